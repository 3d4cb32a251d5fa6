#include "electrical/excitation_sense.hpp"

#include <cmath>

#include "core/text.hpp"

namespace busbar::electrical {

std::optional<Sense> sense_named(std::string_view word) {
  for (const std::string_view name : {"lagging", "overexcited"}) {
    if (equal_ignoring_case(trimmed(word), name)) return Sense::lagging;
  }
  for (const std::string_view name : {"leading", "underexcited"}) {
    if (equal_ignoring_case(trimmed(word), name)) return Sense::leading;
  }
  return std::nullopt;
}

double signed_sine(double power_factor, Sense sense) {
  const double sine = std::sqrt((1 - power_factor) * (1 + power_factor));
  return sense == Sense::lagging ? sine : -sine;
}

}  // namespace busbar::electrical
