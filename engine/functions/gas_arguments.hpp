// Arguments, sources and explanations that the chapters on gases share.
#pragma once

#include <string>

#include "catalogue/row.hpp"
#include "functions/sources.hpp"
#include "gas/mixture.hpp"

namespace busbar::functions {

inline constexpr const char* kNasaLimit = "the limit of the NASA polynomials";
inline constexpr double kLowestGasTemperature = 200;
inline constexpr double kHighestGasTemperature = 6000;
inline constexpr double kHighestGasPressure = 1e7;

inline constexpr Argument kCompositionArgument{
    "composition",
    "Two columns with names (N2, CO2, n-C4H10) and amounts under a heading that says \"mole\", "
    "\"mole %\", \"mass\" or \"mass %\"; or a text such as \"mole: N2 0.79, O2 0.21\"; or a "
    "published mixture such as \"dry air, ISO 2533\""};
inline constexpr Argument kGasTemperatureArgument{"temperature", "Temperature of the gas",
                                                  kLowestGasTemperature, kHighestGasTemperature,
                                                  kNasaLimit};
inline constexpr Argument kGasPressureArgument{"pressure", "Absolute pressure, never gauge",
                                               kAboveZero, kHighestGasPressure,
                                               "the limit set here for ideal gases"};
inline constexpr Argument kDatumArgument{
    "datum",
    "Where the enthalpy is zero: \"0 °C\", \"15 °C\" or \"25 °C\" for the gas itself with its "
    "water as vapour, or \"formation\" for the elements at 25 °C, so that heats of formation are "
    "in it"};

inline constexpr Source kNasaPolynomials{
    "B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556, NASA Glenn Coefficients for "
    "Calculating Thermodynamic Properties of Individual Species",
    "September 2002", "equations 1 to 3; ideal-gas mixture"};

/// Explain hook of rows whose first argument is a gas.
void explain_gas(const Slot* in, const Result& result, UnitSet units, std::string& text);

}  // namespace busbar::functions
