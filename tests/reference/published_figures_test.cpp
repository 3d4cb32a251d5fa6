// Every function against figures that somebody outside the project has published.
//
// Columns of a file: id; formula; given (cells that the formula reads); expected (a number, the
// beginning of a text, or an error word); digits (significant digits that the source prints, or
// "exact" for a definition); table_difference (relative; only where the source rests on other steam
// tables or on a fitted equation of known deviation, argued in the note); source; place; note.
//
// The tolerance is computed: half a unit of the last printed digit, plus the table difference, plus
// what the result moves when the rounded inputs of the formula (written "~2758") move by half a
// unit of their own last digit.
#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <set>

#include "catalogue.hpp"
#include "csv.hpp"
#include "formula.hpp"
#include "paths.hpp"
#include "printed.hpp"

namespace busbar::reference {
namespace {

using support::CsvLine;

// A definition holds exactly; the few roundings of a short computation in doubles do not.
constexpr double kExact = 8 * std::numeric_limits<double>::epsilon();

bool is_error_word(const std::string& text) {
  return text == "#N/A" || text == "#VALUE!" || text == "Err:502" || text == "Err:523";
}

double evaluated(const std::string& formula, const std::string& given) {
  const support::Value value = support::evaluate(formula, given);
  return value.is_number() ? value.number_at() : std::numeric_limits<double>::quiet_NaN();
}

// How far the result moves when the rounded inputs move within what their digits promise.
double input_spread(const CsvLine& line, double central) {
  const std::string& formula = line.at("formula");
  const std::string& given = line.at("given");
  double spread = 0;
  const auto add = [&](bool in_formula) {
    const auto rounded = support::rounded_numbers(in_formula ? formula : given);
    for (std::size_t i = 0; i < rounded.size(); ++i) {
      double widest = 0;
      for (const double side : {-1.0, 1.0}) {
        const double shift = side * rounded[i].half_unit;
        const double moved = evaluated(
            in_formula ? support::plain_formula(formula, i, shift)
                       : support::plain_formula(formula),
            in_formula ? support::plain_formula(given) : support::plain_formula(given, i, shift));
        widest = std::max(widest, std::abs(moved - central));
      }
      spread += widest;
    }
  };
  add(true);
  add(false);
  return spread;
}

double tolerance(const CsvLine& line, double expected, double central) {
  const std::string& digits = line.at("digits");
  double allowed = input_spread(line, central);
  if (digits == "exact") {
    allowed += kExact * std::abs(expected);
  } else {
    allowed += support::half_unit(expected, std::stoi(digits));
  }
  const std::string& difference = line.at("table_difference");
  if (!difference.empty()) {
    allowed += support::number_in(difference).value() * std::abs(expected);
  }
  // The decimal fractions of the table are not exact doubles.
  return allowed * (1 + 1e-9) + kExact * std::abs(expected);
}

class PublishedFigures : public testing::TestWithParam<Function> {};

TEST_P(PublishedFigures, AreReproduced) {
  const std::string path = (support::reference_directory() / GetParam().reference_file()).string();
  const support::Csv csv = support::read_csv(path);
  ASSERT_FALSE(csv.lines.empty()) << path;
  std::set<std::string> ids;
  for (const CsvLine& line : csv.lines) {
    SCOPED_TRACE(path + ":" + std::to_string(line.number) + " " + line.at("id"));
    EXPECT_TRUE(ids.insert(line.at("id")).second) << "the id stands twice";
    EXPECT_FALSE(line.at("source").empty());
    EXPECT_FALSE(line.at("place").empty());
    EXPECT_TRUE(line.at("table_difference").empty() || !line.at("note").empty())
        << "a table difference is argued in the note";
    const std::string& formula = line.at("formula");
    EXPECT_NE((formula + line.at("given")).find(GetParam().name + '('), std::string::npos)
        << "the row does not call " << GetParam().name;

    const support::Value got = support::evaluate(support::plain_formula(formula),
                                                 support::plain_formula(line.at("given")));
    const std::string& expected = line.at("expected");
    if (is_error_word(expected)) {
      EXPECT_EQ(support::error_word(got.error_at()), expected) << got.shown();
      continue;
    }
    const auto number = support::number_in(expected);
    if (!number) {
      ASSERT_FALSE(expected.empty());
      EXPECT_EQ(got.text_at().substr(0, expected.size()), expected) << got.shown();
      continue;
    }
    ASSERT_TRUE(got.is_number()) << got.shown();
    const double allowed = tolerance(line, *number, got.number_at());
    EXPECT_LE(std::abs(got.number_at() - *number), allowed)
        << "expected " << expected << ", got " << got.shown() << ", allowed " << allowed;
  }
}

INSTANTIATE_TEST_SUITE_P(Catalogue, PublishedFigures, testing::ValuesIn(catalogue()),
                         [](const auto& tested) { return tested.param.name; });

}  // namespace
}  // namespace busbar::reference
