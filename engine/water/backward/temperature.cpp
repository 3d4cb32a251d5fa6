#include "water/backward/temperature.hpp"

#include <cmath>

#include "water/constants.hpp"
#include "water/equations/series.hpp"
#include "water/tables/backward_1.hpp"
#include "water/tables/backward_ph_2.hpp"
#include "water/tables/backward_ph_3.hpp"
#include "water/tables/backward_ps_2.hpp"
#include "water/tables/backward_ps_3.hpp"

namespace busbar::water::backward {

namespace {

template <const auto& kTable, int kScale = 1>
double sum(double x, double y) {
  return series<kTable, kValue, kScale>(x, y).value;
}

// Boundaries between subregions: R7-97(2012), section 6.3.
constexpr double kPressure2ab = 4e6;
constexpr double kEntropy2bc = 5850;

// Equation 25 begins at the sublimation pressure of 273.15 K, 611.153 Pa (section 6.3.2).
constexpr double kLowestPressure2a = 611.153;

}  // namespace

double temperature_ph_1(double pressure, double enthalpy) {
  return sum<tables::kTemperaturePh1>(pressure * 1e-6, enthalpy / 2500e3 + 1);
}

double temperature_ps_1(double pressure, double entropy) {
  return sum<tables::kTemperaturePs1>(pressure * 1e-6, entropy / 1000 + 2);
}

double boundary_2bc_pressure(double enthalpy) {
  constexpr const double* n = tables::kBoundary2bc;
  const double eta = enthalpy / 1000;
  return ((n[2] * eta + n[1]) * eta + n[0]) * 1e6;
}

double boundary_2bc_enthalpy(double pressure) {
  constexpr const double* n = tables::kBoundary2bc;
  return (n[3] + std::sqrt((pressure * 1e-6 - n[4]) / n[2])) * 1000;
}

double temperature_ph_2a(double pressure, double enthalpy) {
  return sum<tables::kTemperaturePh2a>(pressure * 1e-6, enthalpy / 2000e3 - 2.1);
}

double temperature_ph_2b(double pressure, double enthalpy) {
  return sum<tables::kTemperaturePh2b>(pressure * 1e-6 - 2, enthalpy / 2000e3 - 2.6);
}

double temperature_ph_2c(double pressure, double enthalpy) {
  return sum<tables::kTemperaturePh2c>(pressure * 1e-6 + 25, enthalpy / 2000e3 - 1.8);
}

double temperature_ps_2a(double pressure, double entropy) {
  // The exponents of pi are quarters.
  return sum<tables::kTemperaturePs2a, 4>(std::sqrt(std::sqrt(pressure * 1e-6)),
                                          entropy / 2000 - 2);
}

double temperature_ps_2b(double pressure, double entropy) {
  return sum<tables::kTemperaturePs2b>(pressure * 1e-6, 10 - entropy / 785.3);
}

double temperature_ps_2c(double pressure, double entropy) {
  return sum<tables::kTemperaturePs2c>(pressure * 1e-6, 2 - entropy / 2925.1);
}

double temperature_ph_2(double pressure, double enthalpy) {
  if (pressure <= kPressure2ab) return temperature_ph_2a(pressure, enthalpy);
  // Equation 21 begins at 6.5467 MPa; below, all of region 2 lies in 2b.
  if (pressure > 6.54670e6 && enthalpy < boundary_2bc_enthalpy(pressure)) {
    return temperature_ph_2c(pressure, enthalpy);
  }
  return temperature_ph_2b(pressure, enthalpy);
}

double temperature_ps_2(double pressure, double entropy) {
  if (pressure < kLowestPressure2a) {
    const double moved = entropy + kGasConstant * std::log(pressure / kLowestPressure2a);
    return temperature_ps_2a(kLowestPressure2a, moved);
  }
  if (pressure <= kPressure2ab) return temperature_ps_2a(pressure, entropy);
  if (entropy < kEntropy2bc) return temperature_ps_2c(pressure, entropy);
  return temperature_ps_2b(pressure, entropy);
}

double boundary_3ab_enthalpy(double pressure) {
  constexpr const double* n = tables::kBoundary3ab;
  const double pi = pressure * 1e-6;
  return (((n[3] * pi + n[2]) * pi + n[1]) * pi + n[0]) * 1000;
}

double temperature_ph_3a(double pressure, double enthalpy) {
  return 760 * sum<tables::kTemperaturePh3a>(pressure / 100e6 + 0.240, enthalpy / 2300e3 - 0.615);
}

double temperature_ph_3b(double pressure, double enthalpy) {
  return 860 * sum<tables::kTemperaturePh3b>(pressure / 100e6 + 0.298, enthalpy / 2800e3 - 0.720);
}

double temperature_ps_3a(double pressure, double entropy) {
  return 760 * sum<tables::kTemperaturePs3a>(pressure / 100e6 + 0.240, entropy / 4400 - 0.703);
}

double temperature_ps_3b(double pressure, double entropy) {
  return 860 * sum<tables::kTemperaturePs3b>(pressure / 100e6 + 0.760, entropy / 5300 - 0.818);
}

}  // namespace busbar::water::backward
