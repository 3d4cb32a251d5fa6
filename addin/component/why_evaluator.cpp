#include "why_evaluator.hpp"

#include <algorithm>
#include <string_view>
#include <utility>

#include "marshal.hpp"
#include "text.hpp"
#include "why_operators.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::uno::Any;

constexpr int kDeepest = 400;   // levels of trees and names together; bounds the recursion
constexpr int kMostNames = 16;  // names that stand for names
constexpr std::size_t kMostExplanations = 3;
constexpr std::size_t kMostBlanksNamed = 4;

// A sentence of the engine with its full stop, so that another may follow.
std::string ended(std::string text) {
  if (!text.empty() && text.back() != '.') text += '.';
  return text;
}

const char* words_for(CalcError error) {
  switch (error) {
    case CalcError::division:
      return "a division by zero";
    case CalcError::number:
      return "an arithmetic result that is no finite number";
    case CalcError::value:
      return "an operator that was given a text instead of a number";
    case CalcError::not_available:
      return "a cell of the array formula beyond the end of its operands";
    default:
      return "an operator that fails";
  }
}

// Arguments that are lifted over a range take one element a result; the others take it whole. A
// composition is a table, or a row or column of texts.
bool is_lifted(std::int32_t kind, const Any& given) {
  if (kind == BUSBAR_ARGUMENT_COMPOSITION) {
    const Shape shape = shape_of(given);
    return shape.rows == 1 || shape.columns == 1;
  }
  return kind != BUSBAR_ARGUMENT_NUMBERS && kind != BUSBAR_ARGUMENT_STREAMS &&
         kind != BUSBAR_ARGUMENT_CELL && kind != BUSBAR_ARGUMENT_OPTIONS;
}

std::int32_t kind_of_argument(const busbar_function* function, std::size_t index) {
  const std::size_t count = busbar_argument_count(function);
  if (count == 0) return BUSBAR_ARGUMENT_NUMBER;
  return busbar_argument_kind(function, std::min(index, count - 1));
}

std::string name_of_argument(const busbar_function* function, std::size_t index) {
  if (index >= busbar_argument_count(function)) return "argument " + std::to_string(index + 1);
  return busbar_argument_text(function, index, BUSBAR_ARGUMENT_NAME);
}

// Whether the ranges that a call is lifted over have one shape. Where they have not, the call fails
// as a whole, whatever stands in the element that the cell would show.
bool fit_together(const busbar_function* function, const std::vector<Any>& given) {
  Shape whole{1, 1};
  const auto fits = [](std::size_t& most, std::size_t part) {
    if (part != 1 && most == 1) most = part;
    return part == 1 || part == most;
  };
  for (std::size_t i = 0; i < given.size(); ++i) {
    if (!given[i].hasValue() || !is_lifted(kind_of_argument(function, i), given[i])) continue;
    const Shape shape = shape_of(given[i]);
    if (!fits(whole.rows, shape.rows) || !fits(whole.columns, shape.columns)) return false;
  }
  return true;
}

// "H1" and "Stages.H1", as somebody types them who takes the name of a cell for the cell.
bool is_cell_name(std::string_view text) {
  text.remove_prefix(text.rfind('.') + 1);  // nothing where there is no point
  std::size_t letters = 0;
  const auto is_letter = [](char c) { return (c >= 'A' && c <= 'Z') || (c >= 'a' && c <= 'z'); };
  const auto is_digit = [](char c) { return c >= '0' && c <= '9'; };
  while (letters < text.size() && is_letter(text[letters])) ++letters;
  const std::string_view digits = text.substr(letters);
  return letters >= 1 && letters <= 3 && !digits.empty() && digits.size() <= 7 &&
         std::all_of(digits.begin(), digits.end(), is_digit);
}

}  // namespace

Result Evaluator::compute(const Node& node, Want want) {
  if (budget_.nodes == 0) return unknown("is too long to be taken apart");
  if (depth_ >= kDeepest) return unknown("is nested too deeply to be taken apart");
  --budget_.nodes;
  ++depth_;
  Result result = compute_kind(node, want);
  --depth_;
  return result;
}

