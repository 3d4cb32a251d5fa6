// The formulas that contracts and laboratories name.
#include <gtest/gtest.h>

#include <cmath>

#include "air/atmosphere.hpp"
#include "air/cipm.hpp"
#include "air/humidity.hpp"
#include "air/perfect_gas.hpp"
#include "air/properties.hpp"

namespace busbar::air {
namespace {

// ASHRAE Handbook Fundamentals 2017, chapter 1, table 3, which rests on IAPWS vapour pressures:
// the equations of Hyland and Wexler in the same chapter are within 2e-4 of it.
TEST(PerfectGas, VapourPressuresOfHylandAndWexler) {
  struct Line {
    double celsius, pascal, digit;
  };
  constexpr Line kLines[] = {{-60, 1.08, 0.01}, {-20, 103.24, 0.01}, {-5, 401.74, 0.01},
                             {25, 3169.7, 0.1}, {50, 12351.3, 0.1},  {100, 101418.0, 0.1}};
  for (const Line& line : kLines) {
    EXPECT_NEAR(hyland_wexler_pressure(line.celsius + 273.15), line.pascal,
                0.5 * line.digit + 2e-4 * line.pascal);
  }
}

// The two equations meet at 0 °C within what ice and water differ there.
TEST(PerfectGas, IceAndWaterMeet) {
  EXPECT_NEAR(hyland_wexler_pressure(std::nextafter(273.15, 0)) / hyland_wexler_pressure(273.15), 1,
              2e-4);
}

TEST(PerfectGas, WetBulbOfSaturatedAirIsItsTemperature) {
  for (const double t : {260.0, 273.15, 300.0}) {
    const double most = *perfect_gas_humidity_ratio(101325, t, 1);
    EXPECT_NEAR(*perfect_gas_humidity_ratio_at_wet_bulb(101325, t, t), most, 1e-12);
  }
}

// The formula has a relative standard uncertainty of 2.2e-5; the virial equation, which shares no
// coefficient with it, agrees within twice that over its whole range.
TEST(Cipm, AgreesWithTheVirialEquation) {
  for (const double p : {60e3, 80e3, 101325.0, 110e3}) {
    for (const double t : {288.15, 294.0, 300.15}) {
      for (const double relative : {0.0, 0.5, 1.0}) {
        const double w =
            *humidity_ratio_at_relative_humidity(p, t, relative, BelowFreezing::unsaid);
        const double here = *density_at(p, t, w);
        EXPECT_NEAR(cipm_2007_density(p, t, relative, 0.0004) / here, 1, 4.4e-5)
            << p << " " << t << " " << relative;
      }
    }
  }
}

TEST(StandardAtmosphere, IsInHydrostaticEquilibrium) {
  for (const double altitude : {-1000.0, 0.0, 3000.0, 9000.0}) {
    const double slope =
        (standard_atmosphere_pressure(altitude + 1) - standard_atmosphere_pressure(altitude - 1)) /
        2;
    const double density = standard_atmosphere_pressure(altitude) /
                           (287.05287 * standard_atmosphere_temperature(altitude));
    EXPECT_NEAR(slope, -density * 9.80665, 1e-6);
  }
}

}  // namespace
}  // namespace busbar::air
