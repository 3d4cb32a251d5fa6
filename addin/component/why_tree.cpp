#include "why_tree.hpp"

#include <algorithm>
#include <array>
#include <com/sun/star/sheet/ComplexReference.hpp>
#include <com/sun/star/sheet/ExternalReference.hpp>
#include <com/sun/star/sheet/FormulaLanguage.hpp>
#include <com/sun/star/sheet/FormulaMapGroup.hpp>
#include <com/sun/star/sheet/FormulaMapGroupSpecialOffset.hpp>
#include <com/sun/star/sheet/FormulaOpCodeMapEntry.hpp>
#include <com/sun/star/sheet/ReferenceFlags.hpp>
#include <com/sun/star/sheet/SingleReference.hpp>
#include <com/sun/star/sheet/XFormulaOpCodeMapper.hpp>
#include <mutex>
#include <optional>
#include <string_view>
#include <utility>

#include "text.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::sheet::ComplexReference;
using com::sun::star::sheet::ExternalReference;
using com::sun::star::sheet::FormulaOpCodeMapEntry;
using com::sun::star::sheet::FormulaToken;
using com::sun::star::sheet::NameToken;
using com::sun::star::sheet::SingleReference;
using com::sun::star::sheet::XFormulaOpCodeMapper;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using com::sun::star::uno::UNO_QUERY_THROW;
using rtl::OUString;

namespace sheet = com::sun::star::sheet;

constexpr sal_Int32 kMostTokens = 8192;
constexpr int kDeepest = 80;        // nested parentheses and calls; bounds the recursion
constexpr int kLongestChain = 250;  // operands in a row, which become as many levels of the tree

constexpr std::array<std::pair<std::string_view, Operator>, 12> kOperators{
    {{"+", Operator::plus},
     {"-", Operator::minus},
     {"*", Operator::times},
     {"/", Operator::divide},
     {"&", Operator::concatenate},
     {"^", Operator::power},
     {"=", Operator::equal},
     {"<>", Operator::unequal},
     {"<", Operator::less},
     {">", Operator::greater},
     {"<=", Operator::less_or_equal},
     {">=", Operator::greater_or_equal}}};

TokenNumbers ask(const SheetDocument& document) {
  const Reference<XFormulaOpCodeMapper> mapper(
      document.factory()->createInstance("com.sun.star.sheet.FormulaOpCodeMapper"),
      UNO_QUERY_THROW);
  const auto group = [&](sal_Int32 which) {
    return mapper->getAvailableMappings(sheet::FormulaLanguage::ENGLISH, which);
  };
  TokenNumbers numbers;
  const auto special = group(sheet::FormulaMapGroup::SPECIAL);
  const auto at = [&](sal_Int32 offset) {
    return offset < special.getLength() ? special[offset].Token.OpCode : -1;
  };
  namespace offset = sheet::FormulaMapGroupSpecialOffset;
  numbers.push = at(offset::PUSH);
  numbers.external = at(offset::EXTERNAL);
  numbers.name = at(offset::NAME);
  numbers.no_name = at(offset::NO_NAME);
  numbers.missing = at(offset::MISSING);
  numbers.bad = at(offset::BAD);
  numbers.spaces = at(offset::SPACES);
  numbers.whitespace = at(offset::WHITESPACE);
  numbers.macro = at(offset::MACRO);
  for (const FormulaOpCodeMapEntry& entry : group(sheet::FormulaMapGroup::SEPARATORS)) {
    if (entry.Name == "(") numbers.open = entry.Token.OpCode;
    if (entry.Name == ")") numbers.close = entry.Token.OpCode;
    if (entry.Name == ";") numbers.separator = entry.Token.OpCode;
  }
  for (const FormulaOpCodeMapEntry& entry : group(sheet::FormulaMapGroup::UNARY_OPERATORS)) {
    if (entry.Name == "%") numbers.percent = entry.Token.OpCode;
    if (entry.Name == "-") numbers.negative = entry.Token.OpCode;
  }
  for (const FormulaOpCodeMapEntry& entry : group(sheet::FormulaMapGroup::BINARY_OPERATORS)) {
    const std::string name = to_utf8(entry.Name);
    for (const auto& [word, op] : kOperators)
      if (name == word) numbers.binary[entry.Token.OpCode] = op;
    if (name == "!") numbers.intersection = entry.Token.OpCode;
    if (name == "~") numbers.union_of = entry.Token.OpCode;
    if (name == ":") numbers.range = entry.Token.OpCode;
  }
  for (const FormulaOpCodeMapEntry& entry : group(sheet::FormulaMapGroup::FUNCTIONS))
    numbers.functions.emplace(entry.Token.OpCode, to_utf8(entry.Name));
  return numbers;
}

Node with_reason(NodeKind kind, std::string why) {
  Node node;
  node.kind = kind;
  node.word = std::move(why);
  return node;
}

Node opaque(std::string why) { return with_reason(NodeKind::opaque, std::move(why)); }

Node deleted_cell() {
  return with_reason(NodeKind::broken, "a reference to a cell that was deleted");
}

