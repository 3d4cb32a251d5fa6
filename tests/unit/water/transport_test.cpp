// Transport properties: every table of the releases, continuity over the regions, and the limits.

#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <string>

#include "published.hpp"
#include "sampling.hpp"
#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/properties/response.hpp"
#include "water/solve/properties.hpp"
#include "water/transport/conductivity.hpp"
#include "water/transport/surface.hpp"
#include "water/transport/viscosity.hpp"

namespace busbar::water {
namespace {

using testing::input;
using testing::last_digit;
using testing::number;
using testing::read_rows;
using testing::Row;
using testing::Sampler;
using testing::unit_in_si;

void expect_printed(const Row& row, double value, double scale, double slack = 0) {
  const std::string& printed = row.at("expected");
  EXPECT_NEAR(value / scale, number(printed), 0.5 * last_digit(printed) + slack)
      << row.at("id") << ": " << row.at("release") << ", table " << row.at("table") << ", "
      << row.at("quantity");
}

// Table 5 is that of scientific use: the printed viscosity over the printed enhancement mu2 is what
// is left without it, to the digits of both.
TEST(Transport, PrintedViscosities) {
  int seen = 0;
  std::map<std::string, std::string> enhancement;
  for (const Row& row : read_rows("r12-08.csv")) {
    const std::string& quantity = row.at("quantity");
    const double mu = viscosity_equation(input(row, "rho"), input(row, "T"));
    if (quantity == "mu_without_enhancement") {
      expect_printed(row, mu, 1e-6);
      ++seen;
    } else if (quantity == "mu2") {
      enhancement[row.at("x2_value")] = row.at("expected");
    } else if (quantity == "mu") {
      const std::string& printed = enhancement[row.at("x2_value")];
      ASSERT_FALSE(printed.empty());
      expect_printed(row, mu * number(printed), 1e-6, 0.5 * last_digit(printed) * mu / 1e-6);
      ++seen;
    }
  }
  EXPECT_EQ(seen, 17);
}

// Tables 7 to 9 (industrial use) print every intermediate result. Tables 4 and 5 give the parts
// that both uses share; lambda2 of table 5 belongs to scientific use.
TEST(Transport, PrintedConductivities) {
  std::map<std::string, int> seen;
  for (const Row& row : read_rows("r15-11.csv")) {
    const std::string& table = row.at("table");
    const std::string& quantity = row.at("quantity");
    const double t = input(row, "T");
    double density = input(row, "rho");
    const bool industrial = table == "7" || table == "8" || table == "9";
    State state;
    if (table == "9") {
      state.region = Region::near_critical;
      state.temperature = t;
      state.volume = 1 / density;
    } else if (industrial) {
      state = *at_pressure_temperature(input(row, "p"), t);
      density = 1 / state.volume;
    }
    const ConductivityParts parts = background_conductivity(std::isnan(density) ? 0 : density, t);
    if (quantity == "lambda0") {
      expect_printed(row, parts.dilute, 1e-3);
    } else if (quantity == "lambda1") {
      expect_printed(row, parts.dense, 1);
    } else if (quantity == "lambda_without_enhancement") {
      expect_printed(row, parts.total(), 1e-3);
    } else if (industrial && quantity == "lambda") {
      expect_printed(row, *thermal_conductivity(state), 1e-3);
    } else if (industrial && quantity == "lambda2") {
      expect_printed(row, *thermal_conductivity(state) - parts.total(), 1e-3,
                     // lambda2 is what is left of lambda: rounding of the difference
                     4e-16 * *thermal_conductivity(state) / 1e-3);
    } else if (industrial && quantity == "mu") {
      expect_printed(row, *viscosity(state), 1e-6);
    } else {
      continue;
    }
    ++seen[table];
  }
  EXPECT_EQ(seen["4"], 4);
  EXPECT_EQ(seen["5"], 9);
  EXPECT_EQ(seen["7"], 10);
  EXPECT_EQ(seen["8"], 10);
  EXPECT_EQ(seen["9"], 10);
}

TEST(Transport, PrintedSurfaceTensions) {
  int seen = 0;
  for (const Row& row : read_rows("r1-76.csv")) {
    const double t = number(row.at("x1_value")) + 273.15;
    // Rounding of 0.01 + 273.15 against the triple point.
    const auto tension = surface_tension(std::abs(t - 273.16) < 1e-9 ? 273.16 : t);
    ASSERT_TRUE(tension) << row.at("id");
    expect_printed(row, *tension, unit_in_si(row.at("unit")));
    ++seen;
  }
  EXPECT_EQ(seen, 75);
  EXPECT_EQ(*surface_tension(kCriticalTemperature), 0);
  EXPECT_FALSE(surface_tension(273.15));
  EXPECT_FALSE(surface_tension(kCriticalTemperature + 1e-9));
  EXPECT_FALSE(surface_tension(std::nan("")));
}

TEST(Transport, PrintedMeltingAndSublimationPressures) {
  const std::map<std::string, Ice> kinds = {{"p_melting_ice_Ih", Ice::ih},
                                            {"p_melting_ice_III", Ice::iii},
                                            {"p_melting_ice_V", Ice::v},
                                            {"p_melting_ice_VI", Ice::vi},
                                            {"p_melting_ice_VII", Ice::vii}};
  int seen = 0;
  for (const Row& row : read_rows("r14-08.csv")) {
    const double t = input(row, "T");
    const auto kind = kinds.find(row.at("quantity"));
    const auto pressure =
        kind == kinds.end() ? sublimation_pressure(t) : melting_pressure(t, kind->second);
    ASSERT_TRUE(pressure);
    expect_printed(row, *pressure, unit_in_si(row.at("unit")));
    if (kind != kinds.end()) {
      EXPECT_NEAR(*melting_temperature(*pressure), t, 1e-11 * t) << row.at("id");
    }
    ++seen;
  }
  EXPECT_EQ(seen, 6);
}

TEST(Transport, MeltingLinesMeetAndInvert) {
  // Triple points of R14-08(2011), table 1: the printed pressures, to half a unit of their own and
  // of the printed temperatures.
  const auto expect_meets = [](Ice ice, double t, double printed, double half_unit) {
    const double slope = std::abs(*melting_pressure(t, ice) -
                                  *melting_pressure(ice == Ice::ih ? t + 1e-3 : t - 1e-3, ice)) /
                         1e-3;
    EXPECT_NEAR(*melting_pressure(t, ice), printed, half_unit + 0.5e-3 * slope);
  };
  expect_meets(Ice::ih, 251.165, 208.566e6, 0.5e3);
  expect_meets(Ice::iii, 256.164, 350.1e6, 0.05e6);
  expect_meets(Ice::v, 273.31, 632.4e6, 0.05e6);
  expect_meets(Ice::vi, 355, 2216e6, 0.5e6);
  EXPECT_EQ(*melting_temperature(611.657), 273.16);
  Sampler sampler(51);
  const double highest = *melting_pressure(715, Ice::vii);
  for (int k = 0; k < 20000; ++k) {
    const double p = sampler.log_between(611.657, highest);
    const auto t = melting_temperature(p);
    ASSERT_TRUE(t) << p;
    EXPECT_GE(*t, 251.165);
    EXPECT_LE(*t, 715);
  }
  EXPECT_FALSE(melting_temperature(611.6));
  EXPECT_FALSE(melting_temperature(highest * 1.000001));
  EXPECT_FALSE(melting_temperature(std::nan("")));
  EXPECT_FALSE(melting_pressure(251.1, Ice::ih));
  EXPECT_FALSE(melting_pressure(273.17, Ice::ih));
  EXPECT_FALSE(sublimation_pressure(49.9));
  EXPECT_FALSE(sublimation_pressure(273.17));
  // Ice, water and steam meet in the triple point.
  EXPECT_NEAR(*sublimation_pressure(273.16), 611.657, 1e-3);
}

// Every state of the range has finite, positive transport properties; beyond it there is an error.
TEST(Transport, AnswersInTheWholeRange) {
  Sampler sampler(52);
  for (int k = 0; k < 50000; ++k) {
    const double p = k % 2 == 0 ? sampler.between(1, kHighestPressure)
                                : sampler.log_between(1e-6, kHighestPressure);
    const double t = k % 3 == 0 ? sampler.between(620, 670) : sampler.between(273.15, 1300);
    const auto state = at_pressure_temperature(p, t);
    if (!state) continue;
    const auto mu = viscosity(*state);
    const auto lambda = thermal_conductivity(*state);
    if (t > 1173.15) {
      ASSERT_FALSE(mu);
      ASSERT_FALSE(lambda);
      EXPECT_EQ(mu.failure().fault, Fault::outside_range);
      continue;
    }
    ASSERT_TRUE(mu && lambda) << p << " " << t;
    EXPECT_GT(*mu, 5e-6);
    EXPECT_LT(*mu, 3e-3);
    EXPECT_GT(*lambda, 0.01);
    EXPECT_LT(*lambda, 1e3) << p << " " << t;
  }
}

// The enhancement grows without bound towards the critical point but stays a number; on the
// saturation line both phases answer and mixtures refuse.
TEST(Transport, AroundTheCriticalPoint) {
  for (double below = 10; below > 1e-7; below /= 3) {
    const auto p = saturation_pressure(kCriticalTemperature - below);
    ASSERT_TRUE(p);
    for (const double x : {0.0, 1.0}) {
      const auto lambda = thermal_conductivity(*at_pressure_dryness(*p, x));
      ASSERT_TRUE(lambda);
      EXPECT_TRUE(std::isfinite(*lambda)) << below;
      EXPECT_GT(*lambda, 0.1);
    }
    EXPECT_FALSE(thermal_conductivity(*at_pressure_dryness(*p, 0.5)));
    EXPECT_FALSE(viscosity(*at_pressure_dryness(*p, 0.5)));
  }
  const auto critical = thermal_conductivity(*at_pressure_dryness(kCriticalPressure, 0));
  ASSERT_TRUE(critical);
  EXPECT_TRUE(std::isfinite(*critical));
}

// Across the seams the two basic equations give densities that differ by the published steps (up to
// 0.2 % on B23, R7-97); transport properties follow the density.
TEST(Transport, NoJumpsAtTheSeams) {
  Sampler sampler(53);
  for (int k = 0; k < 2000; ++k) {
    const double t = sampler.between(625, 862);
    const double p = boundary_23_pressure(t);
    const auto left = at_pressure_temperature(p * 1.0000001, t);
    const auto right = at_pressure_temperature(p * 0.9999999, t);
    ASSERT_TRUE(left && right);
    ASSERT_NE(left->region, right->region);
    EXPECT_NEAR(*viscosity(*left), *viscosity(*right), 0.004 * *viscosity(*left)) << t;
  }
}

TEST(Transport, SurfaceTensionBelongsToTheSaturationLine) {
  EXPECT_FALSE(surface_tension_of(*at_pressure_temperature(1e5, 300)));
  const auto state = at_pressure_dryness(1e5, 0.3);
  EXPECT_EQ(*surface_tension_of(*state), *surface_tension(state->temperature));
}

TEST(Transport, PrandtlNumberIsMadeOfItsParts) {
  Sampler sampler(54);
  for (int k = 0; k < 2000; ++k) {
    const auto state =
        at_pressure_temperature(sampler.log_between(1e3, 1e8), sampler.between(280, 1100));
    if (!state) continue;
    const auto number = prandtl_number(*state);
    ASSERT_TRUE(number);
    EXPECT_NEAR(*number * *thermal_conductivity(*state),
                *viscosity(*state) * response(*state)->isobaric_heat_capacity, 1e-14 * *number);
  }
  // Boiling water at 100 °C has 1.75, steam at 1 bar and 150 °C 0.98 (from memory of VDI heat atlas
  // tables).
  EXPECT_NEAR(*prandtl_number(*at_pressure_dryness(101325, 0)), 1.75, 0.01);
}

}  // namespace
}  // namespace busbar::water
