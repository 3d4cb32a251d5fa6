#include "combustion/burner.hpp"

#include "combustion/products.hpp"
#include "fluid/join.hpp"
#include "fluid/state.hpp"
#include "gas/properties.hpp"

namespace busbar::combustion {
namespace {

// What goes in, checked once.
struct Inlet {
  Oxidant air;
  double air_flow = 0;
  double water_flow = 0;
  double energy = 0;         // of air and water, W
  double fuel_enthalpy = 0;  // less the loss, J/kg
};

Outcome<Inlet> inlet_of(const Burner& burner) {
  if (const Failure water = fluid::refuse_water(burner.air, 1); water.fault != Fault::none) {
    return water;
  }
  if (!burner.air.flow) {
    return Failure{Fault::missing, 1, "carries no flow; SET_FLOW gives it one"};
  }
  const Outcome<Oxidant> air = oxidant_from(burner.air.mixture);
  if (!air) return air.failure();
  Inlet in;
  in.air = *air;
  in.air_flow = *burner.air.flow;
  in.energy = in.air_flow * burner.air.enthalpy;
  if (burner.injected != nullptr) {
    const Stream& water = *burner.injected;
    if (const Failure gas = fluid::refuse_gas(water, 7); gas.fault != Fault::none) return gas;
    if (!water.flow) return Failure{Fault::missing, 7, "carries no flow; SET_FLOW gives it one"};
    if (water.pressure < burner.air.pressure) {
      return Failure{
          Fault::impossible,
          7,
          "has {0}, less than the {1} of the air",
          {{{water.pressure, Quantity::pressure}, {burner.air.pressure, Quantity::pressure}}}};
    }
    in.water_flow = *water.flow;
    in.energy += in.water_flow * fluid::formation_enthalpy(water);
  }
  const Outcome<double> of_fuel = enthalpy(burner.fuel, burner.fuel_temperature);
  if (!of_fuel) {
    const Failure& failure = of_fuel.failure();
    return failure.about(failure.argument == 1 ? 2 : 3);
  }
  const Outcome<double> lower =
      heat_of_combustion(burner.fuel, fuel::Basis::lower, kReferenceTemperature);
  if (!lower) return lower.failure().about(2);
  in.fuel_enthalpy = *of_fuel - (1 - burner.efficiency) * *lower;
  return in;
}

Outcome<Products> burnt(const Burner& burner, const Inlet& in, double fuel_flow) {
  Burning burning;
  burning.air_ratio = in.air_flow / (fuel_flow * stoichiometric_air(burner.fuel, in.air));
  burning.water = in.water_flow / fuel_flow;
  return burn(burner.fuel, in.air, burning);
}

// Of the flue gas of a fuel flow at a temperature (input 4), W.
Outcome<double> outlet_energy(const Burner& burner, const Inlet& in, double fuel_flow,
                              double temperature) {
  const Outcome<Products> products = burnt(burner, in, fuel_flow);
  if (!products) return products.failure().about(4);
  const Outcome<gas::Mixture> mixture = products->mixture(true);
  if (!mixture) return mixture.failure().about(2);
  const Outcome<double> enthalpy = gas::enthalpy(*mixture, temperature, gas::Datum::formation);
  if (!enthalpy) return enthalpy.failure().about(4);
  return fuel_flow * products->mass(true) * *enthalpy;
}

// A tolerance on the least air, so that a stoichiometric flow that was computed is one.
constexpr double kRounding = 1e-12;

}  // namespace

Outcome<Stream> burner_out(const Burner& burner, double fuel_flow) {
  const Outcome<Inlet> in = inlet_of(burner);
  if (!in) return in.failure();
  const double needed = fuel_flow * stoichiometric_air(burner.fuel, in->air);
  if (needed > in->air_flow * (1 + kRounding)) {
    return Failure{
        Fault::impossible,
        4,
        "{0} of fuel needs {1} of this air to burn, and there are {2}",
        {{{fuel_flow, Quantity::flow}, {needed, Quantity::flow}, {in->air_flow, Quantity::flow}}}};
  }
  const Outcome<Products> products = burnt(burner, *in, fuel_flow);
  if (!products) return products.failure().about(4);
  const Outcome<gas::Mixture> mixture = products->mixture(true);
  if (!mixture) return mixture.failure().about(2);
  const double flow = fuel_flow * products->mass(true);
  const double enthalpy = (in->energy + fuel_flow * in->fuel_enthalpy) / flow;
  const Outcome<double> t = gas::temperature_at_enthalpy(*mixture, enthalpy, gas::Datum::formation);
  if (!t) return t.failure().about(4);
  const double pressure = burner.air.pressure * (1 - burner.pressure_loss);
  Outcome<Stream> out = fluid::gas_stream(*mixture, pressure, *t, flow, burner.air.datum);
  if (!out) return out.failure().about(4);
  (*out).enthalpy = enthalpy;
  return out;
}

Outcome<double> burner_fuel_flow(const Burner& burner, double outlet_temperature) {
  const Outcome<Inlet> in = inlet_of(burner);
  if (!in) return in.failure();
  // At one temperature the enthalpy of the flue gas is linear in the fuel flow; two flows tell it.
  const double most = in->air_flow / stoichiometric_air(burner.fuel, in->air);
  const Outcome<double> at_most = outlet_energy(burner, *in, most, outlet_temperature);
  if (!at_most) return at_most.failure();
  const Outcome<double> at_half = outlet_energy(burner, *in, most / 2, outlet_temperature);
  if (!at_half) return at_half.failure();
  const double slope = (*at_most - *at_half) / (most / 2);
  const double wanted = *at_most - most * slope - in->energy;
  const double given = in->fuel_enthalpy - slope;
  if (!(given > 0)) {
    return Failure{Fault::impossible,
                   4,
                   "{0} is hotter than any amount of this fuel makes the gas",
                   {{{outlet_temperature, Quantity::temperature}}}};
  }
  const double flow = wanted / given;
  if (!(flow > 0)) {
    return Failure{Fault::impossible,
                   4,
                   "{0} is reached without fuel",
                   {{{outlet_temperature, Quantity::temperature}}}};
  }
  if (flow * stoichiometric_air(burner.fuel, in->air) > in->air_flow * (1 + kRounding)) {
    return Failure{Fault::impossible,
                   4,
                   "{0} takes more fuel than the air burns: at an air ratio of 1 it is colder",
                   {{{outlet_temperature, Quantity::temperature}}}};
  }
  return flow;
}

}  // namespace busbar::combustion
