// Limits of heat engines.
#include "cycle/limits.hpp"

#include "functions/describe.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

Outcome<Fraction> carnot(Temperature hot, Temperature cold) {
  const Outcome<double> limit = cycle::carnot(hot.si, cold.si);
  if (!limit) return limit.failure();
  return Fraction{*limit};
}

Outcome<Fraction> curzon_ahlborn(Temperature hot, Temperature cold) {
  const Outcome<double> value = cycle::curzon_ahlborn(hot.si, cold.si);
  if (!value) return value.failure();
  return Fraction{*value};
}

Outcome<Temperature> mean_heating_temperature(const Stream& inlet, const Stream& outlet) {
  const Outcome<double> mean = cycle::mean_heating_temperature(inlet, outlet);
  if (!mean) return mean.failure();
  return Temperature{*mean};
}

void explain_carnot(const Slot*, const Result&, UnitSet, std::string& text) {
  text +=
      " No heat engine between these two temperatures can do better; with the peak temperature the "
      "limit is loose, with MEAN_HEATING_TEMPERATURE it bites.";
}

void explain_orientation(const Slot*, const Result&, UnitSet, std::string& text) {
  text +=
      " An orientation for an engine run at its greatest power, never a limit: real plant may be "
      "above it or below.";
}

constexpr const char* kChapter = "Limits";

constexpr Argument kTemperatures[] = {
    {"hot temperature", "Temperature at which heat is taken", kAboveZero, 1e5},
    {"cold temperature", "Temperature at which heat is given off", kAboveZero, 1e5}};
constexpr Argument kHeating[] = {{"inlet", "Stream before it takes heat"},
                                 {"outlet", "Stream after it has taken heat"}};

constexpr Row kRows[] = {
    row<carnot>({"CARNOT",
                 kChapter,
                 "Greatest efficiency of any heat engine between two temperatures",
                 "",
                 "A fraction",
                 {"S. Carnot, Réflexions sur la puissance motrice du feu", "1824; W. Thomson 1851",
                  "1 - Tc/Th"},
                 {"CARNOT(540; 30)", "0.627191"},
                 kFirst},
                kTemperatures, explain_carnot),
    row<curzon_ahlborn>(
        {"CURZON_AHLBORN",
         kChapter,
         "Efficiency of an endoreversible engine at greatest power: orientation, never a limit",
         "",
         "A fraction",
         {"F. L. Curzon and B. Ahlborn, American Journal of Physics 43", "1975",
          "page 22, 1 - sqrt(Tc/Th)"},
         {"CURZON_AHLBORN(565; 25)", "0.403574"},
         kFirst},
        kTemperatures, explain_orientation),
    row<mean_heating_temperature>(
        {"MEAN_HEATING_TEMPERATURE",
         kChapter,
         "Entropy-mean temperature at which a stream takes heat",
         "Enthalpy rise over entropy rise. A Carnot limit with this temperature bites: the stream "
         "takes most of its heat far below the peak. A pressure loss on the way lowers it.",
         "Temperature",
         {"H. D. Baehr and S. Kabelac, Thermodynamik",
          "thermodynamic mean temperature of heat transfer", "(h2 - h1)/(s2 - s1)"},
         {"MEAN_HEATING_TEMPERATURE(STEAM(100; 230); STEAM(100; 540))", "328.318"},
         kFirst},
        kHeating, explain_first_and_second),
};

}  // namespace

std::span<const Row> limits() { return kRows; }

}  // namespace busbar::functions
