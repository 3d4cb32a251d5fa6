// An analysis on another basis.
#pragma once

#include <optional>

#include "fuel/solid/analysis.hpp"

namespace busbar::fuel::solid {

/// What an analysis on another basis may need beside the analysis.
struct Supplement {
  std::optional<double> moisture;  ///< of the wanted state, as a fraction of the moist mass
  std::optional<double> ash;       ///< on dry mass, where the analysis is dry ash-free
};

/// The analysis in another state. Failures: 1 the analysis, 2 the wanted state, 3 the moisture
/// (needed and left out, or given though the analysis holds it), 4 the ash, likewise.
/// ISO 1170:2020, ISO 16993:2016, ASTM D3180: every share but moisture and ash keeps its proportion
/// to the dry ash-free mass; dry = moist / (1 - M), daf = dry / (1 - A).
Outcome<Analysis> in_state(const Analysis& analysis, State to, const Supplement& supplement);

/// The moistures and the dry ash of one fuel, as far as they are known.
struct Dilution {
  std::optional<double> moisture_as_received;
  std::optional<double> moisture_air_dried;
  std::optional<double> ash_dry;
};

/// Factor on a share (other than moisture) or a gross heating value from one state to another.
/// Failures: 3 the moisture as received, 4 air-dried, 5 the ash, where one is needed and left out.
/// ISO 1170:2020, table of conversion factors.
Outcome<double> factor(State from, State to, const Dilution& dilution);

}  // namespace busbar::fuel::solid
