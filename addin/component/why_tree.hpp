// A formula as a tree, from the tokens that Calc compiled it to.
#pragma once

#include <busbar.h>

#include <com/sun/star/sheet/FormulaToken.hpp>
#include <com/sun/star/sheet/NameToken.hpp>
#include <com/sun/star/uno/Any.hxx>
#include <cstddef>
#include <map>
#include <optional>
#include <string>
#include <vector>

#include "why_document.hpp"

namespace busbar::addin {

enum class Operator {
  plus,
  minus,
  times,
  divide,
  concatenate,
  power,
  equal,
  unequal,
  less,
  greater,
  less_or_equal,
  greater_or_equal
};

enum class NodeKind {
  literal,       // number, text, inline array in `value`
  missing,       // an argument that is left out
  reference,     // `area`
  name,          // `name`
  busbar_call,   // `function`, arguments in `children`
  builtin_call,  // `word` is the English name
  negative,
  percent,
  binary,
  broken,     // an error whichever way it is used; `word` says why
  refused,    // what Calc hands to no add-in function; `word` says why
  elsewhere,  // a reference into another file
  opaque      // what cannot be taken apart; `word` says why, as the end of a sentence
};

struct Node {
  NodeKind kind = NodeKind::opaque;
  com::sun::star::uno::Any value;
  Area area;
  com::sun::star::sheet::NameToken name;
  const busbar_function* function = nullptr;
  Operator op = Operator::plus;
  std::string word;
  std::vector<Node> children;
};

// What Calc's token numbers mean; they are the same in every document of an office.
struct TokenNumbers {
  sal_Int32 push = -1;
  sal_Int32 external = -1;
  sal_Int32 name = -1;
  sal_Int32 missing = -1;
  sal_Int32 bad = -1;
  sal_Int32 spaces = -1;
  sal_Int32 whitespace = -1;
  sal_Int32 macro = -1;
  sal_Int32 no_name = -1;
  sal_Int32 open = -1;
  sal_Int32 close = -1;
  sal_Int32 separator = -1;
  sal_Int32 percent = -1;
  sal_Int32 negative = -1;
  sal_Int32 intersection = -1;
  sal_Int32 union_of = -1;
  sal_Int32 range = -1;
  std::map<sal_Int32, Operator> binary;
  std::map<sal_Int32, std::string> functions;  // English names
};

// Asks the document once in the life of the office.
[[nodiscard]] const TokenNumbers& token_numbers(const SheetDocument& document);

// The first name in a formula that Calc does not know, and whether it is called as a function.
struct UnknownName {
  std::string name;
  bool function = false;
};
[[nodiscard]] std::optional<UnknownName> unknown_name(const Tokens& tokens,
                                                      const TokenNumbers& numbers);

// Never fails: what it cannot read is an opaque node. Relative references count from `base`.
[[nodiscard]] Node parse_formula(const Tokens& tokens, const Address& base,
                                 const TokenNumbers& numbers);

}  // namespace busbar::addin
