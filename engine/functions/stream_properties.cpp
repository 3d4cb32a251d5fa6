// Readers of streams for every property, the table of all of them, and exergy.
#include <string>

#include "fluid/properties.hpp"
#include "fluid/separation.hpp"
#include "functions/functions.hpp"
#include "functions/steam_arguments.hpp"

namespace busbar::functions {
namespace {

using fluid::PropertyOf;
using fluid::State;

// --- Readers ---------------------------------------------------------------------------------

template <class Q, PropertyOf kProperty>
Outcome<Q> read(const Stream& stream) {
  const Outcome<State> state = fluid::state_of(stream);
  if (!state) return state.failure();
  const Outcome<double> value = kProperty(stream, *state);
  if (!value) return value.failure().about(1);
  return Q{*value};
}

// --- Exergy ----------------------------------------------------------------------------------

Outcome<SpecificEnergy> specific_exergy(const Stream& stream, Pressure dead_pressure,
                                        Temperature dead_temperature) {
  const Outcome<double> value =
      fluid::specific_exergy(stream, dead_pressure.si, dead_temperature.si);
  if (!value) return value.failure();
  return SpecificEnergy{*value};
}

Outcome<Power> exergy_flow(const Stream& stream, Pressure dead_pressure,
                           Temperature dead_temperature) {
  if (!stream.flow) return Failure{Fault::missing, 1, "carries no flow; SET_FLOW gives it one"};
  const Outcome<SpecificEnergy> value = specific_exergy(stream, dead_pressure, dead_temperature);
  if (!value) return value.failure();
  return Power{*stream.flow * value->si};
}

// --- Table -----------------------------------------------------------------------------------

Outcome<double> dryness(const Stream& stream, const State& state) {
  if (fluid::is_gas(stream)) return Failure{Fault::missing, 1, "is a gas: there is no dryness"};
  if (state.region != water::Region::two_phase) return no_dryness(state, 1);
  return state.dryness;
}

struct Entry {
  const char* name;
  Quantity quantity;
  PropertyOf property;
};

// The order is that of the table for ever: formulas count its rows.
constexpr Entry kEntries[] = {
    {"pressure", Quantity::pressure, fluid::pressure},
    {"temperature", Quantity::temperature, fluid::temperature},
    {"specific volume", Quantity::volume, fluid::volume},
    {"density", Quantity::density, fluid::density},
    {"specific enthalpy", Quantity::enthalpy, fluid::enthalpy},
    {"specific entropy", Quantity::entropy, fluid::entropy},
    {"specific internal energy", Quantity::specific_energy, fluid::internal_energy},
    {"specific Helmholtz energy", Quantity::specific_energy, fluid::helmholtz_energy},
    {"specific Gibbs energy", Quantity::specific_energy, fluid::gibbs_energy},
    {"dryness", Quantity::fraction, dryness},
    {"superheat", Quantity::temperature_difference, fluid::superheat},
    {"subcooling", Quantity::temperature_difference, fluid::subcooling},
    {"isobaric heat capacity", Quantity::heat_capacity, fluid::isobaric_heat_capacity},
    {"isochoric heat capacity", Quantity::heat_capacity, fluid::isochoric_heat_capacity},
    {"speed of sound", Quantity::velocity, fluid::speed_of_sound},
    {"isentropic exponent", Quantity::number, fluid::isentropic_exponent},
    {"Joule-Thomson coefficient", Quantity::joule_thomson, fluid::joule_thomson},
    {"isobaric expansion", Quantity::thermal_expansion, fluid::isobaric_expansion},
    {"isothermal compressibility", Quantity::compressibility, fluid::isothermal_compressibility},
    {"dynamic viscosity", Quantity::viscosity, fluid::viscosity},
    {"thermal conductivity", Quantity::thermal_conductivity, fluid::thermal_conductivity},
    {"Prandtl number", Quantity::number, fluid::prandtl_number},
    {"surface tension", Quantity::surface_tension, fluid::surface_tension},
};

// As in STREAM_TABLE, an empty text stands for what the state does not have; the reader of that
// property says why.
Outcome<Grid> properties_of(const Stream& stream, UnitSet units) {
  const Outcome<State> state = fluid::state_of(stream);
  if (!state) return state.failure();
  Grid table(std::size(kEntries), 3);
  std::size_t r = 0;
  for (const Entry& entry : kEntries) {
    const Unit& unit = unit_of(units, entry.quantity);
    const Outcome<double> value = entry.property(stream, *state);
    table.at(r, 0) = std::string(entry.name);
    table.at(r, 1) = std::string();
    if (value) table.at(r, 1) = unit.from_si(*value);
    table.at(r, 2) = std::string(unit.symbol);
    ++r;
  }
  return table;
}

// --- Rows ------------------------------------------------------------------------------------

constexpr Argument kStream[] = {{"stream", "A cell with a stream"}};
constexpr Argument kExergy[] = {
    {"stream", "A cell with a stream"},
    {"dead state pressure", "Absolute pressure of the dead state, such as that of the ambient air",
     kAboveZero, 100e6, kIf97Limit},
    {"dead state temperature", "Temperature of the dead state, such as that of the ambient air",
     273.15, 2273.15, kIf97Limit}};

constexpr Source kAll{"IAPWS R7-97(2012), AN3-07(2018), R12-08, R15-11, R1-76(2014)",
                      "2012, 2018, 2008, 2011, 2014", "each property as its own function says"};
constexpr Source kExergySource{"Definition of flow exergy; states by IAPWS R7-97(2012)",
                               "Moran and Shapiro, Fundamentals of Engineering Thermodynamics",
                               "section 7.3: h - h0 - T0 (s - s0)"};

constexpr const char* kPhaseNote =
    "Boiling water (dryness 0) and saturated steam (dryness 1) answer; a mixture of the two has no "
    "such property: #N/A. A gas is ideal.";
constexpr const char* kWetNote =
    "Wet steam has it too: the mean of its phases by mass. A gas: on the datum of the stream, see "
    "ENTHALPY_OF.";
constexpr const char* kExergyNote =
    "Thermo-mechanical: against the same fluid in the dead state, without kinetic, potential and "
    "chemical exergy. A gas keeps its composition; where its dew point is above the dead state, "
    "part of its water is liquid there. The dead state has no default: it changes the answer.";

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, "Stream properties", summary, notes, result, source, example, kFirst};
}

