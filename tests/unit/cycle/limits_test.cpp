// Limits between temperatures.
#include "cycle/limits.hpp"

#include <gtest/gtest.h>

#include "../machine/sample.hpp"

namespace busbar::cycle {
namespace {

// Both follow from x = Tc/Th in (0, 1): sqrt(x) > x.
TEST(Limits, CurzonAhlbornIsBelowCarnot) {
  support::Random random(71);
  for (int i = 0; i < 10000; ++i) {
    const double hot = random.logarithmic(1, 1e5);
    const double cold = hot * random.uniform(1e-6, 1 - 1e-9);
    const double limit = *carnot(hot, cold);
    EXPECT_GT(limit, 0);
    EXPECT_LT(limit, 1);
    EXPECT_LT(*curzon_ahlborn(hot, cold), limit);
    // Two engines of the kind one after the other do as one: (1 - e)^2 is the temperature ratio.
    const double rest = 1 - *curzon_ahlborn(hot, cold);
    EXPECT_NEAR(rest * rest, 1 - limit, 1e-12);
  }
}

TEST(Limits, NeedAColderSink) {
  EXPECT_EQ(carnot(300, 300).failure().fault, Fault::impossible);
  EXPECT_EQ(carnot(300, 301).failure().argument, 2);
  EXPECT_EQ(curzon_ahlborn(300, 300).failure().fault, Fault::impossible);
}

// The mean lies between the temperatures of inlet and outlet when the pressure stays (H. D. Baehr
// and S. Kabelac, Thermodynamik: mean value theorem on T ds = dh).
TEST(MeanHeatingTemperature, LiesBetweenTheTemperaturesAtOnePressure) {
  support::Random random(72);
  for (int i = 0; i < 3000; ++i) {
    const double pressure = random.logarithmic(0.05e5, 300e5);
    const double low = random.uniform(280, 600);
    const double high = low + random.uniform(5, 400);
    const Stream inlet =
        sample::through_text(water::stream_of(*water::at_pressure_temperature(pressure, low)));
    const Stream outlet =
        sample::through_text(water::stream_of(*water::at_pressure_temperature(pressure, high)));
    const Outcome<double> mean = mean_heating_temperature(inlet, outlet);
    ASSERT_TRUE(mean);
    // The Gibbs energies of the phases differ by up to 12 J/kg, those of the regions by up to 5
    // (IAPWS R7-97(2012), consistency), which moves the mean by that over the entropy rise.
    const double slack = 20 / (sample::entropy(outlet) - sample::entropy(inlet));
    EXPECT_GE(*mean, low - slack) << pressure << ' ' << low << ' ' << high;
    EXPECT_LE(*mean, high + slack);
  }
}

TEST(MeanHeatingTemperature, NeedsHeat) {
  const Stream cold = water::stream_of(*water::at_pressure_temperature(100e5, 500));
  const Stream hot = water::stream_of(*water::at_pressure_temperature(100e5, 800));
  EXPECT_EQ(mean_heating_temperature(hot, cold).failure().fault, Fault::impossible);
  EXPECT_EQ(mean_heating_temperature(hot, hot).failure().fault, Fault::impossible);
}

}  // namespace
}  // namespace busbar::cycle
