// Efficiency of generators: measured, from losses, and at any load and power factor.
#include <array>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "electrical/generator.hpp"
#include "functions/describe.hpp"
#include "functions/electrical_arguments.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

using electrical::Balance;

// Wide enough for every synchronous machine; at 1 the diagram has no reactance left.
constexpr double kLeastFieldRatio = 0.01;
constexpr double kMostFieldRatio = 0.999;

using StatedLosses = Numbers<ComponentPower>;

constexpr std::array<const char*, electrical::loss_count> kLossNames{
    "friction and windage", "core", "stator copper", "stray load", "field copper", "excitation"};

Outcome<Fraction> generator_efficiency(Power shaft, Power electrical) {
  return Fraction{electrical.si / shaft.si};
}

Outcome<Fraction> generator_efficiency_from_losses(Power output, StatedLosses losses) {
  double total = 0;
  for (const double loss : losses.si) total += loss;
  if (!(total > 0)) {
    return Failure{Fault::zero_or_blank, 2, "is zero or blank throughout: no machine is lossless"};
  }
  return Fraction{output.si / (output.si + total)};
}

Outcome<Current> generator_field_current(Current no_load, Current rated, Fraction rated_factor,
                                         Fraction share, Fraction factor, Word word) {
  const auto sense = electrical::sense_named(word);
  if (!sense) return Failure{Fault::unknown_word, 6, electrical::kUnknownSense};
  const double ratio = no_load.si / rated.si;
  if (!(ratio >= kLeastFieldRatio && ratio <= kMostFieldRatio)) {
    return Failure{Fault::impossible,
                   1,
                   "{0} is {1} of the rated field current; generators lie between {2} and 1",
                   {{{no_load.si, Quantity::current},
                     {ratio, Quantity::fraction},
                     {kLeastFieldRatio, Quantity::fraction}}}};
  }
  return Current{rated.si * electrical::field_current_ratio(rated_factor.si, ratio,
                                                            {share.si, factor.si, *sense})};
}

constexpr std::uint8_t kLossesAt = 3;

// Arguments 5 to 7 are load, power factor and sense.
Outcome<Balance> balance(ApparentPower rated, Fraction rated_factor, StatedLosses losses,
                         Fraction field_ratio, Fraction share, Fraction factor, Word word) {
  const auto sense = electrical::sense_named(word);
  if (!sense) return Failure{Fault::unknown_word, 7, electrical::kUnknownSense};
  const auto machine =
      electrical::generator(rated.si, rated_factor.si, losses.si, field_ratio.si, kLossesAt);
  if (!machine) return machine.failure();
  return electrical::balance_at(*machine, {share.si, factor.si, *sense});
}

Outcome<Fraction> generator_efficiency_at_load(ApparentPower rated, Fraction rated_factor,
                                               StatedLosses losses, Fraction field_ratio,
                                               Fraction share, Fraction factor, Word sense) {
  const auto found = balance(rated, rated_factor, losses, field_ratio, share, factor, sense);
  if (!found) return found.failure();
  return Fraction{found->efficiency()};
}

Outcome<ComponentPower> generator_loss_at_load(ApparentPower rated, Fraction rated_factor,
                                               StatedLosses losses, Fraction field_ratio,
                                               Fraction share, Fraction factor, Word sense) {
  const auto found = balance(rated, rated_factor, losses, field_ratio, share, factor, sense);
  if (!found) return found.failure();
  return ComponentPower{found->total};
}

Outcome<Grid> generator_loss_table(ApparentPower rated, Fraction rated_factor, StatedLosses losses,
                                   Fraction field_ratio, Numbers<Fraction> shares,
                                   Numbers<Fraction> factors, Word word, UnitSet units) {
  const auto sense = electrical::sense_named(word);
  if (!sense) return Failure{Fault::unknown_word, 7, electrical::kUnknownSense};
  const auto machine =
      electrical::generator(rated.si, rated_factor.si, losses.si, field_ratio.si, kLossesAt);
  if (!machine) return machine.failure();
  constexpr std::size_t kFirstLoss = 3;
  constexpr std::size_t kTotal = kFirstLoss + electrical::loss_count;
  constexpr std::size_t kColumns = kTotal + 3;
  if (shares.si.size() * factors.si.size() > kCellLimit / kColumns - 1) {
    return Failure{Fault::too_large, 5, "and power factor would fill more cells than a call may"};
  }
  Grid table(shares.si.size() * factors.si.size() + 1, kColumns);
  table.at(0, 0) = std::string("power factor");
  table.at(0, 1) = std::string("load");
  table.at(0, 2) = heading("output", Quantity::power, units);
  for (std::size_t i = 0; i < electrical::loss_count; ++i) {
    table.at(0, kFirstLoss + i) = heading(kLossNames[i], Quantity::component_power, units);
  }
  table.at(0, kTotal) = heading("all losses", Quantity::component_power, units);
  table.at(0, kTotal + 1) = heading("input", Quantity::power, units);
  table.at(0, kTotal + 2) = std::string("efficiency");
  const Unit& power = unit_of(units, Quantity::power);
  const Unit& loss = unit_of(units, Quantity::component_power);
  std::size_t r = 0;
  for (const double factor : factors.si) {
    for (const double share : shares.si) {
      ++r;
      const Balance found = electrical::balance_at(*machine, {share, factor, *sense});
      table.at(r, 0) = factor;
      table.at(r, 1) = share;
      table.at(r, 2) = power.from_si(found.output);
      for (std::size_t i = 0; i < electrical::loss_count; ++i) {
        table.at(r, kFirstLoss + i) = loss.from_si(found.losses[i]);
      }
      table.at(r, kTotal) = loss.from_si(found.total);
      table.at(r, kTotal + 1) = power.from_si(found.input());
      table.at(r, kTotal + 2) = found.efficiency();
    }
  }
  return table;
}

