#include "water/batch/instructions.hpp"

#include <atomic>

namespace busbar::water::batch {

namespace {

#if defined(__x86_64__)
// The compiler's own test, which also asks whether the system saves the wide registers.
Instructions best() {
  __builtin_cpu_init();
  if (!__builtin_cpu_supports("avx2")) return Instructions::baseline;
  const bool wide = __builtin_cpu_supports("avx512f") && __builtin_cpu_supports("avx512vl") &&
                    __builtin_cpu_supports("avx512dq") && __builtin_cpu_supports("avx512bw");
  return wide ? Instructions::avx512 : Instructions::avx2;
}
#else
Instructions best() { return Instructions::baseline; }
#endif

std::atomic<Instructions>& chosen() {
  static std::atomic<Instructions> instructions{best()};
  return instructions;
}

}  // namespace

Instructions instructions() { return chosen().load(std::memory_order_relaxed); }

bool has(Instructions instructions) { return instructions <= best(); }

void use_at_most(Instructions instructions) {
  chosen().store(has(instructions) ? instructions : best(), std::memory_order_relaxed);
}

}  // namespace busbar::water::batch
