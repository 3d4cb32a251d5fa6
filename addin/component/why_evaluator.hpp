// Computes one formula again, part by part, until the part that fails is found.
//
// It knows Busbar's functions (through the engine), Calc's operators and, through Calc itself,
// Calc's built-in functions. What it cannot compute it calls unknown, never a guess. All work is
// counted against a budget that one explanation shares.
#pragma once

#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/XComponentContext.hpp>
#include <cstddef>
#include <optional>
#include <string>
#include <vector>

#include "calc_error.hpp"
#include "engine.hpp"
#include "why_document.hpp"
#include "why_result.hpp"
#include "why_tree.hpp"

namespace busbar::addin {

struct Budget {
  std::size_t calls = 512;        // of the engine and of Calc's functions
  std::size_t cells = 4'000'000;  // read from ranges
  std::size_t nodes = 20'000;     // of formulas
};

// What a Busbar call gets where the formula names a range and the cell shows one element of the
// result: the elements that belong to the cell, which costs one computation, or the whole ranges.
enum class Lifting { element, whole };

class Evaluator {
 public:
  Evaluator(const SheetDocument& document,
            const com::sun::star::uno::Reference<com::sun::star::uno::XComponentContext>& context,
            const Address& cell, const CellFormula& formula, Budget& budget,
            Lifting lifting = Lifting::element)
      : document_(document),
        context_(context),
        cell_(cell),
        formula_(formula),
        budget_(budget),
        lifting_(lifting) {}

  // The value of the cell: of an array formula, the element that the cell shows.
  [[nodiscard]] Result evaluate(const Node& root) { return operand(root, Want::element); }

  // The engine's words about the outermost Busbar calls that worked, in order of evaluation.
  [[nodiscard]] const std::vector<std::string>& explanations() const { return explanations_; }

  // The first error that a function such as IFERROR took away.
  [[nodiscard]] const std::optional<Fault>& hidden() const { return hidden_; }

 private:
  // `element` computes the one value that the cell shows, `whole` a value with all its rows.
  enum class Want { element, whole };

  Result compute(const Node& node, Want want);
  Result compute_kind(const Node& node, Want want);
  Result compute_reference(const Area& area, Want want);
  Result compute_named(const Node& node, Want want);
  Result compute_binary(const Node& node, Want want);
  Result compute_scaled(const Node& node, Want want, double factor);
  Result compute_engine_call(const Node& node, Want want);
  Result compute_builtin(const Node& node, Want want);

  // An operand of an operator: a range stands for the cell in the same row or column.
  Result operand(const Node& node, Want want);
  Result truth(const Node& node, Want want, bool& holds);
  Result branch(const Node& node, Want want);
  Result choose(const Node& node, Want want);
  Result condition_list(const Node& node, Want want);
  Result switch_list(const Node& node, Want want);
  Result after_failure(const Node& node, Want want);
  Result test_for_error(const Node& node, Want want);
  Result position_of(const Node& node, Want want);
  Result index_into(const Node& node, Want want);
  Result through_calc(const Node& node, Want want);
  com::sun::star::uno::Any for_calc(const Node& node, const com::sun::star::uno::Any& value);

  // The reference behind a node, through names; nothing when it is none.
  std::optional<Area> area_behind(const Node& node);
  std::optional<Node> parsed_name(const Node& node);
  std::optional<Area> intersection(const Area& area) const;
  Result single_cell(const Address& address);

  // The arguments of a Busbar call as Calc would hand them over, ranges whole.
  Result computed_arguments(const Node& node, std::vector<com::sun::star::uno::Any>& given);
  // The element of one of them that belongs to the cell; a blank of a range is a missing value.
  Result element_of_argument(const Node& child, const com::sun::star::uno::Any& given,
                             Value& handed);
  Result about_another_cell(const Node& node) const;
  Result failed_call(const Node& node, const std::vector<const busbar_value*>& arguments,
                     CalcError error);
  std::string explain(const Node& node, const std::vector<const busbar_value*>& arguments);
  std::string blank_note(std::size_t from) const;
  Result pick(const com::sun::star::uno::Any& value);

  const SheetDocument& document_;
  com::sun::star::uno::Reference<com::sun::star::uno::XComponentContext> context_;
  Address cell_;
  const CellFormula& formula_;
  Budget& budget_;
  Lifting lifting_;
  int depth_ = 0;
  int names_open_ = 0;
  int engine_calls_open_ = 0;
  std::vector<Address> blanks_;
  std::vector<std::string> explanations_;
  std::optional<Fault> hidden_;
  std::optional<Fault> latent_;  // an error inside a table, which may or may not come out
};

}  // namespace busbar::addin
