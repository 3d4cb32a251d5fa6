#include "combustion/equilibrium.hpp"

#include <Eigen/LU>
#include <algorithm>
#include <cmath>

#include "gas/polynomial.hpp"
#include "water/state.hpp"

namespace busbar::combustion {
namespace {

using gas::Element;
using gas::Species;

constexpr std::array kReactive{Element::C, Element::H, Element::O, Element::N, Element::S};
constexpr std::array kNoble{Species::Ar, Species::Ne, Species::He, Species::Kr, Species::Xe};
constexpr std::array kNobleElements{Element::Ar, Element::Ne, Element::He, Element::Kr,
                                    Element::Xe};

constexpr std::array kCandidates{
    Species::N2,   Species::O2,  Species::CO2,  Species::H2O, Species::CO,   Species::H2,
    Species::OH,   Species::O,   Species::H,    Species::N,   Species::NO,   Species::NO2,
    Species::N2O,  Species::HO2, Species::H2O2, Species::CH4, Species::C2H2, Species::C2H4,
    Species::C2H6, Species::CH3, Species::HCO,  Species::HCN, Species::NH3,  Species::NH2,
    Species::NH,   Species::HNO, Species::C,    Species::SO2, Species::SO3,  Species::SO,
    Species::S,    Species::S2,  Species::H2S,  Species::COS, Species::H2SO4};

constexpr std::size_t kMostSpecies = kCandidates.size();
constexpr int kMostUnknowns = 8;  // five potentials, graphite, moles of gas, temperature

constexpr unsigned kMostSteps = 120;
constexpr int kMostPhaseChanges = 6;
// The step that ends the iteration squares what was left before it.
constexpr double kLastStep = 1e-8;

// RP-1311 part I, section 3.3: ln of 1e-8, below which a species counts as a trace, and of 1e-4,
// to which a trace may rise in one step.
constexpr double kTrace = -18.420681;
constexpr double kRisenTrace = -9.2103404;

// Below this a species has no weight even in the last digit of a balance.
constexpr double kNothing = -80;

using Matrix = Eigen::Matrix<double, Eigen::Dynamic, Eigen::Dynamic, Eigen::ColMajor, kMostUnknowns,
                             kMostUnknowns>;
using Vector = Eigen::Matrix<double, Eigen::Dynamic, 1, Eigen::ColMajor, kMostUnknowns, 1>;

// One species as the iteration sees it.
struct Gas {
  Species species = Species::N2;
  const gas::Polynomial* cold = nullptr;
  const gas::Polynomial* hot = nullptr;
  std::array<double, kReactive.size()> atoms{};  // of the elements that are there
  double weight = 0;  // greatest share of an element that one mole of it holds
  double log_moles = 0;
  double moles = 0;
  double enthalpy = 0;       // H/(RT)
  double heat_capacity = 0;  // cp/R
  double potential = 0;      // mu/(RT) less that of its elements: nought at the end
};

class Iteration {
 public:
  Iteration(const Elements& elements, double pressure)
      : log_pressure_(std::log(pressure / gas::kStandardPressure)) {
    for (const Element element : kReactive) {
      const double amount = elements[static_cast<std::size_t>(element)];
      if (!(amount > 0)) continue;
      element_[element_count_] = element;
      wanted_[element_count_++] = amount;
      scale_ += amount;
    }
    for (std::size_t i = 0; i < kNoble.size(); ++i) {
      noble_[i] = elements[static_cast<std::size_t>(kNobleElements[i])];
      noble_moles_ += noble_[i];
    }
    scale_ += noble_moles_;
    if (!(scale_ > 0)) return;
    for (double& amount : wanted_) amount /= scale_;
    for (double& amount : noble_) amount /= scale_;
    noble_moles_ /= scale_;
    for (const Species species : kCandidates) consider(species);
  }

  [[nodiscard]] bool empty() const { return gas_count_ == 0; }

