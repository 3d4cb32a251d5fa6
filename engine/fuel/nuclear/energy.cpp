#include "fuel/nuclear/energy.hpp"

#include <array>

#include "core/text.hpp"

namespace busbar::fuel::nuclear {
namespace {

// Exact in the SI of 2019.
constexpr double kElectronVolt = 1.602176634e-19;
constexpr double kAvogadro = 6.02214076e23;

// Fission energies as an encyclopaedia page prints them from the ENDF library (one transcription).
constexpr std::array kFissions{Fission{"U-235", 193.4e6, 0.23504},
                               Fission{"U-238", 198.9e6, 0.23805},
                               Fission{"Th-232", 191.0e6, 0.23204}};

}  // namespace

double heat_of_burn_up(double megawatt_days_per_kilogram) {
  constexpr double kMegawattDay = 86.4e9;
  return megawatt_days_per_kilogram * kMegawattDay;
}

std::optional<Fission> fission_of(std::string_view nuclide) {
  for (const Fission& fission : kFissions) {
    if (equal_ignoring_case(fission.nuclide, trimmed(nuclide))) return fission;
  }
  return std::nullopt;
}

double heat_of_complete_fission(const Fission& fission) {
  return fission.energy * kElectronVolt * kAvogadro / fission.mass;
}

}  // namespace busbar::fuel::nuclear
