#include "calc_error.hpp"

#include <busbar.h>

namespace busbar::addin {

CalcError calc_error_of(std::int32_t kind) {
  switch (kind) {
    case BUSBAR_ERROR_NONE:
      return CalcError::none;
    case BUSBAR_ERROR_MISSING:
      return CalcError::not_available;
    case BUSBAR_ERROR_RANGE:
      return CalcError::argument;
    case BUSBAR_ERROR_CONVERGENCE:
      return CalcError::convergence;
    default:
      return CalcError::value;
  }
}

std::int32_t engine_error_of(CalcError error) {
  switch (error) {
    case CalcError::none:
      return BUSBAR_ERROR_NONE;
    case CalcError::not_available:
      return BUSBAR_ERROR_MISSING;
    case CalcError::argument:
      return BUSBAR_ERROR_RANGE;
    case CalcError::convergence:
      return BUSBAR_ERROR_CONVERGENCE;
    default:
      return BUSBAR_ERROR_VALUE;
  }
}

std::string shown(CalcError error) {
  switch (error) {
    case CalcError::none:
      return {};
    case CalcError::number:
      return "#NUM!";
    case CalcError::value:
      return "#VALUE!";
    case CalcError::reference:
      return "#REF!";
    case CalcError::name:
      return "#NAME?";
    case CalcError::division:
      return "#DIV/0!";
    case CalcError::not_available:
      return "#N/A";
    default:
      return "Err:" + std::to_string(static_cast<std::uint32_t>(error));
  }
}

}  // namespace busbar::addin
