// Mixtures that somebody has published, by names that say who.
#pragma once

#include <span>
#include <string_view>

#include "core/composition.hpp"

namespace busbar::gas {

struct PublishedMixture {
  const char* name;
  const char* source;
  Basis basis;
  std::span<const Part> parts;
};

std::span<const PublishedMixture> published_mixtures();

/// The mixture of that name, capitals or not; nullptr when there is none.
const PublishedMixture* published_mixture(std::string_view name);

}  // namespace busbar::gas
