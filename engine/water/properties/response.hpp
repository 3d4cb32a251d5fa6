// Second-order properties of a single-phase state: how it answers to heat and pressure.
#pragma once

#include "core/outcome.hpp"
#include "water/state.hpp"

namespace busbar::water {

#include "water/kernels/response.hpp"

using Response = ResponseOf<double>;

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
