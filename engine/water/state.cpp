#include "water/state.hpp"

#include <algorithm>
#include <cmath>

#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/failure.hpp"
#include "water/solve/assemble.hpp"
#include "water/solve/density.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {

namespace {

Failure outside(std::uint8_t argument, const char* reason, Measure value, Measure limit = {},
                Measure where = {}) {
  return make_failure(Fault::outside_range, argument, reason, value, limit, where);
}

constexpr Failure kInside{};

Failure check_finite(std::uint8_t argument, Measure value) {
  if (std::isfinite(value.si)) return kInside;
  return outside(argument, "{0} is not a finite number", value);
}

Failure check_pressure(double pressure) {
  const Measure value{pressure, Quantity::pressure};
  if (!std::isfinite(pressure)) return check_finite(1, value);
  if (!(pressure > 0)) {
    return outside(1, "{0} is not above {1}: IAPWS-IF97 needs an absolute pressure above it", value,
                   {0, Quantity::pressure});
  }
  if (pressure > kHighestPressure) {
    return outside(1, "{0} is above {1}, the highest pressure of IAPWS-IF97", value,
                   {kHighestPressure, Quantity::pressure});
  }
  return kInside;
}

Failure check_saturation_pressure(double pressure) {
  const Measure value{pressure, Quantity::pressure};
  if (!std::isfinite(pressure)) return check_finite(1, value);
  if (pressure < kLowestSaturationPressure) {
    return outside(1,
                   "{0} is below {1}, the saturation pressure at {2}, where the saturation line of "
                   "IAPWS-IF97 begins",
                   value, {kLowestSaturationPressure, Quantity::pressure},
                   {kLowestTemperature, Quantity::temperature});
  }
  if (pressure > kCriticalPressure) {
    return outside(1, "{0} is above {1}, the critical pressure, where the saturation line ends",
                   value, {kCriticalPressure, Quantity::pressure});
  }
  return kInside;
}

Failure check_temperature(double pressure, double temperature) {
  const Measure value{temperature, Quantity::temperature};
  if (!std::isfinite(temperature)) return check_finite(2, value);
  if (temperature < kLowestTemperature) {
    return outside(2, "{0} is below {1}, the lowest temperature of IAPWS-IF97", value,
                   {kLowestTemperature, Quantity::temperature});
  }
  if (temperature > kHighestTemperature5) {
    return outside(2, "{0} is above {1}, the highest temperature of IAPWS-IF97 region 5", value,
                   {kHighestTemperature5, Quantity::temperature});
  }
  if (temperature > kHighestTemperature2 && pressure > kHighestPressure5) {
    return outside(2, "{0} is above {1}, the highest temperature of IAPWS-IF97 above {2}", value,
                   {kHighestTemperature2, Quantity::temperature},
                   {kHighestPressure5, Quantity::pressure});
  }
  return kInside;
}

// A volume beyond the range of numbers, at pressures below 1e-302 Pa, is no answer.
Outcome<State> checked(const State& state) {
  if (std::isfinite(state.volume) && std::isfinite(state.entropy)) return state;
  return outside(1, "{0} is so low that the specific volume cannot be held in a number",
                 {state.pressure, Quantity::pressure});
}

// Liquid at or above the saturation pressure. Equations 30 and 31 are inverse to each other but for
// the last digits: a state that lies on the line by either of them is liquid.
bool is_liquid(double pressure, double temperature) {
  constexpr double kRounding = 1e-9;
  if (temperature <= kTemperature13) {
    const double beside = rough_logarithm(pressure) - rough_saturation_logarithm(temperature);
    if (beside > kSurelyLiquid) return true;
    if (beside < kSurelyVapour) return false;
  }
  const double saturation = saturation_pressure_equation(temperature);
  if (pressure >= saturation) return true;
  return pressure >= saturation * (1 - kRounding) && pressure >= kLowestSaturationPressure &&
         temperature <= saturation_temperature_equation(std::min(pressure, kCriticalPressure));
}

bool in_region_3(double pressure, double temperature) {
  return temperature > kTemperature13 && pressure > kPressure13 &&
         temperature <= kHighestTemperature23 && pressure > boundary_23_pressure(temperature);
}

// The checks in short: a Failure is made only where there is one.
bool is_pressure(double pressure) { return pressure > 0 && pressure <= kHighestPressure; }

bool has_saturation(double pressure) {
  return pressure >= kLowestSaturationPressure && pressure <= kCriticalPressure;
}

template <Given kGiven>
Outcome<State> at_pressure_and(double pressure, double value, Quantity quantity) {
  if (!is_pressure(pressure)) return check_pressure(pressure);
  if (!std::isfinite(value)) return check_finite(2, {value, quantity});
  const Outcome<Found> found = on_isobar<kGiven>(pressure, value);
  if (!found) return found.failure();
  return checked(found->state);
}

}  // namespace

