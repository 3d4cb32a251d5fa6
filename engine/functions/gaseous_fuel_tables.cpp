// Gaseous fuels: tables of all properties, with their uncertainties.
#include <array>
#include <optional>
#include <string>
#include <vector>

#include "fuel/gaseous/uncertainty.hpp"
#include "functions/functions.hpp"
#include "functions/gaseous_fuel_arguments.hpp"

namespace busbar::functions {
namespace {

namespace gaseous = fuel::gaseous;
using gaseous::Property;

// --- Tables ----------------------------------------------------------------------------------

struct TableLine {
  const char* name;
  Property property;
  fuel::Basis basis;
  Quantity quantity;
};

constexpr fuel::Basis kHigher = fuel::Basis::higher;
constexpr fuel::Basis kLower = fuel::Basis::lower;

constexpr std::array kLines{
    TableLine{"molar mass", Property::molar_mass, kHigher, Quantity::molar_mass},
    TableLine{"compression factor", Property::compression_factor, kHigher, Quantity::number},
    TableLine{"molar volume", Property::molar_volume, kHigher, Quantity::molar_volume},
    TableLine{"density", Property::density, kHigher, Quantity::density},
    TableLine{"relative density", Property::relative_density, kHigher, Quantity::number},
    TableLine{"HHV by mole", Property::molar_heating_value, kHigher, Quantity::molar_heating_value},
    TableLine{"HHV by mass", Property::mass_heating_value, kHigher, Quantity::heating_value},
    TableLine{"HHV by volume", Property::volume_heating_value, kHigher,
              Quantity::volume_heating_value},
    TableLine{"Wobbe index on HHV", Property::wobbe_index, kHigher, Quantity::volume_heating_value},
    TableLine{"LHV by mole", Property::molar_heating_value, kLower, Quantity::molar_heating_value},
    TableLine{"LHV by mass", Property::mass_heating_value, kLower, Quantity::heating_value},
    TableLine{"LHV by volume", Property::volume_heating_value, kLower,
              Quantity::volume_heating_value},
    TableLine{"Wobbe index on LHV", Property::wobbe_index, kLower, Quantity::volume_heating_value},
};

void put_headings(Grid& table, std::initializer_list<const char*> headings) {
  std::size_t column = 0;
  for (const char* heading : headings) table.at(0, column++) = std::string(heading);
}

void put_name_and_unit(Grid& table, std::size_t row, const TableLine& line, UnitSet units) {
  table.at(row, 0) = std::string(line.name);
  table.at(row, 2) = std::string(unit_of(units, line.quantity).symbol);
}

Outcome<Grid> fuel_gas_table(const Composition& analysis, Temperature combustion,
                             Temperature metering, Pressure pressure, UnitSet units) {
  GasReading read(analysis);
  if (read.combustion(combustion, 2).metering(metering, pressure, 3).failed()) {
    return read.failure();
  }
  Grid table(kLines.size() + 1, 3);
  put_headings(table, {"property", "value", "unit"});
  for (std::size_t i = 0; i < kLines.size(); ++i) {
    const TableLine& line = kLines[i];
    const Outcome<double> value =
        gaseous::value_of(line.property, read.gas, line.basis, read.combusted, read.metered);
    if (!value) return value.failure();
    put_name_and_unit(table, i + 1, line, units);
    table.at(i + 1, 1) = unit_of(units, line.quantity).from_si(*value);
  }
  return table;
}

// The standard uncertainties of an analysis, which needs one for every part.
Outcome<std::vector<double>> uncertainties_of(const Composition& analysis) {
  if (analysis.basis != Basis::mole) {
    return Failure{Fault::outside_range, 1,
                   "is by mass: ISO 6976 propagates uncertainties of mole fractions"};
  }
  std::vector<double> standard;
  standard.reserve(analysis.parts.size());
  for (std::size_t i = 0; i < analysis.parts.size(); ++i) {
    const Part& part = analysis.parts[i];
    if (!part.uncertainty) {
      Failure failure{Fault::missing, 1,
                      "has no uncertainty: a third column, headed \"standard uncertainty\", gives "
                      "it in the unit of the amounts"};
      failure.row = static_cast<std::uint32_t>(i + 1);
      return failure;
    }
    standard.push_back(*part.uncertainty);
  }
  return standard;
}

// Inputs of the domain: 1 the gas, 2 its uncertainties, 3 the coefficients.
Failure about_errors(const Failure& failure) {
  return failure.about(failure.argument == 3 ? 6 : 1);
}

Outcome<Grid> fuel_gas_uncertainty_table(const Composition& analysis, Word correlation,
                                         Temperature combustion, Temperature metering,
                                         Pressure pressure,
                                         std::optional<Numbers<Number>> coefficients,
                                         UnitSet units) {
  GasReading read(analysis);
  read.combustion(combustion, 3).metering(metering, pressure, 4);
  if (read.failed()) return read.failure();
  const Outcome<std::vector<double>> standard = uncertainties_of(analysis);
  if (!standard) return standard.failure();
  const auto named = gaseous::correlation_named(correlation);
  if (!named) {
    return Failure{Fault::unknown_word, 2,
                   "says not how the fractions err together; write \"independent\", \"normalised\" "
                   "or \"matrix\""};
  }
  gaseous::AnalysisErrors errors{*standard, *named, {}};
  const bool matrix = *named == gaseous::Correlation::matrix;
  if (matrix && !coefficients) {
    return Failure{Fault::missing, 6, "are left out, and the correlation is that of a matrix"};
  }
  if (!matrix && coefficients) {
    return Failure{Fault::impossible, 6,
                   "are given, but the correlation is not \"matrix\", which would use them"};
  }
  if (coefficients) errors.coefficients = coefficients->si;
  if (const Failure failure = check_errors(read.gas, errors); failure.fault != Fault::none) {
    return about_errors(failure);
  }
  Grid table(kLines.size() + 1, 5);
  put_headings(
      table, {"property", "value", "unit", "standard uncertainty", "expanded uncertainty, k = 2"});
  for (std::size_t i = 0; i < kLines.size(); ++i) {
    const TableLine& line = kLines[i];
    const auto result = gaseous::uncertain(line.property, read.gas, errors, line.basis,
                                           read.combusted, read.metered);
    if (!result) return about_errors(result.failure());
    const Unit& unit = unit_of(units, line.quantity);
    put_name_and_unit(table, i + 1, line, units);
    table.at(i + 1, 1) = unit.from_si(result->value);
    table.at(i + 1, 3) = unit.from_si(result->uncertainty);
    table.at(i + 1, 4) = unit.from_si(2 * result->uncertainty);
  }
  return table;
}

// --- Rows ------------------------------------------------------------------------------------

constexpr Argument kTable[] = {kAnalysis, kCombustionTemperature, kMeteringTemperature,
                               kMeteringPressure};
constexpr Argument kUncertainties[] = {
    {"composition",
     "Table of component, mole fraction (or mole %) and standard uncertainty of it in the same "
     "unit, with \"mole\" or \"mole %\" over the second and \"standard uncertainty\" over the "
     "third "
     "column"},
    {"correlation",
     "\"independent\"; \"normalised\" where the uncertainties are those before the amounts were "
     "divided by their sum; or \"matrix\" with coefficients"},
    kCombustionTemperature,
    kMeteringTemperature,
    kMeteringPressure,
    {"coefficients",
     "Square of the correlation coefficients, components in the order of the composition", -1, 1}};

constexpr const char* kGiven =
    "B2=\"mole: CH4 0.933212, C2H6 0.025656, C3H8 0.015368, N2 0.01035, CO2 0.015414\"";
constexpr const char* kGivenUncertainties =
    "B2=\"component\" | C2=\"mole\" | D2=\"standard uncertainty\" | B3=\"CH4\" | C3=0.933212 | "
    "D3=0.000346 | B4=\"C2H6\" | C4=0.025656 | D4=0.000243 | B5=\"C3H8\" | C5=0.015368 | "
    "D5=0.000148 | B6=\"N2\" | C6=0.01035 | D6=0.000195 | B7=\"CO2\" | C7=0.015414 | D7=0.000111";

constexpr Row kRows[] = {
    row<fuel_gas_table>(
        {"FUEL_GAS_TABLE",
         kGaseousFuels,
         "Labelled table of all properties of a fuel gas from its analysis",
         "Enter it as an array formula of 14 rows and 3 columns: property, value, unit. Rows: "
         "molar "
         "mass, compression factor, molar volume, density, relative density; by mole, mass, volume "
         "and as Wobbe index the HHV, then the LHV. Fuel gas burns and explodes, and hydrogen "
         "ignites most readily: local codes and licensed practice come first.",
         "A table",
         {kIso6976, kIso6976Edition, "real gas; tables 1 to 3 and annex A"},
         {"INDEX(FUEL_GAS_TABLE(B2; 15; 15; 1.01325); 9; 2)", "38.410611", kGiven},
         kFirst},
        kTable),
    row<fuel_gas_uncertainty_table>(
        {"FUEL_GAS_UNCERTAINTY_TABLE",
         kGaseousFuels,
         "All properties of a fuel gas with the uncertainty that its analysis and ISO 6976 leave",
         "Enter it as an array formula of 14 rows and 5 columns: property, value, unit, standard "
         "and expanded (k = 2) uncertainty; rows as in FUEL_GAS_TABLE. Half of an expanded "
         "uncertainty of k = 2 is a standard one. Sampling and drift of the analyser are not in it "
         "unless the analysis has them.",
         "A table",
         kIso6976Uncertainty,
         {"INDEX(FUEL_GAS_UNCERTAINTY_TABLE(B2:D7; \"independent\"; 15; 15; 1.01325); 7; 4)",
          "0.615609872", kGivenUncertainties},
         kFirst},
        kUncertainties),
};

}  // namespace

std::span<const Row> gaseous_fuel_tables() { return kRows; }

}  // namespace busbar::functions
