// Humid air as a real gas mixture at one pressure and temperature. Kernels without checks: states
// beyond saturation and outside the range are refused in air/properties.hpp.
#pragma once

#include "air/constants.hpp"
#include "air/virial.hpp"

namespace busbar::air {

/// Mole fraction of water from the humidity ratio (kg of water per kg of dry air), and back.
inline double mole_fraction(double humidity_ratio) {
  return humidity_ratio / (humidity_ratio + kMassRatio);
}
inline double humidity_ratio_of(double mole_fraction) {
  return kMassRatio * mole_fraction / (1 - mole_fraction);
}

/// Ideal-gas enthalpy (J/kg) of dry air and of water at temperature (K). Datum: zero for real dry
/// air at 0 °C and 101.325 kPa, and internal energy zero for liquid water at the triple point, as
/// in the steam tables.
double dry_air_enthalpy(double temperature);
double vapour_enthalpy(double temperature);

/// A pressure (Pa) and a temperature (K) with what the mixture needs there, whatever its humidity.
struct Place {
  double pressure = 0;
  double temperature = 0;
  double q = 0;  ///< p/(R T), mol/m3
  Virials virials;
};
Place place(double pressure, double temperature);

/// Enthalpy (J/kg) and volume (m3/kg) per kg of dry air, times the mole fraction 1 - x of dry air,
/// so that they stay finite in pure steam. From the Gibbs energy whose derivative is the fugacity
/// of G11-15: g = ideal + R T (B q + (C - B^2) q^2/2).
double enthalpy_share(const Place& at, double x);
double volume_share(const Place& at, double x);

/// J and m3 per kg of dry air.
inline double mixture_enthalpy(const Place& at, double humidity_ratio) {
  const double x = mole_fraction(humidity_ratio);
  return enthalpy_share(at, x) / (1 - x);
}
inline double mixture_volume(const Place& at, double humidity_ratio) {
  const double x = mole_fraction(humidity_ratio);
  return volume_share(at, x) / (1 - x);
}

}  // namespace busbar::air
