// States from further pairs: back to where they came from, refused where two states answer, and
// exact at every seam.

#include "water/pairs.hpp"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

#include "exactness.hpp"
#include "sampling.hpp"
#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/properties/response.hpp"

namespace busbar::water {
namespace {

using testing::enthalpy_tolerance;
using testing::entropy_tolerance;
using testing::near_a_boundary;
using testing::Sampler;

double internal_energy(const State& state) {
  return state.enthalpy - state.pressure * state.volume;
}

// A state anywhere in the range: single-phase states of all regions, also around the critical
// point, and wet ones.
State random_state(Sampler& sampler) {
  for (;;) {
    const double kind = sampler.share();
    if (kind < 0.2) {
      return *at_pressure_dryness(sampler.share() < 0.5
                                      ? sampler.between(kLowestSaturationPressure, 22.06e6)
                                      : sampler.log_between(kLowestSaturationPressure, 22.06e6),
                                  sampler.between(0.001, 0.999));
    }
    const double p = sampler.share() < 0.5 ? sampler.between(1, kHighestPressure)
                                           : sampler.log_between(1e-3, kHighestPressure);
    const double t = kind < 0.5   ? sampler.between(630, 860)
                     : kind < 0.6 ? sampler.between(kHighestTemperature2 + 1, kHighestTemperature5)
                                  : sampler.between(285, kHighestTemperature2);
    const auto state = at_pressure_temperature(p, t);
    // Off the seams by more than their overlaps.
    if (!state) continue;
    bool inside = true;
    for (const double dt : {-0.1, 0.1}) {
      const auto other = at_pressure_temperature(p, t + dt);
      inside = inside && other && other->region == state->region;
    }
    if (state->region == Region::vapour && t > kTemperature13 && t < kHighestTemperature23) {
      inside = inside && p < boundary_23_pressure(t) * 0.999;
    }
    if (state->region == Region::near_critical) {
      inside = inside && p > boundary_23_pressure(t) * 1.001;
    }
    if (inside) return *state;
  }
}

// The answer satisfies the basic equations and is the same state.
void expect_same(const State& back, const State& state) {
  ASSERT_EQ(back.region, state.region) << "p " << state.pressure << ", T " << state.temperature;
  if (state.region == Region::two_phase) {
    const State mixture = *at_pressure_dryness(back.pressure, back.dryness);
    EXPECT_NEAR(mixture.enthalpy, back.enthalpy, enthalpy_tolerance(back)) << state.pressure;
    EXPECT_NEAR(mixture.entropy, back.entropy, entropy_tolerance(back)) << state.pressure;
    EXPECT_NEAR(mixture.volume, back.volume, 1e-9 * back.volume) << state.pressure;
  } else {
    testing::expect_exact(back);
  }
  EXPECT_NEAR(back.temperature, state.temperature, 1e-8 * state.temperature)
      << "p " << state.pressure;
  // What the bound on the energies leaves for the pressure of a stiff liquid.
  EXPECT_NEAR(back.pressure, state.pressure,
              1e-8 * state.pressure + 4 * enthalpy_tolerance(state) / state.volume)
      << "T " << state.temperature;
}

TEST(Pairs, PressureAndVolume) {
  Sampler sampler(71);
  for (int k = 0; k < 30000; ++k) {
    const State state = random_state(sampler);
    const auto back = at_pressure_volume(state.pressure, state.volume);
    ASSERT_TRUE(back) << back.failure().reason << " p " << state.pressure << " T "
                      << state.temperature;
    EXPECT_EQ(back->volume, state.volume);
    expect_same(*back, state);
  }
}

TEST(Pairs, PressureAndInternalEnergy) {
  Sampler sampler(72);
  for (int k = 0; k < 20000; ++k) {
    const State state = random_state(sampler);
    const auto back = at_pressure_internal_energy(state.pressure, internal_energy(state));
    ASSERT_TRUE(back) << back.failure().reason;
    EXPECT_NEAR(internal_energy(*back), internal_energy(state), enthalpy_tolerance(state));
    expect_same(*back, state);
  }
}

TEST(Pairs, TemperatureAndVolume) {
  Sampler sampler(73);
  for (int k = 0; k < 30000; ++k) {
    const State state = random_state(sampler);
    const auto back = at_temperature_volume(state.temperature, state.volume);
    ASSERT_TRUE(back) << back.failure().reason << " p " << state.pressure << " T "
                      << state.temperature;
    EXPECT_EQ(back->volume, state.volume);
    EXPECT_EQ(back->temperature, state.temperature);
    ASSERT_EQ(back->region, state.region);
    // The volume of a liquid hardly depends on its pressure: dp = dv / (kappa v).
    double stiffness = 1;
    if (state.region == Region::liquid) {
      stiffness = 1 / (response(state)->isothermal_compressibility * state.pressure);
    }
    EXPECT_NEAR(back->pressure, state.pressure,
                1e-9 * state.pressure * std::fmax(1, 1e-3 * stiffness))
        << state.temperature;
    if (state.region == Region::two_phase) {
      EXPECT_NEAR(back->dryness, state.dryness, 1e-6);
      continue;
    }
    testing::expect_exact(*back);
  }
}

TEST(Pairs, TemperatureAndEntropy) {
  Sampler sampler(74);
  for (int k = 0; k < 30000; ++k) {
    const State state = random_state(sampler);
    const auto back = at_temperature_entropy(state.temperature, state.entropy);
    ASSERT_TRUE(back) << back.failure().reason << " p " << state.pressure << " T "
                      << state.temperature;
    EXPECT_EQ(back->entropy, state.entropy);
    EXPECT_EQ(back->temperature, state.temperature);
    ASSERT_EQ(back->region, state.region) << state.pressure << " " << state.temperature;
    if (state.region != Region::two_phase) testing::expect_exact(*back);
    // dp = ds / (v beta)
    const double by_pressure =
        state.region == Region::two_phase ? 1 : state.volume * response(state)->isobaric_expansion;
    EXPECT_NEAR(back->pressure, state.pressure,
                1e-8 * state.pressure + entropy_tolerance(state) / by_pressure);
  }
}

// How often the enthalpy passes a value as the pressure rises at a temperature.
int crossings(double temperature, double enthalpy) {
  const double top = temperature > kHighestTemperature2 ? kHighestPressure5 : kHighestPressure;
  int count = 0;
  bool above = false;
  for (int k = 0; k <= 1200; ++k) {
    // By the logarithm up to 1 MPa, then by the pressure.
    const double p = k <= 300 ? 1e-3 * std::exp(k / 300.0 * std::log(1e9))
                              : 1e6 + (k - 300) / 900.0 * (top - 1e6);
    const auto state = at_pressure_temperature(p, temperature);
    if (!state) break;
    const bool now = state->enthalpy > enthalpy;
    if (k > 0 && now != above) ++count;
    above = now;
  }
  return count;
}

// Where one state has the pair it comes back, and no other pressure gives that enthalpy; where the
// answer is refused there are several.
TEST(Pairs, TemperatureAndEnthalpy) {
  Sampler sampler(75);
  int found = 0;
  int refused = 0;
  int unseen = 0;
  for (int k = 0; k < 3000; ++k) {
    const State state = random_state(sampler);
    const auto back = at_temperature_enthalpy(state.temperature, state.enthalpy);
    const int count = crossings(state.temperature, state.enthalpy);
    if (back) {
      ++found;
      EXPECT_EQ(back->enthalpy, state.enthalpy);
      EXPECT_EQ(back->temperature, state.temperature);
      ASSERT_EQ(back->region, state.region) << state.pressure << " " << state.temperature;
      if (state.region != Region::two_phase) testing::expect_exact(*back);
      // Thin vapour has its enthalpy to the last digits before the first pressure that is looked
      // at.
      EXPECT_LE(count, 1) << "p " << state.pressure << ", T " << state.temperature;
      continue;
    }
    ++refused;
    ASSERT_EQ(back.failure().fault, Fault::outside_range);
    EXPECT_EQ(back.failure().argument, 2);
    // Two crossings between neighbouring pressures are not seen.
    if (count < 2) ++unseen;
  }
  EXPECT_GT(found, 700);
  EXPECT_GT(refused, 150);
  EXPECT_LT(unseen, refused / 10);
}

TEST(Pairs, TemperatureAndDryness) {
  Sampler sampler(76);
  for (int k = 0; k < 20000; ++k) {
    const double t = sampler.between(kLowestTemperature, kCriticalTemperature);
    const double x = sampler.share();
    const auto state = at_temperature_dryness(t, x);
    ASSERT_TRUE(state);
    EXPECT_EQ(state->temperature, t);
    EXPECT_EQ(state->dryness, x);
    EXPECT_EQ(state->pressure, *saturation_pressure(t));
  }
  EXPECT_EQ(at_temperature_dryness(273.14, 0.5).failure().argument, 1);
  EXPECT_EQ(at_temperature_dryness(647.1, 0.5).failure().argument, 1);
  EXPECT_EQ(at_temperature_dryness(400, 1.1).failure().argument, 2);
}

TEST(Pairs, VolumeAndInternalEnergy) {
  Sampler sampler(77);
  for (int k = 0; k < 10000; ++k) {
    const State state = random_state(sampler);
    const auto back = at_volume_internal_energy(state.volume, internal_energy(state));
    ASSERT_TRUE(back) << back.failure().reason << " p " << state.pressure << " T "
                      << state.temperature;
    EXPECT_EQ(back->volume, state.volume);
    ASSERT_EQ(back->region, state.region);
    EXPECT_NEAR(internal_energy(*back), internal_energy(state), enthalpy_tolerance(state));
    // dT = du / cv, and cv is above 1 kJ/(kg K) everywhere.
    EXPECT_NEAR(back->temperature, state.temperature, 1e-8 * state.temperature);
    if (state.region != Region::two_phase) testing::expect_exact(*back);
  }
}

TEST(Pairs, SaturationByEnthalpyAndEntropy) {
  Sampler sampler(78);
  const double lowest = saturated_at_entropy(0)->temperature;
  EXPECT_NEAR(lowest, 273.16, 1e-3);
  for (int k = 0; k < 10000; ++k) {
    const double p = *saturation_pressure(sampler.between(kLowestTemperature, 647));
    for (const double x : {0.0, 1.0}) {
      const State state = *at_pressure_dryness(p, x);
      const auto by_entropy = saturated_at_entropy(state.entropy);
      ASSERT_TRUE(by_entropy);
      EXPECT_EQ(by_entropy->dryness, x);
      EXPECT_EQ(by_entropy->entropy, state.entropy);
      // At 623.15 K the saturated entropies step by what R7-97 states for the seams.
      EXPECT_NEAR(by_entropy->temperature, state.temperature,
                  std::abs(state.temperature - kTemperature13) < 0.1 ? 0.02 : 1e-7);
      const auto by_enthalpy = saturated_at_enthalpy(state.enthalpy);
      if (!by_enthalpy) {
        EXPECT_EQ(x, 1);
        EXPECT_GE(state.enthalpy, at_pressure_dryness(kLowestSaturationPressure, 1)->enthalpy);
        continue;
      }
      EXPECT_EQ(by_enthalpy->dryness, x);
      EXPECT_NEAR(by_enthalpy->temperature, state.temperature,
                  std::abs(state.temperature - kTemperature13) < 0.1 ? 0.05 : 1e-6);
    }
  }
  EXPECT_FALSE(saturated_at_enthalpy(2.7e6));
  EXPECT_FALSE(saturated_at_enthalpy(2.9e6));
  EXPECT_FALSE(saturated_at_enthalpy(-100));
  EXPECT_FALSE(saturated_at_entropy(-1));
  EXPECT_FALSE(saturated_at_entropy(9200));
}

// Cold water: one volume or entropy at two temperatures or pressures.
TEST(Pairs, TheGreatestDensityIsAmbiguous) {
  // Water is densest near 4 °C (3.98 °C, CIPM density table): 2 °C and 6 °C share a volume.
  const double p = 101325;
  const auto shared = at_pressure_volume(p, at_pressure_temperature(p, 275.15)->volume);
  ASSERT_FALSE(shared);
  EXPECT_EQ(shared.failure().fault, Fault::outside_range);
  EXPECT_NEAR(shared.failure().measures[1].si, 273.15 + 3.98, 0.05);
  // Lighter than at 0 °C is unique again, denser than the greatest density is no state.
  EXPECT_TRUE(at_pressure_volume(p, at_pressure_temperature(p, 285)->volume));
  EXPECT_FALSE(at_pressure_volume(p, 0.00099));
  // At high pressure there is no such temperature in range.
  EXPECT_TRUE(at_pressure_volume(90e6, at_pressure_temperature(90e6, 275.15)->volume));
  // The entropy at 1 °C rises with the pressure first and then falls.
  const auto entropy =
      at_temperature_entropy(274.15, at_pressure_temperature(5e6, 274.15)->entropy);
  ASSERT_FALSE(entropy);
  EXPECT_EQ(entropy.failure().fault, Fault::outside_range);
  EXPECT_TRUE(at_temperature_entropy(274.15, at_pressure_temperature(95e6, 274.15)->entropy));
}

// Boiling water and water compressed to the same enthalpy: 100 °C.
TEST(Pairs, EnthalpyAtATemperatureIsOftenAmbiguous) {
  const State compressed = *at_pressure_temperature(50e6, 373.15);
  ASSERT_FALSE(at_temperature_enthalpy(373.15, compressed.enthalpy));
  EXPECT_TRUE(at_temperature_enthalpy(373.15, 2.0e6));   // wet
  EXPECT_TRUE(at_temperature_enthalpy(373.15, 2.68e6));  // superheated
  EXPECT_FALSE(at_temperature_enthalpy(373.15, 2.9e6));  // above vapour of zero pressure
  EXPECT_FALSE(at_temperature_enthalpy(373.15, 4.0e5));  // below boiling water
}

// Within 1e-6 of every boundary: an answer with the property kept, temperature and pressure within
// what the published steps allow (h 0.134 kJ/kg, s 0.177 J/(kg K), v 0.2 % on B23: R7-97).
TEST(Pairs, Seams) {
  Sampler sampler(79);
  for (int k = 0; k < 8000; ++k) {
    const auto [p, t] = near_a_boundary(sampler, k, kLowestTemperature + 10);
    const State state = *at_pressure_temperature(p, t);
    const auto pv = at_pressure_volume(p, state.volume);
    ASSERT_TRUE(pv) << p << " " << t;
    EXPECT_EQ(pv->volume, state.volume);
    EXPECT_NEAR(pv->temperature, t, 1) << p;
    const auto pu = at_pressure_internal_energy(p, internal_energy(state));
    ASSERT_TRUE(pu) << p << " " << t;
    EXPECT_NEAR(pu->temperature, t, 0.15) << p;
    const auto tv = at_temperature_volume(t, state.volume);
    if (tv) {
      EXPECT_EQ(tv->volume, state.volume);
      if (state.region != Region::liquid) {
        EXPECT_NEAR(tv->pressure, p, 0.004 * p) << t;
      }
    } else {
      EXPECT_GT(p, 49.9e6);  // the highest pressure may be passed by a hair
    }
    const auto ts = at_temperature_entropy(t, state.entropy);
    if (ts) {
      EXPECT_EQ(ts->entropy, state.entropy);
    } else {
      EXPECT_GT(p, 49.9e6) << ts.failure().reason << t;
    }
    const auto vu = at_volume_internal_energy(state.volume, internal_energy(state));
    if (vu) {
      EXPECT_NEAR(vu->temperature, t, 0.5) << p;
    } else {
      EXPECT_GT(p, 49.9e6) << vu.failure().reason << p << " " << t;
    }
  }
}

// Anything goes in; an answer within range or an error with the argument comes out.
TEST(Pairs, AnyNumbersAreAnsweredOrRefused) {
  Sampler sampler(80);
  const double telling[] = {0,        -1,      1,      1e-300,  1e300,    std::nan(""),
                            INFINITY, -1e6,    273.15, 647.096, 22.064e6, 1e8,
                            611.213,  3.17e-3, 2.1e6,  2273.15, 1073.15,  4412.02148,
                            5e-324,   1e308,   1e-308, 1e-3,    1e5};
  using Pair = Outcome<State> (*)(double, double);
  const Pair pairs[] = {at_enthalpy_and_entropy,     at_pressure_volume,
                        at_pressure_internal_energy, at_temperature_dryness,
                        at_temperature_volume,       at_temperature_entropy,
                        at_temperature_enthalpy,     at_volume_internal_energy};
  const auto expect_sane = [](const Outcome<State>& state) {
    if (!state) {
      EXPECT_EQ(state.failure().fault, Fault::outside_range) << state.failure().reason;
      EXPECT_LE(state.failure().argument, 2);
      return;
    }
    EXPECT_TRUE(std::isfinite(state->pressure) && std::isfinite(state->enthalpy) &&
                std::isfinite(state->entropy) && std::isfinite(state->volume));
    EXPECT_GT(state->pressure, 0);
    EXPECT_LE(state->pressure, kHighestPressure);
    EXPECT_GE(state->temperature, kLowestTemperature);
    EXPECT_LE(state->temperature, kHighestTemperature5);
  };
  for (const Pair pair : pairs) {
    for (const double a : telling) {
      for (const double b : telling) expect_sane(pair(a, b));
    }
    for (int k = 0; k < 3000; ++k) {
      expect_sane(pair(sampler.log_between(1e-6, 1e9), sampler.log_between(1e-6, 1e9)));
      expect_sane(pair(sampler.between(270, 2300), sampler.log_between(1e-4, 1e7)));
    }
  }
  for (const double a : telling) {
    expect_sane(saturated_at_enthalpy(a));
    expect_sane(saturated_at_entropy(a));
  }
}

}  // namespace
}  // namespace busbar::water
