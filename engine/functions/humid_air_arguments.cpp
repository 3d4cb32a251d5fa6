#include "functions/humid_air_arguments.hpp"

#include "catalogue/sentence.hpp"
#include "core/text.hpp"

namespace busbar::functions {
namespace {

const char* name_of(air::Condensate phase) {
  switch (phase) {
    case air::Condensate::ice:
      return "ice (IAPWS R14-08, equation 6)";
    case air::Condensate::supercooled:
      return "supercooled water (Murphy and Koop 2005, equation 10)";
    default:
      return "liquid water (IAPWS-IF97, equation 30)";
  }
}

// Over what the air is saturated at the temperature, argument 2, and how much it then holds.

}  // namespace

Outcome<air::BelowFreezing> below_freezing(std::optional<Word> word, std::uint8_t argument) {
  if (!word) return air::BelowFreezing::unsaid;
  if (equal_ignoring_case(trimmed(*word), "ice")) return air::BelowFreezing::ice;
  if (equal_ignoring_case(trimmed(*word), "water")) return air::BelowFreezing::water;
  return Failure{Fault::unknown_word, argument,
                 "is neither \"ice\" nor \"water\"; a unit set belongs in options, the argument "
                 "after this one"};
}

void append_saturation(std::string& text, double pressure, double temperature,
                       air::BelowFreezing below, UnitSet units) {
  const auto phase = air::condensate_at(temperature, below);
  if (!phase) return;
  const auto saturated = air::saturation(air::place(pressure, temperature), *phase);
  if (!saturated) return;
  text += " Saturation over ";
  text += name_of(*phase);
  text += ": vapour pressure ";
  append_measure(text, {saturated->vapour_pressure, Quantity::pressure}, units);
  text += ", enhancement factor ";
  append_number(text, saturated->enhancement, 6);
  text += ", saturated humidity ratio ";
  append_number(text, air::humidity_ratio_of(saturated->mole_fraction), 6);
  text += '.';
}

}  // namespace busbar::functions
