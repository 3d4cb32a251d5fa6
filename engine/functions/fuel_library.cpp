// Typical fuels by name, and heat from nuclear fuel.
#include <cmath>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "fuel/library/library.hpp"
#include "fuel/nuclear/energy.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

using fuel::library::TypicalFuel;

void append_origin(std::string& text, const TypicalFuel& fuel) {
  text += ' ';
  text += fuel.name;
  text += ", ";
  text += fuel.status;
  text += ": ";
  text += fuel.source;
  text += '.';
}

void explain_fuel(const Slot* in, const Result&, UnitSet, std::string& text) {
  const auto fuel = fuel::library::typical_fuel(in[0].word());
  if (!fuel) return;
  append_origin(text, **fuel);
  if ((*fuel)->of.empty()) return;
  text += " Heating values are per mass of: ";
  text += (*fuel)->of;
  text += '.';
}

Outcome<HeatingValue> stated(Word name, double TypicalFuel::*value, const char* missing) {
  const auto fuel = fuel::library::typical_fuel(name);
  if (!fuel) return fuel.failure();
  const double found = (**fuel).*value;
  if (std::isnan(found)) return Failure{Fault::missing, 1, missing};
  return HeatingValue{found};
}

Outcome<HeatingValue> typical_fuel_lhv(Word name) {
  return stated(name, &TypicalFuel::lhv,
                "has no lower heating value in its source; see FUEL_LIBRARY, and FUEL_LHV_FROM_HHV "
                "where there is an analysis");
}

Outcome<HeatingValue> typical_fuel_hhv(Word name) {
  return stated(name, &TypicalFuel::hhv,
                "has no higher heating value in its source; see FUEL_LIBRARY, and "
                "FUEL_HHV_FROM_LHV where there is an analysis");
}

Outcome<Text> typical_fuel(Word name) {
  const auto fuel = fuel::library::typical_fuel(name);
  if (!fuel) return fuel.failure();
  if ((*fuel)->composition.empty()) {
    return Failure{Fault::missing, 1, "has no composition in its source; see FUEL_LIBRARY"};
  }
  std::string text("[typical: ");
  text += (*fuel)->name;
  text += "] ";
  text += (*fuel)->composition;
  return Text{std::move(text)};
}

std::string heading(std::string_view what, UnitSet units) {
  std::string text(what);
  text += ", ";
  text += unit_of(units, Quantity::heating_value).symbol;
  return text;
}

Outcome<Grid> fuel_library(Word which, UnitSet units) {
  std::vector<const TypicalFuel*> chosen;
  const std::string_view wanted = trimmed(which);
  for (const TypicalFuel& fuel : fuel::library::fuels()) {
    if (equal_ignoring_case(wanted, "all") || equal_ignoring_case(wanted, fuel.kind)) {
      chosen.push_back(&fuel);
    }
  }
  if (chosen.empty()) {
    const auto fuel = fuel::library::typical_fuel(which);
    if (!fuel) return fuel.failure();
    chosen.push_back(*fuel);
  }
  constexpr std::size_t kColumns = 9;
  Grid table(chosen.size() + 1, kColumns);
  const auto put = [&](std::size_t r, std::size_t c, std::string_view text) {
    table.at(r, c) = std::string(text);
  };
  const auto put_value = [&](std::size_t r, std::size_t c, double si) {
    table.at(r, c) = std::string();
    if (std::isnan(si)) return;
    table.at(r, c) = unit_of(units, Quantity::heating_value).from_si(si);
  };
  put(0, 0, "fuel");
  put(0, 1, "kind");
  put(0, 2, "status");
  put(0, 3, heading("LHV", units));
  put(0, 4, heading("HHV", units));
  put(0, 5, "per mass of");
  put(0, 6, "composition");
  put(0, 7, "further figures");
  put(0, 8, "source");
  for (std::size_t i = 0; i < chosen.size(); ++i) {
    const TypicalFuel& fuel = *chosen[i];
    const std::size_t r = i + 1;
    put(r, 0, fuel.name);
    put(r, 1, fuel.kind);
    put(r, 2, fuel.status);
    put_value(r, 3, fuel.lhv);
    put_value(r, 4, fuel.hhv);
    put(r, 5, fuel.of);
    put(r, 6, fuel.composition);
    put(r, 7, fuel.further);
    put(r, 8, fuel.source);
  }
  return table;
}

Outcome<HeatingValue> burn_up_energy(Number burn_up) {
  return HeatingValue{fuel::nuclear::heat_of_burn_up(burn_up.si)};
}

