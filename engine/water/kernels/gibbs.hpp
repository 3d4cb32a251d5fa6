// Basic equations of regions 1, 2 and 5: the specific Gibbs free energy g(p,T), IAPWS R7-97(2012).

/// The dimensionless Gibbs free energy g/(R T) and its derivatives, without the term ln pi that
/// regions 2 and 5 have in `g` alone (see kHasLogarithm): the caller adds it, so that the kernel
/// calls no maths library. pi is the pressure over the reducing pressure and tau the reducing
/// temperature over the temperature. Only what was asked for is filled in.
template <class Real>
struct Gibbs {
  Real g{};       ///< g/(R T), without ln pi
  Real pi_pi1{};  ///< pi dg/dpi
  Real pi_pi2{};  ///< pi^2 d2g/dpi2
  Real tau1{};    ///< dg/dtau
  Real tau2{};    ///< d2g/dtau2
  Real tau3{};    ///< d3g/dtau3
  Real mixed{};   ///< pi d2g/(dpi dtau)
};

/// Region 1, equation 7.
struct Region1Equation {
  static constexpr double kReducingPressure = 16.53e6;  ///< Pa
  static constexpr double kReducingTemperature = 1386;  ///< K
  static constexpr bool kHasLogarithm = false;

  template <unsigned kSet, class Real>
  [[gnu::always_inline]] static Gibbs<Real> at(Real pi, Real tau) {
    const Real x = 7.1 - pi;
    const Real y = tau - 1.222;
    const Sums<Real> sum = series<tables::kRegion1, kSet>(x, y);
    Gibbs<Real> out;
    const Real per_y = 1.0 / y;
    const Real scale = -pi / x;  // pi d/dpi = -(pi/x) (x d/dx)
    if constexpr ((kSet & kValue) != 0) out.g = sum.value;
    if constexpr ((kSet & kX) != 0) out.pi_pi1 = scale * sum.x;
    if constexpr ((kSet & kXX) != 0) out.pi_pi2 = scale * scale * sum.xx;
    if constexpr ((kSet & kY) != 0) out.tau1 = per_y * sum.y;
    if constexpr ((kSet & kYY) != 0) out.tau2 = per_y * per_y * sum.yy;
    if constexpr ((kSet & kYYY) != 0) out.tau3 = per_y * per_y * per_y * sum.yyy;
    if constexpr ((kSet & kXY) != 0) out.mixed = scale * per_y * sum.xy;
    return out;
  }
};

namespace gibbs_detail {

// Ideal-gas part in powers of tau and residual part in powers of pi and tau - shift.
template <const auto& kIdeal, const auto& kResidual, unsigned kSet, class Real>
[[gnu::always_inline]] inline Gibbs<Real> vapour(Real pi, Real tau, double shift) {
  constexpr unsigned kIdealSet = kSet & (kValue | kY | kYY | kYYY);
  const Real y = tau - shift;
  const Sums<Real> ideal = series<kIdeal, kIdealSet>(pi, tau);
  const Sums<Real> sum = series<kResidual, kSet>(pi, y);
  Gibbs<Real> out;
  const Real per_tau = 1.0 / tau;
  const Real per_y = 1.0 / y;
  if constexpr ((kSet & kValue) != 0) out.g = ideal.value + sum.value;
  if constexpr ((kSet & kX) != 0) out.pi_pi1 = 1.0 + sum.x;
  if constexpr ((kSet & kXX) != 0) out.pi_pi2 = sum.xx - 1.0;
  if constexpr ((kSet & kY) != 0) out.tau1 = per_tau * ideal.y + per_y * sum.y;
  if constexpr ((kSet & kYY) != 0) {
    out.tau2 = per_tau * per_tau * ideal.yy + per_y * per_y * sum.yy;
  }
  if constexpr ((kSet & kYYY) != 0) {
    out.tau3 = per_tau * per_tau * per_tau * ideal.yyy + per_y * per_y * per_y * sum.yyy;
  }
  if constexpr ((kSet & kXY) != 0) out.mixed = per_y * sum.xy;
  return out;
}

}  // namespace gibbs_detail

/// Region 2, equations 15 to 17. Not at 1080 K exactly, where tau - 0.5 is zero (the region ends at
/// 1073.15 K).
struct Region2Equation {
  static constexpr double kReducingPressure = 1e6;     ///< Pa
  static constexpr double kReducingTemperature = 540;  ///< K
  static constexpr bool kHasLogarithm = true;

  template <unsigned kSet, class Real>
  [[gnu::always_inline]] static Gibbs<Real> at(Real pi, Real tau) {
    return gibbs_detail::vapour<tables::kRegion2Ideal, tables::kRegion2Residual, kSet>(pi, tau,
                                                                                       0.5);
  }
};

/// Region 5, equations 32 to 34.
struct Region5Equation {
  static constexpr double kReducingPressure = 1e6;      ///< Pa
  static constexpr double kReducingTemperature = 1000;  ///< K
  static constexpr bool kHasLogarithm = true;

  template <unsigned kSet, class Real>
  [[gnu::always_inline]] static Gibbs<Real> at(Real pi, Real tau) {
    return gibbs_detail::vapour<tables::kRegion5Ideal, tables::kRegion5Residual, kSet>(pi, tau,
                                                                                       0.0);
  }
};
