#include "air/mixture.hpp"

#include <cmath>

#include "air/tables/ideal.hpp"
#include "air/tables/virial.hpp"

namespace busbar::air {
namespace {

// Derivative in tau of n ln(1 - exp(-e tau)).
double slope_of(const tables::Mode& mode, double tau) {
  return mode.n * mode.exponent / std::expm1(mode.exponent * tau);
}

}  // namespace

double dry_air_enthalpy(double temperature) {
  const double tau = tables::kAirReducingTemperature / temperature;
  const double inverse = 1 / tau;
  const double inverse2 = inverse * inverse;
  double slope = tables::kAirIdealConstant + 1.5 * tables::kAirIdealRoot * std::sqrt(tau) +
                 tables::kAirIdealLogarithm * inverse -
                 3 * tables::kAirIdeal[0] * inverse2 * inverse2 -
                 2 * tables::kAirIdeal[1] * inverse2 * inverse - tables::kAirIdeal[2] * inverse2;
  for (const tables::Mode& mode : tables::kAirModes) slope += slope_of(mode, tau);
  slope += tables::kAirLastMode.n * tables::kAirLastMode.exponent /
           (1 + 2.0 / 3.0 * std::exp(-tables::kAirLastMode.exponent * tau));
  return tables::kAirGasConstant / kAirMolarMass * temperature * (tau * slope + 1);
}

double vapour_enthalpy(double temperature) {
  const double tau = tables::kWaterReducingTemperature / temperature;
  double slope = tables::kWaterIdealConstant + tables::kWaterIdealLogarithm / tau;
  for (const tables::Mode& mode : tables::kWaterModes) slope += slope_of(mode, tau);
  return tables::kWaterGasConstant * temperature * (tau * slope + 1);
}

Place place(double pressure, double temperature) {
  return {pressure, temperature, pressure / (kGasConstant * temperature), virials(temperature)};
}

double enthalpy_share(const Place& at, double x) {
  const MixtureVirials of = mixture(at.virials, x);
  const double b = of.second.value;
  const double b_slope = of.second.slope;
  const double c = of.third.value - b * b;
  const double c_slope = of.third.slope - 2 * b * b_slope;
  const double residual =
      kGasConstant * at.temperature * at.q * (b - b_slope + at.q * (c - 0.5 * c_slope));
  return (1 - x) * dry_air_enthalpy(at.temperature) +
         x * kMassRatio * vapour_enthalpy(at.temperature) + residual / kAirMolarMass;
}

double volume_share(const Place& at, double x) {
  const MixtureVirials of = mixture(at.virials, x);
  const double b = of.second.value;
  const double compressibility = 1 + at.q * (b + at.q * (of.third.value - b * b));
  return compressibility / (at.q * kAirMolarMass);
}

}  // namespace busbar::air
