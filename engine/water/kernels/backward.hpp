// Backward equations for temperature and volume at pressure and enthalpy or entropy: starts of the
// iterations (backward/temperature.hpp and backward/volume.hpp say what each is). Pressure in Pa,
// enthalpy in J/kg, entropy in J/(kg K).

// IAPWS R7-97(2012), equations 11 and 13.
template <class Real>
inline Real temperature_ph_1_at(Real p, Real h) {
  return series<tables::kTemperaturePh1, kValue>(p * 1e-6, h * (1 / 2500e3) + 1.0).value;
}
template <class Real>
inline Real temperature_ps_1_at(Real p, Real s) {
  return series<tables::kTemperaturePs1, kValue>(p * 1e-6, s * (1 / 1000.0) + 2.0).value;
}

// Equation 21.
template <class Real>
inline Real boundary_2bc_enthalpy_at(Real p) {
  constexpr const double* n = tables::kBoundary2bc;
  return (n[3] + root((p * 1e-6 - n[4]) / n[2])) * 1000.0;
}

// Equations 22 to 24.
template <class Real>
inline Real temperature_ph_2a_at(Real p, Real h) {
  return series<tables::kTemperaturePh2a, kValue>(p * 1e-6, h * (1 / 2000e3) - 2.1).value;
}
template <class Real>
inline Real temperature_ph_2b_at(Real p, Real h) {
  return series<tables::kTemperaturePh2b, kValue>(p * 1e-6 - 2.0, h * (1 / 2000e3) - 2.6).value;
}
template <class Real>
inline Real temperature_ph_2c_at(Real p, Real h) {
  return series<tables::kTemperaturePh2c, kValue>(p * 1e-6 + 25.0, h * (1 / 2000e3) - 1.8).value;
}

// Equations 25 to 27; the exponents of pi are quarters in the first.
template <class Real>
inline Real temperature_ps_2a_at(Real p, Real s) {
  return series<tables::kTemperaturePs2a, kValue, 4>(root(root(p * 1e-6)), s * (1 / 2000.0) - 2.0)
      .value;
}
template <class Real>
inline Real temperature_ps_2b_at(Real p, Real s) {
  return series<tables::kTemperaturePs2b, kValue>(p * 1e-6, 10.0 - s * (1 / 785.3)).value;
}
template <class Real>
inline Real temperature_ps_2c_at(Real p, Real s) {
  return series<tables::kTemperaturePs2c, kValue>(p * 1e-6, 2.0 - s * (1 / 2925.1)).value;
}

// Boundaries between subregions: R7-97(2012), section 6.3. Equation 25 begins at the sublimation
// pressure of 273.15 K, 611.153 Pa; equation 21 at 6.5467 MPa, and below, all of region 2 above
// 4 MPa is 2b.
inline constexpr double kPressure2ab = 4e6;
inline constexpr double kPressure2bc = 6.54670e6;
inline constexpr double kEntropy2bc = 5850;
inline constexpr double kLowestPressure2a = 611.153;

// IAPWS SR3-03(2014), equations 1 to 11.
template <class Real>
inline Real boundary_3ab_enthalpy_at(Real p) {
  constexpr const double* n = tables::kBoundary3ab;
  const Real pi = p * 1e-6;
  return (((n[3] * pi + n[2]) * pi + n[1]) * pi + n[0]) * 1000.0;
}
template <class Real>
inline Real temperature_ph_3a_at(Real p, Real h) {
  return 760.0 *
         series<tables::kTemperaturePh3a, kValue>(p * 1e-8 + 0.240, h * (1 / 2300e3) - 0.615).value;
}
template <class Real>
inline Real temperature_ph_3b_at(Real p, Real h) {
  return 860.0 *
         series<tables::kTemperaturePh3b, kValue>(p * 1e-8 + 0.298, h * (1 / 2800e3) - 0.720).value;
}
template <class Real>
inline Real temperature_ps_3a_at(Real p, Real s) {
  return 760.0 *
         series<tables::kTemperaturePs3a, kValue>(p * 1e-8 + 0.240, s * (1 / 4400.0) - 0.703).value;
}
template <class Real>
inline Real temperature_ps_3b_at(Real p, Real s) {
  return 860.0 *
         series<tables::kTemperaturePs3b, kValue>(p * 1e-8 + 0.760, s * (1 / 5300.0) - 0.818).value;
}
template <class Real>
inline Real volume_ph_3a_at(Real p, Real h) {
  return 0.0028 *
         series<tables::kVolumePh3a, kValue>(p * 1e-8 + 0.128, h * (1 / 2100e3) - 0.727).value;
}
template <class Real>
inline Real volume_ph_3b_at(Real p, Real h) {
  return 0.0088 *
         series<tables::kVolumePh3b, kValue>(p * 1e-8 + 0.0661, h * (1 / 2800e3) - 0.720).value;
}
template <class Real>
inline Real volume_ps_3a_at(Real p, Real s) {
  return 0.0028 *
         series<tables::kVolumePs3a, kValue>(p * 1e-8 + 0.187, s * (1 / 4400.0) - 0.755).value;
}
template <class Real>
inline Real volume_ps_3b_at(Real p, Real s) {
  return 0.0088 *
         series<tables::kVolumePs3b, kValue>(p * 1e-8 + 0.298, s * (1 / 5300.0) - 0.816).value;
}
template <class Real>
inline Real saturation_pressure_h_3_at(Real h) {
  const Real eta = h * (1 / 2600e3);
  return 22e6 * series<tables::kSaturationPressureH3, kValue>(eta - 1.02, eta - 0.608).value;
}
template <class Real>
inline Real saturation_pressure_s_3_at(Real s) {
  const Real sigma = s * (1 / 5200.0);
  return 22e6 * series<tables::kSaturationPressureS3, kValue>(sigma - 1.03, sigma - 0.699).value;
}
