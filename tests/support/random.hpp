// Random numbers that are the same in every run.
#pragma once

#include <cmath>
#include <cstddef>
#include <cstdint>
#include <random>
#include <string>

namespace busbar::support {

class Random {
 public:
  explicit Random(std::uint64_t seed) : engine_(seed) {}

  /// Uniform in [low, high). Written out, because std::uniform_real_distribution is not the same in
  /// every library.
  double uniform(double low, double high) {
    return low + (high - low) * (static_cast<double>(engine_() >> 11U) * 0x1p-53);
  }
  /// Uniform in the logarithm.
  double logarithmic(double low, double high) {
    return std::exp(uniform(std::log(low), std::log(high)));
  }
  std::size_t below(std::size_t count) { return static_cast<std::size_t>(engine_() % count); }
  bool chance(double probability) { return uniform(0, 1) < probability; }
  std::uint64_t bits() { return engine_(); }
  std::string bytes(std::size_t count) {
    std::string text;
    for (std::size_t i = 0; i < count; ++i) text += static_cast<char>(engine_() & 0xFFU);
    return text;
  }

 private:
  std::mt19937_64 engine_;
};

}  // namespace busbar::support
