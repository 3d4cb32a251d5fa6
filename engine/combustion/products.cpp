#include "combustion/products.hpp"

#include <algorithm>

namespace busbar::combustion {
namespace {

using gas::Element;
using gas::Species;

constexpr std::array<std::pair<Element, Species>, 5> kNoble{{{Element::Ar, Species::Ar},
                                                             {Element::Ne, Species::Ne},
                                                             {Element::He, Species::He},
                                                             {Element::Kr, Species::Kr},
                                                             {Element::Xe, Species::Xe}}};

double& at(Products& products, Species species) {
  return products.amount[static_cast<std::size_t>(species)];
}

Failure short_of_oxygen(const Burning& burning) {
  if (burning.carbon_to_monoxide) {
    return {Fault::impossible,
            3,
            "{0} gives too little oxygen for the carbon monoxide stated; leave that out, and the "
            "shortage sets it",
            {{{burning.air_ratio, Quantity::number}}}};
  }
  return {Fault::impossible,
          3,
          "{0} leaves not enough oxygen for water and CO: take the equilibrium instead",
          {{{burning.air_ratio, Quantity::number}}}};
}

}  // namespace

double Products::moles(bool wet) const {
  double sum = 0;
  for (const double amount_of_one : amount) sum += amount_of_one;
  return wet ? sum : sum - of(Species::H2O);
}

double Products::mass(bool wet) const {
  double sum = 0;
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    const auto species = static_cast<Species>(i);
    if (wet || species != Species::H2O) sum += amount[i] * gas::molar_mass(species);
  }
  return sum;
}

Outcome<gas::Mixture> Products::mixture(bool wet) const {
  if (wet) return gas::Mixture::from_amounts(amount);
  auto dry = amount;
  dry[static_cast<std::size_t>(Species::H2O)] = 0;
  return gas::Mixture::from_amounts(dry);
}

Outcome<Products> burn(const Fuel& fuel, const Oxidant& air, const Burning& burning) {
  const double moles = burning.air_ratio * stoichiometric_moles(fuel, air);
  const auto total = [&](Element element) { return fuel.of(element) + moles * air.of(element); };
  Products out;
  const double solid = burning.unburnt_carbon * fuel.of(Element::C);
  out.carbon = solid * gas::molar_mass(Species::C);
  out.ash = fuel.ash;
  out.air = moles * air.molar_mass();

  const double carbon = total(Element::C) - solid;
  double monoxide = burning.carbon_to_monoxide.value_or(0) * carbon;
  double oxygen = (burning.air_ratio - 1) * stoichiometric_oxygen(fuel) + solid + monoxide / 2;
  // Whole numbers in a balance that closes: what is left is rounding.
  const double rounding = 1e-13 * stoichiometric_oxygen(fuel);
  if (oxygen < -rounding) {
    monoxide -= 2 * oxygen;
    if (burning.carbon_to_monoxide || monoxide > carbon) return short_of_oxygen(burning);
  }
  oxygen = oxygen > rounding ? oxygen : 0;
  at(out, Species::CO) = monoxide;
  at(out, Species::CO2) = carbon - monoxide;
  at(out, Species::H2O) = total(Element::H) / 2 + burning.water / gas::molar_mass(Species::H2O);
  at(out, Species::SO2) = total(Element::S);
  at(out, Species::N2) = total(Element::N) / 2;
  at(out, Species::O2) = oxygen;
  for (const auto& [element, species] : kNoble) at(out, species) = total(element);
  return out;
}

Outcome<gas::Mixture> with_recirculation(const Fuel& fuel, const Oxidant& air, double air_ratio,
                                         double recirculation) {
  Burning burning;
  burning.air_ratio = air_ratio;
  burning.carbon_to_monoxide = 0;
  const Outcome<Products> flue = burn(fuel, air, burning);
  if (!flue) {
    return Failure{Fault::impossible,
                   3,
                   "{0} is below 1: flue gas that still burns is not recirculated here",
                   {{{air_ratio, Quantity::number}}}};
  }
  auto amounts = air.mixture.fractions();
  for (double& amount : amounts) amount *= air_ratio * stoichiometric_moles(fuel, air);
  for (std::size_t i = 0; i < gas::kSpecies; ++i) amounts[i] += recirculation * flue->amount[i];
  return gas::Mixture::from_amounts(amounts);
}

double greatest_carbon_dioxide(const Fuel& fuel, const Oxidant& air) {
  Burning burning;
  burning.carbon_to_monoxide = 0;
  const Outcome<Products> flue = burn(fuel, air, burning);
  return flue ? flue->of(Species::CO2) / flue->moles(false) : 0;
}

}  // namespace busbar::combustion
