// Units written as text, such as "kJ/(kg K)", "lb/h" or "psia".
#pragma once

#include <array>
#include <cstdint>
#include <string_view>

#include "core/outcome.hpp"

namespace busbar::units {

/// Exponents of kg, m, s, K, mol, A. Angles and counts have none.
using Dimension = std::array<std::int8_t, 6>;

/// Pressures carry what they are measured from: gauge and absolute have one dimension, yet no
/// number of one is a number of the other.
enum class Reference : std::uint8_t { plain, gauge };

/// si = x · factor + offset; an offset only for °C and °F standing alone.
struct Expression {
  Dimension dimension{};
  double factor = 1;
  double offset = 0;
  Reference reference = Reference::plain;
};

/// Reads a unit: symbols with SI prefixes where they are usual, products by a space, "*", "·" or
/// ".", quotients by "/", exponents as "m2", "m^2", "m²" or "s-1", parentheses. Two slashes without
/// parentheses are refused because people read them in two ways.
/// Failures: unknown_word (argument 1), with the place in the text as measure 0.
/// Source of factors: SI Brochure 9th ed. (2019); NIST SP 811 (2008), appendix B.
Outcome<Expression> read_unit(std::string_view text);

/// x in unit `from` as a number in unit `to`. Failures: 1 the value (below absolute zero), 2 and 3
/// the units (unknown, of another dimension, gauge against absolute).
Outcome<double> convert(double value, std::string_view from, std::string_view to);

/// The same for differences of temperature and for all units without an offset.
Outcome<double> convert_difference(double value, std::string_view from, std::string_view to);

}  // namespace busbar::units
