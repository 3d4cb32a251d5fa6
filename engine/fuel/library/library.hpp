// Published figures of fuels, for a first estimate when no analysis is at hand. Every one is
// typical or of one sample, and none is used unless somebody asks for it by name.
#pragma once

#include <array>
#include <limits>
#include <span>
#include <string>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::fuel::library {

inline constexpr double kNotStated = std::numeric_limits<double>::quiet_NaN();

/// Shares of dry mass in percent, in the order C, H, O, N, S, Cl, ash.
using DryShares = std::array<double, 7>;

struct TypicalFuel {
  std::string_view name;         ///< with its source in brackets, because sources differ
  std::string_view kind;         ///< gas, liquid, solid or nuclear
  double lhv = kNotStated;       ///< J/kg; NaN where the source gives none
  double hhv = kNotStated;       ///< J/kg; NaN where the source gives none
  std::string_view of;           ///< what the heating values are per kilogram of
  std::string_view composition;  ///< "mole %: …" or "mass % dry: …", empty where there is none
  std::string_view further;      ///< other figures of the source
  std::string_view source;
  std::string_view status;  ///< begins with "typical" or "one sample"
};

std::span<const TypicalFuel> fuels();

/// By its name, capitals or not. Failure (argument 1): unknown, with the nearest name in the
/// reason.
Outcome<const TypicalFuel*> typical_fuel(std::string_view name);

}  // namespace busbar::fuel::library
