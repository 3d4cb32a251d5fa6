// Gaseous fuels by ISO 6976:2016: single properties of an analysis.
#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "fuel/gaseous/constants.hpp"
#include "fuel/gaseous/gpa_2145.hpp"
#include "fuel/gaseous/properties.hpp"
#include "functions/as.hpp"
#include "functions/functions.hpp"
#include "functions/gaseous_fuel_arguments.hpp"

namespace busbar::functions {
namespace {

namespace gaseous = fuel::gaseous;

Outcome<MolarMass> molar_mass(const Composition& analysis) {
  const GasReading read(analysis);
  if (read.failed()) return read.failure();
  return MolarMass{gaseous::molar_mass(read.gas)};
}

Outcome<MolarHeatingValue> by_mole(const Composition& analysis, Word basis,
                                   Temperature combustion) {
  GasReading read(analysis);
  if (read.basis(basis, 2).combustion(combustion, 3).failed()) return read.failure();
  return MolarHeatingValue{
      gaseous::molar_heating_value(read.gas, read.heating_value_basis, read.combusted)};
}

Outcome<HeatingValue> by_mass(const Composition& analysis, Word basis, Temperature combustion) {
  GasReading read(analysis);
  if (read.basis(basis, 2).combustion(combustion, 3).failed()) return read.failure();
  return HeatingValue{
      gaseous::mass_heating_value(read.gas, read.heating_value_basis, read.combusted)};
}

using ByVolume = Outcome<double> (*)(const gaseous::Mixture&, fuel::Basis, gaseous::Combustion,
                                     const gaseous::Metering&);
using Metered = Outcome<double> (*)(const gaseous::Mixture&, const gaseous::Metering&);

template <ByVolume Property>
Outcome<VolumeHeatingValue> by_volume(const Composition& analysis, Word basis,
                                      Temperature combustion, Temperature metering,
                                      Pressure pressure) {
  GasReading read(analysis);
  read.basis(basis, 2).combustion(combustion, 3).metering(metering, pressure, 4);
  if (read.failed()) return read.failure();
  return as<VolumeHeatingValue>(
      Property(read.gas, read.heating_value_basis, read.combusted, read.metered));
}

template <class Q, Metered Property>
Outcome<Q> metered(const Composition& analysis, Temperature metering, Pressure pressure) {
  GasReading read(analysis);
  if (read.metering(metering, pressure, 2).failed()) return read.failure();
  return as<Q>(Property(read.gas, read.metered));
}

Outcome<VolumeHeatingValue> gpa_2145(const Composition& analysis) {
  const GasReading read(analysis);
  if (read.failed()) return read.failure();
  return as<VolumeHeatingValue>(gaseous::gpa_heating_value(read.gas));
}

// --- Explanations ----------------------------------------------------------------------------

void append_lower(const GasReading& read, UnitSet units, std::string& text) {
  if (read.heating_value_basis == fuel::Basis::higher) return;
  text += " Lower value = higher value less ";
  append_number(text, gaseous::hydrogen_atoms(read.gas) / 2, 6);
  text += " mol of water for a mol of gas, at ";
  append_measure(
      text, {gaseous::kVaporization[read.combusted.column], Quantity::molar_heating_value}, units);
  text += " each.";
}

void append_compression(const GasReading& read, UnitSet units, std::string& text) {
  const Outcome<double> z = gaseous::compression_factor(read.gas, read.metered);
  if (!z) return;
  text += " Real gas: compression factor ";
  append_number(text, *z, 8);
  text += " at ";
  append_measure(text, {read.metered.temperature, Quantity::temperature}, units);
  text += " and ";
  append_measure(text, {read.metered.pressure, Quantity::pressure}, units);
  text += '.';
}

void append_molar_mass(const GasReading& read, UnitSet units, std::string& text) {
  text += " Molar mass ";
  append_measure(text, {gaseous::molar_mass(read.gas), Quantity::molar_mass}, units);
  text += '.';
}

void explain_ideal(const Slot* in, const Result&, UnitSet units, std::string& text) {
  GasReading read(Typed<Composition>::take(in[0]));
  read.basis(in[1].word(), 2).combustion({in[2].si}, 3);
  append_molar_mass(read, units, text);
  append_lower(read, units, text);
  text += " By mole and by mass the standard takes the ideal gas for the real one.";
}

void explain_by_volume(const Slot* in, const Result&, UnitSet units, std::string& text) {
  GasReading read(Typed<Composition>::take(in[0]));
  read.basis(in[1].word(), 2).combustion({in[2].si}, 3).metering({in[3].si}, {in[4].si}, 4);
  append_compression(read, units, text);
  append_lower(read, units, text);
}

void explain_metered(const Slot* in, const Result&, UnitSet units, std::string& text) {
  GasReading read(Typed<Composition>::take(in[0]));
  read.metering({in[1].si}, {in[2].si}, 2);
  append_molar_mass(read, units, text);
  append_compression(read, units, text);
}

// ISO 6976 for the ideal gas at the conditions of GPA 2145.
void explain_gpa(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  GasReading read(Typed<Composition>::take(in[0]));
  constexpr double kSixtyFahrenheit = (60 + 459.67) * 5 / 9;
  constexpr double kPressure = 14.696 * 0.45359237 * 9.80665 / (0.0254 * 0.0254);
  read.combustion({kSixtyFahrenheit}, 2);
  const double volume = gaseous::kGasConstant.value * kSixtyFahrenheit / kPressure;
  const double iso =
      gaseous::molar_heating_value(read.gas, fuel::Basis::higher, read.combusted) / volume;
  text += " ISO 6976:2016 gives ";
  append_measure(text, {iso, Quantity::volume_heating_value}, units);
  text += " for the ideal gas at the same conditions";
  if (iso > 0) {
    text += "; GPA 2145 stands ";
    append_number(text, (result.si / iso - 1) * 100, 3);
    text += " % from it";
  }
  text += '.';
}

// --- Rows ------------------------------------------------------------------------------------

constexpr Argument kGas[] = {kAnalysis};
constexpr Argument kIdeal[] = {kAnalysis, kHeatingValueBasis, kCombustionTemperature};
constexpr Argument kByVolume[] = {kAnalysis, kHeatingValueBasis, kCombustionTemperature,
                                  kMeteringTemperature, kMeteringPressure};
constexpr Argument kMetered[] = {kAnalysis, kMeteringTemperature, kMeteringPressure};

constexpr const char* kIdealNote =
    "Of the ideal gas, which the standard takes for the real one; the volume's conditions do not "
    "enter. LHV = HHV less the enthalpy of vaporization of the water formed; water in the gas "
    "counts on HHV. Amounts must sum to 1; NORMALISED_COMPOSITION divides by the sum.";
constexpr const char* kRealNote =
    "Of the real gas at the metering conditions. A \"normal\" or \"standard\" volume means nothing "
    "before its temperature and pressure are known, so both are asked for. The compression factor "
    "must be above 0.9.";

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const char* place, const Example& example) {
  return {name,    kGaseousFuels, summary, notes, result, {kIso6976, kIso6976Edition, place},
          example, kFirst};
}

constexpr const char* kGiven =
    "B2=\"mole: CH4 0.933212, C2H6 0.025656, C3H8 0.015368, N2 0.01035, CO2 0.015414\"";

constexpr Row kRows[] = {
    row<by_mass>(words("FUEL_GAS_HEATING_VALUE_BY_MASS",
                       "Heating value of a fuel gas by mass, from its analysis", kIdealNote,
                       "Heating value by mass: MJ/kg, Btu/lb or J/kg",
                       "calculation on the mass basis; table 3",
                       {"FUEL_GAS_HEATING_VALUE_BY_MASS(B2; \"HHV\"; 15)", "52.113961", kGiven}),
                 kIdeal, explain_ideal),
    row<by_volume<gaseous::volume_heating_value>>(
        words("FUEL_GAS_HEATING_VALUE_BY_VOLUME",
              "Heating value of a fuel gas by volume at stated conditions, from its analysis",
              kRealNote, "Heating value by volume: MJ/m³, Btu/ft³ or J/m³",
              "calculation on the volume basis, real gas; tables 2 and 3",
              {"FUEL_GAS_HEATING_VALUE_BY_VOLUME(B2; \"HHV\"; 15; 15; 1.01325)", "38.410611",
               kGiven}),
        kByVolume, explain_by_volume),
    row<by_mole>(words("FUEL_GAS_HEATING_VALUE_BY_MOLE",
                       "Molar heating value of a fuel gas, from its analysis", kIdealNote,
                       "Molar heating value: kJ/mol, Btu/lbmol or J/mol",
                       "calculation on the molar basis; table 3",
                       {"FUEL_GAS_HEATING_VALUE_BY_MOLE(B2; \"HHV\"; 15)", "906.179959", kGiven}),
                 kIdeal, explain_ideal),
    row<by_volume<gaseous::wobbe_index>>(
        words("FUEL_GAS_WOBBE_INDEX",
              "Wobbe index of a fuel gas at stated conditions, from its analysis",
              "Heating value by volume over the square root of the relative density, both of the "
              "real gas. Gases of one Wobbe index give a burner the same heat at the same pressure "
              "drop. For appraisal only, never to set a burner.",
              "Wobbe index: MJ/m³, Btu/ft³ or J/m³",
              "associated properties, real gas; tables 2 and 3",
              {"FUEL_GAS_WOBBE_INDEX(B2; \"HHV\"; 15; 15; 1.01325)", "49.5293629", kGiven}),
        kByVolume, explain_by_volume),
    row<metered<Number, gaseous::relative_density>>(
        words("FUEL_GAS_RELATIVE_DENSITY",
              "Density of a fuel gas over that of dry air at the same conditions", kRealNote,
              "A ratio", "associated properties, real gas; table 2; air of annex A",
              {"FUEL_GAS_RELATIVE_DENSITY(B2; 15; 1.01325)", "0.601418735", kGiven}),
        kMetered, explain_metered),
    row<metered<Density, gaseous::density>>(
        words("FUEL_GAS_DENSITY", "Density of a fuel gas at metering conditions, from its analysis",
              kRealNote, "Density", "associated properties, real gas; table 2",
              {"FUEL_GAS_DENSITY(B2; 15; 1.01325)", "0.737050318", kGiven}),
        kMetered, explain_metered),
    row<metered<Number, gaseous::compression_factor>>(
        words("FUEL_GAS_COMPRESSION_FACTOR",
              "Compression factor Z of a fuel gas at metering conditions",
              "Z = 1 - (p/p0) s², s the sum of fraction times summation factor, p0 = 101.325 kPa. "
              "Holds near atmospheric pressure only: no pipeline compressibility.",
              "A ratio", "compression factor; table 2",
              {"FUEL_GAS_COMPRESSION_FACTOR(B2; 15; 1.01325)", "0.99776224", kGiven}),
        kMetered, explain_metered),
    row<molar_mass>(
        words("FUEL_GAS_MOLAR_MASS", "Molar mass of a fuel gas, from its analysis",
              "From the atomic masses of the standard.", "Molar mass: kg/kmol, lb/lbmol or kg/mol",
              "table 1 and annex A", {"FUEL_GAS_MOLAR_MASS(B2)", "17.38843", kGiven}),
        kGas),
    row<gpa_2145>(
        {"GPA_2145_HEATING_VALUE",
         kGaseousFuels,
         "HHV by volume of an ideal natural gas at 60 °F and 14.696 psia by GPA 2145",
         "A second opinion beside ISO 6976; WHY gives the difference. Of the ideal gas: not to be "
         "set beside a real-gas value. Methane to n-decane and gases that do not burn.",
         "Heating value by volume: MJ/m³, Btu/ft³ or J/m³",
         {"GPA 2145, Table of Physical Properties for Hydrocarbons and Other Compounds of Interest "
          "to the Natural Gas Industry",
          "edition not stated in the public transcription used",
          "ideal gross heating value at 60 °F and 14.696 psia"},
         {"GPA_2145_HEATING_VALUE(\"mole: CH4 0.9, C2H6 0.1\"; \"us\")", "1085.97"},
         kFirst},
        kGas, explain_gpa),
};

}  // namespace

std::span<const Row> gaseous_fuels() { return kRows; }

}  // namespace busbar::functions
