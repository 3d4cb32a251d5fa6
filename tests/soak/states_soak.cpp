// Millions of random states of every region, there and back through each pair of given properties:
// the largest count of evaluations and the worst residual of the basic equation at the answer.
//
//   busbar_soak [states]        prints a table; ends with 1 when a promise is broken
//
// The promise (water/state.hpp, water/pairs.hpp): the basic equation at the answer agrees with the
// given properties to 1e-10, relative or of R T* (entropy: of R), whichever is wider. At the seams
// of regions, where the equations of IAPWS-IF97 differ, enthalpy and entropy together may belong to
// no state at all; the answer then lies at the seam, within the steps that R7-97(2012) states.
// Within 0.2 mK of the critical temperature a density at pressure and temperature solves a pressure
// shifted by less than 1e-9 of it (water/solve/density.hpp).

#include <algorithm>
#include <array>
#include <cmath>
#include <cstdint>
#include <cstdio>
#include <cstdlib>
#include <thread>
#include <vector>

#include "exactness.hpp"
#include "sampling.hpp"
#include "water/constants.hpp"
#include "water/equations/saturation.hpp"
#include "water/solve/density.hpp"
#include "water/solve/enthalpy_entropy.hpp"
#include "water/solve/isobar.hpp"
#include "water/solve/isobar_volume.hpp"

namespace busbar::water {
namespace {

using testing::Sampler;

constexpr double kPromise = 1e-10;
constexpr int kRegions = 5;

// Largest steps at a seam, R7-97(2012), the consistency paragraphs: 0.134 kJ/kg and 0.177 J/(kg K)
// on the boundary of regions 2 and 3. Half a unit of the last printed digit is added.
constexpr double kEnthalpyStep = 134.5;
constexpr double kEntropyStep = 0.1775;

enum Pair : std::uint8_t {
  pressure_temperature,
  pressure_enthalpy,
  pressure_entropy,
  enthalpy_entropy,
  pressure_volume,
  saturation,
  pairs
};

constexpr std::array<const char*, pairs> kNames{"p, T (density)", "p, h", "p, s",
                                                "h, s",           "p, v", "saturation (densities)"};
// Half of what the iterations are capped at. In wet steam they are those of the saturated
// densities.
constexpr std::array<int, pairs> kCounts{kDensityCap / 2,   kInverseCap / 2, kInverseCap / 2,
                                         kIsentropeCap / 2, kDensityCap / 2, kDensityCap / 2};

struct Worst {
  std::uint64_t states = 0;
  std::uint64_t at_seams = 0;
  std::uint64_t failed = 0;
  int evaluations = 0;
  double residual = 0;
  State where;

