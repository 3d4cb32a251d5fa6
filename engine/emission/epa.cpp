#include "emission/epa.hpp"

#include <array>
#include <vector>

#include "core/name_list.hpp"
#include "core/text.hpp"
#include "emission/tables/epa_f_factors.hpp"
#include "emission/tables/epa_table_c1.hpp"

namespace busbar::emission {
namespace {

// Exact: NIST SP 811 (2008), appendix B. The rule itself rounds 1 MMBtu to 1.055056 GJ.
constexpr double kMillionBtu = 1055.05585262e6;
constexpr double kShortTon = 2000 * 0.45359237;
constexpr double kInch = 0.0254;
constexpr double kGallon = 231 * kInch * kInch * kInch;
constexpr double kFoot = 0.3048;
constexpr double kCubicFoot = kFoot * kFoot * kFoot;

const NameList& fuel_names() {
  // Never destroyed: reasons of failures point into it.
  static const auto& list = *[] {
    std::vector<std::string_view> all;
    for (const EpaFuel& fuel : epa_fuels()) all.push_back(fuel.name);
    return new NameList(std::move(all), "table C-1 of 40 CFR 98", "EPA_FACTORS(\"all\")");
  }();
  return list;
}

const NameList& f_factor_names() {
  static const auto& list = *[] {
    std::vector<std::string_view> all;
    for (const FFactors& row : f_factors()) all.push_back(row.fuel);
    return new NameList(std::move(all), "table 19-2 of EPA Method 19", "EPA_F_FACTORS(\"all\")");
  }();
  return list;
}

}  // namespace

double EpaFuel::heating_value_si() const {
  switch (unit) {
    case EpaUnit::per_short_ton:
      return heating_value * kMillionBtu / kShortTon;
    case EpaUnit::per_gallon:
      return heating_value * kMillionBtu / kGallon;
    case EpaUnit::per_cubic_foot:
      break;
  }
  return heating_value * kMillionBtu / kCubicFoot;
}

double EpaFuel::co2_si() const { return co2 / kMillionBtu; }

std::span<const EpaFuel> epa_fuels() { return tables::kEpaTableC1; }

std::string_view name_of(EpaUnit unit) {
  static constexpr std::array<std::string_view, 3> kNames{
      "MMBtu per short ton", "MMBtu per US gallon",
      "MMBtu per cubic foot at 60 °F and 14.696 psia"};
  return kNames[static_cast<std::size_t>(unit)];
}

std::string_view si_unit_of(EpaUnit unit) {
  return unit == EpaUnit::per_short_ton ? "J/kg" : "J/m3";
}

std::string_view name_of(Origin origin) {
  static constexpr std::array<std::string_view, 5> kNames{"fossil", "biogenic", "partly biogenic",
                                                          "listed as biomass; fossil with the IPCC",
                                                          "biogenic or fossil, as it was made"};
  return kNames[static_cast<std::size_t>(origin)];
}

Outcome<const EpaFuel*> epa_fuel(std::string_view name) {
  const auto at = fuel_names().find(name);
  if (!at) return Failure{Fault::unknown_word, 1, fuel_names().unknown(name)};
  return &epa_fuels()[*at];
}

std::optional<FFactor> f_factor_named(std::string_view word) {
  if (equal_ignoring_case(trimmed(word), "Fd")) return FFactor::dry;
  if (equal_ignoring_case(trimmed(word), "Fw")) return FFactor::wet;
  if (equal_ignoring_case(trimmed(word), "Fc")) return FFactor::carbon;
  return std::nullopt;
}

double FFactors::si(FFactor kind) const {
  const double published = kind == FFactor::dry ? dry : kind == FFactor::wet ? wet : carbon;
  return published * kCubicFoot / kMillionBtu;
}

std::span<const FFactors> f_factors() { return tables::kFFactors; }

Outcome<const FFactors*> f_factors_of(std::string_view fuel) {
  const auto at = f_factor_names().find(fuel);
  if (!at) return Failure{Fault::unknown_word, 1, f_factor_names().unknown(fuel)};
  return &f_factors()[*at];
}

}  // namespace busbar::emission
