// Region 4, saturation line: coefficients of equations 29 to 31.
#pragma once

#include "water/tables/term.hpp"

namespace busbar::water::tables {

// IAPWS R7-97(2012), table 34: n1 to n10
inline constexpr double kRegion4[] = {
    0.11670521452767E+04,  -0.72421316703206E+06, -0.17073846940092E+02, 0.12020824702470E+05,
    -0.32325550322333E+07, 0.14915108613530E+02,  -0.48232657361591E+04, 0.40511340542057E+06,
    -0.23855557567849E+00, 0.65017534844798E+03,
};

}  // namespace busbar::water::tables
