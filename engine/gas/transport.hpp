// Viscosity and thermal conductivity of gases at low pressure.
//
// Pure gases: nitrogen, oxygen and argon by E. W. Lemmon and R. T. Jacobsen, Int. J. Thermophys. 25
// (2004) 21, equations 2, 3 and 5, at zero density; carbon dioxide by A. Fenghour et al., J. Phys.
// Chem. Ref. Data 27 (1998) 31, equation 3; water by the dilute-gas terms of IAPWS R12-08 and
// R15-11; carbon monoxide, hydrogen, methane, sulphur dioxide, nitric oxide, helium and neon by the
// theory of Chapman and Enskog with the Lennard-Jones parameters of R. A. Svehla, NASA TR R-132,
// 1962. Conductivities of the last and of carbon dioxide by the modified Eucken correlation.
// Mixtures: C. R. Wilke, J. Chem. Phys. 18 (1950) 517, for viscosity, and A. Wassiljewa with E. A.
// Mason and S. C. Saxena, Phys. Fluids 1 (1958) 361, for conductivity.
//
// All coefficients from memory; the figures that the sources print for single gases follow from
// them. Wilke's rule is good to about 2 % for flue gas, the conductivity to about 5 %. Up to 10 bar
// the pressure adds less than 2 % above 0 °C.
#pragma once

#include "core/outcome.hpp"
#include "gas/mixture.hpp"

namespace busbar::gas {

/// Pa s and W/(m K). Failures: argument 1, missing: a gas of the composition has no data; argument
/// 2: outside the range of its correlation.
Outcome<double> viscosity(const Mixture& mixture, double temperature);
Outcome<double> thermal_conductivity(const Mixture& mixture, double temperature);

/// cp times viscosity over conductivity.
Outcome<double> prandtl_number(const Mixture& mixture, double temperature);

}  // namespace busbar::gas
