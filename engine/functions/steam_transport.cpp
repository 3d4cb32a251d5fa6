// Viscosity, thermal conductivity, surface tension, and where liquid water ends in ice.
#include <array>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "functions/as.hpp"
#include "functions/functions.hpp"
#include "functions/steam_arguments.hpp"
#include "water/transport/conductivity.hpp"
#include "water/transport/surface.hpp"
#include "water/transport/viscosity.hpp"

namespace busbar::functions {
namespace {

Outcome<SurfaceTension> surface_tension(Temperature t) {
  return as<SurfaceTension>(water::surface_tension(t.si));
}

Outcome<Temperature> melting_temperature(Pressure p) {
  return as<Temperature>(water::melting_temperature(p.si));
}

Outcome<Pressure> melting_pressure(Temperature t, Word word) {
  constexpr std::array<Word, 5> kWords{"Ih", "III", "V", "VI", "VII"};
  for (std::size_t i = 0; i < kWords.size(); ++i) {
    if (!equal_ignoring_case(trimmed(word), kWords[i])) continue;
    return as<Pressure>(water::melting_pressure(t.si, static_cast<water::Ice>(i)));
  }
  return Failure{Fault::unknown_word, 2, "is none of \"Ih\", \"III\", \"V\", \"VI\", \"VII\""};
}

Outcome<Pressure> sublimation_pressure(Temperature t) {
  return as<Pressure>(water::sublimation_pressure(t.si));
}

// --- Rows ------------------------------------------------------------------------------------

constexpr Source kIceRelease{
    "IAPWS R14-08(2011), Revised Release on the Pressure along the Melting and Sublimation Curves "
    "of Ordinary Water Substance",
    "September 2011", "equations 1 to 6"};

constexpr double kHottest = 1173.15;
constexpr Argument kState[] = {kPressureArgument,
                               {"temperature", "Temperature of the fluid, up to 900 °C", 273.15,
                                kHottest, "the limit of the release"}};
constexpr Argument kSurface[] = {
    {"temperature", "Temperature of the saturated fluid, from the triple point to the critical one",
     kAboveZero, 2273.15}};
constexpr Argument kMeltingPressure[] = {{"pressure", "Absolute pressure", kAboveZero, 3e10}};
constexpr Argument kMelting[] = {
    {"temperature", "Temperature of ice and water", kAboveZero, 1000},
    {"ice", "Kind of ice: \"Ih\" (common ice), \"III\", \"V\", \"VI\" or \"VII\""}};
constexpr Argument kSublimation[] = {
    {"temperature", "Temperature of the ice, from 50 K to 0.01 °C", kAboveZero, 1000}};

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, "Transport and phase limits", summary, notes, result, source, example, kFirst};
}

constexpr const char* kEnhancement =
    "Without the critical enhancement, as the release recommends for industrial use; it exceeds 2 "
    "% "
    "only within 3 K of the critical temperature and 80 kg/m³ of the critical density.";

constexpr Row kRows[] = {
    row<at_pressure_and_temperature<Viscosity, water::viscosity>>(
        words("STEAM_VISCOSITY", "Dynamic viscosity at a pressure and a temperature", kEnhancement,
              "Dynamic viscosity", kViscosityRelease,
              {"STEAM_VISCOSITY(200; 346.85)", "70.9051068"}),
        kState, explain_pressure_temperature),
    row<at_pressure_and_temperature<ThermalConductivity, water::thermal_conductivity>>(
        words("STEAM_THERMAL_CONDUCTIVITY", "Thermal conductivity at a pressure and a temperature",
              "With the critical enhancement in its form for industrial use.",
              "Thermal conductivity", kConductivityRelease,
              {"STEAM_THERMAL_CONDUCTIVITY(200; 346.85)", "0.481485195"}),
        kState, explain_pressure_temperature),
    row<at_pressure_and_temperature<Number, water::prandtl_number>>(
        words("STEAM_PRANDTL_NUMBER", "Prandtl number at a pressure and a temperature",
              kEnhancement, "Prandtl number", kPrandtlReleases,
              {"STEAM_PRANDTL_NUMBER(200; 346.85)", "1.12425779"}),
        kState, explain_pressure_temperature),
    row<surface_tension>(
        words(
            "SURFACE_TENSION", "Surface tension between water and its steam at a temperature",
            "From the triple point, where it is greatest, to the critical temperature, where it is "
            "zero.",
            "Surface tension", kTensionRelease, {"SURFACE_TENSION(100)", "58.9118686"}),
        kSurface),
    row<melting_temperature>(
        words(
            "MELTING_TEMPERATURE", "Temperature at which water freezes at a pressure",
            "Of the kind of ice that borders liquid water at this pressure: Ih up to 208.566 MPa, "
            "then III, V, VI and VII. Water can stay liquid below it for a while (supercooled).",
            "Temperature", kIceRelease, {"MELTING_TEMPERATURE(1000)", "-8.94125368"}),
        kMeltingPressure),
    row<melting_pressure>(
        words("MELTING_PRESSURE", "Pressure at which a kind of ice melts at a temperature",
              "Common ice (Ih) melts under pressure: two kinds of ice may melt at one temperature, "
              "at "
              "two pressures.",
              "Absolute pressure", kIceRelease, {"MELTING_PRESSURE(-13.15; \"Ih\")", "1382.68"}),
        kMelting),
    row<sublimation_pressure>(
        words("SUBLIMATION_PRESSURE", "Vapour pressure of common ice at a temperature", "",
              "Absolute pressure", kIceRelease, {"SUBLIMATION_PRESSURE(-43.15)", "0.0000894735"}),
        kSublimation),
};

}  // namespace

std::span<const Row> steam_transport() { return kRows; }

}  // namespace busbar::functions
