// Basic equation of region 3, for plain numbers.
#pragma once

#include "water/constants.hpp"
#include "water/equations/series.hpp"
#include "water/tables/region_3.hpp"

namespace busbar::water {

#include "water/kernels/helmholtz.hpp"

}  // namespace busbar::water
