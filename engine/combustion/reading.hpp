// The air ratio from what an analyser of the flue gas reads.
#pragma once

#include "combustion/fuel.hpp"
#include "combustion/oxidant.hpp"
#include "core/outcome.hpp"

namespace busbar::combustion {

/// What else a reading of oxygen may be taken with.
struct Incomplete {
  double carbon_monoxide = 0;  ///< in the same gas, by volume
  double unburnt_carbon = 0;   ///< share of the fuel's carbon that leaves as solid
};

/// From oxygen in the wet or dry flue gas, by volume. Argument 3 is the reading: at or above what
/// the oxidant itself has, or so low with the CO stated that no air would be left.
Outcome<double> air_ratio_from_oxygen(const Fuel& fuel, const Oxidant& air, double oxygen, bool wet,
                                      const Incomplete& incomplete);

/// From carbon dioxide of complete combustion, at an air ratio of 1 or more (below it the same CO2
/// comes twice). Argument 3: more than at an air ratio of 1, or no more than the oxidant brings;
/// argument 1: a fuel without carbon.
Outcome<double> air_ratio_from_carbon_dioxide(const Fuel& fuel, const Oxidant& air,
                                              double carbon_dioxide, bool wet,
                                              double unburnt_carbon);

/// Readings of an Orsat apparatus or the like, dry, by volume; nitrogen (with argon) is the rest.
struct DryReadings {
  double carbon_dioxide = 0;  ///< with SO2, which the same absorbent takes
  double carbon_monoxide = 0;
  double oxygen = 0;
};

/// From the balances of carbon and nitrogen, which use neither the oxygen of the fuel nor its
/// hydrogen: the gas per kilogram of fuel follows from the carbon found in it, the air from the
/// nitrogen. P. K. Nag, Power Plant Engineering, section 4.3. Arguments: 1 a fuel without carbon,
/// 3 readings without carbon or that sum above 1.
Outcome<double> air_ratio_from_dry_readings(const Fuel& fuel, const Oxidant& air,
                                            const DryReadings& readings, double unburnt_carbon);

}  // namespace busbar::combustion
