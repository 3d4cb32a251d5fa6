// What a fuel burns to, and the heat of it.
#include <array>

#include "functions/combustion_arguments.hpp"
#include "functions/functions.hpp"

namespace busbar::functions {
namespace {

using combustion::Burning;
using combustion::Products;
using gas::Mixture;
using gas::Species;

struct Rest {
  std::optional<Fraction> monoxide;
  std::optional<Fraction> unburnt;
  std::optional<Number> water;
};

Outcome<Products> burnt(const Composition& fuel, const Mixture& air, Number air_ratio,
                        const Rest& rest) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  Burning burning;
  burning.air_ratio = air_ratio.si;
  if (rest.monoxide) burning.carbon_to_monoxide = rest.monoxide->si;
  burning.unburnt_carbon = or_none(rest.unburnt);
  burning.water = or_none(rest.water);
  return combustion::burn(fired->fuel, fired->air, burning);
}

Outcome<Text> flue_gas(const Composition& fuel, const Mixture& air, Number air_ratio, Word state,
                       std::optional<Fraction> monoxide, std::optional<Fraction> unburnt,
                       std::optional<Number> water) {
  const Outcome<Products> products = burnt(fuel, air, air_ratio, {monoxide, unburnt, water});
  if (!products) return products.failure();
  const Outcome<bool> wet = is_wet(state, 4);
  if (!wet) return wet.failure();
  const Outcome<Mixture> mixture = products->mixture(*wet);
  if (!mixture) return mixture.failure();
  return as_text(mixture->composition(Basis::mole));
}

Outcome<Number> flue_gas_mass(const Composition& fuel, const Mixture& air, Number air_ratio,
                              Word state, std::optional<Fraction> monoxide,
                              std::optional<Fraction> unburnt, std::optional<Number> water) {
  const Outcome<Products> products = burnt(fuel, air, air_ratio, {monoxide, unburnt, water});
  if (!products) return products.failure();
  const Outcome<bool> wet = is_wet(state, 4);
  if (!wet) return wet.failure();
  return Number{products->mass(*wet)};
}

Outcome<Volume> flue_gas_volume(const Composition& fuel, const Mixture& air, Number air_ratio,
                                Word state, Temperature t, Pressure p,
                                std::optional<Number> water) {
  const Outcome<Products> products = burnt(fuel, air, air_ratio, {{}, {}, water});
  if (!products) return products.failure();
  const Outcome<bool> wet = is_wet(state, 4);
  if (!wet) return wet.failure();
  return Volume{products->moles(*wet) * gas::kGasConstant * t.si / p.si};
}

Outcome<Fraction> greatest_carbon_dioxide(const Composition& fuel, const Mixture& air) {
  const Outcome<Firing> fired = firing(fuel, air);
  if (!fired) return fired.failure();
  return Fraction{combustion::greatest_carbon_dioxide(fired->fuel, fired->air)};
}

Outcome<Grid> flue_gas_table(const Composition& fuel, const Mixture& air, Number air_ratio,
                             std::optional<Fraction> monoxide, std::optional<Fraction> unburnt,
                             std::optional<Number> water) {
  const Outcome<Products> products = burnt(fuel, air, air_ratio, {monoxide, unburnt, water});
  if (!products) return products.failure();
  std::size_t gases = 0;
  for (const double amount : products->amount) gases += amount > 0 ? 1 : 0;
  constexpr std::size_t kColumns = 5;
  constexpr std::array kHeadings{"species", "mole fraction wet", "mole fraction dry",
                                 "mass fraction wet", "kg/kg fuel"};
  constexpr std::array kSums{"gas wet", "gas dry", "solid carbon", "ash", "air"};
  Grid table(gases + 1 + kSums.size(), kColumns);
  for (std::size_t c = 0; c < kColumns; ++c) table.at(0, c) = std::string(kHeadings[c]);
  const double wet = products->moles(true);
  const double dry = products->moles(false);
  const double mass = products->mass(true);
  std::size_t r = 1;
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    const double amount = products->amount[i];
    if (!(amount > 0)) continue;
    const auto species = static_cast<Species>(i);
    const double own = amount * gas::molar_mass(species);
    table.at(r, 0) = std::string(gas::name_of(species));
    table.at(r, 1) = amount / wet;
    table.at(r, 2) = species == Species::H2O ? 0 : amount / dry;
    table.at(r, 3) = own / mass;
    table.at(r, 4) = own;
    ++r;
  }
  const std::array sums{mass, products->mass(false), products->carbon, products->ash,
                        products->air};
  for (std::size_t i = 0; i < sums.size(); ++i, ++r) {
    table.at(r, 0) = std::string(kSums[i]);
    for (std::size_t c = 1; c + 1 < kColumns; ++c) table.at(r, c) = std::string();
    table.at(r, 4) = sums[i];
  }
  return table;
}

