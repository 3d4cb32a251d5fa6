// From a domain's number to a quantity.
#pragma once

#include "core/outcome.hpp"
#include "core/quantity.hpp"

namespace busbar::functions {

/// The same outcome as a quantity in SI.
template <class Q>
Outcome<Q> as(const Outcome<double>& outcome) {
  if (!outcome) return outcome.failure();
  return Q{*outcome};
}

}  // namespace busbar::functions
