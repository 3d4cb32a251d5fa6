// The text of a gas stream: its shape, its length, and a composition that somebody changed.
#include <gtest/gtest.h>

#include <string>

#include "sample.hpp"
#include "stream/check_digits.hpp"

namespace busbar {
namespace {

Stream flue_gas() {
  Stream stream;
  stream.phase = Phase::gas;
  stream.pressure = 1.03e5;
  stream.temperature = 833.15;
  stream.enthalpy = -431005.2;
  stream.flow = 500;
  stream.datum = gas::Datum::at_25;
  std::array<double, gas::kSpecies> amounts{};
  amounts[static_cast<std::size_t>(gas::Species::N2)] = 0.75;
  amounts[static_cast<std::size_t>(gas::Species::O2)] = 0.125;
  amounts[static_cast<std::size_t>(gas::Species::n_butane)] = 0.125;
  stream.mixture = *gas::Mixture::from_amounts(amounts);
  return stream;
}

TEST(GasText, ReadsAsPromised) {
  const std::string text = sample::text_of(flue_gas());
  EXPECT_EQ(text.substr(0, text.find('#')),
            "gas 500 kg/s, 1.03 bar, 560 °C [1 p=103000 t=833.15 hf=-431005.2 m=500 d=25 N2=0.75 "
            "O2=0.125 n-C4H10=0.125 ");
  Stream formation = flue_gas();
  formation.datum = gas::Datum::formation;
  EXPECT_EQ(sample::text_of(formation).find(" d="), std::string::npos);
}

// With check digits that fit, so that the species themselves are judged.
std::string sealed(const std::string& body) {
  std::string text = body;
  text += '#';
  text += check_digits(body).text();
  text += ']';
  return text;
}

TEST(GasText, AnImpossibleCompositionIsRefused) {
  const std::string face = "gas 1 bar, 20 °C [1 p=100000 t=293.15 hf=-431005.2 ";
  EXPECT_TRUE(read_stream(sealed(face + "N2=0.75 O2=0.25 ")));
  EXPECT_TRUE(read_stream(sealed(face + "d=15 N2=0.75 O2=0.25 ")));
  for (const char* species :
       {"", "N2=0.75 ", "O2=0.25 N2=0.75 ", "N2=0.5 N2=0.5 ", "N2=1.25 O2=-0.25 ", "N2=1 O2=0 ",
        "Xy=0.25 O2=0.75 ", "n2=0.75 O2=0.25 ", "nitrogen=1 ", "N2=0.75, O2=0.25 ", "N2 O2 ",
        "d=99 N2=1 ", "N2=1 d=25 ", "N2=1 x=0.5 ", "N2=0.75 O2=0.25001 ", "N2=nan "}) {
    const Outcome<Stream> read = read_stream(sealed(face + species));
    ASSERT_FALSE(read) << species;
    EXPECT_EQ(read.failure().fault, Fault::damaged_text) << species;
  }
}

TEST(GasText, FaceAndTailAgreeOnTheFluid) {
  for (const char* text : {"steam 1 bar, 20 °C [1 p=100000 t=293.15 hf=-431005.2 N2=1 ",
                           "gas 1 bar, 20 °C [1 p=100000 t=293.15 h=84000 ",
                           "wet steam 1 bar, dryness 0.5 [1 p=100000 t=293.15 hf=84000 x=0.5 N2=1 ",
                           "gas 1 bar, 20 °C [1 p=100000 t=293.15 hf=84000 x=0.5 N2=1 "}) {
    EXPECT_FALSE(read_stream(sealed(text))) << text;
  }
}

TEST(GasText, EveryByteChangedIsRefused) {
  const std::string original = sample::text_of(flue_gas());
  for (std::size_t i = 0; i < original.size(); ++i) {
    for (int byte = 0; byte < 256; ++byte) {
      std::string text = original;
      text[i] = static_cast<char>(byte);
      if (text != original) {
        EXPECT_FALSE(read_stream(text)) << text;
      }
    }
  }
}

// The longest of all: every place taken by the longest names and numbers.
TEST(GasText, FitsIntoTheLimit) {
  Stream stream = flue_gas();
  stream.tag = *Tag::from(std::string(Tag::kLimit, 'x'));
  stream.pressure = 123456.78901234567;
  stream.temperature = 1234.5678901234567;
  stream.enthalpy = -12345678.901234567;
  stream.flow = 123.45678901234567;
  std::array<double, gas::kSpecies> amounts{};
  for (std::size_t k = 0; k < gas::Mixture::kCapacity; ++k) {
    amounts[16 + k] = 1.0 / 3 + 1e-5 * static_cast<double>(k);  // from the hydrocarbons on
  }
  stream.mixture = *gas::Mixture::from_amounts(amounts);
  const std::string text = sample::text_of(stream);
  EXPECT_LT(text.size(), kStreamTextLimit);
  EXPECT_TRUE(read_stream(text)) << text;
}

}  // namespace
}  // namespace busbar
