// Coefficients of the Siegert formula as two ordinances print them.
#pragma once

#include <array>

#include "boiler/siegert.hpp"

namespace busbar::boiler::tables {

inline constexpr const char* kStyriaAnnex1 =
    "Steiermärkisches Baurecht, annex 1 (heating plant ordinance), as quoted by Trippl et al. 2013";
inline constexpr const char* kStyriaAnnex7 =
    "Steiermärkisches Baurecht, annex 7 (heating plant ordinance)";
inline constexpr const char* kSmallFiring = "1. BImSchV, annex 2 (from memory)";

inline constexpr double kNoMoisture = -1;

inline constexpr std::array<SiegertCoefficients, 37> kSiegert{{
    {"biomass", 0.0, 0.6572, 0, 0.0093, 0, kStyriaAnnex1, false},
    {"biomass", 0.1, 0.6682, 0, 0.0107, 0, kStyriaAnnex1, false},
    {"biomass", 0.2, 0.6824, 0, 0.0125, 0, kStyriaAnnex1, false},
    {"biomass", 0.3, 0.7017, 0, 0.0149, 0, kStyriaAnnex1, false},
    {"biomass", 0.4, 0.7290, 0, 0.0183, 0, kStyriaAnnex1, false},
    {"biomass", 0.5, 0.7709, 0, 0.0235, 0, kStyriaAnnex1, false},
    {"lignite", 0.0, 0.6717, 0, 0.0073, 0, kStyriaAnnex1, false},
    {"lignite", 0.1, 0.6809, 0, 0.0084, 0, kStyriaAnnex1, false},
    {"lignite", 0.2, 0.6936, 0, 0.0097, 0, kStyriaAnnex1, false},
    {"lignite", 0.3, 0.7070, 0, 0.0115, 0, kStyriaAnnex1, false},
    {"lignite", 0.4, 0.7281, 0, 0.0140, 0, kStyriaAnnex1, false},
    {"hard coal and coke", 0.00, 0.6901, 0, 0.0054, 0, kStyriaAnnex1, false},
    {"hard coal and coke", 0.05, 0.6932, 0, 0.0057, 0, kStyriaAnnex1, false},
    {"hard coal and coke", 0.10, 0.6967, 0, 0.0061, 0, kStyriaAnnex1, false},
    {"hard coal and coke", 0.15, 0.7006, 0, 0.0065, 0, kStyriaAnnex1, false},
    {"hard coal and coke", 0.20, 0.7050, 0, 0.0069, 0, kStyriaAnnex1, false},
    {"heating oil extra light", kNoMoisture, 0.6642, 0, 0.0086, 0, kStyriaAnnex1, false},
    {"heating oil light", kNoMoisture, 0.6655, 0, 0.0082, 0, kStyriaAnnex1, false},
    {"heating oil medium", kNoMoisture, 0.6687, 0, 0.0079, 0, kStyriaAnnex1, false},
    {"heating oil heavy", kNoMoisture, 0.6736, 0, 0.0076, 0, kStyriaAnnex1, false},
    {"natural gas H", kNoMoisture, 0.6440, 0, 0.0111, 0, kStyriaAnnex1, false},
    {"propane", kNoMoisture, 0.6335, 0, 0.0092, 0, kStyriaAnnex1, false},
    {"butane", kNoMoisture, 0.6247, 0, 0.0089, 0, kStyriaAnnex1, false},
    {"heating oil", kNoMoisture, 0.68, 0.50, 0.007, 0, kSmallFiring, true},
    {"natural gas", kNoMoisture, 0.66, 0.37, 0.009, 0, kSmallFiring, true},
    {"town gas", kNoMoisture, 0.63, 0.35, 0.011, 0, kSmallFiring, true},
    {"coke oven gas", kNoMoisture, 0.60, 0.29, 0.011, 0, kSmallFiring, true},
    {"LPG and LPG/air mixtures", kNoMoisture, 0.63, 0.42, 0.008, 0, kSmallFiring, true},
    {"hard coal, simple", kNoMoisture, 0, 0, 0, 0.66, kStyriaAnnex7, false},
    {"lignite, simple", kNoMoisture, 0, 0, 0, 0.90, kStyriaAnnex7, false},
    {"briquettes, simple", kNoMoisture, 0, 0, 0, 0.75, kStyriaAnnex7, false},
    {"coke, simple", kNoMoisture, 0, 0, 0, 0.73, kStyriaAnnex7, false},
    {"heating oil EL and light, simple", kNoMoisture, 0, 0, 0, 0.55, kStyriaAnnex7, false},
    {"LPG, simple", kNoMoisture, 0, 0, 0, 0.50, kStyriaAnnex7, false},
    {"town gas, simple", kNoMoisture, 0, 0, 0, 0.38, kStyriaAnnex7, false},
    {"natural gas CH4 > 95 %, simple", kNoMoisture, 0, 0, 0, 0.42, kStyriaAnnex7, false},
    {"natural gas CH4 < 95 %, simple", kNoMoisture, 0, 0, 0, 0.46, kStyriaAnnex7, false},
}};

}  // namespace busbar::boiler::tables
