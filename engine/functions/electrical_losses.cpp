// Losses of electrical machines: windings at a stated temperature, windage in hydrogen, tolerances.
#include "electrical/cooling_gas.hpp"
#include "electrical/resistance.hpp"
#include "electrical/tolerance.hpp"
#include "functions/electrical_arguments.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

using electrical::kColdestWinding;
using electrical::kHottestWinding;
using electrical::kLeastPurity;

Outcome<Resistance> resistance_at_temperature(Resistance resistance, Temperature measured_at,
                                              Temperature wanted, Word word) {
  const auto conductor = electrical::conductor_named(word);
  if (!conductor) return Failure{Fault::unknown_word, 4, electrical::kUnknownConductor};
  return Resistance{resistance.si *
                    electrical::resistance_ratio(measured_at.si, wanted.si, *conductor)};
}

Outcome<Temperature> temperature_from_resistance(Resistance cold, Temperature cold_temperature,
                                                 Resistance hot, Word word) {
  const auto conductor = electrical::conductor_named(word);
  if (!conductor) return Failure{Fault::unknown_word, 4, electrical::kUnknownConductor};
  const auto found =
      electrical::temperature_from_resistance(cold.si, cold_temperature.si, hot.si, *conductor);
  if (!found) return found.failure();
  return Temperature{*found};
}

Outcome<Temperature> winding_reference_temperature(Word thermal_class) {
  const auto found = electrical::reference_temperature(thermal_class);
  if (!found) {
    return Failure{Fault::unknown_word, 1,
                   "is not a thermal class of this table; write \"B\" (130) or \"F\" (155), and "
                   "for another class take the temperature from the edition of IEC 60034-2-1 that "
                   "applies"};
  }
  return Temperature{*found};
}

Outcome<ComponentPower> stator_copper_loss(Current current, Resistance resistance,
                                           Temperature measured_at, Temperature stated) {
  return ComponentPower{
      electrical::stator_copper_loss(current.si, resistance.si, measured_at.si, stated.si)};
}

Outcome<ComponentPower> field_copper_loss(Current current, Resistance resistance,
                                          Temperature measured_at, Temperature stated) {
  return ComponentPower{
      electrical::field_copper_loss(current.si, resistance.si, measured_at.si, stated.si)};
}

Outcome<Density> cooling_hydrogen_density(Fraction purity, Pressure pressure,
                                          Temperature temperature) {
  return Density{electrical::hydrogen_density(purity.si, pressure.si, temperature.si)};
}

// Gas temperature alike in both states: it cancels, and any stands for it.
Outcome<ComponentPower> windage_loss_in_hydrogen(ComponentPower loss, Fraction purity_then,
                                                 Pressure pressure_then, Fraction purity_now,
                                                 Pressure pressure_now) {
  constexpr double kAny = 300;
  return ComponentPower{loss.si *
                        electrical::hydrogen_density(purity_now.si, pressure_now.si, kAny) /
                        electrical::hydrogen_density(purity_then.si, pressure_then.si, kAny)};
}

Outcome<ComponentPower> windage_loss_from_air_test(ComponentPower loss, Pressure air_pressure,
                                                   Temperature air_temperature, Fraction purity,
                                                   Pressure pressure, Temperature temperature) {
  return ComponentPower{loss.si *
                        electrical::hydrogen_density(purity.si, pressure.si, temperature.si) /
                        electrical::air_density(air_pressure.si, air_temperature.si)};
}

Outcome<Fraction> tolerated_efficiency(Fraction guaranteed, Power rated) {
  const double limit = electrical::tolerated_efficiency(guaranteed.si, rated.si);
  if (!(limit > 0)) {
    return Failure{Fault::outside_range,
                   1,
                   "{0} less its tolerance is below zero",
                   {{{guaranteed.si, Quantity::fraction}}}};
  }
  return Fraction{limit};
}

Outcome<ComponentPower> tolerated_loss(ComponentPower guaranteed, Power rated) {
  const auto limit = electrical::tolerated_loss(guaranteed.si, rated.si);
  if (!limit) return limit.failure();
  return ComponentPower{*limit};
}

void explain_tolerance(const Slot* in, const Result&, UnitSet, std::string& text) {
  text += in[1].si <= electrical::kSmallMachine
              ? " Less 15 % of (1 - efficiency): the rated power is not above 150 kW or kVA."
              : " Less 10 % of (1 - efficiency): the rated power is above 150 kW or kVA.";
}

constexpr const char* kChapter = "Losses of electrical machines";

constexpr const char* kWindingLimit = "the windings that the correction is meant for";
constexpr Argument kConductor{"conductor", "\"copper\" or \"aluminium\""};
constexpr Argument kMeasuredAt{"measured at", "Temperature at which the resistance was measured",
                               kColdestWinding, kHottestWinding, kWindingLimit};
