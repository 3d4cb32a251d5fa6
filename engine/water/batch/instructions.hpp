// The choice of instruction set while running.
#pragma once

#include <cstdint>

namespace busbar::water::batch {

/// Baseline code runs on every processor of the architecture.
enum class Instructions : std::uint8_t { baseline, avx2, avx512 };

/// The best that this processor has, found once.
Instructions instructions();

/// True when this processor can run them.
bool has(Instructions instructions);

/// For tests and benchmarks: from now on no better than this. Not for use while another thread
/// computes.
void use_at_most(Instructions instructions);

}  // namespace busbar::water::batch

// The function `name` of the instruction set in use; for the part of a file that Highway reads once
// (HWY_ONCE), inside busbar::water.
#if defined(__x86_64__)
#define BUSBAR_FOR_PROCESSOR(name)                                      \
  (batch::instructions() == batch::Instructions::avx512 ? &N_AVX3::name \
   : batch::instructions() == batch::Instructions::avx2 ? &N_AVX2::name \
                                                        : &N_SCALAR::name)
#else
#define BUSBAR_FOR_PROCESSOR(name) (&HWY_STATIC_DISPATCH(name))
#endif
