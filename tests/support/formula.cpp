#include "formula.hpp"

#include <charconv>
#include <utility>
#include <vector>

namespace busbar::support {
namespace {

constexpr int kDeepest = 200;

bool is_letter(char c) { return (c >= 'A' && c <= 'Z') || (c >= 'a' && c <= 'z'); }
bool is_digit(char c) { return c >= '0' && c <= '9'; }

std::string_view trimmed(std::string_view text) {
  const auto first = text.find_first_not_of(" \t\n");
  if (first == std::string_view::npos) return {};
  return text.substr(first, text.find_last_not_of(" \t\n") - first + 1);
}

struct CellName {
  std::size_t column = 0;
  std::size_t row = 0;
};

std::string name_of(CellName cell) {
  std::string letters;
  for (std::size_t left = cell.column; left > 0; left = (left - 1) / 26) {
    letters.insert(letters.begin(), static_cast<char>('A' + (left - 1) % 26));
  }
  return letters + std::to_string(cell.row);
}

// Recursive descent: sum = product {+- product}; product = sign {*/ sign}; sign = [-] item.
class Reader {
 public:
  Reader(std::string_view text, const Sheet& sheet, int depth)
      : left_(text), sheet_(sheet), depth_(depth) {
    if (depth > kDeepest) throw FormulaError("cells refer to each other in a circle");
  }

  Value whole() {
    Value value = sum();
    skip_spaces();
    if (!left_.empty()) fail("something is left over");
    return value;
  }

 private:
  [[noreturn]] void fail(const std::string& what) const {
    throw FormulaError(what + " at \"" + std::string(left_) + "\"");
  }

  void skip_spaces() {
    while (!left_.empty() && (left_.front() == ' ' || left_.front() == '\n')) {
      left_.remove_prefix(1);
    }
  }

  bool take(char c) {
    skip_spaces();
    if (left_.empty() || left_.front() != c) return false;
    left_.remove_prefix(1);
    return true;
  }

  static Value combine(const Value& a, const Value& b, char sign) {
    for (const Value* side : {&a, &b}) {
      if (side->is_error()) return Value::error(side->error_at());
      if (side->kind() != BUSBAR_NUMBER && side->kind() != BUSBAR_BLANK) {
        return Value::error(BUSBAR_ERROR_VALUE);
      }
    }
    const double x = a.number_at();
    const double y = b.number_at();
    switch (sign) {
      case '+':
        return Value::number(x + y);
      case '-':
        return Value::number(x - y);
      case '*':
        return Value::number(x * y);
      default:
        return Value::number(x / y);
    }
  }

  Value sum() {
    Value value = product();
    while (true) {
      if (take('+')) {
        value = combine(value, product(), '+');
      } else if (take('-')) {
        value = combine(value, product(), '-');
      } else {
        return value;
      }
    }
  }

  Value product() {
    Value value = sign();
    while (true) {
      if (take('*')) {
        value = combine(value, sign(), '*');
      } else if (take('/')) {
        value = combine(value, sign(), '/');
      } else {
        return value;
      }
    }
  }

  Value sign() {
    if (take('-')) return combine(Value::number(0), sign(), '-');
    return item();
  }

  Value item() {
    skip_spaces();
    if (left_.empty()) fail("the formula ends too early");
    const char c = left_.front();
    if (c == '(') {
      take('(');
      Value value = sum();
      if (!take(')')) fail("a parenthesis is missing");
      return value;
    }
    if (c == '{') return inline_array();
    if (c == '"') return Value::text(quoted());
    if (is_digit(c) || c == '.') return Value::number(number());
    if (c == '#') {
      for (const std::int32_t kind :
           {BUSBAR_ERROR_MISSING, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_INTERNAL}) {
        const std::string_view word = error_word(kind);
        if (left_.substr(0, word.size()) != word) continue;
        left_.remove_prefix(word.size());
        return Value::error(kind);
      }
    }
    if (is_letter(c)) return named();
    fail("nothing that a formula may hold");
  }

  double number() {
    double value = 0;
    const auto end = std::from_chars(left_.data(), left_.data() + left_.size(), value);
    if (end.ec != std::errc{}) fail("not a number");
    left_.remove_prefix(static_cast<std::size_t>(end.ptr - left_.data()));
    return value;
  }

  std::string quoted() {
    take('"');
    std::string text;
    while (true) {
      const auto quote = left_.find('"');
      if (quote == std::string_view::npos) fail("a quote is not closed");
      text += left_.substr(0, quote);
      left_.remove_prefix(quote + 1);
      if (left_.empty() || left_.front() != '"') return text;
      text += '"';
      left_.remove_prefix(1);
    }
  }

  // A cell of an inline array is a constant, or nothing for a blank.
  Value inline_array() {
    take('{');
    std::vector<std::vector<Value>> rows(1);
    while (true) {
      skip_spaces();
      const char c = left_.empty() ? '\0' : left_.front();
      rows.back().push_back(c == ';' || c == '|' || c == '}' ? Value::blank() : sum());
      if (take(';')) continue;
      if (take('|')) {
        rows.emplace_back();
        continue;
      }
      if (take('}')) break;
      fail("an inline array is not closed");
    }
    Value table(rows.size(), rows.front().size());
    for (std::size_t r = 0; r < rows.size(); ++r) {
      if (rows[r].size() != rows.front().size()) fail("an inline array is ragged");
      for (std::size_t k = 0; k < rows[r].size(); ++k) table.copy(r, k, rows[r][k]);
    }
    return table;
  }

