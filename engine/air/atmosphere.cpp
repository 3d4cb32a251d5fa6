#include "air/atmosphere.hpp"

#include <cmath>

namespace busbar::air {
namespace {

// ISO 2533:1975, table 1 and the layer that begins at sea level.
constexpr double kSeaLevelPressure = 101325;     // Pa
constexpr double kSeaLevelTemperature = 288.15;  // K
constexpr double kLapse = 0.0065;                // K/m
constexpr double kFall = 9.80665;                // m/s2
constexpr double kGasConstant = 287.05287;       // J/(kg K)

}  // namespace

double standard_atmosphere_temperature(double altitude) {
  return kSeaLevelTemperature - kLapse * altitude;
}

double standard_atmosphere_pressure(double altitude) {
  const double ratio = standard_atmosphere_temperature(altitude) / kSeaLevelTemperature;
  return kSeaLevelPressure * std::pow(ratio, kFall / (kGasConstant * kLapse));
}

}  // namespace busbar::air
