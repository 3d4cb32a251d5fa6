// Backward equations at pressure and enthalpy or entropy, for plain numbers.
#pragma once

#include "water/equations/arithmetic.hpp"
#include "water/equations/series.hpp"
#include "water/tables/backward_1.hpp"
#include "water/tables/backward_ph_2.hpp"
#include "water/tables/backward_ph_3.hpp"
#include "water/tables/backward_ps_2.hpp"
#include "water/tables/backward_ps_3.hpp"

namespace busbar::water {

#include "water/kernels/backward.hpp"

}  // namespace busbar::water
