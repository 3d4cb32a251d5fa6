// A spreadsheet as WHY sees it: cells by address, their tokens, names, and what ranges hold.
#pragma once

#include <com/sun/star/lang/XMultiServiceFactory.hpp>
#include <com/sun/star/sheet/FormulaToken.hpp>
#include <com/sun/star/sheet/NameToken.hpp>
#include <com/sun/star/sheet/XSpreadsheetDocument.hpp>
#include <com/sun/star/table/XCell.hpp>
#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/uno/Reference.hxx>
#include <com/sun/star/uno/Sequence.hxx>
#include <cstddef>
#include <optional>
#include <string>
#include <tuple>
#include <vector>

#include "calc_error.hpp"

namespace busbar::addin {

struct Address {
  sal_Int32 sheet = 0;
  sal_Int32 row = 0;
  sal_Int32 column = 0;
  // Sheet by sheet, row by row.
  friend bool operator<(const Address& a, const Address& b) {
    return std::tie(a.sheet, a.row, a.column) < std::tie(b.sheet, b.row, b.column);
  }
  friend bool operator==(const Address& a, const Address& b) {
    return std::tie(a.sheet, a.row, a.column) == std::tie(b.sheet, b.row, b.column);
  }
};

// A rectangle of cells on one sheet, ends included.
struct Area {
  Address first;
  sal_Int32 last_row = 0;
  sal_Int32 last_column = 0;

  [[nodiscard]] bool single() const { return first.row == last_row && first.column == last_column; }
  [[nodiscard]] std::size_t rows() const {
    return static_cast<std::size_t>(last_row - first.row) + 1;
  }
  [[nodiscard]] std::size_t columns() const {
    return static_cast<std::size_t>(last_column - first.column) + 1;
  }
};

// The formula that fills a cell: its own, or the array formula that it is an element of.
struct CellFormula {
  com::sun::star::uno::Sequence<com::sun::star::sheet::FormulaToken> tokens;
  Address base;        // what relative references count from
  bool array = false;  // whether it was entered as an array formula
  sal_Int32 row = 0;   // position of the cell in the array
  sal_Int32 column = 0;
};

enum class Content { blank, number, text, formula };

using Tokens = com::sun::star::uno::Sequence<com::sun::star::sheet::FormulaToken>;

class SheetDocument {
 public:
  // Throws com::sun::star::uno::RuntimeException when it is no spreadsheet.
  explicit SheetDocument(
      const com::sun::star::uno::Reference<com::sun::star::uno::XInterface>& model);

  [[nodiscard]] bool exists(const Address& address) const;
  [[nodiscard]] Content content(const Address& address) const;
  [[nodiscard]] CalcError error(const Address& address) const;
  [[nodiscard]] double number(const Address& address) const;
  [[nodiscard]] rtl::OUString text(const Address& address) const;
  // Whether a formula's result is a text.
  [[nodiscard]] bool shows_text(const Address& address) const;
  [[nodiscard]] rtl::OUString formula_text(const Address& address) const;
  [[nodiscard]] CellFormula formula(const Address& address) const;

  // A single cell as Calc hands it to a parameter of type `any`: a blank is 0.
  [[nodiscard]] com::sun::star::uno::Any value(const Address& address) const;
  // A range as a table; a blank is an empty text, an error is a number that carries it.
  [[nodiscard]] com::sun::star::uno::Any table(const Area& area) const;
  // The first cell with an error, row by row.
  [[nodiscard]] std::optional<Address> first_error(const Area& area) const;
  // The formulas in an area, `most` of them at the most, row by row within each block of them.
  [[nodiscard]] std::vector<Address> formula_cells(const Area& area, std::size_t most) const;
  // Whether the document computes circles step by step.
  [[nodiscard]] bool iterates() const;
  // The area without the rows and columns at its end that nothing fills.
  [[nodiscard]] Area used_part(const Area& area) const;

  // What a name stands for; nothing when there is no such name.
  [[nodiscard]] std::optional<Tokens> name_tokens(
      const com::sun::star::sheet::NameToken& name) const;

  // "B7", or "Stages.B7" when it lies on another sheet than `seen_from`.
  [[nodiscard]] std::string name_of(const Address& address, sal_Int32 seen_from) const;

  [[nodiscard]] com::sun::star::uno::Reference<com::sun::star::lang::XMultiServiceFactory> factory()
      const {
    return factory_;
  }

 private:
  [[nodiscard]] com::sun::star::uno::Reference<com::sun::star::table::XCellRange> sheet(
      sal_Int32 index) const;
  [[nodiscard]] com::sun::star::uno::Reference<com::sun::star::table::XCell> cell(
      const Address& address) const;
  [[nodiscard]] com::sun::star::uno::Reference<com::sun::star::table::XCellRange> range(
      const Area& area) const;

  com::sun::star::uno::Reference<com::sun::star::sheet::XSpreadsheetDocument> document_;
  com::sun::star::uno::Reference<com::sun::star::lang::XMultiServiceFactory> factory_;
};

// "A", "Z", "AA"... for 0, 25, 26...
[[nodiscard]] std::string column_name(sal_Int32 column);

}  // namespace busbar::addin
