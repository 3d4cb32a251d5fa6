// The three unit sets and the unit of every quantity in each.
#pragma once

#include <optional>
#include <string_view>

#include "core/quantity.hpp"

namespace busbar {

/// metric: bar, °C, kJ/kg, kg/s, MW. us: psia, °F, Btu/lb, lb/h, MW. si: Pa, K, J/kg, kg/s, W.
enum class UnitSet : std::uint8_t { metric, us, si, count_ };

/// si = x · multiplier / divisor + offset. One of multiplier and divisor is 1, so that a unit which
/// is a plain decimal multiple of the SI unit is written by division and read by multiplication:
/// after the first trip no value drifts (1e-5 has no exact double, 1e5 has).
struct Unit {
  std::string_view symbol;  ///< "" for plain numbers
  double multiplier;
  double divisor;
  double offset;

  [[nodiscard]] double to_si(double x) const { return x * multiplier / divisor + offset; }
  [[nodiscard]] double from_si(double si) const { return (si - offset) * divisor / multiplier; }
};

/// The unit of a quantity in a unit set.
/// Source: SI Brochure 9th ed. (2019); NIST SP 811 (2008), appendix B, for the US units.
const Unit& unit_of(UnitSet set, Quantity quantity);

/// True when a number of that quantity differs between unit sets.
bool depends_on_unit_set(Quantity quantity);

/// "metric", "us" or "si"; nullopt for any other word. Capitals count as small letters.
std::optional<UnitSet> unit_set_named(std::string_view word);
std::string_view name_of(UnitSet set);

/// What the quantity is called in a sentence, such as "absolute pressure".
std::string_view name_of(Quantity quantity);

}  // namespace busbar
