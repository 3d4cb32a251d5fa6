#include "air/virial.hpp"

#include <array>
#include <cmath>
#include <cstddef>

#include "air/constants.hpp"
#include "air/tables/virial.hpp"

namespace busbar::air {
namespace {

constexpr double kCrossReducingTemperature = 100;  // K

// Sum of n base^t; the slope is that of T d/dT where base goes with T to the power `sense`.
template <std::size_t N>
Coefficient power_sum(const std::array<tables::Term, N>& terms, double log_base, double sense,
                      double scale) {
  Coefficient sum;
  for (const tables::Term& term : terms) {
    const double value = term.n * std::exp(term.t * log_base);
    sum.value += value;
    sum.slope += sense * term.t * value;
  }
  return {sum.value * scale, sum.slope * scale};
}

// Polynomial in y = 100 K/T with its T d/dT.
template <std::size_t N>
Coefficient polynomial(const std::array<double, N>& n, double y) {
  double value = 0;
  double slope = 0;
  for (std::size_t i = N; i-- > 0;) {
    value = value * y + n[i];
    slope = slope * y - static_cast<double>(i) * n[i];
  }
  return {value, slope};
}

// The first coefficient of a residual Helmholtz energy is B rho, the second C rho^2 / 2.
constexpr double kThird = 2;

}  // namespace

Virials virials(double temperature) {
  constexpr double kWaterReducingDensity = tables::kWaterReducingMassDensity / kWaterMolarMass;
  constexpr double kAir = 1 / tables::kAirReducingDensity;
  constexpr double kWater = 1 / kWaterReducingDensity;
  const double air = std::log(tables::kAirReducingTemperature / temperature);
  const double water = std::log(tables::kWaterReducingTemperature / temperature);
  const double cross = std::log(temperature / kCrossReducingTemperature);
  const double y = kCrossReducingTemperature / temperature;

  Virials out;
  out.aa = power_sum(tables::kAirSecond, air, -1, kAir);
  out.aaa = power_sum(tables::kAirThird, air, -1, kThird * kAir * kAir);
  out.ww = power_sum(tables::kWaterSecond, water, -1, kWater);
  out.www = power_sum(tables::kWaterThird, water, -1, kThird * kWater * kWater);
  out.aw = power_sum(tables::kCrossSecond, cross, 1, 1);
  out.aaw = polynomial(tables::kAirAirWater, y);
  const Coefficient exponent = polynomial(tables::kAirWaterWater, y);
  out.aww.value = tables::kAirWaterWaterScale * std::exp(exponent.value);
  out.aww.slope = out.aww.value * exponent.slope;
  return out;
}

MixtureVirials mixture(const Virials& of, double x) {
  const double a = 1 - x;
  const auto second = [&](double aa, double aw, double ww) {
    return a * a * aa + 2 * a * x * aw + x * x * ww;
  };
  const auto third = [&](double aaa, double aaw, double aww, double www) {
    return a * a * (a * aaa + 3 * x * aaw) + x * x * (3 * a * aww + x * www);
  };
  return {{second(of.aa.value, of.aw.value, of.ww.value),
           second(of.aa.slope, of.aw.slope, of.ww.slope)},
          {third(of.aaa.value, of.aaw.value, of.aww.value, of.www.value),
           third(of.aaa.slope, of.aaw.slope, of.aww.slope, of.www.slope)}};
}

double log_fugacity_coefficient(const Virials& of, double q, double x) {
  const double a = 1 - x;
  const double aa = of.aa.value;
  const double aw = of.aw.value;
  const double ww = of.ww.value;
  const double beta = x * (2 - x) * ww + a * a * (2 * aw - aa);
  const double gamma =
      x * x * (3 - 2 * x) * of.www.value +
      a * a * (6 * x * of.aww.value + 3 * (1 - 2 * x) * of.aaw.value - 2 * a * of.aaa.value) +
      (x * x * ww + 2 * x * a * aw + a * a * aa) *
          (x * (3 * x - 4) * ww + 2 * a * (3 * x - 2) * aw + 3 * a * a * aa);
  return q * (beta + 0.5 * q * gamma);
}

}  // namespace busbar::air
