// Density of the gas in a generator, and the windage loss that goes with it.
//
// Windage loss in proportion to gas density at the same speed: common practice, no source. Bearing
// and seal friction does not follow and must be kept apart. Hydrogen with air as its impurity, both
// ideal gases.
#pragma once

namespace busbar::electrical {

/// Hydrogen is refused as a cooling gas below this purity. Mixtures with air burn from 4 to 77 %
/// hydrogen by volume (ISO/TR 15916, from memory); no machine is run near that.
inline constexpr double kLeastPurity = 0.85;

/// Density in kg/m3 at absolute pressure (Pa) and temperature (K); purity is the volume fraction
/// of hydrogen, the rest dry air.
double hydrogen_density(double purity, double pressure, double temperature);

/// Density of dry air likewise.
double air_density(double pressure, double temperature);

}  // namespace busbar::electrical
