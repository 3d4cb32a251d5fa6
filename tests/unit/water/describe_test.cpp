#include "water/describe.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

#include "water/constants.hpp"

namespace busbar::water {
namespace {

TEST(Describe, SuperheatAndSubcooling) {
  // R7-97(2012), table 36: 453.035632 K at 1 MPa.
  const Neighbourhood hot = neighbourhood(*at_pressure_temperature(1e6, 473.035632));
  EXPECT_TRUE(hot.has_saturation);
  EXPECT_NEAR(hot.saturation_temperature, 453.035632, 5e-7);
  EXPECT_NEAR(hot.distance, 20, 5e-7);
  EXPECT_NEAR(neighbourhood(*at_pressure_temperature(1e6, 443.035632)).distance, -10, 5e-7);
  EXPECT_EQ(neighbourhood(*at_pressure_dryness(1e6, 0.4)).distance, 0);
  EXPECT_FALSE(neighbourhood(*at_pressure_temperature(30e6, 700)).has_saturation);
  EXPECT_FALSE(neighbourhood(*at_pressure_temperature(500, 300)).has_saturation);
  EXPECT_TRUE(neighbourhood(*at_pressure_temperature(1e6, 1500)).has_saturation);
}

TEST(Describe, NamesAndEquations) {
  EXPECT_EQ(std::string(equation(Region::liquid)), "IAPWS R7-97(2012), equation 7");
  EXPECT_EQ(std::string(equation(Region::vapour)), "IAPWS R7-97(2012), equation 15");
  EXPECT_EQ(std::string(equation(Region::near_critical)), "IAPWS R7-97(2012), equation 28");
  EXPECT_EQ(std::string(equation(Region::high_temperature)), "IAPWS R7-97(2012), equation 32");
  EXPECT_NE(std::string(equation(Region::two_phase)).find("equation 31"), std::string::npos);
  for (int k = 0; k <= 255; ++k) {
    EXPECT_NE(std::string(region_name(static_cast<Region>(k))), "");
    EXPECT_NE(std::string(equation(static_cast<Region>(k))), "");
  }
}

}  // namespace
}  // namespace busbar::water
