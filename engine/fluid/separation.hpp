// A gas cooled below its dew point, as two phases in equilibrium: gas saturated with water, and
// water.
//
// The water of the gas phase has the saturation pressure of gas-free water (fluid/condensation.hpp)
// and nothing dissolves in the liquid.
#pragma once

#include "core/outcome.hpp"
#include "gas/mixture.hpp"
#include "stream/stream.hpp"

namespace busbar::fluid {

/// Shares by mass; `liquid` is 0 at and above the dew point, where `gas` is the mixture itself.
struct Separation {
  gas::Mixture gas;
  double liquid = 0;
};

/// Inputs: mixture, pressure, temperature. Failures, argument 3: below 0 °C (ice); a gas of water
/// alone below saturation, which all condenses.
Outcome<Separation> separated(const gas::Mixture& mixture, double pressure, double temperature);

/// The gas phase and the water of a gas stream (input 1) at its pressure and a temperature (input
/// 2). No water to give is missing. A flow is shared out; without one both carry none.
Outcome<Stream> gas_phase(const Stream& stream, double temperature);
Outcome<Stream> condensate(const Stream& stream, double temperature);

/// Thermo-mechanical flow exergy against the dead state (inputs 2 and 3), J/kg. A gas keeps its
/// composition; below the dew point of the dead state part of its water is liquid there, as
/// `separated` says. Water: water::specific_exergy.
Outcome<double> specific_exergy(const Stream& stream, double dead_pressure,
                                double dead_temperature);

}  // namespace busbar::fluid
