// The cautions that users meet: in the help, in the function reference and in the box "About
// Busbar".
#pragma once

#include <string_view>

namespace busbar::addin {

inline constexpr std::string_view kCautions =
    "Results serve the appraisal of plants and claims. They never set a safety device, a trip or "
    "an alarm, and they release no pressure part, no electrical work and no operation. Local codes "
    "and licensed practice govern.";

}  // namespace busbar::addin
