// How a single-phase state answers to heat and pressure.

/// SI. All follow from the second derivatives of the basic equation of the region.
template <class Real>
struct ResponseOf {
  Real isobaric_heat_capacity{};      ///< cp = (dh/dT)_p, J/(kg K)
  Real isochoric_heat_capacity{};     ///< cv = (du/dT)_v, J/(kg K)
  Real speed_of_sound{};              ///< w = v sqrt(-(dp/dv)_s), m/s
  Real isentropic_exponent{};         ///< -(v/p) (dp/dv)_s
  Real joule_thomson{};               ///< (dT/dp)_h, K/Pa
  Real isobaric_expansion{};          ///< (1/v) (dv/dT)_p, 1/K
  Real isothermal_compressibility{};  ///< -(1/v) (dv/dp)_T, 1/Pa
};
