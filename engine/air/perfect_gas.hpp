// Humid air as a perfect gas: the formulas that contracts and hand calculations name.
//
// Source: ASHRAE Handbook Fundamentals 2017, chapter 1, with the vapour pressures of Hyland and
// Wexler, ASHRAE Transactions 89(2A) (1983) 500. All in SI; the humidity ratio is kg of water per
// kg of dry air. Below 0 °C saturation is over ice, as the source has it.
#pragma once

#include "core/outcome.hpp"

namespace busbar::air {

/// Vapour pressure (Pa) over water from 0 to 200 °C, over ice from -100 to 0 °C (K): equations 5
/// and 6. The caller keeps to the range.
double hyland_wexler_pressure(double temperature);

/// W = 0.621945 p_w/(p - p_w) with p_w the relative humidity times the vapour pressure. Failures:
/// impossible, argument 2, where the vapour pressure is not below the pressure of the air.
Outcome<double> perfect_gas_humidity_ratio(double pressure, double temperature,
                                           double relative_humidity);

/// W from the wet bulb t*: ((2501 - 2.326 t*) W_s - 1.006 (t - t*))/(2501 + 1.86 t - 4.186 t*) from
/// 0 °C, ((2830 - 0.24 t*) W_s - 1.006 (t - t*))/(2830 + 1.86 t - 2.1 t*) below, t in °C. Failures:
/// impossible, argument 3: above the dry bulb, or lower than dry air shows; where water boils.
Outcome<double> perfect_gas_humidity_ratio_at_wet_bulb(double pressure, double temperature,
                                                       double wet_bulb);

/// h = 1.006 t + W (2501 + 1.86 t), J per kg of dry air.
double perfect_gas_enthalpy(double temperature, double humidity_ratio);

}  // namespace busbar::air
