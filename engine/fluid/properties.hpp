// Every property of a stream in its state, whatever the fluid. Gases are ideal; what they do not
// have (dryness, superheat, a surface) is missing. Failures are about the stream, argument 1.
#pragma once

#include "core/outcome.hpp"
#include "fluid/state.hpp"
#include "gas/datum.hpp"
#include "stream/stream.hpp"

namespace busbar::fluid {

/// A property of a stream whose state is known.
using PropertyOf = Outcome<double> (*)(const Stream&, const State&);

/// The enthalpy as readers show it: of water by the steam tables, of a gas on a datum.
Outcome<double> shown_enthalpy(const Stream& stream, gas::Datum datum);

Outcome<double> pressure(const Stream& stream, const State& state);
Outcome<double> temperature(const Stream& stream, const State& state);
Outcome<double> volume(const Stream& stream, const State& state);
Outcome<double> density(const Stream& stream, const State& state);
Outcome<double> enthalpy(const Stream& stream, const State& state);
Outcome<double> entropy(const Stream& stream, const State& state);
Outcome<double> internal_energy(const Stream& stream, const State& state);
Outcome<double> helmholtz_energy(const Stream& stream, const State& state);
Outcome<double> gibbs_energy(const Stream& stream, const State& state);
Outcome<double> superheat(const Stream& stream, const State& state);
Outcome<double> subcooling(const Stream& stream, const State& state);
Outcome<double> isobaric_heat_capacity(const Stream& stream, const State& state);
Outcome<double> isochoric_heat_capacity(const Stream& stream, const State& state);
Outcome<double> speed_of_sound(const Stream& stream, const State& state);
Outcome<double> isentropic_exponent(const Stream& stream, const State& state);
Outcome<double> joule_thomson(const Stream& stream, const State& state);
Outcome<double> isobaric_expansion(const Stream& stream, const State& state);
Outcome<double> isothermal_compressibility(const Stream& stream, const State& state);
Outcome<double> viscosity(const Stream& stream, const State& state);
Outcome<double> thermal_conductivity(const Stream& stream, const State& state);
Outcome<double> prandtl_number(const Stream& stream, const State& state);
Outcome<double> surface_tension(const Stream& stream, const State& state);

}  // namespace busbar::fluid
