// The saturation line, for many states.
//
// As in batch/pressure_temperature.hpp: bit for bit what the scalar functions of water/state.hpp
// and water/properties/energy.hpp answer, and NaN where they fail. The saturated states of region
// 3, above 16.529 MPa, are left to the scalar functions.
#pragma once

#include <cstddef>

namespace busbar::water::batch {

/// `count` pressures (Pa) or temperatures (K) to one property, in SI.
using OnSaturationLine = void(const double* at, double* out, std::size_t count);

OnSaturationLine saturation_temperature;
OnSaturationLine saturation_pressure;
OnSaturationLine latent_heat;  ///< at pressures

/// `count` pressures (Pa) and drynesses to one property, in SI.
using AtDryness = void(const double* pressure, const double* dryness, double* out,
                       std::size_t count);

AtDryness volume_at_dryness;
AtDryness enthalpy_at_dryness;
AtDryness entropy_at_dryness;

}  // namespace busbar::water::batch
