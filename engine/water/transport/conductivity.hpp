// Thermal conductivity of water and steam.
#pragma once

#include "core/outcome.hpp"
#include "water/state.hpp"

namespace busbar::water {

/// The parts of the thermal conductivity in W/(m K): dilute times dense plus critical.
struct ConductivityParts {
  double dilute = 0;    ///< lambda0, W/(m K)
  double dense = 0;     ///< lambda1, a factor
  double critical = 0;  ///< lambda2, W/(m K)

  [[nodiscard]] double total() const { return dilute * dense + critical; }
};

/// lambda0 and lambda1 at density (kg/m3) and temperature (K). IAPWS R15-11, equations 16 and 17.
ConductivityParts background_conductivity(double density, double temperature);

/// What the critical enhancement needs from the equation of state.
struct CriticalInput {
  double density = 0;                  ///< kg/m3
  double temperature = 0;              ///< K
  double isobaric_heat_capacity = 0;   ///< J/(kg K)
  double isochoric_heat_capacity = 0;  ///< J/(kg K)
  double compressing = 0;              ///< (drho/dp)_T, kg/(m3 Pa)
  double viscosity = 0;                ///< Pa s, without enhancement
};

/// lambda2 (W/(m K)): IAPWS R15-11, equations 18 to 24, with equation 25 for industrial use. Heat
/// capacities and compressibilities that are negative or beyond 1e13 in reduced form count as 1e13,
/// as the release says.
double critical_conductivity(const CriticalInput& input);

/// Thermal conductivity (W/(m K)) of a state by the formulation for industrial use of IAPWS R15-11.
/// Range: 273.15 to 1173.15 K, to 100 MPa up to 1073.15 K and to 50 MPa above; in region 5 the
/// critical part is zero. Failures, argument 0: outside_range above 1173.15 K, missing for a
/// mixture.
Outcome<double> thermal_conductivity(const State& state);

/// Prandtl number, viscosity times cp over thermal conductivity. Failures as those and as
/// isobaric_heat_capacity.
Outcome<double> prandtl_number(const State& state);

}  // namespace busbar::water