  // Every gas in the same amount: RP-1311 part I, section 3.2. It always leads somewhere.
  void start_level(double temperature) {
    log_t_ = std::log(temperature);
    log_moles_ = std::log(0.5 + noble_moles_);
    const double each = std::log(0.5 / static_cast<double>(gas_count_));
    for (std::size_t j = 0; j < gas_count_; ++j) gas_[j].log_moles = each;
    graphite_ = 0;
    has_graphite_ = false;
    element_potential_.fill(0);
  }

  // The gases of complete combustion, the others far fewer: half the steps where it leads to the
  // end.
  void start_burnt(double temperature) {
    const auto wanted = [&](Element element) {
      for (std::size_t e = 0; e < element_count_; ++e) {
        if (element_[e] == element) return wanted_[e];
      }
      return 0.0;
    };
    const double carbon = wanted(Element::C);
    const double hydrogen = wanted(Element::H) / 2;
    const double sulfur = wanted(Element::S);
    double oxygen = wanted(Element::O) - 2 * sulfur;
    const auto spend = [&oxygen](double most) {
      const double spent = std::clamp(oxygen, 0.0, most);
      oxygen -= spent;
      return spent;
    };
    const double monoxide = spend(carbon);
    const double water = spend(hydrogen);
    const double dioxide = spend(monoxide);
    constexpr double kFloor = 1e-5;
    double sum = noble_moles_;
    for (std::size_t j = 0; j < gas_count_; ++j) {
      double moles = kFloor;
      switch (gas_[j].species) {
        case Species::N2:
          moles += wanted(Element::N) / 2;
          break;
        case Species::CO2:
          moles += dioxide;
          break;
        case Species::CO:
          moles += monoxide - dioxide;
          break;
        case Species::H2O:
          moles += water;
          break;
        case Species::H2:
          moles += hydrogen - water;
          break;
        case Species::O2:
          moles += oxygen / 2;
          break;
        case Species::SO2:
          moles += sulfur;
          break;
        default:
          break;
      }
      sum += moles;
      gas_[j].log_moles = std::log(moles);
    }
    log_t_ = std::log(temperature);
    log_moles_ = std::log(sum);
    graphite_ = carbon - monoxide;
    has_graphite_ = graphite_ > 0;
  }

  void hold_enthalpy(double enthalpy) {
    adiabatic_ = true;
    wanted_enthalpy_ = enthalpy / scale_ / gas::kGasConstant;
  }

  bool converge() {
    for (int change = 0; change < kMostPhaseChanges; ++change) {
      if (!converge_phases()) return false;
      if (!change_phases()) return true;
    }
    return false;
  }

  [[nodiscard]] double temperature() const { return std::exp(log_t_); }

  [[nodiscard]] bool at_limit() const { return log_t_ <= kLogLowest || log_t_ >= kLogHighest; }

  [[nodiscard]] Equilibrium result() const {
    Equilibrium out;
    out.temperature = temperature();
    for (std::size_t j = 0; j < gas_count_; ++j) {
      out.amount[static_cast<std::size_t>(gas_[j].species)] = scale_ * std::exp(gas_[j].log_moles);
    }
    for (std::size_t i = 0; i < kNoble.size(); ++i) {
      out.amount[static_cast<std::size_t>(kNoble[i])] = scale_ * noble_[i];
    }
    out.graphite = scale_ * graphite_;
    out.steps = steps_;
    return out;
  }

 private:
  void consider(Species species) {
    Gas made;
    unsigned known = 0;
    unsigned all = 0;
    for (const Element element : kReactive) all += gas::atoms(species, element);
    for (std::size_t e = 0; e < element_count_; ++e) {
      const unsigned atoms = gas::atoms(species, element_[e]);
      made.atoms[e] = atoms;
      made.weight = std::max(made.weight, atoms / wanted_[e]);
      known += atoms;
    }
    if (known != all) return;
    made.species = species;
    made.cold = &gas::cold_fit(species);
    made.hot = &gas::hot_fit(species);
    gas_[gas_count_++] = made;
  }

