#include "air/properties.hpp"

#include "air/humidity.hpp"
#include "air/solve.hpp"
#include "water/failure.hpp"

namespace busbar::air {
namespace {

using water::make_failure;

constexpr double kRoughAir = 1006;      // J/(kg K)
constexpr double kRoughVapour = 1860;   // J/(kg K)
constexpr double kRoughHeat = 2.501e6;  // J/kg

template <double (*kProperty)(const Place&, double)>
Outcome<double> checked(double pressure, double temperature, double humidity_ratio) {
  const Place at = place(pressure, temperature);
  const Failure failure = not_above_saturation(at, humidity_ratio);
  if (failure.fault != Fault::none) return failure;
  return kProperty(at, humidity_ratio);
}

double mixture_density(const Place& at, double humidity_ratio) {
  return (1 + humidity_ratio) / mixture_volume(at, humidity_ratio);
}

}  // namespace

Outcome<double> enthalpy_at(double pressure, double temperature, double humidity_ratio) {
  return checked<mixture_enthalpy>(pressure, temperature, humidity_ratio);
}

Outcome<double> volume_at(double pressure, double temperature, double humidity_ratio) {
  return checked<mixture_volume>(pressure, temperature, humidity_ratio);
}

Outcome<double> density_at(double pressure, double temperature, double humidity_ratio) {
  return checked<mixture_density>(pressure, temperature, humidity_ratio);
}

Outcome<double> temperature_at_enthalpy(double pressure, double enthalpy, double humidity_ratio) {
  const auto excess = [&](double temperature) {
    return mixture_enthalpy(place(pressure, temperature), humidity_ratio) - enthalpy;
  };
  Search search;
  search.low = kColdest;
  search.high = kHottest;
  search.slope = kRoughAir + kRoughVapour * humidity_ratio;
  search.start = kFreezing + (enthalpy - kRoughHeat * humidity_ratio) / search.slope;
  search.tolerance = 1e-9;
  const auto found = find_root(excess, search);
  const bool below = found && *found == kColdest && excess(kColdest) > 0;
  const bool above = found && *found == kHottest && excess(kHottest) < 0;
  if (below || above) {
    return make_failure(Fault::outside_range, 2,
                        "{0} belongs to a temperature outside {1} to {2}, the limits of IAPWS "
                        "G11-15",
                        {enthalpy, Quantity::enthalpy}, {kColdest, Quantity::temperature},
                        {kHottest, Quantity::temperature});
  }
  if (!found) {
    return make_failure(Fault::no_convergence, 2, "{0}: the temperature was not found",
                        {enthalpy, Quantity::enthalpy});
  }
  const Failure failure = not_above_saturation(place(pressure, *found), humidity_ratio);
  if (failure.fault != Fault::none) return failure;
  return *found;
}

}  // namespace busbar::air
