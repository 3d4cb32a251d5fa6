#include "why_document.hpp"

#include <algorithm>
#include <com/sun/star/beans/XPropertySet.hpp>
#include <com/sun/star/container/XIndexAccess.hpp>
#include <com/sun/star/container/XNamed.hpp>
#include <com/sun/star/sheet/CellFlags.hpp>
#include <com/sun/star/sheet/FormulaResult.hpp>
#include <com/sun/star/sheet/XArrayFormulaTokens.hpp>
#include <com/sun/star/sheet/XCellRangeAddressable.hpp>
#include <com/sun/star/sheet/XCellRangeData.hpp>
#include <com/sun/star/sheet/XCellRangesQuery.hpp>
#include <com/sun/star/sheet/XFormulaTokens.hpp>
#include <com/sun/star/sheet/XSheetCellCursor.hpp>
#include <com/sun/star/sheet/XSheetCellRanges.hpp>
#include <com/sun/star/sheet/XSpreadsheet.hpp>
#include <com/sun/star/sheet/XSpreadsheets.hpp>
#include <com/sun/star/sheet/XUsedAreaCursor.hpp>
#include <com/sun/star/table/CellContentType.hpp>

#include "text.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::beans::XPropertySet;
using com::sun::star::container::XIndexAccess;
using com::sun::star::container::XNamed;
using com::sun::star::sheet::NameToken;
using com::sun::star::sheet::XArrayFormulaTokens;
using com::sun::star::sheet::XCellRangeAddressable;
using com::sun::star::sheet::XCellRangeData;
using com::sun::star::sheet::XCellRangesQuery;
using com::sun::star::sheet::XFormulaTokens;
using com::sun::star::sheet::XSheetCellCursor;
using com::sun::star::sheet::XSheetCellRange;
using com::sun::star::sheet::XSheetCellRanges;
using com::sun::star::sheet::XSpreadsheet;
using com::sun::star::sheet::XUsedAreaCursor;
using com::sun::star::table::CellRangeAddress;
using com::sun::star::table::XCell;
using com::sun::star::table::XCellRange;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using com::sun::star::uno::Sequence;
using com::sun::star::uno::UNO_QUERY_THROW;
using rtl::OUString;

namespace content_type = com::sun::star::table;

// A sheet name that a formula could not hold bare stands in quotes, as Calc writes it.
std::string quoted(const std::string& name) {
  const bool plain = !name.empty() && std::all_of(name.begin(), name.end(), [](char c) {
    return (c >= 'A' && c <= 'Z') || (c >= 'a' && c <= 'z') || (c >= '0' && c <= '9') || c == '_' ||
           static_cast<unsigned char>(c) >= 0x80;
  });
  if (plain) return name;
  std::string out = "'";
  for (char c : name) {
    out += c;
    if (c == '\'') out += c;
  }
  return out + "'";
}

// The names of a document or of a sheet.
Reference<XIndexAccess> names_of(const Reference<com::sun::star::uno::XInterface>& owner) {
  const Reference<XPropertySet> properties(owner, UNO_QUERY_THROW);
  return Reference<XIndexAccess>(properties->getPropertyValue("NamedRanges"), UNO_QUERY_THROW);
}

}  // namespace

std::string column_name(sal_Int32 column) {
  std::string name;
  for (sal_Int32 rest = column + 1; rest > 0; rest = (rest - 1) / 26)
    name.insert(name.begin(), static_cast<char>('A' + (rest - 1) % 26));
  return name;
}

SheetDocument::SheetDocument(const Reference<com::sun::star::uno::XInterface>& model)
    : document_(model, UNO_QUERY_THROW), factory_(model, UNO_QUERY_THROW) {}

Reference<XCellRange> SheetDocument::sheet(sal_Int32 index) const {
  const Reference<XIndexAccess> sheets(document_->getSheets(), UNO_QUERY_THROW);
  return Reference<XCellRange>(sheets->getByIndex(index), UNO_QUERY_THROW);
}

Reference<XCell> SheetDocument::cell(const Address& address) const {
  return sheet(address.sheet)->getCellByPosition(address.column, address.row);
}

