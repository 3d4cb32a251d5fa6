#include "electrical/generator.hpp"

#include <algorithm>
#include <cmath>
#include <numeric>

namespace busbar::electrical {
namespace {

// Beyond these, losses were stated in another unit (common practice, no source): the largest
// hydrogen-cooled machines reach 99.1 %, one of a few kilowatts 80 %.
constexpr double kBestEfficiency = 0.998;
constexpr double kWorstEfficiency = 0.5;

double sum(const Losses& losses) { return std::accumulate(losses.begin(), losses.end(), 0.0); }

// Reactance per unit with which |1 + j x exp(-j phi)| is 1 / field_ratio at rated load.
double diagram_reactance(double rated_power_factor, double field_ratio) {
  const double sine = signed_sine(rated_power_factor, Sense::lagging);
  const double beyond = (1 / field_ratio - 1) * (1 / field_ratio + 1);
  // x = -sine + sqrt(sine^2 + beyond), written so that a small x keeps its digits.
  return beyond / (sine + std::sqrt(sine * sine + beyond));
}

}  // namespace

Outcome<Generator> generator(double apparent_power, double power_factor,
                             std::span<const double> losses, double field_ratio,
                             std::uint8_t losses_at) {
  if (losses.size() != loss_count) {
    return Failure{Fault::wrong_shape,
                   losses_at,
                   "needs six numbers and has {0}; their order is friction and windage, core, "
                   "stator copper, stray load, field copper, excitation",
                   {{{static_cast<double>(losses.size()), Quantity::number}}}};
  }
  Generator machine{apparent_power, power_factor, {}, field_ratio};
  std::copy(losses.begin(), losses.end(), machine.rated.begin());
  if (!(machine.rated[stator_copper] > 0)) {
    return Failure{Fault::impossible, losses_at, "holds no stator copper loss, its third number"};
  }
  const double output = apparent_power * power_factor;
  const double total = sum(machine.rated);
  const double efficiency = output / (output + total);
  if (!(efficiency >= kWorstEfficiency && efficiency <= kBestEfficiency)) {
    return Failure{Fault::impossible,
                   losses_at,
                   "adds up to {0}, which at {1} would be an efficiency of {2}: the unit of the "
                   "losses is not the one that this function reads",
                   {{{total, Quantity::component_power},
                     {output, Quantity::power},
                     {efficiency, Quantity::fraction}}}};
  }
  return machine;
}

double field_current_ratio(double rated_power_factor, double field_ratio, const Load& load) {
  const double drop = load.share * diagram_reactance(rated_power_factor, field_ratio);
  const double along = 1 + drop * signed_sine(load.power_factor, load.sense);
  return field_ratio * std::hypot(along, drop * load.power_factor);
}

Balance balance_at(const Generator& machine, const Load& load) {
  const double current = load.share * load.share;
  const double ratio = field_current_ratio(machine.power_factor, machine.field_ratio, load);
  const double field = ratio * ratio;
  Balance balance;
  balance.output = machine.apparent_power * load.share * load.power_factor;
  balance.losses = machine.rated;
  balance.losses[stator_copper] *= current;
  balance.losses[stray_load] *= current;
  balance.losses[field_copper] *= field;
  balance.losses[excitation] *= field;
  balance.total = sum(balance.losses);
  return balance;
}

double best_load(double rated_power_factor, const Losses& rated, double field_ratio) {
  // The field loss is field (r^2 + 2 r^2 x sin(phi) s + r^2 x^2 s^2) at load s: the middle part
  // grows as the output does and moves no maximum.
  const double still = field_ratio * field_ratio * (rated[field_copper] + rated[excitation]);
  const double reactance = diagram_reactance(rated_power_factor, field_ratio);
  const double constant = rated[friction_and_windage] + rated[core] + still;
  const double square = rated[stator_copper] + rated[stray_load] + still * reactance * reactance;
  return std::sqrt(constant / square);
}

}  // namespace busbar::electrical
