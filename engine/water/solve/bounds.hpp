// Enthalpies (J/kg) and entropies (J/(kg K)) beyond which no state of a region or boundary lies,
// whatever the pressure: they spare the evaluation of boundaries that cannot matter. A test holds
// each against the basic equations.
#pragma once

#include "water/solve/given.hpp"

namespace busbar::water {

// Distance (K) from a boundary within which the boundary is evaluated instead of trusting a start.
inline constexpr double kMargin = 0.1;

// The same for a solution: nearer to a boundary than this (K), rounding could decide.
inline constexpr double kCertain = 1e-6;

// Relative error of the equations psat(h) and psat(s) of SR3-03(2014), and the distance above
// 16.529 MPa down to which they are not asked.
inline constexpr double kErrorOfDome3 = 1e-4;
inline constexpr double kEndOfDome3 = 1e-3;

template <Given kGiven>
struct Bounds;

template <>
struct Bounds<Given::enthalpy> {
  static constexpr double kBelowRegion1 = -1e3;
  static constexpr double kAboveRegion1 = 1.68e6;
  static constexpr double kBelowRegion2 = 2.49e6;
  static constexpr double kAboveRegion2 = 4.17e6;
  static constexpr double kAboveDome = 2.81e6;        ///< saturated vapour
  static constexpr double kBelowDome3 = 1.66e6;       ///< saturated liquid of region 3
  static constexpr double kAboveDome3 = 2.57e6;       ///< saturated vapour of region 3
  static constexpr double kBelowBoundary23 = 2.56e6;  ///< region 2 on B23
  static constexpr double kAboveBoundary23 = 2.82e6;
};

template <>
struct Bounds<Given::entropy> {
  static constexpr double kBelowRegion1 = -100;
  static constexpr double kAboveRegion1 = 3.79e3;
  static constexpr double kBelowRegion2 = 5.04e3;
  static constexpr double kAboveRegion2 = 1e300;  ///< there is none: it grows as -ln p
  static constexpr double kAboveDome = 9.16e3;
  static constexpr double kBelowDome3 = 3.77e3;
  static constexpr double kAboveDome3 = 5.22e3;
  static constexpr double kBelowBoundary23 = 5.04e3;
  static constexpr double kAboveBoundary23 = 5.27e3;
};

}  // namespace busbar::water
