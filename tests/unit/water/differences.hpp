// Derivatives by differences with an estimate of their own error.
#pragma once

#include <algorithm>
#include <cmath>

namespace busbar::water::testing {

struct Slope {
  double value = 0;
  double error = 0;
};

/// df/dx by central differences of the fourth order with steps h and h/2. The error is what the two
/// differ by, plus what a relative rounding of `rounding` in f makes over the step.
template <class F>
Slope slope(const F& f, double x, double step, double rounding) {
  const auto difference = [&](double h) {
    return (8 * (f(x + h) - f(x - h)) - (f(x + 2 * h) - f(x - 2 * h))) / (12 * h);
  };
  const double wide = difference(step);
  const double narrow = difference(step / 2);
  const double size = std::max(std::abs(f(x + step)), std::abs(f(x - step)));
  return {narrow, std::abs(wide - narrow) + 4 * rounding * size / step};
}

}  // namespace busbar::water::testing
