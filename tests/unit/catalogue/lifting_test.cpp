// A range is as good as a cell.
#include <gtest/gtest.h>

#include <string>
#include <vector>

#include "calls.hpp"

namespace busbar {
namespace {

using support::Argument;
using support::Value;

Value grid(std::size_t rows, std::size_t columns, double first, double step) {
  Value value(rows, columns);
  for (std::size_t r = 0; r < rows; ++r) {
    for (std::size_t c = 0; c < columns; ++c) {
      value.set(r, c, first + step * static_cast<double>(r * columns + c));
    }
  }
  return value;
}

// The cell of an argument that belongs to a cell of the result.
Value one(const Value& value, std::size_t r, std::size_t c) {
  Value cell;
  cell.copy(0, 0, value, value.rows() == 1 ? 0 : r, value.columns() == 1 ? 0 : c);
  return cell;
}

void expect_lifted(const Value& pressures, const Value& temperatures, std::size_t rows,
                   std::size_t columns) {
  const Value table = support::call("STEAM_ENTHALPY", {pressures, temperatures});
  ASSERT_EQ(table.rows(), rows);
  ASSERT_EQ(table.columns(), columns);
  for (std::size_t r = 0; r < rows; ++r) {
    for (std::size_t c = 0; c < columns; ++c) {
      Value cell;
      cell.copy(0, 0, table, r, c);
      const Value single =
          support::call("STEAM_ENTHALPY", {one(pressures, r, c), one(temperatures, r, c)});
      EXPECT_TRUE(support::same_cell(cell, single)) << r << ' ' << c;
    }
  }
}

TEST(Lifting, RepeatsASingleRowColumnAndCell) {
  const Value scalar = Value::number(540);
  expect_lifted(grid(4, 1, 10, 30), scalar, 4, 1);
  expect_lifted(grid(1, 3, 10, 30), scalar, 1, 3);
  expect_lifted(grid(4, 3, 10, 5), scalar, 4, 3);
  expect_lifted(grid(4, 3, 10, 5), grid(4, 1, 300, 20), 4, 3);
  expect_lifted(grid(4, 3, 10, 5), grid(1, 3, 300, 20), 4, 3);
  expect_lifted(grid(4, 3, 10, 5), grid(4, 3, 300, 20), 4, 3);
  expect_lifted(grid(4, 1, 10, 5), grid(1, 3, 300, 20), 4, 3);
  expect_lifted(grid(1, 3, 10, 5), grid(4, 1, 300, 20), 4, 3);
}

TEST(Lifting, AnyOtherMismatchIsAnErrorThatGivesTheShape) {
  for (const auto& [rows, columns] :
       {std::pair{3, 1}, std::pair{2, 3}, std::pair{4, 2}, std::pair{5, 5}}) {
    const Value result =
        support::call("STEAM_ENTHALPY",
                      {grid(4, 3, 10, 5), grid(std::size_t(rows), std::size_t(columns), 300, 1)});
    ASSERT_EQ(result.rows() * result.columns(), 1U);
    EXPECT_EQ(result.error_at(), BUSBAR_ERROR_VALUE);
    EXPECT_NE(result.reason().find("temperature"), std::string::npos) << result.reason();
    EXPECT_NE(result.reason().find(std::to_string(rows) + " rows"), std::string::npos)
        << result.reason();
  }
}

// Every function, every argument that takes one value: three copies give the single answer thrice.
TEST(Lifting, HoldsForEveryFunction) {
  int lifted = 0;
  for (const Row* row : functions::all()) {
    const std::vector<Value> good = sample::arguments(*row);
    const Value single = support::call_with(row->words.name, good);
    for (std::size_t i = 0; i < good.size() && i < row->arguments.size(); ++i) {
      const Kind kind = row->types[i].kind;
      if (kind != Kind::number && kind != Kind::stream && kind != Kind::word) continue;
      if (row->result.kind == ResultKind::table) continue;
      Value column(3, 1);
      for (std::size_t r = 0; r < 3; ++r) column.copy(r, 0, good[i]);
      const Value table = sample::call(*row, sample::replaced(good, i, &column));
      ASSERT_EQ(table.rows(), 3U) << row->words.name;
      for (std::size_t r = 0; r < 3; ++r) {
        Value cell;
        cell.copy(0, 0, table, r, 0);
        if (single.is_error()) {
          EXPECT_EQ(cell.error_at(), single.error_at()) << row->words.name;
        } else {
          EXPECT_TRUE(support::same_cell(cell, single)) << row->words.name;
        }
      }
      ++lifted;
    }
  }
  EXPECT_GE(lifted, 90);
}

TEST(Lifting, AFailingCellFailsAlone) {
  Value pressures(10000, 1);
  for (std::size_t r = 0; r < pressures.rows(); ++r) {
    pressures.set(r, 0, 1 + 0.02 * static_cast<double>(r));
  }
  constexpr std::size_t kFaulty = 37;
  for (std::size_t k = 0; k < kFaulty; ++k) {
    const std::size_t r = 13 + k * 263;
    if (k % 4 == 0) pressures.set_error(r, 0, BUSBAR_ERROR_MISSING);
    if (k % 4 == 1) pressures.set(r, 0, "broken");
    if (k % 4 == 2) pressures.set(r, 0, -1.0);
    if (k % 4 == 3) pressures.copy(r, 0, Value::blank());
  }
  const Value table = support::call("SATURATION_TEMPERATURE", {pressures});
  std::size_t errors = 0;
  for (std::size_t r = 0; r < table.rows(); ++r) {
    if (table.kind(r, 0) == BUSBAR_ERROR) {
      ++errors;
      EXPECT_EQ(table.reason(r, 0).rfind("SATURATION_TEMPERATURE: pressure ", 0), 0U);
    } else {
      EXPECT_EQ(table.kind(r, 0), BUSBAR_NUMBER);
    }
  }
  EXPECT_EQ(errors, kFaulty);
  EXPECT_EQ(table.error_at(13, 0), BUSBAR_ERROR_MISSING);
  EXPECT_EQ(table.error_at(13 + 263, 0), BUSBAR_ERROR_VALUE);
  EXPECT_EQ(table.error_at(13 + 2 * 263, 0), BUSBAR_ERROR_RANGE);
  EXPECT_EQ(table.error_at(13 + 3 * 263, 0), BUSBAR_ERROR_MISSING);
}

TEST(Lifting, AnExplanationOfARangeFollowsTheFirstFailure) {
  Value pressures(3, 1);
  pressures.set(0, 0, 10.0);
  pressures.set(1, 0, 2000.0);
  pressures.set(2, 0, 3000.0);
  const std::string text = support::explain("STEAM", {pressures, Value::number(540)});
  EXPECT_EQ(text.rfind("Row 2, column 1 of the result: STEAM: pressure 2000 bar", 0), 0U) << text;
}

constexpr std::size_t kWholeColumn = 1048576;

TEST(WholeColumn, OfNumbersIsComputed) {
  Value pressures(kWholeColumn, 1);
  for (std::size_t r = 0; r < kWholeColumn; ++r) {
    pressures.set(r, 0, 1 + 1e-4 * static_cast<double>(r));
  }
  const Value table = support::call("STEAM_ENTHALPY", {pressures, Value::number(540)});
  ASSERT_EQ(table.rows(), kWholeColumn);
  for (const std::size_t r : {std::size_t{0}, kWholeColumn / 2, kWholeColumn - 1}) {
    Value cell;
    cell.copy(0, 0, table, r, 0);
    EXPECT_TRUE(support::same_cell(
        cell, support::call("STEAM_ENTHALPY", {one(pressures, r, 0), Value::number(540)})));
  }
}

TEST(WholeColumn, OfBlanksIsMissingEverywhere) {
  const Value blanks(kWholeColumn, 1);
  const Value table = support::call("ENTHALPY_OF", {blanks});
  ASSERT_EQ(table.rows(), kWholeColumn);
  EXPECT_EQ(table.error_at(0, 0), BUSBAR_ERROR_MISSING);
  EXPECT_EQ(table.error_at(kWholeColumn - 1, 0), BUSBAR_ERROR_MISSING);
  for (const char* name : {"MIX_OUT", "STREAM_TABLE", "EFFICIENCY_CHAIN"}) {
    const Value result = support::call(name, {blanks});
    EXPECT_EQ(result.error_at(), BUSBAR_ERROR_MISSING) << name;
    EXPECT_NE(result.reason().find("row 1, column 1"), std::string::npos) << result.reason();
  }
}

TEST(WholeColumn, AsAChainOfLinksIsMultiplied) {
  Value links(kWholeColumn, 1);
  for (std::size_t r = 0; r < kWholeColumn; ++r) links.set(r, 0, 1.0);
  links.set(7, 0, 0.5);
  links.set(kWholeColumn - 1, 0, 0.5);
  EXPECT_EQ(support::call("EFFICIENCY_CHAIN", {links}).number_at(), 0.25);
}

TEST(WholeColumn, TimesARowIsTooLargeForOneCall) {
  const Value column(kWholeColumn, 1);
  const Value row(1, 1024);
  const Value result = support::call("STEAM_ENTHALPY", {column, row});
  ASSERT_EQ(result.rows() * result.columns(), 1U);
  EXPECT_EQ(result.error_at(), BUSBAR_ERROR_VALUE);
  EXPECT_NE(result.reason().find("cells"), std::string::npos) << result.reason();
}

}  // namespace
}  // namespace busbar