  Value named() {
    std::size_t length = 0;
    while (length < left_.size() &&
           (is_letter(left_[length]) || is_digit(left_[length]) || left_[length] == '_')) {
      ++length;
    }
    const std::string name(left_.substr(0, length));
    left_.remove_prefix(length);
    if (take('(')) return function(name);
    if (name == "TRUE" || name == "FALSE") return Value::logical(name == "TRUE");
    const CellName first = cell_name(name);
    if (!take(':')) return cell(name);
    length = 0;
    while (length < left_.size() && (is_letter(left_[length]) || is_digit(left_[length]))) {
      ++length;
    }
    const CellName last = cell_name(std::string(left_.substr(0, length)));
    left_.remove_prefix(length);
    if (last.row < first.row || last.column < first.column) fail("a range runs backwards");
    Value table(last.row - first.row + 1, last.column - first.column + 1);
    for (std::size_t r = 0; r < table.rows(); ++r) {
      for (std::size_t k = 0; k < table.columns(); ++k) {
        table.copy(r, k, cell(name_of({first.column + k, first.row + r})));
      }
    }
    return table;
  }

  [[nodiscard]] CellName cell_name(const std::string& name) const {
    CellName cell;
    std::size_t i = 0;
    for (; i < name.size() && is_letter(name[i]); ++i) {
      cell.column = cell.column * 26 + static_cast<std::size_t>(name[i] - 'A') + 1;
    }
    const auto end = std::from_chars(name.data() + i, name.data() + name.size(), cell.row);
    if (i == 0 || i > 3 || end.ec != std::errc{} || end.ptr != name.data() + name.size()) {
      fail("\"" + name + "\" is neither a function nor a cell");
    }
    return cell;
  }

  [[nodiscard]] Value cell(const std::string& name) const {
    const auto found = sheet_.cells().find(name);
    if (found == sheet_.cells().end() || found->second.empty()) return Value::blank();
    return Reader(found->second, sheet_, depth_ + 1).whole();
  }

  Value function(const std::string& name) {
    std::vector<Value> values;
    std::vector<bool> given;
    if (!take(')')) {
      while (true) {
        skip_spaces();
        const char c = left_.empty() ? '\0' : left_.front();
        const bool left_out = c == ';' || c == ')';
        given.push_back(!left_out);
        values.push_back(left_out ? Value::blank() : sum());
        if (take(';')) continue;
        if (take(')')) break;
        fail("the arguments of " + name + " do not end");
      }
    }
    if (name == "INDEX") return index(values);
    std::vector<Argument> arguments;
    for (std::size_t i = 0; i < values.size(); ++i) {
      arguments.push_back(given[i] ? Argument(values[i]) : Argument(nullptr));
    }
    return call_with(name, std::span<const Argument>(arguments));
  }

  [[nodiscard]] Value index(const std::vector<Value>& values) const {
    if (values.size() != 3) fail("INDEX takes a table, a row and a column");
    if (values[0].rows() == 1 && values[0].columns() == 1 && values[0].is_error()) {
      return Value::error(values[0].error_at());
    }
    const auto row = static_cast<std::size_t>(values[1].number_at());
    const auto column = static_cast<std::size_t>(values[2].number_at());
    if (row < 1 || row > values[0].rows() || column < 1 || column > values[0].columns()) {
      fail("INDEX points outside its table");
    }
    Value one;
    one.copy(0, 0, values[0], row - 1, column - 1);
    return one;
  }

  std::string_view left_;
  const Sheet& sheet_;
  int depth_;
};

// Cuts at bars that stand outside of quotes and braces.
std::vector<std::string_view> split_at_bars(std::string_view text) {
  std::vector<std::string_view> parts;
  std::size_t start = 0;
  int braces = 0;
  bool quoted = false;
  for (std::size_t i = 0; i <= text.size(); ++i) {
    const char c = i < text.size() ? text[i] : '|';
    if (c == '"') quoted = !quoted;
    if (c == '{') ++braces;
    if (c == '}') --braces;
    if (i < text.size() && (c != '|' || quoted || braces > 0)) continue;
    parts.push_back(trimmed(text.substr(start, i - start)));
    start = i + 1;
  }
  return parts;
}

}  // namespace

Sheet::Sheet(std::string_view given) {
  for (const std::string_view part : split_at_bars(given)) {
    if (part.empty()) continue;
    const auto equals = part.find('=');
    if (equals == std::string_view::npos) {
      throw FormulaError("a given cell lacks its equals sign: " + std::string(part));
    }
    set(std::string(trimmed(part.substr(0, equals))),
        std::string(trimmed(part.substr(equals + 1))));
  }
}

Value Sheet::evaluate(std::string_view formula) const { return Reader(formula, *this, 0).whole(); }

Value evaluate(std::string_view formula, std::string_view given) {
  return Sheet(given).evaluate(formula);
}

}  // namespace busbar::support
