// A range gives what its cells give one by one, to the last bit and to the last word of a reason,
// for every row with a batch kernel and on every instruction set that this processor has.
#include <gtest/gtest.h>

#include <bit>
#include <cmath>
#include <cstdint>
#include <limits>
#include <string>
#include <vector>

#include "../water/sampling.hpp"
#include "catalogue/call.hpp"
#include "catalogue/sentence.hpp"
#include "functions/functions.hpp"
#include "water/batch/instructions.hpp"
#include "water/state.hpp"

namespace busbar {
namespace {

using water::batch::Instructions;
using water::testing::near_a_boundary;
using water::testing::Sampler;

constexpr std::size_t kStates = 6000;
constexpr double kInfinity = std::numeric_limits<double>::infinity();
constexpr double kNone = std::numeric_limits<double>::quiet_NaN();

std::vector<const Row*> rows_with_batch() {
  std::vector<const Row*> rows;
  for (const Row* row : functions::all()) {
    if (row->batch != nullptr) rows.push_back(row);
  }
  return rows;
}

// Arguments of a row, in SI.
using Point = std::vector<double>;

// A state anywhere, beside a boundary, or on the saturation line to the last digits.
water::testing::Point somewhere(Sampler& sampler, int turn) {
  constexpr double kLowest = 273.15;
  if (turn % 3 == 0) return near_a_boundary(sampler, turn / 3, kLowest);
  if (turn % 15 == 1) {
    const double t = sampler.between(kLowest, 647.096);
    const double hair = sampler.between(-1, 1) * (turn % 2 == 0 ? 1e-9 : 1e-15);
    return {*water::saturation_pressure(t) * (1 + hair), t};
  }
  if (turn % 15 == 2) return {sampler.between(16.5e6, 23e6), sampler.between(620, 660)};
  if (turn % 15 == 4) return {sampler.log_between(1e-300, 700), sampler.between(260, 2300)};
  if (turn % 15 == 5) return {sampler.between(16e6, 100e6), sampler.between(620, 870)};
  return {sampler.log_between(600, 110e6),
          turn % 2 == 0 ? sampler.between(270, 2300) : sampler.between(270, 900)};
}

// The second property of the state at a pressure and a temperature; beside it, where that fails.
double property_at(Quantity quantity, const water::testing::Point& at, Sampler& sampler, int turn) {
  auto state = water::at_pressure_temperature(at.pressure, at.temperature);
  if (turn % 5 == 1) state = water::at_pressure_dryness(at.pressure, sampler.between(-0.01, 1.01));
  if (turn % 35 == 2) state = water::at_pressure_dryness(at.pressure, turn % 2 == 0 ? 0 : 1);
  const double hair = turn % 7 == 0 ? 1 + sampler.between(-1e-6, 1e-6) : 1;
  if (quantity == Quantity::enthalpy) {
    return hair * (state ? state->enthalpy : sampler.between(-2e4, 8.1e6));
  }
  return hair * (state ? state->entropy : sampler.between(-1.1e3, 2.1e4));
}

// What the row takes, whatever it is, at and beside the states where its kernels decide.
Point arguments_of(const Row& row, Sampler& sampler, int turn) {
  const auto at = somewhere(sampler, turn);
  Point point;
  for (std::size_t i = 0; i < row.types.size(); ++i) {
    switch (row.types[i].quantity) {
      case Quantity::pressure:
        point.push_back(at.pressure);
        break;
      case Quantity::temperature:
        point.push_back(at.temperature);
        break;
      case Quantity::enthalpy:
      case Quantity::entropy:
        point.push_back(property_at(row.types[i].quantity, at, sampler, turn));
        break;
      case Quantity::fraction:
        point.push_back(turn % 9 == 0 ? sampler.between(-1e-6, 1e-6) : sampler.between(0, 1.1));
        break;
      default: {
        const Argument& argument = row.arguments[i];
        point.push_back(sampler.between(argument.low, argument.high));
      }
    }
  }
  return point;
}

// One argument spoilt, now and then.
Cell cell_of(double number, std::size_t index, int turn) {
  if (turn % 41 != static_cast<int>(index)) return number;
  switch (turn / 41 % 9) {
    case 0:
      return kNone;
    case 1:
      return kInfinity;
    case 2:
      return -kInfinity;
    case 3:
      return Blank{};
    case 4:
      return std::string("text");
    case 5:
      return std::string();
    case 6:
      return true;
    case 7:
      return 0.0;
    default:
      return -number;
  }
}

Cell copied(const Cell& cell) {
  if (const auto* number = std::get_if<double>(&cell)) return *number;
  if (const auto* text = std::get_if<std::string>(&cell)) return *text;
  if (const auto* logical = std::get_if<bool>(&cell)) return *logical;
  return Blank{};
}

// The cells of a call over columns.
std::vector<Grid> columns_for(const Row& row, UnitSet units) {
  Sampler sampler(20261201);
  std::vector<Grid> columns;
  for (std::size_t i = 0; i < row.types.size(); ++i) columns.emplace_back(kStates, 1);
  for (std::size_t k = 0; k < kStates; ++k) {
    const auto turn = static_cast<int>(k);
    const Point point = arguments_of(row, sampler, turn);
    for (std::size_t i = 0; i < columns.size(); ++i) {
      const double number = unit_of(units, row.types[i].quantity).from_si(point[i]);
      columns[i].at(k, 0) = cell_of(number, i, turn);
    }
  }
  return columns;
}

Grid call_with(const Row& row, const std::vector<Grid>& arguments, const Grid* options) {
  std::vector<const Grid*> given;
  for (const Grid& argument : arguments) given.push_back(&argument);
  if (options != nullptr) given.push_back(options);
  return call(row, given);
}

std::string shown(const Cell& cell) {
  if (const auto* error = std::get_if<Error>(&cell)) return sentence(error->problem());
  const auto* number = std::get_if<double>(&cell);
  if (number == nullptr) return "neither number nor error";
  return std::to_string(std::bit_cast<std::uint64_t>(*number)) + " = " + std::to_string(*number);
}

class Batch : public testing::TestWithParam<const Row*> {
 protected:
  ~Batch() override { water::batch::use_at_most(Instructions::avx512); }
};

// How many of the states the batch kernel itself must answer; what lies beside seams, fails, or is
// wet where only one phase has an answer, is few.
TEST_P(Batch, EqualsSingleCellsOnEveryInstructionSet) {
  const Row& row = *GetParam();
  for (const UnitSet units : {UnitSet::metric, UnitSet::us}) {
    const Grid options(Cell(std::string(name_of(units))));
    const Grid* last = row.has_options ? &options : nullptr;
    const std::vector<Grid> columns = columns_for(row, units);
    std::vector<std::string> single;
    std::vector<Grid> cells(columns.size());
    for (std::size_t k = 0; k < kStates; ++k) {
      for (std::size_t i = 0; i < columns.size(); ++i) cells[i] = Grid(copied(columns[i].at(k, 0)));
      single.push_back(shown(call_with(row, cells, last).at(0, 0)));
    }
    for (const auto set : {Instructions::baseline, Instructions::avx2, Instructions::avx512}) {
      if (!water::batch::has(set)) continue;
      water::batch::use_at_most(set);
      const Grid together = call_with(row, columns, last);
      int differing = 0;
      for (std::size_t k = 0; k < kStates && differing < 5; ++k) {
        const std::string batch = shown(together.at(k, 0));
        if (batch == single[k]) continue;
        ++differing;
        ADD_FAILURE() << row.words.name << " on " << static_cast<int>(set) << ", state " << k
                      << ": " << batch << " instead of " << single[k] << " at "
                      << shown(columns[0].at(k, 0)) << ", "
                      << (columns.size() > 1 ? shown(columns[1].at(k, 0)) : std::string());
      }
    }
  }
}

TEST_P(Batch, RepeatsSingleRowsAndColumns) {
  const Row& row = *GetParam();
  if (row.types.size() != 2) return;
  const std::vector<Grid> all = columns_for(row, UnitSet::metric);
  constexpr std::size_t kRows = 37;
  constexpr std::size_t kColumns = 53;
  std::vector<Grid> crossed;
  crossed.emplace_back(kRows, 1);
  crossed.emplace_back(1, kColumns);
  for (std::size_t r = 0; r < kRows; ++r) crossed[0].at(r, 0) = copied(all[0].at(r, 0));
  for (std::size_t c = 0; c < kColumns; ++c) crossed[1].at(0, c) = copied(all[1].at(c, 0));
  const Grid table = call_with(row, crossed, nullptr);
  ASSERT_EQ(table.rows(), kRows);
  ASSERT_EQ(table.columns(), kColumns);
  std::vector<Grid> cells(2);
  for (std::size_t r = 0; r < kRows; ++r) {
    for (std::size_t c = 0; c < kColumns; ++c) {
      cells[0] = Grid(copied(all[0].at(r, 0)));
      cells[1] = Grid(copied(all[1].at(c, 0)));
      EXPECT_EQ(shown(table.at(r, c)), shown(call_with(row, cells, nullptr).at(0, 0)));
    }
  }
}

// A batch kernel that answered nothing would pass above.
TEST_P(Batch, AnswersNearlyAllOrdinaryStatesItself) {
  const Row& row = *GetParam();
  Sampler sampler(7);
  std::vector<std::vector<double>> columns(row.types.size());
  for (int k = 0; k < 2000; ++k) {
    const double t = sampler.between(300, 580);
    const double p = *water::saturation_pressure(t) *
                     (k % 2 == 0 ? sampler.between(1.1, 2) : sampler.between(0.5, 0.9));
    const auto dry = water::at_pressure_temperature(p, t);
    const auto wet = water::at_pressure_dryness(p, sampler.between(0.05, 0.9));
    const bool needs_wet = std::string(row.words.name).find("DRYNESS_AT") != std::string::npos;
    const auto& state = needs_wet || k % 5 == 0 ? wet : dry;
    for (std::size_t i = 0; i < columns.size(); ++i) {
      switch (row.types[i].quantity) {
        case Quantity::pressure:
          columns[i].push_back(p);
          break;
        case Quantity::temperature:
          columns[i].push_back(t);
          break;
        case Quantity::enthalpy:
          columns[i].push_back(state->enthalpy);
          break;
        case Quantity::entropy:
          columns[i].push_back(state->entropy);
          break;
        default:
          columns[i].push_back(sampler.between(0, 1));
      }
    }
  }
  std::vector<const double*> in;
  for (const auto& column : columns) in.push_back(column.data());
  std::vector<double> out(2000);
  row.batch(in.data(), out.data(), out.size());
  int answered = 0;
  for (const double number : out) answered += std::isfinite(number) ? 1 : 0;
  EXPECT_GT(answered, 1980) << row.words.name;
}

INSTANTIATE_TEST_SUITE_P(Rows, Batch, testing::ValuesIn(rows_with_batch()),
                         [](const auto& of) { return std::string(of.param->words.name); });

}  // namespace
}  // namespace busbar
