// What the kernels of gases cost beside a plain transcription of NASA/TP-2002-211556: std::pow for
// every term, species by species, and Newton's method from 1,000 K.
#include <cmath>

#include "gas/properties.hpp"
#include "ratios.hpp"

namespace {

using namespace busbar;         // NOLINT(google-build-using-namespace)
using namespace busbar::bench;  // NOLINT(google-build-using-namespace)
using gas::Datum;
using gas::Mixture;
using gas::Species;

// Flue gas of eight species.
const Mixture& flue_gas() {
  static const Mixture mixture = [] {
    std::array<double, gas::kSpecies> amounts{};
    const auto set = [&](Species species, double amount) {
      amounts[static_cast<std::size_t>(species)] = amount;
    };
    set(Species::N2, 0.74);
    set(Species::O2, 0.12);
    set(Species::Ar, 0.009);
    set(Species::CO2, 0.05);
    set(Species::H2O, 0.08);
    set(Species::SO2, 0.0003);
    set(Species::CO, 0.0002);
    set(Species::NO, 0.0005);
    return *Mixture::from_amounts(amounts);
  }();
  return mixture;
}

double plain_h(double, double t) {
  double sum = 0;
  for (std::size_t i = 0; i < flue_gas().size(); ++i) {
    const auto& a = gas::fit(flue_gas().species(i), t).c;
    const double h = -a[0] * std::pow(t, -2) + a[1] * std::log(t) / t + a[2] + a[3] * t / 2 +
                     a[4] * std::pow(t, 2) / 3 + a[5] * std::pow(t, 3) / 4 +
                     a[6] * std::pow(t, 4) / 5 + a[7] / t;
    sum += flue_gas().mole_fraction(i) * h;
  }
  return sum * gas::kGasConstant * t / flue_gas().molar_mass();
}

double plain_cp(double t) {
  double sum = 0;
  for (std::size_t i = 0; i < flue_gas().size(); ++i) {
    const auto& a = gas::fit(flue_gas().species(i), t).c;
    sum += flue_gas().mole_fraction(i) *
           (a[0] * std::pow(t, -2) + a[1] / t + a[2] + a[3] * t + a[4] * std::pow(t, 2) +
            a[5] * std::pow(t, 3) + a[6] * std::pow(t, 4));
  }
  return sum * gas::kGasConstant / flue_gas().molar_mass();
}

double plain_t(double, double h) {
  double t = 1000;
  for (int i = 0; i < 50; ++i) {
    const double step = (h - plain_h(0, t)) / plain_cp(t);
    t += step;
    if (std::abs(step) < 1e-10 * t) break;
  }
  return t;
}

double scalar_h(double, double t) { return *gas::enthalpy(flue_gas(), t, Datum::formation); }
double scalar_t(double, double h) {
  return *gas::temperature_at_enthalpy(flue_gas(), h, Datum::formation);
}
double scalar_cp(double, double t) { return *gas::heat_capacity(flue_gas(), t); }
double plain_cp_pair(double, double t) { return plain_cp(t); }

}  // namespace

int main(int argc, char** argv) {
  Draw draw;
  Pairs temperatures;
  Pairs enthalpies;
  for (std::size_t i = 0; i < kStates; ++i) {
    const double t = draw(280, 2000);
    temperatures.add(1e5, t);
    enthalpies.add(1e5, scalar_h(0, t));
  }
  const std::vector<Job> jobs{
      {"t->h, 8 species", &temperatures, plain_h, scalar_h, nullptr},
      {"t->cp, 8 species", &temperatures, plain_cp_pair, scalar_cp, nullptr},
      {"h->t, 8 species", &enthalpies, plain_t, scalar_t, nullptr},
  };
  return run(argc, argv, jobs);
}
