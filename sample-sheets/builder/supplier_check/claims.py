"""The sheet "Tests": every claim against its limit and against the supplier's own figures.

One row a claim, the same formulas in every row. The words of the report follow below the numbers.
"""

from styles import style_by_content, style_verdicts
from supplier_check import figures
from writer import Page

NAME = "Tests"
FIRST = 5

# What decided a verdict, in the order in which the tests are asked.
LIMIT = "limit broken"
BALANCE = "own figures broken"
UNSTATED = "basis not stated"
REFUTED = "inlet refuted"
TOUCHING = "at the limit"
COARSE = "readings too coarse"
MODEST = "below own figures"
AGREES = "agrees"
FAILED = "not recomputed"
BLANK = "no claim"

# The cycle gives at most Carnot's share of the heat, pump power taken off; gross power is before
# that is taken off. Fuel gives at most its higher heating value.
_BOILER_LIMIT = 'IF(claim_boiler_basis="HHV";1;higher_heating_value/lower_heating_value)'
_UNIT_LIMIT = "gross_limit*IF({}=\"HHV\";1;higher_heating_value/lower_heating_value)"


def _by_basis(key, kind):
    """The figure on the basis and boundary stated; where one is not, the reading most in favour."""
    return (
        f'IF(claim_{key}_boundary="net";'
        f'IF(claim_{key}_basis="HHV";{kind}_net_hhv;{kind}_net_lhv);'
        f'IF(claim_{key}_basis="HHV";{kind}_gross_hhv;{kind}_gross_lhv))'
    )


# key: (better is, format, unit, recomputed, limit, what the limit says)
RULES = {
    "hp": ("higher", "percent", None, "efficiency_hp", "1", "no stage is better than isentropic"),
    "ip": ("higher", "percent", None, "efficiency_ip", "1", "no stage is better than isentropic"),
    "lp": ("higher", "percent", None, "efficiency_lp", "1", "no stage is better than isentropic"),
    "pump": ("higher", "percent", None, "efficiency_pump", "1", "no pump is better than isentropic"),
    "terminal": (
        "lower",
        "ratio",
        "unit_difference",
        "terminal_difference",
        "0",
        "heat does not flow from the colder to the warmer",
    ),
    "rejected": (
        "lower",
        "power",
        "unit_power",
        "heat_rejected",
        'entropy_added*CONVERT_UNIT(condensing;unit_temperature;"K")',
        "the entropy taken in has to leave",
    ),
    "generator": ("higher", "percent", None, "efficiency_generator", "1", "no more power out than in"),
    "gross": (
        "higher",
        "power",
        "unit_power",
        "gross_from_states",
        "gross_limit*heat_added",
        "Carnot at the mean temperature of heating",
    ),
    "net": ("higher", "power", "unit_power", "net_output", "gross_power", "net is below gross"),
    "cycle": (
        "lower",
        "heat_rate",
        "unit_heat_rate",
        'IF(claim_cycle_boundary="net";rate_turbine_net;rate_turbine_gross)',
        "HEAT_RATE(gross_limit;unit_set)",
        "Carnot at the mean temperature of heating",
    ),
    "boiler": (
        "higher",
        "percent",
        None,
        'heat_added/IF(claim_boiler_basis="HHV";fuel_heat_hhv;fuel_heat_lhv)',
        _BOILER_LIMIT,
        "no more heat out than fuel heat on HHV",
    ),
    "unit": (
        "higher",
        "percent",
        None,
        _by_basis("unit", "efficiency"),
        _UNIT_LIMIT.format("claim_unit_basis"),
        "Carnot at the mean temperature of heating",
    ),
    "heat_rate": (
        "lower",
        "heat_rate",
        "unit_heat_rate",
        _by_basis("heat_rate", "rate"),
        "HEAT_RATE(" + _UNIT_LIMIT.format("claim_heat_rate_basis") + ";unit_set)",
        "Carnot at the mean temperature of heating",
    ),
}

# Differences are shown with a digit more.
FINER = {"percent": "percent2", "power": "power2", "ratio": "ratio2", "heat_rate": "heat_rate2"}

# Stages whose inlet is the exhaust of a stage that another claim is about.
INLET_OF = {"lp": "ip"}


