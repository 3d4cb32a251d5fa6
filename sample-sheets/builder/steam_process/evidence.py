"""The sheet "Evidence": reasons of chosen cells, properties of the states, published sources."""

from steam_process import figures
from steam_process.balance import FIRST_POINT
from writer import Page

NAME = "Evidence"
COLUMNS = 9

REASONS = (
    ("HP stage efficiency", "WHY(efficiency_hp)"),
    ("IP stage efficiency", "WHY(efficiency_ip)"),
    ("LP stage efficiency", "WHY(efficiency_lp)"),
    ("LP exhaust", "WHY(lp_exhaust)"),
    ("IP exhaust: why no dryness", 'WHY_CALL("DRYNESS_OF";ip_exhaust)'),
)

FUNCTIONS = (
    "STEAM",
    "STEAM_AT_ENTHALPY",
    "TURBINE_EFFICIENCY",
    "TURBINE_OUT",
    "SATURATION_DOME",
    "ISOBARS",
    "ISOTHERMS",
    "DRYNESS_LINES",
    "EXPANSION_LINE",
    "HEATING_LINE",
    "ABSOLUTE_PRESSURE",
    "CONVERT_UNIT",
)

TABLE_COLUMNS = (
    ("result centred", None),
    ("result", "flow"),
    ("result", "pressure"),
    ("result", "temperature"),
    ("result", "enthalpy"),
    ("result", "entropy"),
    ("result", "volume"),
    ("result", "dryness"),
)


class Evidence:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths({"A": 5.2, **{column: 3.6 for column in "BCDEFGHI"}})
        page.put("A1", "Evidence", "title")
        page.height(1, 0.9)
        page.put("A3", "Properties of the states, by STREAM_TABLE", "block", merge="I3")
        last = 4 + len(figures.POINTS)
        for column, (style, fmt) in zip("ABCDEFGH", TABLE_COLUMNS):
            page.put(f"{column}4", None, "heading")
            for row in range(5, last + 1):
                page.put(f"{column}{row}", None, style, fmt)
        end = FIRST_POINT + len(figures.POINTS) - 1
        page.put_array(f"A4:H{last}", f"=STREAM_TABLE($Balance.$G${FIRST_POINT}:$G${end})")
        row = self._sentences(last + 2, "Reasons, asked with WHY", REASONS, "={}", 1.1)
        functions = [(name, name) for name in FUNCTIONS]
        heading = "Published sources, asked with PUBLISHED_SOURCE"
        self._sentences(row + 2, heading, functions, '=PUBLISHED_SOURCE("{}")', 0.55)
        page.freeze(1, 2)

    def _sentences(self, row, heading, lines, formula, height):
        page = self.page
        page.put(f"A{row}", heading, "block", merge=f"I{row}")
        for name, asked in lines:
            row += 1
            page.put(f"A{row}", name, "label")
            page.put(f"B{row}", formula.format(asked), "exact", merge=f"I{row}")
            page.height(row, height)
        return row
