// Tolerances on guaranteed values of rotating machines: IEC 60034-1, schedule of tolerances.
#pragma once

#include "core/outcome.hpp"

namespace busbar::electrical {

/// Rated power (W or VA) up to which the wider tolerance on efficiency holds.
inline constexpr double kSmallMachine = 150e3;

/// The least efficiency within the tolerance on a guaranteed one: less 15 % of the losses per unit
/// (1 - efficiency) up to 150 kW or kVA, less 10 % above.
double tolerated_efficiency(double guaranteed, double rated_power);

/// The most total losses within the tolerance: 110 %. The schedule has it above 150 kW or kVA only;
/// a smaller machine (input 2) is out of range.
Outcome<double> tolerated_loss(double guaranteed, double rated_power);

}  // namespace busbar::electrical
