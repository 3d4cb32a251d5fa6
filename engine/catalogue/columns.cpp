#include "catalogue/columns.hpp"

#include <limits>

namespace busbar {

namespace {

constexpr double kNone = std::numeric_limits<double>::quiet_NaN();

}  // namespace

Columns::Columns(const Row& row, UnitSet units, std::span<const Slot> slots,
                 std::span<const Spread> varying)
    : row_(row), units_(units), varying_(varying) {
  for (std::size_t i = 0; i < row.arguments.size(); ++i) in_[i].fill(slots[i].si);
}

// As read_number (arguments.cpp) accepts a cell: a number inside the range of its argument.
void Columns::read(const Spread& spread, std::size_t first, std::size_t count,
                   std::size_t columns) {
  const Argument& argument = row_.arguments[spread.argument];
  const Unit unit = unit_of(units_, row_.types[spread.argument].quantity);
  const Grid& grid = *spread.grid;
  std::size_t r = first / columns;
  std::size_t c = first % columns;
  const bool one_row = grid.rows() == 1;
  const bool one_column = grid.columns() == 1;
  for (double& si : std::span(in_[spread.argument]).first(count)) {
    const auto* number = std::get_if<double>(&grid.at(one_row ? 0 : r, one_column ? 0 : c));
    const double read = number == nullptr ? kNone : unit.to_si(*number);
    si = read >= argument.low && read <= argument.high ? read : kNone;
    if (++c == columns) {
      c = 0;
      ++r;
    }
  }
}

std::span<const double> Columns::compute(std::size_t first, std::size_t count,
                                         std::size_t columns) {
  for (const Spread& spread : varying_) read(spread, first, count, columns);
  std::array<const double*, kMostArguments> in{};
  for (std::size_t i = 0; i < row_.arguments.size(); ++i) in[i] = in_[i].data();
  row_.batch(in.data(), out_.data(), count);
  const Unit unit = unit_of(units_, row_.result.quantity);
  for (double& number : std::span(out_).first(count)) number = unit.from_si(number);
  return std::span(out_).first(count);
}

}  // namespace busbar
