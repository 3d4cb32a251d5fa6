#include "text.hpp"

#include <algorithm>
#include <array>
#include <cstddef>
#include <cstdint>
#include <cstring>
#include <optional>
#include <rtl/string.hxx>

namespace busbar::addin {
namespace {

// A stream cell is nearly all ASCII with a "°" in its middle. The office's converters leave their
// fast path at the first other character, which made up a third of what a stream cell costs; so
// texts of this length and made of U+0000 to U+00FF alone are converted here, eight (four)
// characters at a time, and everything else by the office.
constexpr std::size_t kShort = 512;

constexpr std::uint64_t kNotAsciiBytes = 0x8080808080808080;
constexpr std::uint64_t kNotAsciiUnits = 0xFF80FF80FF80FF80;

template <class T>
std::uint64_t eight_bytes(const T* from) {
  std::uint64_t word = 0;
  std::memcpy(&word, from, sizeof word);
  return word;
}

// The UTF-16 of the text in `out`, or nothing where a character is above U+00FF or malformed.
std::optional<std::size_t> latin_to_utf16(std::string_view text, sal_Unicode* out) {
  const auto* const bytes = reinterpret_cast<const unsigned char*>(text.data());
  std::size_t written = 0;
  for (std::size_t i = 0; i < text.size();) {
    if (i + sizeof(std::uint64_t) <= text.size() &&
        (eight_bytes(bytes + i) & kNotAsciiBytes) == 0) {
      for (std::size_t k = 0; k < sizeof(std::uint64_t); ++k) out[written + k] = bytes[i + k];
      i += sizeof(std::uint64_t);
      written += sizeof(std::uint64_t);
    } else if (bytes[i] < 0x80) {
      out[written++] = bytes[i++];
    } else if ((bytes[i] == 0xC2 || bytes[i] == 0xC3) && i + 1 < text.size() &&
               (bytes[i + 1] & 0xC0U) == 0x80) {
      out[written++] = static_cast<sal_Unicode>((bytes[i] & 0x03U) << 6U | (bytes[i + 1] & 0x3FU));
      i += 2;
    } else {
      return std::nullopt;
    }
  }
  return written;
}

// The UTF-8 of the units in `out`, which has room for two bytes each; nothing where one is above
// U+00FF.
std::optional<std::size_t> latin_to_utf8(const sal_Unicode* units, std::size_t length, char* out) {
  constexpr std::size_t kUnits = sizeof(std::uint64_t) / sizeof(sal_Unicode);
  std::size_t written = 0;
  for (std::size_t i = 0; i < length;) {
    if (i + kUnits <= length && (eight_bytes(units + i) & kNotAsciiUnits) == 0) {
      for (std::size_t k = 0; k < kUnits; ++k) out[written + k] = static_cast<char>(units[i + k]);
      i += kUnits;
      written += kUnits;
      continue;
    }
    const unsigned unit = units[i++];
    if (unit < 0x80) {
      out[written++] = static_cast<char>(unit);
    } else if (unit <= 0xFF) {
      out[written++] = static_cast<char>(0xC0U | unit >> 6U);
      out[written++] = static_cast<char>(0x80U | (unit & 0x3FU));
    } else {
      return std::nullopt;
    }
  }
  return written;
}

}  // namespace

// NOLINTNEXTLINE(cppcoreguidelines-pro-type-member-init): see the declaration of buffer_
Utf8::Utf8(const rtl::OUString& text) {
  const auto length = static_cast<std::size_t>(text.getLength());
  if (length <= kShort) {
    if (const auto bytes = latin_to_utf8(text.getStr(), length, buffer_.data())) {
      view_ = {buffer_.data(), *bytes};
      return;
    }
  }
  const rtl::OString bytes = rtl::OUStringToOString(text, RTL_TEXTENCODING_UTF8);
  long_.assign(bytes.getStr(), static_cast<std::size_t>(bytes.getLength()));
  view_ = long_;
}

void append_utf8(std::string& out, const rtl::OUString& text) { out += Utf8(text).view(); }

std::string to_utf8(const rtl::OUString& text) { return std::string(Utf8(text).view()); }

rtl::OUString to_utf16(std::string_view text) {
  if (text.size() <= kShort) {
    std::array<sal_Unicode, kShort> buffer;  // NOLINT(cppcoreguidelines-pro-type-member-init)
    if (const auto units = latin_to_utf16(text, buffer.data())) {
      return {buffer.data(), static_cast<sal_Int32>(*units)};
    }
  }
  const auto longest = static_cast<std::size_t>(SAL_MAX_INT32 - 1);
  const auto length = static_cast<sal_Int32>(std::min(text.size(), longest));
  return {text.data(), length, RTL_TEXTENCODING_UTF8};
}

}  // namespace busbar::addin
