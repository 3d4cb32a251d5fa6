#include "catalogue/arguments.hpp"

#include <cmath>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "stream/text.hpp"

namespace busbar {
namespace {

// What is above 1 may be a percentage; 1.05 is rather a fraction that came out too high.
constexpr double kLeastPercentage = 2;
constexpr double kHundredPercent = 100;

std::uint8_t position(std::size_t index) { return static_cast<std::uint8_t>(index + 1); }

Trouble trouble(Fault fault, std::size_t index, const char* reason, std::string word = {}) {
  return {{fault, position(index), reason}, std::move(word)};
}

// A cell that cannot be read as what is needed, for whatever reason.
Trouble not_a(const char* needed_but_text, const char* needed_but_logical, std::size_t index,
              const Cell& cell) {
  if (std::holds_alternative<Blank>(cell)) return trouble(Fault::missing, index, "is blank");
  if (const auto* text = std::get_if<std::string>(&cell)) {
    if (text->empty()) return trouble(Fault::missing, index, "is empty");
    return trouble(Fault::wrong_kind, index, needed_but_text, quotable(*text));
  }
  if (const auto* error = std::get_if<Error>(&cell)) {
    const Problem& inner = error->problem();
    return trouble(inner.failure.fault, index, "is itself an error",
                   inner.row != nullptr ? sentence(inner) : std::string{});
  }
  return trouble(Fault::wrong_kind, index, needed_but_logical);
}

Failure against_limit(Fault fault, std::uint8_t at, const char* reason, Measure value,
                      Measure limit) {
  Failure failure{fault, at, reason, {{value, limit}}};
  failure.limit_of_argument = true;
  return failure;
}

// The zero of a temperature is the absolute one, which is no zero in °C; a negative pressure is
// most often a gauge reading.
const char* not_above_zero(Quantity quantity) {
  if (quantity == Quantity::temperature) return "{0} is not above {1}";
  if (quantity == Quantity::pressure) {
    return "{0} is not above zero: pressures are absolute here, see ABSOLUTE_PRESSURE for a gauge "
           "reading and ABSOLUTE_FROM_VACUUM for a vacuum";
  }
  return "{0} is not above zero";
}

// A zero that is out of range may be a blank cell: Calc hands both over as 0.
Failure outside(std::size_t index, const Argument& argument, Quantity quantity, double number,
                double si) {
  const Measure value{si, quantity};
  const std::uint8_t at = position(index);
  if (si < argument.low) {
    if (argument.low == kAboveZero) {
      if (number == 0) return {Fault::zero_or_blank, at, "is zero or blank"};
      return {Fault::outside_range, at, not_above_zero(quantity), {{value, {0, quantity}}}};
    }
    const Measure limit{argument.low, quantity};
    if (number == 0) {
      return against_limit(Fault::zero_or_blank, at, "is zero or blank, and {0} is below {1}",
                           value, limit);
    }
    return against_limit(Fault::outside_range, at, "{0} is below {1}", value, limit);
  }
  const Measure limit{argument.high, quantity};
  // 1e308 bar is more pascal than a double holds.
  if (std::isinf(si)) return against_limit(Fault::outside_range, at, "is above {1}", value, limit);
  if (quantity == Quantity::fraction && si >= kLeastPercentage && si <= kHundredPercent) {
    const Measure meant{si / kHundredPercent, quantity};
    return {Fault::outside_range,
            at,
            "{0} is above {1}: a fraction is meant, {2} if this was a percentage",
            {{value, limit, meant}}};
  }
  return against_limit(Fault::outside_range, at, "{0} is above {1}", value, limit);
}

Trouble read_number(const Row& row, std::size_t index, const Cell& cell, UnitSet units,
                    double& si) {
  const double* number = std::get_if<double>(&cell);
  if (number == nullptr) {
    return not_a("is a text where a number is needed", "is a logical where a number is needed",
                 index, cell);
  }
  if (!std::isfinite(*number)) {
    return trouble(Fault::outside_range, index, "is not a finite number");
  }
  const Argument& argument = row.arguments[index];
  const Quantity quantity = row.types[index].quantity;
  si = unit_of(units, quantity).to_si(*number);
  if (si >= argument.low && si <= argument.high) [[likely]]
    return {};
  return {outside(index, argument, quantity, *number, si), {}};
}

// `keep` takes the stream that was read.
template <class Keep>
Trouble read_stream_cell(std::size_t index, const Cell& cell, Keep&& keep) {
  const auto* text = std::get_if<std::string>(&cell);
  if (text == nullptr || text->empty()) {
    if (const double* number = std::get_if<double>(&cell); number != nullptr && *number == 0) {
      return trouble(Fault::zero_or_blank, index, "is zero or blank where a stream is needed");
    }
    if (std::holds_alternative<double>(cell)) {
      return trouble(Fault::wrong_kind, index, "is a number where a stream is needed");
    }
    return not_a("", "is a logical where a stream is needed", index, cell);
  }
  const Outcome<Stream> read = read_stream(*text);
  if (!read) {
    return {read.failure().about(position(index)), quotable(*text)};
  }
  keep(*read);
  return {};
}

Trouble read_word(std::size_t index, const Cell& cell, Slot& slot) {
  const auto* text = std::get_if<std::string>(&cell);
  if (text != nullptr && !text->empty()) {
    slot.set(text->data(), text->size());
    return {};
  }
  if (const double* number = std::get_if<double>(&cell)) {
    if (*number == 0)
      return trouble(Fault::zero_or_blank, index, "is zero or blank where a word is needed");
    return trouble(Fault::wrong_kind, index, "is a number where a word is needed");
  }
  return not_a("", "is a logical where a word is needed", index, cell);
}

// Every cell of a range, read by `take(cell)`; a failure gets the place of its cell.
template <class Take>
Trouble read_cells(const Grid& grid, Take&& take) {
  for (std::size_t r = 0; r < grid.rows(); ++r) {
    for (std::size_t c = 0; c < grid.columns(); ++c) {
      Trouble found = take(grid.at(r, c));
      if (!found) continue;
      if (!grid.is_single()) {
        found.failure.row = static_cast<std::uint32_t>(r + 1);
        found.failure.column = static_cast<std::uint32_t>(c + 1);
      }
      return found;
    }
  }
  return {};
}

// Made once; read anew for every row of a lifted call.
GivenComposition& composition_of(std::size_t index, Workspace& space, Slot& slot) {
  GivenComposition*& given = space.composition[index];
  if (given == nullptr) given = &space.compositions.emplace_front();
  slot.set(given, 1);
  return *given;
}

}  // namespace

bool is_lifted(Kind kind, const Grid& grid) {
  if (kind == Kind::composition) return grid.rows() == 1 || grid.columns() == 1;
  return kind == Kind::number || kind == Kind::stream || kind == Kind::word;
}

Trouble read_cell(const Row& row, std::size_t index, const Cell& cell, UnitSet units,
                  Workspace& space, Slot& slot) {
  slot.given = true;
  switch (row.types[index].kind) {
    case Kind::number:
      return read_number(row, index, cell, units, slot.si);
    case Kind::stream:
      return read_stream_cell(index, cell, [&](const Stream& stream) {
        slot.stream = space.stream[index].hold(stream);
      });
    case Kind::word:
      return read_word(index, cell, slot);
    case Kind::composition: {
      GivenComposition& given = composition_of(index, space, slot);
      return read_composition_cell(index, cell, row.types[index].use, given);
    }
    default:
      return {};
  }
}

Trouble read_range(const Row& row, std::size_t index, const Grid& grid, UnitSet units,
                   Workspace& space, Slot& slot) {
  slot.given = true;
  if (row.types[index].kind == Kind::composition) {
    return read_composition_table(index, grid, row.types[index].use,
                                  composition_of(index, space, slot));
  }
  const std::size_t cells = grid.rows() * grid.columns();
  if (row.types[index].kind == Kind::streams) {
    auto& streams = space.streams.emplace_front();
    streams.reserve(cells);
    Trouble found = read_cells(grid, [&](const Cell& cell) {
      return read_stream_cell(index, cell,
                              [&](const Stream& stream) { streams.push_back(stream); });
    });
    slot.set(streams.data(), streams.size());
    return found;
  }
  auto& numbers = space.numbers.emplace_front();
  numbers.reserve(cells);
  Trouble found = read_cells(grid, [&](const Cell& cell) {
    return read_number(row, index, cell, units, numbers.emplace_back());
  });
  slot.set(numbers.data(), numbers.size());
  return found;
}

}  // namespace busbar
