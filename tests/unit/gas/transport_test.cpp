// Viscosity and conductivity of gases: what they refuse, and limits that mixing must keep.
#include "gas/transport.hpp"

#include <gtest/gtest.h>

#include <array>

#include "gas/properties.hpp"
#include "water/state.hpp"
#include "water/transport/conductivity.hpp"
#include "water/transport/viscosity.hpp"

namespace busbar::gas {
namespace {

Mixture pair_of(Species a, Species b, double share) {
  std::array<double, kSpecies> amounts{};
  amounts[static_cast<std::size_t>(a)] = share;
  amounts[static_cast<std::size_t>(b)] += 1 - share;
  return *Mixture::from_amounts(amounts);
}

// A trace of a gas changes next to nothing.
TEST(GasTransport, MixingEndsInThePureGases) {
  for (const Species other : {Species::O2, Species::CO2, Species::H2O, Species::He}) {
    const Mixture trace = pair_of(Species::N2, other, 1 - 1e-9);
    const Mixture pure = Mixture::of(Species::N2);
    EXPECT_NEAR(*viscosity(trace, 500) / *viscosity(pure, 500), 1, 1e-6);
    EXPECT_NEAR(*thermal_conductivity(trace, 500) / *thermal_conductivity(pure, 500), 1, 1e-6);
  }
}

// The dilute-gas terms are those of steam at low pressure (IAPWS R12-08 and R15-11).
TEST(GasTransport, WaterVapourIsThinSteam) {
  for (const double t : {320.0, 500.0, 900.0}) {
    const auto steam = water::at_pressure_temperature(10, t);
    const Mixture vapour = Mixture::of(Species::H2O);
    EXPECT_NEAR(*viscosity(vapour, t) / *water::viscosity(*steam), 1, 1e-4);
    EXPECT_NEAR(*thermal_conductivity(vapour, t) / *water::thermal_conductivity(*steam), 1, 1e-3);
  }
}

// Viscosities at 300 K and low pressure, in uPa s: CO2 15.0, H2 8.9, He 19.9, CH4 11.1, CO 17.8
// (CRC Handbook of Chemistry and Physics; from memory), within 2 %.
TEST(GasTransport, ViscositiesAreThoseOfTheHandbook) {
  constexpr std::array<std::pair<Species, double>, 5> kHandbook{{{Species::CO2, 15.0},
                                                                 {Species::H2, 8.9},
                                                                 {Species::He, 19.9},
                                                                 {Species::CH4, 11.1},
                                                                 {Species::CO, 17.8}}};
  for (const auto& [species, micro] : kHandbook) {
    EXPECT_NEAR(*viscosity(Mixture::of(species), 300) * 1e6, micro, 0.02 * micro)
        << name_of(species);
  }
}

TEST(GasTransport, RefusesWhatIsNotKnown) {
  EXPECT_EQ(viscosity(Mixture::of(Species::NH3), 300).failure().fault, Fault::missing);
  EXPECT_EQ(viscosity(Mixture::of(Species::H2O), 270).failure().fault, Fault::outside_range);
  EXPECT_EQ(viscosity(Mixture::of(Species::H2O), 1200).failure().argument, 2);
  EXPECT_FALSE(prandtl_number(Mixture::of(Species::CO2), 1600));
}

}  // namespace
}  // namespace busbar::gas
