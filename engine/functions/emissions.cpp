// Concentrations in flue gas on other references, and emission per fuel energy by F factors.
#include <cmath>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "emission/concentration.hpp"
#include "emission/epa.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

using emission::FFactors;

// --- Oxygen and moisture ---------------------------------------------------------------------

Outcome<Fraction> reference_oxygen(Word plant) {
  const auto reference = emission::reference_oxygen(plant);
  if (!reference) return reference.failure();
  return Fraction{(*reference)->oxygen};
}

void explain_reference(const Slot* in, const Result&, UnitSet, std::string& text) {
  const auto reference = emission::reference_oxygen(in[0].word());
  if (!reference) return;
  text += " Volume of oxygen over volume of dry gas. ";
  text += (*reference)->source;
  text += "; ";
  text += (*reference)->status;
  text += '.';
}

Outcome<Grid> reference_oxygen_table(Word which) {
  std::vector<const emission::ReferenceOxygen*> chosen;
  for (const auto& reference : emission::reference_oxygens()) {
    if (equal_ignoring_case(trimmed(which), "all")) chosen.push_back(&reference);
  }
  if (chosen.empty()) {
    const auto reference = emission::reference_oxygen(which);
    if (!reference) return reference.failure();
    chosen.push_back(*reference);
  }
  constexpr std::size_t kColumns = 4;
  Grid table(chosen.size() + 1, kColumns);
  table.at(0, 0) = std::string("plant");
  table.at(0, 1) = std::string("oxygen, dry");
  table.at(0, 2) = std::string("source");
  table.at(0, 3) = std::string("status");
  for (std::size_t i = 0; i < chosen.size(); ++i) {
    table.at(i + 1, 0) = std::string(chosen[i]->plant);
    table.at(i + 1, 1) = chosen[i]->oxygen;
    table.at(i + 1, 2) = std::string(chosen[i]->source);
    table.at(i + 1, 3) = std::string(chosen[i]->status);
  }
  return table;
}

Outcome<SameUnit> concentration_at_oxygen(SameUnit concentration, Fraction measured,
                                          Fraction reference, Fraction air) {
  const Outcome<double> referred =
      emission::at_oxygen(concentration.si, measured.si, reference.si, air.si);
  if (!referred) return referred.failure();
  return SameUnit{*referred};
}

void explain_oxygen(const Slot* in, const Result&, UnitSet, std::string& text) {
  const double measured = in[1].si;
  const double factor = (in[3].si - in[2].si) / (in[3].si - measured);
  text += " Factor ";
  append_number(text, factor, 6);
  // What a tenth of a percent of oxygen, a good analyser, is worth.
  constexpr double kStep = 0.001;
  text += "; 0.1 % of oxygen more at the analyser is worth ";
  append_number(text, kStep / (in[3].si - measured) * 100, 3);
  text += " % of the result.";
}

Outcome<SameUnit> concentration_dry(SameUnit wet, Fraction water) {
  return SameUnit{wet.si / (1 - water.si)};
}

Outcome<SameUnit> concentration_wet(SameUnit dry, Fraction water) {
  return SameUnit{dry.si * (1 - water.si)};
}

// --- Parts per million, mass, conditions -----------------------------------------------------

constexpr const char* kUnknownGas =
    "is not a gas of this table; write its formula, such as CO, SO2, NH3 or HCl, for nitrogen "
    "oxides the one they are counted as (\"NO2\" by most rules), for organic carbon \"C\"";

Outcome<MassConcentration> mass_concentration_from_ppm(Number ppm, Word gas, Temperature t,
                                                       Pressure p) {
  const auto mass = emission::molar_mass_of(gas);
  if (!mass) return Failure{Fault::unknown_word, 2, kUnknownGas};
  return MassConcentration{ppm.si * 1e-6 * *mass * emission::molar_density(t.si, p.si)};
}

Outcome<Number> ppm_from_mass_concentration(MassConcentration concentration, Word gas,
                                            Temperature t, Pressure p) {
  const auto mass = emission::molar_mass_of(gas);
  if (!mass) return Failure{Fault::unknown_word, 2, kUnknownGas};
  return Number{concentration.si / *mass / emission::molar_density(t.si, p.si) * 1e6};
}

