// One block of states at pressure and enthalpy or entropy: sorted by the equation that starts the
// way to the answer, solved list by list, and put back in order.
// Read inside the namespace of an instruction set, after batch/regions.hpp.
//
// The choice of region is that of solve/isobar.cpp: a solution well inside a region proves it. What
// lies next to a boundary, above 1073.15 K, or beside the saturation line near the critical point
// is left to the scalar function.

// What a job gives for each state, in this order of columns.
enum Give : unsigned { kGiveTemperature = 1, kGiveOther = 2, kGiveDryness = 4 };

enum List : int { kLiquid = 1, kVapourA, kVapourB, kVapourC, kWet, kDenseA, kDenseB, kLists };

// The equations for one given property.
template <Given kGiven>
struct Property;

template <>
struct Property<Given::enthalpy> : Bounds<Given::enthalpy> {
  static constexpr unsigned kThis = kEnthalpy;
  static constexpr unsigned kOther = kEntropy;
  static Lanes of(const PropertiesOf<Lanes>& at) { return at.enthalpy; }
  static Lanes other(const PropertiesOf<Lanes>& at) { return at.entropy; }
  static Lanes liquid(Lanes p, Lanes h) { return temperature_ph_1_at(p, h); }
  static Lanes vapour_a(Lanes p, Lanes h) { return temperature_ph_2a_at(p, h); }
  static Lanes vapour_b(Lanes p, Lanes h) { return temperature_ph_2b_at(p, h); }
  static Lanes vapour_c(Lanes p, Lanes h) { return temperature_ph_2c_at(p, h); }
  static Mask in_vapour_c(Lanes p, Lanes h) {
    return (p > kPressure2bc) & (h < boundary_2bc_enthalpy_at(p));
  }
  static Mask has_start(Lanes p) { return p > 0.0; }
  static Mask in_dense_a(Lanes p, Lanes h) {
    const Lanes at = select(p > kCriticalPressure, p, kCriticalPressure);
    return h <= boundary_3ab_enthalpy_at(at);
  }
  static Lanes dense_a(Lanes p, Lanes h) { return temperature_ph_3a_at(p, h); }
  static Lanes dense_b(Lanes p, Lanes h) { return temperature_ph_3b_at(p, h); }
  static Lanes volume_a(Lanes p, Lanes h) { return volume_ph_3a_at(p, h); }
  static Lanes volume_b(Lanes p, Lanes h) { return volume_ph_3b_at(p, h); }
  static Lanes dome(Lanes h) { return saturation_pressure_h_3_at(h); }
};

template <>
struct Property<Given::entropy> : Bounds<Given::entropy> {
  static constexpr unsigned kThis = kEntropy;
  static constexpr unsigned kOther = kEnthalpy;
  static Lanes of(const PropertiesOf<Lanes>& at) { return at.entropy; }
  static Lanes other(const PropertiesOf<Lanes>& at) { return at.enthalpy; }
  static Lanes liquid(Lanes p, Lanes s) { return temperature_ps_1_at(p, s); }
  static Lanes vapour_a(Lanes p, Lanes s) { return temperature_ps_2a_at(p, s); }
  static Lanes vapour_b(Lanes p, Lanes s) { return temperature_ps_2b_at(p, s); }
  static Lanes vapour_c(Lanes p, Lanes s) { return temperature_ps_2c_at(p, s); }
  static Mask in_vapour_c(Lanes, Lanes s) { return s < kEntropy2bc; }
  static Mask has_start(Lanes p) { return p >= kLowestPressure2a; }
  static Mask in_dense_a(Lanes, Lanes s) { return s <= kCriticalEntropy; }
  static Lanes dense_a(Lanes p, Lanes s) { return temperature_ps_3a_at(p, s); }
  static Lanes dense_b(Lanes p, Lanes s) { return temperature_ps_3b_at(p, s); }
  static Lanes volume_a(Lanes p, Lanes s) { return volume_ps_3a_at(p, s); }
  static Lanes volume_b(Lanes p, Lanes s) { return volume_ps_3b_at(p, s); }
  static Lanes dome(Lanes s) { return saturation_pressure_s_3_at(s); }
};

// A state of a vector; `known` says in which lanes.
struct Solved {
  Lanes temperature;
  Lanes other;
  Lanes dryness;
  Mask known;
};

// Whether a pressure up to 16.529 MPa has a saturation line and the value may lie between its ends.
template <Given kGiven>
HWY_INLINE Mask may_be_wet(Lanes p, Lanes value) {
  return (p >= kLowestSaturationPressure) & (p <= kPressure13) &
         (value <= Property<kGiven>::kAboveDome);
}

