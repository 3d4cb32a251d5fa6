// Check digits of a stream text.
#pragma once

#include <array>
#include <cstddef>
#include <string_view>

namespace busbar {

inline constexpr std::size_t kCheckDigits = 6;

/// Six characters, 30 bits: one in a thousand million damaged texts passes unnoticed. They guard
/// against slips and cuts, not against forgery.
struct CheckDigits {
  std::array<char, kCheckDigits> characters{};

  [[nodiscard]] std::string_view text() const { return {characters.data(), characters.size()}; }
  friend bool operator==(const CheckDigits& a, std::string_view b) { return a.text() == b; }
};

/// The digits for a text: the low 30 bits of its XXH3 hash of 64 bits, whose value is the same on
/// every processor and in every release of xxHash since 0.8.
CheckDigits check_digits(std::string_view text);

}  // namespace busbar
