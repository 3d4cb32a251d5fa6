// Volume, enthalpy and entropy from the basic equations, in SI.

/// m3/kg, J/kg, J/(kg K).
template <class Real>
struct PropertiesOf {
  Real volume{};
  Real enthalpy{};
  Real entropy{};
};

/// Which of them are wanted; they are combined with |.
enum Output : unsigned { kVolume = 1, kEnthalpy = 2, kEntropy = 4 };
inline constexpr unsigned kAllOutputs = kVolume | kEnthalpy | kEntropy;

/// Properties at pressure (Pa) and temperature (K) by the equation of region 1, 2 or 5. `kWanted`
/// leaves out work and changes no bit of what is asked for.
template <class Equation, unsigned kWanted, class Real>
inline PropertiesOf<Real> gibbs_properties_at(Real pressure, Real temperature) {
  constexpr unsigned kSet = ((kWanted & kVolume) != 0 ? kX : 0U) |
                            ((kWanted & kEnthalpy) != 0 ? kY : 0U) |
                            ((kWanted & kEntropy) != 0 ? kValue | kY : 0U);
  const Real pi = pressure / Equation::kReducingPressure;
  const Real tau = Equation::kReducingTemperature / temperature;
  const Gibbs<Real> g = Equation::template at<kSet>(pi, tau);
  PropertiesOf<Real> out;
  if constexpr ((kWanted & kVolume) != 0) {
    out.volume = kGasConstant * temperature / pressure * g.pi_pi1;
  }
  if constexpr ((kWanted & kEnthalpy) != 0) {
    out.enthalpy = (kGasConstant * Equation::kReducingTemperature) * g.tau1;
  }
  if constexpr ((kWanted & kEntropy) != 0) {
    Real potential = g.g;
    if constexpr (Equation::kHasLogarithm) potential = potential + natural_logarithm(pi);
    out.entropy = kGasConstant * (tau * g.tau1 - potential);
  }
  return out;
}

/// Properties at density (kg/m3) and temperature (K) by the equation of region 3.
template <unsigned kWanted, class Real>
inline PropertiesOf<Real> helmholtz_properties_at(Real density, Real temperature) {
  constexpr unsigned kSet =
      ((kWanted & kEnthalpy) != 0 ? kX | kY : 0U) | ((kWanted & kEntropy) != 0 ? kValue | kY : 0U);
  PropertiesOf<Real> out;
  if constexpr ((kWanted & kVolume) != 0) out.volume = 1.0 / density;
  if constexpr (kSet != 0) {
    const Real delta = density / kCriticalDensity;
    const Real tau = kCriticalTemperature / temperature;
    const Helmholtz<Real> f = Region3Equation::at<kSet>(delta, tau);
    if constexpr ((kWanted & kEnthalpy) != 0) {
      out.enthalpy = kGasConstant * temperature * (f.tau1 + f.delta1);
    }
    if constexpr ((kWanted & kEntropy) != 0) {
      const Real value = f.value + tables::kRegion3N1 * natural_logarithm(delta);
      out.entropy = kGasConstant * (f.tau1 - value);
    }
  }
  return out;
}
