// Properties of ideal-gas mixtures, in SI per kg.
//
// Everything holds from the greatest of the lowest to the least of the highest temperatures of the
// species' fits (200 to 6,000 K but for jet fuel); outside there is a failure. Water counts as
// vapour: whoever knows the pressure asks gas/condensation.hpp first. Entropies are absolute (of
// the ideal gas, zero at 0 K, mixing included).
#pragma once

#include "core/outcome.hpp"
#include "gas/datum.hpp"
#include "gas/mixture.hpp"
#include "gas/polynomial.hpp"

namespace busbar::gas {

/// The polynomial of a mixture, per mole of it, below or from 1,000 K on. Mixing terms of the
/// entropy are not in it.
Polynomial cold_fit(const Mixture& mixture);
Polynomial hot_fit(const Mixture& mixture);

inline Polynomial fit(const Mixture& mixture, double temperature) {
  return temperature < kBreak ? cold_fit(mixture) : hot_fit(mixture);
}

/// -sum x ln x: entropy of mixing over R.
double mixing_entropy(const Mixture& mixture);

double lowest_temperature(const Mixture& mixture);
double highest_temperature(const Mixture& mixture);

/// Refuses what lies outside the fits. Argument 2.
Failure check_temperature(const Mixture& mixture, double temperature);

/// Specific gas constant, J/(kg K).
inline double specific_gas_constant(const Mixture& mixture) {
  return kGasConstant / mixture.molar_mass();
}

/// What one evaluation gives: J/kg on the formation datum, J/(kg K) at 1 bar with mixing.
struct Caloric {
  double enthalpy = 0;
  double heat_capacity = 0;
  double entropy = 0;
};
Outcome<Caloric> caloric(const Mixture& mixture, double temperature);

/// Argument 2 is the temperature.
Outcome<double> heat_capacity(const Mixture& mixture, double temperature);
Outcome<double> enthalpy(const Mixture& mixture, double temperature, Datum datum);

/// Mean of cp over a span of temperatures (arguments 2 and 3); at no span cp itself.
Outcome<double> mean_heat_capacity(const Mixture& mixture, double from, double to);

/// What must be added to an enthalpy on the formation datum, J/kg. Argument 1: a gas whose fits
/// begin above the datum has none.
Outcome<double> datum_shift(const Mixture& mixture, Datum datum);

/// Arguments 2 and 3 are pressure and temperature.
Outcome<double> entropy(const Mixture& mixture, double pressure, double temperature);
Outcome<double> density(const Mixture& mixture, double pressure, double temperature);

/// Argument 2 is the temperature.
Outcome<double> isochoric_heat_capacity(const Mixture& mixture, double temperature);
Outcome<double> heat_capacity_ratio(const Mixture& mixture, double temperature);
Outcome<double> speed_of_sound(const Mixture& mixture, double temperature);

/// The temperature of an enthalpy (argument 2). Where the fits meet, at 1,000 K, an enthalpy in
/// the gap between them belongs to 1,000 K and one in their overlap to the lower fit.
Outcome<double> temperature_at_enthalpy(const Mixture& mixture, double enthalpy, Datum datum);

/// The temperature of an entropy (argument 3) at a pressure (argument 2).
Outcome<double> temperature_at_entropy(const Mixture& mixture, double pressure, double entropy);

}  // namespace busbar::gas
