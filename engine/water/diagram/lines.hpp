// The lines of a diagram of water and steam: where the phases meet, lines of constant pressure,
// temperature and dryness, and the way of a process.
//
// Each gives the stated number of points, among them the ends and every corner on the saturation
// line. States are those of IAPWS-IF97 (water/state.hpp). Inputs are counted from 1 as written,
// axes being 1; failures of a state name its input and the published limit.
#pragma once

#include <cstddef>
#include <span>

#include "core/outcome.hpp"
#include "water/diagram/axes.hpp"
#include "water/diagram/course.hpp"
#include "water/state.hpp"

namespace busbar::water::diagram {

/// Boiling water from 273.15 K to the critical point, then saturated steam back to 273.15 K.
Outcome<Points> saturation_dome(Axes axes, std::size_t points);

/// From one temperature to a higher one (K) at a pressure (Pa), by rising enthalpy.
Outcome<Points> isobar(Axes axes, double pressure, double from, double to, std::size_t points);

/// From one pressure to a higher one (Pa) at a temperature (K). A line that ends at the saturation
/// pressure ends in saturated steam; it goes on through wet steam where it ends above.
Outcome<Points> isotherm(Axes axes, double temperature, double from, double to, std::size_t points);

/// From one saturation temperature to a higher one (K) at a dryness.
Outcome<Points> dryness_line(Axes axes, double dryness, double from, double to, std::size_t points);

/// Through all states, the pressure falling from each to the next. Between two of them each point
/// is where a turbine that has the isentropic efficiency of that section would leave the steam:
/// h = h1 - eta (h1 - hs(p)), eta = (h1 - h2) / (h1 - hs(p2)), hs(p) on the isentrope of state 1.
/// (Moran and Shapiro, Fundamentals of Engineering Thermodynamics, 5th ed., section 6.8.)
Outcome<Points> expansion_line(Axes axes, std::span<const State> states, std::size_t points);

/// Through all states; between two of them the pressure changes in proportion to the enthalpy,
/// as with a loss of pressure that is spread evenly over the heat taken or given.
Outcome<Points> heating_line(Axes axes, std::span<const State> states, std::size_t points);

}  // namespace busbar::water::diagram
