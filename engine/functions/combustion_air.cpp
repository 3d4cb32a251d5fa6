// How much air a fuel needs, and how much it was given.
#include "combustion/reading.hpp"
#include "functions/as.hpp"
#include "functions/combustion_arguments.hpp"
#include "functions/functions.hpp"

namespace busbar::functions {
namespace {

using gas::Mixture;
using gas::Species;

Outcome<Number> stoichiometric_oxygen(const Composition& analysis) {
  const Outcome<combustion::Fuel> fuel = combustion::fuel_from(analysis);
  if (!fuel) return fuel.failure();
  return Number{combustion::stoichiometric_oxygen(*fuel) * gas::molar_mass(Species::O2)};
}

Outcome<Number> stoichiometric_air(const Composition& fuel, const Mixture& air) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  return Number{combustion::stoichiometric_air(fired->fuel, fired->air)};
}

Outcome<Number> stoichiometric_air_by_mole(const Composition& fuel, const Mixture& air) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  if (fired->fuel.analysed) {
    return Failure{Fault::impossible, 1,
                   "is an analysis, which has no moles; STOICHIOMETRIC_AIR is by mass"};
  }
  return Number{combustion::stoichiometric_moles(fired->fuel, fired->air) / fired->fuel.moles()};
}

Outcome<Number> air_ratio(const Composition& fuel, const Mixture& air, Number air_per_fuel) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  return Number{air_per_fuel.si / combustion::stoichiometric_air(fired->fuel, fired->air)};
}

Outcome<Number> equivalence_ratio(Number air_ratio) { return Number{1 / air_ratio.si}; }

Outcome<Number> air_ratio_from_oxygen(const Composition& fuel, const Mixture& air, Fraction oxygen,
                                      Word state, std::optional<Fraction> monoxide,
                                      std::optional<Fraction> unburnt) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  const Outcome<bool> wet = is_wet(state, 4);
  if (!wet) return wet.failure();
  return as<Number>(combustion::air_ratio_from_oxygen(fired->fuel, fired->air, oxygen.si, *wet,
                                                      {or_none(monoxide), or_none(unburnt)}));
}

Outcome<Number> air_ratio_from_co2(const Composition& fuel, const Mixture& air, Fraction dioxide,
                                   Word state, std::optional<Fraction> unburnt) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  const Outcome<bool> wet = is_wet(state, 4);
  if (!wet) return wet.failure();
  return as<Number>(combustion::air_ratio_from_carbon_dioxide(fired->fuel, fired->air, dioxide.si,
                                                              *wet, or_none(unburnt)));
}

Outcome<Number> air_ratio_from_dry_readings(const Composition& fuel, const Mixture& air,
                                            Fraction dioxide, Fraction monoxide, Fraction oxygen,
                                            std::optional<Fraction> unburnt) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  return as<Number>(combustion::air_ratio_from_dry_readings(
      fired->fuel, fired->air, {dioxide.si, monoxide.si, oxygen.si}, or_none(unburnt)));
}

Outcome<Text> air_with_humidity(const Mixture& dry, Number humidity) {
  const Outcome<Mixture> humid = combustion::with_humidity(dry, humidity.si);
  if (!humid) return humid.failure();
  return as_text(humid->composition(Basis::mole));
}

Outcome<Text> air_with_recirculation(const Composition& fuel, const Mixture& air, Number air_ratio,
                                     Number recirculation) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  const Outcome<Mixture> mixed =
      combustion::with_recirculation(fired->fuel, fired->air, air_ratio.si, recirculation.si);
  if (!mixed) return mixed.failure();
  return as_text(mixed->composition(Basis::mole));
}

constexpr const char* kChapter = "Combustion air";

constexpr Argument kFuelOnly[] = {kFuelArgument};
constexpr Argument kFuelAir[] = {kFuelArgument, kAirArgument};
constexpr Argument kFuelAirMass[] = {
    kFuelArgument,
    kAirArgument,
    {"air per fuel", "Mass of air over mass of fuel", kAboveZero, 1e6}};
constexpr Argument kAirRatioOnly[] = {kAirRatioArgument};
constexpr Argument kByOxygen[] = {
    kFuelArgument,
    kAirArgument,
    {"oxygen", "O2 in the flue gas, by volume, as a fraction", 0, 1},
    kStateArgument,
    {"carbon monoxide", "CO in the same gas, by volume, as a fraction; left out: none", 0, 0.5},
    kUnburntCarbonArgument};
constexpr Argument kByDioxide[] = {
    kFuelArgument,
    kAirArgument,
    {"carbon dioxide", "CO2 in the flue gas, by volume, as a fraction", kAboveZero, 1},
    kStateArgument,
    kUnburntCarbonArgument};
constexpr Argument kByDryReadings[] = {
    kFuelArgument,
    kAirArgument,
    {"carbon dioxide", "CO2, with SO2, in the dry flue gas, by volume, as a fraction", kAboveZero,
     1},
    {"carbon monoxide", "CO in the dry flue gas, by volume, as a fraction", 0, 1},
    {"oxygen", "O2 in the dry flue gas, by volume, as a fraction", 0, 1},
    kUnburntCarbonArgument};
constexpr Argument kHumidity[] = {
    {"dry air", "A published mixture such as \"dry air, ISO 2533\", or another gas without water"},
    {"humidity ratio", "Mass of water over mass of dry air", 0, 10}};
constexpr Argument kRecirculation[] = {
    kFuelArgument,
    kAirArgument,
    {"air ratio", "Of the fresh air; 1 or more", kLeastAirRatio, kMostAirRatio},
    {"recirculation", "Mass of flue gas drawn back over mass of flue gas to the stack", 0, 100}};

