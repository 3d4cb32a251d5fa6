// Fuels whose ultimate analysis and gross heating value were measured and published: six coals of
// the Argonne Premium Coal Sample Program (Vorres, Energy and Fuels 4 (1990) 420; Users Handbook
// ANL/PCSP-93/1; Pocahontas, Upper Freeport and Blind Canyon from memory, atomic ratios confirmed)
// and 45 fuels of Ghugare et al., BioEnergy Research 7 (2014) 681, table S.2, one transcription
// with the ash as what the elements leave.
#pragma once

#include <array>
#include <string_view>

#include "fuel/solid/correlations.hpp"

namespace busbar::sample {

using fuel::solid::Class;

struct MeasuredFuel {
  std::string_view name;
  Class kind;
  std::array<double, 7> percent;  // C, H, O, N, S, Cl, ash of dry mass
  double hhv;                     // MJ/kg of dry fuel
  // By how many percent the correlations differ, worked out in another language from the same
  // coefficients: Channiwala-Parikh, Dulong, Boie, IGT, Grummel-Davis, Vondracek, Friedl.
  std::array<double, 7> deviation;
};

// clang-format off
inline constexpr std::array kMeasuredFuels = std::to_array<MeasuredFuel>({
    {"Pittsburgh No. 8", Class::coal, {75.5, 4.83, 6.63, 1.49, 2.19, 0.11, 9.25}, 31.701, {-1.06, -0.56, 0.15, -1.69, -1.47, -0.24, -0.90}},
    {"Illinois No. 6", Class::coal, {65.65, 4.23, 8.6, 1.16, 4.83, 0.05, 15.48}, 27.799, {-2.32, -2.09, -0.63, -3.23, -2.98, -0.41, -7.89}},
    {"Wyodak-Anderson", Class::coal, {68.43, 4.88, 16.24, 1.02, 0.63, 0.03, 8.77}, 27.255, {2.08, 0.25, 2.96, 1.35, 0.26, 2.95, 1.62}},
    {"Pocahontas No. 3", Class::coal, {86.71, 4.23, 2.36, 1.27, 0.66, 0, 4.77}, 34.945, {0.03, 0.37, 0.99, -0.71, -0.91, 0.10, 4.99}},
    {"Upper Freeport", Class::coal, {74.23, 4.08, 4.84, 1.35, 2.32, 0, 13.18}, 31.325, {-3.73, -3.13, -2.21, -4.48, -4.48, -2.41, -5.75}},
    {"Blind Canyon", Class::coal, {76.89, 5.49, 10.79, 1.5, 0.62, 0, 4.71}, 32.389, {-0.78, -1.06, -0.03, -1.28, -1.30, -0.58, 2.86}},
    {"Alfalfa Straw", Class::biomass, {45.7, 5.7, 39.7, 1.7, 0.2, 0, 7.0}, 18.271, {0.77, -9.46, 0.80, -1.17, -5.96, 1.16, -0.06}},
    {"Almond Shells", Class::biomass, {49.3, 5.97, 40.63, 0.76, 0.04, 0, 3.3}, 19.490, {2.45, -7.81, 1.69, 1.02, -4.13, 2.21, 0.80}},
    {"Anthracite Coal", Class::coal, {86.78, 1.63, 1.96, 0.65, 0.92, 0, 8.06}, 31.840, {0.27, -1.25, 1.53, -1.47, -3.27, 0.93, -2.97}},
    {"Bamboo Wood", Class::biomass, {48.76, 6.32, 42.77, 0.2, 0.0, 0, 1.95}, 20.547, {-2.65, -12.88, -3.84, -3.66, -9.15, -3.24, -5.39}},
    {"Barley Straw", Class::biomass, {44.3, 5.5, 41.7, 0.7, 0.2, 0, 7.6}, 18.467, {-5.33, -16.50, -5.73, -6.93, -12.54, -5.02, -4.74}},
    {"Beech", Class::biomass, {49.69, 6.07, 43.81, 0.41, 0.02, 0, 0}, 19.507, {2.35, -9.42, 0.96, 0.80, -5.02, 1.54, 1.49}},
    {"Black Locust Wood", Class::biomass, {50.73, 5.71, 41.93, 0.57, 0.01, 0, 1.05}, 19.710, {1.84, -9.49, 0.76, 0.11, -5.27, 1.33, 2.18}},
    {"Charcoal", Class::other, {92.04, 2.45, 2.96, 0.53, 1.0, 0, 1.02}, 34.388, {1.15, -0.45, 1.83, -0.38, -2.00, 0.84, 3.15}},
    {"Coconut Shell", Class::biomass, {50.22, 5.7, 43.37, 0.0, 0.0, 0, 0.71}, 20.498, {-3.66, -15.15, -5.00, -5.14, -10.82, -4.28, -3.17}},
    {"Coke", Class::other, {89.13, 0.43, 0.98, 0.85, 1.0, 0, 7.61}, 31.124, {1.04, -1.39, 2.45, -1.38, -3.73, 1.75, -6.06}},
    {"Converse School Sub C Coal", Class::coal, {53.07, 4.09, 17.53, 0.55, 0.72, 0, 24.04}, 21.672, {-2.68, -4.20, -0.43, -3.03, -4.69, 0.51, -6.10}},
    {"Corn Stover", Class::biomass, {46.5, 5.81, 39.67, 0.56, 0.11, 0, 7.35}, 19.000, {-0.92, -10.69, -1.32, -2.08, -7.34, -0.63, -2.96}},
    {"Cotton Stalk", Class::biomass, {43.64, 5.81, 43.87, 0.0, 0.0, 0, 6.68}, 18.260, {-4.69, -16.57, -5.63, -5.83, -12.37, -4.74, -5.47}},
    {"Douglas Fir", Class::biomass, {56.2, 5.9, 36.7, 0.0, 0.0, 0, 1.2}, 22.098, {2.96, -5.39, 2.03, 2.01, -2.29, 2.57, 2.24}},
    {"Eucalyptus Globulus Wood", Class::biomass, {48.18, 5.92, 44.18, 0.39, 0.01, 0, 1.32}, 19.230, {-0.19, -12.25, -1.47, -1.78, -7.78, -0.83, -0.59}},
    {"German Braunkohle Lignite", Class::coal, {63.89, 4.97, 24.54, 0.57, 0.48, 0, 5.55}, 25.100, {1.77, -2.77, 2.01, 0.76, -1.49, 2.27, 1.66}},
    {"German-Anna", Class::coal, {82.62, 3.02, 3.66, 0.92, 0.73, 0, 9.05}, 33.000, {-3.36, -3.89, -2.16, -4.46, -5.45, -2.65, -3.56}},
    {"German-Hvb Bituminous", Class::coal, {76.65, 4.78, 10.87, 0.54, 0.42, 0, 6.74}, 31.000, {0.51, -0.30, 1.22, 0.04, -0.74, 0.93, 2.72}},
    {"Jefferson mvb Coal", Class::coal, {85.29, 4.55, 3.16, 1.45, 0.96, 0, 4.59}, 34.594, {0.56, 1.00, 1.51, -0.15, -0.10, 0.64, 5.65}},
    {"Lignite", Class::coal, {60.97, 4.07, 18.5, 1.02, 1.81, 0, 13.63}, 23.350, {2.98, -0.07, 4.37, 1.69, 0.25, 4.83, 0.28}},
    {"Loblolly Pine", Class::biomass, {56.3, 5.6, 37.7, 0.0, 0.0, 0, 0.4}, 21.772, {2.64, -6.64, 1.61, 1.38, -3.17, 2.19, 3.09}},
    {"Miscanthus Low K", Class::biomass, {49.0, 6.0, 43.8, 0.6, 0.1, 0, 0.5}, 19.400, {1.22, -10.60, -0.04, -0.45, -6.19, 0.50, 0.55}},
    {"MSW Waste", Class::other, {47.6, 6.0, 32.9, 1.2, 0.3, 0, 12.0}, 19.879, {0.83, -5.15, 1.45, 0.15, -3.46, 1.93, -4.42}},
    {"Mixed Paper", Class::other, {43.41, 5.82, 44.32, 0.25, 0.2, 0, 6.0}, 17.611, {-1.66, -14.21, -2.62, -3.07, -9.73, -1.80, -2.29}},
    {"Olive Stones", Class::biomass, {49.0, 6.1, 42.0, 0.8, 0.0, 0, 2.1}, 20.230, {-1.66, -12.00, -2.57, -3.09, -8.25, -2.11, -3.31}},
    {"Peat S-H3", Class::other, {54.81, 5.38, 35.81, 0.89, 0.11, 0, 3.0}, 22.000, {-1.34, -9.74, -1.73, -2.91, -6.74, -1.31, -1.07}},
    {"Pine Chips", Class::biomass, {49.66, 5.67, 38.07, 0.51, 0.08, 0, 6.01}, 19.790, {0.83, -8.43, 0.40, -0.39, -5.19, 1.06, -0.59}},
    {"Ponderosa Pine Wood", Class::biomass, {49.25, 5.99, 44.36, 0.06, 0.03, 0, 0.31}, 20.020, {-1.80, -13.56, -3.27, -3.20, -9.14, -2.58, -2.40}},
    {"Poplar Crop", Class::biomass, {48.45, 5.85, 43.69, 0.47, 0.01, 0, 1.53}, 19.380, {-0.67, -12.53, -1.86, -2.31, -8.13, -1.24, -0.82}},
    {"Rape Straw", Class::biomass, {46.17, 6.12, 42.47, 0.46, 0.1, 0, 4.68}, 18.340, {2.74, -8.40, 1.83, 1.52, -4.47, 2.50, -0.02}},
    {"Red Oak Chips", Class::biomass, {49.74, 5.96, 44.06, 0.23, 0.01, 0, 0}, 19.540, {1.48, -10.54, 0.02, -0.07, -6.02, 0.67, 1.13}},
    {"Redwood Wood", Class::biomass, {53.5, 5.9, 40.3, 0.1, 0.0, 0, 0.2}, 21.030, {2.03, -8.02, 0.83, 0.77, -4.24, 1.42, 1.60}},
    {"Reed Canary Grass", Class::biomass, {45.0, 5.7, 38.85, 1.4, 0.14, 0, 8.91}, 18.370, {-0.85, -10.43, -0.70, -2.43, -7.26, -0.23, -2.26}},
    {"Rice Straw", Class::biomass, {38.24, 5.2, 36.26, 0.87, 0.18, 0, 19.25}, 15.090, {1.57, -7.78, 2.99, 0.57, -5.03, 3.93, 3.50}},
    {"Rye Straw", Class::biomass, {47.3, 5.6, 42.8, 0.4, 0.1, 0, 3.8}, 18.804, {-1.04, -12.93, -2.00, -2.70, -8.57, -1.26, -0.58}},
    {"Sewage Sludge Granulates", Class::other, {33.4, 4.65, 19.6, 4.52, 1.67, 0, 36.16}, 14.800, {-2.37, -1.14, 4.28, -4.03, -3.18, 3.96, 1.26}},
    {"Sugarcane Bagasse", Class::biomass, {48.64, 5.87, 42.82, 0.16, 0.04, 0, 2.47}, 18.990, {2.26, -9.40, 1.05, 0.86, -5.11, 1.79, 1.44}},
    {"Sunflower Shell", Class::biomass, {47.4, 5.8, 41.4, 1.4, 0.05, 0, 3.95}, 18.000, {5.56, -5.88, 5.05, 3.54, -1.81, 5.45, 5.03}},
    {"Switchgrass", Class::biomass, {47.4, 5.8, 38.9, 0.8, 0.1, 0, 7.0}, 18.256, {5.22, -4.70, 4.92, 3.89, -1.31, 5.55, 3.12}},
    {"Western Hemlock Wood", Class::biomass, {50.4, 5.8, 41.4, 0.1, 0.1, 0, 2.2}, 20.051, {0.29, -10.42, -0.82, -1.02, -6.45, -0.11, -0.40}},
    {"Wheat Straw", Class::biomass, {43.2, 5.0, 39.4, 0.61, 0.11, 0, 11.68}, 17.510, {-4.89, -15.86, -4.74, -6.52, -12.00, -3.82, -1.82}},
    {"White Oak Wood", Class::biomass, {49.48, 5.38, 43.13, 0.35, 0.01, 0, 1.65}, 19.420, {-1.58, -13.88, -2.73, -3.49, -9.24, -2.01, 0.36}},
    {"Winter Wheat Straw", Class::biomass, {46.9, 5.3, 42.4, 0.4, 0.1, 0, 4.9}, 18.798, {-3.53, -15.55, -4.33, -5.33, -11.10, -3.53, -1.65}},
    {"Wyoming Elkol Coal", Class::coal, {71.5, 5.3, 16.9, 1.2, 0.9, 0, 4.2}, 29.570, {-0.43, -2.36, 0.08, -1.21, -2.00, -0.17, 1.12}},
    {"Yard Waste", Class::other, {41.54, 4.79, 31.91, 0.85, 0.24, 0, 20.67}, 16.300, {0.74, -6.55, 2.53, -0.21, -4.52, 3.56, 2.49}},
});
// clang-format on

/// The analysis, checked.
inline Outcome<fuel::solid::Analysis> analysis_of(const MeasuredFuel& fuel) {
  using fuel::solid::Entry;
  constexpr std::array<std::string_view, 7> kNames{"C", "H", "O", "N", "S", "Cl", "ash"};
  std::array<Entry, 7> entries;
  for (std::size_t i = 0; i < entries.size(); ++i) {
    entries[i] = {kNames[i], fuel.percent[i] / 100};
  }
  return fuel::solid::read(fuel::solid::State::dry, entries);
}

}  // namespace busbar::sample
