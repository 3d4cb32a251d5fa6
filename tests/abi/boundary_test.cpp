// The boundary seen from C++: loading twice, text that is no UTF-8, order of freeing.
#include <dlfcn.h>
#include <gtest/gtest.h>

#include <cstdint>
#include <string>

#include "formula.hpp"
#include "value.hpp"

namespace busbar::support {
namespace {

// The names are for ever, and so is the number that stands for them within one release.
TEST(Boundary, FingerprintIsTheSameInTwoLoads) {
  std::uint64_t seen[2] = {};
  for (std::uint64_t& fingerprint : seen) {
#ifdef BUSBAR_SANITIZED
    // The runtime of the sanitizers cannot be loaded twice.
    void* library = dlopen(BUSBAR_LIBRARY, RTLD_NOW | RTLD_LOCAL);
#else
    void* library = dlmopen(LM_ID_NEWLM, BUSBAR_LIBRARY, RTLD_NOW | RTLD_LOCAL);
#endif
    ASSERT_NE(library, nullptr) << dlerror();
    using Fingerprint = std::uint64_t (*)();
    const auto function =
        reinterpret_cast<Fingerprint>(dlsym(library, "busbar_catalogue_fingerprint"));
    ASSERT_NE(function, nullptr);
    fingerprint = function();
    dlclose(library);
  }
  EXPECT_NE(seen[0], 0U);
  EXPECT_EQ(seen[0], seen[1]);
  EXPECT_EQ(seen[0], busbar_catalogue_fingerprint());
}

TEST(Boundary, TextsThatAreNotUtf8AreRefusedWithAReason) {
  const std::string binary{'\xFF', '\0', '\xC3', '\x28', '\x7F'};
  for (const char* name : {"ENTHALPY_OF", "PUBLISHED_SOURCE"}) {
    const Value result = call(name, {Value::text(binary)});
    EXPECT_EQ(result.error_at(), BUSBAR_ERROR_VALUE) << name;
    EXPECT_FALSE(result.reason().empty()) << name;
  }
}

TEST(Boundary, ResultsOutliveTheirArguments) {
  Value result;
  {
    const Value pressure = Value::number(100);
    const Value temperature = Value::number(540);
    result = call("STEAM", {pressure, temperature});
  }
  EXPECT_EQ(result.text_at().substr(0, 16), "steam 100 bar, 5");
}

TEST(Boundary, ErrorsKeepTheirKindThroughACall) {
  for (const std::int32_t kind : {BUSBAR_ERROR_MISSING, BUSBAR_ERROR_VALUE, BUSBAR_ERROR_RANGE,
                                  BUSBAR_ERROR_CONVERGENCE, BUSBAR_ERROR_INTERNAL}) {
    const Value result = call("CARNOT", {Value::error(kind), Value::number(30)});
    EXPECT_EQ(result.error_at(), kind);
    EXPECT_NE(result.reason().find("hot temperature"), std::string::npos) << result.reason();
  }
}

TEST(Boundary, AReasonPassesThroughNestedCalls) {
  const Value failed = call("STEAM", {Value::number(1200), Value::number(540)});
  const Value outer = call("ENTHALPY_OF", {failed});
  EXPECT_EQ(outer.error_at(), BUSBAR_ERROR_RANGE);
}

}  // namespace
}  // namespace busbar::support
