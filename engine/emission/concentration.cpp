#include "emission/concentration.hpp"

#include <array>
#include <vector>

#include "core/name_list.hpp"
#include "core/text.hpp"

namespace busbar::emission {
namespace {

constexpr double kGasConstant = 8.31446261815324;  // exact in the SI of 2019

// Method 19 counts air with 20.9 % of oxygen.
constexpr double kMethod19Air = 0.209;

constexpr std::string_view kTwice = "a legal text and memory agree";
constexpr std::string_view kOnce = "one legal text";
constexpr std::string_view kMemory = "from memory: check before use";

constexpr std::array kReferences{
    ReferenceOxygen{"boilers, liquid and gaseous fuels", 0.03,
                    "13. BImSchV (2021) section 3; Directive 2010/75/EU, annex V", kTwice},
    ReferenceOxygen{"boilers, solid fuels and biomass", 0.06,
                    "13. BImSchV (2021) section 3; Directive 2010/75/EU, annex V", kTwice},
    ReferenceOxygen{"gas turbines", 0.15,
                    "13. BImSchV (2021) section 3; Directive 2010/75/EU, annex V; 40 CFR 60, "
                    "subpart KKKK",
                    kTwice},
    ReferenceOxygen{"engines, Germany", 0.05, "13. BImSchV (2021) section 3", kOnce},
    ReferenceOxygen{"engines, EU", 0.15, "Directive 2010/75/EU, annex V; Directive (EU) 2015/2193",
                    kMemory},
    ReferenceOxygen{"waste incineration", 0.11, "Directive 2010/75/EU, annex VI", kMemory},
};

struct Gas {
  std::string_view formula;
  double molar_mass;  // kg/kmol
};

// Atomic masses of ISO 6976:2016, table A.2; chlorine 35.453 and fluorine 18.9984 (IUPAC, from
// memory).
constexpr std::array kGases{
    Gas{"CO", 28.0101},    Gas{"CO2", 44.0095},  Gas{"NO", 30.0061},  Gas{"NO2", 46.0055},
    Gas{"N2O", 44.0128},   Gas{"SO2", 64.0638},  Gas{"SO3", 80.0632}, Gas{"NH3", 17.03052},
    Gas{"H2S", 34.08088},  Gas{"HCl", 36.46094}, Gas{"HF", 20.00634}, Gas{"CH4", 16.04246},
    Gas{"C3H8", 44.09562}, Gas{"C", 12.0107},
};

const NameList& plants() {
  // Never destroyed: reasons of failures point into it.
  static const auto& list = *[] {
    std::vector<std::string_view> all;
    all.reserve(kReferences.size());
    for (const ReferenceOxygen& reference : kReferences) all.push_back(reference.plant);
    return new NameList(std::move(all), "this table of reference oxygen",
                        "REFERENCE_OXYGEN_TABLE(\"all\")");
  }();
  return list;
}

Failure not_below_air(std::uint8_t argument, double oxygen, double air) {
  return {Fault::impossible,
          argument,
          "is {0}, not below the {1} of air: there is no flue gas to refer to",
          {{{oxygen, Quantity::fraction}, {air, Quantity::fraction}}}};
}

}  // namespace

Outcome<double> at_oxygen(double concentration, double measured, double reference, double air) {
  if (!(measured < air)) return not_below_air(2, measured, air);
  if (!(reference < air)) return not_below_air(3, reference, air);
  return concentration * (air - reference) / (air - measured);
}

std::span<const ReferenceOxygen> reference_oxygens() { return kReferences; }

Outcome<const ReferenceOxygen*> reference_oxygen(std::string_view plant) {
  const auto at = plants().find(plant);
  if (!at) return Failure{Fault::unknown_word, 1, plants().unknown(plant)};
  return &kReferences[*at];
}

std::optional<double> molar_mass_of(std::string_view gas) {
  for (const Gas& known : kGases) {
    // Capitals count: CO is not Co.
    if (known.formula == trimmed(gas)) return known.molar_mass / 1000;
  }
  return std::nullopt;
}

double molar_density(double temperature, double pressure) {
  return pressure / (kGasConstant * temperature);
}

double density_ratio(double from_temperature, double from_pressure, double to_temperature,
                     double to_pressure) {
  return molar_density(to_temperature, to_pressure) /
         molar_density(from_temperature, from_pressure);
}

Outcome<double> emission_by_dry_oxygen(double concentration, double f_dry, double oxygen) {
  if (!(oxygen < kMethod19Air)) return not_below_air(3, oxygen, kMethod19Air);
  return concentration * f_dry * kMethod19Air / (kMethod19Air - oxygen);
}

Outcome<double> emission_by_wet_oxygen(double concentration, double f_wet, double oxygen,
                                       double air_moisture) {
  const double air = kMethod19Air * (1 - air_moisture);
  if (!(oxygen < air)) return not_below_air(3, oxygen, air);
  return concentration * f_wet * kMethod19Air / (air - oxygen);
}

double emission_by_carbon_dioxide(double concentration, double f_carbon, double carbon_dioxide) {
  return concentration * f_carbon / carbon_dioxide;
}

}  // namespace busbar::emission
