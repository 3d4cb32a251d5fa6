// Where transport properties are defined.
#pragma once

#include "water/failure.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// Highest temperature (K) of IAPWS R12-08, equation 9, and R15-11, section 3 on industrial use.
inline constexpr double kHighestTransportTemperature = 1173.15;

/// None for one phase within the range; otherwise why there is no answer. `too_hot` takes the
/// temperature and the limit.
inline Failure check_transport(const State& state, const char* too_hot) {
  if (state.region == Region::two_phase && state.dryness > 0 && state.dryness < 1) {
    return make_failure(Fault::missing, 0,
                        "is two-phase with dryness {0}: there is no such property of a mixture; "
                        "dryness 0 and 1 have it",
                        {state.dryness, Quantity::fraction});
  }
  if (state.temperature > kHighestTransportTemperature) {
    return make_failure(Fault::outside_range, 0, too_hot,
                        {state.temperature, Quantity::temperature},
                        {kHighestTransportTemperature, Quantity::temperature});
  }
  return {};
}

}  // namespace busbar::water
