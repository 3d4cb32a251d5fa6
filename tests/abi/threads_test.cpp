// All examples at once on many threads give what one thread gives.
#include <gtest/gtest.h>

#include <atomic>
#include <thread>
#include <vector>

#include "formula.hpp"
#include "value.hpp"

namespace busbar::support {
namespace {

constexpr int kThreads = 8;
constexpr int kRounds = 20;

struct Example {
  std::string formula;
  std::string given;
};

std::vector<Example> examples() {
  std::vector<Example> all;
  for (std::size_t i = 0; i < busbar_function_count(); ++i) {
    const busbar_function* function = busbar_function_at(i);
    all.push_back({busbar_function_text(function, BUSBAR_FUNCTION_EXAMPLE),
                   busbar_function_text(function, BUSBAR_FUNCTION_EXAMPLE_GIVEN)});
  }
  return all;
}

TEST(Threads, EightOfThemGiveTheSameBits) {
  const std::vector<Example> all = examples();
  std::vector<Value> expected;
  for (const Example& example : all) expected.push_back(evaluate(example.formula, example.given));
  std::atomic<int> different{0};
  std::vector<std::thread> threads;
  for (int t = 0; t < kThreads; ++t) {
    threads.emplace_back([&, t] {
      for (int round = 0; round < kRounds; ++round) {
        for (std::size_t k = 0; k < all.size(); ++k) {
          // Every thread begins at another example.
          const std::size_t i = (k + static_cast<std::size_t>(t) * 7) % all.size();
          if (!same_cell(evaluate(all[i].formula, all[i].given), expected[i])) ++different;
        }
      }
    });
  }
  for (std::thread& thread : threads) thread.join();
  EXPECT_EQ(different, 0);
}

TEST(Threads, OneValueIsReadByAll) {
  Value streams(200, 1);
  for (std::size_t i = 0; i < streams.rows(); ++i) {
    streams.copy(i, 0, call("STEAM", {Value::number(100), Value::number(400.0 + double(i))}));
  }
  const Value expected = call("ENTROPY_OF", {streams});
  std::atomic<int> different{0};
  std::vector<std::thread> threads;
  for (int t = 0; t < kThreads; ++t) {
    threads.emplace_back([&] {
      const Value got = call("ENTROPY_OF", {streams});
      for (std::size_t i = 0; i < streams.rows(); ++i) {
        if (!same_cell(got, expected, i, 0)) ++different;
      }
    });
  }
  for (std::thread& thread : threads) thread.join();
  EXPECT_EQ(different, 0);
}

}  // namespace
}  // namespace busbar::support
