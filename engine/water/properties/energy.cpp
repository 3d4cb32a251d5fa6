#include "water/properties/energy.hpp"

#include "water/describe.hpp"
#include "water/failure.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {

namespace {

// `sign` 1: above saturation, -1: below it. `saturated` is the dryness of the state at zero
// distance.
Outcome<double> distance(const State& state, double sign, double saturated, const char* wet,
                         const char* other_side) {
  if (state.region == Region::two_phase) {
    if (state.dryness == saturated) return 0.0;
    return make_failure(Fault::missing, 0, wet, {state.dryness, Quantity::fraction});
  }
  const Neighbourhood near = neighbourhood(state);
  if (!near.has_saturation) {
    return make_failure(Fault::missing, 0,
                        "is at a pressure of {0}: there is no saturation temperature",
                        {state.pressure, Quantity::pressure});
  }
  const double kelvins = sign * near.distance;
  if (kelvins < 0) {
    return make_failure(Fault::missing, 0, other_side,
                        {-kelvins, Quantity::temperature_difference});
  }
  return kelvins + 0.0;
}

}  // namespace

Outcome<double> internal_energy(const State& state) {
  return state.enthalpy - state.pressure * state.volume;
}

Outcome<double> helmholtz_energy(const State& state) {
  return state.enthalpy - state.pressure * state.volume - state.temperature * state.entropy;
}

Outcome<double> gibbs_energy(const State& state) {
  return state.enthalpy - state.temperature * state.entropy;
}

Outcome<double> superheat(const State& state) {
  return distance(state, 1, 1, "is wet with dryness {0}: there is no superheat",
                  "is subcooled by {0}: there is no superheat");
}

Outcome<double> subcooling(const State& state) {
  return distance(state, -1, 0, "is wet with dryness {0}: there is no subcooling",
                  "is superheated by {0}: there is no subcooling");
}

Outcome<double> latent_heat(double pressure) {
  const Outcome<double> temperature = saturation_temperature(pressure);
  if (!temperature) return temperature.failure();
  const Saturated saturated = saturated_at(pressure);
  if (!saturated.converged) {
    return make_failure(Fault::no_convergence, 0, "the iteration of IAPWS-IF97 did not converge");
  }
  return saturated.vapour.enthalpy - saturated.liquid.enthalpy;
}

Outcome<double> specific_exergy(const State& state, double dead_pressure, double dead_temperature) {
  const Outcome<State> dead = at_pressure_temperature(dead_pressure, dead_temperature);
  if (!dead) {
    const std::uint8_t argument = dead.failure().argument;
    return dead.failure().about(argument == 0 ? std::uint8_t{0}
                                              : static_cast<std::uint8_t>(argument + 1));
  }
  return state.enthalpy - dead->enthalpy - dead_temperature * (state.entropy - dead->entropy);
}

}  // namespace busbar::water
