// Ice Ih against the check table of its release, and against the sublimation line.
#include "water/ice.hpp"

#include <gtest/gtest.h>

#include "water/transport/surface.hpp"

namespace busbar::water {
namespace {

// IAPWS R10-06(2009), table 6 (typed from memory; python3-iapws 1.5.3 gives the same figures).
TEST(Ice, PrintedCheckValues) {
  struct Line {
    double pressure, temperature, gibbs_energy, enthalpy, entropy, volume;
  };
  constexpr Line kLines[] = {
      {611.657, 273.16, 0.611784135, -0.333444253966e6, -0.122069433940e4, 0.109085812737e-2},
      {101325, 273.152519, 0.10134274069e3, -0.333354873637e6, -0.122076932550e4,
       0.109084388214e-2},
      {100e6, 100, -0.222296513088e6, -0.483491635676e6, -0.261195122589e4, 0.106193389260e-2}};
  for (const Line& line : kLines) {
    const IceProperties ice = ice_at(line.pressure, line.temperature);
    EXPECT_NEAR(ice.gibbs_energy, line.gibbs_energy, 1e-6);
    EXPECT_NEAR(ice.enthalpy, line.enthalpy, 5e-6);
    EXPECT_NEAR(ice.entropy, line.entropy, 5e-9);
    EXPECT_NEAR(ice.volume, line.volume, 5e-15);
  }
}

TEST(Ice, VolumeIsTheSlopeOfTheGibbsEnergy) {
  for (const double t : {200.0, 250.0, 273.0}) {
    const double slope = (ice_at(2e6, t).gibbs_energy - ice_at(1e6, t).gibbs_energy) / 1e6;
    EXPECT_NEAR(slope, ice_at(1.5e6, t).volume, 1e-10);
  }
}

}  // namespace
}  // namespace busbar::water