  void take(const Worst& other) {
    states += other.states;
    at_seams += other.at_seams;
    failed += other.failed;
    evaluations = std::max(evaluations, other.evaluations);
    if (other.residual > residual) {
      residual = other.residual;
      where = other.where;
    }
  }
};

using Table = std::array<std::array<Worst, kRegions + 1>, pairs>;

struct Residual {
  double enthalpy = 0;
  double entropy = 0;
  double largest = 0;  // over its scale
};

// The basic equation at the answer against the properties that the answer states.
Residual residual_of(const State& state) {
  Properties basic;
  double pressure = state.pressure;
  double scale = kGasConstant * testing::reducing_temperature(state.region);
  if (state.region == Region::two_phase) {
    const Saturated saturated = saturated_at(state.pressure);
    basic = mixed(saturated.liquid, saturated.vapour, state.dryness);
  } else {
    basic = testing::basic_equation(state);
    if (state.region == Region::near_critical) {
      pressure = testing::pressure_3(1 / state.volume, state.temperature);
    }
  }
  Residual out;
  out.enthalpy = std::abs(basic.enthalpy - state.enthalpy);
  out.entropy = std::abs(basic.entropy - state.entropy);
  scale = std::max(scale, std::abs(state.enthalpy));
  out.largest = std::max(
      {out.enthalpy / scale, out.entropy / std::max(kGasConstant, std::abs(state.entropy)),
       std::abs(basic.volume / state.volume - 1), std::abs(pressure / state.pressure - 1)});
  return out;
}

bool beside_a_seam(const State& state) {
  constexpr double kReach = 0.2;  // K; a step of 0.134 kJ/kg is less than 0.06 K
  const auto near = [&](double t) { return std::abs(state.temperature - t) < kReach; };
  return (near(kTemperature13) && state.pressure > 0.999 * kPressure13) ||
         near(kHighestTemperature2) ||
         (state.pressure > 0.999 * kPressure13 && near(boundary_23_temperature(state.pressure)));
}

// A state of a region, spread over all of it.
State random_state(Sampler& sampler, int region) {
  for (;;) {
    double p = 0;
    double t = 0;
    switch (region) {
      case 1:
        t = sampler.between(kLowestTemperature, kTemperature13);
        p = sampler.share() < 0.5
                ? sampler.between(saturation_pressure_equation(t), kHighestPressure)
                : sampler.log_between(saturation_pressure_equation(t), kHighestPressure);
        break;
      case 2:
        t = sampler.between(kLowestTemperature, kHighestTemperature2);
        p = sampler.share() < 0.3 ? sampler.log_between(1, kHighestPressure)
                                  : sampler.log_between(1e3, kHighestPressure);
        break;
      case 3:
        p = sampler.share() < 0.3 ? sampler.between(kPressure13, 25e6)
                                  : sampler.between(kPressure13, kHighestPressure);
        t = sampler.share() < 0.3 ? sampler.between(640, 660)
                                  : sampler.between(kTemperature13, kHighestTemperature23);
        break;
      case 4: {
        t = sampler.share() < 0.3 ? sampler.between(kTemperature13, kCriticalTemperature)
                                  : sampler.between(kLowestTemperature, kCriticalTemperature);
        const auto wet = at_pressure_dryness(*saturation_pressure(t), sampler.share());
        if (wet) return *wet;
        continue;
      }
      default:
        t = sampler.between(kHighestTemperature2, kHighestTemperature5);
        p = sampler.log_between(1e2, kHighestPressure5);
    }
    const auto state = at_pressure_temperature(p, t);
    if (state && static_cast<int>(state->region) == region) return *state;
  }
}

class Soak {
 public:
  explicit Soak(std::uint64_t seed) : sampler_(seed) {}

  void run(std::uint64_t states) {
    for (std::uint64_t i = 0; i < states; ++i) {
      region_ = 1 + static_cast<int>(i % kRegions);
      one(random_state(sampler_, region_));
    }
  }

  [[nodiscard]] const Table& table() const { return table_; }

 private:
  void note(Pair pair, const State& given, const State& answer, int evaluations) {
    Worst& worst = table_[pair][static_cast<std::size_t>(region_)];
    ++worst.states;
    worst.evaluations = std::max(worst.evaluations, evaluations);
    const Residual residual = residual_of(answer);
    if (pair == enthalpy_entropy && residual.largest > kPromise && beside_a_seam(given)) {
      ++worst.at_seams;
      if (residual.enthalpy > kEnthalpyStep || residual.entropy > kEntropyStep) ++worst.failed;
      return;
    }
    const bool critical = pair == pressure_temperature &&
                          std::abs(given.temperature - kCriticalTemperature) <= kCriticalBand;
    const double promise = critical ? 1e-9 : kPromise;
    if (!(residual.largest <= promise)) ++worst.failed;
    if (!(residual.largest <= worst.residual)) {
      worst.residual = residual.largest;
      worst.where = given;
    }
  }

  void check(Pair pair, const State& given, const Outcome<Found>& found) {
    if (found) return note(pair, given, found->state, found->evaluations);
    Worst& worst = table_[pair][static_cast<std::size_t>(region_)];
    ++worst.states;
    ++worst.failed;
    worst.where = given;
  }

