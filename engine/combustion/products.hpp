// Flue gas by element balance: complete combustion, and what is left incomplete on purpose.
#pragma once

#include <array>
#include <optional>

#include "combustion/fuel.hpp"
#include "combustion/oxidant.hpp"
#include "core/outcome.hpp"
#include "gas/mixture.hpp"

namespace busbar::combustion {

/// How a kilogram of fuel burns. The air ratio is oxidant given over oxidant needed for complete
/// combustion (the equivalence ratio is its reciprocal).
struct Burning {
  double air_ratio = 1;
  /// Share of the burnt carbon that leaves as CO. Where it is not stated all carbon burns to CO2,
  /// and below an air ratio of 1, hydrogen burning first, as much carbon to CO as oxygen is short.
  std::optional<double> carbon_to_monoxide;
  double unburnt_carbon = 0;  ///< share of the fuel's carbon that leaves as solid
  double water = 0;           ///< injected water or steam, kg per kg of fuel
};

/// What leaves, per kilogram of fuel.
struct Products {
  std::array<double, gas::kSpecies> amount{};  ///< mol/kg of fuel
  double carbon = 0;                           ///< solid, kg/kg
  double ash = 0;                              ///< kg/kg
  double air = 0;                              ///< that was given, kg/kg

  [[nodiscard]] double of(gas::Species species) const {
    return amount[static_cast<std::size_t>(species)];
  }
  [[nodiscard]] double moles(bool wet) const;
  [[nodiscard]] double mass(bool wet) const;  ///< of the gas, kg/kg
  [[nodiscard]] Outcome<gas::Mixture> mixture(bool wet) const;
};

/// Arguments of failures: 3 the air ratio (not enough oxygen for what was asked).
Outcome<Products> burn(const Fuel& fuel, const Oxidant& air, const Burning& burning);

/// Oxidant in which a share of the flue gas is recirculated, all of it wet: `recirculation` is the
/// mass of flue gas drawn back over the mass of flue gas that leaves to the stack; `air_ratio` is
/// that of the fresh air. Argument 3: less air than complete combustion takes.
Outcome<gas::Mixture> with_recirculation(const Fuel& fuel, const Oxidant& air, double air_ratio,
                                         double recirculation);

/// The greatest share of CO2 that the dry flue gas can have: at an air ratio of 1.
double greatest_carbon_dioxide(const Fuel& fuel, const Oxidant& air);

}  // namespace busbar::combustion
