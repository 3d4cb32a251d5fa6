// Basic equation of region 3: the specific Helmholtz free energy f(rho,T), IAPWS R7-97(2012),
// equation 28.

/// The dimensionless Helmholtz free energy phi = f/(R T) and its derivatives, delta = rho/rho_c and
/// tau = Tc/T. `value` lacks the term n1 ln delta, which the caller adds (the kernel calls no maths
/// library). Only what was asked for is filled in.
template <class Real>
struct Helmholtz {
  Real value{};   ///< phi - n1 ln delta
  Real delta1{};  ///< delta dphi/ddelta
  Real delta2{};  ///< delta^2 d2phi/ddelta2
  Real tau1{};    ///< tau dphi/dtau
  Real tau2{};    ///< tau^2 d2phi/dtau2
  Real mixed{};   ///< delta tau d2phi/(ddelta dtau)
};

struct Region3Equation {
  template <unsigned kSet, class Real>
  [[gnu::always_inline]] static Helmholtz<Real> at(Real delta, Real tau) {
    const Sums<Real> sum = series<tables::kRegion3, kSet>(delta, tau);
    Helmholtz<Real> out;
    if constexpr ((kSet & kValue) != 0) out.value = sum.value;
    if constexpr ((kSet & kX) != 0) out.delta1 = tables::kRegion3N1 + sum.x;
    if constexpr ((kSet & kXX) != 0) out.delta2 = sum.xx - tables::kRegion3N1;
    if constexpr ((kSet & kY) != 0) out.tau1 = sum.y;
    if constexpr ((kSet & kYY) != 0) out.tau2 = sum.yy;
    if constexpr ((kSet & kXY) != 0) out.mixed = sum.xy;
    return out;
  }
};
