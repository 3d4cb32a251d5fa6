// The engine as it was loaded, checked once against the engine that the registration was written
// for.
#pragma once

#include <busbar.h>

#include <cstddef>
#include <memory>
#include <string>

namespace busbar::addin {

struct FreeValue {
  void operator()(busbar_value* value) const noexcept { busbar_value_free(value); }
};
using Value = std::unique_ptr<busbar_value, FreeValue>;

// Empty when the loaded engine is the one that the functions were registered for, else a sentence
// that says what differs. Calls by number are safe only when it is empty.
[[nodiscard]] const std::string& engine_mismatch();

// The function of that number; only when engine_mismatch() is empty.
[[nodiscard]] const busbar_function* engine_function(std::size_t number);

}  // namespace busbar::addin
