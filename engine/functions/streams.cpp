// Streams: readers, the table, flow and tag, mixing and splitting.
#include <cmath>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "fluid/join.hpp"
#include "fluid/properties.hpp"
#include "functions/describe.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"
#include "machine/balance.hpp"

namespace busbar::functions {
namespace {

using fluid::State;

// --- Readers ---------------------------------------------------------------------------------

Outcome<Pressure> pressure_of(const Stream& stream) { return Pressure{stream.pressure}; }
Outcome<Temperature> temperature_of(const Stream& stream) {
  return Temperature{stream.temperature};
}
Outcome<Enthalpy> enthalpy_of(const Stream& stream, const Options& options) {
  const Outcome<double> h = fluid::shown_enthalpy(stream, options.datum.value_or(stream.datum));
  if (!h) return h.failure();
  return Enthalpy{*h};
}

Outcome<Entropy> entropy_of(const Stream& stream) {
  const Outcome<State> state = fluid::state_of(stream);
  if (!state) return state.failure();
  return Entropy{state->entropy};
}

Outcome<Volume> volume_of(const Stream& stream) {
  const Outcome<State> state = fluid::state_of(stream);
  if (!state) return state.failure();
  return Volume{state->volume};
}

Outcome<Density> density_of(const Stream& stream) {
  const Outcome<State> state = fluid::state_of(stream);
  if (!state) return state.failure();
  return Density{1 / state->volume};
}

Outcome<Flow> flow_of(const Stream& stream) {
  if (!stream.flow) return Failure{Fault::missing, 1, "carries no flow; SET_FLOW gives it one"};
  return Flow{*stream.flow};
}

Outcome<Fraction> dryness_of(const Stream& stream) {
  if (stream.phase == Phase::two_phase) return Fraction{stream.dryness};
  if (fluid::is_gas(stream)) {
    return Failure{Fault::missing, 1, "is a gas: there is no dryness"};
  }
  const Outcome<State> state = fluid::state_of(stream);
  if (!state) return state.failure();
  return no_dryness(*state, 1);
}

// --- Table -----------------------------------------------------------------------------------

Outcome<Grid> stream_table(Streams streams, const Options& options) {
  const UnitSet units = options.units;
  constexpr std::size_t kColumns = 8;
  Grid table(streams.size() + 1, kColumns);
  table.at(0, 0) = std::string("tag");
  table.at(0, 1) = heading("flow", Quantity::flow, units);
  table.at(0, 2) = heading("pressure", Quantity::pressure, units);
  table.at(0, 3) = heading("temperature", Quantity::temperature, units);
  table.at(0, 4) = heading("enthalpy", Quantity::enthalpy, units);
  table.at(0, 5) = heading("entropy", Quantity::entropy, units);
  table.at(0, 6) = heading("volume", Quantity::volume, units);
  table.at(0, 7) = std::string("dryness");
  for (std::size_t i = 0; i < streams.size(); ++i) {
    const Stream& stream = streams[i];
    const Outcome<State> state = fluid::state_of(stream);
    if (!state) return state.failure().about(1);
    const std::size_t r = i + 1;
    const auto put = [&](std::size_t column, double si, Quantity quantity) {
      table.at(r, column) = unit_of(units, quantity).from_si(si);
    };
    table.at(r, 0) = std::string(stream.tag.text());
    table.at(r, 1) = std::string();
    if (stream.flow) put(1, *stream.flow, Quantity::flow);
    put(2, stream.pressure, Quantity::pressure);
    put(3, stream.temperature, Quantity::temperature);
    const Outcome<double> h = fluid::shown_enthalpy(stream, options.datum.value_or(stream.datum));
    if (!h) return h.failure().about(1);
    put(4, *h, Quantity::enthalpy);
    put(5, state->entropy, Quantity::entropy);
    put(6, state->volume, Quantity::volume);
    table.at(r, 7) = std::string();
    if (stream.phase == Phase::two_phase) table.at(r, 7) = stream.dryness;
  }
  return table;
}

// --- Flow and tag ----------------------------------------------------------------------------

Outcome<Stream> set_flow(const Stream& stream, Flow flow) {
  Stream changed = stream;
  changed.flow = flow.si;
  return changed;
}

Outcome<Stream> tagged(const Stream& stream, Word word) {
  const Outcome<Tag> tag = Tag::from(word);
  if (!tag) return tag.failure().about(2);
  Stream changed = stream;
  changed.tag = *tag;
  return changed;
}

// --- Mixing and splitting --------------------------------------------------------------------

Outcome<Stream> mix_out(Streams streams) { return machine::mix_out(streams); }

Outcome<Stream> split_out(const Stream& stream, Fraction fraction) {
  return machine::split_out(stream, fraction.si);
}

Outcome<Stream> spray_out(const Stream& steam, const Stream& water, Temperature outlet) {
  return machine::spray_out(steam, water, outlet.si);
}

void explain_mix(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  double least = result.stream->pressure;
  double most = least;
  for (const Stream& stream : in[0].streams()) {
    least = std::min(least, stream.pressure);
    most = std::max(most, stream.pressure);
  }
  if (most > least) {
    text += " The pressures differ, from ";
    append_measure(text, {least, Quantity::pressure}, units);
    text += " to ";
    append_measure(text, {most, Quantity::pressure}, units);
    text += "; the mixture is at the lowest.";
  }
  explain_result(in, result, units, text);
}

void explain_spray(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  text += " Spray flow ";
  append_measure(text, {*result.stream->flow - *in[0].stream->flow, Quantity::flow}, units);
  text += '.';
  if (in[1].stream->flow) text += " The flow that the water carries is not used.";
  explain_result(in, result, units, text);
}

// --- Rows ------------------------------------------------------------------------------------

constexpr const char* kChapter = "Streams";
constexpr const char* kStreamResult = "A stream";
constexpr const char* kDatumNote =
    "Water and steam: zero near the triple point, as the steam tables have it. A gas: on the datum "
    "that the stream carries, with heats of formation unless GAS or AIR was given another; the "
    "option datum=0 °C (15 °C, 25 °C, formation) shows it on another. Never add the two.";
constexpr Source kText{"Busbar", "stream text, format 1", "carried exactly by the stream"};
constexpr Source kBalance{"Conservation of mass and energy in a steady adiabatic mixing chamber",
                          "Moran and Shapiro, Fundamentals of Engineering Thermodynamics",
                          "sections 4.1 to 4.5"};

constexpr Argument kStream[] = {{"stream", "A cell with a stream"}};
constexpr Argument kStreams[] = {{"streams", "A range whose cells all hold streams"}};
constexpr Argument kStreamFlow[] = {
    {"stream", "A cell with a stream"},
    {"flow", "Mass flow; zero is taken here, and here only", 0, 1e6}};
constexpr Argument kStreamTag[] = {
    {"stream", "A cell with a stream"},
    {"tag", "Plant code or short name of up to 40 bytes, without brackets and colons"}};
constexpr Argument kStreamFraction[] = {
    {"stream", "A cell with a stream that carries a flow"},
    {"fraction", "Share of the flow that leaves on this side", kAboveZero, 1}};
constexpr Argument kSpray[] = {
    {"steam", "Steam before the spray, with its flow"},
    {"water", "Spray water; its flow is found, and one that it carries is not used"},
    {"outlet temperature", "Temperature after the spray, above saturation", 273.15, 2273.15}};

constexpr const char* kStateNote =
    "Found from the pressure and the enthalpy (or dryness) that the stream carries exactly.";

constexpr Row kRows[] = {
    row<pressure_of>({"PRESSURE_OF",
                      kChapter,
                      "Pressure of a stream",
                      "",
                      "Absolute pressure",
                      kText,
                      {"PRESSURE_OF(STEAM(100; 540))", "100"},
                      kFirst},
                     kStream, explain_first),
    row<temperature_of>({"TEMPERATURE_OF",
                         kChapter,
                         "Temperature of a stream",
                         "",
                         "Temperature",
                         kText,
                         {"TEMPERATURE_OF(STEAM(100; 540))", "540"},
                         kFirst},
                        kStream, explain_first),
    row<enthalpy_of>({"ENTHALPY_OF",
                      kChapter,
                      "Specific enthalpy of a stream",
                      kDatumNote,
                      "Specific enthalpy",
                      kText,
                      {"ENTHALPY_OF(STEAM(30; 26.85))", "115.331273"},
                      kFirst},
                     kStream, explain_first),
    row<entropy_of>({"ENTROPY_OF",
                     kChapter,
                     "Specific entropy of a stream",
                     kStateNote,
                     "Specific entropy",
                     kSteamTables,
                     {"ENTROPY_OF(STEAM(30; 26.85))", "0.392294792"},
                     kFirst},
                    kStream, explain_first),
    row<volume_of>({"VOLUME_OF",
                    kChapter,
                    "Specific volume of a stream",
                    kStateNote,
                    "Specific volume",
                    kSteamTables,
                    {"VOLUME_OF(STEAM(30; 26.85))", "0.00100215168"},
                    kFirst},
                   kStream, explain_first),
    row<density_of>({"DENSITY_OF",
                     kChapter,
                     "Density of a stream",
                     kStateNote,
                     "Density",
                     kSteamTables,
                     {"DENSITY_OF(STEAM(30; 26.85))", "997.85294"},
                     kFirst},
                    kStream, explain_first),
    row<flow_of>({"FLOW_OF",
                  kChapter,
                  "Mass flow of a stream",
                  "#N/A when the stream carries none.",
                  "Mass flow",
                  kText,
                  {"FLOW_OF(STEAM(100; 540; 55))", "55"},
                  kFirst},
                 kStream, explain_first),
    row<dryness_of>({"DRYNESS_OF",
                     kChapter,
                     "Dryness of a wet stream",
                     "#N/A outside the two-phase region; WHY then tells the superheat or "
                     "subcooling.",
                     "Dryness, 0 to 1",
                     kText,
                     {"DRYNESS_OF(STEAM_AT_DRYNESS(0.05; 0.88))", "0.88"},
                     kFirst},
                    kStream, explain_first),
    row<stream_table>(
        {"STREAM_TABLE",
         kChapter,
         "Labelled table of all properties of a range of streams",
         "Enter it as an array formula: one heading row, then one row for each stream, read row by "
         "row. Columns: tag, flow, pressure, temperature, enthalpy, entropy, volume, dryness.",
         "A table with units in its headings",
         kSteamTables,
         {"INDEX(STREAM_TABLE(B2:B3); 3; 3)", "20", "B2=STEAM(100; 540) | B3=STEAM(20; 300)"},
         kFirst},
        kStreams),
    row<set_flow>({"SET_FLOW",
                   kChapter,
                   "The same stream with another flow",
                   "The way to give a flow to a stream that carries none, and to mean zero.",
                   kStreamResult,
                   kText,
                   {"SET_FLOW(STEAM(100; 540); 60)", "steam 60 kg/s, 100 bar, 540 °C"},
                   kFirst},
                  kStreamFlow, explain_result),
    row<tagged>({"TAGGED",
                 kChapter,
                 "The same stream with a plant code or name",
                 "The tag travels through devices and appears in WHY.",
                 kStreamResult,
                 kText,
                 {"TAGGED(STEAM(100; 540); \"LBA10\")", "LBA10: steam 100 bar, 540 °C"},
                 kFirst},
                kStreamTag, explain_result),
    row<mix_out>({"MIX_OUT",
                  kChapter,
                  "Stream that leaves an adiabatic mixing of streams",
                  "Each stream needs a flow. The outlet is at the lowest of their pressures. The "
                  "tag stays where all tags are the same. Steam and water that join a gas become "
                  "part of it as vapour, their enthalpy brought to its datum; more water than the "
                  "gas can hold as vapour is refused.",
                  kStreamResult,
                  kBalance,
                  {"FLOW_OF(MIX_OUT(B2:B3))", "8", "B2=STEAM(10; 300; 5) | B3=STEAM(10; 200; 3)"},
                  kFirst},
                 kStreams, explain_mix),
    row<split_out>({"SPLIT_OUT",
                    kChapter,
                    "A share of a stream, in the same state",
                    "Needs a flow. The other side is 1 minus the fraction.",
                    kStreamResult,
                    kBalance,
                    {"SPLIT_OUT(STEAM(100; 540; 50); 0.2)", "steam 10 kg/s, 100 bar, 540 °C"},
                    kFirst},
                   kStreamFraction, explain_result),
    row<spray_out>(
        {"SPRAY_OUT",
         kChapter,
         "Steam after a spray attemperator; the spray flow is found",
         "The outlet keeps the pressure of the steam and must stay superheated. Spray flow = "
         "FLOW_OF(outlet) - FLOW_OF(steam). For appraisal only, never to set a control.",
         kStreamResult,
         kBalance,
         {"SPRAY_OUT(STEAM(100; 560; 50); STEAM(130; 160); 540)",
          "steam 50.8953 kg/s, 100 bar, 540 °C"},
         kFirst},
        kSpray, explain_spray),
};

}  // namespace

std::span<const Row> streams() { return kRows; }

}  // namespace busbar::functions
