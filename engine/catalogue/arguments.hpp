// Reads one argument of a call from its cells.
#pragma once

#include <array>
#include <forward_list>
#include <memory>
#include <string>
#include <type_traits>
#include <vector>

#include "catalogue/row.hpp"
#include "catalogue/value.hpp"

namespace busbar {

/// Room for the stream of one argument. A call that has none does not pay for clearing it.
class StreamRoom {
 public:
  StreamRoom() {}  // NOLINT(modernize-use-equals-default): default would make it no constructor
  const Stream* hold(const Stream& stream) { return std::construct_at(&stream_, stream); }

 private:
  static_assert(std::is_trivially_destructible_v<Stream>);
  union {
    Stream stream_;
  };
};

/// What decoded arguments point into; lives as long as the call.
struct Workspace {
  std::array<StreamRoom, kMostArguments> stream;
  std::forward_list<std::vector<double>> numbers;
  std::forward_list<std::vector<Stream>> streams;
  std::forward_list<GivenComposition> compositions;
  std::array<GivenComposition*, kMostArguments> composition{};
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

/// True for arguments over whose ranges a call is lifted. A composition is lifted over a row or a
/// column of texts and taken whole as a table.
bool is_lifted(Kind kind, const Grid& grid);

}  // namespace busbar
