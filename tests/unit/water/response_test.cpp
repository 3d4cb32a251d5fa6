// Heat capacities, speed of sound and the other second-order properties: the printed figures of the
// releases, and what the definitions demand on random states.

#include "water/properties/response.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <string>

#include "differences.hpp"
#include "published.hpp"
#include "sampling.hpp"
#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/pairs.hpp"
#include "water/properties/energy.hpp"
#include "water/solve/properties.hpp"

namespace busbar::water {
namespace {

using testing::input;
using testing::last_digit;
using testing::number;
using testing::read_rows;
using testing::Row;
using testing::Sampler;
using testing::slope;
using testing::unit_in_si;

constexpr double kEpsilon = 2.2e-16;

double of(const Response& at, const std::string& quantity) {
  if (quantity == "cp") return at.isobaric_heat_capacity;
  if (quantity == "cv") return at.isochoric_heat_capacity;
  if (quantity == "w") return at.speed_of_sound;
  return std::nan("");
}

void expect_printed(const Row& row, double value) {
  const std::string& printed = row.at("expected");
  EXPECT_NEAR(value / unit_in_si(row.at("unit")), number(printed), 0.5 * last_digit(printed))
      << row.at("id") << ": " << row.at("release") << ", table " << row.at("table") << ", "
      << row.at("quantity");
}

TEST(Response, PrintedFiguresOfTheBasicEquations) {
  std::map<std::string, int> seen;
  for (const Row& row : read_rows("r7-97.csv")) {
    const std::string& table = row.at("table");
    const std::string& quantity = row.at("quantity");
    if (table != "5" && table != "15" && table != "42" && table != "33") continue;
    if (quantity != "cp" && quantity != "w") continue;
    if (table == "33") {
      expect_printed(row, of(response_3(input(row, "rho"), input(row, "T")), quantity));
    } else {
      const auto state = at_pressure_temperature(input(row, "p"), input(row, "T"));
      ASSERT_TRUE(state);
      const auto at = response(*state);
      ASSERT_TRUE(at);
      expect_printed(row, of(*at, quantity));
    }
    ++seen[table];
  }
  for (const char* table : {"5", "15", "42", "33"}) EXPECT_EQ(seen[table], 6) << table;
}

// R15-11 prints cp, cv and (drho/dp)_T of IF97, also next to the critical point (table 9).
TEST(Response, PrintedFiguresOfTheReleaseOnThermalConductivity) {
  int seen = 0;
  for (const Row& row : read_rows("r15-11.csv")) {
    const std::string& table = row.at("table");
    if (table != "7" && table != "8" && table != "9") continue;
    const std::string& quantity = row.at("quantity");
    if (quantity != "cp" && quantity != "cv" && quantity != "drho_dp_at_T") continue;
    const double t = input(row, "T");
    double density = input(row, "rho");
    Response at;
    if (table == "9") {
      at = response_3(density, t);
    } else {
      const auto state = at_pressure_temperature(input(row, "p"), t);
      ASSERT_TRUE(state);
      density = 1 / state->volume;
      at = *response(*state);
    }
    expect_printed(row, quantity == "drho_dp_at_T" ? density * at.isothermal_compressibility
                                                   : of(at, quantity));
    ++seen;
  }
  EXPECT_EQ(seen, 18);
}

// A random single-phase state well inside its region: all states that the differences use belong to
// the same basic equation.
State random_state(Sampler& sampler) {
  for (;;) {
    const double t = sampler.share() < 0.3 ? sampler.between(610, 880)
                                           : sampler.between(kLowestTemperature, 2273);
    const double p = sampler.share() < 0.5 ? sampler.between(1e4, kHighestPressure)
                                           : sampler.log_between(1e2, kHighestPressure);
    const auto state = at_pressure_temperature(p, t);
    if (!state) continue;
    bool inside = true;
    for (const double dp : {0.98, 1.0, 1.02}) {
      for (const double dt : {0.995, 1.0, 1.005}) {
        const auto other = at_pressure_temperature(p * dp, t * dt);
        inside = inside && other && other->region == state->region &&
                 std::abs(other->volume / state->volume - 1) < 0.2;
      }
    }
    if (inside) return *state;
  }
}

constexpr double kRounding = 1e-13;  // of v, h and s near a state: 34 to 43 terms of mixed sign

// Step of 1e-3 relative: twice that is 2e-3 in T and p, inside what random_state has checked.
constexpr double kStep = 1e-3;

#define EXPECT_SLOPE(expected, found)                                                 \
  EXPECT_NEAR(expected, (found).value, 4 * (found).error + 1e-9 * std::abs(expected)) \
      << "p " << state.pressure << ", T " << state.temperature

TEST(Response, BelongsToTheFirstOrderProperties) {
  Sampler sampler(41);
  int seen[6] = {};
  for (int k = 0; k < 20000; ++k) {
    const State state = random_state(sampler);
    ++seen[static_cast<int>(state.region)];
    const Response at = *response(state);
    const double p = state.pressure;
    const double t = state.temperature;
    const auto along_t = [&](double State::*member) {
      return slope([&](double x) { return (*at_pressure_temperature(p, x)).*member; }, t, kStep * t,
                   kRounding);
    };
    const auto along_p = [&](double State::*member) {
      return slope([&](double x) { return (*at_pressure_temperature(x, t)).*member; }, p, kStep * p,
                   kRounding);
    };
    EXPECT_SLOPE(at.isobaric_heat_capacity, along_t(&State::enthalpy));
    EXPECT_SLOPE(at.isobaric_heat_capacity / t, along_t(&State::entropy));
    EXPECT_SLOPE(at.isobaric_expansion * state.volume, along_t(&State::volume));
    EXPECT_SLOPE(-at.isothermal_compressibility * state.volume, along_p(&State::volume));
    // Maxwell: (ds/dp)_T = -(dv/dT)_p
    EXPECT_SLOPE(-at.isobaric_expansion * state.volume, along_p(&State::entropy));
    // (dh/dp)_T = v - T (dv/dT)_p = -cp (dT/dp)_h
    EXPECT_SLOPE(-at.isobaric_heat_capacity * at.joule_thomson, along_p(&State::enthalpy));
    // cp - cv = T v beta^2 / kappa
    const double difference = t * state.volume * at.isobaric_expansion * at.isobaric_expansion /
                              at.isothermal_compressibility;
    EXPECT_NEAR(at.isobaric_heat_capacity - at.isochoric_heat_capacity, difference,
                1e-10 * at.isobaric_heat_capacity);
    // (dp/drho)_s = cp/cv (dp/drho)_T
    const double isentropic = at.isobaric_heat_capacity / at.isochoric_heat_capacity *
                              state.volume / at.isothermal_compressibility;
    EXPECT_NEAR(at.speed_of_sound * at.speed_of_sound, isentropic, 1e-10 * isentropic);
    EXPECT_NEAR(at.isentropic_exponent, at.speed_of_sound * at.speed_of_sound / (p * state.volume),
                1e-12 * at.isentropic_exponent);
  }
  for (const int region : {1, 2, 3, 5}) EXPECT_GT(seen[region], 500) << region;
}

// Through (p,h) and (p,s): dT/dp at constant h, dv/dp at constant s.
TEST(Response, ThrottlingAndSoundAlongTheirLines) {
  Sampler sampler(42);
  for (int k = 0; k < 3000; ++k) {
    const State state = random_state(sampler);
    const Response at = *response(state);
    const double p = state.pressure;
    const auto throttled = [&](double x) { return *at_pressure_enthalpy(x, state.enthalpy); };
    const auto expanded = [&](double x) { return *at_pressure_entropy(x, state.entropy); };
    bool inside = true;
    for (const double x : {0.998, 1.002}) {
      inside = inside && throttled(x * p).region == state.region &&
               expanded(x * p).region == state.region;
    }
    if (!inside) continue;
    const auto cooling =
        slope([&](double x) { return throttled(x).temperature; }, p, kStep * p, kRounding);
    EXPECT_SLOPE(at.joule_thomson, cooling);
    const auto squeezing =
        slope([&](double x) { return expanded(x).volume; }, p, kStep * p, kRounding);
    EXPECT_SLOPE(-state.volume / (at.isentropic_exponent * p), squeezing);
  }
}

#define EXPECT_SAME_SLOPE(a, b)                                                               \
  EXPECT_NEAR((a).value, (b).value, 4 * ((a).error + (b).error) + 1e-9 * std::abs((a).value)) \
      << "p " << state.pressure << ", T " << state.temperature << ", region "                 \
      << static_cast<int>(state.region)

// The four relations of Maxwell on random states, by differences of what the solvers answer:
// enthalpy, Helmholtz energy and internal energy are functions of state whatever pair is given. The
// fourth, of the Gibbs energy, stands above.
TEST(Response, MaxwellThroughEveryPairOfProperties) {
  Sampler sampler(44);
  int seen[6] = {};
  for (int k = 0; k < 3000; ++k) {
    const State state = random_state(sampler);
    const Response at = *response(state);
    const double p = state.pressure;
    const double t = state.temperature;
    const double s = state.entropy;
    const double v = state.volume;
    ++seen[static_cast<int>(state.region)];

    // dh = T ds + v dp: (dT/dp)_s = (dv/ds)_p
    const double heat = kStep * at.isobaric_heat_capacity;
    const auto warming = slope([&](double x) { return at_pressure_entropy(x, s)->temperature; }, p,
                               kStep * p, kRounding);
    const auto swelling =
        slope([&](double x) { return at_pressure_entropy(p, x)->volume; }, s, heat, kRounding);
    EXPECT_SAME_SLOPE(warming, swelling);

    // da = -s dT - p dv: (ds/dv)_T = (dp/dT)_v. The pressure of a liquid hangs on the last digits
    // of its volume.
    const double stiffness = std::fmax(1, 1 / (at.isothermal_compressibility * p));
    const double squeeze = kStep * at.isothermal_compressibility * p * v;
    const double tension = std::abs(at.isobaric_expansion) / at.isothermal_compressibility;
    const double warmer = std::fmin(kStep * t, kStep * p / tension);
    const auto stretching = slope([&](double x) { return at_temperature_volume(t, x)->entropy; }, v,
                                  squeeze, kRounding);
    const auto pressing = slope([&](double x) { return at_temperature_volume(x, v)->pressure; }, t,
                                warmer, kRounding * stiffness);
    EXPECT_SAME_SLOPE(stretching, pressing);

    // du = T ds - p dv: (dT/dv)_s = -(dp/ds)_v = -T (dp/du)_v
    const auto squeezing =
        slope([&](double x) { return at_pressure_entropy(x, s)->volume; }, p, kStep * p, kRounding);
    const double u = state.enthalpy - p * v;
    const auto boosting = slope([&](double x) { return at_volume_internal_energy(v, x)->pressure; },
                                u, at.isochoric_heat_capacity * warmer, kRounding * stiffness);
    const double left = warming.value / squeezing.value;
    const double right = -t * boosting.value;
    const double doubt = std::abs(left) * (warming.error / std::abs(warming.value) +
                                           squeezing.error / std::abs(squeezing.value)) +
                         t * boosting.error;
    EXPECT_NEAR(left, right, 4 * doubt + 1e-9 * std::abs(left)) << "p " << p << ", T " << t;
  }
  for (const int region : {1, 2, 3, 5}) EXPECT_GT(seen[region], 100) << region;
}

// Clapeyron: dp/dT = (s'' - s') / (v'' - v') along the saturation line, and equal Gibbs energies.
// Equation 30 is a fit of its own: R7-97(2012), figure 6 (from memory), states 0.025 % for its
// pressure, and by so much pressure times v'' - v' the Gibbs energies may differ. In the last
// kelvin below the critical point both sides of the fraction vanish.
TEST(Response, ClapeyronAlongTheSaturationLine) {
  Sampler sampler(43);
  for (int k = 0; k < 2000; ++k) {
    const double t = k % 4 == 0 ? sampler.between(kTemperature13, 646)
                                : sampler.between(kLowestTemperature + 0.1, kTemperature13);
    const double p = *saturation_pressure(t);
    const auto line =
        slope([](double x) { return saturation_pressure_equation(x); }, t, 0.01, kRounding);
    const State liquid = *at_pressure_dryness(p, 0);
    const State vapour = *at_pressure_dryness(p, 1);
    const double clapeyron =
        (vapour.enthalpy - liquid.enthalpy) / (t * (vapour.volume - liquid.volume));
    // The slope of a curve that is known to 0.025 % is known a few times less well.
    EXPECT_NEAR(line.value, clapeyron, 4 * 0.00025 * clapeyron) << t;
    EXPECT_NEAR(*gibbs_energy(liquid), *gibbs_energy(vapour),
                0.00025 * p * (vapour.volume - liquid.volume))
        << t;
  }
}

TEST(Response, SaturatedPhasesAnswerAndMixturesRefuse) {
  for (const double p : {1e3, 1e5, 10e6, 16.5e6, 17e6, 21e6}) {
    const State liquid = *at_pressure_dryness(p, 0);
    const State vapour = *at_pressure_dryness(p, 1);
    ASSERT_TRUE(response(liquid));
    ASSERT_TRUE(response(vapour));
    // The limit from the side of each phase.
    const double t = liquid.temperature;
    const auto cold = response(*at_pressure_temperature(p, t - 1e-6));
    const auto hot = response(*at_pressure_temperature(p, t + 1e-6));
    ASSERT_TRUE(cold && hot);
    EXPECT_NEAR(response(liquid)->speed_of_sound, cold->speed_of_sound,
                1e-5 * cold->speed_of_sound);
    EXPECT_NEAR(response(vapour)->speed_of_sound, hot->speed_of_sound, 1e-5 * hot->speed_of_sound);
    for (const double x : {1e-9, 0.5, 1 - 1e-9}) {
      const auto mixture = response(*at_pressure_dryness(p, x));
      ASSERT_FALSE(mixture);
      EXPECT_EQ(mixture.failure().fault, Fault::missing);
    }
  }
}

// At the critical point cp and the compressibility have no bound: an error, never an infinity.
TEST(Response, IsFiniteOrRefusedAroundTheCriticalPoint) {
  EXPECT_FALSE(response(*at_pressure_dryness(kCriticalPressure, 0)));
  EXPECT_FALSE(response(*at_pressure_dryness(kCriticalPressure, 1)));
  Sampler sampler(43);
  for (int k = 0; k < 20000; ++k) {
    const double p = kCriticalPressure + sampler.log_between(1e-6, 1e5) * (k % 2 == 0 ? 1 : -1);
    const double t = kCriticalTemperature + sampler.log_between(1e-10, 1) * (k % 4 < 2 ? 1 : -1);
    const auto state = at_pressure_temperature(p, t);
    ASSERT_TRUE(state);
    const auto at = response(*state);
    if (!at) {
      EXPECT_EQ(at.failure().fault, Fault::missing);
      EXPECT_LT(std::abs(t - kCriticalTemperature), 1e-3);
      continue;
    }
    EXPECT_TRUE(std::isfinite(at->isobaric_heat_capacity));
    EXPECT_GT(at->isobaric_heat_capacity, at->isochoric_heat_capacity);
    EXPECT_GT(at->speed_of_sound, 0);
  }
}

// An ideal gas in the limit of zero pressure: beta = 1/T, kappa = 1/p, k = cp/cv, cp - cv = R.
TEST(Response, BecomesThatOfAnIdealGas) {
  for (const double t : {280.0, 500.0, 1000.0, 1500.0, 2200.0}) {
    const auto at = response(*at_pressure_temperature(1e-6, t));
    ASSERT_TRUE(at);
    EXPECT_NEAR(at->isobaric_expansion, 1 / t, 1e-9 / t);
    EXPECT_NEAR(at->isothermal_compressibility, 1e6, 1e-3);
    EXPECT_NEAR(at->isobaric_heat_capacity - at->isochoric_heat_capacity, kGasConstant, 1e-6);
    EXPECT_NEAR(at->isentropic_exponent, at->isobaric_heat_capacity / at->isochoric_heat_capacity,
                1e-9);
  }
}

// In thin vapour the Joule-Thomson coefficient tends to (T dB/dT - B)/cp, which no longer depends
// on the pressure.
TEST(Response, ThrottlingOfThinVapourHasALimit) {
  for (const double t : {280.0, 500.0, 1000.0, 1500.0, 2200.0}) {
    const double thin = response(*at_pressure_temperature(1e-9, t))->joule_thomson;
    const double limit = response(*at_pressure_temperature(1e-5, t))->joule_thomson;
    EXPECT_NEAR(thin, limit, 1e-8 * std::abs(limit)) << t;
  }
}

TEST(Saturation, DegreesOfSuperheatAndSubcooling) {
  // R7-97(2012), table 36: Ts(1 MPa) = 453.035632 K.
  EXPECT_NEAR(*superheat(*at_pressure_temperature(1e6, 473.15)), 473.15 - 453.035632, 0.5e-6);
  EXPECT_NEAR(*subcooling(*at_pressure_temperature(1e6, 433.15)), 453.035632 - 433.15, 0.5e-6);
  EXPECT_EQ(*superheat(*at_pressure_dryness(1e6, 1)), 0);
  EXPECT_EQ(*subcooling(*at_pressure_dryness(1e6, 0)), 0);
  EXPECT_FALSE(superheat(*at_pressure_dryness(1e6, 0.99)));
  EXPECT_FALSE(subcooling(*at_pressure_dryness(1e6, 0.01)));
  EXPECT_FALSE(superheat(*at_pressure_temperature(1e6, 433.15)));
  EXPECT_FALSE(subcooling(*at_pressure_temperature(1e6, 473.15)));
  EXPECT_FALSE(superheat(*at_pressure_temperature(23e6, 700)));
  EXPECT_FALSE(subcooling(*at_pressure_temperature(23e6, 600)));
  EXPECT_FALSE(superheat(*at_pressure_temperature(600, 400)));
}

TEST(Saturation, LatentHeatVanishesAtTheCriticalPointOnly) {
  double last = 1e9;
  for (double t = kLowestTemperature; t < kCriticalTemperature - 0.01; t += 0.5) {
    const auto latent = latent_heat(*saturation_pressure(t));
    ASSERT_TRUE(latent);
    // Regions 1 and 2 meet region 3 with up to 0.031 and 0.134 kJ/kg: R7-97, consistency.
    EXPECT_LT(*latent, last + 165.5) << t;
    last = *latent;
  }
  EXPECT_GT(last, 0);
  EXPECT_EQ(*latent_heat(kCriticalPressure), 0);
  EXPECT_FALSE(latent_heat(kCriticalPressure * 1.0000001));
  EXPECT_FALSE(latent_heat(600));
}

// R7-97(2012), tables 5, 15 and 42 print u; f and g follow.
TEST(Energies, ArePrintedOrFollowFromPrintedOnes) {
  int seen = 0;
  for (const Row& row : read_rows("r7-97.csv")) {
    const std::string& table = row.at("table");
    if (row.at("quantity") != "u" || table == "33") continue;
    const State state = *at_pressure_temperature(input(row, "p"), input(row, "T"));
    expect_printed(row, *internal_energy(state));
    EXPECT_NEAR(*gibbs_energy(state) - *helmholtz_energy(state), state.pressure * state.volume,
                8 * kEpsilon * std::abs(state.enthalpy) + 1e-9);
    ++seen;
  }
  EXPECT_EQ(seen, 9);
}

// Moran and Shapiro, section 7.3: no exergy in the dead state itself, and none is below it at dead
// pressure.
TEST(Energies, ExergyVanishesInTheDeadState) {
  const State dead = *at_pressure_temperature(1.01325e5, 293.15);
  EXPECT_EQ(*specific_exergy(dead, 1.01325e5, 293.15), 0);
  for (double t = 274; t < 1000; t += 3) {
    if (std::abs(t - 293.15) < 1e-9) continue;
    EXPECT_GT(*specific_exergy(*at_pressure_temperature(1.01325e5, t), 1.01325e5, 293.15), 0) << t;
  }
  const auto bad = specific_exergy(dead, 1e5, 200);
  ASSERT_FALSE(bad);
  EXPECT_EQ(bad.failure().argument, 3);
  const auto worse = specific_exergy(dead, 2e8, 293.15);
  ASSERT_FALSE(worse);
  EXPECT_EQ(worse.failure().argument, 2);
}

}  // namespace
}  // namespace busbar::water
