// Values of the C interface.
#include <algorithm>
#include <cstring>
#include <string>

#include "abi/boundary.hpp"
#include "catalogue/sentence.hpp"
#include "core/text.hpp"

namespace busbar::abi {

size_t copy_out(std::string_view text, char* buffer, size_t capacity) {
  if (buffer != nullptr && capacity > 0) {
    const size_t length = prefix_at_boundary(text, capacity - 1);
    std::memcpy(buffer, text.data(), length);
    buffer[length] = '\0';
  }
  return text.size();
}

namespace {

Cell* cell_at(busbar_value* value, size_t row, size_t column) {
  if (value == nullptr || row >= value->grid.rows() || column >= value->grid.columns()) {
    return nullptr;
  }
  return &value->grid.at(row, column);
}

const Cell* cell_at(const busbar_value* value, size_t row, size_t column) {
  return cell_at(const_cast<busbar_value*>(value), row, column);
}

template <class T>
const T* held(const busbar_value* value, size_t row, size_t column) {
  const Cell* cell = cell_at(value, row, column);
  return cell == nullptr ? nullptr : std::get_if<T>(cell);
}

template <class T>
int32_t put(busbar_value* value, size_t row, size_t column, T content) {
  Cell* cell = cell_at(value, row, column);
  if (cell == nullptr) return BUSBAR_BAD_HANDLE;
  cell->emplace<T>(std::move(content));
  return BUSBAR_OK;
}

int32_t kind_of(Fault fault) {
  switch (fault) {
    case Fault::none:
      return BUSBAR_ERROR_NONE;
    case Fault::missing:
      return BUSBAR_ERROR_MISSING;
    case Fault::wrong_kind:
    case Fault::unknown_word:
    case Fault::wrong_shape:
    case Fault::damaged_text:
    case Fault::too_large:
      return BUSBAR_ERROR_VALUE;
    case Fault::zero_or_blank:
    case Fault::outside_range:
    case Fault::impossible:
      return BUSBAR_ERROR_RANGE;
    case Fault::no_convergence:
      return BUSBAR_ERROR_CONVERGENCE;
    case Fault::internal:
      break;
  }
  return BUSBAR_ERROR_INTERNAL;
}

// The failure that an error cell of the host stands for.
Failure failure_of(int32_t kind) {
  switch (kind) {
    case BUSBAR_ERROR_MISSING:
      return {Fault::missing, 0, "a value is missing"};
    case BUSBAR_ERROR_RANGE:
      return {Fault::outside_range, 0, "a value is out of range"};
    case BUSBAR_ERROR_CONVERGENCE:
      return {Fault::no_convergence, 0, "an iteration did not converge"};
    case BUSBAR_ERROR_INTERNAL:
      return {Fault::internal, 0, "an internal error"};
    default:
      return {Fault::wrong_kind, 0, "an error value"};
  }
}

template <class T>
busbar_value* create(T content) {
  auto* value = new busbar_value;
  value->grid.at(0, 0).emplace<T>(std::move(content));
  return value;
}

busbar_value* none() { return nullptr; }

}  // namespace
}  // namespace busbar::abi

using namespace busbar;       // NOLINT(google-build-using-namespace)
using namespace busbar::abi;  // NOLINT(google-build-using-namespace)

