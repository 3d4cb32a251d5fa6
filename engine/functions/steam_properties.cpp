// Properties of water and steam as plain numbers: energies, second derivatives, saturation.
#include "functions/functions.hpp"
#include "functions/steam_arguments.hpp"
#include "water/batch/pressure_temperature.hpp"
#include "water/batch/saturation.hpp"
#include "water/properties/energy.hpp"
#include "water/properties/response.hpp"

namespace busbar::functions {
namespace {

using water::State;

template <class Q, double State::*Member>
Outcome<Q> at_dryness(Pressure p, Fraction x) {
  const Outcome<State> state = water::at_pressure_dryness(p.si, x.si);
  if (!state) return state.failure();
  return Q{(*state).*Member};
}

Outcome<SpecificEnergy> latent_heat(Pressure p) {
  const Outcome<double> value = water::latent_heat(p.si);
  if (!value) return value.failure();
  return SpecificEnergy{*value};
}

void explain_dryness(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const auto state = water::at_pressure_dryness(in[0].si, in[1].si);
  if (!state) return;
  describe_state(text, *state, units);
  append_validity(text, units);
}

// --- Rows ------------------------------------------------------------------------------------

constexpr Argument kPressureTemperature[] = {kPressureArgument, kTemperatureArgument};
constexpr Argument kPressureDryness[] = {kPressureArgument, kDrynessArgument};
constexpr Argument kPressure[] = {kPressureArgument};

constexpr Source kSaturatedStates{kIf97, kIf97Edition,
                                  "equations 30 and 31, saturated states by equations 7, 15, 28"};

constexpr const char* kLineNote =
    "On the saturation line the liquid answers; for wet steam or saturated vapour read a stream.";

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, "Steam properties", summary, notes, result, source, example, kFirst};
}

template <class Q, PropertyOf kProperty>
consteval Row number(const Words& words) {
  return row<at_pressure_and_temperature<Q, kProperty>>(words, kPressureTemperature,
                                                        explain_pressure_temperature);
}

template <class Q, PropertyOf kProperty, water::batch::AtPressureTemperature kBatch>
consteval Row number_with_batch(const Words& words) {
  return row_with_batch<at_pressure_and_temperature<Q, kProperty>, columns_pt<Q, kBatch>>(
      words, kPressureTemperature, explain_pressure_temperature);
}

