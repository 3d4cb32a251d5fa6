// Speed, poles, slip, induced voltage and winding factors.
#include <numbers>

#include "electrical/induced_voltage.hpp"
#include "electrical/synchronous.hpp"
#include "electrical/winding_factor.hpp"
#include "functions/electrical_arguments.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

constexpr double kDegree = std::numbers::pi / 180;

Outcome<RotationalSpeed> synchronous_speed(Frequency frequency, Number poles) {
  const auto speed = electrical::synchronous_speed(frequency.si, poles.si);
  if (!speed) return speed.failure();
  return RotationalSpeed{*speed};
}

Outcome<Number> pole_count(Frequency frequency, RotationalSpeed speed) {
  const auto poles = electrical::pole_count(frequency.si, speed.si);
  if (!poles) return poles.failure();
  return Number{*poles};
}

Outcome<Fraction> motor_slip(Frequency frequency, Number poles, RotationalSpeed speed) {
  const auto slip = electrical::slip(frequency.si, poles.si, speed.si);
  if (!slip) return slip.failure();
  return Fraction{*slip};
}

Outcome<Voltage> conductor_voltage(FluxDensity density, Length length, Velocity velocity,
                                   Number angle) {
  return Voltage{
      electrical::conductor_voltage(density.si, length.si, velocity.si, angle.si * kDegree)};
}

Outcome<Voltage> rotating_coil_voltage(Number turns, MagneticFlux flux, RotationalSpeed speed,
                                       Number angle) {
  return Voltage{
      electrical::rotating_coil_voltage(turns.si, flux.si, speed.si, angle.si * kDegree)};
}

Outcome<Voltage> coil_voltage(Frequency frequency, Number turns, MagneticFlux flux,
                              Fraction factor) {
  return Voltage{electrical::winding_voltage(frequency.si, turns.si, flux.si, factor.si)};
}

Outcome<Fraction> distribution_factor(Number slots, Number poles, Number phases) {
  const auto factor = electrical::distribution_factor(slots.si, poles.si, phases.si);
  if (!factor) return factor.failure();
  return Fraction{*factor};
}

Outcome<Fraction> pitch_factor(Number slots, Number poles, Number span) {
  const auto factor = electrical::pitch_factor(slots.si, poles.si, span.si);
  if (!factor) return factor.failure();
  return Fraction{*factor};
}

Outcome<Fraction> winding_factor(Number slots, Number poles, Number phases, Number span) {
  const auto factor = electrical::winding_factor(slots.si, poles.si, phases.si, span.si);
  if (!factor) return factor.failure();
  return Fraction{*factor};
}

void explain_slip(const Slot*, const Result& result, UnitSet, std::string& text) {
  if (result.si < 0) text += " Negative: faster than synchronous, as an induction generator runs.";
}

constexpr const char* kChapter = "Electrical machines";

constexpr Argument kSpeed{"speed", "Of the shaft", kAboveZero, 1e4};
constexpr Argument kSlots{"slots", "Slots of the stator, a whole number", 2, 10000,
                          "the slots that machines have"};
constexpr Argument kPhases{"phases", "3 for a three-phase winding", 1, 12,
                           "the phases that machines have"};
constexpr Argument kSpan{"coil span", "Slots between the two sides of a coil: 7 for slots 1 and 8",
                         1, 10000, "the coil spans that machines have"};
constexpr Argument kFlux{"flux", "Of one pole, sinusoidal", kAboveZero, 1e3};
constexpr Argument kTurns{"turns", "In series in one phase", kAboveZero, 1e6};

constexpr Argument kSynchronous[] = {kFrequency, kPoles};
constexpr Argument kPoleCount[] = {kFrequency, {"speed", "Rated speed", kAboveZero, 1e4}};
constexpr Argument kSlip[] = {kFrequency, kPoles, kSpeed};
constexpr Argument kConductor[] = {
    {"flux density", "Of the field that the conductor cuts", kAboveZero, 100},
    {"length", "Of the conductor in the field", kAboveZero, 1e3},
    {"velocity", "Of the conductor against the field", kAboveZero, 1e4},
    {"angle", "Between field and motion in degrees; 90 when it cuts straight across", kAboveZero,
     180}};
constexpr Argument kRotatingCoil[] = {
    {"turns", "Of the coil", kAboveZero, 1e6},
    {"flux", "Through one turn that lies across the field: flux density times area", kAboveZero,
     1e3},
    {"speed", "Of the coil", kAboveZero, 1e4},
    {"angle", "Turned since the coil lay across the field, in degrees; 90 at the highest voltage",
     kAboveZero, 360}};
constexpr Argument kCoil[] = {
    kFrequency,
    kTurns,
    kFlux,
    {"winding factor", "Distribution times pitch factor, see WINDING_FACTOR", kAboveZero, 1}};
