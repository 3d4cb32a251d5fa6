#include "why_operators.hpp"

#include <algorithm>
#include <charconv>
#include <cmath>
#include <rtl/math.hxx>
#include <rtl/ustring.hxx>
#include <string>

#include "text.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::uno::Any;
using com::sun::star::uno::Sequence;
using rtl::OUString;

using Table = Sequence<Sequence<Any>>;

template <class T>
bool widen(const Any& value, Table& table) {
  Sequence<Sequence<T>> narrow;
  if (!(value >>= narrow)) return false;
  table.realloc(narrow.getLength());
  Sequence<Any>* const rows = table.getArray();
  for (sal_Int32 r = 0; r < narrow.getLength(); ++r) {
    rows[r].realloc(narrow[r].getLength());
    Any* const cells = rows[r].getArray();
    for (sal_Int32 c = 0; c < narrow[r].getLength(); ++c) cells[c] <<= narrow[r][c];
  }
  return true;
}

bool table_in(const Any& value, Table& table) {
  if (value.getValueTypeClass() != com::sun::star::uno::TypeClass_SEQUENCE) return false;
  return (value >>= table) || widen<double>(value, table) || widen<OUString>(value, table);
}

OUString as_text(const Any& value) {
  OUString text;
  if (value >>= text) return text;
  return rtl::math::doubleToUString(as_number(value), rtl_math_StringFormat_Automatic,
                                    rtl_math_DecimalPlaces_Max, '.', true);
}

double finite_or_error(double number) {
  return std::isfinite(number) ? number : error_number(CalcError::number);
}

double arithmetic(Operator op, double a, double b) {
  switch (op) {
    case Operator::plus:
      return finite_or_error(rtl::math::approxAdd(a, b));
    case Operator::minus:
      return finite_or_error(rtl::math::approxSub(a, b));
    case Operator::times:
      return finite_or_error(a * b);
    case Operator::divide:
      return b == 0 ? error_number(CalcError::division) : finite_or_error(a / b);
    default:
      return finite_or_error(std::pow(a, b));
  }
}

// Less than, equal to or greater than zero; a number comes before any text, capitals do not count.
int compare(const Any& left, const Any& right) {
  OUString a;
  OUString b;
  const bool left_text = left >>= a;
  const bool right_text = right >>= b;
  if (left_text && right_text) return a.toAsciiLowerCase().compareTo(b.toAsciiLowerCase());
  if (left_text != right_text) return left_text ? 1 : -1;
  const double x = as_number(left);
  const double y = as_number(right);
  if (rtl::math::approxEqual(x, y)) return 0;
  return x < y ? -1 : 1;
}

bool holds(Operator op, int order) {
  switch (op) {
    case Operator::equal:
      return order == 0;
    case Operator::unequal:
      return order != 0;
    case Operator::less:
      return order < 0;
    case Operator::greater:
      return order > 0;
    case Operator::less_or_equal:
      return order <= 0;
    default:
      return order >= 0;
  }
}

Any apply_single(Operator op, const Any& left, const Any& right) {
  for (const Any* side : {&left, &right})
    if (error_in(*side) != CalcError::none) return *side;
  switch (op) {
    case Operator::plus:
    case Operator::minus:
    case Operator::times:
    case Operator::divide:
    case Operator::power: {
      const double a = as_number(left);
      const double b = as_number(right);
      if (std::isnan(a)) return Any(a);
      if (std::isnan(b)) return Any(b);
      return Any(arithmetic(op, a, b));
    }
    case Operator::concatenate:
      return Any(OUString(as_text(left) + as_text(right)));
    default:
      return Any(holds(op, compare(left, right)) ? 1.0 : 0.0);
  }
}

}  // namespace

CalcError error_in(const Any& value) {
  if (value.getValueTypeClass() != com::sun::star::uno::TypeClass_DOUBLE) return CalcError::none;
  return error_in(*static_cast<const double*>(value.getValue()));
}

double as_number(const Any& value) {
  double number = 0;
  if (value >>= number) return number;
  bool logical = false;
  if (value >>= logical) return logical ? 1.0 : 0.0;
  OUString text;
  if (value >>= text) {
    // Calc converts a text only where it can be read in one way alone.
    const std::string bytes = to_utf8(text);
    const char* const end = bytes.data() + bytes.size();
    const auto [stop, status] = std::from_chars(bytes.data(), end, number);
    if (status == std::errc{} && stop == end && std::isfinite(number)) return number;
  }
  return error_number(CalcError::value);
}

Shape shape_of(const Any& value) {
  Table table;
  if (!table_in(value, table)) return {1, 1};
  std::size_t columns = 0;
  for (const Sequence<Any>& row : table)
    columns = std::max(columns, static_cast<std::size_t>(row.getLength()));
  return {static_cast<std::size_t>(table.getLength()), columns};
}

Any element_of(const Any& value, std::size_t row, std::size_t column) {
  Table table;
  if (!table_in(value, table)) return value;
  const Shape shape = shape_of(value);
  if (shape.rows == 1) row = 0;
  if (shape.columns == 1) column = 0;
  if (row >= shape.rows) return {};
  const Sequence<Any>& cells = table[static_cast<sal_Int32>(row)];
  if (column >= static_cast<std::size_t>(cells.getLength())) return {};
  return cells[static_cast<sal_Int32>(column)];
}

Any apply(Operator op, const Any& left, const Any& right) {
  const Shape a = shape_of(left);
  const Shape b = shape_of(right);
  const std::size_t rows = std::max(a.rows, b.rows);
  const std::size_t columns = std::max(a.columns, b.columns);
  if (rows == 1 && columns == 1)
    return apply_single(op, element_of(left, 0, 0), element_of(right, 0, 0));
  Table table(static_cast<sal_Int32>(rows));
  Sequence<Any>* const row = table.getArray();
  for (std::size_t r = 0; r < rows; ++r) {
    row[r].realloc(static_cast<sal_Int32>(columns));
    Any* const cells = row[r].getArray();
    for (std::size_t c = 0; c < columns; ++c) {
      const Any x = element_of(left, r, c);
      const Any y = element_of(right, r, c);
      cells[c] = x.hasValue() && y.hasValue() ? apply_single(op, x, y)
                                              : Any(error_number(CalcError::not_available));
    }
  }
  return Any(table);
}

Any scaled(const Any& value, double factor) { return apply(Operator::times, value, Any(factor)); }

}  // namespace busbar::addin
