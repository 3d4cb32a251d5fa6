// Tables of lines: their shape, the empty rows between lines, and what they refuse.
#include <gtest/gtest.h>

#include <string>

#include "formula.hpp"

namespace busbar::support {
namespace {

TEST(Diagrams, OneHeadingRowAndAnEmptyRowBetweenLines) {
  const Value table = evaluate("ISOBARS(\"h-s\"; {1; 10 | 100; 500}; 20; 600; 30)");
  ASSERT_EQ(table.rows(), 4 * 31U);
  ASSERT_EQ(table.columns(), 5U);
  EXPECT_EQ(table.text_at(0, 0), "entropy, kJ/(kg K)");
  EXPECT_EQ(table.text_at(0, 1), "enthalpy, kJ/kg");
  EXPECT_EQ(table.text_at(0, 2), "pressure, bar");
  EXPECT_EQ(table.text_at(0, 3), "temperature, °C");
  EXPECT_EQ(table.text_at(0, 4), "dryness");
  const double pressures[] = {1, 10, 100, 500};
  for (std::size_t line = 0; line < 4; ++line) {
    for (std::size_t i = 1; i <= 30; ++i) {
      EXPECT_EQ(table.number_at(line * 31 + i, 2), pressures[line]);
    }
    if (line == 3) continue;
    for (std::size_t c = 0; c < 5; ++c) EXPECT_EQ(table.text_at((line + 1) * 31, c), "");
  }
}

TEST(Diagrams, EachLineMayHaveItsOwnLimits) {
  const Value table = evaluate("ISOTHERMS(\"h-s\"; {100 | 200}; 0.01; {1 | 10}; 12)");
  ASSERT_EQ(table.rows(), 26U);
  EXPECT_NEAR(table.number_at(12, 2), 1, 1e-12);
  EXPECT_NEAR(table.number_at(25, 2), 10, 1e-12);
  EXPECT_EQ(evaluate("ISOTHERMS(\"h-s\"; {100 | 200}; 0.01; {1 | 2 | 3}; 12)").reason(),
            "ISOTHERMS: to pressure holds 3 numbers for 2 lines: give one for all or one for each");
  const Value dry = evaluate("ISOTHERMS(\"h-s\"; 150; 0.01; SATURATION_PRESSURE(150); 12)");
  EXPECT_EQ(dry.number_at(12, 4), 1);
}

TEST(Diagrams, TheUnitSetIsThatOfTheCall) {
  const Value us = evaluate("ISOTHERMS(\"T-s\"; 1000; 1; 500; 10; \"us\")");
  EXPECT_EQ(us.text_at(0, 0), "entropy, Btu/(lb °F)");
  EXPECT_EQ(us.text_at(0, 1), "temperature, °F");
  EXPECT_NEAR(us.number_at(1, 1), 1000, 1e-9);
  EXPECT_NEAR(us.number_at(10, 2), 500, 1e-9);
  const Value si = evaluate("SATURATION_DOME(\"log p-h\"; 11; \"si\")");
  EXPECT_EQ(si.text_at(0, 1), "pressure, Pa");
}

TEST(Diagrams, RefuseWithAReason) {
  const struct {
    const char* formula;
    const char* reason;
  } cases[] = {
      {"ISOBARS(\"p-T\"; 10; 20; 600; 30)",
       "ISOBARS: axes \"p-T\" is no pair of axes; write \"h-s\", \"T-s\", \"p-h\" or \"log p-h\""},
      {"ISOBARS(\"h-s\"; 600; 20; 900; 30)",
       "ISOBARS: to temperature 900 °C is above 800 °C, the highest temperature of IAPWS-IF97 "
       "above "
       "500 bar"},
      {"ISOBARS(\"h-s\"; {10; 1200}; 20; 600; 30)",
       "ISOBARS: pressures in row 1, column 2 of its range 1200 bar is above 1000 bar, the limit "
       "of "
       "IAPWS-IF97"},
      {"ISOBARS(\"h-s\"; 10; 20; 20; 30)",
       "ISOBARS: to temperature 20 °C is not above 20 °C, where the line begins"},
      {"ISOBARS(\"h-s\"; 10; 20; 600; 30.5)", "ISOBARS: points is 30.5, not a whole number"},
      {"ISOBARS(\"h-s\"; 10; 20; 600; 2000)",
       "ISOBARS: points 2000 is above 1000, the limit of this argument"},
      {"DRYNESS_LINES(\"h-s\"; 0.9; 0; 374; 30)",
       "DRYNESS_LINES: to temperature 374 °C is above 373.946 °C, where the saturation line of "
       "IAPWS-IF97 ends"},
      {"EXPANSION_LINE(\"h-s\"; STEAM(10; 300); 30)",
       "EXPANSION_LINE: streams holds one stream only: a line goes through two at the least"},
  };
  for (const auto& [formula, reason] : cases) {
    EXPECT_EQ(evaluate(formula).reason(), reason) << formula;
  }
  const Value rising = Sheet("B2=STEAM(10; 300) | B3=STEAM(5; 220) | B4=STEAM(6; 200)")
                           .evaluate("EXPANSION_LINE(\"h-s\"; B2:B4; 30)");
  EXPECT_EQ(rising.reason(),
            "EXPANSION_LINE: streams has a pressure of 6 bar in stream 3, not below 5 bar in the "
            "one before it: an expansion falls");
  const Value crowded =
      Sheet("B2=STEAM(10; 100) | B3=STEAM(9; 300) | B4=STEAM(8; 100) | B5=STEAM(7; 300)")
          .evaluate("HEATING_LINE(\"h-s\"; B2:B5; 5)");
  EXPECT_EQ(crowded.reason(),
            "HEATING_LINE: points 5 is too few: this line has 10 ends and corners");
}

TEST(Diagrams, ExplanationsSayHowManyCellsToSelect) {
  const std::string text = evaluate("WHY_CALL(\"ISOBARS\"; \"h-s\"; 10; 20; 600; 30)").text_at();
  EXPECT_NE(text.find("31 rows and 5 columns"), std::string::npos) << text;
}

}  // namespace
}  // namespace busbar::support
