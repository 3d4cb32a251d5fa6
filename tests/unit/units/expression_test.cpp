// Units as text. Factors are checked against published tables in tests/reference; here the grammar.
#include "units/expression.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>
#include <vector>

#include "catalogue/sentence.hpp"
#include "random.hpp"
#include "units/symbols.hpp"

namespace busbar::units {
namespace {

Expression unit(const std::string& text) {
  const Outcome<Expression> read = read_unit(text);
  EXPECT_TRUE(read) << text << ": " << read.failure().reason;
  return *read;
}

void expect_equal(const std::string& a, const std::string& b) {
  EXPECT_EQ(unit(a).dimension, unit(b).dimension) << a << " and " << b;
  EXPECT_NEAR(unit(a).factor, unit(b).factor, 4e-16 * unit(b).factor) << a << " and " << b;
}

TEST(UnitExpression, OneUnitIsWrittenInManyWays) {
  for (const char* text :
       {"kJ/(kg K)", "kJ/(kg·K)", "kJ/(kg*K)", "kJ/(kg.K)", "kJ kg-1 K-1", "kJ·kg^-1·K^-1",
        "kJ kg⁻¹ K⁻¹", "kJ/(kg °C)", " kJ / ( kg K ) ", "(kJ)/(kg K)", "kJ/((kg) (K))"}) {
    expect_equal(text, "kJ/(kg K)");
  }
  for (const char* text : {"m3/h", "m^3/h", "m³/h", "m3 h-1"}) expect_equal(text, "m3/h");
  for (const char* text : {"kg m-1 s-2", "N/m2", "N m⁻²", "J/m3"}) expect_equal(text, "Pa");
  for (const char* text : {"bar(g)", "bar g", "barg"}) {
    EXPECT_EQ(unit(text).reference, Reference::gauge) << text;
  }
  for (const char* text : {"bar(a)", "bar a", "bara", "bar"}) {
    EXPECT_EQ(unit(text).reference, Reference::plain) << text;
  }
}

// SI Brochure, 9th ed., table 4: derived units in base units.
TEST(UnitExpression, DerivedUnitsAreThoseOfTheSI) {
  for (const auto& [derived, base] :
       {std::pair{"N", "kg m s-2"}, std::pair{"Pa", "kg m-1 s-2"}, std::pair{"J", "kg m2 s-2"},
        std::pair{"W", "kg m2 s-3"}, std::pair{"V", "kg m2 s-3 A-1"}, std::pair{"Hz", "s-1"}}) {
    expect_equal(derived, base);
    EXPECT_EQ(unit(derived).factor, 1) << derived;
  }
}

// SI Brochure, 9th ed., table 7.
TEST(UnitExpression, PrefixesAreThoseOfTheSI) {
  for (const auto& [text, factor] :
       {std::pair{"TW", 1e12}, std::pair{"GW", 1e9}, std::pair{"MW", 1e6}, std::pair{"kW", 1e3},
        std::pair{"hPa", 1e2}, std::pair{"dm", 1e-1}, std::pair{"cm", 1e-2}, std::pair{"mm", 1e-3},
        std::pair{"µm", 1e-6}, std::pair{"μm", 1e-6}, std::pair{"um", 1e-6}, std::pair{"nm", 1e-9},
        std::pair{"mbar", 1e2}, std::pair{"kg", 1.0}, std::pair{"mg", 1e-6}}) {
    EXPECT_NEAR(unit(text).factor, factor, 4e-16 * factor) << text;
  }
}

TEST(UnitExpression, PrefixesDoNotStandBeforeUnitsOfOtherSystems) {
  for (const char* text : {"kft", "mlb", "kpsia", "Mgal", "kmin", "m°C", "k%", "kkg", "Matm"}) {
    EXPECT_FALSE(read_unit(text)) << text;
  }
}

TEST(UnitExpression, LookAlikesAreKeptApart) {
  EXPECT_NE(unit("min").dimension, unit("m").dimension);
  EXPECT_NE(unit("h").dimension, unit("hPa").dimension);
  expect_equal("ha", "hm2");
  EXPECT_EQ(unit("MW").factor / unit("mW").factor, 1e9);
  EXPECT_EQ(unit("Pa").factor, 1);
  EXPECT_NEAR(unit("PS").factor, 735.49875, 1e-9);  // NIST SP 811, appendix B.8, metric horsepower
}

TEST(UnitExpression, NonsenseIsRefusedWithAPlace) {
  for (const char* text :
       {"",     " ",       "/",       "kg/", "/kg",  "kg//s", "kg/m/s",     "(kg",   "kg)",
        "()",   "kg^",     "kg^-",    "kg-", "kg^0", "kg0",   "kg^7",       "kg^99", "m2.5",
        "kg+s", "furlong", "kJ/kgK",  "KG",  "Bar",  "MBAR",  "kJ/(kg (K)", "kg**s", "kg..s",
        "5",    "1e3",     "kg s^^2", "m²³", "°",    "deg",   "kg\ts",      "$"}) {
    const Outcome<Expression> read = read_unit(text);
    EXPECT_FALSE(read) << '"' << text << "\" passes";
    EXPECT_EQ(read.failure().argument, 1) << text;
    EXPECT_STRNE(read.failure().reason, "") << text;
  }
}

// The sentence that a cell gives, without the name of its function.
std::string told(const std::string& text) {
  const Outcome<Expression> read = read_unit(text);
  EXPECT_FALSE(read) << text;
  return sentence({read.failure(), nullptr, UnitSet::metric, {}});
}

TEST(UnitExpression, ARefusedUnitIsToldWhatToWrite) {
  for (const auto& [text, advice] : {
           std::pair{"C", "write \"°C\""},
           std::pair{"deg C", "write \"°C\""},
           std::pair{"° C", "write \"°C\""},
           std::pair{"℃", "write \"°C\""},
           std::pair{"kJ/(kg C)", "write \"°C\""},
           std::pair{"F", "write \"°F\""},
           std::pair{"degc", "from character 1 on write \"degC\""},
           std::pair{"kpa", "from character 1 on write \"kPa\""},
           std::pair{"BTU/LB", "from character 5 on write \"lb\""},
           std::pair{"KJ/KG", "from character 1 on write \"kJ\""},
           std::pair{"kJ/KG", "from character 4 on write \"kg\""},
           std::pair{"MPA", "write \"MPa\" or \"mPa\""},
           std::pair{"Mw", "write \"MW\" or \"mW\""},
           std::pair{"M3/h", "write \"m\""},
           std::pair{"INH2O", "write \"inH2O\""},
           std::pair{"psi", "write \"psia\" or \"psig\""},
           std::pair{"PSI", "write \"psia\" or \"psig\""},
           std::pair{"PSIA", "write \"psia\""},
           std::pair{"lbs/h", "write \"lb\" from character 1 on"},
           std::pair{"kJ/kgK", "write \"(kg K)\" from character 4 on"},
           std::pair{"Nm3/h", "at a reference state"},
           std::pair{"Nm", "write \"N m\""},
           std::pair{"ton/h", "different masses"},
       }) {
    EXPECT_NE(told(text).find(advice), std::string::npos) << text << ": " << told(text);
  }
  for (const char* text : {"furlong", "Cat", "Foo", "xC", "tonight", "psix"}) {
    EXPECT_NE(told(text).find("cannot be read from character 1 on"), std::string::npos) << text;
  }
}

// Every way to write the letters of a symbol is either that symbol, another one, or told apart.
TEST(UnitExpression, CapitalsAloneAlwaysGetAHint) {
  for_each_symbol([](std::string_view name) {
    for (const bool upper : {false, true}) {
      std::string text(name);
      for (char& c : text) {
        const bool small = c >= 'a' && c <= 'z';
        const bool capital = c >= 'A' && c <= 'Z';
        if (upper && small) c = static_cast<char>(c - 'a' + 'A');
        if (!upper && capital) c = static_cast<char>(c - 'A' + 'a');
      }
      if (read_unit(text)) continue;
      const std::string reason = told(text);
      EXPECT_NE(reason.find("write \""), std::string::npos) << text << ": " << reason;
    }
  });
}

TEST(UnitExpression, DepthLengthAndPowersAreCapped) {
  EXPECT_FALSE(read_unit(std::string(1000, '(') + "kg" + std::string(1000, ')')));
  EXPECT_FALSE(read_unit("((((((kg))))))"));
  EXPECT_TRUE(read_unit("(((kg)))"));
  EXPECT_FALSE(read_unit(std::string(100000, 'k')));
  std::string long_product = "m6";
  for (int i = 0; i < 12; ++i) long_product += " m6";
  EXPECT_FALSE(read_unit(long_product));
}

TEST(UnitExpression, SurvivesDust) {
  support::Random random(41);
  static const char kAlphabet[] = "kgmsKPaJWhbr/()^*. -123\xC2\xB0\xB2\xE2\x81\xBB°²";
  for (int i = 0; i < 100000; ++i) {
    std::string text;
    const std::size_t length = random.below(24);
    for (std::size_t k = 0; k < length; ++k) {
      text +=
          random.chance(0.02) ? random.bytes(1)[0] : kAlphabet[random.below(sizeof kAlphabet - 1)];
    }
    const Outcome<Expression> read = read_unit(text);
    if (read) {
      EXPECT_TRUE(std::isfinite(read->factor) && read->factor > 0) << text;
    }
  }
}

const std::vector<const char*>& pressures() {
  static const std::vector<const char*> all{"Pa",   "kPa",  "bar",   "psia", "atm",
                                            "torr", "inHg", "mmH2O", "at",   "kgf/cm2"};
  return all;
}

TEST(Conversion, GoesThereAndBack) {
  support::Random random(42);
  for (const char* from : pressures()) {
    for (const char* to : pressures()) {
      for (int i = 0; i < 20; ++i) {
        const double x = random.logarithmic(1e-3, 1e5);
        const Outcome<double> there = convert(x, from, to);
        ASSERT_TRUE(there);
        const Outcome<double> back = convert(*there, to, from);
        ASSERT_TRUE(back);
        EXPECT_NEAR(*back, x, 1e-14 * x) << from << ' ' << to;
      }
    }
  }
}

TEST(Conversion, TemperaturePointsHaveZerosAndDifferencesHaveNone) {
  // t/°F = 1.8 t/°C + 32 (NIST SP 811, appendix B.8)
  EXPECT_NEAR(*convert(540, "°C", "°F"), 1004, 1e-12);
  EXPECT_NEAR(*convert_difference(10, "°C", "°F"), 18, 1e-14);
  EXPECT_NEAR(*convert(0, "K", "degC"), -273.15, 1e-12);
  EXPECT_NEAR(*convert_difference(-500, "K", "°R"), -900, 1e-12);
  EXPECT_EQ(convert(-1, "K", "°C").failure().fault, Fault::impossible);
  EXPECT_EQ(convert(-459.68, "°F", "K").failure().fault, Fault::impossible);
  EXPECT_TRUE(convert_difference(-1, "K", "°C"));
}

TEST(Conversion, GaugeAndAbsoluteDoNotMix) {
  for (const char* gauge : {"barg", "psig", "kPag", "MPag", "mbarg"}) {
    for (const char* absolute : {"bar", "psia", "Pa"}) {
      EXPECT_FALSE(convert(1, gauge, absolute)) << gauge;
      EXPECT_FALSE(convert(1, absolute, gauge)) << gauge;
    }
    EXPECT_TRUE(convert(1, gauge, "barg")) << gauge;
    EXPECT_FALSE(read_unit(std::string(gauge) + " m3")) << gauge;
  }
  EXPECT_NEAR(*convert(14.5, "psig", "barg"), 14.5 * 6894.757293168361 / 1e5, 1e-12);
}

TEST(Conversion, DimensionsMustAgree) {
  for (const auto& [from, to] :
       {std::pair{"kg", "m3"}, std::pair{"kW", "kWh"}, std::pair{"bar", "K"},
        std::pair{"kg/s", "m3/s"}, std::pair{"J/kg", "J/mol"}, std::pair{"1", "m"}}) {
    EXPECT_EQ(convert(1, from, to).failure().argument, 3) << from;
    EXPECT_EQ(convert_difference(1, from, to).failure().argument, 3) << from;
  }
  // kg/cm2 is a pressure in the mouths of people, and a mass per area in the SI.
  EXPECT_EQ(convert(1, "kg/cm2", "bar").failure().argument, 2);
  EXPECT_EQ(convert(1, "bar", "kg/cm2").failure().argument, 3);
  for (const Outcome<double>& refused :
       {convert(1, "kg/cm2", "bar"), convert_difference(1, "bar", "kg/cm²")}) {
    EXPECT_NE(std::string(refused.failure().reason).find("kgf/cm2"), std::string::npos);
  }
  EXPECT_TRUE(convert(1, "kg/cm2", "kg/m2"));
  EXPECT_EQ(convert(1, "nonsense", "m").failure().argument, 2);
  EXPECT_EQ(convert(1, "m", "nonsense").failure().argument, 3);
}

}  // namespace
}  // namespace busbar::units
