#include <busbar.h>

#include "writers.hpp"

namespace busbar::exporter {
namespace {

std::string parameter(const Argument& argument) {
  // `any` takes a value or a range alike, in one call; a cell that holds an error is only handed
  // over to a parameter that takes a reference.
  switch (argument.kind) {
    case BUSBAR_ARGUMENT_CELL:
      return "[in] com::sun::star::table::XCellRange " + argument.identifier;
    case BUSBAR_ARGUMENT_REST:
      return "[in] sequence<any> " + argument.identifier;
    default:
      return "[in] any " + argument.identifier;
  }
}

}  // namespace

std::string write_idl(const Catalogue& catalogue) {
  std::string out = "module busbar { module calc {\ninterface XFunctions {\n";
  for (const Function& function : catalogue.functions) {
    out += "  any " + function.name + "(";
    // Calc fills in the document by itself; no user sees this parameter.
    if (function.takes_cell()) out += "[in] com::sun::star::beans::XPropertySet document, ";
    for (std::size_t i = 0; i < function.arguments.size(); ++i) {
      if (i != 0) out += ", ";
      out += parameter(function.arguments[i]);
    }
    out += ");\n";
  }
  return out + "};\n}; };\n";
}

}  // namespace busbar::exporter
