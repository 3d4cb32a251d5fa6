#include "engine.hpp"

#include <vector>

#include "built_for.hpp"

namespace busbar::addin {
namespace {

struct Loaded {
  std::string mismatch;
  std::vector<const busbar_function*> functions;
};

std::string compare() {
  const bool same_interface = busbar_abi_version() == kBuiltFor.abi_version;
  if (same_interface && busbar_catalogue_fingerprint() == kBuiltFor.fingerprint &&
      busbar_function_count() == kBuiltFor.functions)
    return {};
  std::string text = "The Busbar extension was built for engine version ";
  text += kBuiltFor.version;
  text += ", but version ";
  text += same_interface ? busbar_version() : "with another interface";
  text +=
      " was loaded, so no function is called. Remove the extension, install it anew and start "
      "LibreOffice again.";
  return text;
}

// Never destroyed: an office may still compute while it ends.
const Loaded& loaded() {
  static const Loaded* const instance = [] {
    auto* fresh = new Loaded;
    fresh->mismatch = compare();
    if (fresh->mismatch.empty()) {
      fresh->functions.reserve(kBuiltFor.functions);
      for (std::size_t i = 0; i < kBuiltFor.functions; ++i)
        fresh->functions.push_back(busbar_function_at(i));
    }
    return fresh;
  }();
  return *instance;
}

}  // namespace

const std::string& engine_mismatch() { return loaded().mismatch; }

const busbar_function* engine_function(std::size_t number) { return loaded().functions[number]; }

}  // namespace busbar::addin
