// Gross heating value of a natural gas from the table of GPA 2145: a second opinion beside ISO
// 6976, from data that were chosen independently.
#pragma once

#include "fuel/gaseous/mixture.hpp"

namespace busbar::fuel::gaseous {

/// Of the ideal gas, higher, at 60 °F and 14.696 psia, J/m3: sum of mole fraction times table
/// value. GPA Standard 2145, Table of Physical Properties for Hydrocarbons and Other Compounds of
/// Interest to the Natural Gas Industry (columns in US units). Methane to n-decane without
/// neopentane, and gases that do not burn; anything else is refused (input 1, row of the part).
Outcome<double> gpa_heating_value(const Mixture& gas);

}  // namespace busbar::fuel::gaseous
