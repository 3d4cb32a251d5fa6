// Volume, enthalpy and entropy from the basic equations, in SI.
#pragma once

#include <cmath>

#include "water/equations/gibbs.hpp"
#include "water/equations/helmholtz.hpp"

namespace busbar::water {

/// m3/kg, J/kg, J/(kg K).
struct Properties {
  double volume = 0;
  double enthalpy = 0;
  double entropy = 0;
};

/// `from` at weight 0, `to` at weight 1, both to the last bit, and linear in between.
inline double mixed(double from, double to, double weight) {
  const double width = to - from;
  return weight < 0.5 ? from + weight * width : to - (1 - weight) * width;
}

inline Properties mixed(const Properties& from, const Properties& to, double weight) {
  return {mixed(from.volume, to.volume, weight), mixed(from.enthalpy, to.enthalpy, weight),
          mixed(from.entropy, to.entropy, weight)};
}

/// Properties at pressure (Pa) and temperature (K) by the equation of region 1, 2 or 5.
template <class Equation>
inline Properties gibbs_properties(double pressure, double temperature) {
  const double pi = pressure / Equation::kReducingPressure;
  const double tau = Equation::kReducingTemperature / temperature;
  const Gibbs<double> g = Equation::template at<kValue | kX | kY>(pi, tau);
  Properties out;
  out.volume = kGasConstant * temperature / pressure * g.pi_pi1;
  out.enthalpy = kGasConstant * Equation::kReducingTemperature * g.tau1;
  double potential = g.g;
  if constexpr (Equation::kHasLogarithm) potential += std::log(pi);
  out.entropy = kGasConstant * (tau * g.tau1 - potential);
  return out;
}

// One copy of each (properties.cpp): a value at a boundary is the same number wherever it is asked
// for.
Properties properties_1(double pressure, double temperature);
Properties properties_2(double pressure, double temperature);
Properties properties_5(double pressure, double temperature);

/// Properties at density (kg/m3) and temperature (K) by the equation of region 3.
Properties properties_3(double density, double temperature);

}  // namespace busbar::water
