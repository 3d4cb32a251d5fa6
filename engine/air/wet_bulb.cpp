// The thermodynamic wet bulb: adiabatic saturation.
#include <algorithm>
#include <cmath>

#include "air/humidity.hpp"
#include "air/solve.hpp"
#include "water/failure.hpp"
#include "water/ice.hpp"
#include "water/solve/properties.hpp"

namespace busbar::air {
namespace {

using water::make_failure;

// Saturated air cannot boil: the wet bulb stays this far (K) below the boiling point.
constexpr double kBelowBoiling = 1e-6;
constexpr double kTolerance = 1e-9;
constexpr double kRoughAir = 1006;     // J/(kg K)
constexpr double kRoughVapour = 1860;  // J/(kg K)

double condensate_enthalpy(double pressure, double temperature, Condensate phase) {
  if (phase == Condensate::ice) return water::ice_at(pressure, temperature).enthalpy;
  return water::properties_1(pressure, temperature).enthalpy;
}

// What the balance of adiabatic saturation lacks at a wet bulb, per kg of dry air times the mole
// fraction of dry air in the saturated air: positive where the true wet bulb is higher.
class Balance {
 public:
  Balance(double pressure, double enthalpy, double humidity_ratio)
      : pressure_(pressure), enthalpy_(enthalpy), humidity_ratio_(humidity_ratio) {}

  [[nodiscard]] Outcome<double> at(double wet_bulb, Condensate phase) const {
    const Place there = place(pressure_, wet_bulb);
    const auto saturated = saturation(there, phase);
    if (!saturated) return saturated.failure();
    const double x = saturated->mole_fraction;
    const double condensate = condensate_enthalpy(pressure_, wet_bulb, phase);
    return (1 - x) * (enthalpy_ - humidity_ratio_ * condensate) + x * kMassRatio * condensate -
           enthalpy_share(there, x);
  }

 private:
  double pressure_;
  double enthalpy_;
  double humidity_ratio_;
};

// A start within a few kelvins: two fifths of the way from the dry bulb to where the air would be
// saturated by the Magnus formula.
double rough_wet_bulb(const Place& at, double x) {
  const double y = std::log(std::max(x * at.pressure, 1.0) / 611.2);
  const double dew = kFreezing + 243.12 * y / (17.62 - std::min(y, 12.0));
  const double drop = std::clamp(at.temperature - dew, 0.0, 60.0);
  return at.temperature - 0.4 * drop;
}

}  // namespace

Outcome<double> wet_bulb(double pressure, double temperature, double humidity_ratio) {
  const Place at = place(pressure, temperature);
  // Air between saturation over ice and over water exists, but its wet bulb over ice does not.
  const Condensate most = temperature < kFreezing ? Condensate::ice : Condensate::water;
  const Failure failure = not_above_saturation(at, humidity_ratio, most);
  if (failure.fault != Fault::none) return failure;
  const Balance balance(pressure, mixture_enthalpy(at, humidity_ratio), humidity_ratio);
  const double high =
      std::clamp(boiling_temperature(pressure) - kBelowBoiling, kColdest, temperature);

  Condensate phase = Condensate::ice;
  Search search;
  // Where the dew point is above 0 °C the wet bulb is so too: the enhancement factor is below 2.
  const double partial = mole_fraction(humidity_ratio) * pressure;
  if (partial > 2 * vapour_pressure(kFreezing, Condensate::water)) {
    phase = Condensate::water;
  } else if (high >= kFreezing) {
    const auto liquid = balance.at(kFreezing, Condensate::water);
    if (liquid && *liquid >= 0) phase = Condensate::water;
  }
  search.low = phase == Condensate::water ? kFreezing : kColdest;
  search.high = phase == Condensate::water ? high : std::min(high, kFreezing);
  search.start = rough_wet_bulb(at, mole_fraction(humidity_ratio));
  search.slope = -2.5 * (kRoughAir + kRoughVapour * humidity_ratio);
  search.tolerance = kTolerance;

  Failure failed;
  const auto residual = [&](double wet) {
    const auto value = balance.at(wet, phase);
    if (value) return *value;
    failed = value.failure();
    return 0.0;
  };
  const auto found = find_root(residual, search);
  const bool below = found && *found == kColdest && residual(kColdest) < 0;
  if (failed.fault != Fault::none) return failed.about(2);
  if (below) {
    return make_failure(Fault::outside_range, 3,
                        "{0} at {1} has its wet bulb below {2}, the limit of IAPWS G11-15",
                        {humidity_ratio, Quantity::number}, {temperature, Quantity::temperature},
                        {kColdest, Quantity::temperature});
  }
  if (found) return *found;
  return make_failure(Fault::no_convergence, 3, "{0}: the wet bulb was not found",
                      {humidity_ratio, Quantity::number});
}

Outcome<double> humidity_ratio_at_wet_bulb(double pressure, double temperature, double wet_bulb) {
  if (wet_bulb > temperature) {
    return make_failure(Fault::impossible, 3, "{0} is above the dry bulb, {1}",
                        {wet_bulb, Quantity::temperature}, {temperature, Quantity::temperature});
  }
  const Condensate phase = wet_bulb >= kFreezing ? Condensate::water : Condensate::ice;
  const Place wet = place(pressure, wet_bulb);
  const auto saturated = saturation(wet, phase);
  if (!saturated) return saturated.failure().about(3);
  const double x = saturated->mole_fraction;
  const double most = humidity_ratio_of(x);
  const double condensate = condensate_enthalpy(pressure, wet_bulb, phase);
  const double target = enthalpy_share(wet, x) / (1 - x) - most * condensate;

  const Place at = place(pressure, temperature);
  const auto excess = [&](double w) { return mixture_enthalpy(at, w) - w * condensate - target; };
  const double dry = excess(0);
  if (dry > 0) {
    return make_failure(Fault::impossible, 3,
                        "{0} is lower than completely dry air of {1} could show",
                        {wet_bulb, Quantity::temperature}, {temperature, Quantity::temperature});
  }
  Search search;
  search.high = most;
  search.slope = vapour_enthalpy(temperature) - condensate;
  search.start = -dry / search.slope;
  search.tolerance = 1e-13 * (1 + most);
  if (const auto found = find_root(excess, search)) return *found;
  return make_failure(Fault::no_convergence, 3, "{0}: the humidity was not found",
                      {wet_bulb, Quantity::temperature});
}

}  // namespace busbar::air
