#include "fuel/gaseous/volume.hpp"

namespace busbar::fuel::gaseous {

Outcome<double> volume_ratio(const Mixture& gas, const Metering& from, const Metering& to) {
  const Outcome<double> here = molar_volume(gas, from);
  if (!here) return here.failure();
  const Outcome<double> there = molar_volume(gas, to);
  if (!there) return there.failure();
  return *there / *here;
}

double ideal_volume_ratio(double from_temperature, double from_pressure, double to_temperature,
                          double to_pressure) {
  return to_temperature / from_temperature * (from_pressure / to_pressure);
}

}  // namespace busbar::fuel::gaseous
