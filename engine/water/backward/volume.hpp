// Backward equations of region 3 for specific volume and for the pressure on its saturation line:
// starts of the iterations, never answers. Raw equations in SI units, as in
// backward/temperature.hpp.
#pragma once

namespace busbar::water::backward {

// IAPWS SR3-03(2014), m3/kg.
double volume_ph_3a(double pressure, double enthalpy);  ///< equation 4
double volume_ph_3b(double pressure, double enthalpy);  ///< equation 5
double volume_ps_3a(double pressure, double entropy);   ///< equation 8
double volume_ps_3b(double pressure, double entropy);   ///< equation 9

// IAPWS SR3-03(2014): pressure (Pa) at which a saturated liquid or vapour of region 3 has the given
// enthalpy or entropy, within 0.00043 % and 0.0033 %.
double saturation_pressure_h_3(double enthalpy);  ///< equation 10
double saturation_pressure_s_3(double entropy);   ///< equation 11

/// Subregions of IAPWS SR5-05(2016), tables 2 and 10.
enum class Subregion3 : unsigned char {
  a,
  b,
  c,
  d,
  e,
  f,
  g,
  h,
  i,
  j,
  k,
  l,
  m,
  n,
  o,
  p,
  q,
  r,
  s,
  t,
  u,
  v,
  w,
  x,
  y,
  z
};

/// v(p,T) of a subregion (m3/kg): IAPWS SR5-05(2016), equations 4 and 5.
double volume_pt_3(Subregion3 subregion, double pressure, double temperature);

/// The subregion of a state of region 3: tables 2 and 10. `liquid` chooses the side of the
/// saturation line below the critical pressure.
Subregion3 subregion_3(double pressure, double temperature, bool liquid);

// Boundaries between the subregions, K at Pa: equations 1 to 3.
double boundary_3ab_pt(double pressure);
double boundary_3cd(double pressure);
double boundary_3ef(double pressure);
double boundary_3gh(double pressure);
double boundary_3ij(double pressure);
double boundary_3jk(double pressure);
double boundary_3mn(double pressure);
double boundary_3op(double pressure);
double boundary_3qu(double pressure);
double boundary_3rx(double pressure);
double boundary_3uv(double pressure);
double boundary_3wx(double pressure);

}  // namespace busbar::water::backward
