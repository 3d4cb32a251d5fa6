"""The first sheet, "Losses": efficiency over load, the losses, and the way to the busbar."""

from charts import STROKE, Chart
from generator_losses import chain, curve, figures
from styles import INK, OCHRE, PLUM, SLATE, style_by_content
from writer import Page

NAME = "Losses"
CHART_ROW = 6
CHART_HEIGHT = 8.4
PRINTED = f"A1:K{CHART_ROW + 16}"
WIDTHS = {"A": 5.6, "B": 2.3, "C": 2.3, "D": 2.3, "E": 0.5, "F": 6.0, "G": 2.3, "H": 3.6, "I": 2.2, "J": 2.2, "K": 2.2}

CAUTION = (
    "For appraisal only: nothing here sets a protection, a trip or a limit of excitation. Terminals, "
    "windings and transformers carry high voltage; readings are taken by qualified people under local "
    "codes, licensed practice and the rules of the site."
)

MET, TOLERATED, MISSED = "met", "within tolerance", "missed"


class Losses:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths(WIDTHS)
        page.put("A1", "Generator losses", "title")
        page.height(1, 0.95)
        page.put(
            "A2",
            "From test losses and readings to the busbar: efficiency by summation of losses at any load, "
            "house load, step-up transformer.",
            "subtitle",
        )
        for row, label, text, name in ((3, "Unit", figures.SITE, "site_name"), (4, "Test", figures.TEST, "test_name")):
            page.put(f"A{row}", label, "label")
            page.put(f"B{row}", text, "input left", name=name, merge=f"F{row}")
        page.put("G3", "Engine", "label")
        page.put("H3", '=ENGINE_VERSION()&"; IEC 60034-2-1, 60034-1, 60076-1"', "result text",
                 name="engine_version", merge="K3")
        page.put("G4", "Data", "label")
        page.put("H4", "Site, documents and every figure are invented.", "result text", merge="K4")
        page.put(
            "A5",
            "Where a cell shows #NAME?, or nothing moves when an input changes, the Busbar extension is "
            "missing: install it, then press Ctrl+Shift+F9.",
            "note",
            merge="K5",
        )
        page.height(CHART_ROW, CHART_HEIGHT)
        self._losses(CHART_ROW + 1)
        self._busbar(CHART_ROW + 1)
        self._guarantee(CHART_ROW + 8)
        self._foot(CHART_ROW + 12)
        page.freeze(0, 2)

    def _losses(self, row):
        page = self.page
        page.put(f"A{row}", "Losses", "block", merge=f"D{row}")
        row += 1
        for column, text in zip("ABCD", ("Loss", "Rated load, kW", "The run, kW", "Share in the run")):
            page.put(f"{column}{row}", text, "heading left" if column == "A" else "heading")
        page.height(row, 0.95)
        for index, name in enumerate(chain.LOSSES, 1):
            row += 1
            page.put(f"A{row}", name, "label")
            page.put(f"B{row}", f"=INDEX(rated_losses;{index})", "result", "power")
            page.put(f"C{row}", f"=INDEX(run_losses;1;{index})", "result", "power")
            page.put(f"D{row}", f"=C{row}/run_total", "result", "percent")
        row += 1
        page.put(f"A{row}", "All losses", "label")
        page.put(f"B{row}", "=rated_total", "key", "power")
        page.put(f"C{row}", "=run_total", "key", "power")
        page.put(f"D{row}", f"=SUM(D{row - 6}:D{row - 1})", "result", "percent")
        row += 1
        page.put(f"A{row}", "Efficiency", "label")
        page.put(f"B{row}", "=rated_efficiency", "key", "percent2")
        page.put(f"C{row}", "=run_efficiency", "key", "percent2")
        page.put(f"D{row}", "", "label")

    def _busbar(self, row):
        page = self.page
        page.put(f"F{row}", "From shaft to busbar in the run", "block", merge=f"K{row}")
        for offset in range(5):
            row += 1
            for column, number, style, fmt in (
                ("F", 1, "label", None), ("G", 2, "key", "power2"), ("H", 3, "label", None),
                ("I", 4, "result", "power"), ("J", 5, "result", "percent2"), ("K", 6, "result", "percent2"),
            ):
                if offset == 0:
                    style, fmt = ("heading left" if column in "FH" else "heading"), None
                page.put(f"{column}{row}", f"=INDEX(busbar_table;{offset + 1};{number})", style, fmt)

    def _guarantee(self, row):
        page = self.page
        page.put(f"F{row - 1}", "Guarantee at rated load", "block", merge=f"K{row - 1}")
        for label, formula, fmt, style, name in (
            ("Guaranteed efficiency", "=stated_guaranteed_efficiency", "percent2", "result", None),
            ("Least within the tolerance, IEC 60034-1", "=tolerated", "percent2", "result", None),
            ("By summation of losses", "=rated_efficiency", "percent2", "key", None),
        ):
            page.put(f"F{row}", label, "label")
            page.put(f"G{row}", formula, style, fmt, name=name)
            row += 1
        first = row - 3
        page.put(f"H{first}", "Verdict", "heading")
        page.put(
            f"H{first + 1}",
            f'=IF(rated_efficiency>=stated_guaranteed_efficiency;"{MET}";IF(rated_efficiency>=tolerated;"{TOLERATED}";"{MISSED}"))',
            "result centred",
            name="verdict",
            merge=f"H{first + 2}",
        )
        page.put(f"I{first}", "Best load", "heading", merge=f"J{first}")
        page.put(f"K{first}", "=best_load", "key", "percent")
        page.put(f"I{first + 1}", "House load of gross", "heading", merge=f"J{first + 1}")
        page.put(f"K{first + 1}", "=house_share", "key", "percent2")
        page.put(f"I{first + 2}", "Power factor of the run", "heading", merge=f"J{first + 2}")
        page.put(f"K{first + 2}", "=run_factor", "key", "dryness")
        style_by_content(
            page.sheet.getCellRangeByName(f"H{first + 1}"),
            {MET: "consistent", TOLERATED: "not shown impossible", MISSED: "impossible"},
        )

    def _foot(self, row):
        page = self.page
        page.put(f"A{row}", "How to read the cells", "block", merge=f"D{row}")
        page.put(f"F{row}", "Cautions and scope", "block", merge=f"K{row}")
        for offset, (style, text) in enumerate(
            (
                ("input", "typed, with its document, on the sheet Inputs"),
                ("allowance", "loads and power factors of the curve, sheet Curve"),
                ("result", "worked out by a formula"),
            ),
            1,
        ):
            page.put(f"A{row + offset}", 1.23, style, "ratio2")
            page.put(f"B{row + offset}", text, "label", merge=f"D{row + offset}")
            page.height(row + offset, 0.6)
        page.put(f"F{row + 1}", CAUTION, "caution", merge=f"K{row + 3}")
        page.put(
            f"A{row + 4}",
            "Friction, windage and core loss stay with load; stator copper and stray loss go with the square "
            "of the current, field copper and excitation with the square of the field current, which the "
            "phasor diagram gives from the two currents of the certificate: an estimate away from both. "
            "Uncertainty of the losses is not weighed here.",
            "note",
            merge=f"K{row + 4}",
        )
        page.height(row + 4, 0.8)

    def draw(self):
        """The chart; after the figures of all sheets stand."""
        page = self.page
        width = sum(WIDTHS.values())
        top = page.sheet.getCellRangeByName(f"A{CHART_ROW}").Position.Y / 1000
        chart = Chart(page.document, page.sheet, "efficiency", (0, top + 0.1), (width, CHART_HEIGHT - 0.2))
        chart.title("Efficiency of the generator over load")
        chart.axis("X", "Apparent power over rated apparent power, %", 0.2, 1.1, 0.1, "0 %")
        chart.axis("Y", "Efficiency, %", 0.965, 0.992, 0.005, "0.0 %")
        for (loads, efficiencies, legend), color, dash in zip(
            curve.lines(), (PLUM, OCHRE, SLATE), (None, STROKE, None)
        ):
            chart.line(loads, efficiencies, color, 70, legend, dash)
        for name, legend, color in (("guarantee", "$O$12", INK), ("run", "$O$13", OCHRE)):
            x, y = (curve_cell(page, f"point_{name}_{axis}") for axis in "xy")
            chart.points(x, y, color, 260, f"${curve.NAME}.{legend}")
        chart.finish()
        chart.plot_area(1.9, 1.2, width - 2.9, CHART_HEIGHT - 3.6)
        chart.legend()


def curve_cell(page, name):
    """A named cell of the curve as a chart names it."""
    return page.document.model.NamedRanges.getByName(name).getContent()
