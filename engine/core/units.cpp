#include "core/units.hpp"

#include <array>
#include <cstddef>

#include "core/text.hpp"

namespace busbar {
namespace {

constexpr std::size_t kSets = static_cast<std::size_t>(UnitSet::count_);
constexpr std::size_t kQuantities = static_cast<std::size_t>(Quantity::count_);

// Exact definitions: 1 lb = 0.453 592 37 kg, 1 ft = 0.3048 m, 1 in = 0.0254 m, 1 lbf = 1 lb times
// 9.806 65 m/s2, 1 Btu (International Table) = 1055.055 852 62 J, so that 1 Btu/lb = 2326 J/kg and
// 1 Btu/(lb °F) = 4186.8 J/(kg K) exactly (NIST SP 811, appendix B, footnotes 9 and 22).
constexpr double kPound = 0.45359237;
constexpr double kFoot = 0.3048;
constexpr double kCubicFoot = kFoot * kFoot * kFoot;
constexpr double kFall = 9.80665;
constexpr double kPsi = kPound * kFall / (0.0254 * 0.0254);
constexpr double kBtu = 1055.05585262;
constexpr double kPoundMole = 453.59237;  // mol
constexpr double kFahrenheitZero = 459.67 * 5 / 9;

struct QuantityUnits {
  std::string_view name;
  std::array<Unit, kSets> units;  // metric, us, si
};

constexpr Unit kOne{"", 1, 1, 0};

constexpr std::array<QuantityUnits, kQuantities> kTable{{
    {"number", {kOne, kOne, kOne}},
    {"fraction", {kOne, kOne, kOne}},
    {"absolute pressure", {{{"bar", 1e5, 1, 0}, {"psia", kPsi, 1, 0}, {"Pa", 1, 1, 0}}}},
    {"gauge pressure", {{{"bar", 1e5, 1, 0}, {"psi", kPsi, 1, 0}, {"Pa", 1, 1, 0}}}},
    {"vacuum", {{{"bar", 1e5, 1, 0}, {"psi", kPsi, 1, 0}, {"Pa", 1, 1, 0}}}},
    {"temperature", {{{"°C", 1, 1, 273.15}, {"°F", 5, 9, kFahrenheitZero}, {"K", 1, 1, 0}}}},
    {"temperature difference", {{{"K", 1, 1, 0}, {"°F", 5, 9, 0}, {"K", 1, 1, 0}}}},
    {"specific enthalpy", {{{"kJ/kg", 1e3, 1, 0}, {"Btu/lb", 2326, 1, 0}, {"J/kg", 1, 1, 0}}}},
    {"specific entropy",
     {{{"kJ/(kg K)", 1e3, 1, 0}, {"Btu/(lb °F)", 4186.8, 1, 0}, {"J/(kg K)", 1, 1, 0}}}},
    {"specific volume",
     {{{"m³/kg", 1, 1, 0}, {"ft³/lb", kCubicFoot / kPound, 1, 0}, {"m³/kg", 1, 1, 0}}}},
    {"density", {{{"kg/m³", 1, 1, 0}, {"lb/ft³", kPound / kCubicFoot, 1, 0}, {"kg/m³", 1, 1, 0}}}},
    {"mass flow", {{{"kg/s", 1, 1, 0}, {"lb/h", kPound, 3600, 0}, {"kg/s", 1, 1, 0}}}},
    {"power", {{{"MW", 1e6, 1, 0}, {"MW", 1e6, 1, 0}, {"W", 1, 1, 0}}}},
    {"heat rate", {{{"kJ/kWh", 1, 3600, 0}, {"Btu/kWh", kBtu, 3.6e6, 0}, {"J/J", 1, 1, 0}}}},
    {"specific energy", {{{"kJ/kg", 1e3, 1, 0}, {"Btu/lb", 2326, 1, 0}, {"J/kg", 1, 1, 0}}}},
    {"specific heat capacity",
     {{{"kJ/(kg K)", 1e3, 1, 0}, {"Btu/(lb °F)", 4186.8, 1, 0}, {"J/(kg K)", 1, 1, 0}}}},
    {"velocity", {{{"m/s", 1, 1, 0}, {"ft/s", kFoot, 1, 0}, {"m/s", 1, 1, 0}}}},
    {"thermal expansion", {{{"1/K", 1, 1, 0}, {"1/°F", 9, 5, 0}, {"1/K", 1, 1, 0}}}},
    {"compressibility", {{{"1/bar", 1, 1e5, 0}, {"1/psia", 1, kPsi, 0}, {"1/Pa", 1, 1, 0}}}},
    {"Joule-Thomson coefficient",
     {{{"K/bar", 1, 1e5, 0}, {"°F/psia", 5, 9 * kPsi, 0}, {"K/Pa", 1, 1, 0}}}},
    {"dynamic viscosity",
     {{{"µPa s", 1, 1e6, 0}, {"lb/(ft h)", kPound, kFoot * 3600, 0}, {"Pa s", 1, 1, 0}}}},
    {"thermal conductivity",
     {{{"W/(m K)", 1, 1, 0},
       {"Btu/(h ft °F)", kBtu * 9, 3600 * kFoot * 5, 0},
       {"W/(m K)", 1, 1, 0}}}},
    {"surface tension",
     {{{"mN/m", 1, 1e3, 0}, {"lbf/ft", kPound* kFall / kFoot, 1, 0}, {"N/m", 1, 1, 0}}}},
    {"heating value", {{{"MJ/kg", 1e6, 1, 0}, {"Btu/lb", 2326, 1, 0}, {"J/kg", 1, 1, 0}}}},
    {"molar heating value",
     {{{"kJ/mol", 1e3, 1, 0}, {"Btu/lbmol", kBtu, kPoundMole, 0}, {"J/mol", 1, 1, 0}}}},
    {"heating value by volume",
     {{{"MJ/m³", 1e6, 1, 0}, {"Btu/ft³", kBtu, kCubicFoot, 0}, {"J/m³", 1, 1, 0}}}},
    {"molar mass",
     {{{"kg/kmol", 1, 1e3, 0}, {"lb/lbmol", kPound, kPoundMole, 0}, {"kg/mol", 1, 1, 0}}}},
    {"molar volume",
     {{{"m³/kmol", 1, 1e3, 0}, {"ft³/lbmol", kCubicFoot, kPoundMole, 0}, {"m³/mol", 1, 1, 0}}}},
    {"length", {{{"m", 1, 1, 0}, {"ft", kFoot, 1, 0}, {"m", 1, 1, 0}}}},
    {"power of a component", {{{"kW", 1e3, 1, 0}, {"kW", 1e3, 1, 0}, {"W", 1, 1, 0}}}},
    {"apparent power", {{{"MVA", 1e6, 1, 0}, {"MVA", 1e6, 1, 0}, {"VA", 1, 1, 0}}}},
    {"reactive power", {{{"Mvar", 1e6, 1, 0}, {"Mvar", 1e6, 1, 0}, {"var", 1, 1, 0}}}},
    {"voltage", {{{"kV", 1e3, 1, 0}, {"kV", 1e3, 1, 0}, {"V", 1, 1, 0}}}},
    {"current", {{{"A", 1, 1, 0}, {"A", 1, 1, 0}, {"A", 1, 1, 0}}}},
    {"resistance", {{{"Ω", 1, 1, 0}, {"Ω", 1, 1, 0}, {"Ω", 1, 1, 0}}}},
    {"magnetic flux", {{{"Wb", 1, 1, 0}, {"Wb", 1, 1, 0}, {"Wb", 1, 1, 0}}}},
    {"magnetic flux density", {{{"T", 1, 1, 0}, {"T", 1, 1, 0}, {"T", 1, 1, 0}}}},
    {"frequency", {{{"Hz", 1, 1, 0}, {"Hz", 1, 1, 0}, {"Hz", 1, 1, 0}}}},
    {"rotational speed", {{{"rpm", 1, 60, 0}, {"rpm", 1, 60, 0}, {"1/s", 1, 1, 0}}}},
    {"emission factor",
     {{{"kg/GJ", 1, 1e9, 0}, {"lb/MMBtu", kPound, 1e6 * kBtu, 0}, {"kg/J", 1, 1, 0}}}},
    {"gas volume per energy",
     {{{"m³/GJ", 1, 1e9, 0}, {"ft³/MMBtu", kCubicFoot, 1e6 * kBtu, 0}, {"m³/J", 1, 1, 0}}}},
    {"mass concentration",
     {{{"mg/m³", 1, 1e6, 0}, {"lb/ft³", kPound / kCubicFoot, 1, 0}, {"kg/m³", 1, 1, 0}}}},
    {"amount", {kOne, kOne, kOne}},
}};

constexpr std::array<std::string_view, kSets> kNames{"metric", "us", "si"};

const QuantityUnits& entry(Quantity quantity) { return kTable[static_cast<std::size_t>(quantity)]; }

}  // namespace

const Unit& unit_of(UnitSet set, Quantity quantity) {
  return entry(quantity).units[static_cast<std::size_t>(set)];
}

bool depends_on_unit_set(Quantity quantity) { return !entry(quantity).units[0].symbol.empty(); }

std::optional<UnitSet> unit_set_named(std::string_view word) {
  for (std::size_t i = 0; i < kSets; ++i) {
    if (equal_ignoring_case(word, kNames[i])) return static_cast<UnitSet>(i);
  }
  return std::nullopt;
}

std::string_view name_of(UnitSet set) { return kNames[static_cast<std::size_t>(set)]; }

std::string_view name_of(Quantity quantity) { return entry(quantity).name; }

}  // namespace busbar
