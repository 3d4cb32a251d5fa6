// Which instruction sets the batch kernels are compiled for. Include this before anything of
// Highway, in every file of this folder.
//
// Highway is used for its vector types and for compiling a file once for each instruction set; the
// choice while running is made in batch/instructions.cpp, so that nothing of libhwy is linked.
//
// Results are the same to the last bit on all of them: only + - * / and square roots, in the order
// of the scalar code, and never a fused multiply-add (its instruction set is not even switched on).
#pragma once

#define HWY_DISABLE_BMI2_FMA
#define HWY_DISABLE_F16C
#define HWY_DISABLE_PCLMUL_AES
#define HWY_BROKEN_EMU128 1
#define HWY_DISABLED_TARGETS (HWY_SSSE3 | HWY_SSE4 | HWY_AVX3_DL | HWY_SVE | HWY_SVE2 | HWY_RVV)
