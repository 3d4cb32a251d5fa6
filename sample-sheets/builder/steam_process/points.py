"""The sheet "Lines": the points of every line of the diagrams, and where their labels stand.

Each line is one array formula; the charts read the ranges that stand in `ranges`. Not printed.
"""

from steam_process import figures
from steam_process.balance import FIRST_POINT
from writer import Page, absolute

NAME = "Lines"
TOP = 5  # first row of figures

# Window of the h-s diagram: what the axes of the chart are set to.
ENTROPY = (6.2, 8.6, 0.2)
ENTHALPY = (2100.0, 3800.0, 100.0)

ISOBARS = (200, 130, 80, 50, 35, 20, 12, 7, 4, 2, 1, 0.5, 0.25, 0.12, 0.05, 0.025)
ISOTHERMS = (600, 550, 500, 450, 400, 350, 300, 250, 200, 150, 100, 50)
DRYNESSES = (0.96, 0.92, 0.88, 0.84)
COLDEST = 20  # °C, where the dryness lines end

# Window of the T-s diagram.
TS_ENTROPY = (0, 9, 1)
TS_TEMPERATURE = (0, 600, 50)
TS_HOTTEST = 590  # °C, where its isobars end

TS_ISOBARS = (130, 34, 4.6, 1, 0.05)
TS_DRYNESSES = (0.2, 0.4, 0.6, 0.8)


