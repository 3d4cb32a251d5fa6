// The library of typical fuels: every row carries what a reader needs to distrust it.
#include "fuel/library/library.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <set>
#include <string>

#include "fuel/nuclear/energy.hpp"

namespace busbar::fuel::library {
namespace {

TEST(Library, EveryRowSaysWhereItIsFromAndThatItIsTypical) {
  std::set<std::string_view> seen;
  for (const TypicalFuel& fuel : fuels()) {
    EXPECT_TRUE(seen.insert(fuel.name).second) << fuel.name;
    EXPECT_FALSE(fuel.source.empty()) << fuel.name;
    const std::string status(fuel.status);
    EXPECT_TRUE(status.rfind("typical", 0) == 0 || status.rfind("one sample", 0) == 0 ||
                status.rfind("pure substance", 0) == 0)
        << fuel.name << ": " << status;
    const bool heat = !std::isnan(fuel.lhv) || !std::isnan(fuel.hhv);
    EXPECT_EQ(heat, !fuel.of.empty()) << fuel.name;
    EXPECT_TRUE(heat || !fuel.composition.empty() || !fuel.further.empty()) << fuel.name;
    if (!std::isnan(fuel.lhv) && !std::isnan(fuel.hhv)) {
      EXPECT_LE(fuel.lhv, fuel.hhv) << fuel.name;
    }
    EXPECT_EQ(*typical_fuel(fuel.name), &fuel);
  }
}

TEST(Library, RefusesANameWithoutItsSourceAndNamesTheNearest) {
  const auto found = typical_fuel("diesel");
  ASSERT_FALSE(found);
  EXPECT_NE(std::string(found.failure().reason).find("diesel (IPCC 2006)"), std::string::npos);
}

TEST(Nuclear, BurnUpOfEveryAtomIsItsFission) {
  // The complete fission of uranium 235 is the most that a burn-up can be.
  const double most = nuclear::heat_of_complete_fission(*nuclear::fission_of("U-235"));
  EXPECT_LT(nuclear::heat_of_burn_up(900), most);
  EXPECT_GT(nuclear::heat_of_burn_up(950), most);
}

}  // namespace
}  // namespace busbar::fuel::library
