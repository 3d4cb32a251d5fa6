// Numbers and texts without a locale.
#include "core/text.hpp"

#include <gtest/gtest.h>

#include <bit>
#include <cmath>
#include <cstdint>
#include <cstdlib>
#include <limits>

#include "random.hpp"

namespace busbar {
namespace {

std::string number(double value, int digits) {
  std::string text;
  append_number(text, value, digits);
  return text;
}

TEST(Number, DropsTrailingZerosAndKeepsThePoint) {
  EXPECT_EQ(number(100, 6), "100");
  EXPECT_EQ(number(0.05, 6), "0.05");
  EXPECT_EQ(number(1.5, 6), "1.5");
  EXPECT_EQ(number(-273.15, 6), "-273.15");
  EXPECT_EQ(number(0, 6), "0");
  EXPECT_EQ(number(-0.0, 6), "0");
  EXPECT_EQ(number(1234567, 6), "1234567");
  EXPECT_EQ(number(0.0001, 6), "0.0001");
  EXPECT_EQ(number(99999.96, 6), "100000");
  EXPECT_EQ(number(0.99999951, 6), "1");
}

TEST(Number, UsesAnExponentFarFromOne) {
  EXPECT_EQ(number(1e15, 6), "1e+15");
  EXPECT_EQ(number(1e-5, 6), "1e-05");
  EXPECT_EQ(number(1e308, 6), "1e+308");
}

// Six digits printed and read again lie within half a unit of the sixth digit; the C library's own
// printing is the second opinion.
TEST(Number, IsRoundedLikeTheCLibrary) {
  support::Random random(1);
  for (int i = 0; i < 20000; ++i) {
    const double value = random.logarithmic(1e-4, 1e14) * (random.chance(0.5) ? 1 : -1);
    const int digits = 1 + static_cast<int>(random.below(12));
    const double read = std::strtod(number(value, digits).c_str(), nullptr);
    char expected[64];
    std::snprintf(expected, sizeof expected, "%.*e", digits - 1, value);
    const double magnitude = std::floor(std::log10(std::abs(value)));
    const double unit = std::max(std::pow(10, magnitude - digits + 1), 1e-15);
    // Scaling to whole units rounds once more: a tie may go the other way.
    EXPECT_LE(std::abs(read - value), 0.5 * unit + 0x1p-52 * std::abs(value)) << expected;
  }
}

TEST(ExactNumber, ReadsBackAsTheSameDouble) {
  support::Random random(2);
  for (int i = 0; i < 20000; ++i) {
    const double value = std::bit_cast<double>(random.bits());
    if (!std::isfinite(value)) continue;
    std::string text;
    append_exact(text, value);
    double read = 0;
    ASSERT_TRUE(read_number(text, read)) << text;
    EXPECT_EQ(std::bit_cast<std::uint64_t>(read), std::bit_cast<std::uint64_t>(value)) << text;
  }
}

TEST(ReadNumber, TakesNothingElse) {
  double value = 0;
  for (const char* text :
       {"", " 1", "1 ", "+1", "1,5", "nan", "inf", "-inf", "infinity", "0x10", "1e", "1e999", "--1",
        "1.2.3", "1e+5x", "one", "00000000000000000000000000000000000000001"}) {
    EXPECT_FALSE(read_number(text, value)) << text;
  }
  EXPECT_FALSE(read_number(std::string_view("1\0", 2), value));
  EXPECT_TRUE(read_number("1e+07", value));
  EXPECT_EQ(value, 1e7);
}

TEST(Prefix, EndsBetweenCharacters) {
  const std::string text = "a°b€c𝄞";
  EXPECT_EQ(prefix_at_boundary(text, 1), 1U);
  EXPECT_EQ(prefix_at_boundary(text, 2), 1U);
  EXPECT_EQ(prefix_at_boundary(text, 3), 3U);
  EXPECT_EQ(prefix_at_boundary(text, 6), 4U);
  EXPECT_EQ(prefix_at_boundary(text, 7), 7U);
  EXPECT_EQ(prefix_at_boundary(text, 11), 8U);
  EXPECT_EQ(prefix_at_boundary(text, 99), text.size());
  EXPECT_EQ(prefix_at_boundary(text, 0), 0U);
  const std::string tails(10, '\x80');
  EXPECT_LE(prefix_at_boundary(tails, 5), 5U);
}

// Cases from RFC 3629, sections 3 and 4.
TEST(Utf8, RefusesWhatIsNotWellFormed) {
  for (const char* good : {"", "abc", "°C", "€", "𝄞", "\xF4\x8F\xBF\xBF", "\xC2\xA0"}) {
    EXPECT_TRUE(is_printable_utf8(good)) << good;
  }
  for (const char* bad : {"\x80", "\xC3", "\xC3(", "\xC0\xAF", "\xC1\xBF", "\xE0\x80\xAF",
                          "\xED\xA0\x80", "\xF4\x90\x80\x80", "\xF8\x88\x80\x80\x80", "\xFF",
                          "a\nb", "\x7F", "\xC2\x85", "\t", "\xE2\x82"}) {
    EXPECT_FALSE(is_printable_utf8(bad)) << bad;
  }
  EXPECT_FALSE(is_printable_utf8(std::string_view("a\0b", 3)));
}

TEST(Quote, IsShortAndPrintable) {
  EXPECT_EQ(quotable("psi"), "psi");
  EXPECT_EQ(quotable("°C"), "°C");
  EXPECT_EQ(quotable(std::string("a\0b\xFF", 4)), "a?b?");
  EXPECT_EQ(quotable(std::string(61, 'x')), std::string(60, 'x') + "…");
  EXPECT_EQ(quotable(std::string(60, 'x')), std::string(60, 'x'));
  support::Random random(4);
  for (int i = 0; i < 10000; ++i) {
    const std::string quote = quotable(random.bytes(random.below(100)));
    EXPECT_TRUE(is_printable_utf8(quote));
    EXPECT_LE(quote.size(), 63U);
  }
}

TEST(Case, OnlyAsciiLettersAreFolded) {
  EXPECT_TRUE(equal_ignoring_case("Metric", "mETRIC"));
  EXPECT_FALSE(equal_ignoring_case("metric", "metric "));
  EXPECT_FALSE(equal_ignoring_case("Ä", "ä"));
  EXPECT_FALSE(equal_ignoring_case("[", "{"));
}

TEST(Trim, TakesSpacesAndTabs) {
  EXPECT_EQ(trimmed(" \t a b\t "), "a b");
  EXPECT_EQ(trimmed(" \t"), "");
  EXPECT_EQ(trimmed(""), "");
}

}  // namespace
}  // namespace busbar
