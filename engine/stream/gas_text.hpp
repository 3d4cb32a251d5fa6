// The part of a stream text that only a gas has: its datum and its species.
#pragma once

#include <string>
#include <string_view>

#include "stream/stream.hpp"

namespace busbar {

/// Appends " d=25 N2=0.75 O2=0.25"; no d on the formation datum.
void append_gas(std::string& out, const Stream& stream);

/// Takes what append_gas wrote off the front of the tail; false where it is anything else: an
/// unknown species, one out of order, or fractions that do not sum to 1.
bool take_gas(std::string_view& tail, Stream& stream);

}  // namespace busbar
