#include "text.hpp"

#include <algorithm>
#include <cstddef>
#include <rtl/string.hxx>

namespace busbar::addin {

void append_utf8(std::string& out, const rtl::OUString& text) {
  const rtl::OString bytes = rtl::OUStringToOString(text, RTL_TEXTENCODING_UTF8);
  out.append(bytes.getStr(), static_cast<std::size_t>(bytes.getLength()));
}

std::string to_utf8(const rtl::OUString& text) {
  std::string out;
  append_utf8(out, text);
  return out;
}

rtl::OUString to_utf16(std::string_view text) {
  const auto longest = static_cast<std::size_t>(SAL_MAX_INT32 - 1);
  const auto length = static_cast<sal_Int32>(std::min(text.size(), longest));
  return {text.data(), length, RTL_TEXTENCODING_UTF8};
}

}  // namespace busbar::addin
