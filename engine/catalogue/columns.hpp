// Reads the cells of a call over ranges as columns of numbers, for a batch kernel.
#pragma once

#include <array>
#include <cstddef>
#include <span>

#include "catalogue/row.hpp"
#include "catalogue/value.hpp"

namespace busbar {

/// Where the cells of a result with `columns` columns lie in an argument: single rows and columns
/// repeat.
struct Spread {
  const Grid* grid;
  std::size_t argument;
};

class Columns {
 public:
  /// Cells of one batch: what their columns need stays in the nearest caches.
  static constexpr std::size_t kMost = 1024;

  /// Fewer cells than these are computed one by one: their columns would cost more.
  static constexpr std::size_t kFewest = 16;

  /// `slots` hold the arguments that do not vary.
  Columns(const Row& row, UnitSet units, std::span<const Slot> slots,
          std::span<const Spread> varying);

  /// The results of the cells from `first` on, row by row, in the unit of the result; NaN where
  /// the cell must be computed alone. `count` is at most kMost.
  std::span<const double> compute(std::size_t first, std::size_t count, std::size_t columns);

 private:
  void read(const Spread& spread, std::size_t first, std::size_t count, std::size_t columns);

  const Row& row_;
  UnitSet units_;
  std::span<const Spread> varying_;
  std::array<std::array<double, kMost>, kMostArguments> in_{};
  std::array<double, kMost> out_{};
};

}  // namespace busbar
