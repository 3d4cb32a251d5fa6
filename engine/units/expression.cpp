#include "units/expression.hpp"

#include <cmath>

#include "core/text.hpp"
#include "units/hints.hpp"
#include "units/symbols.hpp"

namespace busbar::units {
namespace {

constexpr std::size_t kLongest = 64;
constexpr int kDeepest = 4;
constexpr int kLargestExponent = 6;

constexpr Dimension kMassPerArea{1, -2, 0, 0, 0, 0};
constexpr Dimension kPressure{1, -1, -2, 0, 0, 0};

struct Exponent {
  std::string_view text;
  int value;
};
// Superscripts, longest first where one begins with another.
constexpr std::array kSuperscripts{Exponent{"⁻¹", -1}, Exponent{"⁻²", -2}, Exponent{"⁻³", -3},
                                   Exponent{"²", 2}, Exponent{"³", 3}};

// Recursive descent over: quotient = product ["/" product]; product = factor {separator factor};
// factor = ("(" quotient ")" | symbol) [exponent].
class Reader {
 public:
  explicit Reader(std::string_view text) : left_(text), size_(text.size()) {}

  bool whole(Expression& unit) { return quotient(unit, 0) && left_.empty(); }
  [[nodiscard]] double place() const { return static_cast<double>(size_ - left_.size() + 1); }
  [[nodiscard]] std::string_view rest() const { return left_; }
  [[nodiscard]] bool two_slashes() const { return two_slashes_; }

 private:
  bool take(std::string_view token) {
    if (left_.substr(0, token.size()) != token) return false;
    left_.remove_prefix(token.size());
    return true;
  }

  void skip_spaces() {
    while (take(" ")) {
    }
  }

  bool quotient(Expression& unit, int depth) {
    if (depth > kDeepest || !product(unit, depth)) return false;
    skip_spaces();
    if (!take("/")) return true;
    Expression below;
    skip_spaces();
    if (!product(below, depth)) return false;
    skip_spaces();
    if (!left_.empty() && left_.front() == '/') {
      two_slashes_ = true;
      return false;
    }
    return multiply(unit, below, -1);
  }

  bool product(Expression& unit, int depth) {
    if (!factor(unit, depth)) return false;
    while (true) {
      const std::string_view before = left_;
      skip_spaces();
      const bool sign = take("*") || take("·") || take(".");
      skip_spaces();
      if (left_.empty() || left_.front() == '/' || left_.front() == ')') {
        return !sign;
      }
      if (!sign && left_.size() == before.size()) return true;
      Expression next;
      if (!factor(next, depth) || !multiply(unit, next, 1)) return false;
    }
  }

  bool factor(Expression& unit, int depth) {
    if (take("(")) {
      skip_spaces();
      if (!quotient(unit, depth + 1)) return false;
      skip_spaces();
      if (!take(")")) return false;
    } else if (!symbol(unit)) {
      return false;
    }
    int power = 1;
    if (!exponent(power)) return false;
    if (power == 1) return true;
    const Expression base = unit;
    unit = Expression{};
    return multiply(unit, base, power);
  }

  static bool ends_symbol(char c) {
    return c == ' ' || c == '*' || c == '.' || c == '/' || c == '(' || c == ')' || c == '^' ||
           c == '-' || c == '+';
  }

  // The longest run of letters that is a symbol; digits end it unless they belong to its name.
  bool symbol(Expression& unit) {
    std::size_t end = 0;
    while (end < left_.size() && !ends_symbol(left_[end])) ++end;
    for (std::size_t length = end; length > 0; --length) {
      const Lookup found = find_symbol(left_.substr(0, length));
      if (!found.found) continue;
      const std::string_view rest = left_.substr(length, end - length);
      if (!rest.empty() && !starts_exponent(rest)) continue;
      unit = found.unit;
      left_.remove_prefix(length);
      return true;
    }
    return false;
  }

  static bool starts_exponent(std::string_view text) {
    if (text.front() >= '1' && text.front() <= '9') return true;
    if (text.substr(0, 2) == "·") return true;
    for (const Exponent& superscript : kSuperscripts) {
      if (text.substr(0, superscript.text.size()) == superscript.text) return true;
    }
    return false;
  }

