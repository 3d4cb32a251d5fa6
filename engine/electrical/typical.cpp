#include "electrical/typical.hpp"

#include <array>

#include "core/name_list.hpp"

namespace busbar::electrical {
namespace {

constexpr std::array kRanges{
    TypicalRange{"two-pole generator, air", "20 to 300 MVA", 0.980, 0.988},
    TypicalRange{"two-pole generator, hydrogen", "150 to 600 MVA", 0.986, 0.990},
    TypicalRange{"two-pole generator, hydrogen and water", "above 500 MVA", 0.988, 0.991},
    TypicalRange{"four-pole generator", "1000 to 1800 MVA", 0.987, 0.990},
    TypicalRange{"large engine generator", "1 to 20 MVA", 0.960, 0.978},
    TypicalRange{"small engine generator", "0.1 to 1 MVA", 0.92, 0.96},
    TypicalRange{"step-up transformer", "50 to 1000 MVA", 0.995, 0.998},
    TypicalRange{"auxiliary transformer", "", 0.990, 0.995},
    TypicalRange{"gearbox, parallel shafts", "each mesh", 0.980, 0.990},
    TypicalRange{"frequency converter", "", 0.96, 0.98},
};

const NameList& names() {
  // Never destroyed: reasons of failures point into it.
  static const auto& list = *[] {
    std::vector<std::string_view> all;
    all.reserve(kRanges.size());
    for (const TypicalRange& range : kRanges) all.push_back(range.machine);
    return new NameList(std::move(all), "this table", "TYPICAL_ELECTRICAL_EFFICIENCY(\"all\")");
  }();
  return list;
}

}  // namespace

std::span<const TypicalRange> typical_ranges() { return kRanges; }

Outcome<const TypicalRange*> typical_range(std::string_view machine) {
  const auto at = names().find(machine);
  if (!at) return Failure{Fault::unknown_word, 1, names().unknown(machine)};
  return &kRanges[*at];
}

}  // namespace busbar::electrical
