// What is taken as an analysis, and what is refused with which reason.
#include "fuel/solid/analysis.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>
#include <vector>

namespace busbar::fuel::solid {
namespace {

using Entries = std::vector<Entry>;

Failure refused(State state, const Entries& entries) {
  const Outcome<Analysis> analysis = read(state, entries);
  EXPECT_FALSE(analysis);
  EXPECT_EQ(analysis.failure().argument, 1);
  return analysis.failure();
}

bool says(const Failure& failure, std::string_view words) {
  return std::string_view(failure.reason).find(words) != std::string_view::npos;
}

const Entries kBeech{{"C", 0.4969}, {"H", 0.0607}, {"O", 0.4381}, {"N", 0.0041}, {"S", 0.0002}};

TEST(States, HaveTheWordsOfTheTrade) {
  for (const char* word : {"as received", "As Received", "ar", "as-received"}) {
    EXPECT_EQ(state_named(word), State::as_received) << word;
  }
  for (const char* word : {"air-dried", "air dried", "ad", "adb"}) {
    EXPECT_EQ(state_named(word), State::air_dried) << word;
  }
  for (const char* word : {"dry", "d", "db", "DRY"}) EXPECT_EQ(state_named(word), State::dry);
  for (const char* word : {"daf", "dry ash-free", "dry, ash free", "DAF"}) {
    EXPECT_EQ(state_named(word), State::dry_ash_free) << word;
  }
  for (const char* word : {"", "wet", "raw", "maf", "a", "drydry"}) {
    EXPECT_FALSE(state_named(word)) << word;
  }
  EXPECT_FALSE(state_named(std::string(1000, 'd')));
}

TEST(Analysis, IsReadByPartsInAnyOrderAndSpelling) {
  const Outcome<Analysis> analysis = read(State::as_received, Entries{{"moisture", 0.1},
                                                                      {"Carbon", 0.6},
                                                                      {"h", 0.04},
                                                                      {"oxygen", 0.1},
                                                                      {"sulfur", 0.01},
                                                                      {"N", 0.01},
                                                                      {"CL", 0},
                                                                      {"Ash", 0.14}});
  ASSERT_TRUE(analysis);
  EXPECT_EQ((*analysis)[Part::carbon], 0.6);
  EXPECT_EQ((*analysis)[Part::sulphur], 0.01);
  EXPECT_EQ((*analysis)[Part::moisture], 0.1);
  EXPECT_TRUE(analysis->has(Part::chlorine));
  EXPECT_FALSE(analysis->has_proximate());
  EXPECT_NEAR(ultimate_sum(*analysis), 1, 1e-15);
}

TEST(Analysis, ThatDoesNotCloseSaysByHowMuch) {
  Entries entries = kBeech;
  entries.push_back({"ash", 0.02});
  Failure failure = refused(State::dry, entries);
  EXPECT_EQ(failure.fault, Fault::impossible);
  EXPECT_TRUE(says(failure, "too much"));
  EXPECT_NEAR(failure.measures[0].si, 1.02, 1e-12);
  EXPECT_NEAR(failure.measures[1].si, 0.02, 1e-12);
  entries = kBeech;
  entries[2].share = 0.40;
  failure = refused(State::dry, entries);
  EXPECT_TRUE(says(failure, "is missing"));
  EXPECT_NEAR(failure.measures[1].si, 0.0381, 1e-12);
  // Rounding to tenths of a percent passes.
  entries[2].share = 0.436;
  EXPECT_TRUE(read(State::dry, entries));
}

TEST(Analysis, TellsHydrogenWithAndWithoutThatOfMoisture) {
  // 10 % moisture; the elements of 0.9 kg of dry fuel.
  const double moisture = 0.1;
  const Entries without{{"C", 0.63}, {"H", 0.045}, {"O", 0.135}, {"ash", 0.09}, {"moisture", 0.1}};
  ASSERT_TRUE(read(State::as_received, without));
  Entries with = without;
  with[1].share += 0.1119 * moisture;
  with[2].share += 0.8881 * moisture;
  const Failure failure = refused(State::as_received, with);
  EXPECT_TRUE(says(failure, "include those of the moisture"));
  with[1].name = "H including moisture";
  with[2].name = "O including moisture";
  const Outcome<Analysis> analysis = read(State::as_received, with);
  ASSERT_TRUE(analysis);
  EXPECT_NEAR((*analysis)[Part::hydrogen], 0.045, 1e-15);
  EXPECT_NEAR((*analysis)[Part::oxygen], 0.135, 1e-15);
  with[1].share = 0.01;
  EXPECT_TRUE(says(refused(State::as_received, with), "moisture alone holds"));
}

TEST(Analysis, OfMoistFuelStatesItsMoisture) {
  Entries entries = kBeech;
  const Failure failure = refused(State::as_received, entries);
  EXPECT_EQ(failure.fault, Fault::missing);
  EXPECT_TRUE(says(failure, "states no moisture"));
  EXPECT_TRUE(says(refused(State::air_dried, entries), "states no moisture"));
  entries.push_back({"moisture", 0.0});
  EXPECT_TRUE(read(State::as_received, entries));
  EXPECT_TRUE(read(State::dry, entries));
  entries.back().share = 0.1;
  EXPECT_TRUE(says(refused(State::dry, entries), "is dry and states moisture"));
  EXPECT_TRUE(says(refused(State::dry_ash_free, entries), "states moisture"));
  entries.back() = {"ash", 0.1};
  EXPECT_TRUE(says(refused(State::dry_ash_free, entries), "states ash"));
}

TEST(Analysis, NamesTheLineToBlame) {
  Entries entries = kBeech;
  entries.push_back({"unobtainium", 0.1});
  Failure failure = refused(State::dry, entries);
  EXPECT_EQ(failure.fault, Fault::unknown_word);
  EXPECT_EQ(failure.row, 6U);
  entries.back() = {"carbon", 0.1};
  failure = refused(State::dry, entries);
  EXPECT_TRUE(says(failure, "second time"));
  EXPECT_EQ(failure.row, 6U);
  entries = kBeech;
  entries[1].share = -0.01;
  failure = refused(State::dry, entries);
  EXPECT_TRUE(says(failure, "below nought"));
  EXPECT_EQ(failure.row, 2U);
  entries[1].share = std::nan("");
  EXPECT_FALSE(read(State::dry, entries));
  entries.push_back({"moisture", 1.2});
  entries[1].share = 0.06;
  failure = refused(State::as_received, entries);
  EXPECT_TRUE(says(failure, "only moisture counted on dry mass"));
}

TEST(Analysis, WithoutAnythingToBurnIsNone) {
  EXPECT_TRUE(says(refused(State::dry, {{"ash", 1}}), "nothing that burns"));
  EXPECT_TRUE(says(refused(State::as_received, {{"moisture", 1}}), "nothing that burns"));
  EXPECT_TRUE(says(refused(State::dry, {{"O", 0.7}, {"N", 0.3}}), "nothing that burns"));
  EXPECT_TRUE(
      says(refused(State::as_received, {{"moisture", 1}, {"C", 0.004}}), "nothing that burns"));
  EXPECT_TRUE(says(refused(State::dry, {}), "nothing that burns"));
}

TEST(Proximate, FixedCarbonIsWhatRemains) {
  const Outcome<Analysis> analysis =
      read(State::as_received, Entries{{"VM", 0.372}, {"ash", 0.091}, {"moisture", 0.0165}});
  ASSERT_TRUE(analysis);
  EXPECT_NEAR((*analysis)[Part::fixed_carbon], 0.5205, 1e-15);
  EXPECT_TRUE(says(refused(State::dry, {{"VM", 0.4}}), "neither fixed carbon nor ash"));
  EXPECT_TRUE(says(refused(State::dry, {{"VM", 0.9}, {"ash", 0.2}}), "too much"));
  EXPECT_TRUE(says(refused(State::dry, {{"FC", 0.4}, {"ash", 0.1}}), "no volatile matter"));
  EXPECT_TRUE(says(refused(State::dry, {{"VM", 0.4}, {"FC", 0.4}, {"ash", 0.1}}), "is missing"));
  EXPECT_TRUE(read(State::dry_ash_free, Entries{{"VM", 0.4}}));
}

}  // namespace
}  // namespace busbar::fuel::solid
