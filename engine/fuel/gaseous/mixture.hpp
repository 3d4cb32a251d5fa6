// A gas of components of ISO 6976 by mole fraction.
#pragma once

#include <array>
#include <cstddef>
#include <cstdint>

#include "core/composition.hpp"
#include "core/outcome.hpp"
#include "fuel/gaseous/component.hpp"

namespace busbar::fuel::gaseous {

/// Components in the order of the analysis, each once, with mole fractions that sum to 1.
struct Mixture {
  std::size_t size = 0;
  std::array<std::uint8_t, kComponents> component{};
  std::array<double, kComponents> fraction{};
};

/// The mixture of an analysis (input 1). Refused, with the row of the part: a name that is no
/// component, a component that stands twice (under whatever name), a negative amount; and amounts
/// that do not sum to 1, for nothing is normalised here. Amounts by mass are divided by the molar
/// masses.
Outcome<Mixture> mixture_of(const Composition& analysis);

}  // namespace busbar::fuel::gaseous
