// Units and pressures from gauges.
#include "functions/functions.hpp"
#include "functions/sources.hpp"
#include "units/expression.hpp"

namespace busbar::functions {
namespace {

Outcome<Number> convert_unit(Number value, Word from, Word to) {
  const Outcome<double> converted = units::convert(value.si, from, to);
  if (!converted) return converted.failure();
  return Number{*converted};
}

Outcome<Number> convert_difference(Number value, Word from, Word to) {
  const Outcome<double> converted = units::convert_difference(value.si, from, to);
  if (!converted) return converted.failure();
  return Number{*converted};
}

Outcome<Pressure> absolute_pressure(GaugePressure gauge, Pressure ambient) {
  const double absolute = ambient.si + gauge.si;
  if (!(absolute > 0)) {
    return Failure{Fault::impossible,
                   1,
                   "{0} below ambient is not less than the ambient pressure {1}",
                   {{{-gauge.si, Quantity::gauge_pressure}, {ambient.si, Quantity::pressure}}}};
  }
  return Pressure{absolute};
}

Outcome<Pressure> absolute_from_vacuum(Vacuum vacuum, Pressure ambient) {
  const double absolute = ambient.si - vacuum.si;
  if (!(absolute > 0)) {
    return Failure{Fault::impossible,
                   1,
                   "{0} is not less than the ambient pressure {1}: nothing would be left",
                   {{{vacuum.si, Quantity::vacuum}, {ambient.si, Quantity::pressure}}}};
  }
  return Pressure{absolute};
}

constexpr const char* kChapter = "Units and gauges";

constexpr Argument kConversion[] = {
    {"value", "The number to convert"},
    {"from", "Its unit as text, such as \"psia\", \"kJ/(kg K)\", \"lb/h\""},
    {"to", "The unit that is wanted"}};

// The least and the greatest ambient pressure at which plant runs (common practice, no source): a
// reading in millibar or in millimetres of mercury falls outside in every unit set.
constexpr Argument kAmbient{"ambient", "Ambient pressure at the gauge, absolute", 40e3, 110e3,
                            "the limit of ambient pressure where plant stands"};
constexpr Argument kGauge[] = {
    {"gauge", "Reading of the gauge, above ambient positive", -110e3, 100e6}, kAmbient};
constexpr Argument kVacuum[] = {{"vacuum", "Reading below ambient, positive", 0, 110e3}, kAmbient};

constexpr Source kUnits{"NIST Special Publication 811, Guide for the use of the SI", "2008",
                        "appendix B; BIPM, SI Brochure, 9th ed. 2019"};
constexpr Source kPressureSource{"ISO 80000-4:2019, Quantities and units: mechanics", "",
                                 "gauge pressure = absolute pressure minus ambient pressure"};

constexpr const char* kUnitNote =
    "The dimensions must agree; gauge pressures (barg, psig) are converted among themselves only. "
    "Units are written with a space, * or · for products, one /, and powers as m2, m^2 or s-1. "
    "Prefixes from n to T stand where they are usual. Temperatures are points: °C, °F, K, °R.";

constexpr Row kRows[] = {
    row<convert_unit>({"CONVERT_UNIT",
                       kChapter,
                       "A number in another unit",
                       kUnitNote,
                       "A number",
                       kUnits,
                       {"CONVERT_UNIT(1450; \"psia\"; \"bar\")", "99.9739808"},
                       kFirst},
                      kConversion),
    row<convert_difference>(
        {"CONVERT_DIFFERENCE",
         kChapter,
         "A difference, such as a temperature rise, in another unit",
         "The zero points of °C and °F drop out: 10 °C of rise are 18 °F of rise.",
         "A number",
         kUnits,
         {"CONVERT_DIFFERENCE(10; \"°C\"; \"°F\")", "18"},
         kFirst},
        kConversion),
    row<absolute_pressure>(
        {"ABSOLUTE_PRESSURE",
         kChapter,
         "Absolute pressure from a gauge reading",
         "The ambient pressure is an argument without a default: it is worth a kelvin of "
         "saturation temperature.",
         "Absolute pressure",
         kPressureSource,
         {"ABSOLUTE_PRESSURE(99; 1.013)", "100.013"},
         kFirst},
        kGauge),
    row<absolute_from_vacuum>({"ABSOLUTE_FROM_VACUUM",
                               kChapter,
                               "Absolute pressure from a vacuum reading",
                               "",
                               "Absolute pressure",
                               kPressureSource,
                               {"ABSOLUTE_FROM_VACUUM(0.96; 1.013)", "0.053"},
                               kFirst},
                              kVacuum),
};

}  // namespace

std::span<const Row> units() { return kRows; }

}  // namespace busbar::functions
