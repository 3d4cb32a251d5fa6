// What the electrical functions say to somebody who slipped, and to readings that cannot be.
#include <gtest/gtest.h>

#include <string>
#include <vector>

#include "formula.hpp"
#include "value.hpp"

namespace busbar {
namespace {

using support::Value;

void expect_reason(const std::string& formula, const std::vector<std::string>& parts) {
  const Value value = support::evaluate(formula);
  ASSERT_TRUE(value.is_error()) << formula << " gives " << value.shown();
  for (const std::string& part : parts) {
    EXPECT_NE(value.reason().find(part), std::string::npos) << formula << ": " << value.reason();
  }
}

TEST(ElectricalSlips, APercentageIsNotAFraction) {
  expect_reason("GENERATOR_POWER(100; 98)", {"generator efficiency", "0.98 if this was"});
  expect_reason("TOLERATED_EFFICIENCY(98.7; 120)", {"guaranteed efficiency", "0.987 if this was"});
  expect_reason("THREE_PHASE_POWER(15.75; 5000; 85)", {"power factor", "0.85 if this was"});
  expect_reason("WINDAGE_LOSS_IN_HYDROGEN(300; 98; 4; 0.95; 4)", {"purity then", "0.98 if this"});
  expect_reason("TRANSFORMER_LOSS(75; 420; 90)", {"load", "0.9 if this was"});
}

TEST(ElectricalSlips, APowerFactorAboveOneIsRefused) {
  expect_reason("THREE_PHASE_CURRENT(100; 15.75; 1.05)",
                {"power factor 1.05 is above 1", "active over apparent power"});
  expect_reason("REACTIVE_POWER(100; -0.8)", {"power factor", "not above zero"});
}

TEST(ElectricalSlips, PolesComeInPairs) {
  expect_reason("SYNCHRONOUS_SPEED(50; 3)", {"poles 3 is odd"});
  expect_reason("SYNCHRONOUS_SPEED(50; 2.5)", {"poles 2.5 is no whole number"});
  expect_reason("POLE_COUNT(50; 1470)", {"speed 1470 rpm at 50 Hz", "4.08163 poles"});
  expect_reason("MOTOR_SLIP(50; 5; 1180)", {"poles 5 is odd"});
  expect_reason("WINDING_FACTOR(36; 3; 3; 7)", {"poles 3 is odd"});
  expect_reason("WINDING_FACTOR(54; 4; 3; 12)", {"slots 54 is 4.5 to a pole and phase"});
}

TEST(ElectricalSlips, LossesInAnotherUnitAreNoticed) {
  expect_reason("GENERATOR_BEST_LOAD(150; 0.8; {0.4 | 0.3 | 0.3 | 0.2 | 0.4 | 0.1}; 0.4)",
                {"losses adds up to 1.7 kW", "120 MW", "unit of the losses"});
  expect_reason("GENERATOR_BEST_LOAD(150; 0.8; {1700}; 0.4)",
                {"needs six numbers and has 1", "core"});
  expect_reason("TRANSFORMER_PEAK_EFFICIENCY(160; 75000; 420000)", {"load loss", "160 MVA"});
}

TEST(ElectricalSlips, HydrogenThatCouldBurnIsNoCoolingGas) {
  expect_reason("COOLING_HYDROGEN_DENSITY(0.7; 4; 40)", {"purity 0.7 is below 0.85", "burn"});
}

TEST(ElectricalSlips, ChainsThatLeaveNothingAreRefused) {
  expect_reason("SHAFT_TO_BUSBAR(100; {120000}; 5; {300})", {"generator losses", "120000 kW"});
  expect_reason("SHAFT_TO_BUSBAR(100; {1000}; 100; {300})", {"auxiliary power", "99 MW"});
  expect_reason("SHAFT_TO_BUSBAR(100; {0 | 0}; 5; {300})", {"generator losses", "zero or blank"});
  expect_reason("HOUSE_LOAD({2000 | 900}; {0.95})", {"efficiencies", "1 for 2 shaft powers"});
}

TEST(ElectricalSlips, WordsAreListed) {
  expect_reason("MOTOR_IE_EFFICIENCY(\"IE9\"; 55; 4; 50)", {"IE9", "\"IE1\""});
  expect_reason("MOTOR_IE_EFFICIENCY(\"IE4\"; 65; 4; 50)", {"rated power 65 kW", "IE4"});
  expect_reason("GENERATOR_LOAD_ANGLE(15; 100; 0.8; \"inductive\"; 2)", {"inductive", "lagging"});
  expect_reason("RESISTANCE_AT_TEMPERATURE(1; 20; 75; \"iron\")", {"iron", "copper"});
}

std::string explained(const std::string& call) {
  return support::evaluate("WHY_CALL(" + call + ")").text_at();
}

TEST(ElectricalFindings, ReadingsThatCannotBeAreComputedAndSaidSo) {
  EXPECT_EQ(support::evaluate("GENERATOR_EFFICIENCY(100; 101)").number_at(), 1.01);
  const std::string efficiency = explained("\"GENERATOR_EFFICIENCY\"; 100; 101");
  EXPECT_NE(efficiency.find("cannot be"), std::string::npos) << efficiency;
  const std::string factor = explained("\"THREE_PHASE_POWER_FACTOR\"; 120; 15; 4000");
  EXPECT_NE(factor.find("cannot be"), std::string::npos) << factor;
}

TEST(ElectricalFindings, ABlankReactivePowerIsNoted) {
  const std::string text = explained("\"POWER_FACTOR\"; 100; 0");
  EXPECT_NE(text.find("blank"), std::string::npos) << text;
}

}  // namespace
}  // namespace busbar
