// Calls of every function with good arguments, taken from its own example.
#pragma once

#include <string>
#include <vector>

#include "catalogue/row.hpp"
#include "formula.hpp"
#include "functions/functions.hpp"
#include "value.hpp"

namespace busbar::sample {

/// Argument formulas of the call in the row's example: the first call of that function in it.
inline std::vector<std::string> argument_formulas(const Row& row) {
  const std::string formula = row.words.example.formula;
  const std::string name = row.words.name;
  std::size_t i = formula.find(name + '(') + name.size() + 1;
  std::vector<std::string> parts(1);
  int depth = 0;
  bool quoted = false;
  for (; i < formula.size(); ++i) {
    const char c = formula[i];
    if (c == '"') quoted = !quoted;
    if (!quoted) {
      if (c == '(' || c == '{') ++depth;
      if (c == ')' && depth == 0) break;
      if (c == ')' || c == '}') --depth;
      if (c == ';' && depth == 0) {
        parts.emplace_back();
        continue;
      }
    }
    parts.back() += c;
  }
  if (parts.size() == 1 && parts.front().empty()) parts.clear();
  return parts;
}

/// The arguments of the example as values.
inline std::vector<support::Value> arguments(const Row& row) {
  std::vector<support::Value> values;
  for (const std::string& formula : argument_formulas(row)) {
    values.push_back(support::evaluate(formula, row.words.example.given));
  }
  return values;
}

/// The same arguments with one in another place; `with` nullptr leaves it out.
inline std::vector<support::Argument> replaced(const std::vector<support::Value>& values,
                                               std::size_t index, const support::Value* with) {
  std::vector<support::Argument> given;
  for (std::size_t i = 0; i < std::max(values.size(), index + 1); ++i) {
    if (i == index) {
      given.push_back(with == nullptr ? support::Argument(nullptr) : support::Argument(*with));
    } else {
      given.push_back(i < values.size() ? support::Argument(values[i])
                                        : support::Argument(nullptr));
    }
  }
  return given;
}

inline support::Value call(const Row& row, const std::vector<support::Argument>& given) {
  return support::call_with(row.words.name, std::span<const support::Argument>(given));
}

}  // namespace busbar::sample