std::optional<Address> address_of(const SingleReference& reference, const Address& base) {
  namespace flag = sheet::ReferenceFlags;
  constexpr sal_Int32 kDeleted = flag::COLUMN_DELETED | flag::ROW_DELETED | flag::SHEET_DELETED;
  if ((reference.Flags & kDeleted) != 0) return {};
  const auto place = [&](sal_Int32 relative, sal_Int32 offset, sal_Int32 absolute, sal_Int32 from) {
    return (reference.Flags & relative) != 0 ? from + offset : absolute;
  };
  return Address{
      place(flag::SHEET_RELATIVE, reference.RelativeSheet, reference.Sheet, base.sheet),
      place(flag::ROW_RELATIVE, reference.RelativeRow, reference.Row, base.row),
      place(flag::COLUMN_RELATIVE, reference.RelativeColumn, reference.Column, base.column)};
}

Node reference_node(const SingleReference& from, const SingleReference& to, const Address& base) {
  const auto first = address_of(from, base);
  const auto last = address_of(to, base);
  if (!first || !last) return deleted_cell();
  if (first->sheet != last->sheet) return opaque("refers to a range over several sheets");
  Node node;
  node.kind = NodeKind::reference;
  node.area.first = {first->sheet, std::min(first->row, last->row),
                     std::min(first->column, last->column)};
  node.area.last_row = std::max(first->row, last->row);
  node.area.last_column = std::max(first->column, last->column);
  return node;
}

// Recursive descent over the infix tokens with Calc's own precedence: a sign binds closer than %,
// % closer than ^, and ^ runs from left to right.
class Parser {
 public:
  Parser(const Tokens& tokens, const Address& base, const TokenNumbers& numbers)
      : base_(base), numbers_(numbers) {
    tokens_.reserve(static_cast<std::size_t>(tokens.getLength()));
    for (const FormulaToken& token : tokens)
      if (token.OpCode != numbers.spaces && token.OpCode != numbers.whitespace)
        tokens_.push_back(&token);
  }

  Node formula() {
    Node node = level(kComparison);
    if (failure_.empty() && next_ != tokens_.size())
      failure_ = "is put together in a way that WHY does not read";
    return failure_.empty() ? std::move(node) : opaque(failure_);
  }

 private:
  static constexpr int kComparison = 0;
  static constexpr int kSigns = 5;

  static int level_of(Operator op) {
    switch (op) {
      case Operator::concatenate:
        return 1;
      case Operator::plus:
      case Operator::minus:
        return 2;
      case Operator::times:
      case Operator::divide:
        return 3;
      case Operator::power:
        return 4;
      default:
        return kComparison;
    }
  }

  [[nodiscard]] sal_Int32 peek() const {
    return next_ < tokens_.size() ? tokens_[next_]->OpCode : -1;
  }

  bool take(sal_Int32 code) {
    if (code < 0 || peek() != code) return false;
    ++next_;
    return true;
  }

  Node fail(const char* why) {
    if (failure_.empty()) failure_ = why;
    return opaque(failure_);
  }

  Node level(int which) {
    if (which == kSigns) return after_signs();
    Node left = level(which + 1);
    int chain = 0;
    while (failure_.empty()) {
      const auto found = numbers_.binary.find(peek());
      if (found == numbers_.binary.end() || level_of(found->second) != which) break;
      ++next_;
      if (++chain > kLongestChain) return fail("is too long for WHY");
      Node node;
      node.kind = NodeKind::binary;
      node.op = found->second;
      node.children.push_back(std::move(left));
      node.children.push_back(level(which + 1));
      left = std::move(node);
    }
    return left;
  }

  Node after_signs() {
    Node node = signs();
    int chain = 0;
    while (failure_.empty() && take(numbers_.percent)) {
      if (++chain > kDeepest) return fail("is nested too deeply for WHY");
      node = wrapped(NodeKind::percent, node);
    }
    return node;
  }

  static Node wrapped(NodeKind kind, Node& inner) {
    Node node;
    node.kind = kind;
    node.children.push_back(std::move(inner));
    return node;
  }

  Node signs() {
    int negatives = 0;
    while (next_ < tokens_.size()) {
      if (take(numbers_.negative)) {
        ++negatives;
        continue;
      }
      const auto found = numbers_.binary.find(peek());
      if (found == numbers_.binary.end() || found->second != Operator::plus) break;
      ++next_;
    }
    Node node = operand();
    const sal_Int32 code = peek();
    if (code >= 0 && code == numbers_.union_of) {
      int chain = 0;
      while (failure_.empty() && take(numbers_.union_of)) {
        if (++chain > kDeepest) return fail("is too long for WHY");
        node = operand();
      }
      return with_reason(NodeKind::refused,
                         "ranges joined with ~, which Calc hands to no add-in function");
    }
    if (code >= 0 && (code == numbers_.range || code == numbers_.intersection))
      return fail("computes a range while it runs");
    // Two signs cancel, but still make a number of a text.
    if (negatives > 0) node = wrapped(NodeKind::negative, node);
    if (negatives > 0 && negatives % 2 == 0) node = wrapped(NodeKind::negative, node);
    return node;
  }

