// The last argument of functions with dimensional values.
#pragma once

#include <optional>
#include <string>
#include <string_view>

#include "core/outcome.hpp"
#include "core/units.hpp"
#include "gas/datum.hpp"

namespace busbar {

struct Options {
  UnitSet units = UnitSet::metric;
  std::optional<gas::Datum> datum;  ///< of the enthalpy of gases
};

/// Reads an options text: words separated by commas or semicolons. A unit set ("metric", "us",
/// "si") may stand in it once; other options are of the form name=value, and a function ignores
/// those that do not concern it, so that one text can serve a whole workbook:
///
///   datum=25 °C   where readers show the enthalpy of a gas as zero (gas/datum.hpp)
///
/// On failure `word` is
/// the text that was not understood.
Outcome<Options> read_options(std::string_view text, std::string& word);

}  // namespace busbar
