// Equilibrium: balances, the law of mass action, every fuel and air ratio, and the edges.
#include "combustion/equilibrium.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

#include "combustion/flame.hpp"
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

Fuel single(const char* name) {
  Composition composition;
  composition.parts = {{name, 1}};
  return *fuel_from(composition);
}

double atoms_in(const Equilibrium& found, Element element) {
  double sum = element == Element::C ? found.graphite : 0;
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    sum += found.amount[i] * gas::atoms(static_cast<Species>(i), element);
  }
  return sum;
}

void expect_balance(const Equilibrium& found, const Elements& given) {
  for (std::size_t e = 0; e < gas::kElementCount; ++e) {
    const double atoms = atoms_in(found, static_cast<Element>(e));
    EXPECT_NEAR(atoms, given[e], 1e-12 * given[e]) << "element " << e;
  }
}

// mu/(RT) of a species in the gas.
double potential(const Equilibrium& found, Species species, double pressure) {
  const gas::Powers powers = gas::Powers::at(found.temperature);
  return gas::fit(species, found.temperature).gibbs(powers) +
         std::log(found.of(species) / found.moles() * pressure / gas::kStandardPressure);
}

constexpr const char* kFuels[] = {
    "H2",       "CO",        "CH4",     "C2H2",    "C2H4",    "C2H6", "C3H6",       "C3H8",
    "1-C4H8",   "n-C4H10",   "i-C4H10", "n-C5H12", "n-C6H14", "C6H6", "C7H8",       "n-C7H16",
    "n-C8H18",  "i-C8H18",   "CH3OH",   "C2H5OH",  "NH3",     "H2S",  "n-C8H18(L)", "Jet-A(L)",
    "CH3OH(L)", "C2H5OH(L)", "C7H8(L)", "C(gr)",   "HCN",     "COS"};

TEST(Equilibrium, OfEveryFuelAndRatioIsFoundAndBalances) {
  const Oxidant air = published("dry air, ISO 2533");
  for (const char* name : kFuels) {
    const Fuel fuel = single(name);
    for (double ratio = 0.2; ratio <= 5; ratio *= 1.06) {
      for (const double pressure : {1e4, 101325.0, 2e6, 1e7}) {
        Feed feed;
        feed.air_ratio = ratio;
        feed.air_temperature = pressure > 1e6 ? 700 : 288.15;
        const auto given = reactants(fuel, air, feed);
        ASSERT_TRUE(given);
        const auto found = equilibrium_of(given->elements, given->enthalpy, pressure);
        ASSERT_TRUE(found) << name << ' ' << ratio << ' ' << pressure << ' '
                           << found.failure().reason;
        expect_balance(*found, given->elements);
        EXPECT_NEAR(enthalpy(*found), given->enthalpy, 1e-10 * std::abs(given->enthalpy) + 1e-3)
            << name << ' ' << ratio;
        EXPECT_LE(found->steps, 60U) << name << ' ' << ratio;
      }
    }
  }
}

TEST(Equilibrium, OfRandomAnalysesIsFoundAndBalances) {
  support::Random random(31);
  const Oxidant air = published("dry air, CIPM-2007");
  int found_ones = 0;
  for (int i = 0; i < 20000; ++i) {
    const double c = random.uniform(0.1, 1);
    const double h = random.uniform(0, 0.2);
    const double o = random.uniform(0, 0.4);
    const double n = random.uniform(0, 0.05);
    const double s = random.uniform(0, 0.1);
    const double ash = random.uniform(0, 0.4);
    const double moisture = random.uniform(0, 0.8);
    const double sum = c + h + o + n + s + ash + moisture;
    // Boie's formula, a plausible heating value.
    const double higher = (34.9 * c + 117.8 * h - 10.3 * o + 10 * s) / sum;
    if (higher < 5) continue;
    Composition composition;
    composition.basis = Basis::mass;
    composition.parts = {{"C", c / sum},
                         {"H", h / sum},
                         {"O", o / sum},
                         {"N", n / sum},
                         {"S", s / sum},
                         {"ash", ash / sum},
                         {"moisture", moisture / sum},
                         {"HHV (MJ/kg)", higher}};
    const auto fuel = fuel_from(composition);
    ASSERT_TRUE(fuel) << fuel.failure().reason;
    Feed feed;
    feed.air_ratio = random.logarithmic(0.2, 5);
    feed.air_temperature = random.uniform(250, 1100);
    const auto given = reactants(*fuel, air, feed);
    ASSERT_TRUE(given);
    const double pressure = random.logarithmic(1e4, 1e7);
    const auto found = equilibrium_of(given->elements, given->enthalpy, pressure);
    if (!found) {
      // Very wet and lean: colder than where an equilibrium is used.
      EXPECT_EQ(found.failure().fault, Fault::outside_range) << found.failure().reason;
      continue;
    }
    ++found_ones;
    expect_balance(*found, given->elements);
  }
  EXPECT_GT(found_ones, 15000);
}

