// Pressure with volume or internal energy.
#include <cmath>

#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/pairs.hpp"
#include "water/properties/response.hpp"
#include "water/solve/assemble.hpp"
#include "water/solve/density.hpp"
#include "water/solve/isobar.hpp"
#include "water/solve/isobar_volume.hpp"
#include "water/solve/root.hpp"

namespace busbar::water {

namespace {

constexpr const char* kBelow =
    "{0} is below {1}, the value at {2} and this pressure, the lowest temperature of IAPWS-IF97";
constexpr const char* kAbove =
    "{0} is above {1}, the value at {2} and this pressure, the highest temperature of IAPWS-IF97 "
    "there";

double hottest_at(double pressure) {
  return pressure > kHighestPressure5 ? kHighestTemperature2 : kHighestTemperature5;
}

// The volume on one isobar, region by region, with the seam rule of solve/isobar.hpp.
class VolumeOnIsobar {
 public:
  VolumeOnIsobar(double pressure, double volume) : pressure_(pressure), volume_(volume) {}

  Outcome<Found> find(const State& coldest) {
    const Outcome<State> state = search(coldest);
    if (!state) return state.failure();
    return Found{*state, evaluations_};
  }

 private:
  Outcome<State> search(const State& coldest) {
    if (pressure_ < kLowestSaturationPressure) {
      if (volume_ < coldest.volume) return below(coldest.volume);
      return in_vapour(kLowestTemperature);
    }
    double boiling = kTemperature13;
    if (pressure_ <= kCriticalPressure) {
      const Saturated saturated = saturated_at(pressure_);
      if (!saturated.converged) return not_converged();
      if (volume_ >= saturated.liquid.volume && volume_ <= saturated.vapour.volume) {
        return wet(saturated);
      }
      if (pressure_ <= kPressure13) {
        boiling = saturated.temperature;
        return volume_ < saturated.liquid.volume ? in_region_1(coldest, boiling)
                                                 : in_vapour(boiling);
      }
    }
    if (volume_ <= properties_1(pressure_, kTemperature13).volume) {
      return in_region_1(coldest, kTemperature13);
    }
    const double boundary = std::fmax(boundary_23_temperature(pressure_), kTemperature13);
    if (volume_ >= properties_2(pressure_, boundary).volume) return in_vapour(boundary);
    return in_region_3(boundary);
  }

  [[nodiscard]] Failure below(double limit) const {
    return make_failure(Fault::outside_range, 2, kBelow, {volume_, Quantity::volume},
                        {limit, Quantity::volume}, {kLowestTemperature, Quantity::temperature});
  }
  [[nodiscard]] Failure above(double limit, double temperature) const {
    return make_failure(Fault::outside_range, 2, kAbove, {volume_, Quantity::volume},
                        {limit, Quantity::volume}, {temperature, Quantity::temperature});
  }

  [[nodiscard]] State kept(State state) const {
    state.volume = volume_;
    return state;
  }

  [[nodiscard]] Outcome<State> wet(const Saturated& saturated) const {
    const double width = saturated.vapour.volume - saturated.liquid.volume;
    const double dryness = width > 0 ? (volume_ - saturated.liquid.volume) / width : 0;
    return kept(two_phase_state(pressure_, saturated, std::clamp(dryness, 0.0, 1.0)));
  }

  template <Properties (*kProperties)(double, double)>
  [[nodiscard]] Outcome<State> solve(Region region, double lowest, double highest) {
    const auto excess = [&](double t) {
      ++evaluations_;
      return kProperties(pressure_, t).volume - volume_;
    };
    const auto root = root_between(excess, lowest, highest);
    if (!root) return not_converged();
    return kept(assembled(region, pressure_, *root, kProperties(pressure_, *root)));
  }

  [[nodiscard]] Outcome<State> in_region_1(const State& coldest, double highest) {
    double lowest = kLowestTemperature;
    double least = coldest.volume;
    const auto expansion = [&](double t) { return response_1(pressure_, t).isobaric_expansion; };
    if (expansion(lowest) < 0) {
      // Cold water contracts when heated up to the temperature of its greatest density.
      constexpr double kWarm = 280;
      const auto densest = root_between(expansion, lowest, std::fmin(kWarm, highest));
      if (!densest) return not_converged();
      lowest = *densest;
      least = properties_1(pressure_, lowest).volume;
      if (volume_ >= least && volume_ <= coldest.volume) {
        return make_failure(Fault::outside_range, 2,
                            "{0} belongs to two states at this pressure, one on each side of the "
                            "greatest density at {1}",
                            {volume_, Quantity::volume}, {lowest, Quantity::temperature});
      }
    }
    if (volume_ < least) return below(least);
    return solve<properties_1>(Region::liquid, lowest, highest);
  }

