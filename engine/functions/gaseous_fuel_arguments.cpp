#include "functions/gaseous_fuel_arguments.hpp"

namespace busbar::functions {

GasReading::GasReading(const Composition& analysis, std::uint8_t place) {
  const Outcome<fuel::gaseous::Mixture> mixture = fuel::gaseous::mixture_of(analysis);
  failure_ = mixture.failure().about(place);
  if (mixture) gas = *mixture;
}

GasReading& GasReading::basis(Word word, std::uint8_t place) {
  if (failed()) return *this;
  if (const auto named = fuel::basis_named(word)) {
    heating_value_basis = *named;
    return *this;
  }
  failure_ = {Fault::unknown_word, place,
              "is not a heating-value basis; write \"HHV\" or \"LHV\" (gross and net name the "
              "boundary of a plant)"};
  return *this;
}

GasReading& GasReading::combustion(Temperature temperature, std::uint8_t place) {
  if (failed()) return *this;
  const auto read = fuel::gaseous::combustion_at(temperature.si);
  failure_ = read.failure().about(place);
  if (read) combusted = *read;
  return *this;
}

GasReading& GasReading::metering(Temperature temperature, Pressure pressure, std::uint8_t place) {
  if (failed()) return *this;
  const auto read = fuel::gaseous::metering_at(temperature.si, pressure.si);
  const bool of_pressure = read.failure().argument == 2;
  failure_ = read.failure().about(of_pressure ? static_cast<std::uint8_t>(place + 1) : place);
  if (read) metered = *read;
  return *this;
}

}  // namespace busbar::functions
