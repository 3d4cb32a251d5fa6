// Standard uncertainties of the properties of a fuel gas: ISO 6976:2016, annex B.
//
// First-order propagation (ISO/IEC Guide 98-3, 5.1.2 and 5.2.2) of the uncertainties of the
// analysis, with its correlations, and of the standard's own data: heating values and summation
// factors of the components, independent of each other; atomic masses, shared by all components
// that contain the element; enthalpy of vaporization, gas constant, and the molar mass and
// compression factor of air.
#pragma once

#include <cstdint>
#include <optional>
#include <span>
#include <string_view>

#include "fuel/gaseous/property.hpp"

namespace busbar::fuel::gaseous {

/// How the errors of the mole fractions go together. It is worth a factor of two.
enum class Correlation : std::uint8_t {
  independent,  ///< each fraction errs for itself
  normalised,   ///< independent amounts, of which the uncertainties are, were divided by their sum
  matrix,       ///< coefficients are given
};

/// "independent", "normalised" or "matrix", capitals or not.
std::optional<Correlation> correlation_named(std::string_view word);

/// What is known of the errors of an analysis. `standard` holds the standard uncertainty of each
/// fraction in the order of the mixture, `coefficients` a square of correlation coefficients.
struct AnalysisErrors {
  std::span<const double> standard;
  Correlation correlation = Correlation::independent;
  std::span<const double> coefficients;
};

struct Uncertain {
  double value = 0;        ///< SI
  double uncertainty = 0;  ///< standard uncertainty, SI
};

/// Checks the errors against the mixture: inputs 2 (standard uncertainties: as many as components,
/// from 0 to 1) and 3 (coefficients: a square of that size, 1 on the diagonal, symmetric, between
/// -1 and 1).
Failure check_errors(const Mixture& gas, const AnalysisErrors& errors);

/// One property with its standard uncertainty. Errors must have passed check_errors; a variance
/// below zero shows coefficients that contradict each other (input 3). A gas without heating value
/// has no uncertainty of it (input 1).
Outcome<Uncertain> uncertain(Property property, const Mixture& gas, const AnalysisErrors& errors,
                             Basis basis, Combustion combustion, const Metering& metering);

}  // namespace busbar::fuel::gaseous
