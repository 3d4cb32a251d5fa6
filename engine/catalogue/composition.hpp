// Reads a composition from cells: the one argument that is a small table or a text.
//
//   a table     two columns (or two rows): a heading that states the basis ("mole", "mole %",
//               "mass", "mass %") over the amounts, names beside them; blank lines at its end
//               may follow; a third column, headed "standard uncertainty", is in the same unit
//   a text      "mole: CH4 0.92, C2H6 0.05, N2 0.03"
//   a name      "dry air, ISO 2533", see gas/published.cpp
//
// An analysis of a fuel states its own basis behind that: "mass % dry", "mass % as received".
//
// A single row or column of cells is no table: it holds texts, and the call is lifted over them.
#pragma once

#include <cstddef>
#include <cstdint>

#include "catalogue/value.hpp"
#include "core/composition.hpp"
#include "core/outcome.hpp"
#include "fuel/solid/analysis.hpp"
#include "gas/mixture.hpp"

namespace busbar {

struct Trouble;

/// What a row makes of a composition: parts as they are given, a gas, or the analysis of a fuel.
enum class CompositionUse : std::uint8_t { parts, gas, fuel };

/// What a Slot of a composition points to. `mixture` is filled where the row asks for a gas,
/// `analysis` where it asks for a fuel.
struct GivenComposition {
  Composition composition;
  gas::Mixture mixture;
  fuel::solid::Analysis analysis;
  bool table = false;       ///< part i stands in line i + 1 of a table, below the heading
  bool horizontal = false;  ///< the lines are columns
};

/// Reads one cell, a text.
Trouble read_composition_cell(std::size_t index, const Cell& cell, CompositionUse use,
                              GivenComposition& given);

/// Reads a table.
Trouble read_composition_table(std::size_t index, const Grid& grid, CompositionUse use,
                               GivenComposition& given);

/// Turns a failure that names a part by its number (`row`) into one that names it by its place in
/// the range and by its name.
Trouble placed(const Failure& failure, const GivenComposition& given);

}  // namespace busbar
