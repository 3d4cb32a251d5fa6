#include "catalogue/options.hpp"

#include "core/text.hpp"
#include "stream/text.hpp"

namespace busbar {
namespace {

Failure unknown(const char* reason) { return {Fault::unknown_word, 1, reason}; }

// "datum=25 °C"
Failure read_named(std::string_view part, std::size_t equals, Options& options) {
  if (!equal_ignoring_case(trimmed(part.substr(0, equals)), "datum")) {
    return unknown("is no option; known are a unit set and datum=...");
  }
  if (options.datum) return unknown("names a second datum");
  options.datum = gas::datum_named(part.substr(equals + 1));
  if (!options.datum) {
    return unknown("names no datum; write datum=formation, datum=0 °C, datum=15 °C or datum=25 °C");
  }
  return {};
}

Failure read_unit_set(std::string_view whole, std::string_view part, bool& seen, Options& options) {
  const auto set = unit_set_named(part);
  if (!set && read_stream(whole)) {
    return unknown(
        "is a stream in the place of the unit set; write \"metric\", \"us\" or \"si\" there, and "
        "give several streams as one range");
  }
  if (!set) return unknown("is not a unit set; write \"metric\", \"us\" or \"si\"");
  if (seen) return unknown("names a second unit set");
  seen = true;
  options.units = *set;
  return {};
}

}  // namespace

Outcome<Options> read_options(std::string_view text, std::string& word) {
  Options options;
  bool units_seen = false;
  std::string_view left = text;
  while (true) {
    const auto separator = left.find_first_of(",;");
    const std::string_view part = trimmed(left.substr(0, separator));
    const auto equals = part.find('=');
    // A stream holds "=" too.
    const bool named = equals != std::string_view::npos && part.find('[') == std::string_view::npos;
    const Failure failure =
        named ? read_named(part, equals, options) : read_unit_set(text, part, units_seen, options);
    if (failure.fault != Fault::none) {
      word = quotable(part);
      return failure;
    }
    if (separator == std::string_view::npos) return options;
    left.remove_prefix(separator + 1);
  }
}

}  // namespace busbar
