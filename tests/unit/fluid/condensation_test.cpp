// Water that condenses out of a gas.
#include "fluid/condensation.hpp"

#include <gtest/gtest.h>

#include <array>

#include "random.hpp"

namespace busbar::fluid {
namespace {

using gas::Mixture;
using gas::Species;

Mixture moist(double water) {
  std::array<double, gas::kSpecies> amounts{};
  amounts[static_cast<std::size_t>(Species::N2)] = 1 - water;
  amounts[static_cast<std::size_t>(Species::H2O)] = water;
  return *Mixture::from_amounts(amounts);
}

TEST(Condensation, TheDewPointIsWhereThePartialPressureSaturates) {
  support::Random random(96);
  for (int i = 0; i < 2000; ++i) {
    const Mixture gas = moist(random.logarithmic(1e-4, 0.9));
    const double p = random.logarithmic(1e3, 1e7);
    const auto dew = dew_point(gas, p);
    ASSERT_TRUE(dew);
    const double partial = gas.mole_fraction(Species::H2O) * p;
    EXPECT_NEAR(*water_saturation_pressure(*dew), partial, 2e-4 * partial);
    EXPECT_EQ(check_condensation(gas, p, *dew * (1 + 1e-9)).fault, Fault::none);
    const Failure below = check_condensation(gas, p, *dew * 0.999);
    EXPECT_EQ(below.fault, Fault::impossible);
    EXPECT_EQ(below.measures[1].si, *dew);
  }
}

TEST(Condensation, AGasWithoutWaterHasNoDewPoint) {
  EXPECT_EQ(dew_point(Mixture::of(Species::N2), 1e5).failure().fault, Fault::missing);
  EXPECT_EQ(check_condensation(Mixture::of(Species::N2), 1e7, 200).fault, Fault::none);
  EXPECT_FALSE(dew_point(moist(0.9), 1e8));
  EXPECT_FALSE(dew_point(moist(1e-300), 1e5));
}

}  // namespace
}  // namespace busbar::fluid
