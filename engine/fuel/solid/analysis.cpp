#include "fuel/solid/analysis.hpp"

#include <algorithm>
#include <cmath>
#include <string>

#include "core/text.hpp"

namespace busbar::fuel::solid {
namespace {

struct Name {
  std::string_view written;
  Part part;
};

constexpr std::array kNames{
    Name{"C", Part::carbon},
    Name{"carbon", Part::carbon},
    Name{"H", Part::hydrogen},
    Name{"hydrogen", Part::hydrogen},
    Name{"O", Part::oxygen},
    Name{"oxygen", Part::oxygen},
    Name{"N", Part::nitrogen},
    Name{"nitrogen", Part::nitrogen},
    Name{"S", Part::sulphur},
    Name{"sulphur", Part::sulphur},
    Name{"sulfur", Part::sulphur},
    Name{"Cl", Part::chlorine},
    Name{"chlorine", Part::chlorine},
    Name{"ash", Part::ash},
    Name{"A", Part::ash},
    Name{"moisture", Part::moisture},
    Name{"water", Part::moisture},
    Name{"M", Part::moisture},
    Name{"H2O", Part::moisture},
    Name{"volatile matter", Part::volatile_matter},
    Name{"volatiles", Part::volatile_matter},
    Name{"VM", Part::volatile_matter},
    Name{"fixed carbon", Part::fixed_carbon},
    Name{"FC", Part::fixed_carbon},
};

constexpr std::array<std::string_view, kParts> kSymbols{
    "C", "H", "O", "N", "S", "Cl", "ash", "moisture", "volatile matter", "fixed carbon"};

constexpr std::array kWithMoisture{Name{"H including moisture", Part::hydrogen},
                                   Name{"hydrogen including moisture", Part::hydrogen},
                                   Name{"O including moisture", Part::oxygen},
                                   Name{"oxygen including moisture", Part::oxygen}};

// Mass of hydrogen and of oxygen in water (ASTM D3180-15, section 7).
constexpr double kHydrogenOfWater = 0.1119;
constexpr double kOxygenOfWater = 0.8881;

template <std::size_t N>
std::optional<Part> among(const std::array<Name, N>& names, std::string_view written) {
  for (const Name& name : names) {
    if (equal_ignoring_case(name.written, written)) return name.part;
  }
  return std::nullopt;
}

Measure share(double value) { return {value, Quantity::fraction}; }

Failure at_entry(std::size_t index, Fault fault, const char* reason, Measure first = {},
                 Measure second = {}) {
  Failure failure{fault, 1, reason, {{first, second}}};
  failure.row = static_cast<std::uint32_t>(index + 1);
  failure.column = 1;
  return failure;
}

Failure check_state(const Analysis& analysis) {
  const auto missing = [](const char* reason) { return Failure{Fault::missing, 1, reason}; };
  const auto not_here = [](const char* reason) { return Failure{Fault::impossible, 1, reason}; };
  switch (analysis.state) {
    case State::as_received:
      if (analysis.has(Part::moisture)) break;
      return missing(
          "is as received and states no moisture: without it nobody can tell whether hydrogen and "
          "oxygen include those of the moisture");
    case State::air_dried:
      if (analysis.has(Part::moisture)) break;
      return missing(
          "is air-dried and states no moisture: without it nobody can tell whether hydrogen and "
          "oxygen include those of the moisture");
    case State::dry:
      if (analysis[Part::moisture] == 0) break;
      return not_here(
          "is dry and states moisture: leave the moisture out here, it is an "
          "argument of its own where it is needed");
    case State::dry_ash_free:
      if (analysis[Part::moisture] != 0) {
        return not_here("is dry ash-free and states moisture: leave it out here");
      }
      if (analysis[Part::ash] != 0) {
        return not_here("is dry ash-free and states ash: leave it out here");
      }
      break;
  }
  return {};
}

bool closes(double sum) { return std::abs(sum - 1) <= kClosure; }

Failure check_ultimate(const Analysis& analysis) {
  const double sum = ultimate_sum(analysis);
  if (closes(sum)) return {};
  if (analysis[Part::moisture] > kClosure && closes(sum - analysis[Part::moisture])) {
    return {Fault::impossible,
            1,
            "adds to {0} with its moisture of {1} and to {2} without: hydrogen and oxygen seem to "
            "include those of the moisture; then name them \"H including moisture\" and \"O "
            "including moisture\"",
            {{share(sum), share(analysis[Part::moisture]), share(sum - analysis[Part::moisture])}}};
  }
  return {Fault::impossible,
          1,
          sum > 1
              ? "does not close: elements, ash and moisture add to {0}, {1} too much (up to {2} "
                "passes)"
              : "does not close: elements, ash and moisture add to {0}, {1} is missing (up to "
                "{2} passes)",
          {{share(sum), share(std::abs(sum - 1)), share(kClosure)}}};
}

Failure complete_proximate(Analysis& analysis) {
  if (!analysis.has(Part::volatile_matter)) {
    return {Fault::missing, 1, "states fixed carbon and no volatile matter"};
  }
  const bool knows_ash = analysis.has(Part::ash) || analysis.state == State::dry_ash_free;
  if (!analysis.has(Part::fixed_carbon)) {
    if (!knows_ash) {
      return {Fault::missing, 1,
              "states volatile matter but neither fixed carbon nor ash: fixed carbon is what "
              "remains of both"};
    }
    const double rest = 1 - proximate_sum(analysis);
    if (rest < 0) {
      return {Fault::impossible,
              1,
              "has volatile matter, ash and moisture of {0} together, {1} too much",
              {{share(1 - rest), share(-rest)}}};
    }
    analysis.set(Part::fixed_carbon, rest);
    return {};
  }
  const double sum = proximate_sum(analysis);
  if (closes(sum)) return {};
  return {Fault::impossible,
          1,
          sum > 1 ? "does not close: volatile matter, fixed carbon, ash and moisture add to {0}, "
                    "{1} too much (up to {2} passes)"
                  : "does not close: volatile matter, fixed carbon, ash and moisture add to {0}, "
                    "{1} is missing (up to {2} passes)",
          {{share(sum), share(std::abs(sum - 1)), share(kClosure)}}};
}

Failure check(Analysis& analysis) {
  if (const Failure failure = check_state(analysis); failure.fault != Fault::none) return failure;
  const bool ultimate = analysis.has_ultimate();
  const bool proximate = analysis.has_proximate();
  const double burns =
      ultimate ? analysis[Part::carbon] + analysis[Part::hydrogen] + analysis[Part::sulphur]
               : analysis[Part::volatile_matter] + analysis[Part::fixed_carbon];
  const bool rest_burns =
      !ultimate && proximate && !analysis.has(Part::fixed_carbon) && proximate_sum(analysis) < 1;
  const double organic = 1 - analysis[Part::ash] - analysis[Part::moisture];
  if (organic <= kClosure || (!(burns > 0) && !rest_burns)) {
    return {Fault::impossible,
            1,
            "holds nothing that burns: ash and moisture are {0} of it, and neither carbon, "
            "hydrogen and sulphur nor volatile matter and fixed carbon stand against them",
            {{share(1 - organic)}}};
  }
  if (ultimate) {
    if (const Failure failure = check_ultimate(analysis); failure.fault != Fault::none) {
      return failure;
    }
  }
  return proximate ? complete_proximate(analysis) : Failure{};
}

}  // namespace

bool Analysis::has_ultimate() const {
  return std::any_of(kElements.begin(), kElements.end(), [&](Part part) { return has(part); });
}

bool Analysis::has_proximate() const {
  return has(Part::volatile_matter) || has(Part::fixed_carbon);
}

std::optional<Part> part_named(std::string_view name) { return among(kNames, trimmed(name)); }

std::string_view symbol_of(Part part) { return kSymbols[static_cast<std::size_t>(part)]; }

double ultimate_sum(const Analysis& analysis) {
  double sum = analysis[Part::ash] + analysis[Part::moisture];
  for (const Part part : kElements) sum += analysis[part];
  return sum;
}

double proximate_sum(const Analysis& analysis) {
  return analysis[Part::volatile_matter] + analysis[Part::fixed_carbon] + analysis[Part::ash] +
         analysis[Part::moisture];
}

Outcome<Analysis> read(State state, std::span<const Entry> entries) {
  Analysis analysis;
  analysis.state = state;
  std::array<std::size_t, kParts> line{};
  std::array<bool, kParts> with_moisture{};
  for (std::size_t i = 0; i < entries.size(); ++i) {
    const Entry& entry = entries[i];
    std::optional<Part> part = part_named(entry.name);
    const std::optional<Part> moist = among(kWithMoisture, trimmed(entry.name));
    if (moist) part = moist;
    if (!part) {
      return at_entry(i, Fault::unknown_word,
                      "is not a part of a fuel analysis; write C, H, O, N, S, Cl, ash, moisture, "
                      "volatile matter or fixed carbon");
    }
    if (analysis.has(*part)) {
      return at_entry(i, Fault::wrong_shape, "names a part for the second time");
    }
    if (!(entry.share >= 0)) {
      return at_entry(i, Fault::impossible, "is {0}: a share below nought", share(entry.share));
    }
    if (!(entry.share <= 1)) {
      return at_entry(i, Fault::impossible,
                      *part == Part::moisture
                          ? "is {0}, above the whole: only moisture counted on dry mass can be, "
                            "see MOISTURE_ON_WET_BASIS"
                          : "is {0}, above the whole",
                      share(entry.share));
    }
    const auto index = static_cast<std::size_t>(*part);
    analysis.set(*part, entry.share);
    line[index] = i;
    with_moisture[index] = moist.has_value();
  }
  const double moisture = analysis[Part::moisture];
  for (const auto& [part, of_water] :
       {std::pair{Part::hydrogen, kHydrogenOfWater}, std::pair{Part::oxygen, kOxygenOfWater}}) {
    const auto index = static_cast<std::size_t>(part);
    if (!with_moisture[index]) continue;
    const double without = analysis[part] - of_water * moisture;
    if (without < 0) {
      return at_entry(line[index], Fault::impossible,
                      "is {0}, less than the {1} that the moisture alone holds",
                      share(analysis[part]), share(of_water * moisture));
    }
    analysis.set(part, without);
  }
  if (const Failure failure = check(analysis); failure.fault != Fault::none) return failure;
  return analysis;
}

}  // namespace busbar::fuel::solid