Result Evaluator::compute_kind(const Node& node, Want want) {
  switch (node.kind) {
    case NodeKind::literal: {
      const CalcError error = error_in(node.value);
      if (error != CalcError::none) return calc_fault(error, "an error that was typed in");
      return want == Want::element ? pick(node.value) : of_value(node.value);
    }
    case NodeKind::missing:
      return of_value({});
    case NodeKind::reference:
      return compute_reference(node.area, want);
    case NodeKind::name:
      return compute_named(node, want);
    case NodeKind::negative:
      return compute_scaled(node, want, -1.0);
    case NodeKind::percent:
      return compute_scaled(node, want, 0.01);
    case NodeKind::binary:
      return compute_binary(node, want);
    case NodeKind::busbar_call:
      return compute_engine_call(node, want);
    case NodeKind::builtin_call:
      return compute_builtin(node, want);
    case NodeKind::broken:
      return calc_fault(CalcError::reference, node.word);
    case NodeKind::refused:
      return unknown("holds " + node.word);
    case NodeKind::elsewhere:
      return unknown(engine_calls_open_ == 0
                         ? "reads another file, and WHY reads this one alone"
                         : "reads another file, and WHY reads this one alone; with that value in a "
                           "cell of its own WHY can tell");
    default:
      return unknown(node.word);
  }
}

// The element of a table that the cell shows.
Result Evaluator::pick(const Any& value) {
  const Any single = element_of(value, static_cast<std::size_t>(formula_.row),
                                static_cast<std::size_t>(formula_.column));
  if (!single.hasValue() && value.hasValue()) {
    const Shape shape = shape_of(value);
    return calc_fault(CalcError::not_available,
                      "the array formula covers more cells than its result, which has " +
                          std::to_string(shape.rows) + " x " + std::to_string(shape.columns) +
                          " cells");
  }
  const CalcError error = error_in(single);
  if (error == CalcError::none) return of_value(single);
  if (latent_) return of_fault(*latent_);
  return calc_fault(error, words_for(error));
}

Result Evaluator::single_cell(const Address& address) {
  if (!document_.exists(address)) return unknown("refers to a cell that does not exist");
  if (document_.content(address) == Content::blank) {
    blanks_.push_back(address);
    return of_value(Any(0.0));
  }
  const CalcError error = document_.error(address);
  if (error != CalcError::none) {
    return cell_fault(error, address, false);
  }
  return of_value(document_.value(address));
}

Result Evaluator::compute_reference(const Area& area, Want want) {
  if (area.single()) return single_cell(area.first);
  if (want == Want::element) {
    Address place = area.first;
    if (area.rows() > 1) place.row += formula_.row;
    if (area.columns() > 1) place.column += formula_.column;
    if (place.row > area.last_row || place.column > area.last_column)
      return calc_fault(CalcError::not_available, words_for(CalcError::not_available));
    return single_cell(place);
  }
  if (!document_.exists(area.first)) return unknown("refers to a cell that does not exist");
  const std::size_t cells = area.rows() * area.columns();
  if (cells > budget_.cells || cells > busbar_cell_limit())
    return unknown("refers to a range that is too large to be read again");
  budget_.cells -= cells;
  return of_value(document_.table(area));
}

std::optional<Node> Evaluator::parsed_name(const Node& node) {
  const auto tokens = document_.name_tokens(node.name);
  if (!tokens) return {};
  return parse_formula(*tokens, formula_.base, token_numbers(document_));
}

Result Evaluator::compute_named(const Node& node, Want want) {
  if (names_open_ >= kMostNames) return unknown("uses names that stand for names without end");
  const auto parsed = parsed_name(node);
  if (!parsed) return unknown("uses a name that is not defined");
  ++names_open_;
  Result result = compute(*parsed, want);
  --names_open_;
  return result;
}

std::optional<Area> Evaluator::area_behind(const Node& node) {
  if (node.kind == NodeKind::reference) return node.area;
  if (node.kind != NodeKind::name || names_open_ >= kMostNames) return {};
  const auto parsed = parsed_name(node);
  if (!parsed) return {};
  ++names_open_;
  auto area = area_behind(*parsed);
  --names_open_;
  return area;
}