Outcome<Text> combustion_fuel(const Composition& analysis, HeatingValue value, Word word) {
  const Outcome<fuel::Basis> basis = heating_value_basis(word, 3);
  if (!basis) return basis.failure();
  const Outcome<Composition> fuel = combustion::with_heating_value(analysis, value.si, *basis);
  if (!fuel) return fuel.failure();
  return as_text(*fuel);
}

Outcome<HeatingValue> heat_of_combustion(const Composition& composition, Word word, Temperature t) {
  const Outcome<combustion::Fuel> fuel = combustion::fuel_from(composition);
  if (!fuel) return fuel.failure();
  const Outcome<fuel::Basis> basis = heating_value_basis(word, 2);
  if (!basis) return basis.failure();
  const Outcome<double> heat = combustion::heat_of_combustion(*fuel, *basis, t.si);
  if (!heat) {
    const Failure& failure = heat.failure();
    return failure.about(failure.argument == 2 ? 3 : failure.argument);
  }
  return HeatingValue{*heat};
}

constexpr const char* kChapter = "Flue gas";

constexpr Argument kFlueGas[] = {
    kFuelArgument,          kAirArgument,           kAirRatioArgument,     kStateArgument,
    kMonoxideShareArgument, kUnburntCarbonArgument, kInjectedWaterArgument};
constexpr Argument kTable[] = {kFuelArgument,          kAirArgument,
                               kAirRatioArgument,      kMonoxideShareArgument,
                               kUnburntCarbonArgument, kInjectedWaterArgument};
constexpr Argument kGasVolume[] = {
    kFuelArgument,
    kAirArgument,
    kAirRatioArgument,
    kStateArgument,
    {"temperature", "At which the volume is counted: 0 °C for a normal cubic metre", 200, 2000},
    {"pressure", "At which the volume is counted, absolute: 1.01325 bar for a normal cubic metre",
     kAboveZero, kHighestGasPressure},
    kInjectedWaterArgument};
constexpr Argument kFuelAir[] = {kFuelArgument, kAirArgument};
constexpr Argument kAnalysis[] = {
    {"analysis",
     "Ultimate analysis by mass, as fired: C, H, O, N, S, ash and moisture, hydrogen and oxygen "
     "without those of the moisture"},
    {"heating value", "At 25 °C and constant pressure, per mass of fuel as fired",
     combustion::kLeastHeatingValue, combustion::kMostHeatingValue},
    {"basis", "\"HHV\" or \"LHV\""}};
constexpr Argument kHeat[] = {
    kFuelArgument,
    {"basis", "\"HHV\" or \"LHV\": whether the water ends as liquid or as vapour"},
    {"temperature", "Of fuel, oxygen and products; 25 °C for an analysis", 200, 600}};

constexpr const char* kGasNote =
    "Complete combustion unless CO or unburnt carbon is stated; no dissociation, no NO, no SO3 "
    "(see EQUILIBRIUM_TABLE). Below an air ratio of 1 hydrogen burns first, and the carbon that "
    "lacks oxygen leaves as CO, as far as that suffices. CO and unburnt fuel are poisonous and "
    "explosive.";
