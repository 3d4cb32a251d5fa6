// One step after another of the way from pressure and enthalpy or entropy to the temperature.
// solve/inverse.cpp strings them together for one state and batch/isobar_blocks.hpp for a vector.

template <class Real>
inline Real clamped(Real x, Real low, Real high) {
  return select(x < low, low, select(x > high, high, x));
}

/// `from` at weight 0, `to` at weight 1, both to the last bit, and linear in between.
template <class Real>
inline Real mixed_at(Real from, Real to, Real weight) {
  const Real width = to - from;
  return select(weight < 0.5, from + weight * width, to - (1.0 - weight) * width);
}

// --- Regions 1, 2 and 5 --------------------------------------------------------------------------

// The given property in the form in which the equation of a region has it, as a function of tau:
// dg/dtau = h/(R T*) for the enthalpy, tau dg/dtau - g = s/R + ln pi for the entropy.
template <Given kGiven, class Real>
inline Real residual(const Gibbs<Real>& g, Real tau, Real target) {
  if constexpr (kGiven == Given::enthalpy) {
    return g.tau1 - target;
  } else {
    return tau * g.tau1 - g.g - target;
  }
}

template <Given kGiven, class Real>
inline Real slope(const Gibbs<Real>& g, Real tau) {
  if constexpr (kGiven == Given::enthalpy) {
    return g.tau2;
  } else {
    return tau * g.tau2;
  }
}

template <Given kGiven, class Real>
inline Real curvature(const Gibbs<Real>& g, Real tau) {
  if constexpr (kGiven == Given::enthalpy) {
    return g.tau3;
  } else {
    return g.tau2 + tau * g.tau3;
  }
}

// The last step is taken without another evaluation: below this residual, relative to
// max(1, target), the error of the linear step is far below 1e-10 R T*.
inline constexpr double kLastResidual = 1e-8;

/// What an iteration looks for on an isobar.
template <class Real>
struct Sought {
  Real pi;
  Real logarithm;  ///< of pi, where the equation has it and an entropy is given or wanted
  Real target;
  Real enough;
};

template <class Equation, Given kGiven, unsigned kWanted, class Real>
inline Sought<Real> sought(Real pressure, Real value) {
  constexpr double kTemperature = Equation::kReducingTemperature;
  constexpr bool kLogarithm =
      Equation::kHasLogarithm && (kGiven == Given::entropy || (kWanted & kEntropy) != 0);
  Sought<Real> out{};
  out.pi = pressure / Equation::kReducingPressure;
  if constexpr (kLogarithm) out.logarithm = natural_logarithm(out.pi);
  if constexpr (kGiven == Given::enthalpy) {
    out.target = value * (1 / (kGasConstant * kTemperature));
  } else {
    out.target = value * (1 / kGasConstant) + out.logarithm;
  }
  const Real size = magnitude(out.target);
  out.enough = kLastResidual * select(size > 1.0, size, Real{} + 1.0);
  return out;
}

/// Halley's step from a temperature.
template <class Equation, Given kGiven, class Real>
inline Real first_tau(const Sought<Real>& to, Real start) {
  constexpr unsigned kSet =
      kGiven == Given::enthalpy ? (kY | kYY | kYYY) : (kValue | kY | kYY | kYYY);
  const Real tau = Equation::kReducingTemperature / start;
  const auto g = Equation::template at<kSet>(to.pi, tau);
  const Real per_slope = 1.0 / slope<kGiven>(g, tau);
  const Real newton = residual<kGiven>(g, tau, to.target) * per_slope;
  const Real bend = 1.0 - 0.5 * newton * curvature<kGiven>(g, tau) * per_slope;
  return tau - select(bend > 0.5, newton / bend, newton);
}

/// Newton's step at tau, and whether it is the last.
template <class Real>
struct NewtonStep {
  Gibbs<Real> g;
  Real missed;
  Real step;
};

template <class Equation, Given kGiven, unsigned kWanted, class Real>
inline NewtonStep<Real> newton_step(const Sought<Real>& to, Real tau) {
  constexpr unsigned kSet = kY | kYY | (kGiven == Given::entropy ? kValue : 0U) |
                            ((kWanted & kVolume) != 0 ? kX | kXY : 0U) |
                            ((kWanted & kEntropy) != 0 ? kValue : 0U);
  NewtonStep<Real> out{};
  out.g = Equation::template at<kSet>(to.pi, tau);
  out.missed = residual<kGiven>(out.g, tau, to.target);
  out.step = -out.missed / slope<kGiven>(out.g, tau);
  return out;
}