// The list of a state.
template <Given kGiven>
HWY_INLINE Lanes list_at(Lanes p, Lanes value) {
  using Of = Property<kGiven>;
  constexpr double kLeastPressure = 1e-290;
  const Mask below = p <= kPressure13;
  const Mask liquid =
      (p >= kLowestSaturationPressure) & (value > Of::kBelowRegion1) & (value < Of::kAboveRegion1);
  const Mask vapour = (value > Of::kBelowRegion2) & (value < Of::kAboveRegion2) & Of::has_start(p) &
                      (below | (value > Of::kAboveBoundary23));
  const Lanes of_vapour =
      select(p <= kPressure2ab, kVapourA, select(Of::in_vapour_c(p, value), kVapourC, kVapourB));
  const Lanes of_rest = select(below, select(may_be_wet<kGiven>(p, value), kWet, kRedo),
                               select(Of::in_dense_a(p, value), kDenseA, kDenseB));
  const Lanes list = select(liquid, kLiquid, select(vapour, of_vapour, of_rest));
  // A value that is not a number, or an infinite one, reaches no solution and need not be found
  // out.
  return select((p >= kLeastPressure) & (p <= kHighestPressure), list, kRedo);
}

// The limits of a region on an isobar. Where a start lies more than a kelvin inside them by the
// rough saturation line, they matter no more and are not worked out: any that are farther off do as
// well.
inline constexpr double kClear = 1;        // K
inline constexpr double kNearStart = 0.5;  // K; a solution is that near to a start that is clear

HWY_INLINE Lanes end_of_liquid(Lanes p, Lanes start) {
  const Lanes end = all_lanes(kTemperature13);
  const Lanes beside = rough_logarithm(p) - rough_saturation_logarithm(start + kClear);
  const Mask clear = (p > kPressure13) | ((beside > kSurelyLiquid) & (start < end - kClear));
  if (all(clear)) return end;
  const Lanes saturation = saturation_temperature_at(p);
  return select((p > kPressure13) | (end < saturation), end, saturation);
}

HWY_INLINE Lanes begin_of_vapour(Lanes p, Lanes start) {
  const Lanes coldest = all_lanes(kLowestTemperature);
  const Lanes end_of_region_1 = all_lanes(kTemperature13);
  const Lanes beside = rough_logarithm(p) - rough_saturation_logarithm(start - kClear);
  const Mask below = p <= kPressure13;
  const Mask above_line = (start > kTemperature13 + kClear) |
                          ((beside < kSurelyVapour) & (start > kLowestTemperature + kClear));
  const Mask clear = (below & (above_line | (p < kLowestSaturationPressure))) |
                     (start > kHighestTemperature23 + kClear);
  if (all(clear)) return coldest;
  const Lanes saturation = saturation_temperature_at(p);
  const Lanes saturated =
      select(p >= kLowestSaturationPressure,
             select(end_of_region_1 < saturation, end_of_region_1, saturation), coldest);
  if (all(below)) return saturated;
  const Lanes boundary = boundary_23_temperature_at(p);
  return select(below, saturated, select(boundary < end_of_region_1, end_of_region_1, boundary));
}

// The three ways to an answer are large, and shared by jobs and lists: not inlined.

// Inside region 1 or 2, as well_inside of solve/isobar.cpp.
template <class Equation, Given kGiven, bool kOther>
HWY_NOINLINE Solved inside(Lanes p, Lanes value, Lanes start, Lanes lowest, Lanes highest) {
  constexpr unsigned kWanted = kOther ? Property<kGiven>::kOther : 0U;
  Solved out{};
  out.known = (start > lowest + kMargin) & (start < highest - kMargin);
  if (none(out.known)) return out;
  // The scalar code keeps start and iterates inside the limits: where the answer is inside and near
  // the start, they were never reached.
  const auto to = sought<Equation, kGiven, kWanted>(p, value);
  const Lanes tau = first_tau<Equation, kGiven>(to, start);
  const auto last = newton_step<Equation, kGiven, kWanted>(to, tau);
  out.temperature = Equation::kReducingTemperature / (tau + last.step);
  out.known = out.known & (magnitude(last.missed) <= to.enough) &
              (magnitude(out.temperature - start) < kNearStart) &
              (out.temperature >= lowest + kCertain) & (out.temperature <= highest - kCertain);
  if constexpr (kOther) {
    out.other =
        Property<kGiven>::other(after_step<Equation, kGiven, kWanted>(to, last, tau, p, value));
  }
  return out;
}