  [[nodiscard]] int row_of_graphite() const { return static_cast<int>(element_count_); }
  [[nodiscard]] int row_of_moles() const {
    return static_cast<int>(element_count_) + (has_graphite_ ? 1 : 0);
  }
  [[nodiscard]] int row_of_temperature() const { return row_of_moles() + 1; }
  [[nodiscard]] int unknowns() const { return row_of_moles() + (adiabatic_ ? 2 : 1); }
  [[nodiscard]] bool has_carbon() const { return element_count_ > 0 && element_[0] == Element::C; }

  void evaluate() {
    const gas::Powers powers = gas::Powers::at(std::exp(log_t_));
    const bool cold = powers.t < gas::kBreak;
    moles_ = std::exp(log_moles_);
    for (std::size_t j = 0; j < gas_count_; ++j) {
      Gas& gas = gas_[j];
      const gas::Polynomial& fit = cold ? *gas.cold : *gas.hot;
      gas.moles = gas.log_moles - log_moles_ < kNothing ? 0 : std::exp(gas.log_moles);
      gas.enthalpy = fit.enthalpy(powers) * powers.inverse;
      gas.heat_capacity = fit.heat_capacity(powers);
      gas.potential =
          gas.enthalpy - fit.entropy(powers) + gas.log_moles - log_moles_ + log_pressure_;
      for (std::size_t e = 0; e < element_count_; ++e) {
        gas.potential -= gas.atoms[e] * element_potential_[e];
      }
    }
    if (adiabatic_) {
      noble_enthalpy_ = 0;
      noble_heat_capacity_ = 0;
      for (std::size_t i = 0; i < kNoble.size(); ++i) {
        if (!(noble_[i] > 0)) continue;
        const gas::Polynomial& fit = gas::fit(kNoble[i], powers.t);
        noble_enthalpy_ += noble_[i] * fit.enthalpy(powers) * powers.inverse;
        noble_heat_capacity_ += noble_[i] * fit.heat_capacity(powers);
      }
    }
    if (has_carbon()) {
      const gas::Polynomial& fit = *gas::fit(gas::Condensed::graphite, powers.t);
      graphite_enthalpy_ = fit.enthalpy(powers) * powers.inverse;
      graphite_heat_capacity_ = fit.heat_capacity(powers);
      graphite_potential_ = graphite_enthalpy_ - fit.entropy(powers) - element_potential_[0];
    }
  }

  // RP-1311 part I, equations 2.24 to 2.27, for the changes of the element potentials instead of
  // themselves, so that rounding in the solution shrinks with the steps. Symmetric: the lower half
  // is copied.
  void assemble(Matrix& m, Vector& r) {
    const int size = unknowns();
    const int n = row_of_moles();
    const int t = row_of_temperature();
    const auto elements = static_cast<int>(element_count_);
    m.setZero(size, size);
    r.setZero(size);
    double sum = noble_moles_;
    double active = 0;
    double enthalpy = noble_enthalpy_;
    double capacity = noble_heat_capacity_;
    for (std::size_t j = 0; j < gas_count_; ++j) {
      const Gas& gas = gas_[j];
      for (int i = 0; i < elements; ++i) {
        const double weight = gas.atoms[static_cast<std::size_t>(i)] * gas.moles;
        if (weight == 0) continue;
        for (int k = i; k < elements; ++k) {
          m(k, i) += weight * gas.atoms[static_cast<std::size_t>(k)];
        }
        m(n, i) += weight;
        r(i) += weight * gas.potential;
        if (adiabatic_) m(t, i) += weight * gas.enthalpy;
      }
      active += gas.moles;
      r(n) += gas.moles * gas.potential;
      if (adiabatic_) {
        const double part = gas.moles * gas.enthalpy;
        m(t, n) += part;
        r(t) += part * gas.potential;
        enthalpy += part;
        capacity += gas.moles * gas.heat_capacity + part * gas.enthalpy;
      }
    }
    sum += active;
    for (int i = 0; i < elements; ++i) {
      r(i) += wanted_[static_cast<std::size_t>(i)] - m(n, i) - (i == 0 ? graphite_ : 0);
    }
    m(n, n) = active - moles_;
    r(n) += moles_ - sum;
    if (has_graphite_) {
      const int g = row_of_graphite();
      m(g, 0) = 1;
      r(g) = graphite_potential_;
      if (adiabatic_) {
        m(t, g) = graphite_enthalpy_;
        enthalpy += graphite_ * graphite_enthalpy_;
        capacity += graphite_ * graphite_heat_capacity_;
      }
    }
    if (adiabatic_) {
      m(t, t) = capacity;
      r(t) += wanted_enthalpy_ * std::exp(-log_t_) - enthalpy;
    }
    for (int i = 0; i < size; ++i) {
      for (int k = i + 1; k < size; ++k) m(i, k) = m(k, i);
    }
  }