constexpr Row kRows[] = {
    number_with_batch<SpecificEnergy, water::internal_energy, water::batch::internal_energy>(
        words("STEAM_INTERNAL_ENERGY", "Specific internal energy at a pressure and a temperature",
              kLineNote, "Specific internal energy, zero in the liquid at the triple point",
              kEnergies, {"STEAM_INTERNAL_ENERGY(30; 26.85)", "112.324818"})),
    number_with_batch<SpecificEnergy, water::helmholtz_energy, water::batch::helmholtz_energy>(
        words("STEAM_HELMHOLTZ_ENERGY",
              "Specific Helmholtz energy u - T s at a pressure and a temperature", kLineNote,
              "Specific Helmholtz (free) energy", kEnergies,
              {"STEAM_HELMHOLTZ_ENERGY(30; 26.85)", "-5.36361974"})),
    number_with_batch<SpecificEnergy, water::gibbs_energy, water::batch::gibbs_energy>(
        words("STEAM_GIBBS_ENERGY", "Specific Gibbs energy h - T s at a pressure and a temperature",
              kLineNote, "Specific Gibbs energy (free enthalpy)", kEnergies,
              {"STEAM_GIBBS_ENERGY(30; 26.85)", "-2.35716470"})),
    number_with_batch<HeatCapacity, water::isobaric_heat_capacity,
                      water::batch::isobaric_heat_capacity>(
        words("STEAM_HEAT_CAPACITY", "Isobaric heat capacity cp at a pressure and a temperature",
              kLineNote, "Specific heat capacity at constant pressure", kDerivatives,
              {"STEAM_HEAT_CAPACITY(30; 26.85)", "4.17301218"})),
    number_with_batch<HeatCapacity, water::isochoric_heat_capacity,
                      water::batch::isochoric_heat_capacity>(
        words("STEAM_ISOCHORIC_HEAT_CAPACITY",
              "Isochoric heat capacity cv at a pressure and a temperature", kLineNote,
              "Specific heat capacity at constant volume", kDerivatives,
              {"STEAM_ISOCHORIC_HEAT_CAPACITY(200; 346.85)", "3.03793441"})),
    number_with_batch<Velocity, water::speed_of_sound, water::batch::speed_of_sound>(
        words("STEAM_SPEED_OF_SOUND", "Speed of sound at a pressure and a temperature", kLineNote,
              "Velocity", kDerivatives, {"STEAM_SPEED_OF_SOUND(30; 26.85)", "1507.73921"})),
    number_with_batch<Number, water::isentropic_exponent, water::batch::isentropic_exponent>(words(
        "STEAM_ISENTROPIC_EXPONENT",
        "Isentropic exponent of p v^k = constant at a pressure and a temperature",
        "The exponent -(v/p)(dp/dv) at constant entropy. It is not cp/cv, which equals it only "
        "in an ideal gas.",
        "Isentropic exponent", kDerivatives,
        {"STEAM_ISENTROPIC_EXPONENT(0.035; 26.85)", "1.32481456"})),
    number_with_batch<JouleThomson, water::joule_thomson, water::batch::joule_thomson>(
        words("STEAM_JOULE_THOMSON_COEFFICIENT",
              "Temperature change per pressure change in throttling, (dT/dp) at constant h",
              "Positive where throttling cools.", "Joule-Thomson coefficient", kDerivatives,
              {"STEAM_JOULE_THOMSON_COEFFICIENT(3; 376.85)", "0.831291340"})),
    number_with_batch<ThermalExpansion, water::isobaric_expansion,
                      water::batch::isobaric_expansion>(
        words("STEAM_ISOBARIC_EXPANSION",
              "Isobaric thermal expansion (1/v)(dv/dT) at a pressure and a temperature",
              "Negative in cold water below the temperature of its greatest density.",
              "Thermal expansion coefficient", kDerivatives,
              {"STEAM_ISOBARIC_EXPANSION(200; 346.85)", "0.00621449913"})),
    number_with_batch<Compressibility, water::isothermal_compressibility,
                      water::batch::isothermal_compressibility>(
        words("STEAM_ISOTHERMAL_COMPRESSIBILITY",
              "Isothermal compressibility -(1/v)(dv/dp) at a pressure and a temperature", kLineNote,
              "Compressibility", kDerivatives,
              {"STEAM_ISOTHERMAL_COMPRESSIBILITY(200; 346.85)", "0.000849501342"})),
    number<TemperatureDifference, water::superheat>(
        words("STEAM_SUPERHEAT", "Degree of superheat at a pressure and a temperature",
              "#N/A for subcooled water, and where the pressure has no saturation temperature. A "
              "temperature reading close to saturation cannot tell superheated from wet steam.",
              "Kelvins (or °F) above saturation", kSaturatedStates,
              {"STEAM_SUPERHEAT(10; 300)", "120.114368"})),
    number<TemperatureDifference, water::subcooling>(
        words("STEAM_SUBCOOLING", "Degree of subcooling at a pressure and a temperature",
              "#N/A for superheated steam, and where the pressure has no saturation temperature.",
              "Kelvins (or °F) below saturation", kSaturatedStates,
              {"STEAM_SUBCOOLING(10; 150)", "29.8856324"})),
    row_with_batch<at_dryness<Enthalpy, &State::enthalpy>,
                   columns<Enthalpy, Pressure, Fraction, water::batch::enthalpy_at_dryness>>(
        words("STEAM_ENTHALPY_AT_DRYNESS", "Specific enthalpy at a pressure and a dryness",
              "Dryness 0 is boiling water, 1 is saturated steam.", "Specific enthalpy",
              kSaturatedStates, {"STEAM_ENTHALPY_AT_DRYNESS(10; 1)", "2777.11954"}),
        kPressureDryness, explain_dryness),
    row_with_batch<at_dryness<Entropy, &State::entropy>,
                   columns<Entropy, Pressure, Fraction, water::batch::entropy_at_dryness>>(
        words("STEAM_ENTROPY_AT_DRYNESS", "Specific entropy at a pressure and a dryness",
              "Dryness 0 is boiling water, 1 is saturated steam.", "Specific entropy",
              kSaturatedStates, {"STEAM_ENTROPY_AT_DRYNESS(10; 1)", "6.58497900"}),
        kPressureDryness, explain_dryness),
    row_with_batch<at_dryness<Volume, &State::volume>,
                   columns<Volume, Pressure, Fraction, water::batch::volume_at_dryness>>(
        words("STEAM_VOLUME_AT_DRYNESS", "Specific volume at a pressure and a dryness",
              "Dryness 0 is boiling water, 1 is saturated steam.", "Specific volume",
              kSaturatedStates, {"STEAM_VOLUME_AT_DRYNESS(10; 1)", "0.194348884"}),
        kPressureDryness, explain_dryness),
    row_with_batch<latent_heat, column<SpecificEnergy, Pressure, water::batch::latent_heat>>(
        words("LATENT_HEAT", "Enthalpy of evaporation at a pressure",
              "Saturated steam less boiling water; zero at the critical point.",
              "Specific enthalpy of evaporation", kSaturatedStates, {"LATENT_HEAT(1)", "2257.51"}),
        kPressure),
};

}  // namespace

std::span<const Row> steam_properties() { return kRows; }

}  // namespace busbar::functions
