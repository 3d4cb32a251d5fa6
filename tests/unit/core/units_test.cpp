// The three unit sets.
#include "core/units.hpp"

#include <gtest/gtest.h>

#include "catalogue/row.hpp"
#include "random.hpp"
#include "units/expression.hpp"

namespace busbar {
namespace {

std::vector<Quantity> quantities() {
  std::vector<Quantity> all;
  for (int i = 0; i < static_cast<int>(Quantity::count_); ++i) {
    all.push_back(static_cast<Quantity>(i));
  }
  return all;
}
constexpr UnitSet kSets[] = {UnitSet::metric, UnitSet::us, UnitSet::si};

Outcome<Number> nothing(Number) { return Number{}; }

// The row template names the quantities without units itself, for the table is no constant there.
TEST(UnitSets, TheShortcutOfTheRowsAgreesWithTheTable) {
  for (const Quantity quantity : quantities()) {
    EXPECT_EQ(detail::Bind<nothing>::kDependsOnUnitSet(quantity), depends_on_unit_set(quantity))
        << name_of(quantity);
  }
}

TEST(UnitSets, EveryQuantityHasANameAndUnitsInEverySetOrInNone) {
  for (const Quantity quantity : quantities()) {
    EXPECT_FALSE(name_of(quantity).empty());
    for (const UnitSet set : kSets) {
      EXPECT_EQ(unit_of(set, quantity).symbol.empty(), !depends_on_unit_set(quantity))
          << name_of(quantity);
    }
  }
}

// The symbols mean the same in CONVERT_UNIT. Factors there come from the same definitions; the
// published ones are in tests/reference.
TEST(UnitSets, AgreeWithTheUnitsOfConversion) {
  for (const Quantity quantity : quantities()) {
    if (!depends_on_unit_set(quantity) || quantity == Quantity::heat_rate) continue;
    for (const UnitSet set : kSets) {
      std::string symbol(unit_of(set, quantity).symbol);
      if (symbol == "psi") symbol = "psig";
      const bool difference = quantity == Quantity::temperature_difference;
      const std::string si(unit_of(UnitSet::si, quantity).symbol);
      for (const double x : {0.0, 1.0, 37.5}) {
        const auto converted = difference || symbol == "psig" ||
                                       quantity == Quantity::gauge_pressure ||
                                       quantity == Quantity::vacuum
                                   ? units::convert_difference(x, symbol, si)
                                   : units::convert(x, symbol, si);
        ASSERT_TRUE(converted) << symbol;
        EXPECT_NEAR(*converted, unit_of(set, quantity).to_si(x), 1e-14 * (1 + std::abs(*converted)))
            << symbol;
      }
    }
  }
}

TEST(UnitSets, NumbersDoNotDriftAfterTheFirstTrip) {
  support::Random random(3);
  for (const Quantity quantity : quantities()) {
    for (const UnitSet set : kSets) {
      const Unit& unit = unit_of(set, quantity);
      for (int i = 0; i < 2000; ++i) {
        const double si = random.logarithmic(1e-3, 1e8);
        const double once = unit.to_si(unit.from_si(si));
        EXPECT_NEAR(once, si, 4e-16 * (si + std::abs(unit.offset)) * 2);
      }
    }
  }
}

TEST(UnitSets, ThreeWordsNameThem) {
  EXPECT_EQ(unit_set_named("metric"), UnitSet::metric);
  EXPECT_EQ(unit_set_named("US"), UnitSet::us);
  EXPECT_EQ(unit_set_named("Si"), UnitSet::si);
  for (const char* word : {"", "imperial", "metric ", "si,", "english", "m"}) {
    EXPECT_FALSE(unit_set_named(word)) << word;
  }
  for (const UnitSet set : kSets) EXPECT_EQ(unit_set_named(name_of(set)), set);
}

}  // namespace
}  // namespace busbar
