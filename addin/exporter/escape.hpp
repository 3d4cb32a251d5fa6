// Quoting of catalogue texts for the languages that the exporter writes.
#pragma once

#include <string>
#include <string_view>

namespace busbar::exporter {

// For the text and the attributes of XML and HTML. Control characters, which XML forbids, go.
[[nodiscard]] std::string markup_text(std::string_view text);

// For running text of Markdown; line breaks become spaces.
[[nodiscard]] std::string markdown_text(std::string_view text);

// For an inline code span of Markdown, fence included; `in_table` also guards the column sign.
[[nodiscard]] std::string markdown_code(std::string_view text, bool in_table = false);

// For a C++ string literal, quotes included; bytes outside ASCII become octal escapes.
[[nodiscard]] std::string cpp_literal(std::string_view text);

}  // namespace busbar::exporter
