// Ideal-gas parts of the Helmholtz energies of dry air and water: coefficients of the enthalpy.
#pragma once

#include <array>

namespace busbar::air::tables {

/// A vibration or rotation that the heat capacity shows: n over the exponent.
struct Mode {
  double n = 0;
  double exponent = 0;
};

// Dry air: Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331; the constant of the
// enthalpy (n5) as IAPWS G8-10 gives it: zero for dry air at 273.15 K and 101.325 kPa.
inline constexpr double kAirGasConstant = 8.314510;  // J/(mol K), belongs to these figures
inline constexpr std::array<double, 3> kAirIdeal{0.605719400e-7, -0.210274769e-4,
                                                 -0.158860716e-3};  // tau^-3, tau^-2, tau^-1
inline constexpr double kAirIdealConstant = 0.100986147428912e2;    // tau
inline constexpr double kAirIdealRoot = -0.195363420e-3;            // tau^1.5
inline constexpr double kAirIdealLogarithm = 0.2490888032e1;
inline constexpr std::array<Mode, 2> kAirModes{
    {{0.791309509, 0.2536365e2}, {0.212236768, 0.1690741e2}}};
inline constexpr Mode kAirLastMode{-0.197938904, 0.8731279e2};  // of ln(2/3 + exp(n tau))

// Water: IAPWS R6-95(2018), table 1.
inline constexpr double kWaterGasConstant = 461.51805;  // J/(kg K), belongs to these figures
inline constexpr double kWaterIdealConstant = 6.6832105275932;
inline constexpr double kWaterIdealLogarithm = 3.00632;
inline constexpr std::array<Mode, 5> kWaterModes{{{0.012436, 1.28728967},
                                                  {0.97315, 3.53734222},
                                                  {1.27950, 7.74073708},
                                                  {0.96956, 9.24437796},
                                                  {0.24873, 27.5075105}}};

}  // namespace busbar::air::tables
