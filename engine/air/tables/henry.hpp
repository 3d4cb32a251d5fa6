// IAPWS G7-04, Guideline on the Henry's Constant and Vapor-Liquid Distribution Constant for Gases
// in H2O: coefficients A, B, C of nitrogen, oxygen and argon in water.
#pragma once

#include <array>

namespace busbar::air::tables {

struct Gas {
  double share = 0;  ///< mole fraction in dry air (Lemmon et al. 2000, as in ASHRAE RP-1485)
  double a = 0;
  double b = 0;
  double c = 0;
};

inline constexpr std::array<Gas, 3> kDissolved{{{0.7812, -9.67578, 4.72162, 11.70585},
                                                {0.2096, -9.44833, 4.43822, 11.42005},
                                                {0.0092, -8.40954, 4.29587, 10.52779}}};

}  // namespace busbar::air::tables
