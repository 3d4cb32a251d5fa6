// The state on an isobar that has a given enthalpy or entropy: choice of region and the seam rule.
//
// The seam rule. At their common boundaries the basic equations of IF97 differ a little (up to
// 0.03 kJ/kg at 623.15 K between regions 1 and 3, 0.13 on the boundary between 2 and 3, 0.1 at
// 1073.15 K between 2 and 5; R7-97(2012), the consistency paragraphs of each section). Along an
// isobar of rising temperature the enthalpy or entropy then either skips a range at the boundary (a
// gap: no temperature solves) or runs through one twice (an overlap: two temperatures solve).
//  - Overlap: the region of the lower number answers.
//  - Gap: the temperature is the boundary's, the given property is kept exactly, and the others are
//    interpolated linearly between the two sides of the boundary with the weight that the given
//    property has in the gap. The region is the one of the lower number.
//  - Regions are decided by the basic equations at the boundaries, never by backward equations.
//  - At pressure and temperature the boundaries belong to the lower region: 623.15 K to region 1,
//    B23 to region 2, 1073.15 K to region 2.
//  - Between saturated liquid and vapour, both included, the state is two-phase; this comes before
//    the overlap of regions 2 and 3, which reaches into the saturated vapour up to 1 kPa above
//    16.529 MPa (the temperature then steps by 2 mK from dryness 1 to region 2).
// In a gap of both properties (p,s) -> h -> (p,h) comes back exactly. Where the enthalpy has a gap
// and the entropy an overlap or the other way round (both then differ by less than the published
// step of the Gibbs energy, 0.005 kJ/kg, allows), it comes back within that step.
#pragma once

#include "core/outcome.hpp"
#include "water/solve/inverse.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// A state and how often a basic equation was evaluated inside the iterations that led to it.
struct Found {
  State state;
  int evaluations = 0;
};

/// Saturated liquid and vapour at a pressure.
struct Saturated {
  double temperature = 0;
  Properties liquid;
  Properties vapour;
  int evaluations = 0;
  bool converged = false;
};

/// Pressure (Pa) from that of 273.15 K up to the critical one; not checked here.
Saturated saturated_at(double pressure);

/// The two-phase state of a dryness between saturated liquid and vapour (lever rule).
State two_phase_state(double pressure, const Saturated& saturated, double dryness);

/// State at pressure (Pa, inside the published range) and enthalpy (J/kg) or entropy (J/(kg K)).
template <Given kGiven>
Outcome<Found> on_isobar(double pressure, double value);

}  // namespace busbar::water
