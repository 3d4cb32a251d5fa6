// Humid air: relative humidity, dew point, wet bulb and fractions of water, to and from the
// humidity ratio.
#include <optional>
#include <string>

#include "air/humidity.hpp"
#include "functions/as.hpp"
#include "functions/functions.hpp"
#include "functions/humid_air_arguments.hpp"

namespace busbar::functions {
namespace {

using OptionalWord = std::optional<Word>;

Outcome<Number> ratio_at_relative_humidity(Pressure p, Temperature t, Fraction relative,
                                           OptionalWord word) {
  const auto below = below_freezing(word, 4);
  if (!below) return below.failure();
  return as<Number>(air::humidity_ratio_at_relative_humidity(p.si, t.si, relative.si, *below));
}

Outcome<Number> ratio_at_dew_point(Pressure p, Temperature dew, OptionalWord word) {
  const auto below = below_freezing(word, 3);
  if (!below) return below.failure();
  return as<Number>(air::humidity_ratio_at_dew_point(p.si, dew.si, *below));
}

Outcome<Number> ratio_at_wet_bulb(Pressure p, Temperature t, Temperature wet) {
  return as<Number>(air::humidity_ratio_at_wet_bulb(p.si, t.si, wet.si));
}

Outcome<Number> ratio_at_mole_fraction(Fraction x) { return Number{air::humidity_ratio_of(x.si)}; }

Outcome<Number> ratio_at_specific_humidity(Number specific) {
  return Number{specific.si / (1 - specific.si)};
}

Outcome<Fraction> relative_humidity(Pressure p, Temperature t, Number ratio, OptionalWord word) {
  const auto below = below_freezing(word, 4);
  if (!below) return below.failure();
  return as<Fraction>(air::relative_humidity(p.si, t.si, ratio.si, *below));
}

Outcome<Temperature> dew_point(Pressure p, Number ratio, OptionalWord word) {
  const auto below = below_freezing(word, 3);
  if (!below) return below.failure();
  return as<Temperature>(air::dew_point(p.si, ratio.si, *below));
}

Outcome<Temperature> wet_bulb(Pressure p, Temperature t, Number ratio) {
  return as<Temperature>(air::wet_bulb(p.si, t.si, ratio.si));
}

Outcome<Fraction> mole_fraction(Number ratio) { return Fraction{air::mole_fraction(ratio.si)}; }

Outcome<Number> specific_humidity(Number ratio) { return Number{ratio.si / (1 + ratio.si)}; }

Outcome<Number> enhancement_factor(Pressure p, Temperature t, OptionalWord word) {
  const auto below = below_freezing(word, 3);
  if (!below) return below.failure();
  const auto phase = air::condensate_at(t.si, *below);
  if (!phase) return phase.failure().about(3);
  const auto saturated = air::saturation(air::place(p.si, t.si), *phase);
  if (!saturated) return saturated.failure();
  return Number{saturated->enhancement};
}

void append_wick(std::string& text, double wet) {
  text += wet < air::kFreezing ? " Wet bulb covered with ice (IAPWS R10-06)."
                               : " Wet bulb covered with liquid water (IAPWS-IF97).";
}

void explain_wet_bulb(const Slot*, const Result& result, UnitSet, std::string& text) {
  append_wick(text, result.si);
}

void explain_given_wet_bulb(const Slot* in, const Result&, UnitSet, std::string& text) {
  append_wick(text, in[2].si);
}

// --- Rows ----------------------------------------------------------------------------------------

constexpr Source kSaturated{
    "IAPWS G11-15, Guideline on a Virial Equation for the Fugacity of H2O in Humid Air; method of "
    "ASHRAE RP-1485 (Herrmann, Kretzschmar, Gatley)",
    "2015; 2009",
    "vapour pressures IAPWS R7-97 equation 30, R14-08 equation 6, Murphy and Koop 2005 equation "
    "10; dissolved air IAPWS G7-04"};
constexpr Source kAdiabatic{
    "IAPWS G11-15; adiabatic saturation as ASHRAE Handbook Fundamentals defines it",
    "2015; 2017, chapter 1", "enthalpy of water IAPWS R7-97, of ice IAPWS R10-06(2009)"};
constexpr Source kDefinitionOfRatio{"Definition; molar masses 18.015268 and 28.96546 g/mol",
                                    "IAPWS G8-10 (2010)", "W = 0.621957 x/(1 - x) = q/(1 - q)"};

constexpr Argument kRelative[] = {kAirPressure, kDryBulb, kRelativeHumidity, kBelowFreezing};
constexpr Argument kRatio[] = {kAirPressure, kDryBulb, kHumidityRatio};
constexpr Argument kRatioBelow[] = {kAirPressure, kDryBulb, kHumidityRatio, kBelowFreezing};
constexpr Argument kDew[] = {kAirPressure,
                             {"dew point", "Dew point, or frost point with \"ice\"", air::kColdest,
                              air::kHottest, kVirialLimit},
                             kBelowFreezing};
constexpr Argument kWet[] = {kAirPressure,
                             kDryBulb,
                             {"wet bulb", "Wet-bulb temperature; below 0 °C with ice on the bulb",
                              air::kColdest, air::kHottest, kVirialLimit}};
constexpr Argument kMoist = {"humidity ratio", "kg of water per kg of dry air, not zero",
                             kAboveZero, 100};
constexpr Argument kPressureRatio[] = {kAirPressure, kMoist, kBelowFreezing};
constexpr Argument kSaturatedAt[] = {kAirPressure, kDryBulb, kBelowFreezing};
constexpr Argument kRatioAlone[] = {kHumidityRatio};
constexpr Argument kFraction[] = {
    {"mole fraction", "Mole (volume) fraction of water in the humid air", 0, 0.99}};
constexpr Argument kSpecific[] = {
    {"specific humidity", "kg of water per kg of humid air", 0, 0.99}};

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kAirChapter, summary, notes, result, source, example, kFirst};
}

