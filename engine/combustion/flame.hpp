// Flames without loss of heat: what fuel and air bring, and the temperature that it leads to.
#pragma once

#include "combustion/equilibrium.hpp"
#include "combustion/fuel.hpp"
#include "combustion/oxidant.hpp"
#include "core/outcome.hpp"

namespace busbar::combustion {

/// What goes into a flame, per kilogram of fuel.
struct Feed {
  double air_ratio = 1;
  double fuel_temperature = kReferenceTemperature;  ///< K
  double air_temperature = kReferenceTemperature;   ///< K
};

/// Elements and enthalpy (J/kg of fuel, formation datum) of fuel and air together.
struct Reactants {
  Elements elements{};
  double enthalpy = 0;
  double mass = 0;  ///< kg per kg of fuel that takes part in gas or carbon, without ash
};

/// Elements alone.
Elements elements_of(const Fuel& fuel, const Oxidant& air, double air_ratio);

/// Arguments of failures here and below: 1 the fuel (an analysis without heating value), 3 the air
/// ratio, 4 and 5 the temperatures of fuel and air. Ash takes no heat.
Outcome<Reactants> reactants(const Fuel& fuel, const Oxidant& air, const Feed& feed);

/// Complete combustion as products.hpp has it: no dissociation. K.
Outcome<double> complete_flame_temperature(const Fuel& fuel, const Oxidant& air, const Feed& feed);

/// Chemical equilibrium at constant enthalpy and pressure.
Outcome<Equilibrium> equilibrium_flame(const Fuel& fuel, const Oxidant& air, const Feed& feed,
                                       double pressure);

}  // namespace busbar::combustion
