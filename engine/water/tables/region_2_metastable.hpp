// Metastable vapour: coefficients of the basic equation.
#pragma once

#include "water/tables/term.hpp"

namespace busbar::water::tables {

// IAPWS R7-97(2012), table 10 with its footnote: n1 and n2 differ from region 2; ln pi + sum n
// tau^J
inline constexpr Term kMetastableIdeal[] = {
    {0, 0, -0.96937268393049E+01},  {0, 1, 0.10087275970006E+02},   {0, -5, -0.56087911283020E-02},
    {0, -4, 0.71452738081455E-01},  {0, -3, -0.40710498223928E+00}, {0, -2, 0.14240819171444E+01},
    {0, -1, -0.43839511319450E+01}, {0, 2, -0.28408632460772E+00},  {0, 3, 0.21268463753307E-01},
};

// IAPWS R7-97(2012), table 16: residual part sum n pi^I (tau - 0.5)^J, equation 19
inline constexpr Term kMetastableResidual[] = {
    {1, 0, -0.73362260186506E-02},  {1, 2, -0.88223831943146E-01},  {1, 5, -0.72334555213245E-01},
    {1, 11, -0.40813178534455E-02}, {2, 1, 0.20097803380207E-02},   {2, 7, -0.53045921898642E-01},
    {2, 16, -0.76190409086970E-02}, {3, 4, -0.63498037657313E-02},  {3, 16, -0.86043093028588E-01},
    {4, 7, 0.75321581522770E-02},   {4, 10, -0.79238375446139E-02}, {5, 9, -0.22888160778447E-03},
    {5, 10, -0.26456501482810E-02},
};

}  // namespace busbar::water::tables
