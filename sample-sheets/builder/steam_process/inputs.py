"""The sheet "Inputs": every typed figure with its unit, document, page and revision."""

from steam_process import figures
from writer import Page

NAME = "Inputs"
COLUMNS = 9
FIRST = 5

FORMATS = {"pressure": "pressure", "temperature": "temperature", "flow": "ratio", "dryness": "dryness"}


class Inputs:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths(
            {"A": 1.2, "B": 7.0, "C": 3.0, "D": 2.4, "E": 2.2, "F": 2.8, "G": 7.4, "H": 1.8, "I": 2.2}
        )
        page.put("A1", "Inputs", "title")
        page.height(1, 0.95)
        page.put(
            "A2",
            "Every figure that was typed, as it stands in its document. All other sheets are formulas.",
            "subtitle",
        )
        page.put("A3", "Readings of the test", "block", merge="I3")
        self._headings(4)
        row = FIRST
        for tag, name, key in figures.POINTS:
            for point, what, value, unit, reference, (document, revision), sheet in figures.READINGS:
                if point != key:
                    continue
                stated = f"stated_{key}_{what}"
                page.put(f"A{row}", tag, "label")
                page.put(f"B{row}", name, "label")
                page.put(f"C{row}", what.capitalize(), "label")
                page.put(f"D{row}", value, "input", FORMATS[what], name=stated)
                page.put(f"E{row}", unit, "input text", name=f"{stated}_unit")
                fixed = reference == figures.NONE
                page.put(
                    f"F{row}",
                    reference,
                    "result centred" if fixed else "input text",
                    name=f"{stated}_reference",
                )
                if not fixed:
                    page.allow(
                        f"F{row}",
                        ("absolute", "gauge"),
                        "Measured from",
                        "Write absolute or gauge: neither passes for the other.",
                    )
                self._origin(row, document, sheet, revision)
                row += 1
        row += 1
        page.put(f"A{row}", "Plant", "block", merge=f"I{row}")
        row += 1
        self._headings(row, plant=True)
        for key, name, value, unit, (document, revision), sheet in figures.PLANT:
            row += 1
            page.put(f"A{row}", "", "label")
            page.put(f"B{row}", name, "label", merge=f"C{row}")
            page.put(f"D{row}", value, "input", "given", name=f"stated_{key}")
            none = unit == figures.NONE
            page.put(
                f"E{row}", unit, "result centred" if none else "input text", name=f"stated_{key}_unit"
            )
            page.put(f"F{row}", figures.NONE, "result centred")
            self._origin(row, document, sheet, revision)
        row += 2
        page.put(
            f"A{row}",
            "Flows of the extractions, the mechanical efficiency and the dryness at S7 are taken from the "
            "heat balance, not measured; the exhaust S8 is worked out on the sheet Balance.",
            "note",
            merge=f"I{row}",
        )
        page.height(row, 0.6)
        page.freeze(2, 4)

    def _headings(self, row, plant=False):
        page = self.page
        for column, text in zip(
            "ABCDEFGHI",
            (
                "",
                "Figure" if plant else "State",
                "" if plant else "Quantity",
                "Value",
                "Unit",
                "Measured from",
                "Document",
                "Page",
                "Revision",
            ),
        ):
            merge = f"C{row}" if plant and column == "B" else None
            if plant and column == "C":
                continue
            left = column in "BCG"
            page.put(f"{column}{row}", text, "heading left" if left else "heading", merge=merge)

    def _origin(self, row, document, sheet, revision):
        page = self.page
        page.put(f"G{row}", document, "input left")
        page.put(f"H{row}", sheet, "input text")
        page.put(f"I{row}", revision, "input text")
