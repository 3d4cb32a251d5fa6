// The catalogue through the C interface.
#include <string>
#include <vector>

#include "abi/boundary.hpp"
#include "catalogue/sentence.hpp"
#include "functions/functions.hpp"

namespace busbar::abi {
namespace {

// Source texts are put together once and kept: handles promise texts that live with the library.
const std::vector<std::string>& sources() {
  static const auto& texts = *new std::vector<std::string>([] {
    std::vector<std::string> all;
    for (const Row* row : functions::all()) all.push_back(source_text(*row));
    return all;
  }());
  return texts;
}

const char* argument_words(const Argument& argument, int32_t field) {
  if (field == BUSBAR_ARGUMENT_NAME) return argument.name;
  if (field == BUSBAR_ARGUMENT_MEANING) return argument.meaning;
  return nullptr;
}

}  // namespace
}  // namespace busbar::abi

using namespace busbar;       // NOLINT(google-build-using-namespace)
using namespace busbar::abi;  // NOLINT(google-build-using-namespace)

extern "C" {

uint32_t busbar_abi_version(void) { return BUSBAR_ABI_VERSION; }

const char* busbar_version(void) { return BUSBAR_VERSION; }

uint64_t busbar_catalogue_fingerprint(void) {
  return guarded<uint64_t>(0, 0, [] { return functions::fingerprint(); });
}

size_t busbar_function_count(void) {
  return guarded<size_t>(0, 0, [] { return functions::all().size(); });
}

const busbar_function* busbar_function_at(size_t index) {
  return guarded<const busbar_function*>(nullptr, nullptr, [&]() -> const busbar_function* {
    const auto rows = functions::all();
    return index < rows.size() ? handle(rows[index]) : nullptr;
  });
}

size_t busbar_function_index(const busbar_function* function) {
  return guarded<size_t>(0, 0, [&]() -> size_t {
    const auto rows = functions::all();
    size_t index = 0;
    while (index < rows.size() && rows[index] != row_of(function)) ++index;
    return index;
  });
}

const char* busbar_function_text(const busbar_function* function, int32_t field) {
  return guarded<const char*>(nullptr, nullptr, [&]() -> const char* {
    if (function == nullptr) return nullptr;
    const Words& words = row_of(function)->words;
    switch (field) {
      case BUSBAR_FUNCTION_NAME:
        return words.name;
      case BUSBAR_FUNCTION_CHAPTER:
        return words.chapter;
      case BUSBAR_FUNCTION_SUMMARY:
        return words.summary;
      case BUSBAR_FUNCTION_NOTES:
        return words.notes;
      case BUSBAR_FUNCTION_SOURCE: {
        const size_t index = busbar_function_index(function);
        return index < sources().size() ? sources()[index].c_str() : nullptr;
      }
      case BUSBAR_FUNCTION_EXAMPLE:
        return words.example.formula;
      case BUSBAR_FUNCTION_EXAMPLE_GIVEN:
        return words.example.given;
      case BUSBAR_FUNCTION_EXAMPLE_ANSWER:
        return words.example.answer;
      case BUSBAR_FUNCTION_SINCE:
        return words.since;
      case BUSBAR_FUNCTION_RESULT:
        return words.result;
      default:
        return nullptr;
    }
  });
}

size_t busbar_argument_count(const busbar_function* function) {
  return function == nullptr ? 0 : row_of(function)->argument_count();
}

const char* busbar_argument_text(const busbar_function* function, size_t argument, int32_t field) {
  if (argument >= busbar_argument_count(function)) return nullptr;
  const Row& row = *row_of(function);
  return argument_words(
      argument < row.arguments.size() ? row.arguments[argument] : options_argument(), field);
}

int32_t busbar_argument_kind(const busbar_function* function, size_t argument) {
  if (argument >= busbar_argument_count(function)) return -1;
  const Row& row = *row_of(function);
  if (argument == row.arguments.size()) return BUSBAR_ARGUMENT_OPTIONS;
  return static_cast<int32_t>(row.types[argument].kind);
}

int32_t busbar_argument_optional(const busbar_function* function, size_t argument) {
  if (argument >= busbar_argument_count(function)) return 0;
  const Row& row = *row_of(function);
  return argument == row.arguments.size() || row.types[argument].optional ? 1 : 0;
}

size_t busbar_argument_range(const busbar_function* function, size_t argument, const char* unit_set,
                             char* buffer, size_t capacity) {
  return guarded<size_t>(0, 0, [&]() -> size_t {
    std::string text;
    if (argument < busbar_argument_count(function) && unit_set != nullptr) {
      const auto units = unit_set_named(unit_set);
      if (units) text = describe_range(*row_of(function), argument, *units);
    }
    return copy_out(text, buffer, capacity);
  });
}

}  // extern "C"
