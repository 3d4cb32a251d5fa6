// The caller's floating-point environment changes no bit of a result, and is there again
// afterwards.
#include <gtest/gtest.h>

#include <cfenv>
#include <string>
#include <vector>

#include "formula.hpp"
#include "value.hpp"
#if defined(__x86_64__)
#include <xmmintrin.h>
#endif

namespace busbar::support {
namespace {

// Arguments are read before the environment changes: only the library is under test.
struct Call {
  std::string name;
  std::vector<Value> arguments;
};

std::vector<Call> calls() {
  std::vector<Call> all;
  const auto n = [](double x) { return Value::number(x); };
  const auto add = [&](const char* name, auto... values) {
    Call one{name, {}};
    (one.arguments.push_back(std::move(values)), ...);
    all.push_back(std::move(one));
  };
  add("STEAM", n(100), n(540), n(55));
  add("TURBINE_OUT", evaluate("STEAM(100; 540; 55)"), n(0.05), n(0.88));
  add("STEAM_TEMPERATURE_AT_ENTHALPY", n(220.7), n(2090));
  add("STEAM_DENSITY", n(222.930643), n(376.85));
  add("SATURATION_TEMPERATURE", n(10), Value::text("us"));
  add("CURZON_AHLBORN", n(565), n(25));
  add("CONVERT_UNIT", n(1), Value::text("psia"), Value::text("bar"));
  add("HEAT_RATE", n(0.4), Value::text("us"));
  add("STEAM_ENTHALPY_AT_ENTROPY", n(1e-300), n(5));
  add("WHY_CALL", Value::text("STEAM"), n(1200), n(540));
  return all;
}

std::vector<Value> results(const std::vector<Call>& all) {
  std::vector<Value> values;
  for (const Call& one : all) values.push_back(call_with(one.name, one.arguments));
  return values;
}

void expect_same(const std::vector<Call>& all, const std::vector<Value>& expected,
                 const std::vector<Value>& got, const char* mode) {
  for (std::size_t i = 0; i < all.size(); ++i) {
    EXPECT_TRUE(same_cell(expected[i], got[i]))
        << all[i].name << " under " << mode << ": " << got[i].shown() << " instead of "
        << expected[i].shown();
  }
}

TEST(Environment, RoundingModeOfTheCallerDoesNotMatter) {
  const std::vector<Call> all = calls();
  const std::vector<Value> expected = results(all);
  for (const int mode : {FE_UPWARD, FE_DOWNWARD, FE_TOWARDZERO}) {
    ASSERT_EQ(std::fesetround(mode), 0);
    const std::vector<Value> got = results(all);
    const int afterwards = std::fegetround();
    std::fesetround(FE_TONEAREST);
    EXPECT_EQ(afterwards, mode);
    expect_same(all, expected, got, "another rounding mode");
  }
}

TEST(Environment, ReasonsAreWrittenInTheSameDigits) {
  const Value failed = call("CARNOT", {Value::number(30.1), Value::number(540.7)});
  const std::string expected = failed.reason();
  std::fesetround(FE_UPWARD);
  const std::string got = failed.reason();
  std::fesetround(FE_TONEAREST);
  EXPECT_EQ(got, expected);
}

TEST(Environment, RaisedFlagsComeBackAsTheyWere) {
  std::feclearexcept(FE_ALL_EXCEPT);
  std::feraiseexcept(FE_DIVBYZERO);
  static_cast<void>(results(calls()));
  const int flags = std::fetestexcept(FE_ALL_EXCEPT);
  std::feclearexcept(FE_ALL_EXCEPT);
  EXPECT_EQ(flags & FE_DIVBYZERO, FE_DIVBYZERO);
}

#if defined(__x86_64__)
TEST(Environment, FlushToZeroOfTheCallerDoesNotMatter) {
  constexpr unsigned kFlushToZero = 0x8040;  // FTZ and DAZ
  const std::vector<Call> all = calls();
  const std::vector<Value> expected = results(all);
  const unsigned before = _mm_getcsr();
  _mm_setcsr(before | kFlushToZero);
  const std::vector<Value> got = results(all);
  const unsigned afterwards = _mm_getcsr();
  _mm_setcsr(before);
  EXPECT_EQ(afterwards & kFlushToZero, kFlushToZero);
  expect_same(all, expected, got, "flush to zero");
}
#endif

}  // namespace
}  // namespace busbar::support
