// Between the gross heating value of a bomb and the net value of a fuel as it is burnt.
#pragma once

#include <optional>
#include <string_view>

#include "core/outcome.hpp"
#include "fuel/solid/analysis.hpp"
#include "fuel/solid/conversion.hpp"

namespace busbar::fuel::solid {

/// net = (gross - a H - b O - c N)(1 - M) - e M, with gross and elements on dry mass, M on moist
/// mass. All in J/kg for a share of one.
struct NetMethod {
  std::string_view name;
  double hydrogen = 0;
  double oxygen = 0;
  double nitrogen = 0;
  double moisture = 0;
  std::string_view gross;  ///< what the gross value is
  std::string_view net;    ///< what comes out
  std::string_view source;
  std::string_view status;
};

/// "ISO 18125", "ISO 1928", "ISO 1928 constant volume", "IPCC 2006", "heat of condensation".
const NetMethod* net_method_named(std::string_view name);

inline constexpr const char* kUnknownNetMethod =
    "is not a method between gross and net; write \"ISO 18125\", \"ISO 1928\", \"ISO 1928 constant "
    "volume\", \"IPCC 2006\" or \"heat of condensation\"";

/// A heating value and the state of the fuel that it is per kilogram of.
struct StatedValue {
  double value = 0;
  State state = State::dry;
};

/// Net value in state `to` from a gross value. `moisture` is that of the moist state among the
/// wanted and the given one that the analysis does not hold itself. Failures: 1 the analysis (it
/// holds no elements), 3 the state of the gross value, 4 the wanted state, 5 the moisture.
Outcome<double> net_from_gross(const Analysis& analysis, StatedValue gross, State to,
                               const NetMethod& method, std::optional<double> moisture);

/// The other way round, with the same failures.
Outcome<double> gross_from_net(const Analysis& analysis, StatedValue net, State to,
                               const NetMethod& method, std::optional<double> moisture);

/// Net value at another moisture; both moistures as fractions of moist mass, below one.
/// q_net = q_net,dry (1 - M) - 2.443 MJ/kg M: ISO 17225-1:2021, annex on the calculation of the net
/// calorific value at different bases.
double net_at_moisture(double net, double from, double to);

/// Gross value at another moisture: the dry part alone burns.
double gross_at_moisture(double gross, double from, double to);

/// Water per dry matter from water per moist matter, and back.
double moisture_on_dry_mass(double moisture);
double moisture_on_moist_mass(double moisture);

}  // namespace busbar::fuel::solid
