// Points of the lines of a diagram, for a chart to draw.
#include <cmath>
#include <string>
#include <vector>

#include "core/text.hpp"
#include "functions/functions.hpp"
#include "functions/steam_arguments.hpp"
#include "water/constants.hpp"
#include "water/diagram/lines.hpp"
#include "water/stream.hpp"

namespace busbar::functions {
namespace {

using water::State;
using water::diagram::Axes;
using water::diagram::Points;

// --- Tables ----------------------------------------------------------------------------------

constexpr std::size_t kColumns = 5;
constexpr std::size_t kMostLines = 100;
constexpr double kFewestPoints = 5;
constexpr double kMostPoints = 1000;

Failure about_count(Number points, std::uint8_t argument) {
  if (points.si == std::floor(points.si)) return {};
  return {
      Fault::wrong_kind, argument, "is {0}, not a whole number", {{{points.si, Quantity::number}}}};
}

std::size_t count_of(Number points) { return static_cast<std::size_t>(points.si); }

constexpr Failure kUnknownAxes{
    Fault::unknown_word, 1, "is no pair of axes; write \"h-s\", \"T-s\", \"p-h\" or \"log p-h\""};

Failure too_many(std::size_t lines) {
  return {Fault::too_large,
          0,
          "holds {0} numbers: a call draws {1} lines at most",
          {{{static_cast<double>(lines), Quantity::number},
            {static_cast<double>(kMostLines), Quantity::number}}}};
}

Failure wrong_count(std::size_t limits, std::size_t lines) {
  return {Fault::wrong_shape,
          0,
          "holds {0} numbers for {1} lines: give one for all or one for each",
          {{{static_cast<double>(limits), Quantity::number},
            {static_cast<double>(lines), Quantity::number}}}};
}

// Headings, then the lines one below the other with an empty row between them, at which a chart
// lifts its pen.
Grid table_of(Axes axes, const std::vector<Points>& lines, UnitSet units) {
  std::size_t rows = lines.size();
  for (const Points& line : lines) rows += line.size();
  Grid table(rows, kColumns);
  const water::diagram::Axis x = abscissa(axes);
  const water::diagram::Axis y = ordinate(axes);
  table.at(0, 0) = heading(x.name, x.quantity, units);
  table.at(0, 1) = heading(y.name, y.quantity, units);
  table.at(0, 2) = heading("pressure", Quantity::pressure, units);
  table.at(0, 3) = heading("temperature", Quantity::temperature, units);
  table.at(0, 4) = std::string("dryness");
  std::size_t r = 1;
  for (const Points& line : lines) {
    if (r > 1) {
      for (std::size_t c = 0; c < kColumns; ++c) table.at(r, c) = std::string();
      ++r;
    }
    for (const State& state : line) {
      const auto put = [&](std::size_t column, double si, Quantity quantity) {
        table.at(r, column) = unit_of(units, quantity).from_si(si);
      };
      put(0, state.*x.property, x.quantity);
      put(1, state.*y.property, y.quantity);
      put(2, state.pressure, Quantity::pressure);
      put(3, state.temperature, Quantity::temperature);
      table.at(r, 4) = std::string();
      if (state.region == water::Region::two_phase) table.at(r, 4) = state.dryness;
      ++r;
    }
  }
  return table;
}

// One line for each number of a range; a limit is one number for all of them or one for each.
struct Family {
  std::span<const double> constants;
  std::span<const double> from;
  std::span<const double> to;
};

Failure check(const Family& family) {
  if (family.constants.size() > kMostLines) return too_many(family.constants.size()).about(2);
  for (const auto& [argument, limits] : {std::pair{3, family.from}, {4, family.to}}) {
    if (limits.size() == 1 || limits.size() == family.constants.size()) continue;
    return wrong_count(limits.size(), family.constants.size())
        .about(static_cast<std::uint8_t>(argument));
  }
  return {};
}

using Line = Outcome<Points> (*)(Axes, double constant, double from, double to, std::size_t points);

Outcome<Grid> lines_of(Word word, const Family& family, Number points, UnitSet units, Line line) {
  constexpr std::uint8_t kPoints = 5;
  const auto axes = water::diagram::axes_named(word);
  if (!axes) return kUnknownAxes;
  for (const Failure& failure : {check(family), about_count(points, kPoints)}) {
    if (failure.fault != Fault::none) return failure;
  }
  std::vector<Points> lines;
  lines.reserve(family.constants.size());
  for (std::size_t i = 0; i < family.constants.size(); ++i) {
    const double from = family.from[family.from.size() > 1 ? i : 0];
    const double to = family.to[family.to.size() > 1 ? i : 0];
    Outcome<Points> drawn = line(*axes, family.constants[i], from, to, count_of(points));
    if (!drawn) return drawn.failure();
    lines.push_back(std::move(*drawn));
  }
  return table_of(*axes, lines, units);
}

// --- Lines of the fluid ----------------------------------------------------------------------

Outcome<Grid> saturation_dome(Word word, Number points, UnitSet units) {
  const auto axes = water::diagram::axes_named(word);
  if (!axes) return kUnknownAxes;
  if (const Failure failure = about_count(points, 2); failure.fault != Fault::none) return failure;
  const Outcome<Points> line = water::diagram::saturation_dome(*axes, count_of(points));
  if (!line) return line.failure();
  return table_of(*axes, {*line}, units);
}

template <class Constant, class Limit, Line kLine>
Outcome<Grid> family_of_lines(Word axes, Numbers<Constant> constants, Numbers<Limit> from,
                              Numbers<Limit> to, Number points, UnitSet units) {
  return lines_of(axes, {constants.si, from.si, to.si}, points, units, kLine);
}

// --- Lines of a process ----------------------------------------------------------------------

using ProcessLine = Outcome<Points> (*)(Axes, std::span<const State>, std::size_t);

template <ProcessLine kLine>
Outcome<Grid> process_line(Word word, Streams streams, Number points, UnitSet units) {
  const auto axes = water::diagram::axes_named(word);
  if (!axes) return kUnknownAxes;
  if (const Failure failure = about_count(points, 3); failure.fault != Fault::none) return failure;
  std::vector<State> states;
  states.reserve(streams.size());
  for (const Stream& stream : streams) {
    const Outcome<State> state = water::state_of(stream);
    if (!state) return state.failure().about(2);
    states.push_back(*state);
  }
  const Outcome<Points> line = kLine(*axes, states, count_of(points));
  if (!line) return line.failure();
  return table_of(*axes, {*line}, units);
}

void explain_size(const Slot*, const Result& result, UnitSet, std::string& text) {
  text += " The table has ";
  append_number(text, static_cast<double>(result.table->rows()), 6);
  text += " rows and ";
  append_number(text, static_cast<double>(result.table->columns()), 6);
  text += " columns: so many cells the array formula needs to show all of it.";
}

// --- Rows ------------------------------------------------------------------------------------

constexpr Argument kAxes{"axes",
                         "\"h-s\", \"T-s\", \"p-h\" or \"log p-h\"; the last gives the pressure "
                         "itself, its points spread "
                         "for a chart whose axis is set to logarithmic"};
constexpr Argument kPoints{"points", "Number of points of each line, ends and corners included",
                           kFewestPoints, kMostPoints};
constexpr Argument kFromTemperature{"from temperature",
                                    "Where each line begins: one for all or one for each", 273.15,
                                    2273.15, kIf97Limit};
constexpr Argument kToTemperature{"to temperature",
                                  "Where each line ends: one for all or one for each", 273.15,
                                  2273.15, kIf97Limit};
constexpr const char* kSaturationLimit = "where the saturation line of IAPWS-IF97 ends";

constexpr Argument kDome[] = {kAxes, kPoints};
constexpr Argument kIsobars[] = {
    kAxes,
    {"pressures", "Absolute pressures, one for each line", kAboveZero, 100e6, kIf97Limit},
    kFromTemperature,
    kToTemperature,
    kPoints};
constexpr Argument kIsotherms[] = {
    kAxes,
    {"temperatures", "Temperatures, one for each line", 273.15, 2273.15, kIf97Limit},
    {"from pressure", "Absolute pressure where each line begins: one for all or one for each",
     kAboveZero, 100e6, kIf97Limit},
    {"to pressure", "Absolute pressure where each line ends: one for all or one for each",
     kAboveZero, 100e6, kIf97Limit},
    kPoints};
constexpr Argument kDrynessLines[] = {
    kAxes,
    {"drynesses", "Mass of vapour over mass of fluid, one for each line", 0, 1},
    {"from temperature",
     "Saturation temperature where each line begins: one for all or one for each", 273.15,
     water::kCriticalTemperature, kSaturationLimit},
    {"to temperature", "Saturation temperature where each line ends: one for all or one for each",
     273.15, water::kCriticalTemperature, kSaturationLimit},
    kPoints};
constexpr Argument kProcess[] = {
    kAxes, {"streams", "A range whose cells all hold streams, in the order of the flow"}, kPoints};

constexpr const char* kTable =
    "A table for an array formula of 5 columns: abscissa, ordinate, pressure, temperature, dryness "
    "(empty where there is none). Headings stand in row 1; an empty row parts two lines, and there "
    "one series of an XY chart lifts its pen";
constexpr const char* kIsobarNote =
    "By rising enthalpy. A line that begins at the saturation temperature begins at boiling water; "
    "one that ends there ends at boiling water.";
constexpr const char* kIsothermNote =
    "By rising pressure. A line passes through wet steam where its pressures lie on both sides of "
    "saturation; one that ends at the saturation pressure ends in saturated steam, as the lines of "
    "an h-s diagram do.";
constexpr const char* kDrynessNote =
    "373.946 °C as the end is the critical point, in which all these lines meet.";
constexpr Source kExpansionSource{"Moran and Shapiro, Fundamentals of Engineering Thermodynamics",
                                  "5th ed.",
                                  "section 6.8, isentropic turbine efficiency, held constant from "
                                  "stream to stream; states by IAPWS R7-97(2012)"};
constexpr Source kHeatingSource{"Definition; states by IAPWS R7-97(2012)",
                                "common practice, no source",
                                "pressure in proportion to the enthalpy from stream to stream"};

constexpr Words words(const char* name, const char* summary, const char* notes,
                      const Source& source, const Example& example) {
  return {name, "Diagrams", summary, notes, kTable, source, example, kFirst};
}

constexpr Row kRows[] = {
    row<saturation_dome>(
        words("SATURATION_DOME", "Points of the saturation line for a chart",
              "Boiling water from 0 °C to the critical point, then saturated steam back to 0 °C.",

              kSaturation, {"INDEX(SATURATION_DOME(\"h-s\"; 60); 2; 1)", "-0.00015454959"}),
        kDome, explain_size),
    row<family_of_lines<Pressure, Temperature, water::diagram::isobar>>(
        words("ISOBARS", "Points of lines of constant pressure for a chart", kIsobarNote,
              kSteamTables, {"INDEX(ISOBARS(\"h-s\"; 1; 20; 600; 40); 41; 2)", "3705.57"}),
        kIsobars, explain_size),
    row<family_of_lines<Temperature, Pressure, water::diagram::isotherm>>(
        words("ISOTHERMS", "Points of lines of constant temperature for a chart", kIsothermNote,
              kSteamTables, {"INDEX(ISOTHERMS(\"h-s\"; 600; 0.01; 100; 30); 31; 2)", "3625.84"}),
        kIsotherms, explain_size),
    row<family_of_lines<Fraction, Temperature, water::diagram::dryness_line>>(
        words("DRYNESS_LINES", "Points of lines of constant dryness for a chart", kDrynessNote,
              kSaturation,
              {"INDEX(DRYNESS_LINES(\"h-s\"; 0.9; 0; 373.946; 30); 31; 2)", "2087.55"}),
        kDrynessLines, explain_size),
    row<process_line<water::diagram::expansion_line>>(
        words("EXPANSION_LINE", "Points of a turbine's expansion through streams, for a chart",
              "Through every stream, as measured or designed. Between two of them each point is "
              "where a turbine of that section's isentropic efficiency would leave the steam. "
              "With TURBINE_OUT(inlet; p; 1) as the second stream it is the isentropic line.",
              kExpansionSource,
              {"INDEX(EXPANSION_LINE(\"h-s\"; B2:B3; 20); 21; 2)", "2264.77",
               "B2=STEAM(100; 540) | B3=TURBINE_OUT(STEAM(100; 540); 0.05; 0.85)"}),
        kProcess, explain_size),
    row<process_line<water::diagram::heating_line>>(
        words("HEATING_LINE",
              "Points of heating, cooling or throttling through streams, for a chart",
              "Through every stream. Between two of them the pressure changes in proportion to the "
              "heat: a loss of pressure is spread evenly over it.",
              kHeatingSource,
              {"INDEX(HEATING_LINE(\"T-s\"; B2:B3; 40); 41; 2)", "540",
               "B2=STEAM(105; 230) | B3=STEAM(100; 540)"}),
        kProcess, explain_size),
};

}  // namespace

std::span<const Row> diagrams() { return kRows; }

}  // namespace busbar::functions
