// Quantities: what a number means, as a type. Kernels take and return these, always in SI.
#pragma once

#include <cstdint>

namespace busbar {

/// What a number measures. The unit in which a user sees it follows from this and the unit set
/// (catalogue/units.hpp). Absolute pressure, gauge pressure and vacuum are separate quantities, and
/// so are a temperature and a temperature difference: none may pass for the other.
enum class Quantity : std::uint8_t {
  number,                  ///< plain number or ratio, the same in every unit set
  fraction,                ///< part of a whole; 0.38, shown by Calc as 38 %
  pressure,                ///< absolute, Pa
  gauge_pressure,          ///< above ambient, Pa
  vacuum,                  ///< below ambient, Pa
  temperature,             ///< K
  temperature_difference,  ///< K
  enthalpy,                ///< specific, J/kg
  entropy,                 ///< specific, J/(kg K)
  volume,                  ///< specific, m3/kg
  density,                 ///< kg/m3
  flow,                    ///< mass flow, kg/s
  power,                   ///< W
  heat_rate,               ///< fuel energy per unit of electricity, J/J
  specific_energy,         ///< internal, Helmholtz and Gibbs energy, exergy; J/kg
  heat_capacity,           ///< specific, J/(kg K)
  velocity,                ///< m/s
  thermal_expansion,       ///< relative volume per temperature, 1/K
  compressibility,         ///< relative volume per pressure, 1/Pa
  joule_thomson,           ///< temperature per pressure at constant enthalpy, K/Pa
  viscosity,               ///< dynamic, Pa s
  thermal_conductivity,    ///< W/(m K)
  surface_tension,         ///< N/m
  heating_value,           ///< of a fuel by mass, J/kg
  molar_heating_value,     ///< J/mol
  volume_heating_value,    ///< by volume at stated reference conditions, J/m3
  molar_mass,              ///< kg/mol
  molar_volume,            ///< m3/mol
  length,                  ///< length, height, altitude; m
  component_power,         ///< losses, motors and single auxiliaries; W
  apparent_power,          ///< VA
  reactive_power,          ///< var
  voltage,                 ///< V
  current,                 ///< A
  resistance,              ///< ohm
  magnetic_flux,           ///< Wb
  flux_density,            ///< T
  frequency,               ///< Hz
  rotational_speed,        ///< turns per second, 1/s
  emission_factor,         ///< mass that is emitted per fuel energy, kg/J
  gas_per_energy,          ///< volume of gas per fuel energy at stated reference conditions, m3/J
  mass_concentration,      ///< mass in a volume of gas at stated conditions, kg/m3
  same_unit,               ///< any unit; the result of the function is in the same one
  count_
};

/// A number with its quantity. `si` is in the SI unit named above.
template <Quantity Q>
struct Of {
  static constexpr Quantity quantity = Q;
  double si = 0;
};

using Number = Of<Quantity::number>;
using Fraction = Of<Quantity::fraction>;
using Pressure = Of<Quantity::pressure>;
using GaugePressure = Of<Quantity::gauge_pressure>;
using Vacuum = Of<Quantity::vacuum>;
using Temperature = Of<Quantity::temperature>;
using TemperatureDifference = Of<Quantity::temperature_difference>;
using Enthalpy = Of<Quantity::enthalpy>;
using Entropy = Of<Quantity::entropy>;
using Volume = Of<Quantity::volume>;
using Density = Of<Quantity::density>;
using Flow = Of<Quantity::flow>;
using Power = Of<Quantity::power>;
using HeatRate = Of<Quantity::heat_rate>;
using SpecificEnergy = Of<Quantity::specific_energy>;
using HeatCapacity = Of<Quantity::heat_capacity>;
using Velocity = Of<Quantity::velocity>;
using ThermalExpansion = Of<Quantity::thermal_expansion>;
using Compressibility = Of<Quantity::compressibility>;
using JouleThomson = Of<Quantity::joule_thomson>;
using Viscosity = Of<Quantity::viscosity>;
using ThermalConductivity = Of<Quantity::thermal_conductivity>;
using SurfaceTension = Of<Quantity::surface_tension>;
using HeatingValue = Of<Quantity::heating_value>;
using MolarHeatingValue = Of<Quantity::molar_heating_value>;
using VolumeHeatingValue = Of<Quantity::volume_heating_value>;
using MolarMass = Of<Quantity::molar_mass>;
using MolarVolume = Of<Quantity::molar_volume>;
using Length = Of<Quantity::length>;
using ComponentPower = Of<Quantity::component_power>;
using ApparentPower = Of<Quantity::apparent_power>;
using ReactivePower = Of<Quantity::reactive_power>;
using Voltage = Of<Quantity::voltage>;
using Current = Of<Quantity::current>;
using Resistance = Of<Quantity::resistance>;
using MagneticFlux = Of<Quantity::magnetic_flux>;
using FluxDensity = Of<Quantity::flux_density>;
using Frequency = Of<Quantity::frequency>;
using RotationalSpeed = Of<Quantity::rotational_speed>;
using EmissionFactor = Of<Quantity::emission_factor>;
using GasPerEnergy = Of<Quantity::gas_per_energy>;
using MassConcentration = Of<Quantity::mass_concentration>;
using SameUnit = Of<Quantity::same_unit>;

}  // namespace busbar
