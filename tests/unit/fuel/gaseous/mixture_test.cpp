// From an analysis to a mixture, and what is refused on the way.
#include "fuel/gaseous/mixture.hpp"

#include <gtest/gtest.h>

#include "fuel/gaseous/conditions.hpp"
#include "sample.hpp"

namespace busbar::fuel::gaseous {
namespace {

Composition of(std::vector<Part> parts, busbar::Basis basis = busbar::Basis::mole) {
  Composition analysis;
  analysis.basis = basis;
  analysis.parts = std::move(parts);
  return analysis;
}

TEST(GasMixture, KeepsOrderAndFractions) {
  const Mixture gas = sample::mixture(sample::kExample1);
  ASSERT_EQ(gas.size, 5U);
  EXPECT_EQ(components()[gas.component[3]].name, "nitrogen");
  EXPECT_EQ(gas.fraction[3], 0.01035);
}

TEST(GasMixture, MassAndMoleFractionsAgree) {
  const Mixture gas = sample::mixture(sample::kExample3);
  std::vector<Part> parts;
  double mass = 0;
  for (std::size_t i = 0; i < gas.size; ++i) mass += gas.fraction[i] * molar_mass(gas.component[i]);
  for (std::size_t i = 0; i < gas.size; ++i) {
    const double share = gas.fraction[i] * molar_mass(gas.component[i]) / mass;
    parts.push_back({components()[gas.component[i]].name, share});
  }
  const auto back = mixture_of(of(parts, busbar::Basis::mass));
  ASSERT_TRUE(back);
  for (std::size_t i = 0; i < gas.size; ++i) {
    EXPECT_NEAR(back->fraction[i], gas.fraction[i], 1e-15);
  }
}

TEST(GasMixture, AComponentUnderTwoNamesIsRefused) {
  const auto gas = mixture_of(of({{"isobutane", 0.4}, {"CH4", 0.2}, {"2-methylpropane", 0.4}}));
  ASSERT_FALSE(gas);
  EXPECT_EQ(gas.failure().fault, Fault::impossible);
  EXPECT_EQ(gas.failure().row, 3U);
}

TEST(GasMixture, AnUnknownNameIsRefusedWithItsRow) {
  const auto gas = mixture_of(of({{"CH4", 0.9}, {"radon", 0.1}}));
  ASSERT_FALSE(gas);
  EXPECT_EQ(gas.failure().fault, Fault::unknown_word);
  EXPECT_EQ(gas.failure().row, 2U);
}

TEST(GasMixture, ANegativeAmountIsRefusedWithItsRow) {
  const auto gas = mixture_of(of({{"CH4", 1.1}, {"N2", -0.1}}));
  ASSERT_FALSE(gas);
  EXPECT_EQ(gas.failure().row, 2U);
}

TEST(GasMixture, NothingIsNormalised) {
  for (const double methane : {0.9, 0.9998, 1.0002, 100.0, 0.01, 0.0}) {
    EXPECT_FALSE(mixture_of(of({{"CH4", methane}}))) << methane;
  }
  EXPECT_FALSE(mixture_of(of({})));
  EXPECT_TRUE(mixture_of(of({{"CH4", 1.0}, {"N2", 0.0}})));
}

TEST(GasConditions, AreThoseOfTheStandardAlone) {
  EXPECT_EQ(combustion_at(273.15)->column, 0U);
  EXPECT_EQ(combustion_at(288.15)->column, 1U);
  EXPECT_EQ(combustion_at(15.55 + 273.15)->column, 2U);
  EXPECT_EQ(combustion_at(15.56 + 273.15)->column, 2U);
  EXPECT_EQ(combustion_at((60 + 459.67) * 5 / 9)->column, 2U);
  EXPECT_EQ(combustion_at(293.15)->column, 3U);
  EXPECT_EQ(combustion_at(298.15)->column, 4U);
  for (const double celsius : {-1.0, 0.01, 15.5, 15.6, 16.0, 20.1, 25.01, 26.0}) {
    EXPECT_FALSE(combustion_at(celsius + 273.15)) << celsius;
  }
  // Nobody meters at 25 °C in this standard.
  EXPECT_FALSE(metering_at(298.15, 101325));
  EXPECT_FALSE(metering_at(288.15, 89e3));
  EXPECT_FALSE(metering_at(288.15, 111e3));
  // Whatever way 60 °F was written, it is 60 °F.
  EXPECT_EQ(metering_at(15.55 + 273.15, 101325)->temperature, (60 + 459.67) * 5 / 9);
}

}  // namespace
}  // namespace busbar::fuel::gaseous
