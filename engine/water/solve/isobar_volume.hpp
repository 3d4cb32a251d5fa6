// The state on an isobar that has a given volume, with the count of its iteration.
#pragma once

#include "core/outcome.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {

/// What at_pressure_volume of pairs.hpp answers; `evaluations` counts those inside the iteration.
Outcome<Found> on_isobar_with_volume(double pressure, double volume);

}  // namespace busbar::water
