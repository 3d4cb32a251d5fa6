#include "machine/expansion.hpp"

#include <boost/math/differentiation/finite_difference.hpp>

#include "fluid/state.hpp"

namespace busbar::machine {
namespace {

using fluid::State;

Failure wrong_pressure(const char* reason, double outlet, double inlet) {
  return {
      Fault::impossible, 2, reason, {{{outlet, Quantity::pressure}, {inlet, Quantity::pressure}}}};
}

// The state after an isentropic change to the pressure; its failure is put down to input 2.
Outcome<State> isentropic_outlet(const Stream& inlet, double outlet_pressure) {
  const Outcome<State> before = fluid::state_of(inlet);
  if (!before) return before.failure().about(1);
  const Outcome<State> after = fluid::at_pressure_entropy(inlet, outlet_pressure, before->entropy);
  if (!after) return after.failure().about(2);
  return after;
}

Outcome<Stream> outlet_at(const Stream& inlet, double pressure, double enthalpy) {
  const Outcome<State> state = fluid::at_pressure_enthalpy(inlet, pressure, enthalpy);
  if (!state) return state.failure().about(2);
  return fluid::moved_to(inlet, *state);
}

constexpr const char* kTurbineRises = "{0} is not below the inlet pressure {1}: a turbine expands";
constexpr const char* kPumpFalls = "{0} is not above the inlet pressure {1}: a pump raises it";
constexpr const char* kCompressorFalls =
    "{0} is not above the inlet pressure {1}: a compressor raises it";

// Isentropic over real rise of enthalpy, for pump and compressor.
Outcome<double> rise_efficiency(const Stream& inlet, const Stream& outlet) {
  const Outcome<State> ideal = isentropic_outlet(inlet, outlet.pressure);
  if (!ideal) return ideal.failure();
  const double rise = outlet.enthalpy - inlet.enthalpy;
  if (rise == 0) return Failure{Fault::impossible, 2, "shows no rise of enthalpy at all"};
  return (ideal->enthalpy - inlet.enthalpy) / rise;
}

Outcome<Stream> raised(const Stream& inlet, double outlet_pressure, double efficiency) {
  const Outcome<State> ideal = isentropic_outlet(inlet, outlet_pressure);
  if (!ideal) return ideal.failure();
  const double rise = ideal->enthalpy - inlet.enthalpy;
  return outlet_at(inlet, outlet_pressure, inlet.enthalpy + rise / efficiency);
}

bool holds_vapour(const Stream& stream) {
  return stream.phase == Phase::vapour || (stream.phase == Phase::two_phase && stream.dryness > 0);
}

Failure not_pumped(const Stream& inlet) {
  if (fluid::is_gas(inlet)) {
    return {Fault::impossible, 1, "is a gas, which no pump takes; COMPRESSOR_OUT compresses it"};
  }
  if (holds_vapour(inlet)) {
    return {Fault::impossible, 1, "is not a liquid: a pump cannot take steam"};
  }
  return {};
}

Failure not_compressed(const Stream& inlet) {
  if (inlet.phase == Phase::liquid || inlet.phase == Phase::two_phase) {
    return {Fault::impossible, 1,
            "holds liquid, which no compressor takes; PUMP_OUT raises the pressure of a liquid"};
  }
  return {};
}

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
  if (const Failure other = fluid::refuse_other_fluid(inlet, outlet); other.fault != Fault::none) {
    return other;
  }
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
  if (const Failure other = not_pumped(inlet); other.fault != Fault::none) return other;
  if (!(outlet_pressure > inlet.pressure)) {
    return wrong_pressure(kPumpFalls, outlet_pressure, inlet.pressure);
  }
  return raised(inlet, outlet_pressure, efficiency);
}

Outcome<Stream> compressor_out(const Stream& inlet, double outlet_pressure, double efficiency) {
  if (const Failure other = not_compressed(inlet); other.fault != Fault::none) return other;
  if (!(outlet_pressure > inlet.pressure)) {
    return wrong_pressure(kCompressorFalls, outlet_pressure, inlet.pressure);
  }
  return raised(inlet, outlet_pressure, efficiency);
}

Outcome<double> compressor_efficiency(const Stream& inlet, const Stream& outlet) {
  if (const Failure other = fluid::refuse_other_fluid(inlet, outlet); other.fault != Fault::none) {
    return other;
  }
  if (const Failure other = not_compressed(inlet); other.fault != Fault::none) return other;
  if (!(outlet.pressure > inlet.pressure)) {
    return wrong_pressure(kCompressorFalls, outlet.pressure, inlet.pressure);
  }
  return rise_efficiency(inlet, outlet);
}

Outcome<double> pump_efficiency(const Stream& inlet, const Stream& outlet) {
  if (const Failure other = fluid::refuse_other_fluid(inlet, outlet); other.fault != Fault::none) {
    return other;
  }
  if (fluid::is_gas(inlet)) return not_pumped(inlet);
  if (!(outlet.pressure > inlet.pressure)) {
    return wrong_pressure(kPumpFalls, outlet.pressure, inlet.pressure);
  }
  return rise_efficiency(inlet, outlet);
}

Outcome<double> pump_efficiency_per_kelvin(const Stream& inlet, const Stream& outlet) {
  Failure failure;
  const auto efficiency = [&](double temperature) {
    const Outcome<State> state =
        fluid::at_pressure_temperature(outlet, outlet.pressure, temperature);
    if (!state) {
      failure = state.failure().about(2);
      return 0.0;
    }
    const Outcome<double> found = pump_efficiency(inlet, fluid::moved_to(outlet, *state));
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
