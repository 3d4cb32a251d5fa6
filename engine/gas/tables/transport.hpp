// Coefficients of gas viscosity and conductivity; sources in gas/transport.hpp. From memory.
#pragma once

#include <array>
#include <cstdint>

#include "gas/species.hpp"

namespace busbar::gas::tables {

enum class Method : std::uint8_t { lemmon, fenghour, steam, lennard_jones };

struct Transport {
  Species species;
  Method method;
  double lowest;   // K
  double highest;  // K
  double energy;   // epsilon/k, K
  double size;     // sigma, nm
  double critical = 0;
  double n1 = 0;
  double n2 = 0;
  double t2 = 0;
  double n3 = 0;
  double t3 = 0;
};

inline constexpr Transport kTransport[] = {
    {Species::N2, Method::lemmon, 200, 2000, 98.94, 0.3656, 126.192, 1.511, 2.117, -1.0, -3.332,
     -0.7},
    {Species::O2, Method::lemmon, 200, 2000, 118.5, 0.3428, 154.581, 1.036, 6.283, -0.9, -4.262,
     -0.6},
    {Species::Ar, Method::lemmon, 200, 2000, 143.2, 0.335, 150.687, 0.8158, -0.4320, -0.77, 0, 0},
    {Species::CO2, Method::fenghour, 200, 1500, 0, 0},
    {Species::H2O, Method::steam, 273.15, 1173.15, 0, 0},
    {Species::CO, Method::lennard_jones, 200, 1500, 91.7, 0.3690},
    {Species::H2, Method::lennard_jones, 200, 1500, 59.7, 0.2827},
    {Species::CH4, Method::lennard_jones, 200, 1500, 148.6, 0.3758},
    {Species::SO2, Method::lennard_jones, 250, 1500, 335.4, 0.4112},
    {Species::NO, Method::lennard_jones, 200, 1500, 116.7, 0.3492},
    {Species::He, Method::lennard_jones, 200, 1500, 10.22, 0.2551},
    {Species::Ne, Method::lennard_jones, 200, 1500, 32.8, 0.2820},
};

// Lemmon and Jacobsen 2004, table II.
inline constexpr std::array kLemmonIntegral{0.431, -0.4623, 0.08406, 0.005341, -0.00331};

// Fenghour et al. 1998, table 1.
inline constexpr std::array kCarbonDioxide{0.235156, -0.491266, 5.211155e-2, 5.347906e-2,
                                           -1.537102e-2};

// IAPWS R12-08, table 1, and R15-11, table 1.
inline constexpr std::array kSteamViscosity{1.67752, 2.20462, 0.6366564, -0.241605};
inline constexpr std::array kSteamConductivity{2.443221e-3, 1.323095e-2, 6.770357e-3, -3.454586e-3,
                                               4.096266e-4};

}  // namespace busbar::gas::tables
