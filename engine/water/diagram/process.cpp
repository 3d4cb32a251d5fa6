// Lines of a process through given states.
#include <cmath>

#include "water/diagram/lines.hpp"
#include "water/failure.hpp"

namespace busbar::water::diagram {

namespace {

using At = std::function<Outcome<State>(double)>;

constexpr std::uint8_t kStatesInput = 2;
constexpr std::uint8_t kPointsInput = 3;

bool is_wet(const State& state) {
  return state.region == Region::two_phase && state.dryness > 0 && state.dryness < 1;
}

// The parameter at which the line passes the saturation line, between one wet state and one that
// is not; halved until the two are one.
Outcome<State> corner(const At& at, double& a, double b, bool wet_at_a) {
  constexpr int kHalvings = 60;
  double wet = wet_at_a ? a : b;
  double other = wet_at_a ? b : a;
  for (int i = 0; i < kHalvings; ++i) {
    const double middle = wet + 0.5 * (other - wet);
    const Outcome<State> state = at(middle);
    if (!state) return state.failure();
    (is_wet(*state) ? wet : other) = middle;
  }
  a = wet;
  return at(wet);
}

// One section of the way, cut where it passes the saturation line.
Failure append_section(Course& course, const State& first, const State& last, double from,
                       double to, const At& at) {
  constexpr int kSamples = 32;
  Stretch stretch{from, to, first, last, at};
  double before = from;
  bool wet = is_wet(first);
  for (int i = 1; i <= kSamples; ++i) {
    const double here = i == kSamples ? to : from + (to - from) * i / kSamples;
    State state = last;
    if (i < kSamples) {
      const Outcome<State> found = at(here);
      if (!found) return found.failure();
      state = *found;
    }
    if (is_wet(state) != wet) {
      double crossing = before;
      const Outcome<State> found = corner(at, crossing, here, wet);
      if (!found) return found.failure();
      // An end that lies on the saturation line itself is no further corner.
      if (std::abs(crossing - from) > 1e-9 * std::abs(to - from) &&
          std::abs(crossing - to) > 1e-9 * std::abs(to - from)) {
        stretch.to = crossing;
        stretch.last = *found;
        course.push_back(stretch);
        stretch = {crossing, to, *found, last, at};
      }
      wet = !wet;
    }
    before = here;
  }
  course.push_back(std::move(stretch));
  return {};
}

Failure check_count(std::span<const State> states) {
  if (states.size() >= 2) return {};
  return make_failure(Fault::wrong_shape, kStatesInput,
                      "holds one stream only: a line goes through two at the least");
}

}  // namespace

Outcome<Points> expansion_line(Axes axes, std::span<const State> states, std::size_t points) {
  if (const Failure failure = check_count(states); failure.fault != Fault::none) return failure;
  Course course;
  for (std::size_t i = 1; i < states.size(); ++i) {
    const State& inlet = states[i - 1];
    const State& outlet = states[i];
    if (!(outlet.pressure < inlet.pressure)) {
      return make_failure(
          Fault::impossible, kStatesInput,
          "has a pressure of {0} in stream {2}, not below {1} in the one before it: "
          "an expansion falls",
          {outlet.pressure, Quantity::pressure}, {inlet.pressure, Quantity::pressure},
          {static_cast<double>(i + 1), Quantity::number});
    }
    const Outcome<State> ideal = at_pressure_entropy(outlet.pressure, inlet.entropy);
    if (!ideal) return ideal.failure().about(kStatesInput);
    const double efficiency =
        (inlet.enthalpy - outlet.enthalpy) / (inlet.enthalpy - ideal->enthalpy);
    const auto at = [inlet, efficiency](double log_pressure) -> Outcome<State> {
      const double pressure = std::exp(log_pressure);
      const Outcome<State> isentropic = at_pressure_entropy(pressure, inlet.entropy);
      if (!isentropic) return isentropic;
      return at_pressure_enthalpy(
          pressure, inlet.enthalpy - efficiency * (inlet.enthalpy - isentropic->enthalpy));
    };
    const Failure failure = append_section(course, inlet, outlet, std::log(inlet.pressure),
                                           std::log(outlet.pressure), at);
    if (failure.fault != Fault::none) return failure.about(kStatesInput);
  }
  return points_of(course, axes, points, kPointsInput, kStatesInput);
}

Outcome<Points> heating_line(Axes axes, std::span<const State> states, std::size_t points) {
  if (const Failure failure = check_count(states); failure.fault != Fault::none) return failure;
  Course course;
  for (std::size_t i = 1; i < states.size(); ++i) {
    const State& first = states[i - 1];
    const State& last = states[i];
    const auto at = [first, last](double share) {
      return at_pressure_enthalpy(first.pressure + share * (last.pressure - first.pressure),
                                  first.enthalpy + share * (last.enthalpy - first.enthalpy));
    };
    const Failure failure = append_section(course, first, last, 0, 1, at);
    if (failure.fault != Fault::none) return failure.about(kStatesInput);
  }
  return points_of(course, axes, points, kPointsInput, kStatesInput);
}

}  // namespace busbar::water::diagram
