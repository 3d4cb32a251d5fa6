// Arguments, sources and reading that the chapters on combustion share.
#pragma once

#include <optional>
#include <string>

#include "catalogue/row.hpp"
#include "combustion/fuel.hpp"
#include "combustion/oxidant.hpp"
#include "combustion/products.hpp"
#include "functions/gas_arguments.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {

/// Fuel and air of a call, arguments 1 and 2.
struct Firing {
  combustion::Fuel fuel;
  combustion::Oxidant air;
};
Outcome<Firing> firing(const Composition& fuel, const gas::Mixture& air);

/// "wet" is true, "dry" false.
Outcome<bool> is_wet(Word state, std::uint8_t argument);

Outcome<fuel::Basis> heating_value_basis(Word word, std::uint8_t argument);

/// What an optional share or amount is where it is left out: none of it.
inline double or_none(std::optional<Fraction> share) { return share ? share->si : 0; }
inline double or_none(std::optional<Number> amount) { return amount ? amount->si : 0; }

Text as_text(const Composition& composition);

/// Explain hook of rows whose first two arguments are fuel and air.
void explain_firing(const Slot* in, const Result& result, UnitSet units, std::string& text);
/// Explain hook of rows whose first argument is a fuel.
void explain_combustion_fuel(const Slot* in, const Result& result, UnitSet units,
                             std::string& text);

inline constexpr Argument kFuelArgument{
    "fuel",
    "As fired, as a table or a text: gases and liquids by name (\"mole: CH4 0.95, N2 0.05\"; "
    "\"mole: n-C8H18(L) 1\"), or an ultimate analysis by mass (\"mass: C 0.85, H 0.12, O 0.01, S "
    "0.01, ash 0.005, moisture 0.005\"; hydrogen and oxygen without those of the moisture), with "
    "its heating value by COMBUSTION_FUEL where heat is asked for"};
inline constexpr Argument kAirArgument{
    "air",
    "Composition of what brings the oxygen, humid as it is: a published mixture such as \"dry air, "
    "ISO 2533\", AIR_WITH_HUMIDITY, or any gas with oxygen"};

/// An air ratio of nought is a blank cell; a thousand times the air puts no flame out on paper.
inline constexpr double kLeastAirRatio = 0.05;
inline constexpr double kMostAirRatio = 1000;
inline constexpr Argument kAirRatioArgument{
    "air ratio",
    "Air given over air needed for complete combustion: 1.2 is 20 % excess air. Its reciprocal is "
    "the equivalence ratio",
    kLeastAirRatio, kMostAirRatio};
inline constexpr Argument kStateArgument{
    "state", "\"dry\" or \"wet\": whether the water vapour counts in the gas"};
inline constexpr Argument kMonoxideShareArgument{
    "carbon to CO",
    "Share of the burnt carbon that leaves as CO; left out: none at an air ratio of 1 or more, and "
    "below 1 what the lack of oxygen leaves, hydrogen burning first",
    0, 1};
inline constexpr Argument kUnburntCarbonArgument{
    "unburnt carbon", "Share of the fuel's carbon that leaves as solid; left out: none", 0, 1};
inline constexpr Argument kInjectedWaterArgument{
    "added water", "Water or steam put in, mass over mass of fuel; left out: none", 0, 100};

inline constexpr const char* kElementBalanceBook =
    "S. R. Turns, An Introduction to Combustion; Y. A. Cengel and M. A. Boles, Thermodynamics";
inline constexpr Source kElementBalance{
    kElementBalanceBook, "2nd ed. 2000; 8th ed. 2015",
    "stoichiometry, sections 2.3 and 15-2: balance of elements"};

}  // namespace busbar::functions
