#include "air/cipm.hpp"

#include <cmath>

namespace busbar::air {

double cipm_2007_density(double pressure, double temperature, double relative_humidity,
                         double carbon_dioxide) {
  constexpr double kGasConstant = 8.314472;  // J/(mol K), CODATA 2006
  const double kelvin = temperature;
  const double t = temperature - 273.15;
  const double p = pressure;

  // Vapour pressure of saturation and enhancement factor: equations A1.1 and A1.2.
  const double saturation = std::exp((1.2378847e-5 * kelvin - 1.9121316e-2) * kelvin + 33.93711047 -
                                     6.3431645e3 / kelvin);
  const double enhancement = 1.00062 + 3.14e-8 * p + 5.6e-7 * t * t;
  const double x = relative_humidity * enhancement * saturation / p;

  // Compressibility: equation A1.4.
  const double per_kelvin = p / kelvin;
  const double second = 1.58123e-6 + (-2.9331e-8 + 1.1043e-10 * t) * t +
                        (5.707e-6 - 2.051e-8 * t) * x + (1.9898e-4 - 2.376e-6 * t) * x * x;
  const double third = 1.83e-11 - 0.765e-8 * x * x;
  const double z = 1 + per_kelvin * (-second + per_kelvin * third);

  const double molar_mass = 1e-3 * (28.96546 + 12.011 * (carbon_dioxide - 0.0004));
  return p * molar_mass / (z * kGasConstant * kelvin) * (1 - 0.3780 * x);
}

}  // namespace busbar::air
