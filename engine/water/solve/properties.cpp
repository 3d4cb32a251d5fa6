#include "water/solve/properties.hpp"

namespace busbar::water {

Properties properties_1(double pressure, double temperature) {
  return gibbs_properties<Region1Equation>(pressure, temperature);
}

Properties properties_2(double pressure, double temperature) {
  return gibbs_properties<Region2Equation>(pressure, temperature);
}

Properties properties_5(double pressure, double temperature) {
  return gibbs_properties<Region5Equation>(pressure, temperature);
}

Properties properties_3(double density, double temperature) {
  const double delta = density / kCriticalDensity;
  const double tau = kCriticalTemperature / temperature;
  const auto f = Region3Equation::at<kValue | kX | kY>(delta, tau);
  const double value = f.value + tables::kRegion3N1 * std::log(delta);
  return {1 / density, kGasConstant * temperature * (f.tau1 + f.delta1),
          kGasConstant * (f.tau1 - value)};
}

}  // namespace busbar::water
