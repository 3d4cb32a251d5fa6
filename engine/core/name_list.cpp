#include "core/name_list.hpp"

#include <algorithm>
#include <numeric>

#include "core/text.hpp"

namespace busbar {
namespace {

// A longer word is not a name; the cost of a comparison stays bounded.
constexpr std::size_t kLongestWord = 80;
constexpr std::size_t kNearNames = 3;

// A sentence about it must stay readable: no further name beyond this length.
constexpr std::size_t kLongestReason = 140;

std::string small_letters(std::string_view text) {
  std::string out(trimmed(text.substr(0, std::min(text.size(), kLongestWord))));
  for (char& c : out) {
    if (c >= 'A' && c <= 'Z') c = static_cast<char>(c - 'A' + 'a');
  }
  return out;
}

// Least number of letters to insert, delete or replace (Levenshtein).
std::size_t edits(const std::string& a, const std::string& b) {
  std::vector<std::size_t> row(b.size() + 1);
  std::iota(row.begin(), row.end(), std::size_t{0});
  for (std::size_t i = 1; i <= a.size(); ++i) {
    std::size_t diagonal = row[0];
    row[0] = i;
    for (std::size_t j = 1; j <= b.size(); ++j) {
      const std::size_t above = row[j];
      const std::size_t replaced = diagonal + (a[i - 1] == b[j - 1] ? 0 : 1);
      row[j] = std::min({above + 1, row[j - 1] + 1, replaced});
      diagonal = above;
    }
  }
  return row[b.size()];
}

// A name that begins with the word, or holds it, is nearer than one that is merely spelt alike.
std::size_t distance(const std::string& word, const std::string& name) {
  constexpr std::size_t kUnlike = 2 * kLongestWord;
  const std::size_t at = word.empty() ? std::string::npos : name.find(word);
  if (at == 0) return name.size() - word.size();
  if (at != std::string::npos) return kLongestWord + name.size() - word.size();
  return kUnlike + edits(word, name);
}

}  // namespace

NameList::NameList(std::vector<std::string_view> names, std::string_view where,
                   std::string_view all)
    : names_(std::move(names)) {
  reasons_.reserve(names_.size());
  for (const std::string_view name : names_) {
    std::string& reason = reasons_.emplace_back("is not a name in ");
    reason += where;
    reason += "; the nearest are ";
    bool first = true;
    for (const std::size_t near : nearest(name, kNearNames)) {
      if (!first && reason.size() + names_[near].size() > kLongestReason) break;
      if (!first) reason += ", ";
      first = false;
      reason += '"';
      reason += names_[near];
      reason += '"';
    }
    reason += "; ";
    reason += all;
    reason += " lists them";
  }
}

std::optional<std::size_t> NameList::find(std::string_view name) const {
  for (std::size_t i = 0; i < names_.size(); ++i) {
    if (equal_ignoring_case(names_[i], trimmed(name))) return i;
  }
  return std::nullopt;
}

std::vector<std::size_t> NameList::nearest(std::string_view word, std::size_t count) const {
  const std::string wanted = small_letters(word);
  std::vector<std::pair<std::size_t, std::size_t>> ranked;
  ranked.reserve(names_.size());
  for (std::size_t i = 0; i < names_.size(); ++i) {
    ranked.emplace_back(distance(wanted, small_letters(names_[i])), i);
  }
  std::sort(ranked.begin(), ranked.end());
  std::vector<std::size_t> out;
  for (std::size_t i = 0; i < std::min(count, ranked.size()); ++i) out.push_back(ranked[i].second);
  return out;
}

const char* NameList::unknown(std::string_view word) const {
  const std::vector<std::size_t> near = nearest(word, 1);
  return near.empty() ? "is not known" : reasons_[near.front()].c_str();
}

}  // namespace busbar
