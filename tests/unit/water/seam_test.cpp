// The boundaries between regions: what the releases say about their size, and the seam rule
// (water/solve/isobar.hpp).

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

#include "exactness.hpp"
#include "published.hpp"
#include "sampling.hpp"
#include "water/equations/saturation.hpp"
#include "water/solve/bounds.hpp"
#include "water/solve/density.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {
namespace {

using testing::number;
using testing::read_rows;
using testing::Row;

// Both sides of a boundary at one of its points, in the order of rising temperature.
struct Sides {
  double pressure;
  double temperature;
  Region cold_region;
  Region hot_region;
  Region lower_number;
  Properties cold;
  Properties hot;
};

Properties region_3(double pressure, double temperature, bool liquid) {
  const DensityFound found = density_3(pressure, temperature, liquid);
  EXPECT_TRUE(found.converged);
  return properties_3(found.density, temperature);
}

Sides sides_13(double pressure) {
  return {pressure,
          kTemperature13,
          Region::liquid,
          Region::near_critical,
          Region::liquid,
          properties_1(pressure, kTemperature13),
          region_3(pressure, kTemperature13, true)};
}

Sides sides_23(double pressure) {
  const double t = std::max(boundary_23_temperature(pressure), kTemperature13);
  return {pressure,
          t,
          Region::near_critical,
          Region::vapour,
          Region::vapour,
          region_3(pressure, t, false),
          properties_2(pressure, t)};
}

Sides sides_25(double pressure) {
  return {pressure,
          kHighestTemperature2,
          Region::vapour,
          Region::high_temperature,
          Region::vapour,
          properties_2(pressure, kHighestTemperature2),
          properties_5(pressure, kHighestTemperature2)};
}

std::vector<Sides> boundary_points(const std::string& boundary, int count) {
  std::vector<Sides> points;
  for (int k = 0; k < count; ++k) {
    const double share = (k + 0.5) / count;
    const double p = kPressure13 + share * (kHighestPressure - kPressure13);
    if (boundary == "1/3") points.push_back(sides_13(p));
    if (boundary == "2/3") points.push_back(sides_23(p));
    if (boundary == "2/5") {
      points.push_back(sides_25(std::exp(std::log(1.0) + share * std::log(kHighestPressure5))));
      points.push_back(sides_25(share * kHighestPressure5));
    }
  }
  return points;
}

double gibbs(const Sides& sides, const Properties& at) {
  return at.enthalpy - sides.temperature * at.entropy;
}

// R7-97(2012) states the largest differences at its boundaries; the sides computed here reach them
// (to 80 %, since the points are a sample) and do not exceed them beyond the printed digit.
TEST(Seams, DifferencesAreThoseOfTheRelease) {
  const auto rows = read_rows("consistency.csv");
  ASSERT_EQ(rows.size(), 14u);
  for (const Row& row : rows) {
    const std::string& boundary = row.at("boundary");
    if (boundary[0] == '4') continue;
    const std::string& quantity = row.at("quantity");
    double largest = 0;
    for (const Sides& sides : boundary_points(boundary, 2000)) {
      double difference = 0;
      if (quantity == "v") difference = 100 * (sides.hot.volume / sides.cold.volume - 1);
      if (quantity == "h") difference = (sides.hot.enthalpy - sides.cold.enthalpy) / 1e3;
      if (quantity == "s") difference = sides.hot.entropy - sides.cold.entropy;
      if (quantity == "g") difference = (gibbs(sides, sides.hot) - gibbs(sides, sides.cold)) / 1e3;
      largest = std::max(largest, std::abs(difference));
    }
    const std::string& printed = row.at("largest");
    EXPECT_LE(largest, number(printed) + 0.5 * testing::last_digit(printed)) << row.at("id");
    EXPECT_GE(largest, 0.8 * number(printed) - 0.5 * testing::last_digit(printed)) << row.at("id");
  }
}

// The same on the saturation line: both phases have the same Gibbs energy to the stated difference.
TEST(Seams, PhasesAgreeOnTheSaturationLineAsTheReleaseSays) {
  for (const Row& row : read_rows("consistency.csv")) {
    const std::string& boundary = row.at("boundary");
    if (boundary[0] != '4') continue;
    const bool in_region_3 = boundary.find("above") != std::string::npos;
    double largest = 0;
    for (int k = 0; k <= 4000; ++k) {
      const double share = k / 4000.0;
      const double t =
          in_region_3
              ? kTemperature13 + 1e-3 + share * (kCriticalTemperature - kTemperature13 - 1e-3)
              : kLowestTemperature + share * (kTemperature13 - kLowestTemperature);
      const Saturated saturated = saturated_at(*saturation_pressure(t));
      ASSERT_TRUE(saturated.converged);
      const double difference =
          saturated.vapour.enthalpy - saturated.liquid.enthalpy -
          saturated.temperature * (saturated.vapour.entropy - saturated.liquid.entropy);
      largest = std::max(largest, std::abs(difference) / 1e3);
    }
    const std::string& printed = row.at("largest");
    EXPECT_LE(largest, number(printed) + 0.5 * testing::last_digit(printed)) << boundary;
  }
}

TEST(Seams, BoundariesBelongToTheLowerRegion) {
  EXPECT_EQ(at_pressure_temperature(50e6, kTemperature13)->region, Region::liquid);
  EXPECT_EQ(at_pressure_temperature(50e6, std::nextafter(kTemperature13, 700))->region,
            Region::near_critical);
  // Equation 5 has its own rounding, which the engine and this test need not share.
  EXPECT_EQ(at_pressure_temperature(boundary_23_pressure(700) * (1 - 1e-14), 700)->region,
            Region::vapour);
  EXPECT_EQ(at_pressure_temperature(boundary_23_pressure(700) * (1 + 1e-14), 700)->region,
            Region::near_critical);
  EXPECT_EQ(at_pressure_temperature(20e6, kHighestTemperature2)->region, Region::vapour);
  EXPECT_EQ(at_pressure_temperature(20e6, std::nextafter(kHighestTemperature2, 2000))->region,
            Region::high_temperature);
  EXPECT_EQ(at_pressure_temperature(kHighestPressure, kHighestTemperature23)->region,
            Region::vapour);
}

template <Given kGiven>
Outcome<State> find(double pressure, double value) {
  return kGiven == Given::enthalpy ? at_pressure_enthalpy(pressure, value)
                                   : at_pressure_entropy(pressure, value);
}

struct Count {
  int gaps = 0;
  int overlaps = 0;
};

template <Given kGiven>
void check_seam(const Sides& sides, Count& count) {
  const double cold = given_of<kGiven>(sides.cold);
  const double hot = given_of<kGiven>(sides.hot);
  if (hot > cold) {
    ++count.gaps;
    for (const double weight : {0.001, 0.25, 0.5, 0.75, 0.999}) {
      const double value = cold + weight * (hot - cold);
      const auto state = find<kGiven>(sides.pressure, value);
      ASSERT_TRUE(state);
      EXPECT_EQ(state->region, sides.lower_number);
      EXPECT_EQ(state->temperature, sides.temperature);
      EXPECT_EQ(given_of<kGiven>({state->volume, state->enthalpy, state->entropy}), value);
      const double w = (value - cold) / (hot - cold);
      const Properties expected = mixed(sides.cold, sides.hot, w);
      // The weight carries the rounding of the given property, some 1e-16 of it over the gap.
      const double blur = 4e-16 * std::abs(value) / (hot - cold);
      EXPECT_NEAR(state->volume, expected.volume,
                  blur * std::abs(sides.hot.volume - sides.cold.volume) + 1e-15 * state->volume);
      EXPECT_NEAR(
          state->enthalpy, expected.enthalpy,
          blur * std::abs(sides.hot.enthalpy - sides.cold.enthalpy) + 1e-15 * state->enthalpy);
      EXPECT_NEAR(state->entropy, expected.entropy,
                  blur * std::abs(sides.hot.entropy - sides.cold.entropy) + 1e-15 * state->entropy);
    }
    // At the ends of the gap the state is that of the region beside it.
    const auto end = find<kGiven>(sides.pressure, cold);
    ASSERT_TRUE(end);
    EXPECT_NEAR(end->temperature, sides.temperature, 1e-9 * sides.temperature);
    EXPECT_NEAR(end->volume, sides.cold.volume, 1e-8 * sides.cold.volume);
    const auto start = find<kGiven>(sides.pressure, hot);
    ASSERT_TRUE(start);
    EXPECT_NEAR(start->temperature, sides.temperature, 1e-9 * sides.temperature);
    EXPECT_NEAR(start->volume, sides.hot.volume, 1e-8 * sides.hot.volume);
  } else if (hot < cold) {
    ++count.overlaps;
    for (const double weight : {0.0, 0.001, 0.25, 0.5, 0.75, 0.999, 1.0}) {
      const double value = hot + weight * (cold - hot);
      const auto state = find<kGiven>(sides.pressure, value);
      ASSERT_TRUE(state);
      EXPECT_EQ(state->region, sides.lower_number) << sides.pressure << " " << weight;
      testing::expect_exact(*state);
    }
  }
}

TEST(Seams, GapsAreBridgedAndOverlapsGoToTheLowerRegion) {
  for (const char* boundary : {"1/3", "2/3", "2/5"}) {
    Count enthalpy;
    Count entropy;
    for (const Sides& sides : boundary_points(boundary, 1500)) {
      check_seam<Given::enthalpy>(sides, enthalpy);
      check_seam<Given::entropy>(sides, entropy);
    }
    // Every boundary has both kinds somewhere, so that neither half of the rule goes untested.
    EXPECT_GT(enthalpy.gaps, 50) << boundary;
    EXPECT_GT(enthalpy.overlaps, 50) << boundary;
    EXPECT_GT(entropy.gaps, 50) << boundary;
    EXPECT_GT(entropy.overlaps, 50) << boundary;
  }
}

// An expansion that ends in a gap: (p,s) -> h -> (p,h) must give back the entropy.
TEST(Seams, EntropyComesBackThroughTheEnthalpy) {
  for (const char* boundary : {"1/3", "2/3", "2/5"}) {
    int both = 0;
    for (const Sides& sides : boundary_points(boundary, 1500)) {
      const double s_cold = sides.cold.entropy;
      const double s_hot = sides.hot.entropy;
      const bool same_kind = (s_hot > s_cold) == (sides.hot.enthalpy > sides.cold.enthalpy);
      for (const double weight : {-0.5, 0.0, 0.1, 0.5, 0.9, 1.0, 1.5}) {
        const double s = s_cold + weight * (s_hot - s_cold);
        const auto there = at_pressure_entropy(sides.pressure, s);
        ASSERT_TRUE(there);
        const auto back = at_pressure_enthalpy(sides.pressure, there->enthalpy);
        ASSERT_TRUE(back);
        if (same_kind && s_hot > s_cold) {
          EXPECT_NEAR(back->entropy, s, 1e-10 * s) << boundary << " " << sides.pressure;
          ++both;
        } else {
          // At most the step in entropy that belongs to the boundary.
          EXPECT_NEAR(back->entropy, s, std::abs(s_hot - s_cold) + 1e-10 * s)
              << boundary << " " << sides.pressure;
        }
      }
    }
    EXPECT_GT(both, 100) << boundary;
  }
}

// States within 1e-6 relative of each boundary, on both sides: an answer that satisfies the basic
// equation of its region, or the boundary itself in a gap.
TEST(Seams, StatesBesideTheBoundaries) {
  testing::Sampler sampler(11);
  for (const char* boundary : {"1/3", "2/3", "2/5"}) {
    for (const Sides& sides : boundary_points(boundary, 1000)) {
      const double t = sides.temperature * (1 + 1e-6 * sampler.between(-1, 1));
      const auto state = at_pressure_temperature(sides.pressure, t);
      ASSERT_TRUE(state);
      // Which side follows from the temperature alone.
      EXPECT_EQ(state->region, t <= sides.temperature ? sides.cold_region : sides.hot_region);
      for (const auto& back : {at_pressure_enthalpy(sides.pressure, state->enthalpy),
                               at_pressure_entropy(sides.pressure, state->entropy)}) {
        ASSERT_TRUE(back);
        if (back->region == state->region) {
          testing::expect_exact(*back);
          EXPECT_NEAR(back->temperature, t, 1e-9 * t);
        } else {
          // Taken by the lower region because both sides have this value.
          EXPECT_EQ(back->region, sides.lower_number);
          testing::expect_exact(*back);
          EXPECT_NEAR(back->temperature, t, 0.2);
        }
      }
    }
  }
}

template <Given kGiven>
void check_bounds() {
  using Bound = Bounds<kGiven>;
  const auto of = [](const Properties& at) { return given_of<kGiven>(at); };
  for (int k = 0; k <= 20000; ++k) {
    const double share = k / 20000.0;
    // Saturated states of both kinds.
    const double saturation =
        kLowestSaturationPressure * std::pow(kCriticalPressure / kLowestSaturationPressure, share);
    const Saturated dome = saturated_at(saturation);
    EXPECT_LT(of(dome.vapour), Bound::kAboveDome);
    if (saturation <= kPressure13) {
      EXPECT_LT(of(dome.liquid), Bound::kAboveRegion1);
      EXPECT_GT(of(dome.vapour), Bound::kBelowRegion2);
    }
    const double upper = kPressure13 + share * (kCriticalPressure - kPressure13);
    const Saturated dome_3 = saturated_at(std::nextafter(upper, 1e9));
    EXPECT_GT(of(dome_3.liquid), Bound::kBelowDome3);
    EXPECT_LT(of(dome_3.vapour), Bound::kAboveDome3);
    // Isobars through region 3.
    const double p = kPressure13 + share * (kHighestPressure - kPressure13);
    EXPECT_GT(of(properties_1(p, kLowestTemperature)), Bound::kBelowRegion1);
    EXPECT_LT(of(properties_1(p, kTemperature13)), Bound::kAboveRegion1);
    const double on_23 = of(properties_2(p, std::max(boundary_23_temperature(p), kTemperature13)));
    EXPECT_GT(on_23, Bound::kBelowBoundary23);
    EXPECT_LT(on_23, Bound::kAboveBoundary23);
    EXPECT_GT(on_23, Bound::kBelowRegion2);
    // All pressures.
    const double any = std::pow(10.0, -9 + 17 * share);
    EXPECT_LT(of(properties_2(any, kHighestTemperature2)), Bound::kAboveRegion2);
  }
}

TEST(Seams, BoundsHoldAtEveryPressure) {
  check_bounds<Given::enthalpy>();
  check_bounds<Given::entropy>();
}

}  // namespace
}  // namespace busbar::water
