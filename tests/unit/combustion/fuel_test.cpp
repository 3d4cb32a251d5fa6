// Fuels: what they are read from, what is refused, and the heat that they bring.
#include "combustion/fuel.hpp"

#include <gtest/gtest.h>

#include <string>

#include "gas/species.hpp"

namespace busbar::combustion {
namespace {

using gas::Element;
using gas::Species;

Composition parts(Basis basis, std::vector<Part> parts) {
  Composition composition;
  composition.basis = basis;
  composition.parts = std::move(parts);
  return composition;
}

Outcome<Fuel> by_mass(std::vector<Part> list) {
  return fuel_from(parts(Basis::mass, std::move(list)));
}
Outcome<Fuel> by_mole(std::vector<Part> list) {
  return fuel_from(parts(Basis::mole, std::move(list)));
}

bool says(const Failure& failure, const char* words) {
  return std::string(failure.reason).find(words) != std::string::npos;
}

TEST(Fuel, HoldsTheElementsOfItsSpeciesPerKilogram) {
  const auto fuel = by_mole({{"CH4", 0.5}, {"n-C8H18(L)", 0.5}});
  ASSERT_TRUE(fuel);
  const double mass = 0.5 * (16.04246e-3 + 114.22852e-3);
  EXPECT_NEAR(fuel->of(Element::C), 4.5 / mass, 1e-10);
  EXPECT_NEAR(fuel->of(Element::H), 11 / mass, 1e-10);
  EXPECT_NEAR(fuel->moles(), 1 / mass, 1e-10);
  EXPECT_FALSE(fuel->analysed);
}

TEST(Fuel, ElementsOfAFuelWeighOneKilogram) {
  const auto fuel = by_mass({{"C", 0.61},
                             {"H", 0.04},
                             {"O", 0.03},
                             {"N", 0.02},
                             {"S", 0.01},
                             {"ash", 0.25},
                             {"moisture", 0.04}});
  ASSERT_TRUE(fuel);
  const double mass = fuel->of(Element::C) * gas::molar_mass(Species::C) +
                      fuel->of(Element::H) * gas::molar_mass(Species::H) +
                      fuel->of(Element::O) * gas::molar_mass(Species::O) +
                      fuel->of(Element::N) * gas::molar_mass(Species::N) +
                      fuel->of(Element::S) * gas::molar_mass(Species::S);
  EXPECT_NEAR(mass + fuel->ash, 1, 1e-14);
  EXPECT_TRUE(fuel->analysed);
}

TEST(Fuel, NamesOfGasesAndOfAnAnalysisAreToldApart) {
  EXPECT_FALSE(by_mass({{"hydrogen", 0.5}, {"CH4", 0.5}})->analysed);
  EXPECT_TRUE(by_mass({{"carbon", 0.85}, {"hydrogen", 0.15}})->analysed);
  EXPECT_TRUE(by_mass({{"c", 0.85}, {"h", 0.15}})->analysed);
  const auto mixed = by_mass({{"CH4", 0.9}, {"moisture", 0.1}});
  ASSERT_FALSE(mixed);
  EXPECT_EQ(mixed.failure().row, 1U);
}

TEST(Fuel, RefusesWhatIsNone) {
  EXPECT_TRUE(says(by_mole({{"N2", 1}}).failure(), "nothing that burns"));
  EXPECT_TRUE(says(by_mole({{"CO2", 0.5}, {"O2", 0.5}}).failure(), "nothing that burns"));
  EXPECT_TRUE(says(by_mass({{"ash", 0.4}, {"moisture", 0.6}}).failure(), "nothing that burns"));
  EXPECT_TRUE(says(by_mole({{"CH4", 0.9}}).failure(), "sums to {0}"));
  EXPECT_EQ(by_mole({{"CH4", 1.2}, {"N2", -0.2}}).failure().row, 2U);
  EXPECT_EQ(by_mole({{"CH4", 0.5}, {"methane", 0.5}}).failure().fault, Fault::wrong_shape);
  EXPECT_EQ(by_mole({{"Xy", 1}}).failure().fault, Fault::unknown_word);
  EXPECT_TRUE(says(by_mole({{"OH", 1}}).failure(), "flames alone"));
  EXPECT_TRUE(says(by_mole({{"C", 0.5}, {"H", 0.5}}).failure(), "an analysis is by mass"));
  EXPECT_TRUE(says(by_mass({{"C", 0.5}, {"moisture", 1.5}}).failure(), "MOISTURE_ON_WET_BASIS"));
  EXPECT_TRUE(says(by_mass({{"C", 0.95}, {"Cl", 0.05}}).failure(), "HCl"));
  EXPECT_TRUE(by_mass({{"C", 1}, {"Cl", 0}}));
  EXPECT_TRUE(says(by_mass({{"C", 0.5}, {"volatile matter", 0.5}}).failure(), "proximate"));
  EXPECT_FALSE(by_mole({}));
}

TEST(Fuel, HeatingValueIsAPartThatAddsNoMass) {
  const auto fuel = by_mass({{"C", 0.85}, {"H", 0.15}, {"HHV (MJ/kg)", 46}});
  ASSERT_TRUE(fuel);
  const auto higher = heat_of_combustion(*fuel, fuel::Basis::higher, kReferenceTemperature);
  ASSERT_TRUE(higher);
  EXPECT_NEAR(*higher, 46e6, 1e-6);
  // Heat of vaporisation of the tables: 285,830 - 241,826 J/mol, half a mole of water per mole H.
  const auto lower = heat_of_combustion(*fuel, fuel::Basis::lower, kReferenceTemperature);
  ASSERT_TRUE(lower);
  EXPECT_NEAR(*higher - *lower, 0.15 / 1.00794e-3 / 2 * (285830 - 241826), 200);
  const auto percent = by_mass({{"C", 0.85}, {"H", 0.15}, {"HHV (MJ/kg)", 0.46}});
  ASSERT_FALSE(percent);
  EXPECT_TRUE(says(percent.failure(), "COMBUSTION_FUEL"));
  EXPECT_EQ(percent.failure().row, 3U);
  EXPECT_FALSE(by_mass({{"C", 1}, {"HHV (MJ/kg)", 33}, {"LHV (MJ/kg)", 33}}));
}

TEST(Fuel, AnalysisNeedsAHeatingValueForHeatAndHasOneTemperature) {
  const auto bare = by_mass({{"C", 0.85}, {"H", 0.15}});
  ASSERT_TRUE(bare);
  EXPECT_EQ(enthalpy(*bare, 298.15).failure().fault, Fault::missing);
  const auto fuel = by_mass({{"C", 0.85}, {"H", 0.15}, {"LHV (MJ/kg)", 43}});
  ASSERT_TRUE(fuel);
  EXPECT_TRUE(enthalpy(*fuel, 298.15));
  EXPECT_EQ(enthalpy(*fuel, 350).failure().argument, 2);
}

// An analysis of a known substance with that substance's heating value is the same fuel.
TEST(Fuel, AnalysisOfAKnownSubstanceAgreesWithItsSpecies) {
  const auto species = by_mole({{"CH3OH(L)", 1}});
  ASSERT_TRUE(species);
  const auto higher = heat_of_combustion(*species, fuel::Basis::higher, kReferenceTemperature);
  ASSERT_TRUE(higher);
  const double mass = 32.04186;
  const auto analysed = by_mass({{"C", 12.0107 / mass},
                                 {"H", 4 * 1.00794 / mass},
                                 {"O", 15.9994 / mass},
                                 {"HHV (MJ/kg)", *higher / 1e6}});
  ASSERT_TRUE(analysed);
  EXPECT_NEAR(*enthalpy(*analysed, 298.15), *enthalpy(*species, 298.15), 1e-5);
}

TEST(Fuel, HeatOfCombustionOfTheLowerBasisMovesWithTemperatureByKirchhoff) {
  const auto fuel = by_mole({{"H2", 1}});
  ASSERT_TRUE(fuel);
  // cp of H2, O2 and H2O at 25 °C and 127 °C: 28.8, 29.4, 33.6 and 29.2, 30.1, 34.3 J/(mol K)
  // (NIST-JANAF), so that the heat rises by (29.0 + 29.7/2 - 33.9) 100 J/mol.
  const auto cold = heat_of_combustion(*fuel, fuel::Basis::lower, 298.15);
  const auto warm = heat_of_combustion(*fuel, fuel::Basis::lower, 398.15);
  ASSERT_TRUE(cold);
  ASSERT_TRUE(warm);
  EXPECT_NEAR((*warm - *cold) * 2.01588e-3, 995, 60);
  EXPECT_FALSE(heat_of_combustion(*fuel, fuel::Basis::higher, 260)) << "no liquid water";
}

}  // namespace
}  // namespace busbar::combustion
