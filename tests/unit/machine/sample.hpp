// Random plant states, and streams that have gone through a cell as text.
#pragma once

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <optional>

#include "random.hpp"
#include "stream/text.hpp"
#include "water/state.hpp"
#include "water/stream.hpp"

namespace busbar::sample {

/// The stream as the next cell reads it.
inline Stream through_text(const Stream& stream) {
  std::string text;
  write_stream(text, stream, UnitSet::metric);
  const Outcome<Stream> read = read_stream(text);
  EXPECT_TRUE(read) << text;
  return *read;
}

inline water::State state_of(const Stream& stream) {
  const auto state = water::state_of(stream);
  EXPECT_TRUE(state) << state.failure().reason;
  return *state;
}

inline double entropy(const Stream& stream) { return state_of(stream).entropy; }

/// Steam as it enters a stage: superheated or supercritical, some of it hot enough for region 5.
inline Stream steam(support::Random& random, std::optional<double> flow = {}) {
  const double pressure = random.logarithmic(0.5e5, 300e5);
  const auto boiling = water::saturation_temperature(pressure);
  const double least = boiling ? *boiling + 0.5 : 660;
  const double temperature = random.uniform(least, random.chance(0.1) ? 1800 : 950);
  return water::stream_of(*water::at_pressure_temperature(pressure, temperature), flow);
}

/// Water before a pump.
inline Stream water_stream(support::Random& random, std::optional<double> flow = {}) {
  const double pressure = random.logarithmic(0.05e5, 30e5);
  const double boiling = *water::saturation_temperature(pressure);
  const double temperature = random.uniform(275, std::max(276.0, boiling - 0.5));
  return water::stream_of(*water::at_pressure_temperature(pressure, std::min(temperature, boiling)),
                          flow);
}

/// Any stream: water, wet steam, steam.
inline Stream any(support::Random& random, double flow) {
  if (random.chance(0.3)) return water_stream(random, flow);
  if (random.chance(0.4)) return steam(random, flow);
  const double pressure = random.logarithmic(0.02e5, 200e5);
  return water::stream_of(*water::at_pressure_dryness(pressure, random.uniform(0, 1)), flow);
}

/// By how much the entropy of a state may be off, in J/(kg K): the iterations stop at 1e-10, and
/// where the way of the fluid crosses a seam between regions, the basic equations differ there by
/// up to 0.177 (IAPWS R7-97(2012), consistency at the boundary between regions 2 and 3, the largest
/// of all).
inline double entropy_slack(const Stream& a, const Stream& b) {
  return state_of(a).region == state_of(b).region ? 1e-6 : 0.177;
}

}  // namespace busbar::sample
