// Ranges of efficiency that are usual in the trade, for a first plausibility check.
#pragma once

#include <span>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::electrical {

struct TypicalRange {
  std::string_view machine;
  std::string_view size;
  double low = 0;   ///< at rated load, as a fraction
  double high = 0;  ///< likewise
};

/// What every line of the table is worth.
inline constexpr std::string_view kTypicalStatus =
    "common practice, from memory, no source: check before use";

std::span<const TypicalRange> typical_ranges();

/// By its name, capitals or not. Failure (argument 1): unknown, with the nearest names.
Outcome<const TypicalRange*> typical_range(std::string_view machine);

}  // namespace busbar::electrical
