// Temperature from pressure and enthalpy or entropy inside one region, started by the backward
// equations and carried to the solution of the basic equation.
#pragma once

#include "water/solve/given.hpp"
#include "water/solve/properties.hpp"

namespace busbar::water {

template <Given kGiven>
inline double given_of(const Properties& properties) {
  if constexpr (kGiven == Given::enthalpy) {
    return properties.enthalpy;
  } else {
    return properties.entropy;
  }
}

/// A state found on an isobar. The given property is kept exactly; the others are those of the
/// basic equation at the solution. `evaluations` counts how often the basic equation was evaluated.
struct Inverse {
  double temperature = 0;
  Properties properties;
  int evaluations = 0;
  bool converged = false;
};

/// Evaluations after which an iteration gives up (no_convergence). Tests hold the worst case far
/// below.
inline constexpr int kInverseCap = 40;

/// Region 1, 2 or 5 between two temperatures (K). Where the value lies outside what the equation
/// has there, the iteration runs against a limit a little outside and does not converge.
template <class Equation, Given kGiven>
Inverse invert_gibbs(double pressure, double value, double start, double lowest, double highest);

/// Region 3 at a pressure (Pa), from the backward equations of SR3-03(2014). The answer satisfies
/// equation 28 for both the pressure and the given property.
template <Given kGiven>
Inverse invert_region_3(double pressure, double value);

}  // namespace busbar::water
