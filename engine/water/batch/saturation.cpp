#include "water/batch/saturation.hpp"

#include "water/batch/instructions.hpp"
#include "water/batch/targets.hpp"

#undef HWY_TARGET_INCLUDE
#define HWY_TARGET_INCLUDE "water/batch/saturation.cpp"
#include <hwy/foreach_target.h>

#include "water/batch/kernels.hpp"

HWY_BEFORE_NAMESPACE();
namespace busbar::water::HWY_NAMESPACE {

#include "water/batch/regions.hpp"

// One answer for each state, without sorting: of(first, second).
template <class Property>
struct Straight {
  static constexpr std::size_t kColumns = 1;
  static void block(const double* first, const double* second, double* const* out, std::size_t n) {
    for (std::size_t i = 0; i < n; i += kLanes) {
      store(Property::of(load(first + i), load(second + i)), out[0] + i);
    }
  }
};

HWY_INLINE Mask has_saturation(Lanes pressure, double highest) {
  return (pressure >= kLowestSaturationPressure) & (pressure <= highest);
}

HWY_INLINE Lanes between(Lanes x, double low, double high) {
  return clamped(x, all_lanes(low), all_lanes(high));
}

struct TemperatureOf {
  HWY_INLINE static Lanes of(Lanes p, Lanes) {
    const Lanes t = between(saturation_temperature_at(p), kLowestTemperature, kCriticalTemperature);
    return select(has_saturation(p, kCriticalPressure), t, kNotANumber);
  }
};

struct PressureOf {
  HWY_INLINE static Lanes of(Lanes t, Lanes) {
    const Lanes p =
        between(saturation_pressure_at(t), kLowestSaturationPressure, kCriticalPressure);
    return select((t >= kLowestTemperature) & (t <= kCriticalTemperature), p, kNotANumber);
  }
};

// Saturated liquid and vapour of regions 1 and 2, as saturated_at of solve/isobar.cpp.
template <unsigned kWanted>
struct SaturatedStates {
  PropertiesOf<Lanes> liquid;
  PropertiesOf<Lanes> vapour;
  explicit SaturatedStates(Lanes p) {
    const Lanes t = between(saturation_temperature_at(p), kLowestTemperature, kTemperature13);
    liquid = gibbs_properties_at<Region1Equation, kWanted>(p, t);
    vapour = gibbs_properties_at<Region2Equation, kWanted>(p, t);
  }
};

struct LatentHeatOf {
  HWY_INLINE static Lanes of(Lanes p, Lanes) {
    const SaturatedStates<kEnthalpy> at(p);
    return select(has_saturation(p, kPressure13), at.vapour.enthalpy - at.liquid.enthalpy,
                  kNotANumber);
  }
};

template <unsigned kWanted, Lanes PropertiesOf<Lanes>::*Member>
struct MixtureOf {
  HWY_INLINE static Lanes of(Lanes p, Lanes dryness) {
    const SaturatedStates<kWanted> at(p);
    const Lanes mixture = mixed_at(at.liquid.*Member, at.vapour.*Member, dryness);
    return select(has_saturation(p, kPressure13) & (dryness >= 0.0) & (dryness <= 1.0), mixture,
                  kNotANumber);
  }
};

template <class Property>
inline void on_line(const double* at, double* out, std::size_t n) {
  run_blocks<Straight<Property>>(at, at, &out, n);
}
template <unsigned kWanted, Lanes PropertiesOf<Lanes>::*Member>
inline void mixture(const double* p, const double* x, double* out, std::size_t n) {
  run_blocks<Straight<MixtureOf<kWanted, Member>>>(p, x, &out, n);
}

void saturation_temperature(const double* p, double* out, std::size_t n) {
  on_line<TemperatureOf>(p, out, n);
}
void saturation_pressure(const double* t, double* out, std::size_t n) {
  on_line<PressureOf>(t, out, n);
}
void latent_heat(const double* p, double* out, std::size_t n) { on_line<LatentHeatOf>(p, out, n); }
void volume_at_dryness(const double* p, const double* x, double* out, std::size_t n) {
  mixture<kVolume, &PropertiesOf<Lanes>::volume>(p, x, out, n);
}
void enthalpy_at_dryness(const double* p, const double* x, double* out, std::size_t n) {
  mixture<kEnthalpy, &PropertiesOf<Lanes>::enthalpy>(p, x, out, n);
}
void entropy_at_dryness(const double* p, const double* x, double* out, std::size_t n) {
  mixture<kEntropy, &PropertiesOf<Lanes>::entropy>(p, x, out, n);
}

}  // namespace busbar::water::HWY_NAMESPACE
HWY_AFTER_NAMESPACE();

#if HWY_ONCE
namespace busbar::water {
namespace batch {

void saturation_temperature(const double* p, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(saturation_temperature)(p, out, n);
}
void saturation_pressure(const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(saturation_pressure)(t, out, n);
}
void latent_heat(const double* p, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(latent_heat)(p, out, n);
}
void volume_at_dryness(const double* p, const double* x, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(volume_at_dryness)(p, x, out, n);
}
void enthalpy_at_dryness(const double* p, const double* x, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(enthalpy_at_dryness)(p, x, out, n);
}
void entropy_at_dryness(const double* p, const double* x, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(entropy_at_dryness)(p, x, out, n);
}

}  // namespace batch
}  // namespace busbar::water
#endif
