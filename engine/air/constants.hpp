// Constants and limits of the humid-air model, in SI.
#pragma once

namespace busbar::air {

// IAPWS G11-15, Guideline on a Virial Equation for the Fugacity of H2O in Humid Air; the molar
// masses are those of IAPWS G8-10 (dry air of CIPM-2007 with 400 ppm of CO2).
inline constexpr double kGasConstant = 8.314462;        ///< J/(mol K)
inline constexpr double kAirMolarMass = 0.02896546;     ///< kg/mol
inline constexpr double kWaterMolarMass = 0.018015268;  ///< kg/mol
inline constexpr double kMassRatio = kWaterMolarMass / kAirMolarMass;

/// From here on saturation is over liquid water; below, over ice or supercooled water.
inline constexpr double kFreezing = 273.15;  ///< K

// The cross virials of G11-15 hold from -80 to 200 °C, the fugacity up to 5 MPa. Written so that
// -80 °C itself is inside.
inline constexpr double kColdest = kFreezing - 80;   ///< K
inline constexpr double kHottest = kFreezing + 200;  ///< K
inline constexpr double kHighestPressure = 5e6;      ///< Pa

}  // namespace busbar::air
