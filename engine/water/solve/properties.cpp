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
  return helmholtz_properties_at<kAllOutputs>(density, temperature);
}

}  // namespace busbar::water
