// Properties of a fuel gas from its composition: ISO 6976:2016, Natural gas - Calculation of
// calorific values, density, relative density and Wobbe indices from composition.
//
// Heating values by mole and by mass are those of the ideal gas, which the standard takes for the
// real gas too. Values by volume, densities and the Wobbe index are those of
// the real gas at the metering conditions; they need a compression factor above 0.9.
#pragma once

#include "core/outcome.hpp"
#include "fuel/basis.hpp"
#include "fuel/gaseous/conditions.hpp"
#include "fuel/gaseous/mixture.hpp"

namespace busbar::fuel::gaseous {

/// The least compression factor for which the standard's equation of state holds.
inline constexpr double kLeastCompressionFactor = 0.9;

/// kg/mol.
double molar_mass(const Mixture& gas);

/// Moles of hydrogen atoms in a mole of gas: each two make one mole of water.
double hydrogen_atoms(const Mixture& gas);

/// Sum of mole fraction times summation factor, at 101.325 kPa and the metering temperature.
double summation_factor(const Mixture& gas, std::size_t metering_column);

/// J/mol: sum of mole fraction times gross molar heating value; the lower one is less by the
/// enthalpy of vaporization of the water formed, (b/2) L0. The water of the fuel itself counts with
/// L0 on the higher and with nothing on the lower basis.
double molar_heating_value(const Mixture& gas, Basis basis, Combustion combustion);

/// J/kg.
double mass_heating_value(const Mixture& gas, Basis basis, Combustion combustion);

/// Z = 1 - (p/p0) s^2, with p0 = 101.325 kPa. Below 0.9 refused (input 1).
Outcome<double> compression_factor(const Mixture& gas, const Metering& metering);

/// Of the real gas, Z R T/p, m3/mol.
Outcome<double> molar_volume(const Mixture& gas, const Metering& metering);

/// J/m3, real gas.
Outcome<double> volume_heating_value(const Mixture& gas, Basis basis, Combustion combustion,
                                     const Metering& metering);

/// kg/m3, real gas.
Outcome<double> density(const Mixture& gas, const Metering& metering);

/// Density over that of dry air of reference composition at the same conditions, both real.
Outcome<double> relative_density(const Mixture& gas, const Metering& metering);

/// Heating value by volume over the square root of the relative density, J/m3, real gas.
Outcome<double> wobbe_index(const Mixture& gas, Basis basis, Combustion combustion,
                            const Metering& metering);

/// Compression factor of dry air: linear in pressure, as that of the gas.
double air_compression_factor(const Metering& metering);

}  // namespace busbar::fuel::gaseous
