#include "electrical/resistance.hpp"

#include "core/text.hpp"

namespace busbar::electrical {
namespace {

constexpr double kCelsiusZero = 273.15;

// Temperature below 0 °C at which the resistance, drawn on as a straight line, would vanish.
double vanishing(Conductor conductor) { return conductor == Conductor::copper ? 235 : 225; }

}  // namespace

std::optional<Conductor> conductor_named(std::string_view word) {
  const std::string_view name = trimmed(word);
  if (equal_ignoring_case(name, "copper")) return Conductor::copper;
  if (equal_ignoring_case(name, "aluminium") || equal_ignoring_case(name, "aluminum")) {
    return Conductor::aluminium;
  }
  return std::nullopt;
}

double resistance_ratio(double from, double to, Conductor conductor) {
  const double zero = vanishing(conductor) - kCelsiusZero;
  return (zero + to) / (zero + from);
}

Outcome<double> temperature_from_resistance(double cold_resistance, double cold_temperature,
                                            double hot_resistance, Conductor conductor) {
  const double zero = vanishing(conductor) - kCelsiusZero;
  const double hot = hot_resistance / cold_resistance * (zero + cold_temperature) - zero;
  if (!(hot >= kColdestWinding) || !(hot <= kHottestWinding)) {
    return Failure{Fault::impossible,
                   3,
                   "{0} against {1} cold would be a winding at {2}",
                   {{{hot_resistance, Quantity::resistance},
                     {cold_resistance, Quantity::resistance},
                     {hot, Quantity::temperature}}}};
  }
  return hot;
}

double stator_copper_loss(double line_current, double line_resistance, double measured_at,
                          double stated) {
  return 1.5 * line_current * line_current * line_resistance *
         resistance_ratio(measured_at, stated, Conductor::copper);
}

double field_copper_loss(double field_current, double resistance, double measured_at,
                         double stated) {
  return field_current * field_current * resistance *
         resistance_ratio(measured_at, stated, Conductor::copper);
}

std::optional<double> reference_temperature(std::string_view thermal_class) {
  const std::string_view name = trimmed(thermal_class);
  if (equal_ignoring_case(name, "B") || name == "130") return kCelsiusZero + 95;
  if (equal_ignoring_case(name, "F") || name == "155") return kCelsiusZero + 115;
  return std::nullopt;
}

}  // namespace busbar::electrical
