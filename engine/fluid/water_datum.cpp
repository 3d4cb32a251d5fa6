#include "fluid/water_datum.hpp"

#include <cmath>

#include "gas/properties.hpp"
#include "water/state.hpp"

namespace busbar::fluid {
namespace {

// Thin enough that what IF97 adds to the ideal gas (about 7e-6 J/kg per Pa) is below rounding.
constexpr double kThin = 1e-3;
constexpr double kReference = 298.15;

struct Shift {
  double enthalpy;
  double entropy;
};

const Shift& shift() {
  static const Shift found = [] {
    const auto steam = water::at_pressure_temperature(kThin, kReference);
    const auto vapour = gas::caloric(gas::Mixture::of(gas::Species::H2O), kReference);
    // The gas constants of the two differ by 8e-6: each goes down in pressure with its own.
    const double steam_constant = steam->pressure * steam->volume / steam->temperature;
    const double at_one_bar =
        steam->entropy - steam_constant * std::log(gas::kStandardPressure / kThin);
    return Shift{vapour->enthalpy - steam->enthalpy, vapour->entropy - at_one_bar};
  }();
  return found;
}

}  // namespace

double water_enthalpy_shift() { return shift().enthalpy; }

double water_entropy_shift() { return shift().entropy; }

}  // namespace busbar::fluid
