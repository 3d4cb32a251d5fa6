// States from pairs of properties beyond those of state.hpp.
//
// All keep both given properties: the basic equation at the answer agrees with them to max(1e-10
// relative, 1e-10 R T*), except in the gaps between regions, where the rule of solve/isobar.hpp
// holds. Failures as there: outside_range with the argument counted from 1 in the order of the
// parameters and the limit named; no_convergence. Where two states have the same pair,
// outside_range says so and none is chosen.
#pragma once

#include "core/outcome.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// State at enthalpy (J/kg) and entropy (J/(kg K)). Started by SR2-01(2014) and SR4-04(2014).
Outcome<State> at_enthalpy_and_entropy(double enthalpy, double entropy);

/// State at pressure (Pa) and specific volume (m3/kg). Cold water around its greatest density has
/// two temperatures for one volume: refused.
Outcome<State> at_pressure_volume(double pressure, double volume);

/// State at pressure (Pa) and specific internal energy (J/kg).
Outcome<State> at_pressure_internal_energy(double pressure, double internal_energy);

/// State at temperature (K, 273.15 to 647.096) and dryness (0 to 1).
Outcome<State> at_temperature_dryness(double temperature, double dryness);

/// State at temperature (K) and specific volume (m3/kg): unique.
Outcome<State> at_temperature_volume(double temperature, double volume);

/// State at temperature (K) and specific entropy (J/(kg K)). Unique but for cold water below the
/// temperature of its greatest density: refused there.
Outcome<State> at_temperature_entropy(double temperature, double entropy);

/// State at temperature (K) and specific enthalpy (J/kg). Compressed and boiling water, or dense
/// and thin vapour, often share an enthalpy at one temperature: refused there.
Outcome<State> at_temperature_enthalpy(double temperature, double enthalpy);

/// State at specific volume (m3/kg) and specific internal energy (J/kg): a closed vessel.
Outcome<State> at_volume_internal_energy(double volume, double internal_energy);

/// Boiling water (dryness 0) or saturated steam (dryness 1) with an enthalpy (J/kg). Saturated
/// steam has every enthalpy between that at 273.15 K and its greatest at two pressures: refused
/// there.
Outcome<State> saturated_at_enthalpy(double enthalpy);

/// Boiling water or saturated steam with an entropy (J/(kg K)): unique.
Outcome<State> saturated_at_entropy(double entropy);

}  // namespace busbar::water
