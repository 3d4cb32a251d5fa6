// The properties of a fuel gas by name, for tables of all of them.
#pragma once

#include <cstdint>

#include "fuel/gaseous/properties.hpp"

namespace busbar::fuel::gaseous {

enum class Property : std::uint8_t {
  molar_mass,
  compression_factor,
  molar_volume,
  molar_heating_value,
  mass_heating_value,
  volume_heating_value,
  density,
  relative_density,
  wobbe_index,
};

/// One property in SI, as its own function in properties.hpp gives it. Those that are no heating
/// value take no notice of the basis and the combustion temperature.
Outcome<double> value_of(Property property, const Mixture& gas, Basis basis, Combustion combustion,
                         const Metering& metering);

}  // namespace busbar::fuel::gaseous
