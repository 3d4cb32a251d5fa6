// Properties of mixtures: laws that hold whatever the mixture, and the way back from h and s.
#include "gas/properties.hpp"

#include <gtest/gtest.h>

#include <cmath>

#include "random.hpp"

namespace busbar::gas {
namespace {

Mixture random_mixture(support::Random& random) {
  std::array<double, kSpecies> amounts{};
  const std::size_t count = 1 + random.below(12);
  for (std::size_t k = 0; k < count; ++k) {
    amounts[random.below(kSpecies)] = random.logarithmic(1e-6, 1);
  }
  return *Mixture::from_amounts(amounts);
}

double random_temperature(support::Random& random, const Mixture& mixture) {
  return random.uniform(lowest_temperature(mixture), highest_temperature(mixture));
}

TEST(GasProperties, TemperatureComesBackFromEnthalpyAndEntropy) {
  support::Random random(92);
  for (int i = 0; i < 20000; ++i) {
    const Mixture mixture = random_mixture(random);
    const double t = random_temperature(random, mixture);
    for (const Datum datum : {Datum::formation, Datum::at_0, Datum::at_15, Datum::at_25}) {
      const auto h = enthalpy(mixture, t, datum);
      if (!h) continue;  // jet fuel has no data at 0 °C or below
      const auto back = temperature_at_enthalpy(mixture, *h, datum);
      ASSERT_TRUE(back) << t;
      EXPECT_NEAR(*back, t, 2e-12 * t + 4e-16 * std::abs(*h)) << static_cast<int>(datum);
    }
    const double p = random.logarithmic(1e3, 1e7);
    const auto s = entropy(mixture, p, t);
    const auto back = temperature_at_entropy(mixture, p, *s);
    ASSERT_TRUE(back) << t;
    EXPECT_NEAR(*back, t, 1e-11 * t);
  }
}

// Where the fits meet there is no gap in what is answered.
TEST(GasProperties, TheSeamAt1000KelvinHasNoHole) {
  support::Random random(93);
  for (int i = 0; i < 2000; ++i) {
    const Mixture mixture = random_mixture(random);
    const double low = *enthalpy(mixture, std::nextafter(kBreak, 0), Datum::formation);
    const double high = *enthalpy(mixture, kBreak, Datum::formation);
    for (const double share : {-0.5, 0.0, 0.25, 0.5, 1.0, 1.5}) {
      const double h = low + share * (high - low);
      const auto t = temperature_at_enthalpy(mixture, h, Datum::formation);
      ASSERT_TRUE(t);
      EXPECT_NEAR(*t, kBreak, 0.02);
    }
  }
}

TEST(GasProperties, OutsideTheFitsThereIsNoAnswer) {
  const Mixture air = Mixture::of(Species::N2);
  EXPECT_EQ(heat_capacity(air, 199.9).failure().fault, Fault::outside_range);
  EXPECT_EQ(heat_capacity(air, 6000.1).failure().fault, Fault::outside_range);
  EXPECT_TRUE(heat_capacity(air, 200));
  EXPECT_TRUE(heat_capacity(air, 6000));
  EXPECT_FALSE(heat_capacity(air, std::nan("")));
  const double least = *enthalpy(air, 200, Datum::at_25);
  const double most = *enthalpy(air, 6000, Datum::at_25);
  EXPECT_TRUE(temperature_at_enthalpy(air, least, Datum::at_25));
  EXPECT_TRUE(temperature_at_enthalpy(air, most, Datum::at_25));
  const auto cold = temperature_at_enthalpy(air, least - 1, Datum::at_25);
  ASSERT_FALSE(cold);
  EXPECT_EQ(cold.failure().argument, 2);
  EXPECT_NEAR(cold.failure().measures[1].si, least, 1e-6);
  EXPECT_FALSE(temperature_at_enthalpy(air, most + 1, Datum::at_25));
  EXPECT_FALSE(temperature_at_enthalpy(air, 1e300, Datum::at_25));
  EXPECT_FALSE(temperature_at_entropy(air, 1e5, -1e300));
  EXPECT_EQ(temperature_at_entropy(air, 1e5, 1e5).failure().argument, 3);
  const Mixture jet = Mixture::of(Species::jet_fuel);
  EXPECT_FALSE(heat_capacity(jet, 273));
  EXPECT_FALSE(
      temperature_at_enthalpy(jet, *enthalpy(jet, 273.15, Datum::at_25) - 10, Datum::at_25));
}

// A datum is zero where it says, and differences do not depend on it.
TEST(GasProperties, ADatumShiftsEveryEnthalpyAlike) {
  support::Random random(94);
  for (int i = 0; i < 2000; ++i) {
    const Mixture mixture = random_mixture(random);
    if (mixture.mole_fraction(Species::jet_fuel) > 0) continue;
    const double a = random_temperature(random, mixture);
    const double b = random_temperature(random, mixture);
    const double rise =
        *enthalpy(mixture, b, Datum::formation) - *enthalpy(mixture, a, Datum::formation);
    for (const Datum datum : {Datum::at_0, Datum::at_15, Datum::at_25}) {
      EXPECT_NEAR(*enthalpy(mixture, zero_temperature(datum), datum), 0, 1e-8);
      EXPECT_NEAR(*enthalpy(mixture, b, datum) - *enthalpy(mixture, a, datum), rise,
                  1e-12 * (std::abs(rise) + 1e8));
    }
  }
}

// The Gibbs-Duhem side of an ideal gas: Mayer's relation and dh = T ds at constant pressure.
TEST(GasProperties, AreThoseOfAnIdealGas) {
  support::Random random(95);
  for (int i = 0; i < 2000; ++i) {
    const Mixture mixture = random_mixture(random);
    const double t = random.uniform(300, 3000);
    const double p = random.logarithmic(1e3, 1e7);
    const double r = specific_gas_constant(mixture);
    EXPECT_NEAR(*heat_capacity(mixture, t) - *isochoric_heat_capacity(mixture, t), r, 1e-9);
    EXPECT_NEAR(p / (*density(mixture, p, t) * r * t), 1, 1e-14);
    EXPECT_NEAR(*entropy(mixture, p, t) - *entropy(mixture, 2 * p, t), r * std::log(2), 1e-8);
    const double a = *speed_of_sound(mixture, t);
    EXPECT_NEAR(a * a, *heat_capacity_ratio(mixture, t) * r * t, 1e-9 * a * a);
    const auto all = caloric(mixture, t);
    EXPECT_EQ(all->heat_capacity, *heat_capacity(mixture, t));
    EXPECT_EQ(all->enthalpy, *enthalpy(mixture, t, Datum::formation));
    EXPECT_NEAR(all->entropy, *entropy(mixture, kStandardPressure, t), 1e-9);
    EXPECT_NEAR(*mean_heat_capacity(mixture, t, t), *heat_capacity(mixture, t), 0);
    EXPECT_NEAR(*mean_heat_capacity(mixture, t, t + 1e-4), *heat_capacity(mixture, t),
                1e-4 * all->heat_capacity);
  }
}

}  // namespace
}  // namespace busbar::gas
