#include "water/transport/conductivity.hpp"

#include <cmath>
#include <numbers>

#include "water/constants.hpp"
#include "water/properties/response.hpp"
#include "water/transport/limits.hpp"
#include "water/transport/tables.hpp"
#include "water/transport/viscosity.hpp"

namespace busbar::water {

namespace {

// IAPWS R15-11, table 3. The gas constant is that of equation 6, for industrial use too: tables 7
// to 9 come out only so.
constexpr double kReducingConductivity = 1e-3;  // W/(m K)
constexpr double kReducingViscosity = 1e-6;     // Pa s
constexpr double kGasConstantHere = 461.51805;  // J/(kg K)
constexpr double kLambda = 177.8514;
constexpr double kPerWaveNumber = 0.40;  // nm, inverse of q_D
constexpr double kAmplitude = 0.13;      // nm, xi_0
constexpr double kGamma0 = 0.06;
constexpr double kExponent = 0.630 / 1.239;  // nu / gamma
constexpr double kReferenceTemperature = 1.5;
constexpr double kSmallestY = 1.2e-7;
constexpr double kCap = 1e13;

double capped(double x) { return x >= 0 && x <= kCap ? x : kCap; }

// Equation 25: the reduced (drho/dp) at 1.5 Tc.
double reference_compressing(double delta) {
  std::size_t j = 0;
  while (j < std::size(tables::kConductivityRanges) && delta > tables::kConductivityRanges[j]) ++j;
  double sum = 0;
  for (std::size_t i = std::size(tables::kConductivityReference); i-- > 0;) {
    sum = sum * delta + tables::kConductivityReference[i][j];
  }
  return 1 / sum;
}

}  // namespace

ConductivityParts background_conductivity(double density, double temperature) {
  const double t = temperature / kCriticalTemperature;
  const double delta = density / kCriticalDensity;
  double dilute = 0;
  for (std::size_t k = std::size(tables::kConductivityDilute); k-- > 0;) {
    dilute = dilute / t + tables::kConductivityDilute[k];
  }
  ConductivityParts parts;
  parts.dilute = kReducingConductivity * std::sqrt(t) / dilute;
  const double sum = tables::double_series(tables::kConductivityDense, 1 / t - 1, delta - 1);
  parts.dense = std::exp(delta * sum);
  return parts;
}

double critical_conductivity(const CriticalInput& input) {
  const double t = input.temperature / kCriticalTemperature;
  const double delta = input.density / kCriticalDensity;
  const double zeta = capped(input.compressing * kCriticalPressure / kCriticalDensity);
  const double cp = capped(input.isobaric_heat_capacity / kGasConstantHere);
  const double kappa = cp * kGasConstantHere / input.isochoric_heat_capacity;
  // Equations 22 and 23.
  const double chi =
      std::fmax(delta * (zeta - reference_compressing(delta) * kReferenceTemperature / t), 0.0);
  const double xi = kAmplitude * std::pow(chi / kGamma0, kExponent);
  const double y = xi / kPerWaveNumber;
  if (y < kSmallestY) return 0;
  // Equation 19.
  const double decay = -std::expm1(-1 / (1 / y + y * y / (3 * delta * delta)));
  const double z =
      2 / (std::numbers::pi * y) * ((1 - 1 / kappa) * std::atan(y) + y / kappa - decay);
  // Equation 18.
  return kReducingConductivity * kLambda * delta * cp * t / (input.viscosity / kReducingViscosity) *
         z;
}

Outcome<double> thermal_conductivity(const State& state) {
  if (const Failure failure = check_transport(
          state,
          "{0} is above {1}, the highest temperature of IAPWS R15-11 (thermal conductivity)");
      failure.fault != Fault::none) {
    return failure;
  }
  const double density = 1 / state.volume;
  ConductivityParts parts = background_conductivity(density, state.temperature);
  if (state.region != Region::high_temperature) {
    const Response at = response_of_phase(state);
    CriticalInput input;
    input.density = density;
    input.temperature = state.temperature;
    input.isobaric_heat_capacity = at.isobaric_heat_capacity;
    input.isochoric_heat_capacity = at.isochoric_heat_capacity;
    input.compressing = density * at.isothermal_compressibility;
    input.viscosity = viscosity_equation(density, state.temperature);
    parts.critical = critical_conductivity(input);
  }
  return parts.total();
}

Outcome<double> prandtl_number(const State& state) {
  const Outcome<double> conductivity = thermal_conductivity(state);
  if (!conductivity) return conductivity.failure();
  const Outcome<double> cp = isobaric_heat_capacity(state);
  if (!cp) return cp.failure();
  return *viscosity(state) * *cp / *conductivity;
}

}  // namespace busbar::water
