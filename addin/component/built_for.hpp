// What the generated registration was written for; the generated source defines it.
#pragma once

#include <cstddef>
#include <cstdint>

namespace busbar::addin {

struct BuiltFor {
  std::uint32_t abi_version;
  std::uint64_t fingerprint;  // of the engine's catalogue
  const char* version;
  std::size_t functions;
};

extern const BuiltFor kBuiltFor;

}  // namespace busbar::addin
