// Saturated air: published enhancement factors, and how ice and water meet.
#include "air/saturation.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

#include "air/constants.hpp"

namespace busbar::air {
namespace {

constexpr double kAtmosphere = 101325;

double saturated(double pressure, double temperature, Condensate phase) {
  return saturation(place(pressure, temperature), phase)->mole_fraction;
}

// ASHRAE RP-1485 (Herrmann, Kretzschmar, Gatley 2009), table A.3.
TEST(SaturatedAir, PrintedEnhancementFactors) {
  EXPECT_NEAR(saturation(place(kAtmosphere, 213.15), Condensate::ice)->enhancement, 1.00708, 1e-5);
  EXPECT_NEAR(saturation(place(kAtmosphere, 353.15), Condensate::water)->enhancement, 1.00573,
              0.5e-5);
}

// Murphy and Koop against the Smithsonian Meteorological Tables, 6th ed., table 94 (Goff and
// Gratch), over water, from memory: the formulas agree within 0.1 % down to -20 °C.
TEST(SaturatedAir, SupercooledWaterAgreesWithOlderTables) {
  EXPECT_NEAR(supercooled_vapour_pressure(263.15), 286.27, 286.27e-3);
  EXPECT_NEAR(supercooled_vapour_pressure(253.15), 125.40, 125.40e-3);
  EXPECT_NEAR(supercooled_vapour_pressure(233.15), 18.91, 18.91e-3);
}

TEST(SaturatedAir, VapourPressuresMeetAtTheTriplePoint) {
  constexpr double kTriple = 273.16;
  EXPECT_NEAR(vapour_pressure(kTriple, Condensate::ice), 611.657, 1e-9);
  EXPECT_NEAR(vapour_pressure(kTriple, Condensate::water), 611.657, 1e-4);
  EXPECT_NEAR(vapour_pressure(kTriple, Condensate::supercooled), 611.657, 1e-4);
  EXPECT_NEAR(vapour_pressure(kFreezing, Condensate::supercooled),
              vapour_pressure(kFreezing, Condensate::water), 1e-4);
}

// The ice point: at 101.325 kPa, ice and water that air has dissolved in are in equilibrium at
// 0 °C (definition of the Celsius scale before 1954). It takes all parts at once: the two vapour
// pressures, the compression of each phase by the air and the dissolved air.
TEST(SaturatedAir, IceAndWaterMeetAtTheIcePoint) {
  const double ice = saturated(kAtmosphere, kFreezing, Condensate::ice);
  const double water = saturated(kAtmosphere, kFreezing, Condensate::water);
  EXPECT_NEAR(ice / water, 1, 3e-6);
}

TEST(SaturatedAir, EnhancementApproachesOneWithoutAir) {
  for (const double t : {280.0, 330.0, 370.0, 440.0}) {
    const double p = vapour_pressure(t, Condensate::water) * (1 + 1e-9);
    const auto found = saturation(place(p, t), Condensate::water);
    ASSERT_TRUE(found);
    EXPECT_NEAR(found->enhancement, 1, 1e-8);
    EXPECT_LE(found->mole_fraction, 1);
  }
}

TEST(SaturatedAir, EnhancementIsNotBelowOne) {
  for (const double p : {2e3, 1e4, 5e4, 1e5, 3e5, 1e6, 2.5e6, kHighestPressure}) {
    for (int i = 0; i <= 56; ++i) {
      const double t = kColdest + 5 * i;
      const Condensate phase = t < kFreezing ? Condensate::ice : Condensate::water;
      if (vapour_pressure(t, phase) >= p) break;
      const auto found = saturation(place(p, t), phase);
      ASSERT_TRUE(found) << p << " " << t;
      EXPECT_GE(found->enhancement, 1) << p << " " << t;
      EXPECT_LE(found->enhancement, 2) << p << " " << t;
    }
  }
}

TEST(SaturatedAir, NoneWhereWaterBoils) {
  const auto found = saturation(place(kAtmosphere, 373.2), Condensate::water);
  ASSERT_FALSE(found);
  EXPECT_EQ(found.failure().fault, Fault::impossible);
  EXPECT_EQ(found.failure().argument, 2);
}

TEST(SaturatedAir, BelowFreezingThePhaseMustBeSaid) {
  EXPECT_EQ(*condensate_at(kFreezing, BelowFreezing::unsaid), Condensate::water);
  EXPECT_EQ(*condensate_at(290, BelowFreezing::ice), Condensate::water);
  EXPECT_EQ(*condensate_at(260, BelowFreezing::ice), Condensate::ice);
  EXPECT_EQ(*condensate_at(260, BelowFreezing::water), Condensate::supercooled);
  EXPECT_EQ(condensate_at(260, BelowFreezing::unsaid).failure().fault, Fault::missing);
}

}  // namespace
}  // namespace busbar::air
