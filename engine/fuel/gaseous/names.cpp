#include "fuel/gaseous/names.hpp"

#include <array>
#include <cstdint>

#include "fuel/gaseous/component.hpp"
#include "fuel/gaseous/names_table.hpp"

namespace busbar::fuel::gaseous {
namespace {

// Longer than any name in the table.
constexpr std::size_t kLongest = 32;

struct Folded {
  std::array<char, kLongest> text{};
  std::size_t size = 0;
  bool too_long = false;
  [[nodiscard]] std::string_view view() const { return {text.data(), size}; }
};

// What becomes of a byte: itself, its lower case, or nothing (0).
constexpr std::array<char, 256> kFold = [] {
  std::array<char, 256> fold{};
  for (std::size_t i = 0; i < fold.size(); ++i) fold[i] = static_cast<char>(i);
  for (char c = 'A'; c <= 'Z'; ++c) {
    fold[static_cast<unsigned char>(c)] = static_cast<char>(c - 'A' + 'a');
  }
  for (const char c : {' ', '\t', '-', '_', ',', '.', '(', ')'}) {
    fold[static_cast<unsigned char>(c)] = 0;
  }
  fold[0] = 1;  // no letter of a name
  return fold;
}();

// Lower case, nothing but letters, digits and "+"; subscript digits (U+2080 to U+2089) as digits.
Folded folded(std::string_view name) {
  constexpr std::string_view kSubscript = "\xE2\x82";
  Folded out;
  for (std::size_t i = 0; i < name.size(); ++i) {
    char c = kFold[static_cast<unsigned char>(name[i])];
    if (c == 0) continue;
    if (c == kSubscript.front() && i + 2 < name.size() && name.substr(i, 2) == kSubscript) {
      const int digit = static_cast<unsigned char>(name[i + 2]) - 0x80;
      if (digit >= 0 && digit <= 9) {
        c = static_cast<char>('0' + digit);
        i += 2;
      }
    }
    if (out.size == kLongest) {
      out.too_long = true;
      return out;
    }
    out.text[out.size++] = c;
  }
  return out;
}

// An analysis is looked up component by component in every call: a hash table, filled when this
// file compiles. FNV-1a, 32 bits, folded to the size of the table.
constexpr std::size_t kBuckets = 512;

constexpr std::size_t bucket_of(std::string_view name) {
  std::uint32_t hash = 2166136261U;
  for (const char c : name) hash = (hash ^ static_cast<unsigned char>(c)) * 16777619U;
  return (hash ^ (hash >> 16U)) % kBuckets;
}

consteval std::array<std::uint8_t, kBuckets> fill() {
  static_assert(kSynonyms.size() < 255);
  std::array<std::uint8_t, kBuckets> buckets{};
  for (std::size_t i = 0; i < kSynonyms.size(); ++i) {
    std::size_t at = bucket_of(kSynonyms[i].name);
    while (buckets[at] != 0) {
      if (kSynonyms[buckets[at] - std::size_t{1}].name == kSynonyms[i].name) {
        throw "a synonym stands twice";
      }
      at = (at + 1) % kBuckets;
    }
    buckets[at] = static_cast<std::uint8_t>(i + 1);
  }
  return buckets;
}

constexpr std::array<std::uint8_t, kBuckets> kTable = fill();

}  // namespace

Outcome<std::size_t> component_named(std::string_view name) {
  const Folded key = folded(name);
  if (!key.too_long && key.size > 0) {
    // The table is never full, so that the search ends at an empty bucket.
    for (std::size_t at = bucket_of(key.view()); kTable[at] != 0; at = (at + 1) % kBuckets) {
      const Synonym& synonym = kSynonyms[kTable[at] - std::size_t{1}];
      if (synonym.name == key.view()) return std::size_t{synonym.number} - 1;
    }
    for (const Hint& hint : kHints) {
      if (hint.name == key.view()) return Failure{Fault::unknown_word, 1, hint.reason};
    }
  }
  return Failure{Fault::unknown_word, 1, "is not a component of ISO 6976:2016"};
}

}  // namespace busbar::fuel::gaseous
