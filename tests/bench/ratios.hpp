// Benchmarks that are read as ratios: each line is one job, done by the yardstick, by the scalar
// kernel and by the batch kernel over the same inputs in the same run.
#pragma once

#include <benchmark/benchmark.h>

#include <string>
#include <vector>

#include "steam_states.hpp"

namespace busbar::bench {

using Single = double (*)(double, double);
using Columns = void (*)(const Pairs& in, std::vector<double>& out);

/// One job, the ratios it should reach (0: none is asked), and the time a state may take (ns).
struct Job {
  const char* name;
  const Pairs* inputs;
  Single yardstick;  ///< nullptr: the batch has an absolute aim only
  Single scalar;
  Columns batch;
  double scalar_aim = 0;
  double batch_aim = 0;
  double batch_nanoseconds = 0;
};

/// Runs all jobs and prints one table. The arguments are those of Google Benchmark, and `avx2` or
/// `baseline` for batch kernels of no better instruction set than that.
int run(int argc, char** argv, const std::vector<Job>& jobs);

}  // namespace busbar::bench
