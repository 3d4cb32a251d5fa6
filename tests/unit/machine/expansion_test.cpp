// Turbine, pump and valve through streams: what was put in comes out again, and the second law
// holds.
#include "machine/expansion.hpp"

#include <gtest/gtest.h>

#include "sample.hpp"

namespace busbar::machine {
namespace {

constexpr int kRuns = 4000;
// A stage or pump whose enthalpy change the rounding of the enthalpy itself (3e6 J/kg in doubles)
// does not disturb at 1e-10.
constexpr double kLeastChange = 10e3;

TEST(Turbine, TheEfficiencyPutInIsReadBack) {
  support::Random random(51);
  int checked = 0;
  for (int i = 0; i < kRuns; ++i) {
    const Stream inlet = sample::through_text(sample::steam(random, 50.0));
    const double outlet = random.logarithmic(3e3, inlet.pressure * 0.95);
    const double efficiency = random.uniform(0.3, 1);
    const Outcome<Stream> out = turbine_out(inlet, outlet, efficiency);
    if (!out) continue;
    const Stream read = sample::through_text(*out);
    if (inlet.enthalpy - read.enthalpy < kLeastChange) continue;
    const Outcome<double> found = turbine_efficiency(inlet, read);
    ASSERT_TRUE(found);
    EXPECT_NEAR(*found, efficiency, 1e-10)
        << inlet.pressure << ' ' << inlet.temperature << ' ' << outlet;
    EXPECT_EQ(read.pressure, outlet);
    EXPECT_EQ(read.flow, inlet.flow);
    ++checked;
  }
  EXPECT_GT(checked, kRuns * 8 / 10);
}

TEST(Turbine, EntropyNeverFalls) {
  support::Random random(52);
  int checked = 0;
  for (int i = 0; i < kRuns; ++i) {
    const Stream inlet = sample::through_text(sample::steam(random));
    const double outlet = random.logarithmic(3e3, inlet.pressure * 0.999);
    const double efficiency = random.chance(0.2) ? 1 : random.uniform(0.01, 1);
    const Outcome<Stream> out = turbine_out(inlet, outlet, efficiency);
    if (!out) continue;
    const Stream read = sample::through_text(*out);
    const double rise = sample::entropy(read) - sample::entropy(inlet);
    EXPECT_GE(rise, -sample::entropy_slack(inlet, read)) << inlet.pressure << ' ' << outlet;
    if (efficiency == 1) {
      EXPECT_NEAR(rise, 0, sample::entropy_slack(inlet, read));
    }
    EXPECT_LE(read.enthalpy, inlet.enthalpy);
    ++checked;
  }
  EXPECT_GT(checked, kRuns * 8 / 10);
}

TEST(Turbine, PassesFlowAndTag) {
  Stream inlet = water::stream_of(*water::at_pressure_temperature(100e5, 813.15), 55.0);
  inlet.tag = *Tag::from("MAA10");
  const Outcome<Stream> out = turbine_out(inlet, 10e5, 0.88);
  ASSERT_TRUE(out);
  EXPECT_EQ(out->flow, 55.0);
  EXPECT_EQ(out->tag.text(), "MAA10");
}

TEST(Turbine, MeasuredStagesMayBeImpossibleButDesignedOnesMayNot) {
  const Stream inlet = water::stream_of(*water::at_pressure_temperature(100e5, 813.15));
  const Stream cold = water::stream_of(*water::at_pressure_temperature(10e5, 460));
  const Stream hot = water::stream_of(*water::at_pressure_temperature(90e5, 850));
  EXPECT_GT(*turbine_efficiency(inlet, cold), 1);
  EXPECT_LT(*turbine_efficiency(inlet, hot), 0);
  EXPECT_EQ(turbine_out(inlet, 100e5, 0.9).failure().fault, Fault::impossible);
  EXPECT_EQ(turbine_out(inlet, 120e5, 0.9).failure().argument, 2);
}

TEST(Pump, TheEfficiencyPutInIsReadBack) {
  support::Random random(53);
  int checked = 0;
  for (int i = 0; i < kRuns; ++i) {
    const Stream inlet = sample::through_text(sample::water_stream(random, 50.0));
    const double outlet = random.uniform(inlet.pressure + 60e5, 350e5);
    const double efficiency = random.uniform(0.3, 1);
    const Outcome<Stream> out = pump_out(inlet, outlet, efficiency);
    ASSERT_TRUE(out);
    const Stream read = sample::through_text(*out);
    const Outcome<double> found = pump_efficiency(inlet, read);
    ASSERT_TRUE(found);
    // The isentropic rise is found to max(1e-10 relative, 1e-10 R T*) of the enthalpy, here up to
    // 1e-10 of 1 MJ/kg, over a rise of 6 kJ/kg and more.
    const double bound =
        std::max(1e-10, 1e-10 * std::abs(read.enthalpy) / (read.enthalpy - inlet.enthalpy));
    EXPECT_NEAR(*found, efficiency, bound) << inlet.pressure << ' ' << outlet;
    ++checked;
  }
  EXPECT_EQ(checked, kRuns);
}

TEST(Pump, EntropyNeverFalls) {
  support::Random random(54);
  for (int i = 0; i < kRuns; ++i) {
    const Stream inlet = sample::through_text(sample::water_stream(random));
    const double outlet = random.logarithmic(inlet.pressure * 1.001, 900e5);
    const Outcome<Stream> out =
        pump_out(inlet, outlet, random.chance(0.2) ? 1 : random.uniform(0.1, 1));
    if (!out) continue;
    const Stream read = sample::through_text(*out);
    EXPECT_GE(sample::entropy(read) - sample::entropy(inlet), -sample::entropy_slack(inlet, read));
    EXPECT_GT(read.enthalpy, inlet.enthalpy);
  }
}

TEST(Pump, TakesBoilingWaterButNoSteam) {
  const Stream boiling = water::stream_of(*water::at_pressure_dryness(5e3, 0));
  EXPECT_TRUE(pump_out(boiling, 120e5, 0.8));
  const Stream wet = water::stream_of(*water::at_pressure_dryness(5e3, 0.01));
  EXPECT_EQ(pump_out(wet, 120e5, 0.8).failure().fault, Fault::impossible);
  const Stream steam = water::stream_of(*water::at_pressure_temperature(1e5, 500));
  EXPECT_EQ(pump_out(steam, 120e5, 0.8).failure().argument, 1);
}

// The slope against plain differences of the measured efficiency.
TEST(Pump, SensitivityIsTheSlopeOfTheEfficiency) {
  const Stream inlet = water::stream_of(*water::at_pressure_temperature(10e5, 430));
  const Outcome<Stream> out = pump_out(inlet, 180e5, 0.8);
  ASSERT_TRUE(out);
  constexpr double kStep = 0.02;
  const auto at = [&](double shift) {
    return *pump_efficiency(
        inlet, water::stream_of(*water::at_pressure_temperature(180e5, out->temperature + shift)));
  };
  const Outcome<double> slope = pump_efficiency_per_kelvin(inlet, *out);
  ASSERT_TRUE(slope);
  EXPECT_NEAR(*slope, (at(kStep) - at(-kStep)) / (2 * kStep), 1e-4 * std::abs(*slope));
  EXPECT_LT(*slope, 0);
}

TEST(Valve, KeepsTheEnthalpyAndRaisesTheEntropy) {
  support::Random random(55);
  int checked = 0;
  for (int i = 0; i < kRuns; ++i) {
    const Stream inlet = sample::through_text(sample::any(random, 3.0));
    const double outlet = random.logarithmic(1e3, inlet.pressure);
    const Outcome<Stream> out = valve_out(inlet, outlet);
    if (!out) continue;
    const Stream read = sample::through_text(*out);
    EXPECT_NEAR(read.enthalpy, inlet.enthalpy, 1e-10 * std::abs(inlet.enthalpy) + 1e-4);
    EXPECT_GE(sample::entropy(read) - sample::entropy(inlet), -sample::entropy_slack(inlet, read))
        << inlet.pressure << ' ' << outlet;
    ++checked;
  }
  EXPECT_GT(checked, kRuns * 8 / 10);
}

TEST(Valve, MayStandOpenButNeverPumps) {
  const Stream inlet = water::stream_of(*water::at_pressure_temperature(10e5, 600));
  EXPECT_TRUE(valve_out(inlet, 10e5));
  EXPECT_EQ(valve_out(inlet, 10.1e5).failure().fault, Fault::impossible);
}

}  // namespace
}  // namespace busbar::machine