constexpr const char* kNeedNote =
    "Carbon burns to CO2, hydrogen to water, sulfur to SO2; nitrogen stays N2. Oxygen of the fuel "
    "is used first.";
constexpr Source kNagReadings{"P. K. Nag, Power Plant Engineering", "3rd ed. 2008",
                              "section 4.3, balances of carbon and nitrogen"};

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kChapter, summary, notes, result, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<stoichiometric_oxygen>(
        words("STOICHIOMETRIC_OXYGEN", "Oxygen that a fuel takes to burn completely", kNeedNote,
              "Mass of oxygen over mass of fuel", kElementBalance,
              {"STOICHIOMETRIC_OXYGEN(\"mole: CH4 1\")", "3.98926349"}),
        kFuelOnly, explain_combustion_fuel),
    row<stoichiometric_air>(
        words("STOICHIOMETRIC_AIR", "Air that a fuel takes to burn completely", kNeedNote,
              "Mass of air, with its water where it is humid, over mass of fuel", kElementBalance,
              {"STOICHIOMETRIC_AIR(\"mole: CH4 1\"; \"dry air, NASA\")", "17.2385221"}),
        kFuelAir, explain_firing),
    row<stoichiometric_air_by_mole>(
        words("STOICHIOMETRIC_AIR_BY_MOLE", "Air that a gaseous fuel takes, by mole", kNeedNote,
              "Moles of air over moles of fuel; for ideal gases the ratio of volumes",
              kElementBalance,
              {"STOICHIOMETRIC_AIR_BY_MOLE(\"mole: CH4 1\"; \"technical air, 21/79\")",
               "9.52380952"}),
        kFuelAir, explain_firing),
    row<air_ratio>(words("AIR_RATIO", "Air ratio from the masses of air and fuel",
                         "1.2 is 20 % excess air. EQUIVALENCE_RATIO is the reciprocal.",
                         "Air given over air needed", kElementBalance,
                         {"AIR_RATIO(\"mole: CH4 1\"; \"dry air, NASA\"; 20)", "1.16019227"}),
                   kFuelAirMass, explain_firing),
    row<equivalence_ratio>(
        words("EQUIVALENCE_RATIO", "Equivalence ratio from an air ratio, or the other way round",
              "Above 1 the mixture is rich in fuel; an air ratio above 1 is lean.",
              "Fuel-air ratio over the stoichiometric one", kElementBalance,
              {"EQUIVALENCE_RATIO(1.25)", "0.8"}),
        kAirRatioOnly),
    row<air_ratio_from_oxygen>(
        words("AIR_RATIO_FROM_OXYGEN", "Air ratio from oxygen in the dry or wet flue gas",
              "The exact balance for this fuel and this air, in place of 21/(21 - O2). An analyser "
              "behind a cooler reads dry; one in the hot gas reads wet.",
              "Air given over air needed", kElementBalance,
              {"AIR_RATIO_FROM_OXYGEN(\"mole: CH4 1\"; \"dry air, ISO 2533\"; 0.03; \"dry\")",
               "1.14964832"}),
        kByOxygen, explain_firing),
    row<air_ratio_from_co2>(
        words("AIR_RATIO_FROM_CO2", "Air ratio from carbon dioxide in the dry or wet flue gas",
              "For complete combustion at an air ratio of 1 or more: below it the same CO2 comes "
              "twice. For an absorbent that takes SO2 too, see AIR_RATIO_FROM_DRY_READINGS.",
              "Air given over air needed", kElementBalance,
              {"AIR_RATIO_FROM_CO2(\"mole: CH4 1\"; \"dry air, ISO 2533\"; 0.1; \"dry\")",
               "1.15575611"}),
        kByDioxide, explain_firing),
    row<air_ratio_from_dry_readings>(
        words("AIR_RATIO_FROM_DRY_READINGS", "Air ratio from CO2, CO and O2 in the dry flue gas",
              "Nitrogen is the rest. Carbon in the gas tells how much gas there is, nitrogen how "
              "much air. Beside AIR_RATIO_FROM_OXYGEN it shows whether the readings agree.",
              "Air given over air needed", kNagReadings,
              {"AIR_RATIO_FROM_DRY_READINGS(\"mole: CH4 1\"; \"dry air, ISO 2533\"; 0.1; 0; 0.03)",
               "1.15714816"}),
        kByDryReadings, explain_firing),
    row<air_with_humidity>(
        words("AIR_WITH_HUMIDITY", "Composition of air with water vapour in it",
              "To be used as the air of a combustion.", "A composition text by mole",
              {"Definition", "", "humidity ratio: mass of water over mass of dry air"},
              {"AIR_WITH_HUMIDITY(\"technical air, 21/79\"; 0.01)", "mole: N2 0.77754805"}),
        kHumidity),
    row<air_with_recirculation>(
        words("AIR_WITH_RECIRCULATION", "Composition of air with recirculated flue gas in it",
              "The flue gas is drawn back wet. Taken as the air of a flame, its air ratio is L + R "
              "(L - 1), with the air ratio L of the fresh air and the recirculation R.",
              "A composition text by mole", kElementBalance,
              {"AIR_WITH_RECIRCULATION(\"mole: CH4 1\"; \"technical air, 21/79\"; 1.1; 0.2)",
               "mole: N2 0.77762863"}),
        kRecirculation, explain_firing),
};

}  // namespace

std::span<const Row> combustion_air() { return kRows; }

}  // namespace busbar::functions
