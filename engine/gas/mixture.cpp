#include "gas/mixture.hpp"

#include <cmath>

namespace busbar::gas {
namespace {

// Sums of typed fractions are within this of 1.
constexpr double kRounding = 1e-12;

Failure at_part(Failure failure, std::size_t index) {
  failure.row = static_cast<std::uint32_t>(index + 1);
  return failure;
}

bool is_shared_formula(std::string_view name) {
  return name == "C4H10" || name == "C5H12" || name == "C4H8" || name == "C8H18";
}

}  // namespace

Outcome<Mixture> Mixture::from(const Composition& composition) {
  std::array<double, kSpecies> amounts{};
  std::array<bool, kSpecies> seen{};
  for (std::size_t i = 0; i < composition.parts.size(); ++i) {
    const Part& part = composition.parts[i];
    const auto found = species_named(part.name);
    if (!found) {
      if (is_shared_formula(part.name)) {
        return at_part({Fault::unknown_word, 1,
                        "is the formula of more than one gas: write n-C4H10 or i-C4H10, n-C5H12 or "
                        "i-C5H12, 1-C4H8, n-C8H18 or i-C8H18"},
                       i);
      }
      return at_part({Fault::unknown_word, 1,
                      "is no gas that Busbar knows; SPECIES_TABLE(\"gas\") lists them"},
                     i);
    }
    const auto index = static_cast<std::size_t>(*found);
    if (seen[index]) {
      return at_part({Fault::wrong_shape, 1, "stands twice in the composition"}, i);
    }
    seen[index] = true;
    amounts[index] = part.amount;
  }
  if (const Failure failure = check_amounts(composition); failure.fault != Fault::none) {
    return failure;
  }
  if (composition.basis == Basis::mass) {
    for (std::size_t i = 0; i < kSpecies; ++i) {
      if (seen[i]) amounts[i] /= gas::molar_mass(static_cast<Species>(i));
    }
  }
  return from_amounts(amounts);
}

Outcome<Mixture> Mixture::from_amounts(std::span<const double, kSpecies> amounts) {
  double sum = 0;
  for (const double amount : amounts) {
    if (!(amount >= 0)) return Failure{Fault::impossible, 1, "holds a negative amount"};
    sum += amount;
  }
  if (!(sum > 0) || !std::isfinite(sum)) {
    return Failure{Fault::impossible, 1, "holds no amount of any gas"};
  }
  if (std::abs(sum - 1) <= kRounding) sum = 1;
  Mixture mixture;
  for (std::size_t i = 0; i < kSpecies; ++i) {
    const double fraction = amounts[i] / sum;
    if (!(fraction > 0)) continue;
    if (!mixture.restore(static_cast<Species>(i), fraction)) {
      return Failure{Fault::too_large,
                     1,
                     "holds more than {0} gases",
                     {{{static_cast<double>(kCapacity), Quantity::number}}}};
    }
  }
  return mixture;
}

bool Mixture::restore(Species species, double fraction) {
  if (size_ == kCapacity || !(fraction > 0) || fraction > 1 + kRounding) return false;
  if (size_ > 0 && species <= species_[size_ - std::size_t{1}]) return false;
  species_[size_] = species;
  fraction_[size_++] = fraction;
  molar_mass_ += fraction * gas::molar_mass(species);
  return true;
}

Mixture Mixture::of(Species species) {
  Mixture mixture;
  mixture.restore(species, 1);
  return mixture;
}

double Mixture::mole_fraction(Species species) const {
  for (std::size_t i = 0; i < size_; ++i) {
    if (species_[i] == species) return fraction_[i];
  }
  return 0;
}

double Mixture::mass_fraction(Species species) const {
  return mole_fraction(species) * gas::molar_mass(species) / molar_mass_;
}

Composition Mixture::composition(Basis basis) const {
  Composition out;
  out.basis = basis;
  out.parts.reserve(size_);
  for (std::size_t i = 0; i < size_; ++i) {
    const double weight = basis == Basis::mass ? gas::molar_mass(species_[i]) / molar_mass_ : 1;
    out.parts.push_back({name_of(species_[i]), fraction_[i] * weight});
  }
  return out;
}

std::array<double, kSpecies> Mixture::fractions() const {
  std::array<double, kSpecies> out{};
  for (std::size_t i = 0; i < size_; ++i) out[static_cast<std::size_t>(species_[i])] = fraction_[i];
  return out;
}

bool operator==(const Mixture& a, const Mixture& b) {
  if (a.size_ != b.size_) return false;
  for (std::size_t i = 0; i < a.size_; ++i) {
    if (a.species_[i] != b.species_[i] || a.fraction_[i] != b.fraction_[i]) return false;
  }
  return true;
}

}  // namespace busbar::gas
