#include "water/transport/surface.hpp"

#include <boost/math/tools/toms748_solve.hpp>
#include <cmath>
#include <cstdint>

#include "water/constants.hpp"
#include "water/failure.hpp"

namespace busbar::water {

namespace {

constexpr double kTriplePointTemperature = 273.16;  // K
constexpr double kTriplePointPressure = 611.657;    // Pa

// IAPWS R1-76(2014), table 2 and equation 1.
constexpr double kTension = 235.8e-3;  // N/m
constexpr double kSlope = -0.625;
constexpr double kExponent = 1.256;

struct Melting {
  double lowest;    // K
  double highest;   // K
  double pressure;  // Pa, reducing
  double a;
  double b;
  const char* below;  // sentences about the limits
  const char* above;
};

// IAPWS R14-08(2011), equations 2 to 4 (III, V, VI); the ends of all lines are its triple points.
constexpr Melting kMelting[] = {
    {251.165, 273.16, kTriplePointPressure, 0, 0,
     "{0} is below {1}, where ice Ih, ice III and liquid water meet",
     "{0} is above {1}, the triple point, where ice Ih ends"},
    {251.165, 256.164, 208.566e6, 0.299948, 60,
     "{0} is below {1}, where ice Ih, ice III and liquid water meet",
     "{0} is above {1}, where ice III, ice V and liquid water meet"},
    {256.164, 273.31, 350.1e6, 1.18721, 8,
     "{0} is below {1}, where ice III, ice V and liquid water meet",
     "{0} is above {1}, where ice V, ice VI and liquid water meet"},
    {273.31, 355, 632.4e6, 1.07476, 4.6,
     "{0} is below {1}, where ice V, ice VI and liquid water meet",
     "{0} is above {1}, where ice VI, ice VII and liquid water meet"},
    {355, 715, 2216e6, 0, 0, "{0} is below {1}, where ice VI, ice VII and liquid water meet",
     "{0} is above {1}, the highest temperature of IAPWS R14-08 (melting)"},
};

const Melting& melting(Ice ice) { return kMelting[static_cast<std::size_t>(ice)]; }

// Equation 1.
double melting_ih(double temperature) {
  const double theta = temperature / kTriplePointTemperature;
  return kTriplePointPressure * (1 + 0.119539337e7 * (1 - std::pow(theta, 3.0)) +
                                 0.808183159e5 * (1 - std::pow(theta, 25.75)) +
                                 0.333826860e4 * (1 - std::pow(theta, 103.75)));
}

// Equation 5.
double melting_vii(double temperature) {
  const double theta = temperature / 355;
  return 2216e6 * std::exp(0.173683e1 * (1 - 1 / theta) - 0.544606e-1 * (1 - std::pow(theta, 5.0)) +
                           0.806106e-7 * (1 - std::pow(theta, 22.0)));
}

double melting_equation(double temperature, Ice ice) {
  if (ice == Ice::ih) return melting_ih(temperature);
  if (ice == Ice::vii) return melting_vii(temperature);
  const Melting& line = melting(ice);
  return line.pressure * (1 - line.a * (1 - std::pow(temperature / line.lowest, line.b)));
}

Failure check_between(double temperature, double lowest, double highest, const char* below,
                      const char* above) {
  const Measure value{temperature, Quantity::temperature};
  if (!std::isfinite(temperature)) {
    return make_failure(Fault::outside_range, 1, "{0} is not a finite number", value);
  }
  if (temperature < lowest) {
    return make_failure(Fault::outside_range, 1, below, value, {lowest, Quantity::temperature});
  }
  if (temperature > highest) {
    return make_failure(Fault::outside_range, 1, above, value, {highest, Quantity::temperature});
  }
  return {};
}

// Temperature on a line that has no closed inverse.
Outcome<double> solve(double pressure, Ice ice) {
  const Melting& line = melting(ice);
  const auto missing = [&](double t) { return melting_equation(t, ice) - pressure; };
  const double at_lowest = missing(line.lowest);
  const double at_highest = missing(line.highest);
  if (at_lowest == 0) return line.lowest;
  if (at_highest == 0) return line.highest;
  std::uintmax_t steps = 100;
  const auto bracket =
      boost::math::tools::toms748_solve(missing, line.lowest, line.highest, at_lowest, at_highest,
                                        boost::math::tools::eps_tolerance<double>(50), steps);
  if (steps >= 100) {
    return make_failure(Fault::no_convergence, 0, "the melting temperature did not converge");
  }
  return 0.5 * (bracket.first + bracket.second);
}

}  // namespace

Outcome<double> surface_tension(double temperature) {
  if (const Failure failure = check_between(
          temperature, kTriplePointTemperature, kCriticalTemperature,
          "{0} is below {1}, the triple point, where IAPWS R1-76 (surface tension) begins",
          "{0} is above {1}, the critical temperature, where the surface vanishes");
      failure.fault != Fault::none) {
    return failure;
  }
  const double tau = 1 - temperature / kCriticalTemperature;
  return kTension * std::pow(tau, kExponent) * (1 + kSlope * tau);
}

Outcome<double> surface_tension_of(const State& state) {
  if (state.region != Region::two_phase) {
    return make_failure(Fault::missing, 0,
                        "is a single phase: there is no surface between liquid and vapour");
  }
  const Outcome<double> tension = surface_tension(state.temperature);
  if (!tension) return tension.failure().about(0);
  return tension;
}

Outcome<double> melting_pressure(double temperature, Ice ice) {
  const Melting& line = melting(ice);
  if (const Failure failure =
          check_between(temperature, line.lowest, line.highest, line.below, line.above);
      failure.fault != Fault::none) {
    return failure;
  }
  return melting_equation(temperature, ice);
}

Outcome<double> melting_temperature(double pressure) {
  const Measure value{pressure, Quantity::pressure};
  if (!std::isfinite(pressure)) {
    return make_failure(Fault::outside_range, 1, "{0} is not a finite number", value);
  }
  if (pressure < kTriplePointPressure) {
    return make_failure(Fault::outside_range, 1,
                        "{0} is below {1}, the triple point, below which ice turns into vapour",
                        value, {kTriplePointPressure, Quantity::pressure});
  }
  // The lines meet to the printed digits of the triple points; the first one that reaches the
  // pressure answers.
  if (pressure <= melting_ih(melting(Ice::ih).lowest)) return solve(pressure, Ice::ih);
  for (const Ice ice : {Ice::iii, Ice::v, Ice::vi}) {
    const Melting& line = melting(ice);
    if (pressure > melting_equation(line.highest, ice)) continue;
    const double power = 1 - (1 - pressure / line.pressure) / line.a;
    const double temperature = line.lowest * std::pow(power, 1 / line.b);
    return std::fmin(std::fmax(temperature, line.lowest), line.highest);
  }
  const Melting& last = melting(Ice::vii);
  const double highest = melting_vii(last.highest);
  if (pressure > highest) {
    return make_failure(Fault::outside_range, 1,
                        "{0} is above {1}, the end of the melting line of ice VII in IAPWS R14-08",
                        value, {highest, Quantity::pressure});
  }
  if (pressure <= melting_vii(last.lowest)) return last.lowest;
  return solve(pressure, Ice::vii);
}

Outcome<double> sublimation_pressure(double temperature) {
  if (const Failure failure =
          check_between(temperature, 50, kTriplePointTemperature,
                        "{0} is below {1}, the lowest temperature of IAPWS R14-08 (sublimation)",
                        "{0} is above {1}, the triple point, where sublimation ends");
      failure.fault != Fault::none) {
    return failure;
  }
  const double theta = temperature / kTriplePointTemperature;
  const double sum = -0.212144006e2 * std::pow(theta, 0.333333333e-2) +
                     0.273203819e2 * std::pow(theta, 0.120666667e1) -
                     0.610598130e1 * std::pow(theta, 0.170333333e1);
  return kTriplePointPressure * std::exp(sum / theta);
}

}  // namespace busbar::water
