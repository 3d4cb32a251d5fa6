// Lines of a diagram: that every point is a state of its line, that ends and corners are among the
// points, and that the drawn line lies close to the true one. No source but the definitions.

#include <gtest/gtest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <vector>

#include "sampling.hpp"
#include "water/constants.hpp"
#include "water/diagram/lines.hpp"
#include "water/pairs.hpp"

namespace busbar::water::diagram {
namespace {

using testing::Sampler;

constexpr std::array kAllAxes{Axes::enthalpy_entropy, Axes::temperature_entropy,
                              Axes::pressure_enthalpy, Axes::log_pressure_enthalpy};

bool same_state(const State& a, const State& b) {
  return a.pressure == b.pressure && a.enthalpy == b.enthalpy && a.entropy == b.entropy &&
         a.temperature == b.temperature;
}

bool contains(const Points& points, const State& state) {
  return std::any_of(points.begin(), points.end(),
                     [&](const State& point) { return same_state(point, state); });
}

// The largest distance of places of the true line from the drawn one, the extent of the line being
// the unit.
double missed_by(const Points& drawn, const std::vector<State>& truth, Axes axes) {
  Place low = place_of(axes, drawn.front());
  Place high = low;
  for (const State& state : drawn) {
    const Place place = place_of(axes, state);
    low = {std::fmin(low.x, place.x), std::fmin(low.y, place.y)};
    high = {std::fmax(high.x, place.x), std::fmax(high.y, place.y)};
  }
  const Place unit{std::fmax(high.x - low.x, 1e-300), std::fmax(high.y - low.y, 1e-300)};
  double worst = 0;
  for (const State& state : truth) {
    const Place place = place_of(axes, state);
    double nearest = 1e300;
    for (std::size_t i = 1; i < drawn.size(); ++i) {
      const Place from = place_of(axes, drawn[i - 1]);
      const Place to = place_of(axes, drawn[i]);
      const double dx = (to.x - from.x) / unit.x;
      const double dy = (to.y - from.y) / unit.y;
      const double px = (place.x - from.x) / unit.x;
      const double py = (place.y - from.y) / unit.y;
      const double length = dx * dx + dy * dy;
      const double along = length > 0 ? std::clamp((px * dx + py * dy) / length, 0.0, 1.0) : 0;
      nearest = std::fmin(nearest, std::hypot(px - along * dx, py - along * dy));
    }
    worst = std::fmax(worst, nearest);
  }
  return worst;
}

TEST(Diagram, AxesHaveNames) {
  EXPECT_EQ(axes_named("h-s"), Axes::enthalpy_entropy);
  EXPECT_EQ(axes_named("T-S"), Axes::temperature_entropy);
  EXPECT_EQ(axes_named("p-h"), Axes::pressure_enthalpy);
  EXPECT_EQ(axes_named("Log p-h"), Axes::log_pressure_enthalpy);
  for (const char* word : {"", "s-h", "h", "h-s ", "logp-h", "p-v"}) {
    EXPECT_FALSE(axes_named(word)) << word;
  }
}

TEST(Diagram, TheDomeGoesOverTheCriticalPoint) {
  for (const Axes axes : kAllAxes) {
    const auto dome = saturation_dome(axes, 60);
    ASSERT_TRUE(dome);
    EXPECT_EQ(dome->size(), 60U);
    EXPECT_TRUE(same_state(dome->front(), *at_temperature_dryness(kLowestTemperature, 0)));
    EXPECT_TRUE(same_state(dome->back(), *at_temperature_dryness(kLowestTemperature, 1)));
    EXPECT_TRUE(contains(*dome, *at_temperature_dryness(kCriticalTemperature, 0)));
    std::vector<State> truth;
    for (double t = kLowestTemperature; t < kCriticalTemperature; t += 0.37) {
      truth.push_back(*at_temperature_dryness(t, 0));
      truth.push_back(*at_temperature_dryness(t, 1));
    }
    for (double below = 1; below > 1e-7; below /= 2) {
      truth.push_back(*at_temperature_dryness(kCriticalTemperature - below, 0));
      truth.push_back(*at_temperature_dryness(kCriticalTemperature - below, 1));
    }
    EXPECT_LT(missed_by(*dome, truth, axes), 1e-3);
    for (std::size_t i = 1; i < dome->size(); ++i) {
      EXPECT_GT((*dome)[i].entropy, (*dome)[i - 1].entropy);
    }
  }
}

TEST(Diagram, IsobarsKeepTheirPressureAndTurnAtTheDome) {
  Sampler sampler(71);
  for (int k = 0; k < 400; ++k) {
    const Axes axes = kAllAxes[static_cast<std::size_t>(k % 4)];
    const double p = k % 5 == 0   ? kCriticalPressure
                     : k % 5 == 1 ? sampler.between(16e6, 24e6)
                                  : sampler.log_between(300, kHighestPressure);
    const double from = sampler.between(kLowestTemperature, 500);
    const double to =
        sampler.between(from + 1, p > kHighestPressure5 ? kHighestTemperature2 : 2273);
    const auto line = isobar(axes, p, from, to, 60);
    ASSERT_TRUE(line) << line.failure().reason;
    ASSERT_EQ(line->size(), 60U);
    EXPECT_TRUE(same_state(line->front(), *at_pressure_temperature(p, from)));
    EXPECT_TRUE(same_state(line->back(), *at_pressure_temperature(p, to)));
    for (std::size_t i = 1; i < line->size(); ++i) {
      const State& state = (*line)[i];
      EXPECT_EQ(state.pressure, p);
      EXPECT_GT(state.enthalpy, (*line)[i - 1].enthalpy);
      EXPECT_GE(state.entropy, (*line)[i - 1].entropy - 0.2);  // the seams: 0.177 J/(kg K) at most
      const auto again = at_pressure_enthalpy(p, state.enthalpy);
      EXPECT_NEAR(again->temperature, state.temperature, 1e-7 * state.temperature);
    }
    if (p < kLowestSaturationPressure || p > kCriticalPressure) continue;
    for (const double dryness : {0.0, 1.0}) {
      const State corner = *at_pressure_dryness(p, dryness);
      const bool passed = corner.enthalpy > line->front().enthalpy + 1 &&
                          corner.enthalpy < line->back().enthalpy - 1;
      EXPECT_TRUE(!passed || contains(*line, corner)) << p;
    }
    std::vector<State> truth;
    for (int i = 0; i <= 500; ++i) {
      const double h =
          line->front().enthalpy + i / 500.0 * (line->back().enthalpy - line->front().enthalpy);
      truth.push_back(*at_pressure_enthalpy(p, h));
    }
    EXPECT_LT(missed_by(*line, truth, axes), 1e-3) << p << " " << from << " " << to;
  }
}

TEST(Diagram, IsothermsKeepTheirTemperatureAndTurnAtTheDome) {
  Sampler sampler(72);
  for (int k = 0; k < 400; ++k) {
    const Axes axes = kAllAxes[static_cast<std::size_t>(k % 4)];
    const double t = k % 5 == 0   ? kCriticalTemperature
                     : k % 5 == 1 ? sampler.between(640, 660)
                                  : sampler.between(kLowestTemperature, kHighestTemperature2);
    const double from = sampler.log_between(100, 2e6);
    const double to = sampler.log_between(from * 1.01, kHighestPressure);
    const auto line = isotherm(axes, t, from, to, 80);
    ASSERT_TRUE(line) << line.failure().reason;
    ASSERT_EQ(line->size(), 80U);
    EXPECT_TRUE(same_state(line->front(), *at_pressure_temperature(from, t)));
    EXPECT_TRUE(same_state(line->back(), *at_pressure_temperature(to, t)));
    for (std::size_t i = 1; i < line->size(); ++i) {
      EXPECT_EQ((*line)[i].temperature, t);
      EXPECT_GE((*line)[i].pressure, (*line)[i - 1].pressure);
    }
    if (t > kCriticalTemperature) continue;
    const double saturation = *saturation_pressure(t);
    for (const double dryness : {0.0, 1.0}) {
      if (from < 0.999 * saturation && to > 1.001 * saturation) {
        EXPECT_TRUE(contains(*line, *at_temperature_dryness(t, dryness))) << t;
      }
    }
    std::vector<State> truth;
    for (int i = 0; i <= 500; ++i) {
      const double p = from * std::pow(to / from, i / 500.0);
      truth.push_back(*at_pressure_temperature(std::clamp(p, from, to), t));
    }
    EXPECT_LT(missed_by(*line, truth, axes), 1e-3) << t << " " << from << " " << to;
  }
}

TEST(Diagram, IsothermsUpToSaturationEndInSaturatedSteam) {
  for (const double t : {300.0, 450.0, 640.0, kCriticalTemperature}) {
    const auto line = isotherm(Axes::enthalpy_entropy, t, 500, *saturation_pressure(t), 20);
    ASSERT_TRUE(line);
    ASSERT_EQ(line->size(), 20U);
    EXPECT_TRUE(same_state(line->back(), *at_temperature_dryness(t, 1)));
    EXPECT_NE((*line)[18].region, Region::two_phase);
  }
}

TEST(Diagram, DrynessLinesKeepTheirDryness) {
  for (const Axes axes : kAllAxes) {
    for (const double x : {0.0, 0.1, 0.5, 0.85, 0.99, 1.0}) {
      const auto line = dryness_line(axes, x, 280, kCriticalTemperature, 25);
      ASSERT_TRUE(line);
      ASSERT_EQ(line->size(), 25U);
      EXPECT_EQ(line->front().temperature, 280);
      EXPECT_TRUE(same_state(line->back(), *at_temperature_dryness(kCriticalTemperature, x)));
      for (std::size_t i = 1; i < line->size(); ++i) {
        EXPECT_EQ((*line)[i].dryness, x);
        EXPECT_GT((*line)[i].temperature, (*line)[i - 1].temperature);
      }
    }
  }
}

// The efficiency from the inlet of a section to each of its points is that of the section.
TEST(Diagram, ExpansionLinesKeepTheEfficiencyOfEachSection) {
  const std::vector<State> states{
      *at_pressure_temperature(13e6, 813.15), *at_pressure_temperature(3.65e6, 627.05),
      *at_pressure_temperature(1.35e6, 535), *at_pressure_dryness(5e3, 0.92)};
  for (const Axes axes : kAllAxes) {
    const auto line = expansion_line(axes, states, 50);
    ASSERT_TRUE(line) << line.failure().reason;
    ASSERT_EQ(line->size(), 50U);
    for (const State& state : states) EXPECT_TRUE(contains(*line, state));
    std::size_t section = 0;
    int dry = 0;
    for (const State& point : *line) {
      while (section + 2 < states.size() && point.pressure < states[section + 1].pressure) {
        ++section;
      }
      const State& inlet = states[section];
      const State& outlet = states[section + 1];
      if (point.pressure >= inlet.pressure) continue;
      const auto efficiency = [&](const State& end) {
        const auto ideal = at_pressure_entropy(end.pressure, inlet.entropy);
        return (inlet.enthalpy - end.enthalpy) / (inlet.enthalpy - ideal->enthalpy);
      };
      EXPECT_NEAR(efficiency(point), efficiency(outlet), 1e-9) << point.pressure;
      dry += point.region == Region::two_phase && point.dryness > 1 - 1e-9;
    }
    EXPECT_EQ(dry, 1) << "the corner on the saturation line";
  }
}

// A measured section may be better than isentropic or warm the steam: it is drawn all the same.
TEST(Diagram, ImpossibleExpansionsAreDrawn) {
  const State inlet = *at_pressure_temperature(4e6, 700);
  const State ideal = *at_pressure_entropy(1e6, inlet.entropy);
  for (const double efficiency : {1.1, -0.1}) {
    const double drop = inlet.enthalpy - ideal.enthalpy;
    const State outlet = *at_pressure_enthalpy(1e6, inlet.enthalpy - efficiency * drop);
    const std::vector<State> states{inlet, outlet};
    const auto line = expansion_line(Axes::enthalpy_entropy, states, 20);
    ASSERT_TRUE(line);
    EXPECT_TRUE(same_state(line->back(), outlet));
  }
}

TEST(Diagram, HeatingLinesSpreadTheLossOfPressure) {
  const std::vector<State> states{*at_pressure_temperature(15.5e6, 515),
                                  *at_pressure_temperature(13e6, 813.15)};
  for (const Axes axes : kAllAxes) {
    const auto line = heating_line(axes, states, 40);
    ASSERT_TRUE(line) << line.failure().reason;
    ASSERT_EQ(line->size(), 40U);
    int corners = 0;
    for (const State& point : *line) {
      const double share =
          (point.enthalpy - states[0].enthalpy) / (states[1].enthalpy - states[0].enthalpy);
      EXPECT_NEAR(point.pressure, 15.5e6 - share * 2.5e6, 1e-3);
      corners +=
          point.region == Region::two_phase && std::fmin(point.dryness, 1 - point.dryness) < 1e-9;
    }
    EXPECT_EQ(corners, 2);
  }
}

TEST(Diagram, FailuresNameTheirInput) {
  const auto axes = Axes::enthalpy_entropy;
  EXPECT_EQ(isobar(axes, 60e6, 300, 1200, 20).failure().argument, 4);
  EXPECT_EQ(isobar(axes, 200e6, 300, 1000, 20).failure().argument, 2);
  EXPECT_EQ(isobar(axes, 1e6, 200, 1000, 20).failure().argument, 3);
  EXPECT_EQ(isobar(axes, 1e6, 500, 400, 20).failure().argument, 4);
  EXPECT_EQ(isobar(axes, 1e6, 500, 500, 20).failure().argument, 4);
  EXPECT_EQ(isobar(axes, 1e6, 300, 600, 3).failure().argument, 5);
  EXPECT_EQ(isotherm(axes, 1200, 1e5, 60e6, 20).failure().argument, 2);
  EXPECT_EQ(isotherm(axes, 400, 1e5, 200e6, 20).failure().argument, 4);
  EXPECT_EQ(isotherm(axes, 400, -1, 1e5, 20).failure().argument, 3);
  EXPECT_EQ(dryness_line(axes, 0.5, 300, 650, 20).failure().argument, 4);
  EXPECT_EQ(dryness_line(axes, 1.5, 300, 600, 20).failure().argument, 2);
  EXPECT_EQ(dryness_line(axes, 0.5, 300, std::nan(""), 20).failure().argument, 4);
  EXPECT_EQ(saturation_dome(axes, 2).failure().argument, 2);
  EXPECT_EQ(expansion_line(axes, {}, 20).failure().argument, 2);
  EXPECT_EQ(heating_line(axes, {}, 20).failure().argument, 2);
}

// Many points, next to seams and to the critical point: none stands twice and none is far off.
TEST(Diagram, ManyPointsStaySpread) {
  for (const double p : {16.6e6, kCriticalPressure, 22.1e6, 25e6, 40e6}) {
    const auto line = isobar(Axes::temperature_entropy, p, 300, 1500, 1000);
    ASSERT_TRUE(line);
    for (std::size_t i = 1; i < line->size(); ++i) {
      EXPECT_GT((*line)[i].enthalpy, (*line)[i - 1].enthalpy) << p;
    }
  }
}

}  // namespace
}  // namespace busbar::water::diagram
