#include "water/backward/pressure_hs.hpp"

#include <algorithm>
#include <cmath>

#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/equations/series.hpp"
#include "water/tables/backward_hs_1_2.hpp"
#include "water/tables/backward_hs_3.hpp"
#include "water/tables/backward_hs_boundaries.hpp"

namespace busbar::water::backward {

namespace {

template <const auto& kTable>
double sum(double x, double y) {
  return series<kTable, kValue>(x, y).value;
}

double power_4(double x) {
  const double square = x * x;
  return square * square;
}

// SR4-04(2014), sections 3.2 to 4.6: entropies J/(kg K) and enthalpies J/kg of named states.
constexpr double kCriticalEntropy = 4412.02148223476;
constexpr double kLiquidEntropy273 = -0.1545495919;
constexpr double kLiquidEntropy623 = 3778.281340;
constexpr double kVapourEntropy273 = 9155.759395;
constexpr double kVapourEntropy623 = 5210.887825;
constexpr double kEntropy2bc = 5850;
constexpr double kEntropy1At100MPa = 3397.782955;  // and 623.15 K
constexpr double kLowestEntropyB23 = 5048.096828;
constexpr double kHighestEntropyB23 = 5260.578707;
constexpr double kLowestEnthalpyB23 = 2563.592004e3;
constexpr double kHighestEnthalpyB23 = 2812.942061e3;

// Wet steam below s''(623.15 K): h - T s is the Gibbs energy of saturation. With 4.2 kJ/(kg K) for
// the heat capacity of boiling water, s' = c ln(T/T0) and g = -c (T ln(T/T0) - T + T0): not exact,
// but a start. Up to the temperature at which s' reaches the entropy the difference falls steadily.
double wet_start(double enthalpy, double entropy) {
  constexpr double kHeatCapacity = 4200;
  double low = kLowestTemperature;
  double high = std::clamp(kLowestTemperature * std::exp(entropy / kHeatCapacity),
                           kLowestTemperature, kCriticalTemperature);
  for (int k = 0; k < 16; ++k) {
    const double t = 0.5 * (low + high);
    const double gibbs =
        -kHeatCapacity * (t * std::log(t / kLowestTemperature) - (t - kLowestTemperature));
    (enthalpy - t * entropy > gibbs ? low : high) = t;
  }
  return saturation_pressure_equation(low);
}

double wet(double enthalpy, double entropy) {
  if (entropy < kVapourEntropy623) return wet_start(enthalpy, entropy);
  const double temperature = saturation_temperature_hs(enthalpy, entropy);
  return saturation_pressure_equation(
      std::clamp(temperature, kLowestTemperature, kCriticalTemperature));
}

}  // namespace

double pressure_hs_1(double enthalpy, double entropy) {
  return 100e6 * sum<tables::kPressureHs1>(enthalpy / 3400e3 + 0.05, entropy / 7600 + 0.05);
}

double boundary_2ab_enthalpy(double entropy) {
  constexpr const double* n = tables::kBoundary2abEnthalpy;
  const double s = entropy / 1000;
  return (((n[3] * s + n[2]) * s + n[1]) * s + n[0]) * 1000;
}

double pressure_hs_2a(double enthalpy, double entropy) {
  return 4e6 * power_4(sum<tables::kPressureHs2a>(enthalpy / 4200e3 - 0.5, entropy / 12e3 - 1.2));
}

double pressure_hs_2b(double enthalpy, double entropy) {
  return 100e6 *
         power_4(sum<tables::kPressureHs2b>(enthalpy / 4100e3 - 0.6, entropy / 7900 - 1.01));
}

double pressure_hs_2c(double enthalpy, double entropy) {
  return 100e6 * power_4(sum<tables::kPressureHs2c>(enthalpy / 3500e3 - 0.7, entropy / 5900 - 1.1));
}

double pressure_hs_3a(double enthalpy, double entropy) {
  return 99e6 * sum<tables::kPressureHs3a>(enthalpy / 2300e3 - 1.01, entropy / 4400 - 0.750);
}

double pressure_hs_3b(double enthalpy, double entropy) {
  return 16.6e6 / sum<tables::kPressureHs3b>(enthalpy / 2800e3 - 0.681, entropy / 5300 - 0.792);
}

double liquid_enthalpy_s_1(double entropy) {
  const double sigma = entropy / 3800;
  return 1700e3 * sum<tables::kLiquidEnthalpyS1>(sigma - 1.09, sigma + 0.366e-4);
}

double liquid_enthalpy_s_3a(double entropy) {
  const double sigma = entropy / 3800;
  return 1700e3 * sum<tables::kLiquidEnthalpyS3a>(sigma - 1.09, sigma + 0.366e-4);
}

double vapour_enthalpy_s_2ab(double entropy) {
  return 2800e3 *
         std::exp(sum<tables::kVapourEnthalpyS2ab>(5210 / entropy - 0.513, entropy / 9200 - 0.524));
}

double vapour_enthalpy_s_2c3b(double entropy) {
  const double sigma = entropy / 5900;
  return 2800e3 * power_4(sum<tables::kVapourEnthalpyS2c3b>(sigma - 1.02, sigma - 0.726));
}

double boundary_13_enthalpy(double entropy) {
  const double sigma = entropy / 3800;
  return 1700e3 * sum<tables::kBoundary13Enthalpy>(sigma - 0.884, sigma - 0.864);
}

double boundary_23_temperature_hs(double enthalpy, double entropy) {
  return 900 *
         sum<tables::kBoundary23Temperature>(enthalpy / 3000e3 - 0.727, entropy / 5300 - 0.864);
}

double saturation_temperature_hs(double enthalpy, double entropy) {
  return 550 *
         sum<tables::kSaturationTemperatureHs>(enthalpy / 2800e3 - 0.119, entropy / 9200 - 1.07);
}

// SR4-04(2014), figure 2 and sections 4.3 to 4.6.
double pressure_hs(double enthalpy, double entropy) {
  const double h = enthalpy;
  const double s = entropy;
  if (s <= kLiquidEntropy623) {
    if (s > kLiquidEntropy273 && h < liquid_enthalpy_s_1(s)) return wet(h, s);
    if (s > kEntropy1At100MPa && h > boundary_13_enthalpy(s)) return pressure_hs_3a(h, s);
    return pressure_hs_1(h, s);
  }
  if (s <= kCriticalEntropy) {
    return h < liquid_enthalpy_s_3a(s) ? wet(h, s) : pressure_hs_3a(h, s);
  }
  if (s < kEntropy2bc) {
    if (h < vapour_enthalpy_s_2c3b(s)) return wet(h, s);
    if (s < kLowestEntropyB23 || (s <= kHighestEntropyB23 && h < kLowestEnthalpyB23)) {
      return pressure_hs_3b(h, s);
    }
    const double pressure = pressure_hs_2c(h, s);
    if (s <= kHighestEntropyB23 && h <= kHighestEnthalpyB23 &&
        pressure > boundary_23_pressure(boundary_23_temperature_hs(h, s))) {
      return pressure_hs_3b(h, s);
    }
    return pressure;
  }
  if (s < kVapourEntropy273 && h < vapour_enthalpy_s_2ab(s)) return wet(h, s);
  return h > boundary_2ab_enthalpy(s) ? pressure_hs_2b(h, s) : pressure_hs_2a(h, s);
}

}  // namespace busbar::water::backward
