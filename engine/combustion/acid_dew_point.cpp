#include "combustion/acid_dew_point.hpp"

#include <array>
#include <cmath>
#include <cstddef>

#include "core/text.hpp"

namespace busbar::combustion {
namespace {

constexpr double kMillimetreOfMercury = 101325.0 / 760;  // Pa
constexpr double kAtmosphere = 101325;                   // Pa
constexpr double kCelsiusZero = 273.15;

constexpr std::array<AcidCorrelation, static_cast<std::size_t>(AcidDewPoint::count_)> kAll{{
    {"Verhoff-Banchero", "sulfuric acid", "SO3",
     "Verhoff and Banchero, Chem. Eng. Prog. 70 (1974) 71",
     "constants as three sources print them"},
    {"Okkes", "sulfuric acid", "SO3", "Okkes, Hydrocarbon Processing 66(7) (1987) 53",
     "constants as one source and memory have them; the paper was not at hand"},
    {"ZareNezhad", "sulfuric acid", "SO3", "ZareNezhad, Oil & Gas J. 107(36) (2009) 60",
     "constants as one source and memory have them; the paper was not at hand"},
    {"Kiang HCl", "hydrochloric acid", "HCl", "Kiang, Chem. Eng. 1981",
     "constants as one source prints them"},
    {"Kiang HNO3", "nitric acid", "HNO3", "Kiang, Chem. Eng. 1981",
     "constants as one source prints them"},
    {"Kiang H2SO3", "sulfurous acid", "SO2", "Kiang, Chem. Eng. 1981",
     "constants as one source prints them"},
    {"Kiang HBr", "hydrobromic acid", "HBr", "Kiang, Chem. Eng. 1981",
     "one constant (0.0398) from memory; one source prints 0.0396"},
}};

// 1000/T = a + b ln(pH2O) + c ln(pAcid) + d ln(pH2O) ln(pAcid), T in K, p in mmHg: the form that
// Verhoff and Banchero, and Kiang, use.
struct Reciprocal {
  double a;
  double b;
  double c;
  double d;
};

double temperature(const Reciprocal& k, double water, double acid) {
  const double w = std::log(water / kMillimetreOfMercury);
  const double s = std::log(acid / kMillimetreOfMercury);
  return 1000 / (k.a + k.b * w + k.c * s + k.d * w * s);
}

constexpr Reciprocal kVerhoffBanchero{2.276, -0.02943, -0.0858, 0.0062};
constexpr Reciprocal kHydrochloric{3.7368, -0.1591, -0.0326, 0.00269};
constexpr Reciprocal kNitric{3.8614, -0.1446, -0.0827, 0.00756};
constexpr Reciprocal kSulfurous{3.9526, -0.1863, 0.000867, -0.000913};
constexpr Reciprocal kHydrobromic{3.5639, -0.1350, -0.0398, 0.00235};

double okkes(double water, double acid) {
  const double w = std::log10(water / kAtmosphere);
  const double s = std::log10(acid / kAtmosphere);
  return kCelsiusZero + 203.25 + 27.6 * w + 10.83 * s + 1.06 * std::pow(s + 8, 2.19);
}

double zarenezhad(double water, double acid) {
  const double w = std::log(water / kMillimetreOfMercury);
  const double s = std::log(acid / kMillimetreOfMercury);
  return kCelsiusZero + 150 + 11.664 * s + 8.1328 * w - 0.383226 * s * w;
}

double evaluate(AcidDewPoint which, double water, double acid) {
  switch (which) {
    case AcidDewPoint::verhoff_banchero:
      return temperature(kVerhoffBanchero, water, acid);
    case AcidDewPoint::okkes:
      return okkes(water, acid);
    case AcidDewPoint::zarenezhad:
      return zarenezhad(water, acid);
    case AcidDewPoint::kiang_hydrochloric:
      return temperature(kHydrochloric, water, acid);
    case AcidDewPoint::kiang_nitric:
      return temperature(kNitric, water, acid);
    case AcidDewPoint::kiang_sulfurous:
      return temperature(kSulfurous, water, acid);
    default:
      return temperature(kHydrobromic, water, acid);
  }
}

Failure outside(std::uint8_t argument, const char* reason, double value, double limit) {
  return {Fault::outside_range,
          argument,
          reason,
          {{{value, Quantity::pressure}, {limit, Quantity::pressure}}}};
}

}  // namespace

const AcidCorrelation& correlation(AcidDewPoint which) {
  return kAll[static_cast<std::size_t>(which)];
}

std::optional<AcidDewPoint> correlation_named(std::string_view name) {
  for (std::size_t i = 0; i < kAll.size(); ++i) {
    if (equal_ignoring_case(kAll[i].name, name)) return static_cast<AcidDewPoint>(i);
  }
  return std::nullopt;
}

Outcome<double> acid_dew_point(AcidDewPoint which, double water, double acid) {
  if (!(water >= kLeastWater)) {
    return outside(2, "{0} of water vapour is below {1}, the least of a flue gas", water,
                   kLeastWater);
  }
  if (!(water <= kMostWater)) {
    return outside(2, "{0} of water vapour is above {1}, the most of a flue gas", water,
                   kMostWater);
  }
  if (!(acid >= kLeastAcid)) {
    return outside(3, "{0} of acid vapour is below {1}, the least of a flue gas", acid, kLeastAcid);
  }
  if (!(acid <= kMostAcid)) {
    return outside(3, "{0} of acid vapour is above {1}, the most of a flue gas", acid, kMostAcid);
  }
  return evaluate(which, water, acid);
}

}  // namespace busbar::combustion
