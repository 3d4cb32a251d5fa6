#include "catalogue/call.hpp"

#include <algorithm>
#include <cmath>
#include <memory>

#include "catalogue/arguments.hpp"
#include "catalogue/columns.hpp"
#include "catalogue/options.hpp"
#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "stream/text.hpp"

namespace busbar {
namespace {

struct Shape {
  std::size_t rows = 1;
  std::size_t columns = 1;
};

// One call of a row: its arguments, decoded once where they do not vary.
class Caller {
 public:
  Caller(const Row& row, Arguments arguments) : row_(row), arguments_(arguments) {}

  Grid run() {
    if (const Trouble found = prepare()) return Grid(error(found));
    if (shape_.rows * shape_.columns == 1) return finish(read_varying(0, 0));
    if (row_.result.kind == ResultKind::table) {
      return Grid(
          error({{Fault::wrong_shape, 0, "gives a table and takes single cells only"}, {}}));
    }
    Grid out(shape_.rows, shape_.columns);
    if (row_.batch != nullptr && shape_.rows * shape_.columns >= Columns::kFewest) {
      fill_in_batches(out);
    } else {
      for (std::size_t r = 0; r < shape_.rows; ++r) {
        for (std::size_t c = 0; c < shape_.columns; ++c) out.at(r, c) = read_and_compute(r, c);
      }
    }
    return out;
  }

  [[nodiscard]] UnitSet units() const { return options_.units; }

  // After a run that worked: what the first cell's computation has to say.
  void explain_first(std::string& text) {
    if (prepare() || read_varying(0, 0)) return;
    Result result;
    if (row_.thunk(slots_.data(), options_, result).fault != Fault::none) return;
    if (row_.explain != nullptr) row_.explain(slots_.data(), result, options_.units, text);
    for (std::size_t i = 0; i < row_.arguments.size(); ++i) {
      const bool zero_temperature =
          row_.types[i].kind == Kind::number && slots_[i].given &&
          row_.types[i].quantity == Quantity::temperature &&
          unit_of(options_.units, Quantity::temperature).to_si(0) == slots_[i].si;
      if (!zero_temperature) continue;
      text += " Note: ";
      text += row_.arguments[i].name;
      text += " is exactly 0; Calc hands a blank cell over as 0 too.";
    }
  }

 private:
  [[nodiscard]] const Grid* given(std::size_t index) const {
    return index < arguments_.size() ? arguments_[index] : nullptr;
  }

  [[nodiscard]] bool has_rest() const {
    return !row_.types.empty() && row_.types.back().kind == Kind::rest;
  }

  [[nodiscard]] bool takes_whole_range() const {
    if (row_.types.empty()) return false;
    const Kind first = row_.types.front().kind;
    return first == Kind::numbers || first == Kind::streams;
  }

  Trouble prepare() {
    if (arguments_.size() > row_.argument_count() && !has_rest()) return too_many();
    if (Trouble found = read_units()) return found;
    for (std::size_t i = 0; i < row_.arguments.size(); ++i) {
      if (Trouble found = read_constant(i)) {
        Trouble cause = misplaced_units();
        return cause ? cause : found;
      }
    }
    return {};
  }

  [[nodiscard]] Trouble too_many() const {
    const Measure most{static_cast<double>(row_.argument_count()), Quantity::number};
    const Measure given{static_cast<double>(arguments_.size()), Quantity::number};
    const char* reason = "takes {0} arguments at the most; {1} were given";
    if (row_.argument_count() == 1) reason = "takes one argument; {1} were given";
    if (row_.argument_count() == 0) reason = "takes no arguments; {1} were given";
    if (takes_whole_range()) reason = "takes one range, not a list of {1} arguments";
    return {{Fault::wrong_shape, 0, reason, {{most, given}}}, {}};
  }

  // The unit set in the place of a number: the gap for an argument that was left out is missing,
  // and whatever else fails was read in the wrong units.
  [[nodiscard]] Trouble misplaced_units() const {
    if (!row_.has_options || given(row_.arguments.size()) != nullptr) return {};
    for (std::size_t i = 0; i < row_.arguments.size(); ++i) {
      const Grid* grid = given(i);
      if (grid == nullptr || !grid->is_single() || row_.types[i].kind != Kind::number) continue;
      const auto* text = std::get_if<std::string>(&grid->at(0, 0));
      if (text == nullptr || !unit_set_named(trimmed(*text))) continue;
      return {{Fault::wrong_kind, static_cast<std::uint8_t>(i + 1),
               "is a unit set where a number is needed; it belongs in options, the last argument: "
               "write an empty argument (;;) for each one that is left out before it"},
              *text};
    }
    return {};
  }

