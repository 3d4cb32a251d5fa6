// The standard atmosphere: what pressure and temperature to expect at an altitude.
#pragma once

namespace busbar::air {

inline constexpr double kLowestAltitude = -2000;   ///< m
inline constexpr double kHighestAltitude = 11000;  ///< m, where the troposphere ends

/// Pressure (Pa) and temperature (K) of the ISO standard atmosphere at a geopotential altitude (m),
/// from -2000 to 11000 m: the caller keeps to the range. Source: ISO 2533:1975, equations for the
/// layer with the lapse rate 6.5 K/km from 288.15 K and 101.325 kPa.
double standard_atmosphere_pressure(double altitude);
double standard_atmosphere_temperature(double altitude);

}  // namespace busbar::air
