// From the generator coupling to the busbar: gross, house load, net.
#pragma once

#include <span>

#include "core/outcome.hpp"

namespace busbar::electrical {

/// Electrical input of motors (W): shaft powers (input 1, W) over efficiencies (input 2), pair by
/// pair; an efficiency is that of motor and, where there is one, converter.
Outcome<double> house_load(std::span<const double> shaft_powers,
                           std::span<const double> efficiencies);

/// Powers in W.
struct Chain {
  double shaft = 0;        ///< at the generator coupling
  double gross = 0;        ///< at the generator terminals
  double auxiliary = 0;    ///< house load, taken at the generator terminals
  double transformer = 0;  ///< into the step-up transformer
  double busbar = 0;       ///< net, at its high-voltage side
};

/// Shaft power (input 1), generator losses (2), house load (3), transformer losses (4), all W.
/// Impossible where losses or house load leave nothing.
Outcome<Chain> shaft_to_busbar(double shaft, std::span<const double> generator_losses,
                               double auxiliary, std::span<const double> transformer_losses);

}  // namespace busbar::electrical
