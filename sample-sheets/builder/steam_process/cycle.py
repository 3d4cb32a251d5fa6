"""The sheet "Cycle": the same states on the T-s diagram, with the heat taken and given."""

from steam_process import drawings
from writer import Page

NAME = "Cycle"
COLUMNS = 6
WIDTH = 33.6
HEIGHT = 19.3
CHART_ROW = 3


class Cycle:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths({column: WIDTH / 6 for column in "ABCDEF"})
        page.put("A1", "Cycle", "title")
        page.height(1, 0.95)
        page.put(
            "A2",
            "Heat is taken from the final feedwater to main steam and in the reheater, and given to the "
            "condenser; the feed heaters lie between, their bled steam not drawn.",
            "subtitle",
        )
        page.put(f"A{CHART_ROW}", None, "text", merge=f"F{CHART_ROW}")
        page.height(CHART_ROW, HEIGHT)
        page.put(
            f"A{CHART_ROW + 1}",
            "Between the states the pressure changes in proportion to the heat (HEATING_LINE); the "
            "expansion keeps the isentropic efficiency of each section (EXPANSION_LINE).",
            "note",
            merge=f"F{CHART_ROW + 1}",
        )
        page.freeze(0, 2)

    def draw(self, lines):
        top = self.page.sheet.getCellRangeByName(f"A{CHART_ROW}").Position.Y / 1000
        size = (WIDTH, HEIGHT - 0.2)
        drawings.temperature_entropy(self.page.document, self.page.sheet, lines, (0, top + 0.1), size)
