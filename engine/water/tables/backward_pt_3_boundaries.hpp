// Region 3: coefficients of the boundaries between the subregions of the backward equations v(p,T).
#pragma once

#include "water/tables/term.hpp"

namespace busbar::water::tables {

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (ln pi)^I, equation 2
inline constexpr Term kBoundary3abPt[] = {
    {-2, 0, 0.918419702359447E+03}, {-1, 0, -0.191887498864292E+04}, {0, 0, 0.154793642129415E+04},
    {1, 0, -0.187661219490113E+03}, {2, 0, 0.213144632222113E+02},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3cd[] = {
    {0, 0, 0.585276966696349E+03},
    {1, 0, 0.278233532206915E+01},
    {2, 0, -0.127283549295878E-01},
    {3, 0, 0.159090746562729E-03},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3gh[] = {
    {0, 0, -0.249284240900418E+05}, {1, 0, 0.428143584791546E+04},  {2, 0, -0.269029173140130E+03},
    {3, 0, 0.751608051114157E+01},  {4, 0, -0.787105249910383E-01},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3ij[] = {
    {0, 0, 0.584814781649163E+03},  {1, 0, -0.616179320924617E+00}, {2, 0, 0.260763050899562E+00},
    {3, 0, -0.587071076864459E-02}, {4, 0, 0.515308185433082E-04},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3jk[] = {
    {0, 0, 0.617229772068439E+03},  {1, 0, -0.770600270141675E+01}, {2, 0, 0.697072596851896E+00},
    {3, 0, -0.157391839848015E-01}, {4, 0, 0.137897492684194E-03},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3mn[] = {
    {0, 0, 0.535339483742384E+03},
    {1, 0, 0.761978122720128E+01},
    {2, 0, -0.158365725441648E+00},
    {3, 0, 0.192871054508108E-02},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (ln pi)^I, equation 2
inline constexpr Term kBoundary3op[] = {
    {-2, 0, -0.152313732937084E+04}, {-1, 0, 0.773845935768222E+03}, {0, 0, 0.969461372400213E+03},
    {1, 0, -0.332500170441278E+03},  {2, 0, 0.642859598466067E+02},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3qu[] = {
    {0, 0, 0.565603648239126E+03},
    {1, 0, 0.529062258221222E+01},
    {2, 0, -0.102020639611016E+00},
    {3, 0, 0.122240301070145E-02},
};

// IAPWS SR5-05(2016), table 1: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3rx[] = {
    {0, 0, 0.584561202520006E+03},
    {1, 0, -0.102961025163669E+01},
    {2, 0, 0.243293362700452E+00},
    {3, 0, -0.294905044740799E-02},
};

// IAPWS SR5-05(2016), table 9: T/1 K = sum n (pi)^I, equation 1
inline constexpr Term kBoundary3uv[] = {
    {0, 0, 0.528199646263062E+03},
    {1, 0, 0.890579602135307E+01},
    {2, 0, -0.222814134903755E+00},
    {3, 0, 0.286791682263697E-02},
};

// IAPWS SR5-05(2016), table 9: T/1 K = sum n (ln pi)^I, equation 2
inline constexpr Term kBoundary3wx[] = {
    {-2, 0, 0.873371668682417E+03}, {-1, 0, 0.329196213998375E+03}, {0, 0, 0.728052609145380E+01},
    {1, 0, 0.973505869861952E+02},  {2, 0, 0.147370491183191E+02},
};

// IAPWS SR5-05(2016), equation 3: the slope dT/dp of the saturation line at the critical point,
// K/MPa
inline constexpr double kBoundary3efSlope = 3.727888004;

}  // namespace busbar::water::tables
