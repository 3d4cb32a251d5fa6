// Where the enthalpy of a gas is zero.
#pragma once

#include <cstdint>
#include <optional>
#include <string_view>

namespace busbar::gas {

/// `formation`: the elements at 298.15 K and 1 bar in their stable form are zero, as in the NASA
/// and JANAF tables, so that enthalpies hold the heats of formation. The others: the gas as it is
/// composed, its water as vapour, is zero at that temperature.
enum class Datum : std::uint8_t { formation, at_0, at_15, at_25, count_ };

/// "formation", "0 °C", "15 °C", "25 °C", also without blank or degree sign, or the kelvins
/// 273.15, 288.15, 298.15 with K.
std::optional<Datum> datum_named(std::string_view word);

/// "formation", "0 °C", ...
std::string_view name_of(Datum datum);

/// Temperature at which a gas is zero, K; not for `formation`.
double zero_temperature(Datum datum);

}  // namespace busbar::gas
