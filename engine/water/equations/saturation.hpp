// Saturation line and boundary between regions 2 and 3, for plain numbers.
#pragma once

#include "water/constants.hpp"
#include "water/equations/arithmetic.hpp"
#include "water/tables/boundary_23.hpp"
#include "water/tables/region_4.hpp"

namespace busbar::water {

#include "water/kernels/saturation.hpp"

// Pa and K; equations 30, 31, 5 and 6 of IAPWS R7-97(2012).
inline double saturation_pressure_equation(double temperature) {
  return saturation_pressure_at(temperature);
}
inline double saturation_temperature_equation(double pressure) {
  return saturation_temperature_at(pressure);
}
inline double boundary_23_pressure(double temperature) {
  return boundary_23_pressure_at(temperature);
}
inline double boundary_23_temperature(double pressure) {
  return boundary_23_temperature_at(pressure);
}

}  // namespace busbar::water
