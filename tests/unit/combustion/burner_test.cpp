// Burners: energy on every datum, both directions, injection of water and steam, refusals.
#include "combustion/burner.hpp"

#include <gtest/gtest.h>

#include <cmath>

#include "combustion/oxidant.hpp"
#include "fluid/join.hpp"
#include "fluid/state.hpp"
#include "fluid/water_datum.hpp"
#include "gas/properties.hpp"
#include "gas/published.hpp"
#include "water/state.hpp"
#include "water/stream.hpp"

namespace busbar::combustion {
namespace {

gas::Mixture air_mixture() {
  const gas::PublishedMixture* mixture = gas::published_mixture("dry air, NASA");
  Composition composition;
  composition.basis = mixture->basis;
  composition.parts.assign(mixture->parts.begin(), mixture->parts.end());
  return *with_humidity(*gas::Mixture::from(composition), 0.01);
}

Stream air_at(double temperature) {
  return *fluid::gas_stream(air_mixture(), 17e5, temperature, 100, gas::Datum::formation);
}

Stream water_at(double pressure, double temperature, double flow) {
  return water::stream_of(*water::at_pressure_temperature(pressure, temperature), flow, {});
}

Fuel methane() {
  Composition composition;
  composition.parts = {{"CH4", 0.95}, {"N2", 0.05}};
  return *fuel_from(composition);
}

Fuel coal() {
  Composition composition;
  composition.basis = Basis::mass;
  composition.parts = {{"C", 0.61}, {"H", 0.04},   {"O", 0.03},        {"N", 0.02},
                       {"S", 0.01}, {"ash", 0.25}, {"moisture", 0.04}, {"HHV (MJ/kg)", 24.3}};
  return *fuel_from(composition);
}

TEST(Burner, FuelFlowAndOutletTemperatureLeadToEachOther) {
  const Stream liquid = water_at(30e5, 300, 3);
  const Stream steam = water_at(30e5, 650, 5);
  const Stream* const injections[] = {nullptr, &liquid, &steam};
  for (const Fuel& fuel : {methane(), coal()}) {
    for (const Stream* injected : injections) {
      Burner burner;
      burner.air = air_at(690);
      burner.fuel = fuel;
      burner.efficiency = 0.985;
      burner.pressure_loss = 0.04;
      burner.injected = injected;
      const auto out = burner_out(burner, 2);
      ASSERT_TRUE(out) << out.failure().reason;
      EXPECT_NEAR(out->pressure, 17e5 * 0.96, 1e-6);
      const double water = injected == nullptr ? 0 : *injected->flow;
      EXPECT_NEAR(*out->flow, 102 + water - 2 * fuel.ash, 1e-10);
      const auto flow = burner_fuel_flow(burner, out->temperature);
      ASSERT_TRUE(flow) << flow.failure().reason;
      EXPECT_NEAR(*flow, 2, 1e-9);
    }
  }
}

// On the datum of a temperature every stream counts from there with its water as vapour, and the
// fuel brings its LHV of that temperature.
TEST(Burner, ClosesOnEveryDatum) {
  const Stream steam = water_at(30e5, 650, 5);
  const Stream liquid = water_at(30e5, 300, 5);
  for (const Stream* injected : {&steam, &liquid}) {
    Burner burner;
    burner.air = air_at(690);
    burner.fuel = methane();
    burner.fuel_temperature = 320;
    burner.injected = injected;
    const auto out = burner_out(burner, 2);
    ASSERT_TRUE(out);
    for (const auto datum : {gas::Datum::at_0, gas::Datum::at_15, gas::Datum::at_25}) {
      const double zero = gas::zero_temperature(datum);
      const gas::Mixture vapour = gas::Mixture::of(gas::Species::H2O);
      const auto on = [&](const gas::Mixture& mixture, double enthalpy) {
        return enthalpy + *gas::datum_shift(mixture, datum);
      };
      const double heat = *heat_of_combustion(burner.fuel, fuel::Basis::lower, zero);
      const double sensible = *enthalpy(burner.fuel, 320) - *enthalpy(burner.fuel, zero);
      const double in = 100 * on(burner.air.mixture, burner.air.enthalpy) + 2 * (heat + sensible) +
                        5 * on(vapour, fluid::formation_enthalpy(*injected));
      const double taken = *out->flow * on(out->mixture, out->enthalpy);
      EXPECT_NEAR(taken, in, 1e-9 * in);
    }
    const double formation_in = 100 * burner.air.enthalpy + 2 * *enthalpy(burner.fuel, 320) +
                                5 * fluid::formation_enthalpy(*injected);
    EXPECT_NEAR(*out->flow * out->enthalpy, formation_in, 1e-9 * std::abs(formation_in));
  }
}

TEST(Burner, RefusesWhatCannotBurn) {
  Burner burner;
  burner.air = air_at(690);
  burner.fuel = methane();
  EXPECT_EQ(burner_out(burner, 8).failure().argument, 4);
  EXPECT_EQ(burner_fuel_flow(burner, 2900).failure().argument, 4);
  EXPECT_EQ(burner_fuel_flow(burner, 600).failure().argument, 4);
  burner.air.flow.reset();
  EXPECT_EQ(burner_out(burner, 2).failure().argument, 1);
  burner.air = water_at(30e5, 650, 5);
  EXPECT_EQ(burner_out(burner, 2).failure().argument, 1);
  burner.air = air_at(690);
  const Stream low = water_at(2e5, 450, 1);
  burner.injected = &low;
  EXPECT_EQ(burner_out(burner, 2).failure().argument, 7);
}

}  // namespace
}  // namespace busbar::combustion
