// Flame temperatures and equilibrium gases.
#include <array>

#include "catalogue/sentence.hpp"
#include "combustion/flame.hpp"
#include "core/text.hpp"
#include "functions/combustion_arguments.hpp"
#include "functions/functions.hpp"

namespace busbar::functions {
namespace {

using combustion::Equilibrium;
using combustion::Feed;
using gas::Mixture;
using gas::Species;

// Shares below this are not told: fits and constants do not bear them.
constexpr double kLeastTold = 1e-15;

Feed feed_of(Number air_ratio, Temperature fuel, Temperature air) {
  return {air_ratio.si, fuel.si, air.si};
}

Outcome<Temperature> flame_temperature(const Composition& fuel, const Mixture& air,
                                       Number air_ratio, Temperature of_fuel, Temperature of_air,
                                       Pressure p, Word products) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  const Feed feed = feed_of(air_ratio, of_fuel, of_air);
  if (equal_ignoring_case(trimmed(products), "complete")) {
    const Outcome<double> t = combustion::complete_flame_temperature(fired->fuel, fired->air, feed);
    if (!t) return t.failure();
    return Temperature{*t};
  }
  if (!equal_ignoring_case(trimmed(products), "equilibrium")) {
    return Failure{Fault::unknown_word, 7,
                   "names no products: write \"equilibrium\", or \"complete\" for combustion "
                   "without dissociation"};
  }
  const Outcome<Equilibrium> flame =
      combustion::equilibrium_flame(fired->fuel, fired->air, feed, p.si);
  if (!flame) return flame.failure();
  return Temperature{flame->temperature};
}

// Failures of the solver count elements and temperature as 1 and 2; in the rows the fuel is 1 and
// the temperature 4.
Outcome<Equilibrium> at_temperature(const Composition& fuel, const Mixture& air, Number air_ratio,
                                    Temperature t, Pressure p) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  const Outcome<Equilibrium> found = combustion::equilibrium_at(
      combustion::elements_of(fired->fuel, fired->air, air_ratio.si), t.si, p.si);
  if (!found) {
    const Failure& failure = found.failure();
    return failure.about(failure.argument == 2 ? 4 : failure.argument);
  }
  return found;
}

Grid table_of(const Equilibrium& found) {
  const double wet = found.moles();
  const double dry = wet - found.of(Species::H2O);
  std::size_t told = 0;
  for (const double amount : found.amount) told += amount > kLeastTold * wet ? 1 : 0;
  constexpr std::array kHeadings{"species", "mole fraction wet", "mole fraction dry", "kg/kg fuel"};
  Grid table(told + 2, kHeadings.size());
  for (std::size_t c = 0; c < kHeadings.size(); ++c) table.at(0, c) = std::string(kHeadings[c]);
  std::size_t r = 1;
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    const double amount = found.amount[i];
    if (!(amount > kLeastTold * wet)) continue;
    const auto species = static_cast<Species>(i);
    table.at(r, 0) = std::string(gas::name_of(species));
    table.at(r, 1) = amount / wet;
    table.at(r, 2) = species == Species::H2O ? 0 : amount / dry;
    table.at(r, 3) = amount * gas::molar_mass(species);
    ++r;
  }
  table.at(r, 0) = std::string(gas::name_of(gas::Condensed::graphite));
  table.at(r, 1) = std::string();
  table.at(r, 2) = std::string();
  table.at(r, 3) = found.graphite * gas::molar_mass(gas::Condensed::graphite);
  return table;
}

Outcome<Grid> equilibrium_table(const Composition& fuel, const Mixture& air, Number air_ratio,
                                Temperature t, Pressure p) {
  const Outcome<Equilibrium> found = at_temperature(fuel, air, air_ratio, t, p);
  if (!found) return found.failure();
  return table_of(*found);
}

Outcome<Grid> equilibrium_flame_table(const Composition& fuel, const Mixture& air, Number air_ratio,
                                      Temperature of_fuel, Temperature of_air, Pressure p) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  const Outcome<Equilibrium> flame = combustion::equilibrium_flame(
      fired->fuel, fired->air, feed_of(air_ratio, of_fuel, of_air), p.si);
  if (!flame) return flame.failure();
  return table_of(*flame);
}

Outcome<Fraction> equilibrium_fraction(const Composition& fuel, const Mixture& air,
                                       Number air_ratio, Temperature t, Pressure p, Word name,
                                       Word state) {
  const auto species = gas::species_named(trimmed(name));
  if (!species) {
    return Failure{Fault::unknown_word, 6,
                   "is no gas that Busbar knows; SPECIES_TABLE(\"gas\") lists them"};
  }
  const Outcome<bool> wet = is_wet(state, 7);
  if (!wet) return wet.failure();
  if (!*wet && *species == Species::H2O) {
    return Failure{Fault::impossible, 6, "is not in a dry gas"};
  }
  const Outcome<Equilibrium> found = at_temperature(fuel, air, air_ratio, t, p);
  if (!found) return found.failure();
  const double whole = found->moles() - (*wet ? 0 : found->of(Species::H2O));
  return Fraction{found->of(*species) / whole};
}

