// Streams of gas: made, read, cooled below the dew point, balanced with others.
#include <array>

#include "fluid/condensation.hpp"
#include "fluid/join.hpp"
#include "fluid/separation.hpp"
#include "fluid/state.hpp"
#include "functions/describe.hpp"
#include "functions/functions.hpp"
#include "functions/gas_arguments.hpp"
#include "gas/published.hpp"

namespace busbar::functions {
namespace {

using gas::Mixture;
using OptionalFlow = std::optional<Flow>;

std::optional<double> si_of(OptionalFlow flow) {
  return flow ? std::optional<double>(flow->si) : std::nullopt;
}

// --- Made ------------------------------------------------------------------------------------

Outcome<Stream> gas_kernel(const Mixture& mixture, Pressure p, Temperature t, OptionalFlow flow,
                           const Options& options) {
  return fluid::gas_stream(mixture, p.si, t.si, si_of(flow),
                           options.datum.value_or(gas::Datum::formation));
}

// The dry air whose record stands among the NASA species.
const Mixture& dry_air() {
  static const Mixture air = [] {
    Composition composition;
    const gas::PublishedMixture* published = gas::published_mixture("dry air, NASA");
    composition.parts.assign(published->parts.begin(), published->parts.end());
    return *Mixture::from(composition);
  }();
  return air;
}

Outcome<Stream> air_kernel(Pressure p, Temperature t, Fraction humidity, OptionalFlow flow,
                           const Options& options) {
  const Outcome<double> saturation = fluid::water_saturation_pressure(t.si);
  double water = 0;
  if (humidity.si > 0) {
    if (!saturation) return saturation.failure().about(2);
    water = humidity.si * *saturation / p.si;
  }
  if (!(water < 1)) {
    return Failure{Fault::impossible,
                   3,
                   "gives the water a partial pressure of {0}, no less than the whole pressure {1}",
                   {{{water * p.si, Quantity::pressure}, {p.si, Quantity::pressure}}}};
  }
  std::array<double, gas::kSpecies> amounts = dry_air().fractions();
  for (double& amount : amounts) amount *= 1 - water;
  amounts[static_cast<std::size_t>(gas::Species::H2O)] = water;
  const Outcome<Mixture> mixture = Mixture::from_amounts(amounts);
  if (!mixture) return mixture.failure().about(3);
  Outcome<Stream> stream = fluid::gas_stream(*mixture, p.si, t.si, si_of(flow),
                                             options.datum.value_or(gas::Datum::formation));
  if (stream) return *stream;
  const std::uint8_t argument = stream.failure().argument;
  return stream.failure().about(argument == 0 ? std::uint8_t{0}
                                              : static_cast<std::uint8_t>(argument - 1));
}

// --- Read ------------------------------------------------------------------------------------

Outcome<Text> composition_of(const Stream& stream, Word basis) {
  if (const Failure water = fluid::refuse_water(stream, 1); water.fault != Fault::none) {
    return water;
  }
  const auto heading = read_heading(basis);
  if (!heading || heading->percent) {
    return Failure{Fault::unknown_word, 2, "is no basis: write \"mole\" or \"mass\""};
  }
  Text text;
  write_composition(text.value, stream.mixture.composition(heading->basis));
  return text;
}

Outcome<MolarMass> molar_mass_of(const Stream& stream) {
  if (!fluid::is_gas(stream)) {
    // R7-97(2012): R = 0.461526 kJ/(kg K) over Rm = 8.31451 J/(mol K).
    constexpr double kWater = 0.018015257;
    return MolarMass{kWater};
  }
  return MolarMass{stream.mixture.molar_mass()};
}

Outcome<Temperature> dew_point_of(const Stream& stream) {
  if (const Failure water = fluid::refuse_water(stream, 1); water.fault != Fault::none) {
    return water;
  }
  const Outcome<double> dew = fluid::dew_point(stream.mixture, stream.pressure);
  if (!dew) return dew.failure().about(1);
  return Temperature{*dew};
}

// --- Cooled and balanced ---------------------------------------------------------------------

Outcome<Stream> cooled_gas_out(const Stream& stream, Temperature t) {
  return fluid::gas_phase(stream, t.si);
}

Outcome<Stream> condensate_out(const Stream& stream, Temperature t) {
  return fluid::condensate(stream, t.si);
}

Outcome<Power> energy_balance(Streams inlets, Streams outlets) {
  const Outcome<double> heat = fluid::heat_taken(inlets, outlets);
  if (!heat) return heat.failure();
  return Power{*heat};
}

// --- Rows ------------------------------------------------------------------------------------

constexpr const char* kChapter = "Gas streams";
constexpr const char* kStreamResult = "A stream";

constexpr Argument kFlow{"flow", "Mass flow; leave it out where it is not known", kAboveZero, 1e6};
constexpr Argument kGas[] = {kCompositionArgument, kGasPressureArgument, kGasTemperatureArgument,
                             kFlow};
constexpr Argument kAir[] = {
    kGasPressureArgument,
    {"temperature", "Dry-bulb temperature", kLowestGasTemperature, kHighestGasTemperature,
     kNasaLimit},
    {"relative humidity",
     "Partial pressure of the water over its saturation pressure, over ice below 0 °C", 0, 1},
    kFlow};
constexpr Argument kStream[] = {{"stream", "A cell with a stream"}};
constexpr Argument kGasStream[] = {{"stream", "A cell with a gas stream"}};
constexpr Argument kStreamBasis[] = {{"stream", "A cell with a gas stream"},
                                     {"basis", "\"mole\" or \"mass\""}};
constexpr Argument kCooled[] = {{"stream", "A cell with a gas stream"},
                                {"temperature", "Temperature to which it is cooled or heated",
                                 kLowestGasTemperature, kHighestGasTemperature, kNasaLimit}};
constexpr Argument kBoundary[] = {{"inlets", "A range whose cells all hold streams that enter"},
                                  {"outlets", "A range whose cells all hold streams that leave"}};

constexpr Source kDewSource{
    "Dalton's law; saturation by IAPWS R7-97(2012) and IAPWS R14-08(2011)", "2012; 2011",
    "partial pressure of water at saturation; enhancement by the other gases left out"};
constexpr Source kBalance{"Conservation of mass and energy",
                          "Moran and Shapiro, Fundamentals of Engineering Thermodynamics",
                          "sections 4.1 to 4.3 and 13.2"};
constexpr Source kText{"Busbar", "stream text, format 1", "carried exactly by the stream"};

constexpr const char* kGasNote =
    "Ideal gas. The enthalpy in the text holds heats of formation; the option datum=25 °C (0 °C, "
    "15 °C) makes readers show the gas as zero there. Water counts as vapour: below the dew point "
    "the stream is refused.";

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kChapter, summary, notes, result, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<gas_kernel>(words("GAS", "Stream of a gas at a pressure and a temperature", kGasNote,
                          kStreamResult, kNasaPolynomials,
                          {"GAS(\"mole: N2 0.75, O2 0.13, CO2 0.04, H2O 0.08\"; 1.03; 560; 500)",
                           "gas 500 kg/s, 1.03 bar, 560 °C"}),
                    kGas, explain_result),
    row<air_kernel>(
        words("AIR", "Stream of humid air at a pressure, a temperature and a relative humidity",
              "The dry air of NASA TP-1906 (N2, O2, Ar, CO2) and water as an ideal gas. As GAS "
              "otherwise.",
              kStreamResult, kNasaPolynomials,
              {"AIR(1.01325; 15; 0.6; 650)", "gas 650 kg/s, 1.01325 bar, 15 °C"}),
        kAir, explain_result),
    row<composition_of>(
        words("COMPOSITION_OF", "Composition of a gas stream on a stated basis",
              "A text of fractions, in the form that every composition argument takes.",
              "A composition text", kText,
              {"COMPOSITION_OF(GAS(\"mole: N2 0.75, O2 0.25\"; 1; 20); \"mole\")",
               "mole: N2 0.75, O2 0.25"}),
        kStreamBasis),
    row<molar_mass_of>(
        words("MOLAR_MASS_OF", "Molar mass of a stream", "", "Molar mass",
              {"ISO 6976:2016 for gases, IAPWS R7-97(2012) for water", "2016; 2012",
               "table A.2; section 2"},
              {"MOLAR_MASS_OF(GAS(\"mole: N2 0.79, O2 0.21\"; 1; 20))", "28.850334"}),
        kStream, explain_first),
    row<dew_point_of>(
        words("DEW_POINT_OF", "Temperature at which the water of a gas stream begins to condense",
              "Below 0 °C the frost point. Water alone: the dew points of acids are far higher.",
              "Temperature", kDewSource, {"DEW_POINT_OF(AIR(1; 30; 0.5))", "18.4462937"}),
        kGasStream, explain_first),
    row<cooled_gas_out>(
        words("COOLED_GAS_OUT", "Gas phase of a gas stream at another temperature",
              "At the pressure of the stream. Below its dew point the gas that is left, saturated "
              "with water; CONDENSATE_OUT gives the water, and ENERGY_BALANCE the heat.",
              kStreamResult, kDewSource,
              {"COOLED_GAS_OUT(GAS(\"mole: N2 0.8, H2O 0.2\"; 1; 150; 10); 40)", "gas"}),
        kCooled, explain_result),
    row<condensate_out>(
        words("CONDENSATE_OUT", "Water that condenses out of a gas stream at a temperature",
              "#N/A at and above the dew point. Pure water: no acid, nothing dissolved.",
              kStreamResult, kDewSource,
              {"CONDENSATE_OUT(GAS(\"mole: N2 0.8, H2O 0.2\"; 1; 150; 10); 40)", "water"}),
        kCooled, explain_result),
    row<energy_balance>(
        words(
            "ENERGY_BALANCE",
            "Heat that streams take between the inlets and the outlets of a boundary",
            "Outlets less inlets, each flow with its enthalpy and heat of formation, water and "
            "steam brought to the same datum: positive when heat must come from outside, negative "
            "when it is given off. Reactions are in it. The flows must balance.",
            "Power", kBalance,
            {"ENERGY_BALANCE(B2; B3:B4)", "-3.54737290",
             "B2=GAS(\"mole: N2 0.8, H2O 0.2\"; 1; 150; 10) | B3=COOLED_GAS_OUT(B2; 40) | "
             "B4=CONDENSATE_OUT(B2; 40)"}),
        kBoundary),
};

}  // namespace

std::span<const Row> gas_streams() { return kRows; }

}  // namespace busbar::functions
