#include "water/pairs.hpp"

#include "water/solve/enthalpy_entropy.hpp"

namespace busbar::water {

Outcome<State> at_enthalpy_and_entropy(double enthalpy, double entropy) {
  const Outcome<Found> found = at_enthalpy_entropy(enthalpy, entropy);
  if (!found) return found.failure();
  return found->state;
}

}  // namespace busbar::water
