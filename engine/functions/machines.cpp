// Machines on streams, and the powers and duties between two streams.
#include <cmath>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "functions/as.hpp"
#include "functions/describe.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"
#include "machine/balance.hpp"
#include "machine/expansion.hpp"

namespace busbar::functions {
namespace {

Outcome<Stream> turbine_out(const Stream& inlet, Pressure outlet, Fraction efficiency) {
  return machine::turbine_out(inlet, outlet.si, efficiency.si);
}

Outcome<Fraction> turbine_efficiency(const Stream& inlet, const Stream& outlet) {
  return as<Fraction>(machine::turbine_efficiency(inlet, outlet));
}

Outcome<Stream> pump_out(const Stream& inlet, Pressure outlet, Fraction efficiency) {
  return machine::pump_out(inlet, outlet.si, efficiency.si);
}

Outcome<Fraction> pump_efficiency(const Stream& inlet, const Stream& outlet) {
  return as<Fraction>(machine::pump_efficiency(inlet, outlet));
}

Outcome<Stream> compressor_out(const Stream& inlet, Pressure outlet, Fraction efficiency) {
  return machine::compressor_out(inlet, outlet.si, efficiency.si);
}

Outcome<Fraction> compressor_efficiency(const Stream& inlet, const Stream& outlet) {
  return as<Fraction>(machine::compressor_efficiency(inlet, outlet));
}

Outcome<Stream> valve_out(const Stream& inlet, Pressure outlet) {
  return machine::valve_out(inlet, outlet.si);
}

Outcome<Power> fluid_power(const Stream& inlet, const Stream& outlet) {
  return as<Power>(machine::fluid_power(inlet, outlet));
}

Outcome<Power> heat_duty(const Stream& inlet, const Stream& outlet) {
  return as<Power>(machine::heat_duty(inlet, outlet));
}

// Losses are paid from the fluid's power where it drives the shaft, and on top of it where the
// shaft drives the fluid.
Outcome<SameUnit> shaft_power(SameUnit fluid, Fraction efficiency) {
  if (fluid.si >= 0) return SameUnit{fluid.si * efficiency.si};
  return SameUnit{fluid.si / efficiency.si};
}

void explain_stage(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  if (result.si > 1) {
    text +=
        " Above 1: as read, the stage would be better than isentropic, which the second law rules "
        "out for an adiabatic machine; weigh the uncertainty of the readings.";
  } else if (result.si < 0) {
    text += " Below 0: as read, the fluid gained enthalpy instead of giving it.";
  }
  explain_first_and_second(in, result, units, text);
}

void explain_compressor(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  if (result.si > 1) {
    text +=
        " Above 1: as read, the compressor would take less than the isentropic power, which the "
        "second law rules out for an adiabatic machine; weigh the uncertainty of the readings.";
  } else if (result.si < 0) {
    text += " Below 0: as read, the fluid lost enthalpy instead of taking it.";
  }
  explain_first_and_second(in, result, units, text);
}

void explain_pump(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  if (result.si > 1) {
    text +=
        " Above 1: as read, the pump would take less than the isentropic power, which the second "
        "law rules out for an adiabatic machine; weigh the uncertainty of the temperature rise.";
  } else if (result.si < 0) {
    text += " Below 0: as read, the fluid lost enthalpy instead of taking it.";
  }
  const auto slope = machine::pump_efficiency_per_kelvin(*in[0].stream, *in[1].stream);
  if (slope) {
    // One tenth of a kelvin is a good matched pair of resistance thermometers.
    constexpr double kStep = 0.1;
    text += " Sensitivity: ";
    append_measure(text, {kStep, Quantity::temperature_difference}, units);
    text += " more temperature rise changes the efficiency by ";
    append_number(text, *slope * kStep, 3);
    text += " (of ";
    append_number(text, result.si, 4);
    text += ").";
  }
  explain_first_and_second(in, result, units, text);
}

constexpr const char* kChapter = "Machines";
constexpr const char* kBook = "Moran and Shapiro, Fundamentals of Engineering Thermodynamics";
constexpr Source kTurbine{kBook, "5th ed.", "section 6.8, isentropic turbine efficiency"};
constexpr Source kPump{kBook, "5th ed.", "section 6.8, isentropic pump efficiency"};
constexpr Source kCompressor{kBook, "5th ed.", "section 6.8, isentropic compressor efficiency"};
constexpr Source kThrottle{kBook, "5th ed.", "section 4.3, throttling devices"};
constexpr Source kEnergy{kBook, "5th ed.", "section 4.2, steady-state energy rate balance"};
constexpr Source kDefinition{
    "Definition", "common practice, no source",
    "mechanical efficiency = power at the coupling over power of the fluid"};

constexpr Argument kInlet{"inlet", "Stream before the machine"};
constexpr Argument kOutlet{"outlet", "Stream after the machine"};
constexpr Argument kOutletPressure{"outlet pressure", "Absolute pressure after the machine",
                                   kAboveZero, 100e6};
constexpr Argument kIsentropicEfficiency{"isentropic efficiency", "Design value as a fraction",
                                         kAboveZero, 1};

constexpr Argument kExpansion[] = {kInlet, kOutletPressure, kIsentropicEfficiency};
constexpr Argument kInletOutlet[] = {kInlet, kOutlet};
constexpr Argument kValve[] = {kInlet, kOutletPressure};
constexpr Argument kShaft[] = {
    {"fluid power", "Power that the fluid gives; negative where the shaft drives the fluid"},
    {"mechanical efficiency", "Bearings and gears, as a fraction", kAboveZero, 1}};

constexpr const char* kMeasuredNote =
    "Measured states may be impossible and are computed all the same: above 1 or below 0 is a "
    "finding. Both states must be readable: a wet exhaust needs its enthalpy or dryness.";

constexpr Row kRows[] = {
    row<turbine_out>(
        {"TURBINE_OUT",
         kChapter,
         "Stream after an adiabatic turbine stage",
         "Outlet enthalpy = inlet enthalpy minus the efficiency times the isentropic drop. Flow "
         "and "
         "tag pass through.",
         "A stream",
         kTurbine,
         {"TURBINE_OUT(STEAM(100; 540; 55); 0.05; 0.88)",
          "wet steam 55 kg/s, 0.05 bar, dryness 0.860184"},
         kFirst},
        kExpansion, explain_result),
    row<turbine_efficiency>(
        {"TURBINE_EFFICIENCY",
         kChapter,
         "Isentropic efficiency of a stage from its two states",
         kMeasuredNote,
         "A fraction",
         kTurbine,
         {"TURBINE_EFFICIENCY(STEAM(100; 540); TURBINE_OUT(STEAM(100; 540); 10; 0.88))", "0.88"},
         kFirst},
        kInletOutlet, explain_stage),
    row<pump_out>({"PUMP_OUT",
                   kChapter,
                   "Stream after an adiabatic pump",
                   "Outlet enthalpy = inlet enthalpy plus the isentropic rise over the efficiency. "
                   "The inlet must be liquid; boiling water counts as liquid.",
                   "A stream",
                   kPump,
                   {"PUMP_OUT(STEAM_AT_DRYNESS(0.05; 0; 55); 120; 0.8)",
                    "water 55 kg/s, 120 bar, 33.8945 °C"},
                   kFirst},
                  kExpansion, explain_result),
    row<pump_efficiency>(
        {"PUMP_EFFICIENCY",
         kChapter,
         "Isentropic efficiency of a pump from its two states",
         "The temperature rise decides: WHY prints by how much the answer moves with it.",
         "A fraction",
         kPump,
         {"PUMP_EFFICIENCY(STEAM(1; 30); PUMP_OUT(STEAM(1; 30); 120; 0.8))", "0.8"},
         kFirst},
        kInletOutlet, explain_pump),
    row<compressor_out>(
        {"COMPRESSOR_OUT",
         kChapter,
         "Stream after an adiabatic compressor",
         "Outlet enthalpy = inlet enthalpy plus the isentropic rise over the efficiency. A gas or "
         "superheated steam; what holds liquid is refused.",
         "A stream",
         kCompressor,
         {"COMPRESSOR_OUT(AIR(1.013; 15; 0.6; 650); 18; 0.88)", "gas 650 kg/s, 18 bar"},
         kFirst},
        kExpansion, explain_result),
    row<compressor_efficiency>({"COMPRESSOR_EFFICIENCY",
                                kChapter,
                                "Isentropic efficiency of a compressor from its two states",
                                kMeasuredNote,
                                "A fraction",
                                kCompressor,
                                {"COMPRESSOR_EFFICIENCY(B2; COMPRESSOR_OUT(B2; 18; 0.88))", "0.88",
                                 "B2=AIR(1.013; 15; 0.6; 650)"},
                                kFirst},
                               kInletOutlet, explain_compressor),
    row<valve_out>({"VALVE_OUT",
                    kChapter,
                    "Stream after a valve: same enthalpy, lower pressure",
                    "For appraisal only: never to size a safety or relief device.",
                    "A stream",
                    kThrottle,
                    {"VALVE_OUT(STEAM(100; 540); 20)", "steam 20 bar, 503.975 °C"},
                    kFirst},
                   kValve, explain_result),
    row<fluid_power>(
        {"FLUID_POWER",
         kChapter,
         "Power that a fluid gives between two states",
         "Positive when the fluid gives power, negative when it takes it. Both streams must carry "
         "the same flow.",
         "Power",
         kEnergy,
         {"FLUID_POWER(STEAM(100; 540; 55); TURBINE_OUT(STEAM(100; 540; 55); 10; 0.88))",
          "30.6490701"},
         kFirst},
        kInletOutlet, explain_first_and_second),
    row<heat_duty>({"HEAT_DUTY",
                    kChapter,
                    "Heat that a stream takes between two states",
                    "Positive when the stream takes heat, negative when it gives it. Both streams "
                    "must carry the same flow.",
                    "Power",
                    kEnergy,
                    {"HEAT_DUTY(STEAM(105; 230; 55); STEAM(100; 540; 55))", "136.676049"},
                    kFirst},
                   kInletOutlet, explain_first_and_second),
    row<shaft_power>(
        {"SHAFT_POWER",
         kChapter,
         "Power at the coupling from the power of the fluid",
         "Fluid power times the efficiency where the fluid drives; divided by it where the shaft "
         "drives the fluid (negative power).",
         "Power, in the unit given",
         kDefinition,
         {"SHAFT_POWER(40; 0.99)", "39.6"},
         kFirst},
        kShaft),
};

}  // namespace

std::span<const Row> machines() { return kRows; }

}  // namespace busbar::functions
