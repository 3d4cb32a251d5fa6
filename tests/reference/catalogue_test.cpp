// What every row of the catalogue must have, and the promise that names never change.
#include "catalogue.hpp"

#include <gtest/gtest.h>

#include <algorithm>
#include <filesystem>
#include <fstream>
#include <set>

#include "formula.hpp"
#include "paths.hpp"
#include "printed.hpp"

namespace busbar::reference {
namespace {

constexpr std::size_t kLongestSummary = 90;
// An example shows at least so many digits of a number that has them.
constexpr int kExampleDigits = 6;

TEST(Catalogue, IsNotEmpty) { EXPECT_GE(catalogue().size(), 55U); }

TEST(Catalogue, NamesAreCapitalsDigitsAndUnderscores) {
  std::set<std::string> seen;
  for (const Function& function : catalogue()) {
    EXPECT_TRUE(seen.insert(function.name).second) << function.name << " stands twice";
    ASSERT_FALSE(function.name.empty());
    EXPECT_TRUE(function.name.front() >= 'A' && function.name.front() <= 'Z') << function.name;
    EXPECT_TRUE(std::all_of(function.name.begin(), function.name.end(), [](char c) {
      return (c >= 'A' && c <= 'Z') || (c >= '0' && c <= '9') || c == '_';
    })) << function.name;
  }
}

TEST(Catalogue, ArgumentNamesAreUniqueInTheirRow) {
  for (const Function& function : catalogue()) {
    std::set<std::string> seen;
    for (std::size_t i = 0; i < function.argument_count(); ++i) {
      EXPECT_FALSE(function.argument(i).empty()) << function.name;
      EXPECT_TRUE(seen.insert(function.argument(i)).second)
          << function.name << ": " << function.argument(i);
    }
  }
}

TEST(Catalogue, SummariesAreShortAndHaveNoFinalPeriod) {
  for (const Function& function : catalogue()) {
    const std::string summary = function.text(BUSBAR_FUNCTION_SUMMARY);
    EXPECT_FALSE(summary.empty()) << function.name;
    EXPECT_LE(summary.size(), kLongestSummary) << function.name;
    EXPECT_NE(summary.back(), '.') << function.name;
  }
}

TEST(Catalogue, EveryRowHasSourceExampleResultAndVersion) {
  for (const Function& function : catalogue()) {
    for (const std::int32_t field :
         {BUSBAR_FUNCTION_SOURCE, BUSBAR_FUNCTION_EXAMPLE, BUSBAR_FUNCTION_EXAMPLE_ANSWER,
          BUSBAR_FUNCTION_RESULT, BUSBAR_FUNCTION_SINCE, BUSBAR_FUNCTION_CHAPTER}) {
      EXPECT_FALSE(function.text(field).empty()) << function.name << ", field " << field;
    }
    EXPECT_NE(function.text(BUSBAR_FUNCTION_EXAMPLE).find(function.name + '('), std::string::npos)
        << function.name << ": the example shows another function";
  }
}

TEST(Catalogue, EveryRowHasItsReferenceFile) {
  for (const Function& function : catalogue()) {
    EXPECT_TRUE(std::filesystem::exists(support::reference_directory() / function.reference_file()))
        << function.reference_file();
  }
}

TEST(Catalogue, EveryReferenceFileHasItsRow) {
  std::set<std::string> expected;
  for (const Function& function : catalogue()) expected.insert(function.reference_file());
  const std::filesystem::path root = support::reference_directory();
  for (const auto& entry : std::filesystem::recursive_directory_iterator(root)) {
    const std::string path = std::filesystem::relative(entry.path(), root).generic_string();
    // Tables of the sources themselves, read by the tests of the domains.
    if (path.rfind("water-releases", 0) == 0 || path.rfind("gas-tables", 0) == 0 ||
        entry.path().extension() != ".csv") {
      continue;
    }
    EXPECT_TRUE(expected.count(path)) << path << " belongs to no function";
  }
}

TEST(Catalogue, AChapterIsOneBlock) {
  std::set<std::string> left;
  std::string current;
  for (const Function& function : catalogue()) {
    if (function.chapter == current) continue;
    EXPECT_FALSE(left.count(function.chapter)) << function.chapter << " is torn apart";
    left.insert(current);
    current = function.chapter;
  }
}

TEST(Catalogue, LooksUpAndCountsConsistently) {
  const std::vector<Function> functions = catalogue();
  for (std::size_t i = 0; i < functions.size(); ++i) {
    const std::string& name = functions[i].name;
    EXPECT_EQ(busbar_find(name.data(), name.size()), functions[i].handle);
    EXPECT_EQ(busbar_function_index(functions[i].handle), i);
  }
  EXPECT_EQ(busbar_function_index(nullptr), functions.size());
  EXPECT_EQ(busbar_function_at(functions.size()), nullptr);
}

TEST(Catalogue, RequiredArgumentsStandBeforeOptionalOnes) {
  for (const Function& function : catalogue()) {
    bool optional_seen = false;
    for (std::size_t i = 0; i < function.argument_count(); ++i) {
      EXPECT_TRUE(function.is_optional(i) || !optional_seen) << function.name;
      optional_seen = optional_seen || function.is_optional(i);
    }
  }
}

TEST(Catalogue, NamesAndArgumentOrdersNeverChange) {
  std::ifstream file(support::engine_directory() / "functions/names.lock");
  ASSERT_TRUE(file) << "engine/functions/names.lock is missing";
  std::vector<std::string> locked;
  for (std::string line; std::getline(file, line);) locked.push_back(line);
  EXPECT_TRUE(std::is_sorted(locked.begin(), locked.end())) << "names.lock: LC_ALL=C sort";
  std::set<std::string> present;
  for (const Function& function : catalogue()) present.insert(function.signature());

  for (const std::string& line : locked) {
    EXPECT_TRUE(present.count(line)) << line << " stands in names.lock but not in the catalogue: "
                                     << "names and argument orders are for ever";
  }
  for (const std::string& line : present) {
    EXPECT_TRUE(std::binary_search(locked.begin(), locked.end(), line))
        << "add to engine/functions/names.lock: " << line;
  }
}

// WHY follows references between the cells of a spreadsheet; the host answers it, and the tests in
// Calc run its example.
bool is_answered_by_the_host(const Function& function) { return function.name == "WHY"; }

TEST(Examples, GiveTheirPrintedAnswers) {
  for (const Function& function : catalogue()) {
    if (is_answered_by_the_host(function)) continue;
    const std::string formula = function.text(BUSBAR_FUNCTION_EXAMPLE);
    const std::string answer = function.text(BUSBAR_FUNCTION_EXAMPLE_ANSWER);
    const support::Value got =
        support::evaluate(formula, function.text(BUSBAR_FUNCTION_EXAMPLE_GIVEN));
    const auto printed = support::number_in(answer);
    if (!printed) {
      EXPECT_EQ(got.text_at().substr(0, answer.size()), answer)
          << formula << " gives " << got.shown();
      continue;
    }
    ASSERT_TRUE(got.is_number()) << formula << " gives " << got.shown();
    // Digits that the answer leaves out are zeros.
    const int digits = std::max(kExampleDigits, support::significant_digits(answer));
    EXPECT_NEAR(got.number_at(), *printed, support::half_unit(*printed, digits) * (1 + 1e-9))
        << formula << " gives " << got.shown();
  }
}

}  // namespace
}  // namespace busbar::reference