class Tests:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)
        self.rows = {}

    def build(self):
        page = self.page
        page.widths(
            {
                "A": 1.1,
                "B": 5.0,
                "C": 1.6,
                "D": 2.2,
                "E": 2.4,
                "F": 2.4,
                "G": 2.3,
                "H": 2.3,
                "I": 4.8,
                "J": 2.2,
                "K": 2.4,
                "L": 2.3,
                "M": 1.8,
                "N": 3.4,
                "O": 3.9,
                "P": 1.3,
            }
        )
        page.put("A1", "Tests of the claims", "title")
        page.put(
            "A2",
            "Each claim against a limit of nature and against the supplier's own figures; both gaps "
            "are weighed with the uncertainty of the readings (sheet Uncertainty).",
            "subtitle",
        )
        page.height(1, 0.9)
        for column, text in zip(
            "ABCDEFGHIJKLMNOP",
            (
                "",
                "Claim",
                "Better is",
                "Claimed",
                "Recomputed",
                "Gap: claimed less recomputed",
                "Uncertainty of the gap, ±",
                "Limit",
                "What the limit says",
                "Past the limit by",
                "Better than own figures by",
                "Not stated",
                "Inlet refuted by",
                "Decided by",
                "Verdict",
                "Text form",
            ),
        ):
            page.put(f"{column}4", text, "heading left" if column in "BI" else "heading")
        page.height(4, 1.35)
        for offset, claim in enumerate(figures.CLAIMS):
            self.rows[claim[1]] = FIRST + offset
        for claim in figures.CLAIMS:
            self._numbers(*claim[:3])
        last = FIRST + len(figures.CLAIMS) - 1
        style_verdicts(page.sheet.getCellRangeByName(f"O{FIRST}:O{last}"))
        area = page.sheet.getCellRangeByName(f"L{FIRST}:L{last}")
        style_by_content(
            area, {word: "unstated" for word in ("heating value", "boundary", "heating value, boundary")}
        )
        page.put(
            f"A{last + 1}",
            "Where a basis or boundary is not stated, the reading most in favour of the claim stands "
            "under Recomputed: if even that fails, the claim is impossible on any.",
            "note",
            merge=f"P{last + 1}",
        )
        self._words(last + 3)
        page.freeze(2, 4)

    def _numbers(self, tag, key, name):
        page = self.page
        row = self.rows[key]
        better, fmt, unit, recomputed, limit, limit_name = RULES[key]
        page.put(f"A{row}", tag, "label")
        page.put(f"B{row}", name, "label")
        page.put(f"C{row}", better, "result centred")
        page.put(f"D{row}", self._claimed(key, unit), "result", fmt, name=f"claim_{key}")
        page.put(f"E{row}", f"={recomputed}", "key", fmt, name=f"recomputed_{key}")
        fine = FINER.get(fmt, fmt)
        page.put(f"F{row}", f"=N(D{row})-E{row}", "result", fine, name=f"gap_{key}")
        page.put(f"G{row}", f"=uncertainty_{key}", "result", fine)
        page.put(f"H{row}", f"={limit}", "result", fmt, name=f"limit_{key}")
        page.put(f"I{row}", limit_name, "label wrapped")
        page.height(row, 0.85)
        sign = f'IF(C{row}="higher";1;-1)'
        page.put(
            f"J{row}", f"=MAX({sign}*(N(D{row})-H{row});{sign}*(E{row}-H{row}))", "result", fine
        )
        page.put(f"K{row}", f"={sign}*F{row}", "result", fine)
        page.put(
            f"L{row}",
            f'=IF(claim_{key}_basis="";"heating value";"")'
            f'&IF(AND(claim_{key}_basis="";claim_{key}_boundary="");", ";"")'
            f'&IF(claim_{key}_boundary="";"boundary";"")',
            "result centred",
        )
        inlet = INLET_OF.get(key)
        refuted = "–"
        if inlet:
            other = self.rows[inlet]
            refuted = f'=IF(N{other}="{LIMIT}";A{other};"–")'
        page.put(f"M{row}", refuted, "result centred")
        page.put(f"N{row}", self._decided(row), "result text")
        page.put(
            f"O{row}",
            f'=IF(OR(N{row}="{LIMIT}";N{row}="{BALANCE}");"impossible";'
            f'IF(N{row}="{AGREES}";"consistent";"not shown impossible"))',
            "result centred",
            name=f"verdict_{key}",
        )
        if fmt == "percent":
            page.put(f"P{row}", "0.0 %", "result centred")
        else:
            page.put(
                f"P{row}",
                f'=IF(ABS(D{row})>=1000;"#,##0";IF(ABS(D{row})>=3;"0.0";"0.000"))',
                "result centred",
            )

    @staticmethod
    def _claimed(key, unit):
        if key == "gross":
            return "=gross_power"
        stated = f"stated_claim_{key}"
        if unit is None:
            value = stated
        elif key == "terminal":
            value = f"CONVERT_DIFFERENCE({stated};{stated}_unit;{unit})"
        else:
            value = f"CONVERT_UNIT({stated};{stated}_unit;{unit})"
        return f'=IF(ISNUMBER({stated});{value};"")'

    @staticmethod
    def _decided(row):
        tests = (
            (f"ISERROR(N(D{row})+E{row}+G{row}+H{row})", FAILED),
            (f"NOT(ISNUMBER(D{row}))", BLANK),
            (f"J{row}>G{row}", LIMIT),
            (f'AND(L{row}<>"";K{row}>G{row})', BALANCE),
            (f'L{row}<>""', UNSTATED),
            (f'M{row}<>"–"', REFUTED),
            (f"J{row}>0", TOUCHING),
            (f"ABS(H{row}-D{row})<=G{row}", COARSE),
            (f"K{row}>G{row}", BALANCE),
            (f"K{row}<-G{row}", MODEST),
        )
        formula = f'"{AGREES}"'
        for condition, word in reversed(tests):
            formula = f'IF({condition};"{word}";{formula})'
        return "=" + formula

    # --- Words

    def _words(self, row):
        page = self.page
        page.put(f"A{row}", "In words, for the report", "block", merge=f"P{row}")
        row += 1
        for columns, text in (
            ("A", ""),
            ("B", "Claim"),
            ("C:D", "Recomputed"),
            ("E", "Uncertainty"),
            ("F:G", "Past the limit by"),
            ("H", "Better by"),
            ("I", "Largest share of the uncertainty"),
            ("J:P", "What the claim fits, where basis or boundary could be another"),
        ):
            first, _, last = columns.partition(":")
            style = "heading left" if first in "BIJ" else "heading"
            page.put(f"{first}{row}", text, style, merge=f"{last}{row}" if last else None)
        self.words = {}
        for tag, key, name, *_ in figures.CLAIMS:
            row += 1
            self.words[key] = row
            numbers = self.rows[key]
            unit = RULES[key][2]
            page.put(f"A{row}", tag, "label")
            page.put(f"B{row}", name, "label")
            value = self._in_words(f"E{numbers}", numbers, unit, False)
            page.put(f"C{row}", "=" + value, "result centred", merge=f"D{row}")
            page.put(
                f"E{row}", '="±"&' + self._in_words(f"G{numbers}", numbers, unit, True), "result centred"
            )
            page.put(
                f"F{row}",
                "=" + self._in_words(f"J{numbers}", numbers, unit, True),
                "result centred",
                merge=f"G{row}",
            )
            page.put(
                f"H{row}", "=" + self._in_words(f"K{numbers}", numbers, unit, True), "result centred"
            )
            page.put(f"I{row}", f"=largest_share_{key}", "result text")
            page.put(f"J{row}", self._fits(key, numbers), "result text", merge=f"P{row}")

    @staticmethod
    def _in_words(cell, row, unit, difference):
        if unit is not None:
            return f'TEXT({cell};P{row})&" "&{unit}'
        if difference:
            return f'TEXT(100*{cell};"0.0")&" points"'
        return f"TEXT({cell};P{row})"

    @staticmethod
    def _fits(key, row):
        choices = {
            "cycle": (("gross", "rate_turbine_gross"), ("net of feed pumps", "rate_turbine_net")),
            "unit": tuple(
                (f"{boundary} on {basis}", f"efficiency_{boundary}_{basis.lower()}")
                for boundary in ("gross", "net")
                for basis in ("LHV", "HHV")
            ),
            "heat_rate": tuple(
                (f"{boundary} on {basis}", f"rate_{boundary}_{basis.lower()}")
                for boundary in ("gross", "net")
                for basis in ("LHV", "HHV")
            ),
            "boiler": (
                ("LHV", "heat_added/fuel_heat_lhv"),
                ("HHV", "heat_added/fuel_heat_hhv"),
            ),
        }.get(key)
        if not choices:
            return "–"
        fits = _listed(choices, row, f"ABS(D{row}-{{}})<=G{row}")
        return (
            f'=IF(L{row}="";"";"It would be "&{_listed(choices, row, "TRUE()")}&". ")'
            f'&IF({fits}="";"The claim fits no other basis or boundary either.";'
            f'"The claim fits "&{fits}&".")'
        )


def _listed(choices, row, condition):
    """A formula that lists the choices for which the condition holds."""
    parts = "&".join(
        f'IF({condition.format(cell)};", "&TEXT({cell};P{row})&" {words}";"")' for words, cell in choices
    )
    return f"MID({parts};3;999)"
