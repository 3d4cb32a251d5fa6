#include "catalogue.hpp"

#include <busbar.h>

#include <algorithm>
#include <set>
#include <stdexcept>

namespace busbar::exporter {
namespace {

constexpr std::size_t kLongestRange = 4096;
constexpr std::size_t kMostParameters = 255;  // Calc's own limit for one call

bool is_lower(char c) { return c >= 'a' && c <= 'z'; }
bool is_upper(char c) { return c >= 'A' && c <= 'Z'; }
bool is_digit(char c) { return c >= '0' && c <= '9'; }
char to_lower(char c) { return is_upper(c) ? static_cast<char>(c - 'A' + 'a') : c; }
char to_upper(char c) { return is_lower(c) ? static_cast<char>(c - 'a' + 'A') : c; }

// Words of UNOIDL, of C++20 and names that the generated method body uses, a blank on each side.
constexpr std::string_view kReserved =
    " FALSE alignas alignof and any asm attribute auto bitand bitor bool boolean bound "
    "break byte case catch char class compl concept const constants constexpr constrained "
    "continue decltype default delete do document double else enum exception explicit "
    "export extern false float for friend get given goto hyper if in inline inout int "
    "interface long maybeambiguous maybedefault maybevoid module mutable namespace needs "
    "new noexcept not nullptr observes oneway operator optional or out private property "
    "protected public published raises readonly register removable requires return "
    "sequence service set short signed singleton sizeof static string struct switch "
    "template this throw transient true try type typedef typeid typename union unsigned "
    "using virtual void while ";

[[noreturn]] void refuse(const std::string& function, const std::string& why) {
  throw std::runtime_error("catalogue row " + function + ": " + why);
}

std::string text_of(const busbar_function* function, std::int32_t field) {
  const char* text = busbar_function_text(function, field);
  return text == nullptr ? std::string{} : std::string{text};
}

std::string range_of(const busbar_function* function, std::size_t argument, const char* unit_set) {
  std::string buffer(kLongestRange, '\0');
  const std::size_t length =
      busbar_argument_range(function, argument, unit_set, buffer.data(), buffer.size());
  if (length >= buffer.size()) throw std::runtime_error("an argument's range text is too long");
  buffer.resize(length);
  return buffer;
}

Argument read_argument(const busbar_function* function, std::size_t index) {
  Argument argument;
  const char* name = busbar_argument_text(function, index, BUSBAR_ARGUMENT_NAME);
  const char* meaning = busbar_argument_text(function, index, BUSBAR_ARGUMENT_MEANING);
  argument.name = name == nullptr ? "" : name;
  argument.meaning = meaning == nullptr ? "" : meaning;
  argument.identifier = parameter_identifier(argument.name);
  argument.kind = busbar_argument_kind(function, index);
  argument.optional = busbar_argument_optional(function, index) != 0;
  for (std::size_t set = 0; set < kUnitSets.size(); ++set)
    argument.range[set] = range_of(function, index, kUnitSets[set]);
  return argument;
}

void check_name(const Function& function) {
  const std::string& name = function.name;
  // A name that reads as a cell address (letters, then digits) would be taken for one.
  const auto letters_end = std::find_if_not(name.begin(), name.end(), is_upper);
  const bool address = letters_end - name.begin() <= 3 && letters_end != name.end() &&
                       std::all_of(letters_end, name.end(), is_digit);
  const bool letters = std::all_of(name.begin(), name.end(),
                                   [](char c) { return is_upper(c) || is_digit(c) || c == '_'; });
  if (name.empty() || !is_upper(name.front()) || !letters || address || name.back() == '_' ||
      name.find("__") != std::string::npos)
    refuse(name, "not a name that Calc and UNO both take");
}

void check_arguments(const Function& function) {
  if (function.arguments.size() > kMostParameters) refuse(function.name, "too many arguments");
  std::set<std::string> seen;
  bool optional_before = false;
  for (std::size_t i = 0; i < function.arguments.size(); ++i) {
    const Argument& argument = function.arguments[i];
    if (argument.name.empty() || argument.meaning.empty())
      refuse(function.name, "an argument without a name or a meaning");
    if (argument.identifier.empty() || !seen.insert(argument.identifier).second)
      refuse(function.name, "argument '" + argument.name + "' has no identifier of its own");
    if (optional_before && !argument.optional && argument.kind != BUSBAR_ARGUMENT_REST)
      refuse(function.name, "argument '" + argument.name + "' follows an optional one");
    optional_before = optional_before || argument.optional;
    if (argument.kind == BUSBAR_ARGUMENT_CELL && function.arguments.size() != 1)
      refuse(function.name, "a cell reference must be the only argument");
    if (argument.kind == BUSBAR_ARGUMENT_REST && i + 1 != function.arguments.size())
      refuse(function.name, "further arguments must come last");
  }
}

Function read_function(const busbar_function* handle) {
  Function function;
  function.name = text_of(handle, BUSBAR_FUNCTION_NAME);
  function.chapter = text_of(handle, BUSBAR_FUNCTION_CHAPTER);
  function.summary = text_of(handle, BUSBAR_FUNCTION_SUMMARY);
  function.notes = text_of(handle, BUSBAR_FUNCTION_NOTES);
  function.source = text_of(handle, BUSBAR_FUNCTION_SOURCE);
  function.example = text_of(handle, BUSBAR_FUNCTION_EXAMPLE);
  function.example_given = text_of(handle, BUSBAR_FUNCTION_EXAMPLE_GIVEN);
  function.example_answer = text_of(handle, BUSBAR_FUNCTION_EXAMPLE_ANSWER);
  function.since = text_of(handle, BUSBAR_FUNCTION_SINCE);
  function.result = text_of(handle, BUSBAR_FUNCTION_RESULT);
  const std::size_t count = busbar_argument_count(handle);
  for (std::size_t i = 0; i < count; ++i) function.arguments.push_back(read_argument(handle, i));
  check_name(function);
  if (function.summary.empty()) refuse(function.name, "no summary");
  if (function.chapter.empty()) refuse(function.name, "no chapter");
  if (function.source.empty()) refuse(function.name, "no source");
  check_arguments(function);
  return function;
}

}  // namespace

std::string parameter_identifier(std::string_view argument_name) {
  std::string identifier;
  bool word_starts = false;
  bool first_word = true;
  for (char c : argument_name) {
    if (!is_lower(c) && !is_upper(c) && !is_digit(c)) {
      word_starts = !identifier.empty();
      continue;
    }
    if (word_starts) first_word = false;
    if (first_word)
      identifier += to_lower(c);
    else
      identifier += word_starts ? to_upper(c) : c;
    word_starts = false;
  }
  const bool reserved = kReserved.find(" " + identifier + " ") != std::string_view::npos;
  if (reserved) identifier += "Value";
  if (!identifier.empty() && is_digit(identifier.front())) identifier.insert(0, "argument");
  return identifier;
}

std::string Function::signature() const {
  std::string text = name + "(";
  for (std::size_t i = 0; i < arguments.size(); ++i) {
    if (i != 0) text += "; ";
    std::string shown = arguments[i].name;
    if (arguments[i].kind == BUSBAR_ARGUMENT_REST) shown += "\u2026";
    text += arguments[i].optional ? "[" + shown + "]" : shown;
  }
  return text + ")";
}

bool Function::takes_cell() const {
  return arguments.size() == 1 && arguments.front().kind == BUSBAR_ARGUMENT_CELL;
}

bool Function::takes_rest() const {
  return !arguments.empty() && arguments.back().kind == BUSBAR_ARGUMENT_REST;
}

Catalogue read_catalogue() {
  Catalogue catalogue;
  catalogue.version = busbar_version();
  catalogue.abi_version = busbar_abi_version();
  catalogue.fingerprint = busbar_catalogue_fingerprint();
  if (catalogue.abi_version != BUSBAR_ABI_VERSION)
    throw std::runtime_error("the engine has another interface version than its header");
  std::set<std::string> names;
  const std::size_t count = busbar_function_count();
  if (count == 0) throw std::runtime_error("the catalogue is empty");
  for (std::size_t i = 0; i < count; ++i) {
    Function function = read_function(busbar_function_at(i));
    if (!names.insert(function.name).second) refuse(function.name, "the name is there twice");
    auto chapter = std::find_if(catalogue.chapters.begin(), catalogue.chapters.end(),
                                [&](const Chapter& c) { return c.name == function.chapter; });
    if (chapter == catalogue.chapters.end())
      chapter = catalogue.chapters.insert(chapter, Chapter{function.chapter, {}});
    chapter->functions.push_back(i);
    catalogue.functions.push_back(std::move(function));
  }
  return catalogue;
}

}  // namespace busbar::exporter
