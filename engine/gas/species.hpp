// The gas species that Busbar knows, and the liquids and solids beside them.
#pragma once

#include <cstddef>
#include <cstdint>
#include <optional>
#include <string_view>

#include "gas/polynomial.hpp"

namespace busbar::gas {

/// Order of the tables and of species in texts; it may grow at its end.
enum class Species : std::uint8_t {
  // clang-format off
  N2, O2, Ar, CO2, H2O, SO2, CO, H2, OH, O, H, N, NO, NO2, N2O, SO3,
  CH4, C2H2, C2H4, C2H6, C3H8, n_butane, isobutane, n_pentane, isopentane, n_hexane,
  NH3, H2S, He, Ne, CH3OH, C2H5OH, HO2, H2O2, HCN, COS, S, SO, S2, H2SO4, C,
  propylene, butene, benzene, toluene, n_heptane, n_octane, isooctane,
  CH3, HCO, NH, NH2, HNO, jet_fuel, Kr, Xe,
  // clang-format on
  count_
};

inline constexpr std::size_t kSpecies = static_cast<std::size_t>(Species::count_);

enum class Condensed : std::uint8_t {
  graphite,
  ice,
  water,
  methanol,
  ethanol,
  benzene,
  toluene,
  n_octane,
  jet_fuel,
  count_
};

inline constexpr std::size_t kCondensed = static_cast<std::size_t>(Condensed::count_);

enum class Element : std::uint8_t { C, H, O, N, S, Ar, Ne, He, Kr, Xe, count_ };

inline constexpr std::size_t kElementCount = static_cast<std::size_t>(Element::count_);

/// Spelling of a species: its formula, with a letter for the isomer (n-C4H10). The other name is
/// a word (n-butane).
std::string_view name_of(Species species);
std::string_view other_name_of(Species species);
std::string_view name_of(Condensed species);
std::string_view other_name_of(Condensed species);

/// The species of that formula or word, capitals or not.
std::optional<Species> species_named(std::string_view name);
std::optional<Condensed> condensed_named(std::string_view name);

double molar_mass(Species species);  ///< kg/mol, ISO 6976:2016 atomic masses
double molar_mass(Condensed species);
double formation_enthalpy(Species species);  ///< J/mol at 298.15 K, as tabulated
double formation_enthalpy(Condensed species);
unsigned atoms(Species species, Element element);
unsigned atoms(Condensed species, Element element);

double lowest_temperature(Species species);  ///< K, published limit of the fit
double highest_temperature(Species species);
double lowest_temperature(Condensed species);
double highest_temperature(Condensed species);

/// The fits below and from 1,000 K on.
const Polynomial& cold_fit(Species species);
const Polynomial& hot_fit(Species species);

inline const Polynomial& fit(Species species, double temperature) {
  return temperature < kBreak ? cold_fit(species) : hot_fit(species);
}

/// The fit of the interval that holds the temperature; nullptr outside the published range.
const Polynomial* fit(Condensed species, double temperature);

}  // namespace busbar::gas
