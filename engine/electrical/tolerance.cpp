#include "electrical/tolerance.hpp"

namespace busbar::electrical {

double tolerated_efficiency(double guaranteed, double rated_power) {
  const double share = rated_power <= kSmallMachine ? 0.15 : 0.10;
  return guaranteed - share * (1 - guaranteed);
}

Outcome<double> tolerated_loss(double guaranteed, double rated_power) {
  if (rated_power <= kSmallMachine) {
    return Failure{Fault::outside_range,
                   2,
                   "{0} is not above {1}: the schedule has a tolerance on total losses for larger "
                   "machines only, and one on efficiency for all, see TOLERATED_EFFICIENCY",
                   {{{rated_power, Quantity::power}, {kSmallMachine, Quantity::power}}}};
  }
  return 1.1 * guaranteed;
}

}  // namespace busbar::electrical
