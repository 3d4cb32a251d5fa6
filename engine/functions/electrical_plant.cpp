// Transformers, auxiliary motors, house load, and the chain from shaft to busbar.
#include <array>
#include <vector>

#include "core/text.hpp"
#include "electrical/chain.hpp"
#include "electrical/motor_classes.hpp"
#include "electrical/transformer.hpp"
#include "electrical/typical.hpp"
#include "functions/describe.hpp"
#include "functions/electrical_arguments.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

using electrical::kColdestWinding;
using electrical::kHottestWinding;

Outcome<ComponentPower> transformer_loss(ComponentPower no_load, ComponentPower at_rated,
                                         Fraction load) {
  return ComponentPower{electrical::transformer_loss(no_load.si, at_rated.si, load.si)};
}

Outcome<ComponentPower> load_loss_at_temperature(ComponentPower load_loss,
                                                 ComponentPower resistance_loss, Temperature from,
                                                 Temperature to, Word word) {
  const auto conductor = electrical::conductor_named(word);
  if (!conductor) return Failure{Fault::unknown_word, 5, electrical::kUnknownConductor};
  const auto found = electrical::load_loss_at_temperature(load_loss.si, resistance_loss.si, from.si,
                                                          to.si, *conductor);
  if (!found) return found.failure();
  return ComponentPower{*found};
}

Outcome<Fraction> transformer_efficiency(ApparentPower rated, ComponentPower no_load,
                                         ComponentPower at_rated, Fraction load, Fraction factor) {
  const auto found =
      electrical::transformer_efficiency(rated.si, no_load.si, at_rated.si, load.si, factor.si);
  if (!found) return found.failure();
  return Fraction{*found};
}

Outcome<Number> transformer_best_load(ComponentPower no_load, ComponentPower at_rated) {
  return Number{electrical::transformer_best_load(no_load.si, at_rated.si)};
}

Outcome<Fraction> transformer_peak_efficiency(ApparentPower rated, ComponentPower no_load,
                                              ComponentPower at_rated) {
  const auto found = electrical::peak_efficiency(rated.si, no_load.si, at_rated.si);
  if (!found) return found.failure();
  return Fraction{*found};
}

Outcome<Fraction> motor_ie_efficiency(Word word, ComponentPower rated, Number poles,
                                      Frequency frequency) {
  const auto efficiency_class = electrical::efficiency_class_named(word);
  if (!efficiency_class) {
    return Failure{Fault::unknown_word, 1,
                   "is not an efficiency class of this table; write \"IE1\", \"IE2\", \"IE3\" or "
                   "\"IE4\""};
  }
  const auto found =
      electrical::class_efficiency(*efficiency_class, rated.si, poles.si, frequency.si);
  if (!found) return found.failure();
  return Fraction{*found};
}

Outcome<Power> house_load(Numbers<ComponentPower> shaft_powers, Numbers<Fraction> efficiencies) {
  const auto found = electrical::house_load(shaft_powers.si, efficiencies.si);
  if (!found) return found.failure();
  return Power{*found};
}

Outcome<Grid> shaft_to_busbar(Power shaft, Numbers<ComponentPower> generator_losses,
                              Power auxiliary, Numbers<ComponentPower> transformer_losses,
                              UnitSet units) {
  const auto chain = electrical::shaft_to_busbar(shaft.si, generator_losses.si, auxiliary.si,
                                                 transformer_losses.si);
  if (!chain) return chain.failure();
  struct Place {
    std::string_view name;
    double power = 0;
    std::string_view taken;
    double before = 0;
  };
  const std::array<Place, 4> places{{
      {"shaft, at the generator coupling", chain->shaft, "", 0},
      {"gross, at the generator terminals", chain->gross, "generator losses", chain->shaft},
      {"into the step-up transformer", chain->transformer, "house load", chain->gross},
      {"net, at the busbar", chain->busbar, "transformer losses", chain->transformer},
  }};
  Grid table(places.size() + 1, 6);
  table.at(0, 0) = std::string("place");
  table.at(0, 1) = heading("power", Quantity::power, units);
  table.at(0, 2) = std::string("taken off before");
  table.at(0, 3) = heading("taken off", Quantity::component_power, units);
  table.at(0, 4) = std::string("of the power before");
  table.at(0, 5) = std::string("of the shaft power");
  for (std::size_t i = 0; i < places.size(); ++i) {
    const Place& place = places[i];
    const std::size_t r = i + 1;
    table.at(r, 0) = std::string(place.name);
    table.at(r, 1) = unit_of(units, Quantity::power).from_si(place.power);
    table.at(r, 2) = std::string(place.taken);
    table.at(r, 3) = std::string();
    table.at(r, 4) = std::string();
    if (i > 0) {
      table.at(r, 3) =
          unit_of(units, Quantity::component_power).from_si(place.before - place.power);
      table.at(r, 4) = place.power / place.before;
    }
    table.at(r, 5) = place.power / chain->shaft;
  }
  return table;
}

