#include "stream/text.hpp"

#include <array>
#include <cmath>
#include <cstdint>

#include "core/text.hpp"
#include "stream/check_digits.hpp"
#include "stream/gas_text.hpp"

namespace busbar {
namespace {

constexpr int kFaceDigits = 6;
constexpr std::string_view kVersion = "1";
constexpr std::string_view kDryness = "dryness ";

constexpr std::array<std::string_view, static_cast<std::size_t>(Phase::count_)> kFluids{
    "water", "steam", "wet steam", "supercritical water", "gas"};

void append_quantity(std::string& out, double si, Quantity quantity, UnitSet set) {
  const Unit& unit = unit_of(set, quantity);
  append_number(out, unit.from_si(si), kFaceDigits);
  out += ' ';
  out += unit.symbol;
}

void append_face(std::string& out, const Stream& stream, UnitSet set) {
  if (!stream.tag.empty()) {
    out += stream.tag.text();
    out += ": ";
  }
  out += kFluids[static_cast<std::size_t>(stream.phase)];
  out += ' ';
  if (stream.flow) {
    append_quantity(out, *stream.flow, Quantity::flow, set);
    out += ", ";
  }
  append_quantity(out, stream.pressure, Quantity::pressure, set);
  out += ", ";
  if (stream.phase == Phase::two_phase) {
    out += kDryness;
    append_number(out, stream.dryness, kFaceDigits);
  } else {
    append_quantity(out, stream.temperature, Quantity::temperature, set);
  }
}

void append_field(std::string& out, std::string_view name, double value) {
  out += name;
  append_exact(out, value);
}

// Everything but the check digits.
void append_body(std::string& out, const Stream& stream, UnitSet set) {
  append_face(out, stream, set);
  out += " [";
  out += kVersion;
  append_field(out, " p=", stream.pressure);
  append_field(out, " t=", stream.temperature);
  const bool gas = stream.phase == Phase::gas;
  append_field(out, gas ? " hf=" : " h=", stream.enthalpy);
  if (stream.phase == Phase::two_phase) append_field(out, " x=", stream.dryness);
  if (stream.flow) append_field(out, " m=", *stream.flow);
  if (gas) append_gas(out, stream);
  out += ' ';
}

Failure damaged(const char* reason) { return {Fault::damaged_text, 1, reason}; }

// Without what a cell gains at its ends when somebody pastes or types: spaces, tabs, line ends and
// the no-break space (two bytes).
std::string_view without_blanks(std::string_view text) {
  static constexpr std::string_view kNoBreak = "\u00a0";
  const auto blank = [](char c) { return c == ' ' || c == '\t' || c == '\r' || c == '\n'; };
  while (!text.empty()) {
    if (blank(text.front())) {
      text.remove_prefix(1);
    } else if (text.substr(0, kNoBreak.size()) == kNoBreak) {
      text.remove_prefix(kNoBreak.size());
    } else if (blank(text.back())) {
      text.remove_suffix(1);
    } else if (text.size() >= kNoBreak.size() &&
               text.substr(text.size() - kNoBreak.size()) == kNoBreak) {
      text.remove_suffix(kNoBreak.size());
    } else {
      break;
    }
  }
  return text;
}

// Takes " name=" and a number off the front of the tail.
bool take_field(std::string_view& tail, std::string_view name, double& value) {
  if (tail.substr(0, name.size()) != name) return false;
  const auto end = tail.find(' ', name.size());
  if (end == std::string_view::npos) return false;
  if (!read_number(tail.substr(name.size(), end - name.size()), value)) return false;
  tail.remove_prefix(end);
  return true;
}

// "[1 p=... t=... h=... x=... m=... #digits]" without the brackets.
Failure read_tail(std::string_view tail, Stream& stream, std::string_view& digits) {
  static constexpr const char* kCut =
      "is cut or damaged: the exact part in brackets is not complete";
  const auto space = tail.find(' ');
  if (space == std::string_view::npos) return damaged(kCut);
  if (tail.substr(0, space) != kVersion) {
    return damaged("is in a stream format that this version of Busbar does not know");
  }
  tail.remove_prefix(space);
  if (!take_field(tail, " p=", stream.pressure) || !take_field(tail, " t=", stream.temperature)) {
    return damaged(kCut);
  }
  if (!take_field(tail, " h=", stream.enthalpy)) {
    if (!take_field(tail, " hf=", stream.enthalpy)) return damaged(kCut);
    stream.phase = Phase::gas;
  }
  if (take_field(tail, " x=", stream.dryness)) stream.phase = Phase::two_phase;
  double flow = 0;
  if (take_field(tail, " m=", flow)) stream.flow = flow;
  if (stream.phase == Phase::gas && !take_gas(tail, stream)) return damaged(kCut);
  if (tail.substr(0, 2) != " #" || tail.size() != 2 + kCheckDigits) return damaged(kCut);
  digits = tail.substr(2);
  return {};
}

// The fluid that the face names: the longest name that fits.
bool read_fluid(std::string_view& face, Phase& phase) {
  std::size_t taken = 0;
  for (std::size_t i = 0; i < kFluids.size(); ++i) {
    if (face.size() > kFluids[i].size() && face.substr(0, kFluids[i].size()) == kFluids[i] &&
        face[kFluids[i].size()] == ' ' && kFluids[i].size() > taken) {
      taken = kFluids[i].size();
      phase = static_cast<Phase>(i);
    }
  }
  if (taken == 0) return false;
  face.remove_prefix(taken + 1);
  return true;
}

struct FaceNumber {
  double value;
  Quantity quantity;
};

struct Face {
  Phase phase = Phase::liquid;
  UnitSet set = UnitSet::metric;
  std::array<FaceNumber, 3> numbers{};  // in the units of the face
  std::size_t count = 0;
};

// The unit set is the one whose pressure unit stands in the face: all three differ.
UnitSet unit_set_of(std::string_view face) {
  for (int i = 0; i < static_cast<int>(UnitSet::count_); ++i) {
    const auto set = static_cast<UnitSet>(i);
    const std::string_view symbol = unit_of(set, Quantity::pressure).symbol;
    const auto at = face.find(symbol);
    if (at != std::string_view::npos && face.substr(at + symbol.size(), 1) == ",") return set;
  }
  return UnitSet::metric;
}

// Every number of a face whose fluid was read already.
bool read_face(std::string_view text, Face& face) {
  bool pressure_seen = false;
  while (!text.empty()) {
    if (face.count == face.numbers.size()) return false;
    const auto comma = text.find(", ");
    std::string_view part = text.substr(0, comma);
    text.remove_prefix(comma == std::string_view::npos ? text.size() : comma + 2);
    FaceNumber& number = face.numbers[face.count++];
    if (part.substr(0, kDryness.size()) == kDryness) {
      number.quantity = Quantity::fraction;
      if (!read_number(part.substr(kDryness.size()), number.value)) return false;
      continue;
    }
    const auto space = part.find(' ');
    if (space == std::string_view::npos) return false;
    if (!read_number(part.substr(0, space), number.value)) return false;
    const std::string_view symbol = part.substr(space + 1);
    bool known = false;
    for (const Quantity quantity : {Quantity::flow, Quantity::pressure, Quantity::temperature}) {
      for (int i = 0; i < static_cast<int>(UnitSet::count_); ++i) {
        const auto set = static_cast<UnitSet>(i);
        if (known || unit_of(set, quantity).symbol != symbol) continue;
        known = true;
        number.quantity = quantity;
        if (quantity == Quantity::pressure) {
          face.set = set;
          pressure_seen = true;
        }
      }
    }
    if (!known) return false;
  }
  return pressure_seen;
}

double exact_value(const Stream& stream, Quantity quantity) {
  switch (quantity) {
    case Quantity::pressure:
      return stream.pressure;
    case Quantity::temperature:
      return stream.temperature;
    case Quantity::flow:
      return stream.flow.value_or(0);
    default:
      return stream.dryness;
  }
}

const char* edited_reason(Quantity quantity) {
  switch (quantity) {
    case Quantity::pressure:
      return "was edited: its pressure reads {0}, its exact part says {1}; enter a new stream";
    case Quantity::temperature:
      return "was edited: its temperature reads {0}, its exact part says {1}; enter a new stream";
    case Quantity::flow:
      return "was edited: its flow reads {0}, its exact part says {1}; enter a new stream";
    default:
      return "was edited: its dryness reads {0}, its exact part says {1}; enter a new stream";
  }
}

// The check digits do not fit. Where the face written anew from the tail does fit them, the face
// was edited, and the number that differs is named.
Failure explain_mismatch(const Stream& stream, const Face& face, std::string_view digits) {
  std::string anew;
  append_body(anew, stream, face.set);
  if (check_digits(anew) != digits) {
    return damaged("was edited or damaged: its check digits do not fit");
  }
  for (std::size_t i = 0; i < face.count; ++i) {
    const Quantity quantity = face.numbers[i].quantity;
    const double exact = exact_value(stream, quantity);
    std::string shown;
    append_number(shown, unit_of(face.set, quantity).from_si(exact), kFaceDigits);
    double rounded = 0;
    if (!read_number(shown, rounded) || rounded == face.numbers[i].value) continue;
    const double edited = unit_of(face.set, quantity).to_si(face.numbers[i].value);
    return {
        Fault::damaged_text, 1, edited_reason(quantity), {{{edited, quantity}, {exact, quantity}}}};
  }
  return damaged("was edited: its readable part differs from its exact part");
}

bool has_physical_numbers(const Stream& stream) {
  const bool wet = stream.phase == Phase::two_phase;
  return stream.pressure > 0 && stream.temperature > 0 && (!stream.flow || *stream.flow >= 0) &&
         (!wet || (stream.dryness >= 0 && stream.dryness <= 1));
}

}  // namespace

void write_stream(std::string& out, const Stream& stream, UnitSet face) {
  const std::size_t start = out.size();
  append_body(out, stream, face);
  const CheckDigits digits = check_digits(std::string_view(out).substr(start));
  out += '#';
  out += digits.text();
  out += ']';
}

Outcome<Stream> read_stream(std::string_view text) {
  if (text.empty()) return Failure{Fault::missing, 1, "is empty where a stream is needed"};
  if (text.size() > kStreamTextLimit) {
    return Failure{Fault::too_large,
                   1,
                   "is a text of {0} bytes; no stream text is longer than {1}",
                   {{{static_cast<double>(text.size()), Quantity::number},
                     {static_cast<double>(kStreamTextLimit), Quantity::number}}}};
  }
  const auto bracket = text.find(" [");
  if (bracket == std::string_view::npos) {
    return Failure{Fault::wrong_kind, 1, "is a text, but not the text of a stream"};
  }
  if (const std::string_view inner = without_blanks(text);
      inner.size() != text.size() && read_stream(inner)) {
    return damaged(
        "is the text of a stream with a space or a line end before or after it; take that away");
  }
  if (text.back() != ']') {
    return damaged("is cut or damaged: the closing bracket of its exact part is missing");
  }
  Stream stream;
  std::string_view digits;
  const std::string_view tail = text.substr(bracket + 2, text.size() - bracket - 3);
  if (const Failure failure = read_tail(tail, stream, digits); failure.fault != Fault::none) {
    return failure;
  }
  std::string_view face_text = text.substr(0, bracket);
  if (const auto colon = face_text.find(": "); colon != std::string_view::npos) {
    const Outcome<Tag> tag = Tag::from(face_text.substr(0, colon));
    if (!tag) return damaged("is damaged: what stands before the colon is not a tag");
    stream.tag = *tag;
    face_text.remove_prefix(colon + 2);
  }
  Face face;
  if (!read_fluid(face_text, face.phase)) {
    return damaged("was edited or damaged: its readable part names no fluid");
  }
  if ((face.phase == Phase::two_phase) != (stream.phase == Phase::two_phase)) {
    return damaged("was edited or damaged: only one of its two parts is wet");
  }
  if ((face.phase == Phase::gas) != (stream.phase == Phase::gas)) {
    return damaged("was edited or damaged: only one of its two parts is a gas");
  }
  stream.phase = face.phase;
  // The digits cover the face: where they fit, its numbers need not be read.
  if (check_digits(text.substr(0, text.size() - kCheckDigits - 2)) != digits) {
    if (!read_face(face_text, face)) {
      return damaged("was edited or damaged: its readable part cannot be read");
    }
    return explain_mismatch(stream, face, digits);
  }
  stream.face = unit_set_of(face_text);
  if (!has_physical_numbers(stream)) {
    return damaged("was made by hand: its numbers are not those of a fluid");
  }
  return stream;
}

}  // namespace busbar
