// How much water air can hold: over liquid water, over ice, over supercooled water.
#pragma once

#include <cstdint>

#include "air/mixture.hpp"
#include "core/outcome.hpp"

namespace busbar::air {

/// The condensed phase that saturated air is in equilibrium with.
enum class Condensate : std::uint8_t { water, ice, supercooled };

/// Which one is meant below 0 °C: engineers mostly mean ice, weather services water. There is no
/// default: at -20 °C the two differ by a fifth.
enum class BelowFreezing : std::uint8_t { unsaid, ice, water };

/// Liquid water from 0 °C, below it what the caller says. Failures: missing, argument 1, when
/// nothing was said and it matters.
Outcome<Condensate> condensate_at(double temperature, BelowFreezing below);

/// Vapour pressure (Pa) of the pure phase at temperature (K): water by IAPWS R7-97(2012), equation
/// 30; ice by IAPWS R14-08(2011), equation 6; supercooled water by Murphy and Koop. Within the
/// range of each; NaN outside.
double vapour_pressure(double temperature, Condensate phase);

/// Vapour pressure (Pa) of supercooled water at temperature (K), 123 to 332 K. Source: D. M. Murphy
/// and T. Koop, Quarterly Journal of the Royal Meteorological Society 131 (2005) 1539, equation 10.
double supercooled_vapour_pressure(double temperature);

/// Air saturated with water.
struct Saturation {
  double vapour_pressure = 0;  ///< of the pure phase, Pa
  double mole_fraction = 0;    ///< of water in the air
  double enhancement = 1;      ///< mole_fraction times pressure over vapour_pressure
};

/// Saturated air at a place: the fugacity of water in the air (G11-15) equals that in the condensed
/// phase, which the air compresses (Poynting) and in which it dissolves (Henry, IAPWS G7-04).
/// Method: Herrmann, Kretzschmar and Gatley, ASHRAE RP-1485 (2009). Agreement with the equation:
/// 1e-14. Failures: impossible, argument 2, where the phase boils (or sublimes) at this pressure;
/// no_convergence.
Outcome<Saturation> saturation(const Place& at, Condensate phase);

/// Temperature (K) at which air with mole fraction x of water is saturated over the phase, between
/// `low` and `high`; nothing outside. Failures, argument 2: outside_range, no_convergence.
Outcome<double> saturation_temperature(double pressure, double x, Condensate phase, double low,
                                       double high);

/// Temperature (K) at which pure water boils or, below 611.2 Pa, ice sublimes: saturated air exists
/// below it. Not below 193.15 K.
double boiling_temperature(double pressure);

}  // namespace busbar::air
