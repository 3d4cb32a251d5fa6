#include "water/backward/volume.hpp"

#include <cmath>

#include "water/equations/series.hpp"
#include "water/tables/backward_ph_3.hpp"
#include "water/tables/backward_ps_3.hpp"

namespace busbar::water::backward {

namespace {

template <const auto& kTable>
double sum(double x, double y) {
  return series<kTable, kValue>(x, y).value;
}

}  // namespace

double volume_ph_3a(double pressure, double enthalpy) {
  return 0.0028 * sum<tables::kVolumePh3a>(pressure / 100e6 + 0.128, enthalpy / 2100e3 - 0.727);
}

double volume_ph_3b(double pressure, double enthalpy) {
  return 0.0088 * sum<tables::kVolumePh3b>(pressure / 100e6 + 0.0661, enthalpy / 2800e3 - 0.720);
}

double volume_ps_3a(double pressure, double entropy) {
  return 0.0028 * sum<tables::kVolumePs3a>(pressure / 100e6 + 0.187, entropy / 4400 - 0.755);
}

double volume_ps_3b(double pressure, double entropy) {
  return 0.0088 * sum<tables::kVolumePs3b>(pressure / 100e6 + 0.298, entropy / 5300 - 0.816);
}

double saturation_pressure_h_3(double enthalpy) {
  const double eta = enthalpy / 2600e3;
  return 22e6 * sum<tables::kSaturationPressureH3>(eta - 1.02, eta - 0.608);
}

double saturation_pressure_s_3(double entropy) {
  const double sigma = entropy / 5200;
  return 22e6 * sum<tables::kSaturationPressureS3>(sigma - 1.03, sigma - 0.699);
}

}  // namespace busbar::water::backward
