#include "csv.hpp"

#include <fstream>
#include <iterator>
#include <stdexcept>

namespace busbar::support {
namespace {

struct Record {
  std::size_t line = 0;
  std::vector<std::string> fields;
};

std::vector<Record> split(const std::string& text, const std::string& path) {
  std::vector<Record> records;
  Record record{1, {}};
  std::string field;
  bool quoted = false;
  std::size_t line = 1;
  const auto end_record = [&] {
    record.fields.push_back(std::move(field));
    field.clear();
    if (record.fields.size() > 1 || !record.fields.front().empty()) records.push_back(record);
    record = {line, {}};
  };
  for (std::size_t i = 0; i < text.size(); ++i) {
    const char c = text[i];
    if (c == '\n') ++line;
    if (quoted) {
      if (c != '"') {
        field += c;
      } else if (i + 1 < text.size() && text[i + 1] == '"') {
        field += c;
        ++i;
      } else {
        quoted = false;
      }
    } else if (c == '"') {
      quoted = true;
    } else if (c == ',') {
      record.fields.push_back(std::move(field));
      field.clear();
    } else if (c == '\n') {
      end_record();
    } else if (c != '\r') {
      field += c;
    }
  }
  if (quoted) throw std::runtime_error(path + ": a quote is not closed");
  if (!field.empty() || !record.fields.empty()) end_record();
  return records;
}

}  // namespace

const std::string& CsvLine::at(std::string_view column) const {
  const auto found = fields.find(column);
  if (found == fields.end()) throw std::out_of_range("no column " + std::string(column));
  return found->second;
}

Csv read_csv(const std::string& path) {
  std::ifstream file(path, std::ios::binary);
  if (!file) throw std::runtime_error(path + ": cannot be read");
  const std::string text{std::istreambuf_iterator<char>(file), std::istreambuf_iterator<char>()};
  const std::vector<Record> records = split(text, path);
  if (records.empty()) throw std::runtime_error(path + ": has no heading");
  Csv csv;
  csv.columns = records.front().fields;
  for (std::size_t i = 1; i < records.size(); ++i) {
    const Record& record = records[i];
    if (record.fields.size() != csv.columns.size()) {
      throw std::runtime_error(path + ":" + std::to_string(record.line) + ": has " +
                               std::to_string(record.fields.size()) + " fields, not " +
                               std::to_string(csv.columns.size()));
    }
    CsvLine line{record.line, {}};
    for (std::size_t k = 0; k < csv.columns.size(); ++k) {
      line.fields[csv.columns[k]] = record.fields[k];
    }
    csv.lines.push_back(std::move(line));
  }
  return csv;
}

}  // namespace busbar::support
