// Three-phase power, current and power factor; the phasor diagram of a generator.
#include <cmath>
#include <numbers>

#include "electrical/three_phase.hpp"
#include "functions/electrical_arguments.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

Outcome<Power> three_phase_power(Voltage voltage, Current current, Fraction factor) {
  return Power{electrical::apparent_power(voltage.si, current.si) * factor.si};
}

Outcome<Current> three_phase_current(Power active, Voltage voltage, Fraction factor) {
  return Current{electrical::line_current(active.si / factor.si, voltage.si)};
}

// From meters: may come out above 1, which is the finding.
Outcome<Fraction> three_phase_power_factor(Power active, Voltage voltage, Current current) {
  return Fraction{active.si / electrical::apparent_power(voltage.si, current.si)};
}

Outcome<ApparentPower> three_phase_apparent_power(Voltage voltage, Current current) {
  return ApparentPower{electrical::apparent_power(voltage.si, current.si)};
}

Outcome<Current> rated_current(ApparentPower apparent, Voltage voltage) {
  return Current{electrical::line_current(apparent.si, voltage.si)};
}

Outcome<ApparentPower> apparent_power(Power active, Fraction factor) {
  return ApparentPower{active.si / factor.si};
}

Outcome<Power> active_power(ApparentPower apparent, Fraction factor) {
  return Power{apparent.si * factor.si};
}

Outcome<ReactivePower> reactive_power(Power active, Fraction factor) {
  return ReactivePower{electrical::reactive_power(active.si, factor.si)};
}

Outcome<Fraction> power_factor(Power active, ReactivePower reactive) {
  return Fraction{electrical::power_factor(active.si, reactive.si)};
}

Outcome<electrical::InternalVoltage> diagram(Voltage voltage, Power active, Fraction factor,
                                             Word word, Resistance reactance) {
  const auto sense = electrical::sense_named(word);
  if (!sense) return Failure{Fault::unknown_word, 4, electrical::kUnknownSense};
  return electrical::internal_voltage(voltage.si, active.si, factor.si, *sense, reactance.si);
}

Outcome<Voltage> internal_voltage(Voltage voltage, Power active, Fraction factor, Word sense,
                                  Resistance reactance) {
  const auto found = diagram(voltage, active, factor, sense, reactance);
  if (!found) return found.failure();
  return Voltage{found->line_to_line};
}

Outcome<Number> load_angle(Voltage voltage, Power active, Fraction factor, Word sense,
                           Resistance reactance) {
  const auto found = diagram(voltage, active, factor, sense, reactance);
  if (!found) return found.failure();
  return Number{found->angle * 180 / std::numbers::pi};
}

void explain_measured_factor(const Slot*, const Result& result, UnitSet, std::string& text) {
  if (result.si <= 1) return;
  text +=
      " Above 1: as read, there is more active than apparent power, which cannot be; weigh the "
      "uncertainty of the transformers and meters.";
}

void explain_factor(const Slot* in, const Result&, UnitSet, std::string& text) {
  if (in[1].si != 0) return;
  text += " Note: reactive power is exactly 0; Calc hands a blank cell over as 0 too.";
}

void explain_angle(const Slot*, const Result& result, UnitSet, std::string& text) {
  if (result.si < 90) return;
  text += " At 90 degrees or more a cylindrical rotor with constant excitation does not hold step.";
}

constexpr const char* kChapter = "Three-phase power";

constexpr Argument kApparentPower{"apparent power", "Of all three phases", kAboveZero, kMostPower};

constexpr Argument kPower[] = {kLineVoltage, kLineCurrent, kPowerFactor};
constexpr Argument kCurrent[] = {kActivePower, kLineVoltage, kPowerFactor};
constexpr Argument kFactor[] = {kActivePower, kLineVoltage, kLineCurrent};
constexpr Argument kApparent[] = {kLineVoltage, kLineCurrent};
constexpr Argument kRated[] = {
    {"apparent power", "Rated, in MVA and not in MW", kAboveZero, kMostPower}, kLineVoltage};
constexpr Argument kActiveAndFactor[] = {kActivePower, kPowerFactor};
constexpr Argument kApparentAndFactor[] = {kApparentPower, kPowerFactor};
constexpr Argument kActiveAndReactive[] = {
    kActivePower,
    {"reactive power", "Of all three phases; its sign does not matter here", -kMostPower,
     kMostPower}};
constexpr Argument kDiagram[] = {
    {"voltage", "At the terminals, line to line", kAboveZero, kMostVoltage},
    kActivePower,
    kPowerFactor,
    kSense,
    {"synchronous reactance", "Of one phase in star, not per unit", kAboveZero, kMostReactance}};

