#include "ratios.hpp"

#include <algorithm>
#include <cstdio>
#include <map>

#include "water/batch/instructions.hpp"

namespace busbar::bench {

namespace {

using water::batch::Instructions;
using water::batch::instructions;
using water::batch::use_at_most;

void each(benchmark::State& state, const Pairs& in, Single function) {
  for (auto _ : state) {
    double sum = 0;
    for (std::size_t i = 0; i < kStates; ++i) sum += function(in.first[i], in.second[i]);
    benchmark::DoNotOptimize(sum);
  }
}

void together(benchmark::State& state, const Pairs& in, Columns function) {
  std::vector<double> out(3 * kStates);
  for (auto _ : state) {
    function(in, out);
    benchmark::ClobberMemory();
  }
}

// Keeps the least processor time of the repetitions of each benchmark: other work on the machine
// only ever adds.
class Least : public benchmark::BenchmarkReporter {
 public:
  bool ReportContext(const Context&) override { return true; }
  void ReportRuns(const std::vector<Run>& runs) override {
    for (const Run& run : runs) {
      if (run.run_type != Run::RT_Iteration || run.error_occurred) continue;
      const double spent = run.GetAdjustedCPUTime() / static_cast<double>(kStates);
      const auto found = least_.emplace(run.run_name.function_name, spent).first;
      found->second = std::min(found->second, spent);
    }
  }
  [[nodiscard]] double of(const std::string& name) const {
    const auto found = least_.find(name);
    return found == least_.end() ? 0 : found->second;
  }

 private:
  std::map<std::string, double> least_;
};

void print(const char* format, double value) {
  if (value > 0) {
    std::printf(format, value);
  } else {
    std::printf("%10s", "");
  }
}

void print_line(const Job& job, const Least& least) {
  const std::string name = job.name;
  const double yardstick = least.of(name + "/yardstick");
  const double scalar = least.of(name + "/scalar");
  const double batch = least.of(name + "/batch");
  std::printf("%-34s", job.name);
  print("%10.0f", yardstick);
  print("%10.1f", scalar);
  print("%9.1fx", scalar > 0 ? yardstick / scalar : 0);
  print("%9.0fx", job.scalar_aim);
  print("%10.1f", batch);
  print("%9.1fx", batch > 0 ? yardstick / batch : 0);
  print("%9.0fx", job.batch_aim);
  print("%8.0fns", job.batch_nanoseconds);
  std::printf("\n");
}

}  // namespace

int run(int argc, char** argv, const std::vector<Job>& jobs) {
  // Defaults first, so that the caller's own flags win.
  std::vector<std::string> texts{argv[0], "--benchmark_repetitions=15", "--benchmark_min_time=0.02",
                                 "--benchmark_enable_random_interleaving=true"};
  texts.insert(texts.end(), argv + 1, argv + argc);
  std::vector<char*> flags;
  flags.reserve(texts.size());
  for (std::string& text : texts) flags.push_back(text.data());
  int count = static_cast<int>(flags.size());
  benchmark::Initialize(&count, flags.data());
  for (int i = 1; i < count; ++i) {
    const std::string flag = flags[static_cast<std::size_t>(i)];
    if (flag == "baseline") use_at_most(Instructions::baseline);
    if (flag == "avx2") use_at_most(Instructions::avx2);
  }
  constexpr const char* kNames[] = {"baseline", "AVX2", "AVX-512"};
  std::printf("batch kernels: %s\n", kNames[static_cast<std::size_t>(instructions())]);
  for (const Job& job : jobs) {
    const std::string name = job.name;
    if (job.yardstick != nullptr) {
      benchmark::RegisterBenchmark((name + "/yardstick").c_str(), each, *job.inputs, job.yardstick);
    }
    if (job.scalar != nullptr) {
      benchmark::RegisterBenchmark((name + "/scalar").c_str(), each, *job.inputs, job.scalar);
    }
    if (job.batch != nullptr) {
      benchmark::RegisterBenchmark((name + "/batch").c_str(), together, *job.inputs, job.batch);
    }
  }
  Least least;
  benchmark::RunSpecifiedBenchmarks(&least);
  std::printf("%-34s%10s%10s%10s%10s%10s%10s%10s%10s\n", "ns a state", "yardstick", "scalar",
              "ratio", "aim", "batch", "ratio", "aim", "aim");
  for (const Job& job : jobs) print_line(job, least);
  return 0;
}

}  // namespace busbar::bench
