// Water in a gas that condenses or freezes out.
//
// The partial pressure of water is compared with its saturation pressure alone: over water by
// IAPWS-IF97, below 0 °C over ice by IAPWS R14-08. What pressure and other gases add to the
// saturation pressure (half a percent in air at 1 bar) and every other vapour (acids, heavy
// hydrocarbons) is left out.
#pragma once

#include "core/outcome.hpp"
#include "gas/mixture.hpp"

namespace busbar::fluid {

/// Saturation pressure of water or, below 273.15 K, of ice, Pa; for 50 K to the critical point.
Outcome<double> water_saturation_pressure(double temperature);

/// The temperature at which water begins to condense, or ice to form, K. Failures: missing (no
/// water in the gas, argument 1), outside_range (partial pressure above the critical one or below
/// that of ice at 50 K, argument 2).
Outcome<double> dew_point(const gas::Mixture& mixture, double pressure);

/// Refuses a gas below its dew point, with the dew point in the reason. Argument 3 (mixture,
/// pressure, temperature).
Failure check_condensation(const gas::Mixture& mixture, double pressure, double temperature);

}  // namespace busbar::fluid
