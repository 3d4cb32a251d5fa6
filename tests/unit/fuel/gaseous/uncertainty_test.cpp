// Uncertainties: ISO 6976:2016, annex D, to the printed digit, and against differences.
#include "fuel/gaseous/uncertainty.hpp"

#include <gtest/gtest.h>

#include <cmath>

#include "sample.hpp"

namespace busbar::fuel::gaseous {
namespace {

constexpr double kAtmosphere = 101325;

struct Printed {
  Property property;
  Basis basis;
  double unit;  // of the printed value, SI
  double value;
  double value_digit;  // half of the last printed one
  double uncertainty;
  double uncertainty_digit;
};

void expect_printed(const Mixture& gas, const AnalysisErrors& errors, double combustion,
                    double metering, std::span<const Printed> results) {
  ASSERT_EQ(check_errors(gas, errors).fault, Fault::none);
  for (const Printed& printed : results) {
    const auto got =
        uncertain(printed.property, gas, errors, printed.basis, *combustion_at(combustion + 273.15),
                  *metering_at(metering + 273.15, kAtmosphere));
    ASSERT_TRUE(got);
    EXPECT_NEAR(got->value / printed.unit, printed.value, printed.value_digit * 1.0001);
    EXPECT_NEAR(got->uncertainty / printed.unit, printed.uncertainty,
                printed.uncertainty_digit * 1.0001)
        << printed.value;
  }
}

constexpr Property kMolar = Property::molar_heating_value;
constexpr Property kMass = Property::mass_heating_value;
constexpr Property kVolume = Property::volume_heating_value;
constexpr Basis kGross = Basis::higher;
constexpr Basis kNet = Basis::lower;

TEST(FuelGasUncertainty, AnnexDExamples1And2) {
  const std::vector<double> u1 = sample::uncertainties(sample::kExample1);
  constexpr Printed kOne[] = {{kMolar, kGross, 1e3, 906.179959, 5e-7, 0.615609872, 5e-10},
                              {kMass, kGross, 1e6, 52.113961, 5e-7, 0.024301, 5e-7},
                              {kVolume, kGross, 1e6, 38.410611, 5e-7, 0.026267, 5e-7}};
  expect_printed(sample::mixture(sample::kExample1), {u1, Correlation::independent, {}}, 15, 15,
                 kOne);
  const std::vector<double> u2 = sample::uncertainties(sample::kExample2);
  constexpr Printed kTwo[] = {{kMolar, kGross, 1e3, 871.443916, 5e-7, 0.522493911, 5e-10},
                              {kMass, kGross, 1e6, 51.294085, 5e-7, 0.025938, 5e-7},
                              {kVolume, kGross, 1e6, 36.874304, 5e-7, 0.022289, 5e-7}};
  expect_printed(sample::mixture(sample::kExample2), {u2, Correlation::independent, {}}, 15.55,
                 15.55, kTwo);
}

// Example 3: u for independent fractions, and with the printed matrix.
void expect_example_3(double combustion, double metering, std::span<const Printed> independent,
                      std::span<const double> with_matrix) {
  const Mixture gas = sample::mixture(sample::kExample3);
  const std::vector<double> u = sample::uncertainties(sample::kExample3);
  expect_printed(gas, {u, Correlation::independent, {}}, combustion, metering, independent);
  std::vector<Printed> correlated(independent.begin(), independent.end());
  for (std::size_t i = 0; i < correlated.size(); ++i) correlated[i].uncertainty = with_matrix[i];
  expect_printed(gas, {u, Correlation::matrix, sample::kExample3Correlation}, combustion, metering,
                 correlated);
}

TEST(FuelGasUncertainty, AnnexDExample3) {
  constexpr Printed kAt15[] = {
      {kVolume, kGross, 1e6, 39.73351, 5e-6, 0.026917, 5e-7},
      {kVolume, kNet, 1e6, 35.86811, 5e-6, 0.024757, 5e-7},
      {Property::density, kGross, 1, 0.76462, 5e-6, 0.000586, 5e-7},
      {Property::relative_density, kGross, 1, 0.62391, 5e-6, 0.000478, 5e-7},
      {Property::wobbe_index, kGross, 1e6, 50.30318, 5e-6, 0.021588, 5e-7},
      {Property::wobbe_index, kNet, 1e6, 45.40954, 5e-6, 0.020151, 5e-7}};
  expect_example_3(15, 15, kAt15,
                   std::array{0.016316, 0.015305, 0.000277, 0.000226, 0.019823, 0.018498});
  constexpr Printed kAt25And0[] = {
      {kVolume, kGross, 1e6, 41.89360, 5e-6, 0.028425, 5e-7},
      {kVolume, kNet, 1e6, 37.85228, 5e-6, 0.026164, 5e-7},
      {Property::density, kGross, 1, 0.80701, 5e-6, 0.000619, 5e-7},
      {Property::relative_density, kGross, 1, 0.62411, 5e-6, 0.000479, 5e-7},
      {Property::wobbe_index, kGross, 1e6, 53.02930, 5e-6, 0.022783, 5e-7},
      {Property::wobbe_index, kNet, 1e6, 47.91376, 5e-6, 0.021278, 5e-7}};
  expect_example_3(25, 0, kAt25And0,
                   std::array{0.017241, 0.016181, 0.000293, 0.000227, 0.020914, 0.019528});
}

// The matrix of example 3 is what dividing independent amounts by their sum leaves: there are
// uncertainties before normalisation that reproduce the printed ones and the matrix, within the
// rounding of the printed uncertainties (7e-6 is known to half of 1e-6).
TEST(FuelGasUncertainty, NormalisationReproducesExample3) {
  const Mixture gas = sample::mixture(sample::kExample3);
  constexpr std::array<double, 11> kBefore{6.34474e-4, 2.52787e-4, 1.50889e-4, 1.80053e-5,
                                           2.70179e-5, 6.69813e-6, 8.78005e-6, 3.93357e-6,
                                           7.73912e-6, 1.96879e-4, 1.13175e-4};
  double all = 0;
  for (const double u : kBefore) all += u * u;
  const auto covariance = [&](std::size_t i, std::size_t j) {
    const double x = gas.fraction[i];
    const double y = gas.fraction[j];
    const double own = i == j ? kBefore[i] * kBefore[i] : 0;
    return own - x * kBefore[j] * kBefore[j] - y * kBefore[i] * kBefore[i] + x * y * all;
  };
  for (std::size_t i = 0; i < gas.size; ++i) {
    EXPECT_NEAR(std::sqrt(covariance(i, i)), sample::kExample3[i].uncertainty, 5e-7);
    for (std::size_t j = 0; j < gas.size; ++j) {
      const double r = covariance(i, j) / std::sqrt(covariance(i, i) * covariance(j, j));
      EXPECT_NEAR(r, sample::kExample3Correlation[i * 11 + j], 0.025) << i << ", " << j;
    }
  }
  const auto got = uncertain(kVolume, gas, {kBefore, Correlation::normalised, {}}, kGross,
                             *combustion_at(288.15), *metering_at(288.15, kAtmosphere));
  ASSERT_TRUE(got);
  // Printed 0.016316; its inputs are rounded to 0.3 %.
  EXPECT_NEAR(got->uncertainty / 1e6, 0.016316, 0.016316 * 0.003);
}

// Without uncertainties of the data the propagation is that of differences of the property.
TEST(FuelGasUncertainty, OfOneFractionIsTheDifferenceThatItMakes) {
  const Combustion combustion = *combustion_at(288.15);
  const Metering metering = *metering_at(273.15, 95e3);
  const Mixture gas = sample::mixture(sample::kExample3);
  constexpr double kStep = 1e-6;
  for (std::size_t i = 0; i < gas.size; ++i) {
    Mixture moved = gas;
    moved.fraction[i] += kStep;
    std::vector<double> u(gas.size, 0.0);
    const auto variance = [&](Property property, Basis basis) {
      const auto got =
          uncertain(property, gas, {u, Correlation::independent, {}}, basis, combustion, metering);
      return got->uncertainty * got->uncertainty;
    };
    const auto expect_slope = [&](Property property, Basis basis, double before, double after) {
      u[i] = 0;
      const double data = variance(property, basis);
      u[i] = 0.5;
      const double slope = std::sqrt(variance(property, basis) - data) / 0.5;
      const double difference = std::abs(after - before) / kStep;
      EXPECT_NEAR(slope, difference, 1e-4 * difference + 1e-3 * before);
    };
    for (const Basis basis : {kGross, kNet}) {
      expect_slope(kMass, basis, mass_heating_value(gas, basis, combustion),
                   mass_heating_value(moved, basis, combustion));
      expect_slope(kVolume, basis, *volume_heating_value(gas, basis, combustion, metering),
                   *volume_heating_value(moved, basis, combustion, metering));
      expect_slope(Property::wobbe_index, basis, *wobbe_index(gas, basis, combustion, metering),
                   *wobbe_index(moved, basis, combustion, metering));
    }
    expect_slope(Property::relative_density, kGross, *relative_density(gas, metering),
                 *relative_density(moved, metering));
    expect_slope(Property::molar_volume, kGross, *molar_volume(gas, metering),
                 *molar_volume(moved, metering));
  }
}

TEST(FuelGasUncertainty, ChecksWhatItIsGiven) {
  const Mixture gas = sample::mixture(sample::kExample1);
  std::vector<double> u = sample::uncertainties(sample::kExample1);
  std::vector<double> r(25, 0.0);
  for (std::size_t i = 0; i < 5; ++i) r[i * 6] = 1;
  const auto fault = [&](std::span<const double> standard, std::span<const double> matrix) {
    return check_errors(gas, {standard, Correlation::matrix, matrix});
  };
  EXPECT_EQ(fault(u, r).fault, Fault::none);
  EXPECT_EQ(fault(std::span(u).first(4), r).argument, 2);
  EXPECT_EQ(fault(u, std::span(r).first(24)).fault, Fault::wrong_shape);
  r[1] = 0.5;
  EXPECT_EQ(fault(u, r).row, 2U);  // not symmetric
  r[5] = 0.5;
  EXPECT_EQ(fault(u, r).fault, Fault::none);
  r[5] = r[1] = 1.5;
  EXPECT_EQ(fault(u, r).fault, Fault::impossible);
  r[5] = r[1] = std::nan("");
  EXPECT_EQ(fault(u, r).fault, Fault::impossible);
  r[5] = r[1] = 0;
  r[24] = 0.9;
  EXPECT_EQ(fault(u, r).column, 5U);
  u[2] = -1e-9;
  EXPECT_EQ(check_errors(gas, {u, Correlation::independent, {}}).row, 3U);
}

TEST(FuelGasUncertainty, CorrelationsThatContradictEachOtherAreRefused) {
  const Mixture gas = sample::mixture(sample::kExample1);
  const std::vector<double> u(5, 0.01);
  // No three quantities are each the opposite of the other two.
  std::vector<double> r(25, -1.0);
  for (std::size_t i = 0; i < 5; ++i) r[i * 6] = 1;
  const AnalysisErrors errors{u, Correlation::matrix, r};
  ASSERT_EQ(check_errors(gas, errors).fault, Fault::none);
  const auto got = uncertain(kMolar, gas, errors, kGross, *combustion_at(288.15),
                             *metering_at(288.15, kAtmosphere));
  ASSERT_FALSE(got);
  EXPECT_EQ(got.failure().argument, 3);
}

TEST(FuelGasUncertainty, AGasThatDoesNotBurnHasNoneOfItsHeatingValue) {
  Composition analysis;
  analysis.parts.push_back({"nitrogen", 1.0});
  const Mixture gas = *mixture_of(analysis);
  const double u[] = {0.0};
  const AnalysisErrors errors{u, Correlation::independent, {}};
  EXPECT_FALSE(uncertain(kMolar, gas, errors, kGross, *combustion_at(288.15),
                         *metering_at(288.15, kAtmosphere)));
  EXPECT_TRUE(uncertain(Property::density, gas, errors, kGross, *combustion_at(288.15),
                        *metering_at(288.15, kAtmosphere)));
}

}  // namespace
}  // namespace busbar::fuel::gaseous
