#include "electrical/induced_voltage.hpp"

#include <cmath>
#include <numbers>

namespace busbar::electrical {

double conductor_voltage(double flux_density, double length, double velocity, double angle) {
  return flux_density * length * velocity * std::sin(angle);
}

double rotating_coil_voltage(double turns, double flux, double speed, double angle) {
  return turns * flux * 2 * std::numbers::pi * speed * std::sin(angle);
}

double winding_voltage(double frequency, double turns, double flux, double winding_factor) {
  return std::numbers::sqrt2 * std::numbers::pi * frequency * turns * flux * winding_factor;
}

}  // namespace busbar::electrical
