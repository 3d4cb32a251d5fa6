#include "air/saturation.hpp"

#include <algorithm>
#include <cmath>
#include <limits>

#include "air/solve.hpp"
#include "air/tables/henry.hpp"
#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/failure.hpp"
#include "water/ice.hpp"
#include "water/solve/properties.hpp"
#include "water/transport/surface.hpp"

namespace busbar::air {
namespace {

using water::make_failure;

constexpr int kCap = 200;
constexpr double kAgreement = 1e-15;

// Volume (m3/mol) of the condensed phase, in the middle between its vapour pressure and the
// pressure of the air. Supercooled water is taken at 0 °C: it expands by less than 2 % down to
// -30 °C, which moves the result by 1.5e-5 per bar.
double condensed_volume(double pressure, double temperature, Condensate phase) {
  if (phase == Condensate::ice) {
    return kWaterMolarMass * water::ice_at(pressure, temperature).volume;
  }
  return kWaterMolarMass * water::properties_1(pressure, std::max(temperature, kFreezing)).volume;
}

// Mole fraction of dissolved air per pascal of air above liquid water (K): IAPWS G7-04, equation 3,
// for each gas by its share. Ice takes up none; supercooled water as much as at 0 °C, which moves
// the result by less than 3e-5 per bar.
double air_solubility(double temperature, Condensate phase) {
  if (phase == Condensate::ice) return 0;
  const double t = std::max(temperature, kFreezing);
  const double reduced = t / water::kCriticalTemperature;
  const double tau = 1 - reduced;
  const double b = std::pow(tau, 0.355) / reduced;
  const double c = std::pow(reduced, -0.41) * std::exp(tau);
  double sum = 0;
  for (const tables::Gas& gas : tables::kDissolved) {
    sum += gas.share * std::exp(-(gas.a / reduced + gas.b * b + gas.c * c));
  }
  return sum / water::saturation_pressure_equation(t);
}

// The logarithm of the enhancement factor is `constant` + the part of the dissolved air - the
// logarithm of the fugacity coefficient in the air, which depend on the mole fraction.
struct Condensed {
  double vapour_pressure = 0;
  double constant = 0;
  double solubility = 0;
};

Condensed condensed(const Place& at, Condensate phase) {
  Condensed out;
  const double p = vapour_pressure(at.temperature, phase);
  const double rt = kGasConstant * at.temperature;
  out.vapour_pressure = p;
  out.constant =
      log_fugacity_coefficient(at.virials, p / rt, 1) +
      condensed_volume(0.5 * (p + at.pressure), at.temperature, phase) * (at.pressure - p) / rt;
  out.solubility = air_solubility(at.temperature, phase);
  return out;
}

double log_enhancement(const Place& at, const Condensed& of, double x) {
  return of.constant + std::log1p(-of.solubility * at.pressure * (1 - x)) -
         log_fugacity_coefficient(at.virials, at.q, x);
}

// Clausius-Clapeyron with the heat of vaporisation or sublimation: only steers the iteration.
double log_slope(double temperature, Condensate phase) {
  const double heat =
      phase == Condensate::ice ? 2.834e6 : 2.501e6 - 2.4e3 * (temperature - kFreezing);
  return heat * kWaterMolarMass / (kGasConstant * temperature * temperature);
}

// Where a pure phase has this vapour pressure, roughly: the start of the iteration. Constants of
// the Magnus formula.
double rough_temperature(double pressure) {
  const double y = std::log(pressure / 611.2);
  return kFreezing + std::clamp(243.12 * y / (17.62 - std::min(y, 12.0)), -80.0, 250.0);
}

}  // namespace

Outcome<Condensate> condensate_at(double temperature, BelowFreezing below) {
  if (temperature >= kFreezing) return Condensate::water;
  if (below == BelowFreezing::ice) return Condensate::ice;
  if (below == BelowFreezing::water) return Condensate::supercooled;
  return make_failure(Fault::missing, 1,
                      "is left out, and {0} is below {1}: write \"ice\" or \"water\" for what the "
                      "air is saturated over there",
                      {temperature, Quantity::temperature}, {kFreezing, Quantity::temperature});
}

double supercooled_vapour_pressure(double temperature) {
  const double t = temperature;
  const double log_t = std::log(t);
  return std::exp(54.842763 - 6763.22 / t - 4.210 * log_t + 0.000367 * t +
                  std::tanh(0.0415 * (t - 218.8)) *
                      (53.878 - 1331.22 / t - 9.44523 * log_t + 0.014025 * t));
}

double vapour_pressure(double temperature, Condensate phase) {
  switch (phase) {
    case Condensate::water:
      if (temperature >= kFreezing && temperature <= water::kCriticalTemperature) {
        return water::saturation_pressure_equation(temperature);
      }
      break;
    case Condensate::ice:
      if (const auto p = water::sublimation_pressure(temperature)) return *p;
      break;
    case Condensate::supercooled:
      if (temperature >= 123 && temperature <= 332) return supercooled_vapour_pressure(temperature);
      break;
  }
  return std::numeric_limits<double>::quiet_NaN();
}

double boiling_temperature(double pressure) {
  if (pressure > water::kLowestSaturationPressure) {
    return water::saturation_temperature_equation(pressure);
  }
  const double target = std::log(pressure);
  const auto excess = [&](double temperature) {
    return std::log(vapour_pressure(temperature, Condensate::ice)) - target;
  };
  Search search;
  search.low = kColdest;
  search.high = kFreezing;
  search.start = rough_temperature(pressure);
  search.slope = log_slope(std::clamp(search.start, kColdest, kFreezing), Condensate::ice);
  search.tolerance = 1e-9;
  return find_root(excess, search).value_or(kColdest);
}

Outcome<Saturation> saturation(const Place& at, Condensate phase) {
  const Condensed of = condensed(at, phase);
  if (!(at.pressure > of.vapour_pressure)) {
    return make_failure(Fault::impossible, 2,
                        "{0} has no saturated air: the vapour pressure of water, {1}, is not below "
                        "the pressure of the air, {2}",
                        {at.temperature, Quantity::temperature},
                        {of.vapour_pressure, Quantity::pressure},
                        {at.pressure, Quantity::pressure});
  }
  // The right-hand side hardly depends on the mole fraction: each step gains one digit or more.
  const double ideal = of.vapour_pressure / at.pressure;
  double f = 1;
  for (int i = 0; i < kCap; ++i) {
    const double next = std::exp(log_enhancement(at, of, std::min(1.0, f * ideal)));
    const double step = std::abs(next - f);
    f = next;
    if (step <= kAgreement * f) return Saturation{of.vapour_pressure, std::min(1.0, f * ideal), f};
    if (!std::isfinite(f)) break;
  }
  return make_failure(Fault::no_convergence, 2, "{0}: saturation was not found",
                      {at.temperature, Quantity::temperature});
}

Outcome<double> saturation_temperature(double pressure, double x, Condensate phase, double low,
                                       double high) {
  const double target = std::log(x * pressure);
  const auto excess = [&](double temperature) {
    const Place at = place(pressure, temperature);
    const Condensed of = condensed(at, phase);
    return std::log(of.vapour_pressure) + log_enhancement(at, of, x) - target;
  };
  Search search;
  search.low = low;
  search.high = high;
  search.start = rough_temperature(x * pressure);
  search.slope = log_slope(std::clamp(search.start, low, high), phase);
  search.tolerance = 1e-9;
  const auto found = find_root(excess, search);
  const bool below = found && *found == low && excess(low) > 0;
  const bool above = found && *found == high && excess(high) < 0;
  if (below || above) {
    return make_failure(Fault::outside_range, 2,
                        "{0} gives saturation outside {1} to {2}, the limits of IAPWS G11-15",
                        {humidity_ratio_of(x), Quantity::number}, {low, Quantity::temperature},
                        {high, Quantity::temperature});
  }
  if (found) return *found;
  return make_failure(Fault::no_convergence, 2, "{0}: saturation was not found",
                      {humidity_ratio_of(x), Quantity::number});
}

}  // namespace busbar::air
