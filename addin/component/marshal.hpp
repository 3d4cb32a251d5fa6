// Values between Calc and the engine. The only place that turns one into the other.
//
// Calc -> engine: a number, a text, a logical, a table of these; void is an omitted argument. An
// empty text inside a table is a blank (Calc hands blank cells of a range over as empty texts).
// Engine -> Calc: a single cell is a scalar, a grid is a table; errors are Calc errors, blanks are
// empty texts, logicals are 1 and 0.
#pragma once

#include <com/sun/star/uno/Any.hxx>

#include "calc_error.hpp"
#include "engine.hpp"

namespace busbar::addin {

enum class Taken {
  value,
  omitted,      // the value is null, which the engine reads as "left out"
  too_large,    // beyond the engine's limits for cells or text
  unsupported,  // an object, an empty table...
  no_memory
};

// Why an argument did not reach the engine, as the end of a sentence.
[[nodiscard]] const char* in_words(Taken taken);

// Never throws; `value` is null unless the answer is Taken::value.
[[nodiscard]] Taken to_engine(const com::sun::star::uno::Any& any, Value& value) noexcept;

// May throw std::bad_alloc.
[[nodiscard]] com::sun::star::uno::Any to_calc(const busbar_value& value);

[[nodiscard]] com::sun::star::uno::Any to_calc(CalcError error);

}  // namespace busbar::addin
