// Sums over a coefficient table, for plain numbers.
#pragma once

#include <utility>

#include "water/tables/term.hpp"

namespace busbar::water {

#include "water/kernels/series.hpp"

}  // namespace busbar::water
