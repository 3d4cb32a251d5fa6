#include "functions/describe.hpp"

#include <cmath>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "fluid/state.hpp"
#include "gas/properties.hpp"
#include "water/describe.hpp"

namespace busbar::functions {
namespace {

// A temperature reading and a pressure reading together seldom place a state closer to saturation
// than this (common practice, no source).
constexpr double kInstrumentReach = 2;
constexpr int kFractionDigits = 4;

// Limits of R7-97(2012), section 2.
constexpr double kLeast = 273.15;
constexpr double kMiddle = 1073.15;
constexpr double kMost = 2273.15;

}  // namespace

std::string heading(std::string_view name, Quantity quantity, UnitSet units) {
  std::string text(name);
  text += ", ";
  text += unit_of(units, quantity).symbol;
  return text;
}

void append_validity(std::string& text, UnitSet units) {
  text += " IAPWS-IF97 holds from ";
  append_measure(text, {kLeast, Quantity::temperature}, units);
  text += " to ";
  append_measure(text, {kMiddle, Quantity::temperature}, units);
  text += " up to ";
  append_measure(text, {100e6, Quantity::pressure}, units);
  text += ", and to ";
  append_measure(text, {kMost, Quantity::temperature}, units);
  text += " up to ";
  append_measure(text, {50e6, Quantity::pressure}, units);
  text += '.';
}

namespace {

void append_distance(std::string& text, const water::Neighbourhood& near, UnitSet units) {
  const double distance = std::abs(near.distance);
  append_measure(text, {distance, Quantity::temperature_difference}, units);
  text += near.distance > 0 ? " above" : " below";
  text += " saturation";
  if (distance >= kInstrumentReach) return;
  text +=
      ", within the reach of instruments: pressure and temperature readings cannot tell this state "
      "from a wet one";
}

// "Gas of 28.6 kg/kmol: 74.3 % N2, 12 % O2, ... by mole; ..."
void describe_gas(std::string& text, const Stream& stream, UnitSet units) {
  const gas::Mixture& mixture = stream.mixture;
  text += " Ideal gas of molar mass ";
  append_measure(text, {mixture.molar_mass(), Quantity::molar_mass}, units);
  text += ", by mole";
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    text += i == 0 ? " " : ", ";
    append_number(text, mixture.mole_fraction(i) * 100, kFractionDigits);
    text += " % ";
    text += gas::name_of(mixture.species(i));
  }
  text += "; readers show its enthalpy ";
  if (stream.datum == gas::Datum::formation) {
    text += "with heats of formation.";
  } else {
    text += "as zero at ";
    text += gas::name_of(stream.datum);
    text += '.';
  }
}

// Where the equations of the fluid hold.
void append_validity_of(std::string& text, const Stream& stream, UnitSet units) {
  if (!fluid::is_gas(stream)) return append_validity(text, units);
  text += " The NASA polynomials hold from ";
  append_measure(text, {gas::lowest_temperature(stream.mixture), Quantity::temperature}, units);
  text += " to ";
  append_measure(text, {gas::highest_temperature(stream.mixture), Quantity::temperature}, units);
  text += '.';
}

void append_stream(std::string& text, const char* which, const Stream& stream, UnitSet units) {
  text += which;
  describe_stream(text, stream, units);
}

}  // namespace

void describe_state(std::string& text, const water::State& state, UnitSet units) {
  text += " State in ";
  text += water::region_name(state.region);
  text += ", ";
  text += water::equation(state.region);
  if (state.region == water::Region::two_phase) {
    text += ", dryness ";
    append_number(text, state.dryness, 6);
  } else if (const auto near = water::neighbourhood(state); near.has_saturation) {
    text += ", ";
    append_distance(text, near, units);
  }
  text += '.';
}

void describe_stream(std::string& text, const Stream& stream, UnitSet units) {
  if (!stream.tag.empty()) {
    text += ' ';
    text += stream.tag.text();
    text += ':';
  }
  if (fluid::is_gas(stream)) return describe_gas(text, stream, units);
  if (const auto state = fluid::state_of(stream)) describe_state(text, *state, units);
}

Failure no_dryness(const water::State& state, std::uint8_t argument) {
  const auto near = water::neighbourhood(state);
  const bool of_stream = argument > 0;
  if (!near.has_saturation) {
    return {Fault::missing, argument,
            of_stream
                ? "is above the critical pressure or temperature, where there is no dryness"
                : "the state is above the critical pressure or temperature, where there is no "
                  "dryness"};
  }
  const Measure distance{std::abs(near.distance), Quantity::temperature_difference};
  const char* superheated = of_stream ? "is superheated by {0}: there is no dryness"
                                      : "the state is superheated by {0}: there is no dryness";
  const char* subcooled = of_stream ? "is subcooled by {0}: there is no dryness"
                                    : "the state is subcooled by {0}: there is no dryness";
  return {Fault::missing, argument, near.distance > 0 ? superheated : subcooled, {{distance}}};
}

void explain_result(const Slot*, const Result& result, UnitSet units, std::string& text) {
  describe_stream(text, *result.stream, units);
  append_validity_of(text, *result.stream, units);
}

void explain_first(const Slot* in, const Result&, UnitSet units, std::string& text) {
  describe_stream(text, *in[0].stream, units);
  append_validity_of(text, *in[0].stream, units);
}

void explain_first_and_second(const Slot* in, const Result&, UnitSet units, std::string& text) {
  append_stream(text, " Inlet:", *in[0].stream, units);
  append_stream(text, " Outlet:", *in[1].stream, units);
  append_validity_of(text, *in[0].stream, units);
}

}  // namespace busbar::functions
