#include "water/diagram/axes.hpp"

#include <algorithm>
#include <cmath>
#include <string>

namespace busbar::water::diagram {

std::optional<Axes> axes_named(std::string_view word) {
  std::string small(word);
  std::transform(small.begin(), small.end(), small.begin(), [](char c) {
    return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c;
  });
  if (small == "h-s") return Axes::enthalpy_entropy;
  if (small == "t-s") return Axes::temperature_entropy;
  if (small == "p-h") return Axes::pressure_enthalpy;
  if (small == "log p-h") return Axes::log_pressure_enthalpy;
  return std::nullopt;
}

Axis abscissa(Axes axes) {
  if (axes == Axes::enthalpy_entropy || axes == Axes::temperature_entropy) {
    return {"entropy", Quantity::entropy, &State::entropy};
  }
  return {"enthalpy", Quantity::enthalpy, &State::enthalpy};
}

Axis ordinate(Axes axes) {
  switch (axes) {
    case Axes::enthalpy_entropy:
      return {"enthalpy", Quantity::enthalpy, &State::enthalpy};
    case Axes::temperature_entropy:
      return {"temperature", Quantity::temperature, &State::temperature};
    default:
      return {"pressure", Quantity::pressure, &State::pressure};
  }
}

Place place_of(Axes axes, const State& state) {
  const double y = state.*ordinate(axes).property;
  return {state.*abscissa(axes).property, axes == Axes::log_pressure_enthalpy ? std::log10(y) : y};
}

}  // namespace busbar::water::diagram
