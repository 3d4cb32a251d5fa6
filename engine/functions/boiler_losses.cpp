// Boiler losses that a formula of a standard or an ordinance gives, and dew points of flue gas.
#include <array>
#include <limits>
#include <string>

#include "boiler/radiation.hpp"
#include "boiler/siegert.hpp"
#include "catalogue/sentence.hpp"
#include "combustion/acid_dew_point.hpp"
#include "core/text.hpp"
#include "functions/as.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

using combustion::AcidDewPoint;

// --- Siegert ---------------------------------------------------------------------------------

Outcome<Fraction> siegert_loss(Word fuel, Temperature gas, Temperature air, Fraction oxygen,
                               std::optional<Fraction> moisture) {
  const double water = moisture ? moisture->si : std::numeric_limits<double>::quiet_NaN();
  return as<Fraction>(boiler::siegert_loss(fuel, gas.si, air.si, oxygen.si, water));
}

Outcome<Fraction> siegert_loss_from_co2(Word fuel, Temperature gas, Temperature air,
                                        Fraction carbon_dioxide) {
  return as<Fraction>(
      boiler::siegert_loss_by_carbon_dioxide(fuel, gas.si, air.si, carbon_dioxide.si));
}

Cell printed(double value) { return value > 0 ? Cell(value) : Cell(std::string()); }

Outcome<Grid> siegert_fuels(Word reading) {
  const bool oxygen = equal_ignoring_case(reading, "oxygen");
  if (!oxygen && !equal_ignoring_case(reading, "carbon dioxide")) {
    return Failure{Fault::unknown_word, 1,
                   "is no reading of the formula; write \"oxygen\" or \"carbon dioxide\""};
  }
  const auto has = [oxygen](const boiler::SiegertCoefficients& row) {
    return oxygen ? row.oxygen > 0 : row.carbon_dioxide + row.simple > 0;
  };
  std::size_t count = 0;
  for (const auto& row : boiler::siegert_table()) count += has(row) ? 1 : 0;
  constexpr std::size_t kColumns = 5;
  Grid table(count + 1, kColumns);
  const std::array<const char*, kColumns> headings{"fuel", "water content",
                                                   oxygen ? "A2" : "A1 or f", "B", "source"};
  for (std::size_t c = 0; c < kColumns; ++c) table.at(0, c) = std::string(headings[c]);
  std::size_t r = 1;
  for (const auto& row : boiler::siegert_table()) {
    if (!has(row)) continue;
    table.at(r, 0) = std::string(row.fuel);
    table.at(r, 1) = row.moisture < 0 ? Cell(std::string()) : Cell(row.moisture);
    table.at(r, 2) = printed(oxygen ? row.oxygen : row.carbon_dioxide + row.simple);
    table.at(r, 3) = printed(row.constant);
    table.at(r, 4) = std::string(row.source);
    ++r;
  }
  return table;
}

void explain_siegert(const Slot* in, const Result&, UnitSet, std::string& text) {
  for (const auto& row : boiler::siegert_table()) {
    if (!equal_ignoring_case(row.fuel, in[0].word())) continue;
    text += " The coefficients are those of ";
    text += row.source;
    text += ". The loss is a part of the fuel energy on LHV.";
    return;
  }
}

// --- Casing ----------------------------------------------------------------------------------

Outcome<Power> radiation_and_convection_loss(Word fuel, Power output) {
  const auto known = boiler::radiation_class_named(fuel);
  if (!known) {
    return Failure{Fault::unknown_word, 1,
                   "is no kind of boiler of EN 12952-15; write \"oil and gas\", \"hard coal\" or "
                   "\"lignite and fluidised bed\""};
  }
  return Power{boiler::radiation_loss(*known, output.si)};
}

void explain_radiation(const Slot* in, const Result&, UnitSet, std::string& text) {
  const auto known = boiler::radiation_class_named(in[0].word());
  if (!known) return;
  text += " C = ";
  append_number(text, known->coefficient, 4);
  text += known->from_memory ? " (from memory: check it against the standard)." : ".";
}

// --- Acid dew points -------------------------------------------------------------------------

// Partial pressures from a total pressure and fractions of the wet gas; its failures name the
// fractions (inputs `water_at`, and the one after it), which is where the user can change them.
Outcome<double> dew_point(AcidDewPoint which, double pressure, double water, double acid,
                          std::uint8_t water_at) {
  Outcome<double> outcome = combustion::acid_dew_point(which, pressure * water, pressure * acid);
  if (outcome) return outcome;
  const bool is_water = outcome.failure().argument == 2;
  return outcome.failure().about(is_water ? water_at : static_cast<std::uint8_t>(water_at + 1));
}

