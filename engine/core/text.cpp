#include "core/text.hpp"

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>
#include <cstdint>

namespace busbar {
namespace {

// Powers of ten that are exact doubles and leave room for the digits in 64 bits.
constexpr std::array<double, 16> kPowers{1e0, 1e1, 1e2,  1e3,  1e4,  1e5,  1e6,  1e7,
                                         1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15};
constexpr double kLeastPlain = 1e-4;
constexpr int kMostDecimals = 15;
constexpr std::size_t kMostQuoted = 60;

char lower(char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; }

// Number of continuation bytes that must follow a lead byte, and the least code point that may be
// written with them; -1 for a byte that cannot lead.
struct Lead {
  int continuation;
  std::uint32_t least;
  std::uint32_t bits;
};

Lead lead_of(unsigned char byte) {
  if (byte < 0x80) return {0, 0, byte};
  if ((byte & 0xE0U) == 0xC0U) return {1, 0x80, byte & 0x1FU};
  if ((byte & 0xF0U) == 0xE0U) return {2, 0x800, byte & 0x0FU};
  if ((byte & 0xF8U) == 0xF0U) return {3, 0x10000, byte & 0x07U};
  return {-1, 0, 0};
}

}  // namespace

bool equal_ignoring_case(std::string_view a, std::string_view b) {
  return std::equal(a.begin(), a.end(), b.begin(), b.end(),
                    [](char x, char y) { return lower(x) == lower(y); });
}

std::string_view trimmed(std::string_view text) {
  const auto first = text.find_first_not_of(" \t");
  if (first == std::string_view::npos) return {};
  return text.substr(first, text.find_last_not_of(" \t") - first + 1);
}

void append_number(std::string& out, double value, int significant) {
  if (value == 0) {  // also -0, whose sign tells a reader nothing
    out += '0';
    return;
  }
  const double size = std::abs(value);
  if (!(size >= kLeastPlain && size < kPowers.back())) {
    std::array<char, 40> buffer{};
    const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), value,
                                   std::chars_format::general, significant);
    out.append(buffer.data(), end.ptr);
    return;
  }
  // Whole units of the last digit wanted, in an integer: basic operations only, so that every
  // processor writes the same digits, and five times as fast as std::to_chars with a precision.
  int decimals = significant - 1;
  for (std::size_t power = 1; size >= kPowers[power]; ++power) --decimals;
  // The least plain number is 1e-4.
  for (std::size_t power = 1; power <= 4 && size * kPowers[power - 1] < 1; ++power) ++decimals;
  decimals = std::clamp(decimals, 0, kMostDecimals);
  const double scaled = std::floor(size * kPowers[static_cast<std::size_t>(decimals)] + 0.5);
  auto digits = static_cast<std::uint64_t>(scaled);
  while (decimals > 0 && digits % 10 == 0) {
    digits /= 10;
    --decimals;
  }
  std::array<char, 24> buffer{};
  const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), digits);
  const std::string_view text(buffer.data(), static_cast<std::size_t>(end.ptr - buffer.data()));
  if (value < 0) out += '-';
  const auto fraction = static_cast<std::size_t>(decimals);
  if (fraction == 0) {
    out += text;
  } else if (text.size() > fraction) {
    out += text.substr(0, text.size() - fraction);
    out += '.';
    out += text.substr(text.size() - fraction);
  } else {
    out += "0.";
    out.append(fraction - text.size(), '0');
    out += text;
  }
}

void append_exact(std::string& out, double value) {
  std::array<char, 32> buffer{};
  const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), value);
  out.append(buffer.data(), end.ptr);
}

bool read_number(std::string_view text, double& value) {
  if (text.empty() || text.size() > 32) return false;
  const auto end = std::from_chars(text.data(), text.data() + text.size(), value);
  return end.ec == std::errc{} && end.ptr == text.data() + text.size() && std::isfinite(value);
}

std::size_t prefix_at_boundary(std::string_view text, std::size_t limit) {
  if (text.size() <= limit) return text.size();
  while (limit > 0 && (static_cast<unsigned char>(text[limit]) & 0xC0U) == 0x80U) --limit;
  return limit;
}

bool is_printable_utf8(std::string_view text) {
  for (std::size_t i = 0; i < text.size();) {
    const Lead lead = lead_of(static_cast<unsigned char>(text[i]));
    if (lead.continuation < 0) return false;
    const auto following = static_cast<std::size_t>(lead.continuation);
    if (following >= text.size() - i) return false;
    std::uint32_t point = lead.bits;
    for (std::size_t k = 1; k <= following; ++k) {
      const auto byte = static_cast<unsigned char>(text[i + k]);
      if ((byte & 0xC0U) != 0x80U) return false;
      point = (point << 6U) | (byte & 0x3FU);
    }
    const bool control = point < 0x20 || (point >= 0x7F && point < 0xA0);
    const bool surrogate = point >= 0xD800 && point < 0xE000;
    if (control || surrogate || point < lead.least || point > 0x10FFFF) return false;
    i += following + 1;
  }
  return true;
}

std::string quotable(std::string_view text) {
  std::string quote(text.substr(0, prefix_at_boundary(text, kMostQuoted)));
  if (!is_printable_utf8(quote)) {
    for (char& c : quote) {
      if (c < ' ' || c > '~') c = '?';
    }
  }
  if (quote.size() < text.size()) quote += "…";
  return quote;
}

}  // namespace busbar
