#include "emission/ipcc.hpp"

#include <vector>

#include "core/name_list.hpp"
#include "core/text.hpp"
#include "emission/tables/ipcc2006.hpp"

namespace busbar::emission {
namespace {

const NameList& names() {
  // Never destroyed: reasons of failures point into it.
  static const auto& list = *[] {
    std::vector<std::string_view> all;
    for (const IpccFuel& fuel : ipcc_fuels()) all.push_back(fuel.name);
    return new NameList(std::move(all), "tables 1.2 and 1.4 of IPCC 2006", "IPCC_FACTORS(\"all\")");
  }();
  return list;
}

}  // namespace

std::optional<Bound> bound_named(std::string_view word) {
  if (equal_ignoring_case(trimmed(word), "default")) return Bound::central;
  if (equal_ignoring_case(trimmed(word), "lower")) return Bound::lower;
  if (equal_ignoring_case(trimmed(word), "upper")) return Bound::upper;
  return std::nullopt;
}

double IpccFuel::net_value_si(Bound bound) const {
  return net_value[static_cast<std::size_t>(bound)] * 1e6;
}

double IpccFuel::co2_si(Bound bound) const { return co2[static_cast<std::size_t>(bound)] / 1e12; }

std::span<const IpccFuel> ipcc_fuels() { return tables::kIpcc2006; }

Outcome<const IpccFuel*> ipcc_fuel(std::string_view name) {
  const auto at = names().find(name);
  if (!at) return Failure{Fault::unknown_word, 1, names().unknown(name)};
  return &ipcc_fuels()[*at];
}

}  // namespace busbar::emission
