// The text form of a stream: what stands in a cell.
//
//   LBA10: steam 55 kg/s, 100 bar, 540 °C [1 p=1e+07 t=813.15 h=3476561.8 m=55 #k3v9qd]
//   wet steam 0.05 bar, dryness 0.88 [1 p=5000 t=306.02 h=2270400.1 x=0.88 #8h2m0c]
//   gas 500 kg/s, 1.03 bar, 560 °C [1 p=103000 t=833.15 hf=-431005.2 m=500 d=25 N2=0.75 ...
//   #m3x0qa]
//
// Face, for people, in the caller's unit set: tag, fluid, flow, pressure, then temperature or
// dryness, six digits each. Tail, in brackets: format version, then SI numbers that read back
// exactly (pressure, temperature, enthalpy, dryness where wet, mass flow where known), then check
// digits over everything before them, the face included. A gas has hf, its enthalpy with heats of
// formation, then d where readers show another datum (0, 15 or 25 for °C), and last its species by
// mole fraction. One form whatever the locale. The text is
// the whole state.
#pragma once

#include <string>
#include <string_view>

#include "core/outcome.hpp"
#include "stream/stream.hpp"

namespace busbar {

/// Most bytes that a stream text may have; a longer one is refused unread. Water needs 250 with the
/// longest tag, a gas of eight species 450, and one of all the species that fit 1,000.
inline constexpr std::size_t kStreamTextLimit = 1200;

/// Appends the text of a stream with its face in the unit set.
void write_stream(std::string& out, const Stream& stream, UnitSet face);

/// Reads a stream text.
/// Failures: missing (empty text), wrong_kind (no stream text at all), too_large, damaged_text with
/// the number that was edited where that can be told. Argument 1 in all.
Outcome<Stream> read_stream(std::string_view text);

}  // namespace busbar
