// Concentrations on other references: there and back, and what is impossible.
#include "emission/concentration.hpp"

#include <gtest/gtest.h>

#include "random.hpp"

namespace busbar::emission {
namespace {

TEST(Concentration, GoesToAReferenceOxygenAndBack) {
  support::Random random(95);
  for (int i = 0; i < 1000; ++i) {
    const double air = random.uniform(0.205, 0.21);
    const double measured = random.uniform(0, 0.2);
    const double reference = random.uniform(0, 0.2);
    const double value = random.logarithmic(1e-6, 1e6);
    const double there = *at_oxygen(value, measured, reference, air);
    EXPECT_NEAR(*at_oxygen(there, reference, measured, air), value, 1e-12 * value);
    EXPECT_EQ(there > value, reference < measured);
  }
}

TEST(Concentration, AirIsNoFlueGas) {
  EXPECT_EQ(at_oxygen(1, 0.21, 0.03, 0.21).failure().argument, 2);
  EXPECT_EQ(at_oxygen(1, 0.03, 0.21, 0.209).failure().argument, 3);
  EXPECT_EQ(emission_by_dry_oxygen(1, 1, 0.209).failure().argument, 3);
  EXPECT_EQ(emission_by_wet_oxygen(1, 1, 0.2, 0.06).failure().argument, 3);
}

TEST(Concentration, GasesAreNamedByFormula) {
  for (const char* gas : {"CO", "NO2", "SO2", "HCl", "HF", "C"}) EXPECT_TRUE(molar_mass_of(gas));
  for (const char* gas : {"", "NOx", "NOX", "co", "Hg", "dust"}) {
    EXPECT_FALSE(molar_mass_of(gas)) << gas;
  }
}

// 22.414 m3/kmol at 0 °C and 101.325 kPa (CODATA, to the digits printed).
TEST(Concentration, MolarVolumeIsThePublishedOne) {
  EXPECT_NEAR(1 / molar_density(273.15, 101325) * 1000, 22.414, 0.0005);
  EXPECT_NEAR(1 / molar_density(273.15, 100000) * 1000, 22.711, 0.0005);
}

// Oxygen, moisture and carbon dioxide of one flue gas must give one emission: a fuel of pure
// carbon burnt with dry air, F factors from its stoichiometry with 20.9 % of oxygen.
TEST(Emission, ThreeEquationsAgreeForCarbon) {
  const double carbon_dioxide_per_energy = 1.0;
  const double dry_per_energy = 1 / 0.209;  // a mole of oxygen becomes one of CO2, nitrogen stays
  for (const double excess : {1.0, 1.2, 1.5, 3.0}) {
    const double gas = dry_per_energy * excess;
    const double oxygen = 0.209 * (excess - 1) / excess;
    const double concentration = 1 / gas;  // one unit is emitted
    EXPECT_NEAR(*emission_by_dry_oxygen(concentration, dry_per_energy, oxygen), 1, 1e-14);
    EXPECT_NEAR(*emission_by_wet_oxygen(concentration, dry_per_energy, oxygen, 0), 1, 1e-14);
    EXPECT_NEAR(emission_by_carbon_dioxide(concentration, carbon_dioxide_per_energy,
                                           carbon_dioxide_per_energy / gas),
                1, 1e-14);
  }
}

}  // namespace
}  // namespace busbar::emission
