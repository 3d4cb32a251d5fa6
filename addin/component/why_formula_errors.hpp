// The errors that Calc gives while it reads a formula, before anything is computed.
#pragma once

#include <string>

#include "calc_error.hpp"
#include "why_tree.hpp"

namespace busbar::addin {

// What Calc could not read, and what most often is behind it; empty for any other error.
[[nodiscard]] std::string unreadable_in_words(CalcError error);

// Which name Calc does not know, and what most often is behind it.
[[nodiscard]] std::string unknown_name_in_words(const Tokens& tokens, const TokenNumbers& numbers);

}  // namespace busbar::addin
