#include "electrical/motor_classes.hpp"

#include <array>
#include <cmath>

#include "core/text.hpp"
#include "electrical/tables/motor_classes.hpp"

namespace busbar::electrical {
namespace {

// 0.75 kW and 750 W are one power.
bool same_power(double a, double b) { return std::abs(a - b) <= 1e-12 * b; }

}  // namespace

std::optional<std::size_t> efficiency_class_named(std::string_view word) {
  constexpr std::array<std::string_view, 4> kNames{"IE1", "IE2", "IE3", "IE4"};
  for (std::size_t i = 0; i < kNames.size(); ++i) {
    if (equal_ignoring_case(trimmed(word), kNames[i])) return i;
  }
  return std::nullopt;
}

Outcome<double> class_efficiency(std::size_t efficiency_class, double rated_power, double poles,
                                 double frequency) {
  if (poles != 4) {
    return Failure{Fault::outside_range,
                   3,
                   "{0} is not 4: only the table of motors with 4 poles is carried here",
                   {{{poles, Quantity::number}}}};
  }
  if (frequency != 50) {
    return Failure{Fault::outside_range,
                   4,
                   "{0} is not 50 Hz: only the table for that frequency is carried here",
                   {{{frequency, Quantity::frequency}}}};
  }
  const double kilowatts = rated_power / 1e3;
  for (const auto& line : tables::kFourPoles50Hz) {
    if (same_power(kilowatts, line.kilowatts)) return line.percent[efficiency_class] / 100;
  }
  const auto& last = tables::kFourPoles50Hz.back();
  if (kilowatts > last.kilowatts) return last.percent[efficiency_class] / 100;
  if (efficiency_class >= tables::kBetween.size()) {
    return Failure{Fault::outside_range,
                   2,
                   "{0} stands between the powers of the table, and for IE4 no formula between "
                   "them is carried here",
                   {{{rated_power, Quantity::component_power}}}};
  }
  const auto& c = tables::kBetween[efficiency_class];
  const double lg = std::log10(kilowatts);
  const double percent = ((c[0] * lg + c[1]) * lg + c[2]) * lg + c[3];
  return std::round(percent * 10) / 1000;
}

}  // namespace busbar::electrical
