"""The sheet "Evidence": exact streams, the reasons of chosen cells, published sources, unit table."""

from supplier_check import figures
from supplier_check.recomputation import FIRST_POINT
from supplier_check.recomputation import NAME as RECOMPUTATION
from writer import Page

NAME = "Evidence"

# quantity: (name of the cell, metric, us, si)
UNITS = (
    ("Pressure", "unit_pressure", "bar", "psia", "Pa"),
    ("Temperature", "unit_temperature", "°C", "°F", "K"),
    ("Temperature difference", "unit_difference", "K", "°F", "K"),
    ("Enthalpy, heating value", "unit_enthalpy", "kJ/kg", "Btu/lb", "J/kg"),
    ("Entropy", "unit_entropy", "kJ/(kg K)", "Btu/(lb °F)", "J/(kg K)"),
    ("Flow", "unit_flow", "kg/s", "lb/h", "kg/s"),
    ("Power", "unit_power", "MW", "MW", "W"),
    ("Heat rate", "unit_heat_rate", "kJ/kWh", "Btu/kWh", "J/J"),
)

REASONS = (
    ("HP stage efficiency", "WHY(efficiency_hp)"),
    ("IP stage efficiency", "WHY(efficiency_ip)"),
    ("Feed pump efficiency", "WHY(efficiency_pump)"),
    ("Main steam", "WHY(main_steam)"),
    ("IP exhaust: why no dryness", 'WHY_CALL("DRYNESS_OF";ip_exhaust)'),
    ("LP exhaust", "WHY(lp_exhaust)"),
    ("Carnot limit", "WHY(carnot_limit)"),
    ("Curzon–Ahlborn", "WHY(curzon_ahlborn_value)"),
    ("Unit efficiency on HHV", "WHY(efficiency_gross_hhv)"),
)

FUNCTIONS = (
    "STEAM",
    "TURBINE_EFFICIENCY",
    "PUMP_EFFICIENCY",
    "FLUID_POWER",
    "HEAT_DUTY",
    "MEAN_HEATING_TEMPERATURE",
    "CARNOT",
    "CURZON_AHLBORN",
    "EFFICIENCY_ON_BASIS",
    "HEAT_RATE",
    "EFFICIENCY_CHAIN",
    "GENERATOR_POWER",
    "NET_POWER",
    "SHAFT_POWER",
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

LAST_ROW_OF_UNITS = 4 + len(UNITS)


class Evidence:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def _units(self):
        page = self.page
        page.widths({"A": 5.2, **{column: 3.6 for column in "BCDEFGHI"}})
        page.put("A1", "Evidence", "title")
        page.height(1, 0.9)
        page.put("A3", "Units of the results", "block", merge="I3")
        for column, text in zip("ABCDEF", ("Quantity", "metric", "us", "si", "Chosen", "Name in formulas")):
            merge = "I4" if column == "F" else None
            page.put(f"{column}4", text, "heading left" if column in "AF" else "heading", merge=merge)
        for row, (quantity, name, *symbols) in enumerate(UNITS, 5):
            page.put(f"A{row}", quantity, "label")
            for column, symbol in zip("BCD", symbols):
                page.put(f"{column}{row}", symbol, "result centred")
            page.put(
                f"E{row}", f"=INDEX(B{row}:D{row};MATCH(unit_set;$B$4:$D$4;0))", "key centred", name=name
            )
            page.put(f"F{row}", name, "result text", merge=f"I{row}")

    def build(self):
        page = self.page
        self._units()
        row = LAST_ROW_OF_UNITS + 2
        page.put(f"A{row}", "Streams, exact: the whole state is in the text", "block", merge=f"I{row}")
        for offset, (tag, name, *_) in enumerate(figures.POINTS):
            row += 1
            page.put(f"A{row}", f"{tag} {name}", "label")
            source = f"${RECOMPUTATION}.$M${FIRST_POINT + offset}"
            page.put(f"B{row}", f"={source}", "exact", merge=f"I{row}")
        row += 2
        page.put(f"A{row}", "Properties of the streams, by STREAM_TABLE", "block", merge=f"I{row}")
        row = self._table(row + 1)
        page.break_before(row + 2)
        row = self._sentences(row + 2, "Reasons, asked with WHY", REASONS, "={}", 3)
        functions = [(name, name) for name in FUNCTIONS]
        heading = "Published sources, asked with PUBLISHED_SOURCE"
        self._sentences(row + 2, heading, functions, '=PUBLISHED_SOURCE("{}")', 0)

    def _table(self, first):
        """One array formula for headings and figures; the last row it fills."""
        page = self.page
        last = first + len(figures.POINTS)
        for column, (style, fmt) in zip("ABCDEFGH", TABLE_COLUMNS):
            page.put(f"{column}{first}", None, "heading")
            for row in range(first + 1, last + 1):
                page.put(f"{column}{row}", None, style, fmt)
        page.put_array(f"A{first}:H{last}", "=STREAM_TABLE(streams;unit_set)")
        return last

    def _sentences(self, row, heading, lines, formula, long_lines):
        page = self.page
        page.put(f"A{row}", heading, "block", merge=f"I{row}")
        for number, (name, asked) in enumerate(lines):
            row += 1
            page.put(f"A{row}", name, "label")
            page.put(f"B{row}", formula.format(asked), "exact", merge=f"I{row}")
            page.height(row, 1.2 if number < long_lines else 0.8 if long_lines else 0.48)
        return row
