// Names of components: the standard's own, synonyms, formulas, and what is refused.
#include "fuel/gaseous/names.hpp"

#include <gtest/gtest.h>

#include <map>
#include <string>

#include "fuel/gaseous/component.hpp"
#include "fuel/gaseous/names_table.hpp"

namespace busbar::fuel::gaseous {
namespace {

std::string_view found(std::string_view name) {
  const auto component = component_named(name);
  return component ? components()[*component].name : "";
}

TEST(GasNames, TheStandardsOwnNamesAreKnown) {
  for (std::size_t i = 0; i < kComponents; ++i) {
    EXPECT_EQ(found(components()[i].name), components()[i].name);
  }
}

TEST(GasNames, EverySynonymIsFoundAndFolded) {
  for (const Synonym& synonym : kSynonyms) {
    ASSERT_GE(synonym.number, 1);
    ASSERT_LE(synonym.number, kComponents);
    EXPECT_EQ(found(synonym.name), components()[synonym.number - std::size_t{1}].name);
  }
}

TEST(GasNames, CapitalsSpacesHyphensCommasAndSubscriptsDoNotCount) {
  EXPECT_EQ(found("Methane"), "methane");
  EXPECT_EQ(found("CARBON DIOXIDE"), "carbon dioxide");
  EXPECT_EQ(found(" CO₂ "), "carbon dioxide");
  EXPECT_EQ(found("C₂H₆"), "ethane");
  EXPECT_EQ(found("i-C4H10"), "isobutane");
  EXPECT_EQ(found("n-C5"), "n-pentane");
  EXPECT_EQ(found("2,2-Dimethylpropane"), "neopentane");
  EXPECT_EQ(found("Hydrogen sulfide"), "hydrogen sulphide");
}

// A hydrocarbon formula means one component only if no other of the standard has the same atoms.
TEST(GasNames, AFormulaIsKnownWhereItIsUnique) {
  std::map<std::string, int> count;
  const auto formula = [](const Component& component) {
    std::string text("C");
    text += std::to_string(component.atoms[kC]);
    text += 'H';
    text += std::to_string(component.atoms[kH]);
    return text;
  };
  for (const Component& component : components()) {
    if (component.atoms[kC] > 1 && component.atoms[kH] > 0 && component.atoms[kO] == 0 &&
        component.atoms[kN] == 0 && component.atoms[kS] == 0) {
      ++count[formula(component)];
    }
  }
  for (const Component& component : components()) {
    const auto at = count.find(formula(component));
    if (at == count.end()) continue;
    // C3H4 has a common isomer that the standard lacks.
    const bool known = at->second == 1 && at->first != "C3H4";
    EXPECT_EQ(found(at->first), known ? component.name : "") << at->first;
  }
}

TEST(GasNames, WhatIsAmbiguousIsRefusedWithAHint) {
  for (const char* name : {"butane", "C4H10", "C4", "pentane"}) {
    const auto component = component_named(name);
    ASSERT_FALSE(component) << name;
    EXPECT_EQ(component.failure().fault, Fault::unknown_word);
    EXPECT_NE(std::string(component.failure().reason).find("several substances"),
              std::string::npos);
  }
  EXPECT_STREQ(component_named("C6+").failure().reason, kGroup);
  EXPECT_STREQ(component_named("air").failure().reason, kMixtureName);
}

TEST(GasNames, AnythingElseIsUnknown) {
  for (const std::string& name :
       {std::string(), std::string("-"), std::string("radon"), std::string("C1H4"),
        std::string(100000, 'a'), std::string("ch4\0", 4), std::string("\xE2\x82"),
        std::string("\xFF\xFE"), std::string("cis-2-butene-and-something-far-longer-than-that")}) {
    EXPECT_FALSE(component_named(name)) << name.substr(0, 20);
  }
}

}  // namespace
}  // namespace busbar::fuel::gaseous
