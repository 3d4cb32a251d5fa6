// Gross and net heating values: the constants, and there and back.
#include "fuel/solid/net_value.hpp"

#include <gtest/gtest.h>

#include <cmath>

#include "measured_fuels.hpp"
#include "random.hpp"

namespace busbar::fuel::solid {
namespace {

constexpr std::array<const char*, 5> kMethods{"ISO 18125", "ISO 1928", "ISO 1928 constant volume",
                                              "IPCC 2006", "heat of condensation"};

// Heat of condensation 44.013 kJ/mol (ISO 6976:2016, annex A), R T at 25 °C, molar masses of IUPAC.
constexpr double kCondensation = 44013;
constexpr double kThermal = 8.3144621 * 298.15;
constexpr double kHydrogen = 1.00794e-3;
constexpr double kOxygen = 15.9994e-3;
constexpr double kNitrogen = 14.0067e-3;
constexpr double kWater = 2 * kHydrogen + kOxygen;

// A mole of gas that appears or is used up does work R T at constant pressure: half a mole of
// oxygen is used for each mole of water from hydrogen, half a mole less is needed for each mole of
// oxygen in the fuel, half a mole of nitrogen appears for each one in it. Printed to 0.1 J/g per
// percent by ISO, which is 1e4 J/kg for the whole.
TEST(NetValue, ConstantsFollowFromTheHeatOfCondensation) {
  const NetMethod& iso = *net_method_named("ISO 18125");
  EXPECT_NEAR(iso.hydrogen, (kCondensation - kThermal / 2) / (2 * kHydrogen), 0.5e4);
  EXPECT_NEAR(iso.oxygen, kThermal / 2 / kOxygen, 0.5e4);
  EXPECT_NEAR(iso.nitrogen, kThermal / 2 / kNitrogen, 1e4);
  EXPECT_NEAR(iso.moisture, kCondensation / kWater, 0.5e3);
  const NetMethod& volume = *net_method_named("ISO 1928 constant volume");
  EXPECT_NEAR(volume.hydrogen, (kCondensation - kThermal) / (2 * kHydrogen), 0.5e4);
  EXPECT_NEAR(volume.moisture, (kCondensation - kThermal) / kWater, 0.6e3);
  const NetMethod& simple = *net_method_named("heat of condensation");
  EXPECT_NEAR(simple.hydrogen, kCondensation / (2 * kHydrogen), 50);
  EXPECT_NEAR(simple.moisture, kCondensation / kWater, 5);
}

TEST(NetValue, GoesThereAndBack) {
  support::Random random(93);
  for (const auto& fuel : sample::kMeasuredFuels) {
    const Analysis dry = *sample::analysis_of(fuel);
    const double moisture = random.uniform(0, 0.6);
    const Analysis moist = *in_state(dry, State::as_received, {moisture, {}});
    for (const char* name : kMethods) {
      const NetMethod& method = *net_method_named(name);
      for (const State gross : {State::as_received, State::dry, State::dry_ash_free}) {
        for (const State net : {State::as_received, State::dry, State::dry_ash_free}) {
          const double value = fuel.hhv * 1e6;
          const Outcome<double> down = net_from_gross(moist, {value, gross}, net, method, {});
          ASSERT_TRUE(down) << down.failure().reason;
          const Outcome<double> up = gross_from_net(moist, {*down, net}, gross, method, {});
          ASSERT_TRUE(up);
          EXPECT_NEAR(*up, value, 1e-12 * value);
        }
      }
    }
  }
}

TEST(NetValue, MoistureFromAnalysisAndFromArgumentAreOne) {
  const NetMethod& iso = *net_method_named("ISO 18125");
  const Analysis dry = *sample::analysis_of(sample::kMeasuredFuels[0]);
  const Analysis moist = *in_state(dry, State::as_received, {0.25, {}});
  const double value = 31.7e6;
  const double here = *net_from_gross(moist, {value, State::dry}, State::as_received, iso, {});
  const double there = *net_from_gross(dry, {value, State::dry}, State::as_received, iso, 0.25);
  EXPECT_NEAR(here, there, 1e-12 * here);
  // And the moist value agrees with moistening the dry net value.
  const double dry_net = *net_from_gross(dry, {value, State::dry}, State::dry, iso, {});
  EXPECT_NEAR(net_at_moisture(dry_net, 0, 0.25), here, 1e-12 * here);
}

TEST(NetValue, AsksForWhatItNeeds) {
  const NetMethod& iso = *net_method_named("ISO 18125");
  const Analysis dry = *sample::analysis_of(sample::kMeasuredFuels[0]);
  const StatedValue gross{30e6, State::dry};
  EXPECT_EQ(net_from_gross(dry, gross, State::as_received, iso, {}).failure().argument, 4);
  EXPECT_EQ(net_from_gross(dry, {30e6, State::air_dried}, State::dry, iso, {}).failure().argument,
            3);
  EXPECT_EQ(net_from_gross(dry, gross, State::dry, iso, 0.2).failure().argument, 6);
  EXPECT_EQ(net_from_gross(dry, {30e6, State::air_dried}, State::as_received, iso, 0.2)
                .failure()
                .argument,
            3);
  const std::array<Entry, 2> entries{Entry{"VM", 0.4}, Entry{"ash", 0.1}};
  const Analysis proximate = *read(State::dry, entries);
  EXPECT_EQ(net_from_gross(proximate, gross, State::dry, iso, {}).failure().argument, 1);
  EXPECT_EQ(net_method_named("DIN 51900"), nullptr);
}

TEST(Moisture, OnDryAndOnMoistMassGoThereAndBack) {
  support::Random random(94);
  for (int i = 0; i < 1000; ++i) {
    const double moisture = random.uniform(0, 0.99);
    EXPECT_NEAR(moisture_on_moist_mass(moisture_on_dry_mass(moisture)), moisture, 1e-15);
    const double net = random.uniform(-2e6, 40e6);
    const double to = random.uniform(0, 0.9);
    EXPECT_NEAR(net_at_moisture(net_at_moisture(net, moisture, to), to, moisture), net, 1e-7);
    EXPECT_NEAR(gross_at_moisture(gross_at_moisture(net, moisture, to), to, moisture), net, 1e-7);
  }
}

}  // namespace
}  // namespace busbar::fuel::solid
