#include "units/hints.hpp"

#include <algorithm>
#include <array>
#include <map>
#include <string>
#include <utility>

#include "units/symbols.hpp"

namespace busbar::units {
namespace {

struct Hint {
  std::string_view written;  // the letters with which the text goes on
  const char* reason;
};

constexpr const char* kCelsius = "is not a unit that Busbar knows; write \"°C\"";
constexpr const char* kFahrenheit = "is not a unit that Busbar knows; write \"°F\"";
constexpr const char* kPsi = "does not say from where it is measured; write \"psia\" or \"psig\"";
constexpr const char* kNormal =
    "is a volume at a reference state, which its name alone does not fix; write \"m3\" and state "
    "the pressure and temperature beside it";
constexpr const char* kTon =
    "means different masses to different readers; write \"t\" for 1000 kg, else \"lb\" or \"kg\"";

// What capitals do not explain. Longer beginnings first where one begins with another.
constexpr std::array kHints{
    Hint{"deg C", kCelsius},
    Hint{"deg F", kFahrenheit},
    Hint{"° C", kCelsius},
    Hint{"° F", kFahrenheit},
    Hint{"ºC", kCelsius},  // the ordinal sign of some keyboards
    Hint{"ºF", kFahrenheit},
    Hint{"℃", kCelsius},
    Hint{"℉", kFahrenheit},
    Hint{"C", kCelsius},
    Hint{"c", kCelsius},
    Hint{"F", kFahrenheit},
    Hint{"f", kFahrenheit},
    Hint{"psi", kPsi},
    Hint{"PSI", kPsi},
    Hint{"Psi", kPsi},
    Hint{"ata",
         "is not a unit that Busbar knows; write \"at\" for kgf/cm2, which is absolute here"},
    Hint{"Nm3", kNormal},
    Hint{"Nm³", kNormal},
    Hint{"Sm3", kNormal},
    Hint{"Sm³", kNormal},
    Hint{"Nm", "is not a unit that Busbar knows; write \"N m\" from character {0} on"},
    Hint{"kgK", "is not a unit that Busbar knows; write \"(kg K)\" from character {0} on"},
    Hint{"sec", "is not a unit that Busbar knows; write \"s\" from character {0} on"},
    Hint{"lbs", "is not a unit that Busbar knows; write \"lb\" from character {0} on"},
    Hint{"tph", "is not a unit that Busbar knows; write \"t/h\""},
    Hint{"gpm", "is not a unit that Busbar knows; write \"gal/min\""},
    Hint{"cfm", "is not a unit that Busbar knows; write \"ft3/min\""},
    Hint{"tons", kTon},
    Hint{"ton", kTon},
    Hint{"tonnes", kTon},
    Hint{"tonne", kTon},
};

std::string lower_case(std::string_view text) {
  std::string out(text);
  for (char& c : out) {
    if (c >= 'A' && c <= 'Z') c = static_cast<char>(c - 'A' + 'a');
  }
  return out;
}

// Every symbol by its small letters, with the reason that names it. Kept for the life of the
// process: a failure points into it.
const std::map<std::string, std::string>& spellings() {
  static const auto* const table = [] {
    std::map<std::string, std::string> names;
    for_each_symbol([&](std::string_view name) {
      std::string& all = names[lower_case(name)];
      if (!all.empty()) all += " or ";
      all += '"';
      all += name;
      all += '"';
    });
    for (auto& [key, all] : names) {
      all.insert(0,
                 "is not a unit that Busbar knows; capitals and small letters count: from "
                 "character {0} on write ");
    }
    return new std::map<std::string, std::string>(std::move(names));
  }();
  return *table;
}

// The letters with which the text goes on, up to an operator, an exponent or a blank.
std::string_view letters(std::string_view text) {
  return text.substr(0, text.find_first_of(" */.()^-+0123456789"));
}

}  // namespace

const char* hint_for(std::string_view rest) {
  for (const Hint& hint : kHints) {
    const std::string_view after = rest.substr(std::min(hint.written.size(), rest.size()));
    if (rest.substr(0, hint.written.size()) == hint.written && letters(after).empty()) {
      return hint.reason;
    }
  }
  // "H2O" ends in a letter behind its digit; no other symbol has a digit inside.
  for (const std::string_view name :
       {rest.substr(0, rest.find_first_of(" */()^")), letters(rest)}) {
    const auto found = spellings().find(lower_case(name));
    if (found != spellings().end()) return found->second.c_str();
  }
  return nullptr;
}

}  // namespace busbar::units
