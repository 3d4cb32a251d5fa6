#include "catalogue/composition.hpp"

#include <cmath>
#include <vector>

#include "catalogue/arguments.hpp"
#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "fuel/solid/state.hpp"
#include "gas/published.hpp"

namespace busbar {
namespace {

constexpr double kHundredPercent = 100;

std::uint8_t position(std::size_t index) { return static_cast<std::uint8_t>(index + 1); }

Trouble trouble(Fault fault, std::size_t index, const char* reason, std::string word = {}) {
  return {{fault, position(index), reason}, std::move(word)};
}

// A table of two or three columns, or rows, seen as lines of a name, an amount and an uncertainty.
class Lines {
 public:
  Lines(const Grid& grid, bool horizontal) : grid_(grid), horizontal_(horizontal) {}

  [[nodiscard]] std::size_t count() const { return horizontal_ ? grid_.columns() : grid_.rows(); }
  [[nodiscard]] std::size_t places() const { return horizontal_ ? grid_.rows() : grid_.columns(); }
  [[nodiscard]] const Cell& at(std::size_t line, std::size_t place) const {
    return horizontal_ ? grid_.at(place, line) : grid_.at(line, place);
  }
  [[nodiscard]] Trouble found_at(Trouble found, std::size_t line, std::size_t place) const {
    found.failure.row = static_cast<std::uint32_t>((horizontal_ ? place : line) + 1);
    found.failure.column = static_cast<std::uint32_t>((horizontal_ ? line : place) + 1);
    return found;
  }

