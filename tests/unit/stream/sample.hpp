// Random streams for the tests of their text.
#pragma once

#include <array>
#include <string>

#include "random.hpp"
#include "stream/stream.hpp"
#include "stream/text.hpp"

namespace busbar::sample {

inline std::string text_of(const Stream& stream, UnitSet set = UnitSet::metric) {
  std::string text;
  write_stream(text, stream, set);
  return text;
}

inline UnitSet unit_set(support::Random& random) {
  return static_cast<UnitSet>(random.below(static_cast<std::size_t>(UnitSet::count_)));
}

// Up to as many species as a stream can hold.
inline gas::Mixture mixture(support::Random& random) {
  std::array<double, gas::kSpecies> amounts{};
  const std::size_t count = 1 + random.below(gas::Mixture::kCapacity);
  for (std::size_t k = 0; k < count; ++k) {
    amounts[random.below(gas::kSpecies)] = random.logarithmic(1e-7, 1);
  }
  return *gas::Mixture::from_amounts(amounts);
}

// The numbers need not be those of water: the text carries what it is given.
inline Stream stream(support::Random& random) {
  Stream out;
  out.phase = static_cast<Phase>(random.below(static_cast<std::size_t>(Phase::count_)));
  out.pressure = random.logarithmic(1e-3, 1e8);
  out.temperature = random.uniform(273.15, 2273.15);
  out.enthalpy = random.uniform(-1e4, 7e6);
  if (out.phase == Phase::two_phase) {
    out.dryness = random.chance(0.1) ? double(random.chance(0.5)) : random.uniform(0, 1);
  }
  if (out.phase == Phase::gas) {
    out.mixture = mixture(random);
    out.datum = static_cast<gas::Datum>(random.below(static_cast<std::size_t>(gas::Datum::count_)));
    out.enthalpy = random.uniform(-1.7e7, 2e8);
  }
  if (random.chance(0.6)) out.flow = random.chance(0.05) ? 0.0 : random.logarithmic(1e-6, 1e6);
  if (random.chance(0.5)) {
    static const char* const kTags[] = {"LBA10",
                                        "1",
                                        "HP out",
                                        "Überhitzer",
                                        "日本",
                                        "a, b",
                                        "x=1 #2",
                                        "steam",
                                        "wet steam 5 bar",
                                        "p=1e7 t=2",
                                        "-----------------------------------4567"};
    out.tag = *Tag::from(kTags[random.below(std::size(kTags))]);
  }
  return out;
}

}  // namespace busbar::sample
