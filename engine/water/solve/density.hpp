// Density in region 3 at given pressure and temperature, and its saturated states.
//
// Next to the critical point equation 28 and the saturation line of equations 30 and 31 part:
// within some 35 microkelvin below Tc the pressure of equation 30 lies above the highest pressure
// that equation 28 allows to vapour at that temperature (by up to 0.4 mPa, 2e-11 of the pressure),
// so that equation 28 has one root there instead of three. The rule:
//  - Down to kCriticalBand (0.2 mK) below Tc, saturated liquid and vapour are the outer roots of
//    equation 28 at the pressure given.
//  - Nearer, their distances from the critical density shrink with the square root of Tc - T, as
//    those of equation 28 do (it is analytic), from their values at the edge of the band to zero at
//    Tc: both densities are continuous and meet in the critical point.
//  - For the density at pressure and temperature, equation 28 is used in that band, and as far
//  above
//    Tc, at the pressure shifted by the difference between equation 30 and equation 28 at those
//    saturated states: less than 0.02 Pa or 1e-9 of the pressure, and zero at both edges.
//    Single-phase states so join the saturated ones.
//  - States at pressure and enthalpy or entropy need no shift: there the solution of equation 28 is
//    well conditioned, and the shift would move the temperature by less than 1e-7 K.
#pragma once

namespace busbar::water {

/// A density (kg/m3) and how many times the basic equation was evaluated for it.
struct DensityFound {
  double density = 0;
  int evaluations = 0;
  bool converged = false;
};

/// Saturated densities (kg/m3) of region 3.
struct SaturatedDensities {
  double liquid = 0;
  double vapour = 0;
  int evaluations = 0;
  bool converged = false;
};

/// Width of the band around the critical temperature described above, K.
inline constexpr double kCriticalBand = 2e-4;

/// Evaluations after which a density iteration gives up (no_convergence).
inline constexpr int kDensityCap = 100;

/// Density of a single-phase state of region 3 at pressure (Pa) and temperature (K); `liquid`
/// chooses the side of the saturation line below the critical pressure. Source: equation 28.
DensityFound density_3(double pressure, double temperature, bool liquid);

/// Saturated densities at a pressure (Pa) between 16.529 MPa and the critical one and at its
/// saturation temperature (K) by equation 31.
SaturatedDensities saturated_densities_3(double pressure, double temperature);

}  // namespace busbar::water
