// F factors: 40 CFR 60, appendix A-7, Method 19, table 19-2, and 40 CFR 75, appendix F, table 1.
// Those of the gases but the wet ones: two public copies agree. All others: from memory.
// Subbituminous coal is counted with bituminous coal in Method 19; the row is that of part 75.
#pragma once

#include <array>

#include "emission/epa.hpp"

namespace busbar::emission::tables {

inline constexpr double kNoFactor = std::numeric_limits<double>::quiet_NaN();

inline constexpr std::array kFFactors = std::to_array<FFactors>({
    {"Coal, anthracite", 10100, 10540, 1970, true},
    {"Coal, bituminous", 9780, 10640, 1800, true},
    {"Coal, subbituminous", 9820, 10640, 1840, true},
    {"Coal, lignite", 9860, 11950, 1910, true},
    {"Oil", 9190, 10320, 1420, true},
    {"Gas, natural", 8710, 10610, 1040, false},
    {"Gas, propane", 8710, 10200, 1190, false},
    {"Gas, butane", 8710, 10390, 1250, false},
    {"Wood", 9240, kNoFactor, 1830, true},
    {"Wood bark", 9600, kNoFactor, 1920, true},
    {"Municipal solid waste", 9570, kNoFactor, 1820, true},
});

}  // namespace busbar::emission::tables
