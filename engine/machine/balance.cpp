#include "machine/balance.hpp"

#include <algorithm>
#include <cmath>

#include "fluid/join.hpp"
#include "fluid/state.hpp"
#include "water/state.hpp"
#include "water/stream.hpp"

namespace busbar::machine {
namespace {

using water::State;

// Flows that were added and split again differ by rounding only.
constexpr double kSameFlow = 1e-9;

Failure no_flow(std::uint8_t input) {
  return {Fault::missing, input, "carries no flow; SET_FLOW gives it one"};
}

Outcome<double> common_flow(const Stream& inlet, const Stream& outlet) {
  if (const Failure other = fluid::refuse_other_fluid(inlet, outlet); other.fault != Fault::none) {
    return other;
  }
  if (!inlet.flow) return no_flow(1);
  if (!outlet.flow) return no_flow(2);
  const double larger = std::max(*inlet.flow, *outlet.flow);
  if (std::abs(*inlet.flow - *outlet.flow) > kSameFlow * larger) {
    return Failure{Fault::impossible,
                   2,
                   "carries {0} but the inlet {1}: power and duty need one and the same flow",
                   {{{*outlet.flow, Quantity::flow}, {*inlet.flow, Quantity::flow}}}};
  }
  return *inlet.flow;
}

}  // namespace

Outcome<double> fluid_power(const Stream& inlet, const Stream& outlet) {
  const Outcome<double> flow = common_flow(inlet, outlet);
  if (!flow) return flow.failure();
  return *flow * (inlet.enthalpy - outlet.enthalpy);
}

Outcome<double> heat_duty(const Stream& inlet, const Stream& outlet) {
  const Outcome<double> flow = common_flow(inlet, outlet);
  if (!flow) return flow.failure();
  return *flow * (outlet.enthalpy - inlet.enthalpy);
}

Outcome<Stream> mix_out(std::span<const Stream> streams) {
  if (streams.empty()) return Failure{Fault::missing, 1, "holds no stream"};
  double flow = 0;
  double energy = 0;
  bool gas = false;
  double pressure = streams.front().pressure;
  Tag tag = streams.front().tag;
  for (std::size_t i = 0; i < streams.size(); ++i) {
    const Stream& stream = streams[i];
    if (!stream.flow) {
      return Failure{
          Fault::missing,
          1,
          "holds a stream without a flow, number {0} of the range; SET_FLOW gives it one",
          {{{static_cast<double>(i + 1), Quantity::number}}}};
    }
    flow += *stream.flow;
    energy += *stream.flow * stream.enthalpy;
    gas = gas || fluid::is_gas(stream);
    pressure = std::min(pressure, stream.pressure);
    if (!(stream.tag == tag)) tag = Tag{};
  }
  if (!(flow > 0)) return Failure{Fault::impossible, 1, "holds streams of zero flow only"};
  if (gas) {
    Outcome<Stream> mixed = fluid::mixed_gas(streams, pressure);
    if (!mixed) return mixed.failure();
    (*mixed).tag = tag;
    return mixed;
  }
  const Outcome<State> state = water::at_pressure_enthalpy(pressure, energy / flow);
  if (!state) return state.failure().about(1);
  return water::stream_of(*state, flow, tag);
}

Outcome<Stream> split_out(const Stream& stream, double fraction) {
  if (!stream.flow) return no_flow(1);
  Stream part = stream;
  part.flow = *stream.flow * fraction;
  return part;
}

Outcome<Stream> spray_out(const Stream& steam, const Stream& water, double outlet_temperature) {
  if (const Failure gas = fluid::refuse_gas(steam, 1); gas.fault != Fault::none) return gas;
  if (const Failure gas = fluid::refuse_gas(water, 2); gas.fault != Fault::none) return gas;
  if (!steam.flow) return no_flow(1);
  if (water.pressure < steam.pressure) {
    return Failure{Fault::impossible,
                   2,
                   "has {0}, less than the {1} of the steam that it is sprayed into",
                   {{{water.pressure, Quantity::pressure}, {steam.pressure, Quantity::pressure}}}};
  }
  if (!(outlet_temperature < steam.temperature)) {
    return Failure{Fault::impossible,
                   3,
                   "{0} is not below the {1} of the steam: spray water only cools",
                   {{{outlet_temperature, Quantity::temperature},
                     {steam.temperature, Quantity::temperature}}}};
  }
  if (const auto boiling = water::saturation_temperature(steam.pressure);
      boiling && !(outlet_temperature > *boiling)) {
    return Failure{
        Fault::impossible,
        3,
        "{0} is not above the saturation temperature {1}: temperature cannot fix a wet outlet",
        {{{outlet_temperature, Quantity::temperature}, {*boiling, Quantity::temperature}}}};
  }
  const Outcome<State> outlet = water::at_pressure_temperature(steam.pressure, outlet_temperature);
  if (!outlet) return outlet.failure().about(3);
  if (!(outlet->enthalpy > water.enthalpy)) {
    return Failure{Fault::impossible, 2, "holds more enthalpy than the outlet: it cannot cool it"};
  }
  const double spray =
      *steam.flow * (steam.enthalpy - outlet->enthalpy) / (outlet->enthalpy - water.enthalpy);
  return water::stream_of(*outlet, *steam.flow + spray, steam.tag);
}

}  // namespace busbar::machine
