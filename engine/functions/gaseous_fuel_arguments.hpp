// What the functions on gaseous fuels have in common: arguments, their reading, words and sources.
#pragma once

#include <cstdint>

#include "catalogue/row.hpp"
#include "core/composition.hpp"
#include "fuel/basis.hpp"
#include "fuel/gaseous/conditions.hpp"
#include "fuel/gaseous/mixture.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {

/// Reads the arguments one after the other; the first failure stays. Places count from 1.
class GasReading {
 public:
  explicit GasReading(const Composition& analysis, std::uint8_t place = 1);

  GasReading& basis(Word word, std::uint8_t place);
  GasReading& combustion(Temperature temperature, std::uint8_t place);
  /// The pressure stands behind the temperature.
  GasReading& metering(Temperature temperature, Pressure pressure, std::uint8_t place);

  [[nodiscard]] bool failed() const { return failure_.fault != Fault::none; }
  [[nodiscard]] const Failure& failure() const { return failure_; }

  fuel::gaseous::Mixture gas;
  fuel::Basis heating_value_basis = fuel::Basis::higher;
  fuel::gaseous::Combustion combusted;
  fuel::gaseous::Metering metered;

 private:
  Failure failure_;
};

inline constexpr const char* kGaseousFuels = "Gaseous fuels";

inline constexpr Argument kAnalysis{
    "composition",
    "Table of component and amount with \"mole\", \"mole %\", \"mass\" or \"mass %\" over the "
    "amounts, or a text such as \"mole: CH4 0.95, C2H6 0.03, N2 0.02\""};
inline constexpr Argument kHeatingValueBasis{
    "basis", "\"HHV\" (gross, superior) or \"LHV\" (net, inferior)"};
inline constexpr Argument kCombustionTemperature{
    "combustion temperature", "At which the heat is counted: 0, 15, 20 or 25 °C or 60 °F",
    kAboveZero};
inline constexpr Argument kMeteringTemperature{
    "metering temperature", "To which the volume belongs: 0, 15 or 20 °C or 60 °F", kAboveZero};
inline constexpr Argument kMeteringPressure{
    "metering pressure", "To which the volume belongs, absolute; 1.01325 bar in most contracts",
    fuel::gaseous::kLeastPressure, fuel::gaseous::kGreatestPressure, "the range of ISO 6976"};

inline constexpr const char* kIso6976 =
    "ISO 6976:2016, Natural gas: calculation of calorific values, density, relative density and "
    "Wobbe indices from composition";

inline constexpr const char* kIso6976Edition = "third edition 2016";
inline constexpr Source kIso6976Uncertainty{
    kIso6976, kIso6976Edition, "uncertainty of calculation, annex B; tables 1 to 3 and annex A"};

}  // namespace busbar::functions
