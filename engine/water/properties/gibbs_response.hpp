// The second-order properties of an equation for the Gibbs energy.
#pragma once

#include <cmath>

#include "water/constants.hpp"
#include "water/equations/gibbs.hpp"
#include "water/properties/response.hpp"

namespace busbar::water {

/// R7-97(2012), tables 3, 12 and 39, in terms of a = pi g_pi and so on.
template <class Equation>
inline Response gibbs_response(double pressure, double temperature) {
  const double pi = pressure / Equation::kReducingPressure;
  const double tau = Equation::kReducingTemperature / temperature;
  const Gibbs<double> g = Equation::template at<kX | kXX | kY | kYY | kXY>(pi, tau);
  const double rt = kGasConstant * temperature;
  const double by_temperature = g.pi_pi1 - tau * g.mixed;  // p (dv/dT)_p / R
  const double curvature = tau * tau * g.tau2;             // -cp / R
  Response out;
  out.isobaric_heat_capacity = -kGasConstant * curvature;
  out.isochoric_heat_capacity =
      kGasConstant * (by_temperature * by_temperature / g.pi_pi2 - curvature);
  const double stiffness =
      g.pi_pi1 * g.pi_pi1 / (by_temperature * by_temperature / curvature - g.pi_pi2);
  out.speed_of_sound = std::sqrt(rt * stiffness);
  out.isentropic_exponent = stiffness / g.pi_pi1;
  out.isobaric_expansion = by_temperature / (g.pi_pi1 * temperature);
  out.isothermal_compressibility = -g.pi_pi2 / (g.pi_pi1 * pressure);
  // v (T beta - 1) / cp with v = R T pi g_pi / p, where pi g_pi - tau pi g_pitau - pi g_pi leaves
  // the mixed derivative: no difference of nearly equal numbers in thin vapour.
  out.joule_thomson = -rt * tau * (g.mixed / pressure) / out.isobaric_heat_capacity;
  return out;
}

}  // namespace busbar::water
