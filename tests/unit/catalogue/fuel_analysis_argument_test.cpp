// The analysis of a fuel as an argument: what a heading must say, and the sentence when it does
// not.
#include <gtest/gtest.h>

#include <string>

#include "formula.hpp"
#include "value.hpp"

namespace busbar {
namespace {

using support::evaluate;
using support::Value;

std::string share_of(const std::string& analysis, const std::string& part = "C") {
  return "FUEL_ANALYSIS_SHARE(" + analysis + "; \"" + part + "\")";
}

void expect_reason(const std::string& formula, std::initializer_list<std::string_view> words) {
  const Value result = evaluate(formula);
  ASSERT_EQ(result.kind(0, 0), BUSBAR_ERROR) << formula;
  const std::string reason = result.reason(0, 0);
  for (const std::string_view word : words) {
    EXPECT_NE(reason.find(word), std::string::npos) << formula << ": " << reason;
  }
}

TEST(FuelAnalysis, IsATableOrAText) {
  const std::string table =
      "{\"part\"; \"mass % dry\" | \"C\"; 75 | \"H\"; 5 | \"O\"; 10 | \"ash\"; 10}";
  EXPECT_EQ(evaluate(share_of(table)).number_at(), 0.75);
  EXPECT_EQ(evaluate(share_of("\"mass %, dry: C 75, H 5, O 10, ash 10\"")).number_at(), 0.75);
  EXPECT_EQ(evaluate(share_of("\"mass as received: C 0.75, H 0.05, O 0.1, ash 0.05, moisture "
                              "0.05\""))
                .number_at(),
            0.75);
  EXPECT_EQ(evaluate(share_of("\"[typical: any remark] mass % daf: C 80, H 5, O 15\"")).number_at(),
            0.8);
}

TEST(FuelAnalysis, MustStateItsBasis) {
  expect_reason(share_of("\"mass %: C 75, H 5, O 10, ash 10\""), {"states no basis of the fuel"});
  expect_reason(share_of("\"mass % wet: C 75, H 5, O 10, ash 10\""),
                {"\"wet\" is not a basis of a fuel analysis"});
  expect_reason(share_of("\"mole % dry: C 75, H 5, O 10, ash 10\""), {"is by mole"});
  expect_reason(share_of("{\"part\"; \"mass %\" | \"C\"; 75 | \"H\"; 25}"),
                {"states no basis of the fuel"});
}

TEST(FuelAnalysis, FailureNamesThePartAndItsPlace) {
  expect_reason(share_of("{\"part\"; \"mass % dry\" | \"C\"; 75 | \"Fe\"; 25}"),
                {"in row 3, column 1", "\"Fe\"", "is not a part of a fuel analysis"});
  expect_reason(share_of("\"mass % dry: C 75, H -5, O 20, ash 10\""), {"\"H\"", "below nought"});
  expect_reason(share_of("\"mass % dry: C 75, H 5, O 12, ash 10\""),
                {"add to 1.02", "0.02 too much"});
  expect_reason(share_of("\"mass % ar: C 30, H 3, O 20, ash 5, moisture 120\""),
                {"\"moisture\"", "MOISTURE_ON_WET_BASIS"});
  expect_reason(share_of("\"mass % ar: C 65, H 6, O 20, ash 9, moisture 20\""),
                {"H including moisture"});
}

// A gas has no such state: the words behind the scale are refused as before.
TEST(FuelAnalysis, StateIsNoHeadingOfAGas) {
  const Value result = evaluate("GAS_MOLAR_MASS(\"mole % dry: N2 79, O2 21\")");
  EXPECT_EQ(result.kind(0, 0), BUSBAR_ERROR);
}

TEST(FuelAnalysis, TextOfAnAnalysisReadsBackExactly) {
  const std::string given =
      "\"mass % dry: C 75.5, H 4.83, O 6.63, N 1.49, S 2.19, Cl 0.11, ash 9.25\"";
  const std::string there =
      "FUEL_ANALYSIS_ON_BASIS(FUEL_ANALYSIS_ON_BASIS(" + given + "; \"ar\"; 0.3); \"dry\")";
  for (const char* part : {"C", "H", "O", "N", "S", "Cl", "ash"}) {
    EXPECT_NEAR(evaluate(share_of(there, part)).number_at(),
                evaluate(share_of(given, part)).number_at(), 1e-15)
        << part;
  }
}

}  // namespace
}  // namespace busbar
