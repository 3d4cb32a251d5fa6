// Speed, poles and slip of machines on a grid of a given frequency.
#pragma once

#include "core/outcome.hpp"

namespace busbar::electrical {

/// More poles than any machine has: slow hydro generators have about a hundred.
inline constexpr double kMostPoles = 200;

/// Turns per second at a frequency (Hz, input 1) and a number of poles (input 2, even).
/// n = 2 f / p, which is 120 f / p in rpm: IEC 60034-1, synchronous speed.
Outcome<double> synchronous_speed(double frequency, double poles);

/// Poles of a synchronous machine from frequency (Hz) and rated speed (1/s, input 2). A speed
/// rounded on the nameplate is taken; one that no even number of poles explains is impossible.
Outcome<double> pole_count(double frequency, double speed);

/// (synchronous speed - speed) / synchronous speed; negative for an induction generator.
Outcome<double> slip(double frequency, double poles, double speed);

}  // namespace busbar::electrical
