#include "fuel/solid/correlations.hpp"

#include "core/text.hpp"
#include "fuel/solid/tables/correlations.hpp"

namespace busbar::fuel::solid {
namespace {

constexpr double kPercent = 100;

// "is outside" sentences, one for each part that a range names.
const char* outside_reason(Part part) {
  switch (part) {
    case Part::carbon:
      return "holds {0} of carbon on dry mass, outside {1} to {2}, where the correlation was "
             "fitted";
    case Part::hydrogen:
      return "holds {0} of hydrogen on dry mass, outside {1} to {2}, where the correlation was "
             "fitted";
    case Part::oxygen:
      return "holds {0} of oxygen on dry mass, outside {1} to {2}, where the correlation was "
             "fitted";
    case Part::nitrogen:
      return "holds {0} of nitrogen on dry mass, outside {1} to {2}, where the correlation was "
             "fitted";
    case Part::sulphur:
      return "holds {0} of sulphur on dry mass, outside {1} to {2}, where the correlation was "
             "fitted";
    case Part::volatile_matter:
      return "holds {0} of volatile matter on dry mass, outside {1} to {2}, where the correlation "
             "was fitted";
    case Part::fixed_carbon:
      return "holds {0} of fixed carbon on dry mass, outside {1} to {2}, where the correlation was "
             "fitted";
    default:
      return "holds {0} of ash on dry mass, outside {1} to {2}, where the correlation was fitted";
  }
}

double linear(const Correlation& correlation, const Analysis& dry) {
  double sum = 0;
  for (std::size_t i = 0; i < kParts; ++i) {
    sum += correlation.coefficient[i] * dry.share[i] * kPercent;
  }
  return sum;
}

double value(const Correlation& correlation, const Analysis& dry) {
  const double c = dry[Part::carbon] * kPercent;
  const double h = dry[Part::hydrogen] * kPercent;
  const double o = dry[Part::oxygen] * kPercent;
  const double n = dry[Part::nitrogen] * kPercent;
  const double s = dry[Part::sulphur] * kPercent;
  const double ash = dry[Part::ash] * kPercent;
  switch (correlation.terms) {
    case Terms::linear:
      return linear(correlation, dry);
    case Terms::grummel_davis:
      return (0.0152 * h + 0.9875) * (c / 3 + h - (o - s) / 8);
    case Terms::vondracek:
      return c * (89.1 - 0.062 * c) + 270 * (h - o / 10) + 25 * s;
    case Terms::friedl:
      return 3.55 * c * c - 232 * c - 2230 * h + 51.2 * c * h + 131 * n + 20600;
    case Terms::sheng_azevedo:
      // Oxygen as what carbon, hydrogen and ash leave.
      return -1.3675 + 0.3137 * c + 0.7009 * h + 0.0318 * (kPercent - c - h - ash);
  }
  return 0;
}

}  // namespace

bool Correlation::made_for(Class kind) const {
  switch (kind) {
    case Class::coal:
      return for_coal;
    case Class::biomass:
      return for_biomass;
    case Class::other:
      break;
  }
  return for_other;
}

std::optional<Class> class_named(std::string_view word) {
  if (equal_ignoring_case(trimmed(word), "coal")) return Class::coal;
  if (equal_ignoring_case(trimmed(word), "biomass")) return Class::biomass;
  if (equal_ignoring_case(trimmed(word), "other")) return Class::other;
  return std::nullopt;
}

std::span<const Correlation> correlations() { return tables::kCorrelations; }

const Correlation* correlation_named(std::string_view name) {
  for (const Correlation& correlation : correlations()) {
    if (equal_ignoring_case(correlation.name, trimmed(name))) return &correlation;
  }
  return nullptr;
}

std::optional<Outside> outside(const Correlation& correlation, const Analysis& dry) {
  // Shares come from products with 1 - M; the last bits are no reason to refuse.
  constexpr double kRounding = 1e-9;
  for (const PartRange& range : correlation.ranges) {
    const double percent = dry[range.part] * kPercent;
    if (percent < range.low - kRounding || percent > range.high + kRounding) {
      return Outside{range, percent};
    }
  }
  return std::nullopt;
}

Outcome<double> hhv_dry(const Correlation& correlation, const Analysis& dry) {
  if (dry.state == State::dry_ash_free) {
    return Failure{Fault::missing, 1,
                   "is dry ash-free, and the correlations are fitted to shares of dry mass with "
                   "ash; bring it to dry with FUEL_ANALYSIS_ON_BASIS"};
  }
  if (correlation.proximate && !dry.has_proximate()) {
    return Failure{Fault::missing, 1,
                   "states no volatile matter, which this correlation is made of"};
  }
  if (!correlation.proximate && !dry.has_ultimate()) {
    return Failure{Fault::missing, 1, "states no elements, which this correlation is made of"};
  }
  if (const auto left = outside(correlation, dry)) {
    return Failure{Fault::outside_range,
                   1,
                   outside_reason(left->range.part),
                   {{{left->percent / kPercent, Quantity::fraction},
                     {left->range.low / kPercent, Quantity::fraction},
                     {left->range.high / kPercent, Quantity::fraction}}}};
  }
  const double estimate = value(correlation, dry);
  if (!(estimate > 0)) {
    return Failure{Fault::outside_range, 1, "would have no heating value by this correlation"};
  }
  return estimate * correlation.joules;
}

}  // namespace busbar::fuel::solid
