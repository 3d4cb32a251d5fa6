// The pressure of equation 28 and its slope, for Newton's method in density.

template <class Real>
struct PressureSlope {
  Real pressure;     // Pa
  Real per_density;  // Pa m3/kg
};

template <class Real>
inline PressureSlope<Real> pressure_slope_at(Real density, Real temperature) {
  const auto f =
      Region3Equation::at<kX | kXX>(density / kCriticalDensity, kCriticalTemperature / temperature);
  const Real rt = kGasConstant * temperature;
  return {density * rt * f.delta1, rt * (2.0 * f.delta1 + f.delta2)};
}

// Equation 28 is used between these densities: 100 MPa at 623.15 K has 761 kg/m3, and the thinnest
// vapour of region 3, at 16.53 MPa and 623.15 K, has 113 kg/m3.
inline constexpr double kLowestDensity = 80;
inline constexpr double kHighestDensity = 800;

// A relative step after which the next one is below rounding: Newton squares it.
inline constexpr double kSmallStep = 1e-9;
