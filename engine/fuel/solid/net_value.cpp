#include "fuel/solid/net_value.hpp"

#include <array>

#include "core/text.hpp"

namespace busbar::fuel::solid {
namespace {

constexpr std::string_view kBomb = "gross at constant volume, as a bomb gives it";
constexpr std::string_view kConstantPressure = "net at constant pressure";
constexpr std::string_view kDerived =
    "from memory; every constant follows from the heat of "
    "condensation at 25 °C and the work of the gases";

// Published per percent in J/g: 212.2 J/g for one percent is 21.22 MJ/kg for the whole.
// Derivation: 8.9367 kg of water per kg of hydrogen, 2443.09 kJ/kg at 25 °C (44.013 kJ/mol, ISO
// 6976:2016), R T = 2.479 kJ/mol; ISO rounds 0.775 and 0.885 J/g for O and N to 0.8.
constexpr std::array kMethods{
    NetMethod{"ISO 18125", 21.22e6, 0.08e6, 0.08e6, 2.443e6, kBomb, kConstantPressure,
              "ISO 18125:2017, net calorific value at constant pressure", kDerived},
    NetMethod{"ISO 1928", 21.2e6, 0.08e6, 0.08e6, 2.443e6, kBomb, kConstantPressure,
              "ISO 1928:2009, net calorific value at constant pressure", kDerived},
    NetMethod{"ISO 1928 constant volume", 20.60e6, 0, 0, 2.305e6, kBomb, "net at constant volume",
              "ISO 1928:2009, net calorific value at constant volume", kDerived},
    NetMethod{"IPCC 2006", 21.2e6, 0.08e6, 0, 2.45e6, kBomb, kConstantPressure,
              "IPCC 2006 Guidelines, volume 2, chapter 1, box 1.1", "one transcription"},
    // 44.013 kJ/mol over 18.01528 g/mol, and 18.01528 / (2 x 1.00794) = 8.93668.
    NetMethod{"heat of condensation", 8.93668 * 2.44309e6, 0, 0, 2.44309e6,
              "gross at constant pressure", kConstantPressure,
              "heat of condensation at 25 °C, ISO 6976:2016 annex A: 44.013 kJ/mol",
              "two transcriptions agree"},
};

Failure no_elements() {
  return {Fault::missing, 1,
          "states no hydrogen: gross and net differ by the water that it burns to"};
}

// The dry analysis, and the moisture of each moist state that occurs, from the analysis or from
// the argument.
struct Basis {
  Analysis dry;
  double moisture_given = 0;   // of the state of the given value
  double moisture_wanted = 0;  // of the wanted state
};

Outcome<double> moisture_of(State state, std::uint8_t argument, const Analysis& analysis,
                            std::optional<double> moisture) {
  if (!is_moist(state)) return 0.0;
  if (analysis.state == state) return analysis[Part::moisture];
  if (moisture) return *moisture;
  return Failure{Fault::missing, argument,
                 "needs a moisture that the analysis does not hold; give it as the last argument"};
}

Outcome<Basis> basis_of(const Analysis& analysis, State given, State wanted,
                        std::optional<double> moisture) {
  if (!analysis.has(Part::hydrogen)) return no_elements();
  const auto needs = [&](State state) { return is_moist(state) && state != analysis.state; };
  if (moisture && !needs(given) && !needs(wanted)) {
    return Failure{Fault::impossible, 6,
                   "is given and not needed: neither basis holds moisture that the analysis does "
                   "not state"};
  }
  if (needs(given) && needs(wanted) && given != wanted) {
    return Failure{Fault::missing, 3,
                   "and the wanted basis need two moistures, of which one can be given; bring the "
                   "heating value to dry first with FUEL_BASIS_FACTOR"};
  }
  Basis basis;
  const bool ash_free = analysis.state == State::dry_ash_free;
  if (ash_free && (given != State::dry_ash_free || wanted != State::dry_ash_free)) {
    return Failure{Fault::missing, 1,
                   "is dry ash-free and the heating values are not; bring it to dry with "
                   "FUEL_ANALYSIS_ON_BASIS"};
  }
  if (ash_free) {
    basis.dry = analysis;  // without ash: dry ash-free is dry
    return basis;
  }
  const Outcome<Analysis> dry = in_state(analysis, State::dry, {});
  if (!dry) return dry.failure();
  basis.dry = *dry;
  const Outcome<double> before = moisture_of(given, 3, analysis, moisture);
  if (!before) return before.failure();
  basis.moisture_given = *before;
  const Outcome<double> after = moisture_of(wanted, 4, analysis, moisture);
  if (!after) return after.failure();
  basis.moisture_wanted = *after;
  return basis;
}

// What one kilogram in a state holds of dry fuel with its ash: 1 - M, or 1/(1 - A).
double dry_in(State state, double moisture, const Analysis& dry) {
  if (state == State::dry_ash_free) return 1 / (1 - dry[Part::ash]);
  return 1 - moisture;
}

double deduction(const NetMethod& method, const Analysis& dry) {
  return method.hydrogen * dry[Part::hydrogen] + method.oxygen * dry[Part::oxygen] +
         method.nitrogen * dry[Part::nitrogen];
}

}  // namespace

const NetMethod* net_method_named(std::string_view name) {
  for (const NetMethod& method : kMethods) {
    if (equal_ignoring_case(method.name, trimmed(name))) return &method;
  }
  return nullptr;
}

Outcome<double> net_from_gross(const Analysis& analysis, StatedValue gross, State to,
                               const NetMethod& method, std::optional<double> moisture) {
  const Outcome<Basis> basis = basis_of(analysis, gross.state, to, moisture);
  if (!basis) return basis.failure();
  const double gross_dry = gross.value / dry_in(gross.state, basis->moisture_given, basis->dry);
  const double net_dry = gross_dry - deduction(method, basis->dry);
  return net_dry * dry_in(to, basis->moisture_wanted, basis->dry) -
         method.moisture * basis->moisture_wanted;
}

Outcome<double> gross_from_net(const Analysis& analysis, StatedValue net, State to,
                               const NetMethod& method, std::optional<double> moisture) {
  const Outcome<Basis> basis = basis_of(analysis, net.state, to, moisture);
  if (!basis) return basis.failure();
  const double net_dry = (net.value + method.moisture * basis->moisture_given) /
                         dry_in(net.state, basis->moisture_given, basis->dry);
  const double gross_dry = net_dry + deduction(method, basis->dry);
  return gross_dry * dry_in(to, basis->moisture_wanted, basis->dry);
}

double net_at_moisture(double net, double from, double to) {
  constexpr double kCondensation = 2.443e6;
  const double dry = (net + kCondensation * from) / (1 - from);
  return dry * (1 - to) - kCondensation * to;
}

double gross_at_moisture(double gross, double from, double to) {
  return gross / (1 - from) * (1 - to);
}

double moisture_on_dry_mass(double moisture) { return moisture / (1 - moisture); }
double moisture_on_moist_mass(double moisture) { return moisture / (1 + moisture); }

}  // namespace busbar::fuel::solid