constexpr Source kPowerSource{"IEC 60050-131, International Electrotechnical Vocabulary", "2002",
                              "active, reactive and apparent power; power factor"};
constexpr Source kDiagramSource{kMachineBook, "6th ed.",
                                "section 5.3, phasor diagram of a cylindrical rotor"};

constexpr const char* kDiagramNote =
    "Terminal voltage plus current times reactance. Armature resistance, saliency and saturation "
    "are left out. A reactance per unit times the square of the rated voltage over the rated "
    "apparent power gives ohms.";

constexpr Row kRows[] = {
    row<three_phase_power>({"THREE_PHASE_POWER",
                            kChapter,
                            "Active power from voltage, current and power factor",
                            kHighVoltage,
                            "Active power of all three phases",
                            kPowerSource,
                            {"THREE_PHASE_POWER(15.75; 5000; 0.85)", "115.939151"},
                            kFirst},
                           kPower),
    row<three_phase_current>({"THREE_PHASE_CURRENT",
                              kChapter,
                              "Line current from active power, voltage and power factor",
                              "For a rating in MVA see RATED_CURRENT.",
                              "Line current",
                              kPowerSource,
                              {"THREE_PHASE_CURRENT(100; 15.75; 0.85)", "4312.60705"},
                              kFirst},
                             kCurrent),
    row<three_phase_power_factor>(
        {"THREE_PHASE_POWER_FACTOR",
         kChapter,
         "Power factor from readings of power, voltage and current",
         "Readings may be impossible and are computed all the same: above 1 is a finding.",
         "A fraction",
         kPowerSource,
         {"THREE_PHASE_POWER_FACTOR(100; 15.75; 4400)", "0.833117272"},
         kFirst},
        kFactor, explain_measured_factor),
    row<three_phase_apparent_power>({"THREE_PHASE_APPARENT_POWER",
                                     kChapter,
                                     "Apparent power from voltage and current",
                                     "",
                                     "Apparent power of all three phases",
                                     kPowerSource,
                                     {"THREE_PHASE_APPARENT_POWER(15.75; 5000)", "136.399"},
                                     kFirst},
                                    kApparent),
    row<rated_current>({"RATED_CURRENT",
                        kChapter,
                        "Line current of a rating in MVA",
                        "",
                        "Line current",
                        kPowerSource,
                        {"RATED_CURRENT(150; 15.75)", "5498.57"},
                        kFirst},
                       kRated),
    row<apparent_power>({"APPARENT_POWER",
                         kChapter,
                         "Apparent power from active power and power factor",
                         "",
                         "Apparent power",
                         kPowerSource,
                         {"APPARENT_POWER(120; 0.8)", "150"},
                         kFirst},
                        kActiveAndFactor),
    row<active_power>({"ACTIVE_POWER",
                       kChapter,
                       "Active power from apparent power and power factor",
                       "",
                       "Active power",
                       kPowerSource,
                       {"ACTIVE_POWER(150; 0.8)", "120"},
                       kFirst},
                      kApparentAndFactor),
    row<reactive_power>({"REACTIVE_POWER",
                         kChapter,
                         "Reactive power from active power and power factor",
                         "The amount, without a sign: whether it is given or taken the power "
                         "factor alone does not say.",
                         "Reactive power",
                         kPowerSource,
                         {"REACTIVE_POWER(120; 0.8)", "90"},
                         kFirst},
                        kActiveAndFactor),
    row<power_factor>({"POWER_FACTOR",
                       kChapter,
                       "Power factor from active and reactive power",
                       "",
                       "A fraction",
                       kPowerSource,
                       {"POWER_FACTOR(120; 90)", "0.8"},
                       kFirst},
                      kActiveAndReactive, explain_factor),
    row<internal_voltage>(
        {"GENERATOR_INTERNAL_VOLTAGE",
         kChapter,
         "Voltage behind the synchronous reactance of a generator",
         kDiagramNote,
         "Voltage, line to line",
         kDiagramSource,
         {"GENERATOR_INTERNAL_VOLTAGE(4.8; 0.9; 0.9; \"lagging\"; 13.8)", "6.58302256"},
         kFirst},
        kDiagram),
    row<load_angle>({"GENERATOR_LOAD_ANGLE",
                     kChapter,
                     "Angle between internal and terminal voltage of a generator",
                     kDiagramNote,
                     "Electrical degrees",
                     kDiagramSource,
                     {"GENERATOR_LOAD_ANGLE(4.8; 0.9; 0.9; \"lagging\"; 13.8)", "23.1448198"},
                     kFirst},
                    kDiagram, explain_angle),
};

}  // namespace

std::span<const Row> electrical_three_phase() { return kRows; }

}  // namespace busbar::functions
