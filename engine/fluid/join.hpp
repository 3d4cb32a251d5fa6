// Streams that flow together, and balances over streams of any fluid.
#pragma once

#include <span>

#include "core/outcome.hpp"
#include "stream/stream.hpp"

namespace busbar::fluid {

/// Enthalpy with the heat of formation whatever the fluid, J/kg: the one in which gas, steam and
/// water may be added.
double formation_enthalpy(const Stream& stream);

/// Adiabatic mixing at a pressure of streams of which at least one is a gas; all must carry a flow,
/// and one of them must flow. Water and steam join the gas as vapour; where the mixture would be
/// below its dew point it is refused. Readers show the datum that all the gases share, or the
/// formation datum. Argument 1.
Outcome<Stream> mixed_gas(std::span<const Stream> streams, double pressure);

/// Heat that streams take between the inlets and the outlets of a boundary, W: what leaves less
/// what enters, with heats of formation. Arguments 1 and 2; all must carry a flow, and the flows
/// must balance.
Outcome<double> heat_taken(std::span<const Stream> inlets, std::span<const Stream> outlets);

}  // namespace busbar::fluid