  Trouble read_units() {
    if (!row_.has_options) return {};
    const Grid* grid = given(row_.arguments.size());
    const auto at = static_cast<std::uint8_t>(row_.arguments.size() + 1);
    if (grid == nullptr) return {};
    if (!grid->is_single()) {
      const char* reason = takes_whole_range()
                               ? "is a second range where the options belong; the function takes "
                                 "one range that holds all its cells"
                               : "is a range; one cell with the unit set is needed";
      return {{Fault::wrong_shape, at, reason}, {}};
    }
    const Cell& cell = grid->at(0, 0);
    if (const double* number = std::get_if<double>(&cell); number != nullptr && *number == 0) {
      return {{Fault::zero_or_blank, at,
               "is zero or blank; leave it out or write \"metric\", \"us\" or \"si\""},
              {}};
    }
    const auto* text = std::get_if<std::string>(&cell);
    if (text == nullptr || text->empty()) {
      const bool empty = text != nullptr || std::holds_alternative<Blank>(cell);
      return {{empty ? Fault::missing : Fault::wrong_kind, at,
               "holds no unit set; leave it out or write \"metric\", \"us\" or \"si\""},
              {}};
    }
    Trouble found;
    const Outcome<Options> options = read_options(*text, found.word);
    if (!options) {
      found.failure = options.failure().about(at);
      return found;
    }
    options_ = *options;
    return {};
  }

  // Reads what is the same for every cell of the result and finds the shape of the rest.
  Trouble read_constant(std::size_t index) {
    const Type& type = row_.types[index];
    if (type.kind == Kind::rest) {
      const Arguments rest = arguments_.subspan(std::min(index, arguments_.size()));
      slots_[index].set(rest.data(), rest.size());
      return {};
    }
    const Grid* grid = given(index);
    if (grid == nullptr) {
      if (type.optional) return {};
      return {{Fault::missing, static_cast<std::uint8_t>(index + 1), "is left out"}, {}};
    }
    if (!is_lifted(type.kind, *grid)) {
      if (type.kind == Kind::cell) return {};
      return read_range(row_, index, *grid, options_.units, space_, slots_[index]);
    }
    if (grid->is_single()) {
      return read_cell(row_, index, grid->at(0, 0), options_.units, space_, slots_[index]);
    }
    varying_[varying_count_++] = index;
    const auto fit = [](std::size_t& whole, std::size_t part) {
      if (part == 1 || part == whole) return true;
      if (whole != 1) return false;
      whole = part;
      return true;
    };
    if (!fit(shape_.rows, grid->rows()) || !fit(shape_.columns, grid->columns())) {
      return {{Fault::wrong_shape,
               static_cast<std::uint8_t>(index + 1),
               "has {0} rows and {1} columns, which fits no other range of the call",
               {{{static_cast<double>(grid->rows()), Quantity::number},
                 {static_cast<double>(grid->columns()), Quantity::number}}}},
              {}};
    }
    if (shape_.rows * shape_.columns > kCellLimit) {
      return {{Fault::too_large, 0, "would fill more cells than one call may"}, {}};
    }
    return {};
  }

  Cell read_and_compute(std::size_t r, std::size_t c) {
    const Trouble found = read_varying(r, c);
    if (found) return error(found);
    return compute();
  }

  // What the batch kernel does not answer, for whatever reason, is computed as a single cell.
  void fill_in_batches(Grid& out) {
    std::array<Spread, kMostArguments> varying{};
    for (std::size_t i = 0; i < varying_count_; ++i) {
      varying[i] = {arguments_[varying_[i]], varying_[i]};
    }
    const auto batches = std::make_unique<Columns>(row_, options_.units, slots_,
                                                   std::span(varying).first(varying_count_));
    const std::size_t cells = shape_.rows * shape_.columns;
    std::size_t r = 0;
    std::size_t c = 0;
    for (std::size_t done = 0; done < cells; done += Columns::kMost) {
      const std::size_t count = std::min(Columns::kMost, cells - done);
      for (const double number : batches->compute(done, count, shape_.columns)) {
        Cell& cell = out.at(r, c);
        if (std::isfinite(number)) {
          cell = number;
        } else {
          cell = read_and_compute(r, c);
        }
        if (++c == shape_.columns) {
          c = 0;
          ++r;
        }
      }
    }
  }

