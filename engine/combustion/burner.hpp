// A burner or combustor without heat transfer: air, fuel and injected water or steam become flue
// gas.
#pragma once

#include "combustion/fuel.hpp"
#include "core/outcome.hpp"
#include "stream/stream.hpp"

namespace busbar::combustion {

/// Inputs are numbered as in burner_out: 1 air, 2 fuel, 3 fuel temperature, 4 fuel flow, 5
/// efficiency, 6 pressure loss, 7 injected water or steam.
struct Burner {
  Stream air;  ///< a gas stream with a flow; recirculated gas is mixed in before
  Fuel fuel;
  double fuel_temperature = kReferenceTemperature;  ///< K
  /// Share of the fuel's energy on LHV that the gas receives; the rest leaves as loss.
  double efficiency = 1;
  double pressure_loss = 0;          ///< share of the air's pressure
  const Stream* injected = nullptr;  ///< with a flow; its pressure is not below that of the air
};

/// The flue gas of a fuel flow (kg/s, input 4): complete combustion, ash and its heat left out.
/// Refused: more fuel than the air burns.
///   m h = m_air h_air + m_fuel h_fuel + m_water h_water - (1 - efficiency) m_fuel LHV,
/// all enthalpies with heats of formation, LHV at 25 °C.
Outcome<Stream> burner_out(const Burner& burner, double fuel_flow);

/// The fuel flow that leads to an outlet temperature (K, input 4), kg/s.
Outcome<double> burner_fuel_flow(const Burner& burner, double outlet_temperature);

}  // namespace busbar::combustion
