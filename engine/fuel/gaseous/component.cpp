#include "fuel/gaseous/component.hpp"

#include "fuel/gaseous/component_table.hpp"
#include "fuel/gaseous/constants.hpp"

namespace busbar::fuel::gaseous {
namespace {

consteval std::array<double, kComponents> molar_masses() {
  std::array<double, kComponents> masses{};
  for (std::size_t i = 0; i < kComponents; ++i) {
    for (std::size_t e = 0; e < kElements; ++e) {
      masses[i] += kComponentTable[i].atoms[e] * kAtomicMass[e].value;
    }
  }
  return masses;
}

constexpr std::array<double, kComponents> kMolarMass = molar_masses();

}  // namespace

std::span<const Component, kComponents> components() { return kComponentTable; }

double molar_mass(std::size_t component) { return kMolarMass[component]; }

}  // namespace busbar::fuel::gaseous
