// Region 3 at pressure and temperature: boundaries between the subregions and the backward
// equations v(p,T), IAPWS SR5-05(2016). Pressure in Pa, temperature in K, volume in m3/kg.

template <const auto& kTable, class Real>
inline Real sum_of(Real x, Real y) {
  return series<kTable, kValue>(x, y).value;
}

// Equation 1: powers of the pressure in MPa; equation 2: powers of its logarithm.
template <const auto& kTable, class Real>
inline Real boundary_of(Real pressure) {
  return sum_of<kTable>(pressure * 1e-6, Real{} + 1.0);
}
template <const auto& kTable, class Real>
inline Real logarithmic_boundary_of(Real pressure) {
  return sum_of<kTable>(natural_logarithm(pressure * 1e-6), Real{} + 1.0);
}
template <class Real>
inline Real boundary_3ef_at(Real pressure) {
  return tables::kBoundary3efSlope * (pressure * 1e-6 - kCriticalPressure * 1e-6) +
         kCriticalTemperature;
}

// Limits of pressure of SR5-05(2016), tables 2 and 10, Pa.
inline constexpr double kPressure3cd = 19.00881189173929e6;      // footnote of table 2
inline constexpr double kSaturationPressure643 = 21.04336732e6;  // section 5.1: psat(643.15 K)

template <class Real>
inline Real power_4(Real x) {
  const Real square = x * x;
  return square * square;
}

// The reducing quantities and exponents of tables 4 and 12 of SR5-05(2016).
template <class Real>
inline Real volume_3a_at(Real pressure, Real temperature) {
  return 0.0024 * sum_of<tables::kVolumePt3a>(pressure / 100e6 - 0.085, temperature / 760 - 0.817);
}
template <class Real>
inline Real volume_3b_at(Real pressure, Real temperature) {
  return 0.0041 * sum_of<tables::kVolumePt3b>(pressure / 100e6 - 0.280, temperature / 860 - 0.779);
}
template <class Real>
inline Real volume_3c_at(Real pressure, Real temperature) {
  return 0.0022 * sum_of<tables::kVolumePt3c>(pressure / 40e6 - 0.259, temperature / 690 - 0.903);
}
template <class Real>
inline Real volume_3d_at(Real pressure, Real temperature) {
  return 0.0029 *
         power_4(sum_of<tables::kVolumePt3d>(pressure / 40e6 - 0.559, temperature / 690 - 0.939));
}
template <class Real>
inline Real volume_3e_at(Real pressure, Real temperature) {
  return 0.0032 * sum_of<tables::kVolumePt3e>(pressure / 40e6 - 0.587, temperature / 710 - 0.918);
}
template <class Real>
inline Real volume_3f_at(Real pressure, Real temperature) {
  return 0.0064 * power_4(sum_of<tables::kVolumePt3f>(root(pressure / 40e6 - 0.587),
                                                      temperature / 730 - 0.891));
}
template <class Real>
inline Real volume_3g_at(Real pressure, Real temperature) {
  return 0.0027 *
         power_4(sum_of<tables::kVolumePt3g>(pressure / 25e6 - 0.872, temperature / 660 - 0.971));
}
template <class Real>
inline Real volume_3h_at(Real pressure, Real temperature) {
  return 0.0032 *
         power_4(sum_of<tables::kVolumePt3h>(pressure / 25e6 - 0.898, temperature / 660 - 0.983));
}
template <class Real>
inline Real volume_3i_at(Real pressure, Real temperature) {
  return 0.0041 * power_4(sum_of<tables::kVolumePt3i>(root(pressure / 25e6 - 0.910),
                                                      temperature / 660 - 0.984));
}
template <class Real>
inline Real volume_3j_at(Real pressure, Real temperature) {
  return 0.0054 * power_4(sum_of<tables::kVolumePt3j>(root(pressure / 25e6 - 0.875),
                                                      temperature / 670 - 0.964));
}
template <class Real>
inline Real volume_3k_at(Real pressure, Real temperature) {
  return 0.0077 * sum_of<tables::kVolumePt3k>(pressure / 25e6 - 0.802, temperature / 680 - 0.935);
}
template <class Real>
inline Real volume_3l_at(Real pressure, Real temperature) {
  return 0.0026 *
         power_4(sum_of<tables::kVolumePt3l>(pressure / 24e6 - 0.908, temperature / 650 - 0.989));
}
template <class Real>
inline Real volume_3m_at(Real pressure, Real temperature) {
  return 0.0028 *
         sum_of<tables::kVolumePt3m>(pressure / 23e6 - 1.00, root(root(temperature / 650 - 0.997)));
}
template <class Real>
inline Real volume_3o_at(Real pressure, Real temperature) {
  return 0.0034 *
         sum_of<tables::kVolumePt3o>(root(pressure / 23e6 - 0.974), temperature / 650 - 0.996);
}
template <class Real>
inline Real volume_3p_at(Real pressure, Real temperature) {
  return 0.0041 *
         sum_of<tables::kVolumePt3p>(root(pressure / 23e6 - 0.972), temperature / 650 - 0.997);
}
template <class Real>
inline Real volume_3q_at(Real pressure, Real temperature) {
  return 0.0022 *
         power_4(sum_of<tables::kVolumePt3q>(pressure / 23e6 - 0.848, temperature / 650 - 0.983));
}
template <class Real>
inline Real volume_3r_at(Real pressure, Real temperature) {
  return 0.0054 * sum_of<tables::kVolumePt3r>(pressure / 23e6 - 0.874, temperature / 650 - 0.982);
}
template <class Real>
inline Real volume_3s_at(Real pressure, Real temperature) {
  return 0.0022 *
         power_4(sum_of<tables::kVolumePt3s>(pressure / 21e6 - 0.886, temperature / 640 - 0.990));
}
template <class Real>
inline Real volume_3t_at(Real pressure, Real temperature) {
  return 0.0088 * sum_of<tables::kVolumePt3t>(pressure / 20e6 - 0.803, temperature / 650 - 1.02);
}
template <class Real>
inline Real volume_3u_at(Real pressure, Real temperature) {
  return 0.0026 * sum_of<tables::kVolumePt3u>(pressure / 23e6 - 0.902, temperature / 650 - 0.988);
}
template <class Real>
inline Real volume_3v_at(Real pressure, Real temperature) {
  return 0.0031 * sum_of<tables::kVolumePt3v>(pressure / 23e6 - 0.960, temperature / 650 - 0.995);
}
template <class Real>
inline Real volume_3w_at(Real pressure, Real temperature) {
  return 0.0039 *
         power_4(sum_of<tables::kVolumePt3w>(pressure / 23e6 - 0.959, temperature / 650 - 0.995));
}
template <class Real>
inline Real volume_3x_at(Real pressure, Real temperature) {
  return 0.0049 * sum_of<tables::kVolumePt3x>(pressure / 23e6 - 0.910, temperature / 650 - 0.988);
}
template <class Real>
inline Real volume_3y_at(Real pressure, Real temperature) {
  return 0.0031 *
         power_4(sum_of<tables::kVolumePt3y>(pressure / 22e6 - 0.996, temperature / 650 - 0.994));
}
template <class Real>
inline Real volume_3z_at(Real pressure, Real temperature) {
  return 0.0038 *
         power_4(sum_of<tables::kVolumePt3z>(pressure / 22e6 - 0.993, temperature / 650 - 0.994));
}