class Lines:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)
        self.ranges = {}  # name of a line: (x, y) ranges for a chart
        self.labels = []  # (kind, x, y, text) cells
        self._next = 0

    def build(self):
        page = self.page
        page.put("A1", "Lines of the diagrams", "title")
        page.height(1, 0.95)
        page.put(
            "A2",
            "Points by array formulas; a chart lifts its pen at the empty rows. Pressures, temperatures "
            "and dryness of the lines may be changed; the windows are those of the axes of the charts.",
            "subtitle",
        )
        self._constants()
        self._mollier()
        self._temperature_entropy()
        page.freeze(0, TOP - 1)

    # --- Constants and labels

    def _constants(self):
        page = self.page
        s_end, h_end = ENTROPY[1], ENTHALPY[1]
        page.put("A3", "Window of the h-s diagram", "block", merge="D3")
        page.put("A4", "entropy to", "label")
        page.put("B4", s_end, "allowance", "ratio2", name="window_entropy")
        page.put("C4", "enthalpy to", "label")
        page.put("D4", h_end, "allowance", "enthalpy", name="window_enthalpy")
        at = TOP + 1
        at = self._family(
            at,
            "isobar",
            "Isobars, bar",
            ISOBARS,
            "pressure",
            # At the upper edge of the window or, where they leave it there, at its right edge.
            "=MIN(window_entropy;STEAM_ENTROPY_AT_ENTHALPY({c};window_enthalpy))",
            "=IF({x}<window_entropy;window_enthalpy;STEAM_ENTHALPY_AT_ENTROPY({c};window_entropy))",
            '={c}&" bar"',
        )
        at = self._family(
            at,
            "isotherm",
            "Isotherms, °C",
            ISOTHERMS,
            "general",
            "=window_entropy-0.05",
            "=ENTHALPY_OF(STEAM_AT_TEMPERATURE_ENTROPY({c};{x}))",
            '={c}&" °C"',
        )
        at = self._family(
            at,
            "dryness",
            "Dryness",
            DRYNESSES,
            "ratio2",
            f"=ENTROPY_OF(STEAM_AT_TEMPERATURE_DRYNESS({COLDEST};{{c}}))",
            f"=ENTHALPY_OF(STEAM_AT_TEMPERATURE_DRYNESS({COLDEST};{{c}}))",
            '="x = "&FIXED({c};2)',
        )
        at = self._family(
            at,
            "ts_isobar",
            "Isobars of the T-s diagram, bar",
            TS_ISOBARS,
            "pressure",
            f"=MIN({TS_ENTROPY[1]};STEAM_ENTROPY({{c}};{TS_HOTTEST}))",
            f"=IF({{x}}<{TS_ENTROPY[1]};{TS_HOTTEST};STEAM_TEMPERATURE_AT_ENTROPY({{c}};{{x}}))",
            '={c}&" bar"',
        )
        at = self._family(
            at,
            "ts_dryness",
            "Dryness on the T-s diagram",
            TS_DRYNESSES,
            "ratio2",
            f"=ENTROPY_OF(STEAM_AT_TEMPERATURE_DRYNESS({COLDEST};{{c}}))",
            f"={COLDEST}+0*{{c}}",
            '="x = "&FIXED({c};1)',
        )
        self._points_of_process(at)
        page.widths({"A": 3.2, "B": 2.4, "C": 2.6, "D": 2.8, "E": 0.6})

    def _family(self, row, kind, heading, constants, fmt, x, y, text):
        page = self.page
        page.put(f"A{row}", heading, "heading left")
        for column, words in zip("BCD", ("label at x", "label at y", "label")):
            page.put(f"{column}{row}", words, "heading")
        first = row + 1
        for constant in constants:
            row += 1
            page.put(f"A{row}", constant, "allowance", fmt)
            cells = {"c": f"A{row}", "x": f"B{row}"}
            page.put(f"B{row}", x.format(**cells), "result", "entropy")
            page.put(f"C{row}", y.format(**cells), "result", "enthalpy")
            page.put(f"D{row}", text.format(**cells), "result centred")
            self._label(kind, row)
        setattr(self, kind + "s", f"$A${first}:$A${row}")
        return row + 2

    def _label(self, kind, row):
        self.labels.append((kind, *(f"${NAME}.${column}${row}" for column in "BCD")))

    def _points_of_process(self, row):
        """The measured points, on both diagrams."""
        page = self.page
        page.put(f"A{row}", "Measured states", "heading left")
        for column, words in zip("BCD", ("entropy", "enthalpy", "label")):
            page.put(f"{column}{row}", words, "heading")
        first = row + 1
        for tag, _, key in figures.POINTS[:8]:
            row += 1
            page.put(f"A{row}", f"=TEMPERATURE_OF({key})", "result", "temperature")
            page.put(f"B{row}", f"={key}_entropy", "result", "entropy")
            page.put(f"C{row}", f"={key}_enthalpy", "result", "enthalpy")
            page.put(f"D{row}", f"\u00a0{tag}\u00a0", "result centred")
            self._label("point " + tag, row)
            self.labels.append(
                ("ts point " + tag, f"${NAME}.$B${row}", f"${NAME}.$A${row}", f"${NAME}.$D${row}")
            )
        self.ranges["states"] = (f"${NAME}.$B${first}:$B${row}", f"${NAME}.$C${first}:$C${row}")
        self.ranges["ts states"] = (f"${NAME}.$B${first}:$B${row}", f"${NAME}.$A${first}:$A${row}")
        row = self._isentropes(row + 2)
        row = self._cycle(row + 2)
        row += 2
        page.put(f"A{row}", "Words of the legend", "heading left", merge=f"D{row}")
        for key, text in (
            ("legend_dome", "saturation"),
            ("legend_isobars", "isobars, bar"),
            ("legend_isotherms", "isotherms, °C"),
            ("legend_dryness", "dryness x"),
            ("legend_expansion", "expansion through the states"),
            ("legend_heat", "reheat"),
            ("legend_isentropic", "isentropic"),
            ("legend_cycle", "heat taken and given"),
        ):
            row += 1
            page.put(f"A{row}", text, "result text", name=key, merge=f"D{row}")
            self.ranges[key] = f"${NAME}.$A${row}"

    def _isentropes(self, row):
        """Each from the inlet of its stage down to the pressure of the outlet; upright on both axes."""
        page = self.page
        page.put(f"A{row}", "Isentropic ends, °C", "heading left")
        for column, words in zip("BCD", ("entropy", "enthalpy", "")):
            page.put(f"{column}{row}", words, "heading")
        first = row + 1
        for _, key, inlet, _ in figures.STAGES:
            for stream in (inlet, f"isentropic_{key}"):
                row += 1
                page.put(f"A{row}", f"=TEMPERATURE_OF({stream})", "result", "temperature")
                page.put(f"B{row}", f"={inlet}_entropy", "result", "entropy")
                page.put(f"C{row}", f"=ENTHALPY_OF({stream})", "result", "enthalpy")
            row += 1  # lifts the pen
        row -= 1
        x, y, t = (f"${NAME}.${column}${first}:${column}${row}" for column in "BCA")
        self.ranges["isentropes"] = (x, y)
        self.ranges["ts isentropes"] = (x, t)
        return row

    def _cycle(self, row):
        page = self.page
        page.put(f"A{row}", "Way of the heat: exhaust, condensate, feedwater, main steam", "heading left",
                 merge=f"D{row}")
        first = row + 1
        for stream in (
            "=lp_exhaust",
            "=STEAM_AT_DRYNESS(lp_exhaust_pressure;0)",
            "=final_feed",
            "=main_steam",
        ):
            row += 1
            page.put(f"A{row}", stream, "stream", merge=f"D{row}")
        self.cycle = f"$A${first}:$A${row}"
        return row

    # --- Points

    def _array(self, key, heading, formula, rows):
        """Two columns of one array formula; x and y are remembered under the key."""
        page = self.page
        x, y = _letters(5 + self._next), _letters(6 + self._next)
        self._next += 3
        page.widths({x: 2.3, y: 2.3, _letters(4 + self._next): 0.5})
        page.put(f"{x}3", heading, "block", merge=f"{y}3")
        last = TOP + rows - 1
        area = page.sheet.getCellRangeByName(f"{x}{TOP}:{y}{last}")
        area.CellStyle = "Busbar result"
        area.NumberFormat = page.styles.number_format("entropy")
        page.sheet.getCellRangeByName(f"{y}{TOP}:{y}{last}").NumberFormat = page.styles.number_format(
            "enthalpy"
        )
        head = page.sheet.getCellRangeByName(f"{x}{TOP}:{y}{TOP}")
        head.CellStyle = "Busbar heading"
        page.height(TOP, 0.95)
        page.put_array(f"{x}{TOP}:{y}{last}", formula)
        self.ranges[key] = tuple(
            f"${NAME}.{absolute(f'{column}{TOP + 1}')}:{absolute(f'{column}{last}')}" for column in (x, y)
        )

    def _mollier(self):
        s, n = '"h-s"', len
        dry = f"IF({self.isotherms}<373.9;SATURATION_PRESSURE(IF({self.isotherms}<373.9;{self.isotherms};0));400)"
        self._array("dome", "Saturation", f"=SATURATION_DOME({s};120)", 121)
        self._array("isobars", "Isobars", f"=ISOBARS({s};{self.isobars};15;700;40)", 41 * n(ISOBARS))
        self._array("isotherms", "Isotherms", f"=ISOTHERMS({s};{self.isotherms};0.005;{dry};30)", 31 * n(ISOTHERMS))
        self._array(
            "drynesses",
            "Dryness",
            f"=DRYNESS_LINES({s};{self.drynesss};{COLDEST};373.946;40)",
            41 * n(DRYNESSES),
        )
        self._process("h-s", "")

    def _process(self, axes, prefix):
        s = f'"{axes}"'
        rows = {key: FIRST_POINT + at for at, (_, _, key) in enumerate(figures.POINTS)}

        def streams(first, last):
            return f"$Balance.$G${rows[first]}:$G${rows[last]}"

        self._array(prefix + "hp", "HP", f"=EXPANSION_LINE({s};{streams('main_steam', 'hp_exhaust')};20)", 21)
        self._array(prefix + "reheat", "Reheat", f"=HEATING_LINE({s};{streams('hp_exhaust', 'hot_reheat')};20)", 21)
        self._array(prefix + "ip_lp", "IP and LP", f"=EXPANSION_LINE({s};{streams('hot_reheat', 'lp_exhaust')};60)", 61)

    def _temperature_entropy(self):
        s, n = '"T-s"', len
        self._array("ts dome", "Saturation", f"=SATURATION_DOME({s};120)", 121)
        self._array("ts isobars", "Isobars", f"=ISOBARS({s};{self.ts_isobars};15;{TS_HOTTEST};50)", 51 * n(TS_ISOBARS))
        self._array(
            "ts drynesses",
            "Dryness",
            f"=DRYNESS_LINES({s};{self.ts_drynesss};{COLDEST};373.946;40)",
            41 * n(TS_DRYNESSES),
        )
        self._process("T-s", "ts ")
        self._array("ts cycle", "Heat", f"=HEATING_LINE({s};{self.cycle};60)", 61)


def _letters(index):
    """Letters of a column, counted from 0."""
    letters = ""
    index += 1
    while index:
        index, rest = divmod(index - 1, 26)
        letters = chr(65 + rest) + letters
    return letters
