// The saturated state that has a given enthalpy or entropy.
#include <boost/math/tools/minima.hpp>
#include <cmath>
#include <cstdint>

#include "water/constants.hpp"
#include "water/pairs.hpp"
#include "water/solve/assemble.hpp"
#include "water/solve/isobar.hpp"
#include "water/solve/root.hpp"

namespace busbar::water {

namespace {

template <Given kGiven>
double saturated_value(double log_pressure, bool vapour) {
  const double pressure =
      std::clamp(std::exp(log_pressure), kLowestSaturationPressure, kCriticalPressure);
  const Saturated saturated = saturated_at(pressure);
  return given_of<kGiven>(vapour ? saturated.vapour : saturated.liquid);
}

// The value rises with the pressure (`sign` 1) or falls (-1). At 16.529 MPa, where the saturated
// states pass from regions 1 and 2 to region 3, the two may overlap: the regions of the lower
// number answer.
template <Given kGiven>
Outcome<State> solve(double value, bool vapour, double sign, double lowest, double highest) {
  const double seam = std::log(kPressure13);
  const Saturated at_seam = saturated_at(kPressure13);
  const double seam_value = given_of<kGiven>(vapour ? at_seam.vapour : at_seam.liquid);
  const bool below = sign * (value - seam_value) <= 0;
  const auto root =
      root_between([&](double x) { return saturated_value<kGiven>(x, vapour) - value; },
                   below ? lowest : seam + 1e-12, below ? seam - 4e-15 : highest);
  if (!root) return not_converged();
  const double pressure = std::clamp(std::exp(*root), kLowestSaturationPressure, kCriticalPressure);
  Outcome<State> state = at_pressure_dryness(pressure, vapour ? 1 : 0);
  if (!state) return state;
  if constexpr (kGiven == Given::enthalpy) {
    (*state).enthalpy = value;
  } else {
    (*state).entropy = value;
  }
  return state;
}

double log_lowest() { return std::log(kLowestSaturationPressure); }
double log_critical() { return std::log(kCriticalPressure); }

Failure outside(Measure value, double limit, bool below) {
  return make_failure(Fault::outside_range, 1,
                      below
                          ? "{0} is below {1}, that of boiling water at {2}, where the saturation "
                            "line of IAPWS-IF97 begins"
                          : "{0} is above {1}, the greatest that saturated steam has",
                      value, {limit, value.quantity}, {kLowestTemperature, Quantity::temperature});
}

}  // namespace

Outcome<State> saturated_at_enthalpy(double enthalpy) {
  const Measure value{enthalpy, Quantity::enthalpy};
  if (!std::isfinite(enthalpy)) return not_finite(1, value);
  const Saturated cold = saturated_at(kLowestSaturationPressure);
  const double critical = saturated_at(kCriticalPressure).liquid.enthalpy;
  if (enthalpy < cold.liquid.enthalpy) return outside(value, cold.liquid.enthalpy, true);
  if (enthalpy <= critical) {
    return solve<Given::enthalpy>(enthalpy, false, 1, log_lowest(), log_critical());
  }
  std::uintmax_t steps = kRootCap;
  const auto greatest = boost::math::tools::brent_find_minima(
      [](double x) { return -saturated_value<Given::enthalpy>(x, true); }, std::log(1e6),
      std::log(10e6), 40, steps);
  if (enthalpy > -greatest.second) return outside(value, -greatest.second, false);
  if (enthalpy >= cold.vapour.enthalpy) {
    return make_failure(Fault::outside_range, 1,
                        "{0} belongs to saturated steam at two pressures, one on each side of {1}",
                        value, {std::exp(greatest.first), Quantity::pressure});
  }
  return solve<Given::enthalpy>(enthalpy, true, -1, greatest.first, log_critical());
}

Outcome<State> saturated_at_entropy(double entropy) {
  const Measure value{entropy, Quantity::entropy};
  if (!std::isfinite(entropy)) return not_finite(1, value);
  const Saturated cold = saturated_at(kLowestSaturationPressure);
  const double critical = saturated_at(kCriticalPressure).liquid.entropy;
  if (entropy < cold.liquid.entropy) return outside(value, cold.liquid.entropy, true);
  if (entropy > cold.vapour.entropy) return outside(value, cold.vapour.entropy, false);
  const bool vapour = entropy > critical;
  return solve<Given::entropy>(entropy, vapour, vapour ? -1 : 1, log_lowest(), log_critical());
}

}  // namespace busbar::water
