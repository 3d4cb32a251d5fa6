// The form of the tables of species.
#pragma once

#include <array>
#include <cstdint>

#include "gas/polynomial.hpp"

namespace busbar::gas::tables {

inline constexpr std::size_t kElements = 10;

using Atoms = std::array<std::uint8_t, kElements>;

struct GasRecord {
  const char* name;
  const char* other_name;
  double molar_mass;          // g/mol
  double formation_enthalpy;  // J/mol at 298.15 K
  double lowest;              // K
  double highest;             // K
  Atoms atoms;
  Polynomial cold;  // below 1,000 K
  Polynomial hot;
};

struct Interval {
  double lowest;   // K
  double highest;  // K
  Polynomial polynomial;
};

struct CondensedRecord {
  const char* name;
  const char* other_name;
  double molar_mass;          // g/mol
  double formation_enthalpy;  // J/mol at 298.15 K
  Atoms atoms;
  std::uint8_t intervals;
  std::array<Interval, 3> interval;
};

}  // namespace busbar::gas::tables
