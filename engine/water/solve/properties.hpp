// Volume, enthalpy and entropy from the basic equations, in SI.
#pragma once

#include "water/equations/gibbs.hpp"
#include "water/equations/helmholtz.hpp"
#include "water/equations/logarithm.hpp"
#include "water/solve/given.hpp"

namespace busbar::water {

// In the order of use.
// clang-format off
#include "water/kernels/properties.hpp"
#include "water/kernels/inverse.hpp"
// clang-format on

using Properties = PropertiesOf<double>;

inline double mixed(double from, double to, double weight) { return mixed_at(from, to, weight); }

inline Properties mixed(const Properties& from, const Properties& to, double weight) {
  return {mixed(from.volume, to.volume, weight), mixed(from.enthalpy, to.enthalpy, weight),
          mixed(from.entropy, to.entropy, weight)};
}

/// All three at pressure (Pa) and temperature (K) by the equation of region 1, 2 or 5.
template <class Equation>
inline Properties gibbs_properties(double pressure, double temperature) {
  return gibbs_properties_at<Equation, kAllOutputs>(pressure, temperature);
}

// One copy of each (properties.cpp): a value at a boundary is the same number wherever it is asked
// for.
Properties properties_1(double pressure, double temperature);
Properties properties_2(double pressure, double temperature);
Properties properties_5(double pressure, double temperature);

/// Properties at density (kg/m3) and temperature (K) by the equation of region 3.
Properties properties_3(double density, double temperature);

}  // namespace busbar::water
