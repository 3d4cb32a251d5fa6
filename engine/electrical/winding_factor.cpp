#include "electrical/winding_factor.hpp"

#include <cmath>
#include <numbers>

namespace busbar::electrical {
namespace {

Failure not_whole(std::uint8_t argument, double value) {
  return {Fault::impossible, argument, "{0} is no whole number", {{{value, Quantity::number}}}};
}

bool is_whole(double value) { return std::floor(value) == value; }

// Slots and poles are inputs 1 and 2 of every formula here.
Failure check_slots_and_poles(double slots, double poles) {
  if (!is_whole(slots)) return not_whole(1, slots);
  if (!is_whole(poles)) return not_whole(2, poles);
  if (std::fmod(poles, 2) != 0) {
    return {Fault::impossible, 2, "{0} is odd: poles come in pairs", {{{poles, Quantity::number}}}};
  }
  return {};
}

}  // namespace

Outcome<double> distribution_factor(double slots, double poles, double phases) {
  if (const Failure wrong = check_slots_and_poles(slots, poles); wrong.fault != Fault::none) {
    return wrong;
  }
  if (!is_whole(phases)) return not_whole(3, phases);
  const double group = slots / (poles * phases);
  if (!is_whole(group)) {
    return Failure{Fault::outside_range,
                   1,
                   "{0} is {1} to a pole and phase: the formula does not hold for a winding with a "
                   "broken number",
                   {{{slots, Quantity::number}, {group, Quantity::number}}}};
  }
  const double half_slot = std::numbers::pi * poles / (2 * slots);
  return std::sin(group * half_slot) / (group * std::sin(half_slot));
}

Outcome<double> pitch_factor(double slots, double poles, double span) {
  if (const Failure wrong = check_slots_and_poles(slots, poles); wrong.fault != Fault::none) {
    return wrong;
  }
  if (!is_whole(span)) return not_whole(3, span);
  const double pitch = slots / poles;
  if (span >= 2 * pitch) {
    return Failure{Fault::impossible,
                   3,
                   "{0} is two pole pitches of {1} slots or more",
                   {{{span, Quantity::number}, {pitch, Quantity::number}}}};
  }
  return std::cos(std::numbers::pi / 2 * (1 - span / pitch));
}

Outcome<double> winding_factor(double slots, double poles, double phases, double span) {
  const Outcome<double> distribution = distribution_factor(slots, poles, phases);
  if (!distribution) return distribution.failure();
  const Outcome<double> pitch = pitch_factor(slots, poles, span);
  if (!pitch) {
    return pitch.failure().argument == 3 ? pitch.failure().about(4) : pitch.failure();
  }
  return *distribution * *pitch;
}

}  // namespace busbar::electrical
