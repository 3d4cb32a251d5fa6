// Published default factors: names, flags, and what the two tables say of each other.
#include <gtest/gtest.h>

#include <cmath>
#include <set>
#include <string>

#include "emission/epa.hpp"
#include "emission/ipcc.hpp"

namespace busbar::emission {
namespace {

TEST(Ipcc, DefaultsLieWithinTheirLimits) {
  std::set<std::string_view> seen;
  for (const IpccFuel& fuel : ipcc_fuels()) {
    EXPECT_TRUE(seen.insert(fuel.name).second) << fuel.name;
    EXPECT_EQ(*ipcc_fuel(fuel.name), &fuel);
    EXPECT_LE(fuel.co2[1], fuel.co2[0]) << fuel.name;
    EXPECT_LE(fuel.co2[0], fuel.co2[2]) << fuel.name;
    if (std::isnan(fuel.net_value[0])) continue;
    EXPECT_LE(fuel.net_value[1], fuel.net_value[0]) << fuel.name;
    EXPECT_LE(fuel.net_value[0], fuel.net_value[2]) << fuel.name;
  }
}

// Table 1.4 is table 1.3 times 44/12, both rounded to three digits.
TEST(Ipcc, CarbonDioxideFollowsFromCarbon) {
  for (const IpccFuel& fuel : ipcc_fuels()) {
    const double from_carbon = fuel.carbon * 44 / 12 * 1000;
    EXPECT_NEAR(from_carbon / fuel.co2[0], 1, 0.003) << fuel.name;
  }
}

TEST(Ipcc, FlagsBiogenicFuels) {
  for (const char* name : {"Wood/Wood Waste", "Charcoal", "Biodiesels", "Landfill Gas"}) {
    EXPECT_TRUE((*ipcc_fuel(name))->biogenic) << name;
  }
  for (const char* name : {"Peat", "Lignite", "Municipal Wastes (non-biomass fraction)"}) {
    EXPECT_FALSE((*ipcc_fuel(name))->biogenic) << name;
  }
}

TEST(Ipcc, UnknownNameIsAnsweredWithTheNearest) {
  const auto fuel = ipcc_fuel("natural gaz");
  ASSERT_FALSE(fuel);
  EXPECT_EQ(std::string(fuel.failure().reason)
                .find("is not a name in tables 1.2 and 1.4 of IPCC 2006; the nearest are \"Natural "
                      "Gas\""),
            0U)
      << fuel.failure().reason;
}

TEST(Epa, EveryRowIsFoundAndSaysWhatItRestsOn) {
  std::set<std::string_view> seen;
  for (const EpaFuel& fuel : epa_fuels()) {
    EXPECT_TRUE(seen.insert(fuel.name).second) << fuel.name;
    EXPECT_EQ(*epa_fuel(fuel.name), &fuel);
    EXPECT_FALSE(fuel.status.empty());
    EXPECT_GT(fuel.heating_value, 0);
    EXPECT_GT(fuel.co2, 40);
  }
  EXPECT_EQ((*epa_fuel("Peat"))->origin, Origin::listed);
  EXPECT_EQ((*epa_fuel("Municipal Solid Waste"))->origin, Origin::mixed);
  EXPECT_EQ((*epa_fuel("Vegetable Oil"))->origin, Origin::biogenic);
}

// One factor is on the net, the other on the gross value of about the same fuel: their ratio is
// that of the heating values, 0.90 for gas and 0.95 for oil (IPCC 2006, volume 2, chapter 1).
TEST(Epa, StandsBesideTheIpccByTheRatioOfHeatingValues) {
  EXPECT_NEAR((*epa_fuel("Natural gas (weighted U.S. average)"))->co2_si() /
                  (*ipcc_fuel("Natural Gas"))->co2_si(Bound::central),
              0.90, 0.01);
  EXPECT_NEAR((*epa_fuel("Distillate Fuel Oil No. 2"))->co2_si() /
                  (*ipcc_fuel("Gas/Diesel Oil"))->co2_si(Bound::central),
              0.95, 0.01);
}

TEST(Epa, FFactorsHaveTheirThreeKinds) {
  EXPECT_EQ(f_factor_named("fd"), FFactor::dry);
  EXPECT_FALSE(f_factor_named("F"));
  const FFactors& wood = **f_factors_of("wood");
  EXPECT_TRUE(std::isnan(wood.si(FFactor::wet)));
  EXPECT_TRUE(wood.from_memory);
  EXPECT_FALSE(f_factors_of("Coal"));
}

}  // namespace
}  // namespace busbar::emission
