// The engine's catalogue, read once through the C interface and checked for what Calc can register.
#pragma once

#include <array>
#include <cstddef>
#include <cstdint>
#include <string>
#include <string_view>
#include <vector>

namespace busbar::exporter {

inline constexpr std::array<const char*, 3> kUnitSets{"metric", "us", "si"};

struct Argument {
  std::string name;
  std::string identifier;  // `name` as an UNO parameter: "outlet pressure" becomes outletPressure
  std::string meaning;
  std::int32_t kind = 0;  // BUSBAR_ARGUMENT_...
  bool optional = false;
  std::array<std::string, kUnitSets.size()> range;  // in the order of kUnitSets
};

struct Function {
  std::string name;
  std::string chapter;
  std::string summary;
  std::string notes;
  std::string source;
  std::string example;
  std::string example_given;
  std::string example_answer;
  std::string since;
  std::string result;
  std::vector<Argument> arguments;

  // "STEAM(pressure; temperature; [flow]; [options])"
  [[nodiscard]] std::string signature() const;
  // Whether Calc hands over a reference, which the add-in answers itself.
  [[nodiscard]] bool takes_cell() const;
  // Whether any number of further arguments may follow.
  [[nodiscard]] bool takes_rest() const;
};

struct Chapter {
  std::string name;
  std::vector<std::size_t> functions;  // positions in Catalogue::functions
};

struct Catalogue {
  std::string version;
  std::uint32_t abi_version = 0;
  std::uint64_t fingerprint = 0;
  std::vector<Function>
      functions;  // in the order of the engine, which is the order of call numbers
  std::vector<Chapter> chapters;
};

// Throws std::runtime_error that names the row when a row cannot be registered with Calc.
[[nodiscard]] Catalogue read_catalogue();

// "outlet pressure" -> "outletPressure", never a word that IDL or C++ reserves.
[[nodiscard]] std::string parameter_identifier(std::string_view argument_name);

}  // namespace busbar::exporter
