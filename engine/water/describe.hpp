// What the explanations of water and steam functions need to know about a state.
#pragma once

#include "water/state.hpp"

namespace busbar::water {

/// Where a state lies beside the saturation line at its own pressure.
struct Neighbourhood {
  double saturation_temperature = 0;  ///< K; equation 31 of IAPWS R7-97(2012)
  double distance = 0;                ///< K; positive: superheat, negative: subcooling
  bool has_saturation = false;        ///< false above 22.064 MPa and below 611.213 Pa
};

Neighbourhood neighbourhood(const State& state);

/// "region 1 (liquid)" and so on; static text.
const char* region_name(Region region);

/// The equation that gives the properties in a region: "IAPWS R7-97(2012), equation 15"; static
/// text.
const char* equation(Region region);

}  // namespace busbar::water
