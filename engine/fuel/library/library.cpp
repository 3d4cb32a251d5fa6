#include "fuel/library/library.hpp"

#include "core/name_list.hpp"
#include "fuel/library/tables.hpp"

namespace busbar::fuel::library {
namespace {

const NameList& names() {
  // Never destroyed: reasons of failures point into it.
  static const auto& list = *[] {
    std::vector<std::string_view> all;
    for (const TypicalFuel& fuel : fuels()) all.push_back(fuel.name);
    return new NameList(std::move(all), "the library of typical fuels", "FUEL_LIBRARY(\"all\")");
  }();
  return list;
}

}  // namespace

std::span<const TypicalFuel> fuels() { return tables::kFuels; }

Outcome<const TypicalFuel*> typical_fuel(std::string_view name) {
  const auto at = names().find(name);
  if (!at) return Failure{Fault::unknown_word, 1, names().unknown(name)};
  return &fuels()[*at];
}

}  // namespace busbar::fuel::library
