// A fuel as combustion sees it: elements, ash, and the enthalpy that it brings.
#pragma once

#include <array>
#include <optional>

#include "core/composition.hpp"
#include "core/outcome.hpp"
#include "fuel/basis.hpp"
#include "gas/species.hpp"

namespace busbar::combustion {

/// Amounts of substance of the elements, by gas::Element.
using Elements = std::array<double, gas::kElementCount>;

/// What heating values and heats of formation of the tables refer to, K.
inline constexpr double kReferenceTemperature = 298.15;

/// One kilogram of fuel. Amounts are in mol/kg.
struct Fuel {
  Elements elements{};
  std::array<double, gas::kSpecies> gases{};
  std::array<double, gas::kCondensed> liquids{};  ///< and solids
  double ash = 0;                                 ///< kg/kg
  bool analysed = false;                          ///< elements of an analysis instead of species
  /// Of an analysed fuel at 298.15 K, J/kg; none without a heating value.
  std::optional<double> formation_enthalpy;

  [[nodiscard]] double of(gas::Element element) const {
    return elements[static_cast<std::size_t>(element)];
  }
  /// Moles of a fuel of species; nought for an analysis.
  [[nodiscard]] double moles() const;
};

/// How the part that carries a heating value is written; its amount is in MJ/kg.
inline constexpr std::string_view kHigherValueName = "HHV (MJ/kg)";
inline constexpr std::string_view kLowerValueName = "LHV (MJ/kg)";
inline constexpr double kLeastHeatingValue = 1.5e6;  ///< J/kg
inline constexpr double kMostHeatingValue = 1.5e8;

/// Reads a fuel from its parts, argument 1 in all failures, `row` counts the part to blame.
///  - Gases, liquids and graphite by name (CH4, n-C8H18(L), C(gr)), by mole or by mass.
///  - An ultimate analysis: by mass, with C, H, O, N, S, ash and moisture as fired (hydrogen and
///    oxygen without those of the moisture), beside them one part named as above with a heating
///    value at 25 °C and constant pressure.
/// Refused: what does not sum to one, what is negative, repeated or unknown, an analysis by mole,
/// chlorine (no product of it is among the species), free atoms and radicals, and a fuel that takes
/// no oxygen.
Outcome<Fuel> fuel_from(const Composition& composition);

/// The composition of an analysed fuel with its heating value as a further part. Argument 2 is the
/// heating value, argument 1 the analysis.
Outcome<Composition> with_heating_value(const Composition& analysis, double value,
                                        fuel::Basis basis);

/// Oxygen for complete combustion to CO2, H2O, SO2 and N2, mol O2 per kg of fuel.
double stoichiometric_oxygen(const Fuel& fuel);

/// Enthalpy on the formation datum, J/kg. Argument 1: an analysis without heating value. Argument
/// 2: a temperature outside the fits, or other than 298.15 K for an analysis, which has no heat
/// capacity.
Outcome<double> enthalpy(const Fuel& fuel, double temperature);

/// Heat that complete combustion gives when fuel, oxygen and products have the same temperature,
/// J/kg; water is liquid for the higher and vapour for the lower value. Arguments 1 and 2 as
/// above.
Outcome<double> heat_of_combustion(const Fuel& fuel, fuel::Basis basis, double temperature);

}  // namespace busbar::combustion
