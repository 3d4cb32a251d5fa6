// Coefficients of the transport equations; the digits are those printed in the releases.
#pragma once

#include <cstddef>

namespace busbar::water::tables {

// IAPWS R12-08, table 1: H_i of equation 11
inline constexpr double kViscosityDilute[] = {1.67752, 2.20462, 0.6366564, -0.241605};

// IAPWS R12-08, table 2: H_ij of equation 12; coefficients that the table leaves out are zero
inline constexpr double kViscosityDense[6][7] = {
    {5.20094E-01, 2.22531E-01, -2.81378E-01, 1.61913E-01, -3.25372E-02, 0, 0},
    {8.50895E-02, 9.99115E-01, -9.06851E-01, 2.57399E-01, 0, 0, 0},
    {-1.08374, 1.88797, -7.72479E-01, 0, 0, 0, 0},
    {-2.89555E-01, 1.26613, -4.89837E-01, 0, 6.98452E-02, 0, -4.35673E-03},
    {0, 0, -2.57040E-01, 0, 0, 8.72102E-03, 0},
    {0, 1.20573E-01, 0, 0, 0, 0, -5.93264E-04},
};

// IAPWS R15-11, table 1: L_k of equation 16
inline constexpr double kConductivityDilute[] = {2.443221E-03, 1.323095E-02, 6.770357E-03,
                                                 -3.454586E-03, 4.096266E-04};

// IAPWS R15-11, table 2: L_ij of equation 17
inline constexpr double kConductivityDense[5][6] = {
    {1.60397357, -0.646013523, 0.111443906, 0.102997357, -0.0504123634, 0.00609859258},
    {2.33771842, -2.78843778, 1.53616167, -0.463045512, 0.0832827019, -0.00719201245},
    {2.19650529, -4.54580785, 3.55777244, -1.40944978, 0.275418278, -0.0205938816},
    {-1.21051378, 1.60812989, -0.621178141, 0.0716373224, 0, 0},
    {-2.7203370, 4.57586331, -3.18369245, 1.1168348, -0.19268305, 0.012913842},
};

// IAPWS R15-11, table 6: A_ij of equation 25; j is the range of the reduced density
inline constexpr double kConductivityReference[6][5] = {
    {6.53786807199516, 6.52717759281799, 5.35500529896124, 1.55225959906681, 1.11999926419994},
    {-5.61149954923348, -6.30816983387575, -3.96415689925446, 0.464621290821181, 0.595748562571649},
    {3.39624167361325, 8.08379285492595, 8.91990208918795, 8.93237374861479, 9.88952565078920},
    {-2.27492629730878, -9.82240510197603, -12.0338729505790, -11.0321960061126, -10.3255051147040},
    {10.2631854662709, 12.1358413791395, 9.19494865194302, 6.16780999933360, 4.66861294457414},
    {1.97815050331519, -5.54349664571295, -2.16866274479712, -0.965458722086812,
     -0.503243546373828},
};

// IAPWS R15-11, equation 25: upper ends of the ranges j = 0 to 3 of the reduced density
inline constexpr double kConductivityRanges[] = {0.310559006, 0.776397516, 1.242236025,
                                                 1.863354037};

/// sum over i of x^i times sum over j of c_ij y^j.
template <std::size_t kRows, std::size_t kColumns>
double double_series(const double (&c)[kRows][kColumns], double x, double y) {
  double sum = 0;
  for (std::size_t i = kRows; i-- > 0;) {
    double inner = 0;
    for (std::size_t j = kColumns; j-- > 0;) inner = inner * y + c[i][j];
    sum = sum * x + inner;
  }
  return sum;
}

}  // namespace busbar::water::tables
