// What is given together with the pressure.
#pragma once

namespace busbar::water {

enum class Given : unsigned char { enthalpy, entropy };

}  // namespace busbar::water
