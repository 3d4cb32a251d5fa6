// Region 5, high temperature: coefficients of the basic equation.
#pragma once

#include "water/tables/term.hpp"

namespace busbar::water::tables {

// IAPWS R7-97(2012), table 37: ideal-gas part ln pi + sum n tau^J, equation 33
inline constexpr Term kRegion5Ideal[] = {
    {0, 0, -0.13179983674201E+02}, {0, 1, 0.68540841634434E+01},   {0, -3, -0.24805148933466E-01},
    {0, -2, 0.36901534980333E+00}, {0, -1, -0.31161318213925E+01}, {0, 2, -0.32961626538917E+00},
};

// IAPWS R7-97(2012), table 38: residual part sum n pi^I tau^J, equation 34
inline constexpr Term kRegion5Residual[] = {
    {1, 1, 0.15736404855259E-02}, {1, 2, 0.90153761673944E-03},  {1, 3, -0.50270077677648E-02},
    {2, 3, 0.22440037409485E-05}, {2, 9, -0.41163275453471E-05}, {3, 7, 0.37919454822955E-07},
};

}  // namespace busbar::water::tables
