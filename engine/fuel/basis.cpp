#include "fuel/basis.hpp"

#include "core/text.hpp"

namespace busbar::fuel {

std::optional<Basis> basis_named(std::string_view word) {
  for (const std::string_view name : {"HHV", "GCV"}) {
    if (equal_ignoring_case(word, name)) return Basis::higher;
  }
  for (const std::string_view name : {"LHV", "NCV"}) {
    if (equal_ignoring_case(word, name)) return Basis::lower;
  }
  return std::nullopt;
}

Outcome<double> energy_ratio(Basis from, Basis to, double higher, double lower) {
  if (lower > higher) {
    return Failure{Fault::impossible,
                   5,
                   "{0} is above the higher heating value {1}",
                   {{{lower, Quantity::same_unit}, {higher, Quantity::same_unit}}}};
  }
  const double before = from == Basis::higher ? higher : lower;
  const double after = to == Basis::higher ? higher : lower;
  return after / before;
}

}  // namespace busbar::fuel
