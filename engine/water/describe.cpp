#include "water/describe.hpp"

namespace busbar::water {

Neighbourhood neighbourhood(const State& state) {
  Neighbourhood out;
  const Outcome<double> saturation = saturation_temperature(state.pressure);
  if (!saturation) return out;
  out.saturation_temperature = *saturation;
  out.distance = state.region == Region::two_phase ? 0 : state.temperature - *saturation;
  out.has_saturation = true;
  return out;
}

const char* region_name(Region region) {
  switch (region) {
    case Region::none:
      break;
    case Region::liquid:
      return "region 1 (liquid)";
    case Region::vapour:
      return "region 2 (vapour)";
    case Region::near_critical:
      return "region 3 (around the critical point)";
    case Region::two_phase:
      return "region 4 (liquid and vapour together)";
    case Region::high_temperature:
      return "region 5 (high-temperature vapour)";
  }
  return "no region";
}

const char* equation(Region region) {
  switch (region) {
    case Region::none:
      break;
    case Region::liquid:
      return "IAPWS R7-97(2012), equation 7";
    case Region::vapour:
      return "IAPWS R7-97(2012), equation 15";
    case Region::near_critical:
      return "IAPWS R7-97(2012), equation 28";
    case Region::two_phase:
      return "IAPWS R7-97(2012), equation 31 and saturated states by equations 7 and 15 or 28";
    case Region::high_temperature:
      return "IAPWS R7-97(2012), equation 32";
  }
  return "no equation";
}

}  // namespace busbar::water
