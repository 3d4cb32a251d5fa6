// Temperature with dryness, volume, entropy or enthalpy.
#include <array>
#include <cmath>
#include <cstddef>

#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/pairs.hpp"
#include "water/properties/response.hpp"
#include "water/solve/assemble.hpp"
#include "water/solve/density.hpp"
#include "water/solve/isobar.hpp"
#include "water/solve/root.hpp"

namespace busbar::water {

namespace {

// Vapour is followed down to this pressure (Pa); the entropy there is above 90 kJ/(kg K).
constexpr double kThinnest = 1e-75;

// How an isotherm is followed: vapour by the logarithm of the pressure, liquid by the pressure,
// region 3 by the density, in which equation 28 is well conditioned.
enum class Kind : unsigned char { vapour, liquid, dense, hot };

// The stretch of an isotherm in one region, in the order of rising pressure.
struct Stretch {
  Kind kind = Kind::vapour;
  double from = 0;
  double to = 0;
  bool ends_on_saturation = false;
  bool begins_on_saturation = false;
};

struct Layout {
  std::array<Stretch, 4> stretches{};
  std::size_t count = 0;
  bool has_saturation = false;
  double saturation_pressure = 0;
  Saturated saturated;
  double seam_pressure = 0;  // of regions 2 and 3; 0 where the isotherm does not cross it
  double highest_pressure = kHighestPressure;
  bool converged = true;

  void add(const Stretch& stretch) { stretches[count++] = stretch; }
};

State state_on(double temperature, Kind kind, double x) {
  switch (kind) {
    case Kind::vapour: {
      const double p = std::exp(x);
      return assembled(Region::vapour, p, temperature, properties_2(p, temperature));
    }
    case Kind::liquid:
      return assembled(Region::liquid, x, temperature, properties_1(x, temperature));
    case Kind::dense:
      return assembled(Region::near_critical, pressure_of_region_3(x, temperature), temperature,
                       properties_3(x, temperature));
    case Kind::hot: {
      const double p = std::exp(x);
      return assembled(Region::high_temperature, p, temperature, properties_5(p, temperature));
    }
  }
  return {};
}

Layout layout(double temperature) {
  Layout out;
  const double t = temperature;
  const double thin = std::log(kThinnest);
  if (t > kHighestTemperature2) {
    out.highest_pressure = kHighestPressure5;
    out.add({Kind::hot, thin, std::log(kHighestPressure5)});
    return out;
  }
  if (t > kHighestTemperature23) {
    out.add({Kind::vapour, thin, std::log(kHighestPressure)});
    return out;
  }
  if (t <= kCriticalTemperature) {
    out.has_saturation = true;
    out.saturation_pressure = *saturation_pressure(t);
    out.saturated = saturated_at(out.saturation_pressure);
    out.converged = out.saturated.converged;
  }
  if (t <= kTemperature13) {
    out.add({Kind::vapour, thin, std::log(out.saturation_pressure), true, false});
    out.add({Kind::liquid, out.saturation_pressure, kHighestPressure, false, true});
    return out;
  }
  const double seam = boundary_23_pressure(t);
  out.seam_pressure = seam;
  const DensityFound thinnest = density_3(seam, t, false);
  const DensityFound densest = density_3(kHighestPressure, t, true);
  out.converged = out.converged && thinnest.converged && densest.converged;
  out.add({Kind::vapour, thin, std::log(seam)});
  if (!out.has_saturation) {
    out.add({Kind::dense, thinnest.density, densest.density});
    return out;
  }
  out.add({Kind::dense, thinnest.density, 1 / out.saturated.vapour.volume, true, false});
  out.add({Kind::dense, 1 / out.saturated.liquid.volume, densest.density, false, true});
  return out;
}

// What is known of the property that is given.
template <Given kGiven>
struct Along;

template <>
struct Along<Given::enthalpy> {
  static constexpr Quantity kQuantity = Quantity::enthalpy;
  // (dh/dp)_T = -cp (dT/dp)_h
  static double falling(const State& state) { return response_of_phase(state).joule_thomson; }
  static bool may_turn(double, Kind) { return true; }
  static double of(const State& state) { return state.enthalpy; }
};

template <>
struct Along<Given::entropy> {
  static constexpr Quantity kQuantity = Quantity::entropy;
  // (ds/dp)_T = -(dv/dT)_p, negative but in cold water
  static double falling(const State& state) { return response_of_phase(state).isobaric_expansion; }
  static bool may_turn(double temperature, Kind kind) {
    constexpr double kWarm = 280;
    return kind == Kind::liquid && temperature < kWarm;
  }
  static double of(const State& state) { return state.entropy; }
};

template <Given kGiven>
class Isotherm {
 public:
  Isotherm(double temperature, double value) : temperature_(temperature), value_(value) {}