  [[nodiscard]] Outcome<State> in_vapour(double lowest) {
    const Properties top = properties_2(pressure_, kHighestTemperature2);
    if (volume_ <= top.volume) {
      return solve<properties_2>(Region::vapour, lowest, kHighestTemperature2);
    }
    if (pressure_ > kHighestPressure5) return above(top.volume, kHighestTemperature2);
    const Properties bottom = properties_5(pressure_, kHighestTemperature2);
    if (volume_ < bottom.volume) return gap(Region::vapour, kHighestTemperature2, top, bottom);
    const Properties highest = properties_5(pressure_, kHighestTemperature5);
    if (volume_ > highest.volume) return above(highest.volume, kHighestTemperature5);
    return solve<properties_5>(Region::high_temperature, kHighestTemperature2,
                               kHighestTemperature5);
  }

  [[nodiscard]] State gap(Region lower_number, double temperature, const Properties& from,
                          const Properties& to) const {
    const double weight = (volume_ - from.volume) / (to.volume - from.volume);
    return kept(in_gap(lower_number, pressure_, temperature, from, to, weight));
  }

  // The density is given: equation 28 at it rises with the temperature.
  [[nodiscard]] Outcome<State> in_region_3(double boundary) {
    const DensityFound cold = density_3(pressure_, kTemperature13, true);
    const DensityFound hot = density_3(pressure_, boundary, false);
    if (!cold.converged || !hot.converged) return not_converged();
    if (volume_ < 1 / cold.density) {
      return gap(Region::liquid, kTemperature13, properties_1(pressure_, kTemperature13),
                 properties_3(cold.density, kTemperature13));
    }
    if (volume_ > 1 / hot.density) {
      return gap(Region::vapour, boundary, properties_3(hot.density, boundary),
                 properties_2(pressure_, boundary));
    }
    const double density = 1 / volume_;
    const auto excess = [&](double t) {
      ++evaluations_;
      return pressure_of_region_3(density, t) - pressure_;
    };
    const auto root = root_between(excess, kTemperature13, boundary);
    if (!root) return not_converged();
    return kept(assembled(Region::near_critical, pressure_, *root, properties_3(density, *root)));
  }

  double pressure_;
  double volume_;
  int evaluations_ = 0;
};

}  // namespace

Outcome<Found> on_isobar_with_volume(double pressure, double volume) {
  const Outcome<State> coldest = at_pressure_temperature(pressure, kLowestTemperature);
  if (!coldest) return coldest.failure().about(1);
  if (!std::isfinite(volume)) return not_finite(2, {volume, Quantity::volume});
  return VolumeOnIsobar(pressure, volume).find(*coldest);
}

Outcome<State> at_pressure_volume(double pressure, double volume) {
  const Outcome<Found> found = on_isobar_with_volume(pressure, volume);
  if (!found) return found.failure();
  return found->state;
}

// (du/dh)_p = 1 - p (dv/dh)_p is positive everywhere, also across wet steam: one root.
Outcome<State> at_pressure_internal_energy(double pressure, double internal_energy) {
  const Outcome<State> coldest = at_pressure_temperature(pressure, kLowestTemperature);
  if (!coldest) return coldest.failure().about(1);
  const Measure value{internal_energy, Quantity::specific_energy};
  if (!std::isfinite(internal_energy)) return not_finite(2, value);
  const Outcome<State> hottest = at_pressure_temperature(pressure, hottest_at(pressure));
  if (!hottest) return hottest.failure().about(1);
  const double lowest = coldest->enthalpy - pressure * coldest->volume;
  const double highest = hottest->enthalpy - pressure * hottest->volume;
  if (internal_energy < lowest) {
    return make_failure(Fault::outside_range, 2, kBelow, value, {lowest, Quantity::specific_energy},
                        {coldest->temperature, Quantity::temperature});
  }
  if (internal_energy > highest) {
    return make_failure(Fault::outside_range, 2, kAbove, value,
                        {highest, Quantity::specific_energy},
                        {hottest->temperature, Quantity::temperature});
  }
  const auto excess = [&](double enthalpy) {
    const Outcome<Found> at = on_isobar<Given::enthalpy>(pressure, enthalpy);
    return at ? enthalpy - pressure * at->state.volume - internal_energy : std::nan("");
  };
  const auto root = root_between(excess, coldest->enthalpy, hottest->enthalpy);
  if (!root || !std::isfinite(*root)) return not_converged();
  const Outcome<Found> at = on_isobar<Given::enthalpy>(pressure, *root);
  if (!at) return at.failure();
  State state = at->state;
  state.enthalpy = internal_energy + pressure * state.volume;
  return state;
}

}  // namespace busbar::water
