// A mixture of gas species by mole fractions.
#pragma once

#include <array>
#include <cstddef>
#include <cstdint>
#include <span>

#include "core/composition.hpp"
#include "core/outcome.hpp"
#include "gas/species.hpp"

namespace busbar::gas {

/// Mole fractions of up to 24 species, in the order of Species, none zero, their sum 1 to within
/// rounding. A plain value without memory of its own; a stream carries one whatever its fluid, so
/// that making and copying an empty one costs next to nothing.
class Mixture {
 public:
  static constexpr std::size_t kCapacity = 24;

  Mixture() {}  // NOLINT(modernize-use-equals-default): default would clear the arrays
  Mixture(const Mixture& other) { *this = other; }
  Mixture& operator=(const Mixture& other);
  ~Mixture() = default;

  /// From named parts. Refuses what check_amounts refuses, unknown species and repeated ones
  /// (`row` counts the part) and more species than fit. Argument 1.
  static Outcome<Mixture> from(const Composition& composition);

  /// From amounts of substance by species (kSpecies of them, in any unit), which are divided by
  /// their sum unless that is 1 to within rounding, so that typed fractions stay as they were;
  /// zeros are left out. Refuses negative amounts, no amount at all and more species than fit.
  /// Argument 1.
  static Outcome<Mixture> from_amounts(std::span<const double, kSpecies> amounts);

  /// A single species.
  static Mixture of(Species species);

  /// Adds a species as a text carries it, to the last digit. False where it stands before one that
  /// is there already, where the fraction is none, or where no more fit.
  bool restore(Species species, double fraction);

  [[nodiscard]] std::size_t size() const { return size_; }
  [[nodiscard]] bool empty() const { return size_ == 0; }
  [[nodiscard]] Species species(std::size_t i) const { return species_[i]; }
  [[nodiscard]] double mole_fraction(std::size_t i) const { return fraction_[i]; }
  [[nodiscard]] double mole_fraction(Species species) const;
  [[nodiscard]] double mass_fraction(Species species) const;
  [[nodiscard]] double molar_mass() const { return molar_mass_; }  ///< kg/mol

  /// The same mixture as named parts on a basis.
  [[nodiscard]] Composition composition(Basis basis) const;

  /// Mole fractions by species.
  [[nodiscard]] std::array<double, kSpecies> fractions() const;

  friend bool operator==(const Mixture& a, const Mixture& b);

 private:
  std::uint8_t size_ = 0;
  double molar_mass_ = 0;
  std::array<Species, kCapacity> species_;
  std::array<double, kCapacity> fraction_;
};

inline Mixture& Mixture::operator=(const Mixture& other) {
  size_ = other.size_;
  molar_mass_ = other.molar_mass_;
  for (std::size_t i = 0; i < size_; ++i) {
    species_[i] = other.species_[i];
    fraction_[i] = other.fraction_[i];
  }
  return *this;
}

}  // namespace busbar::gas
