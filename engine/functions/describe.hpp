// What an explanation says about a stream or a state of water.
#pragma once

#include <string>
#include <string_view>

#include "catalogue/row.hpp"
#include "water/state.hpp"

namespace busbar::functions {

/// Region with its equation, and the distance from saturation; for a stream its tag too.
void describe_state(std::string& text, const water::State& state, UnitSet units);
void describe_stream(std::string& text, const Stream& stream, UnitSet units);

/// Where IAPWS-IF97 holds.
void append_validity(std::string& text, UnitSet units);

/// Heading of a column: "pressure, bar".
std::string heading(std::string_view name, Quantity quantity, UnitSet units);

/// The failure of asking a single-phase state for its dryness: #N/A, with the distance from
/// saturation. `argument` is that of the stream, or 0 where the state came from two numbers.
Failure no_dryness(const water::State& state, std::uint8_t argument);

/// Explain hooks for rows: the stream that comes out, and the streams that go in (arguments 1, 2).
void explain_result(const Slot* in, const Result& result, UnitSet units, std::string& text);
void explain_first(const Slot* in, const Result& result, UnitSet units, std::string& text);
void explain_first_and_second(const Slot* in, const Result& result, UnitSet units,
                              std::string& text);

}  // namespace busbar::functions