Outcome<SameUnit> mass_concentration_at_conditions(SameUnit concentration, Temperature from_t,
                                                   Pressure from_p, Temperature to_t,
                                                   Pressure to_p) {
  return SameUnit{concentration.si *
                  emission::density_ratio(from_t.si, from_p.si, to_t.si, to_p.si)};
}

// --- F factors -------------------------------------------------------------------------------

Outcome<GasPerEnergy> epa_f_factor(Word fuel, Word kind_word) {
  const auto factors = emission::f_factors_of(fuel);
  if (!factors) return factors.failure();
  const auto kind = emission::f_factor_named(kind_word);
  if (!kind) {
    return Failure{Fault::unknown_word, 2,
                   "is no F factor; write \"Fd\" for dry gas, \"Fw\" for wet gas or \"Fc\" for "
                   "carbon dioxide"};
  }
  const double si = (*factors)->si(*kind);
  if (std::isnan(si)) return Failure{Fault::missing, 1, "has no wet factor in table 19-2"};
  return GasPerEnergy{si};
}

void explain_f_factor(const Slot* in, const Result&, UnitSet, std::string& text) {
  const auto factors = emission::f_factors_of(in[0].word());
  if (!factors) return;
  const bool wet = emission::f_factor_named(in[1].word()) == emission::FFactor::wet;
  text +=
      " Volume at 68 °F (20 °C) and 29.92 inHg (101.325 kPa) per energy on the higher heating "
      "value. ";
  text += (*factors)->from_memory || wet ? "From memory: check before use."
                                         : "Two public copies agree.";
}

Outcome<Grid> epa_f_factors(Word which, UnitSet units) {
  std::vector<const FFactors*> chosen;
  for (const FFactors& row : emission::f_factors()) {
    if (equal_ignoring_case(trimmed(which), "all")) chosen.push_back(&row);
  }
  if (chosen.empty()) {
    const auto factors = emission::f_factors_of(which);
    if (!factors) return factors.failure();
    chosen.push_back(*factors);
  }
  constexpr std::size_t kColumns = 5;
  Grid table(chosen.size() + 1, kColumns);
  const Unit& unit = unit_of(units, Quantity::gas_per_energy);
  table.at(0, 0) = std::string("fuel");
  std::size_t c = 1;
  for (const char* name : {"Fd", "Fw", "Fc"}) {
    std::string heading(name);
    heading += ", ";
    heading += unit.symbol;
    table.at(0, c++) = heading;
  }
  table.at(0, 4) = std::string("status");
  for (std::size_t i = 0; i < chosen.size(); ++i) {
    const std::size_t r = i + 1;
    table.at(r, 0) = std::string(chosen[i]->fuel);
    c = 1;
    for (const auto kind :
         {emission::FFactor::dry, emission::FFactor::wet, emission::FFactor::carbon}) {
      const double si = chosen[i]->si(kind);
      table.at(r, c) = std::string();
      if (!std::isnan(si)) table.at(r, c) = unit.from_si(si);
      ++c;
    }
    table.at(r, 4) =
        std::string(chosen[i]->from_memory ? "from memory: check before use"
                                           : "Fd and Fc: two public copies agree; Fw from memory");
  }
  return table;
}

Outcome<EmissionFactor> emission_by_dry_oxygen(MassConcentration c, GasPerEnergy f,
                                               Fraction oxygen) {
  const Outcome<double> emitted = emission::emission_by_dry_oxygen(c.si, f.si, oxygen.si);
  if (!emitted) return emitted.failure();
  return EmissionFactor{*emitted};
}

Outcome<EmissionFactor> emission_by_wet_oxygen(MassConcentration c, GasPerEnergy f, Fraction oxygen,
                                               Fraction moisture) {
  const Outcome<double> emitted =
      emission::emission_by_wet_oxygen(c.si, f.si, oxygen.si, moisture.si);
  if (!emitted) return emitted.failure();
  return EmissionFactor{*emitted};
}

