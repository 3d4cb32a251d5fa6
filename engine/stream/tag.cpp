#include <algorithm>

#include "core/text.hpp"
#include "stream/stream.hpp"

namespace busbar {

Outcome<Tag> Tag::from(std::string_view text) {
  if (text.empty()) return Failure{Fault::missing, 1, "is empty"};
  if (text.size() > kLimit) {
    return Failure{Fault::too_large,
                   1,
                   "is {0} bytes long; a tag may have {1}",
                   {{{static_cast<double>(text.size()), Quantity::number},
                     {static_cast<double>(kLimit), Quantity::number}}}};
  }
  if (!is_printable_utf8(text) || text.find_first_of("[]:") != std::string_view::npos) {
    return Failure{Fault::unknown_word, 1,
                   "holds a bracket, a colon or a control character, which a tag may not"};
  }
  if (trimmed(text).size() != text.size()) {
    return Failure{Fault::unknown_word, 1, "begins or ends with a space, which a tag may not"};
  }
  Tag tag;
  tag.size_ = static_cast<std::uint8_t>(text.size());
  std::copy(text.begin(), text.end(), tag.bytes_.begin());
  return tag;
}

}  // namespace busbar
