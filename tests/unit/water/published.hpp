// Published figures from tests/reference/water-releases and their tolerance.
#pragma once

#include <charconv>
#include <cmath>
#include <fstream>
#include <map>
#include <sstream>
#include <string>
#include <vector>

#include "paths.hpp"

namespace busbar::water::testing {

/// A row of a reference file by column name.
using Row = std::map<std::string, std::string>;

// The files have no quoted fields.
inline std::vector<std::string> split(const std::string& line) {
  std::vector<std::string> fields;
  std::string field;
  std::istringstream in(line);
  while (std::getline(in, field, ',')) fields.push_back(field);
  if (!line.empty() && line.back() == ',') fields.emplace_back();
  return fields;
}

/// All rows of a file; empty when it cannot be read (each test asserts that it is not).
inline std::vector<Row> read_rows(const std::string& file) {
  std::ifstream in(support::reference_directory() / "water-releases" / file);
  std::vector<Row> rows;
  std::string line;
  std::vector<std::string> names;
  while (std::getline(in, line)) {
    if (!line.empty() && line.back() == '\r') line.pop_back();
    const std::vector<std::string> fields = split(line);
    if (names.empty()) {
      names = fields;
      continue;
    }
    Row row;
    for (std::size_t k = 0; k < names.size(); ++k) {
      row[names[k]] = k < fields.size() ? fields[k] : "";
    }
    rows.push_back(row);
  }
  return rows;
}

inline double number(const std::string& text) {
  double value = std::nan("");
  std::from_chars(text.data(), text.data() + text.size(), value);
  return value;
}

/// One unit of the last printed digit: "0.100E-02" has 1e-5.
inline double last_digit(const std::string& text) {
  const std::size_t e = text.find('E');
  const std::string mantissa = text.substr(0, e);
  int exponent = 0;
  if (e != std::string::npos) {
    std::size_t at = e + 1;
    if (text[at] == '+') ++at;
    std::from_chars(text.data() + at, text.data() + text.size(), exponent);
  }
  const std::size_t point = mantissa.find('.');
  const int decimals =
      point == std::string::npos ? 0 : static_cast<int>(mantissa.size() - point - 1);
  return std::pow(10.0, exponent - decimals);
}

/// The factor from a printed unit to SI; 0 for a unit that no row should have.
inline double unit_in_si(const std::string& unit) {
  static const std::map<std::string, double> kUnits = {
      {"MPa", 1e6},       {"Pa", 1},       {"K", 1},     {"kJ/kg", 1e3},
      {"kJ/(kg K)", 1e3}, {"J/(kg K)", 1}, {"m3/kg", 1}, {"kg/m3", 1},
      {"m/s", 1},         {"", 1},         {"-", 1},     {"uPa s", 1e-6},
      {"mW/(m K)", 1e-3}, {"mN/m", 1e-3},  {"nm", 1e-9}, {"kg/(m3 MPa)", 1e-6},
  };
  const auto found = kUnits.find(unit);
  return found == kUnits.end() ? 0 : found->second;
}

/// An input of the row in SI by the name of the variable ("p", "T", "h", "s", "rho"); NaN if
/// absent.
inline double input(const Row& row, const std::string& name) {
  for (const char* x : {"x1", "x2"}) {
    const std::string key = x;
    if (row.at(key) == name) {
      return number(row.at(key + "_value")) * unit_in_si(row.at(key + "_unit"));
    }
  }
  return std::nan("");
}

}  // namespace busbar::water::testing
