// A root in a bracket, by Boost.Math, with a cap.
#pragma once

#include <boost/math/tools/toms748_solve.hpp>
#include <cmath>
#include <cstdint>
#include <optional>

namespace busbar::water {

/// Evaluations after which a bracketed root gives up.
inline constexpr std::uintmax_t kRootCap = 200;

/// The root of f between a and b to 50 bits. Where f does not change its sign there, the end with
/// the smaller value: callers bracket, but for rounding. Nothing when the cap is reached.
template <class F>
std::optional<double> root_between(const F& f, double a, double b) {
  const double at_a = f(a);
  const double at_b = f(b);
  if (at_a == 0) return a;
  if (at_b == 0) return b;
  if (!((at_a < 0) != (at_b < 0))) return std::abs(at_a) < std::abs(at_b) ? a : b;
  std::uintmax_t steps = kRootCap;
  const auto bracket = boost::math::tools::toms748_solve(
      f, a, b, at_a, at_b, boost::math::tools::eps_tolerance<double>(50), steps);
  if (steps >= kRootCap) return std::nullopt;
  return bracket.first + 0.5 * (bracket.second - bracket.first);
}

}  // namespace busbar::water
