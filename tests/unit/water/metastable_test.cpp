// Metastable vapour: the published table, the join with region 2, and its limits.

#include "water/properties/metastable.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

#include "published.hpp"
#include "water/constants.hpp"
#include "water/properties/response.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {
namespace {

using testing::input;
using testing::last_digit;
using testing::number;
using testing::read_rows;
using testing::Row;
using testing::unit_in_si;

TEST(Metastable, PrintedFigures) {
  int seen = 0;
  for (const Row& row : read_rows("r7-97-metastable.csv")) {
    const double p = input(row, "p");
    const auto at = metastable_vapour(p, input(row, "T"));
    ASSERT_TRUE(at) << at.failure().reason;
    const std::string& quantity = row.at("quantity");
    const Properties& first = at->properties;
    const double value = quantity == "v"    ? first.volume
                         : quantity == "h"  ? first.enthalpy
                         : quantity == "u"  ? first.enthalpy - p * first.volume
                         : quantity == "s"  ? first.entropy
                         : quantity == "cp" ? at->response.isobaric_heat_capacity
                                            : at->response.speed_of_sound;
    const std::string& printed = row.at("expected");
    EXPECT_NEAR(value / unit_in_si(row.at("unit")), number(printed), 0.5 * last_digit(printed))
        << row.at("id");
    ++seen;
  }
  EXPECT_EQ(seen, 18);
}

// R7-97(2012), section 6.2, consistency with equation 15 on the saturated vapour line, largest: v
// 0.014 %, h 0.043 kJ/kg, cp 0.78 %, s 0.082 J/(kg K), w 0.051 %; each to half a unit of its last
// digit.
TEST(Metastable, JoinsSaturatedVapourAsPublished) {
  double v = 0;
  double h = 0;
  double s = 0;
  double cp = 0;
  double w = 0;
  const auto worse = [](double& worst, double difference) {
    worst = std::fmax(worst, std::abs(difference));
  };
  for (double p = 611.657; p <= 10e6; p *= 1.002) {
    const Saturated saturated = saturated_at(p);
    const auto at = metastable_vapour(p, saturated.temperature);
    ASSERT_TRUE(at) << p;
    const Response stable = response_2(p, saturated.temperature);
    worse(v, at->properties.volume / saturated.vapour.volume - 1);
    worse(h, at->properties.enthalpy - saturated.vapour.enthalpy);
    worse(s, at->properties.entropy - saturated.vapour.entropy);
    worse(cp, at->response.isobaric_heat_capacity / stable.isobaric_heat_capacity - 1);
    worse(w, at->response.speed_of_sound / stable.speed_of_sound - 1);
  }
  EXPECT_LE(v, 0.000145);
  EXPECT_LE(h, 43.5);
  EXPECT_LE(s, 0.0825);
  EXPECT_LE(cp, 0.00785);
  EXPECT_LE(w, 0.000515);
  // And not far less: the right line is compared.
  EXPECT_GE(h, 42);
}

TEST(Metastable, EndsAtFivePercentMoisture) {
  for (double p = 700; p <= 10e6; p *= 1.5) {
    const Saturated saturated = saturated_at(p);
    double low = kLowestTemperature;
    if (metastable_vapour(p, low)) continue;  // the line lies below 273.15 K
    double high = saturated.temperature;
    for (int k = 0; k < 60; ++k) {
      const double middle = 0.5 * (low + high);
      (metastable_vapour(p, middle) ? high : low) = middle;
    }
    const auto at = metastable_vapour(p, high);
    ASSERT_TRUE(at);
    const auto equilibrium = at_pressure_enthalpy(p, at->properties.enthalpy);
    ASSERT_TRUE(equilibrium);
    EXPECT_NEAR(equilibrium->dryness, 0.95, 1e-9) << p;
    EXPECT_EQ(metastable_vapour(p, low).failure().argument, 2);
  }
}

TEST(Metastable, LimitsArePublished) {
  EXPECT_EQ(metastable_vapour(611, 273.16).failure().argument, 1);
  EXPECT_EQ(metastable_vapour(10.0001e6, 580).failure().argument, 1);
  EXPECT_EQ(metastable_vapour(1e6, 460).failure().argument, 2);
  EXPECT_EQ(metastable_vapour(1e6, 300).failure().argument, 2);
  EXPECT_EQ(metastable_vapour(1e6, 200).failure().argument, 2);
  EXPECT_FALSE(metastable_vapour(std::nan(""), 450));
  EXPECT_FALSE(metastable_vapour(1e6, std::nan("")));
}

}  // namespace
}  // namespace busbar::water
