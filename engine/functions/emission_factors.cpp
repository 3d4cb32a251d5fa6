// Published default emission factors, for checking figures that somebody states.
#include <cmath>

#include "core/text.hpp"
#include "emission/epa.hpp"
#include "emission/ipcc.hpp"
#include "fuel/basis.hpp"
#include "functions/describe.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"
#include "units/expression.hpp"

namespace busbar::functions {
namespace {

using emission::Bound;
using emission::EpaFuel;
using emission::IpccFuel;

constexpr std::string_view kDefaultsStatus =
    "one transcription; the CO2 factor follows from the carbon content";
constexpr std::string_view kLimitsStatus = "from memory: check before use";

// --- IPCC ------------------------------------------------------------------------------------

struct IpccValue {
  const IpccFuel* fuel = nullptr;
  Bound bound = Bound::central;
};

Outcome<IpccValue> ipcc_value(Word name, Word bound_word) {
  const auto fuel = emission::ipcc_fuel(name);
  if (!fuel) return fuel.failure();
  const auto bound = emission::bound_named(bound_word);
  if (!bound) {
    return Failure{
        Fault::unknown_word, 2,
        "is no value of the tables; write \"default\", or \"lower\" or \"upper\" for the "
        "95 % limits"};
  }
  return IpccValue{*fuel, *bound};
}

Outcome<HeatingValue> ipcc_ncv(Word name, Word bound) {
  const Outcome<IpccValue> value = ipcc_value(name, bound);
  if (!value) return value.failure();
  const double si = value->fuel->net_value_si(value->bound);
  if (std::isnan(si)) {
    return Failure{Fault::missing, 1, "has no net calorific value in table 1.2"};
  }
  return HeatingValue{si};
}

Outcome<EmissionFactor> ipcc_co2_factor(Word name, Word bound) {
  const Outcome<IpccValue> value = ipcc_value(name, bound);
  if (!value) return value.failure();
  return EmissionFactor{value->fuel->co2_si(value->bound)};
}

void explain_ipcc(const Slot* in, const Result&, UnitSet, std::string& text) {
  const auto fuel = emission::ipcc_fuel(in[0].word());
  if (!fuel) return;
  text += " On the net calorific value (LHV). ";
  const bool limit = emission::bound_named(in[1].word()) != Bound::central;
  text += limit ? "This 95 % limit is from memory: check before use."
                : "This default: one transcription; the CO2 factor follows from the carbon content "
                  "times 44/12 within 0.3 %.";
  if ((*fuel)->biogenic) text += " Biogenic: reported apart and not counted in the total.";
}

// The table of those that `take` chooses, or of the one whose name it is.
template <class Fuel, class Find>
Outcome<std::vector<const Fuel*>> chosen(std::span<const Fuel> all, Word which, Find find) {
  std::vector<const Fuel*> out;
  if (equal_ignoring_case(trimmed(which), "all")) {
    for (const Fuel& fuel : all) out.push_back(&fuel);
    return out;
  }
  const auto fuel = find(which);
  if (!fuel) return fuel.failure();
  out.push_back(*fuel);
  return out;
}

void put(Grid& table, std::size_t r, std::size_t c, std::string_view text) {
  table.at(r, c) = std::string(text);
}

void put(Grid& table, std::size_t r, std::size_t c, double si, Quantity quantity, UnitSet units) {
  table.at(r, c) = std::string();
  if (!std::isnan(si)) table.at(r, c) = unit_of(units, quantity).from_si(si);
}

Outcome<Grid> ipcc_factors(Word which, UnitSet units) {
  const auto fuels = chosen(emission::ipcc_fuels(), which, emission::ipcc_fuel);
  if (!fuels) return fuels.failure();
  constexpr std::size_t kColumns = 11;
  Grid table(fuels->size() + 1, kColumns);
  put(table, 0, 0, "fuel");
  put(table, 0, 1, heading("NCV", Quantity::heating_value, units));
  put(table, 0, 2, heading("NCV lower", Quantity::heating_value, units));
  put(table, 0, 3, heading("NCV upper", Quantity::heating_value, units));
  put(table, 0, 4, heading("CO2", Quantity::emission_factor, units));
  put(table, 0, 5, heading("CO2 lower", Quantity::emission_factor, units));
  put(table, 0, 6, heading("CO2 upper", Quantity::emission_factor, units));
  put(table, 0, 7, "basis");
  put(table, 0, 8, "origin");
  put(table, 0, 9, "status of defaults");
  put(table, 0, 10, "status of limits");
  for (std::size_t i = 0; i < fuels->size(); ++i) {
    const IpccFuel& fuel = *(*fuels)[i];
    const std::size_t r = i + 1;
    put(table, r, 0, fuel.name);
    std::size_t c = 1;
    for (const Bound bound : {Bound::central, Bound::lower, Bound::upper}) {
      put(table, r, c, fuel.net_value_si(bound), Quantity::heating_value, units);
      put(table, r, c + 3, fuel.co2_si(bound), Quantity::emission_factor, units);
      ++c;
    }
    put(table, r, 7, "NCV (LHV)");
    put(table, r, 8, fuel.biogenic ? "biogenic" : "fossil");
    put(table, r, 9, kDefaultsStatus);
    put(table, r, 10, kLimitsStatus);
  }
  return table;
}

// --- EPA -------------------------------------------------------------------------------------

Outcome<Number> epa_hhv(Word name, Word unit) {
  const auto fuel = emission::epa_fuel(name);
  if (!fuel) return fuel.failure();
  const Outcome<double> value =
      units::convert((*fuel)->heating_value_si(), emission::si_unit_of((*fuel)->unit), unit);
  if (!value) return value.failure().about(2);
  return Number{*value};
}

Outcome<EmissionFactor> epa_co2_factor(Word name) {
  const auto fuel = emission::epa_fuel(name);
  if (!fuel) return fuel.failure();
  return EmissionFactor{(*fuel)->co2_si()};
}

void explain_epa(const Slot* in, const Result&, UnitSet, std::string& text) {
  const auto fuel = emission::epa_fuel(in[0].word());
  if (!fuel) return;
  text += " On the higher heating value, published in ";
  text += emission::name_of((*fuel)->unit);
  text += ". Status: ";
  text += (*fuel)->status;
  text += ". Origin of the carbon: ";
  text += emission::name_of((*fuel)->origin);
  text += '.';
}

Outcome<Grid> epa_factors(Word which, UnitSet units) {
  const auto fuels = chosen(emission::epa_fuels(), which, emission::epa_fuel);
  if (!fuels) return fuels.failure();
  constexpr std::size_t kColumns = 8;
  Grid table(fuels->size() + 1, kColumns);
  put(table, 0, 0, "fuel");
  put(table, 0, 1, "group");
  put(table, 0, 2, "HHV as published");
  put(table, 0, 3, "unit");
  put(table, 0, 4, heading("CO2", Quantity::emission_factor, units));
  put(table, 0, 5, "basis");
  put(table, 0, 6, "origin");
  put(table, 0, 7, "status");
  for (std::size_t i = 0; i < fuels->size(); ++i) {
    const EpaFuel& fuel = *(*fuels)[i];
    const std::size_t r = i + 1;
    put(table, r, 0, fuel.name);
    put(table, r, 1, fuel.group);
    table.at(r, 2) = fuel.heating_value;
    put(table, r, 3, emission::name_of(fuel.unit));
    put(table, r, 4, fuel.co2_si(), Quantity::emission_factor, units);
    put(table, r, 5, "HHV");
    put(table, r, 6, emission::name_of(fuel.origin));
    put(table, r, 7, fuel.status);
  }
  return table;
}

// --- Bases and carbon ------------------------------------------------------------------------

Outcome<SameUnit> co2_factor_on_basis(SameUnit factor, Word from, Word to, SameUnit higher,
                                      SameUnit lower) {
  static constexpr const char* kUnknown =
      "is not a heating-value basis; write \"HHV\" or \"LHV\" (GCV and NCV are the same)";
  const auto source = fuel::basis_named(from);
  if (!source) return Failure{Fault::unknown_word, 2, kUnknown};
  const auto target = fuel::basis_named(to);
  if (!target) return Failure{Fault::unknown_word, 3, kUnknown};
  const Outcome<double> ratio = fuel::energy_ratio(*source, *target, higher.si, lower.si);
  if (!ratio) return ratio.failure();
  return SameUnit{factor.si / *ratio};
}

Outcome<EmissionFactor> co2_factor_from_carbon(Fraction carbon, HeatingValue value) {
  // Atomic masses of ISO 6976:2016, table A.2.
  constexpr double kCarbonDioxide = 44.0095;
  constexpr double kCarbon = 12.0107;
  return EmissionFactor{carbon.si * kCarbonDioxide / kCarbon / value.si};
}

constexpr const char* kChapter = "Emission factors";
constexpr const char* kCheck =
    "A published default, to check a stated figure against; the fuel's own analysis goes before "
    "it, see CO2_FACTOR_FROM_CARBON.";

constexpr Argument kIpccFuel{"fuel",
                             "Name as published, such as \"Natural Gas\"; a name that is "
                             "not there is answered with the nearest"};
constexpr Argument kIpcc[] = {
    kIpccFuel, {"value", "\"default\", or \"lower\" or \"upper\" for the 95 % limits"}};
constexpr Argument kIpccTable[] = {{"fuel", "\"all\", or one name as published"}};
constexpr Argument kEpaFuel{"fuel",
                            "Name as published, such as \"Bituminous\"; a name that is not "
                            "there is answered with the nearest"};
constexpr Argument kEpaOne[] = {kEpaFuel};
constexpr Argument kEpaValue[] = {
    kEpaFuel,
    {"unit",
     "Wanted unit: energy by mass for solids, by volume for liquids and gases, such as "
     "\"MJ/kg\" or \"MMBtu/gal\""}};
constexpr Argument kEpaTable[] = {{"fuel", "\"all\", or one name as published"}};
constexpr Argument kFactorBasis[] = {
    {"factor", "Emission per fuel energy, in any unit", 0},
    {"from basis", "\"HHV\" or \"LHV\": the basis that the factor is on"},
    {"to basis", "\"HHV\" or \"LHV\": the basis that is wanted"},
    {"higher heating value", "Of the fuel as fired", kAboveZero},
    {"lower heating value", "Of the same fuel, in the same unit", kAboveZero}};
constexpr Argument kCarbonFactor[] = {
    {"carbon", "Share of carbon in the mass of fuel, as a fraction", kAboveZero, 1},
    {"heating value", "Of the same fuel in the same state; the factor is on its basis (HHV or LHV)",
     kAboveZero, 150e6}};

constexpr const char* kGuidelines = "IPCC 2006 Guidelines for National Greenhouse Gas Inventories";
constexpr Source kIpccValues{kGuidelines, "volume 2",
                             "table 1.2, net calorific values; limits from memory"};
constexpr Source kIpccCo2{kGuidelines, "volume 2",
                          "tables 1.4 and 2.2, CO2 on net calorific value; limits from memory"};
constexpr Source kIpccAll{kGuidelines, "volume 2", "tables 1.2, 1.3, 1.4; limits from memory"};
constexpr Source kTableC1{"40 CFR part 98, subpart C, table C-1", "81 FR 89188, 2016",
                          "on the higher heating value; rows from memory say so"};
constexpr Source kBasis{"ISO 1928:2020, gross and net calorific value at constant pressure", "",
                        "fuel energy = mass times heating value, on either basis"};
constexpr Source kCarbonBalance{"Conservation of carbon; atomic masses of ISO 6976:2016",
                                "table A.2", "44.0095/12.0107 kg of CO2 per kg of carbon"};

constexpr Row kRows[] = {
    row<ipcc_factors>({"IPCC_FACTORS",
                       kChapter,
                       "Table of the IPCC default net calorific values and CO2 factors",
                       kCheck,
                       "A table with a heading row: fuel, NCV, its limits, CO2, its limits, basis, "
                       "origin, status of defaults, status of limits",
                       kIpccAll,
                       {"INDEX(IPCC_FACTORS(\"Natural Gas\"); 2; 5)", "56.1"},
                       kFirst},
                      kIpccTable),
    row<ipcc_ncv>({"IPCC_NCV",
                   kChapter,
                   "IPCC default net calorific value of a fuel",
                   kCheck,
                   "Net calorific value (LHV) by mass",
                   kIpccValues,
                   {"IPCC_NCV(\"Natural Gas\"; \"default\")", "48"},
                   kFirst},
                  kIpcc, explain_ipcc),
    row<ipcc_co2_factor>(
        {"IPCC_CO2_FACTOR",
         kChapter,
         "IPCC default CO2 factor of a fuel, on its net calorific value",
         "All carbon counts as burnt. Biogenic fuels carry a factor too: their CO2 "
         "is reported apart. WHY says which are biogenic.",
         "CO2 per fuel energy (LHV)",
         kIpccCo2,
         {"IPCC_CO2_FACTOR(\"Lignite\"; \"default\")", "101"},
         kFirst},
        kIpcc, explain_ipcc),
    row<epa_factors>(
        {"EPA_FACTORS",
         kChapter,
         "Table of the EPA default higher heating values and CO2 factors",
         kCheck,
         "A table with a heading row: fuel, group, HHV as published, unit, CO2, basis, "
         "origin, status",
         kTableC1,
         {"INDEX(EPA_FACTORS(\"Bituminous\"); 2; 3)", "24.93"},
         kFirst},
        kEpaTable),
    row<epa_hhv>({"EPA_HHV",
                  kChapter,
                  "EPA default higher heating value of a fuel",
                  "Gases are at 60 °F and 14.696 psia. Other conditions need the ideal gas law "
                  "beside.",
                  "A number in the unit that is asked for",
                  kTableC1,
                  {"EPA_HHV(\"Bituminous\"; \"MJ/kg\")", "28.9936"},
                  kFirst},
                 kEpaValue, explain_epa),
    row<epa_co2_factor>({"EPA_CO2_FACTOR",
                         kChapter,
                         "EPA default CO2 factor of a fuel, on its higher heating value",
                         "Not comparable with a factor on the lower heating value before "
                         "CO2_FACTOR_ON_BASIS.",
                         "CO2 per fuel energy (HHV)",
                         kTableC1,
                         {"EPA_CO2_FACTOR(\"Bituminous\")", "88.4124"},
                         kFirst},
                        kEpaOne, explain_epa),
    row<co2_factor_on_basis>(
        {"CO2_FACTOR_ON_BASIS",
         kChapter,
         "An emission factor on the other heating-value basis",
         "A factor per energy on HHV is lower than the same one on LHV: 5 % for coal and oil, 10 % "
         "for natural gas.",
         "Emission per fuel energy, in the unit given",
         kBasis,
         {"CO2_FACTOR_ON_BASIS(56.1; \"LHV\"; \"HHV\"; 55.5; 50)", "50.5405405"},
         kFirst},
        kFactorBasis),
    row<co2_factor_from_carbon>(
        {"CO2_FACTOR_FROM_CARBON",
         kChapter,
         "CO2 factor of a fuel from its own carbon and heating value",
         "Complete combustion: unburnt carbon, and CO2 from limestone, are left out. On the basis "
         "(HHV or LHV) of the heating value; both figures for the same state of the fuel.",
         "CO2 per fuel energy",
         kCarbonBalance,
         {"CO2_FACTOR_FROM_CARBON(0.612; 24.5)", "91.5300"},
         kFirst},
        kCarbonFactor),
};

}  // namespace

std::span<const Row> emission_factors() { return kRows; }

}  // namespace busbar::functions
