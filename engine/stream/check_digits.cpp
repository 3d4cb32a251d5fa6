#include "stream/check_digits.hpp"

#define XXH_INLINE_ALL
#include <xxhash.h>

#include <cstdint>

namespace busbar {
namespace {

// Letters and digits that are not mistaken for each other: no i, l, o, u.
constexpr std::string_view kAlphabet = "0123456789abcdefghjkmnpqrstvwxyz";
constexpr unsigned kBits = 5;

}  // namespace

CheckDigits check_digits(std::string_view text) {
  std::uint64_t hash = XXH3_64bits(text.data(), text.size());
  CheckDigits digits;
  for (char& c : digits.characters) {
    c = kAlphabet[hash & ((1U << kBits) - 1U)];
    hash >>= kBits;
  }
  return digits;
}

}  // namespace busbar
