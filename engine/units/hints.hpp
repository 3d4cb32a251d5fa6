// What somebody most likely meant by a unit that the engine does not know.
#pragma once

#include <string_view>

namespace busbar::units {

/// A reason for a failure that names what to write instead; {0} in it stands for the place in the
/// text from which on it cannot be read. nullptr where nothing comes near. `rest` is the text from
/// that place on. The texts live as long as the process.
const char* hint_for(std::string_view rest);

}  // namespace busbar::units
