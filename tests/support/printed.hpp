// Printed numbers: what their digits promise. Every tolerance of the tests comes from here.
#pragma once

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace busbar::support {

/// Half a unit of the last significant digit of `value` when it is printed with `digits` of them.
double half_unit(double value, int digits);

/// Significant digits of a printed number, trailing zeros after the point included: 3 for "0.0250".
/// Trailing zeros of a whole number count as well.
int significant_digits(std::string_view printed);

/// A number of the whole text, locale-free.
std::optional<double> number_in(std::string_view text);

/// A formula writes "~2758" for a number that its source prints rounded. Its true value lies within
/// half a unit of the last digit; the checks vary it by that much and widen the tolerance by what
/// the result then moves.
struct Rounded {
  std::size_t position = 0;  ///< of the tilde
  std::size_t length = 0;    ///< of tilde and number
  double value = 0;
  double half_unit = 0;
};
std::vector<Rounded> rounded_numbers(std::string_view formula);

/// The formula without tildes; number `index`, where given, is moved by `shift`.
std::string plain_formula(std::string_view formula, std::optional<std::size_t> index = {},
                          double shift = 0);

}  // namespace busbar::support
