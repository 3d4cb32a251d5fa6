// What the functions on gaseous fuels say about an analysis that they refuse, in the words that a
// user reads.
#include <gtest/gtest.h>

#include <string>

#include "formula.hpp"

namespace busbar::support {
namespace {

// A chromatograph report in percent, with one cell of it spoilt.
Sheet report(const std::string& cell = {}, const std::string& content = {}) {
  Sheet sheet(
      "B2=\"component\" | C2=\"mole %\" | D2=\"standard uncertainty\" | B3=\"Methane\" | "
      "C3=93.3212 "
      "| D3=0.0346 | B4=\"Ethane\" | C4=2.5656 | D4=0.0243 | B5=\"Propane\" | C5=1.5368 | "
      "D5=0.0148 "
      "| B6=\"Nitrogen\" | C6=1.035 | D6=0.0195 | B7=\"Carbon dioxide\" | C7=1.5414 | D7=0.0111 | "
      "B8= | C8= | D8=");
  if (!cell.empty()) sheet.set(cell, content);
  return sheet;
}

constexpr const char* kVolume = "FUEL_GAS_HEATING_VALUE_BY_VOLUME(B2:C8; \"HHV\"; 15; 15; 1.01325)";
constexpr const char* kTable =
    "INDEX(FUEL_GAS_UNCERTAINTY_TABLE(B2:D8; \"independent\"; 15; 15; 1.01325); 9; 4)";
constexpr const char* kWholeTable =
    "FUEL_GAS_UNCERTAINTY_TABLE(B2:D8; \"independent\"; 15; 15; 1.01325)";

void expect_refused(const Value& value, std::int32_t error, const std::string& reason) {
  ASSERT_TRUE(value.is_error()) << value.shown();
  EXPECT_EQ(error_word(value.error_at()), error_word(error));
  EXPECT_NE(value.reason().find(reason), std::string::npos) << value.reason();
}

TEST(GaseousFuels, AReportInPercentWithBlankLinesIsRead) {
  EXPECT_NEAR(report().evaluate(kVolume).number_at(), 38.410611, 5e-7);
  EXPECT_NEAR(report().evaluate(kTable).number_at(), 0.026267, 5e-7);
  // A third column is no matter where no uncertainty is asked for.
  EXPECT_NEAR(report().evaluate("FUEL_GAS_MOLAR_MASS(B2:D8)").number_at(), 17.38843, 5e-6);
}

TEST(GaseousFuels, AReportLyingDownIsRead) {
  const Sheet sheet(
      "B2=\"component\" | C2=\"CH4\" | D2=\"N2\" | B3=\"mole\" | C3=0.9 | D3=0.1 | "
      "B4=\"standard uncertainty\" | C4=0.001 | D4=0.001");
  const Value flat = sheet.evaluate("FUEL_GAS_MOLAR_MASS(B2:D3)");
  ASSERT_TRUE(flat.is_number()) << flat.shown();
  const Value table = sheet.evaluate(
      "INDEX(FUEL_GAS_UNCERTAINTY_TABLE(B2:D4; \"independent\"; 15; 15; 1.01325); 2; 2)");
  EXPECT_EQ(table.number_at(), flat.number_at()) << table.shown();
}

TEST(GaseousFuels, ASumThatIsNotOneIsToldAndNotCorrected) {
  expect_refused(report("C3", "93.3").evaluate(kVolume), BUSBAR_ERROR_RANGE,
                 "sums to 0.999788, 0.000212 too little; NORMALISED_COMPOSITION");
  expect_refused(report("C2", "\"mole\"").evaluate(kVolume), BUSBAR_ERROR_RANGE, "\"mole %\"");
}

TEST(GaseousFuels, WhatIsWrongWithAPartIsSaidWithItsPlace) {
  expect_refused(report("B5", "\"radon\"").evaluate(kVolume), BUSBAR_ERROR_VALUE,
                 "composition in row 4, column 1 of its range \"radon\" is not a component of ISO "
                 "6976:2016");
  expect_refused(report("B5", "\"C6+\"").evaluate(kVolume), BUSBAR_ERROR_VALUE,
                 "is a group of substances");
  expect_refused(report("B5", "\"C4H10\"").evaluate(kVolume), BUSBAR_ERROR_VALUE,
                 "write which one is meant");
  expect_refused(
      report("B5", "\"C2H6\"").evaluate(kVolume), BUSBAR_ERROR_RANGE,
      "row 4, column 1 of its range \"C2H6\" names a component that stands in an earlier "
      "row");
  expect_refused(report("C6", "-1.035").evaluate(kVolume), BUSBAR_ERROR_RANGE, "negative");
  expect_refused(report("C6", "").evaluate(kVolume), BUSBAR_ERROR_MISSING, "\"Nitrogen\"");
  expect_refused(report("C2", "\"%\"").evaluate(kVolume), BUSBAR_ERROR_VALUE, "basis");
}

TEST(GaseousFuels, ReferenceConditionsAreThoseOfTheStandard) {
  const auto call = [](const char* rest) {
    return report().evaluate(std::string("FUEL_GAS_HEATING_VALUE_BY_VOLUME(B2:C8; ") + rest);
  };
  expect_refused(call("\"HHV\"; 25; 25; 1.01325)"), BUSBAR_ERROR_RANGE,
                 "metering temperature 25 °C is no metering temperature of ISO 6976: 0 °C, 15 °C, "
                 "20 °C and 60 °F (15.55 °C) are");
  expect_refused(call("\"HHV\"; 18; 15; 1.01325)"), BUSBAR_ERROR_RANGE,
                 "combustion temperature 18 °C is no combustion temperature of ISO 6976");
  expect_refused(call("\"HHV\"; 15; 15; 1.2)"), BUSBAR_ERROR_RANGE, "the range of ISO 6976");
  expect_refused(call("\"HHV\"; 15; \"normal\"; 1.01325)"), BUSBAR_ERROR_VALUE,
                 "metering temperature \"normal\" is a text where a number is needed");
  expect_refused(call("\"net\"; 15; 15; 1.01325)"), BUSBAR_ERROR_VALUE, "write \"HHV\" or \"LHV\"");
}

TEST(GaseousFuels, UncertaintiesAreNeverAssumed) {
  expect_refused(report("D5", "").evaluate(kWholeTable), BUSBAR_ERROR_MISSING,
                 "\"Propane\" has no uncertainty");
  expect_refused(report("D2", "\"U, k=2\"").evaluate(kWholeTable), BUSBAR_ERROR_VALUE,
                 "only their \"standard uncertainty\" may");
  expect_refused(report("D2", "").evaluate(kWholeTable), BUSBAR_ERROR_MISSING,
                 "only their \"standard uncertainty\" may");
  expect_refused(report("D4", "\"small\"").evaluate(kWholeTable), BUSBAR_ERROR_VALUE,
                 "is no number");
  expect_refused(report("D4", "-0.01").evaluate(kWholeTable), BUSBAR_ERROR_RANGE,
                 "between 0 and 1");
  expect_refused(report().evaluate("FUEL_GAS_UNCERTAINTY_TABLE(B2:D8; \"\"; 15; 15; 1.01325)"),
                 BUSBAR_ERROR_MISSING, "correlation");
  expect_refused(report().evaluate("FUEL_GAS_UNCERTAINTY_TABLE(B2:D8; \"some\"; 15; 15; 1.01325)"),
                 BUSBAR_ERROR_VALUE, "\"independent\", \"normalised\" or \"matrix\"");
  expect_refused(
      report().evaluate(
          "FUEL_GAS_UNCERTAINTY_TABLE(B2:D8; \"matrix\"; 15; 15; 1.01325; {1; 0 | 0; 1})"),
      BUSBAR_ERROR_VALUE, "coefficients has 4 cells; 5 components need 25");
}

TEST(GaseousFuels, AnExplanationSaysHowTheValueCameAbout) {
  const Value why = report().evaluate(
      "WHY_CALL(\"FUEL_GAS_HEATING_VALUE_BY_VOLUME\"; B2:C8; \"LHV\"; 15; 15; 1.01325)");
  for (const char* part : {"compression factor 0.99776224", "at 15 °C and 1.01325 bar",
                           "44.431 kJ/mol", "ISO 6976:2016"}) {
    EXPECT_NE(why.text_at().find(part), std::string::npos) << why.shown();
  }
  const Value gpa = evaluate("WHY_CALL(\"GPA_2145_HEATING_VALUE\"; \"mole: CH4 1\"; \"us\")");
  EXPECT_NE(gpa.text_at().find("ISO 6976:2016 gives 1009.9"), std::string::npos) << gpa.shown();
}

}  // namespace
}  // namespace busbar::support
