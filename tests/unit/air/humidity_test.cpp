// Round trips between the measures of humidity, the wet bulb's balance, and what is refused.
#include "air/humidity.hpp"

#include <gtest/gtest.h>

#include <cmath>

#include "air/properties.hpp"
#include "random.hpp"
#include "water/ice.hpp"
#include "water/solve/properties.hpp"

namespace busbar::air {
namespace {

constexpr double kAtmosphere = 101325;
constexpr int kPoints = 3000;

struct Sample {
  double pressure, temperature, relative_humidity, humidity_ratio;
  BelowFreezing below;
};

// Unsaturated air anywhere in the range, where it can be saturated at all.
template <class Check>
void for_samples(std::uint64_t seed, const Check& check) {
  support::Random random(seed);
  for (int i = 0; i < kPoints; ++i) {
    Sample at{};
    at.pressure = random.logarithmic(2e3, kHighestPressure);
    at.temperature =
        random.uniform(215, std::min(kHottest, boiling_temperature(at.pressure) - 0.01));
    at.relative_humidity = random.uniform(0.02, 1);
    at.below = random.chance(0.5) ? BelowFreezing::ice : BelowFreezing::water;
    const auto w = humidity_ratio_at_relative_humidity(at.pressure, at.temperature,
                                                       at.relative_humidity, at.below);
    ASSERT_TRUE(w) << at.pressure << " " << at.temperature << ": " << w.failure().reason;
    at.humidity_ratio = *w;
    check(at);
  }
}

TEST(Humidity, RelativeHumidityRoundTrip) {
  for_samples(1, [](const Sample& at) {
    const auto back = relative_humidity(at.pressure, at.temperature, at.humidity_ratio, at.below);
    ASSERT_TRUE(back);
    EXPECT_NEAR(*back / at.relative_humidity, 1, 1e-12);
  });
}

TEST(Humidity, DewPointRoundTrip) {
  for_samples(2, [](const Sample& at) {
    const auto dew = dew_point(at.pressure, at.humidity_ratio, at.below);
    if (!dew) {
      EXPECT_EQ(dew.failure().fault, Fault::outside_range);
      return;
    }
    if (*dew == kFreezing) return;
    const auto back = humidity_ratio_at_dew_point(at.pressure, *dew, at.below);
    ASSERT_TRUE(back);
    EXPECT_NEAR(*back / at.humidity_ratio, 1, 1e-10)
        << at.pressure << " " << at.temperature << " " << *dew;
    EXPECT_LE(*dew, at.temperature + 1e-9);
  });
}

TEST(Humidity, DewPointOfSaturatedAirIsItsTemperature) {
  for (const double p : {5e4, kAtmosphere, 1e6}) {
    for (const double t : {200.0, 250.0, 272.0, 280.0, 300.0, 350.0}) {
      for (const BelowFreezing below : {BelowFreezing::ice, BelowFreezing::water}) {
        const auto w = humidity_ratio_at_relative_humidity(p, t, 1, below);
        if (!w) continue;
        EXPECT_NEAR(*dew_point(p, *w, below), t, 1e-9);
      }
    }
  }
}

// Wet bulbs just below 0 °C over ice belong to air that has one over water too, which is given.
TEST(Humidity, WetBulbRoundTripAndOrder) {
  for_samples(3, [](const Sample& at) {
    const auto wet = wet_bulb(at.pressure, at.temperature, at.humidity_ratio);
    if (!wet) {
      EXPECT_EQ(wet.failure().fault, Fault::impossible) << wet.failure().reason;
      return;
    }
    EXPECT_LE(*wet, at.temperature);
    const auto dew = dew_point(at.pressure, at.humidity_ratio, BelowFreezing::ice);
    if (dew) {
      EXPECT_GE(*wet, *dew - 1e-9);
    }
    const auto back = humidity_ratio_at_wet_bulb(at.pressure, at.temperature, *wet);
    ASSERT_TRUE(back) << at.pressure << " " << at.temperature << " " << *wet;
    EXPECT_NEAR(*back, at.humidity_ratio, 1e-10 * (at.humidity_ratio + 1e-3))
        << at.pressure << " " << at.temperature << " " << *wet;
  });
}

// Adiabatic saturation: the air and the water that it takes up bring as much enthalpy as the
// saturated air carries away.
TEST(Humidity, WetBulbClosesTheEnergyBalance) {
  for (const double t : {260.0, 285.0, 320.0, 450.0}) {
    constexpr double kRatio = 0.0004;
    const double wet = *wet_bulb(kAtmosphere, t, kRatio);
    const bool frozen = wet < kFreezing;
    const double water = frozen ? water::ice_at(kAtmosphere, wet).enthalpy
                                : water::properties_1(kAtmosphere, wet).enthalpy;
    const double most =
        *humidity_ratio_at_relative_humidity(kAtmosphere, wet, 1, BelowFreezing::ice);
    const double in = *enthalpy_at(kAtmosphere, t, kRatio) + (most - kRatio) * water;
    EXPECT_NEAR(in, *enthalpy_at(kAtmosphere, wet, most), 1e-5) << t;
  }
}

TEST(Humidity, WetBulbOfSaturatedAirIsItsTemperature) {
  for (const double t : {220.0, 270.0, 274.0, 300.0, 360.0}) {
    const double w = *humidity_ratio_at_relative_humidity(kAtmosphere, t, 1, BelowFreezing::ice);
    EXPECT_NEAR(*wet_bulb(kAtmosphere, t, w), t, 1e-7);
  }
}

TEST(Humidity, WetBulbOfSteamThatHoldsAlmostNoAirIsTheBoilingPoint) {
  const auto wet = wet_bulb(kAtmosphere, 450, 90);
  ASSERT_TRUE(wet);
  EXPECT_NEAR(*wet, boiling_temperature(kAtmosphere), 0.5);
}

TEST(Humidity, EnthalpyRoundTrip) {
  for_samples(4, [](const Sample& at) {
    const auto h = enthalpy_at(at.pressure, at.temperature, at.humidity_ratio);
    if (!h) return;
    const auto back = temperature_at_enthalpy(at.pressure, *h, at.humidity_ratio);
    ASSERT_TRUE(back);
    EXPECT_NEAR(*back, at.temperature, 1e-9);
  });
}

TEST(Humidity, FogIsRefused) {
  const double most =
      *humidity_ratio_at_relative_humidity(kAtmosphere, 300, 1, BelowFreezing::unsaid);
  EXPECT_TRUE(enthalpy_at(kAtmosphere, 300, most));
  // As far above as other published models put saturation, it counts as saturated.
  EXPECT_EQ(*relative_humidity(kAtmosphere, 300, most * 1.00013, BelowFreezing::unsaid), 1);
  EXPECT_NEAR(*wet_bulb(kAtmosphere, 300, most * 1.00013), 300, 0.01);
  for (const auto& refused :
       {enthalpy_at(kAtmosphere, 300, most * 1.001), wet_bulb(kAtmosphere, 300, most * 1.001),
        relative_humidity(kAtmosphere, 300, most * 1.001, BelowFreezing::unsaid)}) {
    ASSERT_FALSE(refused);
    EXPECT_EQ(refused.failure().fault, Fault::impossible);
    EXPECT_EQ(refused.failure().argument, 3);
  }
  EXPECT_TRUE(enthalpy_at(kAtmosphere, 400, 20));  // above the boiling point any humidity exists
}

TEST(Humidity, BetweenIceAndWaterSaturationAirExists) {
  const double over_water =
      *humidity_ratio_at_relative_humidity(kAtmosphere, 253.15, 1, BelowFreezing::water);
  EXPECT_TRUE(enthalpy_at(kAtmosphere, 253.15, over_water));
  EXPECT_FALSE(relative_humidity(kAtmosphere, 253.15, over_water, BelowFreezing::ice));
}

TEST(Humidity, ImpossibleWetBulbs) {
  EXPECT_EQ(humidity_ratio_at_wet_bulb(kAtmosphere, 300, 301).failure().argument, 3);
  const double dry = *wet_bulb(kAtmosphere, 300, 0);
  EXPECT_NEAR(*humidity_ratio_at_wet_bulb(kAtmosphere, 300, dry + 1e-6), 0, 1e-8);
  EXPECT_EQ(humidity_ratio_at_wet_bulb(kAtmosphere, 300, dry - 0.01).failure().fault,
            Fault::impossible);
}

}  // namespace
}  // namespace busbar::air
