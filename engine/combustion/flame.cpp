#include "combustion/flame.hpp"

#include "combustion/products.hpp"
#include "gas/properties.hpp"

namespace busbar::combustion {

Elements elements_of(const Fuel& fuel, const Oxidant& air, double air_ratio) {
  const double moles = air_ratio * stoichiometric_moles(fuel, air);
  Elements sum = fuel.elements;
  for (std::size_t e = 0; e < gas::kElementCount; ++e) sum[e] += moles * air.elements[e];
  return sum;
}

Outcome<Reactants> reactants(const Fuel& fuel, const Oxidant& air, const Feed& feed) {
  const Outcome<double> of_fuel = enthalpy(fuel, feed.fuel_temperature);
  if (!of_fuel) {
    const Failure& failure = of_fuel.failure();
    return failure.about(failure.argument == 2 ? 4 : failure.argument);
  }
  const Outcome<double> of_air =
      gas::enthalpy(air.mixture, feed.air_temperature, gas::Datum::formation);
  if (!of_air) return of_air.failure().about(5);
  const double mass = feed.air_ratio * stoichiometric_air(fuel, air);
  Reactants out;
  out.elements = elements_of(fuel, air, feed.air_ratio);
  out.enthalpy = *of_fuel + mass * *of_air;
  out.mass = 1 - fuel.ash + mass;
  return out;
}

Outcome<double> complete_flame_temperature(const Fuel& fuel, const Oxidant& air, const Feed& feed) {
  const Outcome<Reactants> given = reactants(fuel, air, feed);
  if (!given) return given.failure();
  Burning burning;
  burning.air_ratio = feed.air_ratio;
  const Outcome<Products> products = burn(fuel, air, burning);
  if (!products) return products.failure();
  const Outcome<gas::Mixture> mixture = products->mixture(true);
  if (!mixture) return mixture.failure();
  const Outcome<double> t = gas::temperature_at_enthalpy(
      *mixture, given->enthalpy / products->mass(true), gas::Datum::formation);
  if (!t) return t.failure().about(1);
  return *t;
}

Outcome<Equilibrium> equilibrium_flame(const Fuel& fuel, const Oxidant& air, const Feed& feed,
                                       double pressure) {
  const Outcome<Reactants> given = reactants(fuel, air, feed);
  if (!given) return given.failure();
  const Outcome<Equilibrium> found = equilibrium_of(given->elements, given->enthalpy, pressure);
  if (!found) return found.failure().about(3);
  return found;
}

}  // namespace busbar::combustion
