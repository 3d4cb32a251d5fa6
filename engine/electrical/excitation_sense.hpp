// Whether a machine gives or takes reactive power.
#pragma once

#include <cstdint>
#include <optional>
#include <string_view>

namespace busbar::electrical {

/// Seen from a generator: lagging gives reactive power to the grid (overexcited), leading takes it
/// (underexcited).
enum class Sense : std::uint8_t { lagging, leading };

/// "lagging" or "overexcited", "leading" or "underexcited", capitals or not.
std::optional<Sense> sense_named(std::string_view word);

inline constexpr const char* kUnknownSense =
    "says nothing about reactive power; write \"lagging\" (overexcited, the generator gives it) or "
    "\"leading\" (underexcited, it takes it)";

/// Sine of the phase angle, negative where leading.
double signed_sine(double power_factor, Sense sense);

}  // namespace busbar::electrical