constexpr Argument kStated{"stated temperature",
                           "Temperature to which the loss is stated, see "
                           "WINDING_REFERENCE_TEMPERATURE",
                           kColdestWinding, kHottestWinding, kWindingLimit};
constexpr Argument kRatedPower{"rated power", "Of the machine; kVA count as kW here", kAboveZero,
                               kMostPower};

constexpr const char* kPurityLimit =
    "the least purity of a cooling gas here; mixtures with 4 to 77 % hydrogen in air burn";
constexpr const char* kGasLimit = "the range of cooling gas in machines";
constexpr double kMostGasPressure = 2e6;
constexpr double kColdestGas = 253.15;
constexpr double kHottestGas = 423.15;
constexpr Argument kPurity{"purity", "Hydrogen by volume, as a fraction; the rest is air",
                           kLeastPurity, 1, kPurityLimit};
constexpr Argument kGasPressure{"pressure", "Absolute pressure in the casing", kAboveZero,
                                kMostGasPressure, kGasLimit};
constexpr Argument kGasTemperature{"temperature", "Of the gas", kColdestGas, kHottestGas,
                                   kGasLimit};

constexpr Argument kResistanceAt[] = {
    {"resistance", "As measured", kAboveZero, kMostReactance},
    kMeasuredAt,
    {"wanted temperature", "Temperature for which the resistance is wanted", kColdestWinding,
     kHottestWinding, kWindingLimit},
    kConductor};
constexpr Argument kFromResistance[] = {
    {"cold resistance", "Of the winding before the test", kAboveZero, kMostReactance},
    {"cold temperature", "Of the winding at that time", kColdestWinding, kHottestWinding,
     kWindingLimit},
    {"hot resistance", "Of the same winding, corrected to the instant of switching off", kAboveZero,
     kMostReactance},
    kConductor};
constexpr Argument kClass[] = {{"thermal class", "\"B\" or \"130\", \"F\" or \"155\""}};
constexpr Argument kStator[] = {
    {"current", "In each line", kAboveZero, kMostCurrent},
    {"line resistance", "Between two line terminals, star or delta, mean of the three", kAboveZero,
     kMostReactance},
    kMeasuredAt,
    kStated};
constexpr Argument kField[] = {{"field current", "Direct current", kAboveZero, kMostCurrent},
                               {"resistance", "Of the field winding", kAboveZero, kMostReactance},
                               kMeasuredAt,
                               kStated};
constexpr Argument kDensity[] = {kPurity, kGasPressure, kGasTemperature};
constexpr Argument kWindageThen{"windage loss", "Of the gas alone, without bearings and seals",
                                kAboveZero, kMostComponentPower};
constexpr Argument kWindage[] = {
    kWindageThen,
    {"purity then", "At which the loss is stated, hydrogen by volume", kLeastPurity, 1,
     kPurityLimit},
    {"pressure then", "Absolute, at which the loss is stated", kAboveZero, kMostGasPressure,
     kGasLimit},
    {"purity now", "For which the loss is wanted", kLeastPurity, 1, kPurityLimit},
    {"pressure now", "Absolute, for which the loss is wanted", kAboveZero, kMostGasPressure,
     kGasLimit}};
constexpr Argument kAirTest[] = {
    {"windage loss", "Measured in air, without bearings and seals", kAboveZero,
     kMostComponentPower},
    {"air pressure", "Absolute, at the test", kAboveZero, kMostGasPressure, kGasLimit},
    {"air temperature", "At the test", kColdestGas, kHottestGas, kGasLimit},
    kPurity,
    kGasPressure,
    kGasTemperature};
constexpr Argument kTolerance[] = {{"guaranteed efficiency", "As a fraction", kAboveZero, 1,
                                    "for no machine gives more power than it takes"},
                                   kRatedPower};
constexpr Argument kLossTolerance[] = {
    {"guaranteed loss", "Total losses guaranteed", kAboveZero, kMostComponentPower}, kRatedPower};

constexpr Source kCorrection{kRatingStandard, "2022",
                             "resistance method, (235 + t) for copper and (225 + t) for aluminium"};
constexpr Source kReference{kLossStandard, "2014",
                            "reference temperatures by thermal class; from memory"};
constexpr Source kStatorSource{
    kLossStandard, "2014", "stator winding loss 1.5 I^2 R, corrected to the stated temperature"};
constexpr Source kFieldSource{kLossStandard, "2014",
                              "excitation winding loss I^2 R, corrected to the stated temperature"};
constexpr Source kGasSource{"Ideal gas law with CODATA 2018 and molar masses of IUPAC and CIPM", "",
                            "density = molar mass times pressure over R T"};
constexpr Source kWindageSource{"Windage loss in proportion to gas density",
                                "common practice, no source", "densities by the ideal gas law"};
constexpr Source kToleranceSource{kRatingStandard, "2004 and later", "schedule of tolerances"};