  Outcome<State> find() {
    layout_ = layout(temperature_);
    if (!layout_.converged) return not_converged();
    for (std::size_t i = 0; i < layout_.count; ++i) {
      if (!walk(i)) return not_converged();
    }
    if (layout_.has_saturation) add_wet();
    if (hits_ == 0) return outside();
    if (hits_ > 1) {
      return make_failure(Fault::outside_range, 2,
                          "{0} belongs to more than one state at {1}; a pressure would decide",
                          {value_, A::kQuantity}, {temperature_, Quantity::temperature});
    }
    return answer_;
  }

 private:
  using A = Along<kGiven>;

  double value_at(const Stretch& stretch, double x) const {
    return A::of(state_on(temperature_, stretch.kind, x));
  }

  // On the saturation line the value of the saturated state counts, so that no state lies on both
  // sides of it by rounding.
  double end_value(const Stretch& stretch, bool last) const {
    if (last ? stretch.ends_on_saturation : stretch.begins_on_saturation) {
      return given_of<kGiven>(last ? layout_.saturated.vapour : layout_.saturated.liquid);
    }
    return value_at(stretch, last ? stretch.to : stretch.from);
  }

  void hit(const State& state) {
    ++hits_;
    answer_ = state;
    keep();
  }

  void keep() {
    if constexpr (kGiven == Given::enthalpy) {
      answer_.enthalpy = value_;
    } else {
      answer_.entropy = value_;
    }
  }

  // Solves the part of a stretch in which the property only rises or only falls.
  bool monotone(const Stretch& stretch, double from, double to, double at_from, double at_to,
                bool with_from, bool with_to) {
    const double low = std::fmin(at_from, at_to);
    const double high = std::fmax(at_from, at_to);
    if (!(value_ >= low && value_ <= high)) return true;
    if (!with_from && value_ == at_from) return true;
    if (!with_to && value_ == at_to) return true;
    const auto root =
        root_between([&](double x) { return value_at(stretch, x) - value_; }, from, to);
    if (!root) return false;
    hit(state_on(temperature_, stretch.kind, *root));
    return true;
  }

  bool walk(std::size_t index) {
    const Stretch& stretch = layout_.stretches[index];
    const double first = end_value(stretch, false);
    const double last = end_value(stretch, true);
    const bool with_to = !stretch.ends_on_saturation;
    const bool after_seam = layout_.seam_pressure > 0 && index == 1;
    if (after_seam && across_seam(first)) return true;
    // Everything ends is in (from, to]: neighbours share no point.
    const bool with_from = index == 0;
    if (!A::may_turn(temperature_, stretch.kind)) {
      return monotone(stretch, stretch.from, stretch.to, first, last, with_from, with_to);
    }
    // Turning points lie between samples where the slope changes its sign.
    constexpr int kSamples = 12;
    const bool logarithmic = stretch.kind == Kind::vapour || stretch.kind == Kind::hot;
    const double begin = logarithmic ? std::fmin(stretch.to, std::log(1e2)) : stretch.from;
    const auto falling = [&](double x) {
      return A::falling(state_on(temperature_, stretch.kind, x));
    };
    double from = stretch.from;
    double at_from = first;
    bool with = with_from;
    double x = begin;
    double slope = falling(x);
    for (int k = 1; k <= kSamples; ++k) {
      const double next = k == kSamples
                              ? stretch.to
                              : begin + (stretch.to - begin) * k / static_cast<double>(kSamples);
      const double next_slope = falling(next);
      if ((slope < 0) != (next_slope < 0) && next > x) {
        const auto turn = root_between(falling, x, next);
        if (!turn) return false;
        const double at_turn = value_at(stretch, *turn);
        if (!monotone(stretch, from, *turn, at_from, at_turn, with, true)) return false;
        from = *turn;
        at_from = at_turn;
        with = false;
      }
      x = next;
      slope = next_slope;
    }
    return monotone(stretch, from, stretch.to, at_from, last, with, with_to);
  }

