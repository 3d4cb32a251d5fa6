// Random states with fixed seeds, the same on every machine and compiler (the standard library's
// distributions are not).
#pragma once

#include <cmath>
#include <cstdint>
#include <random>

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

}  // namespace busbar::water::testing