Outcome<Grid> typical_efficiency(Word which) {
  std::vector<electrical::TypicalRange> chosen;
  if (equal_ignoring_case(trimmed(which), "all")) {
    const auto all = electrical::typical_ranges();
    chosen.assign(all.begin(), all.end());
  } else {
    const auto found = electrical::typical_range(which);
    if (!found) return found.failure();
    chosen.push_back(**found);
  }
  Grid table(chosen.size() + 1, 5);
  table.at(0, 0) = std::string("machine");
  table.at(0, 1) = std::string("size");
  table.at(0, 2) = std::string("from");
  table.at(0, 3) = std::string("to");
  table.at(0, 4) = std::string("status");
  for (std::size_t i = 0; i < chosen.size(); ++i) {
    table.at(i + 1, 0) = std::string(chosen[i].machine);
    table.at(i + 1, 1) = std::string(chosen[i].size);
    table.at(i + 1, 2) = chosen[i].low;
    table.at(i + 1, 3) = chosen[i].high;
    table.at(i + 1, 4) = std::string(electrical::kTypicalStatus);
  }
  return table;
}

void explain_class(const Slot* in, const Result&, UnitSet, std::string& text) {
  text +=
      " The least nominal efficiency at rated load, 4 poles, 50 Hz; a motor within the tolerance "
      "of IEC 60034-1 may test lower, and at part load it is another one.";
  constexpr double kConfirmed = 315e3;
  if (in[1].si > kConfirmed) {
    text += " That the table goes on at this value from 315 to 1000 kW is from memory.";
  }
}

constexpr const char* kChapter = "Transformers and auxiliaries";

constexpr Argument kRated{"rated apparent power", "In MVA", kAboveZero, kMostPower};
constexpr Argument kNoLoad{"no-load loss", "At rated voltage; cooling at no load may be added",
                           kAboveZero, kMostComponentPower};
constexpr Argument kLoadLoss{"load loss", "At rated current and the stated temperature", kAboveZero,
                             kMostComponentPower};
constexpr Argument kLoad{"load", "Current as a fraction of the rated one", kAboveZero, 1.5,
                         "the load to which losses are scaled"};
constexpr const char* kWindingLimit = "the windings that the correction is meant for";

constexpr Argument kLoss[] = {kNoLoad, kLoadLoss, kLoad};
constexpr Argument kAtTemperature[] = {
    {"load loss", "At rated current, as measured", kAboveZero, kMostComponentPower},
    {"resistance loss", "Its I²R part at the same temperature, from the resistances", kAboveZero,
     kMostComponentPower},
    {"measured at", "Winding temperature of the measurement", kColdestWinding, kHottestWinding,
     kWindingLimit},
    {"stated temperature", "Winding temperature to which the loss is stated, often 75 °C",
     kColdestWinding, kHottestWinding, kWindingLimit},
    {"conductor", "\"copper\" or \"aluminium\""}};
constexpr Argument kEfficiency[] = {kRated, kNoLoad, kLoadLoss, kLoad, kPowerFactor};
constexpr Argument kBest[] = {kNoLoad, kLoadLoss};
constexpr Argument kPeak[] = {kRated, kNoLoad, kLoadLoss};
constexpr Argument kMotor[] = {
    {"class", "\"IE1\", \"IE2\", \"IE3\" or \"IE4\""},
    {"rated power", "Mechanical power on the nameplate", electrical::kLeastClassPower,
     electrical::kMostClassPower, "the rated powers of the classes"},
    {"poles", "4: the table of that number of poles is carried", 2, 8, "the poles of the classes"},
    {"frequency", "50 Hz: the table for that grid is carried", 1, 100,
     "the frequencies of the classes"}};
constexpr Argument kHouse[] = {
    {"shaft powers", "Range of powers taken at the motor shafts; 0 for one at rest", 0,
     kMostComponentPower, "for a driven machine takes power"},
    {"efficiencies", "Range of efficiencies of motor and converter at that load, as fractions",
     kAboveZero, 1, "for no motor gives more power than it takes"}};
constexpr Argument kChain[] = {
    {"shaft power", "At the generator coupling", kAboveZero, kMostPower},
    {"generator losses", "Range of all generator losses at this load", 0, kMostComponentPower,
     "for a loss is never negative"},
    {"auxiliary power", "House load, taken between generator and step-up transformer", kAboveZero,
     kMostPower},
    {"transformer losses", "Range of the losses of the step-up transformer at this load", 0,
     kMostComponentPower, "for a loss is never negative"}};
constexpr Argument kTypical[] = {{"machine", "\"all\", or one name of the table"}};

constexpr const char* kTransformerBook = "Fitzgerald, Kingsley and Umans, Electric Machinery";
constexpr Source kLossSource{kTransformerBook, "6th ed.",
                             "section 2.5: no-load loss, and load loss with the square of current"};
constexpr Source kTemperatureSource{"IEC 60076-1, power transformers, general", "2011",
                                    "annex E, temperature correction of load loss"};
constexpr Source kPeakSource{"Regulation (EU) 548/2014 and EN 50588-1", "2014",
                             "annex II, peak efficiency index; from memory"};
constexpr Source kClassSource{"IEC 60034-30-1, efficiency classes of line operated AC motors",
                              "2014", "50 Hz, 4 poles"};
