// Basic equations of regions 1, 2 and 5, for plain numbers.
#pragma once

#include "water/constants.hpp"
#include "water/equations/series.hpp"
#include "water/tables/region_1.hpp"
#include "water/tables/region_2.hpp"
#include "water/tables/region_5.hpp"

namespace busbar::water {

#include "water/kernels/gibbs.hpp"

}  // namespace busbar::water
