// Comma-separated tables with quotes (RFC 4180), the first line naming the columns.
#pragma once

#include <map>
#include <string>
#include <string_view>
#include <vector>

namespace busbar::support {

/// A line by column name, with the number of the line in the file for messages.
struct CsvLine {
  std::size_t number = 0;
  std::map<std::string, std::string, std::less<>> fields;

  /// The field of a column; throws std::out_of_range when the table has no such column.
  [[nodiscard]] const std::string& at(std::string_view column) const;
};

struct Csv {
  std::vector<std::string> columns;
  std::vector<CsvLine> lines;
};

/// Throws std::runtime_error with file and line for a line with too few or too many fields, an open
/// quote, or a file that cannot be read.
Csv read_csv(const std::string& path);

}  // namespace busbar::support
