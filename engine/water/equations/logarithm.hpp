// The natural logarithm, for plain numbers.
#pragma once

#include "water/equations/arithmetic.hpp"

namespace busbar::water {

#include "water/kernels/logarithm.hpp"

}  // namespace busbar::water
