// Dew points of acids in flue gas by published correlations.
#pragma once

#include <cstdint>
#include <optional>
#include <span>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::combustion {

enum class AcidDewPoint : std::uint8_t {
  verhoff_banchero,    ///< sulfuric acid, from SO3
  okkes,               ///< sulfuric acid, from SO3
  zarenezhad,          ///< sulfuric acid, from SO3
  kiang_hydrochloric,  ///< from HCl
  kiang_nitric,        ///< from HNO3
  kiang_sulfurous,     ///< from SO2
  kiang_hydrobromic,   ///< from HBr
  count_
};

struct AcidCorrelation {
  std::string_view name;    ///< as a user writes it
  std::string_view acid;    ///< what condenses
  std::string_view vapour;  ///< what the partial pressure is of
  const char* source;
  const char* standing;  ///< how well the printed constants are known
};

const AcidCorrelation& correlation(AcidDewPoint which);
std::optional<AcidDewPoint> correlation_named(std::string_view name);

/// Partial pressures (Pa) between which the correlations are used here. The papers' own ranges were
/// not at hand; these are those of flue gases (common practice, no source).
inline constexpr double kLeastAcid = 1e-3;
inline constexpr double kMostAcid = 1e3;
inline constexpr double kLeastWater = 1e2;
inline constexpr double kMostWater = 1e5;

/// Temperature (K) at which the acid begins to condense, from the partial pressures (Pa) of water
/// vapour (input 2) and of the acid's vapour (input 3).
Outcome<double> acid_dew_point(AcidDewPoint which, double water, double acid);

}  // namespace busbar::combustion
