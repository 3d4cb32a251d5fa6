// Properties of humid air per kg of dry air, refused where the air would hold fog.
//
// Pressure (Pa, up to 5 MPa), temperature (K, 193.15 to 473.15), humidity ratio (kg of water per kg
// of dry air): the caller keeps to these. Failures: impossible, argument 3, above saturation.
// Source: IAPWS G11-15; ideal-gas parts as IAPWS G8-10 takes them.
#pragma once

#include "core/outcome.hpp"

namespace busbar::air {

/// J per kg of dry air: zero for dry air at 0 °C and 101.325 kPa and for liquid water at the triple
/// point, as in the steam tables and in ASHRAE Fundamentals.
Outcome<double> enthalpy_at(double pressure, double temperature, double humidity_ratio);

/// m3 per kg of dry air.
Outcome<double> volume_at(double pressure, double temperature, double humidity_ratio);

/// kg of humid air per m3: (1 + W) / v.
Outcome<double> density_at(double pressure, double temperature, double humidity_ratio);

/// Temperature (K) of air with this enthalpy (J per kg of dry air). Agrees with enthalpy_at to
/// 1e-10 K. Failures: outside_range, argument 2; impossible, argument 3.
Outcome<double> temperature_at_enthalpy(double pressure, double enthalpy, double humidity_ratio);

}  // namespace busbar::air
