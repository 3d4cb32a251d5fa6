// Humid air: enthalpy, volume and density, and the table of everything.
#include <optional>
#include <string>

#include "air/humidity.hpp"
#include "air/properties.hpp"
#include "functions/as.hpp"
#include "functions/functions.hpp"
#include "functions/humid_air_arguments.hpp"

namespace busbar::functions {
namespace {

using OptionalWord = std::optional<Word>;

Outcome<Enthalpy> enthalpy(Pressure p, Temperature t, Number ratio) {
  return as<Enthalpy>(air::enthalpy_at(p.si, t.si, ratio.si));
}

Outcome<Temperature> temperature_at_enthalpy(Pressure p, Enthalpy h, Number ratio) {
  return as<Temperature>(air::temperature_at_enthalpy(p.si, h.si, ratio.si));
}

Outcome<Volume> volume(Pressure p, Temperature t, Number ratio) {
  return as<Volume>(air::volume_at(p.si, t.si, ratio.si));
}

Outcome<Density> density(Pressure p, Temperature t, Number ratio) {
  return as<Density>(air::density_at(p.si, t.si, ratio.si));
}

// Rows of AIR_TABLE: what does not exist for this air stays empty.
class Table {
 public:
  explicit Table(UnitSet units) : units_(units) {}

  void add(const char* name, Quantity quantity, std::optional<double> si, const char* unit = "") {
    const Unit& shown = unit_of(units_, quantity);
    grid_.at(row_, 0) = std::string(name);
    grid_.at(row_, 1) = std::string();
    if (si) grid_.at(row_, 1) = shown.from_si(*si);
    grid_.at(row_, 2) = shown.symbol.empty() ? std::string(unit) : std::string(shown.symbol);
    ++row_;
  }

  [[nodiscard]] Grid take() { return std::move(grid_); }

  static constexpr std::size_t kRows = 14;

