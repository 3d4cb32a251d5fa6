#include "combustion/acid_dew_point.hpp"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <random>

namespace busbar::combustion {
namespace {

TEST(AcidDewPoint, SulfuricCorrelationsStayTogetherInFlueGas) {
  // Over flue gases of oil and coal (8 to 15 per cent of water vapour, 1 to 50 ppm of SO3) the
  // three correlations lie within 7 K of each other.
  std::mt19937_64 random(20261201);
  std::uniform_real_distribution<double> water(8e3, 15e3);
  std::uniform_real_distribution<double> decades(-6, -4.3);
  for (int i = 0; i < 1000; ++i) {
    const double w = water(random);
    const double s = 1e5 * std::pow(10, decades(random));
    const double a = *acid_dew_point(AcidDewPoint::verhoff_banchero, w, s);
    const double b = *acid_dew_point(AcidDewPoint::okkes, w, s);
    const double c = *acid_dew_point(AcidDewPoint::zarenezhad, w, s);
    EXPECT_LT(std::max({a, b, c}) - std::min({a, b, c}), 7) << w << ' ' << s;
  }
}

TEST(AcidDewPoint, RisesWithBothPressures) {
  for (const auto which : {AcidDewPoint::verhoff_banchero, AcidDewPoint::okkes,
                           AcidDewPoint::zarenezhad, AcidDewPoint::kiang_hydrochloric}) {
    EXPECT_GT(*acid_dew_point(which, 1.2e4, 1), *acid_dew_point(which, 1e4, 1));
    EXPECT_GT(*acid_dew_point(which, 1e4, 2), *acid_dew_point(which, 1e4, 1));
  }
}

TEST(AcidDewPoint, RefusesWhatIsNoFlueGas) {
  for (const double bad : {0.0, -1.0, 1e9, std::nan("")}) {
    EXPECT_EQ(acid_dew_point(AcidDewPoint::okkes, bad, 1).failure().argument, 2) << bad;
    EXPECT_EQ(acid_dew_point(AcidDewPoint::okkes, 1e4, bad).failure().argument, 3) << bad;
  }
}

TEST(AcidDewPoint, EveryCorrelationIsFoundByItsName) {
  for (int i = 0; i < static_cast<int>(AcidDewPoint::count_); ++i) {
    const auto which = static_cast<AcidDewPoint>(i);
    EXPECT_EQ(correlation_named(correlation(which).name), which);
  }
  EXPECT_FALSE(correlation_named("Kiang"));
}

}  // namespace
}  // namespace busbar::combustion
