// WHY: what happened in a cell, in a sentence.
#pragma once

#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/uno/Reference.hxx>
#include <com/sun/star/uno/XComponentContext.hpp>
#include <string>

namespace busbar::addin {

// "B7: <reason>" or "B7 passes on the error of Stages.C4: <reason>". Throws std::bad_alloc alone:
// what cannot be explained is said in the sentence.
[[nodiscard]] std::string explain_cell(
    const com::sun::star::uno::Reference<com::sun::star::uno::XComponentContext>& context,
    const com::sun::star::uno::Reference<com::sun::star::uno::XInterface>& document,
    const com::sun::star::uno::Reference<com::sun::star::table::XCellRange>& cell);

}  // namespace busbar::addin
