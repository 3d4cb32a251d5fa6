// Analyses of solid and liquid fuels on other bases.
#include <string>

#include "core/text.hpp"
#include "fuel/solid/analysis.hpp"
#include "fuel/solid/conversion.hpp"
#include "functions/fuel_arguments.hpp"
#include "functions/functions.hpp"

namespace busbar::functions {
namespace {

namespace solid = fuel::solid;
using solid::Analysis;
using solid::State;

constexpr double kPercent = 100;

Outcome<Text> fuel_analysis_on_basis(const Analysis& analysis, Word basis,
                                     std::optional<Fraction> moisture,
                                     std::optional<Fraction> ash) {
  const Outcome<State> state = fuel_state_of(basis, 2);
  if (!state) return state.failure();
  const Outcome<Analysis> moved = solid::in_state(analysis, *state, {si_of(moisture), si_of(ash)});
  if (!moved) return moved.failure();
  std::string text("mass ");
  text += solid::name_of(*state);
  text += ':';
  bool first = true;
  for (std::size_t i = 0; i < solid::kParts; ++i) {
    const auto part = static_cast<solid::Part>(i);
    if (!moved->has(part)) continue;
    text += first ? " " : ", ";
    first = false;
    text += solid::symbol_of(part);
    text += ' ';
    append_exact(text, (*moved)[part]);
  }
  return Text{std::move(text)};
}

Outcome<Grid> fuel_analysis_table(const Analysis& analysis, std::optional<Fraction> as_received,
                                  std::optional<Fraction> air_dried, std::optional<Fraction> ash) {
  if (as_received && analysis.state == State::as_received) {
    return Failure{Fault::impossible, 2, "is given, and the analysis as received holds its own"};
  }
  if (air_dried && analysis.state == State::air_dried) {
    return Failure{Fault::impossible, 3, "is given, and the air-dried analysis holds its own"};
  }
  if (ash && analysis.state != State::dry_ash_free) {
    return Failure{Fault::impossible, 4, "is given, and the analysis holds its own"};
  }
  Grid table(solid::kParts + 1, 5);
  table.at(0, 0) = std::string("part, % by mass");
  for (std::size_t i = 0; i < solid::kParts; ++i) {
    table.at(i + 1, 0) = std::string(solid::symbol_of(static_cast<solid::Part>(i)));
  }
  std::size_t column = 0;
  for (const State state :
       {State::as_received, State::air_dried, State::dry, State::dry_ash_free}) {
    ++column;
    table.at(0, column) = std::string(solid::name_of(state));
    for (std::size_t i = 0; i < solid::kParts; ++i) table.at(i + 1, column) = std::string();
    solid::Supplement supplement{{}, si_of(ash)};
    if (state != analysis.state) {
      if (state == State::as_received) supplement.moisture = si_of(as_received);
      if (state == State::air_dried) supplement.moisture = si_of(air_dried);
    }
    // A basis that lacks its moisture or its ash stays empty.
    const Outcome<Analysis> moved = solid::in_state(analysis, state, supplement);
    if (!moved) continue;
    for (std::size_t i = 0; i < solid::kParts; ++i) {
      const auto part = static_cast<solid::Part>(i);
      if (moved->has(part)) table.at(i + 1, column) = (*moved)[part] * kPercent;
    }
  }
  return table;
}

Outcome<Fraction> fuel_analysis_share(const Analysis& analysis, Word word) {
  const auto part = solid::part_named(word);
  if (!part) {
    return Failure{Fault::unknown_word, 2,
                   "is not a part of a fuel analysis; write C, H, O, N, S, Cl, ash, moisture, "
                   "volatile matter or fixed carbon"};
  }
  if (!analysis.has(*part)) return Failure{Fault::missing, 2, "is not stated in the analysis"};
  return Fraction{analysis[*part]};
}

void explain_analysis(const Slot* in, const Result&, UnitSet, std::string& text) {
  const Analysis& analysis = in[0].composition().analysis;
  text += " The analysis is ";
  text += solid::name_of(analysis.state);
  if (analysis.has_ultimate()) {
    text += "; elements, ash and moisture add to ";
    append_number(text, solid::ultimate_sum(analysis) * kPercent, 6);
    text += " %, taken as they are";
  }
  text += '.';
}

constexpr Argument kWantedBasis{"basis", kFuelBasisWords};
constexpr Argument kAsh{"ash", "Fraction of dry mass, for an analysis that is dry ash-free", 0,
                        kMostFuelMoisture};
constexpr Argument kOnBasis[] = {kAnalysisArgument, kWantedBasis, kWantedMoistureArgument, kAsh};
constexpr Argument kTable[] = {
    kAnalysisArgument,
    {"moisture as received", "Fraction of moist mass, where the analysis does not hold it", 0,
     kMostFuelMoisture},
    {"moisture air-dried", "Fraction of moist mass, where the analysis does not hold it", 0,
     kMostFuelMoisture},
    kAsh};
constexpr Argument kShare[] = {kAnalysisArgument,
                               {"part", "Such as \"C\", \"ash\" or \"moisture\""}};
constexpr Source kBases{"ISO 1170:2020, Coal and coke: calculation of analyses to different bases",
                        "ISO 16993:2016 for biofuels, ASTM D3180", "table of conversion factors"};

constexpr const char* kClosureNote =
    "Elements, ash and moisture must add to one within half a percent, volatile matter, fixed "
    "carbon, ash and moisture likewise; nothing is normalised.";

constexpr Row kRows[] = {
    row<fuel_analysis_on_basis>(
        {"FUEL_ANALYSIS_ON_BASIS",
         kSolidFuels,
         "Analysis of a fuel on another basis",
         kClosureNote,
         "A text of fractions that every analysis argument takes",
         kBases,
         {"FUEL_ANALYSIS_ON_BASIS(\"mass % dry: C 75, H 5, O 10, ash 10\"; \"as received\"; 0.2)",
          "mass as received: C 0.6"},
         kFirst},
        kOnBasis, explain_analysis),
    row<fuel_analysis_table>(
        {"FUEL_ANALYSIS_TABLE",
         kSolidFuels,
         "Analysis of a fuel on all bases side by side",
         "A basis whose moisture or ash is not known stays empty.",
         "A table with a heading row: part, as received, air-dried, dry, dry ash-free",
         kBases,
         {"INDEX(FUEL_ANALYSIS_TABLE(\"mass % dry: C 75, H 5, O 10, ash 10\"; 0.2); 2; 5)",
          "83.3333333"},
         kFirst},
        kTable),
    row<fuel_analysis_share>(
        {"FUEL_ANALYSIS_SHARE",
         kSolidFuels,
         "Share of one part in an analysis",
         "On the basis of the analysis. Fixed carbon that is left out is what remains.",
         "A fraction",
         kBases,
         {"FUEL_ANALYSIS_SHARE(\"mass % ar: moisture 10, VM 30, ash 15\"; \"fixed carbon\")",
          "0.45"},
         kFirst},
        kShare, explain_analysis),
};

}  // namespace

std::span<const Row> solid_fuels() { return kRows; }

}  // namespace busbar::functions
