// The two entries that the generated methods hand every call to. Neither throws.
#pragma once

#include <com/sun/star/beans/XPropertySet.hpp>
#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/Reference.hxx>
#include <com/sun/star/uno/Sequence.hxx>
#include <com/sun/star/uno/XComponentContext.hpp>
#include <cstddef>

namespace busbar::addin {

// Calls the function of that number with `count` arguments and, where `rest` is not null, the
// further ones after them.
com::sun::star::uno::Any answer(
    std::size_t number, const com::sun::star::uno::Any* const* given, std::size_t count,
    const com::sun::star::uno::Sequence<com::sun::star::uno::Any>* rest = nullptr) noexcept;

// Explains the cell that is referred to. `document` is the spreadsheet, which Calc adds to the
// call.
com::sun::star::uno::Any answer_cell(
    const com::sun::star::uno::Reference<com::sun::star::uno::XComponentContext>& context,
    const com::sun::star::uno::Reference<com::sun::star::beans::XPropertySet>& document,
    const com::sun::star::uno::Reference<com::sun::star::table::XCellRange>& cell) noexcept;

}  // namespace busbar::addin
