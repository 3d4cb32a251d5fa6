// Moisture, and the bases of a fuel, from single numbers.
#include "fuel/solid/conversion.hpp"
#include "fuel/solid/net_value.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

namespace solid = fuel::solid;

std::optional<double> si_of(std::optional<Fraction> fraction) {
  return fraction ? std::optional<double>(fraction->si) : std::nullopt;
}

Outcome<Number> fuel_basis_factor(Word from, Word to, std::optional<Fraction> as_received,
                                  std::optional<Fraction> air_dried, std::optional<Fraction> ash) {
  const auto source = solid::state_named(from);
  if (!source) return Failure{Fault::unknown_word, 1, solid::kUnknownState};
  const auto target = solid::state_named(to);
  if (!target) return Failure{Fault::unknown_word, 2, solid::kUnknownState};
  const Outcome<double> factor =
      solid::factor(*source, *target, {si_of(as_received), si_of(air_dried), si_of(ash)});
  if (!factor) return factor.failure();
  return Number{*factor};
}

Outcome<HeatingValue> lhv_at_moisture(HeatingValue lhv, Fraction from, Fraction to) {
  return HeatingValue{solid::net_at_moisture(lhv.si, from.si, to.si)};
}

Outcome<HeatingValue> hhv_at_moisture(HeatingValue hhv, Fraction from, Fraction to) {
  return HeatingValue{solid::gross_at_moisture(hhv.si, from.si, to.si)};
}

Outcome<Fraction> moisture_on_dry_basis(Fraction moisture) {
  return Fraction{solid::moisture_on_dry_mass(moisture.si)};
}

Outcome<Fraction> moisture_on_wet_basis(Fraction moisture) {
  return Fraction{solid::moisture_on_moist_mass(moisture.si)};
}

void explain_lhv(const Slot*, const Result& result, UnitSet, std::string& text) {
  if (result.si >= 0) return;
  text += " Below nought: the fuel cannot evaporate its own water.";
}

constexpr const char* kChapter = "Fuel moisture and bases";

constexpr double kMostMoisture = 0.99;
// 0.9 of moist mass is 9 of dry mass.
constexpr double kMostMoistureOnDryMass = 9;
constexpr const char* kWettest =
    "nine parts of water to one of dry matter (common practice, no source): a fraction is meant, "
    "0.6 for 60 %";

constexpr Argument kFactor[] = {
    {"from basis",
     "\"as received\", \"air-dried\", \"dry\" or \"dry ash-free\" (ar, ad, d, daf): the basis that "
     "the figure is on"},
    {"to basis", "The basis that is wanted, in the same words"},
    {"moisture as received", "Fraction of moist mass, where one basis is as received", 0,
     kMostMoisture},
    {"moisture air-dried", "Fraction of moist mass, where one basis is air-dried", 0,
     kMostMoisture},
    {"ash", "Fraction of dry mass, where one basis is dry ash-free", 0, kMostMoisture}};
constexpr Argument kMoisture{"from moisture",
                             "Of the fuel that the value is for, fraction of "
                             "moist mass; 0 for dry fuel",
                             0, kMostMoisture};
constexpr Argument kOther{"to moisture", "That is wanted, fraction of moist mass; 0 for dry fuel",
                          0, kMostMoisture};
constexpr double kMostHeat = 150e6;
constexpr Argument kNet[] = {
    {"LHV", "Lower heating value at constant pressure", -2.5e6, kMostHeat}, kMoisture, kOther};
constexpr Argument kGross[] = {
    {"HHV", "Higher heating value", kAboveZero, kMostHeat}, kMoisture, kOther};
constexpr Argument kOnWet[] = {
    {"moisture", "Water over moist mass, as a fraction", 0, kMostMoisture}};
constexpr Argument kOnDry[] = {{"moisture", "Water over dry mass, as a fraction; it may be above 1",
                                0, kMostMoistureOnDryMass, kWettest}};

constexpr Source kBases{"ISO 1170:2020, Coal and coke: calculation of analyses to different bases",
                        "ISO 16993:2016 for biofuels, ASTM D3180", "table of conversion factors"};
constexpr Source kMoistValue{"ISO 17225-1, Solid biofuels: fuel specifications and classes", "2021",
                             "annex on net calorific values: q_ar = q_d (1 - M) - 2.443 MJ/kg M; "
                             "constant from memory, equal to the heat of condensation at 25 °C"};
constexpr Source kMoistGross{
    "ISO 1928:2020 and ISO 18125:2017, gross calorific value on other bases", "",
    "q_gr,ar = q_gr,d (1 - M)"};
constexpr Source kWater{"ISO 18134-1, Solid biofuels: determination of moisture content", "2022",
                        "definitions of moisture on wet and on dry basis"};

constexpr Row kRows[] = {
    row<fuel_basis_factor>(
        {"FUEL_BASIS_FACTOR",
         kChapter,
         "Factor between as received, air-dried, dry and dry ash-free",
         "For shares of elements, ash or volatile matter and for gross heating values. Not for "
         "moisture itself, and not for a net heating value, see LHV_AT_MOISTURE. Moistures and ash "
         "are needed only where the two bases differ by them.",
         "A factor on the figure",
         kBases,
         {"FUEL_BASIS_FACTOR(\"ad\"; \"ar\"; 0.2; 0.05)", "0.842105263"},
         kFirst},
        kFactor),
    row<lhv_at_moisture>({"LHV_AT_MOISTURE",
                          kChapter,
                          "Lower heating value of the same fuel with other moisture",
                          "Water that joins the fuel is heated and evaporated at its cost. Per "
                          "kilogram of fuel with the moisture wanted.",
                          "Lower heating value at constant pressure",
                          kMoistValue,
                          {"LHV_AT_MOISTURE(18.8; 0; 0.45)", "9.24065"},
                          kFirst},
                         kNet, explain_lhv),
    row<hhv_at_moisture>(
        {"HHV_AT_MOISTURE",
         kChapter,
         "Higher heating value of the same fuel with other moisture",
         "Per kilogram of fuel with the moisture wanted; the dry part alone burns.",
         "Higher heating value",
         kMoistGross,
         {"HHV_AT_MOISTURE(20.2; 0; 0.45)", "11.11"},
         kFirst},
        kGross),
    row<moisture_on_dry_basis>({"MOISTURE_ON_DRY_BASIS",
                                kChapter,
                                "Water over dry mass from water over moist mass",
                                "",
                                "A fraction, which may be above 1",
                                kWater,
                                {"MOISTURE_ON_DRY_BASIS(0.5)", "1"},
                                kFirst},
                               kOnWet),
    row<moisture_on_wet_basis>({"MOISTURE_ON_WET_BASIS",
                                kChapter,
                                "Water over moist mass from water over dry mass",
                                "Foresters and driers count moisture on dry mass, power plants on "
                                "moist mass: 100 % of the one is 50 % of the other.",
                                "A fraction",
                                kWater,
                                {"MOISTURE_ON_WET_BASIS(1)", "0.5"},
                                kFirst},
                               kOnDry),
};

}  // namespace

std::span<const Row> fuel_moisture() { return kRows; }

}  // namespace busbar::functions
