#include "paths.hpp"

namespace busbar::support {

std::filesystem::path reference_directory() { return BUSBAR_REFERENCE_DIR; }
std::filesystem::path engine_directory() { return BUSBAR_ENGINE_DIR; }

}  // namespace busbar::support
