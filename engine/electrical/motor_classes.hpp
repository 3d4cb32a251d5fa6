// Least efficiencies of the classes IE1 to IE4: IEC 60034-30-1.
#pragma once

#include <cstddef>
#include <optional>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::electrical {

/// Rated powers of the classes, W.
inline constexpr double kLeastClassPower = 750;
inline constexpr double kMostClassPower = 1000e3;

/// "IE1" to "IE4" as 0 to 3, capitals or not.
std::optional<std::size_t> efficiency_class_named(std::string_view word);

/// Least nominal efficiency at rated load of a class (0 to 3), rated power in W (input 2), poles
/// (input 3), grid frequency in Hz (input 4). The table of 4 poles at 50 Hz is carried; between
/// its powers the standard's polynomial, rounded to 0.1 % as the standard has it. Out of range:
/// other poles and frequencies, and IE4 between the powers.
Outcome<double> class_efficiency(std::size_t efficiency_class, double rated_power, double poles,
                                 double frequency);

}  // namespace busbar::electrical
