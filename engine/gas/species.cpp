#include "gas/species.hpp"

#include <algorithm>
#include <array>
#include <iterator>

#include "gas/tables/condensed_species.hpp"
#include "gas/tables/gas_species.hpp"

namespace busbar::gas {
namespace {

static_assert(std::size(tables::kGasSpecies) == kSpecies);
static_assert(std::size(tables::kCondensedSpecies) == kCondensed);
static_assert(tables::kElements == kElementCount);

constexpr double kGramsPerKilogram = 1000;
constexpr std::size_t kLongestName = 24;

const tables::GasRecord& record(Species species) {
  return tables::kGasSpecies[static_cast<std::size_t>(species)];
}
const tables::CondensedRecord& record(Condensed species) {
  return tables::kCondensedSpecies[static_cast<std::size_t>(species)];
}

// Further spellings: those of ISO 6976, of the NASA records, and of the other side of the Atlantic.
struct Spelling {
  std::string_view name;
  Species species;
};
constexpr Spelling kSpellings[] = {
    {"sulfur dioxide", Species::SO2},
    {"sulfur trioxide", Species::SO3},
    {"hydrogen sulfide", Species::H2S},
    {"carbonyl sulfide", Species::COS},
    {"sulfuric acid", Species::H2SO4},
    {"ethene", Species::C2H4},
    {"ethyne", Species::C2H2},
    {"propene", Species::propylene},
    {"i-butane", Species::isobutane},
    {"iso-butane", Species::isobutane},
    {"2-methylpropane", Species::isobutane},
    {"i-pentane", Species::isopentane},
    {"iso-pentane", Species::isopentane},
    {"2-methylbutane", Species::isopentane},
    {"but-1-ene", Species::butene},
    {"nitrogen monoxide", Species::NO},
    {"steam", Species::H2O},
    {"c2h2,acetylene", Species::C2H2},
    {"c4h10,n-butane", Species::n_butane},
    {"c4h10,isobutane", Species::isobutane},
    {"c5h12,n-pentane", Species::n_pentane},
    {"c5h12,i-pentane", Species::isopentane},
    {"c6h14,n-hexane", Species::n_hexane},
    {"c3h6,propylene", Species::propylene},
    {"c4h8,1-butene", Species::butene},
    {"c7h16,n-heptane", Species::n_heptane},
    {"c8h18,n-octane", Species::n_octane},
    {"c8h18,isooctane", Species::isooctane},
};

constexpr char lower(char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; }

// A name in small letters, in place: comparing needs no memory of its own.
struct Key {
  std::array<char, kLongestName> bytes{};
  std::size_t size = 0;
  Species species = Species::count_;

  [[nodiscard]] constexpr std::string_view text() const { return {bytes.data(), size}; }
};

constexpr Key key(std::string_view name, Species species = Species::count_) {
  Key made;
  made.species = species;
  made.size = name.size();
  for (std::size_t i = 0; i < name.size(); ++i) made.bytes[i] = lower(name[i]);
  return made;
}

consteval auto sorted_names() {
  std::array<Key, 2 * kSpecies + std::size(kSpellings)> names{};
  std::size_t n = 0;
  for (std::size_t i = 0; i < kSpecies; ++i) {
    names[n++] = key(tables::kGasSpecies[i].name, static_cast<Species>(i));
    names[n++] = key(tables::kGasSpecies[i].other_name, static_cast<Species>(i));
  }
  for (const Spelling& spelling : kSpellings) names[n++] = key(spelling.name, spelling.species);
  std::sort(names.begin(), names.end(),
            [](const Key& a, const Key& b) { return a.text() < b.text(); });
  for (std::size_t i = 1; i < n; ++i) {
    if (names[i - 1].text() == names[i].text()) throw "one name for two species";
  }
  return names;
}

constexpr auto kNames = sorted_names();

bool same(std::string_view a, std::string_view b) {
  return a.size() == b.size() && std::equal(a.begin(), a.end(), b.begin(),
                                            [](char x, char y) { return lower(x) == lower(y); });
}

}  // namespace

std::string_view name_of(Species species) { return record(species).name; }
std::string_view other_name_of(Species species) { return record(species).other_name; }
std::string_view name_of(Condensed species) { return record(species).name; }
std::string_view other_name_of(Condensed species) { return record(species).other_name; }

std::optional<Species> species_named(std::string_view name) {
  if (name.empty() || name.size() > kLongestName) return std::nullopt;
  const Key wanted = key(name);
  const auto at =
      std::lower_bound(kNames.begin(), kNames.end(), wanted.text(),
                       [](const Key& entry, std::string_view text) { return entry.text() < text; });
  if (at == kNames.end() || at->text() != wanted.text()) return std::nullopt;
  return at->species;
}

std::optional<Condensed> condensed_named(std::string_view name) {
  for (std::size_t i = 0; i < kCondensed; ++i) {
    const auto species = static_cast<Condensed>(i);
    if (same(name, name_of(species)) || same(name, other_name_of(species))) return species;
  }
  return std::nullopt;
}

double molar_mass(Species species) { return record(species).molar_mass / kGramsPerKilogram; }
double molar_mass(Condensed species) { return record(species).molar_mass / kGramsPerKilogram; }
double formation_enthalpy(Species species) { return record(species).formation_enthalpy; }
double formation_enthalpy(Condensed species) { return record(species).formation_enthalpy; }

unsigned atoms(Species species, Element element) {
  return record(species).atoms[static_cast<std::size_t>(element)];
}
unsigned atoms(Condensed species, Element element) {
  return record(species).atoms[static_cast<std::size_t>(element)];
}

double lowest_temperature(Species species) { return record(species).lowest; }
double highest_temperature(Species species) { return record(species).highest; }
double lowest_temperature(Condensed species) { return record(species).interval[0].lowest; }
double highest_temperature(Condensed species) {
  const tables::CondensedRecord& found = record(species);
  return found.interval[found.intervals - std::size_t{1}].highest;
}

const Polynomial& cold_fit(Species species) { return record(species).cold; }
const Polynomial& hot_fit(Species species) { return record(species).hot; }

const Polynomial* fit(Condensed species, double temperature) {
  const tables::CondensedRecord& found = record(species);
  for (std::size_t i = 0; i < found.intervals; ++i) {
    const tables::Interval& interval = found.interval[i];
    if (temperature >= interval.lowest && temperature <= interval.highest) {
      return &interval.polynomial;
    }
  }
  return nullptr;
}

}  // namespace busbar::gas
