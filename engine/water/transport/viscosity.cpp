#include "water/transport/viscosity.hpp"

#include <cmath>

#include "water/constants.hpp"
#include "water/transport/limits.hpp"
#include "water/transport/tables.hpp"

namespace busbar::water {

double viscosity_equation(double density, double temperature) {
  const double t = temperature / kCriticalTemperature;
  const double delta = density / kCriticalDensity;
  // Equation 11.
  double dilute = 0;
  for (std::size_t i = std::size(tables::kViscosityDilute); i-- > 0;) {
    dilute = dilute / t + tables::kViscosityDilute[i];
  }
  const double mu0 = 100 * std::sqrt(t) / dilute;
  // Equation 12.
  const double sum = tables::double_series(tables::kViscosityDense, 1 / t - 1, delta - 1);
  return mu0 * std::exp(delta * sum) * 1e-6;
}

Outcome<double> viscosity(const State& state) {
  if (const Failure failure = check_transport(
          state, "{0} is above {1}, the highest temperature of IAPWS R12-08 (viscosity)");
      failure.fault != Fault::none) {
    return failure;
  }
  return viscosity_equation(1 / state.volume, state.temperature);
}

}  // namespace busbar::water
