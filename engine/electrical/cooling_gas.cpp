#include "electrical/cooling_gas.hpp"

namespace busbar::electrical {
namespace {

constexpr double kGasConstant = 8.31446261815324;  // J/(mol K), CODATA 2018, exact
constexpr double kHydrogen = 2.01588e-3;           // kg/mol, IUPAC standard atomic weights
constexpr double kAir = 28.96546e-3;               // kg/mol, dry air, CIPM-2007 at 400 ppm CO2

double density(double molar_mass, double pressure, double temperature) {
  return molar_mass * pressure / (kGasConstant * temperature);
}

}  // namespace

double hydrogen_density(double purity, double pressure, double temperature) {
  return density(purity * kHydrogen + (1 - purity) * kAir, pressure, temperature);
}

double air_density(double pressure, double temperature) {
  return density(kAir, pressure, temperature);
}

}  // namespace busbar::electrical
