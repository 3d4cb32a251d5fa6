#include "catalogue.hpp"

#include <cctype>
#include <ostream>

namespace busbar::reference {
namespace {

std::string lower(const std::string& text) {
  std::string out;
  for (const char c : text) out += static_cast<char>(std::tolower(static_cast<unsigned char>(c)));
  return out;
}

std::string slug(const std::string& chapter) {
  std::string out = lower(chapter);
  for (char& c : out) {
    if (c == ' ') c = '-';
  }
  return out;
}

std::string owned(const char* text) { return text == nullptr ? std::string() : text; }

}  // namespace

std::string Function::text(std::int32_t field) const {
  return owned(busbar_function_text(handle, field));
}

std::string Function::argument(std::size_t index) const {
  return owned(busbar_argument_text(handle, index, BUSBAR_ARGUMENT_NAME));
}

bool Function::is_optional(std::size_t index) const {
  return busbar_argument_optional(handle, index) == 1;
}

std::string Function::signature() const {
  std::string out = name + '(';
  for (std::size_t i = 0; i < argument_count(); ++i) {
    if (i > 0) out += "; ";
    out += is_optional(i) ? '[' + argument(i) + ']' : argument(i);
  }
  return out + ')';
}

std::string Function::reference_file() const { return slug(chapter) + '/' + lower(name) + ".csv"; }

void PrintTo(const Function& function, std::ostream* out) { *out << function.name; }

std::vector<Function> catalogue() {
  std::vector<Function> functions;
  for (std::size_t i = 0; i < busbar_function_count(); ++i) {
    Function function{busbar_function_at(i), {}, {}};
    function.name = function.text(BUSBAR_FUNCTION_NAME);
    function.chapter = function.text(BUSBAR_FUNCTION_CHAPTER);
    functions.push_back(std::move(function));
  }
  return functions;
}

}  // namespace busbar::reference
