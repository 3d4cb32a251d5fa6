// Saturated and two-phase states, the last kelvins below the critical point included.

#include "water/equations/saturation.hpp"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

#include "exactness.hpp"
#include "sampling.hpp"
#include "water/solve/density.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {
namespace {

using testing::pressure_3;
using testing::Sampler;

// Equation 30 at Tc is 3e-4 Pa above the critical pressure of the release; the function keeps to
// it.
TEST(Saturation, LineEndsInTheCriticalPoint) {
  EXPECT_EQ(*saturation_pressure(kCriticalTemperature), kCriticalPressure);
  EXPECT_NEAR(*saturation_temperature(kCriticalPressure), kCriticalTemperature, 2e-9);
  EXPECT_LE(*saturation_temperature(kCriticalPressure), kCriticalTemperature);
  EXPECT_NEAR(*saturation_pressure(kLowestTemperature), kLowestSaturationPressure, 1e-11);
  EXPECT_GE(*saturation_temperature(kLowestSaturationPressure), kLowestTemperature);
}

TEST(Saturation, ConstantsAreThoseOfEquation30) {
  // The last digits of equation 30 depend on how a compiler folds it.
  EXPECT_NEAR(kPressure13, saturation_pressure_equation(kTemperature13), 1e-14 * kPressure13);
  EXPECT_NEAR(kLowestSaturationPressure, saturation_pressure_equation(kLowestTemperature),
              1e-14 * kLowestSaturationPressure);
}

TEST(Saturation, TemperatureAndPressureAreInverse) {
  for (int k = 0; k <= 20000; ++k) {
    const double t = kLowestTemperature + k / 20000.0 * (kCriticalTemperature - kLowestTemperature);
    const double p = *saturation_pressure(t);
    EXPECT_NEAR(*saturation_temperature(p), t, 1e-11 * t);
    if (k > 0 && p < kCriticalPressure) {
      EXPECT_EQ(at_pressure_temperature(p, t)->region,
                t <= kTemperature13 ? Region::liquid : Region::near_critical);
    }
  }
}

// The header promises liquid on the saturation line, whichever way the line was computed.
TEST(Saturation, OnTheLineTheLiquidIsReturned) {
  Sampler sampler(21);
  for (int k = 0; k < 20000; ++k) {
    const double t = sampler.between(kLowestTemperature, kTemperature13);
    EXPECT_EQ(at_pressure_temperature(*saturation_pressure(t), t)->region, Region::liquid);
    const double p = sampler.log_between(kLowestSaturationPressure, kPressure13);
    EXPECT_EQ(at_pressure_temperature(p, *saturation_temperature(p))->region, Region::liquid);
    const double q = sampler.between(kPressure13 * (1 + 1e-6), kCriticalPressure);
    EXPECT_GT(1 / at_pressure_temperature(q, *saturation_temperature(q))->volume, kCriticalDensity);
  }
}

// Equation 28 at the saturated densities has the pressure given, outside the critical band.
TEST(Saturation, SaturatedDensitiesOfRegion3SatisfyEquation28) {
  int most = 0;
  for (double distance = 23.9; distance > kCriticalBand * 1.0001; distance *= 0.97) {
    const double p = saturation_pressure_equation(kCriticalTemperature - distance);
    const double t = saturation_temperature_equation(p);
    const SaturatedDensities found = saturated_densities_3(p, t);
    ASSERT_TRUE(found.converged) << distance;
    EXPECT_NEAR(pressure_3(found.liquid, t), p, 1e-12 * p) << distance;
    EXPECT_NEAR(pressure_3(found.vapour, t), p, 1e-12 * p) << distance;
    EXPECT_GT(found.liquid, kCriticalDensity);
    EXPECT_LT(found.vapour, kCriticalDensity);
    most = std::max(most, found.evaluations);
  }
  // Two densities together.
  EXPECT_LE(most, 2 * kDensityCap / 4);
}

// Inside the band they follow the square-root law to the critical point; the shift of pressure that
// this means stays below 0.02 Pa, 1e-9 of the pressure.
TEST(Saturation, CriticalBandIsContinuousAndCloses) {
  const double edge = kCriticalTemperature - kCriticalBand;
  const double p_out = saturation_pressure_equation(edge - 1e-9);
  const double p_in = saturation_pressure_equation(edge + 1e-9);
  const SaturatedDensities outside =
      saturated_densities_3(p_out, saturation_temperature_equation(p_out));
  const SaturatedDensities inside =
      saturated_densities_3(p_in, saturation_temperature_equation(p_in));
  // The densities change there by 1.4 kg/m3 over twice the band, 7e-6 kg/m3 in these 2e-9 K; and
  // the rounding of equation 28, about 1e-13 of the pressure, over a slope of 0.16 Pa m3/kg
  // is 1.4e-5.
  EXPECT_NEAR(outside.liquid, inside.liquid, 3e-5);
  EXPECT_NEAR(outside.vapour, inside.vapour, 3e-5);
  double liquid = outside.liquid;
  double vapour = outside.vapour;
  double shift = 0;
  for (double distance = kCriticalBand * 0.999; distance > 2e-9; distance *= 0.98) {
    const double p = saturation_pressure_equation(kCriticalTemperature - distance);
    const double t = saturation_temperature_equation(p);
    const SaturatedDensities found = saturated_densities_3(p, t);
    ASSERT_TRUE(found.converged);
    EXPECT_LT(found.liquid, liquid);
    EXPECT_GT(found.vapour, vapour);
    liquid = found.liquid;
    vapour = found.vapour;
    shift =
        std::max({shift, std::abs(pressure_3(liquid, t) - p), std::abs(pressure_3(vapour, t) - p)});
  }
  EXPECT_NEAR(liquid, kCriticalDensity, 0.01);
  EXPECT_NEAR(vapour, kCriticalDensity, 0.01);
  EXPECT_LT(shift, 0.02);
  EXPECT_GT(shift, 1e-4);  // or the band would not be needed
}

// Pressures of two-phase states: evenly, and ever closer to the critical and the lowest pressure.
double saturation_pressure_sample(Sampler& sampler, int k) {
  switch (k % 4) {
    case 0:
      return sampler.between(kLowestSaturationPressure, kCriticalPressure);
    case 1:
      return sampler.log_between(kLowestSaturationPressure, kCriticalPressure);
    case 2:
      return kCriticalPressure - sampler.log_between(1e-4, 1e6);
    default:
      return kPressure13 + (k % 8 == 3 ? 1 : -1) * sampler.log_between(1e-6, 1e5);
  }
}

TEST(TwoPhase, DrynessEnthalpyAndEntropyAgree) {
  Sampler sampler(22);
  for (int k = 0; k < 40000; ++k) {
    const double p = saturation_pressure_sample(sampler, k);
    const double x = k % 10 == 0 ? 0 : k % 10 == 1 ? 1 : sampler.share();
    const auto state = at_pressure_dryness(p, x);
    ASSERT_TRUE(state) << p;
    EXPECT_EQ(state->region, Region::two_phase);
    EXPECT_EQ(state->dryness, x);
    const auto by_enthalpy = at_pressure_enthalpy(p, state->enthalpy);
    const auto by_entropy = at_pressure_entropy(p, state->entropy);
    ASSERT_TRUE(by_enthalpy);
    ASSERT_TRUE(by_entropy);
    // The dryness carries the rounding of h over the heat of evaporation, which vanishes at pc.
    const State wet = *at_pressure_dryness(p, 0);
    const State dry = *at_pressure_dryness(p, 1);
    const double blur =
        1e-9 + 1e-15 * state->enthalpy / std::max(dry.enthalpy - wet.enthalpy, 1e-300);
    if (p < kCriticalPressure - 1e-3) {
      EXPECT_EQ(by_enthalpy->region, Region::two_phase) << p << " " << x;
      EXPECT_EQ(by_entropy->region, Region::two_phase) << p << " " << x;
      EXPECT_NEAR(by_enthalpy->dryness, x, blur) << p;
      EXPECT_NEAR(by_entropy->dryness, x, blur) << p;
    }
    for (const State& other : {*by_enthalpy, *by_entropy}) {
      EXPECT_NEAR(other.temperature, state->temperature, 1e-9 * state->temperature);
      EXPECT_NEAR(other.volume, state->volume, 1e-9 * state->volume) << p << " " << x;
      EXPECT_NEAR(other.enthalpy, state->enthalpy, 1e-9 * state->enthalpy + 1e-3);
      EXPECT_NEAR(other.entropy, state->entropy, 1e-9 * state->entropy + 1e-6);
    }
  }
}

// Just outside the line the single-phase state joins the saturated one.
TEST(TwoPhase, EndsJoinTheSinglePhaseStates) {
  Sampler sampler(23);
  for (int k = 0; k < 20000; ++k) {
    double p = saturation_pressure_sample(sampler, k);
    // Above 16.529 MPa by less than this, region 3 is a sliver between seams.
    if (std::abs(p - kPressure13) < 2e4) p = kPressure13 - 2e4;
    const State wet = *at_pressure_dryness(p, 0);
    const State dry = *at_pressure_dryness(p, 1);
    const double step = 1e-9;
    const auto liquid = at_pressure_enthalpy(p, wet.enthalpy - step * std::abs(wet.enthalpy));
    const auto vapour = at_pressure_enthalpy(p, dry.enthalpy * (1 + step));
    if (p > kLowestSaturationPressure * (1 + 1e-6)) {
      ASSERT_TRUE(liquid) << p;
      EXPECT_NE(liquid->region, Region::two_phase);
      EXPECT_NEAR(liquid->temperature, wet.temperature, 1e-8 * wet.temperature) << p;
      EXPECT_NEAR(liquid->volume, wet.volume, 1e-7 * wet.volume) << p;
      EXPECT_NEAR(liquid->entropy, wet.entropy, 1e-8 * std::abs(wet.entropy) + 1e-6) << p;
    }
    ASSERT_TRUE(vapour) << p;
    EXPECT_NE(vapour->region, Region::two_phase);
    EXPECT_NEAR(vapour->temperature, dry.temperature, 1e-8 * dry.temperature) << p;
    EXPECT_NEAR(vapour->volume, dry.volume, 1e-7 * dry.volume) << p;
    EXPECT_NEAR(vapour->entropy, dry.entropy, 1e-8 * dry.entropy) << p;
  }
}

// (p,T) a hair below and above the saturation temperature against the saturated states.
TEST(TwoPhase, StatesByTemperatureJoinTheSaturatedOnes) {
  for (double distance = 350; distance > 1e-4; distance *= 0.9) {
    const double p = saturation_pressure_equation(kCriticalTemperature - distance);
    const double t = *saturation_temperature(p);
    if (std::abs(t - kTemperature13) < 0.1) continue;
    const State wet = *at_pressure_dryness(p, 0);
    const State dry = *at_pressure_dryness(p, 1);
    const double hair = 1e-11 * t;
    const auto liquid = at_pressure_temperature(p, t - hair);
    const auto vapour = at_pressure_temperature(p, t + hair);
    ASSERT_TRUE(liquid && vapour);
    // dv/dT at the line grows towards the critical point as 1/(Tc - T): v/(2 (Tc - T)) for a
    // parabola, far less below; and equation 28 is known to 1e-14 of its pressure.
    const double bound = 1e-8 + 2 * hair / distance + 1e-7 * std::pow(1e-3 / distance, 1.0);
    EXPECT_NEAR(liquid->volume, wet.volume, bound * wet.volume) << distance;
    EXPECT_NEAR(vapour->volume, dry.volume, bound * dry.volume) << distance;
  }
}

// The same inside the critical band, where equation 28 alone would put the liquid 0.04 kg/m3 and
// more beside the saturated one (1e-4 of it). What may remain: equations 30 and 31 are inverse to
// each other within 3e-5 Pa here, and the vapour is asked for 1e-10 K (3e-5 Pa) above the line; the
// slope of equation 28 at the saturated densities is about 0.1 Pa m3/kg at 0.1 mK and grows with
// the distance.
TEST(TwoPhase, StatesByTemperatureJoinTheSaturatedOnesInTheCriticalBand) {
  for (double distance = 1.9e-4; distance > 1e-5; distance *= 0.9) {
    const double p = saturation_pressure_equation(kCriticalTemperature - distance);
    const double t = *saturation_temperature(p);
    const double bound = 6e-5 / (0.1 * distance / 1e-4) / kCriticalDensity;
    const auto liquid = at_pressure_temperature(p, t);
    ASSERT_TRUE(liquid);
    const double wet = at_pressure_dryness(p, 0)->volume;
    EXPECT_NEAR(liquid->volume, wet, bound * wet) << distance;
    const auto vapour = at_pressure_temperature(p, t + 1e-10);
    ASSERT_TRUE(vapour);
    const double dry = at_pressure_dryness(p, 1)->volume;
    EXPECT_NEAR(vapour->volume, dry, bound * dry) << distance;
  }
}

// The caps are far from what the iterations need, at the worst places: next to the critical point
// and on the saturation line.
TEST(NearCritical, IterationsStayFarFromTheirCaps) {
  Sampler sampler(24);
  int inverse = 0;
  int density = 0;
  for (int k = 0; k < 30000; ++k) {
    const double p = kCriticalPressure + (k % 2 == 0 ? 1 : -1) * sampler.log_between(1e-6, 3e6);
    const double t =
        k % 3 == 0 ? kCriticalTemperature + sampler.between(-20, 20)
                   : kCriticalTemperature + (k % 3 == 1 ? 1 : -1) * sampler.log_between(1e-10, 20);
    const bool liquid = p >= kCriticalPressure || t <= *saturation_temperature(p);
    const DensityFound found = density_3(p, t, liquid);
    ASSERT_TRUE(found.converged) << p << " " << t;
    density = std::max(density, found.evaluations);
    const Properties at = properties_3(found.density, t);
    const Inverse by_enthalpy = invert_region_3<Given::enthalpy>(p, at.enthalpy);
    const Inverse by_entropy = invert_region_3<Given::entropy>(p, at.entropy);
    ASSERT_TRUE(by_enthalpy.converged && by_entropy.converged) << p << " " << t;
    inverse = std::max({inverse, by_enthalpy.evaluations, by_entropy.evaluations});
  }
  RecordProperty("inverse", inverse);
  RecordProperty("density", density);
  EXPECT_LE(inverse, kInverseCap / 4);
  EXPECT_LE(density, kDensityCap / 2);
}

// Isobars a little below and above pc, states ever closer to the critical temperature: always an
// answer, consistent both ways, and rising enthalpy. At the critical point itself one unit in the
// last place of the pressure (4e-9 Pa) moves the density by the cube root of that over 0.065 Pa,
// 0.004 kg/m3, which is 8 J/kg; rounding in equation 28 is some tens of units.
TEST(NearCritical, EveryStateIsFoundAndConsistent) {
  constexpr double kNoise = 40;  // J/kg
  int most = 0;
  for (int sign = -1; sign <= 1; ++sign) {
    for (double exponent = -8; exponent <= 5.5; exponent += 0.25) {
      const double p = kCriticalPressure + sign * std::pow(10.0, exponent);
      const double middle =
          p < kCriticalPressure ? *saturation_temperature(p) : kCriticalTemperature;
      double last = 0;
      const auto visit = [&](double t) {
        const auto state = at_pressure_temperature(p, t);
        ASSERT_TRUE(state) << p << " " << t;
        EXPECT_GE(state->enthalpy, last - kNoise) << p << " " << t;
        last = state->enthalpy;
        const auto by_enthalpy = on_isobar<Given::enthalpy>(p, state->enthalpy);
        const auto by_entropy = on_isobar<Given::entropy>(p, state->entropy);
        ASSERT_TRUE(by_enthalpy && by_entropy) << p << " " << t;
        most = std::max({most, by_enthalpy->evaluations, by_entropy->evaluations});
        EXPECT_NEAR(by_enthalpy->state.temperature, t, 1e-10 * t);
        EXPECT_NEAR(by_entropy->state.temperature, t, 1e-10 * t);
        EXPECT_NEAR(by_enthalpy->state.volume, state->volume, 1e-8 * state->volume);
        EXPECT_NEAR(by_entropy->state.enthalpy, state->enthalpy, 1e-8 * state->enthalpy);
        if (by_enthalpy->state.region == Region::near_critical) {
          testing::expect_exact(by_enthalpy->state);
        }
        if (by_entropy->state.region == Region::near_critical) {
          testing::expect_exact(by_entropy->state);
        }
      };
      for (double step = 10; step > 1e-11; step *= 0.8) visit(middle - step);
      visit(middle);
      for (double step = 1e-11; step < 10; step *= 1.25) visit(middle + step);
    }
  }
  // Evaluations of the saturated states come on top of those of the iteration itself.
  EXPECT_LE(most, kInverseCap);
}

// Enthalpy across the critical point at constant pressure: every value has a state, the temperature
// never falls, the volume rises.
TEST(NearCritical, TemperatureNeverFallsWithEnthalpy) {
  for (int sign = -1; sign <= 1; ++sign) {
    for (double exponent = -8; exponent <= 6; exponent += 0.5) {
      const double p = kCriticalPressure + sign * std::pow(10.0, exponent);
      double temperature = 0;
      double volume = 0;
      for (double h = 1800e3; h <= 2500e3; h += 500) {
        const auto state = at_pressure_enthalpy(p, h);
        ASSERT_TRUE(state) << p << " " << h;
        EXPECT_GE(state->temperature, temperature - 1e-10 * state->temperature) << p << " " << h;
        EXPECT_GT(state->volume, volume) << p << " " << h;
        temperature = state->temperature;
        volume = state->volume;
      }
    }
  }
}

}  // namespace
}  // namespace busbar::water
