#include "fluid/join.hpp"

#include <algorithm>
#include <array>
#include <cmath>
#include <optional>

#include "fluid/condensation.hpp"
#include "fluid/state.hpp"
#include "fluid/water_datum.hpp"
#include "gas/properties.hpp"

namespace busbar::fluid {
namespace {

using gas::Mixture;
using gas::Species;

// Flows that were added and split again differ by rounding only.
constexpr double kSameFlow = 1e-9;

std::optional<gas::Datum> common_datum(std::span<const Stream> streams) {
  std::optional<gas::Datum> common;
  for (const Stream& stream : streams) {
    if (!is_gas(stream)) continue;
    if (common && *common != stream.datum) return std::nullopt;
    common = stream.datum;
  }
  return common;
}

struct Sum {
  double flow = 0;
  double energy = 0;
};

Outcome<Sum> sum_of(std::span<const Stream> streams, std::uint8_t input) {
  Sum sum;
  for (std::size_t i = 0; i < streams.size(); ++i) {
    if (!streams[i].flow) {
      return Failure{
          Fault::missing,
          input,
          "holds a stream without a flow, number {0} of the range; SET_FLOW gives it one",
          {{{static_cast<double>(i + 1), Quantity::number}}}};
    }
    sum.flow += *streams[i].flow;
    sum.energy += *streams[i].flow * formation_enthalpy(streams[i]);
  }
  return sum;
}

// The enthalpy suffices for no gas at all, or for none that keeps its water as vapour.
Failure not_mixed(const Mixture& mixture, double pressure, double enthalpy,
                  const Outcome<double>& temperature) {
  const Outcome<double> dew = dew_point(mixture, pressure);
  const Outcome<double> saturated =
      dew ? gas::enthalpy(mixture, *dew, gas::Datum::formation) : Outcome<double>(dew.failure());
  if (!saturated || enthalpy > *saturated) {
    return temperature ? Failure{Fault::impossible, 1, "mix to a gas below its dew point"}
                       : temperature.failure().about(1);
  }
  return {Fault::impossible,
          1,
          "mix to more water than the gas can hold as vapour: its dew point would be {0}, and the "
          "heat does not suffice to stay above it",
          {{{*dew, Quantity::temperature}}}};
}

}  // namespace

double formation_enthalpy(const Stream& stream) {
  return is_gas(stream) ? stream.enthalpy : stream.enthalpy + water_enthalpy_shift();
}

Outcome<Stream> mixed_gas(std::span<const Stream> streams, double pressure) {
  std::array<double, gas::kSpecies> amounts{};
  double flow = 0;
  double energy = 0;
  for (const Stream& stream : streams) {
    const double part = *stream.flow;
    flow += part;
    energy += part * formation_enthalpy(stream);
    if (!is_gas(stream)) {
      amounts[static_cast<std::size_t>(Species::H2O)] += part / gas::molar_mass(Species::H2O);
      continue;
    }
    const double moles = part / stream.mixture.molar_mass();
    for (std::size_t i = 0; i < stream.mixture.size(); ++i) {
      amounts[static_cast<std::size_t>(stream.mixture.species(i))] +=
          moles * stream.mixture.mole_fraction(i);
    }
  }
  const Outcome<Mixture> mixture = Mixture::from_amounts(amounts);
  if (!mixture) return mixture.failure().about(1);
  const double enthalpy = energy / flow;
  const Outcome<double> temperature =
      gas::temperature_at_enthalpy(*mixture, enthalpy, gas::Datum::formation);
  if (!temperature || check_condensation(*mixture, pressure, *temperature).fault != Fault::none) {
    return not_mixed(*mixture, pressure, enthalpy, temperature);
  }
  Stream mixed;
  mixed.phase = Phase::gas;
  mixed.mixture = *mixture;
  mixed.pressure = pressure;
  mixed.temperature = *temperature;
  mixed.enthalpy = enthalpy;
  mixed.flow = flow;
  mixed.datum = common_datum(streams).value_or(gas::Datum::formation);
  return mixed;
}

Outcome<double> heat_taken(std::span<const Stream> inlets, std::span<const Stream> outlets) {
  const Outcome<Sum> in = sum_of(inlets, 1);
  if (!in) return in.failure();
  const Outcome<Sum> out = sum_of(outlets, 2);
  if (!out) return out.failure();
  if (std::abs(in->flow - out->flow) > kSameFlow * std::max(in->flow, out->flow)) {
    return Failure{Fault::impossible,
                   2,
                   "carry {0} together, but the inlets {1}: what enters must leave",
                   {{{out->flow, Quantity::flow}, {in->flow, Quantity::flow}}}};
  }
  return out->energy - in->energy;
}

}  // namespace busbar::fluid