std::optional<Area> Evaluator::intersection(const Area& area) const {
  Area single = area;
  if (area.rows() > 1) {
    if (area.columns() > 1 || cell_.row < area.first.row || cell_.row > area.last_row) return {};
    single.first.row = cell_.row;
  }
  if (area.columns() > 1) {
    if (cell_.column < area.first.column || cell_.column > area.last_column) return {};
    single.first.column = cell_.column;
  }
  single.last_row = single.first.row;
  single.last_column = single.first.column;
  return single;
}

Result Evaluator::operand(const Node& node, Want want) {
  if (!formula_.array) {
    const auto area = area_behind(node);
    if (area && !area->single()) {
      const auto single = intersection(*area);
      if (!single)
        return calc_fault(CalcError::value,
                          "a range of several cells where one value is needed, and no cell of it "
                          "stands in the same row or column");
      return single_cell(single->first);
    }
  } else if (want == Want::whole) {
    const auto area = area_behind(node);
    if (area && !area->single()) {
      if (const auto failing = document_.first_error(*area)) {
        if (!latent_) latent_ = cell_fault(document_.error(*failing), *failing, true).fault;
      }
    }
  }
  return compute(node, want);
}

Result Evaluator::compute_scaled(const Node& node, Want want, double factor) {
  Result inner = operand(node.children.front(), want);
  if (!inner.usable()) return inner;
  Any value = scaled(inner.value, factor);
  const CalcError error = error_in(value);
  if (error != CalcError::none) return calc_fault(error, words_for(error));
  return of_value(value);
}

Result Evaluator::compute_binary(const Node& node, Want want) {
  Result left = operand(node.children[0], want);
  if (left.fault) return left;
  Result right = operand(node.children[1], want);
  if (right.fault) return right;
  if (!left.usable()) return left;
  if (!right.usable()) return right;
  Any value = apply(node.op, left.value, right.value);
  const CalcError error = error_in(value);
  if (error != CalcError::none) return calc_fault(error, words_for(error));
  return of_value(value);
}

std::string Evaluator::blank_note(std::size_t from) const {
  std::vector<Address> named;
  for (std::size_t i = from; i < blanks_.size() && named.size() < kMostBlanksNamed; ++i)
    if (std::find(named.begin(), named.end(), blanks_[i]) == named.end())
      named.push_back(blanks_[i]);
  if (named.empty()) return {};
  std::string text = " ";
  for (std::size_t i = 0; i < named.size(); ++i) {
    if (i != 0) text += i + 1 == named.size() ? " and " : ", ";
    text += document_.name_of(named[i], cell_.sheet);
  }
  return text + (named.size() == 1 ? " is" : " are") + " blank, which Calc hands over as 0.";
}

std::string Evaluator::explain(const Node& node,
                               const std::vector<const busbar_value*>& arguments) {
  busbar_value* raw = nullptr;
  const std::int32_t status =
      busbar_explain(node.function, arguments.data(), arguments.size(), &raw);
  const Value explanation(raw);
  if (status != BUSBAR_OK || !explanation) return "the engine could not explain " + node.word + ".";
  std::size_t length = 0;
  const char* text = busbar_get_text(explanation.get(), 0, 0, &length);
  if (text == nullptr) return "the engine could not explain " + node.word + ".";
  return {text, length};
}

Result Evaluator::failed_call(const Node& node, const std::vector<const busbar_value*>& arguments,
                              CalcError error) {
  return engine_fault(error, ended(explain(node, arguments)));
}

// WHY itself inside a formula. Calc hands it nothing but a reference.
Result Evaluator::about_another_cell(const Node& node) const {
  const Node* child = node.children.size() == 1 ? &node.children.front() : nullptr;
  if (child != nullptr && child->kind == NodeKind::elsewhere)
    return engine_fault(CalcError::parameter_list,
                        node.word + " explains the cells of its own file alone.");
  if (child != nullptr && child->kind != NodeKind::literal && child->kind != NodeKind::missing &&
      child->kind != NodeKind::busbar_call)
    return unknown("asks " + node.word + " about another cell");
  rtl::OUString text;
  const bool named = child != nullptr && (child->value >>= text) && is_cell_name(to_utf8(text));
  return engine_fault(CalcError::parameter_list,
                      node.word + " takes one cell by reference; write =" + node.word + "(" +
                          (named ? to_utf8(text) : "B7") + ")" +
                          (named ? ", without quotation marks." : "."));
}