template <class Q, PropertyOf kProperty>
consteval Row reader(const Words& words) {
  return row<read<Q, kProperty>>(words, kStream, explain_first);
}

constexpr Row kRows[] = {
    reader<SpecificEnergy, fluid::internal_energy>(
        words("INTERNAL_ENERGY_OF", "Specific internal energy of a stream", kWetNote,
              "Specific internal energy, zero in the liquid at the triple point", kEnergies,
              {"INTERNAL_ENERGY_OF(STEAM(30; 26.85))", "112.324818"})),
    reader<SpecificEnergy, fluid::helmholtz_energy>(
        words("HELMHOLTZ_ENERGY_OF", "Specific Helmholtz energy u - T s of a stream", kWetNote,
              "Specific Helmholtz (free) energy", kEnergies,
              {"HELMHOLTZ_ENERGY_OF(STEAM(30; 26.85))", "-5.36361974"})),
    reader<SpecificEnergy, fluid::gibbs_energy>(
        words("GIBBS_ENERGY_OF", "Specific Gibbs energy h - T s of a stream", kWetNote,
              "Specific Gibbs energy (free enthalpy)", kEnergies,
              {"GIBBS_ENERGY_OF(STEAM(30; 26.85))", "-2.35716470"})),
    reader<HeatCapacity, fluid::isobaric_heat_capacity>(
        words("HEAT_CAPACITY_OF", "Isobaric heat capacity cp of a stream", kPhaseNote,
              "Specific heat capacity at constant pressure", kDerivatives,
              {"HEAT_CAPACITY_OF(STEAM(30; 26.85))", "4.17301218"})),
    reader<HeatCapacity, fluid::isochoric_heat_capacity>(
        words("ISOCHORIC_HEAT_CAPACITY_OF", "Isochoric heat capacity cv of a stream", kPhaseNote,
              "Specific heat capacity at constant volume", kDerivatives,
              {"ISOCHORIC_HEAT_CAPACITY_OF(STEAM(200; 346.85))", "3.03793441"})),
    reader<Velocity, fluid::speed_of_sound>(
        words("SPEED_OF_SOUND_OF", "Speed of sound in a stream", kPhaseNote, "Velocity",
              kDerivatives, {"SPEED_OF_SOUND_OF(STEAM(30; 26.85))", "1507.73921"})),
    reader<Number, fluid::isentropic_exponent>(
        words("ISENTROPIC_EXPONENT_OF", "Isentropic exponent of p v^k = constant of a stream",
              kPhaseNote, "Isentropic exponent -(v/p)(dp/dv) at constant entropy", kDerivatives,
              {"ISENTROPIC_EXPONENT_OF(STEAM(0.035; 26.85))", "1.32481456"})),
    reader<JouleThomson, fluid::joule_thomson>(
        words("JOULE_THOMSON_COEFFICIENT_OF",
              "Temperature change per pressure change of a stream in throttling", kPhaseNote,
              "Joule-Thomson coefficient (dT/dp) at constant enthalpy", kDerivatives,
              {"JOULE_THOMSON_COEFFICIENT_OF(STEAM(3; 376.85))", "0.831291340"})),
    reader<ThermalExpansion, fluid::isobaric_expansion>(
        words("ISOBARIC_EXPANSION_OF", "Isobaric thermal expansion (1/v)(dv/dT) of a stream",
              kPhaseNote, "Thermal expansion coefficient", kDerivatives,
              {"ISOBARIC_EXPANSION_OF(STEAM(200; 346.85))", "0.00621449913"})),
    reader<Compressibility, fluid::isothermal_compressibility>(words(
        "ISOTHERMAL_COMPRESSIBILITY_OF", "Isothermal compressibility -(1/v)(dv/dp) of a stream",
        kPhaseNote, "Compressibility", kDerivatives,
        {"ISOTHERMAL_COMPRESSIBILITY_OF(STEAM(200; 346.85))", "0.000849501342"})),
    reader<TemperatureDifference, fluid::superheat>(
        words("SUPERHEAT_OF", "Degree of superheat of a stream",
              "#N/A for wet steam, for subcooled water, and where the pressure has no saturation "
              "temperature.",
              "Kelvins (or °F) above saturation", kSaturation,
              {"SUPERHEAT_OF(STEAM(10; 300))", "120.114368"})),
    reader<TemperatureDifference, fluid::subcooling>(
        words("SUBCOOLING_OF", "Degree of subcooling of a stream",
              "#N/A for wet steam, for superheated steam, and where the pressure has no saturation "
              "temperature.",
              "Kelvins (or °F) below saturation", kSaturation,
              {"SUBCOOLING_OF(STEAM(10; 150))", "29.8856324"})),
    reader<Viscosity, fluid::viscosity>(words("VISCOSITY_OF", "Dynamic viscosity of a stream",
                                              kPhaseNote, "Dynamic viscosity", kViscosityRelease,
                                              {"VISCOSITY_OF(STEAM(200; 346.85))", "70.9051068"})),
    reader<ThermalConductivity, fluid::thermal_conductivity>(
        words("THERMAL_CONDUCTIVITY_OF", "Thermal conductivity of a stream", kPhaseNote,
              "Thermal conductivity", kConductivityRelease,
              {"THERMAL_CONDUCTIVITY_OF(STEAM(200; 346.85))", "0.481485195"})),
    reader<Number, fluid::prandtl_number>(
        words("PRANDTL_NUMBER_OF", "Prandtl number of a stream", kPhaseNote, "Prandtl number",
              kPrandtlReleases, {"PRANDTL_NUMBER_OF(STEAM(200; 346.85))", "1.12425779"})),
    reader<SurfaceTension, fluid::surface_tension>(words(
        "SURFACE_TENSION_OF", "Surface tension between the phases of a wet stream",
        "Boiling water and saturated steam have it too; a single phase away from saturation has "
        "no surface: #N/A.",
        "Surface tension", kTensionRelease,
        {"SURFACE_TENSION_OF(STEAM_AT_TEMPERATURE_DRYNESS(100; 0.5))", "58.9118686"})),
    row<properties_of>(
        words(
            "PROPERTIES_OF",
            "Labelled table of all properties of a stream",
            "Enter it as an array formula of 23 rows and 3 columns: name, value, unit. Rows: "
            "pressure, temperature, volume, density, enthalpy, entropy, internal, Helmholtz and "
            "Gibbs energy, dryness, superheat, subcooling, heat capacities cp and cv, speed of "
            "sound, isentropic exponent, Joule-Thomson coefficient, isobaric expansion, isothermal "
            "compressibility, viscosity, thermal conductivity, Prandtl number, surface tension. "
            "Empty where the state has no such property; its own reader then says why.",
            "A table", kAll,
            {"INDEX(PROPERTIES_OF(B2); 13; 2)", "4.17301218", "B2=STEAM(30; 26.85)"}),
        kStream),
    row<specific_exergy>(
        words("SPECIFIC_EXERGY", "Specific flow exergy of a stream against a stated dead state",
              kExergyNote, "Specific exergy", kExergySource,
              {"SPECIFIC_EXERGY(STEAM(100; 540); 1.01325; 15)", "1539.87217"}),
        kExergy, explain_first),
    row<exergy_flow>(
        words("EXERGY_FLOW", "Flow exergy of a stream times its flow, against a stated dead state",
              kExergyNote, "Power", kExergySource,
              {"EXERGY_FLOW(STEAM(100; 540; 55); 1.01325; 15)", "84.6929693"}),
        kExergy, explain_first),
};

}  // namespace

std::span<const Row> stream_properties() { return kRows; }

}  // namespace busbar::functions
