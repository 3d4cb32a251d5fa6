// What the water and steam kernels cost beside a plain transcription of the release.
#include <cmath>

#include "ratios.hpp"
#include "water/batch/isobar.hpp"
#include "water/batch/pressure_temperature.hpp"
#include "water/batch/saturation.hpp"
#include "water/state.hpp"
#include "yardstick.hpp"

namespace {

using namespace busbar;         // NOLINT(google-build-using-namespace)
using namespace busbar::bench;  // NOLINT(google-build-using-namespace)
using water::State;

template <double State::*Member>
double at_pt(double p, double t) {
  return (*water::at_pressure_temperature(p, t)).*Member;
}
template <double State::*Member>
double at_ph(double p, double h) {
  return (*water::at_pressure_enthalpy(p, h)).*Member;
}
template <double State::*Member>
double at_ps(double p, double s) {
  return (*water::at_pressure_entropy(p, s)).*Member;
}

// The sums keep the compiler from leaving a property out.
double plain_vhs(double p, double t) {
  return yardstick::volume(p, t) + yardstick::enthalpy(p, t) + yardstick::entropy(p, t);
}
double scalar_vhs(double p, double t) {
  const auto state = water::at_pressure_temperature(p, t);
  return state->volume + state->enthalpy + state->entropy;
}
double plain_ts(double p, double h) {
  const double t = yardstick::temperature_at_enthalpy(p, h);
  return t + yardstick::entropy(p, t);
}
double scalar_ts(double p, double h) {
  const auto state = water::at_pressure_enthalpy(p, h);
  return state->temperature + state->entropy;
}
double plain_psat(double, double t) { return yardstick::saturation_pressure(t); }
double scalar_psat(double, double t) { return *water::saturation_pressure(t); }
double plain_tsat(double p, double) { return yardstick::saturation_temperature(p); }
double scalar_tsat(double p, double) { return *water::saturation_temperature(p); }
double scalar_density(double p, double t) {
  return 1 / water::at_pressure_temperature(p, t)->volume;
}

// A batch with the states that it leaves to the scalar function.
template <water::batch::AtPressureTemperature kBatch, double (*kScalar)(double, double)>
void columns(const Pairs& in, std::vector<double>& out) {
  kBatch(in.first.data(), in.second.data(), out.data(), kStates);
  for (std::size_t i = 0; i < kStates; ++i) {
    if (!std::isfinite(out[i])) out[i] = kScalar(in.first[i], in.second[i]);
  }
}
void columns_psat(const Pairs& in, std::vector<double>& out) {
  water::batch::saturation_pressure(in.second.data(), out.data(), kStates);
}
void columns_tsat(const Pairs& in, std::vector<double>& out) {
  water::batch::saturation_temperature(in.first.data(), out.data(), kStates);
}
void columns_vhs(const Pairs& in, std::vector<double>& out) {
  water::batch::volume_enthalpy_entropy(in.first.data(), in.second.data(), out.data(),
                                        out.data() + kStates, out.data() + 2 * kStates, kStates);
}

void columns_ts(const Pairs& in, std::vector<double>& out) {
  water::batch::temperature_entropy_at_enthalpy(in.first.data(), in.second.data(), out.data(),
                                                out.data() + kStates, kStates);
  for (std::size_t i = 0; i < kStates; ++i) {
    if (std::isfinite(out[i])) continue;
    const auto state = water::at_pressure_enthalpy(in.first[i], in.second[i]);
    out[i] = state->temperature;
    out[kStates + i] = state->entropy;
  }
}

Pairs on_saturation_line() {
  Draw draw;
  Pairs pairs;
  for (std::size_t i = 0; i < kStates; ++i) pairs.add(draw.decades(1e3, 22e6), draw(274, 647));
  return pairs;
}

}  // namespace

int main(int argc, char** argv) {
  const Pairs sheet = pressures_and_temperatures(kSheet);
  const Pairs liquid = pressures_and_temperatures(kLiquidOnly);
  const Pairs vapour = pressures_and_temperatures(kVapourOnly);
  const Pairs supercritical = pressures_and_temperatures(kSupercriticalOnly);
  const Pairs ph = pressures_and(&State::enthalpy, kSheetWithWet);
  const Pairs ps = pressures_and(&State::entropy, kSheetWithWet);
  const Pairs saturation = on_saturation_line();
  const std::vector<Job> jobs{
      {"(p,t)->h, sheet", &sheet, yardstick::enthalpy, at_pt<&State::enthalpy>,
       columns<water::batch::enthalpy, at_pt<&State::enthalpy>>, 20, 60, 15},
      {"(p,t)->h, region 1", &liquid, yardstick::enthalpy, at_pt<&State::enthalpy>,
       columns<water::batch::enthalpy, at_pt<&State::enthalpy>>, 0, 0, 8},
      {"(p,t)->h, region 2", &vapour, yardstick::enthalpy, at_pt<&State::enthalpy>,
       columns<water::batch::enthalpy, at_pt<&State::enthalpy>>, 0, 0, 8},
      {"(p,t)->v,h,s, sheet", &sheet, plain_vhs, scalar_vhs, columns_vhs, 0, 100},
      {"(p,t)->density, region 3", &supercritical, yardstick::density_3, scalar_density,
       columns<water::batch::density_3, scalar_density>, 0, 0, 50},
      {"(p,h)->t, sheet", &ph, yardstick::temperature_at_enthalpy, at_ph<&State::temperature>,
       columns<water::batch::temperature_at_enthalpy, at_ph<&State::temperature>>, 30, 100},
      {"(p,h)->t,s, sheet", &ph, plain_ts, scalar_ts, columns_ts, 0, 0, 35},
      {"(p,s)->t, sheet", &ps, yardstick::temperature_at_entropy, at_ps<&State::temperature>,
       columns<water::batch::temperature_at_entropy, at_ps<&State::temperature>>, 30, 100},
      {"t->saturation pressure", &saturation, plain_psat, scalar_psat, columns_psat, 5, 0},
      {"p->saturation temperature", &saturation, plain_tsat, scalar_tsat, columns_tsat, 5, 0},
  };
  return run(argc, argv, jobs);
}
