// Calls through the C interface.
#include <algorithm>
#include <array>
#include <vector>

#include "abi/boundary.hpp"
#include "catalogue/call.hpp"
#include "core/text.hpp"
#include "functions/functions.hpp"

namespace busbar::abi {
namespace {

// Calc passes at most 255 arguments.
constexpr size_t kMostGiven = 255;

// The grids of the arguments, without an allocation for the usual few.
class Given {
 public:
  Given(const busbar_value* const* arguments, size_t count) : count_(count) {
    const Grid** at = few_.data();
    if (count > few_.size()) {
      many_.resize(count);
      at = many_.data();
    }
    for (size_t i = 0; i < count; ++i) {
      at[i] = arguments[i] == nullptr ? nullptr : &arguments[i]->grid;
    }
  }
  [[nodiscard]] Arguments arguments() const {
    return {count_ > few_.size() ? many_.data() : few_.data(), count_};
  }

 private:
  size_t count_;
  std::array<const Grid*, kMostArguments> few_{};
  std::vector<const Grid*> many_;
};

template <class Compute>
int32_t answer(const busbar_value* const* arguments, size_t count, busbar_value** result,
               Compute&& compute) {
  if (result == nullptr) return BUSBAR_BAD_HANDLE;
  *result = nullptr;
  if (arguments == nullptr && count > 0) return BUSBAR_BAD_HANDLE;
  if (count > kMostGiven) return BUSBAR_TOO_LARGE;
  return guarded<int32_t>(BUSBAR_OUT_OF_MEMORY, BUSBAR_BAD_HANDLE, [&]() -> int32_t {
    const FloatingPointEnvironment environment;
    const Given given(arguments, count);
    *result = new busbar_value{compute(given.arguments())};
    return BUSBAR_OK;
  });
}

}  // namespace
}  // namespace busbar::abi

using namespace busbar;       // NOLINT(google-build-using-namespace)
using namespace busbar::abi;  // NOLINT(google-build-using-namespace)

extern "C" {

const busbar_function* busbar_find(const char* name, size_t length) {
  return guarded<const busbar_function*>(nullptr, nullptr, [&]() -> const busbar_function* {
    if (name == nullptr) return nullptr;
    return handle(functions::find({name, length}));
  });
}

int32_t busbar_call(const busbar_function* function, const busbar_value* const* arguments,
                    size_t count, busbar_value** result) {
  if (function == nullptr) {
    if (result != nullptr) *result = nullptr;
    return BUSBAR_BAD_HANDLE;
  }
  return answer(arguments, count, result,
                [&](Arguments given) { return call(*row_of(function), given); });
}

int32_t busbar_call_by_name(const char* name, size_t length, const busbar_value* const* arguments,
                            size_t count, busbar_value** result) {
  const busbar_function* function = busbar_find(name, length);
  if (function != nullptr) return busbar_call(function, arguments, count, result);
  return answer(arguments, count, result, [&](Arguments) {
    std::string word =
        name == nullptr ? std::string() : quotable({name, std::min<size_t>(length, kTextLimit)});
    return Grid(Error({{Fault::unknown_word, 0, "is not a function of Busbar"},
                       nullptr,
                       UnitSet::metric,
                       std::move(word)}));
  });
}

int32_t busbar_explain(const busbar_function* function, const busbar_value* const* arguments,
                       size_t count, busbar_value** result) {
  if (function == nullptr) {
    if (result != nullptr) *result = nullptr;
    return BUSBAR_BAD_HANDLE;
  }
  return answer(arguments, count, result,
                [&](Arguments given) { return Grid(explain(*row_of(function), given)); });
}

}  // extern "C"
