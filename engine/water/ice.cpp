#include "water/ice.hpp"

#include <cmath>
#include <complex>

#include "water/tables/ice.hpp"

namespace busbar::water {
namespace {

using Complex = std::complex<double>;

constexpr double kTripleTemperature = 273.16;
constexpr double kTriplePressure = 611.657;
constexpr double kNormalPressure = 101325;

// The bracket of equation 1 for one k, and its derivative with respect to tau.
struct Bracket {
  Complex value;
  Complex slope;
};

Bracket bracket(Complex t, double tau) {
  const Complex below = std::log(t - tau);
  const Complex above = std::log(t + tau);
  return {(t - tau) * below + (t + tau) * above - 2.0 * t * std::log(t) - tau * tau / t,
          above - below - 2.0 * tau / t};
}

}  // namespace

IceProperties ice_at(double pressure, double temperature) {
  const double tau = temperature / kTripleTemperature;
  const double x = (pressure - kNormalPressure) / kTriplePressure;  // pi - pi0

  // Equations 2 and 4, with their derivatives with respect to pi.
  double g0 = 0;
  double g0_pi = 0;
  for (std::size_t k = tables::kIceG0.size(); k-- > 0;) {
    g0_pi = g0_pi * x + g0;
    g0 = g0 * x + tables::kIceG0[k];
  }
  const Complex r2 = (tables::kIceR2[2] * x + tables::kIceR2[1]) * x + tables::kIceR2[0];
  const Complex r2_pi = 2.0 * tables::kIceR2[2] * x + tables::kIceR2[1];

  const Bracket first = bracket(tables::kIceT1, tau);
  const Bracket second = bracket(tables::kIceT2, tau);
  IceProperties out;
  out.gibbs_energy = g0 - tables::kIceS0 * temperature +
                     kTripleTemperature * (tables::kIceR1 * first.value + r2 * second.value).real();
  out.entropy = tables::kIceS0 - (tables::kIceR1 * first.slope + r2 * second.slope).real();
  out.enthalpy = out.gibbs_energy + temperature * out.entropy;
  out.volume = (g0_pi + kTripleTemperature * (r2_pi * second.value).real()) / kTriplePressure;
  return out;
}

}  // namespace busbar::water
