#include "air/humidity.hpp"

#include <algorithm>
#include <cmath>

#include "water/failure.hpp"

namespace busbar::air {
namespace {

using water::make_failure;

// Published models of saturation differ by so much (relative): IAPWS G8-10, with IAPWS-95 for
// water, all virial terms and no dissolved air, holds 1.3e-4 more at 300 K and 1 bar, 2.3e-4 more
// at 400 K and 10 bar. Less above saturation is no proof of fog.
constexpr double kSaturationSlack = 3e-4;

Failure fog(double humidity_ratio, double saturated, double temperature) {
  return make_failure(Fault::impossible, 3,
                      "{0} is above {1}, saturation at {2}: the rest is fog, not vapour. It is kg "
                      "of water per kg of dry air, 0.01 for 10 g/kg",
                      {humidity_ratio, Quantity::number}, {saturated, Quantity::number},
                      {temperature, Quantity::temperature});
}

// Saturation over what the caller means; `argument` is where that would have been said.
Outcome<Saturation> saturation_of(const Place& at, BelowFreezing below, std::uint8_t argument) {
  const auto phase = condensate_at(at.temperature, below);
  if (!phase) return phase.failure().about(argument);
  return saturation(at, *phase);
}

// Whether the dew point is 0 °C or more. The enhancement factor is below 2 in the range, so that
// moist air needs no saturation.
bool holds_more_than_ice_water(const Place& freezing, double x) {
  if (x * freezing.pressure > 2 * vapour_pressure(kFreezing, Condensate::water)) return true;
  const auto over_water = saturation(freezing, Condensate::water);
  return over_water && x >= over_water->mole_fraction;
}

}  // namespace

Failure not_above_saturation(const Place& at, double humidity_ratio) {
  const bool frozen = at.temperature < kFreezing;
  return not_above_saturation(at, humidity_ratio,
                              frozen ? Condensate::supercooled : Condensate::water);
}

Failure not_above_saturation(const Place& at, double humidity_ratio, Condensate phase) {
  const double x = mole_fraction(humidity_ratio);
  const double vapour = vapour_pressure(at.temperature, phase);
  // The enhancement factor is not below 1, and no air is too moist above the boiling point.
  if (x * at.pressure <= vapour || vapour >= at.pressure) return {};
  const auto limit = saturation(at, phase);
  if (!limit) return limit.failure();
  if (x <= limit->mole_fraction * (1 + kSaturationSlack)) return {};
  return fog(humidity_ratio, humidity_ratio_of(limit->mole_fraction), at.temperature);
}

Outcome<double> humidity_ratio_at_relative_humidity(double pressure, double temperature,
                                                    double relative_humidity, BelowFreezing below) {
  const auto limit = saturation_of(place(pressure, temperature), below, 4);
  if (!limit) return limit.failure();
  return humidity_ratio_of(relative_humidity * limit->mole_fraction);
}

Outcome<double> relative_humidity(double pressure, double temperature, double humidity_ratio,
                                  BelowFreezing below) {
  const auto limit = saturation_of(place(pressure, temperature), below, 4);
  if (!limit) return limit.failure();
  const double relative = mole_fraction(humidity_ratio) / limit->mole_fraction;
  if (relative > 1 + kSaturationSlack) {
    return fog(humidity_ratio, humidity_ratio_of(limit->mole_fraction), temperature);
  }
  return std::min(relative, 1.0);
}

Outcome<double> humidity_ratio_at_dew_point(double pressure, double dew_point,
                                            BelowFreezing below) {
  const auto limit = saturation_of(place(pressure, dew_point), below, 3);
  if (!limit) return limit.failure();
  return humidity_ratio_of(limit->mole_fraction);
}

Outcome<double> dew_point(double pressure, double humidity_ratio, BelowFreezing below) {
  const double x = mole_fraction(humidity_ratio);
  const Place freezing = place(pressure, kFreezing);
  if (holds_more_than_ice_water(freezing, x)) {
    const double high = std::min(kHottest, boiling_temperature(pressure));
    return saturation_temperature(pressure, x, Condensate::water, kFreezing, high);
  }
  const Condensate phase = below == BelowFreezing::ice ? Condensate::ice : Condensate::supercooled;
  if (below == BelowFreezing::unsaid) {
    return make_failure(Fault::missing, 3,
                        "is left out, and the dew point is below {0}: write \"ice\" for the frost "
                        "point or \"water\" for the dew point over supercooled water",
                        {kFreezing, Quantity::temperature});
  }
  const auto over_phase = saturation(freezing, phase);
  if (over_phase && x >= over_phase->mole_fraction) return kFreezing;
  return saturation_temperature(pressure, x, phase, kColdest, kFreezing);
}

}  // namespace busbar::air
