// Losses of a generator at any load: they close, they meet the stated point, and the best load is
// the best one.
#include "electrical/generator.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <numeric>
#include <vector>

#include "random.hpp"

namespace busbar::electrical {
namespace {

constexpr int kRuns = 2000;
constexpr double kClosed = 1e-12;

Generator any(support::Random& random) {
  Generator machine;
  machine.apparent_power = random.logarithmic(1e6, 2e9);
  machine.power_factor = random.uniform(0.7, 1);
  for (double& loss : machine.rated) {
    loss = machine.apparent_power * random.logarithmic(1e-4, 5e-3);
  }
  machine.field_ratio = random.uniform(0.2, 0.9);
  return machine;
}

TEST(Generator, OutputAndLossesAreTheInput) {
  support::Random random(81);
  for (int i = 0; i < kRuns; ++i) {
    const Generator machine = any(random);
    const Load load{random.uniform(0.01, kMostLoad), random.uniform(0.05, 1),
                    i % 2 == 0 ? Sense::lagging : Sense::leading};
    const Balance found = balance_at(machine, load);
    const double lost = std::accumulate(found.losses.begin(), found.losses.end(), 0.0);
    EXPECT_NEAR(found.output + lost, found.input(), kClosed * found.input());
    EXPECT_NEAR(found.efficiency() * found.input(), found.output, kClosed * found.input());
    for (const double loss : found.losses) EXPECT_GE(loss, 0);
  }
}

TEST(Generator, AtRatedLoadTheLossesAreTheStatedOnes) {
  support::Random random(82);
  for (int i = 0; i < kRuns; ++i) {
    const Generator machine = any(random);
    const Balance found = balance_at(machine, {1, machine.power_factor, Sense::lagging});
    for (std::size_t k = 0; k < loss_count; ++k) {
      EXPECT_NEAR(found.losses[k], machine.rated[k], kClosed * machine.rated[k]);
    }
  }
}

TEST(Generator, WithoutLoadTheFieldCurrentIsTheNoLoadOne) {
  support::Random random(83);
  for (int i = 0; i < kRuns; ++i) {
    const Generator machine = any(random);
    const double ratio = field_current_ratio(machine.power_factor, machine.field_ratio,
                                             {1e-15, random.uniform(0.1, 1), Sense::lagging});
    EXPECT_NEAR(ratio, machine.field_ratio, kClosed);
  }
}

TEST(Generator, ReactivePowerCostsFieldCurrent) {
  support::Random random(84);
  for (int i = 0; i < kRuns; ++i) {
    const Generator machine = any(random);
    const double share = random.uniform(0.05, 1);
    const double factor = random.uniform(0.2, 0.99);
    const auto ratio = [&](double power_factor, Sense sense) {
      return field_current_ratio(machine.power_factor, machine.field_ratio,
                                 {share, power_factor, sense});
    };
    EXPECT_GT(ratio(factor, Sense::lagging), ratio(1, Sense::lagging));
    EXPECT_GT(ratio(1, Sense::leading), ratio(factor, Sense::leading));
  }
}

TEST(Generator, IsBestAtItsBestLoadWhateverThePowerFactor) {
  support::Random random(85);
  for (int i = 0; i < kRuns; ++i) {
    const Generator machine = any(random);
    const double best = best_load(machine.power_factor, machine.rated, machine.field_ratio);
    const double factor = random.uniform(0.3, 1);
    const auto efficiency = [&](double share) {
      return balance_at(machine, {share, factor, Sense::lagging}).efficiency();
    };
    for (const double aside : {0.5, 0.9, 0.99, 1.01, 1.1, 2.0}) {
      EXPECT_GT(efficiency(best), efficiency(best * aside));
    }
  }
}

// Without a field loss that moves: constant losses equal those with the square of the load.
TEST(Generator, AtTheBestLoadConstantLossesEqualTheOthers) {
  support::Random random(86);
  for (int i = 0; i < kRuns; ++i) {
    Generator machine = any(random);
    machine.rated[field_copper] = 0;
    machine.rated[excitation] = 0;
    const double best = best_load(machine.power_factor, machine.rated, machine.field_ratio);
    const Losses at = balance_at(machine, {best, 0.9, Sense::lagging}).losses;
    const double constant = at[friction_and_windage] + at[core];
    EXPECT_NEAR(constant, at[stator_copper] + at[stray_load], 1e-12 * constant);
  }
}

TEST(Generator, RefusesLossesThatAreNoSixOrInAnotherUnit) {
  const auto refused = [](std::initializer_list<double> losses) {
    const std::vector<double> given(losses);
    return generator(150e6, 0.8, given, 0.4, 3).failure();
  };
  EXPECT_EQ(refused({4e5, 3e5, 3e5, 2e5, 4e5}).fault, Fault::wrong_shape);
  EXPECT_EQ(refused({4e5, 3e5, 0, 2e5, 4e5, 1e5}).fault, Fault::impossible);
  EXPECT_EQ(refused({4e2, 3e2, 3e2, 2e2, 4e2, 1e2}).fault, Fault::impossible);
  EXPECT_EQ(refused({4e8, 3e8, 3e8, 2e8, 4e8, 1e8}).fault, Fault::impossible);
  EXPECT_EQ(refused({4e5, 3e5, 3e5, 2e5, 4e5, 1e5}).fault, Fault::none);
}

}  // namespace
}  // namespace busbar::electrical
