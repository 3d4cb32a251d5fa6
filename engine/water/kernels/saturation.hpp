// Saturation line, region 4, and the boundary between regions 2 and 3.

/// Saturation pressure (Pa) at temperature (K): IAPWS R7-97(2012), equation 30, 273.15 K to Tc.
template <class Real>
inline Real saturation_pressure_at(Real temperature) {
  constexpr const double* n = tables::kRegion4;  // n[k] is n_(k+1) of table 34
  const Real theta = temperature + n[8] / (temperature - n[9]);
  const Real a = (theta + n[0]) * theta + n[1];
  const Real b = (n[2] * theta + n[3]) * theta + n[4];
  const Real c = (n[5] * theta + n[6]) * theta + n[7];
  const Real beta = 2.0 * c / (-b + root(b * b - 4.0 * a * c));
  const Real square = beta * beta;
  return square * square * 1e6;
}

/// Saturation temperature (K) at pressure (Pa): IAPWS R7-97(2012), equation 31, 611.213 Pa to pc.
template <class Real>
inline Real saturation_temperature_at(Real pressure) {
  constexpr const double* n = tables::kRegion4;
  const Real square = root(pressure * 1e-6);
  const Real beta = root(square);
  const Real e = square + n[2] * beta + n[5];
  const Real f = n[0] * square + n[3] * beta + n[6];
  const Real g = n[1] * square + n[4] * beta + n[7];
  const Real d = 2.0 * g / (-f - root(f * f - 4.0 * e * g));
  const Real sum = n[9] + d;
  return 0.5 * (sum - root(sum * sum - 4.0 * (n[8] + n[9] * d)));
}

/// Pressure (Pa) on the boundary between regions 2 and 3 at temperature (K): equation 5.
template <class Real>
inline Real boundary_23_pressure_at(Real temperature) {
  constexpr const double* n = tables::kBoundary23;
  return ((n[2] * temperature + n[1]) * temperature + n[0]) * 1e6;
}

/// Temperature (K) on the boundary between regions 2 and 3 at pressure (Pa): equation 6.
template <class Real>
inline Real boundary_23_temperature_at(Real pressure) {
  constexpr const double* n = tables::kBoundary23;
  return n[3] + root((pressure * 1e-6 - n[4]) / n[2]);
}

/// log2 p, too small by up to 0.0861: the exponent, and the mantissa taken as linear. It rises with
/// p strictly but for numbers that agree in 20 bits of their mantissas.
template <class Real>
inline Real rough_logarithm(Real pressure) {
  return upper_half(pressure) * 0x1p-20 - 1023.0;
}

/// What rough_logarithm gives for the saturation pressure at a temperature between 273.15 and
/// 623.15 K: this, within -0.11 and +0.02. A fit to equation 30; a test holds the band.
template <class Real>
inline Real rough_saturation_logarithm(Real temperature) {
  const Real x = (temperature - 450.0) * 0.01;
  return (((-0.0613494 * x + 0.2686084) * x - 0.8226298) * x + 3.3285124) * x + 19.83003;
}

// Beyond these distances from rough_saturation_logarithm a state is surely liquid or vapour, and
// equation 30 need not be evaluated.
inline constexpr double kSurelyLiquid = 0.05;
inline constexpr double kSurelyVapour = -0.15;
