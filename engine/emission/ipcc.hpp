// Default factors of the IPCC, for checking figures that somebody states; always on the net
// calorific value.
#pragma once

#include <array>
#include <cstdint>
#include <limits>
#include <optional>
#include <span>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::emission {

inline constexpr double kNone = std::numeric_limits<double>::quiet_NaN();

/// The default value, or an end of its 95 % confidence interval.
enum class Bound : std::uint8_t { central, lower, upper };

/// "default", "lower" or "upper".
std::optional<Bound> bound_named(std::string_view word);

/// As published: TJ/Gg, kg/GJ and kg/TJ, in the order default, lower, upper; NaN where the table
/// has a blank.
struct IpccFuel {
  std::string_view name;
  std::array<double, 3> net_value;
  double carbon = kNone;
  std::array<double, 3> co2;
  bool biogenic = false;  ///< its CO2 is reported apart and not counted

  [[nodiscard]] double net_value_si(Bound bound) const;  ///< J/kg
  [[nodiscard]] double co2_si(Bound bound) const;        ///< kg/J
};

std::span<const IpccFuel> ipcc_fuels();

/// By its published name. Failure (argument 1): unknown, with the nearest names.
Outcome<const IpccFuel*> ipcc_fuel(std::string_view name);

}  // namespace busbar::emission
