#include "why.hpp"

#include <com/sun/star/sheet/XCellRangeAddressable.hpp>
#include <set>
#include <string_view>
#include <utility>

#include "engine.hpp"
#include "marshal.hpp"
#include "text.hpp"
#include "why_circle.hpp"
#include "why_document.hpp"
#include "why_evaluator.hpp"
#include "why_formula_errors.hpp"
#include "why_tree.hpp"

namespace busbar::addin {
namespace {

using com::sun::star::sheet::XCellRangeAddressable;
using com::sun::star::table::CellRangeAddress;
using com::sun::star::table::XCellRange;
using com::sun::star::uno::Reference;
using com::sun::star::uno::UNO_QUERY_THROW;
using com::sun::star::uno::XComponentContext;
using com::sun::star::uno::XInterface;
using rtl::OUString;

constexpr int kMostHops = 64;                 // cells that an error is followed through
constexpr std::size_t kCircleOfWorking = 64;  // cells behind a working one, searched for a circle
constexpr std::size_t kLongestFormula = 160;  // of a formula that is quoted
constexpr std::size_t kLongestAnswer = 4000;

// Cut at a character, with a sign that it was.
std::string shortened(std::string text, std::size_t most) {
  if (text.size() <= most) return text;
  std::size_t end = most;
  while (end > 0 && (static_cast<unsigned char>(text[end]) & 0xC0) == 0x80) --end;
  text.resize(end);
  return text + "\u2026";
}

// Whether a text was meant as a stream: it has the exact part in brackets, whole or damaged.
bool looks_like_stream(std::string_view text) {
  const std::size_t bracket = text.find('[');
  return bracket != std::string_view::npos && text.find(" p=", bracket) != std::string_view::npos;
}

// The engine's words about a stream text.
std::string explained_stream(const OUString& text) {
  constexpr std::string_view kReader = "PRESSURE_OF";
  const busbar_function* reader = busbar_find(kReader.data(), kReader.size());
  Value stream;
  if (reader == nullptr || to_engine(com::sun::star::uno::Any(text), stream) != Taken::value)
    return {};
  const busbar_value* const arguments[] = {stream.get()};
  busbar_value* raw = nullptr;
  const std::int32_t status = busbar_explain(reader, arguments, 1, &raw);
  const Value explanation(raw);
  if (status != BUSBAR_OK || !explanation) return {};
  std::size_t length = 0;
  const char* words = busbar_get_text(explanation.get(), 0, 0, &length);
  return words == nullptr ? std::string{} : std::string{words, length};
}

// What one cell says, and whether the reason lies in another.
struct Step {
  std::string text;
  bool follow = false;
  bool hides = false;    // the cell works, because its formula took the error away
  bool repeats = false;  // the cell only shows another one
  bool in_range = false;
  Address next;
};

class Investigation {
 public:
  Investigation(const SheetDocument& document, const Reference<XComponentContext>& context)
      : document_(document), context_(context) {}

  std::string explain(const Address& start) {
    std::set<Address> visited;
    std::string relation;
    std::string range_note;
    Address at = start;
    for (int hop = 0; hop < kMostHops; ++hop) {
      if (!visited.insert(at).second)
        return sentence(start, at, relation, round_trip(at), range_note);
      const Step step = look_at(at);
      if (!step.follow) return sentence(start, at, relation, step.text, range_note);
      if (relation.empty()) {
        relation = step.hides     ? " hides the error of "
                   : step.repeats ? " repeats "
                                  : " passes on the error of ";
        if (step.in_range && !step.hides)
          range_note =
              " (Calc shows Err:504 where a range with an error in it goes into an add-in "
              "function.)";
      }
      at = step.next;
    }
    return sentence(start, at, relation,
                    "lies behind " + std::to_string(kMostHops) +
                        " cells that pass the error on; ask WHY about this one.",
                    range_note);
  }

 private:
  std::string sentence(const Address& start, const Address& found, const std::string& relation,
                       const std::string& text, const std::string& note) const {
    std::string out = document_.name_of(start, start.sheet);
    if (found != start) out += relation + document_.name_of(found, start.sheet);
    return shortened(out + ": " + text + (found != start ? note : ""), kLongestAnswer);
  }

