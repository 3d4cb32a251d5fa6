// Making failures in the water domain.
#pragma once

#include "core/outcome.hpp"

namespace busbar::water {

inline Failure make_failure(Fault fault, std::uint8_t argument, const char* reason,
                            Measure first = {}, Measure second = {}, Measure third = {}) {
  Failure failure;
  failure.fault = fault;
  failure.argument = argument;
  failure.reason = reason;
  failure.measures = {{first, second, third}};
  return failure;
}

}  // namespace busbar::water
