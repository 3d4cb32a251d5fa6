// Chemical equilibrium of an ideal gas, with graphite where it forms.
//
// The Gibbs energy is least under the balance of elements: S. Gordon, B. J. McBride, Computer
// Program for Calculation of Complex Chemical Equilibrium Compositions and Applications, NASA
// RP-1311 part I, 1994, sections 2.2 and 2.3 (element potentials, reduced Gibbs iteration) and 3.3
// (damping). Species: those of gas/species.hpp that flames of C, H, O, N and S hold; noble gases
// take no part.
#pragma once

#include <array>

#include "combustion/fuel.hpp"
#include "core/outcome.hpp"

namespace busbar::combustion {

struct Equilibrium {
  double temperature = 0;                      ///< K
  std::array<double, gas::kSpecies> amount{};  ///< mol, of what was given
  double graphite = 0;                         ///< mol, solid
  unsigned steps = 0;                          ///< iterations that it took

  [[nodiscard]] double of(gas::Species species) const {
    return amount[static_cast<std::size_t>(species)];
  }
  [[nodiscard]] double moles() const;  ///< of gas
};

/// Where the solver is used: below, gases do not reach equilibrium, and water and sulfuric acid
/// condense; above, ions appear, which are not among the species.
inline constexpr double kLowestEquilibrium = 500;
inline constexpr double kHighestEquilibrium = 5000;

/// At a temperature and a pressure. Argument 1: elements of which no gas is made. Argument 2: the
/// temperature.
Outcome<Equilibrium> equilibrium_at(const Elements& elements, double temperature, double pressure);

/// Of an enthalpy (J on the formation datum, of all that was given) at a pressure. Argument 2: an
/// enthalpy whose temperature lies outside the limits above.
Outcome<Equilibrium> equilibrium_of(const Elements& elements, double enthalpy, double pressure);

/// Enthalpy of what an equilibrium holds, J on the formation datum.
double enthalpy(const Equilibrium& equilibrium);

}  // namespace busbar::combustion
