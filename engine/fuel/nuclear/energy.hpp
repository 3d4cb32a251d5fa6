// Heat from nuclear fuel by mass. Arithmetic of energy only.
#pragma once

#include <optional>
#include <string_view>

namespace busbar::fuel::nuclear {

/// Heat per mass of heavy metal at a burn-up; 1 MWd/kg = 86.4 GJ/kg exactly.
double heat_of_burn_up(double megawatt_days_per_kilogram);

struct Fission {
  std::string_view nuclide;
  double energy = 0;  ///< recoverable energy of one fission, eV
  double mass = 0;    ///< molar mass of the nuclide that is used up, kg/mol
};

/// "U-235", "U-238" (bred to plutonium 239) or "Th-232" (bred to uranium 233).
std::optional<Fission> fission_of(std::string_view nuclide);

/// Heat of the complete fission of a kilogram, J/kg: energy times the Avogadro constant over the
/// molar mass.
double heat_of_complete_fission(const Fission& fission);

}  // namespace busbar::fuel::nuclear
