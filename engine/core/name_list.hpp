// A fixed list of published names: exact look-up, and the nearest ones for a name that is not
// there.
#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace busbar {

/// Made once for each table and kept for the life of the process: reasons of failures point into
/// it.
class NameList {
 public:
  /// `where` finishes the sentence "is not a name in <where>", such as "table 1.2 of IPCC 2006";
  /// `all` is the formula that lists every name.
  NameList(std::vector<std::string_view> names, std::string_view where, std::string_view all);

  /// Place of a name, capitals or not, outer spaces ignored.
  [[nodiscard]] std::optional<std::size_t> find(std::string_view name) const;

  /// The places of the names that are most like the word, the nearest first.
  [[nodiscard]] std::vector<std::size_t> nearest(std::string_view word, std::size_t count) const;

  /// A reason that names the nearest name and one or two that are most like that one.
  [[nodiscard]] const char* unknown(std::string_view word) const;

 private:
  std::vector<std::string_view> names_;
  std::vector<std::string> reasons_;
};

}  // namespace busbar
