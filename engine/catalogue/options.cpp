#include "catalogue/options.hpp"

#include "core/text.hpp"
#include "stream/text.hpp"

namespace busbar {

Outcome<Options> read_options(std::string_view text, std::string& word) {
  Options options;
  bool units_seen = false;
  std::string_view left = text;
  while (true) {
    const auto separator = left.find_first_of(",;");
    const std::string_view part = trimmed(left.substr(0, separator));
    const auto set = unit_set_named(part);
    if (!set && read_stream(text)) {
      word = quotable(part);
      return Failure{
          Fault::unknown_word, 1,
          "is a stream in the place of the unit set; write \"metric\", \"us\" or \"si\" there, and "
          "give several streams as one range"};
    }
    if (!set) {
      word = quotable(part);
      return Failure{Fault::unknown_word, 1,
                     "is not a unit set; write \"metric\", \"us\" or \"si\""};
    }
    if (units_seen) {
      word = quotable(part);
      return Failure{Fault::unknown_word, 1, "names a second unit set"};
    }
    units_seen = true;
    options.units = *set;
    if (separator == std::string_view::npos) return options;
    left.remove_prefix(separator + 1);
  }
}

}  // namespace busbar
