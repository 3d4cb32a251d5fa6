// Many states at pressure and enthalpy, or pressure and entropy.
//
// As in batch/pressure_temperature.hpp: bit for bit what the scalar functions of water/state.hpp
// answer, and NaN where they fail or where a state lies next to a boundary between regions.
#pragma once

#include <cstddef>

namespace busbar::water::batch {

/// `count` pressures (Pa) and enthalpies (J/kg) or entropies (J/(kg K)) to one property, in SI.
using OnIsobar = void(const double* pressure, const double* value, double* out, std::size_t count);

OnIsobar temperature_at_enthalpy;
OnIsobar entropy_at_enthalpy;
OnIsobar dryness_at_enthalpy;  ///< NaN outside the two-phase region
OnIsobar temperature_at_entropy;
OnIsobar enthalpy_at_entropy;
OnIsobar dryness_at_entropy;  ///< NaN outside the two-phase region

/// Temperature and entropy together.
void temperature_entropy_at_enthalpy(const double* pressure, const double* enthalpy,
                                     double* temperature, double* entropy, std::size_t count);

}  // namespace busbar::water::batch