Outcome<Temperature> acid_dew_point(Word name, Pressure pressure, Fraction water, Fraction acid) {
  const auto which = combustion::correlation_named(name);
  if (!which) {
    return Failure{Fault::unknown_word, 1,
                   "is no correlation known here; write \"Verhoff-Banchero\", \"Okkes\" or "
                   "\"ZareNezhad\" for sulfuric acid, or \"Kiang HCl\", \"Kiang HNO3\", \"Kiang "
                   "H2SO3\" or \"Kiang HBr\""};
  }
  const Outcome<double> found = dew_point(*which, pressure.si, water.si, acid.si, 3);
  if (!found) return found.failure();
  return Temperature{*found};
}

void explain_acid(const Slot* in, const Result&, UnitSet, std::string& text) {
  const auto which = combustion::correlation_named(in[0].word());
  if (!which) return;
  const combustion::AcidCorrelation& known = combustion::correlation(*which);
  text += " Of ";
  text += known.acid;
  text += ", from ";
  text += known.vapour;
  text += ": ";
  text += known.source;
  text += "; ";
  text += known.standing;
  text += ". Correlations differ by several kelvin from each other.";
}

Outcome<Grid> acid_dew_points(Pressure pressure, Fraction water, Fraction trioxide, UnitSet units) {
  constexpr std::array kSulfuric{AcidDewPoint::verhoff_banchero, AcidDewPoint::okkes,
                                 AcidDewPoint::zarenezhad};
  constexpr std::size_t kColumns = 4;
  Grid table(kSulfuric.size() + 1, kColumns);
  const Unit& unit = unit_of(units, Quantity::temperature);
  std::string heading = "sulfuric acid dew point, ";
  heading += unit.symbol;
  table.at(0, 0) = std::string("correlation");
  table.at(0, 1) = std::move(heading);
  table.at(0, 2) = std::string("source");
  table.at(0, 3) = std::string("standing of the constants");
  for (std::size_t i = 0; i < kSulfuric.size(); ++i) {
    const Outcome<double> found = dew_point(kSulfuric[i], pressure.si, water.si, trioxide.si, 2);
    if (!found) return found.failure();
    const combustion::AcidCorrelation& known = combustion::correlation(kSulfuric[i]);
    table.at(i + 1, 0) = std::string(known.name);
    table.at(i + 1, 1) = unit.from_si(*found);
    table.at(i + 1, 2) = std::string(known.source);
    table.at(i + 1, 3) = std::string(known.standing);
  }
  return table;
}

// --- Rows ------------------------------------------------------------------------------------

constexpr const char* kChapter = "Boiler losses";

constexpr double kMostGas = 1273.15;  // beyond, no exhaust of a boiler
constexpr double kMostAir = 673.15;
constexpr double kMostOxygen = 0.2;

constexpr Argument kFuel{"fuel", "Name as SIEGERT_FUELS lists it"};
constexpr Argument kGas{"flue gas temperature", "Behind the last heating surface", 273.15, kMostGas,
                        "the range of this argument"};
constexpr Argument kAir{"air temperature", "Of the combustion air where it enters the boundary",
                        223.15, kMostAir, "the range of this argument"};

constexpr Argument kByOxygen[] = {
    kFuel,
    kGas,
    kAir,
    {"oxygen", "In the dry flue gas, by volume, as a fraction", 0, kMostOxygen,
     "the limit of this argument: the formula has 21 per cent in air"},
    {"moisture", "Water content of the fuel as fired, for the fuels that are printed with one", 0,
     1}};
constexpr Argument kByCarbonDioxide[] = {
    kFuel,
    kGas,
    kAir,
    {"carbon dioxide", "In the dry flue gas, by volume, as a fraction", kAboveZero, 0.35,
     "more than any fuel gives in air"}};
constexpr Argument kReading[] = {
    {"reading", "\"oxygen\" or \"carbon dioxide\": the gas reading that is at hand"}};
constexpr Argument kRadiation[] = {
    {"boiler", "\"oil and gas\", \"hard coal\" or \"lignite and fluidised bed\""},
    {"useful output", "Greatest useful heat output of the boiler, not that of the test", kAboveZero,
     5e9}};
constexpr Argument kPressure{"pressure", "Absolute pressure of the flue gas", kAboveZero, 1e7};
constexpr Argument kWater{"water vapour", "In the wet flue gas, by volume, as a fraction",
                          kAboveZero, 1};
constexpr Argument kAcidArguments[] = {
    {"correlation",
     "\"Verhoff-Banchero\", \"Okkes\", \"ZareNezhad\" (sulfuric acid), \"Kiang HCl\", "
     "\"Kiang HNO3\", \"Kiang H2SO3\" or \"Kiang HBr\""},
    kPressure,
    kWater,
    {"acid vapour", "SO3, HCl, HNO3, SO2 or HBr in the wet flue gas, by volume, as a fraction",
     kAboveZero, 1}};
