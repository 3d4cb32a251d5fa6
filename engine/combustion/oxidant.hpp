// Air, or whatever gas stands in for it: humid, enriched, mixed with recirculated flue gas.
#pragma once

#include "combustion/fuel.hpp"
#include "gas/mixture.hpp"

namespace busbar::combustion {

/// One mole of oxidant. Its own combustible traces (methane and hydrogen of ISO 2533) burn with its
/// oxygen, so that `oxygen` is what is left for the fuel.
struct Oxidant {
  gas::Mixture mixture;
  Elements elements{};
  double oxygen = 0;  ///< mol O2 per mol that a fuel can use

  [[nodiscard]] double of(gas::Element element) const {
    return elements[static_cast<std::size_t>(element)];
  }
  [[nodiscard]] double molar_mass() const { return mixture.molar_mass(); }  ///< kg/mol
};

/// Refuses a gas that has no oxygen for a fuel. Argument 1.
Outcome<Oxidant> oxidant_from(const gas::Mixture& mixture);

/// Oxidant for complete combustion of a kilogram of fuel, mol/kg.
double stoichiometric_moles(const Fuel& fuel, const Oxidant& air);

/// The same in kg/kg.
double stoichiometric_air(const Fuel& fuel, const Oxidant& air);

/// Dry gas with water vapour, `humidity` in kg water per kg dry gas. Refuses a gas that already
/// holds water (argument 1).
Outcome<gas::Mixture> with_humidity(const gas::Mixture& dry, double humidity);

}  // namespace busbar::combustion
