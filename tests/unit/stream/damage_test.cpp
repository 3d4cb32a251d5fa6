// A stream text that somebody or something changed is refused, with a reason.
#include <gtest/gtest.h>

#include <string>

#include "catalogue/sentence.hpp"
#include "functions/functions.hpp"
#include "sample.hpp"

namespace busbar {
namespace {

std::string why(const std::string& text) {
  const Outcome<Stream> read = read_stream(text);
  if (read) return "taken";
  return sentence({read.failure(), functions::find("ENTHALPY_OF"), UnitSet::metric, {}});
}

void expect_refused(const std::string& text, const std::string& original) {
  const Outcome<Stream> read = read_stream(text);
  EXPECT_FALSE(read) << '"' << text << "\" passes for \"" << original << '"';
  EXPECT_STRNE(read.failure().reason, "") << text;
}

std::vector<std::string> samples() {
  support::Random random(21);
  std::vector<std::string> texts;
  while (texts.size() < 8) {
    texts.push_back(sample::text_of(sample::stream(random), sample::unit_set(random)));
  }
  return texts;
}

TEST(DamagedStream, EverySingleByteReplacedIsRefused) {
  for (const std::string& original : samples()) {
    for (std::size_t i = 0; i < original.size(); ++i) {
      for (int byte = 0; byte < 256; ++byte) {
        std::string text = original;
        text[i] = static_cast<char>(byte);
        if (text != original) expect_refused(text, original);
      }
    }
  }
}

TEST(DamagedStream, EverySingleByteTakenOutDoubledOrPutInIsRefused) {
  for (const std::string& original : samples()) {
    for (std::size_t i = 0; i <= original.size(); ++i) {
      if (i < original.size()) {
        std::string shorter = original;
        shorter.erase(i, 1);
        expect_refused(shorter, original);
      }
      for (const char c : std::string("0123456789.,-+eE []#:=pthxm")) {
        std::string longer = original;
        longer.insert(i, 1, c);
        expect_refused(longer, original);
      }
    }
  }
}

TEST(DamagedStream, NeighboursThatChangedPlacesAreRefused) {
  for (const std::string& original : samples()) {
    for (std::size_t i = 0; i + 1 < original.size(); ++i) {
      std::string text = original;
      std::swap(text[i], text[i + 1]);
      if (text != original) expect_refused(text, original);
    }
  }
}

TEST(DamagedStream, EveryCutIsRefused) {
  for (const std::string& original : samples()) {
    for (std::size_t length = 0; length < original.size(); ++length) {
      expect_refused(original.substr(0, length), original);
      expect_refused(original.substr(original.size() - length), original);
    }
    expect_refused(original + original, original);
    expect_refused(original + ' ', original);
    expect_refused(' ' + original, original);
  }
}

Stream live_steam() {
  Stream stream;
  stream.phase = Phase::vapour;
  stream.pressure = 1e7;
  stream.temperature = 813.15;
  stream.enthalpy = 3476868.5;
  stream.flow = 55.0;
  return stream;
}

std::string edited(std::string text, const std::string& from, const std::string& to) {
  const auto at = text.find(from);
  EXPECT_NE(at, std::string::npos) << text;
  return text.replace(at, from.size(), to);
}

TEST(EditedStream, NamesTheTemperatureAndBothNumbers) {
  const std::string reason = why(edited(sample::text_of(live_steam()), "540 °C", "450 °C"));
  EXPECT_NE(reason.find("temperature"), std::string::npos) << reason;
  EXPECT_NE(reason.find("450 °C"), std::string::npos) << reason;
  EXPECT_NE(reason.find("540 °C"), std::string::npos) << reason;
  EXPECT_NE(reason.find("edited"), std::string::npos) << reason;
}

TEST(EditedStream, NamesPressureFlowAndDryness) {
  const std::string steam = sample::text_of(live_steam());
  for (const auto& [from, to, word] :
       {std::tuple{"100 bar", "10 bar", "pressure"}, std::tuple{"55 kg/s", "56 kg/s", "flow"}}) {
    const std::string reason = why(edited(steam, from, to));
    EXPECT_NE(reason.find(word), std::string::npos) << reason;
    EXPECT_NE(reason.find(from), std::string::npos) << reason;
    EXPECT_NE(reason.find(to), std::string::npos) << reason;
  }
  Stream wet = live_steam();
  wet.phase = Phase::two_phase;
  wet.dryness = 0.88;
  const std::string reason = why(edited(sample::text_of(wet), "dryness 0.88", "dryness 0.98"));
  EXPECT_NE(reason.find("dryness reads 0.98"), std::string::npos) << reason;
  EXPECT_NE(reason.find("0.88"), std::string::npos) << reason;
}

TEST(EditedStream, InEveryUnitSet) {
  for (const auto& [set, from, to] : {std::tuple{UnitSet::us, "1004 °F", "1040 °F"},
                                      std::tuple{UnitSet::si, "813.15 K", "831.15 K"}}) {
    const Outcome<Stream> read = read_stream(edited(sample::text_of(live_steam(), set), from, to));
    ASSERT_FALSE(read);
    const std::string reason = sentence({read.failure(), functions::find("ENTHALPY_OF"), set, {}});
    EXPECT_NE(reason.find(from), std::string::npos) << reason;
    EXPECT_NE(reason.find(to), std::string::npos) << reason;
  }
}

TEST(EditedStream, ABlankAtItsEndsIsTold) {
  const std::string steam = sample::text_of(live_steam());
  for (const std::string& text : {steam + " ", " " + steam, "\n" + steam, steam + "\r\n",
                                  "\u00a0" + steam, steam + "\u00a0 ", "\t" + steam + "\t"}) {
    EXPECT_NE(why(text).find("a space or a line end before or after it"), std::string::npos)
        << why(text);
  }
  // Not where something else is wrong as well.
  EXPECT_EQ(why(edited(steam, "540 °C", "450 °C") + " ").find("before or after"),
            std::string::npos);
  EXPECT_EQ(why(steam.substr(0, steam.size() - 1) + " ").find("before or after"),
            std::string::npos);
  EXPECT_FALSE(read_stream(std::string(kStreamTextLimit, ' ')));
}

TEST(EditedStream, AnotherFluidOrTagIsRefused) {
  const std::string steam = sample::text_of(live_steam());
  EXPECT_NE(why(edited(steam, "steam", "water")), "taken");
  EXPECT_NE(why("LBA10: " + steam), "taken");
  EXPECT_NE(why(edited(steam, "[1 p=1e+07", "[1 p=2e+07")), "taken");
}

TEST(ForeignText, IsNoStream) {
  EXPECT_EQ(read_stream("").failure().fault, Fault::missing);
  for (const char* text : {"hello", "100 bar", "steam 100 bar, 540 °C"}) {
    EXPECT_EQ(read_stream(text).failure().fault, Fault::wrong_kind) << text;
  }
}

TEST(ForeignText, OfAnotherVersionSaysSo) {
  const std::string reason = why(edited(sample::text_of(live_steam()), "[1 p", "[2 p"));
  EXPECT_NE(reason.find("format"), std::string::npos) << reason;
}

TEST(ForeignText, HugeOrBinaryIsRefusedQuickly) {
  EXPECT_EQ(read_stream(std::string(1 << 20, 'x')).failure().fault, Fault::too_large);
  EXPECT_EQ(read_stream(std::string(kStreamTextLimit + 1, ' ')).failure().fault, Fault::too_large);
  EXPECT_FALSE(read_stream(std::string(kStreamTextLimit, '[')));
  support::Random random(22);
  for (int i = 0; i < 20000; ++i) {
    std::string text = random.bytes(random.below(200));
    EXPECT_FALSE(read_stream(text));
    // Binary dust between the marks of a stream.
    text = "steam " + text + " [1 p=" + random.bytes(8) + " #" + random.bytes(6) + "]";
    EXPECT_FALSE(read_stream(text));
  }
}

// Right check digits do not make a fluid: negative pressure, dryness beyond 1.
TEST(ForeignText, ForgedNumbersAreRefused) {
  Stream stream = live_steam();
  stream.pressure = -1e5;
  EXPECT_NE(why(sample::text_of(stream)), "taken");
  stream = live_steam();
  stream.temperature = 0;
  EXPECT_NE(why(sample::text_of(stream)), "taken");
  stream = live_steam();
  stream.flow = -1.0;
  EXPECT_NE(why(sample::text_of(stream)), "taken");
  stream = live_steam();
  stream.phase = Phase::two_phase;
  stream.dryness = 1.5;
  EXPECT_NE(why(sample::text_of(stream)), "taken");
}

}  // namespace
}  // namespace busbar
