// Every species that NIST-JANAF tabulates, from 200 to 3,000 K.
//
// M. W. Chase, NIST-JANAF Thermochemical Tables, 4th edition, J. Phys. Chem. Ref. Data Monograph 9,
// 1998; heat capacities from two transcriptions that agree, entropies and enthalpies from one. The
// NASA polynomials rest on newer spectroscopic constants for some gases, so each has a spread of
// its own, which McBride et al. discuss: large for methane and nitrogen dioxide at high
// temperature, next to nothing for the gases of air.
#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <string>

#include "csv.hpp"
#include "gas/properties.hpp"
#include "paths.hpp"

namespace busbar::gas {
namespace {

constexpr double kHighest = 3000;
constexpr double kThousand = 1000;

// Greatest relative difference in heat capacity up to 3,000 K.
const std::map<std::string, double, std::less<>>& spreads() {
  static const std::map<std::string, double, std::less<>> known{
      {"H2O", 0.0195}, {"SO2", 0.0065}, {"OH", 0.0085},        {"NO2", 0.063}, {"N2O", 0.0315},
      {"CH4", 0.131},  {"NH3", 0.0106}, {"acetylene", 0.0103}, {"H2S", 0.0173}};
  return known;
}

double spread_of(const std::string& species) {
  constexpr double kOthers = 0.003;
  const auto at = spreads().find(species);
  return at == spreads().end() ? kOthers : at->second;
}

TEST(Janaf, HeatCapacityEntropyAndEnthalpyAreWithinTheSpread) {
  const auto path = support::reference_directory() / "gas-tables" / "nist-janaf-1998.csv";
  const support::Csv csv = support::read_csv(path.string());
  ASSERT_GT(csv.lines.size(), 400U);
  for (const support::CsvLine& line : csv.lines) {
    const std::string& name = line.at("species");
    const double t = std::stod(line.at("temperature"));
    if (t > kHighest) continue;
    SCOPED_TRACE(name + ", " + line.at("temperature") + " K");
    const auto species = species_named(name);
    ASSERT_TRUE(species);
    const Mixture mixture = Mixture::of(*species);
    const double m = mixture.molar_mass();
    const double spread = spread_of(name);
    const auto number = [&](const char* column) { return std::stod(line.at(column)); };
    const double cp = number("heat_capacity");
    EXPECT_NEAR(*heat_capacity(mixture, t) * m, cp, spread * cp + 0.0005);
    // What cp differs by, h and s can differ by, and the third law entropy by a little more.
    const double s = number("entropy");
    EXPECT_NEAR(*entropy(mixture, kStandardPressure, t) * m, s, spread * s + 0.006);
    const double h = number("enthalpy_above_298") * kThousand;
    EXPECT_NEAR(*enthalpy(mixture, t, Datum::at_25) * m, h, spread * std::abs(h) + 1.0);
  }
}

}  // namespace
}  // namespace busbar::gas
