#include "water/solve/inverse.hpp"

#include <cmath>

#include "water/backward/temperature.hpp"
#include "water/backward/volume.hpp"

namespace busbar::water {

namespace {

// The given property in the form in which the equation of a region has it, as a function of tau:
// dg/dtau = h/(R T*) for the enthalpy, tau dg/dtau - g = s/R + ln pi for the entropy.
template <Given kGiven>
double residual(const Gibbs<double>& g, double tau, double target) {
  if constexpr (kGiven == Given::enthalpy) {
    return g.tau1 - target;
  } else {
    return tau * g.tau1 - g.g - target;
  }
}

template <Given kGiven>
double slope(const Gibbs<double>& g, double tau) {
  if constexpr (kGiven == Given::enthalpy) {
    return g.tau2;
  } else {
    return tau * g.tau2;
  }
}

template <Given kGiven>
double curvature(const Gibbs<double>& g, double tau) {
  if constexpr (kGiven == Given::enthalpy) {
    return g.tau3;
  } else {
    return g.tau2 + tau * g.tau3;
  }
}

// The last step is taken without another evaluation: below this residual, relative to
// max(1, target), the error of the linear step is far below 1e-10 R T*.
constexpr double kLastResidual = 1e-8;

double clamp(double x, double low, double high) { return x < low ? low : x > high ? high : x; }

}  // namespace

template <class Equation, Given kGiven>
Inverse invert_gibbs(double pressure, double value, double start, double lowest, double highest) {
  constexpr double kTemperature = Equation::kReducingTemperature;
  constexpr unsigned kStart =
      kGiven == Given::enthalpy ? (kY | kYY | kYYY) : (kValue | kY | kYY | kYYY);
  constexpr unsigned kAll = kValue | kX | kY | kYY | kXY;

  const double pi = pressure / Equation::kReducingPressure;
  double logarithm = 0;
  if constexpr (Equation::kHasLogarithm) logarithm = std::log(pi);
  double target = 0;
  if constexpr (kGiven == Given::enthalpy) {
    target = value / (kGasConstant * kTemperature);
  } else {
    target = value / kGasConstant + logarithm;
  }
  const double enough = kLastResidual * std::fmax(1.0, std::abs(target));

  // One kelvin beyond the limits is still inside what the equations bear.
  const double tau_low = kTemperature / (highest + 1);
  const double tau_high = kTemperature / (lowest - 1);

  // Halley's step from the backward equation, then Newton.
  double tau = kTemperature / clamp(start, lowest, highest);
  {
    const auto g = Equation::template at<kStart>(pi, tau);
    const double first = slope<kGiven>(g, tau);
    const double newton = residual<kGiven>(g, tau, target) / first;
    const double bend = 1 - 0.5 * newton * curvature<kGiven>(g, tau) / first;
    tau = clamp(tau - (bend > 0.5 ? newton / bend : newton), tau_low, tau_high);
  }
  Inverse found;
  found.evaluations = 1;
  while (found.evaluations < kInverseCap) {
    const auto g = Equation::template at<kAll>(pi, tau);
    ++found.evaluations;
    const double missed = residual<kGiven>(g, tau, target);
    const double step = -missed / slope<kGiven>(g, tau);
    if (!(std::abs(missed) <= enough)) {
      const double next = clamp(tau + step, tau_low, tau_high);
      if (next == tau) break;  // at a limit, and the solution lies beyond it
      tau = next;
      continue;
    }
    const double moved = tau + step;
    found.temperature = kTemperature / moved;
    const double per_pressure = kGasConstant * kTemperature / pressure;
    found.properties.volume = per_pressure * (g.pi_pi1 + (g.mixed - g.pi_pi1 / tau) * step) / tau;
    found.properties.enthalpy = kGasConstant * kTemperature * (g.tau1 + g.tau2 * step);
    found.properties.entropy =
        kGasConstant * (tau * g.tau1 - g.g - logarithm + tau * g.tau2 * step);
    if constexpr (kGiven == Given::enthalpy) {
      found.properties.enthalpy = value;
    } else {
      found.properties.entropy = value;
    }
    found.converged = true;
    return found;
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
    // Critical entropy: SR4-04(2014), section 3.2.
    constexpr double kCriticalEntropy = 4412.02148223476;
    if (value <= kCriticalEntropy) {
      temperature = backward::temperature_ps_3a(pressure, value);
      density = 1 / backward::volume_ps_3a(pressure, value);
    } else {
      temperature = backward::temperature_ps_3b(pressure, value);
      density = 1 / backward::volume_ps_3b(pressure, value);
    }
  }
  density = clamp(density, 90, 790);
  temperature = clamp(temperature, 620, 870);

  // Newton for density and temperature together. Its determinant stays away from zero everywhere,
  // in the critical point and inside the two-phase region too.
  constexpr double kSmallDensityStep = 1e-8;
  constexpr double kSmallTemperatureStep = 1e-9;
  Inverse found;
  while (found.evaluations < kInverseCap) {
    const double delta = density / kCriticalDensity;
    const double tau = kCriticalTemperature / temperature;
    const auto f = Region3Equation::at<kValue | kX | kXX | kY | kYY | kXY>(delta, tau);
    ++found.evaluations;
    const double rt = kGasConstant * temperature;
    const double missing_pressure = pressure - density * rt * f.delta1;
    const double pressure_density = rt * (2 * f.delta1 + f.delta2);
    const double pressure_temperature = density * kGasConstant * (f.delta1 - f.mixed);
    const double enthalpy = rt * (f.tau1 + f.delta1);
    double missing = 0;
    double by_density = 0;
    double by_temperature = 0;
    double entropy = 0;
    const auto entropy_at = [&] {
      return kGasConstant * (f.tau1 - f.value - tables::kRegion3N1 * std::log(delta));
    };
    const double enthalpy_density = rt / density * (f.mixed + f.delta1 + f.delta2);
    const double enthalpy_temperature = kGasConstant * (f.delta1 - f.tau2 - f.mixed);
    const double entropy_density = kGasConstant / density * (f.mixed - f.delta1);
    const double entropy_temperature = -kGasConstant / temperature * f.tau2;
    if constexpr (kGiven == Given::enthalpy) {
      missing = value - enthalpy;
      by_density = enthalpy_density;
      by_temperature = enthalpy_temperature;
    } else {
      entropy = entropy_at();
      missing = value - entropy;
      by_density = entropy_density;
      by_temperature = entropy_temperature;
    }
    const double determinant =
        pressure_density * by_temperature - pressure_temperature * by_density;
    double density_step =
        (missing_pressure * by_temperature - missing * pressure_temperature) / determinant;
    double temperature_step =
        (pressure_density * missing - by_density * missing_pressure) / determinant;
    if (std::abs(density_step) <= kSmallDensityStep * density &&
        std::abs(temperature_step) <= kSmallTemperatureStep * temperature) {
      found.temperature = temperature + temperature_step;
      found.properties.volume = 1 / (density + density_step);
      if constexpr (kGiven == Given::enthalpy) {
        found.properties.enthalpy = value;
        found.properties.entropy =
            entropy_at() + entropy_density * density_step + entropy_temperature * temperature_step;
      } else {
        found.properties.entropy = value;
        found.properties.enthalpy =
            enthalpy + enthalpy_density * density_step + enthalpy_temperature * temperature_step;
      }
      found.converged = true;
      return found;
    }
    density_step = clamp(density_step, -0.2 * density, 0.2 * density);
    temperature_step = clamp(temperature_step, -10, 10);
    density = clamp(density + density_step, 80, 800);
    temperature = clamp(temperature + temperature_step, 600, 900);
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
