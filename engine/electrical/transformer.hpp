// Losses of a power transformer: no-load loss, which is always there, and load loss, which goes
// with the square of the current.
#pragma once

#include "core/outcome.hpp"
#include "electrical/resistance.hpp"

namespace busbar::electrical {

/// No-load loss plus load^2 times load loss, both W; load as a share of rated current.
double transformer_loss(double no_load_loss, double load_loss, double load);

/// Load loss (input 1, W) at another temperature: its I2R part (input 2) grows with the resistance,
/// the rest falls with it. IEC 60076-1, annex E; temperatures in K.
Outcome<double> load_loss_at_temperature(double load_loss, double resistance_loss, double from,
                                         double to, Conductor conductor);

/// Output over output plus losses; output = load times rated apparent power times power factor.
/// Losses of half the output or more are refused (input 2 or 3, the greater).
Outcome<double> transformer_efficiency(double apparent_power, double no_load_loss, double load_loss,
                                       double load, double power_factor);

/// sqrt(no-load loss / load loss).
double transformer_best_load(double no_load_loss, double load_loss);

/// Peak efficiency index 1 - 2 sqrt(P0 Pk) / S: EN 50588-1, Regulation (EU) 548/2014, annex II.
Outcome<double> peak_efficiency(double apparent_power, double no_load_loss, double load_loss);

}  // namespace busbar::electrical
