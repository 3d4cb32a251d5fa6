// The options text.
#include "catalogue/options.hpp"

#include <gtest/gtest.h>

#include <string>

#include "formula.hpp"
#include "random.hpp"

namespace busbar {
namespace {

TEST(Options, TakeAUnitSetInAnyCase) {
  std::string word;
  for (const auto& [text, set] :
       {std::pair{"metric", UnitSet::metric}, std::pair{"US", UnitSet::us},
        std::pair{"Si", UnitSet::si}, std::pair{"  si\t", UnitSet::si}}) {
    const Outcome<Options> options = read_options(text, word);
    ASSERT_TRUE(options) << text;
    EXPECT_EQ(options->units, set);
  }
}

TEST(Options, RefuseUnknownAndSecondWords) {
  for (const auto& [text, blamed] :
       {std::pair{"imperial", "imperial"}, std::pair{"si, x", "x"}, std::pair{"si;us", "us"},
        std::pair{"si,si", "si"}, std::pair{"", ""}, std::pair{"si,", ""},
        std::pair{"digits=4", "digits=4"}, std::pair{"metric us", "metric us"}}) {
    std::string word = "untouched";
    const Outcome<Options> options = read_options(text, word);
    ASSERT_FALSE(options) << text;
    EXPECT_EQ(options.failure().fault, Fault::unknown_word) << text;
    EXPECT_EQ(word, blamed) << text;
  }
}

TEST(Options, AStreamInTheirPlaceIsToldApart) {
  const std::string told =
      support::evaluate("WHY_CALL(\"STREAM_TABLE\"; STEAM(10; 300; 5); STEAM(10; 200; 3))")
          .text_at();
  EXPECT_NE(told.find("options \"steam 3 kg/s\" is a stream"), std::string::npos) << told;
  EXPECT_NE(told.find("several streams as one range"), std::string::npos) << told;
}

TEST(Options, SurviveAnything) {
  support::Random random(31);
  for (int i = 0; i < 20000; ++i) {
    std::string word;
    EXPECT_FALSE(read_options(random.bytes(random.below(60)) + '\x01', word));
  }
  std::string word;
  EXPECT_FALSE(read_options(std::string(60000, ','), word));
}

// One physical state in three unit sets; US values by the exact definitions of NIST SP 811.
TEST(Options, ChangeTheUnitsOfArgumentsAndResult) {
  const double metric = support::evaluate("STEAM_ENTHALPY(100; 540)").number_at();
  const double si = support::evaluate("STEAM_ENTHALPY(10000000; 813.15; \"si\")").number_at();
  const double us =
      support::evaluate("STEAM_ENTHALPY(100000 / 68.94757293168361; 1004; \"us\")").number_at();
  EXPECT_NEAR(si, metric * 1000, 1e-9 * si);
  EXPECT_NEAR(us, metric / 2.326, 1e-9 * us);
  EXPECT_EQ(support::evaluate("STEAM_ENTHALPY(100; 540; \"metric\")").number_at(), metric);
}

}  // namespace
}  // namespace busbar
