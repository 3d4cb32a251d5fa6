// The sentences: every template in the source is whole, and every explanation says what it must.
#include "catalogue/sentence.hpp"

#include <gtest/gtest.h>

#include <filesystem>
#include <fstream>
#include <iterator>
#include <regex>
#include <string>

#include "calls.hpp"
#include "paths.hpp"

namespace busbar {
namespace {

using support::Value;

// Text literals of a source file, neighbours joined as the compiler joins them.
std::vector<std::string> literals(const std::filesystem::path& path) {
  std::ifstream file(path);
  const std::string source{std::istreambuf_iterator<char>(file), std::istreambuf_iterator<char>()};
  static const std::regex kLiteral("\"((?:[^\"\\\\\n]|\\\\.)*)\"");
  std::vector<std::string> found;
  for (auto at = std::sregex_iterator(source.begin(), source.end(), kLiteral);
       at != std::sregex_iterator(); ++at) {
    found.push_back((*at)[1]);
  }
  return found;
}

TEST(Templates, HoldNoBrokenPlaceForAMeasure) {
  static const std::regex kPlace("\\{[012]\\}");
  int places = 0;
  for (const auto& entry :
       std::filesystem::recursive_directory_iterator(support::engine_directory())) {
    const auto extension = entry.path().extension();
    if (extension != ".cpp" && extension != ".hpp") continue;
    for (const std::string& literal : literals(entry.path())) {
      // An inline array in an example.
      if (literal.find("({") != std::string::npos) continue;
      const std::string left = std::regex_replace(literal, kPlace, "");
      EXPECT_EQ(left.find_first_of("{}"), std::string::npos)
          << entry.path().string() << ": " << literal;
      places += left.size() != literal.size();
    }
  }
  EXPECT_GE(places, 20) << "the scan found hardly any template: it is broken";
}

TEST(Sentence, TellsApartMeasuresThatRoundAlike) {
  const Failure failure{Fault::impossible,
                        2,
                        "{0} is not below the inlet pressure {1}",
                        {{{1.0000001e5, Quantity::pressure}, {1e5, Quantity::pressure}}}};
  const std::string text = sentence({failure, functions::find("TURBINE_OUT"), UnitSet::metric, {}});
  EXPECT_NE(text.find("1.0000001 bar"), std::string::npos) << text;
}

TEST(Sentence, WorksWithoutAFunction) {
  EXPECT_EQ(sentence({{Fault::missing, 3, "is gone"}, nullptr, UnitSet::metric, "x"}),
            "\"x\" is gone");
}

std::string explained(const std::string& name, const std::vector<std::string>& formulas) {
  std::string call = "WHY_CALL(\"" + name + "\"";
  for (const std::string& formula : formulas) call += "; " + formula;
  return support::evaluate(call + ")").text_at();
}

void expect_parts(const std::string& text, const std::vector<std::string>& parts) {
  for (const std::string& part : parts) {
    EXPECT_NE(text.find(part), std::string::npos) << '"' << text << "\" lacks \"" << part << '"';
  }
}

TEST(Explanation, EndsWithItsSourceForEveryFunction) {
  for (const Row* row : functions::all()) {
    if (!row->types.empty() && row->types.front().kind == Kind::cell) continue;
    std::vector<const busbar_value*> handles;
    const std::vector<Value> arguments = sample::arguments(*row);
    for (const Value& value : arguments) handles.push_back(value.get());
    busbar_value* result = nullptr;
    ASSERT_EQ(busbar_explain(busbar_find(row->words.name, std::string(row->words.name).size()),
                             handles.data(), handles.size(), &result),
              BUSBAR_OK);
    const std::string text = Value(result).text_at();
    EXPECT_EQ(text.rfind(row->words.name, 0), 0U) << text;
    expect_parts(text, {"works", "Source: " + source_text(*row)});
    EXPECT_EQ(text.find_first_of("{}"), std::string::npos) << text;
  }
}

TEST(Explanation, NamesRegionEquationAndValidity) {
  expect_parts(explained("STEAM_ENTHALPY", {"100", "540"}),
               {"region 2", "equation 15", "229.001 K above saturation", "800 °C", "1000 bar"});
  expect_parts(explained("STEAM", {"100000", "300", "", "\"si\""}), {"region 1", "equation 7"});
  expect_parts(explained("STEAM_ENTHALPY", {"5", "1500"}), {"region 5", "equation 32"});
  expect_parts(explained("STEAM_ENTHALPY", {"250", "400"}), {"region 3", "equation 28"});
  expect_parts(explained("STEAM_AT_DRYNESS", {"10", "0.5"}), {"region 4", "dryness 0.5"});
}

// The saturation temperature at 10 bar is 179.886 °C (IAPWS R7-97(2012), Table 36).
TEST(Explanation, SaysWhenInstrumentsCannotTellAStateFromAWetOne) {
  for (const char* temperature : {"180.5", "179", "181.8"}) {
    expect_parts(explained("STEAM_ENTHALPY", {"10", temperature}), {"instruments", "wet"});
  }
  EXPECT_EQ(explained("STEAM_ENTHALPY", {"10", "182.5"}).find("instruments"), std::string::npos);
}

TEST(Explanation, OfAMissingDrynessGivesTheDistanceFromSaturation) {
  const Value steam = support::evaluate("DRYNESS_OF(STEAM(10; 200))");
  expect_parts(steam.reason(), {"superheated", "20.1144 K"});
  const Value water = support::evaluate("DRYNESS_OF(STEAM(10; 100))");
  expect_parts(water.reason(), {"subcooled", "79.8856 K"});
}

TEST(Explanation, OfAPumpGivesItsSensitivityToTheTemperatureRise) {
  expect_parts(explained("PUMP_EFFICIENCY", {"STEAM(1; 30)", "PUMP_OUT(STEAM(1; 30); 120; 0.8)"}),
               {"Sensitivity", "0.1 K"});
}

TEST(Explanation, OfAnImpossibleStageSaysSo) {
  EXPECT_EQ(explained("TURBINE_EFFICIENCY", {"STEAM(100; 540)", "STEAM(10; 250)"}).find("better"),
            std::string::npos);
  expect_parts(explained("TURBINE_EFFICIENCY", {"STEAM(100; 540)", "STEAM(10; 190)"}),
               {"better than isentropic", "second law"});
  expect_parts(explained("TURBINE_EFFICIENCY", {"STEAM(100; 400)", "STEAM(90; 540)"}),
               {"gained enthalpy"});
}

TEST(Explanation, CarriesTheTag) {
  expect_parts(explained("ENTHALPY_OF", {"TAGGED(STEAM(100; 540); \"LBA10\")"}), {"LBA10"});
}

TEST(Explanation, OfCurzonAndAhlbornNeverCallsItALimit) {
  expect_parts(explained("CURZON_AHLBORN", {"565", "25"}), {"orientation", "never a limit"});
}

TEST(Explanation, SaysThatABasisDoesNotHoldForBoilersByLosses) {
  for (const char* name : {"EFFICIENCY_ON_BASIS", "HEAT_RATE_ON_BASIS"}) {
    expect_parts(explained(name, {"0.5", "\"LHV\"", "\"HHV\"", "55.5", "50"}), {"boiler", "loss"});
  }
}

TEST(Explanation, OfWhyCallRefusesItself) {
  EXPECT_TRUE(support::evaluate("WHY_CALL(\"WHY_CALL\"; \"STEAM\"; 1; 2)").is_error());
}

}  // namespace
}  // namespace busbar
