// The diagrams on which lines of a fluid are drawn.
#pragma once

#include <cstdint>
#include <optional>
#include <string_view>

#include "core/quantity.hpp"
#include "water/state.hpp"

namespace busbar::water::diagram {

/// Ordinate first, as the trade names them: "h-s" has the enthalpy over the entropy.
enum class Axes : std::uint8_t {
  enthalpy_entropy,
  temperature_entropy,
  pressure_enthalpy,
  log_pressure_enthalpy
};

/// "h-s", "T-s", "p-h" or "log p-h", capitals or not; nullopt for any other word.
std::optional<Axes> axes_named(std::string_view word);

/// One of the two axes: which property a state shows on it.
struct Axis {
  const char* name;
  Quantity quantity;
  double State::*property;
};

Axis abscissa(Axes axes);
Axis ordinate(Axes axes);

/// Where a state stands on the paper. A logarithmic axis has the decimal logarithm here; the
/// scale is that of SI.
struct Place {
  double x = 0;
  double y = 0;
};

Place place_of(Axes axes, const State& state);

}  // namespace busbar::water::diagram
