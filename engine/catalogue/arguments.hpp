// Reads one argument of a call from its cells.
#pragma once

#include <array>
#include <forward_list>
#include <optional>
#include <string>
#include <vector>

#include "catalogue/row.hpp"
#include "catalogue/value.hpp"

namespace busbar {

/// What decoded arguments point into; lives as long as the call.
struct Workspace {
  std::array<std::optional<Stream>, kMostArguments> stream;
  std::forward_list<std::vector<double>> numbers;
  std::forward_list<std::vector<Stream>> streams;
};

/// A failure and the text that was not understood, where there is one.
struct Trouble {
  Failure failure;
  std::string word;

  explicit operator bool() const { return failure.fault != Fault::none; }
};

/// Reads argument `index` of a row from one cell.
Trouble read_cell(const Row& row, std::size_t index, const Cell& cell, UnitSet units,
                  Workspace& space, Slot& slot);

/// Reads an argument that takes a whole range.
Trouble read_range(const Row& row, std::size_t index, const Grid& grid, UnitSet units,
                   Workspace& space, Slot& slot);

/// True for kinds of arguments over whose ranges a call is lifted.
bool is_lifted(Kind kind);

}  // namespace busbar
