// The few operations beyond + - * / that the kernels use, for plain numbers. batch/lanes.hpp has
// the same ones for the lanes of a vector.
#pragma once

#include <bit>
#include <cmath>
#include <cstdint>
#include <limits>

namespace busbar::water {

inline double select(bool condition, double yes, double no) { return condition ? yes : no; }
inline double root(double x) { return std::sqrt(x); }
inline double magnitude(double x) { return std::abs(x); }

#include "water/kernels/binary.hpp"

/// x = mantissa 2^exponent with the mantissa between sqrt(1/2) and sqrt(2), for x above zero. (The
/// lanes of a vector take normal numbers only.)
inline Split<double> split(double x) {
  const bool subnormal = x < std::numeric_limits<double>::min();
  const auto bits = std::bit_cast<std::uint64_t>(subnormal ? x * 0x1p54 : x);
  const std::uint64_t biased = (bits - kRootOfHalf + kOne) >> kMantissaBits;
  const double exponent = std::bit_cast<double>(biased | kTwoTo52) - kBiasedTwoTo52;
  return {subnormal ? exponent - 54 : exponent,
          std::bit_cast<double>(bits + kOne - (biased << kMantissaBits))};
}

/// The upper 32 of the 64 bits of x > 0, as a number.
inline double upper_half(double x) {
  return static_cast<double>(std::bit_cast<std::uint64_t>(x) >> 32U);
}

}  // namespace busbar::water
