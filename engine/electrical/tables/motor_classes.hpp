// Efficiency classes of IEC 60034-30-1:2014, motors of 4 poles at 50 Hz, in per cent at rated load.
// Two copies of the table agree, up to 315 kW; that its last line goes on to 1000 kW is from
// memory.
#pragma once

#include <array>

namespace busbar::electrical::tables {

struct ClassLimits {
  double kilowatts;
  std::array<double, 4> percent;  // IE1, IE2, IE3, IE4
};

inline constexpr std::array kFourPoles50Hz{
    ClassLimits{0.75, {72.1, 79.6, 82.5, 85.7}}, ClassLimits{1.1, {75.0, 81.4, 84.1, 87.2}},
    ClassLimits{1.5, {77.2, 82.8, 85.3, 88.2}},  ClassLimits{2.2, {79.7, 84.3, 86.7, 89.5}},
    ClassLimits{3, {81.5, 85.5, 87.7, 90.4}},    ClassLimits{4, {83.1, 86.6, 88.6, 91.1}},
    ClassLimits{5.5, {84.7, 87.7, 89.6, 91.9}},  ClassLimits{7.5, {86.0, 88.7, 90.4, 92.6}},
    ClassLimits{11, {87.6, 89.8, 91.4, 93.3}},   ClassLimits{15, {88.7, 90.6, 92.1, 93.9}},
    ClassLimits{18.5, {89.3, 91.2, 92.6, 94.2}}, ClassLimits{22, {89.9, 91.6, 93.0, 94.5}},
    ClassLimits{30, {90.7, 92.3, 93.6, 94.9}},   ClassLimits{37, {91.2, 92.7, 93.9, 95.2}},
    ClassLimits{45, {91.7, 93.1, 94.2, 95.4}},   ClassLimits{55, {92.1, 93.5, 94.6, 95.7}},
    ClassLimits{75, {92.7, 94.0, 95.0, 96.0}},   ClassLimits{90, {93.0, 94.2, 95.2, 96.1}},
    ClassLimits{110, {93.3, 94.5, 95.4, 96.3}},  ClassLimits{132, {93.5, 94.7, 95.6, 96.4}},
    ClassLimits{160, {93.8, 94.9, 95.8, 96.6}},  ClassLimits{200, {94.0, 95.1, 96.0, 96.7}},
};

// A, B, C, D of A lg(P)^3 + B lg(P)^2 + C lg(P) + D, P in kW, for powers between those of the
// table; IE1, IE2, IE3. Those of IE4 are not at hand.
inline constexpr std::array<std::array<double, 4>, 3> kBetween{{
    {0.5234, -5.0499, 17.4180, 74.3171},
    {0.0278, -1.9247, 10.4395, 80.9761},
    {0.0773, -1.8951, 9.2984, 83.7025},
}};

}  // namespace busbar::electrical::tables
