#include "fuel/gaseous/gpa_2145.hpp"

#include <array>

namespace busbar::fuel::gaseous {
namespace {

// A heating value of zero: nitrogen, oxygen and so on. Below: GPA 2145 has a value that is not at
// hand here, or none.
constexpr double kNone = -1;

// Btu per cubic foot of ideal gas at 60 °F and 14.696 psia, in the order of the components of ISO
// 6976, table 1. From a public transcription of GPA 2145 that does not state the edition; each
// value is within 0.005 % of ISO 6976:2016 at 60 °F.
constexpr std::array<double, kComponents> kGross = [] {
  std::array<double, kComponents> table{};
  table.fill(kNone);
  constexpr std::array<double, 17> first{1010.0, 1769.7, 2516.1, 3262.3, 3251.9, 4008.9,
                                         4000.9, kNone,  4755.9, kNone,  kNone,  kNone,
                                         kNone,  5502.5, 6248.9, 6996.5, 7742.9};
  for (std::size_t i = 0; i < first.size(); ++i) table[i] = first[i];
  // Helium, neon, argon, nitrogen, oxygen, carbon dioxide.
  for (std::size_t number = 49; number <= 54; ++number) table[number - 1] = 0;
  return table;
}();

// 1 Btu = 1055.055 852 62 J, 1 ft = 0.3048 m: exact.
constexpr double kBtuPerCubicFoot = 1055.05585262 / (0.3048 * 0.3048 * 0.3048);

}  // namespace

Outcome<double> gpa_heating_value(const Mixture& gas) {
  double sum = 0;
  for (std::size_t i = 0; i < gas.size; ++i) {
    const double value = kGross[gas.component[i]];
    if (value == kNone) {
      Failure failure{Fault::outside_range, 1,
                      "has no value in the table of GPA 2145 that is held here"};
      failure.row = static_cast<std::uint32_t>(i + 1);
      return failure;
    }
    sum += gas.fraction[i] * value;
  }
  return sum * kBtuPerCubicFoot;
}

}  // namespace busbar::fuel::gaseous
