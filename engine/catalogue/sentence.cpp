#include "catalogue/sentence.hpp"

#include "core/text.hpp"

namespace busbar {
namespace {

constexpr int kDigits = 6;

constexpr Argument kOptions{
    "options",
    "Unit set of all numbers of this call: \"metric\" (bar, °C, kJ/kg, kg/s, MW), \"us\" (psia, "
    "°F, "
    "Btu/lb, lb/h, MW) or \"si\" (Pa, K, J/kg, kg/s, W); metric when left out"};

std::string number_text(double si, Quantity quantity, UnitSet units) {
  std::string text;
  append_number(text, unit_of(units, quantity).from_si(si), kDigits);
  return text;
}

// Six digits, or all of them where two different measures would otherwise read the same.
void append_distinct(std::string& out, const Failure& failure, std::size_t index, UnitSet units) {
  const Measure& measure = failure.measures[index];
  for (const Measure& other : failure.measures) {
    if (other.quantity == measure.quantity && other.si != measure.si && other.si != 0 &&
        number_text(other.si, other.quantity, units) ==
            number_text(measure.si, measure.quantity, units)) {
      const Unit& unit = unit_of(units, measure.quantity);
      append_exact(out, unit.from_si(measure.si));
      if (!unit.symbol.empty()) out += ' ';
      out += unit.symbol;
      return;
    }
  }
  append_measure(out, measure, units);
}

// Replaces {0}, {1} and {2}.
void append_reason(std::string& out, const Failure& failure, UnitSet units) {
  std::string_view left = failure.reason;
  while (!left.empty()) {
    const auto brace = left.find('{');
    out += left.substr(0, brace);
    if (brace == std::string_view::npos || brace + 2 >= left.size()) return;
    const std::size_t index = static_cast<std::size_t>(left[brace + 1] - '0');
    if (index < failure.measures.size()) append_distinct(out, failure, index, units);
    left.remove_prefix(brace + 3);
  }
}

}  // namespace

void append_measure(std::string& out, Measure measure, UnitSet units) {
  const Unit& unit = unit_of(units, measure.quantity);
  append_number(out, unit.from_si(measure.si), kDigits);
  if (unit.symbol.empty()) return;
  out += ' ';
  out += unit.symbol;
}

const Argument& options_argument() { return kOptions; }

std::string sentence(const Problem& problem) {
  const Failure& failure = problem.failure;
  std::string text;
  const Argument* argument = nullptr;
  if (problem.row != nullptr) {
    text += problem.row->words.name;
    text += ": ";
    const std::size_t index = failure.argument;
    if (index > 0 && index <= problem.row->argument_count()) {
      const bool options = index > problem.row->arguments.size();
      argument = options ? &kOptions : &problem.row->arguments[index - 1];
      text += argument->name;
      text += ' ';
    }
    if (failure.row > 0) {
      text += "in row " + std::to_string(failure.row) + ", column " +
              std::to_string(failure.column) + " of its range ";
    }
  }
  if (!problem.word.empty()) {
    text += '"';
    text += problem.word;
    text += "\" ";
  }
  append_reason(text, failure, problem.units);
  if (failure.limit_of_argument && argument != nullptr) {
    text += ", ";
    text += argument->limit;
  }
  return text;
}

std::string source_text(const Row& row) {
  std::string text = row.words.source.document;
  for (const char* part : {row.words.source.edition, row.words.source.place}) {
    if (std::string_view(part).empty()) continue;
    text += ", ";
    text += part;
  }
  return text;
}

std::string describe_range(const Row& row, std::size_t argument, UnitSet units) {
  if (argument >= row.arguments.size()) return {};
  const Type& type = row.types[argument];
  if (type.kind != Kind::number && type.kind != Kind::numbers) return {};
  const Argument& words = row.arguments[argument];
  const auto limit = [&](double si) { return number_text(si, type.quantity, units); };
  std::string text(unit_of(units, type.quantity).symbol);
  if (type.quantity == Quantity::fraction) text = "fraction";
  if (type.quantity == Quantity::same_unit) text = "any unit";
  const bool below = words.low > -kNoLimit;
  const bool above = words.high < kNoLimit;
  if (!below && !above) return text;
  if (!text.empty()) text += ", ";
  if (words.low == kAboveZero) {
    // In °C and °F the absolute zero is not 0.
    text += "above " + limit(0);
    if (above) text += ", up to " + limit(words.high);
  } else if (below && above) {
    text += limit(words.low) + " to " + limit(words.high);
  } else if (below) {
    text += "from " + limit(words.low);
  } else {
    text += "up to " + limit(words.high);
  }
  return text;
}

}  // namespace busbar
