// Calls a row: reads the arguments, lifts the call over ranges, converts units, keeps the reasons.
#pragma once

#include <span>
#include <string>

#include "catalogue/row.hpp"
#include "catalogue/value.hpp"

namespace busbar {

/// Arguments as they come; nullptr is one that was left out.
using Arguments = std::span<const Grid* const>;

/// Calls the row once, or once for every row and column of its ranges. A range of one row, one
/// column or one cell is repeated to fit; any other mismatch is an error. What fails is an error
/// cell. Throws nothing but std::bad_alloc.
Grid call(const Row& row, Arguments arguments);

/// Why the call fails (for ranges: its first failing cell), or what answered it.
std::string explain(const Row& row, Arguments arguments);

}  // namespace busbar
