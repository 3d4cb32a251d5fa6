// The function reference: one Markdown file, kept in the repository so that a reader of the source
// sees what a cell can call, and a reviewer sees what a change does to it.
#include "../cautions.hpp"
#include "escape.hpp"
#include "writers.hpp"

namespace busbar::exporter {
namespace {

std::string anchor(std::string_view heading) {
  std::string out;
  for (char c : heading) {
    if (c >= 'A' && c <= 'Z')
      out += static_cast<char>(c - 'A' + 'a');
    else if ((c >= 'a' && c <= 'z') || (c >= '0' && c <= '9') || c == '_' || c == '-')
      out += c;
    else if (c == ' ')
      out += '-';
  }
  return out;
}

std::string formula(std::string_view call) {
  std::string out = "=";
  return out += call;
}

std::string ranges(const Argument& argument) {
  if (argument.range[1] == argument.range[0] && argument.range[2] == argument.range[0])
    return markdown_text(argument.range[0]);
  std::string out;
  for (std::size_t set = 0; set < kUnitSets.size(); ++set) {
    if (set != 0) out += "; ";
    out += std::string(kUnitSets[set]) + ": " + markdown_text(argument.range[set]);
  }
  return out;
}

std::string function_section(const Function& function) {
  std::string out = "### ";
  out += markdown_text(function.name) + "\n\n" + markdown_text(function.summary) + "\n\n" +
         markdown_code(formula(function.signature())) + "\n\n";
  if (!function.arguments.empty()) {
    out += "| argument | meaning | takes | unit and range |\n| --- | --- | --- | --- |\n";
    for (const Argument& argument : function.arguments) {
      out.append("| ").append(markdown_text(argument.name));
      if (argument.optional) out += " (optional)";
      out.append(" | ").append(markdown_text(argument.meaning));
      out.append(" | ").append(kind_in_words(argument));
      out.append(" | ").append(ranges(argument)).append(" |\n");
    }
    out += "\n";
  }
  if (!function.result.empty()) out += "Result: " + markdown_text(function.result) + "\n\n";
  if (!function.notes.empty()) out += markdown_text(function.notes) + "\n\n";
  out += "Source: " + markdown_text(function.source) + "\n\n";
  if (!function.example.empty()) {
    out += "Example: " + markdown_code(formula(function.example));
    if (!function.example_given.empty()) out += " with " + markdown_code(function.example_given);
    if (!function.example_answer.empty()) out += " shows " + markdown_code(function.example_answer);
    out += "\n\n";
  }
  if (!function.since.empty()) out += "Since version " + markdown_text(function.since) + ".\n\n";
  return out;
}

}  // namespace

std::string write_reference(const Catalogue& catalogue) {
  std::string out =
      "# Busbar function reference\n\n"
      "Written by `busbar-export` from the engine's catalogue; a test compares the two, so edit "
      "the "
      "catalogue and write this file anew.\n\n" +
      markdown_text(addin::kCautions) +
      "\n\n"
      "The argument `options` names the unit set: `\"metric\"` when it is left out, `\"us\"` or "
      "`\"si\"`. Where an argument takes a number, a stream or a text, a range is taken too and "
      "the "
      "result is the table of results. `=WHY(cell)` says why a cell shows an error, or which "
      "equation and range answered.\n\n";
  for (const Chapter& chapter : catalogue.chapters) {
    out += "- [" + markdown_text(chapter.name) + "](#" + anchor(chapter.name) + "): ";
    for (std::size_t i = 0; i < chapter.functions.size(); ++i) {
      const std::string& name = catalogue.functions[chapter.functions[i]].name;
      out += i == 0 ? "[" : ", [";
      out += markdown_text(name) + "](#" + anchor(name) + ")";
    }
    out += "\n";
  }
  out += "\n";
  for (const Chapter& chapter : catalogue.chapters) {
    out += "## " + markdown_text(chapter.name) + "\n\n";
    for (std::size_t index : chapter.functions) out += function_section(catalogue.functions[index]);
  }
  while (out.size() > 1 && out[out.size() - 2] == '\n') out.pop_back();
  return out;
}

}  // namespace busbar::exporter
