// Voltage induced in a conductor, in a turning coil and in a winding (law of induction).
#pragma once

namespace busbar::electrical {

/// B l v sin(angle) in V: a straight conductor at right angles to field and motion, `angle` (rad)
/// between field and motion.
double conductor_voltage(double flux_density, double length, double velocity, double angle);

/// N phi omega sin(angle) in V at one instant: a coil of N turns that turns `speed` times a second
/// in a uniform field, `flux` (Wb) through it when it lies across the field, `angle` (rad) from
/// there.
double rotating_coil_voltage(double turns, double flux, double speed, double angle);

/// sqrt(2) pi f N phi k in V: effective value of the fundamental in one phase of N turns in series,
/// sinusoidal flux `flux` (Wb) per pole, winding factor k. The 4.44 of the books is sqrt(2) pi.
double winding_voltage(double frequency, double turns, double flux, double winding_factor);

}  // namespace busbar::electrical
