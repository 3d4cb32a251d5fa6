// Measures of humidity: relative humidity, dew point and wet bulb, to and from the humidity ratio.
//
// All in SI; the humidity ratio is kg of water per kg of dry air. Pressures up to 5 MPa,
// temperatures from 193.15 to 473.15 K: the caller keeps to them. Failures count the inputs from 1
// in the order of the parameters.
#pragma once

#include "air/saturation.hpp"
#include "core/outcome.hpp"

namespace busbar::air {

/// Relative humidity is the mole fraction of water over that of saturated air at the same pressure
/// and temperature (ASHRAE Fundamentals 2017, chapter 1, equation 12).
Outcome<double> humidity_ratio_at_relative_humidity(double pressure, double temperature,
                                                    double relative_humidity, BelowFreezing below);
Outcome<double> relative_humidity(double pressure, double temperature, double humidity_ratio,
                                  BelowFreezing below);

/// The temperature at which air of this humidity is saturated at its pressure. Below 0 °C over ice
/// (frost point) or over supercooled water (dew point proper), as `below` says. Where the air is
/// too dry for liquid and too moist for ice, which happens within 0.01 K, it is 0 °C.
Outcome<double> humidity_ratio_at_dew_point(double pressure, double dew_point, BelowFreezing below);
Outcome<double> dew_point(double pressure, double humidity_ratio, BelowFreezing below);

/// Thermodynamic wet bulb, the temperature of adiabatic saturation at constant pressure:
/// h + (W_s - W) h_condensate = h_s (ASHRAE Fundamentals 2017, chapter 1, equation 31), with the
/// enthalpy of liquid water by IAPWS-IF97 from 0 °C and of ice by IAPWS R10-06 below. Air whose wet
/// bulb over water is 0 °C or more may have another over ice, below 0 °C: the one over water is
/// given.
Outcome<double> humidity_ratio_at_wet_bulb(double pressure, double temperature, double wet_bulb);
Outcome<double> wet_bulb(double pressure, double temperature, double humidity_ratio);

/// Nothing when air of this humidity can exist as a gas: saturated over liquid water at the most,
/// below 0 °C supercooled, or over the phase that is named, with the 3e-4 by which published models
/// differ. Else the failure `impossible`, argument 3.
Failure not_above_saturation(const Place& at, double humidity_ratio);
Failure not_above_saturation(const Place& at, double humidity_ratio, Condensate phase);

}  // namespace busbar::air