Reference<XCellRange> SheetDocument::range(const Area& area) const {
  return sheet(area.first.sheet)
      ->getCellRangeByPosition(area.first.column, area.first.row, area.last_column, area.last_row);
}

bool SheetDocument::exists(const Address& address) const {
  if (address.sheet < 0 || address.row < 0 || address.column < 0) return false;
  const Reference<XIndexAccess> sheets(document_->getSheets(), UNO_QUERY_THROW);
  if (address.sheet >= sheets->getCount()) return false;
  const Reference<XCellRangeAddressable> whole(sheet(address.sheet), UNO_QUERY_THROW);
  const CellRangeAddress limits = whole->getRangeAddress();
  return address.row <= limits.EndRow && address.column <= limits.EndColumn;
}

Content SheetDocument::content(const Address& address) const {
  switch (cell(address)->getType()) {
    case content_type::CellContentType_EMPTY:
      return Content::blank;
    case content_type::CellContentType_VALUE:
      return Content::number;
    case content_type::CellContentType_TEXT:
      return Content::text;
    default:
      return Content::formula;
  }
}

CalcError SheetDocument::error(const Address& address) const {
  return static_cast<CalcError>(cell(address)->getError());
}

double SheetDocument::number(const Address& address) const { return cell(address)->getValue(); }

OUString SheetDocument::text(const Address& address) const {
  // Not XText: while Calc computes, it answers "..." for the string of a formula cell.
  const Reference<XCellRangeData> data(range({address, address.row, address.column}),
                                       UNO_QUERY_THROW);
  OUString text;
  data->getDataArray()[0][0] >>= text;
  return text;
}

bool SheetDocument::shows_text(const Address& address) const {
  const Reference<XPropertySet> properties(cell(address), UNO_QUERY_THROW);
  sal_Int32 type = 0;
  properties->getPropertyValue("FormulaResultType2") >>= type;
  return type == com::sun::star::sheet::FormulaResult::STRING;
}

OUString SheetDocument::formula_text(const Address& address) const {
  const Reference<XPropertySet> properties(cell(address), UNO_QUERY_THROW);
  OUString formula;
  properties->getPropertyValue("FormulaLocal") >>= formula;
  return formula;
}

CellFormula SheetDocument::formula(const Address& address) const {
  const Reference<XCell> target = cell(address);
  CellFormula found;
  found.base = address;
  if (target->getFormula().startsWith("{")) {
    const Reference<XSpreadsheet> owner(sheet(address.sheet), UNO_QUERY_THROW);
    const Reference<XSheetCellRange> single(range({address, address.row, address.column}),
                                            UNO_QUERY_THROW);
    const Reference<XSheetCellCursor> cursor = owner->createCursorByRange(single);
    cursor->collapseToCurrentArray();
    const CellRangeAddress extent =
        Reference<XCellRangeAddressable>(cursor, UNO_QUERY_THROW)->getRangeAddress();
    found.array = true;
    found.base = {address.sheet, extent.StartRow, extent.StartColumn};
    found.row = address.row - extent.StartRow;
    found.column = address.column - extent.StartColumn;
    found.tokens = Reference<XArrayFormulaTokens>(cursor, UNO_QUERY_THROW)->getArrayTokens();
  } else {
    found.tokens = Reference<XFormulaTokens>(target, UNO_QUERY_THROW)->getTokens();
  }
  return found;
}

Any SheetDocument::value(const Address& address) const {
  switch (content(address)) {
    case Content::blank:
      return Any(0.0);
    case Content::number:
      return Any(number(address));
    case Content::text:
      return Any(text(address));
    default:
      break;
  }
  const CalcError failure = error(address);
  if (failure != CalcError::none) return Any(error_number(failure));
  return shows_text(address) ? Any(text(address)) : Any(number(address));
}