constexpr Argument kDistribution[] = {kSlots, kPoles, kPhases};
constexpr Argument kPitch[] = {kSlots, kPoles, kSpan};
constexpr Argument kWinding[] = {kSlots, kPoles, kPhases, kSpan};

constexpr Source kSpeedSource{kRatingStandard, "2022", "synchronous speed, n = 120 f / p in rpm"};
constexpr Source kSlipSource{kMachineBook, "6th ed.", "section 6.1, slip of induction machines"};
constexpr Source kConductorSource{"Law of induction", "",
                                  "e = B l v sin(angle) for a straight conductor"};
constexpr Source kCoilSource{"Law of induction", "", "e = N phi omega sin(omega t)"};
constexpr Source kWindingVoltage{kMachineBook, "6th ed.",
                                 "section 4.5, E = sqrt(2) pi f N phi k, the 4.44 of the trade"};
constexpr Source kWindingSource{"Theraja, Electrical Technology, volume II", "",
                                "chapter 37, distribution and pitch factors"};

constexpr const char* kWholeNote =
    "For the fundamental. In degrees of the wave: slots are 180 poles / slots apart.";

constexpr Row kRows[] = {
    row<synchronous_speed>({"SYNCHRONOUS_SPEED",
                            kChapter,
                            "Synchronous speed from frequency and poles",
                            "",
                            "Speed",
                            kSpeedSource,
                            {"SYNCHRONOUS_SPEED(50; 2)", "3000"},
                            kFirst},
                           kSynchronous),
    row<pole_count>({"POLE_COUNT",
                     kChapter,
                     "Poles of a synchronous machine from frequency and rated speed",
                     "Takes a speed as the nameplate rounds it, within 0.5 %. A speed that no even "
                     "number of poles explains is refused: that of an induction machine, or one "
                     "for another frequency.",
                     "An even number",
                     kSpeedSource,
                     {"POLE_COUNT(50; 428.6)", "14"},
                     kFirst},
                    kPoleCount),
    row<motor_slip>({"MOTOR_SLIP",
                     kChapter,
                     "Slip of an induction machine",
                     "Speed lost against the synchronous one, as a fraction of it; negative for an "
                     "induction generator.",
                     "A fraction",
                     kSlipSource,
                     {"MOTOR_SLIP(50; 4; 1485)", "0.01"},
                     kFirst},
                    kSlip, explain_slip),
    row<conductor_voltage>({"INDUCED_VOLTAGE_OF_CONDUCTOR",
                            kChapter,
                            "Voltage induced in a straight conductor that moves in a field",
                            "The conductor stands at right angles to field and motion.",
                            "Voltage",
                            kConductorSource,
                            {"INDUCED_VOLTAGE_OF_CONDUCTOR(1.1; 5; 170; 90)", "0.935"},
                            kFirst},
                           kConductor),
    row<rotating_coil_voltage>(
        {"INDUCED_VOLTAGE_OF_ROTATING_COIL",
         kChapter,
         "Voltage of a coil that turns in a uniform field, at one instant",
         "An instant value, not the effective one; 180 and 360 degrees give zero.",
         "Voltage",
         kCoilSource,
         {"INDUCED_VOLTAGE_OF_ROTATING_COIL(10; 0.05; 3000; 30)", "0.0785398163"},
         kFirst},
        kRotatingCoil),
    row<coil_voltage>({"INDUCED_VOLTAGE_OF_COIL",
                       kChapter,
                       "Effective voltage of the coils of one phase",
                       "Of one phase, not line to line: a star-connected machine has the square "
                       "root of 3 times as much between its lines.",
                       "Voltage, effective, of one phase",
                       kWindingVoltage,
                       {"INDUCED_VOLTAGE_OF_COIL(50; 240; 0.03; 0.96)", "1.53546034"},
                       kFirst},
                      kCoil),
    row<distribution_factor>({"WINDING_DISTRIBUTION_FACTOR",
                              kChapter,
                              "Distribution factor of a winding spread over several slots",
                              kWholeNote,
                              "A fraction",
                              kWindingSource,
                              {"WINDING_DISTRIBUTION_FACTOR(144; 16; 3)", "0.959795081"},
                              kFirst},
                             kDistribution),
    row<pitch_factor>({"WINDING_PITCH_FACTOR",
                       kChapter,
                       "Pitch factor of a winding with shortened coils",
                       kWholeNote,
                       "A fraction",
                       kWindingSource,
                       {"WINDING_PITCH_FACTOR(36; 4; 7)", "0.939692621"},
                       kFirst},
                      kPitch),
    row<winding_factor>({"WINDING_FACTOR",
                         kChapter,
                         "Winding factor: distribution times pitch",
                         kWholeNote,
                         "A fraction",
                         kWindingSource,
                         {"WINDING_FACTOR(36; 4; 3; 7)", "0.901912355"},
                         kFirst},
                        kWinding),
};

}  // namespace

std::span<const Row> electrical_machines() { return kRows; }

}  // namespace busbar::functions
