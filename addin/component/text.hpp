// UTF-8 (engine) and UTF-16 (office), by the office's own converters. Both directions take
// anything: what is no text becomes a replacement character ("?" or U+FFFD), so that no input is
// refused here.
#pragma once

#include <array>
#include <cstddef>
#include <rtl/ustring.hxx>
#include <string>
#include <string_view>

namespace busbar::addin {

/// A text in UTF-8, without memory of its own where it is as short as a stream's.
class Utf8 {
 public:
  explicit Utf8(const rtl::OUString& text);
  Utf8(const Utf8&) = delete;
  Utf8& operator=(const Utf8&) = delete;

  [[nodiscard]] std::string_view view() const { return view_; }

 private:
  static constexpr std::size_t kShort = 512;  // UTF-16 units
  std::array<char, 2 * kShort> buffer_;       // written where it is used, never cleared
  std::string long_;
  std::string_view view_;
};

void append_utf8(std::string& out, const rtl::OUString& text);
[[nodiscard]] std::string to_utf8(const rtl::OUString& text);
[[nodiscard]] rtl::OUString to_utf16(std::string_view text);

}  // namespace busbar::addin
