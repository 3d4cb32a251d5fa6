#include "fluid/condensation.hpp"

#include <cmath>

#include "water/state.hpp"
#include "water/transport/surface.hpp"

namespace busbar::fluid {
namespace {

constexpr double kFreezing = 273.15;
constexpr double kCritical = 647.096;
constexpr double kColdestIce = 50;
// A gas that was put together as saturated is saturated, whatever the last digits say.
constexpr double kSaturated = 1e-9;
constexpr int kMostSteps = 60;

Failure condensed(double temperature, double dew) {
  return {Fault::impossible,
          3,
          dew < kFreezing
              ? "{0} is below the frost point {1}: part of the water is ice, and no single-phase "
                "value is right"
              : "{0} is below the dew point {1}: part of the water is liquid, and no single-phase "
                "value is right",
          {{{temperature, Quantity::temperature}, {dew, Quantity::temperature}}}};
}

// Halving in 1/T, over which ln p is nearly a straight line.
Outcome<double> frost_point(double partial) {
  double low = kColdestIce;
  double high = kFreezing;
  for (int i = 0; i < kMostSteps; ++i) {
    const double middle = 2 / (1 / low + 1 / high);
    const Outcome<double> pressure = water::sublimation_pressure(middle);
    if (!pressure) return pressure.failure();
    (*pressure < partial ? low : high) = middle;
  }
  return (low + high) / 2;
}

}  // namespace

Outcome<double> water_saturation_pressure(double temperature) {
  return temperature < kFreezing ? water::sublimation_pressure(temperature)
                                 : water::saturation_pressure(temperature);
}

Outcome<double> dew_point(const gas::Mixture& mixture, double pressure) {
  const double fraction = mixture.mole_fraction(gas::Species::H2O);
  if (fraction == 0) return Failure{Fault::missing, 1, "holds no water: there is no dew point"};
  const double partial = fraction * pressure;
  static const double freezing = *water::saturation_pressure(kFreezing);
  static const double coldest = *water::sublimation_pressure(kColdestIce);
  const Measure measure{partial, Quantity::pressure};
  if (partial < coldest) {
    return Failure{Fault::outside_range,
                   2,
                   "leaves water a partial pressure of {0}, less than ice has at {1}",
                   {{measure, {kColdestIce, Quantity::temperature}}}};
  }
  if (partial < freezing) return frost_point(partial);
  const Outcome<double> boiling = water::saturation_temperature(partial);
  if (boiling) return *boiling;
  return Failure{
      Fault::outside_range,
      2,
      "leaves water a partial pressure of {0}, which is above the critical one: there is "
      "no dew point",
      {{measure}}};
}

Failure check_condensation(const gas::Mixture& mixture, double pressure, double temperature) {
  if (temperature >= kCritical) return {};
  const double fraction = mixture.mole_fraction(gas::Species::H2O);
  if (fraction == 0) return {};
  const Outcome<double> saturation = water_saturation_pressure(temperature);
  if (!saturation || fraction * pressure <= *saturation * (1 + kSaturated)) return {};
  const Outcome<double> dew = dew_point(mixture, pressure);
  return condensed(temperature, dew ? *dew : kCritical);
}

}  // namespace busbar::fluid
