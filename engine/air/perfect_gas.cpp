#include "air/perfect_gas.hpp"

#include <cmath>

#include "water/failure.hpp"

namespace busbar::air {
namespace {

using water::make_failure;

constexpr double kZero = 273.15;  // K
constexpr double kRatio = 0.621945;

// Failure: the vapour pressure is not below the pressure of the air; `argument` has the
// temperature.
Failure boils(double pressure, double temperature, double vapour, std::uint8_t argument) {
  return make_failure(Fault::impossible, argument,
                      "{0} has no saturated air: the vapour pressure of water, {1}, is not below "
                      "the pressure of the air, {2}",
                      {temperature, Quantity::temperature}, {vapour, Quantity::pressure},
                      {pressure, Quantity::pressure});
}

}  // namespace

double hyland_wexler_pressure(double temperature) {
  const double t = temperature;
  if (t < kZero) {
    return std::exp(
        -0.56745359e4 / t + 0.63925247e1 +
        t * (-0.96778430e-2 + t * (0.62215701e-6 + t * (0.20747825e-8 - t * 0.94840240e-12))) +
        0.41635019e1 * std::log(t));
  }
  return std::exp(-0.58002206e4 / t + 0.13914993e1 +
                  t * (-0.48640239e-1 + t * (0.41764768e-4 - t * 0.14452093e-7)) +
                  0.65459673e1 * std::log(t));
}

Outcome<double> perfect_gas_humidity_ratio(double pressure, double temperature,
                                           double relative_humidity) {
  const double vapour = hyland_wexler_pressure(temperature);
  if (!(vapour < pressure)) return boils(pressure, temperature, vapour, 2);
  const double partial = relative_humidity * vapour;
  return kRatio * partial / (pressure - partial);
}

Outcome<double> perfect_gas_humidity_ratio_at_wet_bulb(double pressure, double temperature,
                                                       double wet_bulb) {
  if (wet_bulb > temperature) {
    return make_failure(Fault::impossible, 3, "{0} is above the dry bulb, {1}",
                        {wet_bulb, Quantity::temperature}, {temperature, Quantity::temperature});
  }
  const auto saturated = perfect_gas_humidity_ratio(pressure, wet_bulb, 1);
  if (!saturated) return saturated.failure().about(3);
  const double t = temperature - kZero;
  const double wet = wet_bulb - kZero;
  const bool frozen = wet < 0;
  const double numerator =
      (frozen ? 2830 - 0.24 * wet : 2501 - 2.326 * wet) * *saturated - 1.006 * (t - wet);
  if (numerator < 0) {
    return make_failure(Fault::impossible, 3,
                        "{0} is lower than completely dry air of {1} could show",
                        {wet_bulb, Quantity::temperature}, {temperature, Quantity::temperature});
  }
  return numerator / (frozen ? 2830 + 1.86 * t - 2.1 * wet : 2501 + 1.86 * t - 4.186 * wet);
}

double perfect_gas_enthalpy(double temperature, double humidity_ratio) {
  const double t = temperature - kZero;
  return 1e3 * (1.006 * t + humidity_ratio * (2501 + 1.86 * t));
}

}  // namespace busbar::air