  void one(const State& state) {
    check(pressure_enthalpy, state, on_isobar<Given::enthalpy>(state.pressure, state.enthalpy));
    check(pressure_entropy, state, on_isobar<Given::entropy>(state.pressure, state.entropy));
    check(enthalpy_entropy, state, at_enthalpy_entropy(state.enthalpy, state.entropy));
    // Cold water around its greatest density has two states for one volume up to 8 °C, and is
    // refused.
    constexpr double kTwoStates = 282;
    if (state.region != Region::liquid || state.temperature > kTwoStates) {
      check(pressure_volume, state, on_isobar_with_volume(state.pressure, state.volume));
    }
    if (state.region == Region::near_critical) {
      const bool liquid = state.temperature < kCriticalTemperature &&
                          state.pressure >= saturation_pressure_equation(state.temperature);
      const DensityFound found = density_3(state.pressure, state.temperature, liquid);
      note(pressure_temperature, state, state, found.evaluations);
    }
    if (state.region == Region::two_phase && state.pressure > kPressure13) {
      note(saturation, state, state, saturated_at(state.pressure).evaluations);
    }
  }

  Sampler sampler_;
  Table table_;
  int region_ = 0;
};

// Prints the table; the number of broken promises.
std::uint64_t report(const Table& table) {
  std::uint64_t broken = 0;
  std::printf("%-24s %6s %12s %8s %12s %8s %8s   %s\n", "given", "region", "states", "most",
              "residual", "seams", "failed", "worst at p/Pa, T/K");
  for (std::size_t pair = 0; pair < pairs; ++pair) {
    for (std::size_t region = 1; region <= kRegions; ++region) {
      const Worst& worst = table[pair][region];
      if (worst.states == 0) continue;
      std::printf("%-24s %6zu %12llu %8d %12.2e %8llu %8llu   %.9g %.9g\n", kNames[pair], region,
                  static_cast<unsigned long long>(worst.states), worst.evaluations, worst.residual,
                  static_cast<unsigned long long>(worst.at_seams),
                  static_cast<unsigned long long>(worst.failed), worst.where.pressure,
                  worst.where.temperature);
      broken += worst.failed;
      const int most = region == 4 ? kDensityCap / 2 : kCounts[pair];
      if (worst.evaluations > most) ++broken;
    }
  }
  return broken;
}

}  // namespace
}  // namespace busbar::water

int main(int count, char** arguments) {
  using busbar::water::Soak;
  const long long asked = count > 1 ? std::atoll(arguments[1]) : 1000000;
  const auto states = static_cast<std::uint64_t>(std::clamp(asked, 1000LL, 1000000000LL));
  // A fixed number of shares, so that the states are the same on every machine.
  constexpr std::size_t kShares = 8;
  std::vector<Soak> shares;
  for (std::size_t i = 0; i < kShares; ++i) shares.emplace_back(1000 + i);
  const std::size_t threads =
      std::clamp<std::size_t>(std::thread::hardware_concurrency(), 1, kShares);
  std::vector<std::thread> running;
  for (std::size_t t = 0; t < threads; ++t) {
    running.emplace_back([&, t] {
      for (std::size_t i = t; i < kShares; i += threads) shares[i].run(states / kShares);
    });
  }
  for (std::thread& thread : running) thread.join();
  busbar::water::Table table{};
  for (const Soak& share : shares) {
    for (std::size_t pair = 0; pair < table.size(); ++pair) {
      for (std::size_t region = 0; region < table[pair].size(); ++region) {
        table[pair][region].take(share.table()[pair][region]);
      }
    }
  }
  const std::uint64_t broken = busbar::water::report(table);
  std::printf("%llu promises broken\n", static_cast<unsigned long long>(broken));
  return broken == 0 ? 0 : 1;
}
