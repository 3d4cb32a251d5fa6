// The unit symbols that the engine knows.
#pragma once

#include <functional>
#include <string_view>

#include "units/expression.hpp"

namespace busbar::units {

struct Symbol {
  std::string_view name;
  Expression unit;
  bool takes_prefix;
};

/// The unit of a symbol, an SI prefix included; nullptr-like `found` false when there is none.
struct Lookup {
  bool found = false;
  Expression unit;
};
Lookup find_symbol(std::string_view name);

/// Calls `take(name)` for every symbol, alone and with each prefix that it takes.
void for_each_symbol(const std::function<void(std::string_view)>& take);

}  // namespace busbar::units