constexpr Source kFormation{"Hess's law with the heats of formation of NASA/TP-2002-211556",
                            "September 2002",
                            "enthalpies of fuel and oxygen less those of CO2, H2O, SO2 and N2"};

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kChapter, summary, notes, result, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<flue_gas>(
        words("FLUE_GAS", "Composition of the flue gas of a fuel, wet or dry", kGasNote,
              "A composition text by mole, for any function that takes a gas", kElementBalance,
              {"FLUE_GAS(\"mole: C2H6 1\"; \"technical air, 21/79\"; 1.2; \"wet\")",
               "mole: N2 0.73488372"}),
        kFlueGas, explain_firing),
    row<flue_gas_table>(
        words("FLUE_GAS_TABLE", "Flue gas by species, wet and dry, by mole and by mass",
              "Enter it as an array formula. Last lines: masses of wet and dry gas, solid carbon, "
              "ash and air per mass of fuel.",
              "A table", kElementBalance,
              {"INDEX(FLUE_GAS_TABLE(\"mole: C2H6 1\"; \"technical air, 21/79\"; 1.2); 2; 2)",
               "0.734883721"}),
        kTable, explain_firing),
    row<flue_gas_mass>(
        words("FLUE_GAS_MASS", "Mass of flue gas, wet or dry, per mass of fuel",
              "Without ash and unburnt carbon.", "Mass of gas over mass of fuel", kElementBalance,
              {"FLUE_GAS_MASS(\"mole: CH4 1\"; \"dry air, NASA\"; 1.15; \"wet\")", "20.8243004"}),
        kFlueGas, explain_firing),
    row<flue_gas_volume>(
        words("FLUE_GAS_VOLUME", "Volume of flue gas, wet or dry, per mass of fuel",
              "Of an ideal gas at the temperature and pressure stated, complete combustion; water "
              "counts as vapour there.",
              "Volume over mass of fuel", kElementBalance,
              {"FLUE_GAS_VOLUME(\"mole: CH4 1\"; \"dry air, NASA\"; 1.15; \"dry\"; 0; 1.01325)",
               "13.9434798"}),
        kGasVolume, explain_firing),
    row<greatest_carbon_dioxide>(
        words(
            "GREATEST_CARBON_DIOXIDE", "CO2 in the dry flue gas at an air ratio of 1",
            "No complete combustion of this fuel in this air can give more.",
            "A fraction by volume", kElementBalance,
            {"GREATEST_CARBON_DIOXIDE(\"mole: CH4 1\"; \"technical air, 21/79\")", "0.117318436"}),
        kFuelAir, explain_firing),
    row<combustion_fuel>(
        words("COMBUSTION_FUEL", "Fuel text of an ultimate analysis with its heating value",
              "What FLAME_TEMPERATURE and the burners take for coal, oil, wood or waste. The "
              "gross value of a bomb, at constant volume, is lower by less than 0.2 %.",
              "A fuel text",
              {"Definition", "", "the analysis with the heating value as a further part"},
              {"COMBUSTION_FUEL(\"mass: C 0.61, H 0.04, O 0.03, N 0.02, S 0.01, ash 0.25, "
               "moisture 0.04\"; 24.3; \"HHV\")",
               "mass: C 0.61, H 0.04, O 0.03, N 0.02, S 0.01, ash 0.25, moisture 0.04, HHV (MJ/kg) "
               "24.3"}),
        kAnalysis, explain_combustion_fuel),
    row<heat_of_combustion>(
        words("HEAT_OF_COMBUSTION", "Heating value of a fuel of known species, or of its text",
              "Fuel, oxygen and products at one temperature, ideal gases at constant pressure. "
              "Contracts for natural gas name ISO 6976 instead, see the gaseous fuels.",
              "Heating value by mass", kFormation,
              {"HEAT_OF_COMBUSTION(\"mole: CH4 1\"; \"LHV\"; 25)", "50.0273649"}),
        kHeat, explain_combustion_fuel),
};

}  // namespace

std::span<const Row> combustion_flue_gas() { return kRows; }

}  // namespace busbar::functions
