// Calc's own functions inside a formula that WHY takes apart. Those that choose between their
// arguments or take errors away are done here, because an error in the part that was not chosen
// explains nothing; all others are computed by Calc itself.
#include <algorithm>
#include <array>
#include <com/sun/star/lang/XMultiComponentFactory.hpp>
#include <com/sun/star/sheet/XFunctionAccess.hpp>
#include <string_view>
#include <utility>

#include "marshal.hpp"
#include "text.hpp"
#include "why_evaluator.hpp"
#include "why_operators.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::sheet::XFunctionAccess;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using com::sun::star::uno::Sequence;
using com::sun::star::uno::UNO_QUERY_THROW;

// The answer depends on the place of the cell, on chance, on the clock, on other documents or on
// the network: to compute it again would give another answer or have an effect.
constexpr std::string_view kNotRepeatable =
    " AREAS CELL CURRENT DDE FILTERXML FORMULA GETPIVOTDATA GOALSEEK HYPERLINK INDIRECT "
    "INFO ISFORMULA ISREF MULTIRANGE NOW OFFSET RAND RAND.NV RANDBETWEEN RANDBETWEEN.NV "
    "SHEET SHEETS STYLE SUBTOTAL TABLE TODAY WEBSERVICE ZGZ ";

// Functions that may work although a cell of their range holds an error.
constexpr std::string_view kTolerant =
    " AGGREGATE AVERAGEIF AVERAGEIFS COLUMNS COUNT COUNTA COUNTBLANK COUNTIF COUNTIFS "
    "HLOOKUP INDEX LOOKUP MATCH MAXIFS MINIFS N ROWS SMALL SUMIF SUMIFS T TYPE VLOOKUP ";

// Functions of single values: a range stands for the cell in the same row or column, or in an array
// formula for each of its cells in turn.
constexpr std::string_view kSingle =
    " ABS ACOS ASIN ATAN ATAN2 CEILING COS COSH DATE DAY DEGREES EVEN EXP FLOOR HOUR INT LEFT LEN "
    "LN "
    "LOG LOG10 LOWER MID MOD MONTH MROUND NOT ODD PI POWER PROPER RADIANS RIGHT ROUND ROUNDDOWN "
    "ROUNDSIG ROUNDUP SEARCH SIGN SIN SINH SQRT SUBSTITUTE TAN TANH TEXT TRIM TRUNC UPPER VALUE "
    "YEAR ";

// Functions that count or skip errors among their arguments.
constexpr std::string_view kCounting = " AGGREGATE COUNT COUNTA ";

// Tests that take any error and answer.
constexpr std::string_view kTests =
    " ISBLANK ISERR ISERROR ISLOGICAL ISNA ISNONTEXT ISNUMBER ISTEXT ";

// The lists hold a blank before and after each word.
bool contains(std::string_view list, std::string_view word) {
  for (std::size_t at = list.find(word); !word.empty() && at != std::string_view::npos;
       at = list.find(word, at + 1))
    if (list[at - 1] == ' ' && list[at + word.size()] == ' ') return true;
  return false;
}

const Node& missing() {
  static const Node* const node = [] {
    auto* fresh = new Node;
    fresh->kind = NodeKind::missing;
    return fresh;
  }();
  return *node;
}

const Node& child(const Node& node, std::size_t index) {
  return index < node.children.size() ? node.children[index] : missing();
}

}  // namespace

Result Evaluator::compute_builtin(const Node& node, Want want) {
  const std::string_view word = node.word;
  if (word == "IF" || word == "CHOOSE") return choose(node, want);
  if (word == "IFS") return condition_list(node, want);
  if (word == "SWITCH") return switch_list(node, want);
  if (word == "IFERROR" || word == "IFNA") return after_failure(node, want);
  if (word == "INDEX") return index_into(node, want);
  if (word == "ROW" || word == "COLUMN") return position_of(node, want);
  if (contains(kTests, word)) return test_for_error(node, want);
  if (contains(kNotRepeatable, word) || word.empty())
    return unknown("uses " + (word.empty() ? std::string("a function") : node.word) +
                   ", which WHY does not compute again");
  return through_calc(node, want);
}