Outcome<Number> generator_best_load(ApparentPower rated, Fraction rated_factor, StatedLosses losses,
                                    Fraction field_ratio) {
  const auto machine =
      electrical::generator(rated.si, rated_factor.si, losses.si, field_ratio.si, kLossesAt);
  if (!machine) return machine.failure();
  return Number{electrical::best_load(rated_factor.si, machine->rated, field_ratio.si)};
}

// --- Explanations ----------------------------------------------------------------------------

void explain_measured(const Slot*, const Result& result, UnitSet, std::string& text) {
  if (result.si <= 1) return;
  text +=
      " Above 1: as read, more electricity leaves than shaft power enters, which cannot be; weigh "
      "the uncertainty of torque and power readings.";
}

void explain_from_losses(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  double total = 0;
  for (const double loss : in[1].numbers()) total += loss;
  text += " All losses: ";
  append_measure(text, {total, Quantity::component_power}, units);
  text += " beside an output of ";
  append_measure(text, {in[0].si, Quantity::power}, units);
  text += '.';
  constexpr double kBest = 0.995;
  if (result.si > kBest) {
    text += " Better than any generator in use: look at the units, and for losses left out.";
  }
}

void explain_balance(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const auto found = balance({in[0].si}, {in[1].si}, {in[2].numbers()}, {in[3].si}, {in[4].si},
                             {in[5].si}, in[6].word());
  if (!found) return;
  text += " Output ";
  append_measure(text, {found->output, Quantity::power}, units);
  for (std::size_t i = 0; i < electrical::loss_count; ++i) {
    text += ", ";
    text += kLossNames[i];
    text += ' ';
    append_measure(text, {found->losses[i], Quantity::component_power}, units);
  }
  text += '.';
}

void explain_best(const Slot*, const Result& result, UnitSet, std::string& text) {
  if (result.si <= 1) return;
  text += " Above rated load: within its rating the machine is best at rated load.";
}

constexpr const char* kChapter = "Generators under load";

constexpr Argument kRated{"rated apparent power", "In MVA and not in MW", kAboveZero, kMostPower};
constexpr Argument kRatedFactor{"rated power factor", "Lagging, as on the nameplate", kAboveZero, 1,
                                kFactorLimit};
constexpr Argument kLosses{
    "losses",
    "Range of six, at rated load: friction and windage, core, stator copper, stray load, field "
    "copper, excitation (exciter, rectifier, brushes)",
    0, kMostComponentPower, "for a loss is never negative"};
constexpr Argument kFieldRatio{
    "field current ratio", "No-load field current at rated voltage over rated field current",
    kLeastFieldRatio, kMostFieldRatio, "the field currents of synchronous generators"};
constexpr const char* kLoadLimit = "to which the scaling of losses is carried";
constexpr Argument kLoad{"load", "Apparent power as a fraction of the rated one", kAboveZero,
                         electrical::kMostLoad, kLoadLimit};

constexpr Argument kMeasured[] = {
    {"shaft power", "Read at the generator coupling", kAboveZero, kMostPower},
    {"electrical power", "Read at the generator terminals", kAboveZero, kMostPower}};
constexpr Argument kFromLosses[] = {
    {"output", "Electrical power at the generator terminals", kAboveZero, kMostPower},
    {"losses", "Range of all losses at that output", 0, kMostComponentPower,
     "for a loss is never negative"}};
constexpr Argument kFieldCurrent[] = {
    {"no-load field current", "At rated voltage and speed, open terminals", kAboveZero,
     kMostCurrent},
    {"rated field current", "At rated load and power factor", kAboveZero, kMostCurrent},
    kRatedFactor,
    kLoad,
    kPowerFactor,
    kSense};
constexpr Argument kAtLoad[] = {kRated, kRatedFactor, kLosses, kFieldRatio,
                                kLoad,  kPowerFactor, kSense};
constexpr Argument kTable[] = {
    kRated,
    kRatedFactor,
    kLosses,
    kFieldRatio,
    {"loads", "Range of apparent powers as fractions of the rated one", kAboveZero,
     electrical::kMostLoad, kLoadLimit},
    {"power factors", "Range of power factors", kAboveZero, 1, kFactorLimit},
    kSense};
constexpr Argument kBest[] = {kRated, kRatedFactor, kLosses, kFieldRatio};

