// Arguments, explanations and short forms that the chapters on water and steam share.
#pragma once

#include <optional>
#include <string>

#include "catalogue/row.hpp"
#include "functions/describe.hpp"
#include "functions/sources.hpp"
#include "water/state.hpp"

namespace busbar::functions {

inline constexpr const char* kIf97Limit = "the limit of IAPWS-IF97";
inline constexpr Argument kPressureArgument{"pressure", "Absolute pressure, never gauge",
                                            kAboveZero, 100e6, kIf97Limit};
inline constexpr Argument kTemperatureArgument{"temperature", "Temperature of the fluid", 273.15,
                                               2273.15, kIf97Limit};
inline constexpr Argument kDrynessArgument{"dryness",
                                           "Mass of vapour over mass of fluid, from 0 to 1", 0, 1};
inline constexpr Argument kEnthalpyArgument{
    "enthalpy", "Specific enthalpy, zero near the triple point of water", -1e4, 8e6};
inline constexpr Argument kEntropyArgument{
    "entropy", "Specific entropy, zero near the triple point of water", -1e3, 2e4};
inline constexpr Argument kFlowArgument{"flow", "Mass flow; leave it out where it is not known",
                                        kAboveZero, 1e6};

/// Batch kernels of water/batch as the catalogue takes them.
template <class R, class A, void (*kBatch)(const double*, double*, std::size_t)>
void column(Column<A> a, Answers<R> out, std::size_t count) {
  kBatch(a.si, out.si, count);
}
template <class R, class A, class B,
          void (*kBatch)(const double*, const double*, double*, std::size_t)>
void columns(Column<A> a, Column<B> b, Answers<R> out, std::size_t count) {
  kBatch(a.si, b.si, out.si, count);
}
template <class R, void (*kBatch)(const double*, const double*, double*, std::size_t)>
void columns_pt(Column<Pressure> p, Column<Temperature> t, Answers<R> out, std::size_t count) {
  kBatch(p.si, t.si, out.si, count);
}

/// A property of a state: any function of water/properties and water/transport.
using PropertyOf = Outcome<double> (*)(const water::State&);

/// The property at a pressure and a temperature. What the property itself refuses is said of the
/// temperature.
template <class Q, PropertyOf kProperty>
Outcome<Q> at_pressure_and_temperature(Pressure p, Temperature t) {
  const Outcome<water::State> state = water::at_pressure_temperature(p.si, t.si);
  if (!state) return state.failure();
  const Outcome<double> value = kProperty(*state);
  if (!value) return value.failure().about(2);
  return Q{*value};
}

/// Explain hook of rows whose arguments begin with a pressure and a temperature.
inline void explain_pressure_temperature(const Slot* in, const Result&, UnitSet units,
                                         std::string& text) {
  const auto state = water::at_pressure_temperature(in[0].si, in[1].si);
  if (!state) return;
  describe_state(text, *state, units);
  append_validity(text, units);
}

}  // namespace busbar::functions
