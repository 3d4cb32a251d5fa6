// Formulas as a spreadsheet writes them, evaluated through the C interface alone.
//
//   TURBINE_OUT(B2; 0.05; 0.88)      calls, nested at will; a left-out argument is nothing at all
//   {1; 2 | 3; 4}                    an inline array: ";" next column, "|" next row
//   B2   B2:B5                       cells that were given, and ranges of them
//   INDEX(STREAM_TABLE(B2:B3); 2; 4) one cell of a table, counted from 1
//   (1 + 2) * -3 / 4                 arithmetic between numbers; an error passes through
#pragma once

#include <map>
#include <stdexcept>
#include <string>
#include <string_view>

#include "value.hpp"

namespace busbar::support {

/// The formula itself is malformed, a fault of the test.
class FormulaError : public std::runtime_error {
 public:
  using std::runtime_error::runtime_error;
};

/// Cells by name, and what a formula over them gives.
class Sheet {
 public:
  Sheet() = default;
  /// "B2=STEAM(10; 300) | B3=7 | B4=\"us\" | B5=": formulas, numbers, texts in quotes, blanks.
  explicit Sheet(std::string_view given);

  void set(const std::string& cell, const std::string& content) { cells_[cell] = content; }
  [[nodiscard]] Value evaluate(std::string_view formula) const;
  [[nodiscard]] const std::map<std::string, std::string>& cells() const { return cells_; }

 private:
  std::map<std::string, std::string> cells_;
};

/// Evaluates a formula over given cells.
Value evaluate(std::string_view formula, std::string_view given = {});

}  // namespace busbar::support
