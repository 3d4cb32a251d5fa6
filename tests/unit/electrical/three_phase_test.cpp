// Power triangle and phasor diagram.
#include "electrical/three_phase.hpp"

#include <gtest/gtest.h>

#include <cmath>

#include "random.hpp"

namespace busbar::electrical {
namespace {

constexpr int kRuns = 3000;
constexpr double kClosed = 1e-12;

TEST(ThreePhase, CurrentAndApparentPowerGoThereAndBack) {
  support::Random random(91);
  for (int i = 0; i < kRuns; ++i) {
    const double voltage = random.logarithmic(100, 1e6);
    const double current = random.logarithmic(1e-2, 1e5);
    EXPECT_NEAR(line_current(apparent_power(voltage, current), voltage), current,
                kClosed * current);
  }
}

TEST(ThreePhase, TheTriangleCloses) {
  support::Random random(92);
  for (int i = 0; i < kRuns; ++i) {
    const double active = random.logarithmic(1, 1e10);
    const double factor = random.uniform(0.01, 1);
    const double reactive = reactive_power(active, factor);
    EXPECT_NEAR(power_factor(active, reactive), factor, kClosed);
    EXPECT_NEAR(std::hypot(active, reactive), active / factor, kClosed * active / factor);
  }
  EXPECT_EQ(reactive_power(120e6, 1), 0);
}

// P = 3 V E sin(angle) / X of one phase (Fitzgerald, Kingsley and Umans, section 5.4).
TEST(InternalVoltage, GivesTheActivePowerThroughTheLoadAngle) {
  support::Random random(93);
  for (int i = 0; i < kRuns; ++i) {
    const double voltage = random.logarithmic(400, 3e4);
    const double active = random.logarithmic(1e4, 1e9);
    const double factor = random.uniform(0.1, 1);
    const double reactance = random.uniform(0.1, 3) * voltage * voltage * factor / active;
    const Sense sense = i % 2 == 0 ? Sense::lagging : Sense::leading;
    const InternalVoltage found = internal_voltage(voltage, active, factor, sense, reactance);
    EXPECT_NEAR(voltage * found.line_to_line * std::sin(found.angle) / reactance, active,
                1e-11 * active);
  }
}

TEST(Sense, IsNamedInTwoWaysAndNotGuessed) {
  EXPECT_EQ(sense_named("Lagging"), Sense::lagging);
  EXPECT_EQ(sense_named(" underexcited "), Sense::leading);
  for (const char* word : {"", "lag", "inductive", "ind.", "capacitive", "+"}) {
    EXPECT_FALSE(sense_named(word)) << word;
  }
}

}  // namespace
}  // namespace busbar::electrical
