#include "marshal.hpp"

#include <algorithm>
#include <cmath>
#include <com/sun/star/uno/Sequence.hxx>
#include <cstddef>
#include <new>
#include <rtl/ustring.hxx>

#include "text.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::uno::Any;
using com::sun::star::uno::Sequence;
using com::sun::star::uno::TypeClass_BOOLEAN;
using com::sun::star::uno::TypeClass_CHAR;
using com::sun::star::uno::TypeClass_DOUBLE;
using com::sun::star::uno::TypeClass_HYPER;
using com::sun::star::uno::TypeClass_SEQUENCE;
using com::sun::star::uno::TypeClass_STRING;
using com::sun::star::uno::TypeClass_UNSIGNED_HYPER;
using com::sun::star::uno::TypeClass_VOID;
using rtl::OUString;

template <class T>
using Table = Sequence<Sequence<T>>;

Taken status(std::int32_t code) {
  switch (code) {
    case BUSBAR_OK:
      return Taken::value;
    case BUSBAR_TOO_LARGE:
      return Taken::too_large;
    case BUSBAR_OUT_OF_MEMORY:
      return Taken::no_memory;
    default:
      return Taken::unsupported;
  }
}

// One cell of a value that is being filled.
struct Cell {
  busbar_value* value;
  std::size_t row;
  std::size_t column;
};

Taken put(const Cell& cell, double number) {
  if (!std::isnan(number))
    return status(busbar_set_number(cell.value, cell.row, cell.column, number));
  const std::int32_t kind = engine_error_of(error_in(number));
  return status(busbar_set_error(cell.value, cell.row, cell.column, kind));
}

Taken put(const Cell& cell, sal_Int32 number) {
  return status(busbar_set_number(cell.value, cell.row, cell.column, number));
}

Taken put(const Cell& cell, const OUString& text) {
  if (text.isEmpty()) return status(busbar_set_blank(cell.value, cell.row, cell.column));
  if (static_cast<std::size_t>(text.getLength()) > busbar_text_limit()) return Taken::too_large;
  const Utf8 bytes(text);
  return status(
      busbar_set_text(cell.value, cell.row, cell.column, bytes.view().data(), bytes.view().size()));
}

// A number of any UNO type; false for what is none.
bool number_in(const Any& any, double& number) {
  switch (any.getValueTypeClass()) {
    case TypeClass_DOUBLE:
      number = *static_cast<const double*>(any.getValue());
      return true;
    case TypeClass_HYPER:
      number = static_cast<double>(*static_cast<const sal_Int64*>(any.getValue()));
      return true;
    case TypeClass_UNSIGNED_HYPER:
      number = static_cast<double>(*static_cast<const sal_uInt64*>(any.getValue()));
      return true;
    default:
      return any >>= number;
  }
}

Taken put(const Cell& cell, const Any& any) {
  switch (any.getValueTypeClass()) {
    case TypeClass_VOID:
      return status(busbar_set_blank(cell.value, cell.row, cell.column));
    case TypeClass_STRING:
      return put(cell, *static_cast<const OUString*>(any.getValue()));
    case TypeClass_BOOLEAN:
      return status(busbar_set_logical(cell.value, cell.row, cell.column,
                                       *static_cast<const sal_Bool*>(any.getValue()) ? 1 : 0));
    case TypeClass_CHAR:
      return put(cell, OUString(*static_cast<const sal_Unicode*>(any.getValue())));
    default: {
      double number = 0;
      return number_in(any, number) ? put(cell, number) : Taken::unsupported;
    }
  }
}

// A ragged table is filled up with blanks.
template <class T>
Taken table_to_engine(const Table<T>& table, Value& value) {
  const auto rows = static_cast<std::size_t>(table.getLength());
  std::size_t columns = 0;
  for (const Sequence<T>& row : table)
    columns = std::max(columns, static_cast<std::size_t>(row.getLength()));
  if (rows == 0 || columns == 0) return Taken::unsupported;
  if (columns > busbar_cell_limit() / rows) return Taken::too_large;
  Value filled(busbar_value_create(rows, columns));
  if (!filled) return Taken::no_memory;
  for (std::size_t r = 0; r < rows; ++r) {
    const Sequence<T>& row = table[static_cast<sal_Int32>(r)];
    const T* const cells = row.getConstArray();
    const auto length = static_cast<std::size_t>(row.getLength());
    for (std::size_t c = 0; c < length; ++c) {
      const Taken taken = put(Cell{filled.get(), r, c}, cells[c]);
      if (taken != Taken::value) return taken;
    }
  }
  value = std::move(filled);
  return Taken::value;
}

Taken sequence_to_engine(const Any& any, Value& value) {
  const com::sun::star::uno::Type& type = any.getValueType();
  if (type == cppu::UnoType<Table<Any>>::get())
    return table_to_engine(*static_cast<const Table<Any>*>(any.getValue()), value);
  if (type == cppu::UnoType<Table<double>>::get())
    return table_to_engine(*static_cast<const Table<double>*>(any.getValue()), value);
  if (type == cppu::UnoType<Table<OUString>>::get())
    return table_to_engine(*static_cast<const Table<OUString>*>(any.getValue()), value);
  if (type == cppu::UnoType<Table<sal_Int32>>::get())
    return table_to_engine(*static_cast<const Table<sal_Int32>*>(any.getValue()), value);
  return Taken::unsupported;
}

