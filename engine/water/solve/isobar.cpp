#include "water/solve/isobar.hpp"

#include <algorithm>
#include <cmath>
#include <optional>

#include "water/backward/temperature.hpp"
#include "water/backward/volume.hpp"
#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/failure.hpp"
#include "water/solve/assemble.hpp"
#include "water/solve/bounds.hpp"
#include "water/solve/density.hpp"

namespace busbar::water {

namespace {

// Words and backward equations for one given property.
template <Given kGiven>
struct Property;

template <>
struct Property<Given::enthalpy> : Bounds<Given::enthalpy> {
  static constexpr Quantity kQuantity = Quantity::enthalpy;
  static constexpr const char* kBelow =
      "{0} is below {1}, the enthalpy at {2} and this pressure, the lowest temperature of "
      "IAPWS-IF97";
  static constexpr const char* kAbove =
      "{0} is above {1}, the enthalpy at {2} and this pressure, the highest temperature of "
      "IAPWS-IF97 there";
  static double backward_1(double p, double h) { return backward::temperature_ph_1(p, h); }
  static double backward_2(double p, double h) { return backward::temperature_ph_2(p, h); }
  static double saturation_pressure_3(double h) { return backward::saturation_pressure_h_3(h); }
};

template <>
struct Property<Given::entropy> : Bounds<Given::entropy> {
  static constexpr Quantity kQuantity = Quantity::entropy;
  static constexpr const char* kBelow =
      "{0} is below {1}, the entropy at {2} and this pressure, the lowest temperature of "
      "IAPWS-IF97";
  static constexpr const char* kAbove =
      "{0} is above {1}, the entropy at {2} and this pressure, the highest temperature of "
      "IAPWS-IF97 there";
  static double backward_1(double p, double s) { return backward::temperature_ps_1(p, s); }
  static double backward_2(double p, double s) { return backward::temperature_ps_2(p, s); }
  static double saturation_pressure_3(double s) { return backward::saturation_pressure_s_3(s); }
};

template <Given kGiven>
Properties with_given(Properties properties, double value) {
  if constexpr (kGiven == Given::enthalpy) {
    properties.enthalpy = value;
  } else {
    properties.entropy = value;
  }
  return properties;
}

// Everything on one isobar for one given property.
template <Given kGiven>
class Isobar {
 public:
  Isobar(double pressure, double value) : pressure_(pressure), value_(value) {}

  Outcome<Found> find() { return pressure_ <= kPressure13 ? below_region_3() : through_region_3(); }

 private:
  using Bound = Property<kGiven>;

  static double of(const Properties& properties) { return given_of<kGiven>(properties); }

  Failure below(const Properties& limit) const {
    return make_failure(Fault::outside_range, 2, Bound::kBelow, {value_, Bound::kQuantity},
                        {of(limit), Bound::kQuantity}, {kLowestTemperature, Quantity::temperature});
  }

  Failure above(const Properties& limit, double temperature) const {
    return make_failure(Fault::outside_range, 2, Bound::kAbove, {value_, Bound::kQuantity},
                        {of(limit), Bound::kQuantity}, {temperature, Quantity::temperature});
  }

  template <class Equation>
  Inverse invert(double start, double lowest, double highest) {
    const Inverse inverse =
        invert_gibbs<Equation, kGiven>(pressure_, value_, start, lowest, highest);
    evaluations_ += inverse.evaluations;
    return inverse;
  }

  Found found(const State& state) const { return {state, evaluations_}; }

  // The solution, kept inside the region against the last rounding.
  Outcome<Found> answer(Region region, const Inverse& inverse, double lowest,
                        double highest) const {
    if (!inverse.converged) return not_converged();
    const double temperature = std::clamp(inverse.temperature, lowest, highest);
    return found(assembled(region, pressure_, temperature, inverse.properties));
  }

  // In a gap between the properties of two regions at their boundary.
  Outcome<Found> gap(Region lower_number, double temperature, const Properties& from,
                     const Properties& to) const {
    const double width = of(to) - of(from);
    const double weight = width > 0 ? std::clamp((value_ - of(from)) / width, 0.0, 1.0) : 0.0;
    return found(assembled(lower_number, pressure_, temperature,
                           with_given<kGiven>(mixed(from, to, weight), value_)));
  }