 private:
  const Grid& grid_;
  bool horizontal_;
};

std::string_view text_in(const Cell& cell) {
  const auto* text = std::get_if<std::string>(&cell);
  return text == nullptr ? std::string_view{} : trimmed(*text);
}

bool is_blank(const Cell& cell) {
  if (std::holds_alternative<Blank>(cell)) return true;
  const auto* text = std::get_if<std::string>(&cell);
  return text != nullptr && trimmed(*text).empty();
}

Trouble inner_error(std::size_t index, const Error& error) {
  const Problem& inner = error.problem();
  return trouble(inner.failure.fault, index, "is itself an error",
                 inner.row != nullptr ? sentence(inner) : std::string{});
}

// The text behind basis and scale, which only the analysis of a fuel has.
Trouble as_analysis(std::size_t index, std::string_view state, GivenComposition& given) {
  if (given.composition.basis != Basis::mass) {
    return trouble(Fault::wrong_kind, index,
                   "is by mole: the analysis of a fuel is by mass, such as \"mass % dry\"");
  }
  const auto named = fuel::solid::state_named(state);
  if (!named) {
    const bool none = state.empty();
    return trouble(none ? Fault::missing : Fault::unknown_word, index,
                   none ? "states no basis of the fuel: write \"mass % as received\", \"mass % "
                          "air-dried\", \"mass % dry\" or \"mass % daf\""
                        : fuel::solid::kUnknownState,
                   quotable(state));
  }
  std::vector<fuel::solid::Entry> entries;
  entries.reserve(given.composition.parts.size());
  for (const Part& part : given.composition.parts) entries.push_back({part.name, part.amount});
  const Outcome<fuel::solid::Analysis> analysis = fuel::solid::read(*named, entries);
  if (!analysis) return placed(analysis.failure().about(position(index)), given);
  given.analysis = *analysis;
  return {};
}

Trouble resolved(std::size_t index, CompositionUse use, std::string_view state,
                 GivenComposition& given) {
  if (use == CompositionUse::fuel) return as_analysis(index, state, given);
  if (use != CompositionUse::gas) return {};
  const Outcome<gas::Mixture> mixture = gas::Mixture::from(given.composition);
  if (!mixture) return placed(mixture.failure().about(position(index)), given);
  given.mixture = *mixture;
  return {};
}

// The heading over the amounts.
Trouble read_table_heading(std::size_t index, const Lines& lines, CompositionUse use,
                           Heading& heading, std::string_view& state) {
  const Cell& cell = lines.at(0, 1);
  if (const auto* error = std::get_if<Error>(&cell)) {
    return lines.found_at(inner_error(index, *error), 0, 1);
  }
  const std::string_view text = text_in(cell);
  const auto read = read_heading(text, state);
  if (read && (state.empty() || use == CompositionUse::fuel)) {
    heading = *read;
    return {};
  }
  if (is_blank(cell)) {
    return lines.found_at(
        trouble(Fault::missing, index,
                "is blank: the heading over the amounts states their basis, \"mole\", \"mole %\", "
                "\"mass\" or \"mass %\""),
        0, 1);
  }
  if (text.empty()) {
    return lines.found_at(
        trouble(Fault::wrong_kind, index,
                "is no heading: the first line states the basis of the amounts, \"mole\", \"mole "
                "%\", \"mass\" or \"mass %\""),
        0, 1);
  }
  return lines.found_at(trouble(Fault::unknown_word, index, why_no_heading(text), quotable(text)),
                        0, 1);
}

// The heading over the uncertainties, where there is such a column.
Trouble read_uncertainty_heading(std::size_t index, const Lines& lines) {
  if (lines.places() < 3) return {};
  const Cell& cell = lines.at(0, 2);
  if (const auto* error = std::get_if<Error>(&cell)) {
    return lines.found_at(inner_error(index, *error), 0, 2);
  }
  const std::string_view text = text_in(cell);
  if (equal_ignoring_case(text, "standard uncertainty")) return {};
  return lines.found_at(
      trouble(is_blank(cell) ? Fault::missing : Fault::unknown_word, index,
              "is no heading for what stands beside the amounts: only their \"standard "
              "uncertainty\" may, in the same unit (half of an expanded one of k = 2)",
              quotable(text)),
      0, 2);
}

Trouble read_uncertainty(std::size_t index, const Lines& lines, std::size_t line,
                         const Heading& heading, Part& part) {
  if (lines.places() < 3 || is_blank(lines.at(line, 2))) return {};
  const double* number = std::get_if<double>(&lines.at(line, 2));
  if (number == nullptr || !std::isfinite(*number)) {
    return lines.found_at(
        trouble(number == nullptr ? Fault::wrong_kind : Fault::outside_range, index,
                number == nullptr ? "has an uncertainty that is no number"
                                  : "has an uncertainty that is not finite",
                quotable(part.name)),
        line, 2);
  }
  part.uncertainty = heading.percent ? *number / kHundredPercent : *number;
  return {};
}

Trouble read_line(std::size_t index, const Lines& lines, std::size_t line, const Heading& heading,
                  Part& part) {
  const Cell& name = lines.at(line, 0);
  const Cell& amount = lines.at(line, 1);
  for (std::size_t place = 0; place < lines.places(); ++place) {
    if (const auto* error = std::get_if<Error>(&lines.at(line, place))) {
      return lines.found_at(inner_error(index, *error), line, place);
    }
  }
  part.name = text_in(name);
  if (part.name.empty()) {
    const bool blank = is_blank(name);
    return lines.found_at(
        trouble(blank ? Fault::missing : Fault::wrong_kind, index,
                blank ? "is blank: an amount has no name" : "is no text: a name is needed"),
        line, 0);
  }
  const double* number = std::get_if<double>(&amount);
  if (number == nullptr) {
    const bool blank = is_blank(amount);
    return lines.found_at(
        trouble(blank ? Fault::missing : Fault::wrong_kind, index,
                blank ? "has no amount" : "has an amount that is no number", quotable(part.name)),
        line, 1);
  }
  if (!std::isfinite(*number)) {
    return lines.found_at(trouble(Fault::outside_range, index, "has an amount that is not finite",
                                  quotable(part.name)),
                          line, 1);
  }
  part.amount = heading.percent ? *number / kHundredPercent : *number;
  return read_uncertainty(index, lines, line, heading, part);
}

}  // namespace

Trouble read_composition_cell(std::size_t index, const Cell& cell, CompositionUse use,
                              GivenComposition& given) {
  given.table = false;
  const auto* text = std::get_if<std::string>(&cell);
  if (text == nullptr || trimmed(*text).empty()) {
    if (const double* number = std::get_if<double>(&cell)) {
      if (*number == 0) {
        return trouble(Fault::zero_or_blank, index,
                       "is zero or blank where a composition is needed");
      }
      return trouble(Fault::wrong_kind, index, "is a number where a composition is needed");
    }
    if (const auto* error = std::get_if<Error>(&cell)) return inner_error(index, *error);
    if (std::holds_alternative<bool>(cell)) {
      return trouble(Fault::wrong_kind, index, "is a logical where a composition is needed");
    }
    return trouble(Fault::missing, index, text == nullptr ? "is blank" : "is empty");
  }
  std::string_view state;
  if (const gas::PublishedMixture* mixture = gas::published_mixture(trimmed(*text))) {
    given.composition.basis = mixture->basis;
    given.composition.parts.assign(mixture->parts.begin(), mixture->parts.end());
    return resolved(index, use, state, given);
  }
  Trouble found;
  Outcome<Composition> read =
      read_composition(*text, found.word, use == CompositionUse::fuel ? &state : nullptr);
  if (!read) {
    found.failure = read.failure().about(position(index));
    return found;
  }
  given.composition = std::move(*read);
  return resolved(index, use, state, given);
}

Trouble read_composition_table(std::size_t index, const Grid& grid, CompositionUse use,
                               GivenComposition& given) {
  // Columns unless the heading stands where that of rows would.
  const auto few = [](std::size_t count) { return count == 2 || count == 3; };
  const bool horizontal =
      few(grid.rows()) && (!few(grid.columns()) || (!read_heading(text_in(grid.at(0, 1))) &&
                                                    read_heading(text_in(grid.at(1, 0)))));
  if (!horizontal && !few(grid.columns())) {
    return {{Fault::wrong_shape,
             position(index),
             "has {0} rows and {1} columns: names and amounts stand in two columns or in two rows",
             {{{static_cast<double>(grid.rows()), Quantity::number},
               {static_cast<double>(grid.columns()), Quantity::number}}}},
            {}};
  }
  const Lines lines(grid, horizontal);
  given.table = true;
  given.horizontal = horizontal;
  Heading heading;
  std::string_view state;
  if (Trouble found = read_table_heading(index, lines, use, heading, state)) return found;
  if (Trouble found = read_uncertainty_heading(index, lines)) return found;
  given.composition.basis = heading.basis;
  std::size_t end = lines.count();
  while (end > 1 && is_blank(lines.at(end - 1, 0)) && is_blank(lines.at(end - 1, 1))) --end;
  if (end == 1) return trouble(Fault::missing, index, "holds a heading and no parts");
  if (end - 1 > kMostParts) {
    return {{Fault::too_large,
             position(index),
             "has more than {0} parts",
             {{{static_cast<double>(kMostParts), Quantity::number}}}},
            {}};
  }
  given.composition.parts.resize(end - 1);
  for (std::size_t i = 1; i < end; ++i) {
    if (Trouble found = read_line(index, lines, i, heading, given.composition.parts[i - 1])) {
      return found;
    }
  }
  return resolved(index, use, state, given);
}

Trouble placed(const Failure& failure, const GivenComposition& given) {
  Trouble found{failure, {}};
  const std::size_t part = failure.row;
  if (part == 0 || part > given.composition.parts.size()) return found;
  found.word = quotable(given.composition.parts[part - 1].name);
  found.failure.row = 0;
  if (!given.table) return found;
  const auto line = static_cast<std::uint32_t>(part + 1);
  found.failure.row = given.horizontal ? 1 : line;
  found.failure.column = given.horizontal ? line : 1;
  return found;
}

}  // namespace busbar
