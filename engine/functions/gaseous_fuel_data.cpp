// Gaseous fuels: the components that are known, and volumes at other conditions.
#include <string>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "fuel/gaseous/constants.hpp"
#include "fuel/gaseous/names_table.hpp"
#include "fuel/gaseous/volume.hpp"
#include "functions/functions.hpp"
#include "functions/gaseous_fuel_arguments.hpp"

namespace busbar::functions {
namespace {

namespace gaseous = fuel::gaseous;

// The components of the standard at one pair of temperatures, with the spellings that are read.
std::string spellings(std::size_t component) {
  std::string text;
  for (const gaseous::Synonym& synonym : gaseous::kSynonyms) {
    if (synonym.number != component + 1) continue;
    if (!text.empty()) text += ", ";
    text += synonym.name;
  }
  return text;
}

Outcome<Grid> component_table(Temperature combustion, Temperature metering, UnitSet units) {
  const auto burnt = gaseous::combustion_at(combustion.si);
  if (!burnt) return burnt.failure();
  const auto measured = gaseous::metering_at(metering.si, gaseous::kReferencePressure);
  if (!measured) return measured.failure().about(2);
  const Unit& mass = unit_of(units, Quantity::molar_mass);
  const Unit& heat = unit_of(units, Quantity::molar_heating_value);
  const auto with_unit = [](std::string_view name, const Unit& unit) {
    std::string text(name);
    text += ", ";
    text += unit.symbol;
    return text;
  };
  Grid table(gaseous::kComponents + 1, 7);
  table.at(0, 0) = std::string("component");
  table.at(0, 1) = std::string("spellings, without spaces, hyphens and commas");
  table.at(0, 2) = with_unit("molar mass", mass);
  table.at(0, 3) = with_unit("HHV by mole", heat);
  table.at(0, 4) = with_unit("standard uncertainty", heat);
  table.at(0, 5) = std::string("summation factor");
  table.at(0, 6) = std::string("standard uncertainty");
  for (std::size_t i = 0; i < gaseous::kComponents; ++i) {
    const gaseous::Component& component = gaseous::components()[i];
    const auto joules = [&](double kilojoules) { return heat.from_si(kilojoules * 1e3); };
    table.at(i + 1, 0) = std::string(component.name);
    table.at(i + 1, 1) = spellings(i);
    table.at(i + 1, 2) = mass.from_si(gaseous::molar_mass(i));
    table.at(i + 1, 3) = joules(component.higher_heating_value[burnt->column]);
    table.at(i + 1, 4) = joules(component.heating_value_uncertainty);
    table.at(i + 1, 5) = component.summation_factor[measured->column];
    table.at(i + 1, 6) = component.summation_uncertainty;
  }
  return table;
}

Outcome<SameUnit> fuel_gas_volume(SameUnit volume, const Composition& analysis,
                                  Temperature from_temperature, Pressure from_pressure,
                                  Temperature to_temperature, Pressure to_pressure) {
  GasReading read(analysis, 2);
  read.metering(from_temperature, from_pressure, 3);
  const gaseous::Metering from = read.metered;
  if (read.metering(to_temperature, to_pressure, 5).failed()) return read.failure();
  const Outcome<double> ratio = gaseous::volume_ratio(read.gas, from, read.metered);
  if (!ratio) return ratio.failure().about(2);
  return SameUnit{volume.si * *ratio};
}

Outcome<SameUnit> ideal_gas_volume(SameUnit volume, Temperature from_temperature,
                                   Pressure from_pressure, Temperature to_temperature,
                                   Pressure to_pressure) {
  return SameUnit{volume.si * gaseous::ideal_volume_ratio(from_temperature.si, from_pressure.si,
                                                          to_temperature.si, to_pressure.si)};
}

void explain_volume(const Slot* in, const Result&, UnitSet units, std::string& text) {
  GasReading read(Typed<Composition>::take(in[1]), 2);
  for (const std::size_t at : {std::size_t{2}, std::size_t{4}}) {
    read.metering({in[at].si}, {in[at + 1].si}, static_cast<std::uint8_t>(at + 1));
    const Outcome<double> z = gaseous::compression_factor(read.gas, read.metered);
    if (!z) return;
    text += at == 2 ? " Compression factor " : " and ";
    append_number(text, *z, 8);
    text += " at ";
    append_measure(text, {in[at].si, Quantity::temperature}, units);
    text += " and ";
    append_measure(text, {in[at + 1].si, Quantity::pressure}, units);
  }
  text += '.';
}

constexpr Argument kComponentTable[] = {kCombustionTemperature, kMeteringTemperature};
constexpr Argument kVolume{"volume", "Volume, or volume per time, in any unit", 0};
constexpr Argument kFromMetering{"from temperature", "Of the volume given: 0, 15 or 20 °C or 60 °F",
                                 kAboveZero};
constexpr Argument kFromMeteringPressure{"from pressure", "Of the volume given, absolute",
                                         gaseous::kLeastPressure, gaseous::kGreatestPressure,
                                         "the range of ISO 6976"};
constexpr Argument kToMetering{"to temperature", "Of the volume wanted: 0, 15 or 20 °C or 60 °F",
                               kAboveZero};
constexpr Argument kToMeteringPressure{"to pressure", "Of the volume wanted, absolute",
                                       gaseous::kLeastPressure, gaseous::kGreatestPressure,
                                       "the range of ISO 6976"};
constexpr Argument kRealVolume[] = {
    kVolume, kAnalysis, kFromMetering, kFromMeteringPressure, kToMetering, kToMeteringPressure};
constexpr Argument kIdealVolume[] = {
    kVolume,
    {"from temperature", "Of the volume given", kAboveZero, 2000},
    {"from pressure", "Of the volume given, absolute", kAboveZero, 1e7},
    {"to temperature", "Of the volume wanted", kAboveZero, 2000},
    {"to pressure", "Of the volume wanted, absolute", kAboveZero, 1e7}};

constexpr Source kGasLaw{
    "Ideal-gas law, as in ISO 13443, Natural gas: standard reference "
    "conditions",
    "1996", "p V = n R T"};

constexpr const char* kGiven =
    "B2=\"mole: CH4 0.933212, C2H6 0.025656, C3H8 0.015368, N2 0.01035, CO2 0.015414\"";

constexpr Row kRows[] = {
    row<component_table>(
        {"FUEL_GAS_COMPONENT_TABLE",
         kGaseousFuels,
         "The 60 components of ISO 6976 with the names that are read and their data",
         "Enter it as an array formula of 61 rows and 7 columns: component, spellings, molar mass, "
         "HHV by mole and its standard uncertainty at the combustion temperature, summation factor "
         "and its standard uncertainty at the metering temperature and 101.325 kPa. A formula is "
         "read where one component alone has it; butane, C4H10 and C6+ are refused.",
         "A table",
         {kIso6976, kIso6976Edition, "tables 1 to 3"},
         {"INDEX(FUEL_GAS_COMPONENT_TABLE(15; 15); 2; 4)", "891.51"},
         kFirst},
        kComponentTable),
    row<fuel_gas_volume>(
        {"FUEL_GAS_VOLUME_AT_CONDITIONS",
         kGaseousFuels,
         "Volume of a real fuel gas at other reference conditions",
         "The same amount of gas: volume times Z T/p there over Z T/p here, between the metering "
         "conditions of ISO 6976. No conversion of pipeline conditions.",
         "Volume, in the unit given",
         {kIso6976, kIso6976Edition, "molar volume of the real gas; table 2"},
         {"FUEL_GAS_VOLUME_AT_CONDITIONS(1000; B2; 15; 1.01325; 0; 1.01325)", "947.511373", kGiven},
         kFirst},
        kRealVolume, explain_volume),
    row<ideal_gas_volume>(
        {"IDEAL_GAS_VOLUME_AT_CONDITIONS",
         kGaseousFuels,
         "Volume of an ideal gas at another temperature and pressure",
         "The same amount of gas: volume times T/p there over T/p here. Near atmospheric pressure "
         "a "
         "natural gas is off by some 0.1 %.",
         "Volume, in the unit given",
         kGasLaw,
         {"IDEAL_GAS_VOLUME_AT_CONDITIONS(1000; 15; 1.01325; 0; 1.01325)", "947.943779"},
         kFirst},
        kIdealVolume),
};

}  // namespace

std::span<const Row> gaseous_fuel_data() { return kRows; }

}  // namespace busbar::functions
