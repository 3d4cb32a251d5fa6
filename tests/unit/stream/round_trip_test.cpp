// A stream and its text are one and the same.
#include <gtest/gtest.h>

#include <bit>
#include <clocale>
#include <cmath>
#include <locale>

#include "sample.hpp"

namespace busbar {
namespace {

bool same(double a, double b) {
  return std::bit_cast<std::uint64_t>(a) == std::bit_cast<std::uint64_t>(b);
}

void expect_same(const Stream& a, const Stream& b, const std::string& text) {
  EXPECT_EQ(a.phase, b.phase) << text;
  EXPECT_TRUE(same(a.pressure, b.pressure)) << text;
  EXPECT_TRUE(same(a.temperature, b.temperature)) << text;
  EXPECT_TRUE(same(a.enthalpy, b.enthalpy)) << text;
  EXPECT_EQ(std::isnan(a.dryness), std::isnan(b.dryness)) << text;
  if (!std::isnan(a.dryness)) {
    EXPECT_TRUE(same(a.dryness, b.dryness)) << text;
  }
  EXPECT_EQ(a.flow.has_value(), b.flow.has_value()) << text;
  if (a.flow && b.flow) {
    EXPECT_TRUE(same(*a.flow, *b.flow)) << text;
  }
  EXPECT_EQ(a.tag.text(), b.tag.text()) << text;
  EXPECT_EQ(a.mixture, b.mixture) << text;
  EXPECT_EQ(a.mixture.molar_mass(), b.mixture.molar_mass()) << text;
  EXPECT_EQ(a.datum, b.datum) << text;
}

TEST(StreamText, ComesBackExactlyInEveryUnitSet) {
  support::Random random(11);
  for (int i = 0; i < 30000; ++i) {
    const Stream stream = sample::stream(random);
    const UnitSet set = sample::unit_set(random);
    const std::string text = sample::text_of(stream, set);
    ASSERT_LE(text.size(), kStreamTextLimit);
    const Outcome<Stream> read = read_stream(text);
    ASSERT_TRUE(read) << text << ": " << read.failure().reason;
    expect_same(stream, *read, text);
    EXPECT_EQ(read->face, set) << text;
    EXPECT_EQ(sample::text_of(*read, read->face), text);
  }
}

TEST(StreamText, IsOneLineOfPrintableText) {
  support::Random random(12);
  for (int i = 0; i < 1000; ++i) {
    const std::string text = sample::text_of(sample::stream(random), sample::unit_set(random));
    EXPECT_EQ(text.find_first_of("\n\r\t"), std::string::npos);
    EXPECT_EQ(text.back(), ']');
  }
}

// The shape that the design promises: a face for people, then version, exact numbers, check digits.
TEST(StreamText, ReadsAsPromised) {
  Stream stream;
  stream.phase = Phase::vapour;
  stream.pressure = 1e7;
  stream.temperature = 813.15;
  stream.enthalpy = 3476868.5;
  stream.flow = 55.0;
  stream.tag = *Tag::from("LBA10");
  const auto without_digits = [&](UnitSet set) {
    const std::string text = sample::text_of(stream, set);
    return text.substr(0, text.find('#'));
  };
  EXPECT_EQ(without_digits(UnitSet::metric),
            "LBA10: steam 55 kg/s, 100 bar, 540 °C [1 p=1e+07 t=813.15 h=3476868.5 m=55 ");
  EXPECT_EQ(without_digits(UnitSet::si),
            "LBA10: steam 55 kg/s, 10000000 Pa, 813.15 K [1 p=1e+07 t=813.15 h=3476868.5 m=55 ");
  EXPECT_EQ(
      without_digits(UnitSet::us),
      "LBA10: steam 436515 lb/h, 1450.38 psia, 1004 °F [1 p=1e+07 t=813.15 h=3476868.5 m=55 ");
}

TEST(StreamText, AZeroFlowStands) {
  Stream stream;
  stream.pressure = 1e5;
  stream.temperature = 300;
  stream.enthalpy = 112653;
  stream.flow = 0.0;
  const std::string text = sample::text_of(stream);
  EXPECT_EQ(text.rfind("water 0 kg/s, 1 bar, 26.85 °C [", 0), 0U) << text;
  const Outcome<Stream> read = read_stream(text);
  ASSERT_TRUE(read);
  ASSERT_TRUE(read->flow.has_value());
  EXPECT_EQ(*read->flow, 0);
}

class Locale {
 public:
  ~Locale() { std::setlocale(LC_ALL, "C"); }
  static bool with_comma() {
    for (const char* name : {"de_DE.UTF-8", "de_DE.utf8", "fr_FR.UTF-8", "es_ES.UTF-8", "de_DE"}) {
      if (std::setlocale(LC_ALL, name) != nullptr) return true;
    }
    return false;
  }
};

// A global C++ locale with a comma needs no locale of the system.
struct Comma : std::numpunct<char> {
  char do_decimal_point() const override { return ','; }
  char do_thousands_sep() const override { return '.'; }
  std::string do_grouping() const override { return "\3"; }
};

TEST(StreamText, KnowsNoLocale) {
  support::Random random(13);
  std::vector<Stream> streams;
  std::vector<std::string> texts;
  for (int i = 0; i < 200; ++i) {
    streams.push_back(sample::stream(random));
    texts.push_back(sample::text_of(streams.back()));
  }
  const Locale restore;
  const bool comma = Locale::with_comma();
  RecordProperty("comma_locale_of_the_system", comma ? "yes" : "none installed");
  const std::locale before = std::locale::global(std::locale(std::locale::classic(), new Comma));
  for (std::size_t i = 0; i < streams.size(); ++i) {
    EXPECT_EQ(sample::text_of(streams[i]), texts[i]);
    EXPECT_TRUE(read_stream(texts[i])) << texts[i];
  }
  std::locale::global(before);
}

}  // namespace
}  // namespace busbar
