// UTF-8 (engine) and UTF-16 (office), by the office's own converters. Both directions take
// anything: what is no text becomes a replacement character ("?" or U+FFFD), so that no input is
// refused here.
#pragma once

#include <rtl/ustring.hxx>
#include <string>
#include <string_view>

namespace busbar::addin {

void append_utf8(std::string& out, const rtl::OUString& text);
[[nodiscard]] std::string to_utf8(const rtl::OUString& text);
[[nodiscard]] rtl::OUString to_utf16(std::string_view text);

}  // namespace busbar::addin
