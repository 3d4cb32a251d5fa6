#include "electrical/chain.hpp"

#include <numeric>

namespace busbar::electrical {
namespace {

double sum(std::span<const double> values) {
  return std::accumulate(values.begin(), values.end(), 0.0);
}

}  // namespace

Outcome<double> house_load(std::span<const double> shaft_powers,
                           std::span<const double> efficiencies) {
  if (shaft_powers.size() != efficiencies.size()) {
    return Failure{Fault::wrong_shape,
                   2,
                   "has {0} for {1} shaft powers",
                   {{{static_cast<double>(efficiencies.size()), Quantity::number},
                     {static_cast<double>(shaft_powers.size()), Quantity::number}}}};
  }
  double load = 0;
  for (std::size_t i = 0; i < shaft_powers.size(); ++i) load += shaft_powers[i] / efficiencies[i];
  if (!(load > 0)) {
    return Failure{Fault::zero_or_blank, 1, "is zero or blank throughout: no motor runs"};
  }
  return load;
}

Outcome<Chain> shaft_to_busbar(double shaft, std::span<const double> generator_losses,
                               double auxiliary, std::span<const double> transformer_losses) {
  Chain chain;
  const double lost = sum(generator_losses);
  const double lost_after = sum(transformer_losses);
  if (!(lost > 0)) return Failure{Fault::zero_or_blank, 2, "is zero or blank throughout"};
  if (!(lost_after > 0)) return Failure{Fault::zero_or_blank, 4, "is zero or blank throughout"};
  chain.shaft = shaft;
  chain.gross = shaft - lost;
  if (!(chain.gross > 0)) {
    return Failure{Fault::impossible,
                   2,
                   "adds up to {0}, as much as the shaft power {1} or more",
                   {{{lost, Quantity::component_power}, {shaft, Quantity::power}}}};
  }
  chain.auxiliary = auxiliary;
  chain.transformer = chain.gross - auxiliary;
  if (!(chain.transformer > 0)) {
    return Failure{Fault::impossible,
                   3,
                   "{0} leaves nothing of the gross power {1}",
                   {{{auxiliary, Quantity::power}, {chain.gross, Quantity::power}}}};
  }
  chain.busbar = chain.transformer - lost_after;
  if (!(chain.busbar > 0)) {
    return Failure{
        Fault::impossible,
        4,
        "adds up to {0}, as much as goes into the transformer, {1}, or more",
        {{{lost_after, Quantity::component_power}, {chain.transformer, Quantity::power}}}};
  }
  return chain;
}

}  // namespace busbar::electrical