  Node operand() {
    if (next_ >= tokens_.size()) return fail("ends too early");
    if (++depth_ > kDeepest) return fail("is nested too deeply for WHY");
    Node node = operand_inside();
    --depth_;
    return node;
  }

  Node operand_inside() {
    const FormulaToken& token = *tokens_[next_++];
    const sal_Int32 code = token.OpCode;
    if (code == numbers_.open) {
      Node inner = level(kComparison);
      if (failure_.empty() && !take(numbers_.close)) return fail("lacks a closing parenthesis");
      return inner;
    }
    if (code == numbers_.push) return pushed(token.Data);
    if (code == numbers_.missing) {
      Node node;
      node.kind = NodeKind::missing;
      return node;
    }
    if (code == numbers_.name) {
      Node node;
      if (!(token.Data >>= node.name)) return fail("holds a name that WHY does not read");
      node.kind = NodeKind::name;
      return node;
    }
    if (code == numbers_.external) return external_call(token.Data);
    if (code == numbers_.macro) return call_of("calls a macro", nullptr);
    if (code == numbers_.bad || code == numbers_.no_name)
      return call_of("holds a name that Calc does not know", nullptr);
    const auto builtin = numbers_.functions.find(code);
    if (builtin != numbers_.functions.end()) {
      Node node = call_of({}, nullptr);
      node.kind = NodeKind::builtin_call;
      node.word = builtin->second;
      return node;
    }
    return fail("holds a part that WHY does not read");
  }

  Node pushed(const Any& data) {
    SingleReference single;
    ComplexReference both;
    ExternalReference elsewhere;
    if (data >>= single) return reference_node(single, single, base_);
    if (data >>= both) return reference_node(both.Reference1, both.Reference2, base_);
    if (data >>= elsewhere) return with_reason(NodeKind::elsewhere, {});
    if (!data.hasValue()) return deleted_cell();
    Node node;
    node.kind = NodeKind::literal;
    node.value = data;
    return node;
  }

  Node external_call(const Any& data) {
    OUString full;
    if (!(data >>= full)) return fail("calls a function that WHY does not know");
    const std::string name = to_utf8(full);
    constexpr std::string_view kOwn = "BUSBAR.";
    if (name.size() > kOwn.size() && std::string_view(name).substr(0, kOwn.size()) == kOwn) {
      const std::string_view function = std::string_view(name).substr(kOwn.size());
      const busbar_function* found = busbar_find(function.data(), function.size());
      if (found != nullptr) {
        Node node = call_of({}, found);
        node.kind = NodeKind::busbar_call;
        node.word = function;
        return node;
      }
    }
    return call_of("calls " + name + " of another extension", nullptr);
  }

  // Reads the arguments. A call that cannot be computed is opaque, but its arguments are read on.
  Node call_of(std::string opaque_because, const busbar_function* function) {
    Node node = opaque(std::move(opaque_because));
    node.function = function;
    if (!take(numbers_.open)) return node;
    if (take(numbers_.close)) return node;
    while (failure_.empty()) {
      if (peek() == numbers_.separator || peek() == numbers_.close) {
        Node omitted;
        omitted.kind = NodeKind::missing;
        node.children.push_back(std::move(omitted));
      } else {
        node.children.push_back(level(kComparison));
      }
      if (take(numbers_.close)) return node;
      if (!take(numbers_.separator)) return fail("lacks a closing parenthesis");
    }
    return node;
  }

  std::vector<const FormulaToken*> tokens_;
  Address base_;
  const TokenNumbers& numbers_;
  std::size_t next_ = 0;
  int depth_ = 0;
  std::string failure_;
};

}  // namespace

const TokenNumbers& token_numbers(const SheetDocument& document) {
  // Kept for the life of the process: an office may still compute while it ends.
  static std::mutex* const guard = new std::mutex;
  static const TokenNumbers* numbers = nullptr;
  const std::lock_guard lock(*guard);
  if (numbers == nullptr) numbers = new TokenNumbers(ask(document));
  return *numbers;
}

std::optional<UnknownName> unknown_name(const Tokens& tokens, const TokenNumbers& numbers) {
  for (sal_Int32 i = 0; i < tokens.getLength(); ++i) {
    OUString name;
    const sal_Int32 code = tokens[i].OpCode;
    if ((code != numbers.bad && code != numbers.no_name) || !(tokens[i].Data >>= name)) continue;
    sal_Int32 next = i + 1;
    while (next < tokens.getLength() &&
           (tokens[next].OpCode == numbers.spaces || tokens[next].OpCode == numbers.whitespace))
      ++next;
    return UnknownName{to_utf8(name),
                       next < tokens.getLength() && tokens[next].OpCode == numbers.open};
  }
  return {};
}

Node parse_formula(const Tokens& tokens, const Address& base, const TokenNumbers& numbers) {
  if (tokens.getLength() > kMostTokens) return opaque("is too long for WHY");
  if (tokens.getLength() == 0) return opaque("is one that Calc could not read");
  return Parser(tokens, base, numbers).formula();
}

}  // namespace busbar::addin
