// Poles, windings, resistances, cooling gas, transformers, motor classes, chain.
#include <gtest/gtest.h>

#include <cmath>
#include <numbers>

#include "electrical/chain.hpp"
#include "electrical/cooling_gas.hpp"
#include "electrical/motor_classes.hpp"
#include "electrical/resistance.hpp"
#include "electrical/synchronous.hpp"
#include "electrical/tables/motor_classes.hpp"
#include "electrical/tolerance.hpp"
#include "electrical/transformer.hpp"
#include "electrical/typical.hpp"
#include "electrical/winding_factor.hpp"
#include "random.hpp"

namespace busbar::electrical {
namespace {

constexpr double kClosed = 1e-12;

TEST(Poles, GoThereAndBackForEveryMachine) {
  for (const double frequency : {16.7, 50.0, 60.0, 400.0}) {
    for (int pairs = 1; 2 * pairs <= static_cast<int>(kMostPoles); ++pairs) {
      const double poles = 2.0 * pairs;
      const auto speed = synchronous_speed(frequency, poles);
      ASSERT_TRUE(speed);
      EXPECT_EQ(*pole_count(frequency, *speed), poles);
      EXPECT_EQ(*slip(frequency, poles, *speed), 0);
    }
  }
}

TEST(Poles, OfASpeedBetweenTwoMachinesAreRefused) {
  for (int pairs = 1; pairs < 90; ++pairs) {
    EXPECT_EQ(pole_count(50, 50 / (pairs + 0.5)).failure().fault, Fault::impossible) << pairs;
  }
  EXPECT_FALSE(pole_count(50, 5000));
  EXPECT_EQ(pole_count(50, 1e-9).failure().fault, Fault::outside_range);
}

// A winding spread evenly over a phase belt of 60 degrees tends to 3 / pi.
TEST(WindingFactor, TendsToItsLimitWithManySlots) {
  EXPECT_NEAR(*distribution_factor(9996, 2, 3), 3 / std::numbers::pi, 1e-6);
  EXPECT_NEAR(*distribution_factor(10000, 2, 1), 2 / std::numbers::pi, 1e-6);
}

TEST(WindingFactor, ACoilTooLongIsAsGoodAsOneTooShort) {
  for (int span = 1; span < 18; ++span) {
    EXPECT_NEAR(*pitch_factor(36, 4, span), *pitch_factor(36, 4, 18 - span), kClosed);
  }
  EXPECT_NEAR(*winding_factor(36, 4, 3, 7),
              *distribution_factor(36, 4, 3) * *pitch_factor(36, 4, 7), kClosed);
}

TEST(Resistance, AndTemperatureGoThereAndBack) {
  support::Random random(94);
  for (int i = 0; i < 2000; ++i) {
    const double cold = random.uniform(260, 320);
    const double hot = random.uniform(260, 480);
    const double resistance = random.logarithmic(1e-5, 10);
    for (const Conductor conductor : {Conductor::copper, Conductor::aluminium}) {
      const double there = resistance * resistance_ratio(cold, hot, conductor);
      const auto back = temperature_from_resistance(resistance, cold, there, conductor);
      ASSERT_TRUE(back);
      EXPECT_NEAR(*back, hot, 1e-9);
    }
  }
}

TEST(CoolingGas, GrowsDenserWithAirAndPressure) {
  EXPECT_NEAR(hydrogen_density(0, 1e5, 300), air_density(1e5, 300), kClosed);
  EXPECT_GT(hydrogen_density(0.95, 4e5, 300), hydrogen_density(0.98, 4e5, 300));
  EXPECT_NEAR(hydrogen_density(0.98, 4e5, 300), 4 * hydrogen_density(0.98, 1e5, 300), kClosed);
}

TEST(Tolerance, OnLossesIsThatOnEfficiencyToFirstOrder) {
  // 10 % more losses take 10 % of (1 - efficiency) off, less a second-order part.
  const double efficiency = 0.985;
  const double losses = 1 / efficiency - 1;
  EXPECT_NEAR(1 / (1 + *tolerated_loss(losses, 1e6)), tolerated_efficiency(efficiency, 1e6), 3e-5);
}

TEST(Transformer, IsBestWhereBothLossesAreEqual) {
  support::Random random(95);
  for (int i = 0; i < 2000; ++i) {
    const double rated = random.logarithmic(1e5, 1e9);
    const double no_load = rated * random.logarithmic(1e-4, 5e-3);
    const double load_loss = rated * random.logarithmic(1e-3, 2e-2);
    const double best = transformer_best_load(no_load, load_loss);
    EXPECT_NEAR(transformer_loss(no_load, load_loss, best), 2 * no_load, kClosed * no_load * 4);
    const auto at = [&](double load) {
      return *transformer_efficiency(rated, no_load, load_loss, load, 0.9);
    };
    EXPECT_GE(at(best), at(best * 0.95));
    EXPECT_GE(at(best), at(best * 1.05));
  }
}

TEST(Transformer, LoadLossAtItsOwnTemperatureStays) {
  EXPECT_NEAR(*load_loss_at_temperature(400, 350, 300, 300, Conductor::aluminium), 400, 1e-10);
  EXPECT_FALSE(load_loss_at_temperature(400, 401, 300, 350, Conductor::copper));
}

TEST(MotorClasses, RiseWithClassAndPower) {
  for (std::size_t i = 0; i < tables::kFourPoles50Hz.size(); ++i) {
    const auto& line = tables::kFourPoles50Hz[i];
    for (std::size_t k = 1; k < line.percent.size(); ++k) {
      EXPECT_GT(line.percent[k], line.percent[k - 1]) << line.kilowatts;
    }
    if (i == 0) continue;
    for (std::size_t k = 0; k < line.percent.size(); ++k) {
      EXPECT_GE(line.percent[k], tables::kFourPoles50Hz[i - 1].percent[k]) << line.kilowatts;
    }
  }
}

// The polynomial of the standard reproduces its table to the printed digit.
TEST(MotorClasses, ThePolynomialRunsThroughTheTable) {
  for (const auto& line : tables::kFourPoles50Hz) {
    for (std::size_t k = 0; k < tables::kBetween.size(); ++k) {
      const auto beside = class_efficiency(k, line.kilowatts * 1e3 * (1 + 1e-9), 4, 50);
      ASSERT_TRUE(beside);
      EXPECT_NEAR(*beside * 100, line.percent[k], 1e-9) << line.kilowatts;
    }
  }
}

TEST(Chain, WhatIsTakenOffIsTheDifference) {
  support::Random random(96);
  for (int i = 0; i < 2000; ++i) {
    const double shaft = random.logarithmic(1e6, 2e9);
    const double losses[] = {shaft * random.uniform(0.001, 0.02), shaft * random.uniform(0, 0.01)};
    const double auxiliary = shaft * random.uniform(0.01, 0.1);
    const double transformer[] = {shaft * random.uniform(0.0005, 0.005)};
    const auto chain = shaft_to_busbar(shaft, losses, auxiliary, transformer);
    ASSERT_TRUE(chain);
    EXPECT_NEAR(chain->busbar + transformer[0] + auxiliary + losses[0] + losses[1], shaft,
                kClosed * shaft);
  }
}

TEST(Typical, EveryRangeIsAFractionInOrder) {
  for (const TypicalRange& range : typical_ranges()) {
    EXPECT_LT(range.low, range.high) << range.machine;
    EXPECT_GT(range.low, 0.5) << range.machine;
    EXPECT_LT(range.high, 1) << range.machine;
  }
}

}  // namespace
}  // namespace busbar::electrical
