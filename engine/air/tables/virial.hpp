// Coefficients of the second and third virial coefficients of humid air.
#pragma once

#include <array>

namespace busbar::air::tables {

/// One term n (T*/T)^t of the limit of a residual Helmholtz energy at zero density.
struct Term {
  double n = 0;
  double t = 0;
};

// Dry air: Lemmon, Jacobsen, Penoncello, Friend, J. Phys. Chem. Ref. Data 29 (2000) 331: residual
// terms 1, 2, 3, 11, 15, 18 (density to the first power) and 4, 11 (second power, the latter from
// its exponential factor). IAPWS G8-10 takes it over.
inline constexpr double kAirReducingTemperature = 132.6312;  // K
inline constexpr double kAirReducingDensity = 10447.7;       // mol/m3
inline constexpr std::array<Term, 6> kAirSecond{{{0.118160747229, 0},
                                                 {0.713116392079, 0.33},
                                                 {-0.161824192067e1, 1.01},
                                                 {-0.101365037912, 1.6},
                                                 {-0.146629609713, 3.6},
                                                 {0.148287891978e-1, 3.5}}};
inline constexpr std::array<Term, 2> kAirThird{{{0.714140178971e-1, 0}, {0.101365037912, 1.6}}};

// Water: IAPWS R6-95(2018), table 2, terms 1, 2, 3, 8, 9, 10, 23 (density to the first power) and
// 4, 5, 8 to 12, 24 to 26 (second power; 8 to 10 from their exponential factor).
inline constexpr double kWaterReducingTemperature = 647.096;  // K
inline constexpr double kWaterReducingMassDensity = 322;      // kg/m3
inline constexpr std::array<Term, 7> kWaterSecond{{{0.12533547935523e-1, -0.5},
                                                   {0.78957634722828e1, 0.875},
                                                   {-0.87803203303561e1, 1},
                                                   {-0.66856572307965, 4},
                                                   {0.20433810950965, 6},
                                                   {-0.66212605039687e-4, 12},
                                                   {-0.10793600908932, 7}}};
inline constexpr std::array<Term, 10> kWaterThird{{{0.31802509345418, 0.5},
                                                   {-0.26145533859358, 0.75},
                                                   {0.66856572307965, 4},
                                                   {-0.20433810950965, 6},
                                                   {0.66212605039687e-4, 12},
                                                   {-0.19232721156002, 1},
                                                   {-0.25709043003438, 5},
                                                   {0.17611491008752e-1, 1},
                                                   {0.22132295167546, 9},
                                                   {-0.40247669763528, 10}}};

// Air with water: IAPWS G11-15, equations for B_aw, C_aaw and C_aww (from Harvey and Huang 2007,
// Hyland and Wexler 1983), in powers of T/100 K; IAPWS G8-10 has them too.
inline constexpr std::array<Term, 3> kCrossSecond{
    {{0.665687e-4, -0.237}, {-0.238834e-3, -1.048}, {-0.176755e-3, -3.183}}};  // m3/mol
inline constexpr std::array<double, 5> kAirAirWater{0.482737e-9, 0.105678e-8, -0.656394e-8,
                                                    0.294442e-7, -0.319317e-7};  // m6/mol2
inline constexpr std::array<double, 4> kAirWaterWater{-0.10728876e2, 0.347802e2, -0.383383e2,
                                                      0.33406e2};
inline constexpr double kAirWaterWaterScale = -1e-6;  // m6/mol2

}  // namespace busbar::air::tables
