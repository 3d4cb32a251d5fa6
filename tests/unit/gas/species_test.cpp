// The tables of species: names, atoms, and fits that agree with themselves.
#include "gas/species.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

#include "gas/mixture.hpp"
#include "gas/properties.hpp"

namespace busbar::gas {
namespace {

Species at(std::size_t i) { return static_cast<Species>(i); }

TEST(Species, EveryNameLeadsBackToIt) {
  for (std::size_t i = 0; i < kSpecies; ++i) {
    EXPECT_EQ(species_named(name_of(at(i))), at(i)) << name_of(at(i));
    EXPECT_EQ(species_named(other_name_of(at(i))), at(i)) << other_name_of(at(i));
  }
  for (std::size_t i = 0; i < kCondensed; ++i) {
    const auto species = static_cast<Condensed>(i);
    EXPECT_EQ(condensed_named(name_of(species)), species);
    EXPECT_EQ(condensed_named(other_name_of(species)), species);
  }
}

TEST(Species, AreTheOnesThatTheEnumerationSays) {
  EXPECT_EQ(name_of(Species::N2), "N2");
  EXPECT_EQ(name_of(Species::SO3), "SO3");
  EXPECT_EQ(name_of(Species::n_hexane), "n-C6H14");
  EXPECT_EQ(name_of(Species::C2H5OH), "C2H5OH");
  EXPECT_EQ(name_of(Species::C), "C");
  EXPECT_EQ(name_of(Species::isooctane), "i-C8H18");
  EXPECT_EQ(name_of(Species::jet_fuel), "Jet-A");
  EXPECT_EQ(name_of(Species::Xe), "Xe");
  EXPECT_EQ(name_of(Condensed::graphite), "C(gr)");
  EXPECT_EQ(name_of(Condensed::water), "H2O(L)");
  EXPECT_EQ(name_of(Condensed::jet_fuel), "Jet-A(L)");
}

TEST(Species, CapitalsDoNotMatterAndNothingElseIsKnown) {
  EXPECT_EQ(species_named("co2"), Species::CO2);
  EXPECT_EQ(species_named("Carbon Dioxide"), Species::CO2);
  EXPECT_EQ(species_named("C4H10,n-butane"), Species::n_butane);
  for (const char* name :
       {"", "C4H10", "air", "CO2 ", "unobtainium", "a name that is far too long"}) {
    EXPECT_FALSE(species_named(name)) << name;
  }
}

// ISO 6976:2016, table A.2.
TEST(Species, MolarMassesAreTheSumOfTheirAtoms) {
  constexpr double kAtomic[] = {12.0107, 1.00794, 15.9994,  14.0067, 32.065,
                                39.948,  20.1797, 4.002602, 83.798,  131.293};
  for (std::size_t i = 0; i < kSpecies; ++i) {
    double mass = 0;
    for (std::size_t e = 0; e < kElementCount; ++e) {
      mass += kAtomic[e] * atoms(at(i), static_cast<Element>(e));
    }
    EXPECT_NEAR(molar_mass(at(i)) * 1000, mass, 1.1e-5 * mass) << name_of(at(i));
  }
}

// NASA/TP-2002-211556: the enthalpy at 298.15 K is the heat of formation.
TEST(Species, TheFitsHoldTheHeatOfFormation) {
  const Powers powers = Powers::at(298.15);
  for (std::size_t i = 0; i < kSpecies; ++i) {
    EXPECT_NEAR(kGasConstant * cold_fit(at(i)).enthalpy(powers), formation_enthalpy(at(i)), 0.02)
        << name_of(at(i));
  }
  for (const Condensed species :
       {Condensed::graphite, Condensed::water, Condensed::methanol, Condensed::ethanol,
        Condensed::benzene, Condensed::toluene, Condensed::n_octane, Condensed::jet_fuel}) {
    EXPECT_NEAR(kGasConstant * fit(species, 298.15)->enthalpy(powers), formation_enthalpy(species),
                0.1)
        << name_of(species);
  }
}

// The two fits of a species meet at 1,000 K.
TEST(Species, TheFitsMeet) {
  const Powers powers = Powers::at(kBreak);
  for (std::size_t i = 0; i < kSpecies; ++i) {
    const Polynomial& cold = cold_fit(at(i));
    const Polynomial& hot = hot_fit(at(i));
    EXPECT_NEAR(cold.heat_capacity(powers), hot.heat_capacity(powers), 2e-3) << name_of(at(i));
    EXPECT_NEAR(cold.enthalpy(powers), hot.enthalpy(powers), 0.02) << name_of(at(i));
    EXPECT_NEAR(cold.entropy(powers), hot.entropy(powers), 2e-5) << name_of(at(i));
  }
}

// cp is the slope of h, and cp/T that of s: one slip in a coefficient breaks it. cp is never
// negative, so that h and s rise and have one temperature each.
TEST(Species, HeatCapacityIsTheSlopeOfEnthalpyAndEntropy) {
  for (std::size_t i = 0; i < kSpecies; ++i) {
    for (double t = lowest_temperature(at(i)) + 1; t < highest_temperature(at(i)); t *= 1.07) {
      if (std::abs(t - kBreak) < 1) continue;
      const Polynomial& polynomial = fit(at(i), t);
      const double d = 1e-3 * t;
      const Powers low = Powers::at(t - d);
      const Powers high = Powers::at(t + d);
      const double cp = polynomial.heat_capacity(Powers::at(t));
      EXPECT_GT(cp, 2.4);
      EXPECT_NEAR((polynomial.enthalpy(high) - polynomial.enthalpy(low)) / (2 * d), cp, 1e-4 * cp);
      EXPECT_NEAR((polynomial.entropy(high) - polynomial.entropy(low)) / (2 * d) * t, cp,
                  1e-4 * cp);
    }
  }
}

// Liquid water evaporates at 25 °C with the heat of CODATA 1989, 44.004 kJ/mol (from memory).
TEST(Species, WaterEvaporates) {
  EXPECT_NEAR(formation_enthalpy(Species::H2O) - formation_enthalpy(Condensed::water), 44004, 1);
  EXPECT_EQ(fit(Condensed::water, 700), nullptr);
  EXPECT_EQ(fit(Condensed::water, 250), nullptr);
  EXPECT_NE(fit(Condensed::water, 373.15), nullptr);
}

}  // namespace
}  // namespace busbar::gas
