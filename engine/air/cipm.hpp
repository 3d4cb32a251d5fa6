// The density of air in metrology.
#pragma once

namespace busbar::air {

/// Density (kg/m3) of moist air at pressure (Pa, 60 to 110 kPa), temperature (K, 288.15 to 300.15),
/// relative humidity (0 to 1) and mole fraction of carbon dioxide: the caller keeps to the range.
/// Relative standard uncertainty of the formula 2.2e-5. Source: A. Picard, R. S. Davis, M. Gläser,
/// K. Fujii, Metrologia 45 (2008) 149, Revised formula for the density of moist air (CIPM-2007).
double cipm_2007_density(double pressure, double temperature, double relative_humidity,
                         double carbon_dioxide);

}  // namespace busbar::air
