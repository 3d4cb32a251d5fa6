// A state of water or steam by IAPWS-IF97 and the ways to find one.
#pragma once

#include <cstdint>
#include <limits>

#include "core/outcome.hpp"

namespace busbar::water {

/// Regions of IAPWS R7-97(2012), figure 1.
enum class Region : std::uint8_t {
  none = 0,
  liquid = 1,            ///< equation 7
  vapour = 2,            ///< equation 15
  near_critical = 3,     ///< equation 28
  two_phase = 4,         ///< equations 30 and 31 with the saturated states of regions 1, 2 or 3
  high_temperature = 5,  ///< equation 32
};

/// An equilibrium state. All in SI: Pa, K, m3/kg, J/kg, J/(kg K).
/// `dryness` is the mass share of vapour, 0 to 1, in the two-phase region and NaN elsewhere.
struct State {
  double pressure = 0;
  double temperature = 0;
  double volume = 0;
  double enthalpy = 0;
  double entropy = 0;
  double dryness = std::numeric_limits<double>::quiet_NaN();
  Region region = Region::none;
};

// Failures: outside_range (argument 1 or 2, the limit that was crossed among the measures),
// zero_or_blank never (callers check), no_convergence when an iteration reaches its cap.
// A value that is not finite is outside_range.
//
// Where the equations of IF97 do not quite meet: solve/isobar.hpp states the rule at the boundaries
// of regions, solve/density.hpp the one in the last 0.2 mK below the critical temperature.

/// State at pressure (Pa) and temperature (K). On the saturation line the liquid is returned.
/// Source: IAPWS R7-97(2012), equations 7, 15, 28, 32; boundaries by equations 5 and 30.
Outcome<State> at_pressure_temperature(double pressure, double temperature);

/// State at pressure (Pa) and specific enthalpy (J/kg). The enthalpy of the basic equation at the
/// answer agrees with the given one to max(1e-10 relative, 1e-10 R T*).
/// Source: as above; started from the backward equations of R7-97(2012) and SR3-03(2014).
Outcome<State> at_pressure_enthalpy(double pressure, double enthalpy);

/// The same where the temperature (K) was computed before, as a stream carries it: one evaluation
/// of the basic equation where both belong together to the last digits, and otherwise the answer of
/// at_pressure_enthalpy, whatever the temperature. In an overlap of two regions the temperature
/// tells which one the state was found in.
Outcome<State> at_pressure_enthalpy_near(double pressure, double enthalpy, double temperature);

/// State at pressure (Pa) and specific entropy (J/(kg K)), as exact as at_pressure_enthalpy.
Outcome<State> at_pressure_entropy(double pressure, double entropy);

/// State at pressure (Pa) and dryness (0 to 1), 611.213 Pa to the critical pressure.
Outcome<State> at_pressure_dryness(double pressure, double dryness);

/// Saturation temperature (K) at pressure (Pa), 611.213 Pa to 22.064 MPa.
/// Source: IAPWS R7-97(2012), equation 31.
Outcome<double> saturation_temperature(double pressure);

/// Saturation pressure (Pa) at temperature (K), 273.15 K to 647.096 K.
/// Source: IAPWS R7-97(2012), equation 30.
Outcome<double> saturation_pressure(double temperature);

}  // namespace busbar::water
