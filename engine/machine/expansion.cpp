#include "machine/expansion.hpp"

#include <boost/math/differentiation/finite_difference.hpp>

#include "water/state.hpp"
#include "water/stream.hpp"

namespace busbar::machine {
namespace {

using water::State;

Failure wrong_pressure(const char* reason, double outlet, double inlet) {
  return {
      Fault::impossible, 2, reason, {{{outlet, Quantity::pressure}, {inlet, Quantity::pressure}}}};
}

// The state after an isentropic change to the pressure; its failure is put down to input 2.
Outcome<State> isentropic_outlet(const Stream& inlet, double outlet_pressure) {
  const Outcome<State> before = water::state_of(inlet);
  if (!before) return before.failure().about(1);
  const Outcome<State> after = water::at_pressure_entropy(outlet_pressure, before->entropy);
  if (!after) return after.failure().about(2);
  return after;
}

Outcome<Stream> outlet_at(const Stream& inlet, double pressure, double enthalpy) {
  const Outcome<State> state = water::at_pressure_enthalpy(pressure, enthalpy);
  if (!state) return state.failure().about(2);
  return water::moved_to(inlet, *state);
}

constexpr const char* kTurbineRises = "{0} is not below the inlet pressure {1}: a turbine expands";
constexpr const char* kPumpFalls = "{0} is not above the inlet pressure {1}: a pump raises it";

}  // namespace

Outcome<Stream> turbine_out(const Stream& inlet, double outlet_pressure, double efficiency) {
  if (!(outlet_pressure < inlet.pressure)) {
    return wrong_pressure(kTurbineRises, outlet_pressure, inlet.pressure);
  }
  const Outcome<State> ideal = isentropic_outlet(inlet, outlet_pressure);
  if (!ideal) return ideal.failure();
  const double drop = inlet.enthalpy - ideal->enthalpy;
  return outlet_at(inlet, outlet_pressure, inlet.enthalpy - efficiency * drop);
}

Outcome<double> turbine_efficiency(const Stream& inlet, const Stream& outlet) {
  if (!(outlet.pressure < inlet.pressure)) {
    return wrong_pressure(kTurbineRises, outlet.pressure, inlet.pressure);
  }
  const Outcome<State> ideal = isentropic_outlet(inlet, outlet.pressure);
  if (!ideal) return ideal.failure();
  const double drop = inlet.enthalpy - ideal->enthalpy;
  if (!(drop > 0)) return Failure{Fault::impossible, 2, "leaves no isentropic enthalpy drop"};
  return (inlet.enthalpy - outlet.enthalpy) / drop;
}

Outcome<Stream> pump_out(const Stream& inlet, double outlet_pressure, double efficiency) {
  if (inlet.phase == Phase::vapour || (inlet.phase == Phase::two_phase && inlet.dryness > 0)) {
    return Failure{Fault::impossible, 1, "is not a liquid: a pump cannot take steam"};
  }
  if (!(outlet_pressure > inlet.pressure)) {
    return wrong_pressure(kPumpFalls, outlet_pressure, inlet.pressure);
  }
  const Outcome<State> ideal = isentropic_outlet(inlet, outlet_pressure);
  if (!ideal) return ideal.failure();
  const double rise = ideal->enthalpy - inlet.enthalpy;
  return outlet_at(inlet, outlet_pressure, inlet.enthalpy + rise / efficiency);
}

Outcome<double> pump_efficiency(const Stream& inlet, const Stream& outlet) {
  if (!(outlet.pressure > inlet.pressure)) {
    return wrong_pressure(kPumpFalls, outlet.pressure, inlet.pressure);
  }
  const Outcome<State> ideal = isentropic_outlet(inlet, outlet.pressure);
  if (!ideal) return ideal.failure();
  const double rise = outlet.enthalpy - inlet.enthalpy;
  if (rise == 0) return Failure{Fault::impossible, 2, "shows no rise of enthalpy at all"};
  return (ideal->enthalpy - inlet.enthalpy) / rise;
}

Outcome<double> pump_efficiency_per_kelvin(const Stream& inlet, const Stream& outlet) {
  Failure failure;
  const auto efficiency = [&](double temperature) {
    const Outcome<State> state = water::at_pressure_temperature(outlet.pressure, temperature);
    if (!state) {
      failure = state.failure().about(2);
      return 0.0;
    }
    const Outcome<double> found = pump_efficiency(inlet, water::moved_to(outlet, *state));
    if (!found) failure = found.failure();
    return found ? *found : 0.0;
  };
  const double slope =
      boost::math::differentiation::finite_difference_derivative(efficiency, outlet.temperature);
  if (failure.fault != Fault::none) return failure;
  return slope;
}

Outcome<Stream> valve_out(const Stream& inlet, double outlet_pressure) {
  if (outlet_pressure > inlet.pressure) {
    return wrong_pressure("{0} is above the inlet pressure {1}: a valve only lowers it",
                          outlet_pressure, inlet.pressure);
  }
  return outlet_at(inlet, outlet_pressure, inlet.enthalpy);
}

}  // namespace busbar::machine
