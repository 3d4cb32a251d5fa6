// Where committed data stands. The paths are compiled into one file alone, so that every other test
// compiles to the same object in every checkout and a compiler cache serves it.
#pragma once

#include <filesystem>

namespace busbar::support {

std::filesystem::path reference_directory();
std::filesystem::path engine_directory();

}  // namespace busbar::support
