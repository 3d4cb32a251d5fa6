// The NASA polynomial of nine coefficients, of one species or of a mixture of any.
//
// B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556, equations 1 to 3:
//   cp/R   = a1/T^2 + a2/T + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4
//   h/(RT) = -a1/T^2 + a2 ln(T)/T + a3 + a4 T/2 + a5 T^2/3 + a6 T^3/4 + a7 T^4/5 + b1/T
//   s/R    = -a1/(2 T^2) - a2/T + a3 ln T + a4 T + a5 T^2/2 + a6 T^3/3 + a7 T^4/4 + b2
// The enthalpy holds the heat of formation from the elements at 298.15 K; the entropy is the
// absolute one of the ideal gas at 1 bar.
#pragma once

#include <array>
#include <cmath>

namespace busbar::gas {

/// The molar gas constant that belongs to the fits, J/(mol K): the source's, 6e-6 below that of
/// the SI of 2019. Densities and sound speeds use it too, so that cp, h, s and v agree.
inline constexpr double kGasConstant = 8.314510;

/// The standard pressure of the entropies, Pa.
inline constexpr double kStandardPressure = 1e5;

/// Where the two fits of a gas meet, K; the upper one holds from here on.
inline constexpr double kBreak = 1000;

/// What every species needs at one temperature: computed once.
struct Powers {
  double t;
  double inverse;
  double logarithm;

  static Powers at(double temperature) {
    return {temperature, 1 / temperature, std::log(temperature)};
  }
};

struct Polynomial {
  std::array<double, 9> c{};  ///< a1 to a7, b1, b2

  [[nodiscard]] double heat_capacity(const Powers& p) const {  // cp/R
    return (c[0] * p.inverse + c[1]) * p.inverse +
           (c[2] + p.t * (c[3] + p.t * (c[4] + p.t * (c[5] + p.t * c[6]))));
  }
  [[nodiscard]] double enthalpy(const Powers& p) const {  // h/R, K
    return c[1] * p.logarithm - c[0] * p.inverse + c[7] +
           p.t * (c[2] + p.t * (c[3] / 2 + p.t * (c[4] / 3 + p.t * (c[5] / 4 + p.t * (c[6] / 5)))));
  }
  [[nodiscard]] double entropy(const Powers& p) const {  // s/R at 1 bar
    return c[2] * p.logarithm - (c[0] * p.inverse / 2 + c[1]) * p.inverse + c[8] +
           p.t * (c[3] + p.t * (c[4] / 2 + p.t * (c[5] / 3 + p.t * (c[6] / 4))));
  }
  [[nodiscard]] double gibbs(const Powers& p) const {  // g/(RT) at 1 bar
    return enthalpy(p) * p.inverse - entropy(p);
  }

  void add(const Polynomial& other, double weight) {
    for (std::size_t k = 0; k < c.size(); ++k) c[k] += weight * other.c[k];
  }
};

}  // namespace busbar::gas
