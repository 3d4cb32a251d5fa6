#include "fuel/solid/conversion.hpp"

namespace busbar::fuel::solid {
namespace {

void scale(Analysis& analysis, double by) {
  for (double& share : analysis.share) share *= by;
}

// Moisture, and ash where it goes too, leave the whole; the rest is shared out anew.
Outcome<Analysis> dried(Analysis analysis, const Supplement& supplement) {
  switch (analysis.state) {
    case State::as_received:
    case State::air_dried: {
      const double dry = 1 - analysis[Part::moisture];
      analysis.drop(Part::moisture);
      scale(analysis, 1 / dry);
      break;
    }
    case State::dry:
      break;
    case State::dry_ash_free:
      if (!supplement.ash) {
        return Failure{Fault::missing, 4,
                       "is left out; a dry ash-free analysis needs it, as a fraction of dry mass"};
      }
      scale(analysis, 1 - *supplement.ash);
      analysis.set(Part::ash, *supplement.ash);
      break;
  }
  analysis.state = State::dry;
  return analysis;
}

Failure check_supplement(const Analysis& analysis, State to, const Supplement& supplement) {
  if (supplement.ash && analysis.state != State::dry_ash_free) {
    return {Fault::impossible, 4, "is not needed: the analysis is not ash-free and holds its own"};
  }
  if (!supplement.moisture) return {};
  if (!is_moist(to)) {
    return {Fault::impossible, 3, "is given, and the wanted basis holds no moisture"};
  }
  if (analysis.state == to) {
    return {Fault::impossible,
            3,
            "is given, and the analysis holds {0} on the same basis; for other moisture bring the "
            "analysis to dry first",
            {{{analysis[Part::moisture], Quantity::fraction}}}};
  }
  return {};
}

Outcome<double> dry_part(State state, const Dilution& dilution) {
  switch (state) {
    case State::as_received:
      if (!dilution.moisture_as_received) {
        return Failure{Fault::missing, 3, "is left out and needed for the as-received basis"};
      }
      return 1 - *dilution.moisture_as_received;
    case State::air_dried:
      if (!dilution.moisture_air_dried) {
        return Failure{Fault::missing, 4, "is left out and needed for the air-dried basis"};
      }
      return 1 - *dilution.moisture_air_dried;
    case State::dry_ash_free:
      if (!dilution.ash_dry) {
        return Failure{Fault::missing, 5, "is left out and needed for the dry ash-free basis"};
      }
      return 1 / (1 - *dilution.ash_dry);
    case State::dry:
      break;
  }
  return 1.0;
}

}  // namespace

Outcome<Analysis> in_state(const Analysis& analysis, State to, const Supplement& supplement) {
  if (const Failure failure = check_supplement(analysis, to, supplement);
      failure.fault != Fault::none) {
    return failure;
  }
  if (analysis.state == to) return analysis;
  const Outcome<Analysis> dry = dried(analysis, supplement);
  if (!dry) return dry;
  Analysis moved = *dry;
  switch (to) {
    case State::as_received:
    case State::air_dried:
      if (!supplement.moisture) {
        return Failure{Fault::missing, 3,
                       "is left out; the wanted basis needs it and the analysis does not hold it"};
      }
      scale(moved, 1 - *supplement.moisture);
      moved.set(Part::moisture, *supplement.moisture);
      break;
    case State::dry:
      break;
    case State::dry_ash_free: {
      const double left = 1 - moved[Part::ash];
      moved.drop(Part::ash);
      scale(moved, 1 / left);
      break;
    }
  }
  moved.state = to;
  return moved;
}

Outcome<double> factor(State from, State to, const Dilution& dilution) {
  if (from == to) return 1.0;
  const Outcome<double> before = dry_part(from, dilution);
  if (!before) return before;
  const Outcome<double> after = dry_part(to, dilution);
  if (!after) return after;
  return *after / *before;
}

}  // namespace busbar::fuel::solid