Outcome<EmissionFactor> emission_by_carbon_dioxide(MassConcentration c, GasPerEnergy f,
                                                   Fraction carbon_dioxide) {
  return EmissionFactor{emission::emission_by_carbon_dioxide(c.si, f.si, carbon_dioxide.si)};
}

// --- Rows ------------------------------------------------------------------------------------

constexpr const char* kChapter = "Emissions";

constexpr double kLeastAir = 0.205;
constexpr double kMostAir = 0.21;
constexpr const char* kAirLimit = "what rules take for the oxygen of air (21, 20.95 or 20.9 %)";
constexpr double kLeastReference = 273.15;
constexpr double kMostReference = 313.15;
constexpr const char* kReferenceLimit =
    "the limit of reference temperatures (0, 15, 20 and 25 °C and 60 °F are in use)";
constexpr const char* kReferencePressureLimit =
    "the limit of reference pressures (1.01325 and 1 bar are in use)";

constexpr Argument kPlant[] = {
    {"plant",
     "Name in the table, such as \"gas turbines\"; a name that is not there is answered "
     "with the nearest"}};
constexpr Argument kWhich[] = {{"plant", "\"all\", or one name of the table"}};
constexpr Argument kConcentration{"concentration", "In any unit, by mass or by volume", 0};
constexpr Argument kAtOxygen[] = {
    kConcentration,
    {"measured oxygen", "In the same gas, dry or wet as the reference is", 0, kMostAir},
    {"reference oxygen", "Oxygen content that the limit refers to, as a fraction", 0, kMostAir},
    {"oxygen of air", "0.21 in Europe, 0.209 in the United States, as the rule says", kLeastAir,
     kMostAir, kAirLimit}};
constexpr Argument kWater{"water", "Share of water vapour in the volume of wet gas", 0, 0.95};
constexpr Argument kDry[] = {kConcentration, kWater};
constexpr Argument kGas{"gas",
                        "Formula: CO, NO, NO2, N2O, SO2, SO3, NH3, H2S, HCl, HF, CH4, C3H8, "
                        "CO2, or C for organic carbon"};
constexpr Argument kReferenceTemperature{
    "reference temperature",
    "Of the cubic metre; \"normal\" or \"standard\" alone is no reference, state 0, 15, 20 or 25 "
    "°C",
    kLeastReference, kMostReference, kReferenceLimit};
constexpr Argument kReferencePressure{"reference pressure",
                                      "Of the cubic metre, absolute, such as 1.01325 bar", 90e3,
                                      110e3, kReferencePressureLimit};
constexpr Argument kFromPpm[] = {{"ppm", "Volume of the gas in a million volumes", 0, 1e6},
                                 kGas,
                                 kReferenceTemperature,
                                 kReferencePressure};
constexpr Argument kFromMass[] = {
    {"concentration", "Mass in a cubic metre at the reference", 0, 1e4},
    kGas,
    kReferenceTemperature,
    kReferencePressure};
constexpr Argument kConditions[] = {
    {"concentration", "Mass by volume at the first conditions, in any unit", 0},
    {"from temperature", "Of the gas whose volume is counted", 200, 2000},
    {"from pressure", "Absolute", kAboveZero, 10e6},
    {"to temperature", "Wanted", 200, 2000},
    {"to pressure", "Wanted, absolute", kAboveZero, 10e6}};
constexpr Argument kFOne[] = {
    {"fuel", "Name in the table, such as \"Gas, natural\""},
    {"factor", "\"Fd\" dry gas, \"Fw\" wet gas or \"Fc\" carbon dioxide, per energy"}};
constexpr Argument kFTable[] = {{"fuel", "\"all\", or one name of the table"}};
constexpr Argument kAt20{"concentration",
                         "Mass by volume at 20 °C and 101.325 kPa, the reference of the F factors",
                         0, 1e4};
constexpr Argument kByDry[] = {{"concentration",
                                "Mass by volume of dry gas at 20 °C and 101.325 kPa, the reference "
                                "of the F factors",
                                0, 1e4},
                               {"Fd", "Dry gas per energy on HHV, see EPA_F_FACTOR", kAboveZero},
                               {"oxygen", "Share in dry gas", 0, kMostAir}};
