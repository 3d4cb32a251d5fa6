// Humid air by the formulas that contracts and laboratories name, and the standard atmosphere.
#include "air/atmosphere.hpp"
#include "air/cipm.hpp"
#include "air/perfect_gas.hpp"
#include "air/saturation.hpp"
#include "functions/as.hpp"
#include "functions/functions.hpp"
#include "functions/humid_air_arguments.hpp"

namespace busbar::functions {
namespace {

Outcome<Enthalpy> enthalpy_ashrae(Temperature t, Number ratio) {
  return Enthalpy{air::perfect_gas_enthalpy(t.si, ratio.si)};
}

Outcome<Number> ratio_ashrae(Pressure p, Temperature t, Fraction relative) {
  return as<Number>(air::perfect_gas_humidity_ratio(p.si, t.si, relative.si));
}

Outcome<Number> ratio_at_wet_bulb_ashrae(Pressure p, Temperature t, Temperature wet) {
  return as<Number>(air::perfect_gas_humidity_ratio_at_wet_bulb(p.si, t.si, wet.si));
}

Outcome<Density> density_cipm(Pressure p, Temperature t, Fraction relative, Fraction dioxide) {
  return Density{air::cipm_2007_density(p.si, t.si, relative.si, dioxide.si)};
}

Outcome<Pressure> supercooled(Temperature t) {
  return Pressure{air::supercooled_vapour_pressure(t.si)};
}

Outcome<Pressure> atmosphere_pressure(Length altitude) {
  return Pressure{air::standard_atmosphere_pressure(altitude.si)};
}

Outcome<Temperature> atmosphere_temperature(Length altitude) {
  return Temperature{air::standard_atmosphere_temperature(altitude.si)};
}

// --- Rows ------------------------------------------------------------------------------------

constexpr const char* kHandbook = "ASHRAE Handbook Fundamentals, chapter 1, Psychrometrics";
constexpr Source kShortEnthalpy{kHandbook, "2017", "h = 1.006 t + W (2501 + 1.86 t)"};
constexpr Source kPerfectGas{kHandbook, "2017",
                             "W = 0.621945 p_w/(p - p_w); vapour pressure equations 5 and 6 "
                             "(Hyland and Wexler 1983)"};
constexpr Source kPerfectWetBulb{
    kHandbook, "2017",
    "W = ((2501 - 2.326 t*) W_s - 1.006 (t - t*))/(2501 + 1.86 t - 4.186 t*), over ice ((2830 - "
    "0.24 t*) W_s - 1.006 (t - t*))/(2830 + 1.86 t - 2.1 t*)"};
constexpr Source kCipm{
    "A. Picard, R. S. Davis, M. Gläser, K. Fujii, Revised formula for the density of moist air "
    "(CIPM-2007), Metrologia 45",
    "2008", "page 149, equation 1 and appendix A1"};
constexpr Source kSupercooled{
    "D. M. Murphy, T. Koop, Review of the vapour pressures of ice and supercooled water for "
    "atmospheric applications, Quarterly Journal of the Royal Meteorological Society 131",
    "2005", "page 1539, equation 10"};
constexpr Source kStandardAtmosphere{"ISO 2533, Standard Atmosphere", "1975",
                                     "layer from sea level to 11 km: 288.15 K, 101.325 kPa, lapse "
                                     "rate 6.5 K/km"};

constexpr const char* kHandbookLimit = "the limit of the vapour pressure equations";
constexpr Argument kAnyPressure{"pressure", "Absolute pressure of the air, never gauge", kAboveZero,
                                100e6};
constexpr Argument kAnyTemperature{"temperature", "Dry-bulb temperature", air::kFreezing - 100,
                                   air::kHottest, kHandbookLimit};
constexpr Argument kEnthalpy[] = {kAnyTemperature, kHumidityRatio};
constexpr Argument kRelative[] = {kAnyPressure, kAnyTemperature, kRelativeHumidity};
constexpr Argument kWet[] = {kAnyPressure,
                             kAnyTemperature,
                             {"wet bulb", "Wet-bulb temperature; below 0 °C with ice on the bulb",
                              air::kFreezing - 100, air::kHottest, kHandbookLimit}};
constexpr Argument kMetrology[] = {
    {"pressure", "Absolute pressure of the air", 60e3, 110e3, "the limit of CIPM-2007"},
    {"temperature", "Temperature of the air", 288.15, 300.15, "the limit of CIPM-2007"},
    kRelativeHumidity,
    {"carbon dioxide", "Mole fraction of carbon dioxide: 0.0004 for 400 ppm", kAboveZero, 0.002,
     "the most that indoor air holds"}};
constexpr Argument kCold[] = {
    {"temperature", "Temperature of the supercooled water", 123, air::kFreezing,
     "the freezing point; SATURATION_PRESSURE holds above it, the formula from 123 K"}};
constexpr Argument kAltitude[] = {{"altitude", "Geopotential altitude above mean sea level",
                                   air::kLowestAltitude, air::kHighestAltitude,
                                   "the limit of this layer of ISO 2533"}};

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kAirChapter, summary, notes, result, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<enthalpy_ashrae>(
        words("AIR_ENTHALPY_ASHRAE", "Enthalpy of humid air by the short formula of contracts",
              "Perfect gas with constant heat capacities: 0.05 % above AIR_ENTHALPY for saturated "
              "air of "
              "25 °C. Fog is not refused: the formula knows no pressure.",
              "Enthalpy per kg of dry air", kShortEnthalpy,
              {"AIR_ENTHALPY_ASHRAE(25; 0.01)", "50.625"}),
        kEnthalpy),
    row<ratio_ashrae>(
        words("AIR_HUMIDITY_RATIO_ASHRAE",
              "Humidity ratio of air from its relative humidity, as a perfect gas",
              "Saturation over ice below 0 °C. Lower than AIR_HUMIDITY_RATIO by the enhancement "
              "factor, 0.5 % for saturated air of 25 °C near 1 bar.",
              "kg of water per kg of dry air", kPerfectGas,
              {"AIR_HUMIDITY_RATIO_ASHRAE(1.01325; 25; 1)", "0.0200811227"}),
        kRelative),
    row<ratio_at_wet_bulb_ashrae>(
        words("AIR_HUMIDITY_RATIO_AT_WET_BULB_ASHRAE",
              "Humidity ratio of air from its wet bulb, as a perfect gas", "Over ice below 0 °C.",
              "kg of water per kg of dry air", kPerfectWetBulb,
              {"AIR_HUMIDITY_RATIO_AT_WET_BULB_ASHRAE(1.01325; 40; 20)", "0.00640078597"}),
        kWet),
    row<density_cipm>(
        words("AIR_DENSITY_CIPM_2007", "Density of moist air by the formula of metrology",
              "For buoyancy and flow calibration in rooms, relative uncertainty 2.2e-5. "
              "AIR_DENSITY agrees with it within 3e-5 at 400 ppm of carbon dioxide.",
              "kg of humid air per volume", kCipm,
              {"AIR_DENSITY_CIPM_2007(1.01325; 20; 0.5; 0.0004)", "1.1993145"}),
        kMetrology),
    row<supercooled>(
        words("SUPERCOOLED_WATER_VAPOUR_PRESSURE",
              "Vapour pressure of liquid water below its freezing point",
              "What weather services refer relative humidity to in frost. SUBLIMATION_PRESSURE is "
              "that of ice, SATURATION_PRESSURE that of water from 0 °C.",
              "Absolute pressure", kSupercooled,
              {"SUPERCOOLED_WATER_VAPOUR_PRESSURE(-20)", "0.00125504169"}),
        kCold),
    row<atmosphere_pressure>(
        words("STANDARD_ATMOSPHERE_PRESSURE", "Pressure of the standard atmosphere at an altitude",
              "A first figure for a site, not a measured one: the weather moves it by some 3 %. A "
              "pressure that a weather service has reduced to sea level is not the pressure of the "
              "site.",
              "Absolute pressure", kStandardAtmosphere,
              {"STANDARD_ATMOSPHERE_PRESSURE(500)", "0.954608353"}),
        kAltitude),
    row<atmosphere_temperature>(
        words("STANDARD_ATMOSPHERE_TEMPERATURE",
              "Temperature of the standard atmosphere at an altitude", "A convention, no climate.",
              "Temperature", kStandardAtmosphere,
              {"STANDARD_ATMOSPHERE_TEMPERATURE(500)", "11.75"}),
        kAltitude),
};

}  // namespace

std::span<const Row> air_formulas() { return kRows; }

}  // namespace busbar::functions
