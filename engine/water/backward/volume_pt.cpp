#include <cmath>

#include "water/backward/volume.hpp"
#include "water/constants.hpp"
#include "water/equations/logarithm.hpp"
#include "water/equations/series.hpp"
#include "water/tables/backward_pt_3_a_to_f.hpp"
#include "water/tables/backward_pt_3_boundaries.hpp"
#include "water/tables/backward_pt_3_g_to_l.hpp"
#include "water/tables/backward_pt_3_m_to_t.hpp"
#include "water/tables/backward_pt_3_u_to_z.hpp"

namespace busbar::water::backward {

#include "water/kernels/subregions.hpp"

namespace {

// Limits of pressure of SR5-05(2016), tables 2 and 10, Pa.
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
  return logarithmic_boundary_of<tables::kBoundary3abPt>(pressure);
}
double boundary_3cd(double pressure) { return boundary_of<tables::kBoundary3cd>(pressure); }
double boundary_3ef(double pressure) { return boundary_3ef_at(pressure); }
double boundary_3gh(double pressure) { return boundary_of<tables::kBoundary3gh>(pressure); }
double boundary_3ij(double pressure) { return boundary_of<tables::kBoundary3ij>(pressure); }
double boundary_3jk(double pressure) { return boundary_of<tables::kBoundary3jk>(pressure); }
double boundary_3mn(double pressure) { return boundary_of<tables::kBoundary3mn>(pressure); }
double boundary_3op(double pressure) {
  return logarithmic_boundary_of<tables::kBoundary3op>(pressure);
}
double boundary_3qu(double pressure) { return boundary_of<tables::kBoundary3qu>(pressure); }
double boundary_3rx(double pressure) { return boundary_of<tables::kBoundary3rx>(pressure); }
double boundary_3uv(double pressure) { return boundary_of<tables::kBoundary3uv>(pressure); }
double boundary_3wx(double pressure) {
  return logarithmic_boundary_of<tables::kBoundary3wx>(pressure);
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

double volume_pt_3(Subregion3 subregion, double pressure, double temperature) {
  switch (subregion) {
    case Subregion3::a:
      return volume_3a_at(pressure, temperature);
    case Subregion3::b:
      return volume_3b_at(pressure, temperature);
    case Subregion3::c:
      return volume_3c_at(pressure, temperature);
    case Subregion3::d:
      return volume_3d_at(pressure, temperature);
    case Subregion3::e:
      return volume_3e_at(pressure, temperature);
    case Subregion3::f:
      return volume_3f_at(pressure, temperature);
    case Subregion3::g:
      return volume_3g_at(pressure, temperature);
    case Subregion3::h:
      return volume_3h_at(pressure, temperature);
    case Subregion3::i:
      return volume_3i_at(pressure, temperature);
    case Subregion3::j:
      return volume_3j_at(pressure, temperature);
    case Subregion3::k:
      return volume_3k_at(pressure, temperature);
    case Subregion3::l:
      return volume_3l_at(pressure, temperature);
    case Subregion3::m:
      return volume_3m_at(pressure, temperature);
    case Subregion3::n:
      return 0.0031 * std::exp(sum_of<tables::kVolumePt3n>(pressure / 23e6 - 0.976,
                                                           temperature / 650 - 0.997));
    case Subregion3::o:
      return volume_3o_at(pressure, temperature);
    case Subregion3::p:
      return volume_3p_at(pressure, temperature);
    case Subregion3::q:
      return volume_3q_at(pressure, temperature);
    case Subregion3::r:
      return volume_3r_at(pressure, temperature);
    case Subregion3::s:
      return volume_3s_at(pressure, temperature);
    case Subregion3::t:
      return volume_3t_at(pressure, temperature);
    case Subregion3::u:
      return volume_3u_at(pressure, temperature);
    case Subregion3::v:
      return volume_3v_at(pressure, temperature);
    case Subregion3::w:
      return volume_3w_at(pressure, temperature);
    case Subregion3::x:
      return volume_3x_at(pressure, temperature);
    case Subregion3::y:
      return volume_3y_at(pressure, temperature);
    case Subregion3::z:
      return volume_3z_at(pressure, temperature);
  }
  return 0;
}

}  // namespace busbar::water::backward
