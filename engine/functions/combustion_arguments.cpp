#include "functions/combustion_arguments.hpp"

#include "catalogue/sentence.hpp"
#include "core/text.hpp"

namespace busbar::functions {

using combustion::Fuel;
using gas::Element;
using gas::Species;

Outcome<Firing> firing(const Composition& fuel, const gas::Mixture& air) {
  const Outcome<Fuel> read = combustion::fuel_from(fuel);
  if (!read) return read.failure();
  const Outcome<combustion::Oxidant> oxidant = combustion::oxidant_from(air);
  if (!oxidant) return oxidant.failure().about(2);
  return Firing{*read, *oxidant};
}

Outcome<bool> is_wet(Word state, std::uint8_t argument) {
  if (equal_ignoring_case(trimmed(state), "wet")) return true;
  if (equal_ignoring_case(trimmed(state), "dry")) return false;
  return Failure{Fault::unknown_word, argument,
                 "is no state of a flue gas: write \"dry\" or \"wet\""};
}

Outcome<fuel::Basis> heating_value_basis(Word word, std::uint8_t argument) {
  if (const auto basis = fuel::basis_named(word)) return *basis;
  return Failure{Fault::unknown_word, argument,
                 "is not a heating-value basis; write \"HHV\" or \"LHV\" (gross and net name the "
                 "boundary of a plant)"};
}

Text as_text(const Composition& composition) {
  Text text;
  write_composition(text.value, composition);
  return text;
}

void explain_combustion_fuel(const Slot* in, const Result&, UnitSet units, std::string& text) {
  const Outcome<Fuel> fuel = combustion::fuel_from(in[0].composition().composition);
  if (!fuel) return;
  text += fuel->analysed ? " The fuel, by its analysis, is by mass" : " The fuel is by mass";
  struct Named {
    const char* name;
    Element element;
    Species atom;
  };
  constexpr Named kNamed[] = {{"C", Element::C, Species::C},
                              {"H", Element::H, Species::H},
                              {"O", Element::O, Species::O},
                              {"N", Element::N, Species::N},
                              {"S", Element::S, Species::S}};
  constexpr int kDigits = 4;
  const char* separator = " ";
  for (const Named& named : kNamed) {
    const double share = fuel->of(named.element) * gas::molar_mass(named.atom);
    if (!(share > 0)) continue;
    text += separator;
    text += named.name;
    text += ' ';
    append_number(text, share, kDigits);
    separator = ", ";
  }
  if (fuel->ash > 0) {
    text += ", ash ";
    append_number(text, fuel->ash, kDigits);
  }
  text += fuel->analysed ? ", moisture counted with H and O." : ".";
  const auto lower =
      combustion::heat_of_combustion(*fuel, fuel::Basis::lower, combustion::kReferenceTemperature);
  const auto higher =
      combustion::heat_of_combustion(*fuel, fuel::Basis::higher, combustion::kReferenceTemperature);
  if (!lower || !higher) return;
  text += " Its LHV is ";
  append_measure(text, {*lower, Quantity::heating_value}, units);
  text += ", its HHV ";
  append_measure(text, {*higher, Quantity::heating_value}, units);
  text += ", at 25 °C and constant pressure.";
}

void explain_firing(const Slot* in, const Result& result, UnitSet units, std::string& text) {
  explain_combustion_fuel(in, result, units, text);
  const auto fired = firing(in[0].composition().composition, in[1].composition().mixture);
  if (!fired) return;
  text += " It needs ";
  append_number(text, combustion::stoichiometric_air(fired->fuel, fired->air), 6);
  text += " kg of this air per kg.";
}

}  // namespace busbar::functions
