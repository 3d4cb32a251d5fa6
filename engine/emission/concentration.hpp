// Concentrations in flue gas: reference oxygen, dry and wet, parts per million and mass, reference
// temperature and pressure; and emission per energy by F factors. SI.
#pragma once

#include <cstdint>
#include <optional>
#include <span>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::emission {

/// Concentration at the reference oxygen: c (air - reference)/(air - measured). All oxygen contents
/// as fractions of the same gas, dry or wet. Failures: 2 measured or 3 reference oxygen not below
/// that of air.
Outcome<double> at_oxygen(double concentration, double measured, double reference, double air);

/// A published oxygen content to which limits refer.
struct ReferenceOxygen {
  std::string_view plant;
  double oxygen = 0;
  std::string_view source;
  std::string_view status;
};
std::span<const ReferenceOxygen> reference_oxygens();
/// Failure (argument 1): unknown, with the nearest names.
Outcome<const ReferenceOxygen*> reference_oxygen(std::string_view plant);

/// Molar mass in kg/mol of a gas that limits are set for, by its formula; "NOx" is none, because
/// it has the mass that it is counted as.
std::optional<double> molar_mass_of(std::string_view gas);

/// Moles of an ideal gas per volume.
double molar_density(double temperature, double pressure);

/// Factor on a mass per volume when the gas goes from one temperature and pressure to another.
double density_ratio(double from_temperature, double from_pressure, double to_temperature,
                     double to_pressure);

/// Emission per fuel energy (EPA Method 19): by oxygen in dry gas (equation 19-1), by oxygen in wet
/// gas (19-2) with the moisture of the ambient air, by carbon dioxide (19-6). Failures: 3 the
/// oxygen or carbon dioxide.
Outcome<double> emission_by_dry_oxygen(double concentration, double f_dry, double oxygen);
Outcome<double> emission_by_wet_oxygen(double concentration, double f_wet, double oxygen,
                                       double air_moisture);
double emission_by_carbon_dioxide(double concentration, double f_carbon, double carbon_dioxide);

}  // namespace busbar::emission
