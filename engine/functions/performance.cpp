// Heat rate, efficiency, bases and the electrical end of the chain.
#include "fuel/basis.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

// An efficiency on the lower heating value may pass 1 where the exhaust is condensed.
constexpr double kMostEfficiency = 1.2;

Outcome<HeatRate> heat_rate(Fraction efficiency) { return HeatRate{1 / efficiency.si}; }

Outcome<Fraction> efficiency_from_heat_rate(HeatRate rate) {
  if (rate.si < 1) {
    return Failure{Fault::impossible,
                   1,
                   "{0} is below {1}: more electricity than fuel energy",
                   {{{rate.si, Quantity::heat_rate}, {1, Quantity::heat_rate}}}};
  }
  return Fraction{1 / rate.si};
}

Outcome<Fraction> efficiency_chain(Numbers<Fraction> links) {
  double product = 1;
  for (const double link : links.si) product *= link;
  return Fraction{product};
}

Outcome<SameUnit> generator_power(SameUnit shaft, Fraction efficiency) {
  return SameUnit{shaft.si * efficiency.si};
}

Outcome<SameUnit> net_power(SameUnit gross, SameUnit auxiliary) {
  return SameUnit{gross.si - auxiliary.si};
}

// Factor on fuel energy between the bases named by arguments 2 and 3.
Outcome<double> fuel_energy_ratio(Word from, Word to, SameUnit higher, SameUnit lower) {
  static constexpr const char* kUnknown =
      "is not a heating-value basis; write \"HHV\" or \"LHV\" (gross and net name the boundary)";
  const auto source = fuel::basis_named(from);
  if (!source) return Failure{Fault::unknown_word, 2, kUnknown};
  const auto target = fuel::basis_named(to);
  if (!target) return Failure{Fault::unknown_word, 3, kUnknown};
  return fuel::energy_ratio(*source, *target, higher.si, lower.si);
}

Outcome<Fraction> efficiency_on_basis(Fraction efficiency, Word from, Word to, SameUnit higher,
                                      SameUnit lower) {
  const Outcome<double> ratio = fuel_energy_ratio(from, to, higher, lower);
  if (!ratio) return ratio.failure();
  const double changed = efficiency.si / *ratio;
  if (changed > kMostEfficiency) {
    return Failure{Fault::impossible,
                   5,
                   "does not go with the higher one: the efficiency would become {0}, above {1}",
                   {{{changed, Quantity::fraction}, {kMostEfficiency, Quantity::fraction}}}};
  }
  return Fraction{changed};
}

Outcome<SameUnit> heat_rate_on_basis(SameUnit rate, Word from, Word to, SameUnit higher,
                                     SameUnit lower) {
  const Outcome<double> ratio = fuel_energy_ratio(from, to, higher, lower);
  if (!ratio) return ratio.failure();
  return SameUnit{rate.si * *ratio};
}

void explain_basis(const Slot*, const Result&, UnitSet, std::string& text) {
  text +=
      " Holds for output over fuel energy; a boiler efficiency by the loss method changes its "
      "losses with the basis and must be worked out anew.";
}

constexpr const char* kChapter = "Performance";

constexpr Argument kEfficiency[] = {
    {"efficiency", "Electricity over fuel energy, on any one stated basis", kAboveZero, 1}};
constexpr Argument kHeatRate[] = {
    {"heat rate", "Fuel energy per unit of electricity, without a heat credit", kAboveZero, 1e3}};
constexpr Argument kLinks[] = {
    {"links", "Range of the efficiencies in the chain, each a fraction", kAboveZero, 1}};
constexpr Argument kGenerator[] = {
    {"shaft power", "Power at the generator coupling", kAboveZero},
    {"generator efficiency", "At this load and power factor, as a fraction", kAboveZero, 1}};
constexpr Argument kNet[] = {
    {"gross power", "Power at the generator terminals", kAboveZero},
    {"auxiliary power", "Power that the plant itself takes, in the same unit", kAboveZero}};
