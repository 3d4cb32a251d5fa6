#include "water/batch/isobar.hpp"

#include "water/batch/instructions.hpp"
#include "water/batch/targets.hpp"

#undef HWY_TARGET_INCLUDE
#define HWY_TARGET_INCLUDE "water/batch/isobar.cpp"
#include <hwy/foreach_target.h>

#include "water/batch/kernels.hpp"

HWY_BEFORE_NAMESPACE();
namespace busbar::water::HWY_NAMESPACE {

// clang-format off
#include "water/batch/regions.hpp"
#include "water/batch/isobar_blocks.hpp"
// clang-format on

template <Given kGiven, unsigned kGive>
inline void one(const double* p, const double* value, double* out, std::size_t n) {
  run_blocks<IsobarJob<kGiven, kGive>>(p, value, &out, n);
}

void temperature_at_enthalpy(const double* p, const double* h, double* out, std::size_t n) {
  one<Given::enthalpy, kGiveTemperature>(p, h, out, n);
}
void entropy_at_enthalpy(const double* p, const double* h, double* out, std::size_t n) {
  one<Given::enthalpy, kGiveOther>(p, h, out, n);
}
void dryness_at_enthalpy(const double* p, const double* h, double* out, std::size_t n) {
  one<Given::enthalpy, kGiveDryness>(p, h, out, n);
}
void temperature_at_entropy(const double* p, const double* s, double* out, std::size_t n) {
  one<Given::entropy, kGiveTemperature>(p, s, out, n);
}
void enthalpy_at_entropy(const double* p, const double* s, double* out, std::size_t n) {
  one<Given::entropy, kGiveOther>(p, s, out, n);
}
void dryness_at_entropy(const double* p, const double* s, double* out, std::size_t n) {
  one<Given::entropy, kGiveDryness>(p, s, out, n);
}
void temperature_and_entropy(const double* p, const double* h, double* const* out, std::size_t n) {
  run_blocks<IsobarJob<Given::enthalpy, kGiveTemperature | kGiveOther>>(p, h, out, n);
}

}  // namespace busbar::water::HWY_NAMESPACE
HWY_AFTER_NAMESPACE();

#if HWY_ONCE
namespace busbar::water {
namespace batch {

void temperature_at_enthalpy(const double* p, const double* h, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(temperature_at_enthalpy)(p, h, out, n);
}
void entropy_at_enthalpy(const double* p, const double* h, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(entropy_at_enthalpy)(p, h, out, n);
}
void dryness_at_enthalpy(const double* p, const double* h, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(dryness_at_enthalpy)(p, h, out, n);
}
void temperature_at_entropy(const double* p, const double* s, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(temperature_at_entropy)(p, s, out, n);
}
void enthalpy_at_entropy(const double* p, const double* s, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(enthalpy_at_entropy)(p, s, out, n);
}
void dryness_at_entropy(const double* p, const double* s, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(dryness_at_entropy)(p, s, out, n);
}
void temperature_entropy_at_enthalpy(const double* p, const double* h, double* temperature,
                                     double* entropy, std::size_t n) {
  double* const out[] = {temperature, entropy};
  BUSBAR_FOR_PROCESSOR(temperature_and_entropy)(p, h, out, n);
}

}  // namespace batch
}  // namespace busbar::water
#endif
