#include "functions/functions.hpp"

#define XXH_INLINE_ALL
#include <xxhash.h>

#include <algorithm>
#include <array>
#include <string>
#include <vector>

namespace busbar::functions {
namespace {

constexpr std::size_t kLongestName = 40;

std::string capitals(std::string_view name) {
  std::string out(name);
  for (char& c : out) {
    if (c >= 'a' && c <= 'z') c = static_cast<char>(c - 'a' + 'A');
  }
  return out;
}

std::vector<const Row*> gather() {
  std::vector<const Row*> rows;
  for (const auto chapter : {
           steam(),
           streams(),
           machines(),
           limits(),
           performance(),
           electrical_machines(),
           electrical_three_phase(),
           electrical_losses(),
           electrical_generator(),
           electrical_plant(),
           units(),
           explanation(),
           steam_properties(),
           steam_transport(),
           steam_pairs(),
           stream_properties(),
           humid_air(),
           air_properties(),
           air_formulas(),
           compositions(),
           gases(),
           gas_streams(),
           diagrams(),
           fuel_moisture(),
           fuel_library(),
           solid_fuels(),
           solid_fuel_heating_values(),
           combustion_air(),
           combustion_flue_gas(),
           combustion_flames(),
           boiler_losses(),
           gaseous_fuels(),
           gaseous_fuel_tables(),
           gaseous_fuel_data(),
           emission_factors(),
           emissions(),
       }) {
    for (const Row& row : chapter) rows.push_back(&row);
  }
  return rows;
}

std::vector<const Row*> sorted_by_name() {
  std::vector<const Row*> rows = gather();
  std::sort(rows.begin(), rows.end(), [](const Row* a, const Row* b) {
    return std::string_view(a->words.name) < std::string_view(b->words.name);
  });
  return rows;
}

}  // namespace

std::span<const Row* const> all() {
  // Never destroyed: the office may still call while the process ends.
  static const auto& rows = *new std::vector<const Row*>(gather());
  return rows;
}

const Row* find(std::string_view name) {
  if (name.empty() || name.size() > kLongestName) return nullptr;
  static const auto& rows = *new std::vector<const Row*>(sorted_by_name());
  const std::string wanted = capitals(name);
  const auto at = std::lower_bound(
      rows.begin(), rows.end(), std::string_view(wanted),
      [](const Row* row, std::string_view key) { return std::string_view(row->words.name) < key; });
  return at != rows.end() && std::string_view((*at)->words.name) == wanted ? *at : nullptr;
}

std::uint64_t fingerprint() {
  std::string text;
  for (const Row* row : all()) {
    text += row->words.name;
    for (std::size_t i = 0; i < row->arguments.size(); ++i) {
      text += ';';
      text += row->arguments[i].name;
      text += static_cast<char>('0' + static_cast<int>(row->types[i].kind));
      text += row->types[i].optional ? '?' : '!';
    }
    text += row->has_options ? "+\n" : "\n";
  }
  return XXH3_64bits(text.data(), text.size());
}

}  // namespace busbar::functions
