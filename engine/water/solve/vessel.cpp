// Volume with internal energy: a closed vessel that is heated or cooled.
#include <cmath>

#include "water/constants.hpp"
#include "water/pairs.hpp"
#include "water/solve/assemble.hpp"
#include "water/solve/root.hpp"

namespace busbar::water {

namespace {

// The highest temperature (K) that IF97 has at a volume.
Outcome<double> hottest_at_volume(double volume) {
  if (volume >= properties_5(kHighestPressure5, kHighestTemperature5).volume) {
    return kHighestTemperature5;
  }
  if (volume > properties_5(kHighestPressure5, kHighestTemperature2).volume) {
    const Outcome<State> state = at_pressure_volume(kHighestPressure5, volume);
    if (!state) return state.failure();
    return state->temperature;
  }
  if (volume >= properties_2(kHighestPressure, kHighestTemperature2).volume) {
    return kHighestTemperature2;
  }
  const Outcome<State> state = at_pressure_volume(kHighestPressure, volume);
  if (!state) return state.failure();
  return state->temperature;
}

// A failure of an inner step is one of the volume, or of no single argument.
Failure about_volume(const Failure& failure) {
  return failure.argument == 0 ? failure : failure.about(1);
}

double internal_energy_of(const State& state) {
  return state.enthalpy - state.pressure * state.volume;
}

}  // namespace

// (du/dT)_v = cv is positive everywhere, also in wet steam: one root.
Outcome<State> at_volume_internal_energy(double volume, double internal_energy) {
  if (!std::isfinite(volume)) return not_finite(1, {volume, Quantity::volume});
  const Measure value{internal_energy, Quantity::specific_energy};
  if (!std::isfinite(internal_energy)) return not_finite(2, value);
  const Properties densest = properties_1(kHighestPressure, kLowestTemperature);
  if (volume < densest.volume) {
    return make_failure(
        Fault::outside_range, 1,
        "{0} is below {1}, the volume at {2}, the highest pressure of IAPWS-IF97, and "
        "its lowest temperature",
        {volume, Quantity::volume}, {densest.volume, Quantity::volume},
        {kHighestPressure, Quantity::pressure});
  }
  const Outcome<double> hottest = hottest_at_volume(volume);
  if (!hottest) return about_volume(hottest.failure());
  const Outcome<State> cold = at_temperature_volume(kLowestTemperature, volume);
  if (!cold) return about_volume(cold.failure());
  const Outcome<State> hot = at_temperature_volume(*hottest, volume);
  if (!hot) return about_volume(hot.failure());
  const double lowest = internal_energy_of(*cold);
  const double highest = internal_energy_of(*hot);
  if (internal_energy < lowest) {
    return make_failure(
        Fault::outside_range, 2,
        "{0} is below {1}, the value at {2} and this volume, the lowest temperature "
        "of IAPWS-IF97",
        value, {lowest, Quantity::specific_energy}, {kLowestTemperature, Quantity::temperature});
  }
  if (internal_energy > highest) {
    return make_failure(Fault::outside_range, 2,
                        "{0} is above {1}, the value at {2} and this volume, where the range of "
                        "IAPWS-IF97 ends",
                        value, {highest, Quantity::specific_energy},
                        {*hottest, Quantity::temperature});
  }
  const auto excess = [&](double t) {
    const Outcome<State> at = at_temperature_volume(t, volume);
    return at ? internal_energy_of(*at) - internal_energy : std::nan("");
  };
  const auto root = root_between(excess, kLowestTemperature, *hottest);
  if (!root) return not_converged();
  Outcome<State> state = at_temperature_volume(*root, volume);
  if (!state) return not_converged();
  (*state).enthalpy = internal_energy + state->pressure * volume;
  return state;
}

}  // namespace busbar::water
