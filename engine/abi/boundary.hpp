// What every entry of the C interface shares: the exception guard, the floating-point environment,
// and the two handle types.
#pragma once

#if defined(__SSE2__)
#include <xmmintrin.h>
#else
#include <cfenv>
#endif

#include <new>
#include <string_view>
#include <utility>

#include "abi/busbar.h"
#include "catalogue/row.hpp"
#include "catalogue/value.hpp"

struct busbar_value {
  busbar::Grid grid;
};

namespace busbar::abi {

/// A function handle is the row itself.
inline const busbar_function* handle(const Row* row) {
  return reinterpret_cast<const busbar_function*>(row);
}
inline const Row* row_of(const busbar_function* function) {
  return reinterpret_cast<const Row*>(function);
}

/// Rounding to nearest and gradual underflow while the engine computes, whatever the host has set;
/// the host's environment comes back afterwards.
#if defined(__SSE2__)
// All arithmetic here is SSE: the control register alone decides, and reading it takes 2 ns where
// std::fegetenv, which also saves the x87 unit, takes 300.
class FloatingPointEnvironment {
 public:
  FloatingPointEnvironment() : saved_(_mm_getcsr()) { _mm_setcsr(kDefault); }
  ~FloatingPointEnvironment() { _mm_setcsr(saved_); }
  FloatingPointEnvironment(const FloatingPointEnvironment&) = delete;
  FloatingPointEnvironment& operator=(const FloatingPointEnvironment&) = delete;

 private:
  static constexpr unsigned kDefault =
      0x1F80;  // all exceptions masked, to nearest, no flush to zero
  unsigned saved_;
};
#else
class FloatingPointEnvironment {
 public:
  FloatingPointEnvironment() {
    std::fegetenv(&saved_);
    std::fesetenv(FE_DFL_ENV);
  }
  ~FloatingPointEnvironment() { std::fesetenv(&saved_); }
  FloatingPointEnvironment(const FloatingPointEnvironment&) = delete;
  FloatingPointEnvironment& operator=(const FloatingPointEnvironment&) = delete;

 private:
  std::fenv_t saved_{};
};
#endif

/// Runs the body; no exception passes. `out_of_memory` answers std::bad_alloc, `defect` the rest.
template <class R, class Body>
R guarded(R out_of_memory, R defect, Body&& body) noexcept {
  try {
    return std::forward<Body>(body)();
  } catch (const std::bad_alloc&) {
    return out_of_memory;
  } catch (...) {
    return defect;
  }
}

/// Copies a text into the caller's buffer as busbar_get_reason promises.
size_t copy_out(std::string_view text, char* buffer, size_t capacity);

}  // namespace busbar::abi
