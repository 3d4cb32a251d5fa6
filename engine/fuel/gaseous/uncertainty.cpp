#include "fuel/gaseous/uncertainty.hpp"

#include <array>
#include <cmath>

#include "core/text.hpp"
#include "fuel/gaseous/constants.hpp"

namespace busbar::fuel::gaseous {
namespace {

using Gradient = std::array<double, kComponents>;

// Every property is a product of powers of the molar heating value H, the molar mass M, the
// compression factor Z, the gas constant R and the term of air, M_air/Z_air (times exact factors).
struct Powers {
  double heating_value;
  double molar_mass;
  double compression;
  double gas_constant;
  double air;
};

constexpr Powers powers_of(Property property) {
  switch (property) {
    case Property::molar_mass:
      return {0, 1, 0, 0, 0};
    case Property::compression_factor:
      return {0, 0, 1, 0, 0};
    case Property::molar_volume:
      return {0, 0, 1, 1, 0};
    case Property::molar_heating_value:
      return {1, 0, 0, 0, 0};
    case Property::mass_heating_value:
      return {1, -1, 0, 0, 0};
    case Property::volume_heating_value:
      return {1, 0, -1, -1, 0};
    case Property::density:
      return {0, 1, -1, -1, 0};
    case Property::relative_density:
      return {0, 1, -1, 0, -1};
    case Property::wobbe_index:
      return {1, -0.5, -0.5, -1, 0.5};
  }
  return {};
}

double square(double x) { return x * x; }

double relative(const Constant& constant) { return constant.uncertainty / constant.value; }

// The three parts below add their share to the derivative of ln(property) after each fraction and
// return the relative variance that the standard's own data bring.

double add_heating_value(const Mixture& gas, Basis basis, Combustion combustion, double power,
                         Gradient& gradient) {
  const double total = molar_heating_value(gas, basis, combustion);
  double variance = 0;
  for (std::size_t i = 0; i < gas.size; ++i) {
    const Component& component = components()[gas.component[i]];
    double value = component.higher_heating_value[combustion.column] * 1e3;
    if (basis == Basis::lower)
      value -= component.atoms[kH] / 2.0 * kVaporization[combustion.column];
    gradient[i] += power * value / total;
    variance += square(gas.fraction[i] * component.heating_value_uncertainty * 1e3);
  }
  if (basis == Basis::lower) variance += square(hydrogen_atoms(gas) / 2 * kVaporizationUncertainty);
  return square(power / total) * variance;
}

double add_molar_mass(const Mixture& gas, double power, Gradient& gradient) {
  const double total = molar_mass(gas);
  std::array<double, kElements> atoms{};
  for (std::size_t i = 0; i < gas.size; ++i) {
    gradient[i] += power * molar_mass(gas.component[i]) / total;
    for (std::size_t e = 0; e < kElements; ++e) {
      atoms[e] += gas.fraction[i] * components()[gas.component[i]].atoms[e];
    }
  }
  double variance = 0;
  for (std::size_t e = 0; e < kElements; ++e) {
    variance += square(atoms[e] * kAtomicMass[e].uncertainty);
  }
  return square(power / total) * variance;
}

double add_compression(const Mixture& gas, const Metering& metering, double power,
                       Gradient& gradient) {
  const double s = summation_factor(gas, metering.column);
  const double ratio = metering.pressure / kReferencePressure;
  const double slope = -2 * ratio * s / (1 - ratio * s * s);
  double variance = 0;
  for (std::size_t i = 0; i < gas.size; ++i) {
    const Component& component = components()[gas.component[i]];
    gradient[i] += power * slope * component.summation_factor[metering.column];
    variance += square(gas.fraction[i] * component.summation_uncertainty);
  }
  return square(power * slope) * variance;
}

// Relative variance that the analysis brings.
double analysis_variance(const Mixture& gas, const AnalysisErrors& errors,
                         const Gradient& gradient) {
  double sum = 0;
  if (errors.correlation == Correlation::matrix) {
    for (std::size_t i = 0; i < gas.size; ++i) {
      for (std::size_t j = 0; j < gas.size; ++j) {
        sum += gradient[i] * errors.standard[i] * errors.coefficients[i * gas.size + j] *
               gradient[j] * errors.standard[j];
      }
    }
    return sum;
  }
  // Of x_i = a_i / sum(a) the derivative after a_k is delta_ik - x_i where sum(a) = 1.
  double mean = 0;
  if (errors.correlation == Correlation::normalised) {
    for (std::size_t i = 0; i < gas.size; ++i) mean += gas.fraction[i] * gradient[i];
  }
  for (std::size_t i = 0; i < gas.size; ++i) {
    sum += square((gradient[i] - mean) * errors.standard[i]);
  }
  return sum;
}

// Coefficients are printed with few digits.
constexpr double kRounding = 1e-6;

Failure check_coefficients(std::size_t size, std::span<const double> r) {
  const auto number = [](std::size_t n) {
    return Measure{static_cast<double>(n), Quantity::number};
  };
  if (r.size() != size * size) {
    return {Fault::wrong_shape,
            3,
            "has {0} cells; {1} components need {2}: a row and a column for each, in their order",
            {{number(r.size()), number(size), number(size * size)}}};
  }
  const auto at_cell = [](Failure failure, std::size_t i, std::size_t j) {
    failure.row = static_cast<std::uint32_t>(i + 1);
    failure.column = static_cast<std::uint32_t>(j + 1);
    return failure;
  };
  for (std::size_t i = 0; i < size; ++i) {
    if (std::abs(r[i * size + i] - 1) > kRounding) {
      return at_cell({Fault::impossible,
                      3,
                      "is {0}, where the correlation of a fraction with itself is 1",
                      {{{r[i * size + i], Quantity::number}}}},
                     i, i);
    }
    for (std::size_t j = 0; j < i; ++j) {
      const double lower = r[i * size + j];
      const double upper = r[j * size + i];
      if (!(std::abs(lower) <= 1 + kRounding)) {
        return at_cell(
            {Fault::impossible, 3, "is {0}, outside -1 to 1", {{{lower, Quantity::number}}}}, i, j);
      }
      if (std::abs(lower - upper) > kRounding) {
        return at_cell({Fault::impossible,
                        3,
                        "is {0}, but {1} on the other side of the diagonal",
                        {{{lower, Quantity::number}, {upper, Quantity::number}}}},
                       i, j);
      }
    }
  }
  return {};
}

}  // namespace

std::optional<Correlation> correlation_named(std::string_view word) {
  word = trimmed(word);
  if (equal_ignoring_case(word, "independent")) return Correlation::independent;
  if (equal_ignoring_case(word, "matrix")) return Correlation::matrix;
  for (const std::string_view spelling : {"normalised", "normalized"}) {
    if (equal_ignoring_case(word, spelling)) return Correlation::normalised;
  }
  return std::nullopt;
}

Failure check_errors(const Mixture& gas, const AnalysisErrors& errors) {
  if (errors.standard.size() != gas.size) {
    return {Fault::wrong_shape,
            2,
            "has {0} cells for {1} components: one standard uncertainty for each, in their order",
            {{{static_cast<double>(errors.standard.size()), Quantity::number},
              {static_cast<double>(gas.size), Quantity::number}}}};
  }
  for (std::size_t i = 0; i < gas.size; ++i) {
    const double u = errors.standard[i];
    if (u >= 0 && u <= 1) continue;
    Failure failure{Fault::outside_range,
                    2,
                    "is {0}, and the uncertainty of a fraction lies between 0 and 1",
                    {{{u, Quantity::number}}}};
    failure.row = static_cast<std::uint32_t>(i + 1);
    return failure;
  }
  if (errors.correlation != Correlation::matrix) return {};
  return check_coefficients(gas.size, errors.coefficients);
}

Outcome<Uncertain> uncertain(Property property, const Mixture& gas, const AnalysisErrors& errors,
                             Basis basis, Combustion combustion, const Metering& metering) {
  const Outcome<double> value = value_of(property, gas, basis, combustion, metering);
  if (!value) return value.failure();
  const Powers powers = powers_of(property);
  if (powers.heating_value != 0 && !(*value > 0)) {
    return Failure{Fault::impossible, 1, "has no heating value of which to state an uncertainty"};
  }
  Gradient gradient{};
  double variance = 0;
  if (powers.heating_value != 0) {
    variance += add_heating_value(gas, basis, combustion, powers.heating_value, gradient);
  }
  if (powers.molar_mass != 0) variance += add_molar_mass(gas, powers.molar_mass, gradient);
  if (powers.compression != 0) {
    variance += add_compression(gas, metering, powers.compression, gradient);
  }
  variance += square(powers.gas_constant * relative(kGasConstant));
  variance +=
      square(powers.air) * (square(relative(kAirMolarMass)) +
                            square(kAirCompressionUncertainty / air_compression_factor(metering)));
  const double analysis = analysis_variance(gas, errors, gradient);
  // The fractions of a normalised analysis leave a variance of zero plus what rounding makes of it.
  if (analysis < -kRounding * variance && analysis < -1e-12) {
    return Failure{Fault::impossible, 3, "contradict each other: a variance becomes negative"};
  }
  if (analysis > 0) variance += analysis;
  return Uncertain{*value, *value * std::sqrt(variance)};
}

}  // namespace busbar::fuel::gaseous
