// Constants of ISO 6976:2016, annex A, in SI, each with its standard uncertainty.
#pragma once

#include <array>

#include "fuel/gaseous/component.hpp"

namespace busbar::fuel::gaseous {

struct Constant {
  double value;
  double uncertainty;
};

/// A.2, molar gas constant, J/(mol K).
inline constexpr Constant kGasConstant{8.3144621, 0.0000075};

/// Table A.2, kg/mol, in the order of Element.
inline constexpr std::array<Constant, kElements> kAtomicMass{{{12.0107e-3, 0.0004e-3},
                                                              {1.00794e-3, 0.000035e-3},
                                                              {14.0067e-3, 0.0001e-3},
                                                              {15.9994e-3, 0.00015e-3},
                                                              {32.065e-3, 0.0025e-3},
                                                              {4.002602e-3, 0.000001e-3},
                                                              {20.1797e-3, 0.0003e-3},
                                                              {39.948e-3, 0.0005e-3}}};

/// Molar mass of dry air of reference composition, kg/mol, and its compression factor at 101.325
/// kPa at the metering temperatures 0 °C, 15 °C, 60 °F, 20 °C.
inline constexpr Constant kAirMolarMass{28.96546e-3, 0.00017e-3};
inline constexpr std::array<double, kMeteringTemperatures> kAirCompressionFactor{
    0.999419, 0.999595, 0.999601, 0.999645};
inline constexpr double kAirCompressionUncertainty = 0.000015;

/// Standard enthalpy of vaporization of water at 0 °C, 15 °C, 60 °F, 20 °C, 25 °C, J/mol.
inline constexpr std::array<double, kCombustionTemperatures> kVaporization{45064, 44431, 44408,
                                                                           44222, 44013};
inline constexpr double kVaporizationUncertainty = 4;

/// The pressure to which the summation factors belong, Pa.
inline constexpr double kReferencePressure = 101325;

}  // namespace busbar::fuel::gaseous
