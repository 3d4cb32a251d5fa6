#include "combustion/fuel.hpp"

#include <cmath>
#include <string_view>

#include "core/text.hpp"
#include "fuel/solid/analysis.hpp"

namespace busbar::combustion {
namespace {

using fuel::solid::Part;
using gas::Condensed;
using gas::Element;
using gas::Species;

constexpr double kMega = 1e6;

Failure at_part(Failure failure, std::size_t index) {
  failure.row = static_cast<std::uint32_t>(index + 1);
  return failure;
}

bool is_heating_value(std::string_view name) {
  return equal_ignoring_case(name, kHigherValueName) || equal_ignoring_case(name, kLowerValueName);
}

// What only an analysis holds. "hydrogen" and "nitrogen" are gases too, the symbols H and N are
// not fuels.
bool tells_an_analysis(std::string_view name) {
  for (const std::string_view symbol :
       {"C", "H", "O", "N", "S", "Cl", "ash", "moisture", "carbon"}) {
    if (equal_ignoring_case(name, symbol)) return true;
  }
  return is_heating_value(name);
}

bool is_analysis(const Composition& composition) {
  for (const busbar::Part& part : composition.parts) {
    if (tells_an_analysis(part.name)) return true;
  }
  return false;
}

void add(Elements& elements, Element element, double amount) {
  elements[static_cast<std::size_t>(element)] += amount;
}

std::optional<Element> element_of(Part part) {
  switch (part) {
    case Part::carbon:
      return Element::C;
    case Part::hydrogen:
      return Element::H;
    case Part::oxygen:
      return Element::O;
    case Part::nitrogen:
      return Element::N;
    case Part::sulphur:
      return Element::S;
    default:
      return std::nullopt;
  }
}

double atomic_mass(Element element) {
  switch (element) {
    case Element::C:
      return gas::molar_mass(Species::C);
    case Element::H:
      return gas::molar_mass(Species::H);
    case Element::O:
      return gas::molar_mass(Species::O);
    case Element::N:
      return gas::molar_mass(Species::N);
    default:
      return gas::molar_mass(Species::S);
  }
}

constexpr std::array<std::pair<Element, Species>, 5> kNoble{{{Element::Ar, Species::Ar},
                                                             {Element::Ne, Species::Ne},
                                                             {Element::He, Species::He},
                                                             {Element::Kr, Species::Kr},
                                                             {Element::Xe, Species::Xe}}};

// Enthalpy of the products of complete combustion less that of its oxygen, J per kg of fuel;
// `water` is that of water, h/R.
double products_less_oxygen(const Fuel& fuel, const gas::Powers& powers, double water) {
  const auto h = [&](Species species) { return gas::fit(species, powers.t).enthalpy(powers); };
  double sum = fuel.of(Element::C) * h(Species::CO2) + fuel.of(Element::H) / 2 * water +
               fuel.of(Element::S) * h(Species::SO2) + fuel.of(Element::N) / 2 * h(Species::N2) -
               stoichiometric_oxygen(fuel) * h(Species::O2);
  for (const auto& [element, species] : kNoble) sum += fuel.of(element) * h(species);
  return gas::kGasConstant * sum;
}

// h/R of water as the basis counts it; none where there is no liquid.
std::optional<double> water_of(fuel::Basis basis, const gas::Powers& powers) {
  if (basis == fuel::Basis::lower) return gas::fit(Species::H2O, powers.t).enthalpy(powers);
  const gas::Polynomial* liquid = gas::fit(Condensed::water, powers.t);
  if (liquid == nullptr) return std::nullopt;
  return liquid->enthalpy(powers);
}

Failure repeated(std::size_t index) {
  return at_part({Fault::wrong_shape, 1, "stands twice in the fuel"}, index);
}

Outcome<double> heating_value_in(const busbar::Part& part, std::size_t index) {
  const double value = part.amount * kMega;
  if (value >= kLeastHeatingValue && value <= kMostHeatingValue) return value;
  return at_part({Fault::outside_range,
                  1,
                  "is {0}, not within {1} and {2}; under a heading in % it counts as a hundredth: "
                  "COMBUSTION_FUEL writes it as it must be",
                  {{{value, Quantity::heating_value},
                    {kLeastHeatingValue, Quantity::heating_value},
                    {kMostHeatingValue, Quantity::heating_value}}}},
                 index);
}

Outcome<Part> part_of_analysis(std::string_view name, std::size_t index) {
  const auto part = fuel::solid::part_named(name);
  if (!part) {
    return at_part({Fault::unknown_word, 1,
                    "is no part of an ultimate analysis: C, H, O, N, S, ash and moisture are; a "
                    "fuel of species holds no part that an analysis has"},
                   index);
  }
  if (*part == Part::volatile_matter || *part == Part::fixed_carbon) {
    return at_part({Fault::unknown_word, 1,
                    "belongs to a proximate analysis; combustion takes C, H, O, N, S, ash and "
                    "moisture"},
                   index);
  }
  return *part;
}

Outcome<Fuel> from_analysis(const Composition& composition) {
  if (composition.basis != Basis::mass) {
    return Failure{Fault::impossible, 1,
                   "is by mole with a part that only an ultimate analysis has, and an analysis is "
                   "by mass"};
  }
  Composition shares;
  shares.basis = Basis::mass;
  std::array<bool, fuel::solid::kParts> seen{};
  std::array<double, fuel::solid::kParts> share{};
  std::optional<double> value;
  fuel::Basis basis = fuel::Basis::higher;
  double sum = 0;
  for (std::size_t i = 0; i < composition.parts.size(); ++i) {
    const busbar::Part& part = composition.parts[i];
    if (is_heating_value(part.name)) {
      if (value) return repeated(i);
      const Outcome<double> read = heating_value_in(part, i);
      if (!read) return read.failure();
      value = *read;
      if (equal_ignoring_case(part.name, kLowerValueName)) basis = fuel::Basis::lower;
      shares.parts.push_back({part.name, 0});  // keeps the count of parts for failures
      continue;
    }
    const Outcome<Part> named = part_of_analysis(part.name, i);
    if (!named) return named.failure();
    if (*named == Part::chlorine && part.amount > 0) {
      return at_part({Fault::impossible, 1,
                      "is more than nought, and HCl is not among the gases known here; count a "
                      "trace of chlorine with the ash"},
                     i);
    }
    if (*named == Part::moisture && part.amount > 1) {
      return at_part({Fault::impossible,
                      1,
                      "is {0}, above the whole: only moisture counted on dry mass can be, see "
                      "MOISTURE_ON_WET_BASIS",
                      {{{part.amount, Quantity::fraction}}}},
                     i);
    }
    const auto at = static_cast<std::size_t>(*named);
    if (seen[at]) return repeated(i);
    seen[at] = true;
    share[at] = part.amount;
    sum += part.amount;
    shares.parts.push_back(part);
  }
  if (const Failure failure = check_amounts(shares); failure.fault != Fault::none) return failure;

  Fuel fuel;
  fuel.analysed = true;
  for (std::size_t i = 0; i < share.size(); ++i) {
    const auto part = static_cast<Part>(i);
    if (const auto element = element_of(part)) {
      add(fuel.elements, *element, share[i] / sum / atomic_mass(*element));
    }
  }
  fuel.ash = share[static_cast<std::size_t>(Part::ash)] / sum;
  const double water =
      share[static_cast<std::size_t>(Part::moisture)] / sum / gas::molar_mass(Species::H2O);
  add(fuel.elements, Element::H, 2 * water);
  add(fuel.elements, Element::O, water);
  if (value) {
    const gas::Powers powers = gas::Powers::at(kReferenceTemperature);
    fuel.formation_enthalpy =
        *value + products_less_oxygen(fuel, powers, water_of(basis, powers).value_or(0));
  }
  return fuel;
}

// Free atoms and radicals live in flames alone.
bool keeps(Species species) {
  switch (species) {
    case Species::OH:
    case Species::O:
    case Species::H:
    case Species::N:
    case Species::HO2:
    case Species::C:
    case Species::S:
    case Species::SO:
    case Species::S2:
    case Species::CH3:
    case Species::HCO:
    case Species::NH:
    case Species::NH2:
    case Species::HNO:
      return false;
    default:
      return true;
  }
}

Outcome<Fuel> from_species(const Composition& composition) {
  Fuel fuel;
  std::array<double, gas::kSpecies + gas::kCondensed> amount{};
  std::array<bool, gas::kSpecies + gas::kCondensed> seen{};
  double mass = 0;
  for (std::size_t i = 0; i < composition.parts.size(); ++i) {
    const busbar::Part& part = composition.parts[i];
    std::size_t at = 0;
    double molar_mass = 0;
    if (const auto species = gas::species_named(part.name); species && keeps(*species)) {
      at = static_cast<std::size_t>(*species);
      molar_mass = gas::molar_mass(*species);
    } else if (const auto condensed = gas::condensed_named(part.name)) {
      at = gas::kSpecies + static_cast<std::size_t>(*condensed);
      molar_mass = gas::molar_mass(*condensed);
    } else {
      return at_part(
          {Fault::unknown_word, 1,
           species ? "is no fuel: it lives in flames alone"
                   : "is no gas or liquid that Busbar knows and no part of an analysis; "
                     "SPECIES_TABLE(\"gas\") and SPECIES_TABLE(\"condensed\") list them"},
          i);
    }
    if (seen[at]) return repeated(i);
    seen[at] = true;
    amount[at] = composition.basis == Basis::mass ? part.amount / molar_mass : part.amount;
    mass += amount[at] * molar_mass;
  }
  if (const Failure failure = check_amounts(composition); failure.fault != Fault::none) {
    return failure;
  }
  for (std::size_t i = 0; i < amount.size(); ++i) {
    const double moles = amount[i] / mass;
    const bool gaseous = i < gas::kSpecies;
    (gaseous ? fuel.gases[i] : fuel.liquids[i - gas::kSpecies]) = moles;
    for (std::size_t e = 0; e < gas::kElementCount; ++e) {
      const auto element = static_cast<Element>(e);
      const unsigned atoms = gaseous
                                 ? gas::atoms(static_cast<Species>(i), element)
                                 : gas::atoms(static_cast<Condensed>(i - gas::kSpecies), element);
      fuel.elements[e] += atoms * moles;
    }
  }
  return fuel;
}

Failure no_heating_value() {
  return {Fault::missing, 1,
          "is an analysis without a heating value; COMBUSTION_FUEL(analysis; heating value; "
          "\"HHV\") puts the two together"};
}

Failure analysis_has_one_temperature(double temperature) {
  return {Fault::outside_range,
          2,
          "{0} is not {1}: an analysis says nothing of the heat capacity; take {1} and count the "
          "sensible heat of a preheated fuel in with its heating value",
          {{{temperature, Quantity::temperature}, {kReferenceTemperature, Quantity::temperature}}}};
}

Failure outside_fit(double temperature, double low, double high) {
  return {Fault::outside_range,
          2,
          "{0} is not within {1} and {2}, where the NASA polynomials of the fuel hold",
          {{{temperature, Quantity::temperature},
            {low, Quantity::temperature},
            {high, Quantity::temperature}}}};
}

}  // namespace

double Fuel::moles() const {
  double sum = 0;
  for (const double amount : gases) sum += amount;
  for (const double amount : liquids) sum += amount;
  return sum;
}

Outcome<Fuel> fuel_from(const Composition& composition) {
  Outcome<Fuel> fuel =
      is_analysis(composition) ? from_analysis(composition) : from_species(composition);
  if (!fuel) return fuel;
  const double oxygen = stoichiometric_oxygen(*fuel);
  if (!(oxygen > 0)) {
    return Failure{Fault::impossible, 1, "holds nothing that burns: it takes no oxygen"};
  }
  return fuel;
}

Outcome<Composition> with_heating_value(const Composition& analysis, double value,
                                        fuel::Basis basis) {
  for (std::size_t i = 0; i < analysis.parts.size(); ++i) {
    if (is_heating_value(analysis.parts[i].name)) {
      return at_part({Fault::impossible, 1, "is a heating value that the analysis already holds"},
                     i);
    }
  }
  Outcome<Fuel> fuel = fuel_from(analysis);
  if (!fuel) return fuel.failure();
  if (!fuel->analysed) {
    return Failure{Fault::impossible, 1,
                   "holds species, whose heats of formation are known: a second heating value "
                   "would contradict them"};
  }
  Composition out = analysis;
  const bool higher = basis == fuel::Basis::higher;
  out.parts.push_back({higher ? kHigherValueName : kLowerValueName, value / kMega});
  return out;
}

double stoichiometric_oxygen(const Fuel& fuel) {
  return fuel.of(Element::C) + fuel.of(Element::H) / 4 + fuel.of(Element::S) -
         fuel.of(Element::O) / 2;
}

Outcome<double> enthalpy(const Fuel& fuel, double temperature) {
  if (fuel.analysed) {
    if (!fuel.formation_enthalpy) return no_heating_value();
    constexpr double kSame = 1e-6;  // a temperature in °F is not exactly 298.15 K
    if (!(std::abs(temperature - kReferenceTemperature) <= kSame)) {
      return analysis_has_one_temperature(temperature);
    }
    return *fuel.formation_enthalpy;
  }
  const gas::Powers powers = gas::Powers::at(temperature);
  double sum = 0;
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    if (!(fuel.gases[i] > 0)) continue;
    const auto species = static_cast<Species>(i);
    const double low = gas::lowest_temperature(species);
    const double high = gas::highest_temperature(species);
    if (!(temperature >= low && temperature <= high)) return outside_fit(temperature, low, high);
    sum += fuel.gases[i] * gas::fit(species, temperature).enthalpy(powers);
  }
  for (std::size_t i = 0; i < gas::kCondensed; ++i) {
    if (!(fuel.liquids[i] > 0)) continue;
    const auto species = static_cast<Condensed>(i);
    const gas::Polynomial* fit = gas::fit(species, temperature);
    if (fit == nullptr) {
      return outside_fit(temperature, gas::lowest_temperature(species),
                         gas::highest_temperature(species));
    }
    sum += fuel.liquids[i] * fit->enthalpy(powers);
  }
  return sum * gas::kGasConstant;
}

Outcome<double> heat_of_combustion(const Fuel& fuel, fuel::Basis basis, double temperature) {
  const Outcome<double> before = enthalpy(fuel, temperature);
  if (!before) return before;
  const gas::Powers powers = gas::Powers::at(temperature);
  const std::optional<double> water = water_of(basis, powers);
  if (!water) {
    return outside_fit(temperature, gas::lowest_temperature(Condensed::water),
                       gas::highest_temperature(Condensed::water));
  }
  return *before - products_less_oxygen(fuel, powers, *water);
}

}  // namespace busbar::combustion
