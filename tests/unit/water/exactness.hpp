// How well an answer satisfies the basic equations.
#pragma once

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

#include "water/constants.hpp"
#include "water/equations/helmholtz.hpp"
#include "water/solve/properties.hpp"
#include "water/state.hpp"

namespace busbar::water::testing {

/// The reducing temperature T* of the equation of a region: R7-97(2012), equations 7, 15, 28
/// and 32.
inline double reducing_temperature(Region region) {
  switch (region) {
    case Region::liquid:
      return 1386;
    case Region::vapour:
      return 540;
    case Region::high_temperature:
      return 1000;
    default:
      return kCriticalTemperature;
  }
}

/// The agreed bound: max(1e-10 relative, 1e-10 R T*).
inline double enthalpy_tolerance(const State& state) {
  return 1e-10 *
         std::max(std::abs(state.enthalpy), kGasConstant * reducing_temperature(state.region));
}

inline double entropy_tolerance(const State& state) {
  return 1e-10 * std::max(std::abs(state.entropy), kGasConstant);
}

/// The basic equation at the answer: at its pressure and temperature, in region 3 at its density
/// and temperature.
inline Properties basic_equation(const State& state) {
  switch (state.region) {
    case Region::liquid:
      return properties_1(state.pressure, state.temperature);
    case Region::vapour:
      return properties_2(state.pressure, state.temperature);
    case Region::high_temperature:
      return properties_5(state.pressure, state.temperature);
    case Region::near_critical:
      return properties_3(1 / state.volume, state.temperature);
    default:
      return {};
  }
}

/// Equation 28: pressure (Pa) at density (kg/m3) and temperature (K).
inline double pressure_3(double density, double temperature) {
  const auto f =
      Region3Equation::at<kX>(density / kCriticalDensity, kCriticalTemperature / temperature);
  return density * kGasConstant * temperature * f.delta1;
}

/// Asserts that a single-phase answer satisfies its basic equation to the agreed bound.
inline void expect_exact(const State& state) {
  const Properties basic = basic_equation(state);
  EXPECT_NEAR(basic.enthalpy, state.enthalpy, enthalpy_tolerance(state))
      << "p " << state.pressure << ", T " << state.temperature;
  EXPECT_NEAR(basic.entropy, state.entropy, entropy_tolerance(state))
      << "p " << state.pressure << ", T " << state.temperature;
  EXPECT_NEAR(basic.volume, state.volume, 1e-10 * state.volume)
      << "p " << state.pressure << ", T " << state.temperature;
  if (state.region == Region::near_critical) {
    EXPECT_NEAR(pressure_3(1 / state.volume, state.temperature), state.pressure,
                1e-10 * state.pressure)
        << "p " << state.pressure << ", T " << state.temperature;
  }
}

}  // namespace busbar::water::testing
