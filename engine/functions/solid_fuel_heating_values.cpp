// Heating values of solid and liquid fuels: estimated from the analysis, and gross against net.
#include <algorithm>
#include <string>
#include <vector>

#include "catalogue/sentence.hpp"
#include "core/text.hpp"
#include "fuel/solid/analysis.hpp"
#include "fuel/solid/conversion.hpp"
#include "fuel/solid/correlations.hpp"
#include "fuel/solid/net_value.hpp"
#include "functions/fuel_arguments.hpp"
#include "functions/functions.hpp"

namespace busbar::functions {
namespace {

namespace solid = fuel::solid;
using solid::Analysis;
using solid::State;

constexpr double kPercent = 100;

// --- Estimated heating values ----------------------------------------------------------------

constexpr const char* kUnknownCorrelation =
    "is not a correlation of this table; write \"Channiwala-Parikh\", \"Dulong\", \"Boie\", "
    "\"IGT\", \"Grummel-Davis\", \"Vondracek\", \"Friedl\", \"Sheng-Azevedo\", \"Parikh "
    "proximate\" or \"Cordero proximate\"";

// The analysis on dry mass; one without ash stays as it is and is refused by the correlation.
Analysis dry_of(const Analysis& analysis) {
  const Outcome<Analysis> dry = solid::in_state(analysis, State::dry, {});
  return dry ? *dry : analysis;
}

Outcome<HeatingValue> fuel_hhv_by_correlation(const Analysis& analysis, Word name, Word basis,
                                              std::optional<Fraction> moisture) {
  const solid::Correlation* correlation = solid::correlation_named(name);
  if (correlation == nullptr) return Failure{Fault::unknown_word, 2, kUnknownCorrelation};
  const Outcome<State> state = fuel_state_of(basis, 3);
  if (!state) return state.failure();
  const Analysis dry = dry_of(analysis);
  const Outcome<double> value = solid::hhv_dry(*correlation, dry);
  if (!value) return value.failure();
  const bool needed = solid::is_moist(*state) && *state != analysis.state;
  if (needed && !moisture) {
    return Failure{Fault::missing, 4,
                   "is left out; the wanted basis needs it and the analysis does not hold it"};
  }
  if (!needed && moisture) {
    return Failure{Fault::impossible, 4,
                   "is given and not needed: the wanted basis holds no moisture that the analysis "
                   "does not state"};
  }
  if (*state == State::dry_ash_free) return HeatingValue{*value / (1 - dry[solid::Part::ash])};
  if (!solid::is_moist(*state)) return HeatingValue{*value};
  const double water = needed ? moisture->si : analysis[solid::Part::moisture];
  return HeatingValue{*value * (1 - water)};
}

void explain_correlation(const Slot* in, const Result&, UnitSet, std::string& text) {
  const solid::Correlation* correlation = solid::correlation_named(in[1].word());
  if (correlation == nullptr) return;
  text += " Estimated at constant volume. Published error: ";
  text += correlation->error;
  text += ". ";
  text += correlation->source;
  text += "; coefficients: ";
  text += correlation->status;
  text += '.';
}

std::string heading(std::string_view what, UnitSet units) {
  std::string text(what);
  text += ", ";
  text += unit_of(units, Quantity::heating_value).symbol;
  return text;
}

std::string_view word_of(solid::Part part) {
  return part == solid::Part::ash ? "ash" : solid::symbol_of(part);
}

Outcome<Grid> fuel_hhv_correlations(const Analysis& analysis, Word kind_word, UnitSet units) {
  const auto kind = solid::class_named(kind_word);
  if (!kind) {
    return Failure{Fault::unknown_word, 2,
                   "is not a kind of fuel; write \"coal\", \"biomass\" or \"other\""};
  }
  const Analysis dry = dry_of(analysis);
  const auto all = solid::correlations();
  constexpr std::size_t kColumns = 6;
  constexpr std::size_t kSummary = 4;
  Grid table(all.size() + 1 + kSummary, kColumns);
  const auto put = [&](std::size_t r, std::size_t c, std::string_view text) {
    table.at(r, c) = std::string(text);
  };
  for (std::size_t r = 0; r < table.rows(); ++r) {
    for (std::size_t c = 0; c < kColumns; ++c) put(r, c, "");
  }
  put(0, 0, "correlation");
  put(0, 1, heading("HHV, dry", units));
  put(0, 2, "applies");
  put(0, 3, "published error");
  put(0, 4, "source");
  put(0, 5, "status of coefficients");
  const Unit& unit = unit_of(units, Quantity::heating_value);
  std::vector<double> values;
  for (std::size_t i = 0; i < all.size(); ++i) {
    const solid::Correlation& correlation = all[i];
    const std::size_t r = i + 1;
    put(r, 0, correlation.name);
    put(r, 3, correlation.error);
    put(r, 4, correlation.source);
    put(r, 5, correlation.status);
    const Outcome<double> value = solid::hhv_dry(correlation, dry);
    if (!correlation.made_for(*kind)) {
      put(r, 2, "no: made for other fuels");
    } else if (value) {
      put(r, 2, "yes");
      table.at(r, 1) = unit.from_si(*value);
      values.push_back(*value);
    } else if (value.failure().fault == Fault::missing) {
      put(r, 2,
          correlation.proximate ? "no: needs volatile matter and ash"
                                : "no: needs the elements and the ash");
    } else if (const auto left = solid::outside(correlation, dry)) {
      std::string text("no: ");
      text += word_of(left->range.part);
      text += ' ';
      append_number(text, left->percent, 4);
      text += " % is outside ";
      append_number(text, left->range.low, 4);
      text += " to ";
      append_number(text, left->range.high, 4);
      text += " %";
      put(r, 2, text);
    }
  }
  if (values.empty()) {
    return Failure{Fault::outside_range, 1,
                   "is such that no correlation for this kind of fuel applies"};
  }
  double sum = 0;
  for (const double value : values) sum += value;
  const double mean = sum / static_cast<double>(values.size());
  const auto [least, most] = std::minmax_element(values.begin(), values.end());
  const std::size_t r = all.size() + 1;
  put(r, 0, "mean of those that apply");
  table.at(r, 1) = unit.from_si(mean);
  put(r + 1, 0, "lowest");
  table.at(r + 1, 1) = unit.from_si(*least);
  put(r + 2, 0, "highest");
  table.at(r + 2, 1) = unit.from_si(*most);
  put(r + 3, 0, "spread over mean");
  table.at(r + 3, 1) = (*most - *least) / mean;
  return table;
}

// --- Gross and net ---------------------------------------------------------------------------

struct Between {
  State from = State::dry;
  State to = State::dry;
  const solid::NetMethod* method = nullptr;
};

Outcome<Between> between(Word from, Word to, Word method_name) {
  const Outcome<State> first = fuel_state_of(from, 3);
  if (!first) return first.failure();
  const Outcome<State> second = fuel_state_of(to, 4);
  if (!second) return second.failure();
  const solid::NetMethod* method = solid::net_method_named(method_name);
  if (method == nullptr) return Failure{Fault::unknown_word, 5, solid::kUnknownNetMethod};
  return Between{*first, *second, method};
}

Outcome<HeatingValue> fuel_lhv_from_hhv(const Analysis& analysis, HeatingValue hhv, Word from,
                                        Word to, Word method, std::optional<Fraction> moisture) {
  const Outcome<Between> way = between(from, to, method);
  if (!way) return way.failure();
  const Outcome<double> net =
      solid::net_from_gross(analysis, {hhv.si, way->from}, way->to, *way->method, si_of(moisture));
  if (!net) return net.failure();
  return HeatingValue{*net};
}

Outcome<HeatingValue> fuel_hhv_from_lhv(const Analysis& analysis, HeatingValue lhv, Word from,
                                        Word to, Word method, std::optional<Fraction> moisture) {
  const Outcome<Between> way = between(from, to, method);
  if (!way) return way.failure();
  const Outcome<double> gross =
      solid::gross_from_net(analysis, {lhv.si, way->from}, way->to, *way->method, si_of(moisture));
  if (!gross) return gross.failure();
  return HeatingValue{*gross};
}

void explain_net(const Slot* in, const Result&, UnitSet, std::string& text) {
  const solid::NetMethod* method = solid::net_method_named(in[4].word());
  if (method == nullptr) return;
  text += " Between a value ";
  text += method->gross;
  text += " and one ";
  text += method->net;
  text += ". ";
  text += method->source;
  text += "; constants: ";
  text += method->status;
  text += '.';
}

void explain_lhv(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  explain_net(in, result, units, text);
  // The one correlation for all fuels, as a check of the value that was handed in.
  const Analysis& analysis = in[0].composition().analysis;
  const solid::Correlation* check = solid::correlation_named("Channiwala-Parikh");
  const auto state = solid::state_named(in[2].word());
  if (check == nullptr || state != State::dry) return;
  const Outcome<double> expected = solid::hhv_dry(*check, dry_of(analysis));
  if (!expected) return;
  text += " Check: Channiwala-Parikh expects ";
  append_measure(text, {*expected, Quantity::heating_value}, units);
  text += " from this analysis, ";
  append_number(text, (*expected / in[1].si - 1) * kPercent, 3);
  text += " % from the value given.";
}

// --- Rows ------------------------------------------------------------------------------------

// Tallow, oils and octane stay below 50 MJ/kg; hydrogen is no solid or liquid fuel here.
constexpr double kMostHeat = 60e6;
constexpr const char* kHeatLimit =
    "more than any solid or liquid fuel gives (common practice, no source)";

constexpr Argument kEstimate[] = {
    kAnalysisArgument,
    {"correlation",
     "Published name, such as \"Channiwala-Parikh\", \"Dulong\" or \"Boie\"; see "
     "FUEL_HHV_CORRELATIONS"},
    {"basis", kFuelBasisWords},
    kWantedMoistureArgument};
constexpr Argument kSpread[] = {
    kAnalysisArgument,
    {"kind",
     "\"coal\" (anthracite to lignite), \"biomass\" (wood, straw, crops) or \"other\" "
     "(waste, sludge, peat, liquids): decides what applies"}};
constexpr Argument kMethod{
    "method",
    "\"ISO 18125\", \"ISO 1928\", \"ISO 1928 constant volume\", \"IPCC 2006\", all from the value "
    "of "
    "a bomb, or \"heat of condensation\" from a gross value at constant pressure"};
constexpr Argument kMoistureEither{
    "moisture", "Fraction of moist mass, of the moist basis that the analysis does not hold", 0,
    kMostFuelMoisture};
constexpr Argument kToNet[] = {
    kAnalysisArgument,
    {"HHV", "Higher heating value as measured", kAboveZero, kMostHeat, kHeatLimit},
    {"HHV basis", kFuelBasisWords},
    {"LHV basis", kFuelBasisWords},
    kMethod,
    kMoistureEither};
constexpr Argument kToGross[] = {kAnalysisArgument,
                                 {"LHV", "Lower heating value", -2.5e6, kMostHeat, kHeatLimit},
                                 {"LHV basis", kFuelBasisWords},
                                 {"HHV basis", kFuelBasisWords},
                                 kMethod,
                                 kMoistureEither};

constexpr Source kCorrelationSource{
    "The paper of each correlation, see FUEL_HHV_CORRELATIONS", "",
    "coefficients per percent of dry mass; some from memory, which the table and WHY say"};
constexpr Source kNetSource{
    "ISO 18125:2017, ISO 1928:2009, IPCC 2006 Guidelines volume 2 box 1.1", "",
    "net calorific value; constants from memory, re-derived from the heat of condensation"};

constexpr const char* kEstimateNote =
    "An estimate where nothing was measured. Refused outside the range in which the correlation "
    "was "
    "fitted. At constant volume, as a bomb gives it.";

constexpr Row kRows[] = {
    row<fuel_hhv_by_correlation>(
        {"FUEL_HHV_BY_CORRELATION",
         kSolidFuels,
         "Higher heating value estimated from an analysis",
         kEstimateNote,
         "Higher heating value by mass, on the basis wanted",
         kCorrelationSource,
         {"FUEL_HHV_BY_CORRELATION(\"mass % dry: C 75.5, H 4.83, O 6.63, N 1.49, S 2.19, Cl 0.11, "
          "ash 9.25\"; \"Channiwala-Parikh\"; \"dry\")",
          "31.3651180"},
         kFirst},
        kEstimate, explain_correlation),
    row<fuel_hhv_correlations>(
        {"FUEL_HHV_CORRELATIONS",
         kSolidFuels,
         "Higher heating value by every correlation that applies, and their spread",
         "On dry mass. Correlations that are not made for the kind of fuel, or were not fitted "
         "there, say so and stay out of the mean.",
         "A table with a heading row: correlation, HHV dry, applies, published error, source, "
         "status; then mean, lowest, highest and spread",
         kCorrelationSource,
         {"INDEX(FUEL_HHV_CORRELATIONS(\"mass % dry: C 75.5, H 4.83, O 6.63, N 1.49, S 2.19, Cl "
          "0.11, ash 9.25\"; \"coal\"); 2; 3)",
          "yes"},
         kFirst},
        kSpread),
    row<fuel_lhv_from_hhv>(
        {"FUEL_LHV_FROM_HHV",
         kSolidFuels,
         "Lower heating value of a solid or liquid fuel from the higher one",
         "Each heating value on its own stated basis. WHY compares a dry HHV with what the "
         "analysis "
         "lets expect.",
         "Lower heating value by mass, on the basis wanted",
         kNetSource,
         {"FUEL_LHV_FROM_HHV(\"mass % dry: C 50, H 6, O 43, N 0.5, ash 0.5\"; 20; \"dry\"; \"as "
          "received\"; \"ISO 18125\"; 0.4)",
          "10.238"},
         kFirst},
        kToNet, explain_lhv),
    row<fuel_hhv_from_lhv>(
        {"FUEL_HHV_FROM_LHV",
         kSolidFuels,
         "Higher heating value of a solid or liquid fuel from the lower one",
         "Each heating value on its own stated basis.",
         "Higher heating value by mass, on the basis wanted",
         kNetSource,
         {"FUEL_HHV_FROM_LHV(\"mass % dry: C 86.3, H 13.6\"; 43; \"dry\"; \"dry\"; \"ISO 1928\")",
          "45.8832"},
         kFirst},
        kToGross, explain_net),
};

}  // namespace

std::span<const Row> solid_fuel_heating_values() { return kRows; }

}  // namespace busbar::functions
