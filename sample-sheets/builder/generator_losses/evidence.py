"""The sheet "Evidence": reasons of chosen cells, and published sources."""

from writer import Page

NAME = "Evidence"

REASONS = (
    ("Efficiency in the run", "WHY(run_efficiency)"),
    ("Least within the tolerance", "WHY(tolerated)"),
    ("Best load", "WHY(best_load)"),
    ("Power factor of the run", "WHY(run_factor)"),
    ("Why 98.7 is refused", 'WHY_CALL("TOLERATED_EFFICIENCY";98.7;152)'),
    ("Why 1470 rpm is refused", 'WHY_CALL("POLE_COUNT";50;1470)'),
)

FUNCTIONS = (
    "POLE_COUNT",
    "RATED_CURRENT",
    "WINDING_REFERENCE_TEMPERATURE",
    "STATOR_COPPER_LOSS",
    "FIELD_COPPER_LOSS",
    "GENERATOR_EFFICIENCY_FROM_LOSSES",
    "GENERATOR_LOSS_TABLE",
    "GENERATOR_BEST_LOAD",
    "TOLERATED_EFFICIENCY",
    "THREE_PHASE_POWER_FACTOR",
    "MOTOR_IE_EFFICIENCY",
    "HOUSE_LOAD",
    "TRANSFORMER_LOAD_LOSS_AT_TEMPERATURE",
    "TRANSFORMER_LOSS",
    "SHAFT_TO_BUSBAR",
)


class Evidence:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths({"A": 8.2, **{column: 3.8 for column in "BCDEFG"}})
        page.put("A1", "Evidence", "title")
        page.height(1, 0.9)
        row = self._sentences(3, "Reasons, asked with WHY", REASONS, "={}", 0.9)
        functions = [(name, name) for name in FUNCTIONS]
        heading = "Published sources, asked with PUBLISHED_SOURCE"
        self._sentences(row + 2, heading, functions, '=PUBLISHED_SOURCE("{}")', 0.55)
        page.freeze(1, 2)

    def _sentences(self, row, heading, lines, formula, height):
        page = self.page
        page.put(f"A{row}", heading, "block", merge=f"G{row}")
        for name, asked in lines:
            row += 1
            page.put(f"A{row}", name, "label")
            page.put(f"B{row}", formula.format(asked), "exact", merge=f"G{row}")
            page.height(row, height)
        return row
