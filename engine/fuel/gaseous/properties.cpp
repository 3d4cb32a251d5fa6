#include "fuel/gaseous/properties.hpp"

#include <cmath>

#include "fuel/gaseous/constants.hpp"

namespace busbar::fuel::gaseous {
namespace {

constexpr double kKilojoule = 1e3;

}  // namespace

double molar_mass(const Mixture& gas) {
  double sum = 0;
  for (std::size_t i = 0; i < gas.size; ++i) sum += gas.fraction[i] * molar_mass(gas.component[i]);
  return sum;
}

double hydrogen_atoms(const Mixture& gas) {
  double sum = 0;
  for (std::size_t i = 0; i < gas.size; ++i) {
    sum += gas.fraction[i] * components()[gas.component[i]].atoms[kH];
  }
  return sum;
}

double summation_factor(const Mixture& gas, std::size_t metering_column) {
  double sum = 0;
  for (std::size_t i = 0; i < gas.size; ++i) {
    sum += gas.fraction[i] * components()[gas.component[i]].summation_factor[metering_column];
  }
  return sum;
}

double molar_heating_value(const Mixture& gas, Basis basis, Combustion combustion) {
  double higher = 0;
  for (std::size_t i = 0; i < gas.size; ++i) {
    const Component& component = components()[gas.component[i]];
    higher += gas.fraction[i] * component.higher_heating_value[combustion.column] * kKilojoule;
  }
  if (basis == Basis::higher) return higher;
  return higher - hydrogen_atoms(gas) / 2 * kVaporization[combustion.column];
}

double mass_heating_value(const Mixture& gas, Basis basis, Combustion combustion) {
  return molar_heating_value(gas, basis, combustion) / molar_mass(gas);
}

Outcome<double> compression_factor(const Mixture& gas, const Metering& metering) {
  const double s = summation_factor(gas, metering.column);
  const double z = 1 - metering.pressure / kReferencePressure * s * s;
  if (z > kLeastCompressionFactor) return z;
  return Failure{
      Fault::outside_range,
      1,
      "has the compression factor {0} at the metering conditions, and ISO 6976 holds above {1} "
      "only",
      {{{z, Quantity::number}, {kLeastCompressionFactor, Quantity::number}}}};
}

Outcome<double> molar_volume(const Mixture& gas, const Metering& metering) {
  const Outcome<double> z = compression_factor(gas, metering);
  if (!z) return z.failure();
  return *z * kGasConstant.value * metering.temperature / metering.pressure;
}

Outcome<double> volume_heating_value(const Mixture& gas, Basis basis, Combustion combustion,
                                     const Metering& metering) {
  const Outcome<double> volume = molar_volume(gas, metering);
  if (!volume) return volume.failure();
  return molar_heating_value(gas, basis, combustion) / *volume;
}

Outcome<double> density(const Mixture& gas, const Metering& metering) {
  const Outcome<double> volume = molar_volume(gas, metering);
  if (!volume) return volume.failure();
  return molar_mass(gas) / *volume;
}

double air_compression_factor(const Metering& metering) {
  return 1 - metering.pressure / kReferencePressure * (1 - kAirCompressionFactor[metering.column]);
}

Outcome<double> relative_density(const Mixture& gas, const Metering& metering) {
  const Outcome<double> z = compression_factor(gas, metering);
  if (!z) return z.failure();
  return molar_mass(gas) / kAirMolarMass.value * air_compression_factor(metering) / *z;
}

Outcome<double> wobbe_index(const Mixture& gas, Basis basis, Combustion combustion,
                            const Metering& metering) {
  const Outcome<double> value = volume_heating_value(gas, basis, combustion, metering);
  if (!value) return value.failure();
  const Outcome<double> relative = relative_density(gas, metering);
  if (!relative) return relative.failure();
  return *value / std::sqrt(*relative);
}

}  // namespace busbar::fuel::gaseous
