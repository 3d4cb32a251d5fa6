// Basic equation of metastable vapour: IAPWS R7-97(2012), equations 18 and 19.
#pragma once

#include "water/equations/gibbs.hpp"
#include "water/tables/region_2_metastable.hpp"

namespace busbar::water {

struct MetastableEquation {
  static constexpr double kReducingPressure = 1e6;     ///< Pa
  static constexpr double kReducingTemperature = 540;  ///< K
  static constexpr bool kHasLogarithm = true;

  template <unsigned kSet, class Real>
  static Gibbs<Real> at(Real pi, Real tau) {
    return gibbs_detail::vapour<tables::kMetastableIdeal, tables::kMetastableResidual, kSet>(
        pi, tau, 0.5);
  }
};

}  // namespace busbar::water
