// Water and steam from further pairs of properties, saturation by enthalpy or entropy, and
// metastable vapour.
#include "catalogue/sentence.hpp"
#include "functions/functions.hpp"
#include "functions/steam_arguments.hpp"
#include "water/pairs.hpp"
#include "water/properties/metastable.hpp"
#include "water/stream.hpp"

namespace busbar::functions {
namespace {

using water::State;
using OptionalFlow = std::optional<Flow>;

Outcome<Stream> as_stream(const Outcome<State>& state, OptionalFlow flow) {
  if (!state) return state.failure();
  return water::stream_of(*state, flow ? std::optional<double>(flow->si) : std::nullopt);
}

using Pair = Outcome<State> (*)(double, double);

template <Pair kPair, class First, class Second>
Outcome<Stream> steam_at(First first, Second second, OptionalFlow flow) {
  return as_stream(kPair(first.si, second.si), flow);
}

using Single = Outcome<State> (*)(double);

template <Single kSingle, class First>
Outcome<Stream> saturated_at(First first, OptionalFlow flow) {
  return as_stream(kSingle(first.si), flow);
}

template <class Q, double water::Properties::*Member>
Outcome<Q> metastable(Pressure p, Temperature t) {
  const Outcome<water::Metastable> at = water::metastable_vapour(p.si, t.si);
  if (!at) return at.failure();
  return Q{at->properties.*Member};
}

template <class Q, double water::Response::*Member>
Outcome<Q> metastable_response(Pressure p, Temperature t) {
  const Outcome<water::Metastable> at = water::metastable_vapour(p.si, t.si);
  if (!at) return at.failure();
  return Q{at->response.*Member};
}

void explain_metastable(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const Outcome<double> saturation = water::saturation_temperature(in[0].si);
  if (!saturation) return;
  text += " Metastable vapour, IAPWS R7-97(2012), equation 18, ";
  append_measure(text, {*saturation - in[1].si, Quantity::temperature_difference}, units);
  text += " below saturation: no equilibrium state.";
}

// --- Rows ------------------------------------------------------------------------------------

constexpr Argument kVolumeArgument{"volume", "Specific volume", kAboveZero, kNoLimit};
constexpr Argument kEnergyArgument{
    "internal energy", "Specific internal energy, zero in the liquid at the triple point", -1e4,
    8e6};
constexpr Argument kSaturatedTemperature{"temperature", "Temperature of the wet or saturated fluid",
                                         273.15, 647.096, "the end of the saturation line"};
constexpr Argument kMetastablePressure{"pressure", "Absolute pressure, never gauge", 611.657, 10e6,
                                       "the limit of the equation for metastable vapour"};

constexpr Argument kEnthalpyEntropy[] = {kEnthalpyArgument, kEntropyArgument, kFlowArgument};
constexpr Argument kPressureVolume[] = {kPressureArgument, kVolumeArgument, kFlowArgument};
constexpr Argument kPressureEnergy[] = {kPressureArgument, kEnergyArgument, kFlowArgument};
constexpr Argument kTemperatureDryness[] = {kSaturatedTemperature, kDrynessArgument, kFlowArgument};
constexpr Argument kTemperatureVolume[] = {kTemperatureArgument, kVolumeArgument, kFlowArgument};
constexpr Argument kTemperatureEntropy[] = {kTemperatureArgument, kEntropyArgument, kFlowArgument};
constexpr Argument kTemperatureEnthalpy[] = {kTemperatureArgument, kEnthalpyArgument,
                                             kFlowArgument};
constexpr Argument kVolumeEnergy[] = {kVolumeArgument, kEnergyArgument, kFlowArgument};
constexpr Argument kEnthalpy[] = {kEnthalpyArgument, kFlowArgument};
constexpr Argument kEntropy[] = {kEntropyArgument, kFlowArgument};
constexpr Argument kMetastable[] = {
    kMetastablePressure,
    {"temperature", "Temperature of the vapour, not above saturation", 273.15, 647.096,
     "the end of the saturation line"}};

constexpr Source kBackwardHs{
    "IAPWS R7-97(2012), started by IAPWS SR2-01(2014) and SR4-04(2014)",
    "2012; supplementary releases of 2001 and 2004, revised 2014",
    "basic equations 7, 15, 28, 30 to 32; start: SR2-01 equations 1 to 5, SR4-04 equations 1 to 9"};
constexpr Source kMetastableSource{kIf97, kIf97Edition,
                                   "section 6.2, equations 18 and 19, tables 10 and 16"};

constexpr const char* kStreamResult = "A stream: one line of text that other functions take";
constexpr const char* kExact =
    "Exact to 1e-10 against the basic equations. At the seams between regions, where the "
    "formulation "
    "has gaps, the state stays on the boundary and the given values are kept.";
constexpr const char* kNeverUnasked =
    "Steam that should have begun to condense and has not yet, down to 5 % equilibrium moisture "
    "and "
    "from 611.657 Pa to 100 bar. No other function answers with it, and no stream carries it.";

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, "Further pairs", summary, notes, result, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<steam_at<water::at_enthalpy_and_entropy, Enthalpy, Entropy>>(
        words("STEAM_AT_ENTHALPY_ENTROPY", "Stream of water or steam at an enthalpy and an entropy",
              kExact, kStreamResult, kBackwardHs,
              {"STEAM_AT_ENTHALPY_ENTROPY(2800; 6.5)", "steam 13.7101 bar, 198.214 °C"}),
        kEnthalpyEntropy, explain_result),
    row<steam_at<water::at_pressure_volume, Pressure, Volume>>(
        words(
            "STEAM_AT_VOLUME", "Stream of water or steam at a pressure and a specific volume",
            "Cold water around its greatest density (4 °C) has two temperatures for one volume and "
            "is refused there.",
            kStreamResult, kSteamTables, {"STEAM_AT_VOLUME(10; 0.2)", "steam 10 bar, 189.449 °C"}),
        kPressureVolume, explain_result),
    row<steam_at<water::at_pressure_internal_energy, Pressure, SpecificEnergy>>(
        words("STEAM_AT_INTERNAL_ENERGY",
              "Stream of water or steam at a pressure and an internal energy", kExact,
              kStreamResult, kSteamTables,
              {"STEAM_AT_INTERNAL_ENERGY(10; 2000)", "wet steam 10 bar, dryness 0.68001"}),
        kPressureEnergy, explain_result),
    row<steam_at<water::at_temperature_dryness, Temperature, Fraction>>(
        words("STEAM_AT_TEMPERATURE_DRYNESS",
              "Stream of wet steam, boiling water (0) or saturated steam (1) at a temperature", "",
              kStreamResult, kSteamTables,
              {"STEAM_AT_TEMPERATURE_DRYNESS(100; 1)", "wet steam 1.01418 bar, dryness 1"}),
        kTemperatureDryness, explain_result),
    row<steam_at<water::at_temperature_volume, Temperature, Volume>>(
        words("STEAM_AT_TEMPERATURE_VOLUME",
              "Stream of water or steam at a temperature and a specific volume", kExact,
              kStreamResult, kSteamTables,
              {"STEAM_AT_TEMPERATURE_VOLUME(100; 0.8)", "wet steam 1.01418 bar, dryness 0.478183"}),
        kTemperatureVolume, explain_result),
    row<steam_at<water::at_temperature_entropy, Temperature, Entropy>>(
        words("STEAM_AT_TEMPERATURE_ENTROPY",
              "Stream of water or steam at a temperature and an entropy",
              "Cold water below 4 °C can have one entropy at two pressures and is refused there.",
              kStreamResult, kSteamTables,
              {"STEAM_AT_TEMPERATURE_ENTROPY(300; 6.5)", "steam 32.1539 bar, 300 °C"}),
        kTemperatureEntropy, explain_result),
    row<steam_at<water::at_temperature_enthalpy, Temperature, Enthalpy>>(
        words("STEAM_AT_TEMPERATURE_ENTHALPY",
              "Stream of water or steam at a temperature and an enthalpy, where one state has them",
              "Boiling and compressed water often share an enthalpy at one temperature: then there "
              "is "
              "an error that says so, and no choice is made.",
              kStreamResult, kSteamTables,
              {"STEAM_AT_TEMPERATURE_ENTHALPY(300; 2900)", "steam 56.5214 bar, 300 °C"}),
        kTemperatureEnthalpy, explain_result),
    row<steam_at<water::at_volume_internal_energy, Volume, SpecificEnergy>>(
        words("STEAM_AT_VOLUME_INTERNAL_ENERGY",
              "Stream of water or steam at a specific volume and an internal energy",
              "What a closed vessel holds after heating or cooling.", kStreamResult, kSteamTables,
              {"STEAM_AT_VOLUME_INTERNAL_ENERGY(0.1; 2500)",
               "wet steam 18.7556 bar, dryness 0.942508"}),
        kVolumeEnergy, explain_result),
    row<saturated_at<water::saturated_at_enthalpy, Enthalpy>>(
        words("SATURATED_AT_ENTHALPY", "Boiling water or saturated steam with an enthalpy",
              "Saturated steam has the enthalpies from 2500.9 to 2803.3 kJ/kg at two pressures and "
              "is "
              "refused there.",
              kStreamResult, kSteamTables,
              {"SATURATED_AT_ENTHALPY(1000)", "wet steam 29.0513 bar, dryness 0"}),
        kEnthalpy, explain_result),
    row<saturated_at<water::saturated_at_entropy, Entropy>>(
        words("SATURATED_AT_ENTROPY", "Boiling water or saturated steam with an entropy", "",
              kStreamResult, kSteamTables,
              {"SATURATED_AT_ENTROPY(6.5)", "wet steam 12.7669 bar, dryness 1"}),
        kEntropy, explain_result),
    row<metastable<Volume, &water::Properties::volume>>(
        words("METASTABLE_STEAM_VOLUME",
              "Specific volume of vapour below its saturation temperature", kNeverUnasked,
              "Specific volume", kMetastableSource,
              {"METASTABLE_STEAM_VOLUME(10; 176.85)", "0.192516540"}),
        kMetastable, explain_metastable),
    row<metastable<Enthalpy, &water::Properties::enthalpy>>(
        words("METASTABLE_STEAM_ENTHALPY",
              "Specific enthalpy of vapour below its saturation temperature", kNeverUnasked,
              "Specific enthalpy", kMetastableSource,
              {"METASTABLE_STEAM_ENTHALPY(10; 176.85)", "2768.81115"}),
        kMetastable, explain_metastable),
    row<metastable<Entropy, &water::Properties::entropy>>(
        words("METASTABLE_STEAM_ENTROPY",
              "Specific entropy of vapour below its saturation temperature", kNeverUnasked,
              "Specific entropy", kMetastableSource,
              {"METASTABLE_STEAM_ENTROPY(10; 176.85)", "6.56660377"}),
        kMetastable, explain_metastable),
    row<metastable_response<HeatCapacity, &water::Response::isobaric_heat_capacity>>(
        words("METASTABLE_STEAM_HEAT_CAPACITY",
              "Isobaric heat capacity of vapour below its saturation temperature", kNeverUnasked,
              "Specific heat capacity at constant pressure", kMetastableSource,
              {"METASTABLE_STEAM_HEAT_CAPACITY(10; 176.85)", "2.76349265"}),
        kMetastable, explain_metastable),
    row<metastable_response<Velocity, &water::Response::speed_of_sound>>(
        words("METASTABLE_STEAM_SPEED_OF_SOUND",
              "Speed of sound in vapour below its saturation temperature", kNeverUnasked,
              "Velocity", kMetastableSource,
              {"METASTABLE_STEAM_SPEED_OF_SOUND(10; 176.85)", "498.408101"}),
        kMetastable, explain_metastable),
};

}  // namespace

std::span<const Row> steam_pairs() { return kRows; }

}  // namespace busbar::functions
