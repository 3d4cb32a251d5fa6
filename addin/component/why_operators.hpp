// Calc's operators on values as WHY carries them: numbers, texts, logicals and tables of these. An
// error is a number that carries it (calc_error.hpp).
#pragma once

#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/Sequence.hxx>
#include <cstddef>

#include "calc_error.hpp"
#include "why_tree.hpp"

namespace busbar::addin {

// The error in a single value, CalcError::none for a table.
[[nodiscard]] CalcError error_in(const com::sun::star::uno::Any& value);

struct Shape {
  std::size_t rows;
  std::size_t columns;
};
// 1 x 1 for a single value.
[[nodiscard]] Shape shape_of(const com::sun::star::uno::Any& value);

// One element; a single row or column repeats. Void beyond the end.
[[nodiscard]] com::sun::star::uno::Any element_of(const com::sun::star::uno::Any& value,
                                                  std::size_t row, std::size_t column);

// Element by element where a table takes part.
[[nodiscard]] com::sun::star::uno::Any apply(Operator op, const com::sun::star::uno::Any& left,
                                             const com::sun::star::uno::Any& right);
[[nodiscard]] com::sun::star::uno::Any scaled(const com::sun::star::uno::Any& value, double factor);

// A single value as a number; an error travels on.
[[nodiscard]] double as_number(const com::sun::star::uno::Any& value);

}  // namespace busbar::addin
