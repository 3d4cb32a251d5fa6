// The components of ISO 6976:2016 and what the standard tabulates of each.
#pragma once

#include <array>
#include <cstddef>
#include <cstdint>
#include <span>
#include <string_view>

namespace busbar::fuel::gaseous {

/// Temperatures at which the gas is metered and at which it burns; columns of the tables below.
inline constexpr std::size_t kMeteringTemperatures = 4;    // 0 °C, 15 °C, 60 °F, 20 °C
inline constexpr std::size_t kCombustionTemperatures = 5;  // the same and 25 °C

/// Elements whose atomic masses make up the molar masses.
enum Element : std::uint8_t { kC, kH, kN, kO, kS, kHe, kNe, kAr, kElements };

/// One component. Heating values are those of the ideal gas.
struct Component {
  std::string_view name;
  std::array<std::uint8_t, kElements> atoms;
  std::array<double, kMeteringTemperatures> summation_factor;        ///< at 101.325 kPa
  double summation_uncertainty;                                      ///< standard uncertainty
  std::array<double, kCombustionTemperatures> higher_heating_value;  ///< gross, kJ/mol
  double heating_value_uncertainty;                                  ///< standard, kJ/mol
};

inline constexpr std::size_t kComponents = 60;

/// ISO 6976:2016, tables 1 to 3, in the order of the standard.
std::span<const Component, kComponents> components();

/// kg/mol, from the atomic masses of ISO 6976:2016, annex A.
double molar_mass(std::size_t component);

}  // namespace busbar::fuel::gaseous