Taken scalar_to_engine(const Any& any, Value& value) {
  if (any.getValueTypeClass() == TypeClass_STRING) {
    // An empty text stays one: unlike in a table, it cannot be a blank cell.
    const auto& text = *static_cast<const OUString*>(any.getValue());
    if (static_cast<std::size_t>(text.getLength()) > busbar_text_limit()) return Taken::too_large;
    const Utf8 bytes(text);
    if (bytes.view().size() > busbar_text_limit()) return Taken::too_large;
    value.reset(busbar_text(bytes.view().data(), bytes.view().size()));
    return value ? Taken::value : Taken::no_memory;
  }
  Value single(busbar_value_create(1, 1));
  if (!single) return Taken::no_memory;
  const Taken taken = put(Cell{single.get(), 0, 0}, any);
  if (taken == Taken::value) value = std::move(single);
  return taken;
}

double number_of(const busbar_value& value, std::size_t row, std::size_t column,
                 std::int32_t kind) {
  switch (kind) {
    case BUSBAR_NUMBER: {
      const double number = busbar_get_number(&value, row, column);
      // Calc would take a stray NaN or infinity for an error code of its own.
      return std::isfinite(number) ? number : error_number(CalcError::value);
    }
    case BUSBAR_LOGICAL:
      return busbar_get_logical(&value, row, column) != 0 ? 1.0 : 0.0;
    default:
      return error_number(calc_error_of(busbar_get_error(&value, row, column)));
  }
}

OUString text_of(const busbar_value& value, std::size_t row, std::size_t column) {
  std::size_t length = 0;
  const char* text = busbar_get_text(&value, row, column, &length);
  return text == nullptr ? OUString() : to_utf16({text, length});
}

bool is_textual(std::int32_t kind) { return kind == BUSBAR_TEXT || kind == BUSBAR_BLANK; }

void give(const busbar_value& value, std::size_t r, std::size_t c, double& out) {
  out = number_of(value, r, c, busbar_kind(&value, r, c));
}

void give(const busbar_value& value, std::size_t r, std::size_t c, OUString& out) {
  out = text_of(value, r, c);
}

void give(const busbar_value& value, std::size_t r, std::size_t c, Any& out) {
  const std::int32_t kind = busbar_kind(&value, r, c);
  if (is_textual(kind))
    out <<= text_of(value, r, c);
  else
    out <<= number_of(value, r, c, kind);
}

template <class T>
Any table_to_calc(const busbar_value& value, std::size_t rows, std::size_t columns) {
  Table<T> table(static_cast<sal_Int32>(rows));
  Sequence<T>* const row = table.getArray();
  for (std::size_t r = 0; r < rows; ++r) {
    row[r].realloc(static_cast<sal_Int32>(columns));
    T* const cells = row[r].getArray();
    for (std::size_t c = 0; c < columns; ++c) give(value, r, c, cells[c]);
  }
  return Any(table);
}

}  // namespace

const char* in_words(Taken taken) {
  switch (taken) {
    case Taken::too_large:
      return "is larger than Busbar takes in one call";
    case Taken::no_memory:
      return "does not fit into memory";
    case Taken::unsupported:
      return "is neither a number, a text nor a range of these";
    default:
      return "";
  }
}

Taken to_engine(const Any& any, Value& value) noexcept {
  value.reset();
  try {
    switch (any.getValueTypeClass()) {
      case TypeClass_DOUBLE: {
        const double number = *static_cast<const double*>(any.getValue());
        if (std::isnan(number)) return scalar_to_engine(any, value);
        value.reset(busbar_number(number));
        return value ? Taken::value : Taken::no_memory;
      }
      case TypeClass_VOID:
        return Taken::omitted;
      case TypeClass_SEQUENCE:
        return sequence_to_engine(any, value);
      default:
        return scalar_to_engine(any, value);
    }
  } catch (const std::bad_alloc&) {
    return Taken::no_memory;
  } catch (...) {
    return Taken::unsupported;
  }
}

Any to_calc(const busbar_value& value) {
  const std::size_t rows = busbar_rows(&value);
  const std::size_t columns = busbar_columns(&value);
  if (rows == 1 && columns == 1) {
    Any single;
    give(value, 0, 0, single);
    return single;
  }
  // A row of numbers or texts alone travels as such: 16 bytes and an allocation less per cell.
  bool numbers = true;
  bool texts = true;
  for (std::size_t r = 0; r < rows && (numbers || texts); ++r) {
    for (std::size_t c = 0; c < columns; ++c) {
      const bool textual = is_textual(busbar_kind(&value, r, c));
      numbers = numbers && !textual;
      texts = texts && textual;
    }
  }
  if (numbers) return table_to_calc<double>(value, rows, columns);
  if (texts) return table_to_calc<OUString>(value, rows, columns);
  return table_to_calc<Any>(value, rows, columns);
}

Any to_calc(CalcError error) { return Any(error_number(error)); }

}  // namespace busbar::addin
