// Radiation and convection loss of a steam boiler's casing.
#pragma once

#include <optional>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::boiler {

/// Q_RC = C Q_N^0.7, both in MW, with Q_N the boiler's maximum useful heat output.
/// Source: EN 12952-15:2003, clause 8. C for hard coal and the exponent are printed in a public
/// source; the two other values of C are from memory.
struct RadiationClass {
  std::string_view name;
  double coefficient;
  bool from_memory;
};

std::optional<RadiationClass> radiation_class_named(std::string_view name);

/// Loss (W) at the maximum useful heat output (W).
double radiation_loss(const RadiationClass& fuel, double greatest_useful_output);

}  // namespace busbar::boiler