template <Given kGiven, bool kOther>
HWY_INLINE Solved inside_liquid(Lanes p, Lanes value) {
  const Lanes start = Property<kGiven>::liquid(p, value);
  return inside<Region1Equation, kGiven, kOther>(p, value, start, all_lanes(kLowestTemperature),
                                                 end_of_liquid(p, start));
}

template <Given kGiven, bool kOther>
HWY_INLINE Solved inside_vapour(Lanes p, Lanes value, Lanes start) {
  return inside<Region2Equation, kGiven, kOther>(p, value, start, begin_of_vapour(p, start),
                                                 all_lanes(kHighestTemperature2));
}

// Between saturated liquid and vapour up to 16.529 MPa.
template <Given kGiven, bool kOther>
HWY_NOINLINE Solved wet(Lanes p, Lanes value) {
  using Of = Property<kGiven>;
  constexpr unsigned kWanted = Of::kThis | (kOther ? Of::kOther : 0U);
  Solved out{};
  out.temperature = clamped(saturation_temperature_at(p), all_lanes(kLowestTemperature),
                            all_lanes(kTemperature13));
  const auto liquid = gibbs_properties_at<Region1Equation, kWanted>(p, out.temperature);
  const auto vapour = gibbs_properties_at<Region2Equation, kWanted>(p, out.temperature);
  const Lanes width = Of::of(vapour) - Of::of(liquid);
  out.known = (value >= Of::of(liquid)) & (value <= Of::of(vapour)) & (width > 0.0);
  out.dryness = clamped((value - Of::of(liquid)) / width, all_lanes(0.0), all_lanes(1.0));
  if constexpr (kOther) out.other = mixed_at(Of::other(liquid), Of::other(vapour), out.dryness);
  return out;
}

// Region 3 well away from its boundaries, as through_region_3 and invert_region_3 find it. Three
// evaluations are the rule.
template <Given kGiven, bool kOther, bool kPartA>
HWY_NOINLINE Solved dense(Lanes p, Lanes value) {
  using Of = Property<kGiven>;
  constexpr int kEvaluations = 6;
  const Lanes end_of_region_1 = all_lanes(kTemperature13);
  Lanes boundary = boundary_23_temperature_at(p);
  boundary = select(boundary < end_of_region_1, end_of_region_1, boundary);
  Solved out{};
  // Each boundary is worked out only where it can matter.
  out.known = value >= Of::kAboveRegion1;
  if (!all(out.known)) {
    const auto at = gibbs_properties_at<Region1Equation, Of::kThis>(p, end_of_region_1);
    out.known = out.known | (value > Of::of(at));
  }
  const Mask no_dome =
      (p >= kCriticalPressure) | (value < Of::kBelowDome3) | (value > Of::kAboveDome3);
  if (!all(no_dome)) {
    const Mask above =
        (p >= Of::dome(value) * (1.0 + kErrorOfDome3)) & (p >= kPressure13 * (1.0 + kEndOfDome3));
    out.known = out.known & (no_dome | above);
  }
  const Mask before_23 = value <= Of::kBelowBoundary23;
  if (!all(before_23)) {
    const auto at = gibbs_properties_at<Region2Equation, Of::kThis>(p, boundary);
    out.known = out.known & (before_23 | (value < Of::of(at)));
  }
  if (none(out.known)) return out;
  Lanes temperature = kPartA ? Of::dense_a(p, value) : Of::dense_b(p, value);
  Lanes density = 1.0 / (kPartA ? Of::volume_a(p, value) : Of::volume_b(p, value));
  density = clamped(density, all_lanes(kLeastStart), all_lanes(kGreatestStart));
  temperature = clamped(temperature, all_lanes(kColdestStart), all_lanes(kHottestStart));
  Mask done = !out.known;
  for (int i = 0; i < kEvaluations; ++i) {
    const auto step = newton_step_3<kGiven>(p, value, density, temperature);
    const Mask here = (magnitude(step.density) <= kSmallDensityStep * density) &
                      (magnitude(step.temperature) <= kSmallTemperatureStep * temperature);
    const Mask now = here & !done;
    out.temperature = select(now, temperature + step.temperature, out.temperature);
    if constexpr (kOther) {
      if (!none(now)) {
        out.other = select(now, other_after_step_3<kGiven>(step, density, temperature), out.other);
      }
    }
    done = done | here;
    if (all(done)) break;
    next_in_region_3(step, density, temperature);
  }
  out.known =
      out.known & done & (out.temperature >= kTemperature13) & (out.temperature <= boundary);
  return out;
}

