// Backward equations for temperature and their subregions: starts of the iterations, never answers.
//
// Raw equations in SI units; each is checked against its published table (tests/unit/water).
// Outside its subregion an equation gives numbers without meaning.
#pragma once

namespace busbar::water::backward {

// IAPWS R7-97(2012). Pressure in Pa, enthalpy in J/kg, entropy in J/(kg K), temperature in K.
double temperature_ph_1(double pressure, double enthalpy);   ///< equation 11
double temperature_ps_1(double pressure, double entropy);    ///< equation 13
double boundary_2bc_pressure(double enthalpy);               ///< equation 20
double boundary_2bc_enthalpy(double pressure);               ///< equation 21
double temperature_ph_2a(double pressure, double enthalpy);  ///< equation 22, up to 4 MPa
double temperature_ph_2b(double pressure, double enthalpy);  ///< equation 23
double temperature_ph_2c(double pressure, double enthalpy);  ///< equation 24, below equation 21
double temperature_ps_2a(double pressure, double entropy);   ///< equation 25, up to 4 MPa
double temperature_ps_2b(double pressure, double entropy);   ///< equation 26
double temperature_ps_2c(double pressure, double entropy);   ///< equation 27, below 5.85 kJ/(kg K)

/// The subregion chosen and its equation evaluated; within 25 mK in region 2. Below 611 Pa, where
/// equation 25 ends, the vapour is close to an ideal gas and the entropy is moved to 611 Pa.
double temperature_ph_2(double pressure, double enthalpy);
double temperature_ps_2(double pressure, double entropy);

// IAPWS SR3-03(2014), region 3.
double boundary_3ab_enthalpy(double pressure);               ///< equation 1
double temperature_ph_3a(double pressure, double enthalpy);  ///< equation 2
double temperature_ph_3b(double pressure, double enthalpy);  ///< equation 3
double temperature_ps_3a(double pressure, double entropy);   ///< equation 6
double temperature_ps_3b(double pressure, double entropy);   ///< equation 7

}  // namespace busbar::water::backward
