#include "electrical/three_phase.hpp"

#include <cmath>

namespace busbar::electrical {
namespace {

const double kRootThree = std::sqrt(3.0);

}  // namespace

double apparent_power(double voltage, double current) { return kRootThree * voltage * current; }

double line_current(double apparent_power, double voltage) {
  return apparent_power / (kRootThree * voltage);
}

double reactive_power(double active_power, double power_factor) {
  return active_power / power_factor * signed_sine(power_factor, Sense::lagging);
}

double power_factor(double active_power, double reactive_power) {
  return active_power / std::hypot(active_power, reactive_power);
}

InternalVoltage internal_voltage(double voltage, double active_power, double power_factor,
                                 Sense sense, double reactance) {
  const double phase = voltage / kRootThree;
  const double current = active_power / (kRootThree * voltage * power_factor);
  const double drop = reactance * current;
  const double along = phase + drop * signed_sine(power_factor, sense);
  const double across = drop * power_factor;
  return {kRootThree * std::hypot(along, across), std::atan2(across, along)};
}

}  // namespace busbar::electrical
