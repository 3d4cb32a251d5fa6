// Analyses on other bases: there and back, and what stays.
#include "fuel/solid/conversion.hpp"

#include <gtest/gtest.h>

#include "measured_fuels.hpp"
#include "random.hpp"

namespace busbar::fuel::solid {
namespace {

void expect_same(const Analysis& a, const Analysis& b) {
  EXPECT_EQ(a.state, b.state);
  for (std::size_t i = 0; i < kParts; ++i) EXPECT_NEAR(a.share[i], b.share[i], 1e-12);
}

TEST(Conversion, ComesBackToTheSameAnalysis) {
  support::Random random(91);
  for (const auto& fuel : sample::kMeasuredFuels) {
    const Analysis dry = *sample::analysis_of(fuel);
    const double moisture = random.uniform(0, 0.7);
    const double ash = dry[Part::ash];
    for (const State moist : {State::as_received, State::air_dried}) {
      const Outcome<Analysis> wet = in_state(dry, moist, {moisture, {}});
      ASSERT_TRUE(wet);
      EXPECT_NEAR(ultimate_sum(*wet), 1 + (ultimate_sum(dry) - 1) * (1 - moisture), 1e-14);
      expect_same(*in_state(*wet, State::dry, {}), dry);
      // Over the dry ash-free one.
      const Outcome<Analysis> daf = in_state(*wet, State::dry_ash_free, {});
      ASSERT_TRUE(daf);
      expect_same(*in_state(*daf, moist, {moisture, ash}), *wet);
    }
  }
}

TEST(Conversion, DryAshFreeSharesAddToOne) {
  for (const auto& fuel : sample::kMeasuredFuels) {
    Analysis dry = *sample::analysis_of(fuel);
    // The sources round; what closes exactly must stay closed exactly.
    dry.set(Part::ash, dry[Part::ash] + 1 - ultimate_sum(dry));
    const Outcome<Analysis> daf = in_state(dry, State::dry_ash_free, {});
    ASSERT_TRUE(daf);
    EXPECT_NEAR(ultimate_sum(*daf), 1, 1e-12) << fuel.name;
    EXPECT_FALSE(daf->has(Part::ash));
    EXPECT_FALSE(daf->has(Part::moisture));
  }
}

TEST(Conversion, GoesWithTheFactorsOfTheStandard) {
  support::Random random(92);
  const Analysis dry = *sample::analysis_of(sample::kMeasuredFuels[0]);
  for (int i = 0; i < 200; ++i) {
    const double ar = random.uniform(0, 0.6);
    const double ad = random.uniform(0, 0.2);
    const Dilution dilution{ar, ad, dry[Part::ash]};
    const Analysis moist = *in_state(dry, State::as_received, {ar, {}});
    const Analysis drier = *in_state(moist, State::air_dried, {ad, {}});
    EXPECT_NEAR(drier[Part::carbon] / moist[Part::carbon],
                *factor(State::as_received, State::air_dried, dilution), 1e-13);
    EXPECT_NEAR((1 - ad) / (1 - ar), *factor(State::as_received, State::air_dried, dilution),
                1e-13);
    for (const State from :
         {State::as_received, State::air_dried, State::dry, State::dry_ash_free}) {
      for (const State to :
           {State::as_received, State::air_dried, State::dry, State::dry_ash_free}) {
        EXPECT_NEAR(*factor(from, to, dilution) * *factor(to, from, dilution), 1, 1e-14);
      }
    }
  }
}

TEST(Conversion, AsksForWhatItNeedsAndRefusesWhatContradicts) {
  const Analysis dry = *sample::analysis_of(sample::kMeasuredFuels[0]);
  EXPECT_EQ(in_state(dry, State::as_received, {}).failure().argument, 3);
  const Analysis moist = *in_state(dry, State::as_received, {0.2, {}});
  EXPECT_EQ(in_state(moist, State::as_received, {0.3, {}}).failure().argument, 3);
  EXPECT_EQ(in_state(moist, State::dry, {0.3, {}}).failure().fault, Fault::impossible);
  EXPECT_EQ(in_state(moist, State::dry, {{}, 0.1}).failure().argument, 4);
  const Analysis daf = *in_state(dry, State::dry_ash_free, {});
  EXPECT_EQ(in_state(daf, State::dry, {}).failure().argument, 4);
  EXPECT_TRUE(in_state(daf, State::dry_ash_free, {}));
  EXPECT_EQ(factor(State::as_received, State::dry, {}).failure().argument, 3);
  EXPECT_EQ(factor(State::dry, State::air_dried, {}).failure().argument, 4);
  EXPECT_EQ(factor(State::dry, State::dry_ash_free, {}).failure().argument, 5);
}

}  // namespace
}  // namespace busbar::fuel::solid
