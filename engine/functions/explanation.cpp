// WHY and its kin.
#include "catalogue/call.hpp"
#include "catalogue/sentence.hpp"
#include "functions/functions.hpp"
#include "functions/sources.hpp"

namespace busbar::functions {
namespace {

constexpr const char* kNoFunction = "is not a function of Busbar";

// A reference to a cell means something to the host alone: Calc's add-in answers WHY itself.
Outcome<Text> why(CellReference) {
  return Failure{Fault::wrong_kind, 1,
                 "can be followed inside a spreadsheet only; here WHY_CALL explains a call"};
}

Outcome<Text> why_call(Word name, Rest arguments) {
  const Row* row = find(name);
  if (row == nullptr) return Failure{Fault::unknown_word, 1, kNoFunction};
  if (row == find("WHY_CALL")) {
    return Failure{Fault::unknown_word, 1, "cannot explain itself"};
  }
  return Text{explain(*row, arguments)};
}

Outcome<Text> published_source(Word name) {
  const Row* row = find(name);
  if (row == nullptr) return Failure{Fault::unknown_word, 1, kNoFunction};
  return Text{source_text(*row)};
}

Outcome<Text> engine_version() { return Text{"Busbar " BUSBAR_VERSION}; }

constexpr const char* kChapter = "Explanation";
constexpr Source kVersion{"Busbar", "this library", "its own version"};
constexpr Source kOwn{"Busbar", "this catalogue", "explains calls; computes nothing itself"};

constexpr Argument kCell[] = {{"cell", "A reference to the cell that is to be explained"}};
constexpr Argument kCall[] = {{"function", "Name of a Busbar function, as text"},
                              {"arguments", "The arguments of that function, one after the other"}};
constexpr Argument kName[] = {{"function", "Name of a Busbar function, as text"}};

constexpr Row kRows[] = {
    row<why>(
        {"WHY",
         kChapter,
         "Why a cell shows what it shows",
         "For a cell that failed: which argument, which limit, in its own units; where it only "
         "passes on an error, the first failing cell is named. For a cell that works: equation, "
         "region and validity.",
         "A sentence",
         kOwn,
         {"WHY(B2)", "B2: STEAM: pressure 1200 bar is above 1000 bar", "B2=STEAM(1200; 540)"},
         kFirst},
        kCell),
    row<why_call>({"WHY_CALL",
                   kChapter,
                   "Why a call would fail, or what answers it",
                   "The arguments follow the name as they would stand in the call.",
                   "A sentence",
                   kOwn,
                   {"WHY_CALL(\"STEAM\"; 1200; 540)", "STEAM: pressure 1200 bar is above 1000 bar"},
                   kFirst},
                  kCall),
    row<published_source>({"PUBLISHED_SOURCE",
                           kChapter,
                           "The published source of a function",
                           "",
                           "A text with document, edition and place",
                           kOwn,
                           {"PUBLISHED_SOURCE(\"STEAM\")", "IAPWS R7-97(2012)"},
                           kFirst},
                          kName),
    row<engine_version>({"ENGINE_VERSION",
                         kChapter,
                         "The version of the engine that computes this sheet",
                         "For the head of a printed sheet: a figure and what worked it out belong "
                         "together.",
                         "A text",
                         kVersion,
                         {"ENGINE_VERSION()", "Busbar 0.1.0"},
                         kFirst}),
};

}  // namespace

std::span<const Row> explanation() { return kRows; }

}  // namespace busbar::functions
