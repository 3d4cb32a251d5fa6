#include <busbar.h>

#include "escape.hpp"
#include "writers.hpp"

namespace busbar::exporter {
namespace {

std::string parameters(const Function& function) {
  std::string out = function.takes_cell() ? "const Reference<XPropertySet>& document, " : "";
  for (std::size_t i = 0; i < function.arguments.size(); ++i) {
    const Argument& argument = function.arguments[i];
    if (i != 0) out += ", ";
    switch (argument.kind) {
      case BUSBAR_ARGUMENT_CELL:
        out += "const Reference<XCellRange>& ";
        break;
      case BUSBAR_ARGUMENT_REST:
        out += "const Sequence<Any>& ";
        break;
      default:
        out += "const Any& ";
    }
    out += argument.identifier;
  }
  return out;
}

std::string body(const Function& function, std::size_t index) {
  if (function.takes_cell())
    return "    return busbar::addin::answer_cell(context_, document, " +
           function.arguments.front().identifier + ");\n";
  const std::string number = std::to_string(index);
  const std::size_t fixed = function.arguments.size() - (function.takes_rest() ? 1 : 0);
  std::string out;
  if (fixed == 0) {
    out += "    const Any* const* const given = nullptr;\n";
  } else {
    out += "    const Any* const given[] = {";
    for (std::size_t i = 0; i < fixed; ++i)
      out += (i == 0 ? "&" : ", &") + function.arguments[i].identifier;
    out += "};\n";
  }
  out += "    return busbar::addin::answer(" + number + ", given, " + std::to_string(fixed);
  if (function.takes_rest()) out += ", &" + function.arguments.back().identifier;
  return out + ");\n";
}

}  // namespace

std::string write_glue(const Catalogue& catalogue) {
  std::string out =
      "// Written by busbar-export from the engine's catalogue; do not edit.\n"
      "#include <busbar/calc/XFunctions.hpp>\n"
      "#include <com/sun/star/lang/XServiceInfo.hpp>\n"
      "#include <cppuhelper/implbase2.hxx>\n"
      "#include <cppuhelper/supportsservice.hxx>\n\n"
      "#include \"answer.hpp\"\n"
      "#include \"built_for.hpp\"\n\n"
      "namespace busbar::addin {\n\n"
      "const BuiltFor kBuiltFor{" +
      std::to_string(catalogue.abi_version) + "u, " + std::to_string(catalogue.fingerprint) +
      "u, " + cpp_literal(catalogue.version) + ", " + std::to_string(catalogue.functions.size()) +
      "};\n\n}  // namespace busbar::addin\n\n"
      "namespace {\n\n"
      "using com::sun::star::beans::XPropertySet;\n"
      "using com::sun::star::table::XCellRange;\n"
      "using com::sun::star::uno::Any;\n"
      "using com::sun::star::uno::Reference;\n"
      "using com::sun::star::uno::Sequence;\n"
      "using com::sun::star::uno::XComponentContext;\n"
      "using rtl::OUString;\n\n"
      "class Functions final\n"
      "    : public cppu::WeakImplHelper2<busbar::calc::XFunctions,\n"
      "                                   com::sun::star::lang::XServiceInfo> {\n"
      " public:\n"
      "  explicit Functions(XComponentContext* context) : context_(context) {}\n\n"
      "  OUString SAL_CALL getImplementationName() override { return \"busbar.calc.Functions\"; }\n"
      "  sal_Bool SAL_CALL supportsService(const OUString& name) override {\n"
      "    return cppu::supportsService(this, name);\n"
      "  }\n"
      "  Sequence<OUString> SAL_CALL getSupportedServiceNames() override {\n"
      "    const OUString names[] = {\"BUSBAR\", \"com.sun.star.sheet.AddIn\"};\n"
      "    return Sequence<OUString>(names, 2);\n"
      "  }\n";
  for (std::size_t i = 0; i < catalogue.functions.size(); ++i) {
    const Function& function = catalogue.functions[i];
    out += "\n  Any SAL_CALL " + function.name + "(" + parameters(function) + ") override {\n" +
           body(function, i) + "  }\n";
  }
  return out +
         "\n private:\n  Reference<XComponentContext> context_;\n};\n\n}  // namespace\n\n"
         "extern \"C\" SAL_DLLPUBLIC_EXPORT com::sun::star::uno::XInterface* SAL_CALL\n"
         "busbar_calc_functions(XComponentContext* context, const Sequence<Any>&) {\n"
         "  return cppu::acquire(new Functions(context));\n"
         "}\n";
}

}  // namespace busbar::exporter
