// Every function with every argument spoilt in every way that a spreadsheet can think of: an error
// of the promised kind with a sentence that names function and argument, never a crash and never a
// number that is not finite.
#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <string>
#include <vector>

#include "calls.hpp"
#include "catalogue/sentence.hpp"
#include "core/text.hpp"

namespace busbar {
namespace {

using support::Value;

constexpr double kInfinity = std::numeric_limits<double>::infinity();
constexpr double kNaN = std::numeric_limits<double>::quiet_NaN();

bool is_number_kind(Kind kind) { return kind == Kind::number || kind == Kind::numbers; }
bool is_stream_kind(Kind kind) { return kind == Kind::stream || kind == Kind::streams; }

// WHY explains a reference inside a spreadsheet; here it refuses every argument. What follows the
// name in WHY_CALL is judged by the function that is explained.
bool takes_values(const Row& row, std::size_t index) {
  return row.types[index].kind != Kind::cell && row.types[index].kind != Kind::rest;
}

void expect_finite_cells(const Value& result, const std::string& call) {
  for (std::size_t r = 0; r < result.rows(); ++r) {
    for (std::size_t c = 0; c < result.columns(); ++c) {
      if (result.kind(r, c) == BUSBAR_NUMBER) {
        EXPECT_TRUE(std::isfinite(result.number_at(r, c))) << call;
      }
      if (result.kind(r, c) != BUSBAR_ERROR) continue;
      const std::string reason = result.reason(r, c);
      EXPECT_NE(result.error_at(r, c), BUSBAR_ERROR_INTERNAL) << call << ": " << reason;
      EXPECT_GE(reason.size(), 10U) << call << ": " << reason;
      EXPECT_EQ(reason.find_first_of("{}"), std::string::npos) << call << ": " << reason;
      EXPECT_EQ(reason.find("nan"), std::string::npos) << call << ": " << reason;
      EXPECT_TRUE(is_printable_utf8(reason)) << call << ": " << reason;
    }
  }
}

// What the table of errors in the design promises, for a value that this kind of argument never
// takes.
void expect_error(const Value& result, std::int32_t kind, const Row& row,
                  const std::string& argument, const std::string& call) {
  ASSERT_EQ(result.kind(), BUSBAR_ERROR) << call << " gives " << result.shown();
  EXPECT_EQ(support::error_word(result.error_at()), support::error_word(kind))
      << call << ": " << result.reason();
  const std::string reason = result.reason();
  EXPECT_EQ(reason.rfind(std::string(row.words.name) + ": ", 0), 0U) << call << ": " << reason;
  EXPECT_NE(reason.find(argument), std::string::npos) << call << ": " << reason;
}

// The same physical arguments as numbers of another unit set.
std::vector<Value> in_units(const Row& row, const std::vector<Value>& metric, UnitSet set) {
  std::vector<Value> values;
  for (std::size_t i = 0; i < metric.size(); ++i) {
    values.emplace_back(metric[i].rows(), metric[i].columns());
    for (std::size_t r = 0; r < metric[i].rows(); ++r) {
      for (std::size_t c = 0; c < metric[i].columns(); ++c) {
        values.back().copy(r, c, metric[i], r, c);
        if (i >= row.types.size() || metric[i].kind(r, c) != BUSBAR_NUMBER) continue;
        const Quantity quantity = row.types[i].quantity;
        const double si = unit_of(UnitSet::metric, quantity).to_si(metric[i].number_at(r, c));
        values.back().set(r, c, unit_of(set, quantity).from_si(si));
      }
    }
  }
  return values;
}

class BadInput : public testing::TestWithParam<const Row*> {
 protected:
  [[nodiscard]] const Row& row() const { return *GetParam(); }
  [[nodiscard]] std::string call_text(std::size_t index, const std::string& what) const {
    return std::string(row().words.name) + ", " + row().arguments[index].name + " = " + what;
  }
  // Checks that every value argument with `value` in its place fails as `kind`.
  void expect(const Value& value, std::int32_t for_numbers, std::int32_t for_streams,
              std::int32_t for_words, const std::string& what) const {
    const std::vector<Value> good = sample::arguments(row());
    for (std::size_t i = 0; i < row().arguments.size(); ++i) {
      const Value result = sample::call(row(), sample::replaced(good, i, &value));
      expect_finite_cells(result, call_text(i, what));
      if (!takes_values(row(), i)) continue;
      const Kind kind = row().types[i].kind;
      const std::int32_t expected = is_number_kind(kind)   ? for_numbers
                                    : is_stream_kind(kind) ? for_streams
                                                           : for_words;
      if (expected == BUSBAR_ERROR_NONE) continue;
      expect_error(result, expected, row(), row().arguments[i].name, call_text(i, what));
    }
  }
};

TEST_P(BadInput, ABlankIsMissing) {
  expect(Value::blank(), BUSBAR_ERROR_MISSING, BUSBAR_ERROR_MISSING, BUSBAR_ERROR_MISSING, "blank");
}

TEST_P(BadInput, AnEmptyTextIsMissing) {
  expect(Value::text(""), BUSBAR_ERROR_MISSING, BUSBAR_ERROR_MISSING, BUSBAR_ERROR_MISSING, "\"\"");
}

TEST_P(BadInput, ATextIsNoNumberAndNoStream) {
  for (const char* text : {"abc", "12", "1,5", "5 bar", "TRUE", "540 °C", "#N/A"}) {
    // Which words are known is for the function to say.
    expect(Value::text(text), BUSBAR_ERROR_VALUE, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_NONE, text);
  }
}

TEST_P(BadInput, ALogicalIsNothing) {
  for (const bool logical : {false, true}) {
    expect(Value::logical(logical), BUSBAR_ERROR_VALUE, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_VALUE,
           "logical");
  }
}

TEST_P(BadInput, AnErrorStaysTheSameError) {
  for (const std::int32_t kind :
       {BUSBAR_ERROR_MISSING, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_RANGE, BUSBAR_ERROR_CONVERGENCE}) {
    expect(Value::error(kind), kind, kind, kind, std::string(support::error_word(kind)));
  }
}

TEST_P(BadInput, ANumberThatIsNotFiniteIsOutOfRange) {
  for (const double number : {kNaN, kInfinity, -kInfinity}) {
    expect(Value::number(number), BUSBAR_ERROR_RANGE, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_VALUE,
           std::to_string(number));
  }
}

TEST_P(BadInput, AnExtremeNumberIsComputedOrRefused) {
  const std::vector<Value> good = sample::arguments(row());
  for (const double number : {1e308, -1e308, 1e-308, 5e-324, -1.0, 1e15, 38.0}) {
    const Value value = Value::number(number);
    expect(value, BUSBAR_ERROR_NONE, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_VALUE,
           std::to_string(number));
    for (std::size_t i = 0; i < row().arguments.size(); ++i) {
      const Value result = sample::call(row(), sample::replaced(good, i, &value));
      if (!is_number_kind(row().types[i].kind) || !result.is_error()) continue;
      // A state of one phase is no failure, but it has no dryness; a subcooled one no superheat.
      // An optional word may be needed after all: "ice" or "water" below 0 °C.
      const std::string reason = result.reason();
      const bool absent = reason.find("there is no") != std::string::npos ||
                          reason.find("is left out") != std::string::npos;
      // One number where a function needs a range of several has the wrong shape.
      const bool shape =
          row().types[i].kind == Kind::numbers && (i >= good.size() || good[i].rows() > 1);
      const std::string_view word = support::error_word(result.error_at());
      if (shape && word == "#VALUE!") continue;
      EXPECT_EQ(word, absent ? "#N/A" : "Err:502") << reason;
    }
  }
}

TEST_P(BadInput, AZeroThatCannotBeAValueIsZeroOrBlank) {
  const std::vector<Value> good = sample::arguments(row());
  const Value zero = Value::number(0);
  for (std::size_t i = 0; i < row().arguments.size(); ++i) {
    if (!takes_values(row(), i)) continue;
    const Value result = sample::call(row(), sample::replaced(good, i, &zero));
    const Argument& argument = row().arguments[i];
    const Unit& unit = unit_of(UnitSet::metric, row().types[i].quantity);
    const double si = unit.to_si(0);
    if (is_number_kind(row().types[i].kind) && si >= argument.low && si <= argument.high) {
      expect_finite_cells(result, call_text(i, "0"));
      continue;
    }
    expect_error(result, BUSBAR_ERROR_RANGE, row(), argument.name, call_text(i, "0"));
    EXPECT_NE(result.reason().find("zero or blank"), std::string::npos) << result.reason();
  }
}

TEST_P(BadInput, BeyondARangeTheSentenceGivesTheLimitInTheUnitsOfTheCall) {
  const std::vector<Value> good = sample::arguments(row());
  for (std::size_t i = 0; i < row().arguments.size(); ++i) {
    if (!is_number_kind(row().types[i].kind)) continue;
    const Argument& argument = row().arguments[i];
    const Quantity quantity = row().types[i].quantity;
    for (const UnitSet set : {UnitSet::metric, UnitSet::us, UnitSet::si}) {
      if (set != UnitSet::metric && !row().has_options) continue;
      const Value options = Value::text(name_of(set));
      for (const bool above : {false, true}) {
        const double limit = above ? argument.high : argument.low;
        if (std::abs(limit) >= kNoLimit || limit == kAboveZero) continue;
        const double span = std::abs(limit) + 1;
        const Value beyond =
            Value::number(unit_of(set, quantity).from_si(above ? limit + span : limit - span));
        const std::vector<Value> others = in_units(row(), good, set);
        std::vector<support::Argument> given = sample::replaced(others, i, &beyond);
        if (row().has_options) {
          given.resize(row().arguments.size(), support::Argument(nullptr));
          given.push_back(options);
        }
        const Value result = sample::call(row(), given);
        expect_error(result, BUSBAR_ERROR_RANGE, row(), argument.name, call_text(i, "beyond"));
        std::string expected;
        append_measure(expected, {limit, quantity}, set);
        EXPECT_NE(result.reason().find(expected), std::string::npos)
            << result.reason() << " does not give the limit " << expected;
      }
    }
  }
}

TEST_P(BadInput, OneCellOfAGridIsAsGoodAsAValue) {
  const std::vector<Value> good = sample::arguments(row());
  const Value expected = support::call_with(row().words.name, good);
  for (std::size_t i = 0; i < good.size(); ++i) {
    if (good[i].rows() * good[i].columns() != 1) continue;
    Value grid(1, 1);
    grid.copy(0, 0, good[i]);
    EXPECT_TRUE(
        support::same_cell(sample::call(row(), sample::replaced(good, i, &grid)), expected));
  }
}

TEST_P(BadInput, TooFewAndTooManyArgumentsAreCounted) {
  const std::vector<Value> good = sample::arguments(row());
  for (std::size_t i = 0; i < row().arguments.size(); ++i) {
    if (row().types[i].optional || row().types[i].kind == Kind::cell) continue;
    const Value left_out = sample::call(row(), sample::replaced(good, i, nullptr));
    expect_error(left_out, BUSBAR_ERROR_MISSING, row(), row().arguments[i].name,
                 call_text(i, "left out"));
    std::vector<support::Argument> cut;
    for (std::size_t k = 0; k < i; ++k) cut.emplace_back(good[k]);
    EXPECT_EQ(sample::call(row(), cut).error_at(), BUSBAR_ERROR_MISSING) << row().words.name;
  }
  const bool takes_more = !row().types.empty() && row().types.back().kind == Kind::rest;
  for (std::size_t extra : {std::size_t{1}, std::size_t{5}, std::size_t{200}}) {
    std::vector<support::Argument> given;
    const Value one = Value::number(1);
    while (given.size() < row().argument_count() + extra) {
      given.push_back(given.size() < good.size() ? support::Argument(good[given.size()])
                                                 : support::Argument(one));
    }
    const Value result = sample::call(row(), given);
    expect_finite_cells(result, row().words.name);
    if (takes_more) continue;
    ASSERT_TRUE(result.is_error()) << row().words.name;
    EXPECT_EQ(support::error_word(result.error_at()), "#VALUE!") << result.reason();
    EXPECT_NE(result.reason().find("argument"), std::string::npos) << result.reason();
    EXPECT_NE(result.reason().find(std::to_string(given.size())), std::string::npos)
        << result.reason();
  }
}

TEST_P(BadInput, ADamagedOrGiantTextIsRefused) {
  const std::string good_text = support::evaluate("STEAM(100; 540; 55)").text_at();
  std::string edited = good_text;
  edited.replace(edited.find("540"), 3, "450");
  const std::vector<std::pair<std::string, std::string>> texts{
      {"edited stream", edited},
      {"cut stream", good_text.substr(0, good_text.size() - 3)},
      {"giant text", std::string(busbar_text_limit(), 'x')},
      {"giant stream", good_text + std::string(60000, ' ')},
      {"binary text", std::string("\xFF\0\xC3(\x01", 5)},
      {"bracket text", std::string(300, '[')},
  };
  for (const auto& [what, text] : texts) {
    expect(Value::text(text), BUSBAR_ERROR_VALUE, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_NONE, what);
    const std::vector<Value> good = sample::arguments(row());
    const Value value = Value::text(text);
    for (std::size_t i = 0; i < row().arguments.size(); ++i) {
      if (row().types[i].kind != Kind::word) continue;
      const Value result = sample::call(row(), sample::replaced(good, i, &value));
      ASSERT_TRUE(result.is_error()) << call_text(i, what);
      EXPECT_EQ(support::error_word(result.error_at()), "#VALUE!") << call_text(i, what);
      EXPECT_LE(result.reason().size(), 300U) << "a sentence quotes a part only";
      EXPECT_TRUE(is_printable_utf8(result.reason())) << what;
    }
  }
}

TEST_P(BadInput, AnUnknownUnitSetIsNamed) {
  if (!row().has_options) return;
  const std::vector<Value> good = sample::arguments(row());
  const std::size_t at = row().arguments.size();
  const auto with = [&](const Value& options) {
    return sample::call(row(), sample::replaced(good, at, &options));
  };
  for (const char* word : {"imperial", "metrics", "SI units", "metric,us", "si;si", ",", "m\xFF"}) {
    const Value result = with(Value::text(word));
    expect_error(result, BUSBAR_ERROR_VALUE, row(), "options", word);
    EXPECT_NE(result.reason().find('"'), std::string::npos) << result.reason();
  }
  expect_error(with(Value::text("")), BUSBAR_ERROR_MISSING, row(), "options", "\"\"");
  expect_error(with(Value::blank()), BUSBAR_ERROR_MISSING, row(), "options", "blank");
  expect_error(with(Value::number(0)), BUSBAR_ERROR_RANGE, row(), "options", "0");
  EXPECT_NE(with(Value::number(0)).reason().find("zero or blank"), std::string::npos);
  expect_error(with(Value::number(1)), BUSBAR_ERROR_VALUE, row(), "options", "1");
  expect_error(with(Value::number(kNaN)), BUSBAR_ERROR_VALUE, row(), "options", "NaN");
  expect_error(with(Value::logical(true)), BUSBAR_ERROR_VALUE, row(), "options", "TRUE");
  expect_error(with(Value(2, 1)), BUSBAR_ERROR_VALUE, row(), "options", "a range");
  const Value missing = with(Value::error(BUSBAR_ERROR_MISSING));
  EXPECT_TRUE(missing.is_error());
}

INSTANTIATE_TEST_SUITE_P(Functions, BadInput,
                         testing::ValuesIn(functions::all().begin(), functions::all().end()),
                         [](const auto& tested) { return std::string(tested.param->words.name); });

// --- Slips that a user makes --------------------------------------------------------------------

std::string reason_of(const std::string& formula) { return support::evaluate(formula).reason(); }

void expect_reason(const std::string& formula, std::int32_t kind,
                   const std::vector<std::string>& parts) {
  const Value result = support::evaluate(formula);
  ASSERT_TRUE(result.is_error()) << formula << " gives " << result.shown();
  EXPECT_EQ(support::error_word(result.error_at()), support::error_word(kind)) << result.reason();
  for (const std::string& part : parts) {
    EXPECT_NE(result.reason().find(part), std::string::npos)
        << formula << ": \"" << result.reason() << "\" lacks \"" << part << '"';
  }
}

TEST(Slips, APercentageIsNoFraction) {
  expect_reason("HEAT_RATE(38)", BUSBAR_ERROR_RANGE, {"efficiency", "38", "0.38", "percentage"});
  expect_reason("TURBINE_OUT(STEAM(100; 540); 0.05; 88)", BUSBAR_ERROR_RANGE,
                {"isentropic efficiency", "0.88", "percentage"});
  expect_reason("GENERATOR_POWER(100; 98.5)", BUSBAR_ERROR_RANGE, {"0.985"});
  expect_reason("EFFICIENCY_CHAIN({0.9; 95})", BUSBAR_ERROR_RANGE,
                {"row 1, column 2", "0.95", "percentage"});
  expect_reason("STEAM_AT_DRYNESS(10; 88)", BUSBAR_ERROR_RANGE, {"dryness", "0.88"});
  EXPECT_EQ(reason_of("HEAT_RATE(150)").find("percentage"), std::string::npos);
}

TEST(Slips, CelsiusGivenAsKelvinAndTheOtherWayRound) {
  expect_reason("STEAM(10000000; 240; ; \"si\")", BUSBAR_ERROR_RANGE,
                {"temperature", "240 K", "273.15 K"});
  expect_reason("SATURATION_PRESSURE(500)", BUSBAR_ERROR_RANGE,
                {"temperature", "500 °C", "373.946 °C"});
  expect_reason("SATURATION_PRESSURE(100; \"si\")", BUSBAR_ERROR_RANGE, {"100 K", "273.15 K"});
  expect_reason("STEAM(600; 813.15)", BUSBAR_ERROR_RANGE, {"813.15 °C", "800 °C"});
  expect_reason("STEAM_ENTHALPY(14.7; 20; \"us\")", BUSBAR_ERROR_RANGE, {"20 °F", "32 °F"});
}

TEST(Slips, PressuresInAnotherUnitLeaveTheRange) {
  expect_reason("STEAM(10000000; 540)", BUSBAR_ERROR_RANGE,
                {"pressure", "10000000 bar", "1000 bar"});
  expect_reason("ABSOLUTE_PRESSURE(99; 1013)", BUSBAR_ERROR_RANGE,
                {"ambient", "1013 bar", "1.1 bar"});
  expect_reason("ABSOLUTE_FROM_VACUUM(28; 14.7; \"us\")", BUSBAR_ERROR_RANGE, {"vacuum", "psi"});
}

TEST(Slips, WrongDimensionsAndUnknownUnitsAreNamed) {
  expect_reason("CONVERT_UNIT(1; \"bar\"; \"kg\")", BUSBAR_ERROR_VALUE, {"to", "\"kg\""});
  expect_reason("CONVERT_UNIT(1; \"parsnip\"; \"kg\")", BUSBAR_ERROR_VALUE,
                {"from", "\"parsnip\""});
  expect_reason("CONVERT_UNIT(1; \"psi\"; \"bar\")", BUSBAR_ERROR_VALUE, {"psia", "psig"});
  expect_reason("CONVERT_UNIT(1; \"psig\"; \"bar\")", BUSBAR_ERROR_VALUE, {"ABSOLUTE_PRESSURE"});
  expect_reason("CONVERT_UNIT(-300; \"°C\"; \"K\")", BUSBAR_ERROR_RANGE,
                {"value", "-300", "absolute zero"});
  expect_reason("EFFICIENCY_ON_BASIS(0.5; \"net\"; \"HHV\"; 55; 50)", BUSBAR_ERROR_VALUE,
                {"from basis", "\"net\"", "LHV"});
}

TEST(Slips, FlowsMustBeThereAndEqual) {
  expect_reason("FLUID_POWER(STEAM(100; 540); STEAM(10; 300; 5))", BUSBAR_ERROR_MISSING,
                {"inlet", "SET_FLOW"});
  expect_reason("FLUID_POWER(STEAM(100; 540; 5); STEAM(10; 300))", BUSBAR_ERROR_MISSING,
                {"outlet", "SET_FLOW"});
  expect_reason("HEAT_DUTY(STEAM(100; 230; 50); STEAM(100; 540; 55))", BUSBAR_ERROR_RANGE,
                {"outlet", "55 kg/s", "50 kg/s"});
  expect_reason("MIX_OUT({1})", BUSBAR_ERROR_VALUE, {"streams"});
}

TEST(Slips, AFlowOfZeroFromABlankCellIsRefused) {
  expect_reason("STEAM(100; 540; 0)", BUSBAR_ERROR_RANGE, {"flow", "zero or blank"});
  EXPECT_TRUE(support::evaluate("SET_FLOW(STEAM(100; 540); 0)").is_text());
}

TEST(Slips, ABlankTemperatureThatIsZeroCelsiusIsNotedInTheExplanation) {
  const std::string text =
      support::explain("STEAM_ENTHALPY", {Value::number(10), Value::number(0)});
  EXPECT_NE(text.find("exactly 0"), std::string::npos) << text;
  EXPECT_NE(text.find("blank"), std::string::npos) << text;
}

}  // namespace
}  // namespace busbar
