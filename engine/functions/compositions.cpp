// Compositions: from one basis to another, normalised on request, and what species there are.
#include "functions/functions.hpp"
#include "functions/gas_arguments.hpp"
#include "gas/mixture.hpp"
#include "gas/species.hpp"

namespace busbar::functions {
namespace {

using gas::Mixture;

Text as_text(const Composition& composition) {
  Text text;
  write_composition(text.value, composition);
  return text;
}

Outcome<Text> normalised_composition(const Composition& given) {
  const Outcome<Composition> whole = normalised(given);
  if (!whole) return whole.failure();
  return as_text(*whole);
}

Outcome<Text> by_mole(const Mixture& mixture) { return as_text(mixture.composition(Basis::mole)); }

Outcome<Text> by_mass(const Mixture& mixture) { return as_text(mixture.composition(Basis::mass)); }

Outcome<Fraction> species_fraction(const Mixture& mixture, Word name, Word basis) {
  const auto species = gas::species_named(name);
  if (!species) {
    return Failure{Fault::unknown_word, 2,
                   "is no gas that Busbar knows; SPECIES_TABLE(\"gas\") lists them"};
  }
  const auto heading = read_heading(basis);
  if (!heading || heading->percent) {
    return Failure{Fault::unknown_word, 3, "is no basis: write \"mole\" or \"mass\""};
  }
  return Fraction{heading->basis == Basis::mole ? mixture.mole_fraction(*species)
                                                : mixture.mass_fraction(*species)};
}

template <class Kind>
Grid table_of(std::size_t count, UnitSet units) {
  Grid table(count + 1, 6);
  const auto heading = [&](std::size_t column, const char* name, Quantity quantity) {
    std::string text = name;
    const Unit& unit = unit_of(units, quantity);
    if (!unit.symbol.empty()) {
      text += " (";
      text += unit.symbol;
      text += ')';
    }
    table.at(0, column) = std::move(text);
  };
  heading(0, "species", Quantity::number);
  heading(1, "other name", Quantity::number);
  heading(2, "molar mass", Quantity::molar_mass);
  heading(3, "heat of formation at 25 °C", Quantity::molar_heating_value);
  heading(4, "from", Quantity::temperature);
  heading(5, "to", Quantity::temperature);
  for (std::size_t i = 0; i < count; ++i) {
    const auto species = static_cast<Kind>(i);
    const auto value = [&](double si, Quantity quantity) {
      return unit_of(units, quantity).from_si(si);
    };
    table.at(i + 1, 0) = std::string(gas::name_of(species));
    table.at(i + 1, 1) = std::string(gas::other_name_of(species));
    table.at(i + 1, 2) = value(gas::molar_mass(species), Quantity::molar_mass);
    table.at(i + 1, 3) = value(gas::formation_enthalpy(species), Quantity::molar_heating_value);
    table.at(i + 1, 4) = value(gas::lowest_temperature(species), Quantity::temperature);
    table.at(i + 1, 5) = value(gas::highest_temperature(species), Quantity::temperature);
  }
  return table;
}

Outcome<Grid> species_table(Word phase, UnitSet units) {
  if (phase == "gas") return table_of<gas::Species>(gas::kSpecies, units);
  if (phase == "condensed") return table_of<gas::Condensed>(gas::kCondensed, units);
  return Failure{Fault::unknown_word, 1, "is no phase: write \"gas\" or \"condensed\""};
}

constexpr const char* kChapter = "Compositions";

constexpr Argument kComposition[] = {kCompositionArgument};
constexpr Argument kAnyComposition[] = {
    {"composition",
     "Two columns with names and amounts under a heading that says \"mole\", \"mole %\", \"mass\" "
     "or \"mass %\"; or a text such as \"mole: N2 0.79, O2 0.21\"; any names, any sum"}};
constexpr Argument kFraction[] = {kCompositionArgument,
                                  {"species", "Formula or name of one gas, such as CO2"},
                                  {"basis", "\"mole\" or \"mass\""}};
constexpr Argument kPhase[] = {{"phase", "\"gas\" or \"condensed\""}};

constexpr Source kArithmetic{"Definition of mole and mass fraction; atomic masses of ISO 6976:2016",
                             "2016", "table A.2"};
constexpr const char* kTextNote =
    "A text of fractions that read back exactly, in the one form that every composition argument "
    "takes.";

constexpr Row kRows[] = {
    row<normalised_composition>(
        {"NORMALISED_COMPOSITION",
         kChapter,
         "Composition divided by its sum",
         "Functions refuse a composition that does not sum to 1 and say by how much; this is the "
         "request to divide. Any names.",
         "A composition text",
         {"Definition", "", "each amount over the sum of all"},
         {"NORMALISED_COMPOSITION(\"mole: N2 3, O2 1\")", "mole: N2 0.75, O2 0.25"},
         kFirst},
        kAnyComposition),
    row<by_mole>({"COMPOSITION_BY_MOLE",
                  kChapter,
                  "Composition of a gas in mole fractions",
                  kTextNote,
                  "A composition text",
                  kArithmetic,
                  {"COMPOSITION_BY_MOLE(\"mass: CH4 1\")", "mole: CH4 1"},
                  kFirst},
                 kComposition),
    row<by_mass>({"COMPOSITION_BY_MASS",
                  kChapter,
                  "Composition of a gas in mass fractions",
                  kTextNote,
                  "A composition text",
                  kArithmetic,
                  {"COMPOSITION_BY_MASS(\"mole: N2 0.79, O2 0.21\")", "mass: N2 0.767"},
                  kFirst},
                 kComposition),
    row<species_fraction>(
        {"SPECIES_FRACTION",
         kChapter,
         "Fraction of one species in a gas, on a stated basis",
         "0 for a species that the composition does not hold.",
         "A fraction",
         kArithmetic,
         {"SPECIES_FRACTION(\"mole: N2 0.79, O2 0.21\"; \"O2\"; \"mass\")", "0.232917511"},
         kFirst},
        kFraction),
    row<species_table>(
        {"SPECIES_TABLE",
         kChapter,
         "Labelled table of all species with molar mass, heat of formation and range",
         "Enter it as an array formula of 6 columns: 57 rows for gases, 10 for liquids and solids.",
         "A table",
         kNasaPolynomials,
         {"INDEX(SPECIES_TABLE(\"gas\"); 5; 4)", "-393.51"},
         kFirst},
        kPhase),
};

}  // namespace

std::span<const Row> compositions() { return kRows; }

}  // namespace busbar::functions
