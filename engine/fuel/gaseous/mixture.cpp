#include "fuel/gaseous/mixture.hpp"

#include "fuel/gaseous/names.hpp"

namespace busbar::fuel::gaseous {
namespace {

Failure in_row(Failure failure, std::size_t index) {
  failure.row = static_cast<std::uint32_t>(index + 1);
  return failure;
}

// Mass fractions over molar masses, then over their sum. The sum of the mass fractions has been
// checked and drops out.
void divide_by_molar_masses(Mixture& mixture) {
  double moles = 0;
  for (std::size_t i = 0; i < mixture.size; ++i) {
    mixture.fraction[i] /= molar_mass(mixture.component[i]);
    moles += mixture.fraction[i];
  }
  for (std::size_t i = 0; i < mixture.size; ++i) mixture.fraction[i] /= moles;
}

}  // namespace

Outcome<Mixture> mixture_of(const Composition& analysis) {
  Mixture mixture;
  std::array<bool, kComponents> seen{};
  for (std::size_t i = 0; i < analysis.parts.size(); ++i) {
    const Part& part = analysis.parts[i];
    const Outcome<std::size_t> component = component_named(part.name);
    if (!component) return in_row(component.failure(), i);
    if (seen[*component]) {
      return in_row({Fault::impossible, 1, "names a component that stands in an earlier row"}, i);
    }
    seen[*component] = true;
    mixture.component[mixture.size] = static_cast<std::uint8_t>(*component);
    mixture.fraction[mixture.size] = part.amount;
    ++mixture.size;
  }
  const Failure amounts = check_amounts(analysis);
  if (amounts.fault != Fault::none) return amounts;
  if (analysis.basis == busbar::Basis::mass) divide_by_molar_masses(mixture);
  return mixture;
}

}  // namespace busbar::fuel::gaseous
