// What something is made of: named parts with amounts, on a stated basis. Which names mean
// something is the business of the domain that takes the composition.
#pragma once

#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "core/outcome.hpp"

namespace busbar {

enum class Basis : std::uint8_t { mole, mass };

/// One part of a composition; the amount is a part of the whole (0.21, never 21).
struct Part {
  std::string_view name;
  double amount = 0;
  std::optional<double> uncertainty = std::nullopt;  ///< standard, of the amount
};

/// Amounts as they were given: nothing is normalised. Failures of those who take a composition
/// count its parts from 1 in `row`.
struct Composition {
  Basis basis = Basis::mole;
  std::vector<Part> parts;

  [[nodiscard]] double sum() const;
};

/// A heading that states basis and scale.
struct Heading {
  Basis basis = Basis::mole;
  bool percent = false;
};

/// Reads "mole", "mole fraction", "mole %", "mass", "mass fraction", "mass %", with "mol" for
/// mole, "weight" and "wt" for mass, "percent" or "-%" for %, capitals or not.
std::optional<Heading> read_heading(std::string_view text);

/// The same, with what stands behind the scale left in `rest`: "dry" of "mass % dry".
std::optional<Heading> read_heading(std::string_view text, std::string_view& rest);

/// A sentence fragment about a heading that is none: what was meant by "%" or "vol %" and what to
/// write instead.
const char* why_no_heading(std::string_view text);

/// Most parts that a composition may have.
inline constexpr std::size_t kMostParts = 100;

/// Reads the one text form, "mole: CH4 0.92, C2H6 0.05, N2 0.03" or "mass %: ...". On failure
/// `word` is what was not understood. Argument 1. The names point into the text. A remark in
/// brackets before the basis is left aside. Words behind the scale go to `rest`; without it they
/// are refused.
Outcome<Composition> read_composition(std::string_view text, std::string& word,
                                      std::string_view* rest = nullptr);

/// Appends the text form with fractions that read back exactly.
void write_composition(std::string& out, const Composition& composition);

/// How far amounts may be from a sum of 1 and still be whole: rounding, no more.
inline constexpr double kSumTolerance = 1e-5;

/// Refuses amounts that are negative (row tells the part) or do not sum to 1. Argument 1.
Failure check_amounts(const Composition& composition);

/// The same amounts divided by their sum. Refuses negative amounts and a sum of zero.
Outcome<Composition> normalised(Composition composition);

}  // namespace busbar
