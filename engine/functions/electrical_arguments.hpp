// Arguments, ranges and sources that the electrical chapters share.
#pragma once

#include "catalogue/row.hpp"

namespace busbar::functions {

// No machine is larger: ranges that keep every product finite.
inline constexpr double kMostPower = 1e10;          // W or VA
inline constexpr double kMostComponentPower = 1e9;  // W
inline constexpr double kMostVoltage = 2e6;         // V
inline constexpr double kMostCurrent = 1e6;         // A
inline constexpr double kMostReactance = 1e6;       // ohm
inline constexpr double kMostFrequency = 1e3;       // Hz

inline constexpr const char* kFactorLimit =
    "for a power factor is active over apparent power, which is never less than the active";

inline constexpr Argument kPowerFactor{"power factor", "Active over apparent power, as a fraction",
                                       kAboveZero, 1, kFactorLimit};
inline constexpr Argument kActivePower{"active power", "Of all three phases", kAboveZero,
                                       kMostPower};
inline constexpr Argument kLineVoltage{"voltage", "Line to line", kAboveZero, kMostVoltage};
inline constexpr Argument kLineCurrent{"current", "In each line", kAboveZero, kMostCurrent};
inline constexpr Argument kFrequency{"frequency", "Of the grid", kAboveZero, kMostFrequency};
inline constexpr Argument kPoles{"poles", "Number of poles, twice the pole pairs", 2, 200,
                                 "the poles that machines have"};
inline constexpr Argument kSense{
    "reactive sense",
    "\"lagging\" (overexcited, the generator gives reactive power) or \"leading\" (underexcited, "
    "it takes it)"};

inline constexpr const char* kHighVoltage =
    "For appraisal only. Terminals, windings and excitation circuits are dangerous to life; "
    "measurements on them belong to qualified people under local codes and the rules of the site.";

inline constexpr const char* kLossStandard =
    "IEC 60034-2-1, determining losses and efficiency of rotating electrical machines from tests";
inline constexpr const char* kRatingStandard = "IEC 60034-1, rating and performance";
inline constexpr const char* kMachineBook = "Fitzgerald, Kingsley and Umans, Electric Machinery";

}  // namespace busbar::functions
