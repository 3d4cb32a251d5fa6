"""The first sheet, "Verdicts": what the auditor signs. Table, legend, scope and cautions."""

from styles import style_by_content, style_verdicts
from supplier_check import claims, figures
from writer import Page

NAME = "Verdicts"
HEADINGS = 9
FIRST = HEADINGS + 1

CAUTION = (
    "For appraisal only. Nothing here may be used to set, size or test a safety device, a trip or a "
    "control. Local codes and licensed practice govern. Steam, feedwater and flue gas are hot and "
    "under pressure and generators carry high voltage: readings are taken by qualified people under "
    "the rules of the site."
)


MEANINGS = {
    "impossible": "the claim, or the states given for it, would break a law of nature or the balance of "
    "the supplier's own figures by more than the uncertainty",
    "not shown impossible": "no such break is proven, yet nothing confirms the claim either; the reason "
    "says what is missing",
    "consistent": "within the uncertainty it follows from the supplier's own figures",
}


class Verdicts:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def _unit_set(self):
        page = self.page
        page.put("B6", "Unit set of all results", "label")
        page.put("C6", "metric", "input text", name="unit_set")
        page.allow(
            "C6",
            ("metric", "us", "si"),
            "Unit set",
            "metric, us or si. Typed figures keep the units that the supplier states.",
        )

    def _names(self):
        page = self.page
        for row, label, text, name in (
            (3, "Unit", figures.SITE, "site_name"),
            (4, "Supplier", figures.SUPPLIER, "supplier_name"),
            (5, "Document", figures.SHEET, "sheet_name"),
        ):
            page.put(f"B{row}", label, "label")
            page.put(f"C{row}", text, "input left", name=name, merge=f"F{row}")

    def build(self, tests):
        page = self.page
        self._unit_set()
        self._names()
        page.widths(
            {
                "A": 1.2,
                "B": 5.4,
                "C": 2.7,
                "D": 2.3,
                "E": 2.5,
                "F": 2.5,
                "G": 2.3,
                "H": 4.0,
                "I": 10.6,
            }
        )
        page.put("A1", "Supplier check", "title")
        page.height(1, 0.95)
        page.put(
            "A2",
            "Each claim on the supplier's sheet is recomputed from the supplier's own states and "
            "readings, held against the laws of nature, and judged within the stated uncertainty.",
            "subtitle",
        )
        last = FIRST + len(figures.CLAIMS) - 1
        area = f"H{FIRST}:H{last}"
        page.put("G3", "Result", "block", merge="H3")
        for row, (verdict, meaning) in enumerate(MEANINGS.items(), 4):
            page.put(f"G{row}", f'=COUNTIF({area};"{verdict}")', "key", "general")
            page.put(f"H{row}", verdict, "result centred")
            page.put(f"I{row}", meaning, "meaning")
            page.height(row, 0.8)
        page.put("I3", "What the words mean", "block")
        style_verdicts(page.sheet.getCellRangeByName("H4:H6"))
        page.put(
            "D6",
            "metric, us or si. Typed figures keep the supplier's units.",
            "meaning",
            merge="F6",
        )
        page.put(
            "B7",
            '="Worked out by "&ENGINE_VERSION()&". Site, supplier, document and every figure are invented. '
            "Where a cell shows #NAME?, or nothing moves when an input changes, the Busbar extension is "
            'missing: install it, then press Ctrl+Shift+F9."',
            "note",
            merge="I7",
        )
        page.height(7, 0.55)
        page.put("A8", "Verdicts", "block", merge="I8")
        for column, text in zip(
            "ABCDEFGHI",
            (
                "",
                "Claim and unit",
                "Stated basis",
                "Claimed",
                "Recomputed",
                "Uncertainty, ±",
                "Limit",
                "Verdict",
                "Reason",
            ),
        ):
            page.put(
                f"{column}{HEADINGS}", text, "heading left" if column in "BI" else "heading"
            )
        page.height(HEADINGS, 0.95)
        for offset, claim in enumerate(figures.CLAIMS):
            self._claim(FIRST + offset, tests, *claim[:3])
        style_verdicts(page.sheet.getCellRangeByName(area))
        basis = page.sheet.getCellRangeByName(f"C{FIRST}:C{last}")
        style_by_content(
            basis,
            {text: "unstated" for text in ("NOT STATED", "LHV, NOT STATED", "HHV, NOT STATED",
                                           "NOT STATED, gross", "NOT STATED, net")},
        )
        page.name_range("verdict_table", page.reference(f"A{HEADINGS}:I{last}"))
        self._foot(last + 2)
        page.freeze(2, HEADINGS)

    def _claim(self, row, tests, tag, key, name):
        page = self.page
        numbers = tests.rows[key]
        unit, fmt = claims.RULES[key][2], claims.RULES[key][1]
        test = f"${claims.NAME}."
        page.put(f"A{row}", tag, "label")
        page.put(f"B{row}", f'="{name}, "&{unit}' if unit else f"{name}, %", "label")
        page.put(f"C{row}", self._basis(key), "result centred")
        for column, source in (("D", "D"), ("E", "E"), ("F", "G"), ("G", "H")):
            finer = column == "F" and fmt != "heat_rate"
            fine = claims.FINER.get(fmt, fmt) if finer else fmt
            page.put(
                f"{column}{row}", f"={test}${source}${numbers}", "key" if column in "DE" else "result", fine
            )
        page.put(f"H{row}", f"={test}$O${numbers}", "result centred")
        page.put(f"I{row}", self._reason(key, tests), "reason")
        page.height(row, 0.92)

    @staticmethod
    def _basis(key):
        basis, boundary = f"claim_{key}_basis", f"claim_{key}_boundary"
        none = figures.NOT_NEEDED
        return (
            f'=IF({basis}="{none}";IF({boundary}="{none}";"{none}";'
            f'IF({boundary}="";"NOT STATED";{boundary}));'
            f'IF({basis}="";"NOT STATED";{basis})'
            f'&IF({boundary}="{none}";"";", "&IF({boundary}="";"NOT STATED";{boundary})))'
        )

    @staticmethod
    def _reason(key, tests):
        test = f"${claims.NAME}."
        numbers, words = tests.rows[key], tests.words[key]

        def number(column):
            return f"{test}${column}${numbers}"

        def word(column):
            return f"{test}${column}${words}"

        fits = f'IF({word("J")}="–";"";" "&{word("J")})'
        unstated = (
            f'UPPER(LEFT({number("L")};1))&MID({number("L")};2;99)&" not stated, and none is assumed."'
        )
        sign = f'IF({number("C")}="higher";1;-1)'
        claim_itself = f'{sign}*({number("D")}-{number("H")})>{number("G")}'
        cases = (
            (
                claims.LIMIT,
                f'IF({claim_itself};"The claim lies ";"The states stated for it give "&{word("C")}&", ")'
                f'&{word("F")}&" past the limit (uncertainty "&{word("E")}&"): "&{number("I")}&"."',
            ),
            (
                claims.BALANCE,
                f'"As stated, the supplier\'s own figures give "&{word("C")}&"; the claim is "&{word("H")}'
                f'&" better (uncertainty "&{word("E")}&")."&{fits}',
            ),
            (claims.UNSTATED, f"{unstated}&{fits}"),
            (
                claims.REFUTED,
                f'"Its inlet state is refuted by "&{number("M")}&"; as read it gives "&{word("C")}'
                f'&". Settle "&{number("M")}&" first."',
            ),
            (
                claims.TOUCHING,
                f'"Its own states lie "&{word("F")}&" past the limit, within the uncertainty "&{word("E")}&"."',
            ),
            (
                claims.COARSE,
                f'"The readings give "&{word("C")}&" "&{word("E")}&": too coarse to tell it from a perfect '
                f'machine. Largest share: "&{word("I")}&"."',
            ),
            (
                claims.MODEST,
                f'"The supplier\'s own figures give "&{word("C")}&", better than the claim by more than the '
                f'uncertainty "&{word("E")}&": a margin to be explained."&{fits}',
            ),
            (
                claims.AGREES,
                f'"The supplier\'s own figures give "&{word("C")}&" "&{word("E")}&"."',
            ),
            (claims.BLANK, '"The supplier claims nothing here."'),
        )
        failed = "".join(f"IF(ISERROR({number(c)});WHY({number(c)});" for c in "DEH")
        formula = f'"Cannot be recomputed. "&{failed}WHY({number("G")}))))'
        for code, text in reversed(cases):
            formula = f'IF({number("N")}="{code}";{text};{formula})'
        return "=" + formula

    def _foot(self, row):
        page = self.page
        page.put(f"A{row}", "How to read the cells", "block", merge=f"D{row}")
        page.put(f"F{row}", "Scope and cautions", "block", merge=f"I{row}")
        legend = (
            ("input", "typed from the supplier's sheet, in its units"),
            ("allowance", "typed by the auditor, where the supplier states none"),
            ("result", "worked out by a formula, in the chosen unit set"),
            ("unstated", "a basis that is not stated: reported, never assumed"),
        )
        for offset, (style, text) in enumerate(legend, 1):
            page.put(f"A{row + offset}", "1.23" if style != "unstated" else "?", style)
            page.put(f"B{row + offset}", text, "label", merge=f"D{row + offset}")
        end = row + len(legend)
        page.put(f"F{row + 1}", CAUTION, "caution", merge=f"I{end}")
        page.put(
            f"A{end + 1}",
            "Sheets: Recomputation (the supplier's figures left, Busbar's right), Tests (limits and "
            "gaps), Uncertainty (weight of each reading), Evidence (exact streams, reasons, sources, "
            "units). One steam unit, steady state, readings independent; leakage, cooling steam and "
            "boiler credits left out. Leakage from HP to IP within one casing can lift an apparent IP "
            "efficiency: ask before you accuse.",
            "note",
            merge=f"I{end + 1}",
        )
        page.height(end + 1, 0.8)
