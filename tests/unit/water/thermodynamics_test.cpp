// What the second law and the exactness of differentials demand, whatever the coefficients.

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <vector>

#include "sampling.hpp"
#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/state.hpp"

namespace busbar::water {
namespace {

using testing::Sampler;

// Enthalpy and entropy rise with temperature along isobars, across the dome and the seams. At a
// seam they may fall by the difference that R7-97(2012) states for it (consistency.csv): 0.031
// kJ/kg and 0.042 J/(kg K) at 623.15 K, 0.134 and 0.177 on B23, 0.096 and 0.142 at 1073.15 K.
TEST(Isobars, EnthalpyAndEntropyRiseWithTemperature) {
  Sampler sampler(31);
  for (int isobar = 0; isobar < 150; ++isobar) {
    const double p = isobar % 3 == 0   ? sampler.log_between(1e-3, kHighestPressure)
                     : isobar % 3 == 1 ? sampler.between(1e5, kHighestPressure)
                                       : sampler.between(16e6, 24e6);
    const double hottest = p > kHighestPressure5 ? kHighestTemperature2 : kHighestTemperature5;
    std::vector<double> temperatures;
    for (int k = 0; k <= 500; ++k) {
      temperatures.push_back(kLowestTemperature + k / 500.0 * (hottest - kLowestTemperature));
    }
    std::vector<double> seams = {kTemperature13, kHighestTemperature2};
    if (p > kPressure13) seams.push_back(boundary_23_temperature(p));
    if (p >= kLowestSaturationPressure && p <= kCriticalPressure) {
      seams.push_back(*saturation_temperature(p));
    }
    for (const double seam : seams) {
      for (const double hair : {-1e-3, -1e-8, 0.0, 1e-8, 1e-3}) {
        const double t = seam + hair;
        if (t >= kLowestTemperature && t <= hottest) temperatures.push_back(t);
      }
    }
    std::sort(temperatures.begin(), temperatures.end());
    double h = -1e9;
    double s = -1e9;
    Region region = Region::none;
    for (const double t : temperatures) {
      const auto state = at_pressure_temperature(p, t);
      ASSERT_TRUE(state) << p << " " << t;
      double h_step = 0;
      double s_step = 0;
      if (region != state->region) {
        h_step = state->region == Region::near_critical      ? 31.5
                 : state->region == Region::high_temperature ? 96.5
                                                             : 134.5;
        s_step = state->region == Region::near_critical      ? 0.0425
                 : state->region == Region::high_temperature ? 0.1425
                                                             : 0.1775;
      }
      EXPECT_GE(state->enthalpy, h - h_step - 1e-12 * std::abs(h)) << p << " " << t;
      EXPECT_GE(state->entropy, s - s_step - 1e-12 * std::abs(s)) << p << " " << t;
      h = state->enthalpy;
      s = state->entropy;
      region = state->region;
    }
  }
}

// dh = T ds + v dp between neighbouring states of one region, by central differences: the error of
// the midpoint rule is of the third order, a relative step of 1e-4 leaves 1e-8 of v dp and cp dT.
void expect_exact_differential(const State& low, const State& middle, const State& high) {
  const double dh = high.enthalpy - low.enthalpy;
  const double tds = middle.temperature * (high.entropy - low.entropy);
  const double vdp = middle.volume * (high.pressure - low.pressure);
  const double size = std::abs(dh) + std::abs(tds) + std::abs(vdp);
  // Rounding: some 1e-13 of the enthalpy in each difference.
  EXPECT_NEAR(dh, tds + vdp, 2e-5 * size + 1e-12 * (std::abs(middle.enthalpy) + 6e5))
      << "p " << middle.pressure << ", T " << middle.temperature;
}

TEST(Differentials, EnthalpyEntropyAndVolumeBelongTogether) {
  Sampler sampler(32);
  int seen[6] = {};
  for (int k = 0; k < 40000; ++k) {
    const double p = k % 2 == 0 ? sampler.between(1e3, kHighestPressure)
                                : sampler.log_between(1, kHighestPressure);
    const double t = k % 5 == 0   ? sampler.between(kHighestTemperature2, kHighestTemperature5)
                     : k % 5 == 1 ? sampler.between(630, 850)
                                  : sampler.between(kLowestTemperature, kHighestTemperature2);
    const double hair = 1e-4;
    const auto middle = at_pressure_temperature(p, t);
    if (!middle) continue;
    // Next to the critical point the third derivatives are too large for this step.
    if (std::abs(t - kCriticalTemperature) < 8 && std::abs(p - kCriticalPressure) < 3e6) continue;
    const auto inside = [&](const Outcome<State>& state) {
      return state && state->region == middle->region &&
             (state->region != Region::near_critical ||
              std::abs(state->volume / middle->volume - 1) < 0.1);
    };
    const auto left = at_pressure_temperature(p * (1 - hair), t);
    const auto right = at_pressure_temperature(p * (1 + hair), t);
    if (inside(left) && inside(right)) expect_exact_differential(*left, *middle, *right);
    const auto cold = at_pressure_temperature(p, t * (1 - hair));
    const auto hot = at_pressure_temperature(p, t * (1 + hair));
    if (inside(cold) && inside(hot)) expect_exact_differential(*cold, *middle, *hot);
    ++seen[static_cast<int>(middle->region)];
  }
  EXPECT_GT(seen[1], 1000);
  EXPECT_GT(seen[2], 1000);
  EXPECT_GT(seen[3], 1000);
  EXPECT_GT(seen[5], 1000);
}

// On isentropes dh = v dp, through (p,s): what an ideal turbine does.
TEST(Differentials, EnthalpyAlongIsentropes) {
  Sampler sampler(33);
  for (int k = 0; k < 10000; ++k) {
    const double p = sampler.log_between(1e3, 90e6);
    const double t = sampler.between(300, 1070);
    const auto middle = at_pressure_temperature(p, t);
    ASSERT_TRUE(middle);
    const auto left = at_pressure_entropy(p * (1 - 1e-4), middle->entropy);
    const auto right = at_pressure_entropy(p * (1 + 1e-4), middle->entropy);
    ASSERT_TRUE(left && right);
    if (left->region != middle->region || right->region != middle->region) continue;
    expect_exact_differential(*left, *middle, *right);
  }
}

}  // namespace
}  // namespace busbar::water
