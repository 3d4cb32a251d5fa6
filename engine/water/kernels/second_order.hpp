// The second-order properties from the basic equations.

/// R7-97(2012), tables 3, 12 and 39, in terms of a = pi g_pi and so on.
template <class Equation, class Real>
inline ResponseOf<Real> gibbs_response_at(Real pressure, Real temperature) {
  const Real pi = pressure / Equation::kReducingPressure;
  const Real tau = Equation::kReducingTemperature / temperature;
  const Gibbs<Real> g = Equation::template at<kX | kXX | kY | kYY | kXY>(pi, tau);
  const Real rt = kGasConstant * temperature;
  const Real by_temperature = g.pi_pi1 - tau * g.mixed;  // p (dv/dT)_p / R
  const Real curvature = tau * tau * g.tau2;             // -cp / R
  ResponseOf<Real> out;
  out.isobaric_heat_capacity = -kGasConstant * curvature;
  out.isochoric_heat_capacity =
      kGasConstant * (by_temperature * by_temperature / g.pi_pi2 - curvature);
  const Real stiffness =
      g.pi_pi1 * g.pi_pi1 / (by_temperature * by_temperature / curvature - g.pi_pi2);
  out.speed_of_sound = root(rt * stiffness);
  out.isentropic_exponent = stiffness / g.pi_pi1;
  out.isobaric_expansion = by_temperature / (g.pi_pi1 * temperature);
  out.isothermal_compressibility = -g.pi_pi2 / (g.pi_pi1 * pressure);
  // v (T beta - 1) / cp with v = R T pi g_pi / p, where pi g_pi - tau pi g_pitau - pi g_pi leaves
  // the mixed derivative: no difference of nearly equal numbers in thin vapour.
  out.joule_thomson = -rt * tau * (g.mixed / pressure) / out.isobaric_heat_capacity;
  return out;
}

/// R7-97(2012), table 31.
template <class Real>
inline ResponseOf<Real> helmholtz_response_at(Real density, Real temperature) {
  const Real delta = density / kCriticalDensity;
  const Real tau = kCriticalTemperature / temperature;
  const auto f = Region3Equation::at<kX | kXX | kYY | kXY>(delta, tau);
  const Real rt = kGasConstant * temperature;
  const Real stiffness = 2.0 * f.delta1 + f.delta2;  // (dp/drho)_T / (R T)
  const Real thermal = f.delta1 - f.mixed;           // (dp/dT)_rho / (rho R)
  ResponseOf<Real> out;
  out.isochoric_heat_capacity = -kGasConstant * f.tau2;
  out.isobaric_heat_capacity = kGasConstant * (thermal * thermal / stiffness - f.tau2);
  const Real isentropic = stiffness - thermal * thermal / f.tau2;  // (dp/drho)_s / (R T)
  out.speed_of_sound = root(rt * isentropic);
  out.isentropic_exponent = isentropic / f.delta1;
  out.isobaric_expansion = thermal / (stiffness * temperature);
  out.isothermal_compressibility = 1.0 / (density * rt * stiffness);
  // v (T beta - 1) / cp, multiplied through with the stiffness, which vanishes at the critical
  // point
  out.joule_thomson =
      (thermal - stiffness) / (density * kGasConstant * (thermal * thermal - f.tau2 * stiffness));
  return out;
}
