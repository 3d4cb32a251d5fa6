// UTF-8 (engine) and UTF-16 (office). Both directions take anything: what is no text (a lone
// surrogate, an overlong or cut sequence) becomes U+FFFD, so that no input is lost or refused here.
#ifndef BUSBAR_ADDIN_TEXT_HPP
#define BUSBAR_ADDIN_TEXT_HPP

#include <rtl/ustring.hxx>
#include <string>
#include <string_view>

namespace busbar::addin {

void append_utf8(std::string& out, const rtl::OUString& text);
[[nodiscard]] std::string to_utf8(const rtl::OUString& text);
[[nodiscard]] rtl::OUString to_utf16(std::string_view text);

}  // namespace busbar::addin

#endif
