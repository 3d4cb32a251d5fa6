// Distribution and pitch factor of a winding, for the fundamental.
#pragma once

#include "core/outcome.hpp"

namespace busbar::electrical {

/// sin(m beta / 2) / (m sin(beta / 2)) with m = slots / (poles phases) slots to a pole and phase
/// and beta = 180 degrees poles / slots between slots. Inputs: slots, poles, phases. A winding
/// with a broken number of slots to a pole and phase is outside the range of this formula.
Outcome<double> distribution_factor(double slots, double poles, double phases);

/// cos(alpha / 2), alpha the angle by which a coil that spans `span` slots differs from a full
/// pitch of slots / poles. Inputs: slots, poles, span.
Outcome<double> pitch_factor(double slots, double poles, double span);

/// The product of the two. Inputs: slots, poles, phases, span.
Outcome<double> winding_factor(double slots, double poles, double phases, double span);

}  // namespace busbar::electrical
