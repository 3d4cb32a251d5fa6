#include "units/symbols.hpp"

#include <array>
#include <string>

namespace busbar::units {
namespace {

constexpr Dimension kNone{};
constexpr Dimension kMass{1, 0, 0, 0, 0, 0};
constexpr Dimension kLength{0, 1, 0, 0, 0, 0};
constexpr Dimension kArea{0, 2, 0, 0, 0, 0};
constexpr Dimension kVolume{0, 3, 0, 0, 0, 0};
constexpr Dimension kTime{0, 0, 1, 0, 0, 0};
constexpr Dimension kPerTime{0, 0, -1, 0, 0, 0};
constexpr Dimension kTemperature{0, 0, 0, 1, 0, 0};
constexpr Dimension kAmount{0, 0, 0, 0, 1, 0};
constexpr Dimension kCurrent{0, 0, 0, 0, 0, 1};
constexpr Dimension kForce{1, 1, -2, 0, 0, 0};
constexpr Dimension kPressure{1, -1, -2, 0, 0, 0};
constexpr Dimension kEnergy{1, 2, -2, 0, 0, 0};
constexpr Dimension kPower{1, 2, -3, 0, 0, 0};
constexpr Dimension kVoltage{1, 2, -3, 0, 0, -1};
constexpr Dimension kResistance{1, 2, -3, 0, 0, -2};
constexpr Dimension kFlux{1, 2, -2, 0, 0, -1};
constexpr Dimension kFluxDensity{1, 0, -2, 0, 0, -1};

// Exact by definition (NIST SP 811, appendix B): inch, pound, standard acceleration of free fall,
// International Table Btu and calorie, gallon of 231 cubic inches.
constexpr double kInch = 0.0254;
constexpr double kFoot = 0.3048;
constexpr double kPound = 0.45359237;
constexpr double kFall = 9.80665;
constexpr double kPsi = kPound * kFall / (kInch * kInch);
constexpr double kBtu = 1055.05585262;
constexpr double kCalorie = 4.1868;
constexpr double kMinute = 60;
constexpr double kHour = 3600;
constexpr double kRankine = 5.0 / 9;
constexpr double kFahrenheitZero = 459.67 * 5 / 9;
constexpr double kCubicFoot = kFoot * kFoot * kFoot;

constexpr Symbol plain(std::string_view name, const Dimension& dimension, double factor) {
  return {name, {dimension, factor, 0, Reference::plain}, false};
}
constexpr Symbol prefixed(std::string_view name, const Dimension& dimension, double factor) {
  return {name, {dimension, factor, 0, Reference::plain}, true};
}
constexpr Symbol offset(std::string_view name, double factor, double zero) {
  return {name, {kTemperature, factor, zero, Reference::plain}, false};
}
constexpr Symbol gauge(std::string_view name, double factor) {
  return {name, {kPressure, factor, 0, Reference::gauge}, false};
}

// Conventional millimetre of water and of mercury, inch of mercury at 0 °C and at 32 °F: NIST SP
// 811, appendix B.8. The US ton of 2000 lb and the ton of refrigeration are left out: "ton" means
// different masses to different readers, "t" does not.
constexpr std::array kSymbols{
    plain("1", kNone, 1),
    plain("%", kNone, 0.01),
    plain("ppm", kNone, 1e-6),
    // Mass and amount
    prefixed("g", kMass, 1e-3),
    plain("t", kMass, 1e3),
    plain("lb", kMass, kPound),
    plain("lbm", kMass, kPound),
    plain("klb", kMass, 1e3 * kPound),
    plain("oz", kMass, kPound / 16),
    prefixed("mol", kAmount, 1),
    plain("lbmol", kAmount, 1e3 * kPound),
    // Length, area, volume
    prefixed("m", kLength, 1),
    plain("in", kLength, kInch),
    plain("ft", kLength, kFoot),
    plain("yd", kLength, 3 * kFoot),
    plain("ha", kArea, 1e4),
    prefixed("L", kVolume, 1e-3),
    prefixed("l", kVolume, 1e-3),
    plain("cf", kVolume, kCubicFoot),
    plain("gal", kVolume, 231 * kInch * kInch * kInch),
    plain("bbl", kVolume, 42 * 231 * kInch * kInch * kInch),
    // Time
    prefixed("s", kTime, 1),
    plain("min", kTime, kMinute),
    plain("h", kTime, kHour),
    plain("hr", kTime, kHour),
    plain("d", kTime, 24 * kHour),
    prefixed("Hz", kPerTime, 1),
    plain("rpm", kPerTime, 1 / kMinute),
    // Temperature
    prefixed("K", kTemperature, 1),
    offset("°C", 1, 273.15),
    offset("degC", 1, 273.15),
    offset("°F", kRankine, kFahrenheitZero),
    offset("degF", kRankine, kFahrenheitZero),
    plain("°R", kTemperature, kRankine),
    plain("degR", kTemperature, kRankine),
    // Force and pressure
    prefixed("N", kForce, 1),
    plain("lbf", kForce, kPound* kFall),
    plain("kgf", kForce, kFall),
    prefixed("Pa", kPressure, 1),
    prefixed("bar", kPressure, 1e5),
    plain("bara", kPressure, 1e5),
    plain("atm", kPressure, 101325),
    plain("at", kPressure, kFall * 1e4),
    plain("psia", kPressure, kPsi),
    plain("torr", kPressure, 101325.0 / 760),
    plain("mmHg", kPressure, 133.322387415),
    plain("inHg", kPressure, 25.4 * 133.322387415),
    plain("mmH2O", kPressure, kFall),
    plain("inH2O", kPressure, 25.4 * kFall),
    gauge("barg", 1e5),
    gauge("mbarg", 1e2),
    gauge("kPag", 1e3),
    gauge("MPag", 1e6),
    gauge("psig", kPsi),
    // Energy and power
    prefixed("J", kEnergy, 1),
    prefixed("Wh", kEnergy, kHour),
    prefixed("cal", kEnergy, kCalorie),
    plain("Btu", kEnergy, kBtu),
    plain("BTU", kEnergy, kBtu),
    plain("MMBtu", kEnergy, 1e6 * kBtu),
    plain("therm", kEnergy, 1e5 * kBtu),
    prefixed("W", kPower, 1),
    plain("hp", kPower, 550 * kFoot * kPound * kFall),
    plain("PS", kPower, 75 * kFall),
    // Electricity
    prefixed("A", kCurrent, 1),
    prefixed("V", kVoltage, 1),
    prefixed("VA", kPower, 1),
    prefixed("var", kPower, 1),
    prefixed("Ω", kResistance, 1),
    prefixed("ohm", kResistance, 1),
    plain("Wb", kFlux, 1),
    plain("mWb", kFlux, 1e-3),
    plain("T", kFluxDensity, 1),
    plain("mT", kFluxDensity, 1e-3),
};

struct Prefix {
  std::string_view name;
  double factor;
};
constexpr std::array kPrefixes{
    Prefix{"k", 1e3},  Prefix{"M", 1e6},  Prefix{"G", 1e9},  Prefix{"T", 1e12},
    Prefix{"h", 1e2},  Prefix{"c", 1e-2}, Prefix{"m", 1e-3}, Prefix{"µ", 1e-6},
    Prefix{"μ", 1e-6}, Prefix{"u", 1e-6}, Prefix{"n", 1e-9}, Prefix{"d", 1e-1},
};

}  // namespace

Lookup find_symbol(std::string_view name) {
  for (const Symbol& symbol : kSymbols) {
    if (symbol.name == name) return {true, symbol.unit};
  }
  for (const Prefix& prefix : kPrefixes) {
    if (name.substr(0, prefix.name.size()) != prefix.name) continue;
    for (const Symbol& symbol : kSymbols) {
      if (!symbol.takes_prefix || symbol.name != name.substr(prefix.name.size())) continue;
      Expression unit = symbol.unit;
      unit.factor *= prefix.factor;
      return {true, unit};
    }
  }
  return {};
}

void for_each_symbol(const std::function<void(std::string_view)>& take) {
  for (const Symbol& symbol : kSymbols) take(symbol.name);
  for (const Prefix& prefix : kPrefixes) {
    for (const Symbol& symbol : kSymbols) {
      if (symbol.takes_prefix) take(std::string(prefix.name).append(symbol.name));
    }
  }
}

}  // namespace busbar::units
