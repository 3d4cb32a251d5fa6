#include "water/stream.hpp"

namespace busbar::water {
namespace {

// Critical point of IAPWS R7-97(2012), equations 2 and 3.
constexpr double kCriticalTemperature = 647.096;
constexpr double kCriticalPressure = 22.064e6;

Phase phase_of(const State& state) {
  if (state.region == Region::two_phase) return Phase::two_phase;
  if (state.pressure < kCriticalPressure) {
    if (state.region == Region::liquid) return Phase::liquid;
    if (state.region != Region::near_critical) return Phase::vapour;
    const Outcome<double> boiling = saturation_temperature(state.pressure);
    return boiling && state.temperature <= *boiling ? Phase::liquid : Phase::vapour;
  }
  return state.temperature < kCriticalTemperature ? Phase::liquid : Phase::supercritical;
}

}  // namespace

Outcome<State> state_of(const Stream& stream) {
  if (stream.phase == Phase::gas) {
    return Failure{Fault::wrong_kind, 1, "is a gas where water or steam is needed"};
  }
  Outcome<State> state =
      stream.phase == Phase::two_phase
          ? at_pressure_dryness(stream.pressure, stream.dryness)
          : at_pressure_enthalpy_near(stream.pressure, stream.enthalpy, stream.temperature);
  if (!state) return state.failure().about(1);
  return state;
}

Stream stream_of(const State& state, std::optional<double> flow, const Tag& tag) {
  Stream stream;
  stream.phase = phase_of(state);
  stream.pressure = state.pressure;
  stream.temperature = state.temperature;
  stream.enthalpy = state.enthalpy;
  stream.dryness = state.dryness;
  stream.flow = flow;
  stream.tag = tag;
  return stream;
}

Stream moved_to(const Stream& stream, const State& state) {
  return stream_of(state, stream.flow, stream.tag);
}

}  // namespace busbar::water