 private:
  UnitSet units_;
  Grid grid_{kRows, 3};
  std::size_t row_ = 0;
};

std::optional<double> value_of(const Outcome<double>& outcome) {
  return outcome ? std::optional<double>(*outcome) : std::nullopt;
}

Outcome<Grid> table(Pressure p, Temperature t, Number ratio, OptionalWord word, UnitSet units) {
  const auto below = below_freezing(word, 4);
  if (!below) return below.failure();
  const auto phase = air::condensate_at(t.si, *below);
  if (!phase) return phase.failure().about(4);
  const auto h = air::enthalpy_at(p.si, t.si, ratio.si);
  if (!h) return h.failure();
  const air::Place at = air::place(p.si, t.si);
  const auto saturated = air::saturation(at, *phase);
  const auto relative = air::relative_humidity(p.si, t.si, ratio.si, *below);
  if (saturated && !relative) return relative.failure();
  const double x = air::mole_fraction(ratio.si);

  Table out(units);
  constexpr const char* kPerDryAir = "kg/kg dry air";
  out.add("pressure", Quantity::pressure, p.si);
  out.add("temperature", Quantity::temperature, t.si);
  out.add("humidity ratio", Quantity::number, ratio.si, kPerDryAir);
  out.add("specific humidity", Quantity::number, ratio.si / (1 + ratio.si), "kg/kg humid air");
  out.add("mole fraction of water", Quantity::fraction, x);
  out.add("partial pressure of water", Quantity::pressure, x * p.si);
  out.add("relative humidity", Quantity::fraction, value_of(relative));
  out.add("saturation humidity ratio", Quantity::number,
          saturated ? std::optional<double>(air::humidity_ratio_of(saturated->mole_fraction))
                    : std::nullopt,
          kPerDryAir);
  out.add("enhancement factor", Quantity::number,
          saturated ? std::optional<double>(saturated->enhancement) : std::nullopt);
  out.add("dew point", Quantity::temperature, value_of(air::dew_point(p.si, ratio.si, *below)));
  out.add("wet bulb", Quantity::temperature, value_of(air::wet_bulb(p.si, t.si, ratio.si)));
  out.add("enthalpy per mass of dry air", Quantity::enthalpy, *h);
  out.add("volume per mass of dry air", Quantity::volume, air::mixture_volume(at, ratio.si));
  out.add("density of humid air", Quantity::density,
          (1 + ratio.si) / air::mixture_volume(at, ratio.si));
  return out.take();
}

// --- Rows ----------------------------------------------------------------------------------------

constexpr Source kProperties{
    "IAPWS G11-15, Guideline on a Virial Equation for the Fugacity of H2O in Humid Air; ideal-gas "
    "parts as in IAPWS G8-10",
    "2015; 2010", "derivatives of the Gibbs energy that belongs to the fugacity"};
constexpr Argument kRatio[] = {kAirPressure, kDryBulb, kHumidityRatio};
constexpr Argument kRatioBelow[] = {kAirPressure, kDryBulb, kHumidityRatio, kBelowFreezing};
constexpr Argument kAtEnthalpy[] = {
    kAirPressure, {"enthalpy", "Enthalpy per kg of dry air", -1e6, 4e8}, kHumidityRatio};

constexpr Words words(const char* name, const char* summary, const char* notes, const char* result,
                      const Source& source, const Example& example) {
  return {name, kAirChapter, summary, notes, result, source, example, kFirst};
}

constexpr const char* kPropertyNote =
    "Real-gas mixture from -80 to 200 °C, up to 50 bar. Air above saturation (fog) is refused. "
    "Within 3e-5 of the full equation of IAPWS G8-10 up to 10 bar and of the ASHRAE tables, whose "
    "molar mass of dry air is 28.966.";
constexpr const char* kEnthalpyNote =
    "Zero for dry air at 0 °C and 1.01325 bar and for liquid water at the triple point. Real-gas "
    "mixture from -80 to 200 °C, up to 50 bar; air above saturation (fog) is refused. Within 3e-5 "
    "of the full equation of IAPWS G8-10 up to 10 bar and of the ASHRAE tables; the short formula "
    "of contracts is AIR_ENTHALPY_ASHRAE.";
constexpr Row kRows[] = {
    row<enthalpy>(words("AIR_ENTHALPY", "Enthalpy of humid air per kg of dry air", kEnthalpyNote,
                        "Enthalpy per kg of dry air", kProperties,
                        {"AIR_ENTHALPY(1.01325; 25; 0.01)", "50.6126534"}),
                  kRatio),
    row<temperature_at_enthalpy>(
        words("AIR_TEMPERATURE_AT_ENTHALPY", "Dry-bulb temperature of air of a known enthalpy",
              "The inverse of AIR_ENTHALPY, for mixing, heating and evaporative cooling. A result "
              "above saturation (fog) is refused.",
              "Temperature", kProperties,
              {"AIR_TEMPERATURE_AT_ENTHALPY(1.01325; 50; 0.01)", "24.4023774"}),
        kAtEnthalpy),
    row<volume>(words("AIR_VOLUME", "Volume of humid air per kg of dry air", kPropertyNote,
                      "Volume per kg of dry air", kProperties,
                      {"AIR_VOLUME(1.01325; 25; 0.01)", "0.857903426"}),
                kRatio),
    row<density>(
        words("AIR_DENSITY", "Density of humid air", kPropertyNote, "kg of humid air per volume",
              kProperties, {"AIR_DENSITY(1.01325; 25; 0.01)", "1.17728869"}),
        kRatio),
    row<table>(
        words("AIR_TABLE", "Labelled table of the state of humid air",
              "Enter it as an array formula of 14 rows and 3 columns: name, value, unit. "
              "Rows: pressure, temperature, humidity ratio, specific humidity, mole "
              "fraction and partial pressure of water, relative humidity, saturation "
              "humidity ratio, enhancement factor, dew point, wet bulb, enthalpy and "
              "volume per kg of dry air, density. Empty where this air has no such "
              "property; its own function then says why.",
              "A table", kProperties, {"INDEX(AIR_TABLE(1.01325; 25; 0.01); 11; 2)", "17.9433618"}),
        kRatioBelow, explain_saturation<3>),
};

}  // namespace

std::span<const Row> air_properties() { return kRows; }

}  // namespace busbar::functions
