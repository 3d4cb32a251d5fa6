// Machines that change the pressure of one stream of water, steam or gas: turbine, pump,
// compressor, valve.
//
// Inputs of the functions below are numbered as written: 1 inlet, 2 outlet or outlet pressure (Pa),
// 3 isentropic efficiency (fraction). Efficiencies compare the enthalpy change with that of the
// isentropic change between the same pressures (Moran and Shapiro, Fundamentals of Engineering
// Thermodynamics, section 6.12).
#pragma once

#include "core/outcome.hpp"
#include "stream/stream.hpp"

namespace busbar::machine {

/// h2 = h1 - eta (h1 - h2s). Impossible when the outlet pressure is above the inlet pressure.
Outcome<Stream> turbine_out(const Stream& inlet, double outlet_pressure, double efficiency);

/// (h1 - h2) / (h1 - h2s), also above 1 or below 0: a measured stage may be impossible.
Outcome<double> turbine_efficiency(const Stream& inlet, const Stream& outlet);

/// h2 = h1 + (h2s - h1) / eta. The inlet must be liquid (dryness 0 included) or supercritical.
Outcome<Stream> pump_out(const Stream& inlet, double outlet_pressure, double efficiency);

/// (h2s - h1) / (h2 - h1).
Outcome<double> pump_efficiency(const Stream& inlet, const Stream& outlet);

/// h2 = h1 + (h2s - h1) / eta. The inlet must be a gas, superheated steam or supercritical.
Outcome<Stream> compressor_out(const Stream& inlet, double outlet_pressure, double efficiency);

/// (h2s - h1) / (h2 - h1).
Outcome<double> compressor_efficiency(const Stream& inlet, const Stream& outlet);

/// Change of the pump efficiency for one kelvin more of outlet temperature.
Outcome<double> pump_efficiency_per_kelvin(const Stream& inlet, const Stream& outlet);

/// h2 = h1 at a lower or equal pressure.
Outcome<Stream> valve_out(const Stream& inlet, double outlet_pressure);

}  // namespace busbar::machine
