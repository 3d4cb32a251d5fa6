// What a part of a formula comes to when WHY computes it again: a value, an error with its origin,
// or the honest answer that it is not known.
#pragma once

#include <com/sun/star/uno/Any.hxx>
#include <optional>
#include <string>
#include <utility>

#include "calc_error.hpp"
#include "why_document.hpp"

namespace busbar::addin {

// Where an error comes from.
struct Fault {
  enum class Origin {
    engine,  // a Busbar call; `text` is the engine's explanation
    cell,    // `cell` holds an error, alone or inside a range
    calc     // an operator or a function of Calc; `text` says which
  };
  Origin origin = Origin::calc;
  CalcError error = CalcError::value;
  std::string text;
  Address cell;
  bool in_range = false;
};

struct Result {
  com::sun::star::uno::Any value;
  std::optional<Fault> fault;  // set exactly when the value is an error
  std::string unknown;         // not empty: why there is no value

  [[nodiscard]] bool usable() const { return !fault && unknown.empty(); }
};

[[nodiscard]] inline Result of_value(const com::sun::star::uno::Any& value) {
  Result result;
  result.value = value;
  return result;
}

// `why` ends a sentence that begins with "the formula".
[[nodiscard]] inline Result unknown(std::string why) {
  Result result;
  result.unknown = std::move(why);
  return result;
}

[[nodiscard]] inline Result of_fault(Fault fault) {
  Result result;
  result.value <<= error_number(fault.error);
  result.fault = std::move(fault);
  return result;
}

[[nodiscard]] inline Result fault_of(Fault::Origin origin, CalcError error, std::string text) {
  Fault fault;
  fault.origin = origin;
  fault.error = error;
  fault.text = std::move(text);
  return of_fault(std::move(fault));
}

[[nodiscard]] inline Result calc_fault(CalcError error, std::string text) {
  return fault_of(Fault::Origin::calc, error, std::move(text));
}

[[nodiscard]] inline Result engine_fault(CalcError error, std::string text) {
  return fault_of(Fault::Origin::engine, error, std::move(text));
}

// A cell that holds an error, `in_range` where the formula names a range around it.
[[nodiscard]] inline Result cell_fault(CalcError error, const Address& cell, bool in_range) {
  Fault fault;
  fault.origin = Fault::Origin::cell;
  fault.error = error;
  fault.cell = cell;
  fault.in_range = in_range;
  return of_fault(std::move(fault));
}

}  // namespace busbar::addin
