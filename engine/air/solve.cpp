#include "air/solve.hpp"

#include <algorithm>
#include <cmath>

#include "water/solve/root.hpp"

namespace busbar::air {
namespace {

constexpr int kSecantCap = 12;

}  // namespace

std::optional<double> find_root(const std::function<double(double)>& f, const Search& search) {
  double x = std::clamp(search.start, search.low, search.high);
  double value = f(x);
  double slope = search.slope;
  for (int i = 0; i < kSecantCap && value != 0; ++i) {
    const double next = std::clamp(x - value / slope, search.low, search.high);
    if (std::abs(next - x) <= search.tolerance) return next;
    const double next_value = f(next);
    slope = (next_value - value) / (next - x);
    x = next;
    value = next_value;
    if (!std::isfinite(slope) || slope == 0) break;
  }
  if (value == 0) return x;
  return water::root_between(f, search.low, search.high);
}

}  // namespace busbar::air
