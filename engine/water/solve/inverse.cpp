#include "water/solve/inverse.hpp"

#include <cmath>

#include "water/backward/temperature.hpp"
#include "water/backward/volume.hpp"

namespace busbar::water {

template <class Equation, Given kGiven>
Inverse invert_gibbs(double pressure, double value, double start, double lowest, double highest) {
  constexpr double kTemperature = Equation::kReducingTemperature;
  const auto to = sought<Equation, kGiven, kAllOutputs>(pressure, value);
  // One kelvin beyond the limits is still inside what the equations bear.
  const double tau_low = kTemperature / (highest + 1);
  const double tau_high = kTemperature / (lowest - 1);
  double tau = first_tau<Equation, kGiven>(to, clamped(start, lowest, highest));
  tau = clamped(tau, tau_low, tau_high);
  Inverse found;
  found.evaluations = 1;
  while (found.evaluations < kInverseCap) {
    const auto at = newton_step<Equation, kGiven, kAllOutputs>(to, tau);
    ++found.evaluations;
    if (std::abs(at.missed) <= to.enough) {
      found.temperature = kTemperature / (tau + at.step);
      found.properties = after_step<Equation, kGiven, kAllOutputs>(to, at, tau, pressure, value);
      found.converged = true;
      return found;
    }
    const double next = clamped(tau + at.step, tau_low, tau_high);
    if (next == tau) break;  // at a limit, and the solution lies beyond it
    tau = next;
  }
  found.temperature = kTemperature / tau;
  return found;
}

template <Given kGiven>
Inverse invert_region_3(double pressure, double value) {
  double temperature = 0;
  double density = 0;
  if constexpr (kGiven == Given::enthalpy) {
    // Equation 1 of SR3-03(2014) holds from pc on; its value at pc serves below.
    const double at = std::fmax(pressure, kCriticalPressure);
    if (value <= backward::boundary_3ab_enthalpy(at)) {
      temperature = backward::temperature_ph_3a(pressure, value);
      density = 1 / backward::volume_ph_3a(pressure, value);
    } else {
      temperature = backward::temperature_ph_3b(pressure, value);
      density = 1 / backward::volume_ph_3b(pressure, value);
    }
  } else {
    if (value <= kCriticalEntropy) {
      temperature = backward::temperature_ps_3a(pressure, value);
      density = 1 / backward::volume_ps_3a(pressure, value);
    } else {
      temperature = backward::temperature_ps_3b(pressure, value);
      density = 1 / backward::volume_ps_3b(pressure, value);
    }
  }
  density = clamped(density, kLeastStart, kGreatestStart);
  temperature = clamped(temperature, kColdestStart, kHottestStart);

  Inverse found;
  while (found.evaluations < kInverseCap) {
    const auto step = newton_step_3<kGiven>(pressure, value, density, temperature);
    ++found.evaluations;
    if (std::abs(step.density) <= kSmallDensityStep * density &&
        std::abs(step.temperature) <= kSmallTemperatureStep * temperature) {
      found.temperature = temperature + step.temperature;
      found.properties.volume = 1 / (density + step.density);
      const double other = other_after_step_3<kGiven>(step, density, temperature);
      found.properties.enthalpy = kGiven == Given::enthalpy ? value : other;
      found.properties.entropy = kGiven == Given::enthalpy ? other : value;
      found.converged = true;
      return found;
    }
    next_in_region_3(step, density, temperature);
  }
  found.temperature = temperature;
  return found;
}

template Inverse invert_gibbs<Region1Equation, Given::enthalpy>(double, double, double, double,
                                                                double);
template Inverse invert_gibbs<Region1Equation, Given::entropy>(double, double, double, double,
                                                               double);
template Inverse invert_gibbs<Region2Equation, Given::enthalpy>(double, double, double, double,
                                                                double);
template Inverse invert_gibbs<Region2Equation, Given::entropy>(double, double, double, double,
                                                               double);
template Inverse invert_gibbs<Region5Equation, Given::enthalpy>(double, double, double, double,
                                                                double);
template Inverse invert_gibbs<Region5Equation, Given::entropy>(double, double, double, double,
                                                               double);
template Inverse invert_region_3<Given::enthalpy>(double, double);
template Inverse invert_region_3<Given::entropy>(double, double);

}  // namespace busbar::water
