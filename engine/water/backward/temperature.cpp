#include "water/backward/temperature.hpp"

#include "water/constants.hpp"
#include "water/equations/backward.hpp"
#include "water/equations/logarithm.hpp"
#include "water/tables/backward_ph_2.hpp"

namespace busbar::water::backward {

double temperature_ph_1(double pressure, double enthalpy) {
  return temperature_ph_1_at(pressure, enthalpy);
}

double temperature_ps_1(double pressure, double entropy) {
  return temperature_ps_1_at(pressure, entropy);
}

double boundary_2bc_pressure(double enthalpy) {
  constexpr const double* n = tables::kBoundary2bc;
  const double eta = enthalpy / 1000;
  return ((n[2] * eta + n[1]) * eta + n[0]) * 1e6;
}

double boundary_2bc_enthalpy(double pressure) { return boundary_2bc_enthalpy_at(pressure); }

double temperature_ph_2a(double pressure, double enthalpy) {
  return temperature_ph_2a_at(pressure, enthalpy);
}

double temperature_ph_2b(double pressure, double enthalpy) {
  return temperature_ph_2b_at(pressure, enthalpy);
}

double temperature_ph_2c(double pressure, double enthalpy) {
  return temperature_ph_2c_at(pressure, enthalpy);
}

double temperature_ps_2a(double pressure, double entropy) {
  return temperature_ps_2a_at(pressure, entropy);
}

double temperature_ps_2b(double pressure, double entropy) {
  return temperature_ps_2b_at(pressure, entropy);
}

double temperature_ps_2c(double pressure, double entropy) {
  return temperature_ps_2c_at(pressure, entropy);
}

double temperature_ph_2(double pressure, double enthalpy) {
  if (pressure <= kPressure2ab) return temperature_ph_2a(pressure, enthalpy);
  if (pressure > kPressure2bc && enthalpy < boundary_2bc_enthalpy(pressure)) {
    return temperature_ph_2c(pressure, enthalpy);
  }
  return temperature_ph_2b(pressure, enthalpy);
}

double temperature_ps_2(double pressure, double entropy) {
  if (pressure < kLowestPressure2a) {
    const double moved = entropy + kGasConstant * natural_logarithm(pressure / kLowestPressure2a);
    return temperature_ps_2a(kLowestPressure2a, moved);
  }
  if (pressure <= kPressure2ab) return temperature_ps_2a(pressure, entropy);
  if (entropy < kEntropy2bc) return temperature_ps_2c(pressure, entropy);
  return temperature_ps_2b(pressure, entropy);
}

double boundary_3ab_enthalpy(double pressure) { return boundary_3ab_enthalpy_at(pressure); }

double temperature_ph_3a(double pressure, double enthalpy) {
  return temperature_ph_3a_at(pressure, enthalpy);
}

double temperature_ph_3b(double pressure, double enthalpy) {
  return temperature_ph_3b_at(pressure, enthalpy);
}

double temperature_ps_3a(double pressure, double entropy) {
  return temperature_ps_3a_at(pressure, entropy);
}

double temperature_ps_3b(double pressure, double entropy) {
  return temperature_ps_3b_at(pressure, entropy);
}

}  // namespace busbar::water::backward