  // A circle that the hops from error to error came upon.
  [[nodiscard]] std::string round_trip(const Address& cell) const {
    const auto between = circle_through(document_, cell);
    if (!between) return "is part of a circle of references.";
    return circle_in_words(document_, cell, *between);
  }

  Step look_at(const Address& cell) {
    Step step;
    switch (document_.content(cell)) {
      case Content::blank:
        step.text = "the cell is blank. Calc hands a blank cell over as 0.";
        return step;
      case Content::number:
        step.text = "a number that was typed in, not a formula.";
        return step;
      case Content::text:
        step.text = typed_text(document_.text(cell));
        return step;
      default:
        return look_at_formula(cell);
    }
  }

  static std::string typed_text(const OUString& text) {
    if (looks_like_stream(to_utf8(text))) {
      const std::string words = explained_stream(text);
      if (!words.empty()) return "a stream that was typed or pasted as a text. " + words;
    }
    return "a text that was typed in, not a formula.";
  }

  std::string quoted_formula(const Address& cell) const {
    return shortened(to_utf8(document_.formula_text(cell)), kLongestFormula);
  }

  Step look_at_formula(const Address& cell) {
    Step step;
    const CalcError error = document_.error(cell);
    if (error == CalcError::circular) {
      if (const auto between = circle_through(document_, cell)) {
        step.text = circle_in_words(document_, cell, *between);
        return step;
      }
    }
    const CellFormula formula = document_.formula(cell);
    const Node tree = parse_formula(formula.tokens, formula.base, token_numbers(document_));
    Evaluator evaluator(document_, context_, cell, formula, budget_);
    const Result result = evaluator.evaluate(tree);
    if (tree.kind == NodeKind::elsewhere) return link(cell, error);
    if (error != CalcError::none) return failing(cell, error, formula, tree, result);
    // IFERROR takes Calc's error about a circle away, too, and leaves the start value.
    if (!document_.iterates()) {
      if (const auto between = circle_through(document_, cell, kCircleOfWorking)) {
        step.text = "the cell shows a value that may be a start value: " +
                    circle_in_words(document_, cell, *between);
        return step;
      }
    }
    return working(tree, result, evaluator);
  }

  // A cell that shows a cell of another file and nothing else.
  [[nodiscard]] Step link(const Address& cell, CalcError error) const {
    Step step;
    if (error == CalcError::reference) {
      step.text =
          "the cell shows a cell of another file, and either Calc does not find the file, its "
          "sheet "
          "or the cell, or that cell itself holds #REF!. The formula is " +
          quoted_formula(cell) + ".";
      return step;
    }
    if (error != CalcError::none) {
      step.text = "the cell shows a cell of another file, which holds " + shown(error) +
                  ": open that file and ask WHY there. The formula is " + quoted_formula(cell) +
                  ".";
      return step;
    }
    step.text = "the cell shows a value of another file.";
    const OUString text = document_.text(cell);
    if (looks_like_stream(to_utf8(text))) step.text.append(" ").append(explained_stream(text));
    return step;
  }

  static std::string sentence_of(const Fault& fault) {
    if (fault.origin == Fault::Origin::cell) return "a cell that it reads holds an error.";
    return fault.origin == Fault::Origin::calc ? fault.text + "." : fault.text;
  }

  static Step followed(const Fault& fault) {
    Step step;
    step.follow = true;
    step.next = fault.cell;
    step.in_range = fault.in_range && fault.error == CalcError::parameter_list;
    return step;
  }

  // Whether what was found is what the cell shows: an error behind it, or the same error.
  static bool explains(const Result& result, CalcError error) {
    if (!result.fault) return false;
    return result.fault->origin == Fault::Origin::cell || result.fault->error == error;
  }

