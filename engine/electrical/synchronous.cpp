#include "electrical/synchronous.hpp"

#include <cmath>

namespace busbar::electrical {
namespace {

// A nameplate rounds 428.57 rpm to 429 or 428 (0.13 %). Fifty pole pairs are 2 % from forty-nine.
constexpr double kRounding = 0.005;

}  // namespace

Outcome<double> synchronous_speed(double frequency, double poles) {
  if (std::floor(poles) != poles) {
    return Failure{Fault::impossible, 2, "{0} is no whole number", {{{poles, Quantity::number}}}};
  }
  if (std::fmod(poles, 2) != 0) {
    return Failure{Fault::impossible,
                   2,
                   "{0} is odd: poles come in pairs, and the number of poles is twice the pairs",
                   {{{poles, Quantity::number}}}};
  }
  return 2 * frequency / poles;
}

Outcome<double> pole_count(double frequency, double speed) {
  const double pairs = frequency / speed;
  const double whole = std::round(pairs);
  if (!(whole >= 1) || std::abs(pairs / whole - 1) > kRounding) {
    return Failure{
        Fault::impossible,
        2,
        "{0} at {1} would need {2} poles, and poles come in whole pairs; the rated speed "
        "of an induction machine is not the synchronous one",
        {{{speed, Quantity::rotational_speed},
          {frequency, Quantity::frequency},
          {2 * pairs, Quantity::number}}}};
  }
  if (2 * whole > kMostPoles) {
    return Failure{Fault::outside_range,
                   2,
                   "{0} would need {1} poles, more than {2}",
                   {{{speed, Quantity::rotational_speed},
                     {2 * whole, Quantity::number},
                     {kMostPoles, Quantity::number}}}};
  }
  return 2 * whole;
}

Outcome<double> slip(double frequency, double poles, double speed) {
  const Outcome<double> synchronous = synchronous_speed(frequency, poles);
  if (!synchronous) return synchronous.failure();
  return 1 - speed / *synchronous;
}

}  // namespace busbar::electrical
