#include "printed.hpp"

#include <array>
#include <charconv>
#include <cmath>

namespace busbar::support {
namespace {

bool is_digit(char c) { return c >= '0' && c <= '9'; }

std::size_t number_length(std::string_view text) {
  double value = 0;
  const auto end = std::from_chars(text.data(), text.data() + text.size(), value);
  return end.ec == std::errc{} ? static_cast<std::size_t>(end.ptr - text.data()) : 0;
}

}  // namespace

double half_unit(double value, int digits) {
  if (value == 0) return 0;
  const double magnitude = std::floor(std::log10(std::abs(value)) + 1e-12);
  return 0.5 * std::pow(10, magnitude - digits + 1);
}

int significant_digits(std::string_view printed) {
  int digits = 0;
  bool leading = true;
  for (const char c : printed) {
    if (c == 'e' || c == 'E') break;
    if (!is_digit(c)) continue;
    if (leading && c == '0') continue;
    leading = false;
    ++digits;
  }
  return digits;
}

std::optional<double> number_in(std::string_view text) {
  double value = 0;
  const auto end = std::from_chars(text.data(), text.data() + text.size(), value);
  if (end.ec != std::errc{} || end.ptr != text.data() + text.size()) return {};
  return value;
}

std::vector<Rounded> rounded_numbers(std::string_view formula) {
  std::vector<Rounded> found;
  bool quoted = false;
  for (std::size_t i = 0; i < formula.size(); ++i) {
    if (formula[i] == '"') quoted = !quoted;
    if (quoted || formula[i] != '~') continue;
    const std::size_t length = number_length(formula.substr(i + 1));
    const std::string_view printed = formula.substr(i + 1, length);
    const double value = number_in(printed).value_or(0);
    found.push_back({i, length + 1, value, half_unit(value, significant_digits(printed))});
  }
  return found;
}

std::string plain_formula(std::string_view formula, std::optional<std::size_t> index,
                          double shift) {
  std::string plain;
  std::size_t copied = 0;
  const std::vector<Rounded> rounded = rounded_numbers(formula);
  for (std::size_t i = 0; i < rounded.size(); ++i) {
    plain += formula.substr(copied, rounded[i].position - copied);
    std::array<char, 40> buffer{};
    const double value = rounded[i].value + (index == i ? shift : 0);
    const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), value);
    plain.append(buffer.data(), end.ptr);
    copied = rounded[i].position + rounded[i].length;
  }
  plain += formula.substr(copied);
  return plain;
}

}  // namespace busbar::support
