// Resistance of windings at a stated temperature, and the I2R losses with it.
#pragma once

#include <cstdint>
#include <optional>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::electrical {

/// Windings that a correction is for, in K: between the coldest hall and the hottest class with a
/// wide margin. Far below, the straight line of resistance over temperature no longer holds.
inline constexpr double kColdestWinding = 223.15;
inline constexpr double kHottestWinding = 573.15;

enum class Conductor : std::uint8_t { copper, aluminium };

/// "copper" or "aluminium" ("aluminum"), capitals or not.
std::optional<Conductor> conductor_named(std::string_view word);

inline constexpr const char* kUnknownConductor =
    "is not a conductor of this correction; write \"copper\" or \"aluminium\"";

/// (k + t2) / (k + t1) with k = 235 for copper and 225 for aluminium, temperatures in °C there and
/// in K here: IEC 60034-1 and IEC 60034-2-1, temperature correction of resistances.
double resistance_ratio(double from, double to, Conductor conductor);

/// Temperature (K) of a winding from its resistance cold and hot: IEC 60034-1, resistance method.
/// Outside kColdestWinding to kHottestWinding it is
/// impossible (input 3).
Outcome<double> temperature_from_resistance(double cold_resistance, double cold_temperature,
                                            double hot_resistance, Conductor conductor);

/// 1.5 I^2 R in W with the resistance between two line terminals, whether star or delta, measured
/// at `measured_at` and corrected to `stated` (K): IEC 60034-2-1, stator winding loss.
double stator_copper_loss(double line_current, double line_resistance, double measured_at,
                          double stated);

/// I^2 R in W of the field winding, corrected likewise: IEC 60034-2-1, excitation winding loss.
double field_copper_loss(double field_current, double resistance, double measured_at,
                         double stated);

/// Reference temperature (K) of IEC 60034-2-1 for a thermal class, "B" or "130", "F" or "155".
std::optional<double> reference_temperature(std::string_view thermal_class);

}  // namespace busbar::electrical
