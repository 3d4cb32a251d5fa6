// One root finder for the inverses of humid air.
#pragma once

#include <functional>
#include <optional>

namespace busbar::air {

/// Where and how to look for a root.
struct Search {
  double low = 0;
  double high = 0;
  double start = 0;
  double slope = 1;      ///< an estimate of the derivative at the start
  double tolerance = 0;  ///< of the last step
};

/// The root of a smooth monotone function: secant steps from a good start, which reach it in four
/// or five evaluations, and the bracket by Boost.Math when they do not. Nothing when the cap is
/// reached. A root outside gives the nearer end: callers look at the ends first.
std::optional<double> find_root(const std::function<double(double)>& f, const Search& search);

}  // namespace busbar::air
