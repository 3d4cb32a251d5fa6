#include "fluid/separation.hpp"

#include <array>

#include "fluid/condensation.hpp"
#include "fluid/state.hpp"
#include "fluid/water_datum.hpp"
#include "gas/properties.hpp"
#include "water/properties/energy.hpp"
#include "water/stream.hpp"

namespace busbar::fluid {
namespace {

using gas::Mixture;
using gas::Species;

constexpr double kFreezing = 273.15;

// Inputs of `separated` as those of a function of a stream and a temperature.
Failure of_stream(const Failure& failure) {
  return failure.about(failure.argument == 3 ? std::uint8_t{2} : std::uint8_t{1});
}

struct Pair {
  double enthalpy = 0;
  double entropy = 0;
};

// Enthalpy with heat of formation and absolute entropy of both phases together, J/kg.
Outcome<Pair> equilibrium(const Mixture& mixture, double pressure, double temperature) {
  const Outcome<Separation> phases = separated(mixture, pressure, temperature);
  if (!phases) return phases.failure();
  const Outcome<double> h = gas::enthalpy(phases->gas, temperature, gas::Datum::formation);
  if (!h) return h.failure().about(3);
  const Outcome<double> s = gas::entropy(phases->gas, pressure, temperature);
  if (!s) return s.failure();
  Pair sum{(1 - phases->liquid) * *h, (1 - phases->liquid) * *s};
  if (phases->liquid > 0) {
    const auto water = water::at_pressure_temperature(pressure, temperature);
    if (!water) return water.failure().about(3);
    sum.enthalpy += phases->liquid * (water->enthalpy + water_enthalpy_shift());
    sum.entropy += phases->liquid * (water->entropy + water_entropy_shift());
  }
  return sum;
}

}  // namespace

Outcome<Separation> separated(const Mixture& mixture, double pressure, double temperature) {
  if (check_condensation(mixture, pressure, temperature).fault == Fault::none) {
    return Separation{mixture, 0};
  }
  if (temperature < kFreezing) {
    return Failure{Fault::outside_range,
                   3,
                   "{0} is below freezing, where the water of the gas becomes ice",
                   {{{temperature, Quantity::temperature}}}};
  }
  const Outcome<double> saturation = water_saturation_pressure(temperature);
  if (!saturation) return saturation.failure().about(3);
  const double water = mixture.mole_fraction(Species::H2O);
  const double vapour_fraction = *saturation / pressure;
  std::array<double, gas::kSpecies> amounts = mixture.fractions();
  const double vapour = (1 - water) * vapour_fraction / (1 - vapour_fraction);
  amounts[static_cast<std::size_t>(Species::H2O)] = vapour;
  const Outcome<Mixture> gas = Mixture::from_amounts(amounts);
  if (!gas || !(1 - water > 0)) {
    return Failure{Fault::impossible,
                   3,
                   "{0} is below saturation: a gas of water alone condenses as a whole",
                   {{{temperature, Quantity::temperature}}}};
  }
  const double liquid = (water - vapour) * gas::molar_mass(Species::H2O) / mixture.molar_mass();
  return Separation{*gas, liquid};
}

Outcome<Stream> gas_phase(const Stream& stream, double temperature) {
  if (const Failure failure = refuse_water(stream, 1); failure.fault != Fault::none) return failure;
  const Outcome<Separation> phases = separated(stream.mixture, stream.pressure, temperature);
  if (!phases) return of_stream(phases.failure());
  std::optional<double> flow;
  if (stream.flow) flow = *stream.flow * (1 - phases->liquid);
  Outcome<Stream> out = gas_stream(phases->gas, stream.pressure, temperature, flow, stream.datum);
  if (!out) return of_stream(out.failure());
  (*out).tag = stream.tag;
  return out;
}

Outcome<Stream> condensate(const Stream& stream, double temperature) {
  if (const Failure failure = refuse_water(stream, 1); failure.fault != Fault::none) return failure;
  const Outcome<Separation> phases = separated(stream.mixture, stream.pressure, temperature);
  if (!phases) return of_stream(phases.failure());
  if (phases->liquid == 0) {
    const Outcome<double> dew = dew_point(stream.mixture, stream.pressure);
    if (!dew) return dew.failure().about(1);
    return Failure{Fault::missing,
                   2,
                   "{0} is above the dew point {1}: there is no condensate",
                   {{{temperature, Quantity::temperature}, {*dew, Quantity::temperature}}}};
  }
  const auto water = water::at_pressure_temperature(stream.pressure, temperature);
  if (!water) return water.failure().about(2);
  std::optional<double> flow;
  if (stream.flow) flow = *stream.flow * phases->liquid;
  return water::stream_of(*water, flow, stream.tag);
}

Outcome<double> specific_exergy(const Stream& stream, double dead_pressure,
                                double dead_temperature) {
  const Outcome<State> state = state_of(stream);
  if (!state) return state.failure();
  if (!is_gas(stream)) {
    return water::specific_exergy(*state, dead_pressure, dead_temperature);
  }
  const Outcome<Pair> dead = equilibrium(stream.mixture, dead_pressure, dead_temperature);
  if (!dead) return dead.failure();
  return state->enthalpy - dead->enthalpy - dead_temperature * (state->entropy - dead->entropy);
}

}  // namespace busbar::fluid
