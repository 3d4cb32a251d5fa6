#include "gas/datum.hpp"

#include <array>
#include <cstddef>

#include "core/text.hpp"

namespace busbar::gas {
namespace {

struct Entry {
  std::string_view name;
  std::array<std::string_view, 8> spellings;
  double zero;
};

constexpr std::array<Entry, static_cast<std::size_t>(Datum::count_)> kEntries{{
    {"formation", {"formation"}, 0},
    {"0 °C", {"0 °C", "0°C", "0 C", "0C", "273.15 K", "273.15K", "32 °F", "32°F"}, 273.15},
    {"15 °C", {"15 °C", "15°C", "15 C", "15C", "288.15 K", "288.15K", "59 °F", "59°F"}, 288.15},
    {"25 °C", {"25 °C", "25°C", "25 C", "25C", "298.15 K", "298.15K", "77 °F", "77°F"}, 298.15},
}};

}  // namespace

std::optional<Datum> datum_named(std::string_view word) {
  word = trimmed(word);
  for (std::size_t i = 0; i < kEntries.size(); ++i) {
    for (const std::string_view spelling : kEntries[i].spellings) {
      if (!spelling.empty() && equal_ignoring_case(word, spelling)) return static_cast<Datum>(i);
    }
  }
  return std::nullopt;
}

std::string_view name_of(Datum datum) { return kEntries[static_cast<std::size_t>(datum)].name; }

double zero_temperature(Datum datum) { return kEntries[static_cast<std::size_t>(datum)].zero; }

}  // namespace busbar::gas
