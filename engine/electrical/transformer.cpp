#include "electrical/transformer.hpp"

#include <cmath>

namespace busbar::electrical {
namespace {

// Losses beyond half of what is transformed were stated in another unit (common practice, no
// source): even small transformers are better than 90 %.
Failure too_lossy(double no_load_loss, double load_loss, double apparent_power) {
  const bool second = no_load_loss >= load_loss;
  return {Fault::impossible,
          static_cast<std::uint8_t>(second ? 2 : 3),
          "{0} is out of proportion for {1}: the unit of the losses is not the one that this "
          "function reads",
          {{{second ? no_load_loss : load_loss, Quantity::component_power},
            {apparent_power, Quantity::apparent_power}}}};
}

bool out_of_proportion(double apparent_power, double no_load_loss, double load_loss) {
  return no_load_loss + load_loss >= apparent_power / 2;
}

}  // namespace

double transformer_loss(double no_load_loss, double load_loss, double load) {
  return no_load_loss + load * load * load_loss;
}

Outcome<double> load_loss_at_temperature(double load_loss, double resistance_loss, double from,
                                         double to, Conductor conductor) {
  if (resistance_loss > load_loss) {
    return Failure{
        Fault::impossible,
        2,
        "{0} is above the whole load loss {1} of which it is a part",
        {{{resistance_loss, Quantity::component_power}, {load_loss, Quantity::component_power}}}};
  }
  const double ratio = resistance_ratio(from, to, conductor);
  return resistance_loss * ratio + (load_loss - resistance_loss) / ratio;
}

Outcome<double> transformer_efficiency(double apparent_power, double no_load_loss, double load_loss,
                                       double load, double power_factor) {
  if (out_of_proportion(apparent_power, no_load_loss, load_loss)) {
    return too_lossy(no_load_loss, load_loss, apparent_power);
  }
  const double output = load * apparent_power * power_factor;
  return output / (output + transformer_loss(no_load_loss, load_loss, load));
}

double transformer_best_load(double no_load_loss, double load_loss) {
  return std::sqrt(no_load_loss / load_loss);
}

Outcome<double> peak_efficiency(double apparent_power, double no_load_loss, double load_loss) {
  if (out_of_proportion(apparent_power, no_load_loss, load_loss)) {
    return too_lossy(no_load_loss, load_loss, apparent_power);
  }
  return 1 - 2 * std::sqrt(no_load_loss) * std::sqrt(load_loss) / apparent_power;
}

}  // namespace busbar::electrical
