#include "gas/published.hpp"

#include "core/text.hpp"

namespace busbar::gas {
namespace {

// ISO 2533:1975, table 3; ozone, sulphur dioxide, nitrogen dioxide and iodine (traces) left out.
// From memory; nitrogen, oxygen and argon follow from the composition that VDI 4670 prints. The
// parts sum to 0.9999976.
constexpr Part kIso2533[] = {{"N2", 0.78084},  {"O2", 0.209476}, {"Ar", 0.00934}, {"CO2", 0.000314},
                             {"Ne", 18.18e-6}, {"He", 5.24e-6},  {"CH4", 2e-6},   {"Kr", 1.14e-6},
                             {"H2", 0.5e-6},   {"N2O", 0.5e-6},  {"Xe", 0.087e-6}};

// A. Picard et al., Metrologia 45 (2008) 149, table 1, carbon dioxide 400 ppm. From memory; its
// molar mass is that of ISO 6976:2016, table A.3. The parts sum to 0.9999971.
constexpr Part kCipm2007[] = {{"N2", 0.780848},  {"O2", 0.209390}, {"Ar", 0.009332},
                              {"CO2", 0.000400}, {"Ne", 18.2e-6},  {"He", 5.2e-6},
                              {"CH4", 1.5e-6},   {"Kr", 1.1e-6},   {"H2", 0.5e-6},
                              {"N2O", 0.3e-6},   {"CO", 0.2e-6},   {"Xe", 0.1e-6}};

// S. Gordon, NASA TP-1906, 1982; the record "Air" of NASA/TP-2002-211556 is made of it.
constexpr Part kNasa[] = {{"N2", 0.78084}, {"O2", 0.209476}, {"Ar", 0.009365}, {"CO2", 0.000319}};

// VDI 4670 part 1: ISO 2533 of its three main parts.
constexpr Part kVdi4670[] = {{"N2", 0.781109}, {"O2", 0.209548}, {"Ar", 0.009343}};

// E. W. Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331. From memory; its molar mass 28.9586
// g/mol follows.
constexpr Part kLemmon2000[] = {{"N2", 0.7812}, {"O2", 0.2096}, {"Ar", 0.0092}};

// Y. A. Cengel and M. A. Boles, Thermodynamics, chapter 15; S. R. Turns, An Introduction to
// Combustion: technical air for sums of combustion.
constexpr Part kTextbook[] = {{"N2", 0.79}, {"O2", 0.21}};

constexpr PublishedMixture kMixtures[] = {
    {"dry air, ISO 2533", "ISO 2533:1975, table 3", Basis::mole, kIso2533},
    {"dry air, CIPM-2007", "A. Picard et al., Metrologia 45 (2008) 149, table 1", Basis::mole,
     kCipm2007},
    {"dry air, NASA", "S. Gordon, NASA TP-1906, 1982", Basis::mole, kNasa},
    {"dry air, VDI 4670", "VDI 4670 part 1", Basis::mole, kVdi4670},
    {"dry air, Lemmon 2000", "E. W. Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331",
     Basis::mole, kLemmon2000},
    {"technical air, 21/79", "textbooks of combustion", Basis::mole, kTextbook},
};

}  // namespace

std::span<const PublishedMixture> published_mixtures() { return kMixtures; }

const PublishedMixture* published_mixture(std::string_view name) {
  for (const PublishedMixture& mixture : kMixtures) {
    if (equal_ignoring_case(name, mixture.name)) return &mixture;
  }
  return nullptr;
}

}  // namespace busbar::gas
