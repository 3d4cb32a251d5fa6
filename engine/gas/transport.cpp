#include "gas/transport.hpp"

#include <array>
#include <cmath>

#include "gas/properties.hpp"
#include "gas/tables/transport.hpp"

namespace busbar::gas {
namespace {

constexpr double kGramsPerKilogram = 1000;
constexpr double kMicro = 1e-6;
constexpr double kMilli = 1e-3;

template <std::size_t N>
double power_series(const std::array<double, N>& coefficients, double x) {
  double sum = 0;
  for (std::size_t i = N; i-- > 0;) sum = sum * x + coefficients[i];
  return sum;
}

const tables::Transport* record_of(Species species) {
  for (const tables::Transport& record : tables::kTransport) {
    if (record.species == species) return &record;
  }
  return nullptr;
}

// Chapman and Enskog, with the collision integral that goes with the parameters. Pa s.
double chapman_enskog(const tables::Transport& gas, double t, const auto& integral) {
  constexpr double kFactor = 0.0266958;
  const double omega = std::exp(power_series(integral, std::log(t / gas.energy)));
  const double m = molar_mass(gas.species) * kGramsPerKilogram;
  return kMicro * kFactor * std::sqrt(m * t) / (gas.size * gas.size * omega);
}

// P. D. Neufeld, A. R. Janzen, R. A. Aziz, J. Chem. Phys. 57 (1972) 1100, equation 2.
double lennard_jones(const tables::Transport& gas, double t) {
  constexpr double kFactor = 0.0266958;
  const double x = t / gas.energy;
  const double omega = 1.16145 * std::pow(x, -0.14874) + 0.52487 * std::exp(-0.77320 * x) +
                       2.16178 * std::exp(-2.43787 * x);
  const double m = molar_mass(gas.species) * kGramsPerKilogram;
  return kMicro * kFactor * std::sqrt(m * t) / (gas.size * gas.size * omega);
}

double carbon_dioxide(double t) {
  constexpr double kEnergy = 251.196;
  return kMicro * 1.00697 * std::sqrt(t) /
         std::exp(power_series(tables::kCarbonDioxide, std::log(t / kEnergy)));
}

double steam_viscosity(double t) {
  const double reduced = t / 647.096;
  return 100 * kMicro * std::sqrt(reduced) / power_series(tables::kSteamViscosity, 1 / reduced);
}

double steam_conductivity(double t) {
  const double reduced = t / 647.096;
  return kMilli * std::sqrt(reduced) / power_series(tables::kSteamConductivity, 1 / reduced);
}

double pure_viscosity(const tables::Transport& gas, double t) {
  switch (gas.method) {
    case tables::Method::lemmon:
      return chapman_enskog(gas, t, tables::kLemmonIntegral);
    case tables::Method::fenghour:
      return carbon_dioxide(t);
    case tables::Method::steam:
      return steam_viscosity(t);
    default:
      return lennard_jones(gas, t);
  }
}

double pure_conductivity(const tables::Transport& gas, double t, double viscosity) {
  if (gas.method == tables::Method::steam) return steam_conductivity(t);
  if (gas.method == tables::Method::lemmon) {
    const double tau = gas.critical / t;
    return kMilli * (gas.n1 * viscosity / kMicro + gas.n2 * std::pow(tau, gas.t2) +
                     gas.n3 * std::pow(tau, gas.t3));
  }
  const double cv = kGasConstant * (fit(gas.species, t).heat_capacity(Powers::at(t)) - 1);
  return viscosity / molar_mass(gas.species) * (1.32 * cv + 1.77 * kGasConstant);
}

struct Pure {
  std::array<double, Mixture::kCapacity> viscosity{};
  std::array<double, Mixture::kCapacity> conductivity{};
};

Outcome<Pure> pure(const Mixture& mixture, double t) {
  Pure out;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    const tables::Transport* gas = record_of(mixture.species(i));
    if (gas == nullptr) {
      return Failure{Fault::missing, 1,
                     "holds a gas whose viscosity is not known here; known are N2, O2, Ar, CO2, "
                     "H2O, CO, H2, CH4, SO2, NO, He and Ne"};
    }
    if (!(t >= gas->lowest && t <= gas->highest)) {
      const bool low = t < gas->lowest;
      return Failure{Fault::outside_range,
                     2,
                     low ? "{0} is below {1}, where the correlation of a gas of the composition "
                           "begins"
                         : "{0} is above {1}, where the correlation of a gas of the composition "
                           "ends",
                     {{{t, Quantity::temperature},
                       {low ? gas->lowest : gas->highest, Quantity::temperature}}}};
    }
    out.viscosity[i] = pure_viscosity(*gas, t);
    out.conductivity[i] = pure_conductivity(*gas, t, out.viscosity[i]);
  }
  return out;
}

// Wilke, equation 13; the same weights serve Mason and Saxena.
double mixed(const Mixture& mixture, const Pure& parts,
             const std::array<double, Mixture::kCapacity>& values) {
  double sum = 0;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    double weight = 0;
    for (std::size_t j = 0; j < mixture.size(); ++j) {
      const double masses = molar_mass(mixture.species(i)) / molar_mass(mixture.species(j));
      const double root =
          1 + std::sqrt(parts.viscosity[i] / parts.viscosity[j]) * std::pow(masses, -0.25);
      weight += mixture.mole_fraction(j) * root * root / std::sqrt(8 * (1 + masses));
    }
    sum += mixture.mole_fraction(i) * values[i] / weight;
  }
  return sum;
}

}  // namespace

Outcome<double> viscosity(const Mixture& mixture, double temperature) {
  const Outcome<Pure> parts = pure(mixture, temperature);
  if (!parts) return parts.failure();
  return mixed(mixture, *parts, parts->viscosity);
}

Outcome<double> thermal_conductivity(const Mixture& mixture, double temperature) {
  const Outcome<Pure> parts = pure(mixture, temperature);
  if (!parts) return parts.failure();
  return mixed(mixture, *parts, parts->conductivity);
}

Outcome<double> prandtl_number(const Mixture& mixture, double temperature) {
  const Outcome<Pure> parts = pure(mixture, temperature);
  if (!parts) return parts.failure();
  const Outcome<double> cp = heat_capacity(mixture, temperature);
  if (!cp) return cp.failure();
  return *cp * mixed(mixture, *parts, parts->viscosity) /
         mixed(mixture, *parts, parts->conductivity);
}

}  // namespace busbar::gas
