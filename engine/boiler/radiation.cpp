#include "boiler/radiation.hpp"

#include <array>
#include <cmath>

#include "core/text.hpp"

namespace busbar::boiler {
namespace {

constexpr double kMega = 1e6;
constexpr double kExponent = 0.7;

constexpr std::array<RadiationClass, 3> kClasses{{
    {"oil and gas", 0.0113, true},
    {"hard coal", 0.022, false},
    {"lignite and fluidised bed", 0.0315, true},
}};

}  // namespace

std::optional<RadiationClass> radiation_class_named(std::string_view name) {
  for (const RadiationClass& known : kClasses) {
    if (equal_ignoring_case(known.name, name)) return known;
  }
  return std::nullopt;
}

double radiation_loss(const RadiationClass& fuel, double greatest_useful_output) {
  return fuel.coefficient * std::pow(greatest_useful_output / kMega, kExponent) * kMega;
}

}  // namespace busbar::boiler
