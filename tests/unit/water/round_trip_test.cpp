// (p,T) -> h and s -> (p,h) and (p,s), densely in every region. No source but the definition: the
// answer must satisfy the basic equation of its region.

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

#include "exactness.hpp"
#include "sampling.hpp"
#include "water/equations/saturation.hpp"
#include "water/solve/density.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {
namespace {

using testing::expect_exact;
using testing::Sampler;

struct Worst {
  double temperature = 0;  // relative
  double volume = 0;       // relative
  int evaluations = 0;
};

// Two states may differ by twice the agreed bound over cp > 1.8 kJ/(kg K): 1e-10 of some 3000 kJ/kg
// is 3e-4 J/kg or 2e-7 K, 1e-9 of the temperature at most. What is found is far better.
void expect_back(const State& state, Worst& worst) {
  for (const Given given : {Given::enthalpy, Given::entropy}) {
    const auto back = given == Given::enthalpy
                          ? on_isobar<Given::enthalpy>(state.pressure, state.enthalpy)
                          : on_isobar<Given::entropy>(state.pressure, state.entropy);
    ASSERT_TRUE(back) << back.failure().reason << ": p " << state.pressure << ", T "
                      << state.temperature;
    const State& other = back->state;
    // Next to a seam an overlap may rightly hand the state to the lower region: seam_test.cpp.
    ASSERT_EQ(other.region, state.region) << "p " << state.pressure << ", T " << state.temperature;
    if (given == Given::enthalpy) {
      EXPECT_EQ(other.enthalpy, state.enthalpy);
    } else {
      EXPECT_EQ(other.entropy, state.entropy);
    }
    expect_exact(other);
    EXPECT_NEAR(other.temperature, state.temperature, 1e-9 * state.temperature);
    EXPECT_NEAR(other.volume, state.volume, 1e-8 * state.volume);
    worst.temperature =
        std::max(worst.temperature, std::abs(other.temperature / state.temperature - 1));
    worst.volume = std::max(worst.volume, std::abs(other.volume / state.volume - 1));
    worst.evaluations = std::max(worst.evaluations, back->evaluations);
  }
}

void report(const Worst& worst) {
  ::testing::Test::RecordProperty("evaluations", worst.evaluations);
  EXPECT_LE(worst.evaluations, kInverseCap / 2);
}

State state_at(double pressure, double temperature, Region region) {
  const auto state = at_pressure_temperature(pressure, temperature);
  EXPECT_TRUE(state) << pressure << " " << temperature;
  EXPECT_EQ(state->region, region) << pressure << " " << temperature;
  return *state;
}

TEST(RoundTrip, Region1) {
  Sampler sampler(1);
  Worst worst;
  for (int k = 0; k < 20000; ++k) {
    const double t = sampler.between(kLowestTemperature, kTemperature13);
    const double p = sampler.between(*saturation_pressure(t) * (1 + 1e-9), kHighestPressure);
    expect_back(state_at(p, t, Region::liquid), worst);
  }
  report(worst);
  EXPECT_LT(worst.temperature, 1e-13);
}

TEST(RoundTrip, Region2) {
  Sampler sampler(2);
  Worst worst;
  for (int k = 0; k < 30000; ++k) {
    const double t = sampler.between(kLowestTemperature, kHighestTemperature2);
    double top = kHighestPressure;
    if (t <= kTemperature13) {
      top = *saturation_pressure(t);
    } else if (t <= kHighestTemperature23) {
      top = boundary_23_pressure(t);
    }
    top *= 1 - 1e-6;
    const double p = k % 2 == 0 ? sampler.between(1, top) : sampler.log_between(1e-9, top);
    expect_back(state_at(p, t, Region::vapour), worst);
  }
  report(worst);
  EXPECT_LT(worst.temperature, 1e-13);
}

TEST(RoundTrip, Region3) {
  Sampler sampler(3);
  Worst worst;
  int seen = 0;
  while (seen < 30000) {
    const double p = sampler.between(kPressure13 * (1 + 1e-6), kHighestPressure);
    // Off the seams by more than their overlaps, which seam_test.cpp treats.
    const double t = sampler.between(kTemperature13 + 0.05, boundary_23_temperature(p) - 0.05);
    if (t < kTemperature13 + 0.05) continue;
    expect_back(state_at(p, t, Region::near_critical), worst);
    ++seen;
  }
  report(worst);
  EXPECT_LT(worst.temperature, 1e-10);
}

TEST(RoundTrip, Region5) {
  Sampler sampler(5);
  Worst worst;
  for (int k = 0; k < 10000; ++k) {
    const double t = sampler.between(kHighestTemperature2 + 0.1, kHighestTemperature5);
    const double p = k % 2 == 0 ? sampler.between(1, kHighestPressure5)
                                : sampler.log_between(1e-9, kHighestPressure5);
    expect_back(state_at(p, t, Region::high_temperature), worst);
  }
  report(worst);
  EXPECT_LT(worst.temperature, 1e-13);
}

// Random enthalpies and entropies over the whole range: always an answer, and the given property
// kept.
TEST(RoundTrip, EveryEnthalpyAndEntropyInRangeHasAState) {
  Sampler sampler(6);
  for (int k = 0; k < 30000; ++k) {
    const double p = k % 2 == 0 ? sampler.between(1, kHighestPressure)
                                : sampler.log_between(1e-3, kHighestPressure);
    const double hottest = p > kHighestPressure5 ? kHighestTemperature2 : kHighestTemperature5;
    const State low = *at_pressure_temperature(p, kLowestTemperature);
    const State high = *at_pressure_temperature(p, hottest);
    const double h = sampler.between(low.enthalpy, high.enthalpy);
    const auto by_enthalpy = at_pressure_enthalpy(p, h);
    ASSERT_TRUE(by_enthalpy) << p << " " << h << " " << by_enthalpy.failure().reason;
    EXPECT_EQ(by_enthalpy->enthalpy, h);
    const double s = sampler.between(low.entropy, high.entropy);
    const auto by_entropy = at_pressure_entropy(p, s);
    ASSERT_TRUE(by_entropy) << p << " " << s << " " << by_entropy.failure().reason;
    EXPECT_EQ(by_entropy->entropy, s);
    for (const State& state : {*by_enthalpy, *by_entropy}) {
      EXPECT_GE(state.temperature, kLowestTemperature);
      EXPECT_LE(state.temperature, hottest);
      EXPECT_GT(state.volume, 0);
      EXPECT_EQ(std::isnan(state.dryness), state.region != Region::two_phase);
    }
  }
}

}  // namespace
}  // namespace busbar::water
