// Sentences about failures and arguments, in the caller's units.
#pragma once

#include <string>

#include "catalogue/row.hpp"
#include "catalogue/value.hpp"

namespace busbar {

/// "TURBINE_OUT: outlet pressure 120 bar is above ..."
std::string sentence(const Problem& problem);

/// Name and meaning of the options argument, which every row with units shares.
const Argument& options_argument();

/// Unit and allowed range of an argument, such as "°C, 0 to 2000"; "" where there is none.
std::string describe_range(const Row& row, std::size_t argument, UnitSet units);

/// Document, edition and place of a row's source as one text.
std::string source_text(const Row& row);

/// A number with its unit, six digits.
void append_measure(std::string& out, Measure measure, UnitSet units);

}  // namespace busbar
