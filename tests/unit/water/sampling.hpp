// Random states with fixed seeds, the same on every machine and compiler (the standard library's
// distributions are not).
#pragma once

#include <cmath>
#include <cstdint>
#include <random>

#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/state.hpp"

namespace busbar::water::testing {

class Sampler {
 public:
  explicit Sampler(std::uint64_t seed) : engine_(seed) {}

  /// Uniform from 0 to 1.
  double share() { return static_cast<double>(engine_() >> 11) * 0x1p-53; }

  double between(double low, double high) { return low + (high - low) * share(); }

  /// Uniform in the logarithm.
  double log_between(double low, double high) {
    return std::exp(between(std::log(low), std::log(high)));
  }

 private:
  std::mt19937_64 engine_;
};

struct Point {
  double pressure;
  double temperature;
};

/// A point within 1e-6 of a boundary: with `turn` counting, the seams 1/3, 2/3 and 2/5 and the
/// saturation line from `lowest` (K) to 646 K follow each other.
inline Point near_a_boundary(Sampler& sampler, int turn, double lowest) {
  const double hair = sampler.between(-1e-6, 1e-6);
  switch (turn % 4) {
    case 0:
      return {sampler.between(kPressure13, kHighestPressure), kTemperature13 * (1 + hair)};
    case 1: {
      const double p = sampler.between(kPressure13 * 1.0001, kHighestPressure);
      return {p, boundary_23_temperature(p) * (1 + hair)};
    }
    case 2:
      return {sampler.log_between(1, kHighestPressure5), kHighestTemperature2 * (1 + hair)};
    default: {
      const double t = sampler.between(lowest, 646);
      return {*saturation_pressure(t) * (1 + hair), t};
    }
  }
}

}  // namespace busbar::water::testing
