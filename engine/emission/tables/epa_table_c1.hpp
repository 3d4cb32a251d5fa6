// Table C-1 to subpart C of 40 CFR part 98 (81 FR 89188, 2016): default higher heating values and
// CO2 factors on the higher heating value. Solids in MMBtu per short ton, liquids in MMBtu per US
// gallon, gases in MMBtu per cubic foot at 60 °F and 14.696 psia; factors in kg/MMBtu.
#pragma once

#include <array>

#include "emission/epa.hpp"

namespace busbar::emission::tables {

inline constexpr std::string_view kCopy = "from a public copy of the rule";
inline constexpr std::string_view kTwoCopies = "two public copies agree";
inline constexpr std::string_view kFactorTwice =
    "from a public copy of the rule; the CO2 factor agrees with a second one";
inline constexpr std::string_view kFactorOnly =
    "from a public copy of the rule; a second one has the same CO2 factor and another heating "
    "value: "
    "check before use";
inline constexpr std::string_view kMemoryTwice = "from memory; agrees with a public copy";
inline constexpr std::string_view kMemoryFactor =
    "from memory; the CO2 factor agrees with a public copy, the heating value differs: check "
    "before use";
inline constexpr std::string_view kFromMemory = "from memory: check before use";

// clang-format off
inline constexpr std::array kEpaTableC1 = std::to_array<EpaFuel>({
    {"Anthracite", "Coal and coke", 25.09, EpaUnit::per_short_ton, 103.69, Origin::fossil, kTwoCopies},
    {"Bituminous", "Coal and coke", 24.93, EpaUnit::per_short_ton, 93.28, Origin::fossil, kTwoCopies},
    {"Subbituminous", "Coal and coke", 17.25, EpaUnit::per_short_ton, 97.17, Origin::fossil, kTwoCopies},
    {"Lignite", "Coal and coke", 14.21, EpaUnit::per_short_ton, 97.72, Origin::fossil, kTwoCopies},
    {"Coal Coke", "Coal and coke", 24.80, EpaUnit::per_short_ton, 113.67, Origin::fossil, kCopy},
    {"Mixed (Commercial sector)", "Coal and coke", 21.39, EpaUnit::per_short_ton, 94.27, Origin::fossil, kCopy},
    {"Mixed (Industrial coking)", "Coal and coke", 26.28, EpaUnit::per_short_ton, 93.90, Origin::fossil, kCopy},
    {"Mixed (Industrial sector)", "Coal and coke", 22.35, EpaUnit::per_short_ton, 94.67, Origin::fossil, kCopy},
    {"Mixed (Electric Power sector)", "Coal and coke", 19.73, EpaUnit::per_short_ton, 95.52, Origin::fossil, kCopy},
    {"Natural gas (weighted U.S. average)", "Natural gas", 1.026e-3, EpaUnit::per_cubic_foot, 53.06, Origin::fossil, kFactorTwice},
    {"Distillate Fuel Oil No. 1", "Petroleum liquid", 0.139, EpaUnit::per_gallon, 73.25, Origin::fossil, kFactorOnly},
    {"Distillate Fuel Oil No. 2", "Petroleum liquid", 0.138, EpaUnit::per_gallon, 73.96, Origin::fossil, kFactorOnly},
    {"Distillate Fuel Oil No. 4", "Petroleum liquid", 0.146, EpaUnit::per_gallon, 75.04, Origin::fossil, kFactorOnly},
    {"Residual Fuel Oil No. 5", "Petroleum liquid", 0.140, EpaUnit::per_gallon, 72.93, Origin::fossil, kFactorOnly},
    {"Residual Fuel Oil No. 6", "Petroleum liquid", 0.150, EpaUnit::per_gallon, 75.10, Origin::fossil, kFactorOnly},
    {"Used Oil", "Petroleum liquid", 0.138, EpaUnit::per_gallon, 74.00, Origin::fossil, kCopy},
    {"Kerosene", "Petroleum liquid", 0.135, EpaUnit::per_gallon, 75.20, Origin::fossil, kFactorOnly},
    {"Liquefied petroleum gases (LPG)", "Petroleum liquid", 0.092, EpaUnit::per_gallon, 61.71, Origin::fossil, kTwoCopies},
    {"Propane", "Petroleum liquid", 0.091, EpaUnit::per_gallon, 62.87, Origin::fossil, kFactorTwice},
    {"Propylene", "Petroleum liquid", 0.091, EpaUnit::per_gallon, 67.77, Origin::fossil, kTwoCopies},
    {"Ethane", "Petroleum liquid", 0.068, EpaUnit::per_gallon, 59.60, Origin::fossil, kFactorTwice},
    {"Ethanol", "Petroleum liquid", 0.084, EpaUnit::per_gallon, 68.44, Origin::as_made, kTwoCopies},
    {"Ethylene", "Petroleum liquid", 0.058, EpaUnit::per_gallon, 65.96, Origin::fossil, kTwoCopies},
    {"Isobutane", "Petroleum liquid", 0.099, EpaUnit::per_gallon, 64.94, Origin::fossil, kTwoCopies},
    {"Isobutylene", "Petroleum liquid", 0.103, EpaUnit::per_gallon, 68.86, Origin::fossil, kCopy},
    {"Butane", "Petroleum liquid", 0.103, EpaUnit::per_gallon, 64.77, Origin::fossil, kFactorTwice},
    {"Butylene", "Petroleum liquid", 0.105, EpaUnit::per_gallon, 68.72, Origin::fossil, kCopy},
    {"Naphtha (<401 deg F)", "Petroleum liquid", 0.125, EpaUnit::per_gallon, 68.02, Origin::fossil, kCopy},
    {"Natural Gasoline", "Petroleum liquid", 0.110, EpaUnit::per_gallon, 66.88, Origin::fossil, kCopy},
    {"Other Oil (>401 deg F)", "Petroleum liquid", 0.139, EpaUnit::per_gallon, 76.22, Origin::fossil, kCopy},
    {"Pentanes Plus", "Petroleum liquid", 0.110, EpaUnit::per_gallon, 70.02, Origin::fossil, kFactorTwice},
    {"Petrochemical Feedstocks", "Petroleum liquid", 0.125, EpaUnit::per_gallon, 71.02, Origin::fossil, kCopy},
    {"Special Naphtha", "Petroleum liquid", 0.125, EpaUnit::per_gallon, 72.34, Origin::fossil, kCopy},
    {"Unfinished Oils", "Petroleum liquid", 0.139, EpaUnit::per_gallon, 74.54, Origin::fossil, kCopy},
    {"Heavy Gas Oils", "Petroleum liquid", 0.148, EpaUnit::per_gallon, 74.92, Origin::fossil, kTwoCopies},
    {"Lubricants", "Petroleum liquid", 0.144, EpaUnit::per_gallon, 74.27, Origin::fossil, kCopy},
    {"Motor Gasoline", "Petroleum liquid", 0.125, EpaUnit::per_gallon, 70.22, Origin::fossil, kCopy},
    {"Aviation Gasoline", "Petroleum liquid", 0.120, EpaUnit::per_gallon, 69.25, Origin::fossil, kCopy},
    {"Kerosene-Type Jet Fuel", "Petroleum liquid", 0.135, EpaUnit::per_gallon, 72.22, Origin::fossil, kCopy},
    {"Asphalt and Road Oil", "Petroleum liquid", 0.158, EpaUnit::per_gallon, 75.36, Origin::fossil, kCopy},
    {"Crude Oil", "Petroleum liquid", 0.138, EpaUnit::per_gallon, 74.54, Origin::fossil, kFactorOnly},
    {"Petroleum Coke", "Petroleum solid", 30.00, EpaUnit::per_short_ton, 102.41, Origin::fossil, kFactorOnly},
    {"Propane Gas", "Petroleum gaseous", 2.516e-3, EpaUnit::per_cubic_foot, 61.46, Origin::fossil, kTwoCopies},
    {"Municipal Solid Waste", "Other fuels solid", 9.95, EpaUnit::per_short_ton, 90.7, Origin::mixed, kFromMemory},
    {"Tires", "Other fuels solid", 28.00, EpaUnit::per_short_ton, 85.97, Origin::mixed, kMemoryFactor},
    {"Plastics", "Other fuels solid", 38.00, EpaUnit::per_short_ton, 75.00, Origin::fossil, kFromMemory},
    {"Blast Furnace Gas", "Other fuels gaseous", 0.092e-3, EpaUnit::per_cubic_foot, 274.32, Origin::fossil, kMemoryTwice},
    {"Coke Oven Gas", "Other fuels gaseous", 0.599e-3, EpaUnit::per_cubic_foot, 46.85, Origin::fossil, kMemoryTwice},
    {"Fuel Gas", "Other fuels gaseous", 1.388e-3, EpaUnit::per_cubic_foot, 59.00, Origin::fossil, kFromMemory},
    {"Wood and Wood Residuals (dry basis)", "Biomass solid", 17.48, EpaUnit::per_short_ton, 93.80, Origin::biogenic, kMemoryFactor},
    {"Agricultural Byproducts", "Biomass solid", 8.25, EpaUnit::per_short_ton, 118.17, Origin::biogenic, kMemoryTwice},
    {"Peat", "Biomass solid", 8.00, EpaUnit::per_short_ton, 111.84, Origin::listed, kMemoryFactor},
    {"Solid Byproducts", "Biomass solid", 10.39, EpaUnit::per_short_ton, 105.51, Origin::biogenic, kFromMemory},
    {"Landfill Gas", "Biomass gaseous", 0.485e-3, EpaUnit::per_cubic_foot, 52.07, Origin::biogenic, kMemoryTwice},
    {"Other Biomass Gases", "Biomass gaseous", 0.655e-3, EpaUnit::per_cubic_foot, 52.07, Origin::biogenic, kFromMemory},
    {"Ethanol (biomass fuels)", "Biomass liquid", 0.084, EpaUnit::per_gallon, 68.44, Origin::biogenic, kMemoryTwice},
    {"Biodiesel (100%)", "Biomass liquid", 0.128, EpaUnit::per_gallon, 73.84, Origin::biogenic, kMemoryTwice},
    {"Rendered Animal Fat", "Biomass liquid", 0.125, EpaUnit::per_gallon, 71.06, Origin::biogenic, kFromMemory},
    {"Vegetable Oil", "Biomass liquid", 0.120, EpaUnit::per_gallon, 81.55, Origin::biogenic, kFromMemory},
});
// clang-format on

}  // namespace busbar::emission::tables
