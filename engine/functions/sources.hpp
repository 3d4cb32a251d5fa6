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

inline constexpr const char* kFirst = "0.1.0";

}  // namespace busbar::functions
