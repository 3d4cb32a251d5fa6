// Saturation line, region 4, and the boundary between regions 2 and 3.
#pragma once

#include <cmath>

#include "water/tables/boundary_23.hpp"
#include "water/tables/region_4.hpp"

namespace busbar::water {

/// Saturation pressure (Pa) at temperature (K): IAPWS R7-97(2012), equation 30, 273.15 K to Tc.
inline double saturation_pressure_equation(double temperature) {
  constexpr const double* n = tables::kRegion4;  // n[k] is n_(k+1) of table 34
  const double theta = temperature + n[8] / (temperature - n[9]);
  const double a = (theta + n[0]) * theta + n[1];
  const double b = (n[2] * theta + n[3]) * theta + n[4];
  const double c = (n[5] * theta + n[6]) * theta + n[7];
  const double beta = 2 * c / (-b + std::sqrt(b * b - 4 * a * c));
  const double square = beta * beta;
  return square * square * 1e6;
}

/// Saturation temperature (K) at pressure (Pa): IAPWS R7-97(2012), equation 31, 611.213 Pa to pc.
inline double saturation_temperature_equation(double pressure) {
  constexpr const double* n = tables::kRegion4;
  const double square = std::sqrt(pressure * 1e-6);
  const double beta = std::sqrt(square);
  const double e = square + n[2] * beta + n[5];
  const double f = n[0] * square + n[3] * beta + n[6];
  const double g = n[1] * square + n[4] * beta + n[7];
  const double d = 2 * g / (-f - std::sqrt(f * f - 4 * e * g));
  const double sum = n[9] + d;
  return 0.5 * (sum - std::sqrt(sum * sum - 4 * (n[8] + n[9] * d)));
}

/// Pressure (Pa) on the boundary between regions 2 and 3 at temperature (K): equation 5.
inline double boundary_23_pressure(double temperature) {
  constexpr const double* n = tables::kBoundary23;
  return ((n[2] * temperature + n[1]) * temperature + n[0]) * 1e6;
}

/// Temperature (K) on the boundary between regions 2 and 3 at pressure (Pa): equation 6.
inline double boundary_23_temperature(double pressure) {
  constexpr const double* n = tables::kBoundary23;
  return n[3] + std::sqrt((pressure * 1e-6 - n[4]) / n[2]);
}

}  // namespace busbar::water