  // Returns the greatest change that is left, or a negative number where the matrix is singular.
  double step() {
    evaluate();
    Matrix m;
    Vector r;
    assemble(m, r);
    const Vector x = m.partialPivLu().solve(r);
    if (!x.allFinite()) return -1;
    const double more = x(row_of_moles());
    const double warmer = adiabatic_ ? x(row_of_temperature()) : 0;

    std::array<double, kMostSpecies> change{};
    double greatest = std::max(5 * std::abs(warmer), 5 * std::abs(more));
    double trace_limit = 1;
    double left = std::max(std::abs(warmer), std::abs(more));
    for (std::size_t j = 0; j < gas_count_; ++j) {
      const Gas& gas = gas_[j];
      double rise = more + gas.enthalpy * warmer - gas.potential;
      for (std::size_t e = 0; e < element_count_; ++e) {
        rise += gas.atoms[e] * x(static_cast<int>(e));
      }
      change[j] = rise;
      const double share = gas.log_moles - log_moles_;
      if (share > kTrace) {
        greatest = std::max(greatest, rise);
      } else if (rise > 0 && rise > more) {
        trace_limit = std::min(trace_limit, std::abs((-share + kRisenTrace) / (rise - more)));
      }
      left = std::max(left, std::abs(rise) * gas.moles * gas.weight);
    }
    const double damping = std::min({1.0, greatest > 2 ? 2 / greatest : 1.0, trace_limit});
    for (std::size_t j = 0; j < gas_count_; ++j) gas_[j].log_moles += damping * change[j];
    log_moles_ += damping * more;
    if (has_graphite_) {
      const double carbon = x(row_of_graphite());
      graphite_ += damping * carbon;
      left = std::max(left, std::abs(carbon));
    }
    if (adiabatic_) {
      log_t_ = std::clamp(log_t_ + damping * warmer, kLogLowest, kLogHighest);
    }
    for (std::size_t e = 0; e < element_count_; ++e) {
      element_potential_[e] += x(static_cast<int>(e));
    }
    if (has_carbon()) graphite_potential_ -= x(0);
    ++steps_;
    return damping < 1 ? 1 : left;
  }

  // True when the last step was small enough.
  bool converge_phases() {
    for (unsigned i = 0; i < kMostSteps; ++i) {
      const double left = step();
      if (left < 0) return false;
      if (left <= kLastStep) return true;
    }
    return false;
  }

  // Graphite comes where its potential is below that of the carbon in the gas (RP-1311 part I,
  // equation 3.7), and goes where its amount turned negative.
  bool change_phases() {
    if (!has_carbon()) return false;
    if (has_graphite_ && graphite_ < 0) {
      has_graphite_ = false;
      graphite_ = 0;
      return true;
    }
    constexpr double kClearly = 1e-9;
    if (!has_graphite_ && graphite_potential_ < -kClearly) {
      has_graphite_ = true;
      return true;
    }
    return false;
  }

  // ln of 200 K and 6,000 K, a little inside, where every fit holds
  static constexpr double kLogLowest = 5.2984;
  static constexpr double kLogHighest = 8.6995;

  std::array<Gas, kMostSpecies> gas_{};
  std::size_t gas_count_ = 0;
  std::array<Element, kReactive.size()> element_{};
  std::array<double, kReactive.size()> wanted_{};
  std::size_t element_count_ = 0;
  std::array<double, kNoble.size()> noble_{};
  double noble_moles_ = 0;
  double noble_enthalpy_ = 0;
  double noble_heat_capacity_ = 0;
  double scale_ = 0;

