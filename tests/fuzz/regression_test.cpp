// The fuzzed entries under a mutator with a fixed seed: the same inputs in every run, on every
// compiler. What libFuzzer finds is added to the seeds in entries.cpp.
#include <gtest/gtest.h>

#include <string>
#include <vector>

#include "entries.hpp"
#include "random.hpp"

namespace busbar::fuzz {
namespace {

constexpr int kRuns = 30000;
constexpr std::size_t kLongest = 600;

void run(const Entry& entry, const std::string& input) {
  entry.run({reinterpret_cast<const std::uint8_t*>(input.data()), input.size()});
}

std::string mutated(const std::vector<std::string>& seeds, support::Random& random) {
  std::string text = seeds[random.below(seeds.size())];
  const std::size_t changes = 1 + random.below(6);
  for (std::size_t k = 0; k < changes; ++k) {
    const std::size_t at = random.below(text.size() + 1);
    switch (random.below(7)) {
      case 0:
        text.insert(at, random.bytes(1 + random.below(4)));
        break;
      case 1:
        text.erase(at, 1 + random.below(8));
        break;
      case 2:
        if (at < text.size()) text[at] = static_cast<char>(text[at] ^ (1 << random.below(8)));
        break;
      case 3:
        if (at < text.size()) text[at] = random.bytes(1)[0];
        break;
      case 4: {
        const std::string& other = seeds[random.below(seeds.size())];
        const std::size_t from = random.below(other.size() + 1);
        text.insert(at, other.substr(from, random.below(40)));
        break;
      }
      case 5:
        text.resize(at);
        break;
      default:
        text.insert(at, text.substr(random.below(text.size() + 1), random.below(20)));
    }
  }
  if (text.size() > kLongest) text.resize(kLongest);
  return text;
}

class Fuzz : public testing::TestWithParam<Entry> {};

TEST_P(Fuzz, SeedsAndTheirMutationsBreakNoPromise) {
  const Entry& entry = GetParam();
  support::Random random(91);
  for (const std::string& seed : entry.seeds) run(entry, seed);
  for (int i = 0; i < kRuns; ++i) run(entry, mutated(entry.seeds, random));
}

TEST_P(Fuzz, DustBreaksNoPromise) {
  const Entry& entry = GetParam();
  support::Random random(92);
  for (int i = 0; i < kRuns; ++i) run(entry, random.bytes(random.below(120)));
}

INSTANTIATE_TEST_SUITE_P(Entries, Fuzz, testing::ValuesIn(entries()),
                         [](const auto& tested) { return std::string(tested.param.name); });

}  // namespace
}  // namespace busbar::fuzz
