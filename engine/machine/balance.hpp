// Mass and energy balances of streams: power, duty, mixing, splitting, spraying.
#pragma once

#include <span>

#include "core/outcome.hpp"
#include "stream/stream.hpp"

namespace busbar::machine {

/// m (h1 - h2) in W, positive when the fluid gives power. Inputs 1 and 2 must be of one fluid and
/// carry equal flows.
Outcome<double> fluid_power(const Stream& inlet, const Stream& outlet);

/// m (h2 - h1) in W, positive when the stream takes heat. Flows as fluid_power.
Outcome<double> heat_duty(const Stream& inlet, const Stream& outlet);

/// Adiabatic mixing at the lowest of the pressures, of water, steam and gases (fluid/join.hpp).
/// Every stream must carry a flow, and one of them must flow. The tag stays where all tags are the
/// same. A failing stream is named by `row`, counted along the range.
Outcome<Stream> mix_out(std::span<const Stream> streams);

/// The share `fraction` of a stream, in the same state. Needs a flow.
Outcome<Stream> split_out(const Stream& stream, double fraction);

/// Steam (input 1) cooled by spray water (input 2) to `outlet_temperature` (K, input 3) at the
/// steam's pressure. The steam needs a flow; the spray flow follows from the energy balance, and a
/// flow that the water carries is not used. The outlet must stay above saturation.
Outcome<Stream> spray_out(const Stream& steam, const Stream& water, double outlet_temperature);

}  // namespace busbar::machine
