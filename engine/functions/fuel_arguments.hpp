// Arguments that the chapter on solid and liquid fuels shares.
#pragma once

#include <cstdint>
#include <optional>

#include "catalogue/row.hpp"
#include "fuel/solid/state.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {

inline std::optional<double> si_of(std::optional<Fraction> fraction) {
  return fraction ? std::optional<double>(fraction->si) : std::nullopt;
}

inline Outcome<fuel::solid::State> fuel_state_of(Word word, std::uint8_t argument) {
  const auto state = fuel::solid::state_named(word);
  if (!state) return Failure{Fault::unknown_word, argument, fuel::solid::kUnknownState};
  return *state;
}

inline constexpr const char* kSolidFuels = "Solid and liquid fuels";
inline constexpr double kMostFuelMoisture = 0.99;

inline constexpr Argument kAnalysisArgument{
    "analysis",
    "Two columns with parts (C, H, O, N, S, Cl, ash, moisture, volatile matter, fixed carbon) and "
    "shares under a heading such as \"mass % as received\", \"mass % dry\" or \"mass % daf\"; or a "
    "text such as \"mass % dry: C 75.5, H 4.83, ...\". Hydrogen and oxygen without those of the "
    "moisture, else named \"H including moisture\""};
constexpr const char* kBasisWords =
    "\"as received\", \"air-dried\", \"dry\" or \"dry ash-free\" (ar, ad, d, daf)";
inline constexpr const char* kFuelBasisWords =
    "\"as received\", \"air-dried\", \"dry\" or \"dry ash-free\" (ar, ad, d, daf)";
inline constexpr Argument kWantedMoistureArgument{
    "moisture", "Of the wanted basis, fraction of moist mass, where the analysis does not hold it",
    0, kMostFuelMoisture};

}  // namespace busbar::functions
