// Dynamic viscosity of water and steam.
#pragma once

#include "core/outcome.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// Dynamic viscosity (Pa s) at density (kg/m3) and temperature (K), without the critical
/// enhancement. Source: IAPWS R12-08, equations 10 to 12 with mu2 = 1.
double viscosity_equation(double density, double temperature);

/// Dynamic viscosity (Pa s) of a state. The critical enhancement is left out, as R12-08,
/// section 3.2, recommends for industrial use: it exceeds 2 % only within 645.91 to 650.77 K and
/// 245.8 to 405.3 kg/m3. Range: 273.15 to 1173.15 K, to 100 MPa up to 1073.15 K and to 50 MPa above
/// (that of IF97 with the upper limit of R12-08, equation 9). Failures, argument 0: outside_range
/// above 1173.15 K, missing for a mixture of both phases.
Outcome<double> viscosity(const State& state);

}  // namespace busbar::water
