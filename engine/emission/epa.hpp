// Default factors of the United States Environmental Protection Agency, for checking figures that
// somebody states; always on the higher heating value.
#pragma once

#include <cstdint>
#include <limits>
#include <optional>
#include <span>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::emission {

/// What table C-1 states the heating value for.
enum class EpaUnit : std::uint8_t { per_short_ton, per_gallon, per_cubic_foot };

/// Where the carbon is from. `listed`: the rule lists it as biomass where the IPCC counts it as
/// fossil; `as_made`: from plants or from oil; `mixed`: partly from plants.
enum class Origin : std::uint8_t { fossil, biogenic, mixed, listed, as_made };

struct EpaFuel {
  std::string_view name;
  std::string_view group;
  double heating_value = 0;  ///< MMBtu per unit
  EpaUnit unit = EpaUnit::per_short_ton;
  double co2 = 0;  ///< kg/MMBtu
  Origin origin = Origin::fossil;
  std::string_view status;

  [[nodiscard]] double heating_value_si() const;  ///< J/kg, or J/m3 for liquids and gases
  [[nodiscard]] double co2_si() const;            ///< kg/J
};

std::span<const EpaFuel> epa_fuels();
std::string_view name_of(EpaUnit unit);     ///< "MMBtu per short ton", ...
std::string_view si_unit_of(EpaUnit unit);  ///< "J/kg" or "J/m3"
std::string_view name_of(Origin origin);

/// By its published name. Failure (argument 1): unknown, with the nearest names.
Outcome<const EpaFuel*> epa_fuel(std::string_view name);

/// Dry gas, wet gas and carbon dioxide that a fuel gives, per energy.
enum class FFactor : std::uint8_t { dry, wet, carbon };

/// "Fd", "Fw" or "Fc".
std::optional<FFactor> f_factor_named(std::string_view word);

/// Cubic feet at 68 °F and 29.92 inHg per MMBtu of higher heating value; NaN where the table has
/// none.
struct FFactors {
  std::string_view fuel;
  double dry = 0;
  double wet = std::numeric_limits<double>::quiet_NaN();
  double carbon = 0;
  bool from_memory = true;

  [[nodiscard]] double si(FFactor kind) const;  ///< m3/J
};

std::span<const FFactors> f_factors();

/// By the name of the fuel. Failure (argument 1): unknown, with the nearest names.
Outcome<const FFactors*> f_factors_of(std::string_view fuel);

}  // namespace busbar::emission
