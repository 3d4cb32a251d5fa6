// The surface between water and its steam, and the limit of liquid water at the cold end.
#pragma once

#include <cstdint>

#include "core/outcome.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// Surface tension (N/m) of water against its vapour at temperature (K), 273.16 to 647.096 K.
/// Source: IAPWS R1-76(2014). Failures: outside_range, argument 1.
Outcome<double> surface_tension(double temperature);

/// That of a state on the saturation line or between its phases. Failures, argument 0: missing for
/// a single phase, which has no surface; outside_range.
Outcome<double> surface_tension_of(const State& state);

/// Kinds of ice with a melting line to liquid water.
enum class Ice : std::uint8_t { ih, iii, v, vi, vii };

/// Pressure (Pa) at which ice of a kind melts at temperature (K). Ranges: Ih 251.165 to 273.16 K,
/// III to 256.164, V to 273.31, VI to 355, VII to 715 K. Failures: outside_range, argument 1.
/// Source: IAPWS R14-08(2011), equations 1 to 5.
Outcome<double> melting_pressure(double temperature, Ice ice);

/// Temperature (K) at which ice melts at pressure (Pa), from the triple point to 20.6 GPa: the one
/// kind of ice that borders liquid water at that pressure. Agrees with the equation to 1e-12.
/// Failures: outside_range, argument 1; no_convergence.
Outcome<double> melting_temperature(double pressure);

/// Vapour pressure (Pa) of ice Ih at temperature (K), 50 to 273.16 K. Source: IAPWS R14-08(2011),
/// equation 6. Failures: outside_range, argument 1.
Outcome<double> sublimation_pressure(double temperature);

}  // namespace busbar::water
