#include "water/properties/response.hpp"

#include <cmath>

#include "water/constants.hpp"
#include "water/failure.hpp"
#include "water/properties/gibbs_response.hpp"

namespace busbar::water {

namespace {

bool is_finite(const Response& at) {
  return std::isfinite(at.isobaric_heat_capacity) && at.isobaric_heat_capacity > 0 &&
         std::isfinite(at.isochoric_heat_capacity) && std::isfinite(at.speed_of_sound) &&
         std::isfinite(at.isentropic_exponent) && std::isfinite(at.joule_thomson) &&
         std::isfinite(at.isobaric_expansion) && std::isfinite(at.isothermal_compressibility) &&
         at.isothermal_compressibility > 0;
}

template <double Response::*Member>
Outcome<double> member(const State& state) {
  const Outcome<Response> at = response(state);
  if (!at) return at.failure();
  return (*at).*Member;
}

}  // namespace

Response response_1(double pressure, double temperature) {
  return gibbs_response<Region1Equation>(pressure, temperature);
}

Response response_2(double pressure, double temperature) {
  return gibbs_response<Region2Equation>(pressure, temperature);
}

Response response_5(double pressure, double temperature) {
  return gibbs_response<Region5Equation>(pressure, temperature);
}

Response response_3(double density, double temperature) {
  return helmholtz_response_at(density, temperature);
}

Response response_of_phase(const State& state) {
  switch (state.region) {
    case Region::liquid:
      return response_1(state.pressure, state.temperature);
    case Region::vapour:
      return response_2(state.pressure, state.temperature);
    case Region::high_temperature:
      return response_5(state.pressure, state.temperature);
    case Region::near_critical:
      return response_3(1 / state.volume, state.temperature);
    case Region::two_phase:
      if (state.pressure > kPressure13) return response_3(1 / state.volume, state.temperature);
      return state.dryness > 0 ? response_2(state.pressure, state.temperature)
                               : response_1(state.pressure, state.temperature);
    case Region::none:
      break;
  }
  return {};
}

Outcome<Response> response(const State& state) {
  if (state.region == Region::two_phase && state.dryness > 0 && state.dryness < 1) {
    return make_failure(Fault::missing, 0,
                        "is two-phase with dryness {0}: there is no such property of a mixture; "
                        "dryness 0 and 1 have it",
                        {state.dryness, Quantity::fraction});
  }
  const Response at = response_of_phase(state);
  if (!is_finite(at)) {
    return make_failure(Fault::missing, 0,
                        "is at the critical point ({0}, {1}), where IAPWS-IF97 gives this property "
                        "no finite value",
                        {kCriticalPressure, Quantity::pressure},
                        {kCriticalTemperature, Quantity::temperature});
  }
  return at;
}

Outcome<double> isobaric_heat_capacity(const State& state) {
  return member<&Response::isobaric_heat_capacity>(state);
}
Outcome<double> isochoric_heat_capacity(const State& state) {
  return member<&Response::isochoric_heat_capacity>(state);
}
Outcome<double> speed_of_sound(const State& state) {
  return member<&Response::speed_of_sound>(state);
}
Outcome<double> isentropic_exponent(const State& state) {
  return member<&Response::isentropic_exponent>(state);
}
Outcome<double> joule_thomson(const State& state) {
  return member<&Response::joule_thomson>(state);
}
Outcome<double> isobaric_expansion(const State& state) {
  return member<&Response::isobaric_expansion>(state);
}
Outcome<double> isothermal_compressibility(const State& state) {
  return member<&Response::isothermal_compressibility>(state);
}

}  // namespace busbar::water
