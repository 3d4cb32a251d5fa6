// Mass and energy close, entropy does not fall, equal streams mix to themselves.
#include "machine/balance.hpp"

#include <gtest/gtest.h>

#include <vector>

#include "sample.hpp"

namespace busbar::machine {
namespace {

constexpr int kRuns = 3000;
constexpr double kClosed = 1e-9;

struct Sums {
  double flow = 0;
  double energy = 0;
  double entropy = 0;
};

Sums sums(const std::vector<Stream>& streams) {
  Sums out;
  for (const Stream& stream : streams) {
    out.flow += *stream.flow;
    out.energy += *stream.flow * stream.enthalpy;
    out.entropy += *stream.flow * sample::entropy(stream);
  }
  return out;
}

TEST(Mixing, ClosesMassAndEnergyAndRaisesEntropy) {
  support::Random random(61);
  for (int i = 0; i < kRuns; ++i) {
    std::vector<Stream> in;
    const std::size_t count = 1 + random.below(6);
    for (std::size_t k = 0; k < count; ++k) {
      in.push_back(sample::through_text(sample::any(random, random.logarithmic(1e-3, 1e3))));
    }
    const Outcome<Stream> mixed = mix_out(in);
    ASSERT_TRUE(mixed) << mixed.failure().reason;
    const Stream out = sample::through_text(*mixed);
    const Sums before = sums(in);
    const Sums after = sums({out});
    EXPECT_NEAR(after.flow, before.flow, kClosed * before.flow);
    EXPECT_NEAR(after.energy, before.energy, kClosed * std::abs(before.energy));
    double slack = 0;
    for (const Stream& stream : in) slack += *stream.flow * sample::entropy_slack(stream, out);
    EXPECT_GE(after.entropy - before.entropy, -slack);
    for (const Stream& stream : in) EXPECT_LE(out.pressure, stream.pressure);
  }
}

TEST(Mixing, OfEqualStreamsChangesTheFlowAlone) {
  support::Random random(62);
  for (int i = 0; i < kRuns; ++i) {
    Stream stream = sample::through_text(sample::any(random, random.logarithmic(1e-3, 1e3)));
    stream.tag = *Tag::from("A1");
    const Outcome<Stream> mixed = mix_out(std::vector<Stream>{stream, stream});
    ASSERT_TRUE(mixed);
    EXPECT_NEAR(*mixed->flow, 2 * *stream.flow, kClosed * *stream.flow);
    EXPECT_EQ(mixed->pressure, stream.pressure);
    EXPECT_NEAR(mixed->enthalpy, stream.enthalpy, kClosed * std::abs(stream.enthalpy) + 1e-4);
    EXPECT_NEAR(mixed->temperature, stream.temperature, 1e-6);
    EXPECT_EQ(mixed->tag.text(), "A1");
  }
}

TEST(Mixing, DropsATagThatNotAllShare) {
  support::Random random(63);
  Stream a = sample::steam(random, 1.0);
  Stream b = a;
  a.tag = *Tag::from("A1");
  b.tag = *Tag::from("B1");
  EXPECT_TRUE(mix_out(std::vector<Stream>{a, b})->tag.empty());
}

TEST(Mixing, NeedsFlows) {
  support::Random random(64);
  const Stream flowing = sample::steam(random, 1.0);
  const Stream silent = sample::steam(random);
  const Stream still = sample::steam(random, 0.0);
  EXPECT_EQ(mix_out(std::vector<Stream>{}).failure().fault, Fault::missing);
  EXPECT_EQ(mix_out(std::vector<Stream>{flowing, silent}).failure().fault, Fault::missing);
  EXPECT_EQ(mix_out(std::vector<Stream>{still, still}).failure().fault, Fault::impossible);
  // A stream of no flow changes nothing but the pressure.
  EXPECT_TRUE(mix_out(std::vector<Stream>{flowing, still}));
}

TEST(Splitting, SharesTheFlow) {
  support::Random random(65);
  for (int i = 0; i < kRuns; ++i) {
    const Stream stream = sample::through_text(sample::any(random, random.logarithmic(1e-3, 1e3)));
    const double share = random.uniform(0.001, 0.999);
    const Stream one = sample::through_text(*split_out(stream, share));
    const Stream other = sample::through_text(*split_out(stream, 1 - share));
    EXPECT_NEAR(*one.flow + *other.flow, *stream.flow, kClosed * *stream.flow);
    EXPECT_EQ(one.enthalpy, stream.enthalpy);
    EXPECT_EQ(one.pressure, stream.pressure);
  }
}

TEST(Spraying, ClosesMassAndEnergyAndRaisesEntropy) {
  support::Random random(66);
  int checked = 0;
  for (int i = 0; i < kRuns; ++i) {
    const Stream steam = sample::through_text(sample::steam(random, random.uniform(1, 500)));
    Stream water = sample::water_stream(random);
    water = water::stream_of(*water::at_pressure_temperature(
        steam.pressure * random.uniform(1, 1.5), random.uniform(280, 420)));
    water = sample::through_text(water);
    const double target = random.uniform(420, steam.temperature);
    const Outcome<Stream> sprayed = spray_out(steam, water, target);
    if (!sprayed) continue;
    const Stream out = sample::through_text(*sprayed);
    const double spray = *out.flow - *steam.flow;
    EXPECT_GE(spray, 0);
    EXPECT_EQ(out.pressure, steam.pressure);
    EXPECT_EQ(out.temperature, target);
    const double energy = *steam.flow * steam.enthalpy + spray * water.enthalpy;
    EXPECT_NEAR(*out.flow * out.enthalpy, energy, kClosed * energy);
    const double entropy = *steam.flow * sample::entropy(steam) + spray * sample::entropy(water);
    const double slack =
        *steam.flow * sample::entropy_slack(steam, out) + spray * sample::entropy_slack(water, out);
    EXPECT_GE(*out.flow * sample::entropy(out) - entropy, -slack);
    ++checked;
  }
  EXPECT_GT(checked, kRuns / 2);
}

TEST(PowerAndDuty, AreOppositeAndAddUpAlongAChain) {
  support::Random random(67);
  for (int i = 0; i < kRuns; ++i) {
    const double flow = random.uniform(1, 500);
    const Stream a = sample::any(random, flow);
    const Stream b = sample::any(random, flow);
    const Stream c = sample::any(random, flow);
    const double whole = *heat_duty(a, c);
    EXPECT_NEAR(*heat_duty(a, b) + *heat_duty(b, c), whole, 1e-9 * flow * 4e6);
    EXPECT_EQ(*fluid_power(a, b), -*heat_duty(a, b));
  }
}

TEST(PowerAndDuty, NeedOneAndTheSameFlow) {
  support::Random random(68);
  const Stream a = sample::steam(random, 10.0);
  const Stream b = sample::steam(random, 10.0 * (1 + 1e-6));
  const Stream rounded = sample::steam(random, 10.0 * (1 + 1e-12));
  const Stream silent = sample::steam(random);
  EXPECT_EQ(fluid_power(a, b).failure().fault, Fault::impossible);
  EXPECT_TRUE(fluid_power(a, rounded));
  EXPECT_EQ(fluid_power(silent, a).failure().argument, 1);
  EXPECT_EQ(heat_duty(a, silent).failure().argument, 2);
}

}  // namespace
}  // namespace busbar::machine