void append_gas(std::string& text, const Equilibrium& found) {
  const double dry = found.moles() - found.of(Species::H2O);
  constexpr int kDigits = 3;
  text += " The dry gas holds, by volume, O2 ";
  append_number(text, found.of(Species::O2) / dry, kDigits);
  text += ", CO ";
  append_number(text, found.of(Species::CO) / dry, kDigits);
  text += ", NO ";
  append_number(text, found.of(Species::NO) / dry, kDigits);
  text += " at equilibrium.";
  if (found.graphite > 0) {
    text +=
        " Solid carbon (graphite) is part of it; real flames leave soot and gas off "
        "equilibrium there.";
  }
}

void explain_flame(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  explain_firing(in, result, units, text);
  const auto fired = firing(in[0].composition().composition, in[1].composition().mixture);
  if (!fired || equal_ignoring_case(trimmed(in[6].word()), "complete")) return;
  const auto flame = combustion::equilibrium_flame(fired->fuel, fired->air,
                                                   {in[2].si, in[3].si, in[4].si}, in[5].si);
  if (flame) append_gas(text, *flame);
}

void explain_equilibrium(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  explain_firing(in, result, units, text);
  const auto found = at_temperature(in[0].composition().composition, in[1].composition().mixture,
                                    {in[2].si}, {in[3].si}, {in[4].si});
  if (found) append_gas(text, *found);
}

constexpr const char* kChapter = "Flames";

constexpr Argument kFuelTemperature{
    "fuel temperature", "Of the fuel before the flame; 25 °C for an analysis", 200, 1500};
constexpr Argument kAirTemperature{"air temperature", "Of the air before the flame", 200, 2500};
constexpr Argument kTemperature{"temperature", "Of the gas in equilibrium",
                                combustion::kLowestEquilibrium, combustion::kHighestEquilibrium,
                                "the range in which the equilibrium is used"};
constexpr Argument kFlame[] = {
    kFuelArgument,
    kAirArgument,
    kAirRatioArgument,
    kFuelTemperature,
    kAirTemperature,
    kGasPressureArgument,
    {"products",
     "\"equilibrium\", or \"complete\" for CO2, H2O, SO2, N2 and O2 without dissociation"}};
constexpr Argument kFlameTable[] = {kFuelArgument,    kAirArgument,    kAirRatioArgument,
                                    kFuelTemperature, kAirTemperature, kGasPressureArgument};
constexpr Argument kState[] = {kFuelArgument, kAirArgument, kAirRatioArgument, kTemperature,
                               kGasPressureArgument};
constexpr Argument kFraction[] = {
    kFuelArgument, kAirArgument,         kAirRatioArgument,
    kTemperature,  kGasPressureArgument, {"species", "Formula or name of one gas, such as NO"},
    kStateArgument};

constexpr Source kEquilibrium{
    "S. Gordon, B. J. McBride, NASA RP-1311, Computer Program for Calculation of Complex Chemical "
    "Equilibrium Compositions and Applications; data of NASA/TP-2002-211556",
    "October 1994; September 2002",
    "part I, equations 2.24 to 2.27: least Gibbs energy by element potentials"};
constexpr const char* kEquilibriumNote =
    "Ideal gases of C, H, O, N and S with their radicals, and graphite. What the gas would be if "
    "it "
    "had time: NO, CO and SO3 of a real plant are far from it once the gas is cold.";

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kChapter, summary, notes, result, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<flame_temperature>(
        words("FLAME_TEMPERATURE", "Adiabatic flame temperature of a fuel in air",
              "At constant pressure and without loss of heat: no part of a real flame that "
              "radiates is so hot. The ash takes no heat. Fuel and air in these ratios can "
              "explode; nothing here sets a safety device.",
              "Temperature", kEquilibrium,
              {"FLAME_TEMPERATURE(\"mole: CH4 1\"; \"dry air, NASA\"; 1; 25; 25; 1.01325; "
               "\"equilibrium\")",
               "1951.09897"}),
        kFlame, explain_flame),
    row<equilibrium_flame_table>(
        words("EQUILIBRIUM_FLAME_TABLE", "Gas of an adiabatic flame in equilibrium, by species",
              "Enter it as an array formula. The last line is solid carbon.", "A table",
              kEquilibrium,
              {"INDEX(EQUILIBRIUM_FLAME_TABLE(\"mole: H2 1\"; \"technical air, 21/79\"; 1; 25; "
               "25; 1.01325); 3; 2)",
               "0.00462784146"}),
        kFlameTable, explain_firing),
    row<equilibrium_table>(
        words("EQUILIBRIUM_TABLE", "Gas of a fuel and air in equilibrium at a temperature",
              kEquilibriumNote, "A table; its last line is solid carbon", kEquilibrium,
              {"INDEX(EQUILIBRIUM_TABLE(\"mole: H2 1\"; \"dry air, NASA\"; 1; 1726.85; 1.01325); "
               "2; 2)",
               "0.644136466"}),
        kState, explain_equilibrium),
    row<equilibrium_fraction>(
        words("EQUILIBRIUM_FRACTION", "Share of one species in a gas in equilibrium",
              kEquilibriumNote, "A fraction by volume", kEquilibrium,
              {"EQUILIBRIUM_FRACTION(\"mole: H2 1\"; \"dry air, NASA\"; 1; 1726.85; 1.01325; "
               "\"NO\"; \"wet\")",
               "0.000483437394"}),
        kFraction, explain_equilibrium),
};

}  // namespace

std::span<const Row> combustion_flames() { return kRows; }

}  // namespace busbar::functions
