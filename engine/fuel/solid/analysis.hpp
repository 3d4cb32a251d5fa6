// Proximate and ultimate analyses of solid and liquid fuels.
#pragma once

#include <array>
#include <cstddef>
#include <cstdint>
#include <optional>
#include <span>
#include <string_view>

#include "core/outcome.hpp"
#include "fuel/solid/state.hpp"

namespace busbar::fuel::solid {

/// Parts of an analysis. Hydrogen and oxygen are without those of the moisture (ISO 1170:2020,
/// ISO 16993:2016).
enum class Part : std::uint8_t {
  carbon,
  hydrogen,
  oxygen,
  nitrogen,
  sulphur,
  chlorine,
  ash,
  moisture,
  volatile_matter,
  fixed_carbon,
  count_
};

inline constexpr std::size_t kParts = static_cast<std::size_t>(Part::count_);
inline constexpr std::array kElements{Part::carbon,   Part::hydrogen, Part::oxygen,
                                      Part::nitrogen, Part::sulphur,  Part::chlorine};

/// Shares of mass in one state. A part that is not given counts as nought: where it were not, the
/// sum would tell.
struct Analysis {
  State state = State::dry;
  std::array<double, kParts> share{};
  std::array<bool, kParts> given{};

  [[nodiscard]] double operator[](Part part) const { return share[static_cast<std::size_t>(part)]; }
  [[nodiscard]] bool has(Part part) const { return given[static_cast<std::size_t>(part)]; }
  void set(Part part, double value) {
    share[static_cast<std::size_t>(part)] = value;
    given[static_cast<std::size_t>(part)] = true;
  }
  void drop(Part part) {
    share[static_cast<std::size_t>(part)] = 0;
    given[static_cast<std::size_t>(part)] = false;
  }
  [[nodiscard]] bool has_ultimate() const;   ///< at least one element
  [[nodiscard]] bool has_proximate() const;  ///< volatile matter or fixed carbon
};

/// How far the shares of an analysis may be from one: seven parts, each rounded to a tenth of a
/// percent, and what laboratories let pass (common practice, no source).
inline constexpr double kClosure = 0.005;

/// One line of an analysis as somebody wrote it.
struct Entry {
  std::string_view name;
  double share = 0;
};

/// Symbols ("C", "Cl") and words ("carbon", "volatile matter", "VM"), capitals or not; nullopt for
/// any other word. "H including moisture" and "O including moisture" are read by `read` alone.
std::optional<Part> part_named(std::string_view name);
std::string_view symbol_of(Part part);

/// Sum of the elements, ash and moisture; and of volatile matter, fixed carbon, ash and moisture.
double ultimate_sum(const Analysis& analysis);
double proximate_sum(const Analysis& analysis);

/// Puts an analysis together and checks it. All failures are about argument 1; `row` counts the
/// entry to blame from 1 where there is one.
///  - an unknown or repeated part, a negative share, a share above one;
///  - moisture in a dry state, ash in a dry ash-free one, no moisture in a moist one: without it
///    nobody can tell whether hydrogen includes that of the moisture;
///  - elements, ash and moisture that do not add to one within kClosure, likewise for the proximate
///    analysis; fixed carbon that is left out is what remains (ISO 1213-2);
///  - nothing that burns.
/// Hydrogen and oxygen including moisture lose 0.1119 and 0.8881 of it (ASTM D3180).
Outcome<Analysis> read(State state, std::span<const Entry> entries);

}  // namespace busbar::fuel::solid
