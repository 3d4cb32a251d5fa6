#include "fuel/solid/state.hpp"

#include <array>
#include <string>

namespace busbar::fuel::solid {
namespace {

struct Spelling {
  std::string_view letters;
  State state;
};

// Small letters without spaces, hyphens and commas.
constexpr std::array kSpellings{
    Spelling{"asreceived", State::as_received},
    Spelling{"ar", State::as_received},
    Spelling{"airdried", State::air_dried},
    Spelling{"airdry", State::air_dried},
    Spelling{"ad", State::air_dried},
    Spelling{"adb", State::air_dried},
    Spelling{"dry", State::dry},
    Spelling{"d", State::dry},
    Spelling{"db", State::dry},
    Spelling{"dryashfree", State::dry_ash_free},
    Spelling{"daf", State::dry_ash_free},
};

std::string letters_of(std::string_view word) {
  std::string out;
  for (const char c : word) {
    if (c == ' ' || c == '-' || c == ',' || c == '\t') continue;
    out += c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c;
  }
  return out;
}

}  // namespace

std::optional<State> state_named(std::string_view word) {
  constexpr std::size_t kLongest = 40;
  if (word.size() > kLongest) return std::nullopt;
  const std::string letters = letters_of(word);
  for (const Spelling& spelling : kSpellings) {
    if (spelling.letters == letters) return spelling.state;
  }
  return std::nullopt;
}

std::string_view name_of(State state) {
  static constexpr std::array<std::string_view, 4> kNames{"as received", "air-dried", "dry",
                                                          "dry ash-free"};
  return kNames[static_cast<std::size_t>(state)];
}

bool is_moist(State state) { return state == State::as_received || state == State::air_dried; }

}  // namespace busbar::fuel::solid
