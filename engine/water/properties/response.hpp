// Second-order properties of a single-phase state: how it answers to heat and pressure.
#pragma once

#include "core/outcome.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// SI. All follow from the second derivatives of the basic equation of the region.
struct Response {
  double isobaric_heat_capacity = 0;      ///< cp = (dh/dT)_p, J/(kg K)
  double isochoric_heat_capacity = 0;     ///< cv = (du/dT)_v, J/(kg K)
  double speed_of_sound = 0;              ///< w = v sqrt(-(dp/dv)_s), m/s
  double isentropic_exponent = 0;         ///< -(v/p) (dp/dv)_s
  double joule_thomson = 0;               ///< (dT/dp)_h, K/Pa
  double isobaric_expansion = 0;          ///< (1/v) (dv/dT)_p, 1/K
  double isothermal_compressibility = 0;  ///< -(1/v) (dv/dp)_T, 1/Pa
};

/// The response of a single-phase state. Saturated liquid (dryness 0) and saturated vapour
/// (dryness 1) answer with the limit of their own phase. Failures, argument 0: missing between
/// those two (heat boils the mixture at constant temperature: cp has no finite value, and the speed
/// of sound depends on how the phases are spread), and missing where the basic equation has no
/// finite answer (the critical point and the last hair below it).
/// Source: IAPWS R7-97(2012), equations 7, 15, 28 and 32 with tables 3, 12, 31 and 39; relations
/// between the coefficients: IAPWS AN3-07(2018).
Outcome<Response> response(const State& state);

/// The same without a check: above dryness 0 saturated vapour answers for a mixture, and next to
/// the critical point numbers may be infinite or negative.
Response response_of_phase(const State& state);

// The basic equations at pressure (Pa), or density (kg/m3), and temperature (K).
Response response_1(double pressure, double temperature);
Response response_2(double pressure, double temperature);
Response response_3(double density, double temperature);
Response response_5(double pressure, double temperature);

// One property each, for callers that want no more. Failures as above.
Outcome<double> isobaric_heat_capacity(const State& state);
Outcome<double> isochoric_heat_capacity(const State& state);
Outcome<double> speed_of_sound(const State& state);
Outcome<double> isentropic_exponent(const State& state);
Outcome<double> joule_thomson(const State& state);
Outcome<double> isobaric_expansion(const State& state);
Outcome<double> isothermal_compressibility(const State& state);

}  // namespace busbar::water