constexpr Argument kTrioxideArguments[] = {
    kPressure,
    kWater,
    {"sulfur trioxide", "SO3 in the wet flue gas, by volume, as a fraction", kAboveZero, 1}};

constexpr Source kSiegert{
    "Siegert's formula with the coefficients of the Styrian heating plant ordinance (annexes 1 and "
    "7) and of the German small firing ordinance, 1. BImSchV annex 2 (from memory)",
    "2013; 2010", "loss = (t_gas - t_air) (A2/(21 - O2) + B) or (t_gas - t_air) (A1/CO2 + B)"};
constexpr Source kCasing{"EN 12952-15, Water-tube boilers: acceptance tests", "2003",
                         "clause 8, Q_RC = C Q_N^0.7; C = 0.0113 and 0.0315 from memory"};
constexpr Source kAcid{
    "Verhoff and Banchero, Chem. Eng. Prog. 70 (1974) 71; Okkes, Hydrocarbon Processing 66(7) "
    "(1987) 53; ZareNezhad, Oil & Gas J. 107(36) (2009) 60; Kiang, Chem. Eng. 1981",
    "", "the correlation named"};

constexpr Row kRows[] = {
    row<siegert_loss>(
        {"SIEGERT_LOSS",
         kChapter,
         "Flue gas loss from temperatures and dry oxygen, by Siegert's formula",
         "Sensible heat of the flue gas as a part of the fuel energy on LHV; nothing else. Between "
         "printed water contents the coefficients are interpolated linearly. A survey figure: a "
         "heat balance with the fuel's own analysis is closer.",
         "A fraction of the fuel energy on LHV",
         kSiegert,
         {"SIEGERT_LOSS(\"natural gas\"; 160; 20; 0.03)", "0.0639333"},
         kFirst},
        kByOxygen, explain_siegert),
    row<siegert_loss_from_co2>(
        {"SIEGERT_LOSS_FROM_CO2",
         kChapter,
         "Flue gas loss from temperatures and dry carbon dioxide, by Siegert's formula",
         "As SIEGERT_LOSS. The names ending in \"simple\" have one coefficient and no constant.",
         "A fraction of the fuel energy on LHV",
         kSiegert,
         {"SIEGERT_LOSS_FROM_CO2(\"natural gas\"; 160; 20; 0.1)", "0.0644"},
         kFirst},
        kByCarbonDioxide, explain_siegert),
    row<siegert_fuels>({"SIEGERT_FUELS",
                        kChapter,
                        "Fuels and coefficients of Siegert's formula",
                        "Enter it as an array formula. A blank water content means that the source "
                        "prints none.",
                        "A table",
                        kSiegert,
                        {"INDEX(SIEGERT_FUELS(\"oxygen\"); 2; 3)", "0.6572"},
                        kFirst},
                       kReading),
    row<radiation_and_convection_loss>(
        {"RADIATION_AND_CONVECTION_LOSS",
         kChapter,
         "Heat that a steam boiler's casing loses",
         "The loss hardly depends on the load: at part load the same heat is a greater part. For "
         "other kinds of boilers, and where the casing was measured, use the measurement.",
         "Heat flow",
         kCasing,
         {"RADIATION_AND_CONVECTION_LOSS(\"hard coal\"; 500)", "1.70491"},
         kFirst},
        kRadiation, explain_radiation),
    row<acid_dew_point>(
        {"ACID_DEW_POINT",
         kChapter,
         "Temperature at which an acid begins to condense from flue gas",
         "Metal colder than this corrodes; keep the margin of the boiler maker and of local "
         "practice. The correlations are used from 1 to 1000 mbar of water vapour and from 1e-8 to "
         "0.01 bar of acid vapour.",
         "Temperature",
         kAcid,
         {"ACID_DEW_POINT(\"Verhoff-Banchero\"; 1.01325; 0.1; 0.00001)", "137.326"},
         kFirst},
        kAcidArguments, explain_acid),
    row<acid_dew_points>(
        {"ACID_DEW_POINTS",
         kChapter,
         "Sulfuric acid dew point by three correlations, side by side",
         "Enter it as an array formula. The spread between the rows is what is not known.",
         "A table with the unit in its heading",
         kAcid,
         {"INDEX(ACID_DEW_POINTS(1.01325; 0.1; 0.00001); 3; 2)", "133.254"},
         kFirst},
        kTrioxideArguments),
};

}  // namespace

std::span<const Row> boiler_losses() { return kRows; }

}  // namespace busbar::functions
