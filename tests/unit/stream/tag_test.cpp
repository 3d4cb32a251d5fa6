// Tags that travel with a stream.
#include <gtest/gtest.h>

#include <string>

#include "sample.hpp"

namespace busbar {
namespace {

TEST(Tag, TakesPlantCodesAndNamesInAnyScript) {
  for (const char* text : {"LBA10", "=LBA10 CP001", "HP bypass 1", "Überhitzer (2)", "主蒸汽",
                           "a,b", "p=1", "#k3v9qd", "{x}", "\"quoted\"", "1/2", "steam"}) {
    const Outcome<Tag> tag = Tag::from(text);
    ASSERT_TRUE(tag) << text;
    EXPECT_EQ(tag->text(), text);
    Stream stream;
    stream.pressure = 1e5;
    stream.temperature = 300;
    stream.tag = *tag;
    const Outcome<Stream> read = read_stream(sample::text_of(stream));
    ASSERT_TRUE(read) << text;
    EXPECT_EQ(read->tag.text(), text);
  }
}

TEST(Tag, RefusesWhatWouldMakeTheTextAmbiguous) {
  for (const char* text : {"a:b", "a: b", "[1]", "a]", "a\nb", "\x7F", " a", "a ", "\ta", "\xFF",
                           "\xC3", "a\xC2\x85"}) {
    EXPECT_EQ(Tag::from(text).failure().fault, Fault::unknown_word) << text;
  }
  EXPECT_EQ(Tag::from("").failure().fault, Fault::missing);
  EXPECT_FALSE(Tag::from(std::string_view("a\0b", 3)));
}

TEST(Tag, MayHaveFortyBytes) {
  EXPECT_TRUE(Tag::from(std::string(40, 'x')));
  EXPECT_EQ(Tag::from(std::string(41, 'x')).failure().fault, Fault::too_large);
  EXPECT_EQ(Tag::from(std::string(1 << 20, 'x')).failure().fault, Fault::too_large);
}

}  // namespace
}  // namespace busbar
