// Flue gas loss by the formula of Siegert: the short way from two temperatures and one gas reading.
#pragma once

#include <cstddef>
#include <span>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::boiler {

/// Coefficients of one fuel at one water content. With temperatures in °C or K and gas readings in
/// per cent by volume, dry:
///   loss in % of the fuel energy on LHV = (t_gas - t_air) (A2/(21 - O2) + B)
///                                       = (t_gas - t_air) (A1/CO2 + B)
///                                       = (t_gas - t_air) f/CO2          (the simple form)
/// What a source does not print is zero.
struct SiegertCoefficients {
  std::string_view fuel;
  double moisture;  ///< mass fraction as fired; negative where the source has no water content
  double oxygen;    ///< A2
  double carbon_dioxide;  ///< A1
  double constant;        ///< B
  double simple;          ///< f
  const char* source;
  bool from_memory;
};

/// Every printed row, a fuel's rows by rising water content.
std::span<const SiegertCoefficients> siegert_table();

/// Loss as a fraction of the fuel energy on LHV, from dry oxygen (a fraction below 0.21), flue gas
/// and air temperature (K). `moisture` is that of the fuel as fired; between two printed water
/// contents the coefficients are interpolated linearly, beyond them the call is refused. A fuel
/// without water content in its source takes none (NaN), a fuel with it needs one.
/// Failures: unknown_word (1), outside_range, missing (5), impossible.
/// Inputs: 1 fuel, 2 gas temperature, 3 air temperature, 4 oxygen, 5 moisture.
Outcome<double> siegert_loss(std::string_view fuel, double gas_temperature, double air_temperature,
                             double oxygen, double moisture);

/// The same from dry carbon dioxide (a fraction), with A1 and B, or f where the source prints the
/// simple form alone. Inputs: 1 fuel, 2 gas temperature, 3 air temperature, 4 carbon dioxide.
Outcome<double> siegert_loss_by_carbon_dioxide(std::string_view fuel, double gas_temperature,
                                               double air_temperature, double carbon_dioxide);

}  // namespace busbar::boiler
