#include "water/properties/metastable.hpp"

#include <cmath>

#include "water/constants.hpp"
#include "water/equations/metastable.hpp"
#include "water/failure.hpp"
#include "water/properties/gibbs_response.hpp"
#include "water/solve/isobar.hpp"

namespace busbar::water {

namespace {

// Section 6.2.
constexpr double kLowest = 611.657;
constexpr double kHighest = 10e6;
constexpr double kMostMoisture = 0.05;

}  // namespace

Outcome<Metastable> metastable_vapour(double pressure, double temperature) {
  const Measure at_pressure{pressure, Quantity::pressure};
  const Measure at_temperature{temperature, Quantity::temperature};
  if (!std::isfinite(pressure)) {
    return make_failure(Fault::outside_range, 1, "{0} is not a finite number", at_pressure);
  }
  if (pressure < kLowest) {
    return make_failure(
        Fault::outside_range, 1,
        "{0} is below {1}, the lowest pressure of the equation for metastable vapour "
        "of IAPWS-IF97",
        at_pressure, {kLowest, Quantity::pressure});
  }
  if (pressure > kHighest) {
    return make_failure(Fault::outside_range, 1,
                        "{0} is above {1}, the highest pressure of the equation for metastable "
                        "vapour of IAPWS-IF97",
                        at_pressure, {kHighest, Quantity::pressure});
  }
  if (!std::isfinite(temperature)) {
    return make_failure(Fault::outside_range, 2, "{0} is not a finite number", at_temperature);
  }
  if (temperature < kLowestTemperature) {
    return make_failure(Fault::outside_range, 2,
                        "{0} is below {1}, the lowest temperature of IAPWS-IF97", at_temperature,
                        {kLowestTemperature, Quantity::temperature});
  }
  const Saturated saturated = saturated_at(pressure);
  if (temperature > saturated.temperature) {
    return make_failure(Fault::outside_range, 2,
                        "{0} is above {1}, the saturation temperature: that vapour is stable",
                        at_temperature, {saturated.temperature, Quantity::temperature});
  }
  Metastable out;
  out.properties = gibbs_properties<MetastableEquation>(pressure, temperature);
  out.response = gibbs_response<MetastableEquation>(pressure, temperature);
  const double least = mixed(saturated.vapour.enthalpy, saturated.liquid.enthalpy, kMostMoisture);
  // The equation gives the saturated vapour itself up to 0.043 kJ/kg away; only the wet end counts.
  if (out.properties.enthalpy < least) {
    const double moisture = (saturated.vapour.enthalpy - out.properties.enthalpy) /
                            (saturated.vapour.enthalpy - saturated.liquid.enthalpy);
    return make_failure(Fault::outside_range, 2,
                        "{0} is too cold: with this enthalpy the moisture at equilibrium would be "
                        "{1}, above {2}, the limit of the equation for metastable vapour",
                        at_temperature, {moisture, Quantity::fraction},
                        {kMostMoisture, Quantity::fraction});
  }
  return out;
}

}  // namespace busbar::water