constexpr Source kHouseSource{"Conservation of energy", "",
                              "electrical input = shaft power over efficiency, summed"};
constexpr Source kChainSource{"Conservation of energy", "",
                              "what enters less what is lost or taken is what leaves"};
constexpr Source kTypicalSource{"Trade figures", "common practice, no source",
                                "from memory: check before use"};

constexpr Row kRows[] = {
    row<transformer_loss>({"TRANSFORMER_LOSS",
                           kChapter,
                           "Losses of a transformer at a load",
                           kHighVoltage,
                           "Loss",
                           kLossSource,
                           {"TRANSFORMER_LOSS(75; 420; 0.9)", "415.2"},
                           kFirst},
                          kLoss),
    row<load_loss_at_temperature>(
        {"TRANSFORMER_LOAD_LOSS_AT_TEMPERATURE",
         kChapter,
         "Load loss of a transformer at another winding temperature",
         "The I²R part grows with the resistance, the additional losses fall with it.",
         "Loss",
         kTemperatureSource,
         {"TRANSFORMER_LOAD_LOSS_AT_TEMPERATURE(380; 330; 24; 75; \"copper\")", "436.754889"},
         kFirst},
        kAtTemperature),
    row<transformer_efficiency>(
        {"TRANSFORMER_EFFICIENCY_AT_LOAD",
         kChapter,
         "Efficiency of a transformer at a load and power factor",
         "Output = load times rated apparent power times power factor.",
         "A fraction",
         kLossSource,
         {"TRANSFORMER_EFFICIENCY_AT_LOAD(160; 75; 420; 0.9; 0.85)", "0.996619311"},
         kFirst},
        kEfficiency),
    row<transformer_best_load>({"TRANSFORMER_BEST_LOAD",
                                kChapter,
                                "Load at which the efficiency of a transformer peaks",
                                "Where the load loss equals the no-load loss.",
                                "Load as a fraction of the rated one",
                                kLossSource,
                                {"TRANSFORMER_BEST_LOAD(75; 420)", "0.422577127"},
                                kFirst},
                               kBest),
    row<transformer_peak_efficiency>(
        {"TRANSFORMER_PEAK_EFFICIENCY",
         kChapter,
         "Peak efficiency index of a transformer",
         "At the best load and a power factor of 1; cooling power at no load belongs into the "
         "no-load loss.",
         "A fraction",
         kPeakSource,
         {"TRANSFORMER_PEAK_EFFICIENCY(160; 75; 420)", "0.99778147"},
         kFirst},
        kPeak),
    row<motor_ie_efficiency>(
        {"MOTOR_IE_EFFICIENCY",
         kChapter,
         "Least efficiency of a motor in its IE class",
         "At rated load, for mains-fed motors of 4 poles at 50 Hz. Between the powers of the table "
         "the standard's polynomial, rounded to 0.1 %; from 200 kW on the value stays.",
         "A fraction",
         kClassSource,
         {"MOTOR_IE_EFFICIENCY(\"IE3\"; 55; 4; 50)", "0.946"},
         kFirst},
        kMotor, explain_class),
    row<house_load>({"HOUSE_LOAD",
                     kChapter,
                     "Electrical power that the motors of a plant take",
                     "",
                     "Power",
                     kHouseSource,
                     {"HOUSE_LOAD(B2:B4; C2:C4)", "3.38485485",
                      "B2=2400 | B3=850 | B4=0 | C2=0.962 | C3=0.955 | C4=0.95"},
                     kFirst},
                    kHouse),
    row<shaft_to_busbar>(
        {"SHAFT_TO_BUSBAR",
         kChapter,
         "Table from shaft power to net power at the busbar",
         "House load is taken off between generator and step-up transformer. Losses are those at "
         "this load, see GENERATOR_LOSS_AT_LOAD and TRANSFORMER_LOSS.\n\nFor appraisal only. "
         "Terminals, windings and excitation circuits are dangerous to life; measurements on them "
         "belong to qualified people under local codes and the rules of the site.",
         "A table with a heading row: place, power, what was taken off before, how much, ratio to "
         "the power before, ratio to the shaft power",
         kChainSource,
         {"INDEX(SHAFT_TO_BUSBAR(121.7; B2:B7; 6.4; C2:C3); 5; 2)", "113.185",
          "B2=420 | B3=310 | B4=330 | B5=210 | B6=390 | B7=40 | C2=75 | C3=340"},
         kFirst},
        kChain),
    row<typical_efficiency>({"TYPICAL_ELECTRICAL_EFFICIENCY",
                             kChapter,
                             "Usual efficiencies of generators, transformers and drives",
                             "For a first look at a claim, never a limit: every line is from "
                             "memory of the trade.",
                             "A table with a heading row: machine, size, from, to, status",
                             kTypicalSource,
                             {"INDEX(TYPICAL_ELECTRICAL_EFFICIENCY(\"auxiliary transformer\"); 2; "
                              "3)",
                              "0.99"},
                             kFirst},
                            kTypical),
};

}  // namespace

std::span<const Row> electrical_plant() { return kRows; }

}  // namespace busbar::functions
