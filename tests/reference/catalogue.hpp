// The catalogue as the C interface shows it, for tests.
#pragma once

#include <iosfwd>
#include <string>
#include <vector>

#include "busbar.h"

namespace busbar::reference {

struct Function {
  const busbar_function* handle = nullptr;
  std::string name;
  std::string chapter;

  [[nodiscard]] std::string text(std::int32_t field) const;
  [[nodiscard]] std::size_t argument_count() const { return busbar_argument_count(handle); }
  [[nodiscard]] std::string argument(std::size_t index) const;
  [[nodiscard]] bool is_optional(std::size_t index) const;
  /// "STEAM(pressure; temperature; [flow]; [options])"
  [[nodiscard]] std::string signature() const;
  /// The file with the published figures: "<chapter-slug>/<name in lower case>.csv".
  [[nodiscard]] std::string reference_file() const;
};

/// For GoogleTest's messages.
void PrintTo(const Function& function, std::ostream* out);

std::vector<Function> catalogue();

}  // namespace busbar::reference
