// The published range (R7-97(2012), section 2), exact to the last place, and the reasons given
// outside it.

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <string>

#include "sampling.hpp"
#include "water/constants.hpp"
#include "water/state.hpp"

namespace busbar::water {
namespace {

constexpr double kInfinity = std::numeric_limits<double>::infinity();
const double kNan = std::nan("");

double up(double x) { return std::nextafter(x, kInfinity); }
double down(double x) { return std::nextafter(x, -kInfinity); }

template <class T>
void expect_outside(const Outcome<T>& outcome, int argument, const std::string& words, double value,
                    double limit, Quantity quantity) {
  ASSERT_FALSE(outcome);
  const Failure& failure = outcome.failure();
  EXPECT_EQ(failure.fault, Fault::outside_range);
  EXPECT_EQ(failure.argument, argument);
  EXPECT_NE(std::string(failure.reason).find(words), std::string::npos) << failure.reason;
  EXPECT_EQ(failure.measures[0].si, value);
  EXPECT_EQ(failure.measures[1].si, limit);
  EXPECT_EQ(failure.measures[0].quantity, quantity);
  EXPECT_EQ(failure.measures[1].quantity, quantity);
}

TEST(Limits, PressureAndTemperature) {
  EXPECT_TRUE(at_pressure_temperature(100e6, 1073.15));
  EXPECT_TRUE(at_pressure_temperature(100e6, 273.15));
  EXPECT_TRUE(at_pressure_temperature(50e6, 2273.15));
  EXPECT_TRUE(at_pressure_temperature(50e6, up(1073.15)));
  EXPECT_TRUE(at_pressure_temperature(1e-6, 273.15));
  expect_outside(at_pressure_temperature(100e6, up(1073.15)), 2, "highest temperature", up(1073.15),
                 1073.15, Quantity::temperature);
  expect_outside(at_pressure_temperature(up(50e6), up(1073.15)), 2, "highest temperature",
                 up(1073.15), 1073.15, Quantity::temperature);
  expect_outside(at_pressure_temperature(50e6, up(2273.15)), 2, "region 5", up(2273.15), 2273.15,
                 Quantity::temperature);
  expect_outside(at_pressure_temperature(1e5, down(273.15)), 2, "lowest temperature", down(273.15),
                 273.15, Quantity::temperature);
  expect_outside(at_pressure_temperature(up(100e6), 500), 1, "highest pressure", up(100e6), 100e6,
                 Quantity::pressure);
  expect_outside(at_pressure_temperature(0, 500), 1, "is not above", 0, 0, Quantity::pressure);
  expect_outside(at_pressure_temperature(-1e5, 500), 1, "is not above", -1e5, 0,
                 Quantity::pressure);
}

TEST(Limits, NumbersThatAreNotFinite) {
  for (const double odd : {kNan, kInfinity, -kInfinity}) {
    for (const auto& outcome : {at_pressure_temperature(odd, 500), at_pressure_enthalpy(odd, 1e6),
                                at_pressure_entropy(odd, 1e3), at_pressure_dryness(odd, 0.5)}) {
      ASSERT_FALSE(outcome);
      EXPECT_EQ(outcome.failure().fault, Fault::outside_range);
      EXPECT_EQ(outcome.failure().argument, 1);
    }
    for (const auto& outcome : {at_pressure_temperature(1e5, odd), at_pressure_enthalpy(1e5, odd),
                                at_pressure_entropy(1e5, odd), at_pressure_dryness(1e5, odd)}) {
      ASSERT_FALSE(outcome);
      EXPECT_EQ(outcome.failure().fault, Fault::outside_range);
      EXPECT_EQ(outcome.failure().argument, 2);
    }
    EXPECT_EQ(saturation_pressure(odd).failure().fault, Fault::outside_range);
    EXPECT_EQ(saturation_temperature(odd).failure().fault, Fault::outside_range);
  }
}

// The lowest and highest enthalpy and entropy at a pressure are those of the temperature limits,
// and the next number beyond is refused with that limit.
TEST(Limits, EnthalpyAndEntropyAtTheirPressure) {
  for (const double p : {1e-3, 100.0, 611.0, 612.0, 1e5, 4e6, 16.5e6, 16.6e6, 22.064e6, 30e6, 50e6,
                         up(50e6), 70e6, 100e6}) {
    const double hottest = p > 50e6 ? 1073.15 : 2273.15;
    const State low = *at_pressure_temperature(p, 273.15);
    const State high = *at_pressure_temperature(p, hottest);
    for (const State& state : {low, high}) {
      const auto by_enthalpy = at_pressure_enthalpy(p, state.enthalpy);
      const auto by_entropy = at_pressure_entropy(p, state.entropy);
      ASSERT_TRUE(by_enthalpy) << p;
      ASSERT_TRUE(by_entropy) << p;
      EXPECT_NEAR(by_enthalpy->temperature, state.temperature, 1e-12 * state.temperature);
      EXPECT_NEAR(by_entropy->temperature, state.temperature, 1e-12 * state.temperature);
    }
    expect_outside(at_pressure_enthalpy(p, down(low.enthalpy)), 2, "is below", down(low.enthalpy),
                   low.enthalpy, Quantity::enthalpy);
    expect_outside(at_pressure_enthalpy(p, up(high.enthalpy)), 2, "is above", up(high.enthalpy),
                   high.enthalpy, Quantity::enthalpy);
    expect_outside(at_pressure_entropy(p, down(low.entropy)), 2, "is below", down(low.entropy),
                   low.entropy, Quantity::entropy);
    expect_outside(at_pressure_entropy(p, up(high.entropy)), 2, "is above", up(high.entropy),
                   high.entropy, Quantity::entropy);
    EXPECT_EQ(at_pressure_enthalpy(p, 1e300).failure().measures[2].si, hottest);
    EXPECT_EQ(at_pressure_enthalpy(p, -1e300).failure().measures[2].si, 273.15);
    EXPECT_EQ(at_pressure_entropy(p, 1e300).failure().measures[2].si, hottest);
    EXPECT_EQ(at_pressure_entropy(p, -1e300).failure().measures[2].si, 273.15);
  }
}

TEST(Limits, SaturationLine) {
  const double lowest = *saturation_pressure(273.15);
  EXPECT_NEAR(lowest, 611.213, 5e-4);  // R7-97(2012), section 8.2
  EXPECT_TRUE(saturation_temperature(lowest));
  EXPECT_TRUE(saturation_temperature(22.064e6));
  EXPECT_TRUE(saturation_pressure(647.096));
  EXPECT_TRUE(at_pressure_dryness(lowest, 0));
  EXPECT_TRUE(at_pressure_dryness(22.064e6, 1));
  expect_outside(saturation_temperature(down(lowest)), 1, "is below", down(lowest), lowest,
                 Quantity::pressure);
  expect_outside(saturation_temperature(up(22.064e6)), 1, "critical pressure", up(22.064e6),
                 22.064e6, Quantity::pressure);
  expect_outside(saturation_pressure(down(273.15)), 1, "is below", down(273.15), 273.15,
                 Quantity::temperature);
  expect_outside(saturation_pressure(up(647.096)), 1, "critical temperature", up(647.096), 647.096,
                 Quantity::temperature);
  expect_outside(at_pressure_dryness(up(22.064e6), 0.5), 1, "critical pressure", up(22.064e6),
                 22.064e6, Quantity::pressure);
  expect_outside(at_pressure_dryness(down(lowest), 0.5), 1, "is below", down(lowest), lowest,
                 Quantity::pressure);
  expect_outside(at_pressure_dryness(1e5, down(0)), 2, "is below", down(0), 0, Quantity::fraction);
  expect_outside(at_pressure_dryness(1e5, up(1)), 2, "is above", up(1), 1, Quantity::fraction);
}

// Down to the smallest numbers a vapour answers; where the volume leaves the range of numbers, and
// nowhere else, it is refused.
TEST(Limits, VanishingPressure) {
  for (double p = 1; p > 0; p /= 1e3) {
    const auto state = at_pressure_temperature(p, 500);
    if (461.526 * 500 / p < std::numeric_limits<double>::max()) {
      ASSERT_TRUE(state) << p;
      EXPECT_TRUE(std::isfinite(state->volume));
      const auto by_enthalpy = at_pressure_enthalpy(p, state->enthalpy);
      const auto by_entropy = at_pressure_entropy(p, state->entropy);
      ASSERT_TRUE(by_enthalpy && by_entropy) << p;
      EXPECT_NEAR(by_enthalpy->temperature, 500, 1e-9);
      EXPECT_NEAR(by_entropy->temperature, 500, 1e-9);
    } else {
      ASSERT_FALSE(state);
      EXPECT_EQ(state.failure().argument, 1);
    }
  }
}

// Any bits whatever: an answer with finite numbers, or a failure with a reason.
TEST(Limits, ArbitraryNumbersNeverGiveArbitraryStates) {
  testing::Sampler sampler(41);
  const auto any = [&] {
    const double size = std::pow(10.0, sampler.between(-320, 308));
    return sampler.share() < 0.3 ? -size : size;
  };
  const auto check = [](const Outcome<State>& outcome) {
    if (outcome) {
      EXPECT_TRUE(std::isfinite(outcome->temperature) && std::isfinite(outcome->volume) &&
                  std::isfinite(outcome->enthalpy) && std::isfinite(outcome->entropy));
      EXPECT_GT(outcome->volume, 0);
      EXPECT_NE(outcome->region, Region::none);
    } else {
      EXPECT_EQ(outcome.failure().fault, Fault::outside_range) << outcome.failure().reason;
      EXPECT_NE(std::string(outcome.failure().reason), "");
    }
  };
  for (int k = 0; k < 20000; ++k) {
    const double p = k % 2 == 0 ? any() : sampler.log_between(1, 100e6);
    check(at_pressure_temperature(p, k % 3 == 0 ? any() : sampler.between(200, 2400)));
    check(at_pressure_enthalpy(p, k % 3 == 0 ? any() : sampler.between(-1e5, 8e6)));
    check(at_pressure_entropy(p, k % 3 == 0 ? any() : sampler.between(-1e2, 2e4)));
    check(at_pressure_dryness(p, k % 3 == 0 ? any() : sampler.between(-0.1, 1.1)));
  }
}

}  // namespace
}  // namespace busbar::water
