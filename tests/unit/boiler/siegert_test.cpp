#include "boiler/siegert.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>

namespace busbar::boiler {
namespace {

constexpr double kNone = std::numeric_limits<double>::quiet_NaN();

TEST(Siegert, IsContinuousAndRisesWithTheWaterContent) {
  double before = 0;
  for (int i = 0; i <= 500; ++i) {
    const Outcome<double> loss = siegert_loss("biomass", 453.15, 293.15, 0.08, i / 1000.0);
    ASSERT_TRUE(loss) << i;
    EXPECT_GT(*loss, before);
    EXPECT_TRUE(i == 0 || *loss - before < 2e-4) << i;
    before = *loss;
  }
}

TEST(Siegert, MeetsEveryPrintedRow) {
  for (const SiegertCoefficients& row : siegert_table()) {
    if (row.oxygen == 0) continue;
    const double moisture = row.moisture < 0 ? kNone : row.moisture;
    const Outcome<double> loss = siegert_loss(row.fuel, 400, 300, 0.05, moisture);
    ASSERT_TRUE(loss) << row.fuel;
    EXPECT_NEAR(*loss, row.oxygen / 16 + row.constant, 1e-14) << row.fuel;
  }
}

TEST(Siegert, OxygenAndCarbonDioxideAgreeAtStoichiometricGas) {
  // Both forms of one fuel describe the same gas: CO2 = CO2max (21 - O2)/21, so that A1 and A2
  // belong together by CO2max = 21 A1/A2, for natural gas 11.8 per cent (handbooks: 11.7 to 12.2).
  const double most = 21 * 0.37 / 0.66 / 100;
  for (const double oxygen : {0.0, 0.03, 0.1}) {
    const Outcome<double> a = siegert_loss("natural gas", 433.15, 293.15, oxygen, kNone);
    const Outcome<double> b = siegert_loss_by_carbon_dioxide("natural gas", 433.15, 293.15,
                                                             most * (0.21 - oxygen) / 0.21);
    ASSERT_TRUE(a && b);
    EXPECT_NEAR(*a, *b, 1e-12);
  }
}

TEST(Siegert, RefusesWhatItCannotKnow) {
  EXPECT_EQ(siegert_loss("peat", 433, 293, 0.03, kNone).failure().argument, 1);
  EXPECT_EQ(siegert_loss("biomass", 433, 293, 0.03, kNone).failure().fault, Fault::missing);
  EXPECT_EQ(siegert_loss("propane", 433, 293, 0.03, 0.1).failure().fault, Fault::outside_range);
  EXPECT_EQ(siegert_loss("biomass", 433, 293, 0.03, 0.51).failure().fault, Fault::outside_range);
  EXPECT_EQ(siegert_loss("propane", 283, 293, 0.03, kNone).failure().argument, 2);
  EXPECT_EQ(siegert_loss("hard coal, simple", 433, 293, 0.03, kNone).failure().argument, 1);
  EXPECT_EQ(siegert_loss_by_carbon_dioxide("natural gas", 1273, 293, 1e-6).failure().fault,
            Fault::impossible);
}

}  // namespace
}  // namespace busbar::boiler
