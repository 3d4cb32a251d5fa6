#include "water/backward/volume.hpp"

#include "water/equations/backward.hpp"

namespace busbar::water::backward {

double volume_ph_3a(double pressure, double enthalpy) {
  return volume_ph_3a_at(pressure, enthalpy);
}

double volume_ph_3b(double pressure, double enthalpy) {
  return volume_ph_3b_at(pressure, enthalpy);
}

double volume_ps_3a(double pressure, double entropy) { return volume_ps_3a_at(pressure, entropy); }

double volume_ps_3b(double pressure, double entropy) { return volume_ps_3b_at(pressure, entropy); }

double saturation_pressure_h_3(double enthalpy) { return saturation_pressure_h_3_at(enthalpy); }

double saturation_pressure_s_3(double entropy) { return saturation_pressure_s_3_at(entropy); }

}  // namespace busbar::water::backward
