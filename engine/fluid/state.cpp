#include "fluid/state.hpp"

#include <cmath>

#include "fluid/condensation.hpp"
#include "gas/properties.hpp"
#include "water/stream.hpp"

namespace busbar::fluid {
namespace {

using gas::Mixture;

// Mole fractions of what is one gas differ by the rounding of its way.
constexpr double kSameFraction = 1e-9;

// What the domain of gases calls its inputs (mixture, pressure, temperature or what stands for it)
// is here the stream, 1 and 2.
Failure shifted(const Failure& failure) {
  return failure.about(failure.argument > 1 ? static_cast<std::uint8_t>(failure.argument - 1) : 0);
}

// The two numbers are known: whatever is refused is said of the second.
Outcome<State> gas_at_temperature(const Mixture& mixture, double pressure, double temperature,
                                  double enthalpy) {
  if (const Failure wet = check_condensation(mixture, pressure, temperature);
      wet.fault != Fault::none) {
    return wet.about(2);
  }
  const Outcome<double> entropy = gas::entropy(mixture, pressure, temperature);
  if (!entropy) return entropy.failure().about(2);
  State state;
  state.pressure = pressure;
  state.temperature = temperature;
  state.volume = gas::specific_gas_constant(mixture) * temperature / pressure;
  state.enthalpy = enthalpy;
  state.entropy = *entropy;
  return state;
}

bool same_mixture(const Mixture& a, const Mixture& b) {
  if (a == b) return true;
  const auto x = a.fractions();
  const auto y = b.fractions();
  for (std::size_t i = 0; i < x.size(); ++i) {
    if (std::abs(x[i] - y[i]) > kSameFraction) return false;
  }
  return true;
}

}  // namespace

Outcome<State> state_of(const Stream& stream) {
  if (!is_gas(stream)) return water::state_of(stream);
  const Outcome<State> state =
      gas_at_temperature(stream.mixture, stream.pressure, stream.temperature, stream.enthalpy);
  if (!state) return state.failure().about(1);
  return state;
}

Outcome<State> at_pressure_temperature(const Stream& fluid, double pressure, double temperature) {
  if (!is_gas(fluid)) return water::at_pressure_temperature(pressure, temperature);
  const Outcome<double> enthalpy = gas::enthalpy(fluid.mixture, temperature, gas::Datum::formation);
  if (!enthalpy) return enthalpy.failure().about(2);
  return gas_at_temperature(fluid.mixture, pressure, temperature, *enthalpy);
}

Outcome<State> at_pressure_enthalpy(const Stream& fluid, double pressure, double enthalpy) {
  if (!is_gas(fluid)) return water::at_pressure_enthalpy(pressure, enthalpy);
  const Outcome<double> temperature =
      gas::temperature_at_enthalpy(fluid.mixture, enthalpy, gas::Datum::formation);
  if (!temperature) return temperature.failure().about(2);
  return gas_at_temperature(fluid.mixture, pressure, *temperature, enthalpy);
}

Outcome<State> at_pressure_entropy(const Stream& fluid, double pressure, double entropy) {
  if (!is_gas(fluid)) return water::at_pressure_entropy(pressure, entropy);
  const Outcome<double> temperature = gas::temperature_at_entropy(fluid.mixture, pressure, entropy);
  if (!temperature) return shifted(temperature.failure());
  return at_pressure_temperature(fluid, pressure, *temperature);
}

Stream moved_to(const Stream& stream, const State& state) {
  if (!is_gas(stream)) return water::moved_to(stream, state);
  Stream moved = stream;
  moved.pressure = state.pressure;
  moved.temperature = state.temperature;
  moved.enthalpy = state.enthalpy;
  return moved;
}

Outcome<Stream> gas_stream(const Mixture& mixture, double pressure, double temperature,
                           std::optional<double> flow, gas::Datum datum) {
  Stream stream;
  stream.phase = Phase::gas;
  stream.mixture = mixture;
  stream.datum = datum;
  stream.flow = flow;
  const Outcome<double> shift = gas::datum_shift(mixture, datum);
  if (!shift) return shift.failure();
  const Outcome<State> state = at_pressure_temperature(stream, pressure, temperature);
  if (!state) {
    return state.failure().about(static_cast<std::uint8_t>(state.failure().argument + 1));
  }
  return fluid::moved_to(stream, *state);
}

Failure refuse_gas(const Stream& stream, std::uint8_t input) {
  if (!is_gas(stream)) return {};
  return {Fault::wrong_kind, input, "is a gas where water or steam is needed"};
}

Failure refuse_water(const Stream& stream, std::uint8_t input) {
  if (is_gas(stream)) return {};
  return {Fault::wrong_kind, input, "is water or steam where a gas is needed"};
}

Failure refuse_other_fluid(const Stream& first, const Stream& second) {
  if (is_gas(first) != is_gas(second)) {
    return {Fault::wrong_kind, 2,
            is_gas(second) ? "is a gas, but the other stream is water or steam"
                           : "is water or steam, but the other stream is a gas"};
  }
  if (!is_gas(first) || same_mixture(first.mixture, second.mixture)) return {};
  return {Fault::impossible, 2, "is a gas of another composition than the other stream"};
}

}  // namespace busbar::fluid
