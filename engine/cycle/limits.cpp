#include "cycle/limits.hpp"

#include <cmath>

#include "fluid/state.hpp"

namespace busbar::cycle {
namespace {

Failure not_colder(double hot, double cold) {
  return {Fault::impossible,
          2,
          "{0} is not below the hot temperature {1}",
          {{{cold, Quantity::temperature}, {hot, Quantity::temperature}}}};
}

}  // namespace

Outcome<double> carnot(double hot, double cold) {
  if (!(cold < hot)) return not_colder(hot, cold);
  return 1 - cold / hot;
}

Outcome<double> curzon_ahlborn(double hot, double cold) {
  if (!(cold < hot)) return not_colder(hot, cold);
  return 1 - std::sqrt(cold / hot);
}

Outcome<double> mean_heating_temperature(const Stream& inlet, const Stream& outlet) {
  if (const Failure other = fluid::refuse_other_fluid(inlet, outlet); other.fault != Fault::none) {
    return other;
  }
  const auto before = fluid::state_of(inlet);
  if (!before) return before.failure().about(1);
  const auto after = fluid::state_of(outlet);
  if (!after) return after.failure().about(2);
  const double heat = after->enthalpy - before->enthalpy;
  const double entropy = after->entropy - before->entropy;
  if (!(heat > 0) || !(entropy > 0)) {
    return Failure{Fault::impossible, 2,
                   "holds no more enthalpy or no more entropy than the inlet: no heat was taken"};
  }
  return heat / entropy;
}

}  // namespace busbar::cycle
