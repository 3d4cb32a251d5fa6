#include "text.hpp"

#include <algorithm>
#include <cstddef>
#include <cstdint>
#include <rtl/ustrbuf.hxx>

namespace busbar::addin {
namespace {

constexpr std::uint32_t kReplacement = 0xFFFD;

void put(std::string& out, std::uint32_t code) {
  const auto byte = [&](std::uint32_t value) { out += static_cast<char>(value); };
  if (code < 0x80) {
    byte(code);
  } else if (code < 0x800) {
    byte(0xC0 | (code >> 6));
    byte(0x80 | (code & 0x3F));
  } else if (code < 0x10000) {
    byte(0xE0 | (code >> 12));
    byte(0x80 | ((code >> 6) & 0x3F));
    byte(0x80 | (code & 0x3F));
  } else {
    byte(0xF0 | (code >> 18));
    byte(0x80 | ((code >> 12) & 0x3F));
    byte(0x80 | ((code >> 6) & 0x3F));
    byte(0x80 | (code & 0x3F));
  }
}

struct Decoded {
  std::uint32_t code;
  std::size_t length;  // bytes taken
};

// Unicode 15, table 3-7: the second byte's range depends on the first, which excludes overlong
// forms, surrogates and what lies beyond U+10FFFF.
Decoded decode(std::string_view rest) {
  const auto at = [&](std::size_t i) {
    return static_cast<std::uint32_t>(static_cast<unsigned char>(rest[i]));
  };
  const std::uint32_t first = at(0);
  if (first < 0x80) return {first, 1};
  std::size_t length = 0;
  std::uint32_t low = 0x80;
  std::uint32_t high = 0xBF;
  std::uint32_t code = 0;
  if (first >= 0xC2 && first <= 0xDF) {
    length = 2;
    code = first & 0x1F;
  } else if (first >= 0xE0 && first <= 0xEF) {
    length = 3;
    code = first & 0x0F;
    if (first == 0xE0) low = 0xA0;
    if (first == 0xED) high = 0x9F;
  } else if (first >= 0xF0 && first <= 0xF4) {
    length = 4;
    code = first & 0x07;
    if (first == 0xF0) low = 0x90;
    if (first == 0xF4) high = 0x8F;
  } else {
    return {kReplacement, 1};
  }
  for (std::size_t i = 1; i < length; ++i) {
    if (i >= rest.size() || at(i) < low || at(i) > high) return {kReplacement, i};
    code = (code << 6) | (at(i) & 0x3F);
    low = 0x80;
    high = 0xBF;
  }
  return {code, length};
}

bool is_ascii(std::string_view text) {
  return std::all_of(text.begin(), text.end(),
                     [](char c) { return static_cast<unsigned char>(c) < 0x80; });
}

}  // namespace

void append_utf8(std::string& out, const rtl::OUString& text) {
  const sal_Unicode* unit = text.getStr();
  const sal_Unicode* const end = unit + text.getLength();
  out.reserve(out.size() + static_cast<std::size_t>(text.getLength()) + 8);
  while (unit != end) {
    const std::uint32_t code = *unit++;
    if (code < 0x80) {
      out += static_cast<char>(code);
    } else if (code >= 0xD800 && code <= 0xDBFF && unit != end && *unit >= 0xDC00 &&
               *unit <= 0xDFFF) {
      put(out, 0x10000 + ((code - 0xD800) << 10) + (std::uint32_t{*unit++} - 0xDC00));
    } else {
      put(out, code >= 0xD800 && code <= 0xDFFF ? kReplacement : code);
    }
  }
}

std::string to_utf8(const rtl::OUString& text) {
  std::string out;
  append_utf8(out, text);
  return out;
}

rtl::OUString to_utf16(std::string_view text) {
  const auto longest = static_cast<std::size_t>(SAL_MAX_INT32 - 1);
  text = text.substr(0, longest);
  if (is_ascii(text))
    return rtl::OUString(text.data(), static_cast<sal_Int32>(text.size()),
                         RTL_TEXTENCODING_ASCII_US);
  rtl::OUStringBuffer out(static_cast<sal_Int32>(text.size()));
  while (!text.empty()) {
    const Decoded next = decode(text);
    out.appendUtf32(next.code);
    text.remove_prefix(next.length);
  }
  return out.makeStringAndClear();
}

}  // namespace busbar::addin
