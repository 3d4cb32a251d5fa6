// Heating-value bases.
#pragma once

#include <cstdint>
#include <optional>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::fuel {

enum class Basis : std::uint8_t { higher, lower };

/// "HHV" or "GCV", "LHV" or "NCV", capitals or not. "gross" and "net" are refused: for a plant they
/// name the boundary, not the heating value.
std::optional<Basis> basis_named(std::string_view word);

/// Factor from fuel energy on `from` to fuel energy on `to`, from the two heating values of the
/// same fuel in one unit (inputs 4 and 5). Impossible when the lower one is the greater.
/// Definitions: ISO 1928 (gross and net calorific value at constant pressure).
Outcome<double> energy_ratio(Basis from, Basis to, double higher, double lower);

}  // namespace busbar::fuel
