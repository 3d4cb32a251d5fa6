"""The sheet "Recomputation": the supplier's figures on the left, what follows from them on the right."""

from styles import style_by_content
from supplier_check import figures, lines
from writer import Page

NAME = "Recomputation"
FIRST_POINT = 6

PLANT_FORMATS = {"fraction": "percent2", "power": "power2"}

UNIT_OF = {  # kind of quantity: named cell with its unit in the chosen set
    "pressure": "unit_pressure",
    "flow": "unit_flow",
    "power": "unit_power",
    "enthalpy": "unit_enthalpy",
}


class Recomputation:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)
        self.row = 0
        self.formulas = {}  # of the cells that hold a reading, by name; they refer to names alone

    def build(self):
        page = self.page
        page.widths(
            {
                "A": 1.1,
                "B": 5.4,
                "C": 2.0,
                "D": 2.0,
                "E": 2.3,
                "F": 2.3,
                "G": 2.4,
                "H": 0.4,
                "I": 2.2,
                "J": 2.3,
                "K": 1.7,
                "L": 2.3,
                "M": 8.2,
                "N": 2.3,
                "O": 2.2,
            }
        )
        page.put("A1", "Supplier's sheet and recomputation", "title")
        page.put("A2", "=site_name&\"; \"&supplier_name&\", \"&sheet_name", "subtitle")
        page.height(1, 0.9)
        self._band(3, "As the supplier states it", '="Recomputed by Busbar in unit set """&unit_set&""""')
        self._points()
        self._plant()
        top = self.row + 2
        self._uncertainty(top)
        self._expansion(top)
        self._claims()
        self._chain()
        self._trade()
        self._limits()
        page.freeze(2, 3)
        page.repeat_rows(1, 3)

    # --- Frame

    def _band(self, row, left, right):
        self.page.put(f"A{row}", left, "block", merge=f"G{row}")
        self.page.put(f"I{row}", right, "block", merge=f"O{row}")

    def _headings(self, row, headings):
        """{"C": text, "I:K": text}"""
        for columns, text in headings.items():
            first, _, last = columns.partition(":")
            merge = f"{last}{row}" if last else None
            left = first in ("A", "B", "I") and not (first == "I" and not last)
            style = "heading left" if left or first == "M" else "heading"
            self.page.put(f"{first}{row}", text, style, merge=merge)

    # --- Block 1: states

    def _points(self):
        page = self.page
        units = figures.STATED_UNITS
        self._headings(
            4,
            {
                "A": "",
                "B": "State",
                "C": "Pressure",
                "D": "Measured from",
                "E": "Temperature",
                "F": "Dryness",
                "G": "Flow",
                "I": "Absolute pressure",
                "J": "Temperature",
                "K": "Dryness",
                "L": "Flow",
                "M": "Stream (its exact text is on the sheet Evidence)",
                "N": "Enthalpy",
                "O": "Entropy",
            },
        )
        page.height(4, 0.95)
        page.put("A5", "", "heading")
        page.put("B5", "unit", "heading left")
        page.put("C5", units["pressure"], "input text", name="stated_unit_pressure")
        page.put("D5", "", "heading")
        page.put("E5", units["temperature"], "input text", name="stated_unit_temperature")
        page.put("F5", "kg/kg", "heading")
        page.put("G5", units["flow"], "input text", name="stated_unit_flow")
        for column, unit in (
            ("I", "=unit_pressure"),
            ("J", "=unit_temperature"),
            ("K", "kg/kg"),
            ("L", "=unit_flow"),
            ("M", "=\"face in \"&unit_pressure&\", \"&unit_temperature&\", \"&unit_flow"),
            ("N", "=unit_enthalpy"),
            ("O", "=unit_entropy"),
        ):
            page.put(f"{column}5", unit, "heading left" if column == "M" else "heading")
        for offset, point in enumerate(figures.POINTS):
            self._point(FIRST_POINT + offset, *point)
        last = FIRST_POINT + len(figures.POINTS) - 1
        page.allow(
            f"D{FIRST_POINT}:D{last}",
            ("absolute", "gauge"),
            "Measured from",
            "Write absolute or gauge: neither passes for the other.",
        )
        page.name_range("streams", page.reference(f"M{FIRST_POINT}:M{last}"))
        self.row = last

    def _point(self, row, tag, name, pressure, reference, temperature, dryness, flow, key):
        page = self.page
        page.put(f"A{row}", tag, "label")
        page.put(f"B{row}", name, "label")
        page.put(f"C{row}", pressure, "input", "pressure", name=f"stated_{key}_pressure")
        page.put(f"D{row}", reference, "input text", name=f"stated_{key}_reference")
        page.put(f"E{row}", temperature, "input", "temperature", name=f"stated_{key}_temperature")
        page.put(f"F{row}", dryness, "input", "dryness", name=f"stated_{key}_dryness")
        page.put(f"G{row}", flow, "input", "ratio", name=f"stated_{key}_flow")
        stated = f"stated_{key}"
        converted = f"CONVERT_UNIT({stated}_pressure;stated_unit_pressure;unit_pressure)"
        for column, what, formula in (
            (
                "I",
                "pressure",
                f'IF({stated}_reference="absolute";{converted};'
                f'IF({stated}_reference="gauge";'
                f"ABSOLUTE_PRESSURE({converted};ambient_pressure;unit_set);NA()))",
            ),
            (
                "J",
                "temperature",
                f"IF(ISNUMBER({stated}_temperature);"
                f'CONVERT_UNIT({stated}_temperature;stated_unit_temperature;unit_temperature);"")',
            ),
            ("K", "dryness", f'IF(ISNUMBER({stated}_dryness);{stated}_dryness;"")'),
            ("L", "flow", f"CONVERT_UNIT({stated}_flow;stated_unit_flow;unit_flow)"),
        ):
            self._reading(f"{column}{row}", f"{key}_{what}", "=" + formula, what)
        page.put(
            f"M{row}",
            f"=TAGGED(IF(ISNUMBER(K{row});STEAM_AT_DRYNESS(I{row};K{row};L{row};unit_set);"
            f"STEAM(I{row};J{row};L{row};unit_set));A{row})",
            "stream",
            name=key,
        )
        page.put(f"N{row}", f"=ENTHALPY_OF(M{row};unit_set)", "result", "enthalpy")
        page.put(f"O{row}", f"=ENTROPY_OF(M{row};unit_set)", "result", "entropy", name=f"{key}_entropy")

    def _reading(self, address, name, formula, fmt):
        """A cell with a reading in the chosen units; the sheet Uncertainty moves it."""
        self.formulas[name] = formula
        self.page.put(address, formula, "result", fmt, name=name)

    # --- Block 2: fuel, power, losses

    def _plant(self):
        page = self.page
        row = self.row + 2
        self._band(row, "Fuel, power and losses", "The same in the chosen unit set")
        row += 1
        self._headings(
            row,
            {
                "A": "",
                "B": "Item",
                "C": "Value",
                "D": "Unit",
                "E:G": "Remark of the supplier",
                "I:K": "Item",
                "L": "Value",
                "M": "Name of the cell in formulas",
                "N:O": "Unit",
            },
        )
        for key, name, value, unit, kind in figures.PLANT:
            row += 1
            page.put(f"A{row}", "", "label")
            page.put(f"B{row}", name, "label")
            fmt = "percent" if kind == "fraction" else "pressure" if kind == "pressure" else "given"
            page.put(f"C{row}", value, "input", fmt, name=f"stated_{key}")
            page.put(
                f"D{row}",
                unit or NO_UNIT,
                "input text" if unit else "label",
                name=f"stated_{key}_unit",
            )
            remark = figures.REMARKS.get(key, "")
            page.put(f"E{row}", remark, "label", merge=f"G{row}")
            page.put(f"I{row}", name, "label", merge=f"K{row}")
            formula = f"=stated_{key}"
            if unit:
                formula = f"=CONVERT_UNIT(stated_{key};stated_{key}_unit;{UNIT_OF[kind]})"
            self._reading(f"L{row}", key, formula, PLANT_FORMATS.get(kind, kind))
            page.put(f"M{row}", key, "result text")
            page.put(
                f"N{row}", f"={UNIT_OF[kind]}" if unit else "%", "result centred", merge=f"O{row}"
            )
        auxiliaries = row - figures.AUXILIARIES + 1
        page.name_range("auxiliary_list", page.reference(f"L{auxiliaries}:L{row}"))
        self.row = row

    # --- Block 3: stated uncertainty, and the expansion in sections

    def _uncertainty(self, row):
        page = self.page
        page.put(f"A{row}", "Uncertainty of the readings, 95 % coverage", "block", merge=f"G{row}")
        row += 1
        self._headings(
            row,
            {
                "A": "",
                "B": "Readings",
                "C": "As stated, ±",
                "D": "Auditor's allowance",
                "E": "Unit",
                "F": "Used, ±",
                "G": "From",
            },
        )
        page.height(row, 0.95)
        for key, name, stated, allowance, unit in figures.UNCERTAINTIES:
            row += 1
            fmt = "percent2" if unit is None else "given"
            page.put(f"A{row}", "", "label")
            page.put(f"B{row}", name, "label")
            page.put(f"C{row}", stated, "input", fmt, name=f"stated_{key}")
            page.put(f"D{row}", allowance, "allowance", fmt)
            page.put(f"E{row}", unit or "% of reading", "label")
            page.put(f"F{row}", f"=IF(ISNUMBER(C{row});C{row};D{row})", "result", fmt, name=key)
            page.put(
                f"G{row}",
                f'=IF(ISNUMBER(C{row});"supplier";"allowance")',
                "result centred",
                name=f"{key}_from",
            )
        self.row = row

    def _expansion(self, row):
        page = self.page
        page.put(f"I{row}", "Expansion in sections, from the states above", "block", merge=f"O{row}")
        row += 1
        self._headings(
            row,
            {
                "I:K": "Section",
                "L": '="Flow, "&unit_flow',
                "M": "From, to",
                "N": '="Power, "&unit_power',
                "O": '="Entropy rise, "&unit_entropy',
            },
        )
        first = row + 1
        for name, inlet, outlet, flow in lines.SECTIONS:
            row += 1
            page.put(f"I{row}", name, "label", merge=f"K{row}")
            page.put(f"L{row}", flow, "result", "flow")
            page.put(f"M{row}", f"{_words(inlet)} → {_words(outlet)}", "result text")
            page.put(
                f"N{row}",
                f"=FLUID_POWER(SET_FLOW({inlet};L{row};unit_set);"
                f"SET_FLOW({outlet};L{row};unit_set);unit_set)",
                "result",
                "power",
            )
            page.put(f"O{row}", f"={outlet}_entropy-{inlet}_entropy", "result", "entropy")
        row += 1
        self._line(
            row,
            "Power of the fluid in the turbine",
            f"=SUM(N{first}:N{row - 1})",
            "power",
            "sum of the sections",
            "=unit_power",
            "turbine_fluid",
        )
        row += 1
        self._headings(
            row,
            {
                "I:K": "Stage",
                "L": "Efficiency",
                "M": "How",
                "N": "Entropy rise",
                "O": "Second law",
            },
        )
        for name, key, formula, rise in lines.STAGES:
            row += 1
            page.put(f"I{row}", name, "label", merge=f"K{row}")
            page.put(f"L{row}", "=" + formula, "key", "percent", name=f"efficiency_{key}")
            how = "inlet to outlet, against the isentropic change"
            page.put(f"M{row}", how, "result text")
            page.put(f"N{row}", f"={rise}", "result", "entropy", name=f"entropy_rise_{key}")
            page.put(
                f"O{row}", f'=IF(N{row}<0;"{BROKEN}";"holds")', "result centred", name=f"second_law_{key}"
            )
        style_by_content(page.sheet.getCellRangeByName(f"O{row - 3}:O{row}"), {BROKEN: "impossible"})
        self.row = max(self.row, row)

    def _line(self, row, label, formula, fmt, how, unit, name, style="result"):
        """One figure of the right-hand side."""
        page = self.page
        page.put(f"I{row}", label, "label", merge=f"K{row}")
        page.put(f"L{row}", formula, style, fmt, name=name)
        page.put(f"M{row}", how, "result text")
        page.put(f"N{row}", unit, "result centred", merge=f"O{row}")

    # --- Block 4: claims, and the chain from fuel to net output

    def _claims(self):
        page = self.page
        row = self.row + 2
        page.break_before(row)
        self.top_of_chain = row
        page.put(f"A{row}", "Claims of the supplier", "block", merge=f"G{row}")
        row += 1
        self._headings(
            row,
            {
                "A": "",
                "B": "Claim",
                "C": "Value",
                "D": "Unit",
                "E": "Heating value",
                "F": "Boundary",
                "G": "Basis",
            },
        )
        first = row + 1
        for tag, key, name, value, unit, basis, boundary in figures.CLAIMS:
            row += 1
            page.put(f"A{row}", tag, "label")
            page.put(f"B{row}", name, "label")
            if value is None:
                page.put(f"C{row}", "=stated_gross_power", "result", "given", name=f"stated_claim_{key}")
            else:
                fmt = "percent" if unit is None else "heat_rate" if value > 1000 else "given"
                page.put(f"C{row}", value, "input", fmt, name=f"stated_claim_{key}")
            style = "label" if unit is None or value is None else "input text"
            page.put(f"D{row}", unit or NO_UNIT, style, name=f"stated_claim_{key}_unit")
            for column, word, what in (("E", basis, "basis"), ("F", boundary, "boundary")):
                fixed = word == figures.NOT_NEEDED or value is None
                page.put(
                    f"{column}{row}",
                    word,
                    "result centred" if fixed else "input text",
                    name=f"claim_{key}_{what}",
                )
            page.put(
                f"G{row}",
                f'=IF(AND(E{row}<>"";F{row}<>"");"{STATED}";"NOT STATED")',
                "result centred",
                name=f"claim_{key}_stated",
            )
        style_by_content(page.sheet.getCellRangeByName(f"G{first}:G{row}"), {"NOT STATED": "unstated"})
        message = "Leave the cell empty where the supplier states nothing."
        page.allow(f"E{first}:E{row}", ("LHV", "HHV", figures.NOT_NEEDED), "Heating value", message)
        page.allow(f"F{first}:F{row}", ("gross", "net", figures.NOT_NEEDED), "Boundary", message)
        self.row = row

    def _chain(self):
        row = self.top_of_chain
        self.page.put(f"I{row}", "From fuel to net output", "block", merge=f"O{row}")
        row += 1
        self._headings(row, {"I:K": "Figure", "L": "Value", "M": "How", "N:O": "Unit"})
        for label, formula, fmt, how, unit, name in lines.CHAIN:
            row += 1
            self._line(row, label, formula, fmt, how, unit, name)
            self.formulas[name] = formula
        row += 2
        self.end_of_chain = self._bases(row)

    def _bases(self, row):
        page = self.page
        rate = '="Heat rate, "&unit_heat_rate'
        self._headings(
            row,
            {"I:K": "Unit, by boundary and basis", "L": "Efficiency", "M": "How", "N:O": rate},
        )
        for boundary, source in (("gross", "gross_power"), ("net", "net_output")):
            for basis in ("LHV", "HHV"):
                row += 1
                lower = f"{source}/fuel_heat_lhv"
                formula = (
                    f"={lower}"
                    if basis == "LHV"
                    else f'=EFFICIENCY_ON_BASIS({lower};"LHV";"HHV";higher_heating_value;lower_heating_value)'
                )
                key = f"{boundary}_{basis.lower()}"
                page.put(f"I{row}", f"{boundary.capitalize()}, {basis}", "label", merge=f"K{row}")
                page.put(f"L{row}", formula, "result", "percent", name=f"efficiency_{key}")
                page.put(f"M{row}", f"{boundary} power over fuel heat on {basis}", "result text")
                page.put(
                    f"N{row}",
                    f"=HEAT_RATE(efficiency_{key};unit_set)",
                    "result",
                    "heat_rate",
                    name=f"rate_{key}",
                    merge=f"O{row}",
                )
        for boundary, power, how in (
            ("gross", "gross_power", "heat to the steam over gross power"),
            ("net of feed pumps", "(gross_power-feed_pump_motors)", "feed pump motors taken off"),
        ):
            row += 1
            key = boundary.partition(" ")[0]
            page.put(f"I{row}", f"Turbine, {boundary}", "label", merge=f"K{row}")
            page.put(f"L{row}", f"={power}/heat_added", "result", "percent", name=f"efficiency_turbine_{key}")
            page.put(f"M{row}", how, "result text")
            page.put(
                f"N{row}",
                f"=HEAT_RATE(efficiency_turbine_{key};unit_set)",
                "result",
                "heat_rate",
                name=f"rate_turbine_{key}",
                merge=f"O{row}",
            )
        row += 2
        self._headings(
            row, {"I:K": "Chain of the claimed links", "L": "Link", "M": "How", "N:O": "Unit"}
        )
        first = row + 1
        for label, formula, how in lines.LINKS:
            row += 1
            self._line(row, label, formula, "percent2", how, "%", None)
        row += 1
        self._line(
            row,
            "Gross unit efficiency by chain",
            f"=EFFICIENCY_CHAIN(L{first}:L{row - 1})",
            "percent",
            "a second way to the gross unit efficiency",
            "%",
            "efficiency_by_chain",
            "key",
        )
        return row

    # --- Block 5: ranges of the trade, and limits

    def _trade(self):
        page = self.page
        row = self.row + 2
        page.put(
            f"A{row}",
            "Ranges met in the trade (common practice, no source): never part of a verdict",
            "block",
            merge=f"G{row}",
        )
        row += 1
        self._headings(
            row,
            {"A": "", "B": "Figure", "C": "From", "D": "To", "E": "Unit", "F": "Recomputed", "G": "Inside?"},
        )
        for name, low, high, key in figures.TRADE_RANGES:
            row += 1
            kelvin = key.endswith("_kelvin")
            fmt = "ratio" if kelvin else "percent"
            page.put(f"A{row}", "", "label")
            page.put(f"B{row}", name, "label")
            page.put(f"C{row}", low, "allowance", fmt)
            page.put(f"D{row}", high, "allowance", fmt)
            page.put(f"E{row}", "K" if kelvin else "%", "label")
            page.put(f"F{row}", f"={key}", "result", fmt)
            page.put(
                f"G{row}",
                f'=IF(F{row}<C{row};"below";IF(F{row}>D{row};"above";"inside"))',
                "result centred",
            )
        row += 2
        page.put(f"A{row}", "What this leaves out", "block", merge=f"G{row}")
        page.put(f"A{row + 1}", figures.LEFT_OUT, "note", merge=f"G{row + 12}")
        self.row = row

    def _limits(self):
        page = self.page
        row = self.end_of_chain + 2
        page.put(f"I{row}", "Limits, and an orientation", "block", merge=f"O{row}")
        row += 1
        self._headings(row, {"I:K": "Figure", "L": "Value", "M": "How", "N:O": "Unit"})
        for label, formula, fmt, how, unit, name in lines.LIMITS:
            row += 1
            style = "key" if name == "carnot_limit" else "result"
            self._line(row, label, formula, fmt, how, unit, name, style)


NO_UNIT = "%"
BROKEN = "broken"
STATED = "stated"


def _words(key):
    names = {point[-1]: point[0] + " " + point[1] for point in figures.POINTS}
    return names[key]
