// States of water and steam as a plant sheet has them: feedwater, wet and superheated steam, some
// supercritical and some hot ones, in random order, so that no branch is predicted.
#pragma once

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <cstdint>
#include <random>
#include <vector>

#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/state.hpp"

namespace busbar::bench {

inline constexpr std::size_t kStates = 4096;

/// Two columns of numbers.
struct Pairs {
  std::vector<double> first;
  std::vector<double> second;

  void add(double a, double b) {
    first.push_back(a);
    second.push_back(b);
  }
};

class Draw {
 public:
  double operator()(double low, double high) {
    return std::uniform_real_distribution<double>(low, high)(random_);
  }
  /// Even over the logarithm.
  double decades(double low, double high) {
    return std::exp((*this)(std::log(low), std::log(high)));
  }
  Pairs shuffled(const Pairs& pairs) {
    std::vector<std::size_t> order(pairs.first.size());
    for (std::size_t i = 0; i < order.size(); ++i) order[i] = i;
    std::shuffle(order.begin(), order.end(), random_);
    Pairs out;
    for (const std::size_t i : order) out.add(pairs.first[i], pairs.second[i]);
    return out;
  }

 private:
  std::mt19937_64 random_{20261201};
};

/// How many of a hundred states lie in each region.
struct Shares {
  unsigned liquid;
  unsigned wet;
  unsigned vapour;
  unsigned supercritical;
  unsigned hot;
};
inline constexpr Shares kSheet{38, 0, 52, 8, 2};
inline constexpr Shares kSheetWithWet{30, 15, 45, 8, 2};
inline constexpr Shares kLiquidOnly{100, 0, 0, 0, 0};
inline constexpr Shares kVapourOnly{0, 0, 100, 0, 0};
inline constexpr Shares kSupercriticalOnly{0, 0, 0, 100, 0};

/// Pressure (Pa) and temperature (K) of single-phase states; of wet states the temperature is that
/// of saturation.
inline Pairs pressures_and_temperatures(const Shares& shares) {
  using namespace water;  // NOLINT(google-build-using-namespace)
  Draw draw;
  Pairs pairs;
  const auto count = [](unsigned share) { return kStates * share / 100; };
  for (std::size_t i = 0; i < count(shares.liquid); ++i) {
    const double t = draw(285, 620);
    pairs.add(draw(saturation_pressure_equation(t) * 1.01, 40e6), t);
  }
  for (std::size_t i = 0; i < count(shares.vapour); ++i) {
    const double p = draw.decades(3e3, 25e6);
    const double low =
        p > kPressure13 ? boundary_23_temperature(p) : saturation_temperature_equation(p);
    pairs.add(p, draw(low + 1, 923));
  }
  for (std::size_t i = 0; i < count(shares.supercritical);) {
    const double p = draw(17e6, 40e6);
    const double t = draw(625, 780);
    if (p <= boundary_23_pressure(t) * 1.001) continue;
    if (std::abs(t - kCriticalTemperature) < 5 && std::abs(p - kCriticalPressure) < 2e6) continue;
    pairs.add(p, t);
    ++i;
  }
  for (std::size_t i = 0; i < count(shares.hot); ++i) pairs.add(draw(1e5, 10e6), draw(1080, 1800));
  while (pairs.first.size() < kStates) pairs.add(pairs.first.front(), pairs.second.front());
  return draw.shuffled(pairs);
}

/// Pressure and enthalpy, or entropy, of such states.
inline Pairs pressures_and(double water::State::*member, const Shares& shares) {
  const Shares single{shares.liquid, 0, shares.vapour, shares.supercritical, shares.hot};
  const Pairs at = pressures_and_temperatures(single);
  Draw draw;
  Pairs pairs;
  const std::size_t wet = kStates * shares.wet / 100;
  for (std::size_t i = 0; i < kStates - wet; ++i) {
    pairs.add(at.first[i], (*water::at_pressure_temperature(at.first[i], at.second[i])).*member);
  }
  for (std::size_t i = 0; i < wet; ++i) {
    const double p = draw.decades(3e3, 15e6);
    pairs.add(p, (*water::at_pressure_dryness(p, draw(0.02, 0.98))).*member);
  }
  return draw.shuffled(pairs);
}

}  // namespace busbar::bench