constexpr Argument kByWet[] = {{"concentration",
                                "Mass by volume of wet gas at 20 °C and 101.325 kPa, the reference "
                                "of the F factors",
                                0, 1e4},
                               {"Fw", "Wet gas per energy on HHV, see EPA_F_FACTOR", kAboveZero},
                               {"oxygen", "Share in wet gas", 0, kMostAir},
                               {"air moisture",
                                "Share of water vapour in the ambient air; Method "
                                "19 takes 0.027 where it is not measured",
                                0, 0.1}};
constexpr Argument kByCarbon[] = {
    kAt20,
    {"Fc", "Carbon dioxide per energy on HHV, see EPA_F_FACTOR", kAboveZero},
    {"carbon dioxide", "Share in the gas, dry or wet as the concentration is", kAboveZero, 0.25}};

constexpr Source kReferences{"13. BImSchV (2021); Directive 2010/75/EU; Directive (EU) 2015/2193",
                             "", "each row with its place in the table; some from memory"};
constexpr Source kOxygen{"Directive 2010/75/EU, annex V and VI; 40 CFR part 60, appendix A-7",
                         "2010; Method 19",
                         "E = E_measured (air - O2 reference)/(air - O2 measured)"};
constexpr Source kIdentity{"Identity", "", "dry = wet/(1 - water)"};
constexpr Source kIdealGas{"Ideal gas; molar masses of ISO 6976:2016",
                           "table A.2; chlorine and fluorine from memory",
                           "c = x M p/(R T), R of the SI 2019"};
constexpr Source kGasLaw{"Ideal gas", "", "c2 = c1 (T1/T2)(p2/p1)"};
constexpr Source kMethod19{"40 CFR part 60, appendix A-7, Method 19; 40 CFR part 75, appendix F",
                           "", "table 19-2; all from memory but Fd and Fc of the gases"};
constexpr Source kEquation1{"40 CFR part 60, appendix A-7, Method 19", "from memory",
                            "equation 19-1: E = C Fd 20.9/(20.9 - O2)"};
constexpr Source kEquation2{"40 CFR part 60, appendix A-7, Method 19", "from memory",
                            "equation 19-2: E = C Fw 20.9/(20.9 (1 - Bwa) - O2)"};
constexpr Source kEquation6{"40 CFR part 60, appendix A-7, Method 19", "from memory",
                            "equation 19-6: E = C Fc 100/CO2"};

constexpr const char* kHigher = "Emission per fuel energy (HHV)";