Any SheetDocument::table(const Area& area) const {
  Sequence<Sequence<Any>> rows =
      Reference<XCellRangeData>(range(area), UNO_QUERY_THROW)->getDataArray();
  if (first_error(area)) {
    Sequence<Any>* const row = rows.getArray();
    for (sal_Int32 r = 0; r < rows.getLength(); ++r) {
      Any* const cells = row[r].getArray();
      for (sal_Int32 c = 0; c < row[r].getLength(); ++c)
        if (!cells[c].hasValue())
          cells[c] <<=
              error_number(error({area.first.sheet, area.first.row + r, area.first.column + c}));
    }
  }
  return Any(rows);
}

std::optional<Address> SheetDocument::first_error(const Area& area) const {
  const Reference<XCellRangesQuery> query(range(area), UNO_QUERY_THROW);
  const Reference<XSheetCellRanges> found =
      query->queryFormulaCells(com::sun::star::sheet::FormulaResult::ERROR);
  std::optional<Address> first;
  if (!found.is()) return first;
  for (const CellRangeAddress& part : found->getRangeAddresses()) {
    // Calc also names cells beside a range that lies beyond the last column in use.
    const Address start{part.Sheet, std::max(part.StartRow, area.first.row),
                        std::max(part.StartColumn, area.first.column)};
    const bool inside = start.row <= std::min(part.EndRow, area.last_row) &&
                        start.column <= std::min(part.EndColumn, area.last_column);
    if (inside && (!first || start < *first)) first = start;
  }
  return first;
}

std::vector<Address> SheetDocument::formula_cells(const Area& area, std::size_t most) const {
  std::vector<Address> cells;
  if (!exists(area.first)) return cells;
  const Reference<XCellRangesQuery> query(range(area), UNO_QUERY_THROW);
  const Reference<XSheetCellRanges> found =
      query->queryContentCells(com::sun::star::sheet::CellFlags::FORMULA);
  if (!found.is()) return cells;
  for (const CellRangeAddress& part : found->getRangeAddresses())
    for (sal_Int32 row = part.StartRow; row <= part.EndRow; ++row)
      for (sal_Int32 column = part.StartColumn; column <= part.EndColumn; ++column) {
        if (cells.size() == most) return cells;
        cells.push_back({part.Sheet, row, column});
      }
  return cells;
}

bool SheetDocument::iterates() const {
  const Reference<XPropertySet> properties(document_, UNO_QUERY_THROW);
  bool on = false;
  properties->getPropertyValue("IsIterationEnabled") >>= on;
  return on;
}

Area SheetDocument::used_part(const Area& area) const {
  const Reference<XSpreadsheet> owner(sheet(area.first.sheet), UNO_QUERY_THROW);
  const Reference<XUsedAreaCursor> cursor(owner->createCursor(), UNO_QUERY_THROW);
  cursor->gotoEndOfUsedArea(false);
  const CellRangeAddress end =
      Reference<XCellRangeAddressable>(cursor, UNO_QUERY_THROW)->getRangeAddress();
  Area used = area;
  used.last_row = std::clamp(end.EndRow, area.first.row, area.last_row);
  used.last_column = std::clamp(end.EndColumn, area.first.column, area.last_column);
  return used;
}

std::optional<Tokens> SheetDocument::name_tokens(const NameToken& name) const {
  const Reference<XIndexAccess> names =
      name.Sheet < 0 ? names_of(document_) : names_of(sheet(name.Sheet));
  for (sal_Int32 i = 0; i < names->getCount(); ++i) {
    const Reference<XPropertySet> properties(names->getByIndex(i), UNO_QUERY_THROW);
    sal_Int32 index = 0;
    properties->getPropertyValue("TokenIndex") >>= index;
    if (index != name.Index) continue;
    return Reference<XFormulaTokens>(properties, UNO_QUERY_THROW)->getTokens();
  }
  return {};
}

std::string SheetDocument::name_of(const Address& address, sal_Int32 seen_from) const {
  std::string local = column_name(address.column) + std::to_string(address.row + 1);
  if (address.sheet == seen_from) return local;
  const Reference<XNamed> named(sheet(address.sheet), UNO_QUERY_THROW);
  return quoted(to_utf8(named->getName())) + "." + local;
}

}  // namespace busbar::addin