  Step failing(const Address& cell, CalcError error, const CellFormula& formula, const Node& tree,
               const Result& result) {
    Step step;
    if (result.fault && result.fault->origin == Fault::Origin::cell) return followed(*result.fault);
    if (step.text = unreadable(cell, error, formula); !step.text.empty()) return step;
    if (explains(result, error)) return told(cell, error, *result.fault);
    // The element that the cell shows does not fail by itself: perhaps the call as a whole does.
    Evaluator whole(document_, context_, cell, formula, budget_, Lifting::whole);
    const Result again = whole.evaluate(tree);
    if (explains(again, error)) return told(cell, error, *again.fault);
    if (const auto between = circle_through(document_, cell)) {
      step.text = circle_in_words(document_, cell, *between);
      return step;
    }
    if (result.fault) return told(cell, error, *result.fault);
    if (!result.unknown.empty())
      step.text = "the cell shows " + shown(error) +
                  ", but WHY cannot take its formula apart: it " + result.unknown +
                  ". The formula is " + quoted_formula(cell) + ".";
    else
      step.text = "the cell shows " + shown(error) +
                  ", but WHY finds no part of its formula that fails. Recalculate hard "
                  "(Ctrl+Shift+F9) and ask again. The formula is " +
                  quoted_formula(cell) + ".";
    return step;
  }

  // What kept Calc from computing the formula at all; empty where nothing did.
  [[nodiscard]] std::string unreadable(const Address& cell, CalcError error,
                                       const CellFormula& formula) const {
    const std::string words = error == CalcError::name
                                  ? unknown_name_in_words(formula.tokens, token_numbers(document_))
                                  : unreadable_in_words(error);
    if (words.empty()) return words;
    return words + " The formula is " + quoted_formula(cell) + ".";
  }

  Step told(const Address& cell, CalcError error, const Fault& fault) const {
    if (fault.origin == Fault::Origin::cell) return followed(fault);
    Step step;
    step.text = fault.text;
    if (fault.origin == Fault::Origin::calc)
      step.text = shown(error) + " comes from Calc's own part of the formula " +
                  quoted_formula(cell) + ": " + fault.text + ".";
    return step;
  }

  static Step working(const Node& tree, const Result& result, const Evaluator& evaluator) {
    Step step;
    if (evaluator.hidden()) {
      const Fault& hidden = *evaluator.hidden();
      if (hidden.origin == Fault::Origin::cell) {
        step = followed(hidden);
        step.hides = true;
        return step;
      }
      step.text = "the cell works, but its formula hides an error: " + sentence_of(hidden);
      return step;
    }
    if (tree.kind == NodeKind::reference && tree.area.single()) {
      step.follow = true;
      step.repeats = true;
      step.next = tree.area.first;
      return step;
    }
    if (tree.kind == NodeKind::busbar_call && busbar_argument_count(tree.function) == 1 &&
        busbar_argument_kind(tree.function, 0) == BUSBAR_ARGUMENT_CELL) {
      step.text = "the cell holds the answer of " + tree.word + " about another cell.";
      return step;
    }
    for (const std::string& text : evaluator.explanations()) {
      if (!step.text.empty()) step.text += ' ';
      step.text += text;
    }
    if (!step.text.empty()) return step;
    if (result.fault)
      step.text =
          "the cell works, but WHY, which computes its formula again from the same cells, "
          "meets an error: " +
          sentence_of(*result.fault) + " Recalculate hard (Ctrl+Shift+F9) and ask again.";
    else if (!result.unknown.empty())
      step.text =
          "the cell works, but WHY cannot take its formula apart: it " + result.unknown + ".";
    else
      step.text = "the cell works; its formula is Calc's own and calls no Busbar function.";
    return step;
  }

  const SheetDocument& document_;
  Reference<XComponentContext> context_;
  Budget budget_;
};

}  // namespace

std::string explain_cell(const Reference<XComponentContext>& context,
                         const Reference<XInterface>& document, const Reference<XCellRange>& cell) {
  if (!engine_mismatch().empty()) return engine_mismatch();
  try {
    const Reference<XCellRangeAddressable> addressable(cell, UNO_QUERY_THROW);
    const CellRangeAddress range = addressable->getRangeAddress();
    if (range.StartColumn != range.EndColumn || range.StartRow != range.EndRow)
      return "WHY explains one cell at a time, and " + column_name(range.StartColumn) +
             std::to_string(range.StartRow + 1) + ":" + column_name(range.EndColumn) +
             std::to_string(range.EndRow + 1) + " is a range.";
    const SheetDocument sheets(document);
    return Investigation(sheets, context).explain({range.Sheet, range.StartRow, range.StartColumn});
  } catch (const com::sun::star::uno::Exception& e) {
    return "WHY could not read the cell: " + shortened(to_utf8(e.Message), kLongestFormula);
  }
}

}  // namespace busbar::addin
