// A synchronous generator by its rated losses: losses, efficiency and best load at any load and
// power factor, by summation of losses (IEC 60034-2-1).
//
// Loss          follows
// friction and windage, core   nothing: constant speed and terminal voltage
// stator copper, stray load    the square of the stator current
// field copper, excitation     the square of the field current
//
// The field current follows the phasor diagram of a cylindrical rotor, Fitzgerald, Kingsley and
// Umans, section 5.3, with one reactance: that which makes the diagram give the stated rated field
// current from the stated no-load one. Saturation is thus met at rated load and at no load and
// runs straight between. Where a maker states the field current of a load, its loss should be
// summed instead.
#pragma once

#include <array>
#include <cstddef>
#include <span>

#include "core/outcome.hpp"
#include "electrical/excitation_sense.hpp"

namespace busbar::electrical {

/// The order in which losses are stated and reported.
enum Loss : std::size_t {
  friction_and_windage,
  core,
  stator_copper,
  stray_load,
  field_copper,
  excitation,
  loss_count
};
using Losses = std::array<double, loss_count>;  // W

/// The load to which the scaling of losses is carried, of rated apparent power.
inline constexpr double kMostLoad = 1.25;

/// `field_ratio` is the no-load field current at rated voltage over the rated one. The rated point
/// is lagging.
struct Generator {
  double apparent_power = 0;  ///< rated, VA
  double power_factor = 1;    ///< rated
  Losses rated{};             ///< at rated load, W
  double field_ratio = 0;
};

/// Apparent power per unit and power factor of a load.
struct Load {
  double share = 0;  ///< of rated apparent power
  double power_factor = 1;
  Sense sense = Sense::lagging;
};

struct Balance {
  double output = 0;  ///< W
  Losses losses{};    ///< W
  double total = 0;   ///< all losses, W
  [[nodiscard]] double input() const { return output + total; }
  [[nodiscard]] double efficiency() const { return output / input(); }
};

/// A generator from stated figures, apparent power and losses being inputs `apparent_at` and
/// `losses_at`. Refused: other than six losses, no stator copper loss, an efficiency at rated load
/// that no generator has, which means losses in another unit.
Outcome<Generator> generator(double apparent_power, double power_factor,
                             std::span<const double> losses, double field_ratio,
                             std::uint8_t losses_at);

/// Field current over the rated one.
double field_current_ratio(double rated_power_factor, double field_ratio, const Load& load);

Balance balance_at(const Generator& machine, const Load& load);

/// Share of rated apparent power at which the efficiency peaks, the same at every power factor:
/// where the losses that do not depend on load equal those that go with its square.
double best_load(double rated_power_factor, const Losses& rated, double field_ratio);

}  // namespace busbar::electrical
