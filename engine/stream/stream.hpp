// A stream: a fluid in a state, with a flow or without, as a cell holds it.
#pragma once

#include <array>
#include <cstdint>
#include <limits>
#include <optional>
#include <string_view>

#include "core/outcome.hpp"
#include "core/units.hpp"
#include "gas/datum.hpp"
#include "gas/mixture.hpp"

namespace busbar {

/// What the readable part calls the fluid.
enum class Phase : std::uint8_t { liquid, vapour, two_phase, supercritical, gas, count_ };

/// A plant code or another short name that travels with a stream. Kept inside the stream so that
/// passing streams around never allocates.
class Tag {
 public:
  static constexpr std::size_t kLimit = 40;  ///< bytes of UTF-8

  Tag() = default;

  /// Refuses texts that are too long, hold control characters, brackets or colons, or begin or end
  /// with a space: they would make the stream text ambiguous. Argument 1.
  static Outcome<Tag> from(std::string_view text);

  [[nodiscard]] std::string_view text() const { return {bytes_.data(), size_}; }
  [[nodiscard]] bool empty() const { return size_ == 0; }
  friend bool operator==(const Tag& a, const Tag& b) { return a.text() == b.text(); }

 private:
  std::uint8_t size_ = 0;
  std::array<char, kLimit> bytes_{};
};

/// A stream of water or steam, or of a gas (Phase::gas). SI: Pa, K, J/kg, kg/s. `dryness` is NaN
/// outside the two-phase region; `mixture` is empty but for a gas.
///
/// The enthalpy of water is that of the steam tables, zero near the triple point of the liquid. The
/// enthalpy of a gas always holds its heat of formation, so that gases of different composition
/// balance; `datum` only says how readers show it. The two are 16 MJ per kg of water apart:
/// fluid/join.hpp converts.
struct Stream {
  Phase phase = Phase::liquid;
  double pressure = 0;
  double temperature = 0;
  double enthalpy = 0;
  double dryness = std::numeric_limits<double>::quiet_NaN();
  std::optional<double> flow;
  Tag tag;
  gas::Datum datum = gas::Datum::formation;
  gas::Mixture mixture;
  UnitSet face = UnitSet::metric;  ///< unit set of the readable part that it was read from
};

}  // namespace busbar