  Outcome<Found> in_region_1(double highest) {
    const Properties lowest = properties_1(pressure_, kLowestTemperature);
    if (value_ < of(lowest)) return below(lowest);
    const Inverse inverse =
        invert<Region1Equation>(Bound::backward_1(pressure_, value_), kLowestTemperature, highest);
    return answer(Region::liquid, inverse, kLowestTemperature, highest);
  }

  // Regions 2 and 5, above the enthalpy or entropy that region 2 has at `lowest`.
  Outcome<Found> in_vapour(double lowest) {
    const Properties top = properties_2(pressure_, kHighestTemperature2);
    if (value_ <= of(top)) {
      const Inverse inverse = invert<Region2Equation>(Bound::backward_2(pressure_, value_), lowest,
                                                      kHighestTemperature2);
      return answer(Region::vapour, inverse, lowest, kHighestTemperature2);
    }
    if (pressure_ > kHighestPressure5) return above(top, kHighestTemperature2);
    const Properties bottom = properties_5(pressure_, kHighestTemperature2);
    if (value_ < of(bottom)) return gap(Region::vapour, kHighestTemperature2, top, bottom);
    const Properties highest = properties_5(pressure_, kHighestTemperature5);
    if (value_ > of(highest)) return above(highest, kHighestTemperature5);
    // Region 5 has no backward equation: the chord between its ends starts the iteration.
    const double share = (value_ - of(bottom)) / (of(highest) - of(bottom));
    const double start =
        kHighestTemperature2 + share * (kHighestTemperature5 - kHighestTemperature2);
    const Inverse inverse =
        invert<Region5Equation>(start, kHighestTemperature2, kHighestTemperature5);
    return answer(Region::high_temperature, inverse, kHighestTemperature2, kHighestTemperature5);
  }

  Outcome<Found> between(const Saturated& saturated) const {
    const double width = of(saturated.vapour) - of(saturated.liquid);
    const double dryness =
        width > 0 ? std::clamp((value_ - of(saturated.liquid)) / width, 0.0, 1.0) : 0.0;
    State state = two_phase_state(pressure_, saturated, dryness);
    if constexpr (kGiven == Given::enthalpy) {
      state.enthalpy = value_;
    } else {
      state.entropy = value_;
    }
    return found(state);
  }

  // A solution well inside a region proves the region, because enthalpy and entropy rise with
  // temperature in each: no boundary needs to be evaluated. Where the start or the solution lies
  // next to a limit nothing is said.
  template <class Equation>
  std::optional<Found> well_inside(Region region, double start, double lowest, double highest) {
    if (!(start > lowest + kMargin && start < highest - kMargin)) return std::nullopt;
    const Inverse inverse = invert<Equation>(start, lowest, highest);
    if (!inverse.converged || inverse.temperature < lowest + kCertain ||
        inverse.temperature > highest - kCertain) {
      return std::nullopt;
    }
    return found(assembled(region, pressure_, inverse.temperature, inverse.properties));
  }

  std::optional<Found> well_inside_region_1(double highest) {
    if (!(value_ > Bound::kBelowRegion1 && value_ < Bound::kAboveRegion1)) return std::nullopt;
    return well_inside<Region1Equation>(Region::liquid, Bound::backward_1(pressure_, value_),
                                        kLowestTemperature, highest);
  }

  std::optional<Found> well_inside_region_2(double lowest) {
    if (!(value_ > Bound::kBelowRegion2 && value_ < Bound::kAboveRegion2)) return std::nullopt;
    return well_inside<Region2Equation>(Region::vapour, Bound::backward_2(pressure_, value_),
                                        lowest, kHighestTemperature2);
  }

  // Up to 16.529 MPa: region 1, the two-phase region, region 2, region 5.
  Outcome<Found> below_region_3() {
    const bool has_liquid = pressure_ >= kLowestSaturationPressure;
    const double saturation =
        has_liquid ? std::min(saturation_temperature_equation(pressure_), kTemperature13)
                   : kLowestTemperature;
    if (has_liquid) {
      if (const auto state = well_inside_region_1(saturation)) return *state;
    }
    if (const auto state = well_inside_region_2(saturation)) return *state;
    if (!has_liquid) {
      const Properties lowest = properties_2(pressure_, kLowestTemperature);
      if (value_ < of(lowest)) return below(lowest);
      return in_vapour(kLowestTemperature);
    }
    if (value_ > Bound::kAboveDome) return in_vapour(saturation);
    const Saturated saturated = saturated_at(pressure_);
    if (value_ < of(saturated.liquid)) return in_region_1(saturated.temperature);
    if (value_ <= of(saturated.vapour)) return between(saturated);
    return in_vapour(saturated.temperature);
  }

