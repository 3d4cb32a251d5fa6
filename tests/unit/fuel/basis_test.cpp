// Heating-value bases.
#include "fuel/basis.hpp"

#include <gtest/gtest.h>

#include "random.hpp"

namespace busbar::fuel {
namespace {

TEST(Basis, HasFourNamesAndNoOther) {
  for (const char* name : {"HHV", "hhv", "GCV", "gcv"}) EXPECT_EQ(basis_named(name), Basis::higher);
  for (const char* name : {"LHV", "lhv", "NCV", "Ncv"}) EXPECT_EQ(basis_named(name), Basis::lower);
  // gross and net name the boundary of a plant too.
  for (const char* name : {"", "gross", "net", "upper", "HHV ", "H", "PCI", "LHVs"}) {
    EXPECT_FALSE(basis_named(name)) << name;
  }
}

TEST(Basis, ChangesThereAndBackAndNotAtAll) {
  support::Random random(81);
  for (int i = 0; i < 1000; ++i) {
    const double higher = random.logarithmic(1, 150);
    const double lower = higher * random.uniform(0.5, 1);
    const double down = *energy_ratio(Basis::higher, Basis::lower, higher, lower);
    const double up = *energy_ratio(Basis::lower, Basis::higher, higher, lower);
    EXPECT_NEAR(down * up, 1, 1e-15 * 4);
    EXPECT_LE(down, 1);
    EXPECT_EQ(*energy_ratio(Basis::lower, Basis::lower, higher, lower), 1);
  }
}

TEST(Basis, TheLowerValueIsNeverTheGreater) {
  const Failure failure = energy_ratio(Basis::lower, Basis::higher, 50, 55).failure();
  EXPECT_EQ(failure.fault, Fault::impossible);
  EXPECT_EQ(failure.argument, 5);
}

}  // namespace
}  // namespace busbar::fuel
