// A line as a course of states, and the choice of the points that draw it.
#pragma once

#include <cstddef>
#include <cstdint>
#include <functional>
#include <vector>

#include "core/outcome.hpp"
#include "water/diagram/axes.hpp"
#include "water/state.hpp"

namespace busbar::water::diagram {

using Points = std::vector<State>;

/// A smooth part of a line between two states that are points of it in any case: its ends and its
/// corners. `at` gives the states between, for a parameter between `from` and `to`.
struct Stretch {
  double from = 0;
  double to = 0;
  State first;
  State last;
  std::function<Outcome<State>(double)> at;
  bool straight = false;  ///< on all axes, as an isobar in wet steam is
};

/// One stretch begins where the one before it ends.
using Course = std::vector<Stretch>;

/// As many points as asked for, in the order of the course. Ends and corners are among them; each
/// further point goes where the line drawn so far misses the true one by most, measured on the
/// axes with the line's own extent as the unit, so that points lie dense where the line bends.
///
/// Fewer points than the course has ends and corners are refused as `count_input`; what a state on
/// the way fails with is put down to `course_input`.
Outcome<Points> points_of(const Course& course, Axes axes, std::size_t count,
                          std::uint8_t count_input, std::uint8_t course_input);

}  // namespace busbar::water::diagram