  // From 16.529 to 100 MPa: region 1, region 3 (with the two-phase region in it), regions 2 and 5.
  Outcome<Found> through_region_3() {
    if (const auto state = well_inside_region_1(kTemperature13)) return *state;
    const double boundary = std::max(boundary_23_temperature(pressure_), kTemperature13);
    if (value_ > Bound::kAboveBoundary23) {
      if (const auto state = well_inside_region_2(boundary)) return *state;
    }
    if (value_ < Bound::kAboveRegion1 && value_ <= of(properties_1(pressure_, kTemperature13))) {
      return in_region_1(kTemperature13);
    }
    if (pressure_ < kCriticalPressure && may_be_two_phase()) {
      const Saturated saturated = saturated_at(pressure_);
      evaluations_ += saturated.evaluations;
      if (!saturated.converged) return not_converged();
      if (value_ >= of(saturated.liquid) && value_ <= of(saturated.vapour)) {
        return between(saturated);
      }
    }
    if (value_ > Bound::kBelowBoundary23 && value_ >= of(properties_2(pressure_, boundary))) {
      return in_vapour(boundary);
    }
    return in_region_3(boundary);
  }

  // The equations psat(h) and psat(s) of SR3-03(2014) tell on which side of the saturation line a
  // state is, but for their error; so does being far outside the enthalpies of the line.
  bool may_be_two_phase() const {
    if (value_ < Bound::kBelowDome3 || value_ > Bound::kAboveDome3) return false;
    return pressure_ < Bound::saturation_pressure_3(value_) * (1 + kErrorOfDome3) ||
           pressure_ < kPressure13 * (1 + kEndOfDome3);
  }

  Outcome<Found> in_region_3(double boundary) {
    const Inverse inverse = invert_region_3<kGiven>(pressure_, value_);
    evaluations_ += inverse.evaluations;
    if (!inverse.converged) return not_converged();
    if (inverse.temperature < kTemperature13) {
      const DensityFound density = density_3(pressure_, kTemperature13, true);
      evaluations_ += density.evaluations;
      if (!density.converged) return not_converged();
      return gap(Region::liquid, kTemperature13, properties_1(pressure_, kTemperature13),
                 properties_3(density.density, kTemperature13));
    }
    if (inverse.temperature > boundary) {
      const DensityFound density = density_3(pressure_, boundary, false);
      evaluations_ += density.evaluations;
      if (!density.converged) return not_converged();
      return gap(Region::vapour, boundary, properties_3(density.density, boundary),
                 properties_2(pressure_, boundary));
    }
    return answer(Region::near_critical, inverse, kTemperature13, boundary);
  }

  double pressure_;
  double value_;
  int evaluations_ = 0;
};

}  // namespace

Saturated saturated_at(double pressure) {
  Saturated out;
  out.temperature = saturation_temperature_equation(pressure);
  if (pressure <= kPressure13) {
    out.temperature = std::clamp(out.temperature, kLowestTemperature, kTemperature13);
    out.liquid = properties_1(pressure, out.temperature);
    out.vapour = properties_2(pressure, out.temperature);
    out.converged = true;
    return out;
  }
  if (pressure >= kCriticalPressure) {
    out.temperature = kCriticalTemperature;
    out.liquid = properties_3(kCriticalDensity, kCriticalTemperature);
    out.vapour = out.liquid;
    out.converged = true;
    return out;
  }
  out.temperature = std::clamp(out.temperature, kTemperature13, kCriticalTemperature);
  const SaturatedDensities densities = saturated_densities_3(pressure, out.temperature);
  out.liquid = properties_3(densities.liquid, out.temperature);
  out.vapour = properties_3(densities.vapour, out.temperature);
  out.evaluations = densities.evaluations;
  out.converged = densities.converged;
  return out;
}

State two_phase_state(double pressure, const Saturated& saturated, double dryness) {
  State state = assembled(Region::two_phase, pressure, saturated.temperature,
                          mixed(saturated.liquid, saturated.vapour, dryness));
  state.dryness = dryness;
  return state;
}

template <Given kGiven>
Outcome<Found> on_isobar(double pressure, double value) {
  return Isobar<kGiven>(pressure, value).find();
}

template Outcome<Found> on_isobar<Given::enthalpy>(double, double);
template Outcome<Found> on_isobar<Given::entropy>(double, double);

}  // namespace busbar::water
