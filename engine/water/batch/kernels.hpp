// The kernels for the lanes of a vector. Each file of this folder includes it where Highway reads
// the file for one instruction set: no include guard in the usual form, and nothing of std:: that
// makes code, or the linker might keep a copy of a shared function that an older processor cannot
// run.
#if defined(BUSBAR_WATER_BATCH_KERNELS) == defined(HWY_TARGET_TOGGLE)
#ifdef HWY_TARGET_TOGGLE
#undef BUSBAR_WATER_BATCH_KERNELS
#else
#define BUSBAR_WATER_BATCH_KERNELS
#endif

#include <hwy/highway.h>

#include <cstddef>
#include <utility>

#include "water/constants.hpp"
#include "water/solve/bounds.hpp"
#include "water/solve/given.hpp"
#include "water/tables/backward_1.hpp"
#include "water/tables/backward_ph_2.hpp"
#include "water/tables/backward_ph_3.hpp"
#include "water/tables/backward_ps_2.hpp"
#include "water/tables/backward_ps_3.hpp"
#include "water/tables/backward_pt_3_a_to_f.hpp"
#include "water/tables/backward_pt_3_boundaries.hpp"
#include "water/tables/backward_pt_3_g_to_l.hpp"
#include "water/tables/backward_pt_3_m_to_t.hpp"
#include "water/tables/backward_pt_3_u_to_z.hpp"
#include "water/tables/boundary_23.hpp"
#include "water/tables/region_1.hpp"
#include "water/tables/region_2.hpp"
#include "water/tables/region_3.hpp"
#include "water/tables/region_4.hpp"
#include "water/tables/region_5.hpp"

HWY_BEFORE_NAMESPACE();
namespace busbar::water::HWY_NAMESPACE {

// In the order of use.
// clang-format off
#include "water/batch/lanes.hpp"
#include "water/kernels/series.hpp"
#include "water/kernels/gibbs.hpp"
#include "water/kernels/helmholtz.hpp"
#include "water/kernels/saturation.hpp"
#include "water/kernels/logarithm.hpp"
#include "water/kernels/properties.hpp"
#include "water/kernels/inverse.hpp"
#include "water/kernels/density.hpp"
#include "water/kernels/backward.hpp"
#include "water/kernels/subregions.hpp"
#include "water/kernels/response.hpp"
#include "water/kernels/second_order.hpp"
// clang-format on

}  // namespace busbar::water::HWY_NAMESPACE
HWY_AFTER_NAMESPACE();

#endif
