#include "water/solve/density.hpp"

#include <cmath>

#include "water/backward/volume.hpp"
#include "water/constants.hpp"
#include "water/equations/helmholtz.hpp"
#include "water/equations/saturation.hpp"

namespace busbar::water {

namespace {

#include "water/kernels/density.hpp"

using Slope = PressureSlope<double>;

Slope pressure_at(double density, double temperature) {
  return pressure_slope_at(density, temperature);
}

// Newton on a branch below Tc. On the liquid branch the pressure is a convex rising function of
// density, on the vapour branch a concave one; once on the outer side of the root (above it for
// liquid, below it for vapour) the iterates approach it from that side only. A step that turns back
// after the first one is rounding, and the iteration is over.
DensityFound newton_on_branch(double pressure, double temperature, double start, bool liquid) {
  DensityFound found;
  double density = start;
  while (found.evaluations < kDensityCap) {
    const Slope at = pressure_at(density, temperature);
    ++found.evaluations;
    double step = (pressure - at.pressure) / at.per_density;
    if (!(at.per_density > 0)) step = liquid ? 0.02 * density : -0.02 * density;
    const bool outward = liquid ? step >= 0 : step <= 0;
    if (found.evaluations > 1 && outward && at.per_density > 0 && std::abs(step) < 1e-4 * density) {
      found.converged = true;
      break;
    }
    const double limit = 0.2 * density;
    if (std::abs(step) > limit) step = step > 0 ? limit : -limit;
    density += step;
    if (std::abs(step) <= kSmallStep * density) {
      found.converged = true;
      break;
    }
  }
  found.density = density;
  return found;
}

// Newton kept inside a bracket, for a pressure that rises with density from `low` to `high`.
DensityFound newton_in_bracket(double pressure, double temperature, double start, double low,
                               double high) {
  DensityFound found;
  double density = start > low && start < high ? start : 0.5 * (low + high);
  while (found.evaluations < kDensityCap) {
    const Slope at = pressure_at(density, temperature);
    ++found.evaluations;
    const double missing = pressure - at.pressure;
    (missing > 0 ? low : high) = density;
    double next = density + missing / at.per_density;
    if (!(next >= low && next <= high)) next = 0.5 * (low + high);
    const double step = next - density;
    density = next;
    if (missing == 0 || std::abs(step) <= kSmallStep * density || high - low <= 4e-16 * density) {
      found.converged = true;
      break;
    }
  }
  found.density = density;
  return found;
}

double start_density(double pressure, double temperature, bool liquid) {
  const auto subregion = backward::subregion_3(pressure, temperature, liquid);
  return 1 / backward::volume_pt_3(subregion, pressure, temperature);
}

// Starts a little outside the root (see newton_on_branch): 3y and 3z are good to 1.8 %, the others
// need no margin.
DensityFound on_branch(double pressure, double temperature, bool liquid) {
  const auto subregion = backward::subregion_3(pressure, temperature, liquid);
  double start = 1 / backward::volume_pt_3(subregion, pressure, temperature);
  if (subregion == backward::Subregion3::y || subregion == backward::Subregion3::z) {
    start *= liquid ? 1.02 : 0.98;
  }
  return newton_on_branch(pressure, temperature, start, liquid);
}

// Equation 28 at the edge of the critical band: its saturated densities there, found once by
// newton_on_branch and held by a test.
constexpr double kEdgeLiquid = 323.408699946338;
constexpr double kEdgeVapour = 320.789715999367;

SaturatedDensities in_band(double temperature) {
  const double below = kCriticalTemperature - temperature;
  const double weight = below > 0 ? std::sqrt(below / kCriticalBand) : 0;
  SaturatedDensities out;
  out.liquid = kCriticalDensity + weight * (kEdgeLiquid - kCriticalDensity);
  out.vapour = kCriticalDensity + weight * (kEdgeVapour - kCriticalDensity);
  out.converged = true;
  return out;
}

}  // namespace

SaturatedDensities saturated_densities_3(double pressure, double temperature) {
  if (temperature > kCriticalTemperature - kCriticalBand) return in_band(temperature);
  const DensityFound liquid = on_branch(pressure, temperature, true);
  const DensityFound vapour = on_branch(pressure, temperature, false);
  return {liquid.density, vapour.density, liquid.evaluations + vapour.evaluations,
          liquid.converged && vapour.converged};
}

DensityFound density_3(double pressure, double temperature, bool liquid) {
  if (temperature >= kCriticalTemperature) {
    const double above = temperature - kCriticalTemperature;
    double shifted = pressure;
    if (above < kCriticalBand) {
      const double difference = saturation_pressure_equation(kCriticalTemperature) -
                                pressure_at(kCriticalDensity, kCriticalTemperature).pressure;
      shifted -= difference * (1 - above / kCriticalBand);
    }
    return newton_in_bracket(shifted, temperature, start_density(pressure, temperature, liquid),
                             kLowestDensity, kHighestDensity);
  }
  if (temperature > kCriticalTemperature - kCriticalBand) {
    const SaturatedDensities saturated = in_band(temperature);
    const double edge = liquid ? saturated.liquid : saturated.vapour;
    const double shifted = pressure + pressure_at(edge, temperature).pressure -
                           saturation_pressure_equation(temperature);
    const double start = start_density(pressure, temperature, liquid);
    return liquid ? newton_in_bracket(shifted, temperature, start, edge, kHighestDensity)
                  : newton_in_bracket(shifted, temperature, start, kLowestDensity, edge);
  }
  return on_branch(pressure, temperature, liquid);
}

}  // namespace busbar::water
