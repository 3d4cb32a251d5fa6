#include "why_circle.hpp"

#include <algorithm>
#include <cstddef>
#include <deque>
#include <map>

#include "why_tree.hpp"

namespace busbar::addin {
namespace {

constexpr int kMostNames = 16;         // names that stand for names
constexpr std::size_t kMostNamed = 4;  // cells of a circle that are named

// The same advice stands on the help page "Working in a sheet".
constexpr const char* kAdvice =
    " A circle of streams needs Tools > Options > LibreOffice Calc > Calculate > Iterations, with "
    "1000 steps. Let it pass through one stream cell that has a start value and rounds what comes "
    "back: =IFERROR(STEAM(10; ROUND(TEMPERATURE_OF(A4); 6); ROUND(0.5*FLOW_OF(A4); 6)); "
    "STEAM(10; 80; 5)). Or cut it on one numeric cell with IFERROR(...; start), never on two. "
    "Goal Seek on a cell that must be zero needs no iterations.";

void add_areas(const SheetDocument& document, const Address& base, const Node& node, int names,
               std::vector<Area>& areas) {
  if (node.kind == NodeKind::reference) areas.push_back(node.area);
  if (node.kind == NodeKind::name && names < kMostNames) {
    if (const auto tokens = document.name_tokens(node.name))
      add_areas(document, base, parse_formula(*tokens, base, token_numbers(document)), names + 1,
                areas);
  }
  for (const Node& child : node.children) add_areas(document, base, child, names, areas);
}

std::vector<Address> formulas_read_by(const SheetDocument& document, const Address& cell,
                                      std::size_t most) {
  const CellFormula formula = document.formula(cell);
  std::vector<Area> areas;
  add_areas(document, formula.base,
            parse_formula(formula.tokens, formula.base, token_numbers(document)), 0, areas);
  std::vector<Address> found;
  for (const Area& area : areas)
    for (const Address& read : document.formula_cells(area, most)) found.push_back(read);
  return found;
}

}  // namespace

std::optional<std::vector<Address>> circle_through(const SheetDocument& document,
                                                   const Address& start, std::size_t most) {
  std::map<Address, Address> reader{{start, start}};  // who reads a cell
  std::deque<Address> waiting{start};
  while (!waiting.empty()) {
    const Address cell = waiting.front();
    waiting.pop_front();
    for (const Address& read : formulas_read_by(document, cell, most)) {
      if (read == start) {
        std::vector<Address> between;
        for (Address at = cell; at != start; at = reader.at(at)) between.push_back(at);
        std::reverse(between.begin(), between.end());
        return between;
      }
      if (reader.size() < most && reader.emplace(read, cell).second) waiting.push_back(read);
    }
  }
  return {};
}

std::string circle_in_words(const SheetDocument& document, const Address& start,
                            const std::vector<Address>& between) {
  std::string text = "the formula refers to itself";
  const std::size_t named = between.size() > kMostNamed ? kMostNamed - 1 : between.size();
  for (std::size_t i = 0; i < named; ++i) {
    const bool last = i + 1 == between.size();
    text += i == 0 ? " through " : last ? " and " : ", ";
    text += document.name_of(between[i], start.sheet);
  }
  if (named < between.size())
    text += " and " + std::to_string(between.size() - named) + " other cells";
  text += document.iterates() ? ", and Calc's iterations do not settle (Err:523)."
                              : ", a circle, while Calc's iterations are off (Err:522).";
  return text + kAdvice;
}

}  // namespace busbar::addin
