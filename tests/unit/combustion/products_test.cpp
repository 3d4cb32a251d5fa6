// Stoichiometry: balances of random fuels, and the way back from a gas reading to the air.
#include "combustion/products.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

#include "combustion/reading.hpp"
#include "gas/published.hpp"
#include "random.hpp"

namespace busbar::combustion {
namespace {

using gas::Element;
using gas::Species;

Oxidant published(const char* name) {
  const gas::PublishedMixture* mixture = gas::published_mixture(name);
  Composition composition;
  composition.basis = mixture->basis;
  composition.parts.assign(mixture->parts.begin(), mixture->parts.end());
  return *oxidant_from(*gas::Mixture::from(composition));
}

Fuel random_fuel(support::Random& random) {
  Composition composition;
  composition.basis = Basis::mass;
  const double c = random.uniform(0.2, 1);
  const double h = random.uniform(0, 0.2);
  const double o = random.uniform(0, 0.3);
  const double n = random.uniform(0, 0.05);
  const double s = random.uniform(0, 0.1);
  const double ash = random.uniform(0, 0.4);
  const double moisture = random.uniform(0, 0.5);
  const double sum = c + h + o + n + s + ash + moisture;
  composition.parts = {{"C", c / sum},
                       {"H", h / sum},
                       {"O", o / sum},
                       {"N", n / sum},
                       {"S", s / sum},
                       {"ash", ash / sum},
                       {"moisture", moisture / sum}};
  return *fuel_from(composition);
}

double atoms_in(const Products& products, Element element) {
  double sum = 0;
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    sum += products.amount[i] * gas::atoms(static_cast<Species>(i), element);
  }
  if (element == Element::C) sum += products.carbon / gas::molar_mass(Species::C);
  return sum;
}

TEST(Products, HoldEveryElementAndTheWholeMass) {
  support::Random random(15);
  const Oxidant air = published("dry air, ISO 2533");
  for (int i = 0; i < 2000; ++i) {
    const Fuel fuel = random_fuel(random);
    Burning burning;
    burning.air_ratio = random.uniform(1, 5);
    burning.carbon_to_monoxide = random.uniform(0, 1);
    burning.unburnt_carbon = random.uniform(0, 0.3);
    burning.water = random.uniform(0, 2);
    const auto products = burn(fuel, air, burning);
    ASSERT_TRUE(products);
    const double moles = burning.air_ratio * stoichiometric_moles(fuel, air);
    const double water = burning.water / gas::molar_mass(Species::H2O);
    for (std::size_t e = 0; e < gas::kElementCount; ++e) {
      const auto element = static_cast<Element>(e);
      double given = fuel.of(element) + moles * air.of(element);
      if (element == Element::H) given += 2 * water;
      if (element == Element::O) given += water;
      EXPECT_NEAR(atoms_in(*products, element), given, 1e-12 * std::max(given, 1.0)) << e;
    }
    const double in = 1 + products->air + burning.water;
    EXPECT_NEAR(products->mass(true) + products->carbon + products->ash, in, 1e-12 * in);
  }
}

TEST(Products, BelowAnAirRatioOfOneHydrogenBurnsFirst) {
  Composition composition;
  composition.parts = {{"n-C8H18", 1}};
  const Fuel fuel = *fuel_from(composition);
  const Oxidant air = published("technical air, 21/79");
  Burning burning;
  burning.air_ratio = 0.9;
  const auto products = burn(fuel, air, burning);
  ASSERT_TRUE(products);
  // Cengel and Boles, example 15-8: 5.5 CO2, 2.5 CO, 9 H2O.
  const double one = fuel.moles();
  EXPECT_NEAR(products->of(Species::CO2) / one, 5.5, 1e-12);
  EXPECT_NEAR(products->of(Species::CO) / one, 2.5, 1e-12);
  EXPECT_NEAR(products->of(Species::H2O) / one, 9, 1e-12);
  EXPECT_EQ(products->of(Species::O2), 0);
  burning.air_ratio = 8.5 / 12.5;
  EXPECT_TRUE(burn(fuel, air, burning)) << "all carbon to CO";
  burning.air_ratio = 8.4 / 12.5;
  const auto sooty = burn(fuel, air, burning);
  ASSERT_FALSE(sooty);
  EXPECT_EQ(sooty.failure().argument, 3);
  EXPECT_NE(std::string(sooty.failure().reason).find("equilibrium"), std::string::npos);
  burning.air_ratio = 0.9;
  burning.carbon_to_monoxide = 0;
  EXPECT_FALSE(burn(fuel, air, burning));
}

TEST(Products, AtAnAirRatioOfOneNothingIsLeft) {
  support::Random random(16);
  const Oxidant air = published("dry air, CIPM-2007");
  for (int i = 0; i < 300; ++i) {
    const auto products = burn(random_fuel(random), air, {});
    ASSERT_TRUE(products);
    EXPECT_EQ(products->of(Species::O2), 0);
    EXPECT_EQ(products->of(Species::CO), 0);
  }
}

TEST(Readings, LeadBackToTheAirRatio) {
  support::Random random(17);
  const Oxidant dry_air = published("dry air, ISO 2533");
  const Oxidant air = *oxidant_from(*with_humidity(dry_air.mixture, 0.012));
  for (int i = 0; i < 2000; ++i) {
    const Fuel fuel = random_fuel(random);
    Burning burning;
    burning.air_ratio = random.uniform(1, 4);
    burning.carbon_to_monoxide = random.uniform(0, 0.2);
    burning.unburnt_carbon = random.uniform(0, 0.1);
    const auto products = burn(fuel, air, burning);
    ASSERT_TRUE(products);
    for (const bool wet : {false, true}) {
      const double whole = products->moles(wet);
      const auto ratio =
          air_ratio_from_oxygen(fuel, air, products->of(Species::O2) / whole, wet,
                                {products->of(Species::CO) / whole, burning.unburnt_carbon});
      ASSERT_TRUE(ratio);
      EXPECT_NEAR(*ratio, burning.air_ratio, 1e-10 * burning.air_ratio);
    }
    const double whole = products->moles(false);
    const auto orsat = air_ratio_from_dry_readings(
        fuel, air,
        {(products->of(Species::CO2) + products->of(Species::SO2)) / whole,
         products->of(Species::CO) / whole, products->of(Species::O2) / whole},
        burning.unburnt_carbon);
    ASSERT_TRUE(orsat);
    EXPECT_NEAR(*orsat, burning.air_ratio, 1e-10 * burning.air_ratio);

    burning.carbon_to_monoxide = 0;
    const auto complete = burn(fuel, air, burning);
    ASSERT_TRUE(complete);
    const auto by_dioxide =
        air_ratio_from_carbon_dioxide(fuel, air, complete->of(Species::CO2) / complete->moles(true),
                                      true, burning.unburnt_carbon);
    ASSERT_TRUE(by_dioxide);
    EXPECT_NEAR(*by_dioxide, burning.air_ratio, 1e-9 * burning.air_ratio);
  }
}

TEST(Readings, OfTheAirItselfAreRefusedWithIts) {
  Composition composition;
  composition.parts = {{"CH4", 1}};
  const Fuel fuel = *fuel_from(composition);
  const Oxidant air = published("technical air, 21/79");
  const auto ambient = air_ratio_from_oxygen(fuel, air, 0.21, false, {});
  ASSERT_FALSE(ambient);
  EXPECT_EQ(ambient.failure().argument, 3);
  EXPECT_NEAR(ambient.failure().measures[1].si, 0.21, 1e-12);
  EXPECT_FALSE(air_ratio_from_oxygen(fuel, air, 0.5, true, {}));
  const auto rich = air_ratio_from_carbon_dioxide(fuel, air, 0.12, false, 0);
  ASSERT_FALSE(rich);
  EXPECT_NEAR(rich.failure().measures[1].si, 0.117318, 1e-6);
}

TEST(Recirculation, LeavesTheFlueGasAsItIs) {
  Composition composition;
  composition.parts = {{"CH4", 0.9}, {"CO2", 0.1}};
  const Fuel fuel = *fuel_from(composition);
  const Oxidant air = published("dry air, NASA");
  const double fresh = 1.15;
  const double share = 0.3;
  Burning burning;
  burning.air_ratio = fresh;
  const auto plain = burn(fuel, air, burning);
  const auto mixed = with_recirculation(fuel, air, fresh, share);
  ASSERT_TRUE(plain);
  ASSERT_TRUE(mixed);
  burning.air_ratio = fresh + share * (fresh - 1);
  const auto recirculated = burn(fuel, *oxidant_from(*mixed), burning);
  ASSERT_TRUE(recirculated);
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    EXPECT_NEAR(recirculated->amount[i], (1 + share) * plain->amount[i], 1e-10);
  }
}

}  // namespace
}  // namespace busbar::combustion
