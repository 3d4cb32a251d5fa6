// Sources that several chapters cite.
#pragma once

#include "catalogue/row.hpp"

namespace busbar::functions {

inline constexpr const char* kIf97 =
    "IAPWS R7-97(2012), Industrial Formulation 1997 for the thermodynamic properties of water and "
    "steam";
inline constexpr const char* kIf97Edition = "August 2007, revision of 2012";
inline constexpr Source kSteamTables{kIf97, kIf97Edition,
                                     "equations 7, 15, 28, 30, 31, 32 by region"};
inline constexpr Source kSaturation{kIf97, kIf97Edition, "section 8, equations 30 and 31"};

inline constexpr Source kEnergies{kIf97, kIf97Edition, "tables 3, 12, 31 and 39"};
inline constexpr Source kDerivatives{
    "IAPWS R7-97(2012) with IAPWS AN3-07(2018), Thermodynamic Derivatives from IAPWS Formulations",
    "August 2007, revision of 2012; 2018",
    "second derivatives of equations 7, 15, 28 and 32 (tables 3, 12, 31, 39)"};
inline constexpr Source kViscosityRelease{
    "IAPWS R12-08, Release on the IAPWS Formulation 2008 for the Viscosity of Ordinary Water "
    "Substance; densities by IAPWS-IF97",
    "September 2008", "equations 10 to 12; mu2 = 1 for industrial use"};
inline constexpr Source kConductivityRelease{
    "IAPWS R15-11, Release on the IAPWS Formulation 2011 for the Thermal Conductivity of Ordinary "
    "Water Substance; states by IAPWS-IF97",
    "September 2011", "equations 15 to 25, formulation for industrial use"};
inline constexpr Source kPrandtlReleases{"IAPWS R12-08, R15-11 and R7-97(2012)",
                                         "2008, 2011 and 2012",
                                         "viscosity times cp over thermal conductivity"};
inline constexpr Source kTensionRelease{
    "IAPWS R1-76(2014), Revised Release on Surface Tension of Ordinary Water Substance",
    "June 2014", "equation 1"};

inline constexpr const char* kFirst = "0.1.0";

}  // namespace busbar::functions
