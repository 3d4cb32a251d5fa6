#include "water/batch/instructions.hpp"
#include "water/batch/pressure_temperature.hpp"
#include "water/batch/targets.hpp"

#undef HWY_TARGET_INCLUDE
#define HWY_TARGET_INCLUDE "water/batch/response.cpp"
#include <hwy/foreach_target.h>

#include "water/batch/kernels.hpp"

HWY_BEFORE_NAMESPACE();
namespace busbar::water::HWY_NAMESPACE {

// clang-format off
#include "water/batch/regions.hpp"
#include "water/batch/pressure_temperature_blocks.hpp"
// clang-format on

// As is_finite of properties/response.cpp.
inline Mask is_finite(const ResponseOf<Lanes>& at) {
  constexpr double kGreatest = 1.7976931348623157e308;
  const Lanes zero{};
  return (at.isobaric_heat_capacity <= kGreatest) & (at.isobaric_heat_capacity > zero) &
         (magnitude(at.isochoric_heat_capacity) <= kGreatest) &
         (magnitude(at.speed_of_sound) <= kGreatest) &
         (magnitude(at.isentropic_exponent) <= kGreatest) &
         (magnitude(at.joule_thomson) <= kGreatest) &
         (magnitude(at.isobaric_expansion) <= kGreatest) &
         (at.isothermal_compressibility <= kGreatest) & (at.isothermal_compressibility > zero);
}

// One second-order property.
template <Lanes ResponseOf<Lanes>::*Member>
struct Responding {
  static constexpr std::size_t kColumns = 1;
  static void block(const double* p, const double* t, double* const* out, std::size_t n) {
    run_block<Responding>(p, t, out, n);
  }
  HWY_INLINE static void give(const ResponseOf<Lanes>& at, Lanes* out) {
    out[0] = select(is_finite(at), at.*Member, kNotANumber);
  }
  template <class Equation>
  HWY_INLINE static void gibbs(Lanes pressure, Lanes temperature, Lanes* out) {
    give(gibbs_response_at<Equation>(pressure, temperature), out);
  }
  // A state carries its volume: the density is its reciprocal, to the last bit.
  HWY_INLINE static void helmholtz(Lanes density, Lanes, Lanes temperature, Lanes* out) {
    give(helmholtz_response_at(1.0 / (1.0 / density), temperature), out);
  }
};

template <Lanes ResponseOf<Lanes>::*Member>
inline void one(const double* p, const double* t, double* out, std::size_t n) {
  run_blocks<Responding<Member>>(p, t, &out, n);
}

void isobaric_heat_capacity(const double* p, const double* t, double* out, std::size_t n) {
  one<&ResponseOf<Lanes>::isobaric_heat_capacity>(p, t, out, n);
}
void isochoric_heat_capacity(const double* p, const double* t, double* out, std::size_t n) {
  one<&ResponseOf<Lanes>::isochoric_heat_capacity>(p, t, out, n);
}
void speed_of_sound(const double* p, const double* t, double* out, std::size_t n) {
  one<&ResponseOf<Lanes>::speed_of_sound>(p, t, out, n);
}
void isentropic_exponent(const double* p, const double* t, double* out, std::size_t n) {
  one<&ResponseOf<Lanes>::isentropic_exponent>(p, t, out, n);
}
void joule_thomson(const double* p, const double* t, double* out, std::size_t n) {
  one<&ResponseOf<Lanes>::joule_thomson>(p, t, out, n);
}
void isobaric_expansion(const double* p, const double* t, double* out, std::size_t n) {
  one<&ResponseOf<Lanes>::isobaric_expansion>(p, t, out, n);
}
void isothermal_compressibility(const double* p, const double* t, double* out, std::size_t n) {
  one<&ResponseOf<Lanes>::isothermal_compressibility>(p, t, out, n);
}

}  // namespace busbar::water::HWY_NAMESPACE
HWY_AFTER_NAMESPACE();

#if HWY_ONCE
namespace busbar::water {
namespace batch {

void isobaric_heat_capacity(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(isobaric_heat_capacity)(p, t, out, n);
}
void isochoric_heat_capacity(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(isochoric_heat_capacity)(p, t, out, n);
}
void speed_of_sound(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(speed_of_sound)(p, t, out, n);
}
void isentropic_exponent(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(isentropic_exponent)(p, t, out, n);
}
void joule_thomson(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(joule_thomson)(p, t, out, n);
}
void isobaric_expansion(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(isobaric_expansion)(p, t, out, n);
}
void isothermal_compressibility(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(isothermal_compressibility)(p, t, out, n);
}

}  // namespace batch
}  // namespace busbar::water
#endif