  double log_pressure_ = 0;
  double log_t_ = 0;
  double log_moles_ = 0;
  double moles_ = 0;
  bool adiabatic_ = false;
  double wanted_enthalpy_ = 0;  // over R

  bool has_graphite_ = false;
  double graphite_ = 0;
  double graphite_enthalpy_ = 0;
  double graphite_heat_capacity_ = 0;
  double graphite_potential_ = 0;  // over RT, less that of the carbon in the gas
  std::array<double, kReactive.size()> element_potential_{};  // over RT
  unsigned steps_ = 0;
};

Failure not_converged() {
  return {Fault::no_convergence, 0, "the equilibrium was not found within its steps"};
}

bool is_within_limits(double temperature) {
  return temperature >= kLowestEquilibrium && temperature <= kHighestEquilibrium;
}

Failure outside_limits(double temperature) {
  return {Fault::outside_range,
          2,
          "{0} is not within {1} and {2}, where the equilibrium is used: below, gases do not reach "
          "it and vapours condense; above, ions appear",
          {{{temperature, Quantity::temperature},
            {kLowestEquilibrium, Quantity::temperature},
            {kHighestEquilibrium, Quantity::temperature}}}};
}

// Liquid water is not among the species: a gas that would hold it is refused.
Outcome<Equilibrium> unless_wet(const Equilibrium& found, double pressure) {
  const double share = found.of(Species::H2O) / found.moles();
  const Outcome<double> saturation = water::saturation_pressure(found.temperature);
  if (!saturation || share * pressure <= *saturation) return found;
  return Failure{Fault::outside_range,
                 2,
                 "{0} is too cold: the partial pressure of water, {1}, is above {2}, where it "
                 "condenses",
                 {{{found.temperature, Quantity::temperature},
                   {share * pressure, Quantity::pressure},
                   {*saturation, Quantity::pressure}}}};
}

Failure no_reactive() { return {Fault::impossible, 1, "holds no C, H, O, N or S"}; }

}  // namespace

double Equilibrium::moles() const {
  double sum = 0;
  for (const double one : amount) sum += one;
  return sum;
}

Outcome<Equilibrium> equilibrium_at(const Elements& elements, double temperature, double pressure) {
  if (!is_within_limits(temperature)) return outside_limits(temperature);
  Iteration iteration(elements, pressure);
  if (iteration.empty()) return no_reactive();
  iteration.start_burnt(temperature);
  if (!iteration.converge()) {
    iteration.start_level(temperature);
    if (!iteration.converge()) return not_converged();
  }
  return unless_wet(iteration.result(), pressure);
}

Outcome<Equilibrium> equilibrium_of(const Elements& elements, double enthalpy, double pressure) {
  Iteration iteration(elements, pressure);
  if (iteration.empty()) return no_reactive();
  iteration.hold_enthalpy(enthalpy);
  constexpr double kStart = 2000;
  iteration.start_burnt(kStart);
  if (!iteration.converge()) {
    constexpr double kLevelStart = 3800;  // RP-1311's
    iteration.start_level(kLevelStart);
    if (!iteration.converge()) {
      return iteration.at_limit() ? outside_limits(iteration.temperature()) : not_converged();
    }
  }
  if (!is_within_limits(iteration.temperature())) return outside_limits(iteration.temperature());
  return unless_wet(iteration.result(), pressure);
}

double enthalpy(const Equilibrium& equilibrium) {
  const gas::Powers powers = gas::Powers::at(equilibrium.temperature);
  double sum = 0;
  for (std::size_t i = 0; i < gas::kSpecies; ++i) {
    if (!(equilibrium.amount[i] > 0)) continue;
    sum += equilibrium.amount[i] * gas::fit(static_cast<Species>(i), powers.t).enthalpy(powers);
  }
  if (equilibrium.graphite > 0) {
    sum += equilibrium.graphite * gas::fit(gas::Condensed::graphite, powers.t)->enthalpy(powers);
  }
  return sum * gas::kGasConstant;
}

}  // namespace busbar::combustion
