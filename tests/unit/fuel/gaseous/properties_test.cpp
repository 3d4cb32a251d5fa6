// Relations between the properties of a fuel gas, and the limits of the standard. Published figures
// of the properties stand in tests/reference/gaseous-fuels.
#include "fuel/gaseous/properties.hpp"

#include <gtest/gtest.h>

#include <cmath>

#include "fuel/gaseous/gpa_2145.hpp"
#include "sample.hpp"

namespace busbar::fuel::gaseous {
namespace {

constexpr double kAtmosphere = 101325;

Mixture pure(std::string_view name) {
  Composition analysis;
  analysis.parts.push_back({name, 1.0});
  return *mixture_of(analysis);
}

TEST(FuelGas, NetValuesOfTheTablesFollowFromTheGrossOnes) {
  // ISO 6976:2016, table 3 with L0 of annex A: methane 802.65 kJ/mol at 15 °C and 802.55 at 25 °C.
  const Mixture methane = pure("methane");
  EXPECT_NEAR(molar_heating_value(methane, Basis::lower, *combustion_at(288.15)), 802648, 0.5);
  EXPECT_NEAR(molar_heating_value(methane, Basis::lower, *combustion_at(298.15)), 802554, 0.5);
}

TEST(FuelGas, WaterCountsOnTheHigherBasisOnly) {
  const Mixture water = pure("water");
  for (const double celsius : {0.0, 15.0, 15.55, 20.0, 25.0}) {
    const Combustion combustion = *combustion_at(celsius + 273.15);
    EXPECT_GT(molar_heating_value(water, Basis::higher, combustion), 44e3);
    EXPECT_NEAR(molar_heating_value(water, Basis::lower, combustion), 0, 1e-10);
  }
}

TEST(FuelGas, ValuesHangTogether) {
  for (const auto& parts : {sample::kExample1, sample::kExample2, sample::kExample3}) {
    const Mixture gas = sample::mixture(parts);
    for (const double celsius : {0.0, 15.0, 15.55, 20.0}) {
      for (const double pressure : {90e3, 100e3, kAtmosphere, 110e3}) {
        const Combustion combustion = *combustion_at(celsius + 273.15);
        const Metering metering = *metering_at(celsius + 273.15, pressure);
        const double by_mass = mass_heating_value(gas, Basis::lower, combustion);
        const double by_volume = *volume_heating_value(gas, Basis::lower, combustion, metering);
        const double density_here = *density(gas, metering);
        EXPECT_NEAR(by_mass * density_here / by_volume, 1, 1e-14);
        const double wobbe = *wobbe_index(gas, Basis::lower, combustion, metering);
        const double relative = *relative_density(gas, metering);
        EXPECT_NEAR(wobbe * std::sqrt(relative) / by_volume, 1, 1e-14);
        // Air by the same equation: the relative density is the ratio of the densities.
        const double air = 28.96546e-3 * metering.pressure /
                           (air_compression_factor(metering) * 8.3144621 * metering.temperature);
        EXPECT_NEAR(density_here / air / relative, 1, 1e-14);
      }
    }
  }
}

TEST(FuelGas, AGasFarFromIdealIsRefusedByVolumeOnly) {
  const Mixture butane = pure("n-butane");
  const Metering metering = *metering_at(273.15, kAtmosphere);
  EXPECT_TRUE(compression_factor(butane, metering));
  const Mixture hexane = pure("n-hexane");
  const auto z = compression_factor(hexane, metering);
  ASSERT_FALSE(z);
  EXPECT_EQ(z.failure().fault, Fault::outside_range);
  EXPECT_EQ(z.failure().argument, 1);
  EXPECT_FALSE(wobbe_index(hexane, Basis::higher, *combustion_at(288.15), metering));
  EXPECT_GT(mass_heating_value(hexane, Basis::higher, *combustion_at(288.15)), 48e6);
}

TEST(FuelGas, GpaIsWithinFiveHundredthsOfAPerMilleOfIso) {
  const Combustion combustion = *combustion_at(15.55 + 273.15);
  const double ideal_volume = 8.3144621 * (60 + 459.67) * 5 / 9 / kAtmosphere;
  for (const char* name :
       {"methane", "ethane", "propane", "isobutane", "n-butane", "isopentane", "n-pentane",
        "n-hexane", "n-heptane", "n-octane", "n-nonane", "n-decane"}) {
    const double iso = molar_heating_value(pure(name), Basis::higher, combustion) / ideal_volume;
    EXPECT_NEAR(*gpa_heating_value(pure(name)) / iso, 1, 5.5e-5) << name;
  }
  EXPECT_EQ(*gpa_heating_value(pure("nitrogen")), 0);
  for (const char* name : {"neopentane", "hydrogen", "water", "3-methylpentane", "n-undecane"}) {
    EXPECT_FALSE(gpa_heating_value(pure(name))) << name;
  }
}

}  // namespace
}  // namespace busbar::fuel::gaseous
