// Backward equations for pressure from enthalpy and entropy, and the boundaries of regions in those
// two: starts of the iteration, never answers. Raw equations in SI units, as in
// backward/temperature.hpp. Outside its subregion an equation gives numbers without meaning.
#pragma once

namespace busbar::water::backward {

// IAPWS SR2-01(2014): Pa from J/kg and J/(kg K).
double pressure_hs_1(double enthalpy, double entropy);   ///< equation 1
double boundary_2ab_enthalpy(double entropy);            ///< equation 2, J/kg
double pressure_hs_2a(double enthalpy, double entropy);  ///< equation 3, up to equation 2
double pressure_hs_2b(double enthalpy, double entropy);  ///< equation 4
double pressure_hs_2c(double enthalpy, double entropy);  ///< equation 5, below 5.85 kJ/(kg K)

// IAPWS SR4-04(2014).
double pressure_hs_3a(double enthalpy, double entropy);  ///< equation 1, up to the critical entropy
double pressure_hs_3b(double enthalpy, double entropy);  ///< equation 2
double liquid_enthalpy_s_1(double entropy);              ///< equation 3, h' to 623.15 K, J/kg
double liquid_enthalpy_s_3a(double entropy);             ///< equation 4, h' above, J/kg
double vapour_enthalpy_s_2ab(double entropy);   ///< equation 5, h'' from 5.85 kJ/(kg K), J/kg
double vapour_enthalpy_s_2c3b(double entropy);  ///< equation 6, h'' below, J/kg
double boundary_13_enthalpy(double entropy);    ///< equation 7, J/kg
double boundary_23_temperature_hs(double enthalpy, double entropy);  ///< equation 8, K
double saturation_temperature_hs(double enthalpy, double entropy);   ///< equation 9, K, wet steam

/// The equation of the subregion that SR2-01 and SR4-04 assign to a state, single-phase or wet. Wet
/// steam below s''(623.15 K) and region 5 have no backward equation: a pressure that is good enough
/// to start from stands in.
double pressure_hs(double enthalpy, double entropy);

}  // namespace busbar::water::backward
