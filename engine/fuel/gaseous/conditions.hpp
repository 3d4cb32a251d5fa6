// Reference conditions of ISO 6976:2016: where the gas is metered and where it burns.
#pragma once

#include <cstddef>

#include "core/outcome.hpp"

namespace busbar::fuel::gaseous {

/// A temperature for which the standard tabulates values, as the column of those tables.
struct Combustion {
  std::size_t column = 0;
};

struct Metering {
  std::size_t column = 0;
  double temperature = 0;  ///< K
  double pressure = 0;     ///< Pa
};

/// Where the standard holds, Pa.
inline constexpr double kLeastPressure = 90e3;
inline constexpr double kGreatestPressure = 110e3;

/// The combustion temperature (input 1, K): 0, 15, 20 or 25 °C or 60 °F, nothing between.
///
/// 60 °F is 288.7056 K; the standard writes it as 15.55 °C, and annex D, example 2, reproduces with
/// the former only. Whatever lies within 0.01 K of it is taken as 60 °F.
Outcome<Combustion> combustion_at(double temperature);

/// The metering conditions (inputs 1 and 2, K and Pa): 0, 15 or 20 °C or 60 °F, 90 to 110 kPa.
Outcome<Metering> metering_at(double temperature, double pressure);

}  // namespace busbar::fuel::gaseous
