// The libFuzzer target of one entry; BUSBAR_FUZZ_ENTRY names it.
#include <cstdint>

#include "entries.hpp"

// libFuzzer names this function.
extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  busbar::fuzz::BUSBAR_FUZZ_ENTRY({data, size});
  return 0;
}
