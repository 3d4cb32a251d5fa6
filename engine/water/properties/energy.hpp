// Energies of a state, and where it stands beside saturation.
#pragma once

#include "core/outcome.hpp"
#include "water/state.hpp"

namespace busbar::water {

// Definitions; IAPWS R7-97(2012), tables 3, 12, 31 and 39. Two-phase states have them too (they are
// linear in the dryness). They never fail; Outcome lets them stand beside other properties. J/kg.
Outcome<double> internal_energy(const State& state);   ///< u = h - p v
Outcome<double> helmholtz_energy(const State& state);  ///< f = u - T s
Outcome<double> gibbs_energy(const State& state);      ///< g = h - T s

/// Kelvins above the saturation temperature at the same pressure; 0 for saturated vapour. Failures,
/// argument 0, missing: wet, subcooled, or no saturation at that pressure.
Outcome<double> superheat(const State& state);

/// Kelvins below the saturation temperature at the same pressure; 0 for saturated liquid. Failures
/// as superheat.
Outcome<double> subcooling(const State& state);

/// Enthalpy of evaporation h'' - h' (J/kg) at pressure (Pa), 611.213 Pa to 22.064 MPa, where it is
/// zero. Failures as saturation_temperature. Source: saturated states of equations 7, 15 and 28.
Outcome<double> latent_heat(double pressure);

/// Flow exergy h - h0 - T0 (s - s0) (J/kg) against water in the dead state of pressure (Pa) and
/// temperature (K); kinetic, potential and chemical exergy are not in it. Failures as
/// at_pressure_temperature, for inputs 2 and 3. Source: Moran and Shapiro, Fundamentals of
/// Engineering Thermodynamics, chapter 7.
Outcome<double> specific_exergy(const State& state, double dead_pressure, double dead_temperature);

}  // namespace busbar::water
