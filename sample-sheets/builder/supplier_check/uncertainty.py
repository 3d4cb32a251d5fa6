"""The sheet "Uncertainty": how far each reading can move each gap, and what that adds up to.

First order, by recomputation: a reading is moved down and up by its uncertainty, everything that
hangs on it is worked out again, and half the difference is its share. Shares add as squares.
Calc's MULTIPLE.OPERATIONS does the recomputation with the very formulas of the other sheets.
"""

from styles import style_by_content
from supplier_check import figures
from supplier_check.claims import RULES
from writer import Page

NAME = "Uncertainty"
FIRST = 5

COLUMNS = "HIJKLMNOPQRST"


# Readings on which no claim hangs, or which another row already moves.
IDLE_POINTS = ("condensate", "cooling_inlet")
MEASURED_FLOWS = ("main_steam", "hot_reheat", "ip_exhaust", "lp_exhaust", "pump_suction")
CALCULATED_FLOWS = ("lp_extraction_upper", "lp_extraction_lower")

CHANGE_FORMATS = {
    "percent": "percent2",
    "power": "small",
    "ratio": "small",
    "heat_rate": "heat_rate2",
}

OF_READING = "of reading"
KELVIN = 'CONVERT_DIFFERENCE(u_temperature;"K";unit_difference)'
MILLIBAR = 'CONVERT_UNIT(u_vacuum;"mbar";unit_pressure)'


def readings():
    """Yields (label, name of the cell, name of its uncertainty, step, format, cell of the unit).

    The step is a formula, or OF_READING where the uncertainty is a share of the reading.
    """
    for tag, name, _, _, temperature, dryness, _, key in figures.POINTS:
        if key in IDLE_POINTS:
            continue
        label = f"{tag} {name}, "
        if key == "lp_exhaust":
            yield label + "pressure", f"{key}_pressure", "u_vacuum", MILLIBAR, "pressure", "unit_pressure"
        else:
            yield label + "pressure", f"{key}_pressure", "u_pressure", OF_READING, "pressure", "unit_pressure"
        if temperature is not None:
            yield (
                label + "temperature",
                f"{key}_temperature",
                "u_temperature",
                KELVIN,
                "temperature",
                "unit_temperature",
            )
        if dryness is not None:
            yield label + "dryness", f"{key}_dryness", "u_dryness", "u_dryness", "dryness", None
        for keys, uncertainty in ((MEASURED_FLOWS, "u_flow"), (CALCULATED_FLOWS, "u_extraction")):
            if key in keys:
                yield label + "flow", f"{key}_flow", uncertainty, OF_READING, "flow", "unit_flow"
    for label, key, uncertainty, fmt, unit in (
        ("Fuel flow", "fuel_flow", "u_fuel", "flow", "unit_flow"),
        ("Higher heating value", "higher_heating_value", "u_heating_value", "enthalpy", "unit_enthalpy"),
        ("Lower heating value", "lower_heating_value", "u_heating_value", "enthalpy", "unit_enthalpy"),
        ("Power at the terminals", "gross_power", "u_power", "power", "unit_power"),
        ("Auxiliary power", "auxiliaries", "u_auxiliary", "power", "unit_power"),
        ("Generator losses", "generator_losses", "u_losses", "power", "unit_power"),
    ):
        yield label, key, uncertainty, OF_READING, fmt, unit
    yield (
        "Mechanical efficiency",
        "mechanical_efficiency",
        "u_mechanical",
        "u_mechanical",
        "percent2",
        None,
    )


class Uncertainty:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self, formulas):
        """`formulas`: {name of a reading: the formula of its cell}."""
        page = self.page
        page.widths({"A": 6.0, "B": 1.5, "C": 1.7, "D": 1.5, "E": 1.6, "F": 1.7, "G": 1.7})
        page.widths({column: 1.75 for column in COLUMNS})
        page.put("A1", "Uncertainty of the gaps", "title")
        page.put(
            "A2",
            "Half the change of each gap (claimed less recomputed) when a reading goes from its value "
            "less to its value plus its uncertainty. First order, readings independent, 95 % coverage.",
            "subtitle",
        )
        page.height(1, 0.9)
        for column, text in zip(
            "ABCDEFG",
            ("Reading", "Unit", "Value", "±", "From", "Value less", "Value plus"),
        ):
            page.put(f"{column}4", text, "heading left" if column == "A" else "heading")
        page.put(
            "H3", "Change of the gap of each claim, in its unit", "block", merge=f"{COLUMNS[-1]}3"
        )
        for column, (tag, key, *_) in zip(COLUMNS, figures.CLAIMS):
            unit = RULES[key][2]
            name = figures.SHORT_NAMES[key]
            text = f'="{tag} {name} "&{unit}' if unit else f"{tag} {name} %"
            page.put(f"{column}4", text, "heading")
        page.height(4, 1.75)
        row = FIRST - 1
        for label, cell, source, relative, fmt, unit in readings():
            row += 1
            self._reading(row, label, cell, source, relative, fmt, unit, formulas[cell])
        style_by_content(page.sheet.getCellRangeByName(f"H{FIRST}:{COLUMNS[-1]}{row}"), {0: "zero"})
        self._totals(FIRST, row)
        page.freeze(1, 4)

    def _reading(self, row, label, cell, source, relative, fmt, unit, formula):
        page = self.page
        page.put(f"A{row}", label, "label")
        page.put(f"B{row}", f"={unit}" if unit else "–", "result centred")
        # The formula anew rather than a reference to the cell: the moved values must not hang on
        # the very cell whose place they take.
        page.put(f"C{row}", formula, "result", fmt)
        step = f"={source}*C{row}" if relative == "of reading" else f"={relative}"
        page.put(f"D{row}", step, "result", "small")
        page.put(f"E{row}", f"={source}_from", "result centred")
        page.put(f"F{row}", f"=C{row}-D{row}", "result", fmt)
        page.put(f"G{row}", f"=C{row}+D{row}", "result", fmt)
        for column, (_, key, *_) in zip(COLUMNS, figures.CLAIMS):
            page.put(
                f"{column}{row}",
                f"=(MULTIPLE.OPERATIONS(gap_{key};{cell};G{row})"
                f"-MULTIPLE.OPERATIONS(gap_{key};{cell};F{row}))/2",
                "result",
                _change_format(key),
            )

    def _totals(self, first, last):
        page = self.page
        total, share = last + 1, last + 2
        page.put(f"A{total}", "Uncertainty of the gap, ±", "heading left", merge=f"G{total}")
        page.put(f"A{share}", "Reading with the largest share", "heading left", merge=f"G{share}")
        page.height(share, 1.5)
        for column, (_, key, *_) in zip(COLUMNS, figures.CLAIMS):
            area = f"{column}{first}:{column}{last}"
            page.put(
                f"{column}{total}",
                f"=SQRT(SUMSQ({area}))",
                "key",
                _change_format(key),
                name=f"uncertainty_{key}",
            )
            page.put(
                f"{column}{share}",
                f"=INDEX($A${first}:$A${last};IF(MAX({area})>=-MIN({area});"
                f"MATCH(MAX({area});{area};0);MATCH(MIN({area});{area};0)))",
                "exact",
                name=f"largest_share_{key}",
            )


def _change_format(key):
    return CHANGE_FORMATS[RULES[key][1]]
