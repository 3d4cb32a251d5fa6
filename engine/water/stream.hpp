// Between streams and states of water.
#pragma once

#include <optional>

#include "core/outcome.hpp"
#include "stream/stream.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// The full state of a stream, found from what its text carries exactly: pressure and dryness where
/// it is wet, pressure and enthalpy elsewhere, where the temperature only spares an iteration.
/// Failures as at_pressure_enthalpy, argument 1; a gas is wrong_kind (fluid/state.hpp takes both).
Outcome<State> state_of(const Stream& stream);

/// A stream in a state.
Stream stream_of(const State& state, std::optional<double> flow = {}, const Tag& tag = {});

/// The same stream (flow, tag) in another state.
Stream moved_to(const Stream& stream, const State& state);

}  // namespace busbar::water
