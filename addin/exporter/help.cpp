// The HTML help: an index by chapter, one page a function, and the pages written by hand.
#include <busbar.h>

#include <stdexcept>
#include <string_view>

#include "../cautions.hpp"
#include "escape.hpp"
#include "writers.hpp"

namespace busbar::exporter {
namespace {

constexpr const char* kStyle =
    R"(:root { --ink: #22262b; --faint: #646c76; --rule: #d8dce1; --bar: #8a4b14; --wash: #f6f3ee; }
body { margin: 0; color: var(--ink); background: #fff; font: 16px/1.55 "Source Serif 4", Charter, "DejaVu Serif", Georgia, serif; }
header { border-top: 6px solid var(--bar); background: var(--wash); padding: 1.1em 0 0.9em; }
header, main, footer { padding-left: max(1.2rem, calc(50vw - 25rem)); padding-right: max(1.2rem, calc(50vw - 25rem)); }
h1 { font-size: 1.7em; margin: 0.2em 0; letter-spacing: 0.01em; overflow-wrap: anywhere; }
h2 { font-size: 1.1em; margin: 1.9em 0 0.4em; color: var(--bar); }
a { color: #20507c; }
code, pre { font-family: "DejaVu Sans Mono", "Liberation Mono", monospace; font-size: 0.88em; }
pre { font-size: 0.8em; background: var(--wash); border-left: 3px solid var(--bar); padding: 0.6em 0.9em; white-space: pre-wrap; overflow-wrap: anywhere; }
table { border-collapse: collapse; width: 100%; font-size: 0.93em; }
th, td { text-align: left; vertical-align: top; padding: 0.4em 1.1em 0.4em 0; border-bottom: 1px solid var(--rule); }
th { font-weight: 600; color: var(--faint); white-space: nowrap; }
.arguments td:nth-child(4) { min-width: 18em; }
.errors td:first-child { white-space: nowrap; }
dl { display: grid; grid-template-columns: 19em 1fr; gap: 0.25em 1em; }
dt { font-weight: 600; } dd { margin: 0; }
.contents { columns: 3 12em; padding-left: 1.2em; margin: 1em 0; }
.trail { font-size: 0.9em; color: var(--faint); }
footer { margin-top: 3em; padding-top: 1em; padding-bottom: 2em; border-top: 1px solid var(--rule); font-size: 0.9em; color: var(--faint); }
@media (max-width: 45rem) {
  table { display: block; overflow-x: auto; }
  .arguments td:nth-child(4) { min-width: 10em; }
  .errors td:first-child { white-space: normal; }
  dl { display: block; } dd { margin-bottom: 0.6em; }
}
)";

constexpr const char* kErrors =
    "<table class=\"errors\"><tr><th>In the cell</th><th>What happened</th></tr>\n"
    "<tr><td>#N/A</td><td>a value is missing: an empty text, or a blank cell inside a "
    "range</td></tr>\n"
    "<tr><td>#VALUE!</td><td>wrong kind of value, unknown word, ranges that do not fit each other, "
    "a damaged stream text</td></tr>\n"
    "<tr><td>Err:502</td><td>outside the published range, or physically impossible; a single blank "
    "cell reaches the function as 0</td></tr>\n"
    "<tr><td>Err:504</td><td>Calc's own: a range holds an error, or the formula refers straight "
    "into "
    "another file (put that value into a cell of its own first)</td></tr>\n"
    "<tr><td>Err:523</td><td>an iteration found no answer within its cap</td></tr></table>\n";

std::string page(const std::string& title, const std::string& depth, const std::string& trail,
                 const std::string& version, const std::string& content) {
  return "<!DOCTYPE html>\n<html lang=\"en\"><head><meta charset=\"utf-8\">"
         "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<title>" +
         markup_text(title) + "</title><link rel=\"stylesheet\" href=\"" + depth +
         "busbar.css\"></head>\n<body><header><div class=\"trail\">" + trail + "</div><h1>" +
         markup_text(title) + "</h1></header>\n<main>\n" + content + "</main>\n<footer><p>" +
         markup_text(addin::kCautions) + "</p><p>Busbar " + markup_text(version) +
         "</p></footer></body></html>\n";
}

// An empty line in a note begins a paragraph.
std::string paragraphs(const std::string& text) {
  std::string out;
  std::size_t from = 0;
  while (from < text.size()) {
    std::size_t to = text.find("\n\n", from);
    if (to == std::string::npos) to = text.size();
    if (to > from) out += "<p>" + markup_text(text.substr(from, to - from)) + "</p>\n";
    from = to + 2;
  }
  return out;
}

// "metric: bar, 0 to 1000", one line a unit set, or one line where they all say the same.
std::string ranges(const Argument& argument) {
  const bool same =
      argument.range[1] == argument.range[0] && argument.range[2] == argument.range[0];
  if (same) return markup_text(argument.range[0]);
  std::string out;
  for (std::size_t set = 0; set < kUnitSets.size(); ++set) {
    if (set != 0) out += "<br>";
    out += std::string(kUnitSets[set]) + ": " + markup_text(argument.range[set]);
  }
  return out;
}

std::string argument_table(const Function& function) {
  if (function.arguments.empty()) return "<p>This function takes no arguments.</p>\n";
  std::string out =
      "<table class=\"arguments\"><tr><th>Argument</th><th>Meaning</th><th>Takes</th><th>Unit and "
      "range</th></tr>\n";
  for (const Argument& argument : function.arguments) {
    out += "<tr><td>" + markup_text(argument.name) + (argument.optional ? "<br>(optional)" : "") +
           "</td><td>" + markup_text(argument.meaning) + "</td><td>" + kind_in_words(argument) +
           "</td><td>" + ranges(argument) + "</td></tr>\n";
  }
  return out + "</table>\n";
}

std::string function_page(const Catalogue& catalogue, const Function& function) {
  std::string out = "<p>" + markup_text(function.summary) +
                    "</p>\n<pre>=" + markup_text(function.signature()) + "</pre>\n";
  out += "<h2>Arguments</h2>\n" + argument_table(function);
  if (!function.result.empty())
    out += "<h2>Result</h2>\n<p>" + markup_text(function.result) + "</p>\n";
  if (!function.notes.empty()) out += "<h2>Notes</h2>\n" + paragraphs(function.notes);
  out += "<h2>Source</h2>\n<p>" + markup_text(function.source) + "</p>\n";
  if (!function.example.empty()) {
    out += "<h2>Example</h2>\n";
    if (!function.example_given.empty())
      out += "<p>With these cells: <code>" + markup_text(function.example_given) + "</code></p>\n";
    out += "<pre>=" + markup_text(function.example) + "</pre>\n";
    if (!function.example_answer.empty())
      out += "<p>The cell shows <code>" + markup_text(function.example_answer) + "</code></p>\n";
  }
  out +=
      "<h2>Errors</h2>\n<p>When a cell shows an error, <code>=WHY(cell)</code> says in a sentence "
      "what failed in it. More on errors, blanks, ranges and circles: <a "
      "href=\"../working-in-a-sheet.html\">Working in a sheet</a>.</p>\n";
  out += kErrors;
  if (!function.since.empty())
    out += "<p class=\"trail\">Since version " + markup_text(function.since) + ".</p>\n";
  return page(function.name, "../",
              "<a href=\"../index.html\">Busbar functions</a> \u203a <a href=\"../index.html#" +
                  markup_text(parameter_identifier(function.chapter)) + "\">" +
                  markup_text(function.chapter) + "</a>",
              catalogue.version, out);
}

// The title in the comment that a page written by hand begins with.
std::string title_of(const HelpPage& written) {
  constexpr std::string_view kBegin = "<!-- ";
  constexpr std::string_view kEnd = " -->";
  const std::size_t end = written.text.find(kEnd);
  if (written.text.substr(0, kBegin.size()) != kBegin || end == std::string::npos)
    throw std::runtime_error(written.file + " does not begin with its title in a comment");
  return written.text.substr(kBegin.size(), end - kBegin.size());
}

// The text behind the comments, with the table of errors where it belongs.
std::string content_of(const HelpPage& written) {
  constexpr std::string_view kTable = "{{errors}}\n";
  std::string text = written.text;
  while (text.substr(0, 4) == "<!--") {
    const std::size_t end = text.find("-->");
    if (end == std::string::npos) throw std::runtime_error(written.file + ": a comment has no end");
    text.erase(0, text.find_first_not_of(" \n", end + 3));
  }
  const std::size_t at = text.find(kTable);
  return at == std::string::npos ? text : text.replace(at, kTable.size(), kErrors);
}

std::string written_page(const Catalogue& catalogue, const HelpPage& written) {
  return page(title_of(written), "", "<a href=\"index.html\">Busbar functions</a>",
              catalogue.version, content_of(written));
}

std::string index_page(const Catalogue& catalogue, const std::vector<HelpPage>& written) {
  std::string out =
      "<p>Each function names its published source, takes a range where it takes a value (enter it "
      "as an array formula), and answers with a number that is right or with an error that has a "
      "reason: <code>=WHY(B7)</code> says what happened in B7.</p>\n"
      "<p>The last argument <code>options</code> names the unit set of a call: "
      "<code>\"metric\"</code> "
      "(when it is left out: bar, \u00b0C, kJ/kg, kg/s, MW, m\u00b3), <code>\"us\"</code> (psia, "
      "\u00b0F, Btu/lb, lb/h, MW, ft\u00b3) or <code>\"si\"</code> (Pa, K, J/kg, kg/s, W, m\u00b3)."
      "</p>\n<p>Pressures are absolute. A value in another file must stand in a cell of its own "
      "before a function can take it.</p>\n";
  for (const HelpPage& one : written)
    out.append("<p><a href=\"")
        .append(markup_text(one.file))
        .append("\">")
        .append(markup_text(title_of(one)))
        .append("</a>: streams, units, errors, blanks, ranges, other files, circles.</p>\n");
  for (const Chapter& chapter : catalogue.chapters) {
    out += "<h2 id=\"" + markup_text(parameter_identifier(chapter.name)) + "\">" +
           markup_text(chapter.name) + "</h2>\n<dl>\n";
    for (std::size_t index : chapter.functions) {
      const Function& function = catalogue.functions[index];
      out += "<dt><a href=\"functions/" + function.name + ".html\"><code>" + function.name +
             "</code></a></dt><dd>" + markup_text(function.summary) + "</dd>\n";
    }
    out += "</dl>\n";
  }
  return page("Busbar functions", "", "Thermal electricity generation, checked in the spreadsheet",
              catalogue.version, out);
}

}  // namespace

std::map<std::string, std::string> write_help(const Catalogue& catalogue,
                                              const std::vector<HelpPage>& written) {
  std::map<std::string, std::string> pages;
  pages["busbar.css"] = kStyle;
  pages["index.html"] = index_page(catalogue, written);
  for (const HelpPage& one : written) pages[one.file] = written_page(catalogue, one);
  for (const Function& function : catalogue.functions)
    pages["functions/" + function.name + ".html"] = function_page(catalogue, function);
  return pages;
}

}  // namespace busbar::exporter
