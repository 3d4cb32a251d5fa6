#include "combustion/oxidant.hpp"

namespace busbar::combustion {

using gas::Element;
using gas::Species;

Outcome<Oxidant> oxidant_from(const gas::Mixture& mixture) {
  Oxidant air;
  air.mixture = mixture;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    for (std::size_t e = 0; e < gas::kElementCount; ++e) {
      air.elements[e] +=
          gas::atoms(mixture.species(i), static_cast<Element>(e)) * mixture.mole_fraction(i);
    }
  }
  air.oxygen =
      air.of(Element::O) / 2 - air.of(Element::C) - air.of(Element::H) / 4 - air.of(Element::S);
  // The elements of CO2 and H2O cancel to a few ulp of the whole.
  constexpr double kNothing = 1e-12;
  if (!(air.oxygen > kNothing)) {
    return Failure{Fault::impossible, 1, "holds no oxygen for a fuel"};
  }
  return air;
}

double stoichiometric_moles(const Fuel& fuel, const Oxidant& air) {
  return stoichiometric_oxygen(fuel) / air.oxygen;
}

double stoichiometric_air(const Fuel& fuel, const Oxidant& air) {
  return stoichiometric_moles(fuel, air) * air.molar_mass();
}

Outcome<gas::Mixture> with_humidity(const gas::Mixture& dry, double humidity) {
  if (dry.mole_fraction(Species::H2O) > 0) {
    return Failure{Fault::impossible, 1, "already holds water"};
  }
  auto amounts = dry.fractions();
  amounts[static_cast<std::size_t>(Species::H2O)] =
      humidity * dry.molar_mass() / gas::molar_mass(Species::H2O);
  return gas::Mixture::from_amounts(amounts);
}

}  // namespace busbar::combustion
