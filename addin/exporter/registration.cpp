#include <busbar.h>

#include "escape.hpp"
#include "writers.hpp"

namespace busbar::exporter {
namespace {

std::string localised(const std::string& property, const std::string& text) {
  return "<prop oor:name=\"" + property + "\"><value xml:lang=\"en\">" + markup_text(text) +
         "</value></prop>";
}

std::string ended(std::string text) {
  if (!text.empty() && text.back() != '.' && text.back() != '?' && text.back() != '!') text += '.';
  return text;
}

// The wizard shows this under the field of the argument: the metric set is the default of a call.
std::string argument_help(const Argument& argument) {
  std::string text = ended(argument.meaning);
  if (!argument.range.front().empty()) text += " [" + argument.range.front() + "]";
  // Calc itself calls every argument optional that takes a value or a range alike.
  text += argument.optional ? " Optional." : " Required.";
  return text;
}

}  // namespace

std::string kind_in_words(const Argument& argument) {
  switch (argument.kind) {
    case BUSBAR_ARGUMENT_NUMBER:
      return "number";
    case BUSBAR_ARGUMENT_STREAM:
      return "stream";
    case BUSBAR_ARGUMENT_WORD:
      return "text";
    case BUSBAR_ARGUMENT_NUMBERS:
      return "range of numbers";
    case BUSBAR_ARGUMENT_STREAMS:
      return "range of streams";
    case BUSBAR_ARGUMENT_CELL:
      return "reference to a cell";
    case BUSBAR_ARGUMENT_REST:
      return "any number of further arguments";
    case BUSBAR_ARGUMENT_OPTIONS:
      return "text";
    case BUSBAR_ARGUMENT_COMPOSITION:
      return "composition";
    default:
      return "value";
  }
}

std::string write_registration(const Catalogue& catalogue) {
  std::string out =
      "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
      "<oor:component-data xmlns:oor=\"http://openoffice.org/2001/registry\" "
      "xmlns:xs=\"http://www.w3.org/2001/XMLSchema\" oor:name=\"CalcAddIns\" "
      "oor:package=\"org.openoffice.Office\">\n"
      "<node oor:name=\"AddInInfo\"><node oor:name=\"BUSBAR\" oor:op=\"replace\">"
      "<node oor:name=\"AddInFunctions\">\n";
  for (const Function& function : catalogue.functions) {
    out += "<node oor:name=\"" + function.name + "\" oor:op=\"replace\">\n";
    out += localised("DisplayName", function.name) + "\n";
    out += localised("Description", ended(function.summary)) + "\n";
    // Calc 7.4 knows no categories but its own.
    out += "<prop oor:name=\"Category\"><value>Add-In</value></prop>\n";
    out += localised("CompatibilityName", function.name) + "\n";
    out += "<node oor:name=\"Parameters\">\n";
    for (const Argument& argument : function.arguments)
      out += "<node oor:name=\"" + argument.identifier + "\" oor:op=\"replace\">" +
             localised("DisplayName", argument.name) +
             localised("Description", argument_help(argument)) + "</node>\n";
    out += "</node></node>\n";
  }
  return out + "</node></node></node>\n</oor:component-data>\n";
}

}  // namespace busbar::exporter
