// Circles of references: a cell that needs itself.
#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <vector>

#include "why_document.hpp"

namespace busbar::addin {

// The shortest way from a formula back to itself: the cells in between, in the order in which they
// are read. Nothing when there is none among the first `most` cells that it needs.
[[nodiscard]] std::optional<std::vector<Address>> circle_through(const SheetDocument& document,
                                                                 const Address& start,
                                                                 std::size_t most = 4096);

// What that means and how it is cut, as a sentence about `start`.
[[nodiscard]] std::string circle_in_words(const SheetDocument& document, const Address& start,
                                          const std::vector<Address>& between);

}  // namespace busbar::addin
