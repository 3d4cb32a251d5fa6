"""The first sheet, "Process": the h-s diagram and the figures that go with it."""

from steam_process import drawings, figures
from writer import Page

NAME = "Process"
COLUMNS = 9
CHART_HEIGHT = 15.0
WIDTHS = {"A": 4.6, "B": 3.4, "C": 3.4, "D": 3.4, "E": 3.4, "F": 3.4, "G": 0.5, "H": 1.8, "I": 9.6}
CHART_ROW = 6

CAUTION = (
    "For appraisal only. Nothing here may be used to set, size or test a safety device, a trip or a "
    "control. Local codes and licensed practice govern. Steam is hot and under pressure: readings are "
    "taken by qualified people under the rules of the site."
)


class Process:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths(WIDTHS)
        page.put("A1", "Steam process", "title")
        page.height(1, 0.95)
        page.put(
            "A2",
            "The expansion of a reheat turbine as measured: stage efficiencies, and the moisture of the "
            "exhaust by the energy balance.",
            "subtitle",
        )
        for row, label, text, name in (
            (3, "Unit", figures.SITE, "site_name"),
            (4, "Test", figures.TEST, "test_name"),
        ):
            page.put(f"A{row}", label, "label")
            page.put(f"B{row}", text, "input left", name=name, merge=f"F{row}")
        page.put("H3", "Engine", "label")
        page.put("I3", '=ENGINE_VERSION()&"; IAPWS-IF97"', "result text", name="engine_version")
        page.put("H4", "Data", "label")
        page.put("I4", "Site, documents and every figure are invented.", "result text")
        page.put(
            "A5",
            "Where a cell shows #NAME?, or nothing moves when an input changes, the Busbar extension is "
            "missing: install it, then press Ctrl+Shift+F9.",
            "note",
            merge="I5",
        )
        page.height(CHART_ROW, CHART_HEIGHT)
        self._results(CHART_ROW + 1)
        page.freeze(0, 2)

    def draw(self, lines):
        """The chart; after the figures of all sheets stand."""
        width = sum(WIDTHS.values())
        row = self.page.sheet.Rows.getByIndex(CHART_ROW - 1)
        top = self.page.sheet.getCellRangeByName(f"A{CHART_ROW}").Position.Y / 1000
        assert row.Height > 0
        size = (width, CHART_HEIGHT - 0.2)
        drawings.mollier(self.page.document, self.page.sheet, lines, (0, top + 0.1), size)

    def _results(self, row):
        page = self.page
        page.put(f"A{row}", "Results", "block", merge=f"F{row}")
        page.put(f"H{row}", "How to read the cells and lines", "block", merge=f"I{row}")
        row += 1
        for column, text in zip(
            "ABCDEF",
            ("Stage", "Drop, kJ/kg", "Isentropic drop, kJ/kg", "Efficiency", "Entropy rise, kJ/(kg K)", "End"),
        ):
            page.put(f"{column}{row}", text, "heading left" if column == "A" else "heading")
        page.height(row, 0.95)
        legend = (
            ("1.23", "input", "typed, with its document, on the sheet Inputs"),
            ("1.23", "allowance", "pressures and temperatures of the drawn lines, on the sheet Lines"),
            ("1.23", "result", "worked out by a formula"),
            ("S1 … S8", "result centred", "measured states; dotted: the isentropic line of each stage"),
        )
        for offset, (text, style, meaning) in enumerate(legend):
            number = float(text) if text == "1.23" else text
            page.put(f"H{row + offset}", number, style, "ratio2" if text == "1.23" else None)
            page.put(f"I{row + offset}", meaning, "label")
        ends = {"hp": "hp_exhaust", "ip": "ip_exhaust", "lp": "lp_exhaust"}
        for name, key, *_ in figures.STAGES:
            row += 1
            page.put(f"A{row}", name, "label")
            page.put(f"B{row}", f"=drop_{key}", "result", "enthalpy")
            page.put(f"C{row}", f"=isentropic_drop_{key}", "result", "enthalpy")
            page.put(f"D{row}", f"=efficiency_{key}", "key", "percent")
            page.put(f"E{row}", f"=entropy_rise_{key}", "result", "entropy")
            end = ends[key]
            page.put(
                f"F{row}",
                f'=IFERROR("x = "&FIXED(DRYNESS_OF({end});3);FIXED(SUPERHEAT_OF({end});0)&" K superheat")',
                "result centred",
            )
        row += 1
        page.put(f"A{row}", "Moisture of the exhaust", "label")
        page.put(f"B{row}", "=exhaust_moisture", "key", "percent")
        page.put(
            f"C{row}",
            '="by the energy balance of the turbine; 1 % more power takes it up by "'
            '&FIXED(100*moisture_per_percent;1)&" points"',
            "result text",
            merge=f"F{row}",
        )
        page.put(f"H{row}", CAUTION, "caution", merge=f"I{row + 1}")
        page.height(row, 0.8)
        page.height(row + 1, 0.8)
        page.put(f"A{row + 1}", "Power of the fluid", "label")
        page.put(f"B{row + 1}", "=fluid_power", "key", "power2")
        page.put(
            f"C{row + 1}",
            "MW; terminals and generator losses, over the mechanical efficiency",
            "result text",
            merge=f"F{row + 1}",
        )
