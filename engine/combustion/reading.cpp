#include "combustion/reading.hpp"

#include "combustion/products.hpp"

namespace busbar::combustion {
namespace {

using gas::Element;

// Products other than oxygen, when all that burns is burnt; mol per kg fuel or per mol oxidant.
template <class Matter>
double moles_but_oxygen(const Matter& matter, bool wet) {
  double sum = matter.of(Element::C) + matter.of(Element::S) + matter.of(Element::N) / 2;
  if (wet) sum += matter.of(Element::H) / 2;
  for (const Element noble : {Element::Ar, Element::Ne, Element::He, Element::Kr, Element::Xe}) {
    sum += matter.of(noble);
  }
  return sum;
}

// Flue gas = `fixed` + air ratio times `rising`, when excess oxygen counts as negative below 1.
struct Volume {
  double need = 0;    // O2 of complete combustion
  double moles = 0;   // oxidant at an air ratio of 1
  double fixed = 0;   // without the oxygen of the air
  double rising = 0;  // per air ratio, oxygen included
};

Volume volume(const Fuel& fuel, const Oxidant& air, bool wet) {
  Volume v;
  v.need = stoichiometric_oxygen(fuel);
  v.moles = stoichiometric_moles(fuel, air);
  v.fixed = moles_but_oxygen(fuel, wet) - v.need;
  v.rising = v.moles * moles_but_oxygen(air, wet) + v.need;
  return v;
}

Failure reading(const char* reason, double found, double limit) {
  return {
      Fault::impossible, 3, reason, {{{found, Quantity::fraction}, {limit, Quantity::fraction}}}};
}

}  // namespace

Outcome<double> air_ratio_from_oxygen(const Fuel& fuel, const Oxidant& air, double oxygen, bool wet,
                                      const Incomplete& incomplete) {
  const Volume v = volume(fuel, air, wet);
  // Each CO leaves half an O2 unused and takes the place of one CO2. With the oxygen that it would
  // still take withdrawn, the gas is that of complete combustion.
  const double share =
      (oxygen - incomplete.carbon_monoxide / 2) / (1 - incomplete.carbon_monoxide / 2);
  const double ambient = v.need / v.rising;
  if (!(share < ambient)) {
    return reading("{0} is not below {1}, the oxygen of the air itself", oxygen, ambient);
  }
  const double unburnt = incomplete.unburnt_carbon * fuel.of(Element::C);
  const double ratio = (v.need - unburnt + share * v.fixed) / (v.need - share * v.rising);
  if (!(ratio > 0)) {
    return reading("{0} is too little for {1} of CO: there would be no air at all", oxygen,
                   incomplete.carbon_monoxide);
  }
  return ratio;
}

Outcome<double> air_ratio_from_carbon_dioxide(const Fuel& fuel, const Oxidant& air,
                                              double carbon_dioxide, bool wet,
                                              double unburnt_carbon) {
  const double burnt = fuel.of(Element::C) * (1 - unburnt_carbon);
  if (!(burnt > 0)) return Failure{Fault::impossible, 1, "holds no carbon that burns"};
  const Volume v = volume(fuel, air, wet);
  const double from_air = v.moles * air.of(Element::C);
  const double ambient = from_air / v.rising;
  if (!(carbon_dioxide > ambient)) {
    return reading("{0} is not above {1}, what the air itself brings", carbon_dioxide, ambient);
  }
  const double ratio = (burnt - carbon_dioxide * v.fixed) / (carbon_dioxide * v.rising - from_air);
  constexpr double kRounding = 1e-9;
  if (!(ratio >= 1 - kRounding)) {
    const double most = (burnt + from_air) / (v.fixed + v.rising);
    return reading(
        "{0} is above {1}, the most that complete combustion gives: at an air ratio of 1",
        carbon_dioxide, most);
  }
  return ratio;
}

Outcome<double> air_ratio_from_dry_readings(const Fuel& fuel, const Oxidant& air,
                                            const DryReadings& readings, double unburnt_carbon) {
  // The absorbent of CO2 takes SO2 too; the CO2 of the air is counted with the fuel's carbon, as
  // it reaches the same reading.
  const double burnt = fuel.of(Element::C) * (1 - unburnt_carbon);
  if (!(burnt > 0)) return Failure{Fault::impossible, 1, "holds no carbon that burns"};
  const double carbon = readings.carbon_dioxide + readings.carbon_monoxide;
  const double nitrogen = 1 - carbon - readings.oxygen;
  if (!(carbon > 0)) return Failure{Fault::impossible, 3, "and CO are nought: no fuel burns"};
  if (!(nitrogen > 0)) {
    return Failure{Fault::impossible,
                   3,
                   "sums with CO and oxygen to {0}: no nitrogen is left",
                   {{{carbon + readings.oxygen, Quantity::fraction}}}};
  }
  // gas = (burnt + S + a air_C) / carbon; nitrogen gas = fuel_N2 + a air_N2: linear in a.
  const auto inert = [](const auto& matter) {
    double sum = matter.of(Element::N) / 2;
    for (const Element noble : {Element::Ar, Element::Ne, Element::He, Element::Kr, Element::Xe}) {
      sum += matter.of(noble);
    }
    return sum;
  };
  const double slope = nitrogen / carbon;
  const double air_inert = inert(air) - slope * (air.of(Element::C) + air.of(Element::S));
  if (!(air_inert > 0)) {
    return Failure{Fault::impossible, 3, "leaves less nitrogen for its carbon than the air has"};
  }
  const double moles = (slope * (burnt + fuel.of(Element::S)) - inert(fuel)) / air_inert;
  if (!(moles > 0)) {
    return Failure{Fault::impossible, 3, "leaves less nitrogen than the fuel itself brings"};
  }
  return moles / stoichiometric_moles(fuel, air);
}

}  // namespace busbar::combustion
