// What is fuzzed: every place where bytes from outside are read. Each entry aborts when the engine
// breaks a promise; a crash and a sanitizer's finding speak for themselves.
#pragma once

#include <cstddef>
#include <cstdint>
#include <span>
#include <string>
#include <vector>

namespace busbar::fuzz {

using Bytes = std::span<const std::uint8_t>;

/// A stream text: what is taken is a stream, and its own text is that stream again.
void stream_text(Bytes bytes);

/// A unit: what is taken has a finite factor above zero and converts into itself.
void unit_expression(Bytes bytes);

/// An options text: what is taken names exactly one unit set.
void options_text(Bytes bytes);

/// Any function with any arguments: a finite answer, or an error with a short printable sentence.
void any_call(Bytes bytes);

struct Entry {
  const char* name;
  void (*run)(Bytes);
  std::vector<std::string> seeds;
};

/// All of them, with well-formed inputs to start from.
std::vector<Entry> entries();

}  // namespace busbar::fuzz
