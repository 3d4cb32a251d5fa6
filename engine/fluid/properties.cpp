#include "fluid/properties.hpp"

#include "gas/properties.hpp"
#include "gas/transport.hpp"
#include "water/properties/energy.hpp"
#include "water/properties/response.hpp"
#include "water/transport/conductivity.hpp"
#include "water/transport/surface.hpp"
#include "water/transport/viscosity.hpp"

namespace busbar::fluid {
namespace {

// The water property, or for a gas what `of_gas` says.
template <class OfGas>
Outcome<double> either(const Stream& stream, const State& state,
                       Outcome<double> (*of_water)(const State&), OfGas&& of_gas) {
  Outcome<double> value = is_gas(stream) ? Outcome<double>(of_gas()) : of_water(state);
  if (!value) return value.failure().about(1);
  return value;
}

Failure gas_has_no(const char* reason) { return {Fault::missing, 1, reason}; }

}  // namespace

Outcome<double> shown_enthalpy(const Stream& stream, gas::Datum datum) {
  if (!is_gas(stream)) return stream.enthalpy;
  const Outcome<double> shift = gas::datum_shift(stream.mixture, datum);
  if (!shift) return shift.failure().about(1);
  return stream.enthalpy + *shift;
}

Outcome<double> pressure(const Stream&, const State& state) { return state.pressure; }
Outcome<double> temperature(const Stream&, const State& state) { return state.temperature; }
Outcome<double> volume(const Stream&, const State& state) { return state.volume; }
Outcome<double> density(const Stream&, const State& state) { return 1 / state.volume; }
Outcome<double> entropy(const Stream&, const State& state) { return state.entropy; }

// What the text carries exactly, not what an iteration came back to.
Outcome<double> enthalpy(const Stream& stream, const State&) {
  return shown_enthalpy(stream, stream.datum);
}

Outcome<double> internal_energy(const Stream& stream, const State& state) {
  if (!is_gas(stream)) return water::internal_energy(state);
  const Outcome<double> h = shown_enthalpy(stream, stream.datum);
  if (!h) return h.failure();
  return *h - state.pressure * state.volume;
}

Outcome<double> helmholtz_energy(const Stream& stream, const State& state) {
  if (!is_gas(stream)) return water::helmholtz_energy(state);
  const Outcome<double> u = internal_energy(stream, state);
  if (!u) return u.failure();
  return *u - state.temperature * state.entropy;
}

Outcome<double> gibbs_energy(const Stream& stream, const State& state) {
  if (!is_gas(stream)) return water::gibbs_energy(state);
  const Outcome<double> h = shown_enthalpy(stream, stream.datum);
  if (!h) return h.failure();
  return *h - state.temperature * state.entropy;
}

Outcome<double> superheat(const Stream& stream, const State& state) {
  return either(stream, state, water::superheat, [] {
    return gas_has_no(
        "is a gas: there is no superheat; DEW_POINT_OF tells where its water "
        "condenses");
  });
}

Outcome<double> subcooling(const Stream& stream, const State& state) {
  return either(stream, state, water::subcooling,
                [] { return gas_has_no("is a gas: there is no subcooling"); });
}

Outcome<double> isobaric_heat_capacity(const Stream& stream, const State& state) {
  return either(stream, state, water::isobaric_heat_capacity,
                [&] { return gas::heat_capacity(stream.mixture, state.temperature); });
}

Outcome<double> isochoric_heat_capacity(const Stream& stream, const State& state) {
  return either(stream, state, water::isochoric_heat_capacity,
                [&] { return gas::isochoric_heat_capacity(stream.mixture, state.temperature); });
}

Outcome<double> speed_of_sound(const Stream& stream, const State& state) {
  return either(stream, state, water::speed_of_sound,
                [&] { return gas::speed_of_sound(stream.mixture, state.temperature); });
}

Outcome<double> isentropic_exponent(const Stream& stream, const State& state) {
  return either(stream, state, water::isentropic_exponent,
                [&] { return gas::heat_capacity_ratio(stream.mixture, state.temperature); });
}

// The ideal gas: no cooling in a throttle, 1/T and 1/p.
Outcome<double> joule_thomson(const Stream& stream, const State& state) {
  return either(stream, state, water::joule_thomson, [] { return 0.0; });
}

Outcome<double> isobaric_expansion(const Stream& stream, const State& state) {
  return either(stream, state, water::isobaric_expansion, [&] { return 1 / state.temperature; });
}

Outcome<double> isothermal_compressibility(const Stream& stream, const State& state) {
  return either(stream, state, water::isothermal_compressibility,
                [&] { return 1 / state.pressure; });
}

Outcome<double> viscosity(const Stream& stream, const State& state) {
  return either(stream, state, water::viscosity,
                [&] { return gas::viscosity(stream.mixture, state.temperature); });
}

Outcome<double> thermal_conductivity(const Stream& stream, const State& state) {
  return either(stream, state, water::thermal_conductivity,
                [&] { return gas::thermal_conductivity(stream.mixture, state.temperature); });
}

Outcome<double> prandtl_number(const Stream& stream, const State& state) {
  return either(stream, state, water::prandtl_number,
                [&] { return gas::prandtl_number(stream.mixture, state.temperature); });
}

Outcome<double> surface_tension(const Stream& stream, const State& state) {
  return either(stream, state, water::surface_tension_of,
                [] { return gas_has_no("is a gas: there is no surface"); });
}

}  // namespace busbar::fluid
