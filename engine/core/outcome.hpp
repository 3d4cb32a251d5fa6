// A result or the reason why there is none. A failure is data; the sentence is written from it
// later, in the caller's units (catalogue/sentence.cpp).
#pragma once

#include <array>
#include <cstdint>
#include <utility>

#include "core/quantity.hpp"

namespace busbar {

/// Why a call has no answer. The mapping to kinds of Calc error stands in abi/values.cpp.
enum class Fault : std::uint8_t {
  none,
  missing,         ///< empty text or a blank where a value is needed
  zero_or_blank,   ///< zero where zero cannot be a value; Calc hands a blank cell over as zero
  wrong_kind,      ///< text for a number, a logical for a stream, ...
  unknown_word,    ///< a word, unit or function name that is not known
  wrong_shape,     ///< ranges that do not fit together, too few or too many arguments
  damaged_text,    ///< a stream text that was edited, cut or damaged
  outside_range,   ///< outside the published range of validity
  impossible,      ///< against a law of physics or the meaning of the quantity
  no_convergence,  ///< an iteration reached its cap
  too_large,       ///< beyond the stated limits on sizes
  internal         ///< a defect of the engine
};

/// A number that belongs into the sentence about a failure.
struct Measure {
  double si = 0;
  Quantity quantity = Quantity::number;
};

/// Why there is no answer.
///
/// `argument` counts the inputs of the call that failed from 1; 0 means no single one. Whoever
/// calls that function with its own inputs in another order says so with `about`. `row` and
/// `column` count from 1 where the input is a whole range and one cell of it is to blame. `reason`
/// is a static text in which {0}, {1}, {2} stand for the measures.
struct Failure {
  Fault fault = Fault::none;
  std::uint8_t argument = 0;
  const char* reason = "";
  std::array<Measure, 3> measures{};
  std::uint32_t row = 0;
  std::uint32_t column = 0;
  bool limit_of_argument = false;  ///< set by the catalogue: it knows whose limit was crossed

  [[nodiscard]] Failure about(std::uint8_t input) const {
    Failure moved = *this;
    moved.argument = input;
    return moved;
  }
};

/// A value or a failure. (std::expected comes with C++23.)
template <class T>
class [[nodiscard]] Outcome {
 public:
  Outcome(T value) : value_(std::move(value)) {}          // NOLINT(google-explicit-constructor)
  Outcome(const Failure& failure) : failure_(failure) {}  // NOLINT(google-explicit-constructor)

  [[nodiscard]] explicit operator bool() const { return failure_.fault == Fault::none; }
  [[nodiscard]] const T& operator*() const { return value_; }
  [[nodiscard]] T& operator*() { return value_; }
  [[nodiscard]] const T* operator->() const { return &value_; }
  [[nodiscard]] const Failure& failure() const { return failure_; }

 private:
  T value_{};
  Failure failure_{};
};

}  // namespace busbar
