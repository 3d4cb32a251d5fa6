#include "why_formula_errors.hpp"

namespace busbar::addin {
namespace {

constexpr const char* kUnits =
    " Units are not typed into formulas: write =STEAM(100; 540), and name the unit set in options.";

// Without the single quotation marks that Calc keeps as part of a name.
std::string bare(const std::string& name) {
  if (name.size() > 2 && name.front() == '\'' && name.back() == '\'')
    return name.substr(1, name.size() - 2);
  return name;
}

}  // namespace

std::string unreadable_in_words(CalcError error) {
  const std::string beginning = "Calc cannot read the formula (" + shown(error) + "): ";
  switch (error) {
    case CalcError::illegal_character:
      return beginning +
             "it holds an illegal character, such as the sign of a unit or a curved quotation "
             "mark." +
             kUnits;
    case CalcError::unpaired:
      return beginning +
             "a parenthesis has no partner, or a number is followed by something that cannot stand "
             "there, such as a unit." +
             kUnits;
    case CalcError::operator_missing:
      return beginning +
             "two parts follow each other without an operator between them, such as a number and a "
             "unit." +
             kUnits;
    case CalcError::operand_missing:
    case CalcError::variable_missing:
      return beginning + "an operator or a parenthesis waits for a value that is not there.";
    default:
      return {};
  }
}

std::string unknown_name_in_words(const Tokens& tokens, const TokenNumbers& numbers) {
  const auto found = unknown_name(tokens, numbers);
  if (found && found->function)
    return "the formula calls a function that Calc does not know (#NAME?): " + found->name +
           ". Its name is misspelt, or the extension that brings it is not installed.";
  if (found)
    return "the formula holds a name that Calc does not know (#NAME?): " + found->name +
           ". A word, such as a unit set or a unit, stands in quotation marks: \"" +
           bare(found->name) + "\".";
  return "the formula holds a name that Calc does not know (#NAME?). A word, such as a unit set or "
         "a unit, stands in quotation marks: \"us\"; a function is unknown while its name is "
         "misspelt or its extension is not installed.";
}

}  // namespace busbar::addin