// A condition: one value, not a table.
Result Evaluator::truth(const Node& node, Want want, bool& holds) {
  Result condition = operand(node, want);
  if (!condition.usable()) return condition;
  const Shape shape = shape_of(condition.value);
  if (shape.rows != 1 || shape.columns != 1)
    return unknown("decides row by row inside another function");
  const double number = as_number(element_of(condition.value, 0, 0));
  if (error_in(number) != CalcError::none)
    return calc_fault(CalcError::value, "a condition that is neither true nor false");
  holds = number != 0;
  return condition;
}

// What a choosing function gives back: where one value is shown, a range stands for one cell.
Result Evaluator::branch(const Node& node, Want want) {
  return want == Want::element ? operand(node, want) : compute(node, want);
}

Result Evaluator::choose(const Node& node, Want want) {
  if (node.word == "IF") {
    bool holds = false;
    Result condition = truth(child(node, 0), want, holds);
    if (!condition.usable()) return condition;
    if (!holds && node.children.size() < 3) return of_value(Any(0.0));
    return branch(child(node, holds ? 1 : 2), want);
  }
  Result position = operand(child(node, 0), want);
  if (!position.usable()) return position;
  const double number = as_number(element_of(position.value, 0, 0));
  if (!(number >= 1) || number >= static_cast<double>(node.children.size()))
    return calc_fault(CalcError::argument, "CHOOSE with a position that it does not have");
  return branch(child(node, static_cast<std::size_t>(number)), want);
}

Result Evaluator::condition_list(const Node& node, Want want) {
  for (std::size_t i = 0; i + 1 < node.children.size(); i += 2) {
    bool holds = false;
    Result condition = truth(node.children[i], want, holds);
    if (!condition.usable()) return condition;
    if (holds) return branch(node.children[i + 1], want);
  }
  return calc_fault(CalcError::not_available, "IFS without a condition that holds");
}

Result Evaluator::switch_list(const Node& node, Want want) {
  Result subject = operand(child(node, 0), want);
  if (!subject.usable()) return subject;
  std::size_t i = 1;
  for (; i + 1 < node.children.size(); i += 2) {
    Result candidate = operand(node.children[i], want);
    if (!candidate.usable()) return candidate;
    const Any same = apply(Operator::equal, subject.value, candidate.value);
    if (as_number(element_of(same, 0, 0)) != 0) return branch(node.children[i + 1], want);
  }
  if (i < node.children.size()) return branch(node.children[i], want);
  return calc_fault(CalcError::not_available, "SWITCH without a case that fits");
}

Result Evaluator::after_failure(const Node& node, Want want) {
  Result first = branch(child(node, 0), want);
  if (!first.fault) return first;
  if (node.word == "IFNA" && first.fault->error != CalcError::not_available) return first;
  if (!hidden_) hidden_ = first.fault;
  return branch(child(node, 1), want);
}

Result Evaluator::test_for_error(const Node& node, Want want) {
  Result tested = operand(child(node, 0), want);
  if (!tested.unknown.empty()) return tested;
  const std::string_view word = node.word;
  if (!tested.fault) {
    if (word == "ISERROR" || word == "ISERR" || word == "ISNA") return of_value(Any(0.0));
    return through_calc(node, want);
  }
  if (!hidden_) hidden_ = tested.fault;
  const bool missing_value = tested.fault->error == CalcError::not_available;
  const bool holds = word == "ISERROR" || word == "ISNONTEXT" ||
                     (word == "ISNA" && missing_value) || (word == "ISERR" && !missing_value);
  return of_value(Any(holds ? 1.0 : 0.0));
}

// The row or column of a reference, or of the cell itself, counted from 1.
Result Evaluator::position_of(const Node& node, Want want) {
  Address place = cell_;
  if (!node.children.empty()) {
    const auto area = area_behind(node.children.front());
    if (!area || (!area->single() && want != Want::element))
      return unknown("uses " + node.word + " of a range inside another function");
    place = area->first;
    if (formula_.array && area->rows() > 1) place.row += formula_.row;
    if (formula_.array && area->columns() > 1) place.column += formula_.column;
  }
  return of_value(Any((node.word == "ROW" ? place.row : place.column) + 1.0));
}

