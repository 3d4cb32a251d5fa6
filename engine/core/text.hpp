// Small text helpers that know no locale.
#pragma once

#include <cstddef>
#include <string>
#include <string_view>

namespace busbar {

/// ASCII letters compare without regard to case, all other bytes as they are.
bool equal_ignoring_case(std::string_view a, std::string_view b);

/// Without spaces and tabs at both ends.
std::string_view trimmed(std::string_view text);

/// Appends a number with up to `significant` digits (1 to 15), trailing zeros dropped, a point as
/// decimal sign; plain notation from 1e-4 to 1e15, otherwise with an exponent.
void append_number(std::string& out, double value, int significant);

/// Appends the shortest decimal form that reads back as the same double.
void append_exact(std::string& out, double value);

/// Reads a whole text as a number in the form that append_exact writes; false if anything else
/// stands there. Never reads "nan" or "inf".
bool read_number(std::string_view text, double& value);

/// Length of the longest prefix of at most `limit` bytes that ends at a UTF-8 character boundary.
std::size_t prefix_at_boundary(std::string_view text, std::size_t limit);

/// True when the text is well-formed UTF-8 without control characters.
bool is_printable_utf8(std::string_view text);

/// The beginning of a user's text as a sentence may quote it: at most 60 bytes, "…" where it was
/// cut, and "?" for every byte of a text that is not printable UTF-8.
std::string quotable(std::string_view text);

}  // namespace busbar