constexpr Source kMeasuredSource{kLossStandard, "2014", "efficiency = output over input"};
constexpr Source kSummation{kLossStandard, "2014",
                            "summation of losses: output over output plus all losses"};
constexpr Source kScaling{
    "IEC 60034-2-1, summation of losses; field current by the phasor diagram of Fitzgerald, "
    "Kingsley and Umans, Electric Machinery",
    "2014; 6th ed.",
    "section 5.3 of the book, with one reactance fitted to the two field currents"};
constexpr Source kMaximum{kMachineBook, "6th ed.",
                          "efficiency is highest where constant losses equal those with the square "
                          "of the load"};

constexpr const char* kModelNote =
    "Friction, windage and core loss stay; stator copper and stray loss go with the square of the "
    "current; field copper and excitation loss with the square of the field current, which the "
    "phasor diagram gives from the two that are stated. Where the maker states field currents at "
    "the load in question, sum the losses there with GENERATOR_EFFICIENCY_FROM_LOSSES instead. "
    "Losses are at the stated reference temperature, rated voltage, frequency and cooling gas.";

constexpr Row kRows[] = {
    row<generator_efficiency>(
        {"GENERATOR_EFFICIENCY",
         kChapter,
         "Efficiency of a generator from shaft and electrical power as read",
         "Readings may be impossible and are computed all the same: above 1 is a finding.",
         "A fraction",
         kMeasuredSource,
         {"GENERATOR_EFFICIENCY(121.8; 120)", "0.985221675"},
         kFirst},
        kMeasured, explain_measured),
    row<generator_efficiency_from_losses>(
        {"GENERATOR_EFFICIENCY_FROM_LOSSES",
         kChapter,
         "Efficiency of a generator by summation of losses",
         kHighVoltage,
         "A fraction",
         kSummation,
         {"GENERATOR_EFFICIENCY_FROM_LOSSES(120; B2:B7)", "0.986031224",
          "B2=420 | B3=310 | B4=330 | B5=210 | B6=390 | B7=40"},
         kFirst},
        kFromLosses, explain_from_losses),
    row<generator_field_current>(
        {"GENERATOR_FIELD_CURRENT",
         kChapter,
         "Field current of a generator at any load and power factor",
         "The phasor diagram of a cylindrical rotor, fitted to the two field currents: exact at "
         "both, an estimate between and beyond, saturation running straight.",
         "Current",
         kScaling,
         {"GENERATOR_FIELD_CURRENT(560; 1450; 0.8; 0.75; 0.9; \"lagging\")", "1143.45679"},
         kFirst},
        kFieldCurrent),
    row<generator_efficiency_at_load>(
        {"GENERATOR_EFFICIENCY_AT_LOAD",
         kChapter,
         "Efficiency of a generator at any load and power factor",
         kModelNote,
         "A fraction",
         kScaling,
         {"GENERATOR_EFFICIENCY_AT_LOAD(150; 0.8; B2:B7; 0.386; 0.75; 0.9; \"lagging\")",
          "0.987312405", "B2=420 | B3=310 | B4=330 | B5=210 | B6=390 | B7=40"},
         kFirst},
        kAtLoad, explain_balance),
    row<generator_loss_at_load>(
        {"GENERATOR_LOSS_AT_LOAD",
         kChapter,
         "All losses of a generator at any load and power factor",
         kModelNote,
         "Loss",
         kScaling,
         {"GENERATOR_LOSS_AT_LOAD(150; 0.8; B2:B7; 0.386; 0.75; 0.9; \"lagging\")", "1301.12718",
          "B2=420 | B3=310 | B4=330 | B5=210 | B6=390 | B7=40"},
         kFirst},
        kAtLoad, explain_balance),
    row<generator_loss_table>(
        {"GENERATOR_LOSS_TABLE",
         kChapter,
         "Table of all losses of a generator over loads and power factors",
         kModelNote,
         "A table with a heading row: power factor, load, output, the six losses, all losses, "
         "input, efficiency; one row for each power factor and load",
         kScaling,
         {"INDEX(GENERATOR_LOSS_TABLE(150; 0.8; B2:B7; 0.386; C2:C3; D2:D3; \"lagging\"); 3; 12)",
          "0.986031224",
          "B2=420 | B3=310 | B4=330 | B5=210 | B6=390 | B7=40 | C2=0.5 | C3=1 | D2=0.8 | D3=0.9"},
         kFirst},
        kTable),
    row<generator_best_load>(
        {"GENERATOR_BEST_LOAD",
         kChapter,
         "Load at which the efficiency of a generator peaks",
         "The same at every power factor. May be above 1: then the machine is best at rated load. "
         "Losses as GENERATOR_LOSS_TABLE scales them.",
         "Apparent power as a fraction of the rated one",
         kMaximum,
         {"GENERATOR_BEST_LOAD(150; 0.8; B2:B7; 0.386)", "1.02041082",
          "B2=420 | B3=310 | B4=330 | B5=210 | B6=390 | B7=40"},
         kFirst},
        kBest, explain_best),
};

}  // namespace

std::span<const Row> electrical_generator() { return kRows; }

}  // namespace busbar::functions