  Trouble read_varying(std::size_t r, std::size_t c) {
    for (std::size_t i = 0; i < varying_count_; ++i) {
      const std::size_t index = varying_[i];
      const Grid& grid = *arguments_[index];
      const Cell& cell = grid.at(grid.rows() == 1 ? 0 : r, grid.columns() == 1 ? 0 : c);
      if (Trouble found = read_cell(row_, index, cell, options_.units, space_, slots_[index]))
        return found;
    }
    return {};
  }

  Grid finish(const Trouble& found) {
    if (found) return Grid(error(found));
    if (row_.result.kind != ResultKind::table) return Grid(compute());
    Result result;
    const Failure failure = row_.thunk(slots_.data(), options_, result);
    if (failure.fault != Fault::none) return Grid(error(about(failure)));
    return std::move(*result.table);
  }

  Cell compute() {
    Result result;
    const Failure failure = row_.thunk(slots_.data(), options_, result);
    if (failure.fault != Fault::none) return error(about(failure));
    switch (row_.result.kind) {
      case ResultKind::number: {
        const double number = unit_of(options_.units, row_.result.quantity).from_si(result.si);
        if (std::isfinite(number)) return number;
        return error({{Fault::outside_range, 0, "has no finite result for these arguments"}, {}});
      }
      case ResultKind::stream: {
        std::string text;
        text.reserve(160);
        write_stream(text, *result.stream,
                     row_.has_options ? options_.units : face_of_first_stream());
        return text;
      }
      case ResultKind::text:
        return std::move(result.text.value);
      case ResultKind::table:
        break;
    }
    return error({{Fault::internal, 0, "has a defect: please report it"}, {}});
  }

  // A function without options writes the stream as its first stream was written.
  [[nodiscard]] UnitSet face_of_first_stream() const {
    for (std::size_t i = 0; i < row_.types.size(); ++i) {
      const Slot& slot = slots_[i];
      if (slot.stream != nullptr) return slot.stream->face;
      if (row_.types[i].kind == Kind::streams && slot.size > 0) return slot.streams().front().face;
    }
    return UnitSet::metric;
  }

  // Adds the word that a failing kernel was given, or the tag of the stream.
  [[nodiscard]] Trouble about(const Failure& failure) const {
    Trouble found{failure, {}};
    if (failure.argument == 0 || failure.argument > row_.types.size()) return found;
    const std::size_t index = failure.argument - std::size_t{1};
    if (row_.types[index].kind == Kind::composition) {
      return placed(failure, slots_[index].composition());
    }
    if (row_.types[index].kind == Kind::word) found.word = quotable(slots_[index].word());
    if (row_.types[index].kind == Kind::stream) found.word = slots_[index].stream->tag.text();
    return found;
  }

  [[nodiscard]] Cell error(const Trouble& found) const {
    return Error({found.failure, &row_, options_.units, found.word});
  }

  const Row& row_;
  Arguments arguments_;
  Options options_;
  Shape shape_;
  std::array<Slot, kMostArguments> slots_;
  std::array<std::size_t, kMostArguments> varying_{};
  std::size_t varying_count_ = 0;
  Workspace space_;
};

void append_place(std::string& text, const Grid& grid, std::size_t r, std::size_t c) {
  if (grid.is_single()) return;
  text += "Row " + std::to_string(r + 1) + ", column " + std::to_string(c + 1) + " of the result: ";
}

}  // namespace

Grid call(const Row& row, Arguments arguments) { return Caller(row, arguments).run(); }

std::string explain(const Row& row, Arguments arguments) {
  const Grid result = call(row, arguments);
  std::string text;
  for (std::size_t r = 0; r < result.rows(); ++r) {
    for (std::size_t c = 0; c < result.columns(); ++c) {
      const auto* error = std::get_if<Error>(&result.at(r, c));
      if (error == nullptr) continue;
      append_place(text, result, r, c);
      text += sentence(error->problem());
      return text;
    }
  }
  text += row.words.name;
  text += result.is_single() || row.result.kind == ResultKind::table ? " works."
                                                                     : " works. First cell:";
  Caller(row, arguments).explain_first(text);
  text += " Source: ";
  text += source_text(row);
  text += '.';
  return text;
}

}  // namespace busbar