Result Evaluator::computed_arguments(const Node& node, std::vector<Any>& given) {
  for (const Node& child : node.children) {
    const auto area = area_behind(child);
    if (area && !area->single()) {
      // Calc calls no add-in with a range that holds an error.
      if (const auto failing = document_.first_error(*area))
        return cell_fault(CalcError::parameter_list, *failing, true);
    }
    if (child.kind == NodeKind::refused) return calc_fault(CalcError::parameter_list, child.word);
    if (child.kind == NodeKind::elsewhere)
      return calc_fault(CalcError::parameter_list,
                        "a reference straight into another file, which Calc hands to no add-in "
                        "function; put that value into a cell of its own and refer to the cell");
    Result argument = compute(child, Want::whole);
    if (!argument.usable()) return argument;
    given.push_back(argument.value);
  }
  return {};
}

Result Evaluator::element_of_argument(const Node& child, const Any& given, Value& handed) {
  Result single = pick(given);
  if (!single.usable()) return single;
  const auto area = area_behind(child);
  rtl::OUString text;
  if (area && !area->single() && (single.value >>= text) && text.isEmpty())
    handed.reset(busbar_value_create(1, 1));
  return single;
}

Result Evaluator::compute_engine_call(const Node& node, Want want) {
  if (busbar_argument_count(node.function) == 1 &&
      busbar_argument_kind(node.function, 0) == BUSBAR_ARGUMENT_CELL)
    return about_another_cell(node);
  if (budget_.calls == 0) return unknown("makes more calls than WHY repeats");
  --budget_.calls;

  const std::size_t blanks_before = blanks_.size();
  std::vector<Any> given;
  ++engine_calls_open_;
  Result stopped = computed_arguments(node, given);
  --engine_calls_open_;
  if (!stopped.usable()) return stopped;

  const bool by_element =
      want == Want::element && lifting_ == Lifting::element && fit_together(node.function, given);
  std::vector<Value> values(given.size());
  std::vector<const busbar_value*> arguments(given.size());
  for (std::size_t i = 0; i < given.size(); ++i) {
    Any value = given[i];
    if (by_element && value.hasValue() && is_lifted(kind_of_argument(node.function, i), value)) {
      Result single = element_of_argument(node.children[i], value, values[i]);
      if (!single.usable()) return single;
      value = single.value;
    }
    if (!values[i]) {
      const Taken taken = to_engine(value, values[i]);
      if (taken != Taken::value && taken != Taken::omitted)
        return engine_fault(CalcError::value, "the " + name_of_argument(node.function, i) + " of " +
                                                  node.word + " " + in_words(taken) + ".");
    }
    arguments[i] = values[i].get();
  }

  busbar_value* raw = nullptr;
  const std::int32_t status = busbar_call(node.function, arguments.data(), arguments.size(), &raw);
  const Value answer(raw);
  if (status != BUSBAR_OK || !answer)
    return engine_fault(CalcError::value, "the engine had no memory for " + node.word + ".");
  const std::string note = blank_note(blanks_before);
  const Any value = to_calc(*answer);
  const CalcError error = error_in(value);
  if (error != CalcError::none) {
    Result failed = failed_call(node, arguments, error);
    failed.fault->text += note;
    return failed;
  }
  const Shape shape = shape_of(value);
  if (shape.rows != 1 || shape.columns != 1) {
    // An error inside the table: it counts only where it comes out in the end.
    for (std::size_t r = 0; r < shape.rows && !latent_; ++r)
      for (std::size_t c = 0; c < shape.columns && !latent_; ++c)
        if (busbar_kind(answer.get(), r, c) == BUSBAR_ERROR)
          latent_ =
              failed_call(node, arguments, calc_error_of(busbar_get_error(answer.get(), r, c)))
                  .fault;
  }
  if (engine_calls_open_ == 0 && explanations_.size() < kMostExplanations)
    explanations_.push_back(ended(explain(node, arguments)) + note);
  return want == Want::element ? pick(value) : of_value(value);
}

}  // namespace busbar::addin
