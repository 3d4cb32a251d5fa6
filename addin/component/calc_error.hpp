// Calc's errors as they travel through the add-in interface: a quiet NaN whose low 32 bits hold the
// code. Such a number is made and read here alone; arithmetic does not keep the code.
#pragma once

#include <bit>
#include <cstdint>
#include <string>

namespace busbar::addin {

enum class CalcError : std::uint32_t {
  none = 0,
  illegal_character = 501,  // Err:501
  argument = 502,           // Err:502
  number = 503,             // #NUM!
  parameter_list = 504,     // Err:504
  unpaired = 508,           // Err:508
  operator_missing = 509,   // Err:509
  operand_missing = 510,    // Err:510
  variable_missing = 511,   // Err:511
  circular = 522,           // Err:522
  convergence = 523,        // Err:523
  value = 519,              // #VALUE!
  reference = 524,          // #REF!
  name = 525,               // #NAME?
  division = 532,           // #DIV/0!
  not_available = 0x7fff    // #N/A
};

inline constexpr std::uint64_t kErrorHighWord = 0x7FF80000;

[[nodiscard]] inline double error_number(CalcError error) {
  return std::bit_cast<double>((kErrorHighWord << 32) | static_cast<std::uint32_t>(error));
}

// The error in a number, CalcError::none when it is no error (a plain NaN counts as #VALUE!).
[[nodiscard]] inline CalcError error_in(double number) {
  if (number == number) return CalcError::none;
  const auto code = static_cast<std::uint32_t>(std::bit_cast<std::uint64_t>(number));
  return code == 0 ? CalcError::value : static_cast<CalcError>(code);
}

// The error that Calc shows for a BUSBAR_ERROR_... kind.
[[nodiscard]] CalcError calc_error_of(std::int32_t kind);

// The kind that an error of Calc has for the engine.
[[nodiscard]] std::int32_t engine_error_of(CalcError error);

// "#VALUE!", "Err:502"...
[[nodiscard]] std::string shown(CalcError error);

}  // namespace busbar::addin
