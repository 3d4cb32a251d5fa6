// Arguments and sources that the files of the chapter "Humid air" share.
#pragma once

#include <cstddef>
#include <cstdint>
#include <optional>
#include <string>

#include "air/constants.hpp"
#include "air/saturation.hpp"
#include "catalogue/row.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {

inline constexpr const char* kAirChapter = "Humid air";

inline constexpr const char* kVirialLimit = "the limit of IAPWS G11-15";
inline constexpr Argument kAirPressure{"pressure", "Absolute pressure of the air, never gauge",
                                       kAboveZero, air::kHighestPressure, kVirialLimit};
inline constexpr Argument kDryBulb{"temperature", "Dry-bulb temperature", air::kColdest,
                                   air::kHottest, kVirialLimit};
inline constexpr Argument kRelativeHumidity{"relative humidity", "As a fraction: 0.6 for 60 %", 0,
                                            1, "saturation"};
inline constexpr Argument kHumidityRatio{"humidity ratio",
                                         "kg of water per kg of dry air: 0.01 for 10 g/kg", 0, 100};
inline constexpr Argument kBelowFreezing{
    "below freezing",
    "\"ice\" or \"water\": what the air is saturated over below 0 °C; has no default and is needed "
    "only there"};

/// The argument below freezing; `argument` is its place in the call.
Outcome<air::BelowFreezing> below_freezing(std::optional<Word> word, std::uint8_t argument);

/// Adds over what air is saturated at a pressure and a temperature, and how much it then holds.
void append_saturation(std::string& text, double pressure, double temperature,
                       air::BelowFreezing below, UnitSet units);

/// Explain hook of rows with a pressure, a temperature and, at place kWord from 0, the argument
/// below freezing.
template <std::size_t kWord>
void explain_saturation(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const auto below = below_freezing(Typed<std::optional<Word>>::take(in[kWord]), 0);
  if (below) append_saturation(text, in[0].si, in[1].si, *below, units);
}

}  // namespace busbar::functions
