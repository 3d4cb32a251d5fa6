// IAPWS R10-06(2009), table 2: coefficients of the Gibbs energy of ice Ih, and the residual entropy
// that fits IAPWS-95. In SI; complex numbers as pairs.
#pragma once

#include <array>
#include <complex>

namespace busbar::water::tables {

inline constexpr std::array<double, 5> kIceG0{-0.632020233335886e6, 0.655022213658955,
                                              -0.189369929326131e-7, 0.339746123271053e-14,
                                              -0.556464869058991e-21};
inline constexpr double kIceS0 = -0.332733756492168e4;
inline constexpr std::complex<double> kIceT1{0.368017112855051e-1, 0.510878114959572e-1};
inline constexpr std::complex<double> kIceR1{0.447050716285388e2, 0.656876847463481e2};
inline constexpr std::complex<double> kIceT2{0.337315741065416, 0.335449415919309};
inline constexpr std::array<std::complex<double>, 3> kIceR2{
    {{-0.725974574329220e2, -0.781008427112870e2},
     {-0.557107698030123e-4, 0.464578634580806e-4},
     {0.234801409215913e-10, -0.285651142904972e-10}}};

}  // namespace busbar::water::tables
