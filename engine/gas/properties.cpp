#include "gas/properties.hpp"

#include <algorithm>
#include <cmath>

namespace busbar::gas {
namespace {

Failure below(double value, double limit, Quantity quantity) {
  return {Fault::outside_range,
          2,
          "{0} is below {1}, the lowest that the NASA polynomials of the composition reach",
          {{{value, quantity}, {limit, quantity}}}};
}

Failure above(double value, double limit, Quantity quantity) {
  return {Fault::outside_range,
          2,
          "{0} is above {1}, the highest that the NASA polynomials of the composition reach",
          {{{value, quantity}, {limit, quantity}}}};
}

}  // namespace

Polynomial cold_fit(const Mixture& mixture) {
  Polynomial sum;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    sum.add(cold_fit(mixture.species(i)), mixture.mole_fraction(i));
  }
  return sum;
}

Polynomial hot_fit(const Mixture& mixture) {
  Polynomial sum;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    sum.add(hot_fit(mixture.species(i)), mixture.mole_fraction(i));
  }
  return sum;
}

double mixing_entropy(const Mixture& mixture) {
  double sum = 0;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    const double x = mixture.mole_fraction(i);
    sum -= x * std::log(x);
  }
  return sum;
}

double lowest_temperature(const Mixture& mixture) {
  double limit = 0;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    limit = std::max(limit, lowest_temperature(mixture.species(i)));
  }
  return limit;
}

double highest_temperature(const Mixture& mixture) {
  double limit = highest_temperature(Species::N2);
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    limit = std::min(limit, highest_temperature(mixture.species(i)));
  }
  return limit;
}

Failure check_temperature(const Mixture& mixture, double temperature) {
  const double lowest = lowest_temperature(mixture);
  if (!(temperature >= lowest)) return below(temperature, lowest, Quantity::temperature);
  const double highest = highest_temperature(mixture);
  if (temperature > highest) return above(temperature, highest, Quantity::temperature);
  return {};
}

Outcome<Caloric> caloric(const Mixture& mixture, double temperature) {
  const Failure failure = check_temperature(mixture, temperature);
  if (failure.fault != Fault::none) return failure;
  const Polynomial mixed = fit(mixture, temperature);
  const Powers powers = Powers::at(temperature);
  const double r = specific_gas_constant(mixture);
  return Caloric{r * mixed.enthalpy(powers), r * mixed.heat_capacity(powers),
                 r * (mixed.entropy(powers) + mixing_entropy(mixture))};
}

Outcome<double> heat_capacity(const Mixture& mixture, double temperature) {
  const Failure failure = check_temperature(mixture, temperature);
  if (failure.fault != Fault::none) return failure;
  return specific_gas_constant(mixture) *
         fit(mixture, temperature).heat_capacity(Powers::at(temperature));
}

Outcome<double> enthalpy(const Mixture& mixture, double temperature, Datum datum) {
  const Failure failure = check_temperature(mixture, temperature);
  if (failure.fault != Fault::none) return failure;
  Polynomial mixed = fit(mixture, temperature);
  const double here = specific_gas_constant(mixture) * mixed.enthalpy(Powers::at(temperature));
  if (datum == Datum::formation) return here;
  const Outcome<double> shift = datum_shift(mixture, datum);
  if (!shift) return shift.failure();
  return here + *shift;
}

Outcome<double> mean_heat_capacity(const Mixture& mixture, double from, double to) {
  if (from == to) return heat_capacity(mixture, from);
  const Outcome<double> start = enthalpy(mixture, from, Datum::formation);
  if (!start) return start.failure();
  const Outcome<double> end = enthalpy(mixture, to, Datum::formation);
  if (!end) return end.failure().about(3);
  // Over a small span the difference of two enthalpies keeps few digits; cp in the middle is then
  // the better value of the two.
  constexpr double kSmallSpan = 1e-3;
  if (std::abs(to - from) < kSmallSpan) return heat_capacity(mixture, (from + to) / 2);
  return (*end - *start) / (to - from);
}

Outcome<double> datum_shift(const Mixture& mixture, Datum datum) {
  if (datum == Datum::formation) return 0.0;
  const double zero = zero_temperature(datum);
  if (check_temperature(mixture, zero).fault != Fault::none) {
    return Failure{Fault::outside_range,
                   1,
                   "has no data at {0}, the temperature of the datum",
                   {{{zero, Quantity::temperature}}}};
  }
  return -specific_gas_constant(mixture) * cold_fit(mixture).enthalpy(Powers::at(zero));
}

Outcome<double> entropy(const Mixture& mixture, double pressure, double temperature) {
  const Failure failure = check_temperature(mixture, temperature);
  if (failure.fault != Fault::none) return failure.about(3);
  return specific_gas_constant(mixture) *
         (fit(mixture, temperature).entropy(Powers::at(temperature)) + mixing_entropy(mixture) -
          std::log(pressure / kStandardPressure));
}

Outcome<double> density(const Mixture& mixture, double pressure, double temperature) {
  const Failure failure = check_temperature(mixture, temperature);
  if (failure.fault != Fault::none) return failure.about(3);
  return pressure / (specific_gas_constant(mixture) * temperature);
}

Outcome<double> isochoric_heat_capacity(const Mixture& mixture, double temperature) {
  const Outcome<double> cp = heat_capacity(mixture, temperature);
  if (!cp) return cp.failure();
  return *cp - specific_gas_constant(mixture);
}

Outcome<double> heat_capacity_ratio(const Mixture& mixture, double temperature) {
  const Outcome<double> cp = heat_capacity(mixture, temperature);
  if (!cp) return cp.failure();
  return *cp / (*cp - specific_gas_constant(mixture));
}

Outcome<double> speed_of_sound(const Mixture& mixture, double temperature) {
  const Outcome<double> ratio = heat_capacity_ratio(mixture, temperature);
  if (!ratio) return ratio.failure();
  return std::sqrt(*ratio * specific_gas_constant(mixture) * temperature);
}

}  // namespace busbar::gas
