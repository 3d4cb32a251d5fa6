// The enthalpy and entropy of water on the datums of gases.
//
// The steam tables put both at zero in the liquid at the triple point; gases count from the
// elements (enthalpy) and from 0 K (entropy). The two meet in the vapour so thin that it is an
// ideal gas: there, at 298.15 K, IAPWS-IF97 is set equal to the NASA polynomial of H2O. Steam of
// low pressure and the water of a gas then are one substance, liquid water differs from it by the
// heat of evaporation of IF97, and both ways of counting differ by a constant.
#pragma once

namespace busbar::fluid {

/// What must be added to the enthalpy of IAPWS-IF97 so that it holds the heat of formation, J/kg:
/// about -15.97 MJ/kg.
double water_enthalpy_shift();

/// What must be added to the entropy of IAPWS-IF97 so that it is the absolute one, J/(kg K).
double water_entropy_shift();

}  // namespace busbar::fluid