constexpr Argument kFrom{"from basis", "\"HHV\" or \"LHV\": the basis that the value is on"};
constexpr Argument kTo{"to basis", "\"HHV\" or \"LHV\": the basis that is wanted"};
constexpr Argument kHigher{"higher heating value", "Of the fuel as fired", kAboveZero};
constexpr Argument kLower{"lower heating value", "Of the same fuel, in the same unit", kAboveZero};
constexpr Argument kEfficiencyBasis[] = {
    {"efficiency", "Output over fuel energy, as a fraction", kAboveZero, kMostEfficiency},
    kFrom,
    kTo,
    kHigher,
    kLower};
constexpr Argument kRateBasis[] = {
    {"heat rate", "Fuel energy over output, in any unit", kAboveZero}, kFrom, kTo, kHigher, kLower};

constexpr Source kRate{"Definition, with 1 kWh = 3600 kJ by the SI Brochure", "9th ed. 2019",
                       "heat rate = 1/efficiency"};
constexpr Source kBasis{"ISO 1928:2020, gross and net calorific value at constant pressure", "",
                        "fuel energy = mass times heating value, on either basis"};
constexpr Source kChain{"Conservation of energy along a chain of conversions", "",
                        "the product of the links"};
constexpr Source kGeneratorSource{"IEC 60034-2-1", "2014", "efficiency = output over input"};
constexpr Source kNetSource{"Definition", "common practice, no source",
                            "net = gross at the generator terminals minus auxiliary power"};

constexpr const char* kBasisNote =
    "Holds for output over fuel energy (plant, unit, engine). It does not hold for a boiler "
    "efficiency by the loss method, whose losses change with the basis.";

constexpr Row kRows[] = {
    row<heat_rate>({"HEAT_RATE",
                    kChapter,
                    "Heat rate of an efficiency",
                    "The basis (HHV or LHV) and boundary (gross or net) of the efficiency are "
                    "those of the heat rate.",
                    "Heat rate",
                    kRate,
                    {"HEAT_RATE(0.4)", "9000"},
                    kFirst},
                   kEfficiency),
    row<efficiency_from_heat_rate>(
        {"EFFICIENCY_FROM_HEAT_RATE",
         kChapter,
         "Efficiency of a heat rate",
         "Basis and boundary stay. A heat rate below 3600 kJ/kWh would give more electricity than "
         "fuel energy and is refused.",
         "A fraction",
         kRate,
         {"EFFICIENCY_FROM_HEAT_RATE(9000)", "0.4"},
         kFirst},
        kHeatRate),
    row<efficiency_chain>(
        {"EFFICIENCY_CHAIN",
         kChapter,
         "Product of the efficiencies of a chain",
         "A blank cell in the range is #N/A: a missing link is not a perfect one.",
         "A fraction",
         kChain,
         {"EFFICIENCY_CHAIN({0.9; 0.5; 0.98})", "0.441"},
         kFirst},
        kLinks),
    row<efficiency_on_basis>({"EFFICIENCY_ON_BASIS",
                              kChapter,
                              "An efficiency on another heating-value basis",
                              kBasisNote,
                              "A fraction",
                              kBasis,
                              {"EFFICIENCY_ON_BASIS(0.55; \"LHV\"; \"HHV\"; 55.5; 50)", "0.495495"},
                              kFirst},
                             kEfficiencyBasis, explain_basis),
    row<heat_rate_on_basis>({"HEAT_RATE_ON_BASIS",
                             kChapter,
                             "A heat rate on another heating-value basis",
                             kBasisNote,
                             "Heat rate, in the unit given",
                             kBasis,
                             {"HEAT_RATE_ON_BASIS(6500; \"LHV\"; \"HHV\"; 55.5; 50)", "7215"},
                             kFirst},
                            kRateBasis, explain_basis),
    row<generator_power>({"GENERATOR_POWER",
                          kChapter,
                          "Gross electrical power at the generator terminals",
                          "",
                          "Power, in the unit given",
                          kGeneratorSource,
                          {"GENERATOR_POWER(100; 0.985)", "98.5"},
                          kFirst},
                         kGenerator),
    row<net_power>({"NET_POWER",
                    kChapter,
                    "Net electrical power that the plant sends out",
                    "Zero auxiliary power is refused: a gross figure would pass for a net one.",
                    "Power, in the unit given",
                    kNetSource,
                    {"NET_POWER(100; 6.5)", "93.5"},
                    kFirst},
                   kNet),
};

}  // namespace

std::span<const Row> performance() { return kRows; }

}  // namespace busbar::functions
