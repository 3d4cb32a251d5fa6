// The second-order properties from the basic equations, for plain numbers.
#pragma once

#include "water/constants.hpp"
#include "water/equations/arithmetic.hpp"
#include "water/equations/gibbs.hpp"
#include "water/equations/helmholtz.hpp"
#include "water/properties/response.hpp"

namespace busbar::water {

#include "water/kernels/second_order.hpp"

template <class Equation>
inline Response gibbs_response(double pressure, double temperature) {
  return gibbs_response_at<Equation>(pressure, temperature);
}

}  // namespace busbar::water
