#include "escape.hpp"

namespace busbar::exporter {

std::string markup_text(std::string_view text) {
  std::string out;
  out.reserve(text.size() + text.size() / 8);
  for (char c : text) {
    switch (c) {
      case '&':
        out += "&amp;";
        break;
      case '<':
        out += "&lt;";
        break;
      case '>':
        out += "&gt;";
        break;
      case '"':
        out += "&quot;";
        break;
      case '\'':
        out += "&#39;";
        break;
      default: {
        const auto byte = static_cast<unsigned char>(c);
        if (byte >= 0x20 || c == '\n' || c == '\t') out += c;
      }
    }
  }
  return out;
}

std::string markdown_text(std::string_view text) {
  constexpr std::string_view kSpecial = "\\`*_{}[]<>#|~";
  std::string out;
  for (char c : text) {
    if (c == '\n' || c == '\r' || c == '\t') {
      out += ' ';
      continue;
    }
    if (kSpecial.find(c) != std::string_view::npos) out += '\\';
    out += c;
  }
  return out;
}

std::string markdown_code(std::string_view text, bool in_table) {
  std::size_t longest = 0;
  std::size_t run = 0;
  std::string body;
  for (char c : text) {
    run = c == '`' ? run + 1 : 0;
    longest = run > longest ? run : longest;
    if (c == '|' && in_table) body += '\\';
    body += c == '\n' ? ' ' : c;
  }
  const std::string fence(longest + 1, '`');
  const bool pad = !body.empty() && (body.front() == '`' || body.back() == '`');
  return fence + (pad ? " " : "") + body + (pad ? " " : "") + fence;
}

std::string cpp_literal(std::string_view text) {
  std::string out = "\"";
  for (char c : text) {
    const auto byte = static_cast<unsigned char>(c);
    if (c == '"' || c == '\\') {
      out += '\\';
      out += c;
    } else if (byte < 0x20 || byte >= 0x7f) {
      // Three octal digits end by themselves, unlike hexadecimal escapes.
      out += '\\';
      out += static_cast<char>('0' + (byte >> 6));
      out += static_cast<char>('0' + ((byte >> 3) & 7));
      out += static_cast<char>('0' + (byte & 7));
    } else {
      out += c;
    }
  }
  return out + "\"";
}

}  // namespace busbar::exporter
