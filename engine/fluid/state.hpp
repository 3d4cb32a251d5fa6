// The state of a stream whatever its fluid, and the same fluid in another state.
//
// Water and steam go to IAPWS-IF97, gases to the NASA polynomials. What water refuses it refuses
// with its own words; a gas below its dew point is refused with the dew point, because part of its
// water is liquid there.
#pragma once

#include <optional>

#include "core/outcome.hpp"
#include "gas/mixture.hpp"
#include "stream/stream.hpp"
#include "water/state.hpp"

namespace busbar::fluid {

/// Pressure, temperature, volume, enthalpy and entropy in SI. For a gas the region is `none`, the
/// enthalpy holds the heat of formation, and the entropy is the absolute one.
using State = water::State;

inline bool is_gas(const Stream& stream) { return stream.phase == Phase::gas; }

/// The full state of a stream, found from what its text carries. Argument 1.
Outcome<State> state_of(const Stream& stream);

/// States of the fluid of a stream. Arguments 1 and 2 are the two numbers.
Outcome<State> at_pressure_temperature(const Stream& fluid, double pressure, double temperature);
Outcome<State> at_pressure_enthalpy(const Stream& fluid, double pressure, double enthalpy);
Outcome<State> at_pressure_entropy(const Stream& fluid, double pressure, double entropy);

/// The same stream (fluid, flow, tag) in another state.
Stream moved_to(const Stream& stream, const State& state);

/// A stream of a gas. Arguments 1 to 3 are mixture, pressure and temperature.
Outcome<Stream> gas_stream(const gas::Mixture& mixture, double pressure, double temperature,
                           std::optional<double> flow, gas::Datum datum);

/// Refuses a gas where only water or steam will do. `input` counts the stream among the inputs.
Failure refuse_gas(const Stream& stream, std::uint8_t input);
/// Refuses water and steam where only a gas will do.
Failure refuse_water(const Stream& stream, std::uint8_t input);

/// Refuses a second stream (input 2) that is not of the fluid of the first: water beside a gas, or
/// a gas of another composition.
Failure refuse_other_fluid(const Stream& first, const Stream& second);

}  // namespace busbar::fluid
