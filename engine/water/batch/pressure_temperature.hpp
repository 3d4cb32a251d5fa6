// Properties of many states at pressure and temperature.
//
// Every answer is the same to the last bit as that of the scalar functions (water/state.hpp,
// water/properties), on every processor. Where the scalar function fails, or decides in the last
// digits beside a seam, the answer is NaN: ask the scalar function.
#pragma once

#include <cstddef>

namespace busbar::water::batch {

/// `count` pressures (Pa) and temperatures (K) to as many values of one property, in SI.
using AtPressureTemperature = void(const double* pressure, const double* temperature, double* out,
                                   std::size_t count);

AtPressureTemperature enthalpy;
AtPressureTemperature entropy;
AtPressureTemperature volume;
AtPressureTemperature density;
AtPressureTemperature internal_energy;
AtPressureTemperature helmholtz_energy;
AtPressureTemperature gibbs_energy;

// Second-order properties (water/properties/response.hpp).
AtPressureTemperature isobaric_heat_capacity;
AtPressureTemperature isochoric_heat_capacity;
AtPressureTemperature speed_of_sound;
AtPressureTemperature isentropic_exponent;
AtPressureTemperature joule_thomson;
AtPressureTemperature isobaric_expansion;
AtPressureTemperature isothermal_compressibility;

/// Volume, enthalpy and entropy together.
void volume_enthalpy_entropy(const double* pressure, const double* temperature, double* volume,
                             double* enthalpy, double* entropy, std::size_t count);

/// Density (kg/m3) of states of region 3 (not checked). NaN next to the critical point.
AtPressureTemperature density_3;

}  // namespace busbar::water::batch
