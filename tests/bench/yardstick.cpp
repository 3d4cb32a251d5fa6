#include "yardstick.hpp"

#include <cmath>
#include <span>

#include "water/backward/volume.hpp"
#include "water/constants.hpp"
#include "water/tables/backward_1.hpp"
#include "water/tables/backward_ph_2.hpp"
#include "water/tables/backward_ph_3.hpp"
#include "water/tables/backward_ps_2.hpp"
#include "water/tables/backward_ps_3.hpp"
#include "water/tables/boundary_23.hpp"
#include "water/tables/region_1.hpp"
#include "water/tables/region_2.hpp"
#include "water/tables/region_3.hpp"
#include "water/tables/region_4.hpp"
#include "water/tables/region_5.hpp"

namespace busbar::yardstick {

namespace {

using water::kCriticalDensity;
using water::kCriticalTemperature;
using water::kGasConstant;
using water::tables::Term;
using Table = std::span<const Term>;

constexpr double kExact = 1e-10;  // what the engine promises of h and s at its answer
constexpr int kCap = 50;

// Sums of one kind of term, as the tables of derivatives print them.
double value(Table table, double x, double y) {
  double sum = 0;
  for (const Term& t : table) sum += t.n * std::pow(x, t.i) * std::pow(y, t.j);
  return sum;
}
double by_x(Table table, double x, double y) {
  double sum = 0;
  for (const Term& t : table) sum += t.n * t.i * std::pow(x, t.i - 1) * std::pow(y, t.j);
  return sum;
}
double by_xx(Table table, double x, double y) {
  double sum = 0;
  for (const Term& t : table) {
    sum += t.n * t.i * (t.i - 1) * std::pow(x, t.i - 2) * std::pow(y, t.j);
  }
  return sum;
}
double by_y(Table table, double x, double y) {
  double sum = 0;
  for (const Term& t : table) sum += t.n * std::pow(x, t.i) * t.j * std::pow(y, t.j - 1);
  return sum;
}
double by_yy(Table table, double x, double y) {
  double sum = 0;
  for (const Term& t : table) {
    sum += t.n * std::pow(x, t.i) * t.j * (t.j - 1) * std::pow(y, t.j - 2);
  }
  return sum;
}
double by_xy(Table table, double x, double y) {
  double sum = 0;
  for (const Term& t : table) {
    sum += t.n * t.i * std::pow(x, t.i - 1) * t.j * std::pow(y, t.j - 1);
  }
  return sum;
}

namespace t = water::tables;

// --- Region 1: tables 2 to 4 -------------------------------------------------------------------

struct One {
  double pi;
  double tau;
  One(double p, double temperature) : pi(p / 16.53e6), tau(1386 / temperature) {}
  [[nodiscard]] double gamma() const { return value(t::kRegion1, 7.1 - pi, tau - 1.222); }
  [[nodiscard]] double gamma_pi() const { return -by_x(t::kRegion1, 7.1 - pi, tau - 1.222); }
  [[nodiscard]] double gamma_tau() const { return by_y(t::kRegion1, 7.1 - pi, tau - 1.222); }
  [[nodiscard]] double gamma_tautau() const { return by_yy(t::kRegion1, 7.1 - pi, tau - 1.222); }
};

// --- Regions 2 and 5: tables 10 to 14 and 37 to 41 -----------------------------------------------

template <const auto& kIdeal, const auto& kResidual>
struct Vapour {
  double pi;
  double tau;
  double y;
  Vapour(double p, double temperature, double reducing, double shift)
      : pi(p / 1e6), tau(reducing / temperature), y(tau - shift) {}
  [[nodiscard]] double gamma() const {
    return std::log(pi) + value(kIdeal, pi, tau) + value(kResidual, pi, y);
  }
  [[nodiscard]] double gamma_pi() const { return 1 / pi + by_x(kResidual, pi, y); }
  [[nodiscard]] double gamma_tau() const { return by_y(kIdeal, pi, tau) + by_y(kResidual, pi, y); }
  [[nodiscard]] double gamma_tautau() const {
    return by_yy(kIdeal, pi, tau) + by_yy(kResidual, pi, y);
  }
};

struct Two : Vapour<t::kRegion2Ideal, t::kRegion2Residual> {
  Two(double p, double temperature) : Vapour(p, temperature, 540, 0.5) {}
};
struct Five : Vapour<t::kRegion5Ideal, t::kRegion5Residual> {
  Five(double p, double temperature) : Vapour(p, temperature, 1000, 0) {}
};

template <class Region>
double v_of(double p, double temperature) {
  const Region at(p, temperature);
  return kGasConstant * temperature / p * at.pi * at.gamma_pi();
}
template <class Region>
double h_of(double p, double temperature) {
  const Region at(p, temperature);
  return kGasConstant * temperature * at.tau * at.gamma_tau();
}
template <class Region>
double s_of(double p, double temperature) {
  const Region at(p, temperature);
  return kGasConstant * (at.tau * at.gamma_tau() - at.gamma());
}
template <class Region>
double cp_of(double p, double temperature) {
  const Region at(p, temperature);
  return -kGasConstant * at.tau * at.tau * at.gamma_tautau();
}

// --- Region 3: tables 30 to 32 -------------------------------------------------------------------

struct Three {
  double rho;
  double temperature;
  double delta;
  double tau;
  Three(double density, double at)
      : rho(density),
        temperature(at),
        delta(density / kCriticalDensity),
        tau(kCriticalTemperature / at) {}
  [[nodiscard]] double phi() const {
    return t::kRegion3N1 * std::log(delta) + value(t::kRegion3, delta, tau);
  }
  [[nodiscard]] double phi_delta() const {
    return t::kRegion3N1 / delta + by_x(t::kRegion3, delta, tau);
  }
  [[nodiscard]] double phi_deltadelta() const {
    return -t::kRegion3N1 / (delta * delta) + by_xx(t::kRegion3, delta, tau);
  }
  [[nodiscard]] double phi_tau() const { return by_y(t::kRegion3, delta, tau); }
  [[nodiscard]] double phi_tautau() const { return by_yy(t::kRegion3, delta, tau); }
  [[nodiscard]] double phi_deltatau() const { return by_xy(t::kRegion3, delta, tau); }

