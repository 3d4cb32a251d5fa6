// IPCC 2006 Guidelines for National Greenhouse Gas Inventories, volume 2: net calorific values of
// table 1.2 in TJ/Gg, carbon contents of table 1.3 in kg/GJ, CO2 factors of tables 1.4 and 2.2 in
// kg/TJ, each with its 95 % limits. Defaults: one transcription, and every CO2 factor is the carbon
// content times 44/12 within 0.3 %. Limits: from memory.
#pragma once

#include <array>

#include "emission/ipcc.hpp"

namespace busbar::emission::tables {

// clang-format off
inline constexpr std::array kIpcc2006 = std::to_array<IpccFuel>({
    {"Crude Oil", {42.3, 40.1, 44.8}, 20.0, {73300, 71100, 75500}, false},
    {"Orimulsion", {27.5, 27.5, 28.3}, 21.0, {77000, 69300, 85400}, false},
    {"Natural Gas Liquids", {44.2, 40.9, 46.9}, 17.5, {64200, 58300, 70400}, false},
    {"Motor Gasoline", {44.3, 42.5, 44.8}, 18.9, {69300, 67500, 73000}, false},
    {"Aviation Gasoline", {44.3, 42.5, 44.8}, 19.1, {70000, 67500, 73000}, false},
    {"Jet Gasoline", {44.3, 42.5, 44.8}, 19.1, {70000, 67500, 73000}, false},
    {"Jet Kerosene", {44.1, 42.0, 45.0}, 19.5, {71500, 69700, 74400}, false},
    {"Other Kerosene", {43.8, 42.4, 45.2}, 19.6, {71900, 70800, 73700}, false},
    {"Shale Oil", {38.1, 32.1, 45.2}, 20.0, {73300, 67800, 79200}, false},
    {"Gas/Diesel Oil", {43.0, 41.4, 43.3}, 20.2, {74100, 72600, 74800}, false},
    {"Residual Fuel Oil", {40.4, 39.8, 41.7}, 21.1, {77400, 75500, 78800}, false},
    {"Liquefied Petroleum Gases", {47.3, 44.8, 52.2}, 17.2, {63100, 61600, 65600}, false},
    {"Ethane", {46.4, 44.9, 48.8}, 16.8, {61600, 56500, 68600}, false},
    {"Naphtha", {44.5, 41.8, 46.5}, 20.0, {73300, 69300, 76300}, false},
    {"Bitumen", {40.2, 33.5, 41.2}, 22.0, {80700, 73000, 89900}, false},
    {"Lubricants", {40.2, 33.5, 42.3}, 20.0, {73300, 71900, 75200}, false},
    {"Petroleum Coke", {32.5, 29.7, 41.9}, 26.6, {97500, 82900, 115000}, false},
    {"Refinery Feedstocks", {43.0, 36.3, 46.4}, 20.0, {73300, 68900, 76600}, false},
    {"Refinery Gas", {49.5, 47.5, 50.6}, 15.7, {57600, 48200, 69000}, false},
    {"Paraffin Waxes", {40.2, 33.7, 48.2}, 20.0, {73300, 72200, 74400}, false},
    {"White Spirit and SBP", {40.2, 33.7, 48.2}, 20.0, {73300, 72200, 74400}, false},
    {"Other Petroleum Products", {40.2, 33.7, 48.2}, 20.0, {73300, 72200, 74400}, false},
    {"Anthracite", {26.7, 21.6, 32.2}, 26.8, {98300, 94600, 101000}, false},
    {"Coking Coal", {28.2, 24.0, 31.0}, 25.8, {94600, 87300, 101000}, false},
    {"Other Bituminous Coal", {25.8, 19.9, 30.5}, 25.8, {94600, 89500, 99700}, false},
    {"Sub-Bituminous Coal", {18.9, 11.5, 26.0}, 26.2, {96100, 92800, 100000}, false},
    {"Lignite", {11.9, 5.50, 21.6}, 27.6, {101000, 90900, 115000}, false},
    {"Oil Shale and Tar Sands", {8.9, 7.1, 11.1}, 29.1, {107000, 90200, 125000}, false},
    {"Brown Coal Briquettes", {20.7, 15.1, 32.0}, 26.6, {97500, 87300, 109000}, false},
    {"Patent Fuel", {20.7, 15.1, 32.0}, 26.6, {97500, 87300, 109000}, false},
    {"Coke Oven Coke and Lignite Coke", {28.2, 25.1, 30.2}, 29.2, {107000, 95700, 119000}, false},
    {"Gas Coke", {28.2, 25.1, 30.2}, 29.2, {107000, 95700, 119000}, false},
    {"Coal Tar", {28.0, 14.1, 55.0}, 22.0, {80700, 68200, 95300}, false},
    {"Gas Works Gas", {38.7, 19.6, 77.0}, 12.1, {44400, 37300, 54100}, false},
    {"Coke Oven Gas", {38.7, 19.6, 77.0}, 12.1, {44400, 37300, 54100}, false},
    {"Blast Furnace Gas", {2.47, 1.20, 5.00}, 70.8, {260000, 219000, 308000}, false},
    {"Oxygen Steel Furnace Gas", {7.06, 3.80, 15.0}, 49.6, {182000, 145000, 202000}, false},
    {"Natural Gas", {48.0, 46.5, 50.4}, 15.3, {56100, 54300, 58300}, false},
    {"Municipal Wastes (non-biomass fraction)", {10.0, 7.0, 18.0}, 25.0, {91700, 73300, 121000}, false},
    {"Industrial Wastes", {kNone, kNone, kNone}, 39.0, {143000, 110000, 183000}, false},
    {"Waste Oil", {40.2, 20.3, 80.0}, 20.0, {73300, 72200, 74400}, false},
    {"Peat", {9.76, 7.80, 12.5}, 28.9, {106000, 100000, 108000}, false},
    {"Wood/Wood Waste", {15.6, 7.90, 31.0}, 30.5, {112000, 95000, 132000}, true},
    {"Sulphite lyes (black liquor)", {11.8, 5.90, 23.0}, 26.0, {95300, 80700, 110000}, true},
    {"Other Primary Solid Biomass", {11.6, 5.90, 23.0}, 27.3, {100000, 84700, 117000}, true},
    {"Charcoal", {29.5, 14.9, 58.0}, 30.5, {112000, 95000, 132000}, true},
    {"Biogasoline", {27.0, 13.6, 54.0}, 19.3, {70800, 59800, 84300}, true},
    {"Biodiesels", {27.0, 13.6, 54.0}, 19.3, {70800, 59800, 84300}, true},
    {"Other Liquid Biofuels", {27.4, 13.8, 54.0}, 21.7, {79600, 67100, 95300}, true},
    {"Landfill Gas", {50.4, 25.4, 100}, 14.9, {54600, 46200, 66000}, true},
    {"Sludge Gas", {50.4, 25.4, 100}, 14.9, {54600, 46200, 66000}, true},
    {"Other Biogas", {50.4, 25.4, 100}, 14.9, {54600, 46200, 66000}, true},
    {"Municipal Wastes (biomass fraction)", {11.6, 6.80, 18.0}, 27.3, {100000, 84700, 117000}, true},
});
// clang-format on

}  // namespace busbar::emission::tables
