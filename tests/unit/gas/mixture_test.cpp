// Mixtures: what they refuse, both bases, and the published airs.
#include "gas/mixture.hpp"

#include <gtest/gtest.h>

#include <string>

#include "gas/properties.hpp"
#include "gas/published.hpp"
#include "random.hpp"

namespace busbar::gas {
namespace {

Outcome<Mixture> mixture_of(std::vector<Part> parts, Basis basis = Basis::mole) {
  Composition composition;
  composition.basis = basis;
  composition.parts = std::move(parts);
  return Mixture::from(composition);
}

TEST(Mixture, RefusesUnknownAndRepeatedSpeciesAndSaysWhich) {
  const auto unknown = mixture_of({{"N2", 0.5}, {"Xy", 0.5}});
  ASSERT_FALSE(unknown);
  EXPECT_EQ(unknown.failure().fault, Fault::unknown_word);
  EXPECT_EQ(unknown.failure().row, 2U);
  const auto twice = mixture_of({{"N2", 0.5}, {"O2", 0.2}, {"nitrogen", 0.3}});
  ASSERT_FALSE(twice);
  EXPECT_EQ(twice.failure().fault, Fault::wrong_shape);
  EXPECT_EQ(twice.failure().row, 3U);
  const auto two_gases = mixture_of({{"C4H10", 1}});
  ASSERT_FALSE(two_gases);
  EXPECT_NE(std::string(two_gases.failure().reason).find("n-C4H10"), std::string::npos);
}

TEST(Mixture, RefusesWhatIsNegativeOrNoWhole) {
  const auto negative = mixture_of({{"N2", 1.1}, {"O2", -0.1}});
  ASSERT_FALSE(negative);
  EXPECT_EQ(negative.failure().fault, Fault::outside_range);
  EXPECT_EQ(negative.failure().row, 2U);
  const auto short_of = mixture_of({{"N2", 0.5}, {"O2", 0.499}});
  ASSERT_FALSE(short_of);
  EXPECT_EQ(short_of.failure().fault, Fault::impossible);
  EXPECT_NEAR(short_of.failure().measures[1].si, 0.001, 1e-12);
  EXPECT_FALSE(mixture_of({}));
  EXPECT_TRUE(mixture_of({{"N2", 0.5}, {"O2", 0.499995}})) << "rounding, no more";
}

TEST(Mixture, LeavesZerosOutAndKeepsTheOrderOfTheTables) {
  const auto mixture = mixture_of({{"CO2", 0.25}, {"SO2", 0}, {"N2", 0.75}});
  ASSERT_TRUE(mixture);
  ASSERT_EQ(mixture->size(), 2U);
  EXPECT_EQ(mixture->species(0), Species::N2);
  EXPECT_EQ(mixture->mole_fraction(Species::SO2), 0);
}

TEST(Mixture, MassAndMoleLeadBackToEachOther) {
  support::Random random(91);
  for (int i = 0; i < 500; ++i) {
    std::array<double, kSpecies> amounts{};
    for (int k = 0; k < 12; ++k) amounts[random.below(kSpecies)] = random.uniform(0, 1);
    const auto mixture = Mixture::from_amounts(amounts);
    if (!mixture) continue;
    const auto back = Mixture::from(mixture->composition(Basis::mass));
    ASSERT_TRUE(back);
    ASSERT_EQ(back->size(), mixture->size());
    double sum = 0;
    for (std::size_t k = 0; k < back->size(); ++k) {
      EXPECT_NEAR(back->mole_fraction(k), mixture->mole_fraction(k), 1e-14);
      sum += mixture->mass_fraction(mixture->species(k));
    }
    EXPECT_NEAR(sum, 1, 1e-14);
    EXPECT_NEAR(back->molar_mass(), mixture->molar_mass(), 1e-14);
  }
}

TEST(Mixture, HoldsNoMoreThanFit) {
  std::array<double, kSpecies> amounts{};
  amounts.fill(1);
  const auto mixture = Mixture::from_amounts(amounts);
  ASSERT_FALSE(mixture);
  EXPECT_EQ(mixture.failure().fault, Fault::too_large);
}

TEST(PublishedMixtures, AreWholeAndKnown) {
  for (const PublishedMixture& published : published_mixtures()) {
    Composition composition;
    composition.basis = published.basis;
    composition.parts.assign(published.parts.begin(), published.parts.end());
    EXPECT_TRUE(Mixture::from(composition)) << published.name;
    EXPECT_EQ(published_mixture(published.name), &published);
  }
  EXPECT_EQ(published_mixture("air"), nullptr);
  EXPECT_EQ(published_mixture("DRY AIR, NASA"), published_mixture("dry air, NASA"));
}

// NASA/TP-2002-211556 has a record of its own for air, fitted to the mixture of its parts, from 200
// to 1,000 K: the mixture must agree with it.
TEST(PublishedMixtures, NasaAirAgreesWithTheRecordOfAir) {
  constexpr Polynomial kAir{{10099.5016, -196.827561, 5.00915511, -0.00576101373, 1.06685993e-05,
                             -7.94029797e-09, 2.18523191e-12, -176.796731, -3.921504225}};
  Composition composition;
  const PublishedMixture* published = published_mixture("dry air, NASA");
  composition.parts.assign(published->parts.begin(), published->parts.end());
  const Mixture air = *Mixture::from(composition);
  for (double t = 200; t <= 1000; t += 50) {
    const Powers powers = Powers::at(t);
    const Polynomial mixed = cold_fit(air);
    EXPECT_NEAR(mixed.heat_capacity(powers), kAir.heat_capacity(powers), 1e-4) << t;
    EXPECT_NEAR(mixed.enthalpy(powers), kAir.enthalpy(powers), 0.03) << t;
    EXPECT_NEAR(mixed.entropy(powers) + mixing_entropy(air), kAir.entropy(powers), 2e-4) << t;
  }
}

}  // namespace
}  // namespace busbar::gas