extern "C" {

size_t busbar_cell_limit(void) { return kCellLimit; }
size_t busbar_text_limit(void) { return kTextLimit; }

busbar_value* busbar_value_create(size_t rows, size_t columns) {
  return guarded(none(), none(), [&]() -> busbar_value* {
    if (rows == 0 || columns == 0 || rows > kCellLimit / columns) return nullptr;
    return new busbar_value{Grid(rows, columns)};
  });
}

void busbar_value_free(busbar_value* value) { delete value; }

int32_t busbar_set_number(busbar_value* value, size_t row, size_t column, double number) {
  return put(value, row, column, number);
}

int32_t busbar_set_text(busbar_value* value, size_t row, size_t column, const char* text,
                        size_t length) {
  return guarded<int32_t>(BUSBAR_OUT_OF_MEMORY, BUSBAR_OUT_OF_MEMORY, [&]() -> int32_t {
    if (text == nullptr && length > 0) return BUSBAR_BAD_HANDLE;
    if (length > kTextLimit) return BUSBAR_TOO_LARGE;
    return put(value, row, column, text == nullptr ? std::string() : std::string(text, length));
  });
}

int32_t busbar_set_logical(busbar_value* value, size_t row, size_t column, int32_t logical) {
  return put(value, row, column, logical != 0);
}

int32_t busbar_set_blank(busbar_value* value, size_t row, size_t column) {
  return put(value, row, column, Blank{});
}

int32_t busbar_set_error(busbar_value* value, size_t row, size_t column, int32_t kind) {
  return guarded<int32_t>(BUSBAR_OUT_OF_MEMORY, BUSBAR_OUT_OF_MEMORY, [&]() -> int32_t {
    if (kind < BUSBAR_ERROR_MISSING || kind > BUSBAR_ERROR_INTERNAL) return BUSBAR_BAD_HANDLE;
    return put(value, row, column, Error({failure_of(kind), nullptr, UnitSet::metric, {}}));
  });
}

busbar_value* busbar_number(double number) {
  return guarded(none(), none(), [&] { return create(number); });
}

busbar_value* busbar_text(const char* text, size_t length) {
  return guarded(none(), none(), [&]() -> busbar_value* {
    if ((text == nullptr && length > 0) || length > kTextLimit) return nullptr;
    return create(text == nullptr ? std::string() : std::string(text, length));
  });
}

size_t busbar_rows(const busbar_value* value) { return value == nullptr ? 0 : value->grid.rows(); }

size_t busbar_columns(const busbar_value* value) {
  return value == nullptr ? 0 : value->grid.columns();
}

int32_t busbar_kind(const busbar_value* value, size_t row, size_t column) {
  const Cell* cell = cell_at(value, row, column);
  if (cell == nullptr || std::holds_alternative<Blank>(*cell)) return BUSBAR_BLANK;
  if (std::holds_alternative<double>(*cell)) return BUSBAR_NUMBER;
  if (std::holds_alternative<std::string>(*cell)) return BUSBAR_TEXT;
  if (std::holds_alternative<bool>(*cell)) return BUSBAR_LOGICAL;
  return BUSBAR_ERROR;
}

double busbar_get_number(const busbar_value* value, size_t row, size_t column) {
  const double* number = held<double>(value, row, column);
  return number == nullptr ? 0 : *number;
}

const char* busbar_get_text(const busbar_value* value, size_t row, size_t column, size_t* length) {
  const std::string* text = held<std::string>(value, row, column);
  if (length != nullptr) *length = text == nullptr ? 0 : text->size();
  return text == nullptr ? nullptr : text->c_str();
}

int32_t busbar_get_logical(const busbar_value* value, size_t row, size_t column) {
  const bool* logical = held<bool>(value, row, column);
  return logical != nullptr && *logical ? 1 : 0;
}

int32_t busbar_get_error(const busbar_value* value, size_t row, size_t column) {
  const Error* error = held<Error>(value, row, column);
  return error == nullptr ? BUSBAR_ERROR_NONE : kind_of(error->problem().failure.fault);
}

size_t busbar_get_reason(const busbar_value* value, size_t row, size_t column, char* buffer,
                         size_t capacity) {
  return guarded<size_t>(0, 0, [&]() -> size_t {
    const FloatingPointEnvironment environment;
    const Error* error = held<Error>(value, row, column);
    return copy_out(error == nullptr ? std::string() : sentence(error->problem()), buffer,
                    capacity);
  });
}

}  // extern "C"
