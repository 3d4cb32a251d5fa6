// The same gas at other reference conditions.
#pragma once

#include "fuel/gaseous/properties.hpp"

namespace busbar::fuel::gaseous {

/// Volume at `to` over volume at `from` of the same amount of real gas: Z T/p there over Z T/p
/// here, with the compression factors of ISO 6976:2016 (input 1 where one is too small).
Outcome<double> volume_ratio(const Mixture& gas, const Metering& from, const Metering& to);

/// The same of an ideal gas, whatever it is: T/p over T/p (K, Pa, all above zero).
double ideal_volume_ratio(double from_temperature, double from_pressure, double to_temperature,
                          double to_pressure);

}  // namespace busbar::fuel::gaseous
