#include "fuel/gaseous/property.hpp"

namespace busbar::fuel::gaseous {

Outcome<double> value_of(Property property, const Mixture& gas, Basis basis, Combustion combustion,
                         const Metering& metering) {
  switch (property) {
    case Property::molar_mass:
      return molar_mass(gas);
    case Property::compression_factor:
      return compression_factor(gas, metering);
    case Property::molar_volume:
      return molar_volume(gas, metering);
    case Property::molar_heating_value:
      return molar_heating_value(gas, basis, combustion);
    case Property::mass_heating_value:
      return mass_heating_value(gas, basis, combustion);
    case Property::volume_heating_value:
      return volume_heating_value(gas, basis, combustion, metering);
    case Property::density:
      return density(gas, metering);
    case Property::relative_density:
      return relative_density(gas, metering);
    case Property::wobbe_index:
      return wobbe_index(gas, basis, combustion, metering);
  }
  return Failure{Fault::internal, 0, "has a defect: please report it"};
}

}  // namespace busbar::fuel::gaseous