Outcome<State> at_pressure_temperature(double pressure, double temperature) {
  if (!is_pressure(pressure)) return check_pressure(pressure);
  if (!(temperature >= kLowestTemperature && temperature <= kHighestTemperature2)) {
    const Failure failure = check_temperature(pressure, temperature);
    if (failure.fault != Fault::none) return failure;
  }
  if (temperature <= kTemperature13) {
    if (pressure > kPressure13 || is_liquid(pressure, temperature)) {
      return assembled(Region::liquid, pressure, temperature, properties_1(pressure, temperature));
    }
    return checked(
        assembled(Region::vapour, pressure, temperature, properties_2(pressure, temperature)));
  }
  if (temperature > kHighestTemperature2) {
    return checked(assembled(Region::high_temperature, pressure, temperature,
                             properties_5(pressure, temperature)));
  }
  if (!in_region_3(pressure, temperature)) {
    return checked(
        assembled(Region::vapour, pressure, temperature, properties_2(pressure, temperature)));
  }
  const bool liquid = temperature < kCriticalTemperature && is_liquid(pressure, temperature);
  const DensityFound found = density_3(pressure, temperature, liquid);
  if (!found.converged) {
    return make_failure(Fault::no_convergence, 0,
                        "the density of IAPWS-IF97 region 3 did not converge at {0} and {1}",
                        {pressure, Quantity::pressure}, {temperature, Quantity::temperature});
  }
  return assembled(Region::near_critical, pressure, temperature,
                   properties_3(found.density, temperature));
}

Outcome<State> at_pressure_enthalpy(double pressure, double enthalpy) {
  return at_pressure_and<Given::enthalpy>(pressure, enthalpy, Quantity::enthalpy);
}

Outcome<State> at_pressure_enthalpy_near(double pressure, double enthalpy, double temperature) {
  // Some last digits: a hundred thousand times closer than at_pressure_enthalpy promises.
  constexpr double kSame = 2e-15;
  constexpr double kScale = kGasConstant * 1386;  // R T* of region 1
  const Outcome<State> expected = at_pressure_temperature(pressure, temperature);
  if (expected) {
    const double rest = enthalpy - expected->enthalpy;
    if (std::fabs(rest) <= kSame * std::fmax(std::fabs(enthalpy), kScale)) {
      State state = *expected;
      state.enthalpy = enthalpy;
      state.entropy += rest / temperature;
      return state;
    }
  }
  return at_pressure_enthalpy(pressure, enthalpy);
}

Outcome<State> at_pressure_entropy(double pressure, double entropy) {
  return at_pressure_and<Given::entropy>(pressure, entropy, Quantity::entropy);
}

Outcome<State> at_pressure_dryness(double pressure, double dryness) {
  if (!has_saturation(pressure)) return check_saturation_pressure(pressure);
  const Measure value{dryness, Quantity::fraction};
  if (!std::isfinite(dryness)) return check_finite(2, value);
  if (dryness < 0) {
    return outside(2, "{0} is below {1}, the dryness of saturated liquid", value,
                   {0, Quantity::fraction});
  }
  if (dryness > 1) {
    return outside(2, "{0} is above {1}, the dryness of saturated vapour", value,
                   {1, Quantity::fraction});
  }
  const Saturated saturated = saturated_at(pressure);
  if (!saturated.converged) {
    return make_failure(Fault::no_convergence, 0,
                        "the saturated states of IAPWS-IF97 region 3 did not converge at {0}",
                        {pressure, Quantity::pressure});
  }
  return two_phase_state(pressure, saturated, dryness);
}

Outcome<double> saturation_temperature(double pressure) {
  if (!has_saturation(pressure)) return check_saturation_pressure(pressure);
  return clamped(saturation_temperature_equation(pressure), kLowestTemperature,
                 kCriticalTemperature);
}

Outcome<double> saturation_pressure(double temperature) {
  const Measure value{temperature, Quantity::temperature};
  if (!std::isfinite(temperature)) return check_finite(1, value);
  if (temperature < kLowestTemperature) {
    return outside(1, "{0} is below {1}, where the saturation line of IAPWS-IF97 begins", value,
                   {kLowestTemperature, Quantity::temperature});
  }
  if (temperature > kCriticalTemperature) {
    return outside(1, "{0} is above {1}, the critical temperature, where the saturation line ends",
                   value, {kCriticalTemperature, Quantity::temperature});
  }
  return clamped(saturation_pressure_equation(temperature), kLowestSaturationPressure,
                 kCriticalPressure);
}

}  // namespace busbar::water
