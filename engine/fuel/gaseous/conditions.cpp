#include "fuel/gaseous/conditions.hpp"

#include <array>
#include <cmath>

#include "fuel/gaseous/component.hpp"

namespace busbar::fuel::gaseous {
namespace {

constexpr double kSixtyFahrenheit = (60 + 459.67) * 5 / 9;
constexpr std::array<double, kCombustionTemperatures> kTemperatures{
    273.15, 288.15, kSixtyFahrenheit, 293.15, 298.15};

// 15.55 °C and 15.56 °C mean 60 °F; the others are written exactly, but for the unit conversion.
constexpr double kWithinFahrenheit = 0.01;
constexpr double kWithin = 1e-6;

// The column of a temperature among the first `count`, or `count`.
std::size_t column_of(double temperature, std::size_t count) {
  for (std::size_t i = 0; i < count; ++i) {
    const double within = kTemperatures[i] == kSixtyFahrenheit ? kWithinFahrenheit : kWithin;
    if (std::abs(temperature - kTemperatures[i]) <= within) return i;
  }
  return count;
}

}  // namespace

Outcome<Combustion> combustion_at(double temperature) {
  const std::size_t column = column_of(temperature, kCombustionTemperatures);
  if (column < kCombustionTemperatures) return Combustion{column};
  return Failure{
      Fault::outside_range,
      1,
      "{0} is no combustion temperature of ISO 6976: 0 °C, 15 °C, 20 °C, 25 °C and 60 °F "
      "(15.55 °C) are",
      {{{temperature, Quantity::temperature}}}};
}

Outcome<Metering> metering_at(double temperature, double pressure) {
  const std::size_t column = column_of(temperature, kMeteringTemperatures);
  if (column == kMeteringTemperatures) {
    return Failure{
        Fault::outside_range,
        1,
        "{0} is no metering temperature of ISO 6976: 0 °C, 15 °C, 20 °C and 60 °F (15.55 "
        "°C) are",
        {{{temperature, Quantity::temperature}}}};
  }
  if (!(pressure >= kLeastPressure && pressure <= kGreatestPressure)) {
    return Failure{Fault::outside_range,
                   2,
                   "{0} is outside {1} to {2}, where ISO 6976 holds",
                   {{{pressure, Quantity::pressure},
                     {kLeastPressure, Quantity::pressure},
                     {kGreatestPressure, Quantity::pressure}}}};
  }
  return Metering{column, kTemperatures[column], pressure};
}

}  // namespace busbar::fuel::gaseous
