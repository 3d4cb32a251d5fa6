// Gas streams through every device, and gases joined by steam and water.
#include <gtest/gtest.h>

#include <array>
#include <cmath>
#include <vector>

#include "fluid/join.hpp"
#include "fluid/properties.hpp"
#include "fluid/separation.hpp"
#include "fluid/state.hpp"
#include "fluid/water_datum.hpp"
#include "gas/properties.hpp"
#include "machine/balance.hpp"
#include "machine/expansion.hpp"
#include "random.hpp"
#include "water/stream.hpp"

namespace busbar::fluid {
namespace {

using gas::Datum;
using gas::Mixture;
using gas::Species;

Mixture mixture_of(std::initializer_list<std::pair<Species, double>> parts) {
  std::array<double, gas::kSpecies> amounts{};
  for (const auto& [species, amount] : parts) amounts[static_cast<std::size_t>(species)] = amount;
  return *Mixture::from_amounts(amounts);
}

Mixture flue_gas() {
  return mixture_of({{Species::N2, 0.745},
                     {Species::O2, 0.125},
                     {Species::Ar, 0.01},
                     {Species::CO2, 0.04},
                     {Species::H2O, 0.08}});
}

Stream gas_at(const Mixture& mixture, double p, double t, double flow = 100,
              Datum datum = Datum::formation) {
  const auto stream = gas_stream(mixture, p, t, flow, datum);
  EXPECT_TRUE(stream);
  return *stream;
}

Stream steam_at(double p, double t, double flow) {
  return water::stream_of(*water::at_pressure_temperature(p, t), flow);
}

TEST(GasStreams, AStateComesBackFromAnyPair) {
  support::Random random(101);
  for (int i = 0; i < 3000; ++i) {
    const Stream stream =
        gas_at(flue_gas(), random.logarithmic(2e4, 5e6), random.uniform(450, 2500));
    const auto state = state_of(stream);
    ASSERT_TRUE(state);
    const auto from_s = at_pressure_entropy(stream, stream.pressure, state->entropy);
    const auto from_h = at_pressure_enthalpy(stream, stream.pressure, state->enthalpy);
    ASSERT_TRUE(from_s && from_h);
    EXPECT_NEAR(from_s->temperature, stream.temperature, 1e-11 * stream.temperature);
    EXPECT_NEAR(from_h->temperature, stream.temperature, 1e-11 * stream.temperature);
    EXPECT_NEAR(from_s->enthalpy, state->enthalpy, 1e-11 * std::abs(state->enthalpy));
    EXPECT_NEAR(state->pressure * state->volume,
                gas::specific_gas_constant(stream.mixture) * state->temperature, 1e-6);
  }
}

// What a machine computed, the efficiency reads back.
TEST(GasStreams, MachinesAgreeWithTheirEfficiencies) {
  support::Random random(102);
  for (int i = 0; i < 2000; ++i) {
    const double efficiency = random.uniform(0.5, 1);
    const double ratio = random.uniform(1.1, 30);
    const Stream cold = gas_at(flue_gas(), 1e5, random.uniform(330, 500));
    const auto pressed = machine::compressor_out(cold, cold.pressure * ratio, efficiency);
    ASSERT_TRUE(pressed);
    EXPECT_NEAR(*machine::compressor_efficiency(cold, *pressed), efficiency, 1e-9);
    EXPECT_LT(*machine::fluid_power(cold, *pressed), 0);
    const Stream hot = gas_at(flue_gas(), 30e5, random.uniform(1200, 1900));
    const auto expanded = machine::turbine_out(hot, hot.pressure / ratio, efficiency);
    ASSERT_TRUE(expanded);
    EXPECT_NEAR(*machine::turbine_efficiency(hot, *expanded), efficiency, 1e-9);
    EXPECT_EQ(expanded->mixture, hot.mixture);
    EXPECT_EQ(*expanded->flow, *hot.flow);
    const auto throttled = machine::valve_out(hot, hot.pressure / ratio);
    ASSERT_TRUE(throttled);
    EXPECT_NEAR(throttled->temperature, hot.temperature, 1e-11 * hot.temperature);
  }
}

// Moran and Shapiro, Fundamentals of Engineering Thermodynamics, section 6.12: with constant heat
// capacity T2s = T1 (p2/p1)^((k-1)/k), which a monatomic gas has exactly.
TEST(GasStreams, AMonatomicGasIsCompressedAsTheFormulaSays) {
  const Stream argon = gas_at(Mixture::of(Species::Ar), 1e5, 300);
  const auto pressed = machine::compressor_out(argon, 8e5, 1);
  ASSERT_TRUE(pressed);
  EXPECT_NEAR(pressed->temperature, 300 * std::pow(8.0, 0.4), 1e-9 * 300);
}

TEST(GasStreams, GiveAReasonWhereTheyMakeNoSense) {
  const Stream gas = gas_at(flue_gas(), 1e5, 500);
  const Stream steam = steam_at(1e5, 500, 100);
  EXPECT_EQ(machine::pump_out(gas, 2e5, 0.8).failure().fault, Fault::impossible);
  EXPECT_EQ(machine::pump_efficiency(gas, gas).failure().fault, Fault::impossible);
  EXPECT_EQ(machine::spray_out(gas, steam, 450).failure().fault, Fault::wrong_kind);
  EXPECT_EQ(machine::spray_out(steam, gas, 450).failure().argument, 2);
  EXPECT_EQ(machine::fluid_power(gas, steam).failure().fault, Fault::wrong_kind);
  EXPECT_EQ(machine::heat_duty(steam, gas).failure().fault, Fault::wrong_kind);
  EXPECT_EQ(machine::turbine_efficiency(gas, steam).failure().argument, 2);
  const Stream other = gas_at(Mixture::of(Species::N2), 1e5, 500);
  EXPECT_EQ(machine::heat_duty(gas, other).failure().fault, Fault::impossible);
  EXPECT_EQ(water::state_of(gas).failure().fault, Fault::wrong_kind);
  const Stream liquid = steam_at(1e5, 300, 100);
  EXPECT_EQ(machine::compressor_out(liquid, 2e5, 0.8).failure().fault, Fault::impossible);
  EXPECT_EQ(superheat(gas, *state_of(gas)).failure().fault, Fault::missing);
  EXPECT_EQ(surface_tension(gas, *state_of(gas)).failure().fault, Fault::missing);
}

// The difference between the two datums: IAPWS-IF97 liquid at 25 °C must have the heat of formation
// of liquid water, -285.830 kJ/mol (CODATA 1989; from memory), but for the difference of the two
// heats of evaporation: 0.44 kJ/kg, that is 8 J/mol, where CODATA states 57 J/mol.
TEST(WaterDatum, LeadsFromTheSteamTablesToHeatsOfFormation) {
  const auto liquid = water::at_pressure_temperature(1e5, 298.15);
  EXPECT_NEAR(liquid->enthalpy + water_enthalpy_shift(), -285830 / 0.01801528, 500);
  // Absolute entropy of the liquid: 69.95 J/(mol K), CODATA 1989 (from memory).
  EXPECT_NEAR((liquid->entropy + water_entropy_shift()) * 0.01801528, 69.95, 0.05);
  EXPECT_NEAR(water_enthalpy_shift(), -15.97e6, 0.01e6);
}

// Thin steam and the water of a gas are one substance: the two heat capacities of the ideal gas
// differ little.
TEST(WaterDatum, ThinSteamIsTheVapourOfAGas) {
  for (const double t : {300.0, 400.0, 600.0, 800.0, 1000.0}) {
    const auto steam = water::at_pressure_temperature(10, t);
    const auto vapour = gas::caloric(Mixture::of(Species::H2O), t);
    EXPECT_NEAR(steam->enthalpy + water_enthalpy_shift(), vapour->enthalpy, 400) << t;
  }
}

double datum_enthalpy(const Stream& stream, Datum datum) { return *shown_enthalpy(stream, datum); }

// Mixing closes on every datum: the enthalpy of the product less that of the parts, each counted
// on the datum from its own composition, is what the shift of the datum between compositions says,
// and with heats of formation nothing is left.
TEST(Mixing, ClosesToTheLastDigits) {
  support::Random random(103);
  for (int i = 0; i < 2000; ++i) {
    std::vector<Stream> parts{
        gas_at(flue_gas(), random.logarithmic(1e5, 3e6), random.uniform(500, 1800),
               random.uniform(100, 500)),
        gas_at(Mixture::of(Species::CH4), random.logarithmic(1e5, 3e6), random.uniform(280, 500),
               random.uniform(0.1, 10)),
        steam_at(random.logarithmic(3e6, 6e6), random.uniform(560, 900), random.uniform(0.1, 20)),
        steam_at(5e6, random.uniform(280, 400), random.uniform(0.01, 2))};
    const auto mixed = machine::mix_out(parts);
    ASSERT_TRUE(mixed);
    double flow = 0;
    double energy = 0;
    double size = 0;
    std::array<double, gas::kElementCount> atoms{};
    for (const Stream& part : parts) {
      flow += *part.flow;
      energy += *part.flow * formation_enthalpy(part);
      size += *part.flow * std::abs(formation_enthalpy(part));
      const Mixture composition = is_gas(part) ? part.mixture : Mixture::of(Species::H2O);
      for (std::size_t k = 0; k < composition.size(); ++k) {
        for (std::size_t e = 0; e < gas::kElementCount; ++e) {
          atoms[e] += *part.flow / composition.molar_mass() * composition.mole_fraction(k) *
                      gas::atoms(composition.species(k), static_cast<gas::Element>(e));
        }
      }
    }
    EXPECT_NEAR(*mixed->flow, flow, 1e-12 * flow);
    EXPECT_NEAR(*mixed->flow * mixed->enthalpy, energy, 1e-12 * size);
    EXPECT_NEAR(*heat_taken(parts, std::span(&*mixed, 1)), 0, 1e-9 * size);
    for (std::size_t e = 0; e < gas::kElementCount; ++e) {
      double after = 0;
      for (std::size_t k = 0; k < mixed->mixture.size(); ++k) {
        after += *mixed->flow / mixed->mixture.molar_mass() * mixed->mixture.mole_fraction(k) *
                 gas::atoms(mixed->mixture.species(k), static_cast<gas::Element>(e));
      }
      EXPECT_NEAR(after, atoms[e], 1e-12 * (atoms[e] + 1));
    }
    // The same by sensible enthalpies: each part on the datum, its water as vapour; the liquid and
    // the steam brought there with the vapour of the datum temperature.
    for (const Datum datum : {Datum::at_0, Datum::at_15, Datum::at_25}) {
      const auto vapour =
          gas::enthalpy(Mixture::of(Species::H2O), gas::zero_temperature(datum), Datum::formation);
      double sensible = 0;
      for (const Stream& part : parts) {
        sensible += *part.flow * (is_gas(part) ? datum_enthalpy(part, datum)
                                               : formation_enthalpy(part) - *vapour);
      }
      EXPECT_NEAR(*mixed->flow * datum_enthalpy(*mixed, datum), sensible, 1e-9 * size);
    }
  }
}

TEST(Mixing, OfGasesAloneNeedsNoDatum) {
  const Stream a = gas_at(flue_gas(), 2e5, 700, 30, Datum::at_25);
  const Stream b = gas_at(flue_gas(), 1e5, 500, 10, Datum::at_25);
  const std::array<Stream, 2> parts{a, b};
  const auto mixed = machine::mix_out(parts);
  ASSERT_TRUE(mixed);
  EXPECT_EQ(mixed->datum, Datum::at_25);
  EXPECT_EQ(mixed->pressure, 1e5);
  EXPECT_NEAR(mixed->enthalpy, 0.75 * a.enthalpy + 0.25 * b.enthalpy, 1e-6);
  const std::array<Stream, 2> others{a, gas_at(flue_gas(), 1e5, 500, 10, Datum::at_0)};
  EXPECT_EQ(machine::mix_out(others)->datum, Datum::formation);
}

TEST(Mixing, MoreWaterThanTheGasCanHoldIsRefused) {
  const std::array<Stream, 2> parts{gas_at(Mixture::of(Species::N2), 1e5, 300, 100),
                                    steam_at(1e5, 290, 20)};
  const auto mixed = machine::mix_out(parts);
  ASSERT_FALSE(mixed);
  EXPECT_EQ(mixed.failure().fault, Fault::impossible);
  EXPECT_NEAR(mixed.failure().measures[0].si, 340, 20);
}

// Sprayed into warm air until it is saturated, water cools the air to its wet-bulb temperature:
// 30 °C and 40 % relative humidity at 101.325 kPa give 20.0 °C (ASHRAE psychrometric chart 1; from
// memory).
TEST(Mixing, SprayedWaterCoolsAir) {
  const double x = 0.4 * 4246 / 101325;
  const Stream air = gas_at(
      mixture_of({{Species::N2, 0.79 * (1 - x)}, {Species::O2, 0.21 * (1 - x)}, {Species::H2O, x}}),
      101325, 303.15, 1);
  double most = 0;
  for (double spray = 0; spray < 0.02; spray += 1e-5) {
    const std::array<Stream, 2> parts{air, steam_at(101325, 293.15, spray)};
    const auto mixed = machine::mix_out(parts);
    if (!mixed) break;
    most = mixed->temperature;
  }
  EXPECT_NEAR(most, 293.15, 0.3);
}

TEST(Separation, ClosesInMassAndAmounts) {
  support::Random random(104);
  for (int i = 0; i < 2000; ++i) {
    const double p = random.logarithmic(5e4, 2e6);
    const Stream gas = gas_at(flue_gas(), p, 450, random.uniform(1, 100));
    const double t = random.uniform(274, 340);
    const auto dry = gas_phase(gas, t);
    ASSERT_TRUE(dry);
    const auto water = condensate(gas, t);
    if (!water) {
      EXPECT_EQ(water.failure().fault, Fault::missing);
      EXPECT_EQ(*dry->flow, *gas.flow);
      continue;
    }
    EXPECT_EQ(water->phase, Phase::liquid);
    EXPECT_NEAR(*dry->flow + *water->flow, *gas.flow, 1e-12 * *gas.flow);
    const auto saturation = water::saturation_pressure(t);
    EXPECT_NEAR(dry->mixture.mole_fraction(Species::H2O) * p, *saturation, 1e-9 * *saturation);
    const double nitrogen = *dry->flow * dry->mixture.mass_fraction(Species::N2);
    EXPECT_NEAR(nitrogen, *gas.flow * gas.mixture.mass_fraction(Species::N2), 1e-12 * *gas.flow);
    EXPECT_EQ(state_of(*dry)->region, water::Region::none);
  }
  EXPECT_FALSE(gas_phase(gas_at(flue_gas(), 1e5, 450), 260)) << "ice";
  EXPECT_FALSE(gas_phase(gas_at(Mixture::of(Species::H2O), 1e5, 450), 300)) << "nothing left";
  EXPECT_FALSE(condensate(gas_at(Mixture::of(Species::N2), 1e5, 450), 300));
}

// Exergy is zero in the dead state, positive elsewhere, and has no step at the dew point.
TEST(GasExergy, IsZeroInTheDeadStateAndPositiveElsewhere) {
  support::Random random(105);
  for (int i = 0; i < 1000; ++i) {
    const double t0 = random.uniform(275, 310);
    const Stream dead = gas_at(Mixture::of(Species::N2), 1e5, t0);
    EXPECT_NEAR(*specific_exergy(dead, 1e5, t0), 0, 1e-6);
    const Stream hot = gas_at(flue_gas(), random.logarithmic(1e5, 3e6), random.uniform(460, 1800));
    EXPECT_GT(*specific_exergy(hot, 1e5, t0), 0);
  }
  const Mixture gas = flue_gas();
  const Stream hot = gas_at(gas, 1e5, 800);
  const double dew = 314.7;  // near the dew point of 8 kPa
  double before = *specific_exergy(hot, 1e5, dew - 3);
  for (double t = dew - 2.99; t < dew + 3; t += 0.01) {
    const double here = *specific_exergy(hot, 1e5, t);
    EXPECT_NEAR(here, before, 20);
    before = here;
  }
}

// Exergy destroyed in mixing is T0 times the entropy made: never negative.
TEST(GasExergy, OfAnIdealGasFollowsItsFormula) {
  const Stream argon = gas_at(Mixture::of(Species::Ar), 5e5, 600);
  const double cp = *gas::heat_capacity(argon.mixture, 400);
  const double r = gas::specific_gas_constant(argon.mixture);
  const double t0 = 300;
  const double expected = cp * (600 - t0) - t0 * (cp * std::log(600 / t0) - r * std::log(5.0));
  EXPECT_NEAR(*specific_exergy(argon, 1e5, t0), expected, 1e-6 * expected);
}

}  // namespace
}  // namespace busbar::fluid
