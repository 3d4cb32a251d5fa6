// What the exporter writes from the catalogue, one function a file.
#pragma once

#include <map>
#include <string>
#include <vector>

#include "catalogue.hpp"

namespace busbar::exporter {

// The UNO interface busbar.calc.XFunctions: one method a function.
[[nodiscard]] std::string write_idl(const Catalogue& catalogue);

// CalcAddIns.xcu: names and texts for the Function Wizard.
[[nodiscard]] std::string write_registration(const Catalogue& catalogue);

// The C++ source that implements XFunctions by handing each call on with the function's number.
[[nodiscard]] std::string write_glue(const Catalogue& catalogue);

// A page of the help that is written by hand.
struct HelpPage {
  std::string file;  // "working-in-a-sheet.html"
  std::string text;  // its title in a comment, then what stands between head and foot
};

// The pages of the HTML help by file name, below the folder help/. Throws std::runtime_error that
// names a page without a title.
[[nodiscard]] std::map<std::string, std::string> write_help(const Catalogue& catalogue,
                                                            const std::vector<HelpPage>& written);

// The function reference as one Markdown file.
[[nodiscard]] std::string write_reference(const Catalogue& catalogue);

// What an argument takes, in words: "a number", "a stream", "a range of streams"...
[[nodiscard]] std::string kind_in_words(const Argument& argument);

}  // namespace busbar::exporter