TEST(Equilibrium, ObeysTheLawOfMassAction) {
  const Oxidant air = published("dry air, NASA");
  constexpr double kPressure = 3e5;
  for (const double ratio : {0.5, 0.9, 1.0, 1.3, 3.0}) {
    for (const double temperature : {600.0, 999.0, 1001.0, 1600.0, 2400.0, 4000.0}) {
      const auto found =
          equilibrium_at(elements_of(single("CH4"), air, ratio), temperature, kPressure);
      ASSERT_TRUE(found) << ratio << ' ' << temperature << found.failure().reason;
      const auto mu = [&](Species species) { return potential(*found, species, kPressure); };
      EXPECT_NEAR(mu(Species::CO) + mu(Species::H2O), mu(Species::CO2) + mu(Species::H2), 1e-9);
      EXPECT_NEAR(mu(Species::H2) + mu(Species::O2) / 2, mu(Species::H2O), 1e-9);
      EXPECT_NEAR(mu(Species::N2) + mu(Species::O2), 2 * mu(Species::NO), 1e-9);
      EXPECT_NEAR(2 * mu(Species::OH), mu(Species::H2O) + mu(Species::O), 1e-9);
      EXPECT_NEAR(mu(Species::CH4) + mu(Species::H2O), mu(Species::CO) + 3 * mu(Species::H2), 1e-9);
    }
  }
}

TEST(Equilibrium, GraphiteIsInEquilibriumWithTheGasWhereItIsThere) {
  const Oxidant air = published("technical air, 21/79");
  const auto sooty = equilibrium_at(elements_of(single("C2H2"), air, 0.3), 1200, 101325);
  ASSERT_TRUE(sooty);
  ASSERT_GT(sooty->graphite, 0);
  const gas::Powers powers = gas::Powers::at(1200);
  // Boudouard: C + CO2 = 2 CO.
  EXPECT_NEAR(gas::fit(gas::Condensed::graphite, 1200)->gibbs(powers) +
                  potential(*sooty, Species::CO2, 101325),
              2 * potential(*sooty, Species::CO, 101325), 1e-9);
  EXPECT_EQ(equilibrium_at(elements_of(single("C2H2"), air, 0.6), 1200, 101325)->graphite, 0);
}

TEST(Equilibrium, NobleGasesPassThrough) {
  Elements elements{};
  elements[static_cast<std::size_t>(Element::H)] = 2;
  elements[static_cast<std::size_t>(Element::O)] = 1.4;
  elements[static_cast<std::size_t>(Element::Ar)] = 5;
  const auto found = equilibrium_at(elements, 2500, 1e5);
  ASSERT_TRUE(found);
  EXPECT_EQ(found->of(Species::Ar), 5);
  elements.fill(0);
  EXPECT_FALSE(equilibrium_at(elements, 2500, 1e5));
  elements[static_cast<std::size_t>(Element::Ar)] = 5;
  EXPECT_FALSE(equilibrium_at(elements, 2500, 1e5)) << "nothing that reacts";
}

