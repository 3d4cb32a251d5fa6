// Names of published tables: exact look-up and the nearest ones.
#include "core/name_list.hpp"

#include <gtest/gtest.h>

#include <string>

namespace busbar {
namespace {

const NameList& fuels() {
  static const NameList list({"Anthracite", "Coking Coal", "Lignite", "Residual Fuel Oil",
                              "Gas/Diesel Oil", "Natural Gas"},
                             "this table", "TABLE(\"all\")");
  return list;
}

TEST(NameList, FindsExactNamesInAnyCase) {
  EXPECT_EQ(fuels().find("Anthracite"), 0U);
  EXPECT_EQ(fuels().find(" natural gas "), 5U);
  EXPECT_FALSE(fuels().find("natural  gas"));
  EXPECT_FALSE(fuels().find(""));
}

TEST(NameList, NamesTheNearest) {
  EXPECT_EQ(fuels().nearest("anthracit", 1), (std::vector<std::size_t>{0}));
  EXPECT_EQ(fuels().nearest("diesel", 1), (std::vector<std::size_t>{4}));
  EXPECT_EQ(fuels().nearest("Lignit", 1), (std::vector<std::size_t>{2}));
  EXPECT_EQ(fuels().nearest("natural", 9).size(), 6U);
  const std::string reason = fuels().unknown("coal");
  EXPECT_EQ(reason.find("is not a name in this table; the nearest are \"Coking Coal\", "), 0U)
      << reason;
  EXPECT_NE(reason.find("TABLE(\"all\") lists them"), std::string::npos);
}

TEST(NameList, SurvivesAnyWord) {
  EXPECT_FALSE(fuels().find(std::string(100000, 'x')));
  EXPECT_NE(fuels().unknown(std::string(100000, 'x')), nullptr);
  EXPECT_NE(fuels().unknown(""), nullptr);
}

}  // namespace
}  // namespace busbar
