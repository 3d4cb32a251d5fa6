// Lines that end in the critical point.
#include <algorithm>
#include <cmath>

#include "water/constants.hpp"
#include "water/diagram/lines.hpp"
#include "water/failure.hpp"
#include "water/pairs.hpp"

namespace busbar::water::diagram {

namespace {

// Near the critical point saturated states move with the square root of Tc - T: over that root
// they are smooth.
double root_of(double temperature) { return std::sqrt(kCriticalTemperature - temperature); }

Outcome<Stretch> constant_dryness(double dryness, double from, double to) {
  const Outcome<State> first = at_temperature_dryness(from, dryness);
  if (!first) return first.failure();
  const Outcome<State> last = at_temperature_dryness(to, dryness);
  if (!last) return last.failure();
  const double coldest = std::fmin(from, to);
  Stretch stretch;
  stretch.from = root_of(from);
  stretch.to = root_of(to);
  stretch.first = *first;
  stretch.last = *last;
  stretch.at = [dryness, coldest](double root) {
    const double temperature = kCriticalTemperature - root * root;
    return at_temperature_dryness(std::clamp(temperature, coldest, kCriticalTemperature), dryness);
  };
  return stretch;
}

}  // namespace

Outcome<Points> saturation_dome(Axes axes, std::size_t points) {
  const Outcome<Stretch> boiling = constant_dryness(0, kLowestTemperature, kCriticalTemperature);
  if (!boiling) return boiling.failure();
  const Outcome<Stretch> dry = constant_dryness(1, kCriticalTemperature, kLowestTemperature);
  if (!dry) return dry.failure();
  return points_of({*boiling, *dry}, axes, points, 2, 0);
}

Outcome<Points> dryness_line(Axes axes, double dryness, double from, double to,
                             std::size_t points) {
  if (!(from < to)) {
    return make_failure(Fault::impossible, 4, "{0} is not above {1}, where the line begins",
                        {to, Quantity::temperature}, {from, Quantity::temperature});
  }
  for (const auto& [input, temperature] :
       {std::pair{std::uint8_t{3}, from}, {std::uint8_t{4}, to}}) {
    const Outcome<double> pressure = saturation_pressure(temperature);
    if (!pressure) return pressure.failure().about(input);
  }
  const Outcome<Stretch> line = constant_dryness(dryness, from, to);
  if (!line) return line.failure().about(2);
  return points_of({*line}, axes, points, 5, 2);
}

}  // namespace busbar::water::diagram
