// Isobars and isotherms.
#include <cmath>

#include "water/constants.hpp"
#include "water/diagram/lines.hpp"
#include "water/failure.hpp"
#include "water/pairs.hpp"

namespace busbar::water::diagram {

namespace {

// A corner nearer to an end of its line than this share is that end.
constexpr double kSame = 1e-9;

// Beyond every enthalpy.
constexpr double kNever = 1e300;

}  // namespace

Outcome<Points> isobar(Axes axes, double pressure, double from, double to, std::size_t points) {
  if (!(from < to)) {
    return make_failure(Fault::impossible, 4, "{0} is not above {1}, where the line begins",
                        {to, Quantity::temperature}, {from, Quantity::temperature});
  }
  const Outcome<State> first = at_pressure_temperature(pressure, from);
  if (!first) return first.failure().about(first.failure().argument == 1 ? 2 : 3);
  const Outcome<State> last = at_pressure_temperature(pressure, to);
  if (!last) return last.failure().about(4);

  Points corners{*first};
  const double margin = kSame * (last->enthalpy - first->enthalpy);
  double boiling = kNever;
  double dry = -kNever;
  if (pressure >= kLowestSaturationPressure && pressure <= kCriticalPressure) {
    for (const double dryness : {0.0, 1.0}) {
      const Outcome<State> saturated = at_pressure_dryness(pressure, dryness);
      if (!saturated) return saturated.failure().about(2);
      (dryness > 0 ? dry : boiling) = saturated->enthalpy;
      if (saturated->enthalpy > corners.back().enthalpy + margin &&
          saturated->enthalpy < last->enthalpy - margin) {
        corners.push_back(*saturated);
      }
    }
  }
  corners.push_back(*last);

  Course course;
  for (std::size_t i = 1; i < corners.size(); ++i) {
    const State& begin = corners[i - 1];
    const State& end = corners[i];
    const bool wet = begin.enthalpy >= boiling - margin && end.enthalpy <= dry + margin;
    const auto at = [pressure](double enthalpy) {
      return at_pressure_enthalpy(pressure, enthalpy);
    };
    course.push_back({begin.enthalpy, end.enthalpy, begin, end, at, wet});
  }
  return points_of(course, axes, points, 5, 2);
}

Outcome<Points> isotherm(Axes axes, double temperature, double from, double to,
                         std::size_t points) {
  if (!(from < to)) {
    return make_failure(Fault::impossible, 4, "{0} is not above {1}, where the line begins",
                        {to, Quantity::pressure}, {from, Quantity::pressure});
  }
  const Outcome<State> first = at_pressure_temperature(from, temperature);
  if (!first) return first.failure().about(first.failure().argument == 1 ? 3 : 2);
  const Outcome<State> last = at_pressure_temperature(to, temperature);
  if (!last) return last.failure().about(last.failure().argument == 1 ? 4 : 2);

  const auto in_one_phase = [temperature](double log_pressure) {
    return at_pressure_temperature(std::exp(log_pressure), temperature);
  };
  const auto wet = [temperature](double dryness) {
    return at_temperature_dryness(temperature, dryness);
  };
  Course course;
  State begin = *first;
  double begins = std::log(from);
  if (temperature <= kCriticalTemperature) {
    const Outcome<State> dry = at_temperature_dryness(temperature, 1);
    if (!dry) return dry.failure().about(2);
    const Outcome<State> boiling = at_temperature_dryness(temperature, 0);
    if (!boiling) return boiling.failure().about(2);
    const double saturation = dry->pressure;
    if (from < saturation * (1 - kSame) && to >= saturation * (1 - kSame)) {
      begins = std::log(saturation);
      course.push_back({std::log(from), begins, begin, *dry, in_one_phase});
      // What ends at saturation ends in saturated steam.
      if (to <= saturation * (1 + kSame)) return points_of(course, axes, points, 5, 2);
      if (dry->enthalpy > boiling->enthalpy) course.push_back({1, 0, *dry, *boiling, wet, true});
      begin = *boiling;
    }
  }
  course.push_back({begins, std::log(to), begin, *last, in_one_phase});
  return points_of(course, axes, points, 5, 2);
}

}  // namespace busbar::water::diagram
