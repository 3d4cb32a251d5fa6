// Putting states together in the solvers.
#pragma once

#include <algorithm>

#include "water/constants.hpp"
#include "water/failure.hpp"
#include "water/solve/properties.hpp"
#include "water/state.hpp"

namespace busbar::water {

inline State assembled(Region region, double pressure, double temperature, const Properties& at) {
  State state;
  state.pressure = pressure;
  state.temperature = temperature;
  state.volume = at.volume;
  state.enthalpy = at.enthalpy;
  state.entropy = at.entropy;
  state.region = region;
  return state;
}

/// Pressure (Pa) of equation 28 at density (kg/m3) and temperature (K).
inline double pressure_of_region_3(double density, double temperature) {
  const auto f =
      Region3Equation::at<kX>(density / kCriticalDensity, kCriticalTemperature / temperature);
  return density * kGasConstant * temperature * f.delta1;
}

/// A point between the two sides of a seam, where one given property lies in the gap.
inline State in_gap(Region lower_number, double pressure, double temperature,
                    const Properties& from, const Properties& to, double weight) {
  return assembled(lower_number, pressure, temperature,
                   mixed(from, to, std::clamp(weight, 0.0, 1.0)));
}

inline Failure not_converged() {
  return make_failure(Fault::no_convergence, 0, "the iteration of IAPWS-IF97 did not converge");
}

inline Failure not_finite(std::uint8_t argument, Measure value) {
  return make_failure(Fault::outside_range, argument, "{0} is not a finite number", value);
}

}  // namespace busbar::water
