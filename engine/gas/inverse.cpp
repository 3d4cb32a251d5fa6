// Temperatures from enthalpy and from entropy.
#include <algorithm>
#include <cmath>

#include "gas/properties.hpp"

namespace busbar::gas {
namespace {

constexpr int kMostSteps = 40;
// A Newton step of this size leaves an error of its square: below the rounding of a double.
constexpr double kLastStep = 1e-8;

constexpr Failure kNotConverged{Fault::no_convergence, 2, "leads to no temperature"};

// The ends of the fits, whose logarithms are computed once.
const Powers& cold_end() {
  static const Powers powers = Powers::at(200);
  return powers;
}
const Powers& middle() {
  static const Powers powers = Powers::at(kBreak);
  return powers;
}
const Powers& hot_end() {
  static const Powers powers = Powers::at(6000);
  return powers;
}

// What is solved for: value and slope over R at a temperature.
struct Sample {
  double value;
  double slope;
};

struct ByEnthalpy {
  static Sample at(const Polynomial& fit, const Powers& p) {
    return {fit.enthalpy(p), fit.heat_capacity(p)};
  }
};

struct ByEntropy {
  static Sample at(const Polynomial& fit, const Powers& p) {
    return {fit.entropy(p), fit.heat_capacity(p) * p.inverse};
  }
};

// The temperature by the cubic through both ends with their slopes, as a start.
double cubic_start(double wanted, const Sample& low, double t_low, const Sample& high,
                   double t_high) {
  const double span = high.value - low.value;
  const double u = (wanted - low.value) / span;
  const double m0 = span / low.slope;
  const double m1 = span / high.slope;
  const double v = 1 - u;
  return t_low * v * v * (1 + 2 * u) + t_high * u * u * (3 - 2 * u) + m0 * u * v * v -
         m1 * u * u * v;
}

// Newton within the interval; values rise with temperature, so the bracket always holds.
template <class By>
Outcome<double> solve(const Polynomial& fit, double wanted, const Powers& low, const Sample& at_low,
                      const Powers& high, const Sample& at_high) {
  double least = low.t;
  double most = high.t;
  double t = std::clamp(cubic_start(wanted, at_low, low.t, at_high, high.t), least, most);
  for (int i = 0; i < kMostSteps; ++i) {
    const Sample here = By::at(fit, Powers::at(t));
    const double missing = wanted - here.value;
    (missing > 0 ? least : most) = t;
    const double step = missing / here.slope;
    double next = t + step;
    if (!(next >= least && next <= most)) next = (least + most) / 2;
    const bool last = std::abs(next - t) <= kLastStep * t;
    t = next;
    if (last) return t;
  }
  return kNotConverged;
}

// Chooses the interval: in the gap between the fits 1,000 K, in their overlap the lower fit.
template <class By>
Outcome<double> temperature_at(const Mixture& mixture, double wanted) {
  const Polynomial cold = cold_fit(mixture);
  const Sample seam = By::at(cold, middle());
  if (wanted <= seam.value) {
    const Sample end = By::at(cold, cold_end());
    if (wanted < end.value) return cold_end().t / 2;  // below every range: refused by the caller
    return solve<By>(cold, wanted, cold_end(), end, middle(), seam);
  }
  const Polynomial hot = hot_fit(mixture);
  const Sample start = By::at(hot, middle());
  if (wanted <= start.value) return kBreak;
  const Sample end = By::at(hot, hot_end());
  if (wanted > end.value) return hot_end().t * 2;
  return solve<By>(hot, wanted, middle(), start, hot_end(), end);
}

// Outside the fits the temperature is not known, so the limit is told in what was asked for.
Failure outside(double asked, double limit, Quantity quantity, bool low) {
  return {Fault::outside_range,
          2,
          low ? "{0} is below {1}, where the NASA polynomials of the composition begin"
              : "{0} is above {1}, where the NASA polynomials of the composition end",
          {{{asked, quantity}, {limit, quantity}}}};
}

}  // namespace

Outcome<double> temperature_at_enthalpy(const Mixture& mixture, double enthalpy, Datum datum) {
  const Outcome<double> shift = datum_shift(mixture, datum);
  if (!shift) return shift.failure();
  const double wanted = (enthalpy - *shift) / specific_gas_constant(mixture);
  const Outcome<double> t = temperature_at<ByEnthalpy>(mixture, wanted);
  if (!t) return t.failure();
  if (check_temperature(mixture, *t).fault == Fault::none) return *t;
  const bool low = *t < kBreak;
  const double end = low ? lowest_temperature(mixture) : highest_temperature(mixture);
  const Outcome<double> limit = gas::enthalpy(mixture, end, datum);
  if (!limit) return limit.failure();
  return outside(enthalpy, *limit, Quantity::enthalpy, low);
}

Outcome<double> temperature_at_entropy(const Mixture& mixture, double pressure, double entropy) {
  const double wanted = entropy / specific_gas_constant(mixture) - mixing_entropy(mixture) +
                        std::log(pressure / kStandardPressure);
  const Outcome<double> t = temperature_at<ByEntropy>(mixture, wanted);
  if (!t) return t.failure().about(3);
  if (check_temperature(mixture, *t).fault == Fault::none) return *t;
  const bool low = *t < kBreak;
  const double end = low ? lowest_temperature(mixture) : highest_temperature(mixture);
  const Outcome<double> limit = gas::entropy(mixture, pressure, end);
  if (!limit) return limit.failure();
  return outside(entropy, *limit, Quantity::entropy, low).about(3);
}

}  // namespace busbar::gas
