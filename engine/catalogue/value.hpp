// What crosses the boundary: a grid of cells.
#pragma once

#include <cstddef>
#include <memory>
#include <string>
#include <utility>
#include <variant>
#include <vector>

#include "core/outcome.hpp"
#include "core/units.hpp"

namespace busbar {

struct Row;

/// Limits on one value: eight full Calc columns, and a text longer than any that a function takes.
inline constexpr std::size_t kCellLimit = std::size_t{1} << 23U;
inline constexpr std::size_t kTextLimit = std::size_t{1} << 16U;

struct Blank {};

/// What is behind an error cell: the failure, the function that failed and the units in which the
/// caller wants to read the reason. `word` is the text that was not understood, where there is one.
struct Problem {
  Failure failure;
  const Row* row = nullptr;
  UnitSet units = UnitSet::metric;
  std::string word;
};

/// An error cell. Its sentence is written only when somebody asks (catalogue/sentence.hpp).
class Error {
 public:
  explicit Error(Problem problem) : problem_(std::make_unique<const Problem>(std::move(problem))) {}
  [[nodiscard]] const Problem& problem() const { return *problem_; }

 private:
  std::unique_ptr<const Problem> problem_;
};

using Cell = std::variant<Blank, double, std::string, bool, Error>;

/// A grid of cells, row by row; a single cell is 1 x 1 and needs no memory of its own.
class Grid {
 public:
  Grid() = default;
  Grid(std::size_t rows, std::size_t columns) : rows_(rows), columns_(columns) {
    if (rows * columns != 1) cells_.resize(rows * columns);
  }
  explicit Grid(Cell cell) : single_(std::move(cell)) {}

  // Out of line: inlined moves of the variant make g++ 12 warn of uninitialised members that are
  // not.
  Grid(Grid&& other) noexcept;
  Grid& operator=(Grid&& other) noexcept;
  Grid(const Grid&) = delete;
  Grid& operator=(const Grid&) = delete;
  ~Grid();

  [[nodiscard]] std::size_t rows() const { return rows_; }
  [[nodiscard]] std::size_t columns() const { return columns_; }
  [[nodiscard]] bool is_single() const { return cells_.empty(); }
  [[nodiscard]] const Cell& at(std::size_t row, std::size_t column) const {
    return is_single() ? single_ : cells_[row * columns_ + column];
  }
  [[nodiscard]] Cell& at(std::size_t row, std::size_t column) {
    return is_single() ? single_ : cells_[row * columns_ + column];
  }

 private:
  std::size_t rows_ = 1;
  std::size_t columns_ = 1;
  Cell single_;
  std::vector<Cell> cells_;
};

}  // namespace busbar
