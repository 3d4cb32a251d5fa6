// Properties of gases as plain numbers.
#include "catalogue/sentence.hpp"
#include "fluid/condensation.hpp"
#include "functions/as.hpp"
#include "functions/functions.hpp"
#include "functions/gas_arguments.hpp"
#include "gas/properties.hpp"
#include "gas/transport.hpp"

namespace busbar::functions {
namespace {

using gas::Mixture;

Outcome<gas::Datum> datum_in(Word word, std::uint8_t argument) {
  const auto datum = gas::datum_named(word);
  if (datum) return *datum;
  return Failure{Fault::unknown_word, argument,
                 "is no datum: write \"formation\", \"0 °C\", \"15 °C\" or \"25 °C\""};
}

Outcome<Enthalpy> gas_enthalpy(const Mixture& mixture, Temperature t, Word word) {
  const Outcome<gas::Datum> datum = datum_in(word, 3);
  if (!datum) return datum.failure();
  return as<Enthalpy>(gas::enthalpy(mixture, t.si, *datum));
}

// With the pressure known, a gas below its dew point is refused.
template <class Q, Outcome<double> (*kProperty)(const Mixture&, double, double)>
Outcome<Q> at_pressure(const Mixture& mixture, Pressure p, Temperature t) {
  const Failure failure = fluid::check_condensation(mixture, p.si, t.si);
  if (failure.fault != Fault::none) return failure;
  return as<Q>(kProperty(mixture, p.si, t.si));
}

template <class Q, Outcome<double> (*kProperty)(const Mixture&, double)>
Outcome<Q> at_temperature(const Mixture& mixture, Temperature t) {
  return as<Q>(kProperty(mixture, t.si));
}

Outcome<HeatCapacity> mean_heat_capacity(const Mixture& mixture, Temperature from, Temperature to) {
  return as<HeatCapacity>(gas::mean_heat_capacity(mixture, from.si, to.si));
}

Outcome<Temperature> temperature_at_enthalpy(const Mixture& mixture, Enthalpy h, Word word) {
  const Outcome<gas::Datum> datum = datum_in(word, 3);
  if (!datum) return datum.failure();
  return as<Temperature>(gas::temperature_at_enthalpy(mixture, h.si, *datum));
}

Outcome<Temperature> temperature_at_entropy(const Mixture& mixture, Pressure p, Entropy s) {
  const Outcome<double> t = gas::temperature_at_entropy(mixture, p.si, s.si);
  if (!t) return t.failure();
  const Failure failure = fluid::check_condensation(mixture, p.si, *t);
  if (failure.fault != Fault::none) return failure;
  return Temperature{*t};
}

Outcome<MolarMass> gas_molar_mass(const Mixture& mixture) {
  return MolarMass{mixture.molar_mass()};
}

Outcome<Entropy> specific_gas_constant(const Mixture& mixture) {
  return Entropy{gas::specific_gas_constant(mixture)};
}

Outcome<Temperature> dew_point(const Mixture& mixture, Pressure p) {
  return as<Temperature>(fluid::dew_point(mixture, p.si));
}

constexpr const char* kChapter = "Gases";

constexpr Argument kComposition[] = {kCompositionArgument};
constexpr Argument kCompositionTemperature[] = {kCompositionArgument, kGasTemperatureArgument};
constexpr Argument kCompositionTemperatureDatum[] = {kCompositionArgument, kGasTemperatureArgument,
                                                     kDatumArgument};
constexpr Argument kCompositionPressureTemperature[] = {kCompositionArgument, kGasPressureArgument,
                                                        kGasTemperatureArgument};
constexpr Argument kCompositionPressure[] = {kCompositionArgument, kGasPressureArgument};
constexpr Argument kSpan[] = {kCompositionArgument,
                              {"from temperature", "Temperature at one end", kLowestGasTemperature,
                               kHighestGasTemperature, kNasaLimit},
                              {"to temperature", "Temperature at the other end",
                               kLowestGasTemperature, kHighestGasTemperature, kNasaLimit}};
constexpr Argument kCompositionEnthalpyDatum[] = {
    kCompositionArgument,
    {"enthalpy", "Specific enthalpy on the datum", -1e8, 1e9},
    kDatumArgument};
constexpr Argument kCompositionPressureEntropy[] = {
    kCompositionArgument,
    kGasPressureArgument,
    {"entropy", "Absolute specific entropy, as GAS_ENTROPY gives it", -1e5, 1e6}};

constexpr const char* kVapourNote =
    "Water counts as vapour: below the dew point, which needs a pressure (GAS_DEW_POINT), part of "
    "it is liquid and the value does not hold.";
constexpr const char* kEntropyNote =
    "Absolute (third law) entropy of the ideal gas with its entropy of mixing; 0 at 0 K, so no "
    "datum. Refused below the dew point.";
constexpr Source kDewSource{
    "Dalton's law; saturation by IAPWS R7-97(2012) and IAPWS R14-08(2011)", "2012; 2011",
    "partial pressure of water at saturation; enhancement by the other gases left out"};

constexpr Source kTransport{
    "E. W. Lemmon and R. T. Jacobsen, Int. J. Thermophys. 25; A. Fenghour et al., J. Phys. Chem. "
    "Ref. Data 27; IAPWS R12-08 and R15-11; R. A. Svehla, NASA TR R-132; C. R. Wilke, J. Chem. "
    "Phys. 18",
    "2004; 1998; 2008 and 2011; 1962; 1950",
    "dilute-gas terms and Wilke's rule; coefficients from memory"};
constexpr const char* kTransportNote =
    "At low pressure: up to 10 bar the pressure adds less than 2 % above 0 °C. Wilke's rule is "
    "good to about 2 % in viscosity; conductivities are good to about 5 %. Compositions of N2, O2, "
    "Ar, CO2, H2O, CO, H2, CH4, SO2, NO, He and Ne; with water from 0 °C to 900 °C.";

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kChapter, summary, notes, result, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<gas_enthalpy>(
        words("GAS_ENTHALPY", "Specific enthalpy of a gas at a temperature, on a stated datum",
              kVapourNote, "Specific enthalpy", kNasaPolynomials,
              {"GAS_ENTHALPY(\"mole: N2 0.79, O2 0.21\"; 500; \"25 °C\")", "497.662215"}),
        kCompositionTemperatureDatum, explain_gas),
    row<at_pressure<Entropy, gas::entropy>>(
        words("GAS_ENTROPY", "Absolute specific entropy of a gas at a pressure and a temperature",
              kEntropyNote, "Specific entropy", kNasaPolynomials,
              {"GAS_ENTROPY(\"mole: N2 0.79, O2 0.21\"; 10; 500)", "7.21621802"}),
        kCompositionPressureTemperature, explain_gas),
    row<at_temperature<HeatCapacity, gas::heat_capacity>>(
        words("GAS_HEAT_CAPACITY", "Isobaric heat capacity cp of a gas", kVapourNote,
              "Specific heat capacity at constant pressure", kNasaPolynomials,
              {"GAS_HEAT_CAPACITY(\"mole: N2 0.79, O2 0.21\"; 500)", "1.10002051"}),
        kCompositionTemperature, explain_gas),
    row<at_temperature<HeatCapacity, gas::isochoric_heat_capacity>>(
        words("GAS_ISOCHORIC_HEAT_CAPACITY", "Isochoric heat capacity cv of a gas", kVapourNote,
              "Specific heat capacity at constant volume", kNasaPolynomials,
              {"GAS_ISOCHORIC_HEAT_CAPACITY(\"mole: N2 0.79, O2 0.21\"; 500)", "0.811825928"}),
        kCompositionTemperature, explain_gas),
    row<mean_heat_capacity>(
        words("GAS_MEAN_HEAT_CAPACITY", "Mean isobaric heat capacity between two temperatures",
              kVapourNote, "Enthalpy difference over temperature difference", kNasaPolynomials,
              {"GAS_MEAN_HEAT_CAPACITY(\"mole: N2 0.79, O2 0.21\"; 25; 500)", "1.04770993"}),
        kSpan, explain_gas),
    row<at_temperature<Number, gas::heat_capacity_ratio>>(
        words("GAS_HEAT_CAPACITY_RATIO", "Ratio cp/cv of a gas, its isentropic exponent",
              kVapourNote, "Ratio of heat capacities", kNasaPolynomials,
              {"GAS_HEAT_CAPACITY_RATIO(\"mole: N2 0.79, O2 0.21\"; 500)", "1.35499554"}),
        kCompositionTemperature, explain_gas),
    row<at_temperature<Velocity, gas::speed_of_sound>>(
        words("GAS_SPEED_OF_SOUND", "Speed of sound in a gas", kVapourNote, "Velocity",
              kNasaPolynomials,
              {"GAS_SPEED_OF_SOUND(\"mole: N2 0.79, O2 0.21\"; 500)", "549.469664"}),
        kCompositionTemperature, explain_gas),
    row<at_pressure<Density, gas::density>>(
        words("GAS_DENSITY", "Density of a gas at a pressure and a temperature",
              "Ideal gas. Refused below the dew point.", "Density", kNasaPolynomials,
              {"GAS_DENSITY(\"mole: N2 0.79, O2 0.21\"; 10; 500)", "4.48797496"}),
        kCompositionPressureTemperature, explain_gas),
    row<at_temperature<Viscosity, gas::viscosity>>(
        words("GAS_VISCOSITY", "Dynamic viscosity of a gas at low pressure", kTransportNote,
              "Dynamic viscosity", kTransport, {"GAS_VISCOSITY(\"mole: N2 1\"; 26.85)", "17.8770"}),
        kCompositionTemperature, explain_gas),
    row<at_temperature<ThermalConductivity, gas::thermal_conductivity>>(
        words("GAS_THERMAL_CONDUCTIVITY", "Thermal conductivity of a gas at low pressure",
              kTransportNote, "Thermal conductivity", kTransport,
              {"GAS_THERMAL_CONDUCTIVITY(\"mole: N2 1\"; 26.85)", "0.025936"}),
        kCompositionTemperature, explain_gas),
    row<at_temperature<Number, gas::prandtl_number>>(
        words("GAS_PRANDTL_NUMBER", "Prandtl number of a gas at low pressure", kTransportNote,
              "Prandtl number", kTransport,
              {"GAS_PRANDTL_NUMBER(\"mole: Ar 1\"; 26.85)", "0.664118"}),
        kCompositionTemperature, explain_gas),
    row<temperature_at_enthalpy>(
        words("GAS_TEMPERATURE_AT_ENTHALPY", "Temperature of a gas at an enthalpy", kVapourNote,
              "Temperature", kNasaPolynomials,
              {"GAS_TEMPERATURE_AT_ENTHALPY(\"mole: N2 0.79, O2 0.21\"; 500; \"25 °C\")",
               "502.124729"}),
        kCompositionEnthalpyDatum, explain_gas),
    row<temperature_at_entropy>(
        words("GAS_TEMPERATURE_AT_ENTROPY", "Temperature of a gas at a pressure and an entropy",
              kEntropyNote, "Temperature", kNasaPolynomials,
              {"GAS_TEMPERATURE_AT_ENTROPY(\"mole: N2 0.79, O2 0.21\"; 10; 7.2)", "488.670869"}),
        kCompositionPressureEntropy, explain_gas),
    row<dew_point>(
        words("GAS_DEW_POINT", "Temperature at which the water of a gas begins to condense",
              "Below 0 °C the frost point. Water alone: the dew points of acids are far higher.",
              "Temperature", kDewSource,
              {"GAS_DEW_POINT(\"mole: N2 0.71, O2 0.12, CO2 0.04, H2O 0.13\"; 1.01325)",
               "51.3027926"}),
        kCompositionPressure, explain_gas),
    row<gas_molar_mass>(
        words("GAS_MOLAR_MASS", "Molar mass of a gas", "", "Molar mass",
              {"ISO 6976:2016, atomic masses, as in NASA/TP-2002-211556", "2016", "table A.2"},
              {"GAS_MOLAR_MASS(\"dry air, NASA\")", "28.9651159"}),
        kComposition, explain_gas),
    row<specific_gas_constant>(
        words("SPECIFIC_GAS_CONSTANT", "Gas constant of a gas by mass",
              "Molar gas constant 8.314510 J/(mol K), the one that belongs to the NASA "
              "polynomials, over the molar mass.",
              "Specific gas constant", kNasaPolynomials,
              {"SPECIFIC_GAS_CONSTANT(\"dry air, NASA\")", "0.287052537"}),
        kComposition, explain_gas),
};

}  // namespace

void explain_gas(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const Mixture& mixture = in[0].composition().mixture;
  text += " Ideal gas of molar mass ";
  append_measure(text, {mixture.molar_mass(), Quantity::molar_mass}, units);
  text += ", NASA polynomials from ";
  append_measure(text, {gas::lowest_temperature(mixture), Quantity::temperature}, units);
  text += " to ";
  append_measure(text, {gas::highest_temperature(mixture), Quantity::temperature}, units);
  text += ".";
  if (mixture.mole_fraction(gas::Species::H2O) > 0) {
    text += " It holds water, which counts as vapour; GAS_DEW_POINT tells where that ends.";
  }
}

std::span<const Row> gases() { return kRows; }

}  // namespace busbar::functions
