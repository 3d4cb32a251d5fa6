// The last argument of functions with dimensional values.
#pragma once

#include <string>
#include <string_view>

#include "core/outcome.hpp"
#include "core/units.hpp"

namespace busbar {

struct Options {
  UnitSet units = UnitSet::metric;
};

/// Reads an options text: words separated by commas or semicolons. A unit set ("metric", "us",
/// "si") may stand in it once; other options will be of the form name=value. On failure `word` is
/// the text that was not understood.
Outcome<Options> read_options(std::string_view text, std::string& word);

}  // namespace busbar