  // At the seam of regions 2 and 3 the isotherm either skips a range of the property (the state
  // stays on the seam) or has it twice (region 2 answers). True when the seam or region 2 has
  // answered.
  bool across_seam(double after) {
    const double p = layout_.seam_pressure;
    const State before = assembled(Region::vapour, p, temperature_, properties_2(p, temperature_));
    const double at = A::of(before);
    if (!(value_ > std::fmin(at, after) && value_ < std::fmax(at, after))) return false;
    const bool falls = A::falling(before) > 0;
    const bool gap = falls ? after < at : after > at;
    if (gap) {
      const double density = layout_.stretches[1].from;
      hit(in_gap(Region::vapour, p, temperature_, properties_2(p, temperature_),
                 properties_3(density, temperature_), (value_ - at) / (after - at)));
      return false;  // the rest of region 3 may hold another state
    }
    return hits_ > 0;
  }

  void add_wet() {
    const double liquid = given_of<kGiven>(layout_.saturated.liquid);
    const double vapour = given_of<kGiven>(layout_.saturated.vapour);
    if (!(value_ >= liquid && value_ <= vapour)) return;
    const double width = vapour - liquid;
    State state = two_phase_state(layout_.saturation_pressure, layout_.saturated,
                                  width > 0 ? (value_ - liquid) / width : 0);
    state.temperature = temperature_;
    hit(state);
  }

  Outcome<State> outside() const {
    return make_failure(Fault::outside_range, 2,
                        "{0} belongs to no state at {1} between zero pressure and {2}, the highest "
                        "pressure of IAPWS-IF97 there",
                        {value_, A::kQuantity}, {temperature_, Quantity::temperature},
                        {layout_.highest_pressure, Quantity::pressure});
  }

