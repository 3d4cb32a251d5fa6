// Compositions as cells hold them: tables, texts, names, and what is refused with which words.
#include <gtest/gtest.h>

#include <string>

#include "core/composition.hpp"
#include "formula.hpp"

namespace busbar {
namespace {

using support::Value;

std::string text_of(const std::string& formula, const std::string& given = {}) {
  const Value value = support::evaluate(formula, given);
  return value.is_error() ? value.reason() : value.text_at();
}

TEST(CompositionArgument, TablesTextsAndNamesAreAlike) {
  const std::string expected = "mole: N2 0.75, O2 0.25";
  for (const char* formula :
       {"COMPOSITION_BY_MOLE(\"mole: N2 0.75, O2 0.25\")",
        "COMPOSITION_BY_MOLE(\" Mole % :  O2 25 ,N2  75 \")",
        "COMPOSITION_BY_MOLE({\"species\"; \"mole %\" | \"N2\"; 75 | \"O2\"; 25})",
        "COMPOSITION_BY_MOLE({\"\"; \"mol.-%\" | \"oxygen\"; 25 | \"nitrogen\"; 75})",
        "COMPOSITION_BY_MOLE({\"species\"; \"N2\"; \"O2\" | \"mole fraction\"; 0.75; 0.25})"}) {
    EXPECT_EQ(text_of(formula), expected) << formula;
  }
  EXPECT_EQ(text_of("COMPOSITION_BY_MOLE(A1:B6)",
                    "A1=\"gas\" | B1=\"mole\" | A2=\"N2\" | B2=0.75 | A3=\"O2\" | B3=0.25 | A4= | "
                    "B4= | A5=\"\" | B5= | A6= | B6="),
            expected)
      << "blank lines at the end";
  EXPECT_EQ(text_of("COMPOSITION_BY_MOLE({\"gas\"; \"mole\" | \"N2\"; 1})"), "mole: N2 1");
  EXPECT_EQ(text_of("COMPOSITION_BY_MOLE({\"gas\"; \"N2\" | \"mole\"; 1})"), "mole: N2 1");
  EXPECT_EQ(text_of("COMPOSITION_BY_MOLE(\"technical air, 21/79\")"), "mole: N2 0.79, O2 0.21");
}

TEST(CompositionArgument, IsLiftedOverTextsAndTakenWholeAsATable) {
  const Value masses = support::evaluate("GAS_MOLAR_MASS({\"mole: N2 1\" | \"mole: O2 1\"})");
  ASSERT_EQ(masses.rows(), 2U);
  EXPECT_NEAR(masses.number_at(0, 0), 28.0134, 1e-9);
  EXPECT_NEAR(masses.number_at(1, 0), 31.9988, 1e-9);
  const Value along = support::evaluate("GAS_MOLAR_MASS({\"mole: N2 1\"; \"mole: Xy 1\"})");
  ASSERT_EQ(along.columns(), 2U);
  EXPECT_TRUE(along.kind(0, 1) == BUSBAR_ERROR);
  const Value table =
      support::evaluate("GAS_HEAT_CAPACITY({\"gas\"; \"mole\" | \"N2\"; 1}; {100 | 200 | 300})");
  ASSERT_EQ(table.rows(), 3U);
  EXPECT_LT(table.number_at(0, 0), table.number_at(2, 0));
}

void expect_reason(const std::string& formula, std::int32_t kind,
                   const std::vector<std::string>& parts, const std::string& given = {}) {
  const Value result = support::evaluate(formula, given);
  ASSERT_TRUE(result.is_error()) << formula << " gives " << result.shown();
  EXPECT_EQ(support::error_word(result.error_at()), support::error_word(kind)) << result.reason();
  for (const std::string& part : parts) {
    EXPECT_NE(result.reason().find(part), std::string::npos)
        << formula << ": \"" << result.reason() << "\" lacks \"" << part << '"';
  }
}

std::string mass_of(const std::string& composition) {
  return "GAS_MOLAR_MASS(" + composition + ")";
}

TEST(CompositionArgument, StatesItsBasis) {
  const std::string write = "write \"mole\", \"mole %\", \"mass\" or \"mass %\"";
  expect_reason(mass_of("{\"gas\"; \"%\" | \"N2\"; 100}"), BUSBAR_ERROR_VALUE,
                {"row 1, column 2", "\"%\"", "states no basis", write});
  expect_reason(mass_of("{\"gas\"; \"vol %\" | \"N2\"; 100}"), BUSBAR_ERROR_VALUE,
                {"\"vol %\"", "ideal gas", "mole %"});
  expect_reason(mass_of("{\"N2\"; 0.79 | \"O2\"; 0.21}"), BUSBAR_ERROR_VALUE,
                {"row 1, column 2", "no heading"});
  expect_reason(mass_of("{\"gas\"; \"\" | \"N2\"; 1}"), BUSBAR_ERROR_MISSING,
                {"row 1, column 2", "is blank", "heading"});
  expect_reason(mass_of("\"%: N2 100\""), BUSBAR_ERROR_VALUE, {"\"%\"", write});
  expect_reason(mass_of("\"N2 1\""), BUSBAR_ERROR_VALUE, {"\"N2 1\"", "mole: N2 0.79, O2 0.21"});
  expect_reason(mass_of("\"air\""), BUSBAR_ERROR_VALUE, {"\"air\"", "published mixture"});
}

TEST(CompositionArgument, SumsToOneOrSaysByHowMuchItDoesNot) {
  expect_reason(mass_of("\"mole: N2 0.79, O2 0.2\""), BUSBAR_ERROR_RANGE,
                {"sums to 0.99", "0.01 too little", "NORMALISED_COMPOSITION"});
  expect_reason(mass_of("\"mole: N2 0.79, O2 0.22\""), BUSBAR_ERROR_RANGE,
                {"sums to 1.01", "0.01 too much"});
  expect_reason(mass_of("\"mole: N2 79, O2 21\""), BUSBAR_ERROR_RANGE,
                {"sums to 100", "mole %", "percentages"});
  expect_reason(mass_of("\"mole %: N2 0.79, O2 0.21\""), BUSBAR_ERROR_RANGE,
                {"sums to 0.01", "fractions"});
  EXPECT_EQ(text_of("COMPOSITION_BY_MOLE(NORMALISED_COMPOSITION(\"mole: N2 3, O2 1\"))"),
            "mole: N2 0.75, O2 0.25");
}

TEST(CompositionArgument, NamesThePartThatIsWrong) {
  expect_reason(mass_of("\"mole: N2 0.5, Xy 0.5\""), BUSBAR_ERROR_VALUE,
                {"\"Xy\"", "no gas that Busbar knows", "SPECIES_TABLE"});
  expect_reason(mass_of("{\"gas\"; \"mole\" | \"N2\"; 0.5 | \"Xy\"; 0.5}"), BUSBAR_ERROR_VALUE,
                {"row 3, column 1", "\"Xy\""});
  expect_reason(mass_of("{\"gas\"; \"N2\"; \"Xy\" | \"mole\"; 0.5; 0.5}"), BUSBAR_ERROR_VALUE,
                {"row 1, column 3", "\"Xy\""});
  expect_reason(mass_of("\"mole: N2 0.5, nitrogen 0.5\""), BUSBAR_ERROR_VALUE,
                {"\"nitrogen\"", "twice"});
  expect_reason(mass_of("{\"gas\"; \"mole\" | \"N2\"; 1.5 | \"O2\"; -0.5}"), BUSBAR_ERROR_RANGE,
                {"row 3, column 1", "\"O2\"", "-0.5", "negative"});
  expect_reason(mass_of("\"mole: C4H10 1\""), BUSBAR_ERROR_VALUE, {"n-C4H10"});
  expect_reason(mass_of("{\"gas\"; \"mole\" | \"N2\"; \"x\"}"), BUSBAR_ERROR_VALUE,
                {"row 2, column 2", "\"N2\"", "no number"});
  expect_reason(mass_of("{\"gas\"; \"mole\" | 7; 1}"), BUSBAR_ERROR_VALUE,
                {"row 2, column 1", "a name is needed"});
  expect_reason(mass_of("A1:B3"), BUSBAR_ERROR_MISSING, {"row 2, column 1", "no name"},
                "A1=\"gas\" | B1=\"mole\" | A2= | B2=0.5 | A3=\"N2\" | B3=0.5");
  expect_reason(mass_of("A1:B2"), BUSBAR_ERROR_MISSING, {"row 2, column 2", "no amount"},
                "A1=\"gas\" | B1=\"mole\" | A2=\"N2\" | B2=");
  expect_reason(mass_of("A1:B2"), BUSBAR_ERROR_MISSING, {"heading", "no parts"},
                "A1=\"gas\" | B1=\"mole\" | A2= | B2=");
}

TEST(CompositionArgument, IsNoNumberAndNoOtherShape) {
  expect_reason(mass_of("0"), BUSBAR_ERROR_RANGE, {"zero or blank", "composition"});
  expect_reason(mass_of("21"), BUSBAR_ERROR_VALUE, {"is a number"});
  expect_reason(mass_of("{1; 2; 3; 4 | 4; 5; 6; 7 | 7; 8; 9; 1 | 1; 2; 3; 4}"), BUSBAR_ERROR_VALUE,
                {"4 rows and 4 columns", "two columns"});
  expect_reason(mass_of("\"mole: N2 0,79\""), BUSBAR_ERROR_VALUE, {"\"79\"", "point"});
  expect_reason(mass_of("\"mole: N2 1,\""), BUSBAR_ERROR_VALUE, {"is no part"});
  expect_reason(mass_of("\"mole:\""), BUSBAR_ERROR_VALUE, {"is no part"});
}

TEST(Headings, AreReadInTheirUsualSpellings) {
  for (const char* word : {"mole", "Mol", "mole fraction", "mol/mol", " MOLE "}) {
    const auto heading = read_heading(word);
    ASSERT_TRUE(heading) << word;
    EXPECT_EQ(heading->basis, Basis::mole);
    EXPECT_FALSE(heading->percent);
  }
  for (const char* word : {"mole %", "mol%", "mol.-%", "mole percent"}) {
    const auto heading = read_heading(word);
    ASSERT_TRUE(heading) << word;
    EXPECT_TRUE(heading->percent);
  }
  for (const char* word : {"mass %", "wt%", "wt-%", "weight %", "Mass percent"}) {
    const auto heading = read_heading(word);
    ASSERT_TRUE(heading) << word;
    EXPECT_EQ(heading->basis, Basis::mass);
    EXPECT_TRUE(heading->percent);
  }
  for (const char* word :
       {"", "%", "percent", "vol %", "ppm", "mole ppm", "moles", "fraction", "mass mole"}) {
    EXPECT_FALSE(read_heading(word)) << word;
  }
}

}  // namespace
}  // namespace busbar
