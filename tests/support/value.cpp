#include "value.hpp"

#include <bit>
#include <cstdio>
#include <stdexcept>

namespace busbar::support {
namespace {

void require(std::int32_t status) {
  if (status != BUSBAR_OK) throw std::runtime_error("the C interface refused a cell");
}

std::vector<const busbar_value*> handles(std::span<const Argument> arguments) {
  std::vector<const busbar_value*> given;
  given.reserve(arguments.size());
  for (const Argument& argument : arguments) given.push_back(argument.get());
  return given;
}

}  // namespace

Value::Value(std::size_t rows, std::size_t columns) : value_(busbar_value_create(rows, columns)) {
  if (value_ == nullptr) throw std::runtime_error("the C interface refused a grid");
}

Value Value::number(double number) { return Value(busbar_number(number)); }
Value Value::text(std::string_view text) { return Value(busbar_text(text.data(), text.size())); }

Value Value::logical(bool logical) {
  Value value;
  require(busbar_set_logical(value.value_.get(), 0, 0, logical ? 1 : 0));
  return value;
}

Value Value::error(std::int32_t kind) {
  Value value;
  value.set_error(0, 0, kind);
  return value;
}

Value Value::column(const std::vector<double>& numbers) {
  Value value(numbers.size(), 1);
  for (std::size_t i = 0; i < numbers.size(); ++i) value.set(i, 0, numbers[i]);
  return value;
}

std::int32_t Value::kind(std::size_t row, std::size_t column) const {
  return busbar_kind(get(), row, column);
}
double Value::number_at(std::size_t row, std::size_t column) const {
  return busbar_get_number(get(), row, column);
}
std::string Value::text_at(std::size_t row, std::size_t column) const {
  std::size_t length = 0;
  const char* text = busbar_get_text(get(), row, column, &length);
  return text == nullptr ? std::string() : std::string(text, length);
}
std::int32_t Value::error_at(std::size_t row, std::size_t column) const {
  return busbar_get_error(get(), row, column);
}
std::string Value::reason(std::size_t row, std::size_t column) const {
  std::string text(busbar_get_reason(get(), row, column, nullptr, 0) + 1, '\0');
  busbar_get_reason(get(), row, column, text.data(), text.size());
  text.pop_back();
  return text;
}

void Value::set(std::size_t row, std::size_t column, double number) {
  require(busbar_set_number(value_.get(), row, column, number));
}
void Value::set(std::size_t row, std::size_t column, std::string_view text) {
  require(busbar_set_text(value_.get(), row, column, text.data(), text.size()));
}
void Value::set_error(std::size_t row, std::size_t column, std::int32_t kind) {
  require(busbar_set_error(value_.get(), row, column, kind));
}

void Value::copy(std::size_t row, std::size_t column, const Value& from, std::size_t from_row,
                 std::size_t from_column) {
  switch (from.kind(from_row, from_column)) {
    case BUSBAR_NUMBER:
      set(row, column, from.number_at(from_row, from_column));
      break;
    case BUSBAR_TEXT:
      set(row, column, from.text_at(from_row, from_column));
      break;
    case BUSBAR_LOGICAL:
      require(busbar_set_logical(value_.get(), row, column,
                                 busbar_get_logical(from.get(), from_row, from_column)));
      break;
    case BUSBAR_ERROR:
      set_error(row, column, from.error_at(from_row, from_column));
      break;
    default:
      require(busbar_set_blank(value_.get(), row, column));
  }
}

std::string Value::shown(std::size_t row, std::size_t column) const {
  switch (kind(row, column)) {
    case BUSBAR_NUMBER: {
      char buffer[40];
      std::snprintf(buffer, sizeof buffer, "%.17g", number_at(row, column));
      return buffer;
    }
    case BUSBAR_TEXT:
      return '"' + text_at(row, column) + '"';
    case BUSBAR_LOGICAL:
      return busbar_get_logical(get(), row, column) != 0 ? "TRUE" : "FALSE";
    case BUSBAR_ERROR:
      return std::string(error_word(error_at(row, column))) + " (" + reason(row, column) + ")";
    default:
      return "blank";
  }
}

Value call_with(std::string_view name, std::span<const Argument> arguments) {
  const auto given = handles(arguments);
  busbar_value* result = nullptr;
  require(busbar_call_by_name(name.data(), name.size(), given.data(), given.size(), &result));
  return Value(result);
}

Value call_with(std::string_view name, const std::vector<Value>& arguments) {
  return call_with(name, std::vector<Argument>(arguments.begin(), arguments.end()));
}

Value call(std::string_view name, std::initializer_list<Argument> arguments) {
  return call_with(name, std::span<const Argument>(arguments.begin(), arguments.size()));
}

std::string explain(std::string_view name, std::initializer_list<Argument> arguments) {
  const auto given = handles({arguments.begin(), arguments.size()});
  busbar_value* result = nullptr;
  require(
      busbar_explain(busbar_find(name.data(), name.size()), given.data(), given.size(), &result));
  return Value(result).text_at();
}

std::string_view error_word(std::int32_t kind) {
  switch (kind) {
    case BUSBAR_ERROR_MISSING:
      return "#N/A";
    case BUSBAR_ERROR_VALUE:
      return "#VALUE!";
    case BUSBAR_ERROR_RANGE:
      return "Err:502";
    case BUSBAR_ERROR_CONVERGENCE:
      return "Err:523";
    case BUSBAR_ERROR_INTERNAL:
      return "internal";
    default:
      return "none";
  }
}

bool same_cell(const Value& a, const Value& b, std::size_t row, std::size_t column) {
  if (a.kind(row, column) != b.kind(row, column)) return false;
  switch (a.kind(row, column)) {
    case BUSBAR_NUMBER:
      return std::bit_cast<std::uint64_t>(a.number_at(row, column)) ==
             std::bit_cast<std::uint64_t>(b.number_at(row, column));
    case BUSBAR_TEXT:
      return a.text_at(row, column) == b.text_at(row, column);
    case BUSBAR_ERROR:
      return a.error_at(row, column) == b.error_at(row, column) &&
             a.reason(row, column) == b.reason(row, column);
    default:
      return true;
  }
}

}  // namespace busbar::support
