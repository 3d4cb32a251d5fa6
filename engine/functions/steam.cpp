// Water and steam: streams from two properties, and properties as plain numbers.
#include "catalogue/sentence.hpp"
#include "functions/describe.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"
#include "functions/steam_arguments.hpp"
#include "water/batch/isobar.hpp"
#include "water/batch/pressure_temperature.hpp"
#include "water/batch/saturation.hpp"
#include "water/state.hpp"
#include "water/stream.hpp"

namespace busbar::functions {
namespace {

using water::State;
using OptionalFlow = std::optional<Flow>;

// --- Streams ---------------------------------------------------------------------------------

Outcome<Stream> as_stream(const Outcome<State>& state, OptionalFlow flow) {
  if (!state) return state.failure();
  return water::stream_of(*state, flow ? std::optional<double>(flow->si) : std::nullopt);
}

Outcome<Stream> steam_kernel(Pressure p, Temperature t, OptionalFlow flow) {
  return as_stream(water::at_pressure_temperature(p.si, t.si), flow);
}

Outcome<Stream> steam_at_dryness(Pressure p, Fraction x, OptionalFlow flow) {
  return as_stream(water::at_pressure_dryness(p.si, x.si), flow);
}

Outcome<Stream> steam_at_enthalpy(Pressure p, Enthalpy h, OptionalFlow flow) {
  return as_stream(water::at_pressure_enthalpy(p.si, h.si), flow);
}

Outcome<Stream> steam_at_entropy(Pressure p, Entropy s, OptionalFlow flow) {
  return as_stream(water::at_pressure_entropy(p.si, s.si), flow);
}

// --- Numbers ---------------------------------------------------------------------------------

template <class Q, double State::*Member>
Outcome<Q> at_pt(Pressure p, Temperature t) {
  const Outcome<State> state = water::at_pressure_temperature(p.si, t.si);
  if (!state) return state.failure();
  return Q{(*state).*Member};
}

template <class Q, double State::*Member>
Outcome<Q> at_ph(Pressure p, Enthalpy h) {
  const Outcome<State> state = water::at_pressure_enthalpy(p.si, h.si);
  if (!state) return state.failure();
  return Q{(*state).*Member};
}

template <class Q, double State::*Member>
Outcome<Q> at_ps(Pressure p, Entropy s) {
  const Outcome<State> state = water::at_pressure_entropy(p.si, s.si);
  if (!state) return state.failure();
  return Q{(*state).*Member};
}

Outcome<Density> density(Pressure p, Temperature t) {
  const Outcome<State> state = water::at_pressure_temperature(p.si, t.si);
  if (!state) return state.failure();
  return Density{1 / state->volume};
}

// Outside the two-phase region there is no dryness: #N/A, with the distance from saturation.
Outcome<Fraction> dryness_of_state(const Outcome<State>& state) {
  if (!state) return state.failure();
  if (state->region != water::Region::two_phase) return no_dryness(*state, 0);
  return Fraction{state->dryness};
}

Outcome<Fraction> dryness_at_enthalpy(Pressure p, Enthalpy h) {
  return dryness_of_state(water::at_pressure_enthalpy(p.si, h.si));
}

Outcome<Fraction> dryness_at_entropy(Pressure p, Entropy s) {
  return dryness_of_state(water::at_pressure_entropy(p.si, s.si));
}

Outcome<Temperature> saturation_temperature(Pressure p) {
  const Outcome<double> t = water::saturation_temperature(p.si);
  if (!t) return t.failure();
  return Temperature{*t};
}

Outcome<Pressure> saturation_pressure(Temperature t) {
  const Outcome<double> p = water::saturation_pressure(t.si);
  if (!p) return p.failure();
  return Pressure{*p};
}

// --- Explanations ----------------------------------------------------------------------------

void explain_ph(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const auto state = water::at_pressure_enthalpy(in[0].si, in[1].si);
  if (!state) return;
  describe_state(text, *state, units);
  append_validity(text, units);
}

void explain_ps(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const auto state = water::at_pressure_entropy(in[0].si, in[1].si);
  if (!state) return;
  describe_state(text, *state, units);
  append_validity(text, units);
}

void explain_saturation(const Slot*, const Result&, UnitSet units, std::string& text) {
  text += " Saturation line of IAPWS-IF97, from ";
  append_measure(text, {273.15, Quantity::temperature}, units);
  text += " to the critical point at ";
  append_measure(text, {647.096, Quantity::temperature}, units);
  text += " and ";
  append_measure(text, {22.064e6, Quantity::pressure}, units);
  text += '.';
}

// --- Rows ------------------------------------------------------------------------------------

constexpr const char* kChapter = "Water and steam";
constexpr Argument kPressureTemperatureFlow[] = {kPressureArgument, kTemperatureArgument,
                                                 kFlowArgument};
constexpr Argument kPressureDrynessFlow[] = {kPressureArgument, kDrynessArgument, kFlowArgument};
constexpr Argument kPressureEnthalpyFlow[] = {kPressureArgument, kEnthalpyArgument, kFlowArgument};
constexpr Argument kPressureEntropyFlow[] = {kPressureArgument, kEntropyArgument, kFlowArgument};
constexpr Argument kPressureTemperature[] = {kPressureArgument, kTemperatureArgument};
constexpr Argument kPressureEnthalpy[] = {kPressureArgument, kEnthalpyArgument};
constexpr Argument kPressureEntropy[] = {kPressureArgument, kEntropyArgument};
constexpr Argument kSaturationPressure[] = {kPressureArgument};
constexpr Argument kSaturationTemperature[] = {kTemperatureArgument};

constexpr const char* kStreamResult = "A stream: one line of text that other functions take";
constexpr const char* kWetNote =
    "Pressure and temperature cannot fix a wet state: on the saturation line the liquid is "
    "returned; "
    "use STEAM_AT_DRYNESS, STEAM_AT_ENTHALPY or STEAM_AT_ENTROPY for wet steam.";
constexpr const char* kSeamNote =
    "Exact to 1e-10 against the basic equations. At the seams between regions, where the "
    "formulation "
    "has gaps, the temperature stays on the boundary and the given value is kept.";

constexpr Row kRows[] = {
    row<steam_kernel>({"STEAM",
                       kChapter,
                       "Stream of water or steam at a pressure and a temperature",
                       kWetNote,
                       kStreamResult,
                       kSteamTables,
                       {"STEAM(100; 540; 55)", "steam 55 kg/s, 100 bar, 540 °C"},
                       kFirst},
                      kPressureTemperatureFlow, explain_result),
    row<steam_at_dryness>(
        {"STEAM_AT_DRYNESS",
         kChapter,
         "Stream of wet steam, boiling water (0) or saturated steam (1) at a pressure",
         "From the least pressure of the saturation line to the critical pressure.",
         kStreamResult,
         kSteamTables,
         {"STEAM_AT_DRYNESS(0.05; 0.88)", "wet steam 0.05 bar, dryness 0.88"},
         kFirst},
        kPressureDrynessFlow, explain_result),
    row<steam_at_enthalpy>(
        {"STEAM_AT_ENTHALPY",
         kChapter,
         "Stream of water or steam at a pressure and an enthalpy",
         kSeamNote,
         kStreamResult,
         kSteamTables,
         {"STEAM_AT_ENTHALPY(0.05; 2300)", "wet steam 0.05 bar, dryness 0.892379"},
         kFirst},
        kPressureEnthalpyFlow, explain_result),
    row<steam_at_entropy>({"STEAM_AT_ENTROPY",
                           kChapter,
                           "Stream of water or steam at a pressure and an entropy",
                           kSeamNote,
                           kStreamResult,
                           kSteamTables,
                           {"STEAM_AT_ENTROPY(20; 6.8)", "steam 20 bar, 307.867 °C"},
                           kFirst},
                          kPressureEntropyFlow, explain_result),

    row_with_batch<at_pt<Enthalpy, &State::enthalpy>, columns_pt<Enthalpy, water::batch::enthalpy>>(
        {"STEAM_ENTHALPY",
         kChapter,
         "Specific enthalpy at a pressure and a temperature",
         kWetNote,
         "Specific enthalpy",
         kSteamTables,
         {"STEAM_ENTHALPY(30; 26.85)", "115.331273"},
         kFirst},
        kPressureTemperature, explain_pressure_temperature),
    row_with_batch<at_pt<Entropy, &State::entropy>, columns_pt<Entropy, water::batch::entropy>>(
        {"STEAM_ENTROPY",
         kChapter,
         "Specific entropy at a pressure and a temperature",
         kWetNote,
         "Specific entropy",
         kSteamTables,
         {"STEAM_ENTROPY(30; 26.85)", "0.392294792"},
         kFirst},
        kPressureTemperature, explain_pressure_temperature),
    row_with_batch<at_pt<Volume, &State::volume>, columns_pt<Volume, water::batch::volume>>(
        {"STEAM_VOLUME",
         kChapter,
         "Specific volume at a pressure and a temperature",
         kWetNote,
         "Specific volume",
         kSteamTables,
         {"STEAM_VOLUME(30; 26.85)", "0.00100215168"},
         kFirst},
        kPressureTemperature, explain_pressure_temperature),
    row_with_batch<density, columns_pt<Density, water::batch::density>>(
        {"STEAM_DENSITY",
         kChapter,
         "Density at a pressure and a temperature",
         kWetNote,
         "Density",
         kSteamTables,
         {"STEAM_DENSITY(30; 26.85)", "997.85294"},
         kFirst},
        kPressureTemperature, explain_pressure_temperature),

    row_with_batch<at_ph<Temperature, &State::temperature>,
                   columns<Temperature, Pressure, Enthalpy, water::batch::temperature_at_enthalpy>>(
        {"STEAM_TEMPERATURE_AT_ENTHALPY",
         kChapter,
         "Temperature at a pressure and an enthalpy",
         kSeamNote,
         "Temperature",
         kSteamTables,
         {"STEAM_TEMPERATURE_AT_ENTHALPY(30; 500)", "118.641991"},
         kFirst},
        kPressureEnthalpy, explain_ph),
    row_with_batch<at_ph<Entropy, &State::entropy>,
                   columns<Entropy, Pressure, Enthalpy, water::batch::entropy_at_enthalpy>>(
        {"STEAM_ENTROPY_AT_ENTHALPY",
         kChapter,
         "Specific entropy at a pressure and an enthalpy",
         kSeamNote,
         "Specific entropy",
         kSteamTables,
         {"STEAM_ENTROPY_AT_ENTHALPY(30; 500)", "1.51061383"},
         kFirst},
        kPressureEnthalpy, explain_ph),
    row_with_batch<dryness_at_enthalpy,
                   columns<Fraction, Pressure, Enthalpy, water::batch::dryness_at_enthalpy>>(
        {"STEAM_DRYNESS_AT_ENTHALPY",
         kChapter,
         "Dryness at a pressure and an enthalpy",
         "#N/A outside the two-phase region; WHY then tells the superheat or subcooling.",
         "Dryness, 0 to 1",
         kSteamTables,
         {"STEAM_DRYNESS_AT_ENTHALPY(0.05; 2300)", "0.892379238"},
         kFirst},
        kPressureEnthalpy, explain_ph),
    row_with_batch<at_ps<Temperature, &State::temperature>,
                   columns<Temperature, Pressure, Entropy, water::batch::temperature_at_entropy>>(
        {"STEAM_TEMPERATURE_AT_ENTROPY",
         kChapter,
         "Temperature at a pressure and an entropy",
         kSeamNote,
         "Temperature",
         kSteamTables,
         {"STEAM_TEMPERATURE_AT_ENTROPY(30; 0.5)", "34.6953938"},
         kFirst},
        kPressureEntropy, explain_ps),
    row_with_batch<at_ps<Enthalpy, &State::enthalpy>,
                   columns<Enthalpy, Pressure, Entropy, water::batch::enthalpy_at_entropy>>(
        {"STEAM_ENTHALPY_AT_ENTROPY",
         kChapter,
         "Specific enthalpy at a pressure and an entropy",
         kSeamNote,
         "Specific enthalpy",
         kSteamTables,
         {"STEAM_ENTHALPY_AT_ENTROPY(0.05; 6.8)", "2072.98783"},
         kFirst},
        kPressureEntropy, explain_ps),
    row_with_batch<dryness_at_entropy,
                   columns<Fraction, Pressure, Entropy, water::batch::dryness_at_entropy>>(
        {"STEAM_DRYNESS_AT_ENTROPY",
         kChapter,
         "Dryness at a pressure and an entropy",
         "#N/A outside the two-phase region; WHY then tells the superheat or subcooling.",
         "Dryness, 0 to 1",
         kSteamTables,
         {"STEAM_DRYNESS_AT_ENTROPY(0.05; 6.8)", "0.798688702"},
         kFirst},
        kPressureEntropy, explain_ps),

    row_with_batch<saturation_temperature,
                   column<Temperature, Pressure, water::batch::saturation_temperature>>(
        {"SATURATION_TEMPERATURE",
         kChapter,
         "Boiling temperature at a pressure",
         "",
         "Temperature",
         kSaturation,
         {"SATURATION_TEMPERATURE(10)", "179.885632"},
         kFirst},
        kSaturationPressure, explain_saturation),
    row_with_batch<saturation_pressure,
                   column<Pressure, Temperature, water::batch::saturation_pressure>>(
        {"SATURATION_PRESSURE",
         kChapter,
         "Boiling pressure at a temperature",
         "",
         "Absolute pressure",
         kSaturation,
         {"SATURATION_PRESSURE(226.85)", "26.3889776"},
         kFirst},
        kSaturationTemperature, explain_saturation),
};

}  // namespace

std::span<const Row> steam() { return kRows; }

}  // namespace busbar::functions
