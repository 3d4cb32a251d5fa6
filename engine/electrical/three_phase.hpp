// Balanced three-phase power with line values, and the phasor diagram of a cylindrical rotor.
#pragma once

#include "electrical/excitation_sense.hpp"

namespace busbar::electrical {

/// sqrt(3) V I in VA, line-to-line voltage and line current.
double apparent_power(double voltage, double current);

/// Line current in A of an apparent power.
double line_current(double apparent_power, double voltage);

/// P sqrt(1 / k^2 - 1) in var for a power factor k.
double reactive_power(double active_power, double power_factor);

/// P / sqrt(P^2 + Q^2).
double power_factor(double active_power, double reactive_power);

/// Voltage behind the synchronous reactance: V + j X I, armature resistance neglected.
struct InternalVoltage {
  double line_to_line = 0;  ///< V
  double angle = 0;         ///< load angle to the terminal voltage, rad
};

/// Terminal voltage line to line (V), active power (W), power factor and its sense, synchronous
/// reactance of a phase in star (ohm). Fitzgerald, Kingsley and Umans, section 5.3.
InternalVoltage internal_voltage(double voltage, double active_power, double power_factor,
                                 Sense sense, double reactance);

}  // namespace busbar::electrical
