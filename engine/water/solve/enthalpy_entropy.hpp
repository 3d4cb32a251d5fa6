// The state that has a given enthalpy and entropy.
#pragma once

#include "core/outcome.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {

/// Evaluations of the isentrope after which the iteration gives up (no_convergence). Tests hold the
/// worst case far below.
inline constexpr int kIsentropeCap = 120;

/// State at enthalpy (J/kg) and entropy (J/(kg K)). Along an isentrope dh = v dp: the enthalpy
/// rises with the pressure through all regions, wet steam and seams included, so the pressure is
/// the one root of a rising function whose slope is the volume. Each point of the isentrope is the
/// state at pressure and entropy, with the seam rule of solve/isobar.hpp; where the isentrope steps
/// at a seam, the state stays at the step and keeps the given enthalpy. `evaluations` counts the
/// points.
Outcome<Found> at_enthalpy_entropy(double enthalpy, double entropy);

}  // namespace busbar::water
