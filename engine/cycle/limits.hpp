// Limits of heat engines between temperatures.
#pragma once

#include "core/outcome.hpp"
#include "stream/stream.hpp"

namespace busbar::cycle {

/// 1 - Tc/Th, the most that any heat engine between two temperatures (K) can give. Impossible when
/// the cold temperature (input 2) is not below the hot one.
/// Source: S. Carnot, Réflexions sur la puissance motrice du feu, 1824, in the form of Kelvin 1851.
Outcome<double> carnot(double hot, double cold);

/// 1 - sqrt(Tc/Th), the efficiency at greatest power of an endoreversible engine: an orientation,
/// never a limit. Source: F. L. Curzon and B. Ahlborn, Am. J. Phys. 43 (1975) 22, equation 11.
Outcome<double> curzon_ahlborn(double hot, double cold);

/// (h2 - h1)/(s2 - s1) in K: the entropy-mean temperature at which a stream takes heat from inlet
/// to outlet. Impossible when the entropy does not rise. Source: Bejan, Advanced Engineering
/// Thermodynamics, and Baehr and Kabelac, Thermodynamik, thermodynamic mean temperature.
Outcome<double> mean_heating_temperature(const Stream& inlet, const Stream& outlet);

}  // namespace busbar::cycle
