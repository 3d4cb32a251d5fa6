// A plain transcription of IAPWS R7-97(2012), as somebody writes it down from the release: one
// function a property, std::pow for every term, backward equations as the start and Newton's method
// with the release's own derivatives to the exactness that the engine promises. It is the yardstick
// of the benchmarks and nothing else: no checks, no seam rule. SI units.
#pragma once

namespace busbar::yardstick {

double saturation_pressure(double temperature);  ///< equation 30
double saturation_temperature(double pressure);  ///< equation 31

double volume(double pressure, double temperature);
double enthalpy(double pressure, double temperature);
double entropy(double pressure, double temperature);

/// Density in region 3: Newton on equation 28, started by SR5-05(2016).
double density_3(double pressure, double temperature);

double temperature_at_enthalpy(double pressure, double enthalpy);
double temperature_at_entropy(double pressure, double entropy);

}  // namespace busbar::yardstick