// INDEX of a reference leads to one cell, whatever the others hold.
Result Evaluator::index_into(const Node& node, Want want) {
  const auto area = area_behind(child(node, 0));
  if (!area || node.children.size() > 3) return through_calc(node, want);
  std::array<double, 2> position{0, 0};
  for (std::size_t i = 0; i < position.size(); ++i) {
    Result given = operand(child(node, i + 1), want);
    if (!given.usable()) return given;
    if (given.value.hasValue()) position[i] = as_number(element_of(given.value, 0, 0));
  }
  // A single row or column may be counted along by one position.
  if (area->rows() == 1 && node.children.size() == 2) std::swap(position[0], position[1]);
  if (area->rows() == 1 && position[0] == 0) position[0] = 1;
  if (area->columns() == 1 && position[1] == 0) position[1] = 1;
  if (!(position[0] >= 0) || !(position[1] >= 0) ||
      position[0] >= static_cast<double>(area->rows()) + 1 ||
      position[1] >= static_cast<double>(area->columns()) + 1)
    return calc_fault(CalcError::argument, "INDEX beyond the end of its range");
  Area part = *area;
  if (position[0] >= 1) {
    part.first.row += static_cast<sal_Int32>(position[0]) - 1;
    part.last_row = part.first.row;
  }
  if (position[1] >= 1) {
    part.first.column += static_cast<sal_Int32>(position[1]) - 1;
    part.last_column = part.first.column;
  }
  return compute_reference(part, want);
}

// A single cell goes to Calc as a range of one cell: functions such as MAX skip a text or a blank
// in a cell that they refuse as a value.
Any Evaluator::for_calc(const Node& node, const Any& value) {
  const auto area = area_behind(node);
  if (!area || !area->single()) return value;
  const bool blank = document_.content(area->first) == Content::blank;
  const Any cell = blank ? Any() : value;
  const Sequence<Any> row(&cell, 1);
  return Any(Sequence<Sequence<Any>>(&row, 1));
}

Result Evaluator::through_calc(const Node& node, Want want) {
  if (budget_.calls == 0) return unknown("makes more calls than WHY repeats");
  --budget_.calls;
  const bool tolerant = contains(kTolerant, node.word);
  const bool single = contains(kSingle, node.word);
  const bool counting = contains(kCounting, node.word);
  Sequence<Any> arguments(static_cast<sal_Int32>(node.children.size()));
  Any* const argument = arguments.getArray();
  std::optional<Fault> in_range;
  for (std::size_t i = 0; i < node.children.size(); ++i) {
    const auto area = area_behind(node.children[i]);
    if (area && !area->single() && !in_range && !single) {
      if (const auto failing = document_.first_error(*area)) {
        in_range = cell_fault(document_.error(*failing), *failing, true).fault;
        if (!tolerant) return of_fault(*in_range);
      }
    }
    Result given =
        single ? operand(node.children[i], want) : compute(node.children[i], Want::whole);
    if (given.fault && counting) {
      if (!hidden_) hidden_ = given.fault;
      return unknown("uses " + node.word + " over an error");
    }
    if (!given.usable()) return given;
    if (!given.value.hasValue() && i + 1 != node.children.size())
      return unknown("leaves out an argument of " + node.word);
    argument[i] = single ? given.value : for_calc(node.children[i], given.value);
  }
  if (!node.children.empty() && !argument[arguments.getLength() - 1].hasValue())
    arguments.realloc(arguments.getLength() - 1);
  const auto failed = [&](CalcError error) {
    if (in_range) return of_fault(*in_range);
    if (latent_) return of_fault(*latent_);
    return calc_fault(error, node.word + ", a function of Calc, fails");
  };
  try {
    const Reference<XFunctionAccess> access(
        context_->getServiceManager()->createInstanceWithContext(
            "com.sun.star.sheet.FunctionAccess", context_),
        UNO_QUERY_THROW);
    const Any value = access->callFunction(to_utf16(node.word), arguments);
    if (!value.hasValue()) return failed(CalcError::not_available);
    const CalcError error = error_in(value);
    if (error != CalcError::none) return failed(error);
    return want == Want::element ? pick(value) : of_value(value);
  } catch (const com::sun::star::uno::Exception&) {
    return failed(CalcError::value);
  }
}

}  // namespace busbar::addin