constexpr const char* kHydrogenCaution =
    "Hydrogen burns and explodes with air. This arithmetic sets no purity limit, alarm or purging "
    "procedure: the maker's instructions, local codes and licensed practice govern.";
constexpr const char* kWindageNote =
    "Same speed and gas temperature; bearing and seal friction does not follow the gas and must be "
    "left out. Gauge pressures need ABSOLUTE_PRESSURE first.\n\nHydrogen burns and explodes with "
    "air. This arithmetic sets no purity limit, alarm or purging procedure: the maker's "
    "instructions, local codes and licensed practice govern.";

constexpr Row kRows[] = {
    row<resistance_at_temperature>(
        {"RESISTANCE_AT_TEMPERATURE",
         kChapter,
         "Resistance of a winding at another temperature",
         "",
         "Resistance",
         kCorrection,
         {"RESISTANCE_AT_TEMPERATURE(0.00182; 22; 95; \"copper\")", "0.00233696498"},
         kFirst},
        kResistanceAt),
    row<temperature_from_resistance>(
        {"TEMPERATURE_FROM_RESISTANCE",
         kChapter,
         "Mean temperature of a winding from its resistance, cold and hot",
         kHighVoltage,
         "Temperature",
         kCorrection,
         {"TEMPERATURE_FROM_RESISTANCE(0.00182; 22; 0.0023; \"copper\")", "89.7802198"},
         kFirst},
        kFromResistance),
    row<winding_reference_temperature>(
        {"WINDING_REFERENCE_TEMPERATURE",
         kChapter,
         "Temperature to which winding losses are stated, by thermal class",
         "Where a machine is rated for a lower class than its insulation has, that of the lower "
         "class counts. From memory of the standard: check the edition of the contract.",
         "Temperature",
         kReference,
         {"WINDING_REFERENCE_TEMPERATURE(\"B\")", "95"},
         kFirst},
        kClass),
    row<stator_copper_loss>({"STATOR_COPPER_LOSS",
                             kChapter,
                             "Copper loss of a three-phase stator at a stated temperature",
                             kHighVoltage,
                             "Loss",
                             kStatorSource,
                             {"STATOR_COPPER_LOSS(5500; 0.00364; 22; 95)", "212.079572"},
                             kFirst},
                            kStator),
    row<field_copper_loss>({"FIELD_COPPER_LOSS",
                            kChapter,
                            "Copper loss of a field winding at a stated temperature",
                            kHighVoltage,
                            "Loss",
                            kFieldSource,
                            {"FIELD_COPPER_LOSS(1450; 0.142; 22; 95)", "383.35856"},
                            kFirst},
                           kField),
    row<cooling_hydrogen_density>({"COOLING_HYDROGEN_DENSITY",
                                   kChapter,
                                   "Density of hydrogen with air in it, as in a generator casing",
                                   kHydrogenCaution,
                                   "Density",
                                   kGasSource,
                                   {"COOLING_HYDROGEN_DENSITY(0.98; 4; 45)", "0.386334024"},
                                   kFirst},
                                  kDensity),
    row<windage_loss_in_hydrogen>(
        {"WINDAGE_LOSS_IN_HYDROGEN",
         kChapter,
         "Windage loss at another hydrogen purity and pressure",
         kWindageNote,
         "Loss",
         kWindageSource,
         {"WINDAGE_LOSS_IN_HYDROGEN(320; 0.98; 4; 0.95; 4)", "421.263785"},
         kFirst},
        kWindage),
    row<windage_loss_from_air_test>(
        {"WINDAGE_LOSS_FROM_AIR_TEST",
         kChapter,
         "Windage loss in hydrogen from a test in air at the same speed",
         kWindageNote,
         "Loss",
         kWindageSource,
         {"WINDAGE_LOSS_FROM_AIR_TEST(1200; 1.013; 40; 0.98; 4; 45)", "411.377874"},
         kFirst},
        kAirTest),
    row<tolerated_efficiency>(
        {"TOLERATED_EFFICIENCY",
         kChapter,
         "Least efficiency within the tolerance on a guaranteed one",
         "A contract may exclude the tolerance: a guarantee without one is met or not met. The "
         "edition of 1996 drew the line at 50 kW.",
         "A fraction",
         kToleranceSource,
         {"TOLERATED_EFFICIENCY(0.987; 120)", "0.9857"},
         kFirst},
        kTolerance, explain_tolerance),
    row<tolerated_loss>({"TOLERATED_LOSS",
                         kChapter,
                         "Most total losses within the tolerance on guaranteed ones",
                         "A contract may exclude the tolerance.",
                         "Loss",
                         kToleranceSource,
                         {"TOLERATED_LOSS(1600; 120)", "1760"},
                         kFirst},
                        kLossTolerance),
};

}  // namespace

std::span<const Row> electrical_losses() { return kRows; }

}  // namespace busbar::functions
