// The table of streams: what stands in its headings and where there is nothing to say.
#include <gtest/gtest.h>

#include <array>
#include <string>

#include "formula.hpp"

namespace busbar::support {
namespace {

constexpr const char* kGiven =
    "B2=TAGGED(STEAM_AT_DRYNESS(10; 0.88; 3); \"LBA10\") | B3=STEAM(10; 300)";

TEST(StreamTable, HeadingsCarryTheUnitsOfTheCall) {
  const Sheet sheet(kGiven);
  const std::array<std::array<const char*, 9>, 3> expected{{
      {"metric", "tag", "flow, kg/s", "pressure, bar", "temperature, °C", "enthalpy, kJ/kg",
       "entropy, kJ/(kg K)", "volume, m³/kg", "dryness"},
      {"us", "tag", "flow, lb/h", "pressure, psia", "temperature, °F", "enthalpy, Btu/lb",
       "entropy, Btu/(lb °F)", "volume, ft³/lb", "dryness"},
      {"si", "tag", "flow, kg/s", "pressure, Pa", "temperature, K", "enthalpy, J/kg",
       "entropy, J/(kg K)", "volume, m³/kg", "dryness"},
  }};
  for (const auto& row : expected) {
    const Value table = sheet.evaluate(std::string("STREAM_TABLE(B2:B3; \"") + row[0] + "\")");
    ASSERT_EQ(table.rows(), 3U);
    ASSERT_EQ(table.columns(), 8U);
    for (std::size_t c = 0; c < 8; ++c) EXPECT_EQ(table.text_at(0, c), row[c + 1]);
  }
}

TEST(StreamTable, LeavesEmptyWhatAStreamDoesNotCarry) {
  const Value table = Sheet(kGiven).evaluate("STREAM_TABLE(B2:B3)");
  EXPECT_EQ(table.text_at(1, 0), "LBA10");
  EXPECT_EQ(table.number_at(1, 1), 3);
  EXPECT_EQ(table.number_at(1, 7), 0.88);
  for (const std::size_t c : {0U, 1U, 7U}) {
    EXPECT_EQ(table.kind(2, c), BUSBAR_TEXT);
    EXPECT_EQ(table.text_at(2, c), "");
  }
}

}  // namespace
}  // namespace busbar::support