  double temperature_;
  double value_;
  Layout layout_;
  int hits_ = 0;
  State answer_;
};

// None when the temperature is in range.
Failure check_temperature(double temperature) {
  // Any pressure that is in range at every temperature.
  constexpr double kPressure = 1e3;
  const Outcome<State> any = at_pressure_temperature(kPressure, temperature);
  return any ? Failure{} : any.failure().about(1);
}

Failure beyond(double volume, double limit, double pressure) {
  return make_failure(
      Fault::outside_range, 2,
      "{0} is below {1}, the volume at this temperature and {2}, the highest pressure "
      "of IAPWS-IF97 there",
      {volume, Quantity::volume}, {limit, Quantity::volume}, {pressure, Quantity::pressure});
}

// The pressure at which a region has the volume: it falls as the pressure rises.
template <Properties (*kProperties)(double, double)>
Outcome<State> solve_pressure(Region region, double temperature, double volume, double lowest,
                              double highest) {
  const auto root = root_between(
      [&](double x) {
        const double p = std::exp(x);
        return std::log(kProperties(p, temperature).volume / volume);
      },
      std::log(lowest), std::log(highest));
  if (!root) return not_converged();
  const double p = std::clamp(std::exp(*root), lowest, highest);
  State state = assembled(region, p, temperature, kProperties(p, temperature));
  state.volume = volume;
  return state;
}

}  // namespace

Outcome<State> at_temperature_dryness(double temperature, double dryness) {
  const Outcome<double> pressure = saturation_pressure(temperature);
  if (!pressure) return pressure.failure();
  Outcome<State> state = at_pressure_dryness(*pressure, dryness);
  if (state) (*state).temperature = temperature;
  return state;
}

Outcome<State> at_temperature_entropy(double temperature, double entropy) {
  if (const Failure failure = check_temperature(temperature); failure.fault != Fault::none) {
    return failure;
  }
  if (!std::isfinite(entropy)) return not_finite(2, {entropy, Quantity::entropy});
  return Isotherm<Given::entropy>(temperature, entropy).find();
}

Outcome<State> at_temperature_enthalpy(double temperature, double enthalpy) {
  if (const Failure failure = check_temperature(temperature); failure.fault != Fault::none) {
    return failure;
  }
  if (!std::isfinite(enthalpy)) return not_finite(2, {enthalpy, Quantity::enthalpy});
  return Isotherm<Given::enthalpy>(temperature, enthalpy).find();
}

Outcome<State> at_temperature_volume(double temperature, double volume) {
  if (const Failure failure = check_temperature(temperature); failure.fault != Fault::none) {
    return failure;
  }
  const double t = temperature;
  if (!std::isfinite(volume)) return not_finite(2, {volume, Quantity::volume});
  if (!(volume > 0)) {
    return make_failure(Fault::outside_range, 2, "{0} is not above {1}", {volume, Quantity::volume},
                        {0, Quantity::volume});
  }
  // Far beyond, pressures are too small to be held in a number.
  constexpr double kLargestVolume = 1e200;
  if (volume > kLargestVolume) {
    return make_failure(Fault::outside_range, 2, "{0} is above {1}, the largest that is followed",
                        {volume, Quantity::volume}, {kLargestVolume, Quantity::volume});
  }
  // Vapour at this volume is thinner than an ideal gas ten times as dense.
  const double thin = 0.1 * kGasConstant * t / volume;
  if (t > kHighestTemperature23) {
    const bool hot = t > kHighestTemperature2;
    const double highest = hot ? kHighestPressure5 : kHighestPressure;
    const double least = (hot ? properties_5 : properties_2)(highest, t).volume;
    // An iteration over temperatures may miss the limit by rounding.
    if (volume < least * (1 - 1e-12)) return beyond(volume, least, highest);
    const double low = std::fmin(thin, 0.5 * highest);
    return hot ? solve_pressure<properties_5>(Region::high_temperature, t, volume, low, highest)
               : solve_pressure<properties_2>(Region::vapour, t, volume, low, highest);
  }
  const Layout at = layout(t);
  if (!at.converged) return not_converged();
  if (at.has_saturation && volume >= at.saturated.liquid.volume &&
      volume <= at.saturated.vapour.volume) {
    const double width = at.saturated.vapour.volume - at.saturated.liquid.volume;
    State state = two_phase_state(
        at.saturation_pressure, at.saturated,
        width > 0 ? std::clamp((volume - at.saturated.liquid.volume) / width, 0.0, 1.0) : 0.0);
    state.temperature = t;
    state.volume = volume;
    return state;
  }
  if (t <= kTemperature13) {
    if (volume > at.saturated.vapour.volume) {
      return solve_pressure<properties_2>(Region::vapour, t, volume,
                                          std::fmin(thin, 0.5 * at.saturation_pressure),
                                          at.saturation_pressure);
    }
    const double least = properties_1(kHighestPressure, t).volume;
    if (volume < least * (1 - 1e-12)) return beyond(volume, least, kHighestPressure);
    return solve_pressure<properties_1>(Region::liquid, t, volume, at.saturation_pressure,
                                        kHighestPressure);
  }
  const double seam = at.seam_pressure;
  const Properties vapour = properties_2(seam, t);
  if (volume >= vapour.volume) {
    return solve_pressure<properties_2>(Region::vapour, t, volume, std::fmin(thin, 0.5 * seam),
                                        seam);
  }
  const double thinnest = at.stretches[1].from;
  const double densest = at.stretches[at.count - 1].to;
  if (volume > 1 / thinnest) {
    const Properties dense = properties_3(thinnest, t);
    State state = in_gap(Region::vapour, seam, t, vapour, dense,
                         (volume - vapour.volume) / (dense.volume - vapour.volume));
    state.volume = volume;
    return state;
  }
  const double density = std::fmin(1 / volume, densest);
  if (volume < 1 / densest * (1 - 1e-12)) return beyond(volume, 1 / densest, kHighestPressure);
  State state = assembled(Region::near_critical, pressure_of_region_3(density, t), t,
                          properties_3(density, t));
  // Rounding, and the last hair below the critical temperature (solve/density.hpp).
  state.pressure = std::clamp(state.pressure, seam, kHighestPressure);
  state.volume = volume;
  return state;
}

}  // namespace busbar::water
