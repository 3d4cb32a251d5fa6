// The bases on which analyses of solid and liquid fuels are stated.
#pragma once

#include <cstdint>
#include <optional>
#include <string_view>

namespace busbar::fuel::solid {

/// What the shares are shares of. Called "basis" by ISO 1170 and ISO 16993; called state here,
/// because a basis is also the heating value that energy is counted on (fuel/basis.hpp).
enum class State : std::uint8_t { as_received, air_dried, dry, dry_ash_free };

/// "as received" or "ar", "air-dried" or "ad", "dry" or "d" or "db", "dry ash-free" or "daf";
/// capitals, hyphens and commas do not count. nullopt for any other word.
std::optional<State> state_named(std::string_view word);

/// The words that a user reads, such as "as received".
std::string_view name_of(State state);

/// True where the fuel holds moisture: as received and air-dried.
bool is_moist(State state);

/// The sentence about a word that names no state.
inline constexpr const char* kUnknownState =
    "is not a basis of a fuel analysis; write \"as received\", \"air-dried\", \"dry\" or \"dry "
    "ash-free\" (or ar, ad, d, daf)";

}  // namespace busbar::fuel::solid
