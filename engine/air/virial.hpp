// Virial coefficients of humid air: how far it is from an ideal gas.
#pragma once

namespace busbar::air {

/// A virial coefficient in SI (m3/mol or m6/mol2), and T times its derivative in T.
struct Coefficient {
  double value = 0;
  double slope = 0;
};

/// Second and third virial coefficients of air (a) and water (w) at one temperature.
struct Virials {
  Coefficient aa, aw, ww;
  Coefficient aaa, aaw, aww, www;
};

/// At temperature (K), 193.15 to 473.15 K. Source: IAPWS G11-15, with the coefficients of pure air
/// and pure water from the equations that it names (tables/virial.hpp).
Virials virials(double temperature);

/// Of the mixture with mole fraction x of water.
struct MixtureVirials {
  Coefficient second, third;
};
MixtureVirials mixture(const Virials& of, double x);

/// Logarithm of the fugacity coefficient of water in the mixture with mole fraction x of water;
/// q = p/(R T) in mol/m3. Source: IAPWS G11-15, the equation for the fugacity.
double log_fugacity_coefficient(const Virials& of, double q, double x);

}  // namespace busbar::air
