// Gross heating values estimated from an analysis by published correlations.
#pragma once

#include <array>
#include <cstdint>
#include <optional>
#include <span>
#include <string_view>

#include "core/outcome.hpp"
#include "fuel/solid/analysis.hpp"

namespace busbar::fuel::solid {

/// What the fuel is, which decides the correlations that were made for it.
enum class Class : std::uint8_t { coal, biomass, other };

/// "coal" (anthracite to lignite, coke), "biomass" (wood, straw, energy crops), "other" (waste,
/// sludge, peat, liquids, blends); nullopt for any other word.
std::optional<Class> class_named(std::string_view word);

/// From where to where a part may reach on dry mass, in percent as published.
struct PartRange {
  Part part = Part::carbon;
  double low = 0;
  double high = 100;
};

enum class Terms : std::uint8_t { linear, grummel_davis, vondracek, friedl, sheng_azevedo };

/// One correlation. Coefficients per percent of dry mass, in the unit of `joules`.
struct Correlation {
  std::string_view name;
  Terms terms = Terms::linear;
  bool proximate = false;
  double joules = 1e6;  ///< J/kg in one unit of the correlation
  std::array<double, kParts> coefficient{};
  std::span<const PartRange> ranges;
  bool for_coal = true;
  bool for_biomass = true;
  bool for_other = true;
  std::string_view error;  ///< as the source reports it
  std::string_view source;
  std::string_view status;  ///< how surely the figures above are the published ones

  [[nodiscard]] bool made_for(Class kind) const;
};

/// All correlations in a fixed order.
std::span<const Correlation> correlations();

/// Its published name, capitals or not; nullptr when there is none.
const Correlation* correlation_named(std::string_view name);

/// The first range that a dry analysis leaves, and the share in percent that leaves it.
struct Outside {
  PartRange range;
  double percent = 0;
};
std::optional<Outside> outside(const Correlation& correlation, const Analysis& dry);

/// Gross heating value of the dry fuel at constant volume, J/kg. Failures (argument 1): the
/// analysis is dry ash-free, lacks the elements or the proximate parts, or leaves the range in
/// which the correlation was fitted.
Outcome<double> hhv_dry(const Correlation& correlation, const Analysis& dry);

}  // namespace busbar::fuel::solid