TEST(Equilibrium, ScalesWithTheAmount) {
  const Oxidant air = published("dry air, NASA");
  Elements elements = elements_of(single("CH4"), air, 0.8);
  const auto one = equilibrium_at(elements, 2000, 1e5);
  for (double& amount : elements) amount *= 1e6;
  const auto million = equilibrium_at(elements, 2000, 1e5);
  ASSERT_TRUE(one);
  ASSERT_TRUE(million);
  EXPECT_NEAR(million->of(Species::CO) / one->of(Species::CO), 1e6, 1e-4);
}

// The two fits of a species do not quite meet at 1,000 K: an enthalpy there must not set the
// iteration swinging.
TEST(Equilibrium, IsFoundAcrossTheSeamOfTheFits) {
  const Oxidant air = published("dry air, ISO 2533");
  const Elements elements = elements_of(single("CH4"), air, 3);
  const auto below = equilibrium_at(elements, std::nextafter(1000.0, 0), 1e5);
  const auto above = equilibrium_at(elements, 1000, 1e5);
  ASSERT_TRUE(below);
  ASSERT_TRUE(above);
  const double low = enthalpy(*below);
  const double high = enthalpy(*above);
  for (int i = -20; i <= 40; ++i) {
    const double wanted = low + (high - low) * i / 20;
    const auto found = equilibrium_of(elements, wanted, 1e5);
    ASSERT_TRUE(found) << i << ' ' << high - low << ' ' << found.failure().reason;
    EXPECT_NEAR(found->temperature, 1000, 1e-3);
  }
}

TEST(Equilibrium, OutsideItsLimitsIsRefusedWithTheTemperature) {
  const Oxidant air = published("technical air, 21/79");
  const Elements elements = elements_of(single("CH4"), air, 1);
  for (const double temperature : {300.0, 5500.0, std::nan("")}) {
    const auto refused = equilibrium_at(elements, temperature, 1e5);
    ASSERT_FALSE(refused);
    EXPECT_EQ(refused.failure().argument, 2);
  }
  const auto wet = equilibrium_at(elements, 510, 3e7);
  ASSERT_FALSE(wet);
  EXPECT_NE(std::string(wet.failure().reason).find("condenses"), std::string::npos);
  EXPECT_FALSE(equilibrium_of(elements, -1e9, 1e5));
  EXPECT_FALSE(equilibrium_of(elements, 1e12, 1e5));
  EXPECT_FALSE(equilibrium_of(elements, std::nan(""), 1e5));
  EXPECT_FALSE(equilibrium_at(elements, 1500, std::nan("")));
}

TEST(Flame, CompleteAndEquilibriumAgreeWhereNothingDissociates) {
  const Oxidant air = published("dry air, NASA");
  Feed feed;
  feed.air_ratio = 4;
  const auto complete = complete_flame_temperature(single("CH4"), air, feed);
  const auto found = equilibrium_flame(single("CH4"), air, feed, 101325);
  ASSERT_TRUE(complete);
  ASSERT_TRUE(found);
  EXPECT_NEAR(*complete, found->temperature, 0.2);
  feed.air_ratio = 1;
  EXPECT_GT(*complete_flame_temperature(single("CH4"), air, feed),
            equilibrium_flame(single("CH4"), air, feed, 101325)->temperature + 80);
}

TEST(Flame, NamesTheArgumentThatFails) {
  const Oxidant air = published("dry air, NASA");
  Feed feed;
  feed.fuel_temperature = 100;
  EXPECT_EQ(equilibrium_flame(single("CH4"), air, feed, 1e5).failure().argument, 4);
  feed.fuel_temperature = 298.15;
  feed.air_temperature = 100;
  EXPECT_EQ(equilibrium_flame(single("CH4"), air, feed, 1e5).failure().argument, 5);
  feed.air_temperature = 298.15;
  feed.air_ratio = 500;
  EXPECT_EQ(equilibrium_flame(single("CH4"), air, feed, 1e5).failure().argument, 3);
}

}  // namespace
}  // namespace busbar::combustion
