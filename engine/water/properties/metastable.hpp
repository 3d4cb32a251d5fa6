// Metastable (supersaturated) vapour: steam that should have begun to condense and has not yet, as
// behind the nozzles of wet turbine stages. It is no equilibrium state: nothing else in this domain
// gives or takes it.
#pragma once

#include "core/outcome.hpp"
#include "water/properties/response.hpp"
#include "water/solve/properties.hpp"

namespace busbar::water {

struct Metastable {
  Properties properties;
  Response response;
};

/// Metastable vapour at pressure (Pa) and temperature (K). Range: 611.657 Pa to 10 MPa, from the
/// saturated vapour line down to the line of 5 % equilibrium moisture. Failures, outside_range:
/// argument 1 beyond the pressures; argument 2 above the saturation temperature, below 273.15 K, or
/// where the enthalpy at equilibrium would mean more than 5 % moisture.
/// Source: IAPWS R7-97(2012), section 6.2, equations 18 and 19.
Outcome<Metastable> metastable_vapour(double pressure, double temperature);

}  // namespace busbar::water
