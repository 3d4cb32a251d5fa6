// The arithmetic that the kernels bring with them.
#include <gtest/gtest.h>

#include <cmath>
#include <limits>

#include "sampling.hpp"
#include "water/equations/logarithm.hpp"
#include "water/equations/saturation.hpp"

namespace busbar::water {
namespace {

using testing::Sampler;

// Beside the maths library in extended precision (64 bits of mantissa).
TEST(Kernels, TheLogarithmIsRightToOneUlp) {
  Sampler sampler(1);
  double worst = 0;
  for (int i = 0; i < 1'000'000; ++i) {
    const double x = i % 3 == 0   ? sampler.between(0.5, 2)
                     : i % 3 == 1 ? std::exp(sampler.between(-700, 700))
                                  : sampler.between(0.99, 1.01);
    const long double exact = std::log(static_cast<long double>(x));
    const auto rounded = static_cast<double>(exact);
    const double ulp = std::abs(std::nextafter(rounded, 1e300) - rounded);
    const long double error = static_cast<long double>(natural_logarithm(x)) - exact;
    worst = std::fmax(worst, std::abs(static_cast<double>(error)) / ulp);
  }
  EXPECT_LT(worst, 1.0);
}

TEST(Kernels, TheLogarithmOfSubnormalNumbers) {
  for (const double x : {5e-324, 1e-310, std::numeric_limits<double>::min()}) {
    EXPECT_DOUBLE_EQ(natural_logarithm(x), std::log(x));
  }
  EXPECT_EQ(natural_logarithm(1.0), 0.0);
}

// The band that lets a state be called liquid or vapour without equation 30.
TEST(Kernels, TheRoughSaturationLineKeepsItsBand) {
  for (int i = 0; i <= 350'000; ++i) {
    const double t = kLowestTemperature + 1e-3 * i;
    const double beside =
        rough_logarithm(saturation_pressure_equation(t)) - rough_saturation_logarithm(t);
    EXPECT_LT(beside, kSurelyLiquid - 0.02) << t;
    EXPECT_GT(beside, kSurelyVapour + 0.02) << t;
  }
}

TEST(Kernels, TheRoughLogarithmRisesWithThePressure) {
  Sampler sampler(2);
  for (int i = 0; i < 100'000; ++i) {
    const double p = sampler.log_between(1, 1e8);
    const double higher = p * (1 + sampler.log_between(1e-6, 1));
    EXPECT_LE(rough_logarithm(p), rough_logarithm(higher));
    EXPECT_NEAR(rough_logarithm(p), std::log2(p), 0.0862);
  }
}

}  // namespace
}  // namespace busbar::water