/// The properties after the last step, which is short enough to be linear. The given one is kept.
template <class Equation, Given kGiven, unsigned kWanted, class Real>
inline PropertiesOf<Real> after_step(const Sought<Real>& to, const NewtonStep<Real>& last, Real tau,
                                     Real pressure, Real value) {
  constexpr double kTemperature = Equation::kReducingTemperature;
  const Gibbs<Real>& g = last.g;
  PropertiesOf<Real> out;
  if constexpr ((kWanted & kVolume) != 0) {
    const Real per_pressure = kGasConstant * kTemperature / pressure;
    out.volume = per_pressure * (g.pi_pi1 + (g.mixed - g.pi_pi1 / tau) * last.step) / tau;
  }
  if constexpr (kGiven == Given::enthalpy) {
    out.enthalpy = value;
    if constexpr ((kWanted & kEntropy) != 0) {
      out.entropy = kGasConstant * (tau * g.tau1 - g.g - to.logarithm + tau * g.tau2 * last.step);
    }
  } else {
    out.entropy = value;
    if constexpr ((kWanted & kEnthalpy) != 0) {
      out.enthalpy = (kGasConstant * kTemperature) * (g.tau1 + g.tau2 * last.step);
    }
  }
  return out;
}

// --- Region 3 ------------------------------------------------------------------------------------

/// Newton's step for density and temperature together. The determinant stays away from zero
/// everywhere, in the critical point and inside the two-phase region too.
template <class Real>
struct NewtonStep3 {
  Helmholtz<Real> f;
  Real density;
  Real temperature;
};

inline constexpr double kSmallDensityStep = 1e-8;
inline constexpr double kSmallTemperatureStep = 1e-9;

// Limits of the start and of one step.
inline constexpr double kLeastStart = 90;      // kg/m3
inline constexpr double kGreatestStart = 790;  // kg/m3
inline constexpr double kColdestStart = 620;   // K
inline constexpr double kHottestStart = 870;   // K

// Critical entropy: SR4-04(2014), section 3.2.
inline constexpr double kCriticalEntropy = 4412.02148223476;

template <class Real>
inline void next_in_region_3(const NewtonStep3<Real>& step, Real& density, Real& temperature) {
  constexpr double kLongestStep = 10;  // K
  const Real zero{};
  const Real limit = 0.2 * density;
  density = clamped(density + clamped(step.density, -limit, limit), zero + 80.0, zero + 800.0);
  temperature =
      clamped(temperature + clamped(step.temperature, zero - kLongestStep, zero + kLongestStep),
              zero + 600.0, zero + 900.0);
}

template <class Real>
inline Real entropy_3(const Helmholtz<Real>& f, Real density) {
  const Real logarithm = natural_logarithm(density / kCriticalDensity);
  return kGasConstant * (f.tau1 - f.value - tables::kRegion3N1 * logarithm);
}

// How enthalpy and entropy change with density and temperature.
template <class Real>
inline Real enthalpy_by_density(const Helmholtz<Real>& f, Real density, Real temperature) {
  return kGasConstant * temperature / density * (f.mixed + f.delta1 + f.delta2);
}
template <class Real>
inline Real enthalpy_by_temperature(const Helmholtz<Real>& f) {
  return kGasConstant * (f.delta1 - f.tau2 - f.mixed);
}
template <class Real>
inline Real entropy_by_density(const Helmholtz<Real>& f, Real density) {
  return kGasConstant / density * (f.mixed - f.delta1);
}
template <class Real>
inline Real entropy_by_temperature(const Helmholtz<Real>& f, Real temperature) {
  return -kGasConstant / temperature * f.tau2;
}

template <Given kGiven, class Real>
inline NewtonStep3<Real> newton_step_3(Real pressure, Real value, Real density, Real temperature) {
  constexpr unsigned kSet = kValue | kX | kXX | kY | kYY | kXY;
  NewtonStep3<Real> out{};
  out.f = Region3Equation::at<kSet>(density / kCriticalDensity, kCriticalTemperature / temperature);
  const Helmholtz<Real>& f = out.f;
  const Real rt = kGasConstant * temperature;
  const Real missing_pressure = pressure - density * rt * f.delta1;
  const Real pressure_density = rt * (2.0 * f.delta1 + f.delta2);
  const Real pressure_temperature = density * kGasConstant * (f.delta1 - f.mixed);
  Real missing{};
  Real by_density{};
  Real by_temperature{};
  if constexpr (kGiven == Given::enthalpy) {
    missing = value - rt * (f.tau1 + f.delta1);
    by_density = enthalpy_by_density(f, density, temperature);
    by_temperature = enthalpy_by_temperature(f);
  } else {
    missing = value - entropy_3(f, density);
    by_density = entropy_by_density(f, density);
    by_temperature = entropy_by_temperature(f, temperature);
  }
  const Real determinant = pressure_density * by_temperature - pressure_temperature * by_density;
  out.density = (missing_pressure * by_temperature - missing * pressure_temperature) / determinant;
  out.temperature = (pressure_density * missing - by_density * missing_pressure) / determinant;
  return out;
}

/// The property that is not given, after the last step from a density and a temperature.
template <Given kGiven, class Real>
inline Real other_after_step_3(const NewtonStep3<Real>& last, Real density, Real temperature) {
  const Helmholtz<Real>& f = last.f;
  if constexpr (kGiven == Given::enthalpy) {
    return entropy_3(f, density) + entropy_by_density(f, density) * last.density +
           entropy_by_temperature(f, temperature) * last.temperature;
  } else {
    return kGasConstant * temperature * (f.tau1 + f.delta1) +
           enthalpy_by_density(f, density, temperature) * last.density +
           enthalpy_by_temperature(f) * last.temperature;
  }
}
