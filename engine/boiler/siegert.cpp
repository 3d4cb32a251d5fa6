#include "boiler/siegert.hpp"

#include <cmath>

#include "boiler/tables/siegert.hpp"
#include "core/text.hpp"

namespace busbar::boiler {
namespace {

constexpr double kPerCent = 100;
// The oxygen of dry air in the printed formula, %.
constexpr double kOxygenOfAir = 21;

constexpr const char* kUnknown =
    "is none of the fuels that the Siegert coefficients are printed for; see SIEGERT_FUELS()";

std::span<const SiegertCoefficients> rows_of(std::string_view fuel) {
  const std::span<const SiegertCoefficients> all = siegert_table();
  std::size_t first = 0;
  while (first < all.size() && !equal_ignoring_case(all[first].fuel, fuel)) ++first;
  std::size_t last = first;
  while (last < all.size() && equal_ignoring_case(all[last].fuel, fuel)) ++last;
  return all.subspan(first, last - first);
}

Failure beyond(double moisture, double limit, const char* reason) {
  return {Fault::outside_range,
          5,
          reason,
          {{{moisture, Quantity::fraction}, {limit, Quantity::fraction}}}};
}

Outcome<SiegertCoefficients> at_moisture(std::span<const SiegertCoefficients> rows,
                                         double moisture) {
  if (rows.front().moisture < 0) {
    if (!std::isnan(moisture)) {
      return Failure{Fault::outside_range, 5,
                     "is given, but the source prints this fuel without a water content; leave "
                     "it out"};
    }
    return rows.front();
  }
  if (std::isnan(moisture)) {
    return Failure{Fault::missing, 5,
                   "is missing: the coefficients of this fuel depend on its water content"};
  }
  if (moisture < rows.front().moisture) {
    return beyond(moisture, rows.front().moisture,
                  "{0} is below {1}, the lowest water content printed for this fuel");
  }
  if (moisture > rows.back().moisture) {
    return beyond(moisture, rows.back().moisture,
                  "{0} is above {1}, the highest water content printed for this fuel");
  }
  std::size_t upper = 1;
  while (upper + 1 < rows.size() && rows[upper].moisture < moisture) ++upper;
  const SiegertCoefficients& low = rows[upper - 1];
  const SiegertCoefficients& high = rows[upper];
  const double weight = (moisture - low.moisture) / (high.moisture - low.moisture);
  SiegertCoefficients at = low;
  at.moisture = moisture;
  at.oxygen = std::lerp(low.oxygen, high.oxygen, weight);
  at.constant = std::lerp(low.constant, high.constant, weight);
  return at;
}

Outcome<double> temperature_rise(double gas, double air) {
  if (gas >= air) return gas - air;
  return Failure{Fault::impossible,
                 2,
                 "{0} is below the air temperature {1}: a flue gas loss needs hotter gas",
                 {{{gas, Quantity::temperature}, {air, Quantity::temperature}}}};
}

Outcome<double> as_loss(double per_cent) {
  const double loss = per_cent / kPerCent;
  if (loss <= 1) return loss;
  return Failure{Fault::impossible,
                 4,
                 "makes a loss of {0}, more than the fuel's energy",
                 {{{loss, Quantity::fraction}}}};
}

}  // namespace

std::span<const SiegertCoefficients> siegert_table() { return tables::kSiegert; }

Outcome<double> siegert_loss(std::string_view fuel, double gas_temperature, double air_temperature,
                             double oxygen, double moisture) {
  const std::span<const SiegertCoefficients> rows = rows_of(fuel);
  if (rows.empty()) return Failure{Fault::unknown_word, 1, kUnknown};
  if (rows.front().oxygen == 0) {
    return Failure{Fault::wrong_kind, 1,
                   "has coefficients for carbon dioxide only; see SIEGERT_LOSS_FROM_CO2"};
  }
  const Outcome<SiegertCoefficients> at = at_moisture(rows, moisture);
  if (!at) return at.failure();
  const Outcome<double> rise = temperature_rise(gas_temperature, air_temperature);
  if (!rise) return rise.failure();
  return as_loss(*rise * (at->oxygen / (kOxygenOfAir - oxygen * kPerCent) + at->constant));
}

Outcome<double> siegert_loss_by_carbon_dioxide(std::string_view fuel, double gas_temperature,
                                               double air_temperature, double carbon_dioxide) {
  const std::span<const SiegertCoefficients> rows = rows_of(fuel);
  if (rows.empty()) return Failure{Fault::unknown_word, 1, kUnknown};
  const SiegertCoefficients& at = rows.front();
  if (at.carbon_dioxide == 0 && at.simple == 0) {
    return Failure{Fault::wrong_kind, 1, "has coefficients for oxygen only; see SIEGERT_LOSS"};
  }
  const Outcome<double> rise = temperature_rise(gas_temperature, air_temperature);
  if (!rise) return rise.failure();
  const double per_kelvin =
      (at.carbon_dioxide + at.simple) / (carbon_dioxide * kPerCent) + at.constant;
  return as_loss(*rise * per_kelvin);
}

}  // namespace busbar::boiler