constexpr const char* kSaturationNote =
    "Saturation over liquid water from 0 °C. Below it over ice (usual in engineering) or over "
    "supercooled water (usual in weather reports), as the argument below freezing says: at -20 °C "
    "they differ by 22 %. Real gas: near 1 bar saturated air holds 0.4 to 0.7 % more water than a "
    "perfect gas. Within 2e-5 of the ASHRAE tables; IAPWS G8-10, with IAPWS-95 for water, has "
    "1.3e-4 "
    "more at 27 °C. No answer where water boils.";
constexpr const char* kWetBulbNote =
    "Thermodynamic wet bulb (adiabatic saturation), over water from 0 °C and over ice below. A "
    "ventilated psychrometer reads it within some tenths of a kelvin. Air with a wet bulb between "
    "0 and about 0.6 °C over water has one below 0 °C over ice too: the one over water is given.";

constexpr Row kRows[] = {
    row<ratio_at_relative_humidity>(
        words("AIR_HUMIDITY_RATIO", "Humidity ratio of air from its relative humidity",
              kSaturationNote, "kg of water per kg of dry air", kSaturated,
              {"AIR_HUMIDITY_RATIO(1.01325; 15; 0.6)", "0.00637255313"}),
        kRelative, explain_saturation<3>),
    row<ratio_at_dew_point>(
        words("AIR_HUMIDITY_RATIO_AT_DEW_POINT", "Humidity ratio of air from its dew point",
              kSaturationNote, "kg of water per kg of dry air", kSaturated,
              {"AIR_HUMIDITY_RATIO_AT_DEW_POINT(1.01325; 10)", "0.0076627936"}),
        kDew, explain_saturation<2>),
    row<ratio_at_wet_bulb>(
        words("AIR_HUMIDITY_RATIO_AT_WET_BULB", "Humidity ratio of air from its wet bulb",
              kWetBulbNote, "kg of water per kg of dry air", kAdiabatic,
              {"AIR_HUMIDITY_RATIO_AT_WET_BULB(1.01325; 40; 20)", "0.00645247172"}),
        kWet, explain_given_wet_bulb),
    row<ratio_at_mole_fraction>(
        words("AIR_HUMIDITY_RATIO_AT_MOLE_FRACTION",
              "Humidity ratio of air from its mole fraction of water", "",
              "kg of water per kg of dry air", kDefinitionOfRatio,
              {"AIR_HUMIDITY_RATIO_AT_MOLE_FRACTION(0.01)", "0.00628239303"}),
        kFraction),
    row<ratio_at_specific_humidity>(
        words("AIR_HUMIDITY_RATIO_AT_SPECIFIC_HUMIDITY",
              "Humidity ratio of air from its specific humidity",
              "Per kg of dry air from per kg of humid air; the two are easily mixed up.",
              "kg of water per kg of dry air", kDefinitionOfRatio,
              {"AIR_HUMIDITY_RATIO_AT_SPECIFIC_HUMIDITY(0.02)", "0.0204081633"}),
        kSpecific),
    row<relative_humidity>(
        words("AIR_RELATIVE_HUMIDITY", "Relative humidity of air from its humidity ratio",
              kSaturationNote, "A fraction", kSaturated,
              {"AIR_RELATIVE_HUMIDITY(1.01325; 15; 0.0064)", "0.602557905"}),
        kRatioBelow, explain_saturation<3>),
    row<dew_point>(
        words("AIR_DEW_POINT", "Dew point of air from its humidity ratio",
              "The temperature at which the air is saturated at its pressure. Below 0 °C the "
              "argument below freezing decides: \"ice\" gives the frost point, \"water\" the dew "
              "point over supercooled water, up to 8 K lower. Real-gas saturation as in "
              "AIR_HUMIDITY_RATIO.",
              "Temperature", kSaturated, {"AIR_DEW_POINT(1.01325; 0.0064)", "7.37039053"}),
        kPressureRatio),
    row<wet_bulb>(
        words("AIR_WET_BULB", "Wet-bulb temperature of air from its humidity ratio", kWetBulbNote,
              "Temperature", kAdiabatic, {"AIR_WET_BULB(1.01325; 40; 0.0065)", "20.0359001"}),
        kRatio, explain_wet_bulb),
    row<mole_fraction>(
        words("AIR_MOLE_FRACTION_OF_WATER", "Mole fraction of water in air of a humidity ratio",
              "The moisture of the combustion air by volume.", "A fraction", kDefinitionOfRatio,
              {"AIR_MOLE_FRACTION_OF_WATER(0.0064)", "0.0101852942"}),
        kRatioAlone),
    row<specific_humidity>(
        words("AIR_SPECIFIC_HUMIDITY", "Specific humidity of air from its humidity ratio",
              "Per kg of humid air from per kg of dry air.", "kg of water per kg of humid air",
              kDefinitionOfRatio, {"AIR_SPECIFIC_HUMIDITY(0.02)", "0.0196078431"}),
        kRatioAlone),
    row<enhancement_factor>(
        words("AIR_ENHANCEMENT_FACTOR",
              "By how much air raises the vapour pressure of the water over which it is saturated",
              "Mole fraction of water in saturated air times pressure over vapour pressure. "
              "That of CIPM-2007, fitted to older data, is 1.5e-4 lower at 20 °C and 1 bar.",
              "A factor", kSaturated, {"AIR_ENHANCEMENT_FACTOR(1.01325; 80)", "1.00572712"}),
        kSaturatedAt, explain_saturation<2>),
};

}  // namespace

std::span<const Row> humid_air() { return kRows; }

}  // namespace busbar::functions