template <Given kGiven, bool kOther>
HWY_INLINE Solved solve(std::size_t list, Lanes p, Lanes value) {
  using Of = Property<kGiven>;
  switch (list) {
    case kLiquid:
      return inside_liquid<kGiven, kOther>(p, value);
    case kVapourA:
      return inside_vapour<kGiven, kOther>(p, value, Of::vapour_a(p, value));
    case kVapourB:
      return inside_vapour<kGiven, kOther>(p, value, Of::vapour_b(p, value));
    case kVapourC:
      return inside_vapour<kGiven, kOther>(p, value, Of::vapour_c(p, value));
    case kWet:
      return wet<kGiven, kOther>(p, value);
    case kDenseA:
      return dense<kGiven, kOther, true>(p, value);
    default:
      return dense<kGiven, kOther, false>(p, value);
  }
}

// Columns of one list.
struct Run {
  double p[kPadded];
  double value[kPadded];
  double temperature[kPadded];
  double other[kPadded];
  double dryness[kPadded];
};

template <Given kGiven, unsigned kGive>
inline void isobar_block(const double* pressure, const double* value, double* const* out,
                         std::size_t n) {
  constexpr bool kOther = (kGive & kGiveOther) != 0;
  double list[kPadded];
  for (std::size_t i = 0; i < n; i += kLanes) {
    const Lanes p = load(pressure + i);
    const Lanes given = load(value + i);
    // Only wet states have a dryness.
    const Lanes of = (kGive & kGiveDryness) != 0 ? select(may_be_wet<kGiven>(p, given), kWet, kRedo)
                                                 : list_at<kGiven>(p, given);
    store(of, list + i);
  }
  Sorted<kLists> sorted;
  sorted.sort(list, n);
  Run run;
  // kWet stands behind the lists from which it gets more.
  for (std::size_t k = 1; k < kLists; ++k) {
    const std::size_t count = sorted.count[k];
    if (count == 0) continue;
    sorted.gather(k, pressure, run.p);
    sorted.gather(k, value, run.value);
    for (std::size_t i = 0; i < count; i += kLanes) {
      const Solved at = solve<kGiven, kOther>(k, load(run.p + i), load(run.value + i));
      store(select(at.known, at.temperature, kNotANumber), run.temperature + i);
      if constexpr (kOther) store(select(at.known, at.other, kNotANumber), run.other + i);
      store(select(at.known, at.dryness, kNotANumber), run.dryness + i);
    }
    double* const* column = out;
    if constexpr ((kGive & kGiveTemperature) != 0) sorted.scatter(k, run.temperature, *column++);
    if constexpr (kOther) sorted.scatter(k, run.other, *column++);
    if constexpr ((kGive & kGiveDryness) != 0) sorted.scatter(k, run.dryness, *column++);
    if (k >= kWet) continue;
    for (std::size_t i = 0; i < count; ++i) {
      if (run.temperature[i] > 0) continue;  // solved
      const bool wet_too = run.p[i] >= kLowestSaturationPressure && run.p[i] <= kPressure13 &&
                           run.value[i] <= Property<kGiven>::kAboveDome;
      if (wet_too) sorted.place[kWet][sorted.count[kWet]++] = sorted.place[k][i];
    }
  }
  for (std::size_t i = 0; i < sorted.count[0]; ++i) {
    double* const* column = out;
    if constexpr ((kGive & kGiveTemperature) != 0) (*column++)[sorted.place[0][i]] = kNotANumber;
    if constexpr (kOther) (*column++)[sorted.place[0][i]] = kNotANumber;
    if constexpr ((kGive & kGiveDryness) != 0) (*column++)[sorted.place[0][i]] = kNotANumber;
  }
}

template <Given kGiven, unsigned kGive>
struct IsobarJob {
  static constexpr std::size_t kColumns = ((kGive & kGiveTemperature) != 0 ? 1U : 0U) +
                                          ((kGive & kGiveOther) != 0 ? 1U : 0U) +
                                          ((kGive & kGiveDryness) != 0 ? 1U : 0U);
  static void block(const double* pressure, const double* value, double* const* out,
                    std::size_t n) {
    isobar_block<kGiven, kGive>(pressure, value, out, n);
  }
};
