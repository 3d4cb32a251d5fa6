#include <cmath>

#include "water/backward/volume.hpp"
#include "water/constants.hpp"
#include "water/equations/series.hpp"
#include "water/tables/backward_pt_3_a_to_f.hpp"
#include "water/tables/backward_pt_3_boundaries.hpp"
#include "water/tables/backward_pt_3_g_to_l.hpp"
#include "water/tables/backward_pt_3_m_to_t.hpp"
#include "water/tables/backward_pt_3_u_to_z.hpp"

namespace busbar::water::backward {

namespace {

template <const auto& kTable>
double sum(double x, double y) {
  return series<kTable, kValue>(x, y).value;
}

double power_4(double x) {
  const double square = x * x;
  return square * square;
}

// Equation 1: powers of the pressure in MPa; equation 2: powers of its logarithm.
template <const auto& kTable>
double boundary(double pressure) {
  return sum<kTable>(pressure * 1e-6, 1.0);
}

template <const auto& kTable>
double logarithmic_boundary(double pressure) {
  return sum<kTable>(std::log(pressure * 1e-6), 1.0);
}

// Limits of pressure of SR5-05(2016), tables 2 and 10, Pa.
constexpr double kPressure3cd = 19.00881189173929e6;         // footnote of table 2
constexpr double kSaturationPressure643 = 21.04336732e6;     // section 5.1: psat(643.15 K)
constexpr double kSaturationPressureLiquid = 21.93161551e6;  // footnote e: v' = 0.00264 m3/kg
constexpr double kSaturationPressureVapour = 21.90096265e6;  // footnote f: v'' = 0.00385 m3/kg

// Table 10: 3u to 3z, between the boundaries 3qu and 3rx.
Subregion3 near_critical(double p, double t, bool liquid) {
  if (p > kCriticalPressure) {
    const bool upper = p > 22.11e6;
    if (t <= boundary_3uv(p)) return Subregion3::u;
    if (t <= boundary_3ef(p)) return upper ? Subregion3::v : Subregion3::y;
    if (t <= boundary_3wx(p)) return upper ? Subregion3::w : Subregion3::z;
    return Subregion3::x;
  }
  if (liquid) {
    if (p > kSaturationPressureLiquid && t > boundary_3uv(p)) return Subregion3::y;
    return Subregion3::u;
  }
  if (p > kSaturationPressureVapour && t <= boundary_3wx(p)) return Subregion3::z;
  return Subregion3::x;
}

}  // namespace

double boundary_3ab_pt(double pressure) {
  return logarithmic_boundary<tables::kBoundary3abPt>(pressure);
}
double boundary_3cd(double pressure) { return boundary<tables::kBoundary3cd>(pressure); }
double boundary_3ef(double pressure) {
  return tables::kBoundary3efSlope * (pressure * 1e-6 - kCriticalPressure * 1e-6) +
         kCriticalTemperature;
}
double boundary_3gh(double pressure) { return boundary<tables::kBoundary3gh>(pressure); }
double boundary_3ij(double pressure) { return boundary<tables::kBoundary3ij>(pressure); }
double boundary_3jk(double pressure) { return boundary<tables::kBoundary3jk>(pressure); }
double boundary_3mn(double pressure) { return boundary<tables::kBoundary3mn>(pressure); }
double boundary_3op(double pressure) {
  return logarithmic_boundary<tables::kBoundary3op>(pressure);
}
double boundary_3qu(double pressure) { return boundary<tables::kBoundary3qu>(pressure); }
double boundary_3rx(double pressure) { return boundary<tables::kBoundary3rx>(pressure); }
double boundary_3uv(double pressure) { return boundary<tables::kBoundary3uv>(pressure); }
double boundary_3wx(double pressure) {
  return logarithmic_boundary<tables::kBoundary3wx>(pressure);
}

Subregion3 subregion_3(double pressure, double temperature, bool liquid) {
  const double p = pressure;
  const double t = temperature;
  if (p > 40e6) return t <= boundary_3ab_pt(p) ? Subregion3::a : Subregion3::b;
  if (p <= kPressure3cd) return liquid ? Subregion3::c : Subregion3::t;
  if (t <= boundary_3cd(p)) return Subregion3::c;
  if (p > 25e6) {
    if (t <= boundary_3ab_pt(p)) return Subregion3::d;
    return t <= boundary_3ef(p) ? Subregion3::e : Subregion3::f;
  }
  if (p > 22.5e6) {
    if (t > boundary_3jk(p)) return Subregion3::k;
    if (t > boundary_3ij(p)) return Subregion3::j;
    if (t <= boundary_3gh(p)) return p > 23.5e6 ? Subregion3::g : Subregion3::l;
    if (p > 23e6) return t <= boundary_3ef(p) ? Subregion3::h : Subregion3::i;
    if (t <= boundary_3ef(p)) return t <= boundary_3mn(p) ? Subregion3::m : Subregion3::n;
    return t <= boundary_3op(p) ? Subregion3::o : Subregion3::p;
  }
  if (p > kSaturationPressure643) {
    if (t <= boundary_3qu(p)) return Subregion3::q;
    if (t <= boundary_3rx(p)) return near_critical(p, t, liquid);
    return t <= boundary_3jk(p) ? Subregion3::r : Subregion3::k;
  }
  if (liquid) return Subregion3::s;
  if (p > 20.5e6) return t <= boundary_3jk(p) ? Subregion3::r : Subregion3::k;
  return Subregion3::t;
}

// The reducing quantities and exponents of tables 4 and 12 of SR5-05(2016) stand in the cases.
double volume_pt_3(Subregion3 subregion, double pressure, double temperature) {
  switch (subregion) {
    case Subregion3::a:
      return 0.0024 * sum<tables::kVolumePt3a>(pressure / 100e6 - 0.085, temperature / 760 - 0.817);
    case Subregion3::b:
      return 0.0041 * sum<tables::kVolumePt3b>(pressure / 100e6 - 0.280, temperature / 860 - 0.779);
    case Subregion3::c:
      return 0.0022 * sum<tables::kVolumePt3c>(pressure / 40e6 - 0.259, temperature / 690 - 0.903);
    case Subregion3::d:
      return 0.0029 *
             power_4(sum<tables::kVolumePt3d>(pressure / 40e6 - 0.559, temperature / 690 - 0.939));
    case Subregion3::e:
      return 0.0032 * sum<tables::kVolumePt3e>(pressure / 40e6 - 0.587, temperature / 710 - 0.918);
    case Subregion3::f:
      return 0.0064 * power_4(sum<tables::kVolumePt3f>(std::sqrt(pressure / 40e6 - 0.587),
                                                       temperature / 730 - 0.891));
    case Subregion3::g:
      return 0.0027 *
             power_4(sum<tables::kVolumePt3g>(pressure / 25e6 - 0.872, temperature / 660 - 0.971));
    case Subregion3::h:
      return 0.0032 *
             power_4(sum<tables::kVolumePt3h>(pressure / 25e6 - 0.898, temperature / 660 - 0.983));
    case Subregion3::i:
      return 0.0041 * power_4(sum<tables::kVolumePt3i>(std::sqrt(pressure / 25e6 - 0.910),
                                                       temperature / 660 - 0.984));
    case Subregion3::j:
      return 0.0054 * power_4(sum<tables::kVolumePt3j>(std::sqrt(pressure / 25e6 - 0.875),
                                                       temperature / 670 - 0.964));
    case Subregion3::k:
      return 0.0077 * sum<tables::kVolumePt3k>(pressure / 25e6 - 0.802, temperature / 680 - 0.935);
    case Subregion3::l:
      return 0.0026 *
             power_4(sum<tables::kVolumePt3l>(pressure / 24e6 - 0.908, temperature / 650 - 0.989));
    case Subregion3::m:
      return 0.0028 * sum<tables::kVolumePt3m>(pressure / 23e6 - 1.00,
                                               std::sqrt(std::sqrt(temperature / 650 - 0.997)));
    case Subregion3::n:
      return 0.0031 *
             std::exp(sum<tables::kVolumePt3n>(pressure / 23e6 - 0.976, temperature / 650 - 0.997));
    case Subregion3::o:
      return 0.0034 * sum<tables::kVolumePt3o>(std::sqrt(pressure / 23e6 - 0.974),
                                               temperature / 650 - 0.996);
    case Subregion3::p:
      return 0.0041 * sum<tables::kVolumePt3p>(std::sqrt(pressure / 23e6 - 0.972),
                                               temperature / 650 - 0.997);
    case Subregion3::q:
      return 0.0022 *
             power_4(sum<tables::kVolumePt3q>(pressure / 23e6 - 0.848, temperature / 650 - 0.983));
    case Subregion3::r:
      return 0.0054 * sum<tables::kVolumePt3r>(pressure / 23e6 - 0.874, temperature / 650 - 0.982);
    case Subregion3::s:
      return 0.0022 *
             power_4(sum<tables::kVolumePt3s>(pressure / 21e6 - 0.886, temperature / 640 - 0.990));
    case Subregion3::t:
      return 0.0088 * sum<tables::kVolumePt3t>(pressure / 20e6 - 0.803, temperature / 650 - 1.02);
    case Subregion3::u:
      return 0.0026 * sum<tables::kVolumePt3u>(pressure / 23e6 - 0.902, temperature / 650 - 0.988);
    case Subregion3::v:
      return 0.0031 * sum<tables::kVolumePt3v>(pressure / 23e6 - 0.960, temperature / 650 - 0.995);
    case Subregion3::w:
      return 0.0039 *
             power_4(sum<tables::kVolumePt3w>(pressure / 23e6 - 0.959, temperature / 650 - 0.995));
    case Subregion3::x:
      return 0.0049 * sum<tables::kVolumePt3x>(pressure / 23e6 - 0.910, temperature / 650 - 0.988);
    case Subregion3::y:
      return 0.0031 *
             power_4(sum<tables::kVolumePt3y>(pressure / 22e6 - 0.996, temperature / 650 - 0.994));
    case Subregion3::z:
      return 0.0038 *
             power_4(sum<tables::kVolumePt3z>(pressure / 22e6 - 0.993, temperature / 650 - 0.994));
  }
  return 0;
}

}  // namespace busbar::water::backward
