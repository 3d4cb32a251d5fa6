#include "catalogue/value.hpp"

namespace busbar {

Grid::Grid(Grid&& other) noexcept = default;
Grid& Grid::operator=(Grid&& other) noexcept = default;
Grid::~Grid() = default;

}  // namespace busbar
