#include "water/solve/enthalpy_entropy.hpp"

#include <algorithm>
#include <cmath>

#include "water/backward/pressure_hs.hpp"
#include "water/constants.hpp"
#include "water/failure.hpp"

namespace busbar::water {

namespace {

// Pressures (Pa) between which the root is sought: no volume can be held in a number far below.
constexpr double kLowest = 1e-290;
constexpr double kHighest = kHighestPressure;

// Where an isentrope leaves the range of temperatures it is continued at the edge, as if the
// entropy that is missing were added there: h + T (s - s_edge). The slope of that is the volume
// again, so the iteration does not notice the edge. Where region 5 ends, above 50 MPa, the
// isentrope goes on with the volume that it has there.
enum class Side : unsigned char { inside, too_cold, too_hot, too_high };

struct Point {
  State state;
  double enthalpy = 0;
  double volume = 0;
  double missing_entropy = 0;  // s - s_edge, outside only
  Side side = Side::inside;
};

Outcome<Point> point_at(double pressure, double entropy) {
  Point point;
  const Outcome<Found> found = on_isobar<Given::entropy>(pressure, entropy);
  if (found) {
    point.state = found->state;
    point.enthalpy = point.state.enthalpy;
    point.volume = point.state.volume;
    return point;
  }
  if (found.failure().fault == Fault::no_convergence) return found.failure();
  const Outcome<State> cold = at_pressure_temperature(pressure, kLowestTemperature);
  if (!cold) return cold.failure();
  point.state = *cold;
  point.side = Side::too_cold;
  if (entropy > cold->entropy) {
    if (pressure > kHighestPressure5) {
      const Outcome<Point> end = point_at(kHighestPressure5, entropy);
      if (!end) return end;
      if (end->state.temperature > kHighestTemperature2) {
        Point beyond = *end;
        beyond.enthalpy += end->volume * (pressure - kHighestPressure5);
        if (end->side == Side::inside) beyond.side = Side::too_high;
        return beyond;
      }
    }
    const Outcome<State> hot = at_pressure_temperature(
        pressure, pressure > kHighestPressure5 ? kHighestTemperature2 : kHighestTemperature5);
    if (!hot) return hot.failure();
    point.state = *hot;
    point.side = Side::too_hot;
  }
  point.missing_entropy = entropy - point.state.entropy;
  point.enthalpy = point.state.enthalpy + point.state.temperature * point.missing_entropy;
  point.volume = point.state.volume;
  return point;
}

Failure outside(double enthalpy, double entropy, const char* reason, Measure limit) {
  return make_failure(Fault::outside_range, 1, reason, {enthalpy, Quantity::enthalpy},
                      {entropy, Quantity::entropy}, limit);
}

// Vapour far from saturation is close to an ideal gas: its enthalpy gives the temperature at a low
// pressure, and the entropy left over gives the pressure.
double ideal_start(double enthalpy, double entropy) {
  constexpr double kLow = 1e3;
  const Outcome<Found> at = on_isobar<Given::enthalpy>(kLow, enthalpy);
  if (!at) return 1e6;
  return kLow * std::exp((at->state.entropy - entropy) / kGasConstant);
}

double start(double enthalpy, double entropy) {
  // Region 5, and vapour below 611 Pa.
  constexpr double kEnthalpyRegion5 = 3.9e6;
  constexpr double kVapourEntropy273 = 9155.759395;
  const bool vapour = enthalpy > kEnthalpyRegion5 || entropy > kVapourEntropy273;
  const double pressure = vapour && enthalpy > 2.4e6 ? ideal_start(enthalpy, entropy)
                                                     : backward::pressure_hs(enthalpy, entropy);
  return std::isfinite(pressure) ? std::clamp(pressure, kLowest, kHighest) : 1e6;
}

Outcome<Found> answer(const Point& point, double enthalpy, double entropy, int points) {
  // An isentrope that ends at the edge of the range may miss it by rounding.
  const double rounding = 1e-10 * std::fmax(std::abs(entropy), kGasConstant);
  if (point.side != Side::inside && std::abs(point.missing_entropy) > rounding) {
    const Measure limit{point.state.temperature, Quantity::temperature};
    return point.side == Side::too_cold
               ? outside(
                     enthalpy, entropy,
                     "{0} with entropy {1} lies below {2}, the lowest temperature of IAPWS-IF97",
                     limit)
               : outside(enthalpy, entropy,
                         "{0} with entropy {1} lies above {2}, the highest temperature of "
                         "IAPWS-IF97 there",
                         limit);
  }
  if (point.side == Side::too_high &&
      point.enthalpy - point.state.enthalpy > 1e-10 * point.state.enthalpy) {
    return outside(
        enthalpy, entropy,
        "{0} with entropy {1} needs a pressure above {2}, the highest of IAPWS-IF97 region "
        "5",
        {kHighestPressure5, Quantity::pressure});
  }
  State state = point.state;
  state.enthalpy = enthalpy;
  state.entropy = entropy;
  return Found{state, points};
}

}  // namespace

Outcome<Found> at_enthalpy_entropy(double enthalpy, double entropy) {
  if (!std::isfinite(enthalpy)) {
    return make_failure(Fault::outside_range, 1, "{0} is not a finite number",
                        {enthalpy, Quantity::enthalpy});
  }
  if (!std::isfinite(entropy)) {
    return make_failure(Fault::outside_range, 2, "{0} is not a finite number",
                        {entropy, Quantity::entropy});
  }
  const double scale = std::fmax(std::abs(enthalpy), kGasConstant * 540);
  const double enough = 2e-13 * scale;
  const double agreed = 1e-10 * scale;

  double low = kLowest;
  double high = kHighest;
  double pressure = start(enthalpy, entropy);
  Point below;  // the point at `low`, once there is one
  bool has_below = false;
  for (int points = 1; points <= kIsentropeCap; ++points) {
    const Outcome<Point> found = point_at(pressure, entropy);
    if (!found) return found.failure();
    const Point& point = *found;
    const double missing = enthalpy - point.enthalpy;
    if (std::abs(missing) <= enough) return answer(point, enthalpy, entropy, points);
    if (missing > 0) {
      if (pressure >= kHighest) {
        if (missing <= agreed) return answer(point, enthalpy, entropy, points);
        return outside(enthalpy, entropy,
                       "{0} with entropy {1} needs a pressure above {2}, the highest of IAPWS-IF97",
                       {kHighestPressure, Quantity::pressure});
      }
      low = pressure;
      below = point;
      has_below = true;
    } else {
      if (pressure <= kLowest) {
        return outside(enthalpy, entropy,
                       "{0} with entropy {1} lies below {2}, the lowest temperature of IAPWS-IF97",
                       {kLowestTemperature, Quantity::temperature});
      }
      high = pressure;
    }
    // Liquid follows the pressure itself, vapour and wet steam its logarithm.
    const bool liquid = point.state.region == Region::liquid ||
                        (point.state.region == Region::near_critical && point.volume < 2.5e-3);
    double next = pressure + missing / point.volume;
    if (!liquid || next < 0.1 * pressure) {
      next = pressure * std::exp(std::clamp(missing / (pressure * point.volume), -3.0, 3.0));
    }
    // A step at a seam makes Newton jump to and fro: from then on the bracket is halved.
    const bool halve = points > 12 && points % 2 == 0;
    if (halve || !(next > low && next < high)) {
      const bool open = high >= kHighest || low <= kLowest;
      if (!halve && open && !(next < high)) {
        next = high;
      } else if (!halve && open && !(next > low)) {
        next = low > kLowest ? std::sqrt(low) * std::sqrt(high) : kLowest;
      } else {
        next = low < 0.5 * high ? std::sqrt(low) * std::sqrt(high) : 0.5 * (low + high);
      }
    }
    if (high - low <= 8 * 2.3e-16 * high || next == pressure) {
      // Converged as far as pressures can be told apart, or at a step: the point below it answers.
      if (std::abs(missing) <= agreed || !has_below) {
        return answer(point, enthalpy, entropy, points);
      }
      return answer(below, enthalpy, entropy, points);
    }
    pressure = next;
  }
  return make_failure(Fault::no_convergence, 0, "the iteration of IAPWS-IF97 did not converge");
}

}  // namespace busbar::water