  bool exponent(int& power) {
    for (const Exponent& superscript : kSuperscripts) {
      if (take(superscript.text)) {
        power = superscript.value;
        return true;
      }
    }
    const bool caret = take("^");
    const bool minus = take("-");
    const bool digit = !left_.empty() && left_.front() >= '1' && left_.front() <= '9';
    if (!digit) return !caret && !minus;
    power = left_.front() - '0';
    left_.remove_prefix(1);
    if (power > kLargestExponent) return false;
    if (minus) power = -power;
    return true;
  }

  // unit *= other^power. Offsets and gauges have no meaning inside a product.
  static bool multiply(Expression& unit, const Expression& other, int power) {
    for (std::size_t i = 0; i < unit.dimension.size(); ++i) {
      const int sum = unit.dimension[i] + other.dimension[i] * power;
      if (sum > 4 * kLargestExponent || sum < -4 * kLargestExponent) return false;
      unit.dimension[i] = static_cast<std::int8_t>(sum);
    }
    for (int i = 0; i < std::abs(power); ++i) {
      unit.factor = power > 0 ? unit.factor * other.factor : unit.factor / other.factor;
    }
    // In "kJ/(kg °C)" the degree is a difference, which the trade writes so; the zero point drops
    // out.
    unit.offset = 0;
    return unit.reference != Reference::gauge && other.reference != Reference::gauge;
  }

  std::string_view left_;
  std::size_t size_;
  bool two_slashes_ = false;
};

Outcome<Expression> read_at(std::string_view text, std::uint8_t argument) {
  const Outcome<Expression> unit = read_unit(text);
  if (!unit) return unit.failure().about(argument);
  return unit;
}

Outcome<double> between(double value, std::string_view from, std::string_view to, bool difference) {
  const Outcome<Expression> source = read_at(from, 2);
  if (!source) return source.failure();
  const Outcome<Expression> target = read_at(to, 3);
  if (!target) return target.failure();
  if (source->dimension != target->dimension) {
    const bool from_area = source->dimension == kMassPerArea && target->dimension == kPressure;
    const bool to_area = source->dimension == kPressure && target->dimension == kMassPerArea;
    if (from_area || to_area) {
      return Failure{Fault::wrong_kind, static_cast<std::uint8_t>(from_area ? 2 : 3),
                     "is a mass per area and no pressure; write kgf for the force, as in "
                     "\"kgf/cm2\""};
    }
    return Failure{Fault::wrong_kind, 3, "measures something else than the unit that is converted"};
  }
  if (!difference && source->reference != target->reference) {
    return Failure{Fault::wrong_kind, 3,
                   "is not measured from the same zero: gauge and absolute pressure differ by the "
                   "ambient pressure, see ABSOLUTE_PRESSURE"};
  }
  if (difference) return value * source->factor / target->factor;
  const double si = value * source->factor + source->offset;
  const bool temperature = source->dimension == Dimension{0, 0, 0, 1, 0, 0};
  if (temperature && si < 0) {
    return Failure{Fault::impossible,
                   1,
                   "{0} is below absolute zero; CONVERT_DIFFERENCE converts differences",
                   {{{value, Quantity::number}}}};
  }
  return (si - target->offset) / target->factor;
}

}  // namespace

Outcome<Expression> read_unit(std::string_view text) {
  const std::string_view inner = trimmed(text);
  if (inner.empty()) return Failure{Fault::missing, 1, "is empty"};
  if (inner.size() > kLongest) return Failure{Fault::too_large, 1, "is too long for a unit"};
  if (inner == "bar g" || inner == "bar(g)") return read_unit("barg");
  if (inner == "bar a" || inner == "bar(a)") return read_unit("bara");
  Expression unit;
  Reader reader(inner);
  if (reader.whole(unit)) return unit;
  if (reader.two_slashes()) {
    return Failure{Fault::unknown_word, 1, "has two slashes; write a/(b c)"};
  }
  const char* hint = hint_for(reader.rest());
  return Failure{Fault::unknown_word,
                 1,
                 hint != nullptr
                     ? hint
                     : "is not a unit that Busbar knows; it cannot be read from character {0} on",
                 {{{reader.place(), Quantity::number}}}};
}

Outcome<double> convert(double value, std::string_view from, std::string_view to) {
  return between(value, from, to, false);
}

Outcome<double> convert_difference(double value, std::string_view from, std::string_view to) {
  return between(value, from, to, true);
}

}  // namespace busbar::units
