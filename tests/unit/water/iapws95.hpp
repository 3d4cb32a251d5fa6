// IAPWS-95, the scientific formulation, as an independent witness in tests: never part of the
// engine. IAPWS R6-95(2018), equations 4 to 6 with tables 1 to 5.
#pragma once

namespace busbar::water::iapws95 {

inline constexpr double kGasConstant = 461.51805;  ///< J/(kg K), equation 3
inline constexpr double kCriticalTemperature = 647.096;
inline constexpr double kCriticalDensity = 322;

/// A dimensionless Helmholtz energy and its derivatives with respect to delta and tau.
struct Derivatives {
  double value = 0;
  double d = 0;
  double dd = 0;
  double t = 0;
  double tt = 0;
  double dt = 0;
};

Derivatives ideal(double delta, double tau);     ///< equation 5
Derivatives residual(double delta, double tau);  ///< equation 6

/// Properties at density (kg/m3) and temperature (K), SI: table 3.
struct Point {
  double pressure = 0;
  double enthalpy = 0;
  double entropy = 0;
  double isochoric_heat_capacity = 0;
  double isobaric_heat_capacity = 0;
  double speed_of_sound = 0;
  double pressure_by_density = 0;  ///< (dp/drho)_T
  double gibbs_energy = 0;
};
Point at(double density, double temperature);

/// Density (kg/m3) at pressure (Pa) and temperature (K) by Newton from a start; NaN when it does
/// not converge.
double density(double pressure, double temperature, double start);

/// Saturated densities (kg/m3) at a temperature (K): equal pressures and Gibbs energies. NaN when
/// the iteration from the starts does not converge.
struct Saturation {
  double liquid = 0;
  double vapour = 0;
};
Saturation saturation(double temperature, double liquid_start, double vapour_start);

}  // namespace busbar::water::iapws95