Outcome<HeatingValue> fission_energy(Word nuclide) {
  const auto fission = fuel::nuclear::fission_of(nuclide);
  if (!fission) {
    return Failure{Fault::unknown_word, 1,
                   "is not a nuclide of this table; write \"U-235\", \"U-238\" (bred to plutonium) "
                   "or \"Th-232\" (bred to uranium 233)"};
  }
  return HeatingValue{fuel::nuclear::heat_of_complete_fission(*fission)};
}

constexpr const char* kChapter = "Fuel library";
constexpr const char* kTypicalNote =
    "Typical or of one sample, as the status says; for a first estimate only. No other function "
    "takes a value from here unless it is asked to.";

// Complete fission of uranium 235, see FISSION_ENERGY: more cannot be burnt up.
constexpr double kMostBurnUp = 950;
constexpr const char* kEnergyOnly =
    "Arithmetic of energy for comparing plants; not for criticality, fuel design or licensing, "
    "which belong to licensed practice under the rules of the country.";

constexpr Argument kFuel[] = {
    {"fuel", "Name in the library, with its source in brackets, such as \"diesel (IPCC 2006)\""}};
constexpr Argument kWhich[] = {
    {"fuel", "\"all\", \"gas\", \"liquid\", \"solid\", \"nuclear\", or one name of the library"}};
constexpr Argument kBurnUp[] = {
    {"burn-up", "Heat per mass of heavy metal in MWd/kg, the same as GWd/t", kAboveZero,
     kMostBurnUp, "more than the fission of every atom would give"}};
constexpr Argument kNuclide[] = {{"nuclide", "\"U-235\", \"U-238\" or \"Th-232\""}};

constexpr Source kLibrary{"Published figures of typical fuels", "",
                          "each with its own source in the table FUEL_LIBRARY"};
constexpr Source kDefinition{"Definition, with the megawatt day of 86 400 MJ",
                             "SI Brochure, 9th ed. 2019", "1 MWd = 86.4 GJ"};
constexpr Source kFission{
    "Energy release per fission, ENDF library: U-235 193.4, U-238 198.9, Th-232 191.0 MeV",
    "one transcription", "heat = energy times Avogadro constant over molar mass"};

constexpr Row kRows[] = {
    row<fuel_library>({"FUEL_LIBRARY",
                       kChapter,
                       "Table of typical fuels, each with its source and status",
                       kTypicalNote,
                       "A table with a heading row: fuel, kind, status, LHV, HHV, per mass of, "
                       "composition, further figures, source",
                       kLibrary,
                       {"INDEX(FUEL_LIBRARY(\"diesel (IPCC 2006)\"); 2; 3)", "typical"},
                       kFirst},
                      kWhich),
    row<typical_fuel>({"TYPICAL_FUEL",
                       kChapter,
                       "Composition of a typical fuel, for functions that take one",
                       kTypicalNote,
                       "A text that says \"typical\" and its source and can stand for an analysis",
                       kLibrary,
                       {"TYPICAL_FUEL(\"biogas, 60 % methane\")",
                        "[typical: biogas, 60 % methane] mole %: CH4 60, CO2 40"},
                       kFirst},
                      kFuel, explain_fuel),
    row<typical_fuel_lhv>({"TYPICAL_FUEL_LHV",
                           kChapter,
                           "Lower heating value of a typical fuel",
                           kTypicalNote,
                           "Lower heating value by mass",
                           kLibrary,
                           {"TYPICAL_FUEL_LHV(\"diesel (IPCC 2006)\")", "43"},
                           kFirst},
                          kFuel, explain_fuel),
    row<typical_fuel_hhv>({"TYPICAL_FUEL_HHV",
                           kChapter,
                           "Higher heating value of a typical fuel",
                           kTypicalNote,
                           "Higher heating value by mass",
                           kLibrary,
                           {"TYPICAL_FUEL_HHV(\"hydrogen (NASA)\")", "141.789"},
                           kFirst},
                          kFuel, explain_fuel),
    row<burn_up_energy>({"BURN_UP_ENERGY",
                         kChapter,
                         "Heat per mass of heavy metal at a burn-up",
                         kEnergyOnly,
                         "Heat by mass of uranium or other heavy metal",
                         kDefinition,
                         {"BURN_UP_ENERGY(45)", "3888000"},
                         kFirst},
                        kBurnUp),
    row<fission_energy>({"FISSION_ENERGY",
                         kChapter,
                         "Heat per mass when every atom of a nuclide is split",
                         kEnergyOnly,
                         "Heat by mass of the nuclide",
                         kFission,
                         {"FISSION_ENERGY(\"U-235\")", "79391861.9"},
                         kFirst},
                        kNuclide),
};

}  // namespace

std::span<const Row> fuel_library() { return kRows; }

}  // namespace busbar::functions
