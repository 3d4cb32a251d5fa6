"""The sheet "Inputs": every typed figure with its unit, document, page and revision."""

from generator_losses import figures
from writer import Page

NAME = "Inputs"


class Inputs:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths({"A": 8.6, "B": 2.6, "C": 2.2, "D": 2.6, "E": 7.4, "F": 1.8, "G": 2.2})
        page.put("A1", "Inputs", "title")
        page.height(1, 0.95)
        page.put(
            "A2",
            "Every figure that was typed, as it stands in its document. All other sheets are formulas.",
            "subtitle",
        )
        row = 2
        for block, lines in figures.REGISTER:
            row += 1
            page.put(f"A{row}", block, "block", merge=f"G{row}")
            row += 1
            self._headings(row, ("Figure", "Value", "Unit", "", "Document", "Page", "Revision"))
            for key, name, value, unit, fmt, document, sheet in lines:
                row += 1
                page.put(f"A{row}", name, "label")
                style = "input text" if isinstance(value, str) else "input"
                page.put(f"B{row}", value, style, fmt, name=f"stated_{key}")
                page.put(f"C{row}", unit, "result centred")
                page.put(f"D{row}", "", "label")
                self._origin(row, document, sheet)
        row += 1
        page.break_before(row)
        page.put(f"A{row}", "Motors of the house load", "block", merge=f"G{row}")
        row += 1
        self._headings(
            row,
            ("Driven machine", "Shaft power, kW", "Rated, kW", "Efficiency or class", "Document", "Page", "Revision"),
        )
        page.height(row, 0.95)
        self.first = row + 1
        for name, shaft, rated, efficiency, sheet in figures.AUXILIARIES:
            row += 1
            page.put(f"A{row}", name, "label")
            page.put(f"B{row}", shaft, "input", "given")
            page.put(f"C{row}", rated, "input", "given")
            style = "input text" if isinstance(efficiency, str) else "input"
            page.put(f"D{row}", efficiency, style, None if isinstance(efficiency, str) else "percent")
            self._origin(row, figures.MOTORS, sheet)
        for name, column in (("motor_shaft_powers", "B"), ("motor_ratings", "C"), ("motor_efficiencies", "D")):
            page.name_range(name, page.reference(f"{column}{self.first}:{column}{row}"))
        row += 2
        page.put(
            f"A{row}",
            "Losses are at rated voltage and frequency in air. The rated power of a class is that of one "
            "motor; its efficiency is the least of the class at rated load. A machine at rest takes 0 kW.",
            "note",
            merge=f"G{row}",
        )
        page.height(row, 0.8)
        page.freeze(1, 2)

    def _headings(self, row, texts):
        for column, text in zip("ABCDEFG", texts):
            self.page.put(f"{column}{row}", text, "heading left" if column in "AE" else "heading")

    def _origin(self, row, document, sheet):
        name, revision = document
        self.page.put(f"E{row}", name, "input left")
        self.page.put(f"F{row}", sheet, "input text")
        self.page.put(f"G{row}", revision, "input text")
