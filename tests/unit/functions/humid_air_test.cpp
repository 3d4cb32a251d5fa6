// The cell functions of humid air as a user meets them: what WHY says, unit sets, the table.
#include <gtest/gtest.h>

#include <string>

#include "formula.hpp"
#include "value.hpp"

namespace busbar::support {
namespace {

void expect_reason(const std::string& formula, const std::string& part) {
  const Value got = Sheet().evaluate(formula);
  ASSERT_TRUE(got.is_error()) << formula << " gives " << got.shown();
  EXPECT_NE(got.reason().find(part), std::string::npos) << got.reason();
}

void expect_why(const std::string& call, const std::string& part) {
  const Value got = Sheet().evaluate("WHY_CALL(" + call + ")");
  EXPECT_NE(got.text_at().find(part), std::string::npos) << got.text_at();
}

double number(const std::string& formula) {
  const Value got = Sheet().evaluate(formula);
  EXPECT_TRUE(got.is_number()) << formula << " gives " << got.shown();
  return got.is_number() ? got.number_at() : 0;
}

TEST(HumidAir, SaysWhyThereIsNoAnswer) {
  expect_reason("AIR_HUMIDITY_RATIO(1.01325; 15; 60)",
                "60 is above 1: a fraction is meant, 0.6 if this was a percentage");
  expect_reason("AIR_HUMIDITY_RATIO(1.01325; 15; 1.2)", "1.2 is above 1, saturation");
  expect_reason("AIR_HUMIDITY_RATIO(1.01325; -5; 0.6)",
                "below freezing is left out, and -5 °C is below 0 °C: write \"ice\" or \"water\"");
  expect_reason("AIR_HUMIDITY_RATIO(1.01325; 15; 0.6; \"us\")",
                "below freezing \"us\" is neither \"ice\" nor \"water\"");
  expect_reason("AIR_HUMIDITY_RATIO(1.01325; 120; 0.6)", "temperature 120 °C has no saturated air");
  expect_reason("AIR_ENTHALPY(1.01325; 25; 0.03)", "the rest is fog, not vapour");
  expect_reason("AIR_ENTHALPY(1.01325; 25; 10)", "0.01 for 10 g/kg");
  expect_reason("AIR_DEW_POINT(1.01325; 0.001)", "\"ice\" for the frost point");
  expect_reason("AIR_DEW_POINT(1.01325; 0)", "is zero or blank");
  expect_reason("AIR_WET_BULB(1.01325; -80; 0)", "wet bulb below -80 °C");
  expect_reason("AIR_HUMIDITY_RATIO_AT_WET_BULB(1.01325; 20; 21)", "above the dry bulb, 20 °C");
  expect_reason("AIR_HUMIDITY_RATIO_AT_WET_BULB(1.01325; 40; 5)", "completely dry air of 40 °C");
  expect_reason("AIR_TEMPERATURE_AT_ENTHALPY(1.01325; 900; 0)", "outside -80 °C to 200 °C");
  expect_reason("AIR_ENTHALPY(0; 25; 0.01)", "is zero or blank");
  expect_reason("AIR_ENTHALPY(-0.2; 25; 0.01)", "pressures are absolute here");
  expect_reason("STANDARD_ATMOSPHERE_PRESSURE(12000)", "above 11000 m");
}

TEST(HumidAir, SaysOverWhatItIsSaturated) {
  expect_why("\"AIR_HUMIDITY_RATIO\"; 1.01325; 15; 0.6",
             "Saturation over liquid water (IAPWS-IF97, equation 30): vapour pressure 0.0170574 "
             "bar, enhancement factor 1.004");
  expect_why("\"AIR_HUMIDITY_RATIO\"; 1.01325; -5; 0.6; \"ice\"", "Saturation over ice");
  expect_why("\"AIR_HUMIDITY_RATIO\"; 1.01325; -5; 0.6; \"water\"", "over supercooled water");
  expect_why("\"AIR_WET_BULB\"; 1.01325; -5; 0.001", "Wet bulb covered with ice");
  expect_why("\"AIR_WET_BULB\"; 1.01325; 20; 0.005", "Wet bulb covered with liquid water");
}

// Weather services refer to water, engineers to ice: at -20 °C the saturated ratios are as 1.25 to
// 1.03 hPa (Smithsonian Meteorological Tables, tables 94 and 96, from memory).
TEST(HumidAir, IceAndWaterDifferInFrost) {
  const double ice = number("AIR_HUMIDITY_RATIO(1; -20; 1; \"ice\")");
  const double water = number("AIR_HUMIDITY_RATIO(1; -20; 1; \"water\")");
  EXPECT_NEAR(water / ice, 1.2540 / 1.0324, 0.002);
  // The word is of no account above the freezing point.
  EXPECT_EQ(number("AIR_HUMIDITY_RATIO(1; 20; 1; \"ice\")"),
            number("AIR_HUMIDITY_RATIO(1; 20; 1; \"WATER\")"));
}

TEST(HumidAir, UnitSets) {
  const double metric = number("AIR_ENTHALPY(1.01325; 25; 0.01)");
  EXPECT_NEAR(number("AIR_ENTHALPY(14.695948775; 77; 0.01; \"us\")"), metric * 1e3 / 2326, 1e-6);
  EXPECT_NEAR(number("AIR_ENTHALPY(101325; 298.15; 0.01; \"si\")"), metric * 1e3, 1e-6);
  EXPECT_NEAR(number("AIR_HUMIDITY_RATIO(14.695948775; 59; 0.6; ; \"us\")"),
              number("AIR_HUMIDITY_RATIO(1.01325; 15; 0.6)"), 1e-10);
  EXPECT_NEAR(number("STANDARD_ATMOSPHERE_PRESSURE(1640.41994750656; \"us\")"),
              number("STANDARD_ATMOSPHERE_PRESSURE(500)") * 14.503773773, 1e-7);
}

TEST(HumidAir, TheTableAgreesWithTheFunctions) {
  const Value table = Sheet().evaluate("AIR_TABLE(0.95; 30; 0.015)");
  ASSERT_EQ(table.rows(), 14U);
  ASSERT_EQ(table.columns(), 3U);
  const auto expect = [&](std::size_t row, const char* name, const std::string& formula,
                          const char* unit) {
    EXPECT_EQ(table.text_at(row, 0), name);
    EXPECT_NEAR(table.number_at(row, 1) / number(formula), 1, 1e-12) << formula;
    EXPECT_EQ(table.text_at(row, 2), unit);
  };
  expect(3, "specific humidity", "AIR_SPECIFIC_HUMIDITY(0.015)", "kg/kg humid air");
  expect(4, "mole fraction of water", "AIR_MOLE_FRACTION_OF_WATER(0.015)", "");
  expect(6, "relative humidity", "AIR_RELATIVE_HUMIDITY(0.95; 30; 0.015)", "");
  expect(7, "saturation humidity ratio", "AIR_HUMIDITY_RATIO(0.95; 30; 1)", "kg/kg dry air");
  expect(8, "enhancement factor", "AIR_ENHANCEMENT_FACTOR(0.95; 30)", "");
  expect(9, "dew point", "AIR_DEW_POINT(0.95; 0.015)", "°C");
  expect(10, "wet bulb", "AIR_WET_BULB(0.95; 30; 0.015)", "°C");
  expect(11, "enthalpy per mass of dry air", "AIR_ENTHALPY(0.95; 30; 0.015)", "kJ/kg");
  expect(12, "volume per mass of dry air", "AIR_VOLUME(0.95; 30; 0.015)", "m³/kg");
  expect(13, "density of humid air", "AIR_DENSITY(0.95; 30; 0.015)", "kg/m³");
}

TEST(HumidAir, TheTableLeavesEmptyWhatThisAirDoesNotHave) {
  const Value hot = Sheet().evaluate("AIR_TABLE(1; 150; 0.5)");  // above the boiling point
  EXPECT_EQ(hot.text_at(6, 1), "");
  EXPECT_EQ(hot.text_at(8, 1), "");
  EXPECT_GT(hot.number_at(10, 1), 0);
  const Value dry = Sheet().evaluate("AIR_TABLE(1; 20; 0)");
  EXPECT_EQ(dry.text_at(9, 1), "");
  EXPECT_EQ(dry.number_at(6, 1), 0);
}

}  // namespace
}  // namespace busbar::support