constexpr Row kRows[] = {
    row<reference_oxygen_table>({"REFERENCE_OXYGEN_TABLE",
                                 kChapter,
                                 "Table of oxygen contents that emission limits refer to",
                                 "",
                                 "A table with a heading row: plant, oxygen, source, status",
                                 kReferences,
                                 {"INDEX(REFERENCE_OXYGEN_TABLE(\"gas turbines\"); 2; 2)", "0.15"},
                                 kFirst},
                                kWhich),
    row<reference_oxygen>({"REFERENCE_OXYGEN",
                           kChapter,
                           "Oxygen content that the emission limits of a plant refer to",
                           "For a first comparison; the permit of the plant decides.",
                           "A fraction of dry gas",
                           kReferences,
                           {"REFERENCE_OXYGEN(\"gas turbines\")", "0.15"},
                           kFirst},
                          kPlant, explain_reference),
    row<concentration_at_oxygen>(
        {"CONCENTRATION_AT_OXYGEN",
         kChapter,
         "A concentration at the reference oxygen content",
         "Oxygen and concentration in the same gas, dry as limits mostly are. Not for combustion "
         "with enriched air. Some rules refer a measured value only where the measured oxygen is "
         "above the reference.",
         "Concentration, in the unit given",
         kOxygen,
         {"CONCENTRATION_AT_OXYGEN(100; 0.04; 0.03; 0.21)", "105.882353"},
         kFirst},
        kAtOxygen, explain_oxygen),
    row<concentration_dry>({"CONCENTRATION_DRY",
                            kChapter,
                            "A concentration in dry gas from one in wet gas",
                            "",
                            "Concentration, in the unit given",
                            kIdentity,
                            {"CONCENTRATION_DRY(90; 0.1)", "100"},
                            kFirst},
                           kDry),
    row<concentration_wet>({"CONCENTRATION_WET",
                            kChapter,
                            "A concentration in wet gas from one in dry gas",
                            "",
                            "Concentration, in the unit given",
                            kIdentity,
                            {"CONCENTRATION_WET(100; 0.1)", "90"},
                            kFirst},
                           kDry),
    row<mass_concentration_from_ppm>(
        {"MASS_CONCENTRATION_FROM_PPM",
         kChapter,
         "Mass by volume from parts per million, at a stated reference",
         "Reference temperature and pressure have no default: 1 ppm of NO2 is 2.05 mg/m³ at 0 °C "
         "and 1.88 at 25 °C.",
         "Mass by volume of gas at the reference",
         kIdealGas,
         {"MASS_CONCENTRATION_FROM_PPM(25; \"NO2\"; 0; 1.01325)", "51.3134"},
         kFirst},
        kFromPpm),
    row<ppm_from_mass_concentration>(
        {"PPM_FROM_MASS_CONCENTRATION",
         kChapter,
         "Parts per million from mass by volume at a stated reference",
         "",
         "Volume of the gas in a million volumes",
         kIdealGas,
         {"PPM_FROM_MASS_CONCENTRATION(50; \"CO\"; 0; 1.01325)", "40.0105"},
         kFirst},
        kFromMass),
    row<mass_concentration_at_conditions>(
        {"MASS_CONCENTRATION_AT_CONDITIONS",
         kChapter,
         "Mass by volume at another temperature and pressure",
         "Oxygen and moisture stay as they are.",
         "Concentration, in the unit given",
         kGasLaw,
         {"MASS_CONCENTRATION_AT_CONDITIONS(50; 150; 1; 0; 1.01325)", "78.4838"},
         kFirst},
        kConditions),
    row<epa_f_factors>({"EPA_F_FACTORS",
                        kChapter,
                        "Table of the F factors: gas volume per fuel energy",
                        "At 20 °C and 101.325 kPa, on the higher heating value.",
                        "A table with a heading row: fuel, Fd, Fw, Fc, status",
                        kMethod19,
                        {"INDEX(EPA_F_FACTORS(\"Gas, natural\"; \"us\"); 2; 2)", "8710"},
                        kFirst},
                       kFTable),
    row<epa_f_factor>({"EPA_F_FACTOR",
                       kChapter,
                       "F factor of a fuel: gas volume per fuel energy",
                       "At 20 °C and 101.325 kPa, on the higher heating value.",
                       "Volume of gas per fuel energy (HHV)",
                       kMethod19,
                       {"EPA_F_FACTOR(\"Gas, natural\"; \"Fd\")", "233.769"},
                       kFirst},
                      kFOne, explain_f_factor),
    row<emission_by_dry_oxygen>({"EMISSION_BY_DRY_OXYGEN",
                                 kChapter,
                                 "Emission per fuel energy from dry concentration and oxygen",
                                 "",
                                 kHigher,
                                 kEquation1,
                                 {"EMISSION_BY_DRY_OXYGEN(50; 233.77; 0.15)", "0.0414050"},
                                 kFirst},
                                kByDry),
    row<emission_by_wet_oxygen>({"EMISSION_BY_WET_OXYGEN",
                                 kChapter,
                                 "Emission per fuel energy from wet concentration and oxygen",
                                 "",
                                 kHigher,
                                 kEquation2,
                                 {"EMISSION_BY_WET_OXYGEN(45; 284.76; 0.13; 0.027)", "0.0365087"},
                                 kFirst},
                                kByWet),
    row<emission_by_carbon_dioxide>(
        {"EMISSION_BY_CARBON_DIOXIDE",
         kChapter,
         "Emission per fuel energy from concentration and carbon dioxide",
         "",
         kHigher,
         kEquation6,
         {"EMISSION_BY_CARBON_DIOXIDE(200; 48.31; 0.13)", "0.0743231"},
         kFirst},
        kByCarbon),
};

}  // namespace

std::span<const Row> emissions() { return kRows; }

}  // namespace busbar::functions
