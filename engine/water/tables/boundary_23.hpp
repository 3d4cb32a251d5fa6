// Boundary between regions 2 and 3: coefficients of equations 5 and 6.
#pragma once

#include "water/tables/term.hpp"

namespace busbar::water::tables {

// IAPWS R7-97(2012), table 1: n1 to n5
inline constexpr double kBoundary23[] = {
    0.34805185628969E+03, -0.11671859879975E+01, 0.10192970039326E-02,
    0.57254459862746E+03, 0.13918839778870E+02,
};

}  // namespace busbar::water::tables
