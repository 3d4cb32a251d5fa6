// Names under which an analysis lists a component.
#pragma once

#include <cstddef>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::fuel::gaseous {

/// The component of that name (input 1): the standard's own name, a synonym ("isobutane",
/// "i-butane", "2-methylpropane", "iC4") or a formula that only one component of the standard has
/// ("CH4", "CO2", "H₂S"). Capitals, spaces, hyphens, commas and brackets do not count. A name that
/// means several substances ("C4H10", "butane") or a group ("C6+") is refused with a hint.
Outcome<std::size_t> component_named(std::string_view name);

}  // namespace busbar::fuel::gaseous
