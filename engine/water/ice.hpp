// Common ice (Ih): what the wet bulb and saturation below the freezing point need of it.
#pragma once

namespace busbar::water {

/// Properties of ice Ih in SI: J/kg, J/(kg K), m3/kg. The datum is that of IAPWS-95 and IF97:
/// internal energy and entropy are zero in liquid water at the triple point.
struct IceProperties {
  double gibbs_energy = 0;
  double enthalpy = 0;
  double entropy = 0;
  double volume = 0;
};

/// Ice Ih at pressure (Pa, up to 210 MPa) and temperature (K, above 0 up to 273.16): the caller
/// keeps to that range. Source: IAPWS R10-06(2009), Revised Release on the Equation of State 2006
/// for H2O Ice Ih, equations 1 to 4.
IceProperties ice_at(double pressure, double temperature);

}  // namespace busbar::water
