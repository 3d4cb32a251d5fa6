// Values of the C interface with an owner, for tests in C++.
#pragma once

#include <cstddef>
#include <cstdint>
#include <initializer_list>
#include <memory>
#include <span>
#include <string>
#include <string_view>
#include <vector>

#include "busbar.h"

namespace busbar::support {

/// A value of the C interface. Cells count from 0.
class Value {
 public:
  Value() : Value(1, 1) {}
  Value(std::size_t rows, std::size_t columns);
  explicit Value(busbar_value* owned) : value_(owned) {}

  static Value number(double number);
  static Value text(std::string_view text);
  static Value logical(bool logical);
  static Value blank() { return {}; }
  static Value error(std::int32_t kind);
  /// One column of numbers.
  static Value column(const std::vector<double>& numbers);

  [[nodiscard]] const busbar_value* get() const { return value_.get(); }
  [[nodiscard]] std::size_t rows() const { return busbar_rows(get()); }
  [[nodiscard]] std::size_t columns() const { return busbar_columns(get()); }
  [[nodiscard]] std::int32_t kind(std::size_t row = 0, std::size_t column = 0) const;
  [[nodiscard]] double number_at(std::size_t row = 0, std::size_t column = 0) const;
  [[nodiscard]] std::string text_at(std::size_t row = 0, std::size_t column = 0) const;
  [[nodiscard]] std::int32_t error_at(std::size_t row = 0, std::size_t column = 0) const;
  [[nodiscard]] std::string reason(std::size_t row = 0, std::size_t column = 0) const;
  [[nodiscard]] bool is_number() const { return kind() == BUSBAR_NUMBER; }
  [[nodiscard]] bool is_text() const { return kind() == BUSBAR_TEXT; }
  [[nodiscard]] bool is_error() const { return kind() == BUSBAR_ERROR; }

  void set(std::size_t row, std::size_t column, double number);
  void set(std::size_t row, std::size_t column, std::string_view text);
  void set_error(std::size_t row, std::size_t column, std::int32_t kind);
  /// Copies one cell of another value; of an error its kind, as a spreadsheet does.
  void copy(std::size_t row, std::size_t column, const Value& from, std::size_t from_row = 0,
            std::size_t from_column = 0);

  /// For messages: the cell as a person would read it.
  [[nodiscard]] std::string shown(std::size_t row = 0, std::size_t column = 0) const;

 private:
  struct Free {
    void operator()(busbar_value* value) const { busbar_value_free(value); }
  };
  std::unique_ptr<busbar_value, Free> value_;
};

/// An argument of a call; nullptr is one that was left out. Lives no longer than the call.
class Argument {
 public:
  Argument(const Value& value) : value_(&value) {}  // NOLINT(google-explicit-constructor)
  Argument(std::nullptr_t) {}                       // NOLINT(google-explicit-constructor)
  [[nodiscard]] const busbar_value* get() const {
    return value_ == nullptr ? nullptr : value_->get();
  }

 private:
  const Value* value_ = nullptr;
};

/// Calls by name.
Value call(std::string_view name, std::initializer_list<Argument> arguments);
Value call_with(std::string_view name, std::span<const Argument> arguments);
Value call_with(std::string_view name, const std::vector<Value>& arguments);

/// The explanation of the same call.
std::string explain(std::string_view name, std::initializer_list<Argument> arguments);

/// What Calc shows for a kind of error: "#N/A", "#VALUE!", "Err:502", "Err:523".
std::string_view error_word(std::int32_t kind);

/// True when two cells hold the same bits.
bool same_cell(const Value& a, const Value& b, std::size_t row = 0, std::size_t column = 0);

}  // namespace busbar::support
