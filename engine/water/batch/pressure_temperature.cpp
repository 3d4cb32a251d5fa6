#include "water/batch/pressure_temperature.hpp"

#include "water/batch/instructions.hpp"
#include "water/batch/targets.hpp"

#undef HWY_TARGET_INCLUDE
#define HWY_TARGET_INCLUDE "water/batch/pressure_temperature.cpp"
#include <hwy/foreach_target.h>

#include "water/batch/kernels.hpp"

HWY_BEFORE_NAMESPACE();
namespace busbar::water::HWY_NAMESPACE {

// clang-format off
#include "water/batch/regions.hpp"
#include "water/batch/pressure_temperature_blocks.hpp"
// clang-format on

// One number of volume, enthalpy and entropy.
template <class Property>
struct One {
  static constexpr std::size_t kColumns = 1;
  static void block(const double* p, const double* t, double* const* out, std::size_t n) {
    run_block<One>(p, t, out, n);
  }
  template <class Equation>
  HWY_INLINE static void gibbs(Lanes pressure, Lanes temperature, Lanes* out) {
    const auto at = gibbs_properties_at<Equation, Property::kWanted>(pressure, temperature);
    out[0] = Property::of(pressure, temperature, at);
  }
  HWY_INLINE static void helmholtz(Lanes density, Lanes pressure, Lanes temperature, Lanes* out) {
    const auto at = helmholtz_properties_at<Property::kWanted>(density, temperature);
    out[0] = Property::of(pressure, temperature, at);
  }
};

using At = PropertiesOf<Lanes>;

struct EnthalpyOf {
  static constexpr unsigned kWanted = kEnthalpy;
  HWY_INLINE static Lanes of(Lanes, Lanes, const At& at) { return at.enthalpy; }
};
struct EntropyOf {
  static constexpr unsigned kWanted = kEntropy;
  HWY_INLINE static Lanes of(Lanes, Lanes, const At& at) { return at.entropy; }
};
struct VolumeOf {
  static constexpr unsigned kWanted = kVolume;
  HWY_INLINE static Lanes of(Lanes, Lanes, const At& at) { return at.volume; }
};
struct DensityOf {
  static constexpr unsigned kWanted = kVolume;
  HWY_INLINE static Lanes of(Lanes, Lanes, const At& at) { return 1.0 / at.volume; }
};
// As in water/properties/energy.cpp.
struct InternalEnergyOf {
  static constexpr unsigned kWanted = kVolume | kEnthalpy;
  HWY_INLINE static Lanes of(Lanes p, Lanes, const At& at) { return at.enthalpy - p * at.volume; }
};
struct HelmholtzEnergyOf {
  static constexpr unsigned kWanted = kAllOutputs;
  HWY_INLINE static Lanes of(Lanes p, Lanes t, const At& at) {
    return at.enthalpy - p * at.volume - t * at.entropy;
  }
};
struct GibbsEnergyOf {
  static constexpr unsigned kWanted = kEnthalpy | kEntropy;
  HWY_INLINE static Lanes of(Lanes, Lanes t, const At& at) { return at.enthalpy - t * at.entropy; }
};

struct VolumeEnthalpyEntropy {
  static constexpr std::size_t kColumns = 3;
  static void block(const double* p, const double* t, double* const* out, std::size_t n) {
    run_block<VolumeEnthalpyEntropy>(p, t, out, n);
  }
  HWY_INLINE static void give(const At& at, Lanes* out) {
    out[0] = at.volume;
    out[1] = at.enthalpy;
    out[2] = at.entropy;
  }
  template <class Equation>
  HWY_INLINE static void gibbs(Lanes pressure, Lanes temperature, Lanes* out) {
    give(gibbs_properties_at<Equation, kAllOutputs>(pressure, temperature), out);
  }
  HWY_INLINE static void helmholtz(Lanes density, Lanes, Lanes temperature, Lanes* out) {
    give(helmholtz_properties_at<kAllOutputs>(density, temperature), out);
  }
};

template <class Property>
inline void one(const double* pressure, const double* temperature, double* out, std::size_t count) {
  run_blocks<One<Property>>(pressure, temperature, &out, count);
}

void enthalpy(const double* p, const double* t, double* out, std::size_t n) {
  one<EnthalpyOf>(p, t, out, n);
}
void entropy(const double* p, const double* t, double* out, std::size_t n) {
  one<EntropyOf>(p, t, out, n);
}
void volume(const double* p, const double* t, double* out, std::size_t n) {
  one<VolumeOf>(p, t, out, n);
}
void density(const double* p, const double* t, double* out, std::size_t n) {
  one<DensityOf>(p, t, out, n);
}
void internal_energy(const double* p, const double* t, double* out, std::size_t n) {
  one<InternalEnergyOf>(p, t, out, n);
}
void helmholtz_energy(const double* p, const double* t, double* out, std::size_t n) {
  one<HelmholtzEnergyOf>(p, t, out, n);
}
void gibbs_energy(const double* p, const double* t, double* out, std::size_t n) {
  one<GibbsEnergyOf>(p, t, out, n);
}
void together(const double* p, const double* t, double* const* out, std::size_t n) {
  run_blocks<VolumeEnthalpyEntropy>(p, t, out, n);
}

}  // namespace busbar::water::HWY_NAMESPACE
HWY_AFTER_NAMESPACE();

#if HWY_ONCE
namespace busbar::water {
namespace batch {

void enthalpy(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(enthalpy)(p, t, out, n);
}
void entropy(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(entropy)(p, t, out, n);
}
void volume(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(volume)(p, t, out, n);
}
void density(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(density)(p, t, out, n);
}
void internal_energy(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(internal_energy)(p, t, out, n);
}
void helmholtz_energy(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(helmholtz_energy)(p, t, out, n);
}
void gibbs_energy(const double* p, const double* t, double* out, std::size_t n) {
  BUSBAR_FOR_PROCESSOR(gibbs_energy)(p, t, out, n);
}
void volume_enthalpy_entropy(const double* p, const double* t, double* volume, double* enthalpy,
                             double* entropy, std::size_t n) {
  double* const out[] = {volume, enthalpy, entropy};
  BUSBAR_FOR_PROCESSOR(together)(p, t, out, n);
}

}  // namespace batch
}  // namespace busbar::water
#endif
