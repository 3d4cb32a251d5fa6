#include "core/composition.hpp"

#include <cmath>

#include "core/text.hpp"

namespace busbar {
namespace {

constexpr double kHundred = 100;

// A sum that somebody meant as a whole of a hundred, or of a hundredth.
constexpr double kNear = 0.02;

bool is_near(double sum, double whole) { return std::abs(sum - whole) <= kNear * whole; }

// Takes a word off the front, whatever blanks, points and hyphens follow it.
bool take(std::string_view& text, std::string_view word) {
  if (text.size() < word.size() || !equal_ignoring_case(text.substr(0, word.size()), word)) {
    return false;
  }
  text.remove_prefix(word.size());
  while (!text.empty() && (text.front() == ' ' || text.front() == '.' || text.front() == '-')) {
    text.remove_prefix(1);
  }
  return true;
}

Failure malformed(const char* reason) { return {Fault::unknown_word, 1, reason}; }

Failure negative(std::size_t index, double amount) {
  Failure failure{Fault::outside_range,
                  1,
                  "has the amount {0}, which is negative",
                  {{{amount, Quantity::number}}}};
  failure.row = static_cast<std::uint32_t>(index + 1);
  return failure;
}

Failure check_signs(const Composition& composition) {
  for (std::size_t i = 0; i < composition.parts.size(); ++i) {
    const double amount = composition.parts[i].amount;
    if (!(amount >= 0)) return negative(i, amount);
  }
  return {};
}

// "[typical: beech] mass % dry: ..." without what stands in brackets.
std::string_view without_remark(std::string_view text) {
  text = trimmed(text);
  if (text.empty() || text.front() != '[') return text;
  const auto end = text.find(']');
  return end == std::string_view::npos ? text : trimmed(text.substr(end + 1));
}

// "n-C4H10 0.03": the amount is what stands behind the last space.
bool read_part(std::string_view text, Part& part) {
  text = trimmed(text);
  const auto space = text.find_last_of(" \t");
  if (space == std::string_view::npos) return false;
  part.name = trimmed(text.substr(0, space));
  return !part.name.empty() && read_number(text.substr(space + 1), part.amount);
}

}  // namespace

double Composition::sum() const {
  double total = 0;
  for (const Part& part : parts) total += part.amount;
  return total;
}

std::optional<Heading> read_heading(std::string_view text) {
  std::string_view rest;
  const std::optional<Heading> heading = read_heading(text, rest);
  return rest.empty() ? heading : std::nullopt;
}

std::optional<Heading> read_heading(std::string_view text, std::string_view& rest) {
  text = trimmed(text);
  Heading heading;
  if (take(text, "mole") || take(text, "mol/mol") || take(text, "mol")) {
    heading.basis = Basis::mole;
  } else if (take(text, "mass") || take(text, "weight") || take(text, "wt") ||
             take(text, "kg/kg")) {
    heading.basis = Basis::mass;
  } else {
    return std::nullopt;
  }
  if (take(text, "%") || take(text, "percent")) {
    heading.percent = true;
  } else {
    take(text, "fraction");
  }
  rest = text;
  return heading;
}

const char* why_no_heading(std::string_view text) {
  text = trimmed(text);
  if (take(text, "vol")) {
    return "is no basis here: the volume % of an ideal gas is its mole %; write \"mole %\" where "
           "that holds";
  }
  return "states no basis: write \"mole\", \"mole %\", \"mass\" or \"mass %\"";
}

Outcome<Composition> read_composition(std::string_view text, std::string& word,
                                      std::string_view* rest) {
  text = without_remark(text);
  const auto colon = text.find(':');
  const auto refuse = [&](std::string_view what, const char* reason) {
    word = quotable(what);
    return malformed(reason);
  };
  if (colon == std::string_view::npos) {
    return refuse(text,
                  "is no composition: write \"mole: N2 0.79, O2 0.21\" with mole, mole %, mass or "
                  "mass %, or the name of a published mixture");
  }
  std::string_view behind;
  const auto heading = read_heading(text.substr(0, colon), behind);
  if (rest != nullptr) *rest = behind;
  if (!heading || (rest == nullptr && !behind.empty()))
    return refuse(text.substr(0, colon), why_no_heading(text.substr(0, colon)));
  Composition composition;
  composition.basis = heading->basis;
  text.remove_prefix(colon + 1);
  while (true) {
    const auto comma = text.find(',');
    Part part;
    if (!read_part(text.substr(0, comma), part)) {
      return refuse(trimmed(text.substr(0, comma)),
                    "is no part of a composition: a name, a space and an amount are needed, with a "
                    "point in the amount and a comma between parts");
    }
    if (heading->percent) part.amount /= kHundred;
    if (composition.parts.size() == kMostParts) {
      return Failure{Fault::too_large,
                     1,
                     "has more than {0} parts",
                     {{{static_cast<double>(kMostParts), Quantity::number}}}};
    }
    composition.parts.push_back(part);
    if (comma == std::string_view::npos) return composition;
    text.remove_prefix(comma + 1);
  }
}

void write_composition(std::string& out, const Composition& composition) {
  out += composition.basis == Basis::mole ? "mole:" : "mass:";
  bool first = true;
  for (const Part& part : composition.parts) {
    out += first ? " " : ", ";
    first = false;
    out += part.name;
    out += ' ';
    append_exact(out, part.amount);
  }
}

Failure check_amounts(const Composition& composition) {
  if (const Failure failure = check_signs(composition); failure.fault != Fault::none) {
    return failure;
  }
  const double sum = composition.sum();
  const double excess = sum - 1;
  if (std::abs(excess) <= kSumTolerance) return {};
  const Measure total{sum, Quantity::number};
  if (is_near(sum, kHundred)) {
    return {Fault::impossible,
            1,
            "sums to {0} instead of 1: state \"mole %\" or \"mass %\" if these are percentages",
            {{total}}};
  }
  if (is_near(sum, 1 / kHundred)) {
    return {Fault::impossible,
            1,
            "sums to {0} instead of 1: state \"mole\" or \"mass\" if these are fractions (cells "
            "that show % hold fractions)",
            {{total}}};
  }
  return {Fault::impossible,
          1,
          excess < 0 ? "sums to {0}, {1} too little; NORMALISED_COMPOSITION divides by the sum"
                     : "sums to {0}, {1} too much; NORMALISED_COMPOSITION divides by the sum",
          {{total, {std::abs(excess), Quantity::number}}}};
}

Outcome<Composition> normalised(Composition composition) {
  if (const Failure failure = check_signs(composition); failure.fault != Fault::none) {
    return failure;
  }
  const double sum = composition.sum();
  if (!(sum > 0) || !std::isfinite(sum)) {
    return Failure{Fault::impossible,
                   1,
                   "sums to {0}: there is nothing to divide by",
                   {{{sum, Quantity::number}}}};
  }
  for (Part& part : composition.parts) part.amount /= sum;
  return composition;
}

}  // namespace busbar
