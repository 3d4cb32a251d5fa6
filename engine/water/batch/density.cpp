#include "water/solve/density.hpp"

#include "water/batch/instructions.hpp"
#include "water/batch/pressure_temperature.hpp"
#include "water/batch/targets.hpp"

#undef HWY_TARGET_INCLUDE
#define HWY_TARGET_INCLUDE "water/batch/density.cpp"
#include <hwy/foreach_target.h>

#include "water/batch/kernels.hpp"

HWY_BEFORE_NAMESPACE();
namespace busbar::water::HWY_NAMESPACE {

#include "water/batch/regions.hpp"

// Lists of states by subregion. Left to the scalar function: u to z around the critical point, and
// m to p, a narrow band beside them.
enum Subregion : int { kA = 1, kB, kC, kD, kE, kF, kG, kH, kI, kJ, kK, kL, kQ, kR, kS, kT, kEnd };

// Newton's method takes four evaluations at the most where it is let run here; what takes longer is
// left to the scalar function.
inline constexpr int kEvaluations = 6;

// Saturation decides below the critical temperature: 1 for liquid, 0 for vapour and above it,
// kNeither in the last digits beside the line.
inline constexpr double kNeither = 2;

HWY_INLINE Lanes liquid_at(Lanes pressure, Lanes temperature) {
  constexpr double kRounding = 1e-9;
  const Lanes saturation = saturation_pressure_at(temperature);
  const Lanes below = select(pressure >= saturation, 1.0,
                             select(pressure < saturation * (1.0 - kRounding), 0.0, kNeither));
  return select(temperature < kCriticalTemperature, below, 0.0);
}

// SR5-05(2016), table 2, as backward::subregion_3 has it.
HWY_INLINE Lanes subregion_at(Lanes p, Lanes t, Lanes is_liquid) {
  const Mask liquid = is_liquid >= 1.0;
  const Mask under_ab = t <= logarithmic_boundary_of<tables::kBoundary3abPt>(p);
  const Mask under_jk = t <= boundary_of<tables::kBoundary3jk>(p);
  const Lanes above_25 = select(under_ab, kD, select(t <= boundary_3ef_at(p), kE, kF));
  const Lanes under_gh = select(p > 23.5e6, kG, kL);
  const Lanes over_gh = select(p > 23e6, select(t <= boundary_3ef_at(p), kH, kI), kRedo);
  const Lanes above_22 =
      select(under_jk,
             select(t <= boundary_of<tables::kBoundary3ij>(p),
                    select(t <= boundary_of<tables::kBoundary3gh>(p), under_gh, over_gh), kJ),
             kK);
  const Lanes r_or_k = select(under_jk, kR, kK);
  const Lanes above_643 =
      select(t <= boundary_of<tables::kBoundary3qu>(p), kQ,
             select(t <= boundary_of<tables::kBoundary3rx>(p), all_lanes(kRedo), r_or_k));
  const Lanes below_643 = select(liquid, kS, select(p > 20.5e6, r_or_k, kT));
  const Lanes from_cd = select(
      p > 25e6, above_25,
      select(p > 22.5e6, above_22, select(p > kSaturationPressure643, above_643, below_643)));
  const Lanes below_40 = select(p <= kPressure3cd, select(liquid, kC, kT),
                                select(t <= boundary_of<tables::kBoundary3cd>(p), kC, from_cd));
  const Lanes all_pressures = select(p > 40e6, select(under_ab, kA, kB), below_40);
  return select(is_liquid < kNeither, all_pressures, kRedo);
}

#define BUSBAR_START(list, name)                                           \
  case list:                                                               \
    for (std::size_t i = 0; i < n; i += kLanes) {                          \
      store(1.0 / volume_3##name##_at(load(p + i), load(t + i)), out + i); \
    }                                                                      \
    return

inline void start_densities(std::size_t list, const double* p, const double* t, double* out,
                            std::size_t n) {
  switch (list) {
    BUSBAR_START(kA, a);
    BUSBAR_START(kB, b);
    BUSBAR_START(kC, c);
    BUSBAR_START(kD, d);
    BUSBAR_START(kE, e);
    BUSBAR_START(kF, f);
    BUSBAR_START(kG, g);
    BUSBAR_START(kH, h);
    BUSBAR_START(kI, i);
    BUSBAR_START(kJ, j);
    BUSBAR_START(kK, k);
    BUSBAR_START(kL, l);
    BUSBAR_START(kQ, q);
    BUSBAR_START(kR, r);
    BUSBAR_START(kS, s);
    BUSBAR_START(kT, t);
    default:
      for (std::size_t i = 0; i < n; ++i) out[i] = kNotANumber;
  }
}

#undef BUSBAR_START

// newton_in_bracket of solve/density.cpp, lane by lane.
HWY_INLINE Lanes above_critical(Lanes pressure, Lanes temperature, Lanes begin) {
  Lanes low = all_lanes(kLowestDensity);
  Lanes high = all_lanes(kHighestDensity);
  Lanes density = select((begin > low) & (begin < high), begin, 0.5 * (low + high));
  Lanes found = all_lanes(kNotANumber);
  Mask done = density < 0.0;
  for (int i = 0; i < kEvaluations; ++i) {
    const auto at = pressure_slope_at(density, temperature);
    const Lanes missing = pressure - at.pressure;
    low = select(missing > 0.0, density, low);
    high = select(missing > 0.0, high, density);
    const Lanes newton = density + missing / at.per_density;
    const Lanes next = select((newton >= low) & (newton <= high), newton, 0.5 * (low + high));
    const Lanes step = next - density;
    density = next;
    const Mask here = (missing == all_lanes(0.0)) | (magnitude(step) <= kSmallStep * density) |
                      (high - low <= 4e-16 * density);
    found = select(here & !done, density, found);
    done = done | here;
    if (all(done)) break;
  }
  return found;
}

// newton_on_branch of solve/density.cpp, lane by lane. A slope that is not positive is left to it.
HWY_INLINE Lanes on_branch(Lanes pressure, Lanes temperature, Lanes begin, Mask liquid) {
  Lanes density = begin;
  Lanes found = all_lanes(kNotANumber);
  Mask done = density < 0.0;
  for (int i = 0; i < kEvaluations; ++i) {
    const auto at = pressure_slope_at(density, temperature);
    done = done | !(at.per_density > 0.0);
    Lanes step = (pressure - at.pressure) / at.per_density;
    const Mask outward = (liquid & (step >= 0.0)) | ((step <= 0.0) & !liquid);
    if (i > 0) {
      const Mask turned = outward & (magnitude(step) < 1e-4 * density);
      found = select(turned & !done, density, found);
      done = done | turned;
    }
    const Lanes limit = 0.2 * density;
    step = select(magnitude(step) > limit, select(step > 0.0, limit, -limit), step);
    density = density + step;
    const Mask here = magnitude(step) <= kSmallStep * density;
    found = select(here & !done, density, found);
    done = done | here;
    if (all(done)) break;
  }
  return found;
}

inline void density_block(const double* pressure, const double* temperature, double* out,
                          std::size_t n) {
  double p[kPadded];
  double t[kPadded];
  double liquid[kPadded];
  double list[kPadded];
  for (std::size_t i = 0; i < n; ++i) p[i] = pressure[i];
  for (std::size_t i = 0; i < n; ++i) t[i] = temperature[i];
  fill_up(p, n);
  fill_up(t, n);
  for (std::size_t i = 0; i < n; i += kLanes) {
    const Lanes is_liquid = liquid_at(load(p + i), load(t + i));
    store(is_liquid, liquid + i);
    store(subregion_at(load(p + i), load(t + i), is_liquid), list + i);
  }
  double begin[kPadded];
  Sorted<kEnd> subregions;
  subregions.sort(list, n);
  double p_of[kPadded];
  double t_of[kPadded];
  double answers[kPadded];
  for (std::size_t k = 0; k < kEnd; ++k) {
    if (subregions.count[k] == 0) continue;
    subregions.gather(k, p, p_of);
    subregions.gather(k, t, t_of);
    start_densities(k, p_of, t_of, answers, subregions.count[k]);
    subregions.scatter(k, answers, begin);
  }
  fill_up(begin, n);
  // Next to the critical temperature solve/density.hpp has a rule of its own.
  for (std::size_t i = 0; i < n; i += kLanes) {
    const Lanes at = load(t + i);
    const Lanes side = select(at - kCriticalTemperature >= kCriticalBand, 1.0,
                              select(at <= kCriticalTemperature - kCriticalBand, 2.0, kRedo));
    store(side, list + i);
  }
  Sorted<3> sides;
  sides.sort(list, n);
  for (std::size_t i = 0; i < sides.count[0]; ++i) out[sides.place[0][i]] = kNotANumber;
  double begin_of[kPadded];
  double liquid_of[kPadded];
  for (std::size_t k = 1; k < 3; ++k) {
    const std::size_t count = sides.count[k];
    if (count == 0) continue;
    sides.gather(k, p, p_of);
    sides.gather(k, t, t_of);
    sides.gather(k, begin, begin_of);
    sides.gather(k, liquid, liquid_of);
    for (std::size_t i = 0; i < count; i += kLanes) {
      const Lanes from = load(begin_of + i);
      const Lanes at_p = load(p_of + i);
      const Lanes at_t = load(t_of + i);
      // A start that is not a number is passed on.
      const Lanes density = k == 1 ? above_critical(at_p, at_t, from)
                                   : on_branch(at_p, at_t, from, load(liquid_of + i) >= 1.0);
      store(select(from > 0.0, density, kNotANumber), answers + i);
    }
    sides.scatter(k, answers, out);
  }
}

void density_3(const double* pressure, const double* temperature, double* out, std::size_t count) {
  for (std::size_t done = 0; done < count; done += kBlock) {
    const std::size_t n = count - done < kBlock ? count - done : kBlock;
    density_block(pressure + done, temperature + done, out + done, n);
  }
}

}  // namespace busbar::water::HWY_NAMESPACE
HWY_AFTER_NAMESPACE();

#if HWY_ONCE
namespace busbar::water {
namespace batch {

void density_3(const double* pressure, const double* temperature, double* out, std::size_t count) {
  BUSBAR_FOR_PROCESSOR(density_3)(pressure, temperature, out, count);
}

}  // namespace batch
}  // namespace busbar::water
#endif