  [[nodiscard]] double pressure() const {
    return rho * kGasConstant * temperature * delta * phi_delta();
  }
  [[nodiscard]] double pressure_by_density() const {
    return kGasConstant * temperature *
           (2 * delta * phi_delta() + delta * delta * phi_deltadelta());
  }
  [[nodiscard]] double pressure_by_temperature() const {
    return rho * kGasConstant * (delta * phi_delta() - delta * tau * phi_deltatau());
  }
  [[nodiscard]] double enthalpy() const {
    return kGasConstant * temperature * (tau * phi_tau() + delta * phi_delta());
  }
  [[nodiscard]] double enthalpy_by_density() const {
    return kGasConstant * temperature / rho *
           (delta * tau * phi_deltatau() + delta * phi_delta() + delta * delta * phi_deltadelta());
  }
  [[nodiscard]] double enthalpy_by_temperature() const {
    return kGasConstant *
           (delta * phi_delta() - tau * tau * phi_tautau() - delta * tau * phi_deltatau());
  }
  [[nodiscard]] double entropy() const { return kGasConstant * (tau * phi_tau() - phi()); }
  [[nodiscard]] double entropy_by_density() const {
    return kGasConstant / rho * (delta * tau * phi_deltatau() - delta * phi_delta());
  }
  [[nodiscard]] double entropy_by_temperature() const {
    return -kGasConstant / temperature * tau * tau * phi_tautau();
  }
};

// --- Which region (section 2 and figure 1) -------------------------------------------------------

double boundary_23(double temperature) {
  const double* n = t::kBoundary23;
  return (n[0] + n[1] * temperature + n[2] * std::pow(temperature, 2)) * 1e6;
}
double boundary_23_temperature(double p) {
  const double* n = t::kBoundary23;
  return n[3] + std::pow((p * 1e-6 - n[4]) / n[2], 0.5);
}

int region(double p, double temperature) {
  if (temperature > 1073.15) return 5;
  if (temperature <= 623.15) return p >= saturation_pressure(temperature) ? 1 : 2;
  if (temperature > 863.15) return 2;
  return p > boundary_23(temperature) ? 3 : 2;
}

// --- Backward equations --------------------------------------------------------------------------

double start_ph(double p, double h, int region) {
  const double pi = p * 1e-6;
  if (region == 1) return value(t::kTemperaturePh1, pi, h / 2500e3 + 1);
  if (pi <= 4) return value(t::kTemperaturePh2a, pi, h / 2000e3 - 2.1);
  const double* n = t::kBoundary2bc;
  const double eta = h / 1000;
  if (pi > n[0] + n[1] * eta + n[2] * std::pow(eta, 2)) {
    return value(t::kTemperaturePh2c, pi + 25, h / 2000e3 - 1.8);
  }
  return value(t::kTemperaturePh2b, pi - 2, h / 2000e3 - 2.6);
}

double start_ps(double p, double s, int region) {
  const double pi = p * 1e-6;
  if (region == 1) return value(t::kTemperaturePs1, pi, s / 1000 + 2);
  if (pi <= 4) {
    double sum = 0;
    for (const Term& term : t::kTemperaturePs2a) {
      sum += term.n * std::pow(pi, term.i) * std::pow(s / 2000 - 2, term.j);
    }
    return sum;
  }
  if (s < 5850) return value(t::kTemperaturePs2c, pi, 2 - s / 2925.1);
  return value(t::kTemperaturePs2b, pi, 10 - s / 785.3);
}

// Newton on one function with its derivative.
template <class F, class D>
double newton(double start, double given, double scale, const F& function, const D& derivative) {
  double temperature = start;
  for (int i = 0; i < kCap; ++i) {
    const double missing = given - function(temperature);
    if (std::abs(missing) <= kExact * std::fmax(std::abs(given), scale)) break;
    temperature += missing / derivative(temperature);
  }
  return temperature;
}

// Newton for density and temperature together in region 3.
template <class Value, class ByDensity, class ByTemperature>
double newton_3(double p, double given, double density, double temperature, double scale,
                const Value& of, const ByDensity& by_density, const ByTemperature& by_temperature) {
  for (int i = 0; i < kCap; ++i) {
    const Three at(density, temperature);
    const double missing_p = p - at.pressure();
    const double missing = given - of(at);
    if (std::abs(missing) <= kExact * std::fmax(std::abs(given), scale) &&
        std::abs(missing_p) <= kExact * p) {
      break;
    }
    const double a = at.pressure_by_density();
    const double b = at.pressure_by_temperature();
    const double c = by_density(at);
    const double d = by_temperature(at);
    const double determinant = a * d - b * c;
    density += (missing_p * d - missing * b) / determinant;
    temperature += (a * missing - c * missing_p) / determinant;
  }
  return temperature;
}

double ph_3(double p, double h) {
  const double pi = p * 1e-6;
  const double* n = t::kBoundary3ab;
  const double border = n[0] + n[1] * pi + n[2] * std::pow(pi, 2) + n[3] * std::pow(pi, 3);
  double temperature = 0;
  double volume = 0;
  if (h / 1000 <= border) {
    temperature = 760 * value(t::kTemperaturePh3a, p / 100e6 + 0.240, h / 2300e3 - 0.615);
    volume = 0.0028 * value(t::kVolumePh3a, p / 100e6 + 0.128, h / 2100e3 - 0.727);
  } else {
    temperature = 860 * value(t::kTemperaturePh3b, p / 100e6 + 0.298, h / 2800e3 - 0.720);
    volume = 0.0088 * value(t::kVolumePh3b, p / 100e6 + 0.0661, h / 2800e3 - 0.720);
  }
  return newton_3(
      p, h, 1 / volume, temperature, kGasConstant * kCriticalTemperature,
      [](const Three& at) { return at.enthalpy(); },
      [](const Three& at) { return at.enthalpy_by_density(); },
      [](const Three& at) { return at.enthalpy_by_temperature(); });
}

double ps_3(double p, double s) {
  double temperature = 0;
  double volume = 0;
  if (s <= 4412.02148223476) {
    temperature = 760 * value(t::kTemperaturePs3a, p / 100e6 + 0.240, s / 4400 - 0.703);
    volume = 0.0028 * value(t::kVolumePs3a, p / 100e6 + 0.187, s / 4400 - 0.755);
  } else {
    temperature = 860 * value(t::kTemperaturePs3b, p / 100e6 + 0.760, s / 5300 - 0.818);
    volume = 0.0088 * value(t::kVolumePs3b, p / 100e6 + 0.298, s / 5300 - 0.816);
  }
  return newton_3(
      p, s, 1 / volume, temperature, kGasConstant, [](const Three& at) { return at.entropy(); },
      [](const Three& at) { return at.entropy_by_density(); },
      [](const Three& at) { return at.entropy_by_temperature(); });
}

}  // namespace

double saturation_pressure(double temperature) {
  const double* n = t::kRegion4;
  const double theta = temperature + n[8] / (temperature - n[9]);
  const double a = std::pow(theta, 2) + n[0] * theta + n[1];
  const double b = n[2] * std::pow(theta, 2) + n[3] * theta + n[4];
  const double c = n[5] * std::pow(theta, 2) + n[6] * theta + n[7];
  return std::pow(2 * c / (-b + std::pow(std::pow(b, 2) - 4 * a * c, 0.5)), 4) * 1e6;
}

double saturation_temperature(double p) {
  const double* n = t::kRegion4;
  const double beta = std::pow(p * 1e-6, 0.25);
  const double e = std::pow(beta, 2) + n[2] * beta + n[5];
  const double f = n[0] * std::pow(beta, 2) + n[3] * beta + n[6];
  const double g = n[1] * std::pow(beta, 2) + n[4] * beta + n[7];
  const double d = 2 * g / (-f - std::pow(std::pow(f, 2) - 4 * e * g, 0.5));
  return (n[9] + d - std::pow(std::pow(n[9] + d, 2) - 4 * (n[8] + n[9] * d), 0.5)) / 2;
}

// The backward equation that starts the iteration is the engine's own, in the yardstick's favour:
// written with std::pow it would cost as much as an iteration.
double density_3(double p, double temperature) {
  const bool liquid = temperature < kCriticalTemperature && p >= saturation_pressure(temperature);
  const auto subregion = water::backward::subregion_3(p, temperature, liquid);
  double density = 1 / water::backward::volume_pt_3(subregion, p, temperature);
  for (int i = 0; i < kCap; ++i) {
    const Three at(density, temperature);
    const double step = (p - at.pressure()) / at.pressure_by_density();
    density += step;
    if (std::abs(step) <= kExact * density) break;
  }
  return density;
}

double volume(double p, double temperature) {
  switch (region(p, temperature)) {
    case 1:
      return v_of<One>(p, temperature);
    case 2:
      return v_of<Two>(p, temperature);
    case 3:
      return 1 / density_3(p, temperature);
    default:
      return v_of<Five>(p, temperature);
  }
}

double enthalpy(double p, double temperature) {
  switch (region(p, temperature)) {
    case 1:
      return h_of<One>(p, temperature);
    case 2:
      return h_of<Two>(p, temperature);
    case 3:
      return Three(density_3(p, temperature), temperature).enthalpy();
    default:
      return h_of<Five>(p, temperature);
  }
}

double entropy(double p, double temperature) {
  switch (region(p, temperature)) {
    case 1:
      return s_of<One>(p, temperature);
    case 2:
      return s_of<Two>(p, temperature);
    case 3:
      return Three(density_3(p, temperature), temperature).entropy();
    default:
      return s_of<Five>(p, temperature);
  }
}

double temperature_at_enthalpy(double p, double h) {
  const auto solve = [&](auto region, double start) {
    using Region = decltype(region);
    return newton(
        start, h, kGasConstant * 540, [&](double at) { return h_of<Region>(p, at); },
        [&](double at) { return cp_of<Region>(p, at); });
  };
  if (p <= 16.529164252604509e6) {
    const double saturated = saturation_temperature(p);
    if (h < h_of<One>(p, saturated)) return solve(One(1, 300), start_ph(p, h, 1));
    if (h <= h_of<Two>(p, saturated)) return saturated;
  } else {
    if (h <= h_of<One>(p, 623.15)) return solve(One(1, 300), start_ph(p, h, 1));
    if (h < h_of<Two>(p, boundary_23_temperature(p))) return ph_3(p, h);
  }
  if (h <= h_of<Two>(p, 1073.15)) return solve(Two(1, 300), start_ph(p, h, 2));
  return solve(Five(1, 300), 1500);
}

double temperature_at_entropy(double p, double s) {
  const auto solve = [&](auto region, double start) {
    using Region = decltype(region);
    return newton(
        start, s, kGasConstant, [&](double at) { return s_of<Region>(p, at); },
        [&](double at) { return cp_of<Region>(p, at) / at; });
  };
  if (p <= 16.529164252604509e6) {
    const double saturated = saturation_temperature(p);
    if (s < s_of<One>(p, saturated)) return solve(One(1, 300), start_ps(p, s, 1));
    if (s <= s_of<Two>(p, saturated)) return saturated;
  } else {
    if (s <= s_of<One>(p, 623.15)) return solve(One(1, 300), start_ps(p, s, 1));
    if (s < s_of<Two>(p, boundary_23_temperature(p))) return ps_3(p, s);
  }
  if (s <= s_of<Two>(p, 1073.15)) return solve(Two(1, 300), start_ps(p, s, 2));
  return solve(Five(1, 300), 1500);
}

}  // namespace busbar::yardstick
