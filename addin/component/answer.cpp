#include "answer.hpp"

#include <algorithm>
#include <array>
#include <vector>

#include "marshal.hpp"
#include "text.hpp"
#include "why.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::uno::Any;
using com::sun::star::uno::Sequence;

constexpr std::size_t kOnStack = 16;  // no function of the catalogue has more named arguments

Any call(std::size_t number, const busbar_value* const* arguments, std::size_t count) {
  busbar_value* raw = nullptr;
  const std::int32_t status = busbar_call(engine_function(number), arguments, count, &raw);
  const Value result(raw);
  if (status != BUSBAR_OK || !result) return to_calc(CalcError::value);
  return to_calc(*result);
}

Any call_with_few(std::size_t number, const Any* const* given, std::size_t count) {
  std::array<Value, kOnStack> values;
  std::array<const busbar_value*, kOnStack> arguments{};
  for (std::size_t i = 0; i < count; ++i) {
    const Taken taken = to_engine(*given[i], values[i]);
    if (taken != Taken::value && taken != Taken::omitted) return to_calc(CalcError::value);
    arguments[i] = values[i].get();
  }
  return call(number, arguments.data(), count);
}

Any call_with_many(std::size_t number, const Any* const* given, std::size_t count,
                   const Sequence<Any>* rest) {
  const std::size_t more = rest == nullptr ? 0 : static_cast<std::size_t>(rest->getLength());
  std::vector<Value> values(count + more);
  std::vector<const busbar_value*> arguments(count + more);
  for (std::size_t i = 0; i < values.size(); ++i) {
    const Any& any = i < count ? *given[i] : (*rest)[static_cast<sal_Int32>(i - count)];
    const Taken taken = to_engine(any, values[i]);
    if (taken != Taken::value && taken != Taken::omitted) return to_calc(CalcError::value);
    arguments[i] = values[i].get();
  }
  return call(number, arguments.data(), arguments.size());
}

}  // namespace

Any answer(std::size_t number, const Any* const* given, std::size_t count,
           const Sequence<Any>* rest) noexcept {
  try {
    if (!engine_mismatch().empty()) return to_calc(CalcError::value);
    if (rest == nullptr && count <= kOnStack) return call_with_few(number, given, count);
    return call_with_many(number, given, count, rest);
  } catch (...) {
    // Out of memory is all that is left; a method of an add-in must not throw.
    try {
      return to_calc(CalcError::value);
    } catch (...) {
      return {};
    }
  }
}

Any answer_cell(
    const com::sun::star::uno::Reference<com::sun::star::uno::XComponentContext>& context,
    const com::sun::star::uno::Reference<com::sun::star::beans::XPropertySet>& document,
    const com::sun::star::uno::Reference<com::sun::star::table::XCellRange>& cell) noexcept {
  try {
    return Any(to_utf16(explain_cell(context, document, cell)));
  } catch (...) {
    try {
      return to_calc(CalcError::value);
    } catch (...) {
      return {};
    }
  }
}

}  // namespace busbar::addin
