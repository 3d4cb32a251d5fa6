// Constants and limits of IAPWS-IF97, in SI.
#pragma once

namespace busbar::water {

// IAPWS R7-97(2012), equations 1 to 4.
inline constexpr double kGasConstant = 461.526;          ///< J/(kg K)
inline constexpr double kCriticalTemperature = 647.096;  ///< K
inline constexpr double kCriticalPressure = 22.064e6;    ///< Pa
inline constexpr double kCriticalDensity = 322;          ///< kg/m3

// IAPWS R7-97(2012), section 2: range of validity.
inline constexpr double kLowestTemperature = 273.15;  ///< K
inline constexpr double kHighestTemperature2 =
    1073.15;  ///< K, of regions 2 and 3; start of region 5
inline constexpr double kHighestTemperature5 = 2273.15;  ///< K, of region 5
inline constexpr double kHighestPressure = 100e6;        ///< Pa, of regions 1 to 3
inline constexpr double kHighestPressure5 = 50e6;        ///< Pa, of region 5

// Boundary between regions 1 and 3, and where B23 meets 100 MPa (sections 2 and 4).
inline constexpr double kTemperature13 = 623.15;         ///< K
inline constexpr double kHighestTemperature23 = 863.15;  ///< K

/// Equation 30 at 623.15 K (printed as 16.5292 MPa): regions 1 and 2 meet there up to this
/// pressure, region 3 lies above it. A test holds the digits against equation 30.
inline constexpr double kPressure13 = 16529164.252604509;  ///< Pa

/// Equation 30 at 273.15 K (printed as 611.213 Pa): no liquid below. A test holds the digits.
inline constexpr double kLowestSaturationPressure = 611.21267744434533;  ///< Pa

}  // namespace busbar::water
